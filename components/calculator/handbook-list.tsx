'use client'

import Link from 'next/link'
import { useDeferredValue, useState } from 'react'
import { TextField } from '../ui/text-field'
import { findCalculators, type Listed } from './find'
import { useLastUsedIds } from './last-used'

interface HandbookListProps {
  calculators: readonly Listed[]
  stages: readonly { id: string; name: string; says: string }[]
}

/** The calculators by stage, the last used first; one box searches them all. */
export function HandbookList({ calculators, stages }: HandbookListProps) {
  const [query, setQuery] = useState('')
  const asked = useDeferredValue(query)
  const lastUsed = useLastUsedIds().flatMap((id) => calculators.find((each) => each.id === id) ?? [])
  return (
    <>
      <TextField
        label="What do you want to know?"
        className="max-w-[620px]"
        type="search"
        value={query}
        onChange={(event) => setQuery(event.target.value)}
        hint="A trade word will do: miter, pitch, long point, sticks."
      />
      {asked.trim() !== '' ? (
        <Found found={findCalculators(asked, calculators)} />
      ) : (
        <>
          {lastUsed.length > 0 && <Group title="Last used here" calculators={lastUsed} />}
          {stages.map(({ id, name, says }) => (
            <Group key={id} title={name} says={says} calculators={calculators.filter(({ stage }) => stage === id)} />
          ))}
        </>
      )}
    </>
  )
}

function Found({ found }: { found: readonly Listed[] }) {
  if (found.length > 0)
    return <Group title={found.length === 1 ? 'One fits' : `${found.length} fit`} calculators={found} />
  return (
    <p role="status" className="my-8 max-w-[62ch]">
      Nothing in the handbook goes by that name. Try one word of what the hand does: cut, slope, height, stick.
    </p>
  )
}

function Group({ title, says, calculators }: { title: string; says?: string; calculators: readonly Listed[] }) {
  if (calculators.length === 0) return null
  return (
    <section className="my-9">
      <h2>{title}</h2>
      {says && <p className="mt-1 text-mute">{says}</p>}
      <ul className="handbook-list">
        {calculators.map(({ id, name, asks }) => (
          <li key={id}>
            <Link href={`/handbook/${id}`} prefetch={false}>
              <b>{name}</b>
              <span>{asks}</span>
            </Link>
          </li>
        ))}
      </ul>
    </section>
  )
}
