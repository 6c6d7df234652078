import { act, screen, waitFor, within } from '@testing-library/react'
import { beforeEach, describe, expect, it } from 'vitest'
import { PLACES_OF, ROLES } from '#shared/access/permissions'
import { sessionKey } from '@/features/people/api/people.queries'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { startLocales } from '@/locales/index'
import { fakeApi, json, noAnswer, personOf, problem } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'

const WORDS = { roof: 'Roof', brake: 'Brake', rack: 'Rack', counter: 'Counter', office: 'Office' }

const as = (role: (typeof ROLES)[number], more = {}) =>
  fakeApi({
    'GET /api/session': () => json({ person: personOf(role, more), csrfToken: 'inside' }),
  })

beforeEach(async () => {
  holdCsrfToken(null)
  // Texts are loaded when somebody speaks their language, which is not what is tested here.
  await import('@/locales/texts-es')
  await startLocales('en')
})

describe('landing', () => {
  it.each(ROLES)('a %s begins at the first place of the role', async (role) => {
    as(role)
    const { router } = renderApp('/')
    const [first] = PLACES_OF[role]
    await waitFor(() => expect(router.state.location.pathname).toBe(`/${first}`))
    await waitFor(() => expect(document.documentElement).toHaveAttribute('data-place', first))
  })

  it('speaks the language of the person and shows their theme', async () => {
    as('bender', { language: 'es', theme: 'dark' })
    renderApp('/account')
    expect(await screen.findByRole('heading', { name: 'Cuenta' })).toBeVisible()
    expect(document.documentElement).toHaveAttribute('lang', 'es')
    expect(document.documentElement).toHaveAttribute('data-theme', 'dark')
    expect(document.title).toBe('Cuenta · Foldyard')
  })
})

describe('the menu', () => {
  it.each(ROLES)('of a %s names the places of the role and no others', async (role) => {
    as(role)
    const { user } = renderApp('/account')
    await user.click(await screen.findByRole('button', { name: /Menu/ }))
    const nav = screen.getAllByRole('navigation', { name: 'Places' }).at(-1)
    if (!nav) throw new Error('The menu has no places.')
    expect(
      within(nav)
        .getAllByRole('link')
        .map((link) => link.textContent),
    ).toEqual(PLACES_OF[role].map((place) => WORDS[place]))
  })

  it('closes with Escape and gives the focus back', async () => {
    as('manager')
    const { user } = renderApp('/account')
    const button = await screen.findByRole('button', { name: /Menu/ })
    await user.click(button)
    expect(screen.getByRole('link', { name: 'Account' })).toBeVisible()
    await user.keyboard('{Escape}')
    expect(screen.queryByRole('link', { name: 'Account' })).not.toBeInTheDocument()
    expect(button).toHaveFocus()
  })
})

describe('a place that the role does not enter', () => {
  it('is refused plainly, with the way back', async () => {
    as('crewLead')
    const { user, router } = renderApp('/office')
    expect(await screen.findByRole('heading', { name: 'Office is closed to you' })).toBeVisible()
    expect(screen.getByText(/signed in as crew lead/)).toBeVisible()
    await user.click(screen.getByRole('link', { name: 'To the start' }))
    await waitFor(() => expect(router.state.location.pathname).toBe('/roof'))
  })
})

describe('an address that leads nowhere', () => {
  it('is told, with the way back', async () => {
    as('bender')
    renderApp('/attic')
    expect(await screen.findByRole('heading', { name: 'Nothing lies here' })).toBeVisible()
    expect(screen.getByRole('link', { name: 'To the start' })).toHaveAttribute('href', '/')
  })
})

describe('the connection', () => {
  it('is shown as it is: reconnecting, live, none', async () => {
    const api = as('manager')
    const { user, live } = renderApp('/account')
    expect(await screen.findByText('Reconnecting')).toBeVisible()
    act(() => live.last().open())
    expect(screen.getByText('Live')).toBeInTheDocument()

    api.on('PATCH /api/me', noAnswer)
    await user.click(screen.getByRole('radio', { name: 'Millimeters' }))
    expect(await screen.findByText('No connection')).toBeVisible()
    expect(screen.getByText(/what was last read/)).toBeVisible()

    api.on('PATCH /api/me', () => json(personOf('manager', { units: 'mm' })))
    act(() => live.last().fail({ refused: false }))
    act(() => live.last().open())
    await waitFor(() => expect(screen.queryByText('No connection')).not.toBeInTheDocument())
  })

  it('that comes back gets what was chosen meanwhile, without another press', async () => {
    const api = as('manager')
    const { user, client } = renderApp('/account')
    const millimeters = await screen.findByRole('radio', { name: 'Millimeters' })
    api.on('PATCH /api/me', noAnswer)
    await user.click(millimeters)
    expect(await screen.findByText('No connection')).toBeVisible()
    expect(millimeters).toBeChecked()
    api.on('PATCH /api/me', () => json(personOf('manager', { units: 'mm' })))
    await waitFor(
      () => expect(client.getQueryData(sessionKey)).toMatchObject({ person: { units: 'mm' } }),
      { timeout: 10_000 },
    )
    expect(screen.queryByText('No connection')).not.toBeInTheDocument()
    expect(millimeters).toBeChecked()
  }, 20_000)

  it('that fails at the door says what happened and tries again', async () => {
    const api = fakeApi({ 'GET /api/session': () => problem('internal') })
    const { user } = renderApp('/account')
    expect(await screen.findByRole('alert')).toHaveTextContent('The server failed.')
    expect(screen.getByText('req-0001')).toBeVisible()
    api.on('GET /api/session', () => json({ person: personOf('manager'), csrfToken: 'inside' }))
    await user.click(screen.getByRole('button', { name: 'Try again' }))
    expect(await screen.findByRole('heading', { name: 'Account' })).toBeVisible()
  })
})
