// The look of a drawing is needed from the first paint on, what draws it later.
import '../../drawing/plate.module.css'
import { drawnLater } from './drawn-later'

const parts = () => import('./later-parts')

export const RailPlateLater = drawnLater(async () => (await parts()).RailPlate)
export const RailResultsLater = drawnLater(async () => (await parts()).RailResults)
/** Folded away at first: it opens without them, and they are there by the time a hand is. */
export const ExtraSetsLater = drawnLater(async () => (await parts()).ExtraSets)
export const WorkingLater = drawnLater(async () => (await parts()).Working)
export const RailCautionsLater = drawnLater(async () => (await parts()).RailCautions)
export const RailBeingOffLater = drawnLater(async () => (await parts()).RailBeingOff)
