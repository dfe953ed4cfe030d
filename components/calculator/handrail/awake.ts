/** Signs that somebody is there: the drawing of a page made ahead can wait for the first of them, its numbers are drawn already. */
const signs = ['pointermove', 'pointerdown', 'keydown', 'focusin', 'scroll'] as const

let rouse: () => void = () => undefined
const roused = new Promise<void>((resolve) => {
  rouse = resolve
})

/** Ends the waiting at once: what was made ahead is not what this reader needs. */
export const wake = (): void => rouse()

/** Until somebody stirs, or the page is woken. A server waits for nobody. */
export function untilAwake(): Promise<void> {
  if (typeof window === 'undefined') return Promise.resolve()
  for (const sign of signs) window.addEventListener(sign, wake, { once: true, passive: true, capture: true })
  return roused
}
