/**
 * From the formulas of the lists, which are plain text with the markup of labels, to a tree in the elements of MathML Core.
 * Factors that touch belong together about a slash; words of two or more letters that are no function stay words.
 */

export interface MathNode {
  readonly tag:
    | 'mrow'
    | 'mi'
    | 'mn'
    | 'mo'
    | 'mtext'
    | 'mfrac'
    | 'msqrt'
    | 'msub'
    | 'msup'
    | 'msubsup'
    | 'mover'
    | 'mspace'
  readonly attributes?: Readonly<Record<string, string>>
  readonly children: readonly (MathNode | string)[]
}

const FUNCTIONS: ReadonlySet<string> = new Set(['sin', 'sinh', 'ln', 'log', 'lim', 'cos', 'exp'])
const UPRIGHT: ReadonlySet<string> = new Set(['Mpc'])
const SUPERSCRIPTS: Readonly<Record<string, string>> = { '²': '2', '³': '3', '″': '″', '′': '′' }
const DOTS: Readonly<Record<string, string>> = { '\u0307': '˙', '\u0308': '¨' }
const BRACKETS: Readonly<Record<string, string>> = { '(': ')', '[': ']', '|': '|' }

interface Token {
  readonly kind: 'letter' | 'word' | 'number' | 'open' | 'close' | 'slash' | 'root' | 'script' | 'raised' | 'sign'
  readonly text: string
  /** Whether a blank stands before it. */
  readonly apart: boolean
}

const TOKEN =
  /(\s*)(?:(?<script>[_^](?:\{[^{}]*\}|[\p{L}\p{N}*∞]+))|(?<word>[A-Za-z]{2,})|(?<letter>\p{L}\p{M}*)|(?<number>\d+(?:\.\d+)?|[½])|(?<raised>[²³″′]+)|(?<root>√)|(?<slash>\/)|(?<open>[([])|(?<close>[)\]])|(?<sign>\^|[^\s]))/gu

function tokensOf(text: string): Token[] {
  return [...text.matchAll(TOKEN)].flatMap((match) => {
    const [kind, value] = Object.entries(match.groups ?? {}).find(([, one]) => one !== undefined) ?? []
    if (kind === undefined || value === undefined) return []
    const token = { kind: kind as Token['kind'], text: value, apart: (match[1] ?? '') !== '' }
    const differential = kind === 'word' && /^d[A-Za-z]$/.test(value)
    if (!differential) return [token]
    return [...value].map((letter, i) => ({ kind: 'letter' as const, text: letter, apart: i === 0 && token.apart }))
  })
}

/** A thing in a row, and whether it is an operand that a slash may take. */
interface Item {
  readonly node: MathNode
  readonly operand: boolean
  readonly apart: boolean
  /** What stands between its brackets, where it has brackets. */
  readonly inside?: MathNode
}

/** About the name of a function that has no brackets. */
const THIN: Item = {
  node: { tag: 'mspace', attributes: { width: '0.17em' }, children: [] },
  operand: false,
  apart: false,
}

const node = (tag: MathNode['tag'], ...children: (MathNode | string)[]): MathNode => ({ tag, children })
const rowOf = (nodes: readonly MathNode[]): MathNode =>
  nodes.length === 1 && nodes[0] ? nodes[0] : node('mrow', ...nodes)

export function formulaTree(text: string): MathNode {
  const reader = { tokens: tokensOf(text), at: 0 }
  return inRow(rowUntil(reader, null))
}

/** Words that follow each other are one text. */
function inRow(items: readonly Item[]): MathNode {
  const nodes: MathNode[] = []
  for (const { node: one } of items) {
    const before = nodes.at(-1)
    if (one.tag === 'mtext' && before?.tag === 'mtext') {
      nodes[nodes.length - 1] = node('mtext', `${before.children[0]}${one.children[0]}`.replace(/\u00a0+/g, '\u00a0'))
    } else {
      if (before?.tag === 'mtext' && isStop(one))
        nodes[nodes.length - 1] = node('mtext', `${before.children[0]}`.trimEnd())
      nodes.push(one)
    }
  }
  return rowOf(nodes)
}

