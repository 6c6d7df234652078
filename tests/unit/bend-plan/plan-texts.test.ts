import { describe, expect, test } from 'vitest'
import {
  gaugeRestSchema,
  moveSchema,
  planCheckSchema,
  planCureSchema,
  reasonCodeSchema,
} from '#shared/bend-plan/plan.schema'
import { reasonText } from '#shared/bend-plan/reason-text'
import type { Told } from '#shared/bend-plan/reason-text'
import en from '../../../src/locales/en/plan.json'
import es from '../../../src/locales/es/plan.json'

const keys = (of: object): string[] =>
  Object.entries(of).flatMap(([key, value]: [string, unknown]) =>
    typeof value === 'object' && value !== null
      ? keys(value).map((inner) => `${key}.${inner}`)
      : [key],
  )

const told = (reason: Partial<Told> & Pick<Told, 'code'>) =>
  reasonText({ bend: 1, found: null, limit: null, overlap: null, edge: null, ...reason })

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
    for (const code of reasonCodeSchema.options) {
      expect(Object.keys(en.reason)).toContain(told({ code, found: 1, limit: 2 }).key)
      const over = told({ code, overlap: 0.25, edge: 'A' })
      expect(Object.keys(en.reason)).toContain(over.key)
      expect(over.key.endsWith('Over')).toBe(over.overlap !== null)
    }
  })

  test('an overlap is told up to the next sixteenth, and never less than it is', () => {
    const at = (overlap: number) => told({ code: 'trapped', overlap, edge: 'B' }).overlap
    expect([at(0.125), at(0.125_000_01), at(0.126), at(0.19)]).toEqual([0.125, 0.125, 0.1875, 0.25])
    expect(told({ code: 'trapped' })).toEqual({ key: 'trapped', unit: null, overlap: null })
    // The throat has its own figures.
    expect(told({ code: 'throat', found: 22, limit: 20, overlap: 2, edge: 'A' })).toEqual({
      key: 'throat',
      unit: 'inches',
      overlap: null,
    })
  })

  test('a fold beyond the brake and a hem outside its hems are told apart', () => {
    const angle = { code: 'angle' as const }
    expect(told({ ...angle, bend: 2, found: 150, limit: 140 })).toEqual({
      key: 'angleBend',
      unit: 'degrees',
      overlap: null,
    })
    expect(told({ ...angle, bend: 'hemA', found: 0.25, limit: 0.375 })).toEqual({
      key: 'angleHemShort',
      unit: 'inches',
      overlap: null,
    })
    expect(told({ ...angle, bend: 'hemB', found: 2, limit: 1 }).key).toBe('angleHemLong')
  })
})
