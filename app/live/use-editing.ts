/** What a person types, chooses and drags in the form, and where it leads. */
import { useLayoutEffect, useMemo, useRef, useState } from 'react'
import type { Desk } from '../../lib/words/desk'
import { dragged, type Edited, edited } from '../../lib/words/edit'
import { go } from './address'

/** What a field holds until it is taken over, and what is wrong with it. */
export interface Draft {
  readonly text: string
  readonly complaint: string | null
}

/** What can be done with fields, by their names; the same for the whole life of a form. */
export interface Hand {
  readonly type: (name: string, text: string) => void
  readonly drop: (name: string) => void
  /** Takes over what was typed. */
  readonly commit: (name: string) => void
  readonly choose: (name: string, text: string) => void
  /** In the middle of a gesture. */
  readonly drag: (name: string, text: string, gesture: string) => void
}

export interface Editing {
  readonly drafts: ReadonlyMap<string, Draft>
  readonly hand: Hand
}

export function useEditing(desk: Desk): Editing {
  const [drafts, setDrafts] = useState<ReadonlyMap<string, Draft>>(new Map())
  const latest = useRef({ desk, drafts })
  useLayoutEffect(() => {
    latest.current = { desk, drafts }
  }, [desk, drafts])
  const hand = useMemo((): Hand => {
    const put = (name: string, draft: Draft | null) =>
      setDrafts((before) => {
        if (!draft && !before.has(name)) return before
        const after = new Map(before)
        if (draft) after.set(name, draft)
        else after.delete(name)
        return after
      })
    const take = (name: string, text: string, result: Edited, gesture: string | null = null) => {
      if (result.ok) {
        put(name, null)
        go(result.link, gesture)
      } else put(name, { text, complaint: result.complaint })
    }
    const choose = (name: string, text: string) => take(name, text, edited(latest.current.desk, name, text))
    return {
      type: (name, text) => put(name, { text, complaint: null }),
      drop: (name) => put(name, null),
      commit: (name) => {
        const draft = latest.current.drafts.get(name)
        if (draft && draft.complaint === null) choose(name, draft.text)
      },
      choose,
      drag: (name, text, gesture) => take(name, text, dragged(latest.current.desk, name, text), gesture),
    }
  }, [])
  return { drafts, hand }
}
