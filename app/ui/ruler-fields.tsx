import type { Shelf } from '../../lib/answers/shelf'
import type { RulerAsk } from '../../lib/words/ruler-ask'
import type { RulerField, RulerTyped } from '../../lib/words/ruler-typed'
import type { RulerHand } from './ruler'

interface Props {
  readonly ask: RulerAsk
  readonly shelf: Shelf
  readonly complaints: RulerTyped['complaints']
  readonly hand: RulerHand | null
}

/** Where the epochs are typed, and the length, the line and the area that some readings need. */
export function RulerFields({ ask, shelf, complaints, hand }: Props) {
  const lengths = ask.hubble ? 'h⁻¹ Mpc' : 'Mpc'
  const variable = shelf.epochs.find(({ key }) => key === ask.variable)
  const unit = variable?.unit === 'Mpc' ? lengths : (variable?.unit ?? '')
  const field = (key: RulerField, label: string, unit: string) => (
    <TextField field={key} label={label} unit={unit} ask={ask} complaints={complaints} hand={hand} />
  )
  return (
    <>
      <div className="field">
        <label htmlFor="ruler-epoch">epoch given by</label>
        <select
          id="ruler-epoch"
          name="epoch"
          {...(hand
            ? {
                value: ask.variable,
                onChange: ({ target }) => hand.ask({ variable: target.value as RulerAsk['variable'] }),
              }
            : { defaultValue: ask.variable })}
        >
          {shelf.epochs.map(({ key, label }) => (
            <option key={key} value={key}>
              {label}
            </option>
          ))}
        </select>
      </div>
      {field('at', variable?.label ?? '', unit)}
      {field('until', 'second epoch, if any', unit)}
      {field('sky', 'sky area', 'deg²')}
      {field('line', 'line at rest', '')}
      {field('length', 'length, for angles and recession', lengths)}
      <Tick
        name="units"
        value="h"
        ticked={ask.hubble}
        label="lengths in units with h⁻¹"
        tick={hand && ((hubble) => hand.ask({ hubble }))}
      />
    </>
  )
}

interface TextProps extends Omit<Props, 'shelf'> {
  readonly field: RulerField
  readonly label: string
  readonly unit: string
}

function TextField({ field, label, unit, ask, complaints, hand }: TextProps) {
  const id = `ruler-${field}`
  const complaint = hand ? hand.complaintOf(field) : complaints[field]
  return (
    <div className="field">
      <label htmlFor={id}>{label}</label>
      <span className="entry">
        <input
          id={id}
          name={field}
          aria-invalid={complaint ? true : undefined}
          aria-describedby={complaint ? `${id}-complaint` : undefined}
          {...(hand ? typing(field, hand) : { defaultValue: ask[field] })}
        />
        <span className="unit">{unit}</span>
      </span>
      {/* It may change with every key, and is not to interrupt. */}
      <p id={`${id}-complaint`} className="complaint" role="status">
        {complaint}
      </p>
    </div>
  )
}

/** Every keystroke that can be read is asked at once; Escape takes back what cannot. */
const typing = (field: RulerField, hand: RulerHand) => ({
  value: hand.textOf(field),
  onChange: ({ target }: { readonly target: HTMLInputElement }) => hand.type(field, target.value),
  onBlur: () => hand.leave(field),
  onKeyDown: ({ key }: { readonly key: string }) => {
    if (key === 'Enter') hand.leave(field)
    if (key === 'Escape') hand.drop(field)
  },
})

export function ReadingChoices({ ask, shelf, hand }: Omit<Props, 'complaints'>) {
  const choose = (key: string, chosen: boolean) => {
    const order = shelf.readings.flatMap(({ choices }) => choices.map((one) => one.key))
    hand?.ask({ read: order.filter((one) => (one === key ? chosen : ask.read.includes(one))) })
  }
  return (
    <details className="group">
      <summary>Choose the readings</summary>
      <div className="reading-choices">
        {shelf.readings.map(({ title, choices }) => (
          <fieldset key={title}>
            <legend>{title}</legend>
            {choices.map(({ key, label }) => (
              <Tick
                key={key}
                name="read"
                value={key}
                ticked={ask.read.includes(key)}
                label={label}
                tick={hand && ((chosen) => choose(key, chosen))}
              />
            ))}
          </fieldset>
        ))}
      </div>
    </details>
  )
}

interface TickProps {
  readonly name: string
  readonly value: string
  readonly label: string
  readonly ticked: boolean
  readonly tick: ((ticked: boolean) => void) | null
}

function Tick({ name, value, label, ticked, tick }: TickProps) {
  return (
    <label className="tick">
      <input
        type="checkbox"
        name={name}
        value={value}
        {...(tick
          ? { checked: ticked, onChange: ({ target }: { readonly target: HTMLInputElement }) => tick(target.checked) }
          : { defaultChecked: ticked })}
      />
      {label}
    </label>
  )
}
