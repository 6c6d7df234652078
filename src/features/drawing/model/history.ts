/** Undo and redo over immutable documents. A gesture that was cancelled leaves no trace. */
export interface History<Document> {
  readonly past: readonly Document[]
  readonly present: Document
  readonly future: readonly Document[]
}

const MOST_STEPS = 200

export const startHistory = <Document>(present: Document): History<Document> => ({
  past: [],
  present,
  future: [],
})

/** One step: what was present can be undone to. Recording the same document again is no step. */
export function record<Document>(history: History<Document>, next: Document): History<Document> {
  if (next === history.present) return history
  return { past: [...history.past, history.present].slice(-MOST_STEPS), present: next, future: [] }
}

/** Goes on with the step that was recorded last: a number typed digit by digit is one step. */
export const amend = <Document>(history: History<Document>, next: Document): History<Document> => ({
  past: history.past,
  present: next,
  future: [],
})

export const canUndo = (history: History<unknown>): boolean => history.past.length > 0

export const canRedo = (history: History<unknown>): boolean => history.future.length > 0

export function undo<Document>(history: History<Document>): History<Document> {
  const previous = history.past.at(-1)
  if (previous === undefined) return history
  return {
    past: history.past.slice(0, -1),
    present: previous,
    future: [history.present, ...history.future],
  }
}

export function redo<Document>(history: History<Document>): History<Document> {
  const [next, ...future] = history.future
  if (next === undefined) return history
  return { past: [...history.past, history.present], present: next, future }
}
