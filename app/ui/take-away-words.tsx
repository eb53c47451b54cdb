'use client'

import type { ScenarioWords, Words } from '../../lib/answers/words'
import { CopyText } from './copy-text'

/** Of the headings, by what they stand under. */
type Level = 2 | 3 | 4

/** Words of scenarios and their figure, each to be copied with one click, or selected by hand. */
export function TakeAwayWords({ words, level }: { readonly words: Words; readonly level: Level }) {
  const several = words.scenarios.length > 1
  return (
    <div className="words">
      {several && <Text level={level} title="Caption of the figure" text={words.figure.caption} />}
      {several && <Text level={level} title="Alternative text of the figure" text={words.figure.alternative} />}
      {words.scenarios.map((scenario, i) => {
        const key = `${i} ${scenario.code}`
        return <OfScenario key={key} scenario={scenario} level={level} heading={several} />
      })}
      <Text level={level} title="LaTeX macros" text={words.macros} code />
      <Text level={level} title="References, BibTeX" text={words.bibtex} code />
    </div>
  )
}

interface ScenarioProps {
  readonly scenario: ScenarioWords
  readonly level: Level
  readonly heading: boolean
}

function OfScenario({ scenario, level, heading }: ScenarioProps) {
  const { label, summary, methods, caption, alternative, press } = scenario
  const [Heading, below] = [`h${level}` as const, (heading ? Math.min(level + 1, 4) : level) as Level]
  return (
    <section aria-label={label}>
      {heading && <Heading className="whose">{label}</Heading>}
      <Text level={below} title="Summary in plain language" text={summary} />
      <Text level={below} title="Methods" text={methods} />
      <Text level={below} title="Caption" text={caption} />
      <Text level={below} title="Alternative text" text={alternative} />
      <Text
        level={below}
        title="Press card"
        text={press.facts.map(({ title, text }) => `${title}. ${text}`).join('\n\n')}
      />
    </section>
  )
}

interface TextProps {
  readonly level: Level
  readonly title: string
  readonly text: string
  readonly code?: boolean
}

function Text({ level, title, text, code }: TextProps) {
  const Heading = `h${level}` as const
  return (
    <div className="text">
      <Heading>
        {title} <CopyText title={title} text={text} />
      </Heading>
      {/* What scrolls must be within reach of the keyboard. */}
      <pre className={code ? 'code' : undefined} tabIndex={code ? 0 : undefined}>
        {text}
      </pre>
    </div>
  )
}
