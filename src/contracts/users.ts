import * as z from 'zod';
import { ROLES } from '../domain/access/policy';
import { idParams, instant, listOf, requiredText } from './common';
import { contract } from './contract';
import { email, newPassword, sessionReply } from './session';

export const user = z.object({
  id: z.int(),
  name: z.string(),
  email: z.string(),
  role: z.enum(ROLES),
  state: z.enum(['invited', 'active', 'disabled']),
  lastSeenAt: instant.nullable(),
  invitationExpiresAt: instant.nullable(),
});
export type User = z.infer<typeof user>;

export const listUsers = contract({
  method: 'GET',
  path: '/api/users',
  access: 'user.manage',
  summary: 'Everyone who may sign in, and those invited',
  reply: listOf(user),
});

/** The address that lets an invited person choose a password; shown to the administrator, to hand over. */
const invitation = z.object({ user, token: z.string(), expiresAt: instant });

export const inviteUser = contract({
  method: 'POST',
  path: '/api/users',
  access: 'user.manage',
  summary: 'Invite a person',
  body: z.object({ name: requiredText(120), email, role: z.enum(ROLES) }),
  reply: invitation,
  status: 201,
  problems: ['already-exists'],
});

export const renewInvitation = contract({
  method: 'POST',
  path: '/api/users/:id/invitation',
  access: 'user.manage',
  summary: 'Make a new invitation address; the old one stops working',
  params: idParams,
  reply: invitation,
  problems: ['not-allowed-now'],
});

/** Disabling signs the person out everywhere. The last active administrator cannot be disabled or demoted. */
export const updateUser = contract({
  method: 'PATCH',
  path: '/api/users/:id',
  access: 'user.manage',
  summary: 'Change a person’s role, or disable or enable them',
  params: idParams,
  body: z.object({ role: z.enum(ROLES).optional(), disabled: z.boolean().optional() }),
  reply: user,
  problems: ['not-allowed-now'],
});

const tokenParams = z.object({ token: z.string().regex(/^[A-Za-z0-9_-]{20,100}$/, 'This is not an invitation.') });

export const getInvitation = contract({
  method: 'GET',
  path: '/api/invitations/:token',
  access: 'public',
  summary: 'Whom an invitation is for',
  params: tokenParams,
  reply: z.object({ name: z.string(), email: z.string(), role: z.enum(ROLES), practiceName: z.string() }),
});

export const acceptInvitation = contract({
  method: 'POST',
  path: '/api/invitations/:token',
  access: 'public',
  summary: 'Accept an invitation by choosing a password',
  params: tokenParams,
  body: z.object({ password: newPassword }),
  reply: sessionReply,
  problems: ['too-many-attempts'],
});
