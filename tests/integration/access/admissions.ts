import { database } from '@/db/client';
import { insertPreset, insertVersion } from '@/db/queries/presets';
import { createDesign, deleteDesign } from '@/lib/access/designs';
import type { Member } from '@/lib/access/policy';
import { decide } from '@/lib/access/review';

/** Who gets in: anyone; whoever has the role; or the member a thing belongs to, and nobody else. */
export type Admission = 'anyone' | 'member' | 'librarian' | 'admin' | 'owner';

export interface Entry {
  readonly admission: Admission;
  /** parts of the address, made anew for each call; `owner` is the member whose thing it is */
  readonly params?: (owner: Member) => Promise<Readonly<Record<string, string>>>;
  readonly body?: unknown;
  readonly fields?: Readonly<Record<string, string | readonly string[]>>;
}

const LID = { family: 'living-hinge', material: 'pp' } as const;

const design = async (owner: Member) => ({ id: (await createDesign(owner, { ...LID, name: 'Lid' })).id });
async function deletedDesign(owner: Member) {
  const { id } = await design(owner);
  deleteDesign(owner, id);
  return { id };
}
const designState = async (owner: Member) => ({ ...(await design(owner)), state: '1' });
/** A version as handed in, without the drawing and measuring of the part. */
async function handedIn(owner: Member) {
  const { family, material, use, parameters, verdict } = await createDesign(owner, { ...LID, name: 'Lid' });
  const at = new Date();
  const slug = `lid-${crypto.randomUUID()}`;
  const author = { authorId: owner.id, authorName: owner.name };
  const preset = insertPreset(database(), { slug, ...author, createdAt: at, changedAt: at });
  const words = {
    title: 'Lid',
    purpose: 'A box',
    printingNotes: '',
    tags: [],
    licence: 'CC-BY-4.0',
  } as const;
  const figures = { kind: 'hinges', strainShare: null, sizeX: 40, sizeY: 30, sizeZ: 2, mass: null } as const;
  const version = insertVersion(database(), {
    presetId: preset.id,
    ...words,
    tags: [],
    ...{ family, material, use, verdict },
    values: { ...parameters },
    ...figures,
    enclosure: null,
    startedFrom: null,
    handedInAt: at,
  });
  return { slug, versionId: version.id };
}

let waiting: ReturnType<typeof handedIn> | undefined;
let published: ReturnType<typeof handedIn> | undefined;

/** A version that waits for a librarian, the same for every call. */
async function waitingVersion(owner: Member) {
  waiting ??= handedIn(owner);
  return { id: (await waiting).versionId };
}

async function publish(owner: Member) {
  const version = await handedIn(owner);
  decide({ ...owner, id: 'demo-tomas', roles: ['librarian', 'member'] }, version.versionId, 'publish', '');
  return version;
}

/** A preset of the library, the same for every call. */
async function publishedPreset(owner: Member) {
  published ??= publish(owner);
  return { slug: (await published).slug };
}

const given = (params: Readonly<Record<string, string>>) => async () => params;

const anyone: Entry = { admission: 'anyone' };
const member: Entry = { admission: 'member' };
const admin: Entry = { admission: 'admin' };
const ownDesign: Entry = { admission: 'owner', params: design };
const hook = given({ family: 'cantilever-hook' });
const password = 'not the password';

export const PAGES: Readonly<Record<string, Entry>> = {
  '(account)/accept-invite': anyone,
  '(account)/account': member,
  '(account)/forgot-password': anyone,
  '(account)/reset-password': anyone,
  '(account)/sign-in': anyone,
  '(account)/verify-email': anyone,
  '(club)/admin': admin,
  '(club)/admin/audit': admin,
  '(club)/admin/club': admin,
  '(club)/admin/invitations': admin,
  '(club)/admin/mail': admin,
  '(club)/admin/members/[id]': { admission: 'admin', params: given({ id: 'demo-ines' }) },
  '(club)/materials': anyone,
  '(club)/materials/[id]': { admission: 'anyone', params: given({ id: 'pla' }) },
  '(library)/library': anyone,
  '(library)/library/[slug]': { admission: 'anyone', params: publishedPreset },
  '(library)/review': { admission: 'librarian' },
  '(library)/review/[id]': { admission: 'librarian', params: waitingVersion },
  '(site)': anyone,
  '(site)/about': anyone,
  '(site)/guide': anyone,
  '(site)/guide/verification': anyone,
  '(site)/guide/[family]': { admission: 'anyone', params: hook },
  '(studio)/design': anyone,
  '(studio)/design/[family]': { admission: 'anyone', params: hook },
  '(studio)/designs': member,
  '(studio)/designs/[id]': ownDesign,
  '(studio)/designs/[id]/history': ownDesign,
  '(studio)/designs/[id]/publish': ownDesign,
};

