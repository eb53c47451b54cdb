'use client'

import type { ScenarioWords, Words } from '../../lib/answers/words'
import { CopyText } from './copy-text'

/** Words of scenarios and their figure, each to be copied with one click, or selected by hand. */
export function TakeAwayWords({ words }: { readonly words: Words }) {
  const several = words.scenarios.length > 1
  return (
    <div className="words">
      {several && <Text title="Caption of the figure" text={words.figure.caption} />}
      {several && <Text title="Alternative text of the figure" text={words.figure.alternative} />}
      {words.scenarios.map((scenario, i) => {
        const key = `${i} ${scenario.code}`
        return <OfScenario key={key} scenario={scenario} heading={several} />
      })}
      <Text title="LaTeX macros" text={words.macros} code />
      <Text title="References, BibTeX" text={words.bibtex} code />
    </div>
  )
}

function OfScenario({ scenario, heading }: { readonly scenario: ScenarioWords; readonly heading: boolean }) {
  const { label, summary, methods, caption, alternative, press } = scenario
  return (
    <section aria-label={label}>
      {heading && <h3>{label}</h3>}
      <Text title="Summary in plain language" text={summary} />
      <Text title="Methods" text={methods} />
      <Text title="Caption" text={caption} />
      <Text title="Alternative text" text={alternative} />
      <Text title="Press card" text={press.facts.map(({ title, text }) => `${title}. ${text}`).join('\n\n')} />
    </section>
  )
}

interface TextProps {
  readonly title: string
  readonly text: string
  readonly code?: boolean
}

function Text({ title, text, code }: TextProps) {
  return (
    <div className="text">
      <h4>
        {title} <CopyText title={title} text={text} />
      </h4>
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be within reach of the keyboard */}
      <pre className={code ? 'code' : undefined} tabIndex={code ? 0 : undefined}>
        {text}
      </pre>
    </div>
  )
}
