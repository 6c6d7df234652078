import { describe, expect, it } from 'vitest'
import { isNodeNewEnough } from '../../../server/launch/base/node-version.mjs'

describe('the oldest Node', () => {
  it.each(['20.19.0', 'v20.19.0', '20.20.2', '22.0.0', '100.0.0', '21.0.0-nightly'])(
    'takes %s',
    (version) => expect(isNodeNewEnough(version)).toBe(true),
  )

  it.each(['20.18.9', '18.20.4', '9.19.0', '20.9.0'])('refuses %s', (version) =>
    expect(isNodeNewEnough(version)).toBe(false),
  )
})
