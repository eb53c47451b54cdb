/** Histories with closed forms (Bondi 1952, Cosmology; any textbook), time in Gyr from now with 1/H₀ = 14 Gyr, a = 1 now. */
import { plainEntry } from '../../lib/figures/entry'
import type { Drawn } from '../../lib/figures/long-view'
import type { Entry } from '../../lib/figures/window'
import type { Scenario } from '../../lib/scenario/scenario'
import { told } from '../words/told'

export const HUBBLE_TIME = 14

type History = (time: number) => number | null

function entry(label: string, history: History, sketch: Parameters<typeof told>[0]): Entry<Drawn> {
  const measures = { hubbleTime: HUBBLE_TIME, ...sketch.measures }
  return plainEntry(told({ label, ...sketch, measures }), (times) => times.map(history))
}

/** a = (1 + 3t/2)^(2/3): matter alone, flat. */
export function einsteinDeSitter(hubbleTime = HUBBLE_TIME): Entry<Drawn> {
  const age = (2 / 3) * hubbleTime
  const history: History = (t) => (t < -age ? null : (1 + t / age) ** (2 / 3))
  return entry('Plain dust', history, {
    origin: { time: -age },
    end: { kind: 'decelerating' },
    measures: { hubbleTime, deceleration: 0.5 },
  })
}

/** a = e^t: a cosmological constant alone. */
export function deSitter(): Entry<Drawn> {
  return entry('No beginning', (t) => Math.exp(t / HUBBLE_TIME), {
    origin: { kind: 'eternal', time: null },
    end: { kind: 'exponential' },
    measures: { deceleration: -1, asymptoticHubble: 70 },
  })
}

/** sinh^(2/3): matter and a cosmological constant, flat, Ω_m = `matter`. */
export function flatLambda(matter = 0.3, label = 'Steady light', hubbleTime = HUBBLE_TIME): Entry<Drawn> {
  const rate = (1.5 * Math.sqrt(1 - matter)) / hubbleTime
  const age = Math.asinh(Math.sqrt((1 - matter) / matter)) / rate
  const factor = (matter / (1 - matter)) ** (1 / 3)
  const history: History = (t) => (t < -age ? null : factor * Math.sinh(rate * (t + age)) ** (2 / 3))
  return entry(label, history, {
    origin: { time: -age },
    end: { kind: 'exponential' },
    measures: { hubbleTime, deceleration: -0.55, asymptoticHubble: 58.6, eventHorizon: 16.6, particleHorizon: 46 },
    moments: [['acceleration-start', -6.1]],
  })
}

/** sin^(2/3): matter and a negative cosmological constant, flat; Ω_m = 1 + `sink`. */
export function sinking(sink = 0.2, label = 'Fading light', scenario: Partial<Scenario> = {}): Entry<Drawn> {
  const rate = (1.5 * Math.sqrt(sink)) / HUBBLE_TIME
  const age = Math.asin(Math.sqrt(sink / (1 + sink))) / rate
  const factor = ((1 + sink) / sink) ** (1 / 3)
  const [turn, end] = [Math.PI / 2 / rate - age, Math.PI / rate - age]
  const history: History = (t) => (t < -age || t > end ? null : factor * Math.sin(rate * (t + age)) ** (2 / 3))
  return entry(label, history, {
    scenario,
    origin: { time: -age },
    end: { kind: 'crunch', time: end, scale: 0, turnaround: { time: turn, scale: factor } },
    measures: { deceleration: 1 },
  })
}

/** a = (1 − t/T)^(−T), T = 2/(3|1 + w|): phantom energy alone; it has no big bang of its own. */
export function phantom(w = -1.5, label = 'Gathering light'): Entry<Drawn> {
  const end = 2 / (3 * Math.abs(1 + w))
  const history: History = (t) => (t >= end * HUBBLE_TIME ? null : (1 - t / HUBBLE_TIME / end) ** -end)
  return entry(label, history, {
    origin: { kind: 'eternal', time: null },
    end: { kind: 'rip', time: end * HUBBLE_TIME },
    measures: { deceleration: -1.75 },
    moments: [['unbinding-galaxy', end * HUBBLE_TIME - 0.06]],
  })
}

/** a = cosh(t)/cosh(t₀): a cosmological constant in a closed universe, bouncing. */
export function bounce(before = 10): Entry<Drawn> {
  const least = 1 / Math.cosh(before / HUBBLE_TIME)
  return entry('There and back', (t) => least * Math.cosh((t + before) / HUBBLE_TIME), {
    origin: { kind: 'bounce', time: -before, scale: least },
    end: { kind: 'exponential' },
    measures: { deceleration: -1.2, asymptoticHubble: 60 },
  })
}

/** a = 1 + t: nothing but curvature. */
export function milne(): Entry<Drawn> {
  return entry('Empty', (t) => (t < -HUBBLE_TIME ? null : 1 + t / HUBBLE_TIME), {
    origin: { time: -HUBBLE_TIME },
    end: { kind: 'coasting' },
    measures: { deceleration: 0 },
  })
}
