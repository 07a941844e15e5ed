import { writeFileSync } from 'node:fs'
import { PASSWORD_LENGTH } from '@/lib/accounts/terms'

// Writes content/accounts/common-passwords.txt. People make passwords by few recipes, and those are tried first: a
// usual word with figures behind it, a word twice, two usual words, a walk over the keyboard, one sign again and
// again, a row of figures, a date. The words are ordinary ones; no list that leaked from anywhere is used.

const WORDS = [
  'password', 'passwort', 'letmein', 'welcome', 'secret', 'hello', 'login', 'admin', 'administrator', 'master', 'access',
  'default', 'changeme', 'temporary', 'test', 'testing', 'guest', 'user', 'please', 'opensesame', 'iloveyou',
  'loveyou', 'sunshine', 'princess', 'dragon', 'monkey', 'football', 'baseball', 'soccer', 'hockey', 'summer', 'winter',
  'spring', 'autumn', 'january', 'february', 'march', 'april', 'june', 'july', 'august', 'september', 'october', 'november',
  'december', 'monday', 'friday', 'sunday', 'freedom', 'whatever', 'computer', 'internet', 'shadow', 'flower', 'purple',
  'orange', 'silver', 'golden', 'cookie', 'butter', 'cheese', 'coffee', 'music', 'guitar', 'record', 'vinyl', 'turntable',
  'cartridge', 'stylus', 'preamp', 'amplifier', 'phono', 'hifi', 'oskerby', 'setdown', 'workshop',
]
const TAILS = [
  '1', '12', '123', '1234', '12345', '123456', '1234567', '12345678', '123456789', '1234567890', '321', '4321', '111', '000',
  '007', '99', '00', '!', '1!', '123!', '2020', '2021', '2022', '2023', '2024', '2025', '2026', '2027', '2028',
]
const PAIRS = ['password', 'welcome', 'secret', 'login', 'admin', 'hello', 'love', 'mypassword', 'letmein', 'music', 'vinyl', 'record']
const ROWS = ['1234567890', 'qwertyuiop', 'asdfghjkl', 'zxcvbnm', 'qwertzuiop', 'azertyuiop', 'abcdefghijklmnopqrstuvwxyz']
const COLUMNS = ['1qaz', '2wsx', '3edc', '4rfv', '5tgb', '6yhn', '7ujm', '8ik', '9ol', '0p']
const SIGNS = [...'abcdefghijklmnopqrstuvwxyz0123456789']
const SENTENCES = [
  'letmeinplease', 'iloveyousomuch', 'iloveyouforever', 'thisismypassword', 'passwordpassword',
  'mysecretpassword', 'nopassword', 'forgotpassword', 'newpassword', 'oldpassword', 'whatismypassword',
  'youwillneverguess', 'opensesameplease', 'helloworld', 'goodmorning', 'happybirthday', 'merrychristmas', 'dontforgetit',
]

const backwards = (text: string) => [...text].reverse().join('')

function* candidates() {
  yield* SENTENCES
  for (const word of WORDS) {
    for (const tail of TAILS) yield word + tail
    for (const times of [2, 3]) yield word.repeat(times)
    yield `my${word}`
    yield `the${word}`
    yield word + backwards(word)
  }
  for (const first of PAIRS) for (const second of PAIRS) yield first + second
  for (const sign of SIGNS) for (let length = PASSWORD_LENGTH.min; length <= 16; length++) yield sign.repeat(length)
  for (const row of [...ROWS, ...ROWS.map(backwards)]) {
    yield row + row
    for (let length = PASSWORD_LENGTH.min; length <= row.length; length++) yield row.slice(0, length)
    for (const tail of TAILS) yield row + tail
  }
  for (let from = 0; from < COLUMNS.length; from++)
    for (let to = from + 2; to <= COLUMNS.length; to++) yield COLUMNS.slice(from, to).join('')
  for (const piece of ['123', '321', '112233', '121212', '123123', '101010', 'abc', 'abc123', 'qwe', 'qwe123', 'qwerty', 'asd', '1q2w3e', '1q2w3e4r', 'a1b2c3'])
    for (const times of [2, 3, 4, 5]) yield piece.repeat(times)
  for (let figure = 0; figure <= 9; figure++) {
    const row = [...'12345678901234567890'].map((each) => (Number(each) + figure) % 10).join('')
    for (const length of [10, 11, 12, 16, 20]) yield row.slice(0, length)
  }
}

const long = [...candidates()].filter(({ length }) => length >= PASSWORD_LENGTH.min && length <= PASSWORD_LENGTH.max)
const list = [...new Set(long)].sort()
writeFileSync('content/accounts/common-passwords.txt', `${list.join('\n')}\n`)
console.log(`${list.length} passwords that are tried first.`)
