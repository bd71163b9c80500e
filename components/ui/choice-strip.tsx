'use client'

interface ChoiceStripProps<T extends string> {
  label: string
  choices: readonly { value: T, label: string }[]
  value: T
  onChoose: (value: T) => void
}

/** Two or three choices of one thing, side by side. */
export function ChoiceStrip<T extends string>({ label, choices, value, onChoose }: ChoiceStripProps<T>) {
  return (
    <span className="pick" role="group" aria-label={label}>
      {choices.map((choice) => (
        <button key={choice.value} type="button" aria-pressed={choice.value === value} onClick={() => onChoose(choice.value)}>{choice.label}</button>
      ))}
    </span>
  )
}
