import { describe, expect, it } from 'vitest'
import { passwordFault } from '@/lib/schemas/password'
import { demoPeople, demoShop } from '@/scripts/seed/people'

describe('a password', () => {
  it.each([
    'river copper lantern seven',
    'ΚαλημέραΚόσμεΦίλε',
    'пять серых цапель идут',
    '木漏れ日の中で静かに歩く猫と犬が三匹',
    'x7#Qm!vT2@kLp9zR',
    'no digits no capitals needed',
    'a'.repeat(3) + ' quiet brown otters swim by ' + 'q'.repeat(96),
  ])('stands: %s', (password) => {
    expect(passwordFault(password)).toBeNull()
  })

  it.each([
    ['shorter than 15', 'river copper 7'],
    ['longer than 128', 'quiet otters '.repeat(10)],
    ['one letter repeated', 'z'.repeat(20)],
    ['a piece repeated', 'otterotterotterotter'],
    ['the alphabet', 'abcdefghijklmnopqrstuv'],
    ['the alphabet backwards', 'zyxwvutsrqponmlkjih'],
    ['digits in a row', '123456789012345678'],
    ['rows of the keyboard', 'qwertyuiopasdfghjkl'],
    ['a common word, twice', 'passwordpassword'],
    ['common words with digits', 'Password123Welcome456'],
    ['a common word in disguise', 'P4$$w0rdP4$$w0rd1'],
    ['words of the trade', 'welding handrail longpoint'],
    ['the phrase everybody knows', 'correct horse battery staple'],
  ])('is refused: %s', (_, password) => {
    expect(passwordFault(password)).toMatch(/\.$/)
  })

  it('may not be made of the person’s own words', () => {
    const words = ['Lene Haugland', 'Haugland Rail', 'lene@fjord.example']
    expect(passwordFault('lene haugland fjord')).toBeNull()
    expect(passwordFault('lene haugland fjord', words)).not.toBeNull()
    expect(passwordFault('haugland under grey herons', words)).toBeNull()
  })

  it('of 128 characters is the longest, counted as a reader counts', () => {
    const long = Array.from({ length: 128 }, (_, n) => String.fromCodePoint(0x1f300 + n)).join('')
    expect(passwordFault(long)).toBeNull()
    expect(passwordFault(`${long}🔥`)).toContain('at most 128')
  })

  it('takes no long time over a long one', () => {
    for (const hostile of ['ab'.repeat(64), 'aab'.repeat(42), 'abcabcab'.repeat(16), ' '.repeat(128)]) {
      expect(passwordFault(hostile)).not.toBeNull()
    }
  })
})

describe('the demo people', () => {
  it('have passwords that the rules allow', () => {
    for (const { name, email, password } of demoPeople)
      expect(passwordFault(password, [name, email, demoShop.name])).toBeNull()
  })
})
