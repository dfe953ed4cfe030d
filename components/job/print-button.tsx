'use client'

import { Button } from '@/components/ui/button'

/** Prints the page as it stands. */
export function PrintButton() {
  return (
    <Button variant="primary" onClick={() => window.print()}>
      Print
    </Button>
  )
}
