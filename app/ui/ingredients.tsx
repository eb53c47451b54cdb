import type { Explorer } from '../../lib/answers/explorer'
import type { FieldGroup } from '../../lib/words/fields'
import { FieldRow } from './field'
import { Sentence, Symbols } from './symbol'

/** The parameters of the scenario in focus as a plain form; the others travel along unseen. */
export function Ingredients({ view }: { readonly view: Explorer }) {
  const { form, scenarios, place } = view
  return (
    <section className="ingredients" aria-labelledby="ingredients">
      <h2 id="ingredients" className="heading">
        Ingredients
      </h2>
      <Tabs view={view} />
      <form action="/compose" method="get" autoComplete="off">
        {scenarios.map((one) => (
          <input key={one.slot} type="hidden" name="s" value={one.plainCode} />
        ))}
        <input type="hidden" name="focus" value={place.focus + 1} />
        {place.theme && <input type="hidden" name="theme" value={place.theme} />}
        {form.hidden.map(({ name, value }) => (
          <input key={name} type="hidden" name={name} value={value} />
        ))}
        {form.groups.map((group) => (
          <Group key={group.key} group={group} />
        ))}
        <button type="submit">Apply</button>
      </form>
    </section>
  )
}

function Tabs({ view }: { readonly view: Explorer }) {
  const { scenarios, place, links } = view
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
        {links.add && (
          <a href={links.add} rel="nofollow">
            Add
          </a>
        )}
        {links.copy && (
          <a href={links.copy} rel="nofollow">
            Copy
          </a>
        )}
        {links.remove && (
          <a href={links.remove} rel="nofollow">
            Remove
          </a>
        )}
      </span>
    </nav>
  )
}

function Group({ group }: { readonly group: FieldGroup }) {
  const { key, title, folded, fields, family } = group
  const rows = fields.map((field) => <FieldRow key={field.name} field={field} />)
  if (folded) {
    return (
      <details className="group" id={key}>
        <summary>{title}</summary>
        {rows}
      </details>
    )
  }
  return (
    <fieldset className="group">
      <legend>{title}</legend>
      {rows}
      {family && (
        <p className="law">
          <span className="formula">
            <Symbols markup={family.formula} />
          </span>{' '}
          <Sentence text={family.caution} />
        </p>
      )}
    </fieldset>
  )
}
