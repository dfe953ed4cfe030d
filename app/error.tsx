'use client'

import { Button, ButtonLink } from '@/components/ui/button'
import { ProblemState } from '@/components/ui/states'

/** Something of ours broke while the page was made; what was typed lives in the address and is kept. */
export default function PageProblem({ retry }: { error: unknown; retry: () => void }) {
  return (
    <ProblemState
      title="This page broke off half-way"
      action={
        <>
          <Button variant="primary" onClick={retry}>
            Try again
          </Button>
          <ButtonLink href="/handbook" prefetch={false}>
            Open the handbook
          </ButtonLink>
        </>
      }
    >
      <p>It is our doing, not yours. Numbers in the address bar are still there; try again and they come back.</p>
    </ProblemState>
  )
}
