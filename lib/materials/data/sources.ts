import type { Mark, Source } from '../types';

const source = (text: string, mark: Mark): Source => ({ text, mark });

const GUIDE = 'Snap-Fit Joints for Plastics - A Design Guide';
const COMPILATION = 'Covestro, BASF and DuPont design tables in one compilation';

/** The same publication, with what it says on this figure. */
export const detail = (from: Source, text: string): Source => source(`${from.text}: ${text}`, from.mark);

export const PRINTED_SHEET = source(
  "Filament maker's ISO 527 / 178 / 75 data sheet for printed specimens, 100 % infill",
  'quoted',
);
export const PRINTED_GUIDE = source(
  'Printed-part guide after Snap-Fit Joints for Plastics - A Design Guide, a third of the yield strain',
  'quoted',
);
export const RESIN_TABLES = source(`${COMPILATION}, permissible strain`, 'quoted');
export const GUIDE_STRAIN = source(`${GUIDE}, Table 2, permissible strain`, 'quoted');
export const GUIDE_OFTEN = source(`${GUIDE}, frequent separation at 60 % of the single value`, 'computed');
export const GUIDE_FRICTION = source(
  `${GUIDE}, plastic on steel times the factor for the plastic on itself`,
  'computed',
);
export const FLEXURE_NOTES = source('Notes on flexure materials, creep and heat resistance', 'quoted');
export const OPEN_TABLES = source('Open filament material tables', 'verified');
export const DRYING_TABLES = source('Drying tables of filament suppliers', 'verified');
export const EXPANSION_LISTS = source('Published lists of thermal expansion of plastics', 'verified');
export const MOULDING_SHRINKAGE = source('Moulding shrinkage lists', 'verified');
export const PRINTED_SHRINKAGE = source('Shrinkage lists for printed plastics', 'quoted');
export const FOLDING_STUDY = source(
  'Balderrama-Armendariz et al., Int J Adv Manuf Technol 2019, folding endurance of printed hinges',
  'verified',
);
export const HINGE_NOTES = source('Penn State plastics design notes, living hinges', 'verified');
export const PP_PRINTING = source('ORNL, MRS Communications 13 (2023) 169-176', 'verified');
export const BEAM_BOOKS = source('Handbooks of plastics', 'memory');
export const PP_SHEETS = source('Filament data sheets for polypropylene', 'memory');
export const PRACTICE = source('Trade practice', 'common-practice');
