/** Parts that members made out of a family's presets; `of` names the preset they started from. */
export interface Variant {
  readonly family: string;
  readonly of: string;
  readonly title: string;
  readonly purpose: string;
  readonly material?: string;
  readonly values: Readonly<Record<string, unknown>>;
}

export const VARIANTS: readonly Variant[] = [
  {
    family: 'cantilever-hook',
    of: 'battery-hatch',
    title: 'Long battery hatch hook',
    purpose:
      'The same hook with a longer arm, for the deep hatch of the three-metre glider. Opens with one finger.',
    values: { armLength: 26, rootThickness: 2.2 },
  },
  {
    family: 'cantilever-hook',
    of: 'battery-hatch',
    title: 'Canopy hook for cold hands',
    purpose: 'Wider and softer, so that it can be opened with gloves on at the winter meeting.',
    material: 'pp',
    values: { rootWidth: 12, tipWidth: 12, baseWidth: 16, undercut: 1.2 },
  },
  {
    family: 'rod-clip',
    of: 'rigging-rod-clip',
    title: 'Boat hook clip for the bench rail',
    purpose: 'Holds the retrieving pole along the rail of the club bench; two of them carry it.',
    values: { rodDiameter: 16, wallThickness: 2.4, tipThickness: 1.8, clipWidth: 14 },
  },
  {
    family: 'rod-clip',
    of: 'cable-row',
    title: 'Four servo leads in a row',
    purpose: 'Keeps four servo leads apart under the deck so that none reaches the winch drum.',
    values: { clipCount: 4 },
  },
  {
    family: 'living-hinge',
    of: 'rudder-hinge',
    title: 'Flap hinge for a hand-launched glider',
    purpose: 'A short strip for the flaps of the small glider, glued into a slit along the rear spar.',
    values: { leafWidth: 80, holeCount: 6 },
  },
  {
    family: 'peg-strap',
    of: 'battery-strap',
    title: 'Strap for the big winch battery',
    purpose:
      'Goes round the lead battery of the launch winch and the tray under it. A cord holds it a second time.',
    values: { bundleDiameter: 70, strapWidth: 20 },
  },
  {
    family: 'press-lid',
    of: 'lead-shot-pot',
    title: 'Tall pot for trim lead',
    purpose: 'The lead-shot pot, drawn taller for the keel of the racing boat.',
    values: { potHeight: 60 },
  },
];
