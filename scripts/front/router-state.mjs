/**
 * Soft navigations send where they come from in a header, and Next answers a damaged one with 500. It is judged here by
 * Next's own reader, the only one that knows the format.
 */
import { parseAndValidateFlightRouterState } from 'next/dist/server/app-render/parse-and-validate-flight-router-state.js'

/** What Next reads of it at most. */
export const LONGEST_STATE = 40_000

/**
 * @param {import('node:http').IncomingHttpHeaders} headers
 * @returns {import('./problem.mjs').Problem | null}
 */
export function routerStateProblem(headers) {
  const state = headers['next-router-state-tree']
  if (state === undefined) return null
  try {
    parseAndValidateFlightRouterState(state)
    return null
  } catch {
    return { status: 400, detail: 'The header Next-Router-State-Tree cannot be read.' }
  }
}
