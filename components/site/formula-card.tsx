import type { Guide } from '@/generators/contract';
import { SourceLine } from './source-mark';

type Formula = Guide['formulas'][number];

export function FormulaCard({ formula }: { formula: Formula }) {
  return (
    <article className="border-hair border-t py-5 first:border-t-0">
      <h3 className="font-bold text-xl">{formula.name}</h3>
      <p className="my-3 overflow-x-auto rounded-field bg-tint px-4 py-3 font-mono text-[0.95rem] leading-relaxed">
        {formula.formula}
      </p>
      <dl className="grid gap-x-5 gap-y-1.5 text-[0.95rem] sm:grid-cols-[6rem_1fr]">
        <dt className="text-muted">Symbols</dt>
        <dd>{formula.symbols}</dd>
        <dt className="text-muted">Holds for</dt>
        <dd>{formula.validity}</dd>
        <dt className="text-muted">Source</dt>
        <dd>
          <SourceLine source={formula.source} />
        </dd>
      </dl>
    </article>
  );
}
