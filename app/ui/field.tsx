import { memo } from 'react'
import type { Field } from '../../lib/words/fields'
import type { Draft, Hand } from '../live/use-editing'
import { Means } from './means'
import { Slider } from './slider'
import { Sentence, Symbols } from './symbol'

interface Props {
  readonly field: Field
  readonly draft: Draft | undefined
  readonly hand: Hand
  readonly live: boolean
}

/** Fields are read anew from every address, and a hand changes one or two of them. */
const isSame = (one: Props, other: Props): boolean =>
  one.draft === other.draft &&
  one.hand === other.hand &&
  one.live === other.live &&
  JSON.stringify(one.field) === JSON.stringify(other.field)

/** One parameter: symbol, words, where it is typed or chosen, and where it is dragged. */
export const FieldRow = memo(function FieldRow(props: Props) {
  const { field, draft, hand } = props
  const id = `field-${field.name}`
  const complaint = draft?.complaint ?? null
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
      <Control id={id} {...props} />
      {complaint && (
        <p id={`${id}-complaint`} className="complaint" role="alert">
          {complaint}
        </p>
      )}
      {field.kind === 'number' && (
        <span className="track">
          <Slider field={field} drag={hand.drag} />
        </span>
      )}
    </div>
  )
}, isSame)

interface ControlProps extends Props {
  readonly id: string
}

function Control({ field, id, draft, hand, live }: ControlProps) {
  switch (field.kind) {
    case 'closing':
      return (
        <span className="entry">
          {/* It changes with every turn of a slider. */}
          <output id={id} aria-live="off">
            {field.shown}
          </output>
          <input type="hidden" name={field.name} value={field.value} />
        </span>
      )
    case 'choice':
      return <Choices field={field} id={id} choose={hand.choose} />
    case 'text':
      return <input className="wide" maxLength={2 * field.most} {...typed(field, id, draft, hand)} />
    default:
      return (
        <span className="entry">
          <input inputMode="text" title={field.allowed} {...typed(field, id, draft, hand)} />
          <span className="unit">
            <Sentence text={field.unit} />
            {field.kind === 'number' && <Reset field={field} choose={hand.choose} live={live} />}
          </span>
        </span>
      )
  }
}

interface ResetProps {
  readonly field: Extract<Field, { kind: 'number' }>
  readonly choose: Hand['choose']
  readonly live: boolean
}

/** Back to what holds where nothing is typed. */
function Reset({ field: { name, label, value, usual }, choose, live }: ResetProps) {
  if (usual === null || usual === value) return null
  return (
    <button
      type="button"
      className={live ? 'reset' : 'reset absent'}
      aria-label={`Reset ${label} to ${usual}`}
      onClick={() => choose(name, '')}
    >
      reset
    </button>
  )
}

/** What is typed is taken over on Enter and on leaving the field; Escape takes it back. */
function typed({ name, value }: Field, id: string, draft: Draft | undefined, { type, commit, drop }: Hand) {
  const wrong = draft !== undefined && draft.complaint !== null
  return {
    id,
    name,
    value: draft?.text ?? value,
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
  readonly choose: Hand['choose']
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
