/** Text as it may stand in a LaTeX document of any encoding. */

const SIGNS: Readonly<Record<string, string>> = {
  '\\': '\\textbackslash{}',
  '{': '\\{',
  '}': '\\}',
  $: '\\$',
  '&': '\\&',
  '#': '\\#',
  '%': '\\%',
  _: '\\_',
  '^': '\\textasciicircum{}',
  '~': '\\textasciitilde{}',
  '²': '$^2$',
  '³': '$^3$',
  '−': '$-$',
  '×': '$\\times$',
  '–': '--',
  '’': "'",
  '…': '\\dots{}',
  '\u00a0': '~',
  '\u202f': '\\,',
}

/** `\`, `%` and all other signs with a meaning of their own are printed as they are. */
export const tex = (text: string): string =>
  text.replace(/[\\{}$&#%_^~²³−×–’…\u00a0\u202f]/g, (sign) => SIGNS[sign] ?? sign)
