import { signInAction } from '@/app/(account)/sign-in/actions';
import type { Connection } from '@/db/client';
import { outbox } from '@/db/schema/mail';
import { DEMO_PASSWORD, seedDemoMembers } from '@/db/seed/demo-members';
import { Browser } from './browser';
import { seededDatabase } from './database';

export { DEMO_PASSWORD };

/** The demo club in a database of its own. */
export async function demoClub(): Promise<Connection> {
  const db = seededDatabase();
  await seedDemoMembers(db);
  return db;
}

/** The first name of a demo member as their address. */
export const addressOf = (name: string): string => `${name}@millrace.example`;

export async function signedIn(name: string, password = DEMO_PASSWORD): Promise<Browser> {
  const browser = new Browser();
  const answer = await browser.submit(signInAction, { email: addressOf(name), password });
  if (answer.goesTo === undefined) throw new Error(`${name} was not let in`);
  return browser;
}

/** The link in the newest waiting mail to an address. */
export function linkTo(db: Connection, email: string): URL {
  const mails = db
    .select()
    .from(outbox)
    .all()
    .filter(({ recipient }) => recipient === email);
  const found = /https?:\/\/\S+token=[\w-]+/.exec(mails.at(-1)?.text ?? '');
  if (!found) throw new Error(`No link was mailed to ${email}`);
  return new URL(found[0]);
}

export const tokenTo = (db: Connection, email: string): string =>
  linkTo(db, email).searchParams.get('token')!;
