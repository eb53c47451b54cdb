/** What a person types, chooses and drags in the form, and where it leads. */
import { useState } from 'react'
import type { Desk } from '../../lib/words/desk'
import { edited } from '../../lib/words/edit'
import { go } from './address'

interface Draft {
  readonly text: string
  readonly complaint: string | null
}

export interface Editing {
  /** What a field holds: as typed, until it is taken over. */
  readonly textOf: (name: string, value: string) => string
  readonly complaintOf: (name: string) => string | null
  readonly type: (name: string, text: string) => void
  readonly drop: (name: string) => void
  /** Takes over what was typed. */
  readonly commit: (name: string) => void
  readonly choose: (name: string, text: string) => void
  /** In the middle of a gesture. */
  readonly drag: (name: string, text: string, gesture: string) => void
}

export function useEditing(desk: Desk): Editing {
  const [drafts, setDrafts] = useState<ReadonlyMap<string, Draft>>(new Map())
  const put = (name: string, draft: Draft | null) =>
    setDrafts((before) => {
      const after = new Map(before)
      if (draft) after.set(name, draft)
      else after.delete(name)
      return after
    })
  const take = (name: string, text: string, gesture: string | null) => {
    const result = edited(desk, name, text)
    if (result.ok) {
      put(name, null)
      go(result.link, gesture)
    } else put(name, { text, complaint: result.complaint })
  }
  const commit = (name: string) => {
    const draft = drafts.get(name)
    if (draft && draft.complaint === null) take(name, draft.text, null)
  }
  return {
    textOf: (name, value) => drafts.get(name)?.text ?? value,
    complaintOf: (name) => drafts.get(name)?.complaint ?? null,
    type: (name, text) => put(name, { text, complaint: null }),
    drop: (name) => put(name, null),
    commit,
    choose: (name, text) => take(name, text, null),
    drag: take,
  }
}
