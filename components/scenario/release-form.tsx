'use client'

import { useActionState } from 'react'
import { Button, TextLink } from '@/components/ui/button'
import { Caution } from '@/components/ui/caution'
import { ErrorSummary } from '@/components/ui/error-summary'
import { TextareaField } from '@/components/ui/field'
import { Section } from '@/components/ui/section'
import type { Finding } from '@/lib/calc/live'
import type { ActionState } from '@/lib/errors'
import type { UnitSystem } from '@/lib/units'
import { findingAmount, findingLead, findingTitle, letterOf, limitWords } from '@/lib/words/findings'

interface ReleaseFormProps {
  title: string
  backHref: string
  outside: readonly Finding[]
  system: UnitSystem
  release: (before: ActionState, form: FormData) => Promise<ActionState>
}

const labelOf = (finding: Finding, system: UnitSystem) =>
  `${finding.channel ? `${letterOf(finding.channel)}: ` : ''}${findingLead(finding, system)} ${findingAmount(finding, system)}; ${limitWords(finding, system)}`

/** A reason in writing for each finding outside its limit, then the release. */
export function ReleaseForm({ title, backHref, outside, system, release }: ReleaseFormProps) {
  const [answer, action, pending] = useActionState(release, { ok: false })
  const values = answer.ok ? {} : (answer.values ?? {})
  const errors = answer.ok ? {} : (answer.fieldErrors ?? {})
  return (
    <form action={action} className="release" noValidate>
      {answer.ok ? null : <ErrorSummary title="Not released" formError={answer.formError} fieldErrors={answer.fieldErrors} labels={Object.fromEntries(outside.map((finding) => [`reason.${finding.id}`, findingTitle(finding, system)]))} />}
      <p className="lead">“{title}” becomes a plan that everyone in the shop can read and nobody can change. Units are built and checked to it.</p>
      {outside.length > 0 ? (
        <Section title={outside.length === 1 ? 'One finding lies outside its limit: why is it released all the same?' : `${outside.length} findings lie outside their limits: why is each released all the same?`}>
          {outside.map((finding) => (
            <TextareaField key={finding.id} name={`reason.${finding.id}`} label={labelOf(finding, system)} defaultValue={values[`reason.${finding.id}`]} error={errors[`reason.${finding.id}`]} maxLength={1000} note="Kept with the plan, with your name and the time. At least 10 characters." />
          ))}
        </Section>
      ) : null}
      <Caution>
        Detonation can destroy an engine in seconds. The models compare settings of one engine; they approve none. Ground-run, then flight-test as the rules of your country and licensed practice say.
      </Caution>
      <p className="acts">
        <Button kind="do" type="submit" pending={pending}>Release the plan</Button>
        <TextLink href={backHref}>Back to the sheet</TextLink>
      </p>
    </form>
  )
}
