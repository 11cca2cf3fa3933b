import type { Family } from '../contract';
import { about } from './about';
import { callouts, stances } from './callouts';
import { check } from './checks';
import { build, volumes } from './geometry';
import { motion } from './motion';
import { presets } from './presets';
import { parameters, type Values } from './schema';

const family: Family<Values> = {
  about,
  parameters,
  presets,
  check,
  build,
  volumes,
  motion,
  callouts,
  stances,
};

export default family;
