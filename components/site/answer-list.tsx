import type { Answer } from './answers';

/** Questions a maker has, answered with figures of a real part. */
export function AnswerList({ answers }: { answers: readonly Answer[] }) {
  return (
    <dl className="grid gap-x-8 gap-y-10 sm:grid-cols-2 xl:grid-cols-4">
      {answers.map(({ question, figure, words }) => (
        <div key={question} className="border-ink border-t-2 pt-3">
          <dt className="font-semibold">{question}</dt>
          <dd className="mt-3">
            <strong className="block font-bold font-heading text-4xl leading-[1.05] tracking-[-0.02em]">
              {figure}
            </strong>
            <span className="mt-2 block max-w-[46ch] text-muted">{words}</span>
          </dd>
        </div>
      ))}
    </dl>
  );
}
