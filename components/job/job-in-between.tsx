import type { JobView } from '@/lib/schemas/views'

const rows = [
  ['Job', 'name'],
  ['Place', 'place'],
  ['For', 'client'],
  ['Notes', 'notes'],
] as const

/** What somebody else saved while this form was open; the form below still holds what was typed. */
export function JobInBetween({ theirs }: { theirs: JobView }) {
  return (
    <div role="alert" className="mb-5 border-l-8 border-off bg-field px-4 py-3">
      <p className="font-semibold">Somebody saved this job in between. Below is what you typed; theirs is:</p>
      <dl className="mt-2 grid grid-cols-[5rem_1fr] gap-x-3">
        {rows.map(([label, field]) => (
          <div key={field} className="contents">
            <dt className="text-mute">{label}</dt>
            <dd className="whitespace-pre-line">{theirs[field] || '(empty)'}</dd>
          </div>
        ))}
      </dl>
    </div>
  )
}
