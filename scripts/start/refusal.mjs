/** Something that the person at the keyboard can mend: they read the sentence, without a stack. */
export class Refusal extends Error {}

function sentenceOf(error) {
  const { code, message, stack } = error;
  if (error instanceof Refusal || code?.startsWith('ERR_PARSE_ARGS')) return message;
  if (code !== 'EACCES' && code !== 'EPERM') return stack;
  return `${message}\nAnother account made this. Go on as that one, or remove it.`;
}

/** Runs a command and ends it with a sentence for people where it fails. */
export async function withSentences(command) {
  try {
    await command();
  } catch (error) {
    console.error(`\n${sentenceOf(error)}`);
    process.exit(1);
  }
}
