/** From a scenario code to its history, its measures and the answer that a request gets. */
import { historyAnswer } from '../../lib/answers/history'
import { historyOf } from '../../lib/history/history'
import { budgetOf } from '../../lib/scenario/budget'
import type { Scenario } from '../../lib/scenario/scenario'
import { solve } from '../../lib/solve'
import type { Benches } from './bench'
import { inTurn, MASSLESS, read, STANDARD, variants } from './scenarios'

const history = (scenario: Scenario) => historyOf(scenario, budgetOf(scenario))

const codes = Array.from({ length: 64 }, (_, i) => `h0:${67 + i / 100},${STANDARD},eos:cpl,w0:-0.8,wa:-0.9`)
const [massless, massive] = [variants(MASSLESS), variants(STANDARD)]

export const benches: Benches = {
  'read a code': { run: inTurn(codes, read) },
  'history, massless neutrinos': { run: inTurn(massless, history) },
  'history, one massive state': { run: inTurn(massive, history) },
  'history, measures, moments, massless neutrinos': { run: inTurn(massless, solve) },
  'history, measures, moments, one massive state': { run: inTurn(massive, solve) },
  'answer of /api/history as text, one massive state': {
    run: inTurn(massive, (scenario) => JSON.stringify(historyAnswer([solve(scenario)]))),
  },
}
