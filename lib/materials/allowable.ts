import type { Material, Opening, Source, Use } from './types';

export interface AllowableFactor {
  readonly id: 'short-term' | 'use' | 'layers' | 'temperature';
  readonly label: string;
  /** short-term: strain as a fraction; the others: multiplier. Null: not known. */
  readonly value: number | null;
  readonly source: Source;
  /** why it is not known, or what it does not cover */
  readonly note?: string;
}

export interface AllowableStrain {
  /** product of the factors, strain as a fraction; null when one of them is not known */
  readonly value: number | null;
  readonly factors: readonly AllowableFactor[];
  readonly because: string;
  /** what forces worked out with the moduli of 23 °C are worth at the temperature of use */
  readonly stiffness: 'as-given' | 'softer' | 'not-known';
}

const GUIDE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, frequent separation about 60 % of the single value',
  mark: 'quoted',
};
const BETWEEN: Source = {
  text: 'Geometric mean of once and often: a line straight in log strain against log openings, the form fatigue of printed PLA takes (Ezeh & Susmel, Int. J. Fatigue 126 (2019) 319-326)',
  mark: 'derived',
};
const HEAT: Source = {
  text: 'Service temperature no higher than heat deflection temperature (0.45 MPa) less 20 K, nor than the continuous limit',
  mark: 'quoted',
};
const LAYERS: Source = {
  text: 'Across layers half of the strain along them, or refuse (printed-part guide)',
  mark: 'quoted',
};
const GIVEN: Source = { text: 'Given for the use at hand', mark: 'given' };

/** Below this, °C, printed plastics lose toughness and nothing here says by how much. */
const COLD_LIMIT = 0;
/** Up to this, °C, the figures measured at 23 °C stand without a heat limit of the plastic. */
const ROOM_LIMIT = 30;
/** Printed specimens held 3 h at 20 MPa: none broke at 40 °C, at 60 °C all but PC did. */
const CREEP_LIMIT = 40;
/** Share of the short-term limit for frequent opening, and across layers, where a plastic has no figure. */
const OFTEN_SHARE = 0.6;
const ACROSS_SHARE = 0.5;

const USE_LABEL: Readonly<Record<Opening, string>> = {
  once: 'opened once',
  sometimes: 'opened sometimes',
  often: 'opened often',
};

function openingFactor(material: Material, opening: Opening): AllowableFactor {
  const once = material.allowableOnce?.value;
  const often = material.allowableOften?.value;
  const repeated = once && often ? often / once : OFTEN_SHARE;
  const value = opening === 'once' ? 1 : opening === 'often' ? repeated : Math.sqrt(repeated);
  const measured = material.allowableOften?.source ?? GUIDE;
  const source = opening === 'sometimes' ? BETWEEN : opening === 'often' ? measured : GUIDE;
  return { id: 'use', label: USE_LABEL[opening], value, source };
}

function layerFactor(material: Material, layers: Use['layers']): AllowableFactor {
  if (material.process === 'moulded') {
    return { id: 'layers', label: 'moulded, no layers', value: 1, source: LAYERS };
  }
  if (layers === 'along') {
    return { id: 'layers', label: 'layers along the strain', value: 1, source: LAYERS };
  }
  const along = material.allowableOnce?.value;
  const across = material.allowableAcross;
  const value = along && across ? across.value / along : ACROSS_SHARE;
  return { id: 'layers', label: 'strain pulls the layers apart', value, source: across?.source ?? LAYERS };
}

/** Highest service temperature in °C: heat deflection less 20 K or the continuous limit, the lower; null: not known. */
export function serviceLimit(material: Material): number | null {
  const limits = [
    material.heatDeflection && material.heatDeflection.value - 20,
    material.continuousService?.value,
  ].filter((limit) => typeof limit === 'number');
  return limits.length > 0 ? Math.min(...limits) : null;
}

function heatNote(material: Material, temperature: number): { known: boolean; note?: string } {
  const limit = serviceLimit(material);
  if (temperature < COLD_LIMIT) {
    return { known: false, note: `below ${COLD_LIMIT} °C toughness falls and no figure was found` };
  }
  if (limit === null) {
    const known = temperature <= ROOM_LIMIT;
    return known ? { known } : { known, note: `no heat limit of ${material.shortName} was found` };
  }
  if (temperature > limit) {
    return { known: false, note: `${material.shortName} softens: use it up to ${limit} °C` };
  }
  if (temperature <= CREEP_LIMIT) return { known: true };
  return { known: true, note: `for a short flex only: over ${CREEP_LIMIT} °C a part held strained creeps` };
}

/**
 * 1 within the service limit, not known outside: short-time strain limits are published at 23 °C and a heated plastic
 * stretches further, not less, until it softens; what heat takes away is strength held over time.
 */
function temperatureFactor(material: Material, temperature: number): AllowableFactor {
  const { known, note } = heatNote(material, temperature);
  const label = `at ${temperature} °C`;
  return { id: 'temperature', label, value: known ? 1 : null, source: HEAT, ...(note && { note }) };
}

function stiffnessAt(material: Material, temperature: number): AllowableStrain['stiffness'] {
  if (!heatNote(material, temperature).known) return 'not-known';
  return temperature > ROOM_LIMIT ? 'softer' : 'as-given';
}

function reason(factors: readonly AllowableFactor[]): string {
  const told = (factor: AllowableFactor) => (factor.note ? `${factor.label} (${factor.note})` : factor.label);
  const missing = factors.filter((factor) => factor.value === null).map(told);
  if (missing.length > 0) return `Not known: ${missing.join(', ')}.`;
  return factors.map(told).join(', ');
}

function given(material: Material, value: number, use: Use): AllowableStrain {
  const whole = (id: AllowableFactor['id'], label: string): AllowableFactor => ({
    id,
    label,
    value: id === 'short-term' ? value : 1,
    source: material.allowableFinal?.source ?? GIVEN,
  });
  const covered = 'covered by the given strain';
  const factors = [
    whole('short-term', 'allowable strain as given'),
    whole('use', covered),
    whole('layers', covered),
    whole('temperature', covered),
  ];
  const because = 'The allowable strain was given for this use; no factor is applied.';
  return { value, factors, because, stiffness: stiffnessAt(material, use.temperature) };
}

/**
 * Allowable strain = short-term limit x use x layer direction x temperature.
 * Every factor carries its source; a factor that is not known makes the product not known.
 * A strain given for the use at hand replaces the product.
 */
export function allowableStrain(material: Material, use: Use): AllowableStrain {
  if (material.allowableFinal) return given(material, material.allowableFinal.value, use);
  const limit = material.allowableOnce;
  const factors: AllowableFactor[] = [
    {
      id: 'short-term',
      label: `short-term limit of ${material.shortName}`,
      value: limit?.value ?? null,
      source: limit?.source ?? { text: 'no figure found', mark: 'memory' },
    },
    openingFactor(material, use.opening),
    layerFactor(material, use.layers),
    temperatureFactor(material, use.temperature),
  ];
  const value = factors.some((factor) => factor.value === null)
    ? null
    : factors.reduce((product, factor) => product * (factor.value ?? Number.NaN), 1);
  return { value, factors, because: reason(factors), stiffness: stiffnessAt(material, use.temperature) };
}
