import type { Family } from './law'
import { powerLaw } from './power-law'

const law = powerLaw(-1)

export const lambda: Family = {
  key: 'lambda',
  label: 'cosmological constant',
  formula: 'w = −1',
  meaning: 'A density that never changes, of either sign.',
  source: 'Einstein 1917, Sitzungsberichte der Königlich Preussischen Akademie der Wissenschaften, 142',
  caution: 'That the density has not changed so far does not show that it never will.',
  parameters: [],
  law: () => law,
}
