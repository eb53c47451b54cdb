/** Published parameter sets, as their tables print them: central values of the marginal distributions unless a best fit is named. */

export interface PublishedValue {
  readonly symbol: string
  /** As printed, with a true minus sign. */
  readonly value: string
  /** `± 0.54`, `+1.6 −2.1`, or empty. */
  readonly error: string
}

export interface PublishedSet {
  readonly key: string
  readonly title: string
  /** A whole scenario with its name, or null where the set is one parameter. */
  readonly code: string | null
  readonly change: { readonly key: 'h0' | 'matter'; readonly value: number } | null
  readonly values: readonly PublishedValue[]
  /** What the same fit says of quantities that H₀ can be retuned to: radian, Gyr. */
  readonly kept: { readonly acousticAngle: string; readonly age: string } | null
  /** Of the errors. */
  readonly confidence: '68%' | 'best fit'
  readonly citation: string
  readonly note: string
}

export const PUBLISHED_SETS: readonly PublishedSet[] = [
  {
    key: 'planck2018_TTTEEE_lowE_lensing',
    title: 'Planck 2018 TT,TE,EE+lowE+lensing',
    code: 'h0:67.36,matter:0.3153,baryons:0.02237,nu:3.046,as:Planck 2018',
    change: null,
    values: [
      { symbol: 'H_0', value: '67.36', error: '± 0.54' },
      { symbol: 'Ω_m', value: '0.3153', error: '± 0.0073' },
      { symbol: 'Ω_b h²', value: '0.02237', error: '± 0.00015' },
    ],
    kept: { acousticAngle: '0.0104110', age: '13.797' },
    confidence: '68%',
    citation: 'Planck Collaboration 2020, A&A 641, A6, arXiv:1807.06209, Table 2',
    note: 'N_{eff} = 3.046 and one neutrino of 0.06 eV, as there.',
  },
  {
    key: 'planck2018_TTTEEE_lowE_lensing_BAO',
    title: 'Planck 2018 TT,TE,EE+lowE+lensing+BAO',
    code: 'h0:67.66,matter:0.3111,nu:3.046,as:Planck 2018 with BAO',
    change: null,
    values: [
      { symbol: 'H_0', value: '67.66', error: '± 0.42' },
      { symbol: 'Ω_m', value: '0.3111', error: '± 0.0056' },
      { symbol: 'Ω_b h²', value: '0.02242', error: '± 0.00014' },
    ],
    kept: { acousticAngle: '0.0104119', age: '13.787' },
    confidence: '68%',
    citation: 'Planck Collaboration 2020, A&A 641, A6, arXiv:1807.06209, Table 2',
    note: 'N_{eff} = 3.046 and one neutrino of 0.06 eV, as there.',
  },
  {
    key: 'planck2018_TTTEEE_lowE',
    title: 'Planck 2018 TT,TE,EE+lowE',
    code: 'h0:67.27,matter:0.3166,baryons:0.02236,nu:3.046,as:Planck 2018 TT,TE,EE',
    change: null,
    values: [
      { symbol: 'H_0', value: '67.27', error: '± 0.60' },
      { symbol: 'Ω_m', value: '0.3166', error: '± 0.0084' },
      { symbol: 'Ω_b h²', value: '0.02236', error: '± 0.00015' },
    ],
    kept: { acousticAngle: '0.0104109', age: '13.800' },
    confidence: '68%',
    citation: 'Planck Collaboration 2020, A&A 641, A6, arXiv:1807.06209, Table 2',
    note: 'N_{eff} = 3.046 and one neutrino of 0.06 eV, as there.',
  },
  {
    key: 'planck2018_TE_lowE',
    title: 'Planck 2018 TE+lowE',
    code: 'h0:68.44,matter:0.301,baryons:0.02249,nu:3.046,as:Planck 2018 TE',
    change: null,
    values: [
      { symbol: 'H_0', value: '68.44', error: '± 0.91' },
      { symbol: 'Ω_m', value: '0.301', error: '± 0.012' },
      { symbol: 'Ω_b h²', value: '0.02249', error: '± 0.00025' },
    ],
    kept: { acousticAngle: '0.0104156', age: '13.761' },
    confidence: '68%',
    citation: 'Planck Collaboration 2020, A&A 641, A6, arXiv:1807.06209, Table 2',
    note: 'N_{eff} = 3.046 and one neutrino of 0.06 eV, as there.',
  },
  {
    key: 'planck2018_TT_lowE',
    title: 'Planck 2018 TT+lowE',
    code: 'h0:66.88,matter:0.321,baryons:0.02212,nu:3.046,as:Planck 2018 TT',
    change: null,
    values: [
      { symbol: 'H_0', value: '66.88', error: '± 0.92' },
      { symbol: 'Ω_m', value: '0.321', error: '± 0.013' },
      { symbol: 'Ω_b h²', value: '0.02212', error: '± 0.00022' },
    ],
    kept: { acousticAngle: '0.0104097', age: '13.830' },
    confidence: '68%',
    citation: 'Planck Collaboration 2020, A&A 641, A6, arXiv:1807.06209, Table 2',
    note: 'N_{eff} = 3.046 and one neutrino of 0.06 eV, as there.',
  },
  {
    key: 'planck2018_TTTEEE_lowE_lensing_bestfit',
    title: 'Planck 2018 TT,TE,EE+lowE+lensing, best fit',
    code: 'h0:67.32,matter:0.3158,baryons:0.022383,nu:3.046,as:Planck 2018 best fit',
    change: null,
    values: [
      { symbol: 'H_0', value: '67.32', error: '' },
      { symbol: 'Ω_m', value: '0.3158', error: '' },
      { symbol: 'Ω_b h²', value: '0.022383', error: '' },
    ],
    kept: { acousticAngle: '0.01041085', age: '13.7971' },
    confidence: 'best fit',
    citation: 'Planck Collaboration 2020, A&A 641, A6, arXiv:1807.06209, Table 1',
    note: 'N_{eff} = 3.046 and one neutrino of 0.06 eV, as there.',
  },
  {
    key: 'desi_dr2_LCDM_DESI_CMB',
    title: 'DESI DR2 + CMB, flat ΛCDM',
    code: 'h0:68.17,matter:0.3027,as:DESI DR2 with CMB',
    change: null,
    values: [
      { symbol: 'H_0', value: '68.17', error: '± 0.28' },
      { symbol: 'Ω_m', value: '0.3027', error: '± 0.0036' },
    ],
    kept: null,
    confidence: '68%',
    citation: 'DESI Collaboration 2025, arXiv:2503.14738, Table V',
    note: 'Ω_b h² and neutrinos at their defaults.',
  },
  {
    key: 'desi_dr2_LCDM_DESI_BBN',
    title: 'DESI DR2 + BBN, flat ΛCDM',
    code: 'h0:68.51,matter:0.2977,as:DESI DR2 with BBN',
    change: null,
    values: [
      { symbol: 'H_0', value: '68.51', error: '± 0.58' },
      { symbol: 'Ω_m', value: '0.2977', error: '± 0.0086' },
    ],
    kept: null,
    confidence: '68%',
    citation: 'DESI Collaboration 2025, arXiv:2503.14738, Table V',
    note: 'Ω_b h² and neutrinos at their defaults.',
  },
  {
    key: 'desi_dr2_oLCDM_DESI_CMB',
    title: 'DESI DR2 + CMB, ΛCDM with curvature',
    code: 'h0:68.5,matter:0.3034,curvature:0.0023,as:DESI DR2 with CMB, curved',
    change: null,
    values: [
      { symbol: 'H_0', value: '68.50', error: '± 0.33' },
      { symbol: 'Ω_m', value: '0.3034', error: '± 0.0037' },
      { symbol: 'Ω_k', value: '0.0023', error: '± 0.0011' },
    ],
    kept: null,
    confidence: '68%',
    citation: 'DESI Collaboration 2025, arXiv:2503.14738, Table V',
    note: 'Ω_b h² and neutrinos at their defaults.',
  },
  {
    key: 'desi_dr2_w0wa_DESI_CMB',
    title: 'DESI DR2 + CMB, w_0 w_a',
    code: 'h0:63.6,matter:0.353,eos:cpl,w0:-0.42,wa:-1.75,as:DESI DR2 with CMB, w0wa',
    change: null,
    values: [
      { symbol: 'H_0', value: '63.6', error: '' },
      { symbol: 'Ω_m', value: '0.353', error: '± 0.021' },
      { symbol: 'w_0', value: '−0.42', error: '± 0.21' },
      { symbol: 'w_a', value: '−1.75', error: '± 0.58' },
    ],
    kept: null,
    confidence: '68%',
    citation: 'DESI Collaboration 2025, arXiv:2503.14738, Table V',
    note: 'Ω_b h² and neutrinos at their defaults.',
  },
  {
    key: 'desi_dr2_w0wa_DESI_CMB_PantheonPlus',
    title: 'DESI DR2 + CMB + Pantheon+, w_0 w_a',
    code: 'h0:67.51,matter:0.3114,eos:cpl,w0:-0.838,wa:-0.62,as:DESI DR2, CMB and Pantheon+, w0wa',
    change: null,
    values: [
      { symbol: 'H_0', value: '67.51', error: '± 0.59' },
      { symbol: 'Ω_m', value: '0.3114', error: '± 0.0057' },
      { symbol: 'w_0', value: '−0.838', error: '± 0.055' },
      { symbol: 'w_a', value: '−0.62', error: '+0.22 −0.19' },
    ],
    kept: null,
    confidence: '68%',
    citation: 'DESI Collaboration 2025, arXiv:2503.14738, Table V',
    note: 'Ω_b h² and neutrinos at their defaults.',
  },
  {
    key: 'desi_dr2_w0wa_DESI_CMB_DESY5',
    title: 'DESI DR2 + CMB + DESY5, w_0 w_a',
    code: 'h0:66.74,matter:0.3191,eos:cpl,w0:-0.752,wa:-0.86,as:DESI DR2, CMB and DESY5, w0wa',
    change: null,
    values: [
      { symbol: 'H_0', value: '66.74', error: '± 0.56' },
      { symbol: 'Ω_m', value: '0.3191', error: '± 0.0056' },
      { symbol: 'w_0', value: '−0.752', error: '± 0.057' },
      { symbol: 'w_a', value: '−0.86', error: '+0.23 −0.20' },
    ],
    kept: null,
    confidence: '68%',
    citation: 'DESI Collaboration 2025, arXiv:2503.14738, Table V',
    note: 'Ω_b h² and neutrinos at their defaults.',
  },
  {
    key: 'sh0es_2022',
    title: 'H_0 of SH0ES 2022',
    code: null,
    change: { key: 'h0', value: 73.04 },
    values: [{ symbol: 'H_0', value: '73.04', error: '± 1.04' }],
    kept: null,
    confidence: '68%',
    citation: 'Riess et al. 2022, ApJ 934, L7, arXiv:2112.04510',
    note: 'One parameter: the others of the scenario stay.',
  },
  {
    key: 'sh0es_2024',
    title: 'H_0 of SH0ES 2024',
    code: null,
    change: { key: 'h0', value: 73.17 },
    values: [{ symbol: 'H_0', value: '73.17', error: '± 0.86' }],
    kept: null,
    confidence: '68%',
    citation: 'Breuval et al. 2024, arXiv:2404.08038',
    note: 'One parameter: the others of the scenario stay.',
  },
  {
    key: 'pantheonplus_LCDM',
    title: 'Ω_m of Pantheon+, flat ΛCDM',
    code: null,
    change: { key: 'matter', value: 0.334 },
    values: [{ symbol: 'Ω_m', value: '0.334', error: '± 0.018' }],
    kept: null,
    confidence: '68%',
    citation: 'Brout et al. 2022, ApJ 938, 110, arXiv:2202.04077',
    note: 'One parameter: the others of the scenario stay.',
  },
  {
    key: 'union3_LCDM',
    title: 'Ω_m of Union3, flat ΛCDM',
    code: null,
    change: { key: 'matter', value: 0.356 },
    values: [{ symbol: 'Ω_m', value: '0.356', error: '' }],
    kept: null,
    confidence: '68%',
    citation: 'Rubin et al. 2023, arXiv:2311.12098',
    note: 'One parameter: the others of the scenario stay.',
  },
]
