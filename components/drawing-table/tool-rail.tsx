'use client'
/** Tools at the left hand, and how near one stands. */
import { useDesk, useEditorState } from './desk-context'
import { FartherIcon, FitIcon, HelpIcon, MoveIcon, NearerIcon, PickUpIcon, PlantIcon, RoomIcon } from './icons'
import { BUTTON, CommandButton } from './parts'

const TOOL = `${BUTTON} min-h-14 w-full flex-col gap-0.5 px-0.5 text-[13px] whitespace-nowrap leading-tight hover:bg-sheet aria-disabled:text-ink-soft`

function ToolButton({ isOn, onPress, children }: { isOn: boolean; onPress: () => void; children: React.ReactNode }) {
  return (
    <button type="button" aria-pressed={isOn} onClick={onPress} className={`${TOOL} aria-pressed:bg-sheet aria-pressed:font-bold aria-pressed:text-leaf aria-pressed:shadow-[inset_0_0_0_1px_var(--color-leaf)]`}>
      {children}
    </button>
  )
}

export function ToolRail() {
  const { editor, page } = useDesk()
  const { tool, grid } = useEditorState()
  return (
    <div role="toolbar" aria-label="Tools" aria-orientation="vertical" className="flex w-18 shrink-0 flex-col gap-1 overflow-y-auto border-r border-rule p-1.5">
      {editor.canEdit ? (
        <>
          <ToolButton isOn={tool.kind === 'move'} onPress={() => editor.setTool({ kind: 'move' })}><MoveIcon />Move</ToolButton>
          <ToolButton isOn={tool.kind === 'plant'} onPress={page.openPlants}><PlantIcon />Plant</ToolButton>
          <CommandButton id="pick-up" label="Pick up the selected plant, then tap where it goes" className={TOOL}><PickUpIcon />Pick up</CommandButton>
          <ToolButton isOn={grid === 1} onPress={() => editor.setGrid(grid === 1 ? 1 / 64 : 1)}>
            <span className="font-mono text-base leading-6">{grid === 1 ? '1 in' : '1/64'}</span>Snap
          </ToolButton>
        </>
      ) : null}
      <ToolButton isOn={tool.kind === 'room'} onPress={() => (tool.kind === 'room' ? editor.setTool({ kind: 'move' }) : page.openRoom())}><RoomIcon />What fits</ToolButton>
      <div className="mt-auto flex flex-col gap-1 border-t border-rule pt-1">
        <CommandButton id="zoom-in" className={TOOL}><NearerIcon />Nearer</CommandButton>
        <CommandButton id="zoom-out" className={TOOL}><FartherIcon />Farther</CommandButton>
        <CommandButton id="fit" className={TOOL}><FitIcon />Whole</CommandButton>
        <CommandButton id="help" className={TOOL}><HelpIcon />Keys</CommandButton>
      </div>
    </div>
  )
}
