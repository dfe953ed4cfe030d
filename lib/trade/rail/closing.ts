import { closingError, closingVerdict } from '../field-check'
import type { Closing, Flight } from './types'

/** Whether rise, run and rake of the taped flights close; flights measured otherwise have nothing to close. */
export function closeFlights(flights: readonly Flight[]): Closing[] {
  return flights.flatMap((flight, i) => {
    if (!('nosingRise' in flight) || typeof flight.nosingRake !== 'number') return []
    const error = closingError(flight.nosingRise, flight.nosingRun, flight.nosingRake)
    return [{ flight: i + 1, error, verdict: closingVerdict(error) }]
  })
}
