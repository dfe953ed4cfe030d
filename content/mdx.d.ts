/** Prose as a page imports it: the text, and what its head says. */
declare module '*.mdx' {
  import type { ComponentType } from 'react'

  export const frontmatter: { title: string; lede: string }
  const Text: ComponentType
  export default Text
}
