import type { RulerView } from '../../lib/answers/ruler-view'
import type { Shelf } from '../../lib/answers/shelf'
import type { Desk } from '../../lib/words/desk'
import { type Place, RULER_KEYS } from '../../lib/words/place'
import { type RulerAsk, rulerAskOf } from '../../lib/words/ruler-ask'
import type { RulerField } from '../../lib/words/ruler-typed'
import { ReadingChoices, RulerFields } from './ruler-fields'
import { RulerTable } from './ruler-table'
import { Sentence } from './symbol'

/** What takes over in the browser; null on the server, where the form is a plain one. */
export interface RulerHand {
  readonly textOf: (field: RulerField) => string
  readonly complaintOf: (field: RulerField) => string | undefined
  readonly type: (field: RulerField, text: string) => void
  readonly leave: (field: RulerField) => void
  readonly drop: (field: RulerField) => void
  readonly ask: (changed: Partial<RulerAsk>) => void
}

interface Props {
  readonly desk: Pick<Desk, 'scenarios' | 'placeFields'> & { readonly place: Place }
  readonly view: RulerView
  readonly shelf: Shelf
  readonly hand: RulerHand | null
  /** That something is still on its way, or why it does not come. */
  readonly state?: string | null
}

/** So many columns have room beside the form. */
const BESIDE = 3

/** An epoch in any variable, and what is read there in every scenario. */
export function Ruler({ desk, view, shelf, hand, state = null }: Props) {
  const ask = rulerAskOf(desk.place)
  const own: readonly string[] = RULER_KEYS
  return (
    <section className={view.scenarios.length > BESIDE ? 'ruler many' : 'ruler'} aria-labelledby="ruler">
      <h2 id="ruler" className="heading">
        Ruler
      </h2>
      <form
        className="ruler-form"
        action="/compose/ruler"
        method="get"
        autoComplete="off"
        onSubmit={hand ? (event) => event.preventDefault() : undefined}
      >
        {desk.scenarios.map((one) => (
          <input key={one.slot} type="hidden" name="s" value={one.plainCode} />
        ))}
        {desk.placeFields
          .filter(([key]) => !own.includes(key))
          .map(([key, value]) => (
            <input key={key} type="hidden" name={key} value={value} />
          ))}
        <RulerFields ask={ask} shelf={shelf} complaints={view.complaints} hand={hand} />
        <ReadingChoices ask={ask} shelf={shelf} hand={hand} />
        {!hand && (
          <button type="submit" className="unscripted">
            Read
          </button>
        )}
      </form>
      <Readings view={view} state={state} {...captionsOf(ask, shelf)} />
    </section>
  )
}

interface Captions {
  readonly here: string
  readonly there: string
}

/** `At redshift 1.9`, `Between redshift 1.9 and 2.1`. */
function captionsOf({ variable, at, until, hubble }: RulerAsk, { epochs }: Shelf): Captions {
  const { label = '', unit = '' } = epochs.find(({ key }) => key === variable) ?? {}
  const units = unit && ` ${hubble && unit === 'Mpc' ? 'h⁻¹ ' : ''}${unit}`
  const shown = (text: string) => text.replace(/^-/, '−')
  return {
    here: `At ${label} ${shown(at)}${units}`,
    there: `Between ${label} ${shown(at)} and ${shown(until)}${units}`,
  }
}

interface ReadingsProps extends Captions {
  readonly view: RulerView
  readonly state: string | null
}

/** The first reading, for those who do not see the others change. */
function spokenOf({ at: [first], scenarios }: RulerView, here: string): string {
  if (!first) return here
  const cells = first.cells.map((cell, i) => `${scenarios.length > 1 ? `${scenarios[i]?.name} ` : ''}${cell ?? 'none'}`)
  return `${here}: ${first.label} ${cells.join(', ')} ${first.unit}`
}

function Readings({ view, state, here, there }: ReadingsProps) {
  const { at, between, notes, downloads } = view
  if (at.length === 0 && between.length === 0) {
    return <p className="readings because">Nothing is read: choose readings, or correct the field that is marked.</p>
  }
  return (
    <div className="readings" aria-busy={state ? true : undefined}>
      <p className="state-of-readings" role="status">
        {state}
      </p>
      <p className="spoken" role="status">
        {state ? '' : spokenOf(view, here)}
      </p>
      {at.length > 0 && <RulerTable view={view} rows={at} of="reading" caption={here} />}
      {between.length > 0 && <RulerTable view={view} rows={between} of="between" caption={there} />}
      {notes.map((note) => (
        <p key={note} className="because">
          <Sentence text={note} />
        </p>
      ))}
      <p className="because downloads">
        These readings in full{' '}
        {downloads.map(({ format, link }) => (
          <a key={format} href={link} rel="nofollow" download aria-label={`Readings as ${format}`}>
            {format}
          </a>
        ))}
      </p>
    </div>
  )
}
