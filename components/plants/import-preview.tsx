import { WideTable } from '@/components/ui'
import { rangeText } from '@/lib/plants'
import { BotanicalName } from './botanical-name'
import type { LineProblem, Preview } from './import-calls'
import { CARD, HEADING } from './parts'

/** Longer lists say how many more there are. */
const SHOWN = 200

const counted = (count: number, one: string, many: string) => `${count.toLocaleString('en-US')} ${count === 1 ? one : many}`
export const plantCount = (count: number) => counted(count, 'plant', 'plants')
const linesOf = (problems: readonly LineProblem[]) => new Set(problems.map(({ line }) => line)).size

/** What the preview comes to, in a sentence. */
export function previewSentence({ isReadable, total, good, problems }: Preview): string {
  if (!isReadable) return 'This file cannot be brought in as it is.'
  if (problems.length === 0) return `All ${plantCount(total)} can come in.`
  return `${plantCount(good.length)} of ${total} can come in; ${counted(linesOf(problems), 'line has', 'lines have')} problems.`
}

/** What an import came to. */
export function doneSentence({ added, problems }: { added: number; problems: readonly LineProblem[] }): string {
  const left = linesOf(problems)
  return `${plantCount(added)} brought in${left > 0 ? `, ${counted(left, 'line', 'lines')} left out` : ''}.`
}

const Rest = ({ count }: { count: number }) => (count > 0 ? <p className="mt-2 text-ink-soft">…and {count.toLocaleString('en-US')} more.</p> : null)

/** Every bad cell by its line and column. */
export function ProblemTable({ title = 'Lines with problems', problems }: { title?: string; problems: readonly LineProblem[] }) {
  return (
    <section className={CARD} aria-label={title}>
      <h2 className={HEADING}>{title}</h2>
      <table className="mt-2 w-full border-collapse text-left align-top">
        <thead>
          <tr className="border-b border-ink-soft"><th scope="col" className="w-20 py-2">Line</th><th scope="col" className="w-40 py-2">Column</th><th scope="col" className="py-2">What is wrong</th></tr>
        </thead>
        <tbody>
          {problems.slice(0, SHOWN).map(({ line, column, message }, i) => (
            <tr key={i} className="border-b border-rule align-top last:border-0">
              <td className="py-2 font-mono">{line}</td>
              <td className="py-2 pr-3 font-mono text-sm break-words">{column || 'whole line'}</td>
              <td className="py-2 break-words">{message}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <Rest count={problems.length - SHOWN} />
    </section>
  )
}

/** The plants that can come in. */
export function GoodTable({ good, notes }: Pick<Preview, 'good' | 'notes'>) {
  const noteOf = new Map(notes.map(({ line, message }) => [line, message]))
  return (
    <section className={CARD} aria-label="Plants that can come in">
      <h2 className={HEADING}>Plants that can come in</h2>
      <WideTable label="Plants that can come in, as a table">
        <table className="mt-2 w-full min-w-160 border-collapse text-left">
          <thead>
            <tr className="border-b border-ink-soft">
              {['Line', 'Botanical name', 'Common name', 'Height', 'Spread'].map((heading) => <th key={heading} scope="col" className="py-2 pr-3">{heading}</th>)}
            </tr>
          </thead>
          <tbody>
            {good.slice(0, SHOWN).map(({ line, botanical, common, heightMin, heightMax, spreadMin, spreadMax }) => (
              <tr key={line} className="border-b border-rule align-top last:border-0">
                <td className="py-2 font-mono">{line}</td>
                <th scope="row" className="py-2 pr-3 font-normal"><BotanicalName name={botanical} />{noteOf.has(line) && <span className="block text-sm text-ink-soft">{noteOf.get(line)}</span>}</th>
                <td className="py-2 pr-3">{common}</td>
                <td className="py-2 pr-3 font-mono text-sm whitespace-nowrap">{rangeText(heightMin, heightMax)}</td>
                <td className="py-2 font-mono text-sm whitespace-nowrap">{rangeText(spreadMin, spreadMax)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </WideTable>
      <Rest count={good.length - SHOWN} />
    </section>
  )
}
