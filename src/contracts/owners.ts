import * as z from 'zod';
import { listOf, requiredText, text } from './common';
import { contract } from './contract';
import { email } from './session';

/** A person or firm that owns sets; `userId` where they also sign in as a collector. */
export const owner = z.object({
  id: z.int(),
  name: z.string(),
  email: z.string(),
  phone: z.string(),
  userId: z.int().nullable(),
  setCount: z.int(),
});
export type Owner = z.infer<typeof owner>;

export const listOwners = contract({
  method: 'GET',
  path: '/api/owners',
  access: 'owner.list',
  summary: 'Everyone who owns a set here',
  reply: listOf(owner),
});

const emailOrNone = text(254).refine(
  (typed) => typed === '' || email.safeParse(typed).success,
  'Use an e-mail address such as name@example.org, or leave it empty.',
);

/** An owner whose e-mail address is a collector's sees their sets when signed in. */
export const addOwner = contract({
  method: 'POST',
  path: '/api/owners',
  access: 'owner.edit',
  summary: 'Add an owner',
  body: z.object({ name: requiredText(120), email: emailOrNone, phone: text(60) }),
  reply: owner,
  status: 201,
});
