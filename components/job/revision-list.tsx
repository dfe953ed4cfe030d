import Link from 'next/link'
import type { RevisionLine } from '@/lib/schemas/views'
import { dayInWords } from './day'

interface Props {
  path: string
  revisions: readonly RevisionLine[]
  shown: number
}

/** Every revision, newest first: open one, or see what changed from the one before. */
export function RevisionList({ path, revisions, shown }: Props) {
  return (
    <ol className="grid gap-2">
      {revisions.map(({ revision, note, createdBy, createdAt, supersededAt }) => (
        <li key={revision} className="border-b border-rule py-2">
          <Link
            href={`${path}?revision=${revision}`}
            prefetch={false}
            aria-current={revision === shown ? 'page' : undefined}
          >
            Revision {revision}
          </Link>
          {supersededAt ? ' · superseded' : ' · the one that counts'}
          <span className="block text-mute">
            {note || 'first measure'} · {createdBy}, {dayInWords(createdAt)}
          </span>
          {revision > 1 && (
            <Link href={`${path}/compare?was=${revision - 1}&is=${revision}`} prefetch={false}>
              What changed from {revision - 1}
            </Link>
          )}
        </li>
      ))}
    </ol>
  )
}
