/** The form of a scenario: what a person may type, in groups, and what closes the budget. */
import { FAMILIES, familyOf } from '../dark-energy'
import type { Family } from '../dark-energy/law'
import type { NumberParameter, Parameter, ParameterValue } from '../parameter'
import type { Budget } from '../scenario/budget'
import { isUsed } from '../scenario/family-keys'
import * as own from '../scenario/parameters'
import type { Scenario } from '../scenario/scenario'
import { significant } from './number'

export interface Choice {
  readonly value: string
  readonly label: string
}

interface Described {
  readonly name: string
  readonly symbol: string
  readonly label: string
  readonly meaning: string
  readonly value: string
  /** Its entry on the page of methods. */
  readonly means: string | null
}

export type Field =
  | (Described & {
      readonly kind: 'number'
      readonly unit: string
      readonly allowed: string
      readonly slider: NumberParameter['slider']
      /** What holds where nothing is typed; null where that follows from the other fields. */
      readonly usual: string | null
    })
  | (Described & { readonly kind: 'list'; readonly unit: string; readonly allowed: string })
  | (Described & { readonly kind: 'choice'; readonly choices: readonly Choice[] })
  | (Described & { readonly kind: 'text'; readonly most: number })
  /** Follows from the others: shown, and carried in full so that another choice of what closes changes nothing. */
  | (Described & { readonly kind: 'closing'; readonly shown: string })

export interface FieldGroup {
  readonly key: string
  readonly title: string
  /** Seldom changed: folded until asked for. */
  readonly folded: boolean
  readonly fields: readonly Field[]
  /** Beside the group: the law in a formula, and how far it can be trusted. */
  readonly family: Pick<Family, 'key' | 'formula' | 'meaning' | 'caution' | 'source'> | null
}

export interface Form {
  readonly groups: readonly FieldGroup[]
  /** What the choices of the form would need that are not made now. */
  readonly hidden: readonly { readonly name: string; readonly value: string }[]
}

/** Names of the form's own choices, which are not keys of the scenario code. */
export const CLOSES = 'closes'
export const LIGHT = 'light'
/** The law before it was changed. */
export const WAS = 'was'

const CLOSING: readonly Choice[] = [
  { value: 'dark', label: 'dark energy' },
  { value: 'curvature', label: 'curvature' },
]
const LIGHTS: readonly Choice[] = [
  { value: 'thermal', label: 'photons and neutrinos' },
  { value: 'given', label: 'given by its density' },
  { value: 'none', label: 'none' },
]

export function formOf(scenario: Scenario, budget: Budget): Form {
  const family = familyOf(scenario.eos)
  const { key, formula, meaning, caution, source } = family
  const groups = [
    group('densities', 'Densities today', densityFields(scenario, budget)),
    group('rate', 'Expansion rate', [numberField(own.H0, scenario.h0)]),
    {
      ...group('dark', 'Dark energy', darkFields(scenario, family)),
      family: { key, formula, meaning, caution, source },
    },
    { ...group('light', 'Radiation, neutrinos, baryons', lightFields(scenario)), folded: true },
    group('name', 'Name', [nameField(scenario)]),
  ]
  return { groups, hidden: hiddenFields(scenario, budget) }
}

function group(key: string, title: string, fields: readonly Field[]): FieldGroup {
  return { key, title, fields, folded: false, family: null }
}

function densityFields({ matter, closure }: Scenario, budget: Budget): Field[] {
  const dark = closure.given === 'dark' ? numberField(own.DARK, closure.value) : closingField(own.DARK, budget.dark)
  const curvature =
    closure.given === 'curvature'
      ? numberField(own.CURVATURE, closure.value)
      : closingField(own.CURVATURE, budget.curvature)
  const closes = closure.given === 'dark' ? 'curvature' : 'dark'
  return [
    numberField(own.MATTER, matter),
    dark,
    curvature,
    choiceField(
      CLOSES,
      'closes the budget',
      'What is left to make the densities add up to 1.',
      closes,
      CLOSING,
      'caution-closing',
    ),
  ]
}

