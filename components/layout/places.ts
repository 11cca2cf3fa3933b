export interface Place {
  readonly href: string;
  readonly name: string;
}

/** Where the header leads. A place is listed once its page exists. */
export const PLACES: readonly Place[] = [
  { href: '/design', name: 'Design' },
  { href: '/designs', name: 'My designs' },
  { href: '/library', name: 'Club library' },
  { href: '/materials', name: 'Materials' },
  { href: '/guide', name: 'Guide' },
];
