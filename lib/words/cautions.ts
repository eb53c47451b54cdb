/** What has to be known beside the numbers, each once. */

export interface Caution {
  readonly key: string
  readonly title: string
  readonly text: string
}

export const CAUTIONS: readonly Caution[] = [
  {
    key: 'future',
    title: 'Beyond today',
    text: 'Laws of dark energy describe the past. Followed into the future they are assumptions: beyond:hold shows what becomes of the universe where w stays as it is today.',
  },
  {
    key: 'acoustic',
    title: 'Comparing laws of dark energy',
    text: 'With H_0 and Ω_m held, another law of dark energy moves the acoustic angle by more than its measured 0.03%. Retune H_0 to keep the angle, where the comparison is to agree with the microwave background.',
  },
  {
    key: 'bound',
    title: 'Bound systems',
    text: 'Galaxies, stars and rulers do not expand. What recedes is what nothing binds together.',
  },
  {
    key: 'unbinding',
    title: 'When systems come apart',
    text: 'The moments before a rip are orders of magnitude: they solve ä/a = (2π/P)², and a circular orbit loses its bound state already at (27/256)(2π/P)², about three times as long before the rip.',
  },
  {
    key: 'recombination',
    title: 'Recombination and sound',
    text: 'Last scattering, the drag epoch and the sound horizon are fits for the standard early universe, with T_{CMB} from 2.70 to 2.75 K, N_{eff} from 2 to 4.5, Ω_b h² from 0.015 to 0.03 and Ω_m h² from 0.08 to 0.25. Outside there is no number but a reason. Where dark energy exceeds 1% at last scattering they are doubtful inside, too.',
  },
  {
    key: 'neutrinos',
    title: 'Neutrinos',
    text: 'Three states share N_{eff} and one temperature. Those with mass count as matter with their full energy, Ω_m holds them, and cold matter is Ω_m without them.',
  },
  {
    key: 'closing',
    title: 'The budget',
    text: 'All densities add up to 1, so that one of them follows from the others. Radiation is part of the sum: matter:0.3,dark:0.7 is a slightly closed universe.',
  },
  {
    key: 'antipode',
    title: 'Closed space',
    text: 'The antipode of a closed space lies at a comoving distance of πR_k. Beyond it distances across the line of sight shrink again, the comoving volume is that of all space, and a horizon takes in the whole of it.',
  },
  {
    key: 'smooth',
    title: 'What is left out',
    text: 'The universe is homogeneous and isotropic, its components act on each other through gravity alone, dark energy does not cluster, and growth is linear and well inside the horizon.',
  },
  {
    key: 'error',
    title: 'Error bounds',
    text: 'A stated error bounds the numerical error of a value for exactly the typed parameters. How uncertain these are is another question.',
  },
  {
    key: 'units',
    title: 'Units and constants',
    text: 'A year is the Julian year, a light year is made of it, a parsec is that of the IAU (2015); the speed of light is exact, other constants are CODATA 2018, the mass of the sun is the nominal G M☉ of the IAU (2015).',
  },
]