function darkFields(scenario: Scenario, family: Family): Field[] {
  const choices = FAMILIES.map(({ key, label }) => ({ value: key, label }))
  const used = family.parameters.filter((one) => isUsed(one, scenario.law) === true)
  return [
    choiceField(own.EOS.key, own.EOS.label, own.EOS.meaning, scenario.eos, choices, 'parameter-eos'),
    ...used.map((one) => ({ ...familyField(one, scenario.law[one.key]), means: `law-${family.key}-${one.key}` })),
    ...(family.parameters.length === 0
      ? []
      : [
          choiceField(
            own.BEYOND.key,
            own.BEYOND.label,
            own.BEYOND.meaning,
            scenario.beyond,
            own.BEYOND.choices,
            'parameter-beyond',
          ),
        ]),
  ]
}

function familyField(parameter: Parameter, value: ParameterValue | undefined): Field {
  if (parameter.kind !== 'choice') return numberField(parameter, value ?? '')
  return choiceField(parameter.key, parameter.label, parameter.meaning, String(value), parameter.choices)
}

function lightFields({ radiation, baryons }: Scenario): Field[] {
  const meaning = 'What of light and neutrinos there is today.'
  return [
    choiceField(LIGHT, 'radiation', meaning, radiation.kind, LIGHTS),
    ...radiationFields(radiation),
    numberField(own.BARYONS, baryons),
  ]
}

function radiationFields(radiation: Scenario['radiation']): Field[] {
  if (radiation.kind === 'none') return []
  if (radiation.kind === 'given') return [numberField(own.RADIATION, radiation.density)]
  const masses = radiation.masses.length > 0 ? radiation.masses : [0]
  return [numberField(own.CMB, radiation.cmb), numberField(own.NU, radiation.nu), numberField(own.MASSES, masses)]
}

function nameField({ name }: Scenario): Field {
  const { key, symbol, label, meaning, most } = own.AS
  return { kind: 'text', name: key, symbol, label, meaning, value: name ?? '', most, means: `parameter-${key}` }
}

type Numeric = Pick<
  Exclude<Parameter, { kind: 'choice' }>,
  'key' | 'symbol' | 'label' | 'meaning' | 'unit' | 'min' | 'max'
> &
  (
    | { readonly kind: 'list' }
    | (Pick<NumberParameter, 'kind' | 'slider'> & { readonly fallback: NumberParameter['fallback'] | null })
  )

function numberField(parameter: Numeric, value: ParameterValue): Field {
  const { key, symbol, label, meaning, min, max } = parameter
  const unit = unitText(parameter.unit)
  const text = typeof value === 'object' ? value.join('; ') : String(value)
  const allowed = `${min} to ${max}`.replaceAll('-', '−')
  const field = { name: key, symbol, label, meaning, unit, value: text, allowed, means: `parameter-${key}` }
  return parameter.kind === 'number'
    ? {
        ...field,
        kind: 'number',
        slider: parameter.slider,
        usual: parameter.fallback === null ? null : String(parameter.fallback),
      }
    : { ...field, kind: 'list' }
}

/** As the measures have it: `km s⁻¹ Mpc⁻¹` is `km/s/Mpc`. */
export function unitText(unit: string): string {
  return unit.replace(/ (\p{L}+)⁻¹/gu, '/$1')
}

function closingField(parameter: Numeric, value: number): Field {
  const { key, symbol, label, meaning } = parameter
  const shown = significant(value, 4)
  return { kind: 'closing', name: key, symbol, label, meaning, value: String(value), shown, means: `parameter-${key}` }
}

function choiceField(
  name: string,
  label: string,
  meaning: string,
  value: string,
  choices: readonly Choice[],
  means: string | null = null,
): Field {
  return { kind: 'choice', name, symbol: '', label, meaning, value, choices, means }
}

function hiddenFields({ radiation, eos }: Scenario, budget: Budget): Form['hidden'] {
  const was = { name: WAS, value: eos }
  if (radiation.kind === 'given') return [was]
  const massless = budget.photons + budget.masslessNeutrinos
  return [was, { name: own.RADIATION.key, value: String(Number(massless.toPrecision(4))) }]
}
