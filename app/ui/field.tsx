import type { Field } from '../../lib/words/fields'
import { Symbols } from './symbol'

/** One parameter: symbol, words, and where it is typed or chosen. */
export function FieldRow({ field }: { readonly field: Field }) {
  const id = `field-${field.name}`
  return (
    <div className={field.kind === 'closing' ? 'field closing' : 'field'}>
      <label htmlFor={id} title={field.meaning}>
        <span className="symbol">
          <Symbols markup={field.symbol} />
        </span>
        <span>
          {field.label}
          {field.kind === 'closing' && ', closes'}
        </span>
      </label>
      <Control field={field} id={id} />
    </div>
  )
}

function Control({ field, id }: { readonly field: Field; readonly id: string }) {
  switch (field.kind) {
    case 'closing':
      return (
        <span className="entry">
          <output id={id}>{field.shown}</output>
          <input type="hidden" name={field.name} value={field.value} />
        </span>
      )
    case 'choice':
      return <Choices field={field} id={id} />
    case 'text':
      return <input id={id} className="wide" name={field.name} defaultValue={field.value} maxLength={2 * field.most} />
    default:
      return (
        <span className="entry">
          <input
            id={id}
            name={field.name}
            defaultValue={field.value}
            inputMode="text"
            title={`${field.meaning} ${field.allowed}`}
          />
          <span className="unit">{field.unit}</span>
        </span>
      )
  }
}

function Choices({ field, id }: { readonly field: Extract<Field, { kind: 'choice' }>; readonly id: string }) {
  return (
    <select id={id} name={field.name} defaultValue={field.value}>
      {field.choices.map(({ value, label }) => (
        <option key={value} value={value}>
          {label}
        </option>
      ))}
    </select>
  )
}
