import 'katex/dist/katex.min.css'
import type { Metadata } from 'next'
import Link from 'next/link'
import Note, { frontmatter } from '@/content/notes/taking-the-measure.mdx'

export const metadata: Metadata = { title: frontmatter.title, description: frontmatter.lede }

export default function TakingTheMeasurePage() {
  return (
    <article className="note">
      <p className="crumb">
        <Link href="/handbook" prefetch={false}>
          Handbook
        </Link>{' '}
        · To read first
      </p>
      <h1>{frontmatter.title}</h1>
      <p className="lede">{frontmatter.lede}</p>
      <Note />
    </article>
  )
}
