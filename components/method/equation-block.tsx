import { ScrollBox } from '@/components/ui/scroll-box'
import { sources } from '@/lib/calc/live'
import { displayMath, inlineMath } from '@/lib/method/math'
import type { Equation, MathSymbol } from '@/lib/method/topic'
import { sourceWords } from '@/lib/words/sources'

/** MathML made on the server from the method's own TeX. */
function SetFormula({ mathml }: { mathml: string }) {
  return <span dangerouslySetInnerHTML={{ __html: mathml }} />
}

function SymbolTable({ title, symbols }: { title: string, symbols: readonly MathSymbol[] }) {
  return (
    <table className="led syms">
      <caption className="sr">Symbols of: {title}</caption>
      <thead><tr><th scope="col">Symbol</th><th scope="col">Meaning, range</th><th scope="col">Unit</th></tr></thead>
      <tbody>
        {symbols.map(({ tex, meaning, unit, range }) => (
          <tr key={tex}>
            <td className="sym"><SetFormula mathml={inlineMath(tex)} /></td>
            <th scope="row">{meaning}{range ? <small>{range}</small> : null}</th>
            <td className="unit">{unit}</td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}

function SourceLine({ sources: ids, basis }: Pick<Equation, 'sources' | 'basis'>) {
  return (
    <p className="fine">
      From: {basis ? `${basis}${ids.length > 0 ? '; ' : ''}` : null}
      {ids.map((id, i) => {
        const source = sources[id]
        return <span key={id}>{i > 0 ? '; ' : ''}<a href={`#source-${id}`}>{source ? sourceWords(source) : id}</a></span>
      })}
    </p>
  )
}

/** An equation set in type, its symbols, and where it comes from. Links from results land on it. */
export function EquationBlock({ id, title, tex, note, symbols, sources: sourceIds, basis }: Equation) {
  return (
    <article className="eq" id={id} tabIndex={-1} aria-labelledby={`${id}-head`}>
      <h3 id={`${id}-head`}><a href={`#${id}`}>{title}</a></h3>
      <div>
        <ScrollBox label={`Equation: ${title}`} className="eqn">
          {displayMath(tex).map((mathml) => <SetFormula key={mathml} mathml={mathml} />)}
        </ScrollBox>
        {note ? <p className="eqnote">{note}</p> : null}
        <SourceLine sources={sourceIds} basis={basis} />
      </div>
      <SymbolTable title={title} symbols={symbols} />
    </article>
  )
}
