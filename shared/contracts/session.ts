/** Who is signed in, to which shop. */
import * as z from 'zod';

export const ROLES = ['designer', 'technician', 'supervisor', 'administrator'] as const;
export const roleSchema = z.enum(ROLES);
export type Role = z.infer<typeof roleSchema>;

export const personSchema = z.object({
  id: z.string(),
  email: z.string(),
  name: z.string(),
  roles: z.array(roleSchema),
});
export type Person = z.infer<typeof personSchema>;

export const shopSchema = z.object({
  name: z.string(),
  /** A demo shop says so on its sign-in page, with its demo people. */
  demo: z.boolean(),
  demoSignIns: z.array(z.object({ email: z.string(), roles: z.array(roleSchema) })).optional(),
  demoPassword: z.string().optional(),
});

export const sessionSchema = z.object({
  person: personSchema.nullable(),
  shop: shopSchema,
  /** Sent back in the `X-CSRF-Token` header of every changing request. */
  csrfToken: z.string(),
  version: z.string(),
});
export type Session = z.infer<typeof sessionSchema>;

export const signInSchema = z.strictObject({
  email: z.string().trim().min(1, 'Enter your e-mail address.').max(254, 'That is too long for an e-mail address.'),
  password: z.string().min(1, 'Enter your password.').max(1000, 'That is too long for a password.'),
});
export type SignIn = z.infer<typeof signInSchema>;
