import type { MDXComponents } from 'mdx/types'

/** Components that prose in content/ may name. */
export function useMDXComponents(): MDXComponents {
  return {}
}
