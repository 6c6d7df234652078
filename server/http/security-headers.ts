import type { RequestHandler } from 'express'
import helmet from 'helmet'

const CONTENT_SECURITY_POLICY = {
  defaultSrc: ["'self'"],
  scriptSrc: ["'self'"],
  scriptSrcAttr: ["'none'"],
  styleSrc: ["'self'"],
  // Positions that widgets and the canvas container compute at run time.
  styleSrcAttr: ["'unsafe-inline'"],
  imgSrc: ["'self'", 'data:', 'blob:'],
  fontSrc: ["'self'"],
  connectSrc: ["'self'"],
  workerSrc: ["'self'"],
  manifestSrc: ["'self'"],
  objectSrc: ["'none'"],
  baseUri: ["'none'"],
  formAction: ["'self'"],
  frameAncestors: ["'none'"],
}

export interface SecurityOptions {
  /** Served over TLS: only then may a browser be told to insist on it. */
  readonly secure: boolean
  /** Off only for the development server, whose tools write scripts into the page. */
  readonly contentSecurityPolicy: boolean
}

export const securityHeaders = (options: SecurityOptions): RequestHandler =>
  helmet({
    strictTransportSecurity: options.secure && { maxAge: 31_536_000, includeSubDomains: false },
    contentSecurityPolicy: options.contentSecurityPolicy && {
      useDefaults: false,
      directives: options.secure
        ? { ...CONTENT_SECURITY_POLICY, upgradeInsecureRequests: [] }
        : CONTENT_SECURITY_POLICY,
    },
    referrerPolicy: { policy: 'same-origin' },
  })
