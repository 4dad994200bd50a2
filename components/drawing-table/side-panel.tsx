'use client'
/** What is said of the drawing, in words and numbers. */
import { Tabs } from 'radix-ui'
import { FindingList } from '@/components/findings/finding-list'
import { BedsPanel } from './beds-panel'
import { useDesk, useEditorState } from './desk-context'
import { PlantForm } from './plant-form'
import { PlantsTable } from './plants-table'
import { WaysOut } from './ways-out'

export const TABS = ['findings', 'plants', 'plant', 'beds'] as const
export type TabName = (typeof TABS)[number]

const TAB = 'min-h-11 border-b-3 border-transparent px-2 whitespace-nowrap focus-visible:outline-2 focus-visible:-outline-offset-2 focus-visible:outline-leaf data-[state=active]:border-leaf data-[state=active]:font-bold data-[state=inactive]:text-ink-soft'
const PAGE = 'min-h-0 flex-1 overflow-y-auto focus-visible:outline-2 focus-visible:-outline-offset-2 focus-visible:outline-leaf'

export function SidePanel({ tab, onTab }: { tab: TabName; onTab: (tab: TabName) => void }) {
  const { editor } = useDesk()
  const { sheet, report, finding, selected } = useEditorState()
  return (
    <Tabs.Root value={tab} onValueChange={(value) => onTab(TABS.find((one) => one === value) ?? 'findings')} className="flex min-h-0 flex-1 flex-col">
      <Tabs.List aria-label="Beside the drawing" className="flex overflow-x-auto border-b border-rule px-1 pt-2">
        <Tabs.Trigger value="findings" className={TAB}>Findings {report.findings.length}</Tabs.Trigger>
        <Tabs.Trigger value="plants" className={TAB}>Plants {sheet.placements.length}</Tabs.Trigger>
        <Tabs.Trigger value="plant" className={TAB}>This plant</Tabs.Trigger>
        <Tabs.Trigger value="beds" className={TAB}>Beds</Tabs.Trigger>
      </Tabs.List>
      <Tabs.Content value="findings" className={PAGE}>
        <FindingList findings={report.findings} sheet={sheet} chosen={finding} selected={selected} onChoose={editor.selectFinding} renderChosen={(one) => <WaysOut finding={one} />} />
      </Tabs.Content>
      <Tabs.Content value="plants" className={PAGE}><PlantsTable /></Tabs.Content>
      <Tabs.Content value="plant" className={PAGE}><PlantForm /></Tabs.Content>
      <Tabs.Content value="beds" className={PAGE}><BedsPanel /></Tabs.Content>
    </Tabs.Root>
  )
}
