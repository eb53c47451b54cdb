/** Rows equally spaced in ln a, as a download of a table makes them. */
import { COLUMNS } from '../../lib/quantities/columns'
import type { Benches } from './bench'
import { FIVE, pagesOf, tableSubject } from './rows'
import { inTurn, MASSLESS, STANDARD, variants } from './scenarios'

const columns = COLUMNS.filter(({ key }) => key !== 'growth' && key !== 'growthRate')
const [massless, massive] = [variants(MASSLESS), variants(STANDARD)]

export const benches: Benches = {
  '512 rows, all columns but growth, massless neutrinos': {
    run: inTurn(massless.map(tableSubject), (subject) => pagesOf(subject, columns)),
  },
  '512 rows, all columns but growth, one massive state': {
    run: inTurn(massive.map(tableSubject), (subject) => pagesOf(subject, columns)),
  },
  '512 rows, five columns, massless neutrinos': {
    run: inTurn(massless.map(tableSubject), (subject) => pagesOf(subject, FIVE)),
  },
  'history and 512 rows, massless neutrinos': {
    run: inTurn(massless, (scenario) => pagesOf(tableSubject(scenario), columns)),
    aim: 150e-6,
  },
  'history and 512 rows, one massive state': {
    run: inTurn(massive, (scenario) => pagesOf(tableSubject(scenario), columns)),
    aim: 250e-6,
  },
}
