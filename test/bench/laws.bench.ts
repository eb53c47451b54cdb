/** Other laws of dark energy and other ends: what one server meets in a day. */
import { solve } from '../../lib/solve'
import type { Bench, Benches } from './bench'
import { inTurn, MASSLESS, STANDARD, variants } from './scenarios'

const solved = (code: string): Bench => ({ run: inTurn(variants(code), solve) })

export const benches: Benches = {
  'bounce in the past': solved('matter:0.1,dark:2,cmb:0'),
  'turns round': solved(`${MASSLESS},dark:-0.1`),
  'ends in a rip': solved(`${STANDARD},eos:constant,w:-1.25`),
  'w changes': solved(`${STANDARD},eos:cpl,w0:-0.8,wa:-0.9`),
  'scalar field, exponential potential': solved(`${MASSLESS},eos:field,v:exponential,slope:1`),
  'scalar field, one massive state': solved(`${STANDARD},eos:field,v:exponential,slope:1`),
  'scalar field that turns round': solved(`${MASSLESS},eos:field,v:linear,slope:1`),
}
