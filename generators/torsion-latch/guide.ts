import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'A torsion latch is a lever on two short bars. Closing the lid, or pressing the tail, turns the lever and twists the bars; they turn it back.',
    'It gives a finger release without a long flexible arm.',
  ],
  howItFails: [
    'The bars shear or crack at the middle of their long sides, or at sharp corners where they meet rocker and frame.',
    'Printed standing, the bars part between layers.',
    'A thin rocker bends instead of turning, and the nose does not clear its edge.',
  ],
  formulas: [
    {
      name: 'Turn of the rocker',
      formula: 'sin phi = y / l1 = y2 / l2',
      symbols: 'y undercut, l1 arm to the nose, y2 travel of the tail, l2 arm to the tail',
      validity: 'Stiff rocker',
      source: { text: 'Snap-Fit Joints for Plastics - A Design Guide, torsion (as quoted)', mark: 'quoted' },
    },
    {
      name: 'Round bar',
      formula: 'gamma = phi r / L, T = G (pi r^4 / 2) phi / L, gamma_allow = (1 + nu) eps_allow',
      symbols: 'gamma shear strain, r radius, L bar length, G = E / (2 (1 + nu))',
      validity: 'Small strain',
      source: { text: 'Snap-Fit Joints for Plastics - A Design Guide, torsion (as quoted)', mark: 'quoted' },
    },
    {
      name: 'Rectangular bar',
      formula: 'T = G J phi / L, series of Saint-Venant for J and the largest shear',
      symbols: 'J torsion constant',
      validity: 'Ends free to warp; agrees with the usual table of alpha and beta',
      source: {
        text: 'Timoshenko & Goodier, Theory of Elasticity (from memory, recomputed)',
        mark: 'memory',
      },
    },
    {
      name: 'Held ends',
      formula: 'Leff = L - a 0.473 (1 - 1 / (1 + (a / (2.165 b))^3.07))',
      symbols: 'a, b long and short side of the bar',
      validity: 'Torque within 1 % of finite elements; shear within 3 % for L >= 2 a, high for shorter bars',
      source: source.TWIST,
    },
    {
      name: 'Twist and bending together',
      formula: 'eps = sqrt(eps_b^2 + (gamma / (1 + nu))^2)',
      symbols: 'eps_b bending strain of the bar',
      validity: 'Greatest shear (Tresca)',
      source: source.BENDING,
    },
  ],
  printing: [
    'Print flat with strands along the bars and solid infill in them; the twist still shears the layers, so a printed torsion bar is the least certain of all snap parts.',
    'Fillets at the bar ends of at least half the bar.',
    'Leave room under the tail.',
  ],
  cautions: [
    'Batteries and spinning parts need a second retention beside a latch.',
    'Not for lifting, climbing, child safety or any load that can hurt someone if it lets go.',
    'Figures are estimates for a first print: prove them by test. Local codes and licensed practice come first.',
  ],
};

export default guide;
