export const JOBS = 'jobs'

export interface JobRow {
  id: string
  company_id: string
  name: string
  address: string
  pitch_rise: number
  version: number
  created_by: string
  created_at: Date
}
export type JobInsert = Pick<
  JobRow,
  'company_id' | 'name' | 'address' | 'pitch_rise' | 'created_by'
> &
  Partial<JobRow>
export type JobUpdate = Partial<Pick<JobRow, 'name' | 'address' | 'pitch_rise' | 'version'>>
