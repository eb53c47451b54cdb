/** What a scenario says that its author may not have meant: sentences, not errors. */
import type { Budget } from './budget'
import { BARYONS } from './parameters'
import type { Scenario } from './scenario'
import { writeScenario } from './write'

export interface Notice {
  readonly message: string
  /** The code that says what was probably meant; null where there is no telling. */
  readonly code: string | null
}

/** Radiation above this stands in the mind of whoever typed the densities. */
const SMALL = 0.01

export function noticesOf(scenario: Scenario, budget: Budget): Notice[] {
  const notices = [closingNotice(scenario, budget), baryonNotice(scenario), dustNotice(scenario)]
  return notices.filter((one) => one !== null)
}

/** The typed densities add up to 1 and leave no room for radiation, so that the closing one takes its negative. */
function closingNotice(scenario: Scenario, budget: Budget): Notice | null {
  const { closure, matter } = scenario
  const radiation = budget.photons + budget.masslessNeutrinos
  // 1e-12: far above the rounding of typed decimals, far below what anyone types as a difference.
  if (Math.abs(1 - matter - closure.value) > 1e-12 || radiation === 0 || radiation > SMALL) return null
  const effect =
    closure.given === 'dark'
      ? `the universe is slightly closed: Ω_k = ${short(budget.curvature)}`
      : `dark energy closes the budget with Ω_DE = ${short(budget.dark)} and decides the far future`
  const message = `The given densities add up to 1 without the radiation of ${short(radiation)}, so ${effect}.`
  return { message, code: writeScenario(withoutLeftover(scenario)) }
}

/** Flat, the radiation taken from dark energy; where there was to be no dark energy, without radiation. */
function withoutLeftover(scenario: Scenario): Scenario {
  const { given, value } = scenario.closure
  if (given === 'curvature') return { ...scenario, radiation: { kind: 'none' } }
  const flat: Scenario = { ...scenario, closure: { given: 'curvature', value: 0 } }
  return value === 0 ? { ...flat, radiation: { kind: 'none' } } : flat
}

/** Published tables give Ω_b near 0.05 and Ω_b h² near 0.022. */
function baryonNotice(scenario: Scenario): Notice | null {
  if (scenario.baryons <= 0.03) return null
  const physical = Number((scenario.baryons * (scenario.h0 / 100) ** 2).toPrecision(4))
  const message = `baryons is Ω_b h²; ${scenario.baryons} looks like Ω_b, which would be Ω_b h² = ${physical}.`
  const fits = physical >= BARYONS.min && physical <= 0.03
  return { message, code: fits ? writeScenario({ ...scenario, baryons: physical }) : null }
}

/** A Chaplygin gas with B < 1 behaves as dust early on; beside the usual matter there is then too much of it. */
function dustNotice(scenario: Scenario): Notice | null {
  const { b } = scenario.law
  if (scenario.eos !== 'chaplygin' || typeof b !== 'number' || b >= 1 || scenario.matter <= 0.1) return null
  const unified: Scenario = { ...scenario, matter: 0.05 }
  const message =
    'A Chaplygin gas with B below 1 carries dust of its own; as unified dark matter it stands beside baryons alone, with Ω_m near 0.05.'
  return { message, code: writeScenario(unified) }
}

const short = (x: number): string => String(Number(x.toPrecision(2))).replace('-', '−')
