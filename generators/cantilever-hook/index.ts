import type { Family } from '../contract';
import { about } from './about';
import { bending } from './bending';
import { callouts } from './callouts';
import { check } from './checks';
import { build, volumes } from './geometry';
import { motion } from './motion';
import { presets } from './presets';
import { type HookValues, parameters } from './schema';
import { stances } from './stances';

const family: Family<HookValues> = {
  about,
  parameters,
  presets,
  check,
  build,
  volumes,
  motion,
  bending,
  callouts,
  stances,
};

export default family;
