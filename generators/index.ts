import type { About, Family, Guide } from './contract';

/** What the list knows of a family before it is loaded. */
export interface FamilyEntry {
  readonly about: About;
  readonly load: () => Promise<Family>;
  readonly loadGuide: () => Promise<Guide>;
}

/** The families, in the order they are offered. A new family is a folder and a line here. */
export const FAMILIES: readonly FamilyEntry[] = [];

export const familyEntry = (id: string): FamilyEntry | undefined =>
  FAMILIES.find((entry) => entry.about.id === id);
