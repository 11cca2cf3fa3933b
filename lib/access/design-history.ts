import 'server-only';
import type { Report } from '@/generators/report';
import { readContent } from './design-content';
import { type Design, type DesignState, getDesign, listStates } from './designs';
import type { Viewer } from './policy';

export interface History {
  readonly design: Design;
  /** newest first */
  readonly states: readonly DesignState[];
  /** a state and the one before it, each checked today; null where the design has one state only */
  readonly compared: {
    readonly before: DesignState;
    readonly after: DesignState;
    readonly reports: readonly [Report, Report];
  } | null;
}

const reportOf = async (state: DesignState): Promise<Report> => (await readContent(state)).report;

/** The history of a design, with one state compared with the one before: the newest unless another is named. */
export async function getHistory(viewer: Viewer, id: string, revision?: number): Promise<History> {
  const design = getDesign(viewer, id);
  const states = listStates(viewer, id);
  const at = Math.max(
    0,
    states.findIndex((state) => state.revision === revision),
  );
  const [after, before] = [states[at], states[at + 1]];
  if (!after || !before) return { design, states, compared: null };
  return {
    design,
    states,
    compared: { before, after, reports: [await reportOf(before), await reportOf(after)] },
  };
}
