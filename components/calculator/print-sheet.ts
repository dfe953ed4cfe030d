import type { SheetAsk } from '@/lib/schemas/sheet'

/** Fetches the printable sheet of these inputs and opens it. False when it did not come. */
export async function openSheet(id: string, ask: SheetAsk): Promise<boolean> {
  try {
    const response = await fetch(`/api/calculators/${id}/sheet`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(ask),
    })
    if (!response.ok) return false
    const url = URL.createObjectURL(await response.blob())
    if (!window.open(url)) keep(url, `${id}.pdf`)
    return true
  } catch {
    return false
  }
}

/** Where a new window is refused, the sheet goes to the downloads. */
function keep(url: string, name: string): void {
  const link = document.createElement('a')
  link.href = url
  link.download = name
  link.click()
}
