import { screen, waitFor } from '@testing-library/react'
import { beforeEach, describe, expect, it } from 'vitest'
import { holdCsrfToken } from '@/lib/api/csrf-token'
import { startLocales } from '@/locales/index'
import { fakeApi, json, noAnswer, personOf, problem } from '../../support/fake-api'
import { renderApp } from '../../support/render-app'

const nobody = () => json({ person: null, csrfToken: 'door' })

const fillIn = async (user: ReturnType<typeof renderApp>['user'], email: string) => {
  await user.type(await screen.findByLabelText('Mail address'), email)
  await user.type(screen.getByLabelText('Password'), 'correct horse')
  await user.click(screen.getByRole('button', { name: 'Sign in' }))
}

beforeEach(async () => {
  holdCsrfToken(null)
  await startLocales('en')
})

describe('signing in', () => {
  it('leads to the place of the person', async () => {
    const api = fakeApi({
      'GET /api/session': nobody,
      'POST /api/session': () => json({ person: personOf('bender'), csrfToken: 'inside' }),
      'PATCH /api/me': () => json(personOf('bender', { theme: 'dark' })),
    })
    const { user, router } = renderApp('/')
    await fillIn(user, 'Ines@Example.com ')
    expect(await screen.findByRole('heading', { level: 1 })).toBeVisible()
    await waitFor(() => expect(router.state.location.pathname).toBe('/brake'))
    const [request] = api.seen('POST /api/session')
    expect(request?.headers.get('x-csrf-token')).toBe('door')
    expect(request?.body).toEqual({ email: 'ines@example.com', password: 'correct horse' })
  })

  it('uses the CSRF token of the new session from then on', async () => {
    const api = fakeApi({
      'GET /api/session': nobody,
      'POST /api/session': () => json({ person: personOf('bender'), csrfToken: 'inside' }),
      'PATCH /api/me': () => json(personOf('bender', { theme: 'dark' })),
    })
    const { user } = renderApp('/account')
    await fillIn(user, 'ines@example.com')
    await user.click(await screen.findByRole('radio', { name: 'Dark' }))
    await waitFor(() => expect(document.documentElement).toHaveAttribute('data-theme', 'dark'))
    expect(api.seen('PATCH /api/me')[0]?.headers.get('x-csrf-token')).toBe('inside')
  })

  it.each([
    ['wrong-credentials', /do not fit together.*Type both again/],
    ['too-many-requests', /Too many tries.*Wait a few minutes/],
    ['internal', /The server failed.*Try again in a moment/],
  ] as const)('says in words what %s means', async (code, words) => {
    fakeApi({ 'GET /api/session': nobody, 'POST /api/session': () => problem(code) })
    const { user } = renderApp('/')
    await fillIn(user, 'ines@example.com')
    expect(await screen.findByRole('alert')).toHaveTextContent(words)
    expect(screen.getByLabelText('Mail address')).toHaveValue('ines@example.com')
  })

  it('says so when no answer comes', async () => {
    fakeApi({ 'GET /api/session': nobody, 'POST /api/session': noAnswer })
    const { user } = renderApp('/')
    await fillIn(user, 'ines@example.com')
    expect(await screen.findByRole('alert')).toHaveTextContent('No answer from the server.')
  })

  it('asks for what is missing before anything is sent', async () => {
    const api = fakeApi({ 'GET /api/session': nobody })
    const { user } = renderApp('/')
    await user.type(await screen.findByLabelText('Mail address'), 'ines')
    await user.click(screen.getByRole('button', { name: 'Sign in' }))
    expect(await screen.findByText(/such as name@example\.com/)).toBeVisible()
    expect(screen.getByText('Type your password.')).toBeVisible()
    expect(api.seen('POST /api/session')).toEqual([])
  })

  it('speaks Spanish when asked to, its errors too, and remembers it on the device', async () => {
    fakeApi({
      'GET /api/session': nobody,
      'POST /api/session': () => problem('wrong-credentials'),
    })
    const { user } = renderApp('/')
    await user.click(await screen.findByRole('button', { name: 'Español' }))
    await user.type(await screen.findByLabelText('Correo electrónico'), 'ines@example.com')
    await user.type(screen.getByLabelText('Contraseña'), 'x')
    await user.click(screen.getByRole('button', { name: 'Entrar' }))
    expect(await screen.findByRole('alert')).toHaveTextContent('no corresponden')
    expect(document.documentElement).toHaveAttribute('lang', 'es')
    expect(window.localStorage.getItem('foldyard.language')).toBe('es')
  })
})

