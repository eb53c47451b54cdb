import '../styles/interface.css'
import type { Metadata } from 'next'
import { exampleCommand, exampleLink } from '../../lib/interface/examples'
import type { Route, RouteParameter } from '../../lib/interface/route'
import { ROUTES } from '../../lib/interface/routes'
import { CODE_KEYS, FAMILY_KEYS, type KeyTold } from '../../lib/interface/scenario-code'
import { typeset } from '../../lib/words/number'
import { EDITION } from '../edition'
import { Formula } from '../method/formula'
import { Footer } from '../ui/footer'
import { Masthead } from '../ui/masthead'
import { Sentence } from '../ui/symbol'
import { HOME } from './home'

export const metadata: Metadata = {
  title: 'Interface for scripts',
  description: 'How programs ask Longhence for histories, distances, tables and figures of expanding universes.',
}

/** The interface, readable: every route with its parameters and examples, and the scenario code. */
export default function Page() {
  return (
    <div className="page">
      <Masthead />
      <main className="interface">
        <h1>Interface for scripts</h1>
        <p>
          Every answer is a plain GET, but for the batch; no key is needed, and pages of any site may ask. Numbers are
          full doubles with their units beside them. What is refused comes back as a problem document (RFC 9457) that
          names the parameter, what was given and what is allowed. The same as a document for programs:{' '}
          <a href="/api/openapi.json">OpenAPI 3.1</a>, and as <a href="/longhence.d.ts">TypeScript declarations</a>.
        </p>
        <nav aria-label="Routes">
          <ul className="routes">
            {ROUTES.map(({ path, method }) => (
              <li key={path}>
                <a href={`#${anchorOf(path)}`}>
                  {method.toUpperCase()} {path}
                </a>
              </li>
            ))}
            <li>
              <a href="#code">The scenario code</a>
            </li>
          </ul>
        </nav>
        {ROUTES.map((route) => (
          <RouteSection key={route.path} route={route} />
        ))}
        <Code />
      </main>
      <Footer data={null} edition={EDITION} />
    </div>
  )
}

const anchorOf = (path: string): string => path.replace(/^\/api\//, '')

function RouteSection({ route }: { readonly route: Route }) {
  const { path, method, summary, parameters, answer, examples } = route
  return (
    <section aria-labelledby={anchorOf(path)}>
      <h2 id={anchorOf(path)}>
        <span className="method">{method.toUpperCase()}</span> {path}
      </h2>
      <p>
        {summary} Answers with {Object.keys(answer).join(', ')}.
      </p>
      {parameters.length > 0 && (
        <table className="parameters">
          <thead className="spoken">
            <tr>
              <th scope="col">Key</th>
              <th scope="col">Meaning</th>
            </tr>
          </thead>
          <tbody>
            {parameters.map((one) => (
              <Parameter key={one.name} parameter={one} />
            ))}
          </tbody>
        </table>
      )}
      {examples.map((example) => (
        <figure key={example.title} className="example">
          <figcaption>
            {method === 'get' ? <a href={exampleLink(route, example)}>{example.title}</a> : example.title}
          </figcaption>
          <pre>
            <code>{exampleCommand(route, example, HOME.base)}</code>
          </pre>
        </figure>
      ))}
    </section>
  )
}

function Parameter({ parameter }: { readonly parameter: RouteParameter }) {
  const { name, description, schema } = parameter
  const choices = Array.isArray(schema.enum) ? schema.enum.join(', ') : ''
  return (
    <tr>
      <th scope="row">
        <code>{name}</code>
      </th>
      <td>
        {name === 's' ? (
          <>
            <a href="#code">Scenario codes</a>, up to six times; the demo where there is none.
          </>
        ) : (
          description.split('`').map((part, i) => (i % 2 === 1 ? <code key={part}>{part}</code> : part))
        )}
        {choices !== '' && ` One of ${choices}.`}
        {schema.default !== undefined && <Default value={String(schema.default)} />}
      </td>
    </tr>
  )
}

function Code() {
  return (
    <section aria-labelledby="code">
      <h2 id="code">The scenario code</h2>
      <p>
        Pairs of key and value, <code>key:value</code>, joined by commas in any order; <code>as</code> comes last and
        takes the whole rest. Answers hold the canonical form: two codes are the same scenario when it is the same text.
      </p>
      <Keys keys={CODE_KEYS} />
      {FAMILY_KEYS.map(({ key, label, formula, source, keys }) => (
        <div key={key} className="family">
          <h3>
            <code>eos:{key}</code> {label}
          </h3>
          <Formula text={formula} />
          <p>{source}.</p>
          <Keys keys={keys} />
        </div>
      ))}
    </section>
  )
}

function Keys({ keys }: { readonly keys: readonly KeyTold[] }) {
  if (keys.length === 0) return null
  return (
    <table className="parameters">
      <tbody>
        {keys.map(({ key, meaning, allowed, fallback }) => (
          <tr key={key}>
            <th scope="row">
              <code>{key}</code>
            </th>
            <td>
              <Sentence text={meaning} /> Allowed: <Sentence text={typeset(allowed)} />.
              {fallback !== '' && <Default value={fallback} />}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}

/** At the end of what is said of a key. */
function Default({ value }: { readonly value: string }) {
  return (
    <>
      {' '}
      Default: <code>{value}</code>.
    </>
  )
}
