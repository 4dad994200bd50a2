import { AIM_WORDS, DEER_PRESSURE_WORDS, MOISTURE_WORDS, WALNUT_WORDS, type ProjectInput } from '@/lib/project'

const degrees = ({ latitude, longitude }: ProjectInput) =>
  latitude === undefined || longitude === undefined
    ? 'Not given'
    : `${Math.abs(latitude)}° ${latitude < 0 ? 'S' : 'N'}, ${Math.abs(longitude)}° ${longitude < 0 ? 'W' : 'E'}`

function factsOf(project: ProjectInput): [string, string][] {
  return [
    ['Client', project.clientName || 'Not named'],
    ['Address', project.address || 'Not given'],
    ['Hardiness zone', project.zone],
    ['Where', degrees(project)],
    ['Soil moisture', MOISTURE_WORDS[project.moisture]],
    ['Deer', DEER_PRESSURE_WORDS[project.deer]],
    ['Black walnut', WALNUT_WORDS[project.walnut]],
    ['Wildfire zone', project.fireZone ? 'Yes: local law decides what may be planted' : 'No'],
    ['The brief', project.brief.map((aim) => AIM_WORDS[aim]).join(', ') || 'Nothing asked for'],
    ['Notes', project.notes || 'None'],
  ]
}

/** The commission and its site, to read. */
export function SiteFacts({ project }: { project: ProjectInput }) {
  return (
    <dl className="grid gap-x-8 gap-y-3 border border-rule bg-sheet p-4 sm:grid-cols-2 lg:grid-cols-4">
      {factsOf(project).map(([name, value]) => (
        <div key={name} className={name === 'Notes' ? 'sm:col-span-2' : undefined}>
          <dt className="text-sm text-ink-soft">{name}</dt>
          <dd className="break-words whitespace-pre-line">{value}</dd>
        </div>
      ))}
    </dl>
  )
}
