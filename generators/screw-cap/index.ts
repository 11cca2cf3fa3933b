import type { Family } from '../contract';
import { screwMotion } from '../screw-motion';
import { about } from './about';
import { callouts, stances } from './callouts';
import { check } from './checks';
import { build, volumes } from './geometry';
import { presets } from './presets';
import { parameters, type Values } from './schema';

const family: Family<Values> = {
  about,
  parameters,
  presets,
  check,
  build,
  volumes,
  motion: (values, material) => screwMotion(values, material, { neck: 'neck', cap: 'cap' }),
  callouts,
  stances,
};

export default family;
