import { notFound } from 'next/navigation'
import { Denied, NotFound } from '@/lib/errors'

/** For pages: what is missing and what is not this reader's are the same page, "nothing is there". */
export async function orNotFound<Found>(reading: Promise<Found>): Promise<Found> {
  try {
    return await reading
  } catch (error) {
    if (error instanceof NotFound || error instanceof Denied) notFound()
    throw error
  }
}
