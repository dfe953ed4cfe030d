'use client'

import { useEffectEvent, useLayoutEffect, type RefObject } from 'react'
import type { RawInputs } from './address'
import { textOfRaw } from './field-kinds'

const prefix = 'input-'

/**
 * A page made ahead can be typed into before its scripts arrive. What was typed by then is taken over instead of lost:
 * it is what the boxes hold that the page did not write.
 */
export function useTypedEarly(
  form: RefObject<HTMLFormElement | null>,
  raw: RawInputs,
  set: (change: RawInputs) => void,
): void {
  const takeOver = useEffectEvent(() => {
    const boxes = form.current?.querySelectorAll<HTMLInputElement>(`input[id^="${prefix}"]`) ?? []
    const typed = [...boxes].filter(({ id, value }) => value !== textOfRaw(raw[id.slice(prefix.length)]))
    if (typed.length > 0) set(Object.fromEntries(typed.map(({ id, value }) => [id.slice(prefix.length), value])))
  })
  useLayoutEffect(() => takeOver(), [])
}
