import { z } from 'zod';
import { idSchema, lineSchema, momentSchema, versionSchema } from './common.js';

export const roles = ['referrer', 'specialist', 'chair', 'liaison', 'administrator'] as const;
export const roleSchema = z.enum(roles);
export type Role = z.infer<typeof roleSchema>;

export const emailSchema = z
  .string({ error: 'must be an e-mail address' })
  .trim()
  .toLowerCase()
  .max(254, 'must have at most 254 characters')
  .pipe(z.email({ error: 'must be an e-mail address' }));

/** At least 12 characters, as NIST SP 800-63B asks for no composition rules but length. */
export const newPasswordSchema = z
  .string({ error: 'must be a password' })
  .min(12, 'must have at least 12 characters')
  .max(200, 'must have at most 200 characters');

export const signInSchema = z
  .object({
    email: z
      .string({ error: 'must be an e-mail address' })
      .trim()
      .toLowerCase()
      .min(1, 'must not be empty')
      .max(254),
    password: z.string({ error: 'must be a password' }).min(1, 'must not be empty').max(200),
    code: z.string().max(20).optional(),
  })
  .meta({ id: 'SignIn' });
export type SignIn = z.infer<typeof signInSchema>;

export const centreSchema = z
  .object({ id: idSchema, code: z.string(), name: z.string() })
  .meta({ id: 'Centre' });
export type Centre = z.infer<typeof centreSchema>;
export const centreListSchema = z.object({ items: z.array(centreSchema) }).meta({ id: 'CentreList' });
export const newCentreSchema = z
  .object({ code: lineSchema(12), name: lineSchema(120) })
  .meta({ id: 'NewCentre' });

export const meSchema = z
  .object({
    id: idSchema,
    email: z.string(),
    name: z.string(),
    specialty: z.string(),
    centre: z.string(),
    roles: z.array(roleSchema),
    /** The time zone that dates are shown in. */
    timeZone: z.string(),
    demo: z.boolean(),
  })
  .meta({ id: 'Me' });
export type Me = z.infer<typeof meSchema>;

export const changePasswordSchema = z
  .object({
    currentPassword: z.string().min(1, 'must not be empty').max(200),
    newPassword: newPasswordSchema,
  })
  .meta({ id: 'ChangePassword' });

/** A person in the list. `email`, `active` and `invited` are there for administrators alone. */
export const personSchema = z
  .object({
    id: idSchema,
    version: versionSchema,
    name: z.string(),
    specialty: z.string(),
    centre: centreSchema,
    roles: z.array(roleSchema),
    email: z.string().optional(),
    active: z.boolean().optional(),
    /** Invited and not yet signed in for the first time. */
    invited: z.boolean().optional(),
    lastSeenAt: momentSchema.nullable().optional(),
  })
  .meta({ id: 'Person' });
export type Person = z.infer<typeof personSchema>;
export const personListSchema = z.object({ items: z.array(personSchema) }).meta({ id: 'PersonList' });
export const personQuerySchema = z.object({ role: roleSchema.optional(), q: z.string().max(100).optional() });

export const invitePersonSchema = z
  .object({
    email: emailSchema,
    name: lineSchema(120),
    specialty: lineSchema(120),
    centreId: idSchema,
    roles: z.array(roleSchema).min(1, 'must name at least one role'),
  })
  .meta({ id: 'InvitePerson' });
export type InvitePerson = z.infer<typeof invitePersonSchema>;

export const changePersonSchema = z
  .object({
    version: versionSchema,
    name: lineSchema(120).optional(),
    specialty: lineSchema(120).optional(),
    centreId: idSchema.optional(),
    roles: z.array(roleSchema).min(1, 'must name at least one role').optional(),
    active: z.boolean().optional(),
  })
  .meta({ id: 'ChangePerson' });
export type ChangePerson = z.infer<typeof changePersonSchema>;
export const personParamsSchema = z.object({ personId: idSchema });

/** An invitation as its single-use link shows it before a password is set. */
export const invitationSchema = z
  .object({ name: z.string(), email: z.string(), expiresAt: momentSchema })
  .meta({ id: 'Invitation' });
export const invitationParamsSchema = z.object({ token: z.string().min(1).max(200) });
export const acceptInvitationSchema = z
  .object({ password: newPasswordSchema })
  .meta({ id: 'AcceptInvitation' });
