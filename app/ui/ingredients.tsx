import { memo, type ReactNode } from 'react'
import type { ShelvedSet } from '../../lib/answers/shelf'
import type { Desk } from '../../lib/words/desk'
import type { FieldGroup } from '../../lib/words/fields'
import { type Editing, useEditing } from '../live/use-editing'
import { FieldRow } from './field'
import { Published, Retune } from './ingredients-published'
import { Means } from './means'
import { Sentence, Symbols } from './symbol'

interface Props {
  readonly desk: Desk
  /**
   * The same, but for the middle of a gesture: what it was before. Links, and what is sent unseen, need not follow every turn of a
   * slider.
   */
  readonly still: Desk
  readonly sets: readonly ShelvedSet[]
  /** Until then a plain form, which asks for the page that its fields spell. */
  readonly live: boolean
}

/** The parameters of the scenario in focus; the others travel along unseen. */
export const Ingredients = memo(function Ingredients({ desk, still, sets, live }: Props) {
  const { form, place, placeFields } = desk
  const editing = useEditing(desk)
  return (
    <section className="ingredients" aria-labelledby="ingredients">
      <h2 id="ingredients" className="heading">
        Ingredients
      </h2>
      <Tabs desk={still} />
      <Published desk={still} sets={sets} />
      <form
        action="/compose"
        method="get"
        autoComplete="off"
        className={`slot-${place.focus}`}
        onSubmit={(event) => event.preventDefault()}
      >
        {still.scenarios.map((one) => (
          <input key={one.slot} type="hidden" name="s" value={one.plainCode} />
        ))}
        {placeFields.map(([key, value]) => (
          <input key={key} type="hidden" name={key} value={value} />
        ))}
        {form.hidden.map(({ name, value }) => (
          <input key={name} type="hidden" name={name} value={value} />
        ))}
        {form.groups.map((group) => (
          <Group key={group.key} group={group} editing={editing} live={live}>
            {group.key === 'rate' && <Retune desk={still} sets={sets} />}
          </Group>
        ))}
        <button type="submit" className={live ? 'absent unscripted' : 'unscripted'}>
          Apply
        </button>
      </form>
    </section>
  )
})

const Tabs = memo(function Tabs({ desk }: { readonly desk: Desk }) {
  const { scenarios, place, links } = desk
  const reset = `/compose/preset?${links.here.replace(/^\/\?/, '')}&set=defaults`
  const acts = { Add: links.add, Copy: links.copy, Remove: links.remove, Reset: reset }
  return (
    <nav className="tabs" aria-label="Scenarios">
      {scenarios.map(({ slot, name, link }) => (
        <a
          key={slot}
          className={`tab ink-${slot}`}
          href={link}
          rel="nofollow"
          aria-current={slot === place.focus ? 'true' : undefined}
        >
          {name}
        </a>
      ))}
      <span className="acts">
        {Object.entries(acts).map(
          ([act, link]) =>
            link && (
              <a key={act} href={link} rel="nofollow">
                {act}
              </a>
            ),
        )}
      </span>
    </nav>
  )
})

interface GroupProps {
  readonly group: FieldGroup
  readonly editing: Editing
  readonly live: boolean
  /** Below the fields. */
  readonly children: ReactNode
}

function Group({ group, editing, live, children }: GroupProps) {
  const { key, title, folded, fields, family } = group
  const { drafts, hand } = editing
  const rows = fields.map((field) => (
    <FieldRow key={field.name} field={field} draft={drafts.get(field.name)} hand={hand} live={live} />
  ))
  if (folded) {
    return (
      <details className="group" id={key}>
        <summary>{title}</summary>
        {rows}
      </details>
    )
  }
  const isSaid = fields.length === 1 && fields[0]?.label === title.toLowerCase()
  return (
    <fieldset className="group">
      <legend className={isSaid ? 'spoken' : undefined}>{title}</legend>
      {rows}
      {children}
      {family && (
        <p className="law">
          <span className="formula">
            <Means of={`law-${family.key}`}>
              <Symbols markup={family.formula} />
            </Means>
          </span>{' '}
          <Sentence text={family.caution} />
        </p>
      )}
    </fieldset>
  )
}
