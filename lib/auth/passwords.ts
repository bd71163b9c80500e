import 'server-only'
import { hash, verify } from '@node-rs/argon2'

// argon2id (the package's default): memory in KiB, passes, lanes. About 0.1 s on one core, 32 MiB while it runs.
const cost = { memoryCost: 32_768, timeCost: 3, parallelism: 1, outputLen: 32 }

/** The hash of random bytes that nobody kept, made with the cost above: it matches no password and takes as long to refuse. */
export const nobodysHash = '$argon2id$v=19$m=32768,t=3,p=1$PfQTlzMHH9OL2oiaJGW/Pw$uSIl1nytZmN+waBo1e/PaOsBvitDId4/F9u/ASIaVYI'

// The same letters can be typed as different code points (é as one or as two); NFKC makes them one password.
const normal = (password: string) => password.normalize('NFKC')

export const hashPassword = (password: string): Promise<string> => hash(normal(password), cost)

/** One verification whether the person exists or not, so that the answer takes the same time. */
export async function isPassword(passwordHash: string | null, password: string): Promise<boolean> {
  const matches = await verify(passwordHash ?? nobodysHash, normal(password))
  return matches && passwordHash !== null
}
