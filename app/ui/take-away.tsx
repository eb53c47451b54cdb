import { lazy, memo, Suspense, useEffect, useMemo, useRef, useState } from 'react'
import type { Choice, TakeAwayLists } from '../../lib/answers/take-away'
import { frameHtml } from '../../lib/formats/frame'
import type { Desk } from '../../lib/words/desk'
import { placePairs } from '../../lib/words/place'
import { CopyText } from './copy-text'

interface Props {
  readonly desk: Pick<Desk, 'links' | 'place' | 'scenarios'>
  readonly lists: TakeAwayLists
  readonly version: string
  readonly live: boolean
}

/** Read when somebody opens it. */
const Words = lazy(() => import('./take-away-fetched'))

/** Files, links and words of what is shown. Without scripts all of it is links. */
export const TakeAway = memo(function TakeAway({ desk, lists, version, live }: Props) {
  const query = queryOf(desk)
  const theme = desk.place.theme ? `&theme=${desk.place.theme}` : ''
  const figures = figuresOf(desk.place, lists)
  const words = useOpen()
  const home = useMemo(() => ({ version, base: lists.base }), [version, lists.base])
  return (
    <section className="take-away" aria-labelledby="take-away">
      <h2 id="take-away" className="heading">
        Take away
      </h2>
      <table className="figures">
        <thead>
          <tr>
            <th scope="col">Figures</th>
            {figures.map(({ title }) => (
              <th key={title} scope="col">
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {lists.sizes.map(({ key, label }) => (
            <tr key={key}>
              <th scope="row">{label}</th>
              {figures.map(({ title, keys }) => (
                <td key={title}>
                  <Files
                    label={`${title}, ${label}`}
                    choices={lists.figures}
                    href={(format) => `/api/figure?${query}${keys}&size=${key}&format=${format}${theme}`}
                  />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      <table>
        <tbody>
          <Row label="Table" choices={lists.tables} href={(format) => `/api/table?${query}&format=${format}`} />
          <Codes query={query} lists={lists} live={live} />
        </tbody>
        <FrameRows query={`${query}${theme}`} title={titleOf(desk)} lists={lists} live={live} />
        <tbody>
          <tr>
            <th scope="row">For programs</th>
            <td>
              <a href="/api">Interface for scripts</a>
            </td>
          </tr>
        </tbody>
      </table>
      <details ref={words.ref} onToggle={words.look}>
        <summary>Words: captions, methods, summary, press card, macros, references</summary>
        {words.open && live ? (
          <Suspense fallback={null}>
            <Words query={query} home={home} />
          </Suspense>
        ) : (
          <p>
            <a href={`/words?${query}${theme}`}>All of them on a page of their own</a>
          </p>
        )}
      </details>
    </section>
  )
})

/** Whether it is open, also where it was opened before the page came alive. */
function useOpen() {
  const ref = useRef<HTMLDetailsElement>(null)
  const [open, setOpen] = useState(false)
  const look = () => setOpen(ref.current?.open === true)
  useEffect(look, [])
  return { ref, open, look }
}

/** What a page of somebody else pastes to show the figure. */
function FrameRows({
  query,
  title,
  lists,
  live,
}: Pick<Props, 'lists' | 'live'> & { readonly query: string; readonly title: string }) {
  const base = lists.base === '' && live ? location.origin : lists.base
  const html = frameHtml(`${base}/embed?${query}`, title)
  return (
    <tbody className="text">
      <tr>
        <th scope="row">Frame for other pages</th>
        <td>
          <a href={`/embed?${query}`} rel="nofollow">
            Open
          </a>
          <CopyText title="HTML of the frame" text={html} />
        </td>
      </tr>
      <tr>
        <td colSpan={2}>
          {/* biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be within reach of the keyboard */}
          <pre className="code" tabIndex={0}>
            {html}
          </pre>
        </td>
      </tr>
    </tbody>
  )
}

const titleOf = ({ scenarios }: Props['desk']): string => scenarios.map(({ name }) => name).join(', ')
const queryOf = ({ links }: Props['desk']): string => links.data.split('?')[1] ?? ''

interface FilesProps {
  readonly label: string
  readonly choices: readonly Choice[]
  readonly href: (key: string) => string
}

function Row(props: FilesProps) {
  return (
    <tr>
      <th scope="row">{props.label}</th>
      <td>
        <Files {...props} />
      </td>
    </tr>
  )
}

function Files({ label, choices, href }: FilesProps) {
  return choices.map(({ key, label: name }) => (
    <a key={key} href={href(key)} rel="nofollow" download aria-label={`${label} as ${name}`}>
      {name}
    </a>
  ))
}

const OF_LONG = ['focus', 'time', 'from', 'to']
const OF_VIEW = ['focus', 'show', 'by', 'compare', 'galaxy', 'left', 'right']

/** Both figures of the page as they are shown, each with the keys that say so. */
function figuresOf(place: Desk['place'], { views }: TakeAwayLists) {
  const pairs = placePairs(place)
  const keysOf = (wanted: readonly string[]) =>
    pairs.flatMap(([key, value]) => (wanted.includes(key) ? [`&${key}=${encodeURIComponent(value)}`] : [])).join('')
  const view = views.find(({ key }) => key === place.view) ?? views[0]
  return [
    { title: 'Long view', keys: keysOf(OF_LONG) },
    { title: view?.label ?? '', keys: `&view=${view?.key}${keysOf(OF_VIEW)}` },
  ]
}

/** A code has to lead somewhere: where the server does not know its own address, the browser does. */
function Codes({ query, lists, live }: Pick<Props, 'lists' | 'live'> & { readonly query: string }) {
  if (lists.base === '' && !live) return <Room label={CODES} />
  const base = lists.base === '' ? `&base=${encodeURIComponent(location.origin)}` : ''
  return <Row label={CODES} choices={lists.codes} href={(format) => `/api/qr?${query}&format=${format}${base}`} />
}

const CODES = 'Link as QR code'

/** Of a row that comes later: nothing moves then. */
function Room({ label }: { readonly label: string }) {
  return (
    <tr className="absent">
      <th scope="row">{label}</th>
      <td>&nbsp;</td>
    </tr>
  )
}
