import { Actor } from '@/lib/auth/actor'
import { hashPassword } from '@/lib/auth/password'
import { reviseCutSheet, saveCutSheet } from '@/lib/data/cut-sheets'
import { createJob } from '@/lib/data/jobs'
import { endSignIn, openSignIn } from '@/lib/data/sign-ins'
import { inTransaction } from '@/lib/data/transaction'
import { Crew, CrewMember, Job, sequelize, Shop, User } from '@/models'
import { demoCrews, demoPeople, demoShop } from './people'
import { firstMeasure, porchJob, secondMeasure } from './porch-rail'

/** Seeds the demo shop once. Each part commits whole, so a run cut short is finished by the next. */
export async function seedDemo(say: (line: string) => void): Promise<void> {
  try {
    if ((await User.count({ where: { demo: true } })) === 0) {
      await seedPeople()
      say(`${demoShop.name}: ${demoPeople.length} people in ${Object.keys(demoCrews).length} crews`)
    }
    if ((await Job.count({ where: { shopId: demoShop.id } })) === 0) {
      await seedJob()
      say(`${porchJob.name}: a job with one cut sheet in two revisions`)
    }
  } finally {
    await sequelize.close()
  }
}

async function seedPeople(): Promise<void> {
  const people = await Promise.all(
    demoPeople.map(async ({ password, crews: _, ...person }) => ({
      ...person,
      passwordHash: await hashPassword(password),
    })),
  )
  await inTransaction(async (transaction) => {
    const shopId = demoShop.id
    await Shop.create(demoShop, { transaction })
    await Crew.bulkCreate(
      Object.values(demoCrews).map((crew) => ({ ...crew, shopId })),
      { transaction },
    )
    await User.bulkCreate(
      people.map((person) => ({ ...person, shopId, demo: true })),
      { transaction },
    )
    const places = demoPeople.flatMap(({ id, role, crews }) =>
      crews.map((crew) => ({
        crewId: demoCrews[crew].id,
        userId: id,
        place: role === 'instructor' ? ('instructor' as const) : ('apprentice' as const),
      })),
    )
    await CrewMember.bulkCreate(places, { transaction })
  })
}

/** Made as the journeyman makes it, through the same door. */
async function seedJob(): Promise<void> {
  const userId = demoPeople.find(({ role }) => role === 'journeyman')?.id ?? ''
  const signIn = await openSignIn(userId, 'seed')
  const actor = await Actor.of(signIn, userId)
  if (!actor) throw new Error('The demo journeyman cannot sign in: the account is disabled.')
  try {
    await inTransaction(async () => {
      const { id } = await createJob(actor, porchJob)
      const { sheet } = await saveCutSheet(actor, id, firstMeasure)
      await reviseCutSheet(actor, id, sheet, secondMeasure)
    })
  } finally {
    await endSignIn(signIn, userId)
  }
}
