import { realpathSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'

/** The repository's real path: two ways to the same clone are one clone. */
export const ROOT = realpathSync(join(dirname(fileURLToPath(import.meta.url)), '../../..'))

/** @param {...string} parts */
export const inRoot = (...parts) => join(ROOT, ...parts)
