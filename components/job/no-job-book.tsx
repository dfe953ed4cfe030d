import { ButtonLink } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/states'

/** What apprentices and instructors see where the job book would be. */
export function NoJobBook() {
  return (
    <>
      <h1>Job book</h1>
      <EmptyState
        title="Your sign-in keeps no job book"
        action={
          <ButtonLink href="/handbook/handrail" prefetch={false} variant="primary">
            Measure a stair
          </ButtonLink>
        }
      >
        Journeymen keep jobs and cut sheets here. Every calculator and its printed sheet is open to you all the same.
      </EmptyState>
    </>
  )
}
