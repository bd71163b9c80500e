import clsx from 'clsx'

interface NumProps {
  /** Already formatted: sign, real minus, decimals. */
  value: string
  /** "°" joins the value; every other unit stands after a thin gap, lighter. */
  unit?: string
  bad?: boolean
  className?: string
}

/** A number with its unit: one word that never breaks. */
export function Num({ value, unit, bad = false, className }: NumProps) {
  return (
    <span className={clsx('n', bad && 'bad', className)}>
      {value}
      {unit ? unit === '°' ? <i className="deg">°</i> : <>{'\u00a0'}<i className="sp">{unit}</i></> : null}
    </span>
  )
}
