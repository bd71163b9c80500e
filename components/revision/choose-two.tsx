import Form from 'next/form'
import { Button } from '@/components/ui/button'

interface ChooseTwoProps {
  action: string
  /** Number of the current revision: they are numbered from 1 without gaps. */
  current: number
  left: number
  right: number
}

/** Which revision against which; a form that asks with GET. */
export function ChooseTwo({ action, current, left, right }: ChooseTwoProps) {
  const numbers = Array.from({ length: current }, (_, i) => current - i)
  const select = (name: string, label: string, value: number) => (
    <select name={name} aria-label={label} defaultValue={value} className="lselect">
      {numbers.map((number) => <option key={number} value={number}>{number}{number === current ? ', current' : ''}</option>)}
    </select>
  )
  return (
    <Form action={action} className="ctwo" key={`${left} ${right}`}>
      <span aria-hidden="true">Revision</span>{select('left', 'First revision', left)}
      <span aria-hidden="true">against</span>{select('right', 'Second revision', right)}
      <Button type="submit">Compare</Button>
    </Form>
  )
}