const isStop = ({ tag, children }: MathNode): boolean => tag === 'mo' && (children[0] === ',' || children[0] === ';')

interface Reader {
  readonly tokens: readonly Token[]
  at: number
}

/** Items up to the closing bracket, or to the end. */
function rowUntil(reader: Reader, close: string | null): Item[] {
  const items: Item[] = []
  for (;;) {
    const token = reader.tokens[reader.at]
    if (token === undefined) return items
    if (token.text === close) {
      reader.at++
      return items
    }
    if (token.kind === 'slash') {
      reader.at++
      items.push(fraction(items, reader, token))
    } else {
      const named = FUNCTIONS.has(token.text)
      if (named && items.at(-1)?.operand) items.push(THIN)
      items.push(itemOf(reader, items.at(-1)))
      if (named && reader.tokens[reader.at]?.kind === 'letter') items.push(THIN)
    }
  }
}

/** Takes the factors before the slash off the row. */
function fraction(items: Item[], reader: Reader, slash: Token): Item {
  const above: Item[] = []
  while (items.at(-1)?.operand && !(above[0]?.apart ?? slash.apart)) above.unshift(items.pop() as Item)
  const below: Item[] = []
  while (continues(reader, below.length === 0)) below.push(itemOf(reader, below.at(-1)))
  const whole = (part: readonly Item[]) =>
    part.length === 1 && part[0]?.inside ? part[0].inside : rowOf(part.map((one) => one.node))
  return { node: node('mfrac', whole(above), whole(below)), operand: true, apart: above[0]?.apart ?? true }
}

function continues({ tokens, at }: Reader, first: boolean): boolean {
  const token = tokens[at]
  if (token === undefined || token.kind === 'close' || token.kind === 'slash') return false
  if (first) return true
  if (token.apart) return false
  return token.kind !== 'sign' && token.kind !== 'word'
}

function itemOf(reader: Reader, before: Item | undefined): Item {
  const token = reader.tokens[reader.at++] as Token
  const base = baseOf(reader, token, before)
  return scripted(reader, base)
}

function baseOf(reader: Reader, token: Token, before: Item | undefined): Item {
  const { kind, text, apart } = token
  const plain = (tag: MathNode['tag'], operand: boolean, children = text): Item => ({
    node: node(tag, children),
    operand,
    apart,
  })
  if (kind === 'open' || (text === '|' && !(before?.operand && !apart))) return bracketed(reader, token)
  if (kind === 'root') {
    const under = itemOf(reader, undefined)
    const content = under.inside && !isBar(under) ? under.inside : under.node
    return { node: node('msqrt', content), operand: true, apart }
  }
  if (kind === 'number') return plain('mn', true)
  if (kind === 'letter') return alone(reader, before) ? wordItem(token) : { node: letterOf(text), operand: true, apart }
  if (kind === 'word') {
    if (FUNCTIONS.has(text)) return { ...plain('mi', false), operand: false }
    return UPRIGHT.has(text) ? upright(token) : wordItem(token)
  }
  if (text === ',')
    return {
      node: { tag: 'mo', attributes: { separator: 'true', rspace: '0.45em' }, children: [','] },
      operand: false,
      apart,
    }
  // Not a difference where nothing stands before it.
  if (text === '−' && !before?.operand) {
    return { node: { tag: 'mo', attributes: { form: 'prefix' }, children: [text] }, operand: false, apart }
  }
  return plain('mo', false)
}

const isBar = (item: Item): boolean =>
  item.node.children.some((one) => typeof one !== 'string' && one.children[0] === '|')

/** Dots of a derivative stand over the slanted letter: one letter with its dots would be set upright. No accent, which touches it. */
function letterOf(text: string): MathNode {
  const [letter = text, dots] = text.normalize('NFD')
  const over = DOTS[dots ?? '']
  if (over === undefined) return node('mi', text)
  return node('mover', node('mi', letter), { tag: 'mo', attributes: { stretchy: 'false' }, children: [over] })
}

