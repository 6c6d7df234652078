import { LaunchError } from '../base/launch-error.mjs'

/** @typedef {{ email: string, password: string, role: string, name: string }} DemoAccount */

/**
 * @param {unknown} value
 * @returns {value is DemoAccount}
 */
const isDemoAccount = (value) =>
  typeof value === 'object' &&
  value !== null &&
  ['email', 'password', 'role', 'name'].every(
    (key) => key in value && typeof Reflect.get(value, key) === 'string',
  )

/**
 * @param {string} text what the database command `accounts` prints, a JSON array
 * @returns {DemoAccount[]}
 */
export const parseDemoAccounts = (text) => {
  /** @type {unknown} */
  const value = JSON.parse(text)
  if (!Array.isArray(value) || !value.every(isDemoAccount)) {
    throw new LaunchError('The database command "accounts" did not print a list of accounts.')
  }
  return value
}

/**
 * @param {DemoAccount[]} accounts
 * @returns {string[]} a table, one line an account
 */
export const demoAccountLines = (accounts) => {
  /** @param {(account: DemoAccount) => string} pick */
  const width = (pick) => Math.max(0, ...accounts.map((account) => pick(account).length))
  const role = width((account) => account.role)
  const email = width((account) => account.email)
  const password = width((account) => account.password)
  return accounts.map((account) =>
    [
      account.role.padEnd(role),
      account.email.padEnd(email),
      account.password.padEnd(password),
      account.name,
    ].join('  '),
  )
}
