/** Other laws of dark energy and other ends: what one server meets in a day. */
import { subjectOf } from '../../lib/quantities/quantity'
import { measuresOf, solve } from '../../lib/solve'
import type { Bench, Benches } from './bench'
import { inTurn, MASSLESS, numbers, read, STANDARD, variants } from './scenarios'

const COUNT = 10000

const solved = (code: string): Bench => ({ run: inTurn(variants(code), solve) })

function randomScenarios() {
  const between = numbers()
  return Array.from({ length: COUNT }, () => {
    const [h0, matter, w0, wa] = [between(60, 80), between(0.1, 0.5), between(-1.5, -0.5), between(-1, 0.4)]
    return read(
      `h0:${h0.toFixed(3)},matter:${matter.toFixed(5)},masses:0,eos:cpl,w0:${w0.toFixed(4)},wa:${wa.toFixed(4)}`,
    )
  })
}

const random = randomScenarios()

export const benches: Benches = {
  'bounce in the past': solved('matter:0.1,dark:2,cmb:0'),
  'turns round': solved(`${MASSLESS},dark:-0.1`),
  'ends in a rip': solved(`${STANDARD},eos:constant,w:-1.25`),
  'w changes': solved(`${STANDARD},eos:cpl,w0:-0.8,wa:-0.9`),
  'scalar field, exponential potential': solved(`${MASSLESS},eos:field,v:exponential,slope:1`),
  'scalar field, one massive state': solved(`${STANDARD},eos:field,v:exponential,slope:1`),
  'scalar field that turns round': solved(`${MASSLESS},eos:field,v:linear,slope:1`),
  '10,000 random scenarios whose w changes, all measures': {
    run: () => random.forEach((one) => void measuresOf(subjectOf(one))),
    aim: 1,
  },
  'the same with their moments': { run: () => random.forEach((one) => void solve(one)) },
}
