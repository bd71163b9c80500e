'use client'

import { useState } from 'react'
import { PageHead } from '@/components/shell/page-head'
import { PersonMenu } from '@/components/shell/person-menu'
import { PhoneRibbon } from '@/components/shell/phone-ribbon'
import { TopStrip } from '@/components/shell/top-strip'
import { Button } from '@/components/ui/button'
import { ChannelChip } from '@/components/ui/channel-chip'
import { Stamp } from '@/components/ui/stamp'

const items = [{ href: '/pieces', label: 'Scenarios' }, { href: '/plans', label: 'Plans' }, { href: '/engines', label: 'Engines' }]
const person = { name: 'Noor Adeyemi', role: 'designer', shopId: '1', shopName: 'Juniper Field Engine Shop', shops: [{ id: '1', name: 'Juniper Field Engine Shop' }, { id: '2', name: 'North Slip Works' }], unitSystem: 'metric' as const }
const nothing = async () => {}
const tabs = [{ value: 'result', label: 'Result' }, { value: 'inputs', label: 'Inputs' }, { value: 'curves', label: 'Curves' }] as const

/** The frame of a signed-in page; its forms go nowhere. */
export function ShellPieces() {
  const [tab, setTab] = useState<(typeof tabs)[number]['value']>('result')
  return (
    <>
      <TopStrip homeHref="/pieces" shopName={person.shopName} items={items}>
        <PersonMenu person={person} theme="system" items={items} signOut={nothing} setUnitSystem={nothing} switchShop={nothing} setTheme={nothing} />
      </TopStrip>
      <PageHead
        over="Scenario J260-04 · revision 7 · saved 10:42" title="Climb timing for 97 RON"
        stamp={<Stamp verdict="outside" head="1 outside its limit, 3 close"><ChannelChip channel="A" /> shows full timing only from <b className="one">1710 rpm</b>; at most 920.</Stamp>}
        actions={<><Button>Undo</Button><Button off="1 outside">Release a plan</Button><Button kind="do">Save</Button></>}
      />
      <PhoneRibbon label="Parts of this page" tabs={tabs} value={tab} onChoose={setTab} />
    </>
  )
}
