/** Random scenarios of the laws that the hunt knows. */
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'
import type { Chance } from './chance'
import { FAMILY_KEYS, type OtherLaw, otherLaw } from './laws'

export interface Drawn {
  readonly code: string
  readonly family: string
  readonly scenario: Scenario
  readonly law: OtherLaw
}

const short = (x: number): number => Number(x.toPrecision(3))
const typed = (chance: Chance, x: number): number => (chance.pick([true, false]) ? short(x) : x)

const matterOf = (chance: Chance): number =>
  chance.pick([() => chance.between(0, 2), () => chance.size(1e-4, 1e4), () => 0, () => 1])()

function closureOf(chance: Chance): string {
  const signed = () => chance.pick([-1, 1]) * chance.size(1e-6, 100)
  const value = typed(chance, chance.pick([() => chance.between(-3, 3), signed])())
  return chance.pick(['', `curvature:${value}`, `dark:${value}`])
}

const lightOf = (chance: Chance): string =>
  chance.pick(['masses:0', 'cmb:0', `radiation:${typed(chance, chance.size(1e-6, 1e3))}`])

/** One legal scenario. */
export function drawn(chance: Chance): Drawn {
  for (;;) {
    const family = chance.pick(FAMILY_KEYS)
    const law = otherLaw(family, chance)
    const parts = [`matter:${typed(chance, matterOf(chance))}`, closureOf(chance), lightOf(chance), law.code]
    const code = parts.filter((part) => part !== '').join(',')
    const reading = readScenario(code, 0)
    if (reading.ok) return { code, family, scenario: reading.value, law }
  }
}
