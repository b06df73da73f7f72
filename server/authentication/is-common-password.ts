/** What people add figures and signs to, by its letters alone. */
const STEMS = new Set([
  'password', 'passwort', 'passphrase', 'passw', 'welcome', 'letmein', 'iloveyou', 'admin',
  'administrator', 'changeme', 'qwerty', 'qwertyuiop', 'asdfghjkl', 'monkey', 'dragon', 'football',
  'baseball', 'sunshine', 'princess', 'superman', 'trustno', 'master', 'login', 'default', 'secret',
  'whatever', 'liverpool', 'chelsea', 'arsenal', 'test', 'testing', 'temporary', 'groundsill',
  'mypassword', 'newpassword', 'correcthorsebatterystaple', 'qazwsxedcrfv', 'zaqxswcde',
]); // prettier-ignore

const ROWS = [
  '012345678901234567890123456789',
  'abcdefghijklmnopqrstuvwxyz',
  'qwertyuiopasdfghjklzxcvbnm',
  '1q2w3e4r5t6y7u8i9o0p',
  '1qaz2wsx3edc4rfv5tgb6yhn',
].flatMap((row) => [row, Array.from(row).reverse().join('')]);

const PLAIN_LETTERS: Readonly<Record<string, string>> = {
  '0': 'o',
  '1': 'i',
  '3': 'e',
  '4': 'a',
  '5': 's',
  '7': 't',
  '@': 'a',
  $: 's',
};

function lettersOf(text: string): string {
  return text.replaceAll(/[^a-z]+/g, '');
}

/** The shortest part that a text is made of again and again, as `abc` of `abcabc`. */
function repeatedPart(text: string): string {
  return /^(.+?)\1+$/s.exec(text)?.[1] ?? text;
}

/**
 * Whether a password is among the first that anybody tries: a known word with figures and signs about it,
 * the same few letters again and again, or a run along the keyboard.
 */
export function isCommonPassword(password: string): boolean {
  const small = password.toLowerCase();
  const part = repeatedPart(small);
  if (part.length <= 4 || ROWS.some((row) => row.includes(part))) return true;
  const bare = part.replaceAll(/^[^a-z@$]+|[^a-z]+$/g, '');
  const plain = bare.replaceAll(/[013457@$]/g, (sign) => PLAIN_LETTERS[sign] ?? sign);
  return [bare, plain].some((text) => STEMS.has(repeatedPart(lettersOf(text))));
}
