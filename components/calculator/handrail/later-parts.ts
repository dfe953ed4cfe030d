/** What the page draws again once somebody is there: one file to fetch. */
export { Working } from '../working'
export { ExtraSets } from './extra-sets'
export { RailBeingOff } from './rail-being-off'
export { RailCautions } from './rail-cautions'
export { RailPlate } from './rail-plate'
export { RailResults } from './rail-results'
