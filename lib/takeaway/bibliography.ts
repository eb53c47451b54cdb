/** The publications that sources name, for BibTeX. Titles are given from memory. */
import { tex } from '../formats/tex'

export interface Publication {
  /** As a source names it: authors and year. */
  readonly cite: string
  readonly author: string
  readonly title: string
  readonly journal?: string
  readonly volume?: string
  readonly pages?: string
  readonly eprint?: string
}

type Row = readonly [
  cite: string,
  author: string,
  title: string,
  journal: string,
  volume: string,
  pages: string,
  eprint?: string,
]

const PRD = 'Physical Review D'
const PRL = 'Physical Review Letters'
const PLB = 'Physics Letters B'
const APJ = 'The Astrophysical Journal'
const MNRAS = 'Monthly Notices of the Royal Astronomical Society'

const ARTICLES: readonly Row[] = [
  ['Friedmann 1922', 'Friedmann, A.', 'Über die Krümmung des Raumes', 'Zeitschrift für Physik', '10', '377'],
  ['Hogg 1999', 'Hogg, D. W.', 'Distance measures in cosmology', '', '', '', 'astro-ph/9905116'],
  [
    'Davis & Lineweaver 2004',
    'Davis, T. M. and Lineweaver, C. H.',
    'Expanding Confusion: Common Misconceptions of Cosmological Horizons and the Superluminal Expansion of the Universe',
    'Publications of the Astronomical Society of Australia',
    '21',
    '97',
    'astro-ph/0310808',
  ],
  [
    'Chevallier & Polarski 2001',
    'Chevallier, M. and Polarski, D.',
    'Accelerating universes with scaling dark matter',
    'International Journal of Modern Physics D',
    '10',
    '213',
  ],
  ['Linder 2003', 'Linder, E. V.', 'Exploring the Expansion History of the Universe', PRL, '90', '091301'],
  [
    'Jassal, Bagla & Padmanabhan 2005',
    'Jassal, H. K. and Bagla, J. S. and Padmanabhan, T.',
    'WMAP constraints on low redshift evolution of dark energy',
    MNRAS,
    '356',
    'L11',
  ],
  [
    'Barboza & Alcaniz 2008',
    'Barboza, E. M. and Alcaniz, J. S.',
    'A parametric model for dark energy',
    PLB,
    '666',
    '415',
  ],
  [
    'Efstathiou 1999',
    'Efstathiou, G.',
    'Constraining the equation of state of the Universe from distant Type Ia supernovae and cosmic microwave background anisotropies',
    MNRAS,
    '310',
    '842',
  ],
  [
    'Fritsch & Butland 1984',
    'Fritsch, F. N. and Butland, J.',
    'A method for constructing local monotone piecewise cubic interpolants',
    'SIAM Journal on Scientific and Statistical Computing',
    '5',
    '300',
  ],
  [
    'Nojiri, Odintsov & Tsujikawa 2005',
    'Nojiri, S. and Odintsov, S. D. and Tsujikawa, S.',
    'Properties of singularities in the (phantom) dark energy universe',
    PRD,
    '71',
    '063004',
  ],
  [
    'Frampton, Ludwick & Scherrer 2011',
    'Frampton, P. H. and Ludwick, K. J. and Scherrer, R. J.',
    'The little rip',
    PRD,
    '84',
    '063003',
  ],
  ['Turner & White 1997', 'Turner, M. S. and White, M.', 'CDM models with a smooth component', PRD, '56', 'R4439'],
  [
    'Kamenshchik, Moschella & Pasquier 2001',
    'Kamenshchik, A. and Moschella, U. and Pasquier, V.',
    'An alternative to quintessence',
    PLB,
    '511',
    '265',
  ],
  [
    'Bento, Bertolami & Sen 2002',
    'Bento, M. C. and Bertolami, O. and Sen, A. A.',
    'Generalized Chaplygin gas, accelerated expansion, and dark-energy-matter unification',
    PRD,
    '66',
    '043507',
  ],
  [
    'Ratra & Peebles 1988',
    'Ratra, B. and Peebles, P. J. E.',
    'Cosmological consequences of a rolling homogeneous scalar field',
    PRD,
    '37',
    '3406',
  ],
  [
    'Wetterich 1988',
    'Wetterich, C.',
    'Cosmology and the fate of dilatation symmetry',
    'Nuclear Physics B',
    '302',
    '668',
  ],
  [
    'Frieman, Hill, Stebbins & Waga 1995',
    'Frieman, J. A. and Hill, C. T. and Stebbins, A. and Waga, I.',
    'Cosmology with Ultralight Pseudo Nambu-Goldstone Bosons',
    PRL,
    '75',
    '2077',
  ],
  [
    'Kallosh, Kratochvil, Linde, Linder & Shmakova 2003',
    'Kallosh, R. and Kratochvil, J. and Linde, A. and Linder, E. V. and Shmakova, M.',
    'Observational bounds on cosmic doomsday',
    'Journal of Cosmology and Astroparticle Physics',
    '10',
    '015',
  ],
  [
    'Einstein 1917',
    'Einstein, A.',
    'Kosmologische Betrachtungen zur allgemeinen Relativitätstheorie',
    'Sitzungsberichte der Königlich Preussischen Akademie der Wissenschaften',
    '',
    '142',
  ],
  [
    'Visser 2004',
    'Visser, M.',
    'Jerk, snap and the cosmological equation of state',
    'Classical and Quantum Gravity',
    '21',
    '2603',
  ],
  [
    'Hu & Sugiyama 1996',
    'Hu, W. and Sugiyama, N.',
    'Small-Scale Cosmological Perturbations: An Analytic Approach',
    APJ,
    '471',
    '542',
  ],
  [
    'Aizpuru, Arjona & Nesseris 2021',
    'Aizpuru, A. and Arjona, R. and Nesseris, S.',
    'Machine learning improved fits of the sound horizon at the baryon drag epoch',
    PRD,
    '104',
    '043521',
  ],
  [
    'Eisenstein & Hu 1998',
    'Eisenstein, D. J. and Hu, W.',
    'Baryonic Features in the Matter Transfer Function',
    APJ,
    '496',
    '605',
  ],
  [
    'Planck Collaboration 2020',
    '{Planck Collaboration}',
    'Planck 2018 results. VI. Cosmological parameters',
    'Astronomy \\& Astrophysics',
    '641',
    'A6',
    '1807.06209',
  ],
]

