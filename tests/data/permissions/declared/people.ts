import { randomUUID } from 'node:crypto'
import { GET as getMeRoute } from '@/app/api/me/route'
import { signIn } from '@/app/(public)/sign-in/actions'
import { signUp } from '@/app/(public)/sign-up/actions'
import { setUnitSystem, signOut, switchShop } from '@/app/(shop)/actions'
import { checkSignIn } from '@/lib/data/people/check-sign-in'
import { createPersonWithShop } from '@/lib/data/people/create-person-with-shop'
import { findActor } from '@/lib/data/people/find-actor'
import { getMe } from '@/lib/data/people/get-me'
import { updateMyUnits } from '@/lib/data/people/update-my-units'
import { updateSessionShop } from '@/lib/data/people/update-session-shop'
import { formOf } from '../../support/next-mocks'
import { declare } from '../declare'

const password = 'a long enough one'
const anyAddress = () => `test ${randomUUID()}`
const newPerson = () => ({ name: 'New Person', email: `${randomUUID()}@new.example`, password, shopName: 'New Shop' })

/** Someone who can sign in: the e-mail address. */
async function registered(): Promise<string> {
  const person = newPerson()
  await createPersonWithShop(person, anyAddress())
  return person.email
}

export const people = [
  declare(createPersonWithShop, { needs: 'public', call: (fn) => fn(newPerson(), anyAddress()) }),
  declare(checkSignIn, { needs: 'public', prepare: registered, call: (fn, { target: email }) => fn({ email, password }, anyAddress()) }),
  declare(findActor, { needs: 'public', call: (fn, { actor }) => fn(actor.userId, null) }),
  declare(getMe, { needs: 'person.readSelf', call: (fn, { actor }) => fn(actor) }),
  declare(updateMyUnits, { needs: 'person.writeSelf', call: (fn, { actor }) => fn(actor, 'us') }),
  declare(updateSessionShop, { needs: 'shop.switch', prepare: async ({ shop }) => shop.id, call: (fn, { actor, target }) => fn(actor, randomUUID(), target) }),

  declare(signUp, { needs: 'public', call: (fn) => fn({ ok: false }, formOf(newPerson())) }),
  declare(signIn, { needs: 'public', prepare: registered, call: (fn, { target: email }) => fn({ ok: false }, formOf({ email, password })) }),
  declare(signOut, { needs: 'public', call: (fn) => fn() }),
  declare(setUnitSystem, { needs: 'person.writeSelf', call: (fn) => fn(formOf({ unitSystem: 'us' })) }),
  declare(switchShop, { needs: 'shop.switch', prepare: async ({ shop }) => shop.id, call: (fn, { target: shopId }) => fn(formOf({ shopId })) }),

  declare(getMeRoute, { needs: 'person.readSelf', call: (fn) => fn() }),
]
