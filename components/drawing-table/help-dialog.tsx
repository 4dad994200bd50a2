'use client'
import { useEffect, useRef } from 'react'
import { COMMANDS, COMMAND_GROUPS } from './editor'
import { useDesk } from './desk-context'
import { PLAIN } from './parts'

/** The keys of the drawing, from the one list of commands. */
export function HelpDialog({ isOpen, onClose }: { isOpen: boolean; onClose: () => void }) {
  const { editor } = useDesk()
  const dialog = useRef<HTMLDialogElement>(null)
  useEffect(() => {
    const element = dialog.current
    if (isOpen && element && !element.open) element.showModal()
    if (!isOpen) element?.close()
  }, [isOpen])
  const shown = COMMANDS.filter(({ edits }) => editor.canEdit || !edits)
  return (
    <dialog ref={dialog} onClose={onClose} aria-labelledby="help-title" className="m-auto max-h-[85dvh] w-[min(40rem,92vw)] border border-ink bg-sheet p-6 text-ink backdrop:bg-ink/40">
      <div className="flex items-start justify-between gap-4">
        <h2 id="help-title" className="font-heading text-2xl">Keys of the drawing</h2>
        <button type="button" onClick={onClose} className={PLAIN}>Close</button>
      </div>
      <p className="mt-1 text-ink-soft">They work while the drawing has the focus. By finger: tap a plant to select it, tap it again to pick it up, tap where it goes. Two fingers pan and zoom.</p>
      <div className="mt-4 grid gap-x-8 gap-y-4 sm:grid-cols-2">
        {COMMAND_GROUPS.map((group) => {
          const commands = shown.filter((command) => command.group === group)
          return commands.length === 0 ? null : (
            <section key={group}>
              <h3 className="border-b border-rule font-bold">{group}</h3>
              <dl className="mt-1 grid grid-cols-[auto_1fr] gap-x-3 gap-y-1">
                {commands.map(({ id, label, keyText }) => (
                  <div key={id} className="col-span-2 grid grid-cols-subgrid">
                    <dt className="font-mono text-sm leading-6">{keyText}</dt>
                    <dd>{label}</dd>
                  </div>
                ))}
              </dl>
            </section>
          )
        })}
      </div>
    </dialog>
  )
}
