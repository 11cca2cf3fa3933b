import { describe, expect, it } from 'vitest';
import { POST } from '@/app/api/v1/check/route';
import { checkResponse } from '@/lib/http/v1/responses';
import { post } from '../../support/api';
import { seededDatabase } from '../../support/database';

seededDatabase();

/** Snap-Fit Joints for Plastics - A Design Guide, calculation example I, p. 16 (printed answers, as quoted). */
const EXAMPLE = {
  family: 'cantilever-hook',
  parameters: {
    armLength: 19,
    rootThickness: 3.28,
    tipThickness: 1.64,
    rootWidth: 9.5,
    tipWidth: 9.5,
    undercut: 2.4,
    leadInAngle: 30,
  },
  material: { id: 'pc-moulded', secantModulus: 1815, friction: 0.6, allowableStrain: 0.02 },
  use: { opening: 'often', layers: 'along', temperature: 23 },
};

async function example() {
  const answer = await post(POST, '/api/v1/check', EXAMPLE);
  const body = await answer.json();
  expect(answer.status, JSON.stringify(body)).toBe(200);
  const { figures, allowable } = checkResponse.parse(body);
  return {
    handbook: Object.fromEntries(figures.map(({ id, handbook }) => [id, handbook!])),
    allowable,
    figures,
  };
}

describe('the worked example of the design guide, sent to the API with its own plastic', () => {
  it('meets the printed root strain of 2 %', async () => {
    const { handbook } = await example();
    expect(handbook['peak-strain']).toBeCloseTo(0.02, 4);
  });

  it('meets the printed deflection force of 32.5 N within 0.5 %', async () => {
    const { handbook } = await example();
    expect(Math.abs(handbook['deflection-force']! / 32.5 - 1)).toBeLessThan(0.005);
  });

  it('meets the printed mating force of 58.5 N within 0.5 %', async () => {
    const { handbook } = await example();
    expect(Math.abs(handbook['mating-force']! / 58.5 - 1)).toBeLessThan(0.005);
  });

  it('judges by the allowable strain that was given', async () => {
    const { allowable, figures } = await example();
    expect(allowable.value).toBe(0.02);
    expect(figures.find(({ id }) => id === 'peak-strain')!.limit).toBe(0.02);
  });
});
