import * as z from 'zod';

export const ROLES = ['owner', 'designer', 'maker', 'client'] as const;
export const roleSchema = z.enum(ROLES);
export type Role = z.infer<typeof roleSchema>;

export const signInSchema = z.strictObject({
  email: z.email({ error: 'must be an e-mail address' }).max(254, 'must be at most 254 characters'),
  password: z
    .string({ error: 'must be text' })
    .min(1, 'must not be empty')
    .max(200, 'must be at most 200 characters'),
});
export type SignIn = z.infer<typeof signInSchema>;

/** Who is signed in. In a small workshop one person wears several hats: rights are those of all roles together. */
export const personSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  roles: z.array(roleSchema),
  workshop: z.object({ id: z.uuid(), name: z.string() }),
});
export type Person = z.infer<typeof personSchema>;

export const sessionSchema = z.object({ person: personSchema.nullable() });
export type Session = z.infer<typeof sessionSchema>;
