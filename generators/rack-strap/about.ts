import type { About } from '../contract';

export const about: About = {
  id: 'rack-strap',
  kind: 'straps',
  name: 'Rack strap',
  summary:
    'A toothed strap that is drawn through its own head, where a pawl lets it tighten and not slip back.',
  rightWhen: 'Bundles of different size are drawn tight: spars, hoses, cables, stakes, rolled sails.',
  wrongWhen:
    'It is wrapped round something thin in a stiff plastic, or anybody could come to harm if it lets go.',
  bendsBy: 'bending',
};
