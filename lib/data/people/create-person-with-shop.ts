import 'server-only'
import { UniqueConstraintViolationException } from '@mikro-orm/core'
import { Membership, Shop, User } from '@/entities/index'
import { countSignUp } from '@/lib/auth/limits'
import { hashPassword } from '@/lib/auth/passwords'
import { AppError } from '@/lib/errors'
import type { SignUpInput } from '@/lib/schemas/people'
import { newEm } from '../support/orm'

/**
 * Sign-up: the person, a shop and the membership as its owner, in one transaction.
 * A registered address is said to be one. Signing up ends signed in, so an answer that hides it would have to fail for no stated
 * reason; instead attempts are counted per network address first, and the password is hashed either way, so time tells nothing more.
 */
export async function createPersonWithShop(input: SignUpInput, address: string): Promise<{ userId: string, shopId: string }> {
  await countSignUp(address)
  const passwordHash = await hashPassword(input.password)
  const em = await newEm()
  const user = em.create(User, { email: input.email, name: input.name, passwordHash })
  const shop = em.create(Shop, { name: input.shopName })
  em.create(Membership, { user, shop, role: 'owner' })
  try {
    await em.flush()
  } catch (error) {
    if (error instanceof UniqueConstraintViolationException) {
      throw new AppError('addressTaken', { fieldErrors: { email: new AppError('addressTaken').message } })
    }
    throw error
  }
  return { userId: user.id, shopId: shop.id }
}
