import type { Field } from '../../lib/words/fields'
import type { Editing } from '../live/use-editing'
import { Means } from './means'
import { Slider } from './slider'
import { Symbols } from './symbol'

interface Props {
  readonly field: Field
  readonly editing: Editing
  readonly live: boolean
}

/** One parameter: symbol, words, where it is typed or chosen, and where it is dragged. */
export function FieldRow({ field, editing, live }: Props) {
  const id = `field-${field.name}`
  const complaint = editing.complaintOf(field.name)
  return (
    <div className={field.kind === 'closing' ? 'field closing' : 'field'}>
      <span className="named">
        {field.symbol && (
          <span className="symbol">
            {field.means ? (
              <Means of={field.means}>
                <Symbols markup={field.symbol} />
              </Means>
            ) : (
              <Symbols markup={field.symbol} />
            )}
          </span>
        )}
        <label htmlFor={id} data-means={field.means ?? undefined}>
          {field.label}
          {field.kind === 'closing' && ', closes'}
        </label>
      </span>
      <Control field={field} id={id} editing={editing} live={live} />
      {complaint && (
        <p id={`${id}-complaint`} className="complaint" role="alert">
          {complaint}
        </p>
      )}
      {field.kind === 'number' && <span className="track">{live && <Slider field={field} drag={editing.drag} />}</span>}
    </div>
  )
}

interface ControlProps {
  readonly field: Field
  readonly id: string
  readonly editing: Editing
  readonly live: boolean
}

function Control({ field, id, editing, live }: ControlProps) {
  switch (field.kind) {
    case 'closing':
      return (
        <span className="entry">
          <output id={id}>{field.shown}</output>
          <input type="hidden" name={field.name} value={field.value} />
        </span>
      )
    case 'choice':
      return <Choices field={field} id={id} choose={editing.choose} />
    case 'text':
      return <input className="wide" maxLength={2 * field.most} {...typed(field, id, editing)} />
    default:
      return (
        <span className="entry">
          <input inputMode="text" title={field.allowed} {...typed(field, id, editing)} />
          <span className="unit">
            {field.unit}
            {live && field.kind === 'number' && <Reset field={field} choose={editing.choose} />}
          </span>
        </span>
      )
  }
}

interface ResetProps {
  readonly field: Extract<Field, { kind: 'number' }>
  readonly choose: Editing['choose']
}

/** Back to what holds where nothing is typed. */
function Reset({ field: { name, label, value, usual }, choose }: ResetProps) {
  if (usual === null || usual === value) return null
  return (
    <button type="button" className="reset" aria-label={`Reset ${label} to ${usual}`} onClick={() => choose(name, '')}>
      reset
    </button>
  )
}

/** What is typed is taken over on Enter and on leaving the field; Escape takes it back. */
function typed({ name, value }: Field, id: string, { textOf, complaintOf, type, commit, drop }: Editing) {
  const wrong = complaintOf(name) !== null
  return {
    id,
    name,
    value: textOf(name, value),
    'aria-invalid': wrong || undefined,
    'aria-describedby': wrong ? `${id}-complaint` : undefined,
    onChange: ({ target }: { readonly target: HTMLInputElement }) => type(name, target.value),
    onBlur: () => commit(name),
    onKeyDown: ({ key }: { readonly key: string }) => {
      if (key === 'Enter') commit(name)
      if (key === 'Escape') drop(name)
    },
  }
}

interface ChoicesProps {
  readonly field: Extract<Field, { kind: 'choice' }>
  readonly id: string
  readonly choose: Editing['choose']
}

function Choices({ field, id, choose }: ChoicesProps) {
  const { name, value, choices } = field
  return (
    <select id={id} name={name} value={value} onChange={({ target }) => choose(name, target.value)}>
      {choices.map((one) => (
        <option key={one.value} value={one.value}>
          {one.label}
        </option>
      ))}
    </select>
  )
}
