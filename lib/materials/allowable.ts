import type { Material, Opening, Source, Use } from './types';

export interface AllowableFactor {
  readonly id: 'short-term' | 'use' | 'layers' | 'temperature';
  readonly label: string;
  /** short-term: strain as a fraction; the others: multiplier. Null: not known. */
  readonly value: number | null;
  readonly source: Source;
}

export interface AllowableStrain {
  /** product of the factors, strain as a fraction; null when one of them is not known */
  readonly value: number | null;
  readonly factors: readonly AllowableFactor[];
  readonly because: string;
}

const GUIDE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, frequent separation about 60 % of the single value (as quoted)',
  mark: 'quoted',
};
const BETWEEN: Source = { text: 'Midway between once and often', mark: 'common-practice' };
const HEAT: Source = {
  text: 'Service temperature no higher than heat deflection temperature (0.45 MPa) less 20 K (as quoted)',
  mark: 'quoted',
};
const LAYERS: Source = {
  text: 'Across layers half of the strain along them, or refuse (printed-part guide, as quoted)',
  mark: 'quoted',
};

/** Below this, °C, printed plastics lose toughness and nothing here says by how much. */
const COLD_LIMIT = 0;

const USE_LABEL: Readonly<Record<Opening, string>> = {
  once: 'opened once',
  sometimes: 'opened sometimes',
  often: 'opened often',
};

function openingFactor(material: Material, opening: Opening): AllowableFactor {
  const once = material.allowableOnce?.value;
  const often = material.allowableOften?.value;
  const repeated = once && often ? often / once : 0.6;
  const value = opening === 'once' ? 1 : opening === 'often' ? repeated : (1 + repeated) / 2;
  const measured = material.allowableOften?.source ?? GUIDE;
  const source = opening === 'sometimes' ? BETWEEN : opening === 'often' ? measured : GUIDE;
  return { id: 'use', label: USE_LABEL[opening], value, source };
}

function layerFactor(material: Material, layers: Use['layers']): AllowableFactor {
  if (layers === 'along' || material.process === 'moulded') {
    return { id: 'layers', label: 'layers along the strain', value: 1, source: LAYERS };
  }
  const along = material.allowableOnce?.value;
  const across = material.allowableAcross;
  const value = along && across ? across.value / along : null;
  return { id: 'layers', label: 'strain pulls the layers apart', value, source: across?.source ?? LAYERS };
}

/** Highest service temperature in °C: heat deflection less 20 K; null when not known. */
export function serviceLimit(material: Material): number | null {
  return material.heatDeflection ? material.heatDeflection.value - 20 : null;
}

function temperatureFactor(material: Material, temperature: number): AllowableFactor {
  const limit = serviceLimit(material) ?? material.continuousService?.value ?? null;
  const label = `at ${temperature} °C`;
  const source =
    serviceLimit(material) === null && material.continuousService ? material.continuousService.source : HEAT;
  if (temperature >= COLD_LIMIT && temperature <= 30) return { id: 'temperature', label, value: 1, source };
  const known = limit !== null && temperature >= COLD_LIMIT && temperature <= limit;
  return { id: 'temperature', label, value: known ? 1 : null, source };
}

function reason(factors: readonly AllowableFactor[]): string {
  const missing = factors.filter((factor) => factor.value === null).map((factor) => factor.label);
  if (missing.length > 0) return `Not known: ${missing.join(', ')}.`;
  return factors.map((factor) => factor.label).join(', ');
}

/**
 * Allowable strain = short-term limit x use x layer direction x temperature.
 * Every factor carries its source; a factor that is not known makes the product not known.
 */
export function allowableStrain(material: Material, use: Use): AllowableStrain {
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
  return { value, factors, because: reason(factors) };
}
