import 'server-only'
import { createHash } from 'node:crypto'
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible'
import { AppError } from '@/lib/errors'
import { authPool } from './pool'

/** Attempts allowed (count) within a window (s). Counted in PostgreSQL: a restart or a second process forgets nothing. */
export const limits = {
  signInPerAccount: { points: 10, duration: 15 * 60 },
  signInPerAddress: { points: 50, duration: 15 * 60 },
  signUpPerAddress: { points: 30, duration: 60 * 60 },
} as const

const limiter = (keyPrefix: keyof typeof limits) =>
  new RateLimiterPostgres({
    storeClient: authPool, storeType: 'pool', tableName: 'sign_in_limits', tableCreated: true, keyPrefix, ...limits[keyPrefix],
  })
const perAccount = limiter('signInPerAccount')
const perAddress = limiter('signInPerAddress')
const signUps = limiter('signUpPerAddress')

// The key holds a digest: the table keeps no list of addresses somebody tried.
const accountKey = (email: string) => createHash('sha256').update(email).digest('hex')

async function count(counter: RateLimiterPostgres, key: string): Promise<void> {
  try {
    await counter.consume(key)
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal
    throw new AppError('tooMany', { waitSeconds: Math.max(1, Math.ceil(refusal.msBeforeNext / 1000)) })
  }
}

/**
 * Counts an attempt before the password is looked at, so that many at once cannot slip past. The account is counted by the
 * typed e-mail address whether it exists or not: the refusal tells nothing.
 */
export async function countSignIn(email: string, address: string): Promise<void> {
  await count(perAddress, address)
  await count(perAccount, accountKey(email))
}

/** A right password clears the account's count and gives the address its attempt back. */
export async function clearSignIn(email: string, address: string): Promise<void> {
  await Promise.all([perAccount.delete(accountKey(email)), perAddress.reward(address)])
}

export const countSignUp = (address: string): Promise<void> => count(signUps, address)
