import type { Family } from '@/generators/contract';
import type { NumberField } from '@/generators/parameters';
import { type Remedy, remedies } from '@/generators/remedies';
import { type Figure, type Report, VERDICT_WORDS } from '@/generators/report';
import type { Subject } from '@/generators/sensitivity';
import { materialById } from '@/lib/materials/data';
import { formatQuantity } from '@/lib/units';
import { SAMPLE_MATERIAL, SAMPLE_USE, sampleValues } from './sample';

export interface Answer {
  readonly question: string;
  /** the figure that answers it, as written */
  readonly figure: string;
  readonly words: string;
}

const written = (figure: Figure | undefined): string =>
  figure ? formatQuantity(figure.value, figure.unit) : 'not known';

const range = ({ low, high, unit }: Figure): string =>
  `${formatQuantity(low, unit, 2)} to ${formatQuantity(high, unit, 2)}`;

function remedyWords(family: Family, { field, to, from }: Remedy): string {
  const { label, unit } = family.parameters.fields[field] as NumberField;
  return `${label} ${to > from ? 'up' : 'down'} to ${formatQuantity(to, unit)}`;
}

function holding(report: Report): Answer {
  const peak = report.figures.find(({ id }) => id === report.governing)!;
  return {
    question: 'Will it hold?',
    figure: formatQuantity(peak.value, peak.unit),
    words: `is the peak strain; ${formatQuantity(peak.limit, peak.unit)} is allowed, so it is ${
      VERDICT_WORDS[report.verdict]
    }. The handbook's plain formula says ${formatQuantity(peak.handbook, peak.unit)}; both are always shown.`,
  };
}

function feeling(report: Report): Answer {
  const push = report.figures.find(({ id }) => id === 'mating-force');
  const pull = report.figures.find(({ id }) => id === 'separation-force');
  return {
    question: 'How does it feel?',
    figure: written(push),
    words:
      push && pull
        ? `to push in, ${written(pull)} to pull open. Friction is never known well, so a band stands beside each: ${range(push)} in.`
        : '',
  };
}

function changing(family: Family, subject: Subject): Answer {
  const ways = remedies(subject).map((remedy) => remedyWords(family, remedy));
  return {
    question: 'What should I change?',
    figure: ways[0] ?? 'another plastic',
    words:
      'would just meet the limit. Every dimension tells its effect on the strain, and is taken over with one press.',
  };
}

function printing(family: Family): Answer {
  const stance = family.stances(sampleValues(family))[0]!;
  return { question: 'Which way up do I print it?', figure: stance.label, words: stance.because };
}

/** What the design page says of the first page's hook, pulled all the way. */
export function answers(family: Family): Answer[] {
  const material = materialById(SAMPLE_MATERIAL)!;
  const values = family.parameters.schema.parse(sampleValues(family));
  const report = family.check(values, material, SAMPLE_USE);
  const subject: Subject = { family, values, material, use: SAMPLE_USE };
  return [holding(report), feeling(report), changing(family, subject), printing(family)];
}
