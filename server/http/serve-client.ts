import { join, resolve } from 'node:path'
import express, { Router } from 'express'

/**
 * The built client. Files below /assets carry a hash in their names and never change; a missing one
 * is a 404, not the page. Every other path is a place of the client and gets the page.
 */
export function serveClient(directory: string): Router {
  const root = resolve(directory)
  const router = Router()
  router.use(
    '/assets',
    express.static(join(root, 'assets'), {
      fallthrough: false,
      index: false,
      immutable: true,
      maxAge: '1y',
    }),
  )
  router.use(express.static(root, { index: false, cacheControl: false, setHeaders: revalidate }))
  router.get('/{*path}', (_request, response) => {
    revalidate(response)
    response.sendFile(join(root, 'index.html'), { cacheControl: false })
  })
  return router
}

const revalidate = (response: { setHeader: (name: string, value: string) => unknown }): void => {
  response.setHeader('Cache-Control', 'no-cache')
}
