import type { SecantModel } from '../types';

const LINE = 'Es = E (1 - 12 eps) up to 4 %';
const CALIBRATION =
  'calibrated on the polycarbonate of Snap-Fit Joints for Plastics - A Design Guide, 1815 MPa at 2 %';

/** Polycarbonate, the plastic the line was calibrated on. */
export const CALIBRATED: SecantModel = {
  kind: 'softening',
  slope: 12,
  validTo: 0.04,
  assumed: false,
  source: { text: `${LINE}, ${CALIBRATION}`, mark: 'derived' },
};

/** The polycarbonate line borrowed for another plastic. */
export const ASSUMED: SecantModel = {
  ...CALIBRATED,
  assumed: true,
  source: {
    text: `Assumption: ${LINE}, ${CALIBRATION}; no curve of this plastic was found`,
    mark: 'derived',
  },
};

/** TPU 95A: a straight fall from 33.6 MPa at first to 11.1 MPa (11.1 MPa stress at 100 % strain). */
export const TPU_TWO_POINTS: SecantModel = {
  kind: 'softening',
  slope: 1 - 11.1 / 33.6,
  validTo: 1,
  assumed: true,
  source: {
    text: 'Assumption: the secant modulus falls in a straight line from 33.6 MPa to the 11.1 MPa of the stress at 100 % strain on the data sheet; the true curve falls faster at first',
    mark: 'derived',
  },
};
