const KEBAB = /^[a-z0-9]+(-[a-z0-9]+)*$/;
/** What may stand between the name of a file and its ending. */
const KINDS = ['test', 'd', 'worker', 'config', 'e2e'];
/** Bins into which everything falls that nobody has named. */
const BINS = /^(utils?|misc|helpers?)$/;

/** Paths that are not in kebab case, or that say only that their author had no name for them. */
export function nameFaults(files: readonly string[]): string[] {
  return files.flatMap((file) => {
    const folders = file.split('/');
    const [name = '', ...endings] = (folders.pop() ?? '').split('.');
    const words = [...folders, name];
    const kinds = endings.slice(0, -1);
    const kebab =
      words.every((word) => KEBAB.test(word)) && kinds.every((kind) => KINDS.includes(kind));
    const bin = words.some((word) => word.split('-').some((part) => BINS.test(part)));
    return [
      ...(kebab ? [] : [`${file} is not in kebab case`]),
      ...(bin ? [`${file} is a bin without a name`] : []),
    ];
  });
}
