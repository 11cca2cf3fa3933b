'use client';

import { QueryClient, QueryClientProvider, useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { send } from '@/components/forms/send';
import { marginWords, VerdictMark } from '@/components/studio/verdict';
import { Labelled } from '@/components/ui/labelled';
import { type Option, SelectField } from '@/components/ui/select-field';
import type { CheckResult } from '@/lib/access/check';
import type { Use } from '@/lib/materials/types';
import { formatQuantity } from '@/lib/units';

interface Part {
  readonly family: string;
  readonly parameters: Readonly<Record<string, unknown>>;
  readonly use: Use;
}

async function check(part: Part, material: string): Promise<CheckResult> {
  const sent = await send<CheckResult>('POST', '/api/v1/check', { ...part, material });
  if (!sent.ok) throw new Error(sent.message);
  return sent.value;
}

function Answer({ result }: { result: CheckResult }) {
  const figure = result.figures.find(({ id }) => id === result.governing);
  if (!figure) return null;
  const share = figure.value !== null && figure.limit ? Math.min(1.5, figure.value / figure.limit) : null;
  return (
    <div className="grid gap-2">
      <p className="flex flex-wrap items-baseline gap-x-3">
        <b className="font-bold font-heading text-4xl">{formatQuantity(figure.value, figure.unit)}</b>
        <span className="text-muted">
          {figure.label.toLowerCase()}, {figure.limitKind === 'max' ? 'at most' : 'at least'}{' '}
          {formatQuantity(figure.limit, figure.unit)}
        </span>
      </p>
      {share !== null && figure.limitKind === 'max' && (
        <span aria-hidden="true" className="relative block h-4 bg-tint">
          <i className="hatched absolute inset-y-0 right-0 left-2/3" />
          <i className="absolute inset-y-0 left-0 bg-petrol" style={{ width: `${(share * 200) / 3}%` }} />
          <i className="absolute -inset-y-1 left-2/3 border-over border-l-2" />
        </span>
      )}
      <p>
        <VerdictMark verdict={result.verdict} more={marginWords(figure)} />
      </p>
      <p className="text-muted text-sm">{figure.because}</p>
    </div>
  );
}

function Chosen({ part, material }: { part: Part; material: string }) {
  const { data, error } = useQuery({
    queryKey: ['check', part, material],
    queryFn: () => check(part, material),
    staleTime: Infinity,
    placeholderData: (before) => before,
  });
  return (
    <div aria-live="polite">
      {error && <p className="text-over">{error.message}</p>}
      {data && !error && <Answer result={data} />}
      {!data && !error && <p className="text-muted">Checking</p>}
    </div>
  );
}

/** The part checked in whatever plastic the reader has at hand. */
export function CheckIn({ part, own, materials }: { part: Part; own: string; materials: readonly Option[] }) {
  const [client] = useState(() => new QueryClient({ defaultOptions: { queries: { retry: 1 } } }));
  const [material, setMaterial] = useState(own);
  return (
    <QueryClientProvider client={client}>
      <div className="grid gap-4">
        <Labelled label="In your plastic">
          {(id) => (
            <SelectField
              id={id}
              value={material}
              onChange={(event) => setMaterial(event.target.value)}
              options={materials}
            />
          )}
        </Labelled>
        <Chosen part={part} material={material} />
      </div>
    </QueryClientProvider>
  );
}
