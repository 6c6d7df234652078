import { invalidField } from '#server/http/errors'
import { parseCode, type CodeFault, type CodeKind } from '#shared/pieces/codes'

const CURES: Record<CodeFault, string> = {
  empty: 'Type or scan the code on the label.',
  length: 'A code has eight characters: compare it with the label.',
  characters: 'A code has letters and digits only: compare it with the label.',
  check: 'One character is wrong: compare it with the label.',
  kind: 'A code begins with P (piece), B (bundle), R (run) or S (slip): compare it with the label.',
}

/**
 * The code as it stands on the label, whatever it was typed like. Throws `invalid-input` naming
 * `path` for a slip of the pen.
 */
export function readAnyCode(typed: string, path = 'code'): { code: string; kind: CodeKind } {
  const read = parseCode(typed)
  if (!read.ok) throw invalidField(path, CURES[read.fault])
  return read
}

/** Like `readAnyCode`, for a place where only one kind of code will do. */
export function readCode(typed: string, expected: CodeKind, path = 'code'): string {
  const { code, kind } = readAnyCode(typed, path)
  if (kind !== expected) {
    throw invalidField(
      path,
      `${code} is the code of a ${kind}. Type or scan the code of a ${expected}.`,
    )
  }
  return code
}

/** A list of codes of one kind, each once however often it was scanned. */
export function readCodes(typed: readonly string[], expected: CodeKind, path: string): string[] {
  return [...new Set(typed.map((text, index) => readCode(text, expected, `${path}.${index}`)))]
}
