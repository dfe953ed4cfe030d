import { choice, degrees, forms, group, inches, list, quantity, whole } from '../fields'

const length = { above: 0, most: 12_000 }
// Unusual heights are warned of once, for the whole rail.
const railHeight = { above: 0, most: 240 }
const firstRise = inches('First rise', {
  ...length,
  sane: [4, 9.5],
  fallback: null,
  hint: 'From the floor or landing up to this flight’s first nosing.',
})
const treadRun = inches('Tread run', { ...length, sane: [9, 14], fallback: null, hint: 'For the code rows only.' })
const slope = quantity('Slope away', 'in/ft', {
  least: -6,
  most: 6,
  sane: [-0.5, 0.5],
  fallback: 0,
  hint: '+ rises away.',
})

const returnToWall = group(
  'Return to the wall',
  {
    clearance: inches('Clearance to the wall', { least: 0, most: 24 }),
    gap: inches('Gap left at the wall', { least: 0, most: 24, fallback: 0 }),
  },
  { fallback: null },
)

const flight = forms('Flight', [
  {
    risers: whole('Risers', { least: 2, most: 60, sane: [2, 20] }),
    rise: inches('Rise', { ...length, sane: [4, 9.5] }),
    run: inches('Run', { ...length, sane: [9, 14], hint: 'Nosing to nosing, level.' }),
  },
  {
    rake: inches('Rake', { ...length, hint: 'Bottom nosing to top nosing, along the slope.' }),
    pitch: degrees('Pitch', { above: 0, most: 89, sane: [20, 50], hint: 'From level.' }),
    firstRise,
    run: treadRun,
  },
  {
    nosingRise: inches('Rise, nosing to nosing', length),
    nosingRun: inches('Run, nosing to nosing', length),
    nosingRake: inches('Rake, nosing to nosing', {
      ...length,
      fallback: null,
      hint: 'The third tape: it closes the triangle.',
    }),
    firstRise,
    run: treadRun,
  },
])

const landing = group('Landing', {
  length: inches('Landing length', { ...length, hint: 'Top nosing below to the first nosing above.' }),
  slopeInPerFt: slope,
  railHeight: inches('Rail height on the landing', { ...railHeight, fallback: null }),
})

/** What a field measure of one rail asks for, in climbing order. */
export const handrailFields = {
  hand: choice('Hand, going up', ['L', 'R'], { names: ['Left', 'Right'], hint: 'The side you hold going UP.' }),
  section: group('Section', {
    shape: choice('Shape', ['round', 'square', 'rect'], { names: ['Round', 'Square', 'Rectangular'] }),
    depth: inches('Depth, seen from the side', { above: 0, most: 24, sane: [0.75, 4] }),
    width: inches('Width', { above: 0, most: 24, sane: [0.75, 4] }),
  }),
  railHeight: inches('Rail height', { ...railHeight, hint: 'Plumb, nosing to top of rail.' }),
  flights: list('Flights', flight, { least: 1, most: 12 }),
  landings: list('Landings', landing, { least: 0, most: 11 }, { fallback: null }),
  bottom: group('Bottom end', {
    type: choice('Bottom end', ['none', 'slope', 'level'], {
      names: ['At the nosing', 'Down the slope', 'Level'],
    }),
    horizontal: inches('Reach past the bottom nosing, level', { ...length, fallback: null }),
    length: inches('Length of the level run', { ...length, fallback: null, hint: 'Outward from the knuckle.' }),
    railHeight: inches('Rail height of the level run', { ...railHeight, fallback: null }),
    return: returnToWall,
  }),
  top: group('Top end', {
    type: choice('Top end', ['none', 'level'], { names: ['At the nosing', 'Level'] }),
    length: inches('Length past the top nosing', { ...length, fallback: null }),
    slopeInPerFt: slope,
    railHeight: inches('Rail height at the top', { ...railHeight, fallback: null }),
    return: returnToWall,
  }),
  volutes: group(
    'Volutes',
    {
      bottom: inches('Taken off at the bottom', { least: 0, most: 240, fallback: 0 }),
      top: inches('Taken off at the top', { least: 0, most: 240, fallback: 0 }),
    },
    { fallback: null },
  ),
  brackets: forms(
    'Brackets',
    [
      {
        endDistance: inches('First bracket from the end', { above: 0, most: 240, sane: [3, 24] }),
        maxSpacing: inches('Farthest apart', { above: 0, most: 1200, sane: [24, 60] }),
      },
      {
        field: list('Bracket places', inches('Place, level from the bottom nosing', { least: -12_000, most: 12_000 }), {
          least: 1,
          most: 60,
        }),
        jointClear: inches('Clear of a joint', { least: 0, most: 60, fallback: 3 }),
      },
    ],
    { fallback: null },
  ),
  stock: group(
    'Stock',
    {
      length: inches('Stick length', { ...length, sane: [120, 288] }),
      kerf: inches('Kerf', { least: 0, most: 2, sane: [0.035, 0.125] }),
      trim: inches('Trim', { least: 0, most: 240, fallback: 0 }),
    },
    { fallback: null },
  ),
  weld: group(
    'Weld',
    {
      areaIn2: quantity('Bead area', 'in2', { above: 0, most: 10, sane: [0.005, 0.2] }),
      efficiency: quantity('Deposition efficiency', 'ratio', { above: 0, most: 1, sane: [0.55, 0.98] }),
      lbPerHour: quantity('Deposition rate', 'lb/h', { above: 0, most: 100, sane: [0.5, 15] }),
      arcOnPct: quantity('Arc-on time', '%', { above: 0, most: 100, sane: [10, 50], fallback: 25 }),
    },
    { fallback: null },
  ),
  code: group(
    'Code rows',
    {
      outsideDia: inches('Outside diameter of the grip', { above: 0, most: 24 }),
      wallClearance: inches('Clearance to the wall', { least: 0, most: 24 }),
    },
    { fallback: null },
  ),
} as const
