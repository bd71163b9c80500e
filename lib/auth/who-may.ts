import { can, type Action } from './permissions'
import { roles, type Role } from './roles'

/** The roles that may do this, or one of these. */
export const rolesThatMay = (...anyOf: [Action, ...Action[]]): Role[] =>
  roles.filter((role) => anyOf.some((action) => can({ role }, action)))
