/** Whatever the scenario code allows can be shown: words without holes, drawings without NaN. */
import fc from 'fast-check'
import { expect, it } from 'vitest'
import { explorer } from '../../lib/answers/explorer'
import { VIEWS } from '../../lib/figures/views'

/** As people type them: six decimals. */
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true }).map((x) => Number(x.toFixed(6)))
const wild = (min: number, max: number, tame: readonly [number, number]) =>
  fc.oneof({ weight: 3, arbitrary: between(...tame) }, { weight: 1, arbitrary: between(min, max) })

const law = fc.oneof(
  fc.constant(''),
  wild(-20, 20, [-1.6, 0.2]).map((w) => `,eos:constant,w:${w}`),
  fc
    .tuple(wild(-20, 20, [-1.5, 0]), wild(-20, 20, [-2, 1]), fc.constantFrom('', ',beyond:hold'))
    .map(([w0, wa, beyond]) => `,eos:cpl,w0:${w0},wa:${wa}${beyond}`),
)
const code = fc
  .tuple(
    wild(1, 1000, [50, 90]),
    wild(0, 10000, [0, 1.5]),
    fc.oneof(
      wild(-100, 100, [-1, 1]).map((k) => `,curvature:${k}`),
      wild(-100, 100, [-1, 2]).map((dark) => `,dark:${dark}`),
    ),
    fc.constantFrom(',masses:0', ',cmb:0', ',radiation:0.001'),
    law,
  )
  .map(([h0, matter, closure, light, eos]) => `h0:${h0},matter:${matter}${closure}${light}${eos}`)

/** Every view, in all that it shows, against all that it knows. */
const place = fc
  .constantFrom(
    ...VIEWS.flatMap(({ key: view, shows }) =>
      shows.flatMap(({ key: show, by, compare }) =>
        by.flatMap((axis) => ['value', ...compare].map((how) => ({ view, show, by: axis, compare: how }))),
      ),
    ),
  )
  .chain((view) =>
    fc.record({ time: fc.constantFrom('log', ''), galaxy: wild(0, 1e4, [0.1, 4]).map(String) }).map((more) => ({
      ...view,
      ...more,
    })),
  )

it('shows every legal scenario in every view', { timeout: 240_000 }, () => {
  fc.assert(
    fc.property(fc.array(code, { minLength: 1, maxLength: 3 }), place, (codes, keys) => {
      const view = explorer({ codes, keys: new Map(Object.entries(keys)) })
      for (const problem of view.refusal?.problems ?? []) expect(problem.message).toContain('no solution')
      const { long, panel, ...words } = view
      expect(JSON.stringify(words)).not.toMatch(/NaN|undefined|Infinity/)
      expect(JSON.stringify([panel.notes, panel.tabs, panel.choices])).not.toMatch(/NaN|undefined|Infinity/)
      for (const { pictures } of [long.figure, panel.figure])
        for (const { attributes, parts } of pictures)
          expect([...Object.values(attributes), ...parts].join(' ')).not.toMatch(/NaN|undefined|Infinity/)
      for (const { x, y } of [long.figure, panel.figure])
        for (const { from, to } of [x, y]) expect(to).toBeGreaterThan(from)
      expect(long.figure.curves).toHaveLength(view.scenarios.length)
    }),
    { numRuns: 60 },
  )
})
