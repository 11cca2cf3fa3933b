import type { Mark } from '@/lib/materials/types';

export interface Passage {
  readonly head: string;
  readonly text: string;
}

export const FIGURES: readonly Passage[] = [
  {
    head: 'Strain',
    text: 'How far the plastic is stretched or squeezed at its worst place, in percent of its length. A part breaks by strain long before it breaks by force, so strain is what the limit stands on.',
  },
  {
    head: 'Handbook, corrected, computed',
    text: 'The handbook figure is the plain formula as the design guides print it. The corrected one adds what that formula leaves out: a root that turns, fillets, shear, large deflection. The two differ by 20 to 60 % where parts are short or thick. Where a part bends as a flat outline, a third figure is computed by finite elements a moment later and carries the verdict; elsewhere the corrected one does. The page marks which.',
  },
  {
    head: 'Allowed strain',
    text: 'The short-term limit of the plastic, times a factor for how often the part is opened, one for how the layers run, one for how warm it gets. Each factor is shown with where it comes from.',
  },
  {
    head: 'Verdicts',
    text: 'Within limit; close to limit, over 85 % of what is allowed; over limit; not known. Not known is an answer: where a figure is missing or a formula would be stretched past its range, no guess stands in for it.',
  },
  {
    head: 'Bands',
    text: 'Forces depend on friction, which is known to half of its value at best. The figure is the middle, the band beside it is what to expect.',
  },
  {
    head: 'Colours on the part',
    text: 'Darker is more strain, always. Warm colours are pulled, blue hatched ones are squeezed; past the allowed strain red hatching begins. The scale stands beside the part.',
  },
];

export const KEEPING: readonly Passage[] = [
  {
    head: 'Without an account',
    text: 'Nothing of yours is stored on the server. Your work stays in this browser and in the link; the library is open to read, to print and to start from.',
  },
  {
    head: 'Kept designs',
    text: 'Signed in, a design is saved as you change it. A run of changes is one state of its history; any state can be compared and restored. Deleted designs can be brought back for 30 days.',
  },
  {
    head: 'The club library',
    text: 'A design handed in is checked by a librarian. A published version is never changed, only followed by another, so that what somebody printed stays what it was. It stays under its author’s name when the author leaves.',
  },
  {
    head: 'Reports',
    text: 'Worked or not, with printer, plastic and a note: once from a member for a version. They tell of that print on that printer, and prove nothing for yours.',
  },
  {
    head: 'Photos',
    text: 'Photos are made smaller and written afresh. Place, camera and everything else beside the picture is dropped.',
  },
];

export const MARKS: readonly { readonly mark: Mark; readonly text: string }[] = [
  { mark: 'verified', text: 'We have read the value or formula in the publication that is named.' },
  { mark: 'computed', text: 'The formula is published; the number was worked out here from it.' },
  { mark: 'derived', text: 'Worked out here, and compared with finite elements before it was used.' },
  { mark: 'quoted', text: 'Read in a text that quotes the publication, not in the publication.' },
  {
    mark: 'memory',
    text: 'Remembered from a book or standard that was not at hand. Look it up before you rely on it.',
  },
  { mark: 'common-practice', text: 'What people who print do, without a publication behind it.' },
  { mark: 'given', text: 'Entered by you. It is used as it stands.' },
];

export const CAUTIONS: readonly string[] = [
  'Not for lifting, climbing, life support, child safety or any load that can hurt someone if it lets go.',
  'Food contact and drinking water depend on the exact resin, additives, nozzle and local rules. A plastic by name is not enough.',
  'Batteries and spinning parts need a second retention besides the printed one.',
  'Ventilate while printing; some plastics give off fumes that do harm.',
  'Numbers are estimates for a first print. Prove them by test, in the plastic and on the printer that will make the part.',
  'Local codes and licensed practice come first.',
];

export const FONTS: readonly Passage[] = [
  { head: 'Bricolage Grotesque', text: 'Copyright 2022 The Bricolage Grotesque Project Authors' },
  { head: 'Instrument Sans', text: 'Copyright 2022 The Instrument Sans Project Authors' },
  { head: 'Spline Sans Mono', text: 'Copyright 2022 The Spline Sans Mono Project Authors' },
];
