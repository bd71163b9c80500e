import type { ReactNode } from 'react'
import { Button } from './button'

interface SearchBoxProps {
  /** Where the list lives; the form asks it with GET, so it works without a script and can be kept as a bookmark. */
  action: string
  label: string
  name?: string
  value?: string
  placeholder?: string
  onValue?: (value: string) => void
  /** Further filters: selects, hidden inputs. */
  children?: ReactNode
}

export function SearchBox({ action, label, name = 'q', value = '', placeholder, onValue, children }: SearchBoxProps) {
  return (
    <form role="search" action={action} method="get" className="search">
      <input type="search" name={name} defaultValue={value} placeholder={placeholder ?? label} aria-label={label} maxLength={120} autoComplete="off" onChange={onValue ? (event) => onValue(event.target.value) : undefined} />
      {children}
      <Button type="submit">Find</Button>
    </form>
  )
}
