/** Ten thousand scenarios in a row, as a survey of parameters computes them. */
import { subjectOf } from '../../lib/quantities/quantity'
import { measuresOf, solve } from '../../lib/solve'
import type { Benches } from './bench'
import { numbers, read } from './scenarios'

const COUNT = 10000

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
  '10,000 random scenarios whose w changes, all measures': {
    run: () => random.forEach((one) => void measuresOf(subjectOf(one))),
    aim: 1,
  },
  'the same with their moments': { run: () => random.forEach((one) => void solve(one)) },
}
