import { describe, expect, it } from 'vitest'
import { ConfigError, readConfig, readDatabaseUrl } from '#server/config'

const DATABASE_URL = 'postgresql://app@localhost/app'
const SESSION_SECRET = 's'.repeat(48)

describe('the settings in production', () => {
  const production = { NODE_ENV: 'production', DATABASE_URL, SESSION_SECRET }

  it('are safe when nothing more is said', () => {
    expect(readConfig(production)).toMatchObject({
      production: true,
      host: '127.0.0.1',
      cookieSecure: true,
      trustProxy: 0,
    })
  })

  it('refuse to do without a secret', () => {
    const read = () => readConfig({ ...production, SESSION_SECRET: undefined })
    expect(read).toThrow(ConfigError)
    expect(read).toThrow('SESSION_SECRET: Missing.')
  })

  it('refuse the secret of development', () => {
    const { sessionSecret } = readConfig({ NODE_ENV: 'development', DATABASE_URL })
    const read = () => readConfig({ ...production, SESSION_SECRET: sessionSecret })
    expect(read).toThrow('SESSION_SECRET: This is the development default.')
  })

  it('refuse a short secret', () => {
    expect(() => readConfig({ ...production, SESSION_SECRET: 'short' })).toThrow('Too short')
  })

  it('turn secure cookies off only when told', () => {
    expect(readConfig({ ...production, COOKIE_SECURE: 'false' }).cookieSecure).toBe(false)
    expect(() => readConfig({ ...production, COOKIE_SECURE: 'no' })).toThrow('COOKIE_SECURE')
  })
})

describe('the settings', () => {
  it('name everything that is wrong at once', () => {
    const read = () => readConfig({ PORT: 'http', SHOP_TIME_ZONE: 'Shop/Floor' })
    expect(read).toThrow(/DATABASE_URL[^]*PORT[^]*SHOP_TIME_ZONE/)
  })

  it('need no secret on a developer’s machine', () => {
    expect(readConfig({ DATABASE_URL })).toMatchObject({ production: false, cookieSecure: false })
  })

  it('of the database command are the address alone', () => {
    expect(readDatabaseUrl({ DATABASE_URL })).toBe(DATABASE_URL)
    expect(() => readDatabaseUrl({ DATABASE_URL: 'localhost' })).toThrow('DATABASE_URL')
  })
})
