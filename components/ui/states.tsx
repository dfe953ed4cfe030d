import type { ReactNode } from 'react'
import { Panel } from './panel'

interface StateProps {
  title: string
  children?: ReactNode
  /** What one can do now. */
  action?: ReactNode
}

/** Nothing here yet, and how to begin. */
export function EmptyState({ title, children, action }: StateProps) {
  return (
    <Panel className="max-w-[62ch]">
      <h2 className="text-[26px]">{title}</h2>
      {children && <div className="mt-2 text-mute">{children}</div>}
      {action && <div className="mt-5 flex flex-wrap gap-3">{action}</div>}
    </Panel>
  )
}

/** Something is on its way; says what. */
export function LoadingState({ title = 'Fetching…' }: { title?: string }) {
  return (
    <div role="status" className="py-10 font-head text-2xl font-semibold text-mute">
      {title}
    </div>
  )
}

/** Something did not work: what, what is kept, and what to do. */
export function ProblemState({ title, children, action }: StateProps) {
  return (
    <Panel role="alert" className="max-w-[62ch] border-l-8 border-l-off">
      <h2 className="text-[26px]">{title}</h2>
      {children && <div className="mt-2">{children}</div>}
      {action && <div className="mt-5 flex flex-wrap gap-3">{action}</div>}
    </Panel>
  )
}
