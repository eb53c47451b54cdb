interface Props {
  /** As the address names it. */
  readonly asked: string | undefined
  readonly today: string
}

/** A link that was made with another engine may open with other digits. */
export function OlderEngine({ asked, today }: Props) {
  if (asked === undefined || asked === today || !/^[\w.-]{1,20}$/.test(asked)) return null
  return (
    <aside className="older-engine" aria-label="About this link">
      This link was made with engine {asked}. Today’s is engine {today}, whose digits may differ; the scenarios are the
      same.
    </aside>
  )
}
