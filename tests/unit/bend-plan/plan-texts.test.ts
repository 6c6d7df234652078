import { describe, expect, test } from 'vitest'
import {
  gaugeRestSchema,
  moveSchema,
  planCheckSchema,
  planCureSchema,
  reasonCodeSchema,
} from '#shared/bend-plan/plan.schema'
import { reasonText } from '#shared/bend-plan/reason-text'
import en from '../../../src/locales/en/plan.json'
import es from '../../../src/locales/es/plan.json'

const keys = (of: object): string[] =>
  Object.entries(of).flatMap(([key, value]: [string, unknown]) =>
    typeof value === 'object' && value !== null
      ? keys(value).map((inner) => `${key}.${inner}`)
      : [key],
  )

const places = (text: string) => [...text.matchAll(/\{\{(\w+)\}\}/g)].map(([, name]) => name).sort()

describe('texts of the plan', () => {
  test('both languages say the same things about the same figures', () => {
    expect(keys(es)).toEqual(keys(en))
    expect(Object.values(es.reason).map(places)).toEqual(Object.values(en.reason).map(places))
  })

  test('every code has its text', () => {
    expect(Object.keys(en.check)).toEqual(planCheckSchema.options)
    expect(Object.keys(en.move)).toEqual(moveSchema.options)
    expect(Object.keys(en.restsOn)).toEqual(gaugeRestSchema.options)
    expect(Object.keys(en.cure)).toEqual(planCureSchema.shape.code.options)
    const figures = { found: 1, limit: 2 }
    for (const code of reasonCodeSchema.options) {
      expect(Object.keys(en.reason)).toContain(reasonText({ code, bend: 1, ...figures }).key)
    }
  })

  test('a fold beyond the brake and a hem outside its hems are told apart', () => {
    const angle = { code: 'angle' as const }
    expect(reasonText({ ...angle, bend: 2, found: 150, limit: 140 })).toEqual({
      key: 'angleBend',
      unit: 'degrees',
    })
    expect(reasonText({ ...angle, bend: 'hemA', found: 0.25, limit: 0.375 })).toEqual({
      key: 'angleHemShort',
      unit: 'inches',
    })
    expect(reasonText({ ...angle, bend: 'hemB', found: 2, limit: 1 }).key).toBe('angleHemLong')
  })
})
