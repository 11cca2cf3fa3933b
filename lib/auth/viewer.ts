import 'server-only';
import type { Role } from '@/db/schema/members';

export type { Role };

/** Whoever asks: null is a visitor. A suspended member has no session and so is a visitor too. */
export type Viewer = {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly emailVerified: boolean;
  readonly roles: readonly Role[];
} | null;

export type Member = NonNullable<Viewer>;
