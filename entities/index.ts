import { Membership } from './membership.entity'
import { Session } from './session.entity'
import { Shop } from './shop.entity'
import { SignInLimit } from './sign-in-limit.entity'
import { User } from './user.entity'

export { Membership, Session, Shop, SignInLimit, User }

/** Every entity, listed by hand: the bundler cannot look into folders. */
export const entities = [User, Shop, Membership, Session, SignInLimit]
