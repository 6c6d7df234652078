import type { z } from 'zod'

type RawIssue = z.core.$ZodRawIssue

const KINDS: Record<string, string> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  array: 'a list',
  object: 'an object',
  undefined: 'nothing',
}

const FORMATS: Record<string, string> = {
  uuid: 'Must be an id (a UUID), as given by this API.',
  email: 'Must be a mail address such as name@example.com.',
  date: 'Must be a day such as 2026-03-09.',
  datetime: 'Must be a moment in UTC such as 2026-03-09T14:30:00Z.',
}

/**
 * Words for what a schema refuses without words of its own: each says what to send instead.
 * A schema's own message goes before these.
 */
export function inputMessage(issue: RawIssue): string | undefined {
  switch (issue.code) {
    case 'invalid_type':
      if (issue.expected === 'undefined') return 'This request takes no body. Send none.'
      if (issue.input === undefined) return `Missing. Send ${kindOf(issue.expected)}.`
      return `Must be ${kindOf(issue.expected)}.`
    case 'too_small':
      return `Too small. Send ${bound(issue.inclusive, 'at least', 'more than')} ${measure(issue.origin, issue.minimum)}.`
    case 'too_big':
      return `Too large. Send ${bound(issue.inclusive, 'at most', 'less than')} ${measure(issue.origin, issue.maximum)}.`
    case 'invalid_value':
      return `Must be ${issue.values.map((value) => JSON.stringify(value)).join(' or ')}.`
    case 'invalid_format':
      return FORMATS[issue.format]
    case 'not_multiple_of':
      return `Must be a multiple of ${issue.divisor}.`
    default:
      return undefined
  }
}

const kindOf = (expected: string): string => KINDS[expected] ?? expected

const bound = (inclusive: boolean | undefined, closed: string, open: string): string =>
  inclusive === false ? open : closed

function measure(origin: string, size: number | bigint): string {
  if (origin === 'string') return `${size} characters`
  if (origin === 'array' || origin === 'set') return `${size} items`
  return String(size)
}
