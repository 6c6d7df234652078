/**
 * A fresh idempotency key (UUID version 4, RFC 9562). `crypto.randomUUID` exists on https and
 * localhost only; a shop that serves its own network over plain http has `getRandomValues`.
 */
export function newKey(): string {
  if (typeof crypto.randomUUID === 'function') return crypto.randomUUID()
  const bytes = crypto.getRandomValues(new Uint8Array(16))
  const hex = Array.from(bytes, (byte, index) => {
    if (index === 6) return (byte & 0x0f) | 0x40
    if (index === 8) return (byte & 0x3f) | 0x80
    return byte
  }).map((byte) => byte.toString(16).padStart(2, '0'))
  return [
    hex.slice(0, 4).join(''),
    hex.slice(4, 6).join(''),
    hex.slice(6, 8).join(''),
    hex.slice(8, 10).join(''),
    hex.slice(10).join(''),
  ].join('-')
}
