import { screen } from '@testing-library/react'
import { beforeEach, describe, expect, it } from 'vitest'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { startLocales } from '@/locales/index'
import { fakeApi, json, problem } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'

const TOKEN = 'a'.repeat(43)
const door = {
  'GET /api/session': () => json({ person: null, csrfToken: 'door' }),
  'POST /api/password-links': () =>
    json({
      kind: 'invitation',
      name: 'Pilar Sorrelwood',
      email: 'pilar@example.com',
      language: 'en',
    }),
}

beforeEach(async () => {
  holdCsrfToken(null)
  await startLocales('en')
})

const typePassword = async (user: ReturnType<typeof renderApp>['user'], password: string) => {
  await user.type(await screen.findByLabelText('New password'), password)
  await user.click(screen.getByRole('button', { name: 'Set password' }))
}

describe('the page of an invitation', () => {
  it('greets the invited, sets the password and leads to sign-in', async () => {
    const api = fakeApi({
      ...door,
      'POST /api/passwords': () => new Response(null, { status: 204 }),
    })
    const { user } = renderApp(`/welcome/${TOKEN}`)
    expect(await screen.findByRole('heading', { name: 'Welcome, Pilar Sorrelwood' })).toBeVisible()
    await typePassword(user, 'snips by the door')
    expect(await screen.findByText('The password is set.')).toBeVisible()
    expect(screen.getByRole('link', { name: 'Go to sign-in' })).toHaveAttribute('href', '/')
    const [request] = api.seen('POST /api/passwords')
    expect(request?.body).toEqual({ token: TOKEN, password: 'snips by the door' })
  })

  it.each([
    ['short', /Too short/],
    ['Password123!', /tried first/],
    ['sorrelwood1', /name or address/],
  ])('says why %j is not taken, before anything is sent', async (password, words) => {
    const api = fakeApi(door)
    const { user } = renderApp(`/welcome/${TOKEN}`)
    await typePassword(user, password)
    expect(await screen.findByText(words)).toBeVisible()
    expect(api.seen('POST /api/passwords')).toEqual([])
  })

  it('says so when the link is used up, and where to get another', async () => {
    fakeApi({ ...door, 'POST /api/password-links': () => problem('not-found') })
    renderApp(`/reset/${TOKEN}`)
    expect(await screen.findByText('This link is used up or too old.')).toBeVisible()
    expect(screen.getByRole('link', { name: 'Ask for a new password' })).toHaveAttribute(
      'href',
      '/forgot-password',
    )
  })
})
