import * as z from 'zod';
import { ROLES } from '../domain/access/policy';
import { requiredText } from './common';
import { contract } from './contract';

export const email = z
  .string()
  .trim()
  .max(254, 'Keep it to 254 characters.')
  .pipe(z.email('Use an e-mail address such as name@example.org.'))
  .transform((text) => text.toLowerCase());

/** Long rather than complicated; 8 to 200 characters. */
export const newPassword = z
  .string()
  .min(12, 'Use at least 12 characters; a few words will do.')
  .max(200, 'Keep it to 200 characters.');

export const person = z.object({ id: z.int(), name: z.string(), email: z.string(), role: z.enum(ROLES) });
export type Person = z.infer<typeof person>;

export const sessionReply = z.object({
  /** Nobody: null. */
  user: person.nullable(),
  /** True until the first administrator is named. */
  needsSetup: z.boolean(),
  /** True in the demo practice: the sign-in page then names the demo accounts. */
  demo: z.boolean(),
  practiceName: z.string(),
});
export type Session = z.infer<typeof sessionReply>;

export const getSession = contract({
  method: 'GET',
  path: '/api/session',
  access: 'public',
  summary: 'Who is signed in',
  reply: sessionReply,
});

export const signIn = contract({
  method: 'POST',
  path: '/api/session',
  access: 'public',
  summary: 'Sign in',
  body: z.object({ email, password: z.string().min(1, 'This is needed.').max(200, 'Keep it to 200 characters.') }),
  reply: sessionReply,
  problems: ['wrong-credentials', 'too-many-attempts'],
});

export const signOut = contract({
  method: 'DELETE',
  path: '/api/session',
  access: 'public',
  summary: 'Sign out',
  reply: null,
});

export const signOutEverywhere = contract({
  method: 'DELETE',
  path: '/api/sessions',
  access: 'signed-in',
  summary: 'Sign out on every device',
  reply: null,
});

export const changePassword = contract({
  method: 'PUT',
  path: '/api/session/password',
  access: 'signed-in',
  summary: 'Change one’s password; other devices are signed out',
  body: z.object({ currentPassword: z.string().min(1, 'This is needed.').max(200), newPassword }),
  reply: null,
  problems: ['too-many-attempts'],
});

/** Names the first administrator of a clean practice; refused ever after. */
export const setUpPractice = contract({
  method: 'POST',
  path: '/api/setup',
  access: 'public',
  summary: 'Name the first administrator of a clean practice',
  body: z.object({ practiceName: requiredText(120), name: requiredText(120), email, password: newPassword }),
  reply: sessionReply,
  status: 201,
  problems: ['not-allowed-now'],
});
