interface WorkingRulerProps {
  label: string
  /** 0…1; leave out where the end is not known. */
  share?: number
}

const ticks = Array.from({ length: 41 }, (_, index) => index)

/** Work that takes a while: a ruler whose ticks turn to ink as it goes on. */
export function WorkingRuler({ label, share }: WorkingRulerProps) {
  const done = share === undefined ? undefined : Math.min(1, Math.max(0, share))
  return (
    <div className="ruler">
      <p>{label}{done === undefined ? null : <> <span className="n">{Math.round(done * 100)}<i>%</i></span></>}</p>
      <svg viewBox="0 0 404 14" width="404" height="14" role="progressbar" aria-label={label} aria-valuemin={0} aria-valuemax={100} aria-valuenow={done === undefined ? undefined : Math.round(done * 100)}>
        <path className="g-axis" d="M2 10H402" />
        {ticks.map((tick) => {
          const inked = done !== undefined && tick / 40 <= done
          return <line key={tick} x1={2 + tick * 10} x2={2 + tick * 10} y1="10" y2={tick % 5 === 0 ? 2 : 6} stroke={inked ? 'var(--ink)' : 'var(--rule)'} strokeWidth={inked ? 1.6 : 1} />
        })}
      </svg>
    </div>
  )
}
