'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { useEffect, useRef, type KeyboardEvent } from 'react'
import { DownGlyph } from '@/components/ui/glyphs'
import { Button } from '@/components/ui/button'
import type { NavItem } from './main-nav'
import type { Theme } from './theme'
import { ThemeSwitch } from './theme-switch'

type FormAction = (formData: FormData) => Promise<void>

export interface Person {
  name: string
  /** The role in this shop, as a word. */
  role: string
  shopId: string
  shopName: string
  shops: readonly { id: string, name: string }[]
  unitSystem: 'metric' | 'us'
}

interface PersonMenuProps {
  person: Person
  theme: Theme
  /** On a phone the pages stand here. */
  items: readonly NavItem[]
  signOut: () => Promise<void>
  setUnitSystem: FormAction
  switchShop: FormAction
  setTheme: FormAction
}

const unitWords = { metric: 'Metric', us: 'US' } as const

/** The person's own sheet: shop, units, theme, sign-out. A details element: it opens and every form in it works without a script. */
export function PersonMenu({ person, theme, items, signOut, setUnitSystem, switchShop, setTheme }: PersonMenuProps) {
  const box = useRef<HTMLDetailsElement>(null)
  const path = usePathname()
  const close = () => box.current?.removeAttribute('open')
  useEffect(close, [path])
  useEffect(() => {
    const outside = (event: PointerEvent) => {
      if (event.target instanceof Node && !box.current?.contains(event.target)) close()
    }
    document.addEventListener('pointerdown', outside)
    return () => document.removeEventListener('pointerdown', outside)
  }, [])
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key !== 'Escape') return
    close()
    box.current?.querySelector('summary')?.focus()
  }
  return (
    <details className="menu" ref={box} onKeyDown={onKeyDown}>
      <summary><span>{person.name}<span className="role">, {person.role}</span></span><DownGlyph /></summary>
      <div className="pane">
        <nav className="only-n" aria-label="Pages">{items.map((item) => <Link prefetch={false} key={item.href} href={item.href}>{item.label}</Link>)}</nav>
        <p className="fine">{person.shopName}, {person.role}</p>
        {person.shops.length > 1 ? (
          <form action={switchShop} className="line">
            <label className="sr" htmlFor="menu-shop">Shop</label>
            <select id="menu-shop" name="shopId" className="menu-select" defaultValue={person.shopId}>
              {person.shops.map((shop) => <option key={shop.id} value={shop.id}>{shop.name}</option>)}
            </select>
            <Button type="submit" size="small">Go there</Button>
          </form>
        ) : null}
        <form action={setUnitSystem} className="line">
          <span>Units</span>
          <span className="pick" role="group" aria-label="Units">
            {(['metric', 'us'] as const).map((system) => <button key={system} type="submit" name="unitSystem" value={system} aria-pressed={system === person.unitSystem}>{unitWords[system]}</button>)}
          </span>
        </form>
        <div className="line"><span>Theme</span><ThemeSwitch theme={theme} setTheme={setTheme} /></div>
        <form action={signOut}><Button type="submit">Sign out</Button></form>
      </div>
    </details>
  )
}
