import type { About } from '../contract';

export const about: About = {
  id: 'side-buckle',
  kind: 'straps',
  name: 'Side buckle',
  summary: 'A plug with two springy arms that lock in a housing and let go when both sides are squeezed.',
  rightWhen: 'A webbing strap is opened and closed again and again: bags, covers, trolleys, model boxes.',
  wrongWhen:
    'Anybody or anything could come to harm if it lets go, or the strap is always under a heavy pull.',
  bendsBy: 'bending',
};
