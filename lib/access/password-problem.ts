/**
 * What makes a password easy to guess. Pure, so that the form says it while one types and the server decides by the
 * same rule. The words and runs are common knowledge (from memory), not a copy of a published list.
 */

export const MIN_PASSWORD = 12
export const MAX_PASSWORD = 256

/** Words that guessers try first, alone, doubled, or dressed with digits and signs. */
const COMMON_WORDS = new Set([
  'password', 'passwort', 'passphrase', 'pass', 'letmein', 'welcome', 'welcomeback', 'changeme', 'secret', 'admin',
  'administrator', 'root', 'user', 'username', 'guest', 'login', 'default', 'master', 'testing', 'test', 'hello', 'helloworld',
  'iloveyou', 'loveyou', 'princess', 'sunshine', 'monkey', 'dragon', 'shadow', 'football', 'baseball', 'basketball', 'superman',
  'batman', 'starwars', 'pokemon', 'freedom', 'whatever', 'trustno', 'michael', 'jennifer', 'jordan', 'charlie', 'summer', 'winter',
  'spring', 'autumn', 'january', 'february', 'september', 'october', 'november', 'december', 'computer', 'internet', 'garden',
  'gardens', 'gardening', 'gardener', 'landscape', 'qwerty', 'qwertz', 'azerty', 'asdf', 'asdfgh', 'zxcvbn', 'abc', 'abcdef',
  'correcthorsebatterystaple', 'thequickbrownfox', 'thisismypassword', 'mypassword', 'mysecretpassword', 'newpassword',
  'unbelievable', 'opensesame', 'iloveyousomuch', 'tenthsummer',
])

/** Runs along a keyboard and an alphabet; read both ways, and round again at the end. */
const RUNS = [
  'abcdefghijklmnopqrstuvwxyz', '01234567890', '1234567890-=', 'qwertyuiop[]', 'qwertzuiop', 'azertyuiop', 'asdfghjkl;', 'zxcvbnm,./',
  'qwertyuiopasdfghjklzxcvbnm', '1q2w3e4r5t6y7u8i9o0p', '1qaz2wsx3edc4rfv5tgb6yhn7ujm', 'qazwsxedcrfvtgbyhnujm', 'zaq12wsxcde34rfv',
]

const LOOKALIKES: Record<string, string> = { '0': 'o', '1': 'i', '3': 'e', '4': 'a', '5': 's', '7': 't', '@': 'a', $: 's', '!': 'i' }

const lettersOf = (text: string) => text.replace(/[^a-z]/g, '')
const plainOf = (text: string) => text.replace(/[0134579@$!]/g, (sign) => LOOKALIKES[sign] ?? sign)

/** The text without its endless repetition: "abcabcabc" is "abc"; a last unit may be cut short. */
function unitOf(text: string): string {
  for (let length = 1; length <= text.length / 2; length++) {
    const unit = text.slice(0, length)
    if (unit.repeat(Math.ceil(text.length / length)).startsWith(text)) return unit
  }
  return text
}

function isRun(text: string): boolean {
  return RUNS.some((run) => {
    const there = run + run
    const back = [...there].reverse().join('')
    return there.includes(text) || back.includes(text)
  })
}

/** The text cut into runs of four or more, back to back, with at most three signs left over. */
function isMadeOfRuns(text: string): boolean {
  let left = 0
  for (let at = 0; at < text.length; ) {
    let end = Math.min(text.length, at + 40)
    while (end - at >= 4 && !isRun(text.slice(at, end))) end--
    if (end - at >= 4) at = end
    else {
      left += 1
      at += 1
    }
  }
  return left <= 3
}

function isCommonWord(text: string): boolean {
  const bare = [lettersOf(text), lettersOf(plainOf(text)), lettersOf(plainOf(text.replace(/^[^a-z]+|[^a-z]+$/g, '')))]
  return bare.some((word) => word.length >= 3 && COMMON_WORDS.has(unitOf(word)))
}

function isFromAddress(text: string, email: string): boolean {
  const address = email.trim().toLowerCase()
  const name = address.split('@')[0] ?? ''
  return address.length > 0 && (text.includes(address) || (name.length >= 4 && text.includes(name)))
}

/**
 * Why this password will not do, as a sentence; null when it will. Any characters are welcome, spaces too. Length is
 * counted in characters as people see them in Unicode's composed form; at least 12, at most 256.
 * @param email the person's own address, which must not stand in it.
 * @example passwordProblem('quiet hedges at noon') // null
 */
export function passwordProblem(password: string, email = ''): string | null {
  const composed = password.normalize('NFC')
  const length = [...composed].length
  if (length < MIN_PASSWORD) return `Use at least ${MIN_PASSWORD} characters. A few words with spaces are fine.`
  if (length > MAX_PASSWORD) return `Use at most ${MAX_PASSWORD} characters.`
  const text = composed.toLowerCase()
  if (isFromAddress(text, email)) return 'This has your e-mail address in it. Choose something nobody can look up.'
  if (lettersOf(plainOf(text)).includes('tenthsummer')) return 'This has the name of the product in it: too easy to guess.'
  const packed = text.replace(/\s+/g, '')
  if (unitOf(packed).length <= 4 || new Set(packed).size < 5) return 'This repeats itself: too easy to guess.'
  if (isMadeOfRuns(packed)) return 'This runs along the keyboard or the alphabet: too easy to guess.'
  return isCommonWord(packed) ? 'This is among the passwords tried first: choose another.' : null
}
