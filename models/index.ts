import { database } from './connect'
import { AuditEvent, defineAuditEvent } from './audit-event'
import { Crew, defineCrew } from './crew'
import { CrewMember, defineCrewMember } from './crew-member'
import { CutSheet, defineCutSheet } from './cut-sheet'
import { IdempotencyKey, defineIdempotencyKey } from './idempotency-key'
import { Job, defineJob } from './job'
import { OutboxLetter, defineOutboxLetter } from './outbox-letter'
import { Shop, defineShop } from './shop'
import { SignIn, defineSignIn } from './sign-in'
import { User, defineUser } from './user'

const sequelize = database()
for (const define of [
  defineAuditEvent,
  defineCrew,
  defineCrewMember,
  defineCutSheet,
  defineIdempotencyKey,
  defineJob,
  defineOutboxLetter,
  defineShop,
  defineSignIn,
  defineUser,
])
  define(sequelize)

CutSheet.belongsTo(Job, { as: 'job', foreignKey: 'jobId' })
CutSheet.belongsTo(User, { as: 'author', foreignKey: 'createdBy' })
User.belongsTo(Shop, { as: 'shop', foreignKey: 'shopId' })

export { sequelize }
export { AuditEvent, Crew, CrewMember, CutSheet, IdempotencyKey, Job, OutboxLetter, Shop, SignIn, User }
