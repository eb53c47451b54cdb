/** What must not stand together in one scenario. `given` holds the typed keys with their texts. */
import type { Family } from '../dark-energy/law'
import type { ParameterValues } from '../parameter'
import type { Budget } from './budget'
import { CMB, CURVATURE, DARK, EOS, MASSES, MATTER, NU, RADIATION } from './parameters'
import { type Fault, fault } from './problems'
import type { Scenario } from './scenario'

type Given = ReadonlyMap<string, string>

export function closureFaults(given: Given): Fault[] {
  const value = given.get(DARK.key)
  if (value === undefined || !given.has(CURVATURE.key)) return []
  const message = 'dark and curvature exclude each other: the one that is left out closes the budget.'
  return [fault(DARK.key, value, 'not together with curvature', message)]
}

/** `cmb` is the temperature as read, or its default where the text was at fault. */
export function radiationFaults(given: Given, cmb: number): Fault[] {
  const replaced = [CMB, NU, MASSES].filter((one) => given.has(one.key)).map((one) => one.key)
  const value = given.get(RADIATION.key)
  if (value !== undefined) {
    const message = `radiation takes the place of ${replaced.join(' and ')}.`
    return replaced.length > 0 ? [fault(RADIATION.key, value, 'not together with cmb, nu, masses', message)] : []
  }
  if (cmb !== 0) return []
  const left = replaced.filter((key) => key !== CMB.key)
  return left.map((key) => fault(key, given.get(key) ?? '', 'not together with cmb:0', 'cmb:0 leaves out neutrinos.'))
}

/** Conditions that tie a family's parameters together; its values are all read. */
export function lawFaults(given: Given, family: Family, values: ParameterValues): Fault[] {
  const conflict = family.conflict?.(values) ?? null
  if (conflict === null) return []
  const { key, allowed } = conflict
  return [fault(key, given.get(key) ?? '', allowed, `${key} does not fit the other parameters of eos:${family.key}.`)]
}

/** A law that is defined for a positive density only. */
export function positiveFaults(given: Given, family: Family | undefined, budget: Budget): Fault[] {
  if (!family?.positive || budget.dark > 0) return []
  const density = String(Number(budget.dark.toPrecision(4)))
  const message = `eos:${family.key} needs a positive density of dark energy today, and here it is ${density}.`
  return [fault(EOS.key, given.get(EOS.key) ?? family.key, 'another law where dark energy is not positive', message)]
}

/** Massive neutrinos are part of `matter`: they cannot weigh more. */
export function weightFaults(given: Given, scenario: Scenario, budget: Budget): Fault[] {
  if (budget.coldMatter >= 0) return []
  const least = String(Number(budget.massiveNeutrinos.toPrecision(4)))
  const key = given.has(MASSES.key) && !given.has(MATTER.key) ? MASSES.key : MATTER.key
  const message =
    `matter counts massive neutrinos, and these alone have a density of ${least}, more than ${scenario.matter}. ` +
    'Give more matter, or masses:0 for massless neutrinos, or cmb:0 for none.'
  const allowed =
    key === MATTER.key ? `at least ${least} with these neutrinos` : `lighter than matter:${scenario.matter}`
  return [fault(key, given.get(key) ?? String(scenario.matter), allowed, message)]
}
