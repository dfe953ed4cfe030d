import type { NewJob, NewSheet, SheetRevision } from '@/lib/schemas/job'

/** Two flights up to a porch, a landing that drains between them, taken by tape. */
export const porchJob: NewJob = {
  name: 'Marlow porch, street side',
  place: '14 Tannery Row',
  client: 'A. Marlow',
  notes: 'Left-hand rail only. Brick piers: bracket on the mortar, never on an edge.',
}

function fieldMeasure(landing: { length: number; slopeInPerFt: number }) {
  return {
    hand: 'L',
    section: { shape: 'square', depth: 1.5, width: 1.5 },
    railHeight: 36,
    flights: [
      { nosingRise: 28.25, nosingRun: 44, nosingRake: 52.3125, firstRise: 7.0625, run: 11 },
      { nosingRise: 21.375, nosingRun: 33, nosingRake: 39.3125, firstRise: 7.125, run: 11 },
    ],
    landings: [landing],
    bottom: { type: 'level', length: 12 },
    top: { type: 'level', length: 12 },
    brackets: { endDistance: 6, maxSpacing: 48 },
    stock: { length: 240, kerf: 0.0625, trim: 0.5 },
  }
}

const head = {
  name: 'Porch rail, left',
  calculator: 'handrail',
  measuredBy: 'R. Solberg',
  instrument: 'Tape 25 ft, level 48 in',
}

export const firstMeasure: NewSheet = {
  ...head,
  inputs: fieldMeasure({ length: 48, slopeInPerFt: 0.125 }),
  measuredOn: '2026-03-03',
  note: '',
}

export const secondMeasure: SheetRevision = {
  ...head,
  inputs: fieldMeasure({ length: 47.625, slopeInPerFt: 0.25 }),
  measuredOn: '2026-03-05',
  note: 'Landing measured again: shorter by 3/8, and it drains 1/4 in a foot.',
  revises: 1,
}
