import { User } from '@/models'
import type { Actor } from './access-actors'
import { newJob, newSheet } from './jobs'
import { newPerson, type Person } from './people'

/** Rows one call may reach for: the owner's job with a sheet, and everybody who may knock. */
export interface Ground {
  people: { [actor in Actor]: Person | undefined }
  job: string
}

/** A new shop with one of each, another shop's journeyman and coordinator, and somebody disabled. */
export async function newGround(): Promise<Ground> {
  const owner = await newPerson('journeyman')
  const inShop = (role: Parameters<typeof newPerson>[0]) => newPerson(role, owner.shopId)
  const disabled = await inShop('journeyman')
  await User.update({ disabledAt: new Date() }, { where: { id: disabled.id } })
  const job = await newJob(owner)
  await newSheet(owner, job)
  return {
    job,
    people: {
      anonymous: undefined,
      owner,
      mate: await inShop('journeyman'),
      apprentice: await inShop('apprentice'),
      instructor: await inShop('instructor'),
      coordinator: await inShop('coordinator'),
      foreigner: await newPerson('journeyman'),
      'foreign coordinator': await newPerson('coordinator'),
      disabled,
    },
  }
}
