import type { Family } from '../contract';
import { screwMotion } from '../screw-motion';
import { about } from './about';
import { callouts, stances } from './callouts';
import { check } from './checks';
import { build, volumes } from './geometry';
import { screwOf } from './layout';
import { presets } from './presets';
import { parameters, type Values } from './schema';

const family: Family<Values> = {
  about,
  parameters,
  presets,
  check,
  build,
  volumes,
  motion: (values, material) => screwMotion(screwOf(values), material, { neck: 'pot', cap: 'lid' }),
  callouts,
  stances,
};

export default family;
