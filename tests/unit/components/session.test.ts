import { describe, expect, it } from 'vitest';
import { createSession, presetTyped } from '@/components/studio/session';
import { ROUND_PLASTIC, STIFF_PLASTIC, TINY, tinyStrain } from '../generators/tiny-family';

const MATERIALS = [ROUND_PLASTIC, STIFF_PLASTIC];
const open = (entries: Record<string, string> = {}) => {
  const start = presetTyped(TINY);
  return createSession(TINY, MATERIALS, { ...start, entries: { ...start.entries, ...entries } });
};
const strainOf = (session: ReturnType<typeof open>) => session.reading.getState().report.figures[0]!.value;

describe('typing in the design page', () => {
  it('checks the part at every valid entry', () => {
    const session = open();
    session.type('armLength', '25');
    expect(strainOf(session)).toBe(tinyStrain({ armLength: 25, thickness: 2, undercut: 1.2 }));
  });

  it('keeps a faulty entry and the last valid part beside it', () => {
    const session = open();
    session.type('armLength', '25');
    session.type('armLength', '250');
    expect(session.typed.getState().entries.armLength).toBe('250');
    const { design, issues } = session.reading.getState();
    expect(design.values.armLength).toBe(25);
    expect(issues).toEqual([
      { field: 'armLength', message: 'Arm length must be at most 60 mm', bound: 60, unit: 'mm' },
    ]);
    session.type('armLength', '26');
    expect(session.reading.getState().issues).toEqual([]);
  });

  it('shows the first preset where a link opens with a faulty entry, which stays as it came', () => {
    const session = open({ armLength: '9oo' });
    const { design, issues } = session.reading.getState();
    expect(design.values.armLength).toBe(20);
    expect(issues.map(({ field }) => field)).toEqual(['armLength']);
    expect(session.typed.getState().entries.armLength).toBe('9oo');
  });

  it('names the entry at fault and not what it breaks between dimensions', () => {
    const session = open();
    session.type('thickness', '0.1');
    expect(session.reading.getState().issues.map(({ field }) => field)).toEqual(['thickness']);
    session.type('thickness', '1.5');
    expect(session.reading.getState().issues.map(({ field }) => field)).toEqual(['tip']);
  });

  it('is not held up by a faulty entry whose field is out of sight', () => {
    const session = open();
    session.type('shape', 'round');
    session.type('noseRadius', '99');
    expect(session.reading.getState().issues).toHaveLength(1);
    session.type('shape', 'sharp');
    expect(session.reading.getState().issues).toEqual([]);
    expect(session.typed.getState().entries.noseRadius).toBe('99');
  });

  it('names a plastic that is not in the list', () => {
    const session = open();
    session.type('material', 'unobtainium');
    const { issues, material } = session.reading.getState();
    expect(issues[0]!.message).toBe('Material unobtainium is not in the list');
    expect(material.id).toBe('round');
  });
});

describe('undo', () => {
  it('takes back a run of typing in one field as one step', () => {
    const session = open();
    for (const text of ['2', '21', '21.', '21.5']) session.type('armLength', text);
    session.undo();
    expect(session.typed.getState().entries.armLength).toBe('20.0');
    session.redo();
    expect(session.typed.getState().entries.armLength).toBe('21.5');
  });

  it('takes back edits of two fields, or with a pause between them, one by one', () => {
    const session = open();
    session.type('armLength', '21');
    session.type('undercut', '1');
    session.seal();
    session.type('undercut', '2');
    const undercuts = [0, 1, 2].map(() => {
      session.undo();
      return session.typed.getState().entries.undercut;
    });
    expect(undercuts).toEqual(['1', '1.2', '1.2']);
    expect(session.typed.getState().entries.armLength).toBe('20.0');
  });

  it('brings the check back too', () => {
    const session = open();
    const before = strainOf(session);
    session.type('undercut', '3');
    expect(strainOf(session)).not.toBe(before);
    session.undo();
    expect(strainOf(session)).toBe(before);
  });

  it('forgets what could be redone once something else is typed', () => {
    const session = open();
    session.type('armLength', '21');
    session.undo();
    session.type('armLength', '30');
    session.redo();
    expect(session.typed.getState().entries.armLength).toBe('30');
  });

  it('takes back the change to another preset', () => {
    const session = open();
    session.replace(presetTyped(TINY, TINY.presets[1]));
    expect(session.reading.getState().material.id).toBe('stiff');
    session.undo();
    expect(session.typed.getState()).toEqual(presetTyped(TINY));
  });
});
