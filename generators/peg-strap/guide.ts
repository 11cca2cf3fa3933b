import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'A peg strap ties a bundle of cables, rods or a battery pack and opens again: the headed peg at one end goes through one of the eyes at the other.',
    'It closes from its first eye, on the smallest bundle, to its last, on the largest. With a half turn the strip stands on edge opposite the peg and keeps two members apart.',
    'To open it, squeeze the strip beside the eye from both edges: the eye grows longer along the strip, one side slips over the head and the rest follows.',
  ],
  howItFails: [
    'The eye tears beside the head, where the webs left of the strip are narrow: a stiff plastic cracks before the head is through.',
    'The strip cracks at the edge of an eye that lies bent on the bundle.',
    'The peg snaps or leans: it stands upright on the bed, so bending it pulls its layers apart.',
    'The eye slips off a head that is hardly wider than the eye, or that has a shallow back face.',
    'A strap kept closed and tight for weeks creeps and sits loose.',
  ],
  formulas: [
    {
      name: 'Wrap strain',
      formula: 'eps = t / (D + t)',
      symbols: 't strap thickness, D bundle diameter',
      validity: 'Exact for a plain strip that lies on the bundle',
      source: source.GEOMETRY,
    },
    {
      name: 'Bend at the edge of an eye',
      formula:
        'K = (1.79 + 0.25/(0.39 + d/t) + 0.81/(1 + (d/t)²) - 0.26/(1 + (d/t)³)) (1 - 1.04 d/b + 1.22 (d/b)²)',
      symbols: 'K times the wrap strain, d eye diameter, b strap width',
      validity: 'd/b up to 0.3, held there beyond; 1/(1 - d/b) times more where the strip is not pressed on',
      source: source.BENT_HOLE,
    },
    {
      name: 'Length from peg to eye',
      formula: 'L = p √(1 + k²)/k, k = ln(1 + 2 p/(D + t))/(2 π), p = t',
      symbols: 'one turn of a spiral with pitch p, nearly π (D + 2 t)',
      validity: 'Straight strap; a hard bundle may be up to one thickness larger',
      source: source.SPIRAL,
    },
    {
      name: 'Eye over the head',
      formula: 'eps = K (dh - d)/d, radial force N = E (dh - d)/d · π d t F/((b² + d²)/(b² - d²) + nu)',
      symbols:
        'dh head diameter, q = d²/(b² - d²), F = 1 + q (0.342 - 0.034 q), K = 1.03 up to d/b 0.6, rising to 1.16 at 0.7',
      validity: 'd/b from 0.2 to 0.7, rigid head, whole depth of the eye stretched, small strain',
      source: source.EYE,
    },
    {
      name: 'Push-in and pull-out',
      formula: 'W = N (mu + tan a)/(1 - mu tan a)',
      symbols: 'a lead or return angle against the axis of the peg, mu friction',
      validity: 'Below the self-locking angle atan(1/mu); friction is a band',
      source: source.WEDGE,
    },
    {
      name: 'Squeeze to release',
      formula: 'P = (dh - d) E t/(√q (3.04 + 0.4 q + 0.0065/q)), folds first above π² E t³/(3 b)',
      symbols: 'P squeeze from edge to edge over a patch as wide as the eye',
      validity: 'd/b from 0.2 to 0.7; the eye must not close on the neck first',
      source: source.SQUEEZE,
    },
    {
      name: 'Half turn',
      formula: 'L = 2 π (D + (b + t)/2)/1.512; edges (tau b)²/12, faces sheared tau t, tau up to 2.9 π/L',
      symbols: 'tau twist per length, bend up to 1.65 · 2 π/L',
      validity: 'Strip narrower than 0.12 of the loop; a wider one folds',
      source: source.HALF_TURN,
    },
    {
      name: 'Strip and peg under load',
      formula: 'F = E eps (b - d) t; at the edge of the eye less by 2 + (1 - d/b)³',
      symbols:
        'eps allowable strain; the peg by bending, shear and fillet, with the strain allowed across layers',
      validity: 'Short-time pull on the closed strap',
      source: source.NET_SECTION,
    },
  ],
  printing: [
    'Lay the strip flat with the peg up: the strands then lie in the plane that bends and stretches.',
    'Print slowly and solid; let two outlines run round every eye.',
    'A return angle of 45 degrees needs no support under the head.',
    'Holes come out small: measure an eye and correct the head, a tenth of a millimetre decides how hard it closes.',
    'Dry soft plastics before printing: bubbles in the webs beside the eyes are where they tear.',
  ],
  cautions: [
    'Not for lifting, climbing, life support, child safety or any load that can hurt someone if it lets go.',
    'Batteries and spinning parts need a second retention besides the strap.',
    'Do not strap warm battery packs tight: they swell.',
    'Figures are estimates for a first print: prove them by test. Local codes and licensed practice come first.',
  ],
};

export default guide;