/** The article between two words. */
function alone({ tokens, at }: Reader, before: Item | undefined): boolean {
  const [letter, next] = [tokens[at - 1], tokens[at]]
  return letter?.text === 'a' && before?.node.tag === 'mtext' && next?.kind === 'word' && !FUNCTIONS.has(next.text)
}

const upright = ({ text, apart }: Token): Item => ({
  node: { tag: 'mi', attributes: { mathvariant: 'normal' }, children: [text] },
  operand: true,
  apart,
})

const wordItem = ({ text, apart }: Token): Item => ({
  node: node('mtext', `\u00a0${text}\u00a0`),
  operand: false,
  apart,
})

function bracketed(reader: Reader, { text, apart }: Token): Item {
  const close = BRACKETS[text] ?? ')'
  const inside = inRow(rowUntil(reader, close))
  const fence = (sign: string, form: 'prefix' | 'postfix'): MathNode => ({
    tag: 'mo',
    attributes: { fence: 'true', form, ...(isTall(inside) ? {} : { stretchy: 'false' }) },
    children: [sign],
  })
  return { node: node('mrow', fence(text, 'prefix'), inside, fence(close, 'postfix')), operand: true, apart, inside }
}

/** Only brackets about these are stretched: a stretched bracket stands apart from what is within. */
function isTall({ tag, children }: MathNode): boolean {
  return tag === 'mfrac' || tag === 'msqrt' || children.some((one) => typeof one !== 'string' && isTall(one))
}

/** Subscripts and superscripts that follow at once. */
function scripted(reader: Reader, base: Item): Item {
  let [sub, sup]: [MathNode | null, MathNode | null] = [null, null]
  for (;;) {
    const token = reader.tokens[reader.at]
    if (token === undefined || token.apart) break
    if (token.kind === 'script') {
      const content = scriptOf(token.text.slice(1))
      if (token.text.startsWith('_')) sub = content
      else sup = content
      reader.at++
    } else if (token.kind === 'raised') {
      sup = node(/[²³]/.test(token.text) ? 'mn' : 'mo', [...token.text].map((one) => SUPERSCRIPTS[one] ?? one).join(''))
      reader.at++
    } else if (token.text === '^') {
      reader.at++
      const raised = itemOf(reader, undefined)
      sup = raised.inside ?? raised.node
    } else break
  }
  const children = [base.node, ...(sub ? [sub] : []), ...(sup ? [sup] : [])]
  const tag = sub && sup ? 'msubsup' : sub ? 'msub' : 'msup'
  return children.length === 1
    ? base
    : { node: node(tag, ...children), operand: base.operand || base.node.tag === 'mi', apart: base.apart }
}

function scriptOf(text: string): MathNode {
  const content = text.replace(/^\{|\}$/g, '')
  if (/^\d+$/.test(content)) return node('mn', content)
  if (/^[*∞−+]$/.test(content)) return node('mo', content)
  return { tag: 'mi', attributes: { mathvariant: [...content].length > 1 ? 'normal' : 'italic' }, children: [content] }
}

/** As plain text, for tests and for readers without eyes: what MathML would be read as. */
export function formulaText({ tag, children }: MathNode): string {
  const parts = children.map((one) => (typeof one === 'string' ? one : formulaText(one)))
  switch (tag) {
    case 'mfrac':
      return `{${parts[0]}|${parts[1]}}`
    case 'mover':
      return `${parts[0]}${Object.keys(DOTS).find((dots) => DOTS[dots] === parts[1]) ?? parts[1]}`.normalize('NFC')
    case 'msqrt':
      return `√{${parts[0]}}`
    case 'msub':
      return `${parts[0]}_${parts[1]}`
    case 'msup':
      return `${parts[0]}^${parts[1]}`
    case 'msubsup':
      return `${parts[0]}_${parts[1]}^${parts[2]}`
    default:
      return parts.join('')
  }
}
