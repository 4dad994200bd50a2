import { Button } from '@/components/ui'

export interface Demo {
  password: string
  studios: readonly { name: string; people: readonly { name: string; email: string; role: string }[] }[]
}

/** The accounts of the demonstration; one tap fills the form with one of them. */
export function DemoSignIns({ demo, onPick }: { demo: Demo; onPick: (email: string, password: string) => void }) {
  return (
    <section aria-labelledby="demo-title" className="mt-5 border-t border-rule pt-4">
      <h2 id="demo-title" className="font-heading text-xl">This is the demonstration</h2>
      <p className="text-ink-soft">Tap a person to fill the form. Everyone&apos;s password: <span className="font-mono text-ink">{demo.password}</span></p>
      {demo.studios.map((studio) => (
        <div key={studio.name} className="mt-3">
          <h3 className="font-bold">{studio.name}</h3>
          <ul className="mt-1 grid gap-2">
            {studio.people.map(({ name, email, role }) => (
              <li key={email}>
                <Button onClick={() => onPick(email, demo.password)} className="w-full py-1.5">
                  <span className="min-w-0 flex-1 text-left"><span className="block font-bold">{name}</span><span className="block text-sm break-all text-ink-soft">{email}</span></span>
                  <span className="text-sm text-ink-soft">{role}</span>
                </Button>
              </li>
            ))}
          </ul>
        </div>
      ))}
    </section>
  )
}
