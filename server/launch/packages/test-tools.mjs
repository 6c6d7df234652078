import { existsSync } from 'node:fs'
import { installDebianPackages } from './debian-packages.mjs'

/**
 * Programs that the tests run, by the Debian package that brings them. Each is looked for at the
 * path where Debian puts it.
 */
export const TEST_TOOLS = [
  { package: 'chromium', program: '/usr/bin/chromium' },
  // What is printed is read back: pages and text of PDFs, and the bar codes on them.
  { package: 'poppler-utils', program: '/usr/bin/pdftoppm' },
  { package: 'zbar-tools', program: '/usr/bin/zbarimg' },
]

/**
 * @param {typeof TEST_TOOLS} tools
 * @param {(path: string) => boolean} isThere
 * @returns {string[]} the packages to install
 */
export const missingTools = (tools, isThere) =>
  tools.filter((tool) => !isThere(tool.program)).map((tool) => tool.package)

/**
 * @param {{ note: (line: string) => void, done: (line: string) => void }} report
 */
export const ensureTestTools = async ({ note, done }) => {
  const missing = missingTools(TEST_TOOLS, existsSync)
  if (missing.length > 0) await installDebianPackages(missing, note)
  done(TEST_TOOLS.map((tool) => tool.package).join(', '))
}
