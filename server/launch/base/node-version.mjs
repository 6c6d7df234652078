/** The oldest Node that every pinned package accepts. */
export const OLDEST_NODE = '20.19.0'

/**
 * @param {string} version such as `20.19.0`, with or without a leading `v`
 * @returns {number[]}
 */
const partsOf = (version) => version.replace(/^v/, '').split(/[.-]/).slice(0, 3).map(Number)

/**
 * @param {string} version the running Node's version
 * @param {string} [oldest]
 * @returns {boolean} whether `version` is `oldest` or newer
 */
export const isNodeNewEnough = (version, oldest = OLDEST_NODE) => {
  const have = partsOf(version)
  const need = partsOf(oldest)
  for (let i = 0; i < need.length; i += 1) {
    const difference = (have[i] ?? 0) - (need[i] ?? 0)
    if (difference !== 0) return difference > 0
  }
  return true
}
