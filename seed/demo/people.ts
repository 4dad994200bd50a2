/** The people and studios of the demonstration: invented, with addresses nobody can own. */
import type { MemberRole } from '@/lib/access'

export { DEMO_PASSWORD } from '@/lib/server/people/demo-password'

export interface DemoPerson {
  name: string
  email: string
  role: MemberRole
}

export const STUDIO = {
  name: 'Thimble Hill Planting',
  people: [
    { name: 'Orla Vantongeren', email: 'orla@thimblehill.example', role: 'owner' },
    { name: 'Ines Halloway', email: 'ines@thimblehill.example', role: 'designer' },
    { name: 'Piet Amselberg', email: 'piet@thimblehill.example', role: 'reviewer' },
    { name: 'Rue Castellan', email: 'rue@thimblehill.example', role: 'estimator' },
  ] satisfies DemoPerson[],
}

export const OTHER_STUDIO = {
  name: 'Low Fen Gardens',
  people: [
    { name: 'Tam Brandreth', email: 'tam@lowfen.example', role: 'owner' },
    { name: 'Wilf Ostrey', email: 'wilf@lowfen.example', role: 'designer' },
  ] satisfies DemoPerson[],
}
