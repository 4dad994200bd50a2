import { describe, expect, it } from 'vitest'
import { can, passwordProblem, PERMISSIONS, ROLES } from '@/lib/access'

describe('a password', () => {
  it.each([
    'quiet hedges at noon', 'Zwölf Rosen & 3 Eiben', '长城上的十二朵玫瑰花儿真好看', 'x9$Kq!vR2mLp', 'boxwood by the third sill',
    'correct horse on a hill', 'p4ssw0rd is not in my garden shed',
  ])('of twelve characters or more is welcome whatever its characters: %s', (password) => {
    expect(passwordProblem(password, 'ines@thimblehill.example')).toBeNull()
  })

  it('has at least twelve characters and at most 256, counted as people see them', () => {
    expect(passwordProblem('kp3!xzQwvm9')).toMatch(/at least 12/)
    expect(passwordProblem('kp3!xzQwvm9e')).toBeNull()
    // Six letters with their accents apart are six characters, not twelve.
    expect(passwordProblem('e\u0301a\u0301o\u0301u\u0301i\u0301y\u0301')).toMatch(/at least 12/)
    const many = Array.from({ length: 257 }, (_, i) => String.fromCodePoint(0x4e00 + ((i * 7) % 200))).join('')
    expect(passwordProblem(many)).toMatch(/at most 256/)
    expect(passwordProblem(many.slice(1))).toBeNull()
  })

  it.each([
    'password1234', 'PASSWORD!!!!', 'P@ssw0rd1234', 'passwordpassword', '1234password', 'welcome12345', 'Welcome2026!!', 'letmeinletmein',
    'iloveyou1234', 'Administrator', 'administrator1', 'correcthorsebatterystaple', 'correct horse battery staple', 'Summer2026!!', 'changeme1234',
    '123456789012', '0987654321098', 'qwertyuiop123', 'qwertyuiop[]', 'qwertyuiopasdf', '1q2w3e4r5t6y', '1qaz2wsx3edc', 'asdfghjkl123', 'abcdefghijkl',
    'a b c d e f g h', 'aaaaaaaaaaaa', 'abababababab', 'abcabcabcabc', '            ', '123123123123', '111111222222',
    'tenthsummer!', 'Tenth Summer 1', 't3nthSumm3r2026',
  ])('that is tried first is refused: %s', (password) => {
    expect(passwordProblem(password)).toMatch(/too easy|tried first|repeats/)
  })

  it('does not have the own e-mail address in it, nor the name before the @', () => {
    expect(passwordProblem('rosalind and twelve', 'Rosalind@example.test')).toMatch(/e-mail/)
    expect(passwordProblem('rosalind@example.test!', 'rosalind@example.test')).toMatch(/e-mail/)
    // A name as short as a syllable stands in many good passwords.
    expect(passwordProblem('every hedge has a gate', 'eve@example.test')).toBeNull()
  })
})

describe('the table of who may do what', () => {
  it('lets a client read their own page and nothing else', () => {
    expect(PERMISSIONS.filter((permission) => can('client', permission))).toEqual(['client-view:read'])
  })

  it('lets an owner do all a member of the studio can do', () => {
    const members = ROLES.filter((role) => role !== 'client')
    for (const permission of PERMISSIONS) {
      if (members.some((role) => can(role, permission))) expect(can('owner', permission)).toBe(true)
    }
  })

  it('lets reviewers and estimators look at drawings without changing them', () => {
    for (const role of ['reviewer', 'estimator'] as const) {
      expect(can(role, 'sheet:read')).toBe(true)
      expect(can(role, 'sheet:edit')).toBe(false)
      expect(can(role, 'plant:edit')).toBe(false)
    }
  })
})
