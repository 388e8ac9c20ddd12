export { COMMON_WORDS, KEY_ROWS }

/**
 * What the commonest passwords are made of; common practice, from memory. Nearly all common passwords are far shorter
 * than the 15 characters we ask for, so their length refuses them already. What is left to refuse are these words put
 * together, with figures around them.
 */
const COMMON_WORDS = [
  'password', 'passwort', 'passord', 'passcode', 'passphrase', 'pass', 'letmein', 'welcome', 'iloveyou', 'loveyou', 'login',
  'logon', 'admin', 'administrator', 'master', 'secret', 'changeme', 'default', 'access', 'account', 'guest', 'test', 'user',
  'username', 'root', 'system', 'server', 'internet', 'computer', 'qwerty', 'qwertz', 'azerty', 'asdf', 'zxcv', 'trustno',
  'whatever', 'nothing', 'hello', 'please', 'monkey', 'dragon', 'football', 'baseball', 'basketball', 'soccer', 'hockey',
  'princess', 'sunshine', 'shadow', 'charlie', 'ashley', 'jessica', 'daniel', 'thomas', 'summer', 'winter', 'spring', 'autumn', 'january', 'february', 'december', 'killer', 'hunter', 'ranger', 'flower',
  'cheese', 'ginger', 'pepper', 'cookie', 'chocolate', 'banana', 'orange', 'purple', 'silver', 'golden', 'freedom', 'forever',
  'babygirl', 'lovely', 'sweetheart', 'angel', 'loveme',
  'mailcreated', 'onetwothree', 'number', 'buggy', 'truggy', 'racing', 'racer',
] as const

/** Neighbouring keys, and the alphabet: what fingers type without a thought. Each is also met backwards. */
const KEY_ROWS = [
  'qwertyuiop', 'asdfghjkl', 'zxcvbnm', '1234567890', 'azertyuiop', 'qsdfghjklm', 'wxcvbn', 'qwertzuiop', 'yxcvbnm',
  'abcdefghijklmnopqrstuvwxyz', '1qaz', '2wsx', '3edc', '4rfv', '5tgb', '6yhn', '7ujm', '8ik', '9ol',
  '1q2w3e4r5t6y7u8i9o0p', 'q1w2e3r4t5y6u7i8o9p0', '1a2s3d4f5g6h7j8k9l',
] as const
