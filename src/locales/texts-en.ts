import { textsOf } from './texts-of'

/** All English texts, in one file of the build. */
export const texts = textsOf(
  import.meta.glob<Record<string, unknown>>('./en/*.json', { eager: true, import: 'default' }),
)
