import { describe, expect, it } from 'vitest';
import { limitWords } from '@/components/studio/sheet/remedies';
import livingHinge from '@/generators/living-hinge';
import { remedyOf } from '@/generators/remedies';
import { presetDesign } from '@/generators/url-state';
import { materialById } from '@/lib/materials/data';

describe('the room of a living hinge', () => {
  it('says that a thinner web is stopped by what can be printed, not by the strain', () => {
    const { values, material, use } = presetDesign(livingHinge);
    const subject = { family: livingHinge, values, material: materialById(material)!, use };
    const room = remedyOf(subject, 'webThickness')!;
    expect(room.to).toBeLessThan(room.from);
    expect(limitWords(room.stoppedBy!)).toMatch(/^.+, at least /);
  });
});
