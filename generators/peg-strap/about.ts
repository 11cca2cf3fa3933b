import type { About } from '../contract';

export const about: About = {
  id: 'peg-strap',
  kind: 'straps',
  name: 'Peg strap',
  summary: 'A soft strip that closes round a bundle with a headed peg in one of its eyes.',
  rightWhen:
    'You bundle cables, rods or a battery pack and open the strap again, in a plastic that stretches.',
  wrongWhen:
    'You need a stiff plastic, a fine adjustment, or a hold that must not let go: an eye in PLA or PETG cracks before the head is through.',
  bendsBy: 'bending round the bundle, and stretching of the eye over the head',
};
