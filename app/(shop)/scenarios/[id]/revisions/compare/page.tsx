import type { Metadata } from 'next'
import { ChooseTwo } from '@/components/revision/choose-two'
import { CompareSide } from '@/components/revision/compare-head'
import { FindingChangesList } from '@/components/revision/finding-changes-list'
import { InputDifferences } from '@/components/revision/input-differences'
import { OverlaidPlot } from '@/components/revision/overlaid-plot'
import { ResultDifferences } from '@/components/revision/result-differences'
import { PageHead } from '@/components/shell/page-head'
import { ButtonLink, TextLink } from '@/components/ui/button'
import { Section } from '@/components/ui/section'
import { requireActor } from '@/lib/auth/session'
import { comparisonHead, comparisonSentence } from '@/lib/compare/comparison-words'
import { drawnResult } from '@/lib/compare/drawn-result'
import { findingChanges } from '@/lib/compare/finding-changes'
import { inputRows } from '@/lib/compare/input-rows'
import { overlaidCurves } from '@/lib/compare/overlaid-curves'
import { getRevision } from '@/lib/data/scenarios/get-revision'
import { getScenario } from '@/lib/data/scenarios/get-scenario'
import { pageData } from '@/lib/page-data'
import { engineFields } from '@/lib/schemas/engine-fields'
import { engineToForm } from '@/lib/schemas/engine-form'
import type { RevisionDto } from '@/lib/schemas/revision-dto'
import { revisionNumber } from '@/lib/schemas/revision-number'
import { scenarioFields } from '@/lib/schemas/scenario-fields'
import { scenarioToForm } from '@/lib/schemas/scenario-form'
import type { UnitSystem } from '@/lib/units'

export const metadata: Metadata = { title: 'Compare revisions' }

interface ComparePageProps {
  params: Promise<{ id: string }>
  searchParams: Promise<{ left?: string | string[], right?: string | string[], all?: string | string[] }>
}

const fields = [...scenarioFields, ...engineFields.map((field) => ({ ...field, name: `engine.${field.name}`, label: field.name === 'name' ? 'Engine' : field.label }))]

/** Sheet and engine of a revision as the texts of one form. */
function formOf({ title, sheet, engine }: RevisionDto, system: UnitSystem) {
  const engineTexts = Object.entries(engineToForm(engine.name, engine.code, engine.spec, system)).map(([name, text]) => [`engine.${name}`, text])
  return { ...scenarioToForm(title, sheet, system), ...Object.fromEntries(engineTexts) as Record<string, string> }
}

/** Two revisions side by side: by default the current one against the one before. */
export default async function ComparePage({ params, searchParams }: ComparePageProps) {
  const [actor, { id }, asked] = await Promise.all([requireActor(), params, searchParams])
  const scenario = await pageData(() => getScenario(actor, id))
  const current = scenario.revision.number
  const right = asked.right ? revisionNumber(asked.right) : current
  const left = asked.left ? revisionNumber(asked.left) : Math.max(1, right - 1)
  const [one, two] = await pageData(() => Promise.all([getRevision(actor, id, left), getRevision(actor, id, right)]))
  const system = actor.unitSystem
  const [from, to] = [formOf(one, system), formOf(two, system)]
  const rows = inputRows(fields, from, to, system)
  const same = rows.filter((row) => row.isSame).length
  const all = asked.all === '1'
  const changes = findingChanges(one.results, two.results)
  const list = `/scenarios/${id}/revisions`
  const here = (more: boolean) => `${list}/compare?left=${left}&right=${right}${more ? '&all=1' : ''}`
  const columns = [{ label: `Revision ${left}`, digit: 1 as const }, { label: `Revision ${right}`, digit: 2 as const }] as const
  return (
    <>
      <PageHead
        over={<>Compare · <TextLink className="font-normal" href={list}>Scenario {scenario.code}</TextLink> · revision {right} against {left}</>}
        title={comparisonHead(changes, same < rows.length)}
        actions={scenario.canWrite && right !== current ? <ButtonLink kind="do" href={`/scenarios/${id}?from=${right}`}>Work on from {right}</ButtonLink> : <ButtonLink href={`/scenarios/${id}`}>Open the sheet</ButtonLink>}
      />
      <div className="body cmp">
        <div>
          {current > 1 ? <ChooseTwo action={`${list}/compare`} current={current} left={left} right={right} /> : null}
          <div className="csides">
            <CompareSide revision={one} digit={1} href={`${list}/${left}`} />
            <CompareSide revision={two} digit={2} href={`${list}/${right}`} />
          </div>
          <Section title={all ? 'Inputs' : 'Inputs that differ'} right={<>{same} {same === 1 ? 'is' : 'are'} the same, <TextLink href={here(!all)} scroll={false}>{all ? 'fold' : 'show'}</TextLink></>}>
            <InputDifferences fields={fields} left={{ label: `Revision ${left}`, values: from }} right={{ label: `Revision ${right}`, values: to }} system={system} all={all} digits />
          </Section>
          <Section title="Results" right={`difference from revision ${left}`}><ResultDifferences left={one.results} right={two.results} columns={columns} system={system} /></Section>
        </div>
        <div className="cright">
          <Section title="Curves laid over each other">
            <OverlaidPlot
              curves={overlaidCurves(drawnResult(one), drawnResult(two))} finding={comparisonSentence(one.results, two.results, system)}
              toRpm={Math.ceil(Math.max(one.engine.spec.maxRpm, two.engine.spec.maxRpm) / 100) * 100} csvName={`${scenario.code}-${left}-${right}-advance`}
            />
          </Section>
          <Section title="Findings with another verdict"><FindingChangesList changes={changes} system={system} /></Section>
        </div>
      </div>
    </>
  )
}
