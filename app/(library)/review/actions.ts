'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { VERDICT_WORDS } from '@/generators/report';
import { checkAgain, decide, retire } from '@/lib/access/review';
import { formAction } from '@/lib/forms/form';

const id = z.string().max(60);
const note = z.string().trim().max(600, 'At most 600 characters');

export const againAction = formAction({
  schema: z.object({ id }),
  async run(given, { viewer }) {
    const { verdict, sameVerdict, sameSize } = await checkAgain(viewer, given.id);
    const now = `Checked and built again: ${VERDICT_WORDS[verdict]}`;
    const then = sameVerdict ? 'as handed in' : 'not as when it was handed in';
    return `${now}, ${then}; the shape has ${sameSize ? 'the same' : 'another'} size.`;
  },
});

export const publishAction = formAction({
  schema: z.object({ id, note }),
  async run(given, { viewer }) {
    decide(viewer, given.id, 'publish', given.note);
    revalidatePath('/library');
    redirect('/review');
  },
});

export const sendBackAction = formAction({
  schema: z.object({ id, note: note.min(1, 'Say what is missing') }),
  async run(given, { viewer }) {
    decide(viewer, given.id, 'send-back', given.note);
    redirect('/review');
  },
});

export const retireAction = formAction({
  schema: z.object({ slug: z.string().max(80), note: note.min(1, 'Say why') }),
  async run(given, { viewer }) {
    retire(viewer, given.slug, given.note);
    revalidatePath('/library');
    redirect('/review?state=retired');
  },
});
