/** Which passwords are refused, and why. Length is the protocol's rule; this is about guessing. */

const PRODUCT_WORDS = ['hubstead']
/** Shorter words turn up in good passwords by chance. */
const MIN_PERSONAL_WORD_LENGTH = 4
const MIN_DISTINCT_CHARACTERS = 5

const LOOKALIKES: Record<string, string> = {
  '0': 'o',
  '1': 'i',
  '3': 'e',
  '4': 'a',
  '5': 's',
  '7': 't',
  '@': 'a',
  $: 's',
  '!': 'i',
}

let commonPasswords: Promise<ReadonlySet<string>> | null = null

/** Half a megabyte of words, wanted only when somebody chooses a password. */
function loadCommonPasswords(): Promise<ReadonlySet<string>> {
  commonPasswords ??= import('@zxcvbn-ts/language-common').then(
    (module) => new Set(module.dictionary.passwords),
  )
  return commonPasswords
}

const lettersOnly = (text: string) => text.replace(/[^\p{L}]/gu, '')
const unfold = (text: string) => [...text].map((character) => LOOKALIKES[character] ?? character).join('')

/** "passwordpassword" is "password" to anybody who guesses. */
function repeatedUnit(text: string): string {
  return /^(.+?)\1+$/u.exec(text)?.[1] ?? text
}

function isStaircase(text: string): boolean {
  const codes = [...text].map((character) => character.codePointAt(0) ?? 0)
  const steps = new Set(codes.slice(1).map((code, index) => code - (codes[index] ?? 0)))
  return steps.size === 1
}

/** The reason it is refused, or null. Any characters are allowed, spaces included. */
export async function passwordProblem(
  password: string,
  person: { name: string; email: string },
): Promise<string | null> {
  const plain = password.toLowerCase()
  if (new Set(plain).size < MIN_DISTINCT_CHARACTERS || isStaircase(plain))
    return 'This is a simple pattern. Choose something harder to guess.'

  const personal = [
    ...person.name.toLowerCase().split(/[^\p{L}\p{N}]+/u),
    ...person.email.toLowerCase().split(/[@.+_-]/),
  ]
  const words = [...PRODUCT_WORDS, ...personal.filter((word) => word.length >= MIN_PERSONAL_WORD_LENGTH)]
  const forms = [plain, unfold(plain)]
  if (words.some((word) => forms.some((form) => form.includes(word))))
    return 'Leave out your name, your address and the name of this product.'

  const common = await loadCommonPasswords()
  const candidates = [plain, lettersOnly(plain), lettersOnly(unfold(plain)), plain.replace(/[\d\W_]+$/, '')]
  const isCommon = candidates.some(
    (candidate) => candidate.length > 0 && (common.has(candidate) || common.has(repeatedUnit(candidate))),
  )
  // A short common word inside a long password is no weakness: only what is left without it counts.
  return isCommon ? 'This is a common password. Choose something harder to guess.' : null
}
