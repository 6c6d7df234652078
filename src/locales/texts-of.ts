/** The texts of a language by namespace: one a file, named like the file. */
export type Texts = Record<string, Record<string, unknown>>

export const textsOf = (files: Record<string, Record<string, unknown>>): Texts =>
  Object.fromEntries(
    Object.entries(files).map(([path, texts]) => {
      const [, namespace] = /\/([\w-]+)\.json$/.exec(path) ?? []
      if (namespace === undefined) throw new Error(`No locale: ${path}`)
      return [namespace, texts]
    }),
  )
