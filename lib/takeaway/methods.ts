/** What was assumed and computed, in sentences for the section on methods. */
import { familyOf } from '../dark-energy'
import type { Parameter, ParameterValue } from '../parameter'
import { isUsed } from '../scenario/family-keys'
import type { Scenario } from '../scenario/scenario'
import type { Solution } from '../solve'
import { variesAhead } from '../words/beyond'
import { joined } from '../words/sentence'
import { publicationsIn } from './bibliography'
import type { Edition } from './sources'

export function methodsOf({ scenario, code, measures, budget }: Solution, { version, engine }: Edition): string {
  const fits = ['recombinationRedshift', 'dragRedshift', 'soundHorizonDrag'] as const
  return [
    `We integrate the Friedmann equation (Friedmann 1922) for a homogeneous and isotropic universe with ${joined(inputs(scenario))}.`,
    budget.dark === 0 ? 'There is no dark energy.' : lawSentence(scenario),
    fits.every((key) => measures[key].value !== null)
      ? 'Last scattering, the drag epoch and the sound horizon follow Hu & Sugiyama (1996), Aizpuru, Arjona & Nesseris (2021) and Eisenstein & Hu (1998).'
      : '',
    `Distances and horizons are defined as in Hogg (1999) and Davis & Lineweaver (2004).`,
    `The numbers are those of Longhence ${version}, engine ${engine} (The Longhence authors 2026), for the scenario ${code}.`,
  ]
    .filter((sentence) => sentence !== '')
    .join(' ')
}

function inputs({ h0, matter, closure, radiation }: Scenario): string[] {
  return [
    `H_0 = ${minus(h0)} km s⁻¹ Mpc⁻¹`,
    `Ω_m = ${minus(matter)}`,
    closure.given === 'dark'
      ? `Ω_DE = ${minus(closure.value)} (curvature closes the budget)`
      : closure.value === 0
        ? 'flat space'
        : `Ω_k = ${minus(closure.value)}`,
    ...lightOf(radiation),
  ]
}

function lightOf(radiation: Scenario['radiation']): string[] {
  if (radiation.kind === 'none') return ['no radiation']
  if (radiation.kind === 'given') return [`Ω_r = ${minus(radiation.density)}`]
  const { cmb, nu, masses } = radiation
  const massive = masses.length === 0 ? 'massless neutrinos' : `neutrino masses of ${masses.map(String).join(', ')} eV`
  return [`T_CMB = ${cmb} K`, `N_eff = ${nu}`, massive]
}

function lawSentence(scenario: Scenario): string {
  const family = familyOf(scenario.eos)
  const used = family.parameters.filter((one) => isUsed(one, scenario.law) === true)
  const values = used.map((one) => valueText(one, scenario.law[one.key]))
  const cites = publicationsIn(family.source).map(({ cite }) => cite)
  const law = `Dark energy ${family.clause ?? `follows ${family.formula}`}${values.length > 0 ? ` with ${joined(values)}` : ''} (${cites.join('; ')})`
  if (!variesAhead({ ...scenario, beyond: 'follow' })) return `${law}.`
  return scenario.beyond === 'hold' ? `${law}; after today w keeps its value.` : `${law}, in the future too.`
}

function valueText(one: Parameter, value: ParameterValue | undefined): string {
  if (typeof value === 'string')
    return one.kind === 'choice' ? (one.choices.find((choice) => choice.value === value)?.label ?? value) : value
  const text = typeof value === 'number' ? minus(value) : (value ?? []).map(minus).join(', ')
  return `${one.symbol} = ${text}${one.unit && ` ${one.unit}`}`
}

const minus = (value: number): string => String(value).replace('-', '−')
