import { Router } from 'express'
import { createApiDocument } from '#server/http/document/api-document'
import { API_PAGE_STYLE, createApiPage } from '#server/http/document/api-page'

/** The API's own description, for programs and for people; made once from the contract. */
export function documentRouter(): Router {
  const document = createApiDocument()
  const page = createApiPage(document, 'docs.css')
  const router = Router()
  router.get('/openapi.json', (_request, response) => {
    response.json(document)
  })
  router.get('/docs', (_request, response) => {
    response.type('html').send(page)
  })
  router.get('/docs.css', (_request, response) => {
    response.type('css').send(API_PAGE_STYLE)
  })
  return router
}
