import type { Role } from '@/lib/schemas/account'

interface DemoPerson {
  id: string
  name: string
  email: string
  password: string
  role: Role
  crews: readonly DemoCrew[]
}

type DemoCrew = 'morning' | 'evening'

export const demoShop = { id: '01930000-0000-7000-8000-000000000001', name: 'Quarry Lane Ironworks' }

export const demoCrews: { [name in DemoCrew]: { id: string; name: string } } = {
  morning: { id: '01930000-0000-7000-8000-000000000011', name: 'Morning crew' },
  evening: { id: '01930000-0000-7000-8000-000000000012', name: 'Evening crew' },
}

// Printed by `npm start` and in the README: the app refuses to be reached from beyond loopback while they exist.
const password = 'copper kettle under rain'

function person(n: number, name: string, role: Role, ...crews: DemoCrew[]): DemoPerson {
  const first = name.split(' ')[0] ?? name
  const id = `01930000-0000-7000-8000-0000000001${String(n).padStart(2, '0')}`
  return { id, name, email: `${first.toLowerCase()}@quarrylane.example`, password, role, crews }
}

/** Everybody of the demo shop. All of them invented. */
export const demoPeople: readonly DemoPerson[] = [
  person(1, 'Odile Varga', 'coordinator'),
  person(2, 'Tomas Brekke', 'instructor', 'morning', 'evening'),
  person(3, 'Renna Solberg', 'journeyman'),
  person(4, 'Ilse Okonjo', 'apprentice', 'morning'),
  person(5, 'Dario Whitlock', 'apprentice', 'morning'),
  person(6, 'Maeve Castellan', 'apprentice', 'morning'),
  person(7, 'Jonah Petrakis', 'apprentice', 'evening'),
  person(8, 'Sunniva Dale', 'apprentice', 'evening'),
  person(9, 'Kofi Marchetti', 'apprentice', 'evening'),
]
