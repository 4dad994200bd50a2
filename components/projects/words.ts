/** The choices of the site form as people say them. */
import type { Aim } from '@/lib/spacing'

export const MOISTURE = [{ value: 'dry', label: 'Dry' }, { value: 'medium', label: 'Medium' }, { value: 'wet', label: 'Wet' }]
export const DEER = [{ value: 'none', label: 'None' }, { value: 'some', label: 'Some' }, { value: 'high', label: 'High' }]
export const WALNUT = [
  { value: 'none', label: 'None known' },
  { value: 'present', label: 'A black walnut stands near' },
  { value: 'removed', label: 'A black walnut was removed' },
]
export const AIM_WORDS: Record<Aim, string> = {
  birds: 'Birds', pollinators: 'Pollinators', deer: 'Safe from deer', children: 'Children play here', pets: 'Pets live here',
  'low-upkeep': 'Little upkeep', winter: 'Something to see in winter',
}
