import type { Choice } from '../../lib/answers/panel'

/** A choice as a row of links, the one that holds marked. */
export function Choices({ choice: { label, options } }: { readonly choice: Choice }) {
  return (
    <nav className="choice" aria-label={label}>
      <span className="choice-name">{label}</span>
      {options.map(({ word, link, chosen }) => (
        <a key={word} href={link} rel="nofollow" aria-current={chosen ? 'true' : undefined}>
          {word}
        </a>
      ))}
    </nav>
  )
}
