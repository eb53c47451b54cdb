/**
 * Units and meanings in the words of the virtual observatory: VOUnits 1.1 (IVOA Recommendation of 15 December 2023) and
 * UCD1+ (controlled vocabulary 1.4, IVOA 2021; the words are given from memory).
 */

/** From the units of columns. */
const UNITS: Readonly<Record<string, string>> = {
  '': '1',
  Gyr: 'Gyr',
  Gly: 'Glyr',
  Mpc: 'Mpc',
  kpc: 'kpc',
  'Gpc³': 'Gpc**3',
  'km/s/Mpc': 'km.s**-1.Mpc**-1',
  mag: 'mag',
  K: 'K',
  'kg/m³': 'kg.m**-3',
  'cm/s per year': 'cm.s**-1.yr**-1',
}

/** Columns for which the vocabulary has a word. */
const UCDS: Readonly<Record<string, string>> = {
  time: 'time.interval',
  age: 'time.age',
  lookback: 'time.interval',
  redshift: 'src.redshift',
  comoving: 'pos.distance',
  transverse: 'pos.distance',
  angular: 'pos.distance',
  luminosity: 'pos.distance',
  modulus: 'phot.mag.distMod',
  volume: 'phys.volume',
  particleHorizon: 'pos.distance',
  eventHorizon: 'pos.distance',
  hubbleRadius: 'pos.distance',
  temperature: 'phys.temperature',
  criticalDensity: 'phys.density',
}

/** Throws for a unit that nobody has translated: a new column's unit belongs into the list. */
export function vounitOf(unit: string): string {
  const known = UNITS[unit]
  if (known === undefined) throw new RangeError(`the unit ${unit} has no VOUnit`)
  return known
}

export const ucdOf = (key: string): string | undefined => (Object.hasOwn(UCDS, key) ? UCDS[key] : undefined)
