/** Addresses of the page: the scenarios, and what is said beside them. */
import type { Scenario } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { type Place, placeKeys } from './place'

export function pageLink(scenarios: readonly Scenario[], place: Place): string {
  return `/?${[linkQuery(scenarios), ...placeKeys(place)].filter((part) => part !== '').join('&')}`
}
