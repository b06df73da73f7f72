import { CaseError } from './case-error.ts';
import { answerAsWorker, assessInThreads } from './in-threads.ts';
import { readCase } from './read-case.ts';
import { workingText } from './working-text.ts';

const USAGE = 'Usage: npm run -s assess -- case.json [--working NAME]';

function argumentsOf(args: readonly string[]): { file: string; working: string | undefined } {
  const at = args.indexOf('--working');
  const working = at < 0 ? undefined : args[at + 1];
  const files = args.filter((_, index) => at < 0 || (index !== at && index !== at + 1));
  const [file, ...more] = files;
  const unknown = files.find((word) => word.startsWith('--'));
  if (unknown !== undefined) throw new CaseError(`${unknown} is not known. ${USAGE}`);
  if (at >= 0 && working === undefined)
    throw new CaseError(`--working needs a wall's name. ${USAGE}`);
  if (file === undefined || more.length > 0) throw new CaseError(USAGE);
  return { file, working };
}

async function output(args: readonly string[]): Promise<string> {
  const { file, working } = argumentsOf(args);
  if (working !== undefined) return workingText(readCase(file), working);
  const { basis, parts } = await assessInThreads(file);
  for (const part of parts) if ('fault' in part) throw new CaseError(part.fault);
  const walls = parts.map((part) => ('json' in part ? part.json : '')).join(',\n');
  const { methodVersion, ...rest } = basis;
  return `{"walls": [\n${walls}\n],\n"basis": ${JSON.stringify(rest)},\n"methodVersion": ${JSON.stringify(methodVersion)}}\n`;
}

/** Prints the results of a case as JSON, or one line about what is wrong with it and status 2. */
export async function assess(args: readonly string[]): Promise<void> {
  try {
    process.stdout.write(await output(args));
  } catch (error) {
    if (!(error instanceof CaseError)) throw error;
    process.stderr.write(`${error.message}\n`);
    process.exitCode = 2;
  }
}

answerAsWorker();
