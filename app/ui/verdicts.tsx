import { memo } from 'react'
import type { ScenarioView } from '../../lib/answers/explorer'
import { useSteadyHeight } from '../live/use-steady-height'
import { Key } from './key'
import { Sentence } from './symbol'

interface Props {
  readonly scenarios: readonly ScenarioView[]
  readonly focus: number
}

export const Verdicts = memo(function Verdicts({ scenarios, focus }: Props) {
  const ref = useSteadyHeight(String(scenarios.length))
  return (
    <section className="verdicts" aria-label="Verdict" ref={ref}>
      {scenarios.map((scenario) => (
        <VerdictOf key={scenario.slot} scenario={scenario} current={scenario.slot === focus} />
      ))}
    </section>
  )
})

function VerdictOf({ scenario, current }: { readonly scenario: ScenarioView; readonly current: boolean }) {
  const { slot, name, verdict, proven, notices } = scenario
  return (
    <article className={current ? 'verdict current' : 'verdict'}>
      <Key slot={slot} />
      <h2>
        <a className={`ink-${slot}`} href={scenario.link} rel="nofollow" aria-current={current ? 'true' : undefined}>
          {name}
        </a>
      </h2>
      <p className="said">{verdict.sentences.join(' ')}</p>
      {verdict.aside && <p className="aside">{verdict.aside}</p>}
      {verdict.nearest && (
        <p className="aside">
          <Sentence text={verdict.nearest} />
        </p>
      )}
      {!proven && (
        <p className="aside">The ending is found by numerical integration, to the digits typed; it is not proven.</p>
      )}
      {notices.map((notice) => (
        <p key={notice.message} className="aside notice">
          <Sentence text={notice.message} /> {notice.link && <a href={notice.link}>Correct it</a>}
        </p>
      ))}
    </article>
  )
}
