'use client';
import { useEffect, useMemo, useRef, useState } from 'react';
import type { Callout, Motion } from '@/generators/contract';
import type { ParameterValue } from '@/generators/parameters';
import type { BuiltBody } from '@/lib/geometry/kernel';
import { type BuildClient, createBuildClient } from './build-client';

/** What belongs to one set of parameters; drawn together or not at all. */
interface Belongings {
  readonly motion: Motion | null;
  readonly callouts: readonly Callout[];
}

export interface Build extends Belongings {
  readonly key: string;
  readonly bodies: readonly BuiltBody[];
}

export interface BuildState {
  readonly build: Build | null;
  readonly message: string | null;
  readonly buildMs: number | null;
  /** performance.now() when the parameters of the build shown were received */
  readonly askedAt: number;
}

type Values = Readonly<Record<string, ParameterValue>>;

const NOTHING: BuildState = { build: null, message: null, buildMs: null, askedAt: 0 };

/** Builds in the worker, latest wins. The last good build stays until the next one is there, or fails. */
export function useBuild(family: string, values: Values, belongings: Belongings): BuildState {
  const key = useMemo(() => JSON.stringify([family, values]), [family, values]);
  const [state, setState] = useState<BuildState>(NOTHING);
  const client = useRef<BuildClient | null>(null);
  const latest = useRef({ family, values, belongings });
  latest.current = { family, values, belongings };

  useEffect(() => {
    const created = createBuildClient();
    client.current = created;
    created.warmUp(latest.current.family);
    return () => created.dispose();
  }, []);

  useEffect(() => {
    const asked = latest.current;
    const askedAt = performance.now();
    let wanted = true;
    client
      .current!.build({ family, parameters: asked.values, quality: 'preview' })
      .then((bodies) => {
        if (!wanted || !bodies) return;
        const build = { key, bodies, ...asked.belongings };
        setState({ build, message: null, buildMs: performance.now() - askedAt, askedAt });
      })
      .catch((error: unknown) => {
        if (!wanted) return;
        const message = error instanceof Error ? error.message : 'The shape could not be built.';
        setState((last) => ({ ...last, message }));
      });
    return () => {
      wanted = false;
    };
  }, [family, key]);

  const { motion, callouts } = belongings;
  return useMemo(() => {
    const { build } = state;
    if (!build || build.key !== key) return state;
    if (build.motion === motion && build.callouts === callouts) return state;
    return { ...state, build: { ...build, motion, callouts } };
  }, [state, key, motion, callouts]);
}
