import { textsOf } from './texts-of'

/** All Spanish texts, in one file of the build. */
export const texts = textsOf(
  import.meta.glob<Record<string, unknown>>('./es/*.json', { eager: true, import: 'default' }),
)
