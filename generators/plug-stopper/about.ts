import type { About } from '../contract';

export const about: About = {
  id: 'plug-stopper',
  kind: 'caps',
  name: 'Plug stopper',
  summary: 'A tapered plug, solid or hollow, with ribs that seal in a round bore by squeeze.',
  rightWhen:
    'A drain, tube end or filler hole is shut by hand, without a thread, against dust or still water.',
  wrongWhen: 'Pressure, heat or drinking water stands behind it, or it must hold by itself for years.',
  bendsBy: 'hoop compression',
};
