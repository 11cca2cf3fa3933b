import { about as armLadder } from './arm-ladder/about';
import { about as cantileverHook } from './cantilever-hook/about';
import { about as clearanceLadder } from './clearance-ladder/about';
import type { About, Family, Guide } from './contract';
import { about as foldedHook } from './folded-hook/about';
import { about as hingedBox } from './hinged-box/about';
import { about as knuckleHinge } from './knuckle-hinge/about';
import { about as latticeHinge } from './lattice-hinge/about';
import { about as livingHinge } from './living-hinge/about';
import { about as pegStrap } from './peg-strap/about';
import { about as plugStopper } from './plug-stopper/about';
import { about as pressLid } from './press-lid/about';
import { about as rackStrap } from './rack-strap/about';
import { about as rodClip } from './rod-clip/about';
import { about as screwCap } from './screw-cap/about';
import { about as screwPot } from './screw-pot/about';
import { about as sideBuckle } from './side-buckle/about';
import { about as softMount } from './soft-mount/about';
import { about as threadLadder } from './thread-ladder/about';
import { about as torsionLatch } from './torsion-latch/about';
import { about as webLadder } from './web-ladder/about';

/** What the list knows of a family before it is loaded. */
export interface FamilyEntry {
  readonly about: About;
  readonly load: () => Promise<Family>;
  readonly loadGuide: () => Promise<Guide>;
}

/** The families, in the order they are offered. A new family is a folder and a line here. */
export const FAMILIES: readonly FamilyEntry[] = [
  {
    about: cantileverHook,
    load: () => import('./cantilever-hook').then((m) => m.default),
    loadGuide: () => import('./cantilever-hook/guide').then((m) => m.default),
  },
  {
    about: livingHinge,
    load: () => import('./living-hinge').then((m) => m.default),
    loadGuide: () => import('./living-hinge/guide').then((m) => m.default),
  },
  {
    about: pegStrap,
    load: () => import('./peg-strap').then((m) => m.default),
    loadGuide: () => import('./peg-strap/guide').then((m) => m.default),
  },
  {
    about: sideBuckle,
    load: () => import('./side-buckle').then((m) => m.default),
    loadGuide: () => import('./side-buckle/guide').then((m) => m.default),
  },
  {
    about: rackStrap,
    load: () => import('./rack-strap').then((m) => m.default),
    loadGuide: () => import('./rack-strap/guide').then((m) => m.default),
  },
  {
    about: rodClip,
    load: () => import('./rod-clip').then((m) => m.default),
    loadGuide: () => import('./rod-clip/guide').then((m) => m.default),
  },
  {
    about: screwCap,
    load: () => import('./screw-cap').then((m) => m.default),
    loadGuide: () => import('./screw-cap/guide').then((m) => m.default),
  },
  {
    about: screwPot,
    load: () => import('./screw-pot').then((m) => m.default),
    loadGuide: () => import('./screw-pot/guide').then((m) => m.default),
  },
  {
    about: torsionLatch,
    load: () => import('./torsion-latch').then((m) => m.default),
    loadGuide: () => import('./torsion-latch/guide').then((m) => m.default),
  },
  {
    about: foldedHook,
    load: () => import('./folded-hook').then((m) => m.default),
    loadGuide: () => import('./folded-hook/guide').then((m) => m.default),
  },
  {
    about: plugStopper,
    load: () => import('./plug-stopper').then((m) => m.default),
    loadGuide: () => import('./plug-stopper/guide').then((m) => m.default),
  },
  {
    about: pressLid,
    load: () => import('./press-lid').then((m) => m.default),
    loadGuide: () => import('./press-lid/guide').then((m) => m.default),
  },
  {
    about: knuckleHinge,
    load: () => import('./knuckle-hinge').then((m) => m.default),
    loadGuide: () => import('./knuckle-hinge/guide').then((m) => m.default),
  },
  {
    about: latticeHinge,
    load: () => import('./lattice-hinge').then((m) => m.default),
    loadGuide: () => import('./lattice-hinge/guide').then((m) => m.default),
  },
  {
    about: hingedBox,
    load: () => import('./hinged-box').then((m) => m.default),
    loadGuide: () => import('./hinged-box/guide').then((m) => m.default),
  },
  {
    about: clearanceLadder,
    load: () => import('./clearance-ladder').then((m) => m.default),
    loadGuide: () => import('./clearance-ladder/guide').then((m) => m.default),
  },
  {
    about: armLadder,
    load: () => import('./arm-ladder').then((m) => m.default),
    loadGuide: () => import('./arm-ladder/guide').then((m) => m.default),
  },
  {
    about: threadLadder,
    load: () => import('./thread-ladder').then((m) => m.default),
    loadGuide: () => import('./thread-ladder/guide').then((m) => m.default),
  },
  {
    about: webLadder,
    load: () => import('./web-ladder').then((m) => m.default),
    loadGuide: () => import('./web-ladder/guide').then((m) => m.default),
  },
  {
    about: softMount,
    load: () => import('./soft-mount').then((m) => m.default),
    loadGuide: () => import('./soft-mount/guide').then((m) => m.default),
  },
];

export const familyEntry = (id: string): FamilyEntry | undefined =>
  FAMILIES.find((entry) => entry.about.id === id);