describe('a session that ends by itself', () => {
  const person = personOf('manager')

  async function endWhileTyping() {
    const api = fakeApi({
      'GET /api/session': () => json({ person, csrfToken: 'inside' }),
      'PATCH /api/me': () => problem('not-signed-in'),
    })
    const app = renderApp('/account')
    const name = await screen.findByLabelText('Name')
    await app.user.clear(name)
    await app.user.type(name, 'Ines C.')
    await app.user.click(screen.getByRole('button', { name: 'Save name' }))
    await screen.findByText(/your session ended/)
    return { ...app, api }
  }

  it('brings the sign-in page up, with the person known', async () => {
    const { live } = await endWhileTyping()
    expect(screen.getByLabelText('Mail address')).toHaveValue(person.email)
    expect(screen.queryByRole('textbox', { name: 'Name' })).not.toBeInTheDocument()
    expect(live.last().readyState).toBe(EventSource.CLOSED)
  })

  it('keeps the address and what was typed for after signing in', async () => {
    const { user, api, router } = await endWhileTyping()
    api.on('POST /api/session', () => json({ person, csrfToken: 'again' }))
    await user.type(screen.getByLabelText('Password'), 'correct horse')
    await user.click(screen.getByRole('button', { name: 'Sign in' }))
    expect(await screen.findByRole('textbox', { name: 'Name' })).toHaveValue('Ines C.')
    expect(router.state.location.pathname).toBe('/account')
    expect(screen.queryByRole('alert')).not.toBeInTheDocument()
  })

  it('shows nothing of it to another person, who begins at the start', async () => {
    const { user, api, router } = await endWhileTyping()
    const other = personOf('bender', {
      id: '11111111-2222-4333-8444-555555555555',
      name: 'Wren Ash',
      email: 'wren@example.com',
    })
    api.on('POST /api/session', () => json({ person: other, csrfToken: 'again' }))
    await user.clear(screen.getByLabelText('Mail address'))
    await fillIn(user, other.email)
    await waitFor(() => expect(router.state.location.pathname).toBe('/brake'))
    expect(screen.queryByDisplayValue('Ines C.')).not.toBeInTheDocument()
  })
})

describe('signing out', () => {
  it('leads to the door, with nothing kept beneath', async () => {
    fakeApi({
      'GET /api/session': () => json({ person: personOf('manager'), csrfToken: 'inside' }),
      'DELETE /api/session': () => json(undefined, 204),
    })
    const { user } = renderApp('/account')
    await user.click(await screen.findByRole('button', { name: 'Sign out here' }))
    expect(await screen.findByLabelText('Mail address')).toHaveValue('')
    expect(screen.queryByText(/your session ended/)).not.toBeInTheDocument()
    expect(screen.queryByText('Signing out')).not.toBeInTheDocument()
  })

  it('everywhere asks back first', async () => {
    const api = fakeApi({
      'GET /api/session': () => json({ person: personOf('manager'), csrfToken: 'inside' }),
      'DELETE /api/sessions': () => json(undefined, 204),
    })
    const { user } = renderApp('/account')
    await user.click(await screen.findByRole('button', { name: 'Sign out everywhere' }))
    expect(api.seen('DELETE /api/sessions')).toEqual([])
    await user.click(screen.getByRole('button', { name: 'Sign out everywhere now' }))
    expect(await screen.findByLabelText('Mail address')).toBeVisible()
    expect(api.seen('DELETE /api/sessions')).toHaveLength(1)
  })
})
