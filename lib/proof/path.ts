import type { Output, Outputs } from '@/lib/calculators/outputs'

const isRecord = (item: unknown): item is Record<string, unknown> => typeof item === 'object' && item !== null
const isNamed = (item: unknown, key: string) => isRecord(item) && (item.id === key || item.mark === key)

/** Follows a path such as `parts/A/topEdge` into solved outputs: a list is entered by place, or by an item's id or mark. */
export function valueAt(solved: unknown, path: string): unknown {
  return path.split('/').reduce((inside: unknown, key) => {
    if (Array.isArray(inside)) return inside.find((item: unknown) => isNamed(item, key)) ?? inside[Number(key)]
    return isRecord(inside) ? inside[key] : undefined
  }, solved)
}

/** How the value at the end of a path is read; every item of a list is read alike. */
export function outputAt(outputs: Outputs, path: string): Output | undefined {
  const [name = '', ...rest] = path.split('/')
  return rest.reduce<Output | undefined>((inside, key) => {
    if (inside?.kind === 'list') return inside.of
    return inside?.kind === 'group' ? inside.of[key] : undefined
  }, outputs[name])
}
