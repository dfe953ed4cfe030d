'use client'

import './globals.css'

/** The last net: nothing of the layout stands here, so it brings its own page. */
export default function EverythingProblem({ retry }: { error: unknown; retry: () => void }) {
  return (
    <html lang="en">
      <body>
        <main>
          <h1>Longpoint could not be opened</h1>
          <p className="lede">It is our doing, not yours. Try again; numbers in the address bar are kept.</p>
          <button
            type="button"
            onClick={retry}
            className="min-h-12 cursor-pointer rounded-[3px] bg-ink px-5 text-paper"
          >
            Try again
          </button>
        </main>
      </body>
    </html>
  )
}
