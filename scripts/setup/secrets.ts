import { randomBytes } from 'node:crypto'
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import path from 'node:path'

export interface Secrets {
  databasePassword: string
  authSecret: string
}

/** Random words of this installation, made once and readable by their owner alone. */
export function secretsOf(directory: string): Secrets {
  const file = path.join(directory, 'secrets.json')
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8')) as Secrets
  const secrets = { databasePassword: random(), authSecret: random() }
  // Renamed into place whole: a disk that fills up half-way leaves no half a secret.
  writeFileSync(`${file}.next`, JSON.stringify(secrets), { mode: 0o600 })
  renameSync(`${file}.next`, file)
  return secrets
}

function random() {
  return randomBytes(32).toString('base64url')
}
