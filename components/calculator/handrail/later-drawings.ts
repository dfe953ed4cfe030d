import { drawnLater } from './drawn-later'

export const RailPlateLater = drawnLater(async () => (await import('./rail-plate')).RailPlate)
export const LaidSticksLater = drawnLater(async () => (await import('./sticks')).LaidSticks)