export const PUBLICATIONS: readonly Publication[] = ARTICLES.map(
  ([cite, author, title, journal, volume, pages, eprint]) => ({
    cite,
    author,
    title,
    journal,
    volume,
    pages,
    eprint,
  }),
)

/** Those that a source names. */
export const publicationsIn = (source: string): readonly Publication[] =>
  PUBLICATIONS.filter(({ cite }) => source.includes(cite))

const yearOf = ({ cite }: Publication): string => cite.slice(-4)

/** The first author's name and the year. */
export const keyOf = (one: Publication): string =>
  `${one.author.replace(/^\{/, '').split(/[, ]/)[0].toLowerCase()}${yearOf(one)}`

export function bibtexOf(one: Publication): string {
  const { author, title, journal, volume, pages, eprint } = one
  const fields = {
    author: letters(author),
    title: `{${letters(title)}}`,
    journal: letters(journal ?? ''),
    year: yearOf(one),
    volume,
    pages,
    eprint,
    archivePrefix: eprint ? 'arXiv' : '',
  }
  return entry(journal ? 'article' : 'misc', keyOf(one), fields)
}

export function entry(kind: string, key: string, fields: Readonly<Record<string, string | undefined>>): string {
  const lines = Object.entries(fields).flatMap(([name, value]) => (value ? [`  ${name} = {${value}},`] : []))
  return [`@${kind}{${key},`, ...lines, '}'].join('\n')
}

/** BibTeX of any age wants accents in commands. */
const letters = (text: string): string => text.replace(/[ÄÖÜäöü]/g, (sign) => `{\\"${sign.normalize('NFD').charAt(0)}}`)

export const software = (version: string, engine: string, url: string, year: string): string =>
  entry('software', 'longhence', {
    author: '{The Longhence authors}',
    title: '{Longhence}',
    version: tex(version),
    year,
    note: `Engine ${tex(engine)}`,
    url: url === '' ? undefined : url,
  })
