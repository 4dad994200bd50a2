/** Everything a key or a button of the drawing table can do: one list feeds the toolbar, the keyboard and the help. */
import type { Desk } from './desk'
import { neighbourOf } from './placing'

/** What the commands open in the page around the drawing. */
export interface Surroundings {
  openHelp: () => void
  openPlants: () => void
  openRoom: () => void
}

export interface CommandContext extends Desk {
  page: Surroundings
}

/** A key as the browser names it. Ctrl stands for Cmd too. */
export interface Stroke {
  key: string
  ctrl?: boolean
  shift?: boolean
}

export const COMMAND_GROUPS = ['Edit', 'Move', 'Look', 'Help'] as const

export interface Command {
  id: string
  label: string
  /** The key in words. */
  keyText: string
  strokes: readonly Stroke[]
  group: (typeof COMMAND_GROUPS)[number]
  /** Heard everywhere on the page but in fields; otherwise only while the drawing has the focus. */
  isGlobal?: boolean
  /** Hidden from those who may only read. */
  edits?: boolean
  when: (context: CommandContext) => boolean
  run: (context: CommandContext) => void
}

const always = () => true
const hasSelection = ({ editor }: CommandContext) => editor.getSnapshot().selected !== null
const canMove = (context: CommandContext) => context.editor.canEdit && hasSelection(context)

const STEP_IN = 1
const LONG_STEP_IN = 6
const ZOOM_STEP = 1.25

const ARROWS = [
  { key: 'ArrowLeft', id: 'left', words: 'left', dx: -1, dy: 0 },
  { key: 'ArrowRight', id: 'right', words: 'right', dx: 1, dy: 0 },
  { key: 'ArrowUp', id: 'in', words: 'towards the wall', dx: 0, dy: -1 },
  { key: 'ArrowDown', id: 'out', words: 'away from the wall', dx: 0, dy: 1 },
] as const

const arrow = ({ key, id, words, dx, dy }: (typeof ARROWS)[number], shift: boolean): Command => {
  const step = shift ? LONG_STEP_IN : STEP_IN
  return {
    id: `nudge-${id}${shift ? '-far' : ''}`, label: `${step} in ${words}`, keyText: `${shift ? 'Shift + ' : ''}${key.replace('Arrow', '')} arrow`,
    strokes: [{ key, shift }], group: 'Move', edits: true, when: canMove,
    run: ({ editor }) => editor.nudge(dx * step, dy * step),
  }
}

const along = (by: 1 | -1): Command => ({
  id: by > 0 ? 'next' : 'previous', label: by > 0 ? 'Next plant along the wall' : 'Plant before it', keyText: by > 0 ? 'Tab' : 'Shift + Tab',
  strokes: [{ key: 'Tab', shift: by < 0 }], group: 'Look',
  // Beyond the last plant the key leaves the drawing, as it leaves any field.
  when: ({ editor }) => neighbourOf(editor.getSnapshot().sheet, editor.getSnapshot().selected, by) !== null,
  run: ({ editor }) => editor.select(neighbourOf(editor.getSnapshot().sheet, editor.getSnapshot().selected, by)),
})

const EDITING: readonly Command[] = [
  {
    id: 'undo', label: 'Undo', keyText: 'Ctrl + Z', strokes: [{ key: 'z', ctrl: true }], group: 'Edit', isGlobal: true, edits: true,
    when: ({ editor }) => editor.canEdit && (editor.getSnapshot().undoLabel !== null || editor.moving !== null), run: ({ editor }) => editor.undo(),
  },
  {
    id: 'redo', label: 'Redo', keyText: 'Shift + Ctrl + Z', strokes: [{ key: 'z', ctrl: true, shift: true }, { key: 'y', ctrl: true }], group: 'Edit', isGlobal: true, edits: true,
    when: ({ editor }) => editor.canEdit && editor.getSnapshot().redoLabel !== null, run: ({ editor }) => editor.redo(),
  },
  {
    id: 'remove', label: 'Remove the plant', keyText: 'Delete', strokes: [{ key: 'Delete' }, { key: 'Backspace' }], group: 'Edit', edits: true,
    when: canMove, run: ({ editor }) => editor.remove(editor.getSnapshot().selected ?? ''),
  },
  {
    id: 'plant', label: 'Choose a plant', keyText: 'P', strokes: [{ key: 'p' }], group: 'Edit', edits: true,
    when: ({ editor }) => editor.canEdit, run: ({ page }) => page.openPlants(),
  },
  {
    id: 'pick-up', label: 'Pick up, or set down', keyText: 'Enter', strokes: [{ key: 'Enter' }], group: 'Move', edits: true,
    when: canMove, run: ({ editor }) => (editor.getSnapshot().isCarried ? editor.commitMove() : editor.pickUp()),
  },
]

