import { shops } from './0001-shops'
import { users } from './0002-users'
import { crews } from './0003-crews'
import { crewMembers } from './0004-crew-members'
import { signIns } from './0005-sign-ins'
import { jobs } from './0006-jobs'
import { cutSheets } from './0007-cut-sheets'
import { idempotencyKeys } from './0008-idempotency-keys'
import { rateLimits } from './0009-rate-limits'
import { auditEvents } from './0010-audit-events'
import { outbox } from './0011-outbox'
import type { Migration } from './migration'

/** All of them, in order. A list and not a folder scan, so that every runner finds the same ones. */
export const migrations: readonly Migration[] = [
  shops,
  users,
  crews,
  crewMembers,
  signIns,
  jobs,
  cutSheets,
  idempotencyKeys,
  rateLimits,
  auditEvents,
  outbox,
]