export const HANDLERS: Readonly<Record<string, Entry>> = {
  'POST (club)/admin/club/backup': admin,
  'GET (site)/guide/[family]/part.svg': { admission: 'anyone', params: hook },
  'GET api/health': anyone,
  'GET api/v1/[...rest]': anyone,
  'POST api/v1/[...rest]': anyone,
  'PUT api/v1/[...rest]': anyone,
  'PATCH api/v1/[...rest]': anyone,
  'DELETE api/v1/[...rest]': anyone,
  'POST api/v1/check': anyone,
  'GET api/v1/designs': member,
  'POST api/v1/designs': { admission: 'member', body: { ...LID, name: 'Lid' } },
  'GET api/v1/designs/[id]': ownDesign,
  'PUT api/v1/designs/[id]': { ...ownDesign, body: { ...LID, revision: 1 } },
  'PATCH api/v1/designs/[id]': { ...ownDesign, body: { name: 'Lid of the box' } },
  'DELETE api/v1/designs/[id]': ownDesign,
  'POST api/v1/designs/[id]/copy': ownDesign,
  'GET api/v1/designs/[id]/picture': ownDesign,
  'GET api/v1/designs/[id]/states': ownDesign,
  'POST api/v1/designs/[id]/states/[state]/restore': {
    admission: 'owner',
    params: designState,
    body: { revision: 1 },
  },
  'POST api/v1/designs/[id]/undelete': { admission: 'owner', params: deletedDesign },
  'GET api/v1/export': anyone,
  'POST api/v1/export': anyone,
  'GET api/v1/families': anyone,
  'GET api/v1/families/[id]': { admission: 'anyone', params: given({ id: 'cantilever-hook' }) },
  'GET api/v1/materials': anyone,
  'GET api/v1/materials/[id]': { admission: 'anyone', params: given({ id: 'pla' }) },
  'GET api/v1/openapi.json': anyone,
  'POST api/v1/photos': member,
  'GET api/v1/photos/[id]': { admission: 'anyone', params: given({ id: 'none' }) },
  'DELETE api/v1/photos/[id]': { admission: 'member', params: given({ id: 'none' }) },
  'GET api/v1/presets': anyone,
  'GET api/v1/presets/[slug]': { admission: 'anyone', params: given({ slug: 'none' }) },
  'GET api/v1/presets/[slug]/picture': { admission: 'anyone', params: given({ slug: 'none' }) },
  'PUT api/v1/presets/[slug]/favourite': { admission: 'member', params: given({ slug: 'none' }) },
  'DELETE api/v1/presets/[slug]/favourite': { admission: 'member', params: given({ slug: 'none' }) },
  'GET api/v1/review/[id]/picture': { admission: 'librarian', params: given({ id: 'none' }) },
};

export const ACTIONS: Readonly<Record<string, Entry>> = {
  '(account)/accept-invite#acceptInvitationAction': anyone,
  '(account)/account#signOutAction': anyone,
  '(account)/account#renameAction': { admission: 'member', fields: { name: 'Somebody Else' } },
  '(account)/account#changePasswordAction': {
    admission: 'member',
    fields: { password, next: 'kettle anvil heron' },
  },
  '(account)/account#changeEmailAction': {
    admission: 'member',
    fields: { password, email: 'new@millrace.example' },
  },
  '(account)/account#verifyAction': member,
  '(account)/account#endSessionAction': { admission: 'member', fields: { id: 'none' } },
  '(account)/account#endOtherSessionsAction': member,
  '(account)/account#deleteAccountAction': { admission: 'member', fields: { password } },
  '(account)/forgot-password#askResetAction': anyone,
  '(account)/reset-password#resetPasswordAction': anyone,
  '(account)/sign-in#signInAction': anyone,
  '(account)/verify-email#confirmAddressAction': anyone,
  '(club)/admin/club#changeClubAction': {
    admission: 'admin',
    fields: { name: 'Millrace Model Club', contactEmail: '' },
  },
  '(club)/admin/invitations#inviteAction': {
    admission: 'admin',
    fields: { email: 'new@millrace.example', roles: [] },
  },
  '(club)/admin/invitations#withdrawAction': { admission: 'admin', fields: { id: 'none' } },
  '(club)/admin/mail#sendAgainAction': { admission: 'admin', fields: { id: 'none' } },
  '(library)/library/[slug]#reportAction': {
    admission: 'member',
    fields: { slug: 'none', version: '1', worked: 'yes', material: 'pla', printer: 'The bench', note: '' },
  },
  '(library)/library/[slug]#startAction': { admission: 'member', fields: { slug: 'none', version: '1' } },
  '(library)/review#againAction': { admission: 'librarian', fields: { id: 'none' } },
  '(library)/review#publishAction': { admission: 'librarian', fields: { id: 'none', note: '' } },
  '(library)/review#sendBackAction': { admission: 'librarian', fields: { id: 'none', note: 'Why' } },
  '(library)/review#retireAction': { admission: 'librarian', fields: { slug: 'none', note: 'Why' } },
  '(studio)/designs/[id]/publish#handInAction': {
    admission: 'member',
    fields: {
      designId: 'none',
      title: 'Lid',
      purpose: 'A box',
      printingNotes: '',
      tags: '',
      licence: 'CC-BY-4.0',
    },
  },
  '(club)/admin/members/[id]#giveRolesAction': { admission: 'admin', fields: { id: 'none', roles: [] } },
  '(club)/admin/members/[id]#suspendAction': { admission: 'admin', fields: { id: 'none', reason: 'Why' } },
  '(club)/admin/members/[id]#restoreAction': { admission: 'admin', fields: { id: 'none' } },
};
