import type { About } from '../contract';

export const about: About = {
  id: 'soft-mount',
  kind: 'mounts',
  name: 'Soft mount',
  summary: 'Two plates on rubber-like columns or on a pair of S-springs, to keep shaking away.',
  rightWhen: 'A camera, a receiver or a gyro must be kept from the shaking of a motor.',
  wrongWhen: 'The load must be located exactly, hangs for months, or hurts someone if it comes off.',
  bendsBy: 'compression and bending',
};
