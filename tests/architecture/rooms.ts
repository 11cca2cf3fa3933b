/**
 * The rooms of the project and who may import whom. A room is the longest matching path prefix.
 * `types` may be imported with `import type` only. Packages are listed where only some rooms may use them.
 */
export interface Room {
  readonly path: string;
  readonly may: readonly string[];
  readonly types?: readonly string[];
}

const CORE = ['lib/units', 'lib/errors.ts'];

export const ROOMS: readonly Room[] = [
  { path: 'lib/units', may: [] },
  { path: 'lib/errors.ts', may: [] },
  { path: 'lib/env.ts', may: [] },
  { path: 'lib/materials', may: CORE },
  { path: 'lib/mechanics', may: [...CORE, 'lib/materials'] },
  { path: 'lib/geometry', may: CORE },
  { path: 'lib/fea', may: [...CORE, 'lib/materials', 'lib/mechanics', 'lib/geometry'] },
  { path: 'lib/export', may: [...CORE, 'lib/geometry', 'lib/materials'] },
  { path: 'lib/printing', may: [...CORE, 'lib/materials', 'lib/geometry'] },
  {
    path: 'generators',
    may: [...CORE, 'lib/materials', 'lib/mechanics', 'lib/geometry', 'lib/fea', 'lib/export', 'lib/printing'],
  },
  { path: 'db', may: [...CORE, 'lib/env.ts', 'lib/materials', 'generators'] },
  {
    path: 'db/seed',
    may: [...CORE, 'lib/env.ts', 'db', 'lib/materials', 'generators', 'lib/geometry', 'lib/storage'],
  },
  { path: 'lib/auth', may: [...CORE, 'lib/env.ts', 'db', 'lib/mail'] },
  { path: 'lib/mail', may: [...CORE, 'lib/env.ts', 'db'] },
  { path: 'lib/storage', may: [...CORE, 'lib/env.ts', 'db'] },
  {
    path: 'lib/jobs',
    may: [
      ...CORE,
      'lib/env.ts',
      'db',
      'generators',
      'lib/mail',
      'lib/storage',
      'lib/geometry',
      'lib/export',
      'lib/fea',
      'lib/materials',
    ],
  },
  {
    path: 'lib/access',
    may: [
      ...CORE,
      'lib/env.ts',
      'db',
      'generators',
      'lib/auth',
      'lib/jobs',
      'lib/mail',
      'lib/storage',
      'lib/materials',
      'lib/geometry',
      'lib/export',
      'lib/printing',
      'lib/fea',
    ],
  },
  {
    path: 'lib/http',
    may: [...CORE, 'lib/env.ts', 'lib/auth', 'lib/access', 'lib/materials', 'generators', 'db'],
  },
  { path: 'lib/forms', may: [...CORE, 'lib/auth', 'lib/access', 'lib/http'] },
  {
    path: 'components/viewport',
    may: [...CORE, 'generators', 'lib/geometry', 'lib/materials', 'lib/fea', 'components/ui'],
  },
  { path: 'components/ui', may: CORE },
  // the record of the finite elements, written by a script and read by the guide
  { path: 'public/verification', may: [] },
  {
    path: 'components',
    may: [
      ...CORE,
      'generators',
      'components/ui',
      'components/viewport',
      'lib/materials',
      'lib/geometry',
      'lib/export',
      'lib/printing',
      'lib/fea',
      'lib/mechanics',
      'public/verification',
    ],
    types: ['lib/access', 'lib/forms'],
  },
  {
    path: 'app',
    may: [
      ...CORE,
      'components',
      'components/ui',
      'components/viewport',
      'generators',
      'lib/access',
      'lib/auth',
      'lib/http',
      'lib/forms',
      'lib/jobs',
      'lib/mail',
      'lib/storage',
      'lib/materials',
      'lib/geometry',
      'lib/export',
      'lib/printing',
      'lib/fea',
      'lib/mechanics',
    ],
  },
  {
    path: 'lib/scripts',
    may: ['db', 'lib/env.ts', 'lib/auth', 'lib/mail', 'lib/jobs', 'generators', 'lib/materials'],
  },
];

/** Packages that only the named rooms may import. */
export const PACKAGE_ROOMS: Readonly<Record<string, readonly string[]>> = {
  three: ['components/viewport'],
  '@react-three/fiber': ['components/viewport'],
  '@react-three/drei': ['components/viewport'],
  'manifold-3d': ['lib/geometry'],
  '@jscad/modeling': ['lib/geometry'],
  'better-sqlite3': ['db'],
  'drizzle-orm': ['db', 'lib/auth', 'lib/access', 'lib/jobs', 'lib/mail', 'lib/storage'],
  lucia: ['lib/auth'],
  '@node-rs/argon2': ['lib/auth', 'db'],
  nodemailer: ['lib/mail'],
  sharp: ['lib/storage', 'lib/jobs', 'db'],
};
