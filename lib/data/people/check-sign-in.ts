import 'server-only'
import { Membership, User } from '@/entities/index'
import { clearSignIn, countSignIn } from '@/lib/auth/limits'
import { isPassword } from '@/lib/auth/passwords'
import type { Role } from '@/lib/auth/roles'
import { AppError } from '@/lib/errors'
import type { SignInInput } from '@/lib/schemas/people'
import { newEm } from '../support/orm'

/** Whose address and password these are, with the shop joined first. An unknown address and a wrong password answer alike. */
export async function checkSignIn(input: SignInInput, address: string): Promise<{ userId: string, shopId: string, role: Role }> {
  await countSignIn(input.email, address)
  const em = await newEm()
  const user = await em.findOne(User, { email: input.email })
  if (!(await isPassword(user?.passwordHash ?? null, input.password)) || !user) throw new AppError('wrongSignIn')
  await clearSignIn(input.email, address)
  const membership = await em.findOne(Membership, { user: user.id }, { orderBy: { createdAt: 'asc', id: 'asc' } })
  if (!membership) throw new AppError('noShop')
  return { userId: user.id, shopId: membership.shop.id, role: membership.role }
}
