import type { Role } from './roles'

/** The person a request acts for, in the shop it acts in. The role is the one of that shop. */
export type Actor = {
  userId: string
  name: string
  email: string
  unitSystem: 'metric' | 'us'
  shop: { id: string, name: string }
  role: Role
}
