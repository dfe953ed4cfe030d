// The look of a drawing is needed from the first paint on, what draws it later.
import '../../drawing/plate.module.css'
import { drawnLater } from './drawn-later'

export const RailPlateLater = drawnLater(async () => (await import('./rail-plate')).RailPlate)
export const LaidSticksLater = drawnLater(async () => (await import('./sticks')).LaidSticks)
