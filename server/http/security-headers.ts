import { createHash } from 'node:crypto'
import type { RequestHandler } from 'express'
import helmet from 'helmet'

/** The style elements that the widget library writes, letter for letter; any other is refused. */
const LIBRARY_STYLES = [
  `@layer {
  [data-react-aria-pressable] {
    touch-action: pan-x pan-y pinch-zoom;
  }
}`,
  `@layer {
  * {
    overscroll-behavior: contain;
  }
}`,
]

const hashSource = (text: string): string =>
  `'sha256-${createHash('sha256').update(text).digest('base64')}'`

const CONTENT_SECURITY_POLICY = {
  defaultSrc: ["'self'"],
  scriptSrc: ["'self'"],
  scriptSrcAttr: ["'none'"],
  styleSrc: ["'self'", ...LIBRARY_STYLES.map(hashSource)],
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
