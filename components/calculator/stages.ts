import type { Stage } from '@/lib/calculators/define'

/** The six stages, in the order of learning. */
export const stages: readonly { id: Stage; name: string; says: string }[] = [
  { id: 'safety', name: 'Safety', says: 'Eyes, ears, air, fire, lifting: before the first spark.' },
  { id: 'triangle', name: 'Tape and triangle', says: 'Read the tape, and find the third side.' },
  { id: 'field', name: 'Field measure', says: 'Measure the stair so that the numbers close.' },
  { id: 'cutting', name: 'Cutting', says: 'Saw setting, long point, blank, sticks.' },
  { id: 'weld', name: 'Fit-up and weld', says: 'Tack, weld, and what the heat pulls.' },
  { id: 'deliver', name: 'Deliver', says: 'Check it, finish it, set it, sign it off.' },
]

export const stageName = (id: Stage): string => stages.find((stage) => stage.id === id)?.name ?? id
