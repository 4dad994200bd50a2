import type { ProjectInput } from '@/lib/project'
import { AIM_WORDS, DEER, MOISTURE, WALNUT } from './words'

const word = (list: readonly { value: string; label: string }[], value: string) => list.find((one) => one.value === value)?.label ?? value

/** The facts of a site for those who only read them. */
export function SiteFacts({ project }: { project: ProjectInput }) {
  const facts: [string, string][] = [
    ['Client', project.clientName || 'not named'],
    ['Address', project.address || 'not given'],
    ['Hardiness zone', project.zone],
    ['Soil moisture', word(MOISTURE, project.moisture)],
    ['Deer', word(DEER, project.deer)],
    ['Black walnut', word(WALNUT, project.walnut)],
    ['Wildfire zone', project.fireZone ? 'yes; local law decides' : 'no'],
    ['Latitude, longitude', project.latitude === undefined || project.longitude === undefined ? 'not given' : `${project.latitude}, ${project.longitude}`],
    ['Wished for', (project.brief ?? []).map((aim) => AIM_WORDS[aim]).join(', ') || 'nothing said'],
    ['Notes', project.notes || 'none'],
  ]
  return (
    <dl className="grid gap-x-6 gap-y-2 sm:grid-cols-[auto_1fr]">
      {facts.map(([name, value]) => <div key={name} className="contents"><dt className="text-ink-soft">{name}</dt><dd className="min-w-0 break-words whitespace-pre-line">{value}</dd></div>)}
    </dl>
  )
}
