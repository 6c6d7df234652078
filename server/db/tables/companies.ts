export const COMPANIES = 'companies'

export interface CompanyRow {
  id: string
  name: string
  created_at: Date
}
export type CompanyInsert = Pick<CompanyRow, 'name'> & Partial<CompanyRow>
export type CompanyUpdate = Partial<Pick<CompanyRow, 'name'>>
