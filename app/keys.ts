/** The keys of a page's address as Next hands them over: each once, several times, or not at all. */
type Value = string | string[] | undefined

export interface PageProps {
  readonly searchParams: Promise<Readonly<Record<string, Value>>>
}

export const all = (value: Value): readonly string[] => (value === undefined ? [] : [value].flat())

export const queryOf = async ({ searchParams }: PageProps): Promise<URLSearchParams> =>
  new URLSearchParams(Object.entries(await searchParams).flatMap(([key, value]) => all(value).map((one) => [key, one])))
