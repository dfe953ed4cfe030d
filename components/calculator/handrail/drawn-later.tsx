'use client'

import { use, useEffect, useState, type ComponentType } from 'react'
import { untilAwake } from './awake'

/**
 * A drawing that the server draws into the page, and whose means to draw again are fetched when somebody stirs. Until
 * then the browser keeps the server's own strokes, and needs none of what drew them.
 */
export function drawnLater<P extends object>(load: () => Promise<ComponentType<P>>): ComponentType<P> {
  let loading: Promise<ComponentType<P>> | undefined
  const once = () => (loading ??= load())

  function Later(props: P) {
    const [Drawn, setDrawn] = useState<ComponentType<P> | null>(null)
    useEffect(() => {
      let here = true
      void untilAwake()
        .then(once)
        .then((fetched) => here && setDrawn(() => fetched))
      return () => {
        here = false
      }
    }, [])
    if (Drawn)
      return (
        <div key="live" className="drawn-later">
          <Drawn {...props} />
        </div>
      )
    // What React does not know of it leaves alone: the server's drawing stands in here.
    return <div key="ahead" className="drawn-later" suppressHydrationWarning dangerouslySetInnerHTML={{ __html: '' }} />
  }

  function Ahead(props: P) {
    const Drawn = use(once())
    return (
      <div key="ahead" className="drawn-later">
        <Drawn {...props} />
      </div>
    )
  }

  return typeof window === 'undefined' ? Ahead : Later
}
