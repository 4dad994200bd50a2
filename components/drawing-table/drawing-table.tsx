'use client'
/** The drawing table of one facade: the drawing in the middle, tools at the left, words and numbers at the right, time below. */
import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { useEffect, useMemo, useState } from 'react'
import { v7 as newId } from 'uuid'
import type { Sheet } from '@/lib/spacing'
import { Announcements } from './announcements'
import { saveCalls } from './calls'
import { DeskProvider, useDesk, useEditorState } from './desk-context'
import { DrawingFrame } from './drawing-frame'
import { createDesk, MemoryQueueStore, openDesk, type Desk, type SheetReport } from './editor'
import { IdbQueueStore, lockWatch } from './editor/save-queue-idb'
import { HelpDialog } from './help-dialog'
import { PlantPicker } from './plant-picker'
import { RoomPanel } from './room-panel'
import { SaveNotices } from './save-notices'
import { SidePanel, type TabName } from './side-panel'
import { systemClock } from './system-clock'
import { TimeBar } from './time-bar'
import { ToolRail } from './tool-rail'
import { TopBar } from './top-bar'
import type { TableFacade } from './types'

interface Props {
  facade: TableFacade
  sheet: Sheet
  seq: number
  report: SheetReport
  /** Without it the table is for looking only. */
  canEdit: boolean
  canListPlants: boolean
}

/** Desks of this tab by facade: one that still has edits waiting is gone on with, not opened beside itself. */
const desks = new Map<string, Desk>()
/** Sheets a desk has been opened on: met again, after a step back in the browser, they are old. */
const seen = new WeakSet<Sheet>()

function makeDesk({ facade, sheet, seq, report, canEdit }: Props): Desk {
  const isBrowser = typeof window !== 'undefined'
  const live = isBrowser ? desks.get(facade.id) : undefined
  if (live && live.queue.unsaved.length > 0) return live
  return createDesk({
    facade: facade.id, sheet, seq, report, canEdit, newId, clock: systemClock, calls: saveCalls(facade.id),
    store: isBrowser && 'indexedDB' in window ? new IdbQueueStore(lockWatch(), systemClock.now) : new MemoryQueueStore(),
  })
}

/** Desks already open: an effect may run twice, edits may not be claimed twice. */
const opened = new WeakSet<Desk>()

function useOpenDesk(desk: Desk, facade: string, sheet: Sheet) {
  useEffect(() => {
    desks.set(facade, desk)
    if (!opened.has(desk)) {
      opened.add(desk)
      void openDesk(desk)
      if (seen.has(sheet)) void desk.refresh()
      seen.add(sheet)
    }
    const { queue } = desk
    const shown = (event: PageTransitionEvent) => {
      if (event.persisted) void desk.refresh()
    }
    const leaving = (event: BeforeUnloadEvent) => {
      const { waiting, isLasting } = queue.getSnapshot()
      if (waiting > 0 && !isLasting) event.preventDefault()
    }
    const ears = new AbortController()
    const { signal } = ears
    window.addEventListener('online', queue.wake, { signal })
    window.addEventListener('focus', queue.wake, { signal })
    window.addEventListener('pageshow', shown, { signal })
    window.addEventListener('beforeunload', leaving, { signal })
    return () => ears.abort()
  }, [desk, facade, sheet])
}

export function DrawingTable(props: Props) {
  const [desk] = useState(() => makeDesk(props))
  const [queries] = useState(() => new QueryClient())
  const [tab, setTab] = useState<TabName>('findings')
  const [isHelpOpen, setHelpOpen] = useState(false)
  useOpenDesk(desk, props.facade.id, props.sheet)
  const page = useMemo(() => ({
    openHelp: () => setHelpOpen(true),
    openPlants: () => desk.editor.setTool({ kind: 'plant', plant: null }),
    openRoom: () => desk.editor.setTool({ kind: 'room' }),
  }), [desk])
  return (
    <QueryClientProvider client={queries}>
      <DeskProvider desk={desk} page={page}>
        <div className="flex min-h-0 flex-1 flex-col">
          <TopBar facade={props.facade} canListPlants={props.canListPlants} />
          <SaveNotices />
          <div className="flex min-h-0 flex-1">
            <ToolRail />
            <DrawingFrame name={props.facade.name} />
            <Beside facadeId={props.facade.id} tab={tab} onTab={setTab} />
          </div>
          <TimeBar />
        </div>
        <HelpDialog isOpen={isHelpOpen} onClose={() => setHelpOpen(false)} />
        <Announcements />
      </DeskProvider>
    </QueryClientProvider>
  )
}

/** The library while a plant is being chosen, what fits while one asks, else the words and numbers; the table needs more room than the sentences. */
function Beside({ facadeId, tab, onTab }: { facadeId: string; tab: TabName; onTab: (tab: TabName) => void }) {
  const { editor } = useDesk()
  const { tool } = useEditorState()
  const close = () => editor.setTool({ kind: 'move' })
  return (
    <aside aria-label="Beside the drawing" className={`flex min-h-0 shrink-0 flex-col border-l border-rule ${tool.kind === 'move' && tab === 'plants' ? 'w-[37rem]' : 'w-88 xl:w-96'}`}>
      {tool.kind === 'plant' ? <PlantPicker onClose={close} /> : tool.kind === 'room' ? <RoomPanel facadeId={facadeId} onClose={close} /> : <SidePanel tab={tab} onTab={onTab} />}
    </aside>
  )
}
