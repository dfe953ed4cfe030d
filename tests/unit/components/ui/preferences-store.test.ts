import { describe, expect, it } from 'vitest'
import { preferencesAtFirst, readPreferences } from '@/components/ui/preferences-store'
import { defaultPreferences, preferencesSchema } from '@/lib/schemas/account'

describe('preferences kept on a device', () => {
  it('are at first what the account’s are', () => {
    expect(preferencesAtFirst()).toEqual(defaultPreferences)
  })

  it('come back as they were kept', () => {
    const kept = preferencesSchema.parse({ units: 'mm', tape: 32, sawSquare: 90, dialStep: 1, theme: 'night' })
    expect(readPreferences(JSON.stringify(kept))).toEqual(kept)
  })

  it.each([null, '', '{', '[]', '"mm"', 'null', '{"tape":7,"units":"ell","theme":{}}'])('pass over %s', (text) => {
    expect(readPreferences(text)).toEqual(defaultPreferences)
  })
})
