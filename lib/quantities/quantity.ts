/** What every output of Longhence says about itself. */
export interface Quantity {
  /** Name in answers and tables. */
  readonly key: string
  /** In the markup of labels: `_` starts a subscript. */
  readonly symbol: string
  readonly label: string
  /** Empty for a pure number. */
  readonly unit: string
  /** Decimals for fixed, significant digits for the others: how the page rounds it. */
  readonly digits: { readonly kind: 'fixed' | 'significant'; readonly count: number }
  /** One sentence. */
  readonly meaning: string
  readonly formula: string
  readonly source: string
}
