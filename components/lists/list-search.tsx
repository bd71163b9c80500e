import Form from 'next/form'
import { Button, TextLink } from '@/components/ui/button'
import type { ListParams } from '@/lib/list-address'

export interface ListChoice {
  name: string
  label: string
  choices: readonly { value: string, label: string }[]
}

interface ListSearchProps {
  path: string
  params: ListParams
  /** "Search scenarios" */
  label: string
  placeholder: string
  selects?: readonly ListChoice[]
  /** Names kept as they are: the state chosen beside the form. */
  keep?: readonly string[]
}

/** Search and choices of a list: a form that asks its own page with GET. */
export function ListSearch({ path, params, label, placeholder, selects = [], keep = ['state'] }: ListSearchProps) {
  const isAsked = Boolean(params.search) || selects.some(({ name }) => params[name])
  return (
    // A new address brings new values: the key makes the inputs start from them.
    <Form action={path} role="search" className="search lsearch" key={JSON.stringify(params)}>
      {keep.map((name) => (params[name] ? <input key={name} type="hidden" name={name} value={params[name]} /> : null))}
      <input type="search" name="search" defaultValue={params.search} placeholder={placeholder} aria-label={label} maxLength={200} autoComplete="off" />
      {selects.map(({ name, label: words, choices }) => (
        <select key={name} name={name} aria-label={words} defaultValue={params[name] ?? ''} className="lselect">
          {choices.map((choice) => <option key={choice.value} value={choice.value}>{choice.label}</option>)}
        </select>
      ))}
      <Button type="submit">Find</Button>
      {isAsked ? <TextLink href={params.state ? `${path}?state=${params.state}` : path} className="self-center">Clear</TextLink> : null}
    </Form>
  )
}
