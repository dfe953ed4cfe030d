// The look of a drawing is needed from the first paint on, what draws it later.
import '../../drawing/plate.module.css'
import { drawnLater } from './drawn-later'

export const RailPlateLater = drawnLater(async () => (await import('./rail-plate')).RailPlate)
export const RailResultsLater = drawnLater(async () => (await import('./rail-results')).RailResults)
export const WorkingLater = drawnLater(async () => (await import('../working')).Working)
export const RailBeingOffLater = drawnLater(async () => (await import('./rail-being-off')).RailBeingOff)
