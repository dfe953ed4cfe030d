import type { Metadata } from 'next'
import { NeedsScripts } from '@/components/calculator/needs-scripts'
import { CutSheetScreen } from '@/components/sheet/cut-sheet-screen'

export const metadata: Metadata = { title: 'Cut sheet', description: 'One page to cut, mark and fit a handrail by.' }

export default function CutSheetPage() {
  return (
    <>
      <h1 className="no-print mb-4">Cut sheet</h1>
      <NeedsScripts />
      <CutSheetScreen />
    </>
  )
}
