import type { TestProject } from 'vitest/node'
import { createProductDatabase, startProduct } from './product-process'

declare module 'vitest' {
  interface ProvidedContext {
    /** Where the built product answers, with the demo shop in its database. */
    productUrl: string
    productDatabaseUrl: string
  }
}

/** Runs once before the browser tests: the product as it is built, on a port of its own. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const database = await createProductDatabase()
  try {
    const product = await startProduct(database.url)
    project.provide('productUrl', product.url)
    project.provide('productDatabaseUrl', database.url)
    return async () => {
      await product.stop()
      await database.drop()
    }
  } catch (error) {
    await database.drop()
    throw error
  }
}
