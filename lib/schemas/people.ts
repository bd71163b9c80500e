import { z } from 'zod'
import { roleNames } from '../words/roles'

// Longest address RFC 5321 lets through, characters.
const emailMax = 254
const nameMax = 80
const passwordMin = 10
const passwordMax = 200

const email = z.string({ error: 'Type your e-mail address.' }).trim().toLowerCase()
  .min(1, 'Type your e-mail address.')
  .max(emailMax, `An e-mail address has at most ${emailMax} characters.`)
  .pipe(z.email('This is not an e-mail address. It looks like name@example.org.'))

const named = (missing: string, what: string) => z.string({ error: missing }).trim()
  .min(1, missing)
  .max(nameMax, `${what} has at most ${nameMax} characters.`)
  .refine((text) => !/\p{Cc}/u.test(text), `${what} cannot hold control characters.`)

const passwordRange = `A password has ${passwordMin} to ${passwordMax} characters.`

export const signUpInput = z.object({
  name: named('Type your name.', 'A name'),
  email,
  password: z.string({ error: passwordRange }).min(passwordMin, passwordRange).max(passwordMax, passwordRange),
  shopName: named('Type the name of your shop.', 'The name of a shop'),
  next: z.string().optional(),
})
export type SignUpInput = z.output<typeof signUpInput>

/** No least length here: it would tell which passwords need no trying. The most is what may be hashed. */
export const signInInput = z.object({
  email,
  password: z.string({ error: 'Type your password.' }).min(1, 'Type your password.').max(passwordMax, passwordRange),
  next: z.string().optional(),
})
export type SignInInput = z.output<typeof signInInput>

export const unitSystem = z.enum(['metric', 'us'], 'Choose metric or US units.')

const role = z.enum(Object.keys(roleNames) as [keyof typeof roleNames, ...(keyof typeof roleNames)[]])

/** The person's own data, as it may leave the server. */
export const meDto = z.object({
  name: z.string(),
  email: z.string(),
  unitSystem,
  role,
  shop: z.object({ id: z.string(), name: z.string() }),
  shops: z.array(z.object({ id: z.string(), name: z.string(), role })),
})
export type MeDto = z.output<typeof meDto>
