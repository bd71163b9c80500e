import { Engine } from './engine.entity'
import { Membership } from './membership.entity'
import { Revision } from './revision.entity'
import { Scenario } from './scenario.entity'
import { Session } from './session.entity'
import { Shop } from './shop.entity'
import { SignInLimit } from './sign-in-limit.entity'
import { User } from './user.entity'

export { Engine, Membership, Revision, Scenario, Session, Shop, SignInLimit, User }

/** Every entity, listed by hand: the bundler cannot look into folders. */
export const entities = [User, Shop, Membership, Session, SignInLimit, Engine, Scenario, Revision]
