import type { About } from '../contract';

export const about: About = {
  id: 'screw-pot',
  kind: 'caps',
  name: 'Screw pot',
  summary: 'A round pot with a thread round its mouth and the lid that screws on it, divided or not.',
  rightWhen:
    'Small things or shot are carried about and must stay in: trim weights, rigging bits, filler powder.',
  wrongWhen:
    'It has to hold pressure, hot liquid, fuel or food, or is opened with one hand: use a press lid for that.',
  bendsBy: 'thread shear, seal interference',
};
