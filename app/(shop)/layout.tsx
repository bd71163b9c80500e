import { cookies } from 'next/headers'
import type { ReactNode } from 'react'
import { setTheme } from '@/app/actions'
import { ClientSetup } from '@/components/shell/client-setup'
import type { NavItem } from '@/components/shell/main-nav'
import { PageFoot } from '@/components/shell/page-foot'
import { PersonMenu } from '@/components/shell/person-menu'
import { readTheme, themeCookie } from '@/components/shell/theme'
import { TopStrip } from '@/components/shell/top-strip'
import type { Actor } from '@/lib/auth/actor'
import { homeOf } from '@/lib/auth/home'
import { can } from '@/lib/auth/permissions'
import { requireActor } from '@/lib/auth/session'
import { getMe } from '@/lib/data/people/get-me'
import { roleNames } from '@/lib/words/roles'
import { setUnitSystem, signOut, switchShop } from './actions'

/** The pages this role can open. */
const pagesOf = (actor: Actor): NavItem[] => [
  ...(can(actor, 'scenario.read') || can(actor, 'scenario.readOwn') ? [{ href: '/scenarios', label: 'Scenarios' }] : []),
  { href: '/plans', label: 'Plans' },
  ...(can(actor, 'engine.read') ? [{ href: '/engines', label: 'Engines' }] : []),
]

export default async function ShopLayout({ children }: { children: ReactNode }) {
  const actor = await requireActor()
  const [me, jar] = await Promise.all([getMe(actor), cookies()])
  const items = pagesOf(actor)
  const person = { name: me.name, role: roleNames[me.role].toLowerCase(), shopId: me.shop.id, shopName: me.shop.name, shops: me.shops.map(({ id, name }) => ({ id, name })), unitSystem: me.unitSystem }
  return (
    <>
      <ClientSetup />
      <TopStrip homeHref={homeOf(actor)} shopName={me.shop.name} items={items}>
        <PersonMenu person={person} theme={readTheme(jar.get(themeCookie)?.value)} items={items} signOut={signOut} setUnitSystem={setUnitSystem} switchShop={switchShop} setTheme={setTheme} />
      </TopStrip>
      <main id="main" tabIndex={-1}>{children}</main>
      <PageFoot />
    </>
  )
}
