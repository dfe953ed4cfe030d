import { describe, expect, it } from 'vitest'
import { onPort, readOptions } from '@/scripts/start/options'
import { readPlan } from '@/scripts/test/plan'

const env = (given: Record<string, string>) => ({ NODE_ENV: 'test', ...given }) as NodeJS.ProcessEnv

describe('the options of npm start', () => {
  it('stay on this machine, at port 3000, unless told otherwise', () => {
    expect(readOptions([], env({}))).toMatchObject({ host: '127.0.0.1', port: 3000, origin: 'http://localhost:3000' })
  })

  it.each(['0', '65536', '80.5', 'http', '-1'])('refuse PORT=%s by name', (PORT) => {
    expect(() => readOptions([], env({ PORT }))).toThrow(/^PORT is /)
  })

  it('refuse an option that does not exist, and name those that do', () => {
    expect(() => readOptions(['--port'], env({}))).toThrow('There are: --dev, --any-port.')
  })

  it.each(['0.0.0.0', '::', '192.168.1.20', 'longpoint.example'])(
    'keep the door shut at HOST=%s without mail',
    (HOST) => {
      expect(() => readOptions([], env({ HOST }))).toThrow('Set SMTP_URL first')
      expect(() => readOptions([], env({ HOST, SMTP_URL: 'smtp://mail.example' }))).toThrow('Set APP_ORIGIN')
    },
  )

  it.each(['localhost', '127.0.0.1', '127.0.1.9', '::1'])('count HOST=%s as this machine', (HOST) => {
    expect(readOptions([], env({ HOST })).host).toBe(HOST)
  })

  it('move the address with the port, but not one that was given', () => {
    expect(onPort(readOptions([], env({})), 3005).origin).toBe('http://localhost:3005')
    const given = readOptions([], env({ APP_ORIGIN: 'https://longpoint.example' }))
    expect(onPort(given, 3005).origin).toBe('https://longpoint.example')
  })
})

describe('the options of npm test', () => {
  it('run everything unless told otherwise', () => {
    expect(readPlan([])).toEqual({ checks: true, suites: ['unit', 'proof', 'api', 'browser', 'faults'], full: false })
  })

  it('run only what is named, in the usual order', () => {
    expect(readPlan(['--only', 'api,unit', '--full'])).toEqual({ checks: false, suites: ['unit', 'api'], full: true })
  })

  it.each(['', 'units', 'unit,'])('refuse --only %j', (names) => {
    expect(() => readPlan(['--only', names])).toThrow('--only knows checks, unit, proof')
  })
})
