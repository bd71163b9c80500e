import { defineEntity, p, type InferEntity } from '@mikro-orm/core'

/** A person. One account whatever the number of shops; the address is kept in lower case. */
export const User = defineEntity({
  name: 'User',
  tableName: 'users',
  properties: {
    id: p.uuid().primary().defaultRaw('gen_random_uuid()'),
    email: p.string().length(254).unique(),
    name: p.string().length(80),
    passwordHash: p.text().hidden(),
    unitSystem: p.enum(['metric', 'us']).$type<'metric' | 'us'>().default('metric'),
    createdAt: p.datetime().onCreate(() => new Date()).defaultRaw('now()'),
  },
  checks: [{ name: 'users_email_lower', expression: 'email = lower(email)' }],
})
export type User = InferEntity<typeof User>
