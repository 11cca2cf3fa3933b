/** What members write, in the order it is dealt out. */
export const PRINTING_NOTES: readonly string[] = [
  'Laid flat, so that the layers run along what bends. Four walls fill it at this size.',
  'First layer slow, no brim needed. Cut the elephant’s foot off before you try the fit.',
  'Dry the spool overnight. Ours had been open for a month and the first one broke across the layers.',
  'Printed as it lies on the bed, no supports. Let the bed cool before you lift it off.',
  'Slow outer walls, fan low. The bending part wants well-joined layers more than a fine surface.',
  'Two at once are no slower than one, and the layers have time to cool.',
];

export const WORKED: readonly string[] = [
  'Went in at the first try and holds. Opened it thirty times at the field day.',
  'Fits. I took the clearance up by a tenth, my printer runs fat.',
  'A season on the water and no whitening at the root.',
  'Good feel, closes with a click. Printed two spares.',
  '',
  'Held through the capsize at the spring regatta.',
];

export const FAILED: readonly string[] = [
  'Came off the bed with the layers standing up, snapped at the first bend. My fault, the notes say lay it flat.',
  'Too loose on my printer, the hole came out wide. The fit coupon told me so afterwards.',
  'Went soft on the rear shelf of the car in July. I would take another plastic.',
];

export const PRINTERS: readonly string[] = [
  'bench printer one, 0.4 mm nozzle',
  'the enclosed bench printer',
  'own printer, open frame, 0.4 mm nozzle',
  'bench printer three, 0.6 mm nozzle',
];

export const SENT_BACK =
  'Please say which way up it was printed, and show the catch closed in a photo. The check is fine.';
export const PUBLISHED = 'Checked again, closes and opens as it says.';