/** Puts back what is held; else puts the plant in hand away; else lets go of what is selected. */
function escape({ editor }: CommandContext): void {
  if (editor.moving) editor.cancelMove()
  else if (editor.getSnapshot().tool.kind !== 'move') editor.setTool({ kind: 'move' })
  else editor.select(null)
}

const LOOKING: readonly Command[] = [
  along(1), along(-1),
  {
    id: 'escape', label: 'Put back, or let go', keyText: 'Escape', strokes: [{ key: 'Escape' }], group: 'Move',
    when: ({ editor }) => editor.moving !== null || editor.getSnapshot().tool.kind !== 'move' || editor.getSnapshot().selected !== null || editor.getSnapshot().finding !== null,
    run: escape,
  },
  { id: 'room', label: 'Ask what fits at a spot', keyText: 'F', strokes: [{ key: 'f' }], group: 'Look', when: always, run: ({ page }) => page.openRoom() },
  { id: 'zoom-in', label: 'Nearer', keyText: '+', strokes: [{ key: '+' }, { key: '=' }], group: 'Look', when: always, run: ({ viewport }) => viewport.zoom(ZOOM_STEP) },
  { id: 'zoom-out', label: 'Farther', keyText: '-', strokes: [{ key: '-' }], group: 'Look', when: always, run: ({ viewport }) => viewport.zoom(1 / ZOOM_STEP) },
  { id: 'fit', label: 'Whole sheet', keyText: '0', strokes: [{ key: '0' }], group: 'Look', when: always, run: ({ viewport }) => viewport.fit() },
  { id: 'year-on', label: 'A year later', keyText: ']', strokes: [{ key: ']' }], group: 'Look', when: always, run: ({ editor }) => editor.setYear(editor.getSnapshot().year + 1) },
  { id: 'year-back', label: 'A year earlier', keyText: '[', strokes: [{ key: '[' }], group: 'Look', when: always, run: ({ editor }) => editor.setYear(editor.getSnapshot().year - 1) },
  { id: 'help', label: 'Keys of the drawing', keyText: '?', strokes: [{ key: '?' }], group: 'Help', when: always, run: ({ page }) => page.openHelp() },
]

export const COMMANDS: readonly Command[] = [...EDITING, ...ARROWS.map((one) => arrow(one, false)), ...ARROWS.map((one) => arrow(one, true)), ...LOOKING]

/** A command by its id. */
export function commandNamed(id: string): Command {
  const command = COMMANDS.find((one) => one.id === id)
  if (!command) throw new Error(`There is no command ${id}.`)
  return command
}

interface KeyLike {
  key: string
  ctrlKey: boolean
  metaKey: boolean
  shiftKey: boolean
  altKey: boolean
}

const isLetterOrArrow = (key: string) => key.length > 1 || /[a-z]/i.test(key)

/** The command a key means, whether or not it can run now. Signs such as + and ? count with and without Shift. */
export function commandFor(event: KeyLike, { onDrawing }: { onDrawing: boolean }): Command | null {
  if (event.altKey) return null
  const hasCtrl = event.ctrlKey || event.metaKey
  const key = event.key.length === 1 ? event.key.toLowerCase() : event.key
  const isStroke = (stroke: Stroke) =>
    stroke.key === key && (stroke.ctrl ?? false) === hasCtrl && (!isLetterOrArrow(key) || (stroke.shift ?? false) === event.shiftKey)
  return COMMANDS.find((command) => (onDrawing || command.isGlobal) && command.strokes.some(isStroke)) ?? null
}

export const isArrow = (key: string): boolean => ARROWS.some((one) => one.key === key)
