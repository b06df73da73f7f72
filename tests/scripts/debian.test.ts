import { spawnSync } from 'node:child_process';
import { chmodSync, mkdirSync, readFileSync, symlinkSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { createDataFolder } from '../support/data-folder.ts';

const MODULE = path.resolve(import.meta.dirname, '../../scripts/start/debian.mjs');
const { folder, remove } = createDataFolder('debian');
const log = path.join(folder, 'log');
let bin = '';
let made = 0;

/** A program by this name and no other, besides the shell. */
function putProgram(name: string, lines: string): void {
  const file = path.join(bin, name);
  writeFileSync(file, `#!/bin/sh\necho "${name} $*" >> ${log}\n${lines}\n`);
  chmodSync(file, 0o755);
}

/** An apt-get whose first installation fails, as with lists that are out of date. */
function putStaleApt(): void {
  const installs = `echo '#!/bin/sh' > ${bin}/pdftotext; /bin/chmod +x ${bin}/pdftotext`;
  putProgram(
    'apt-get',
    `case "$*" in *update*) : > ${bin}/updated;; *) test -e ${bin}/updated && ${installs};; esac`,
  );
}

function install(packages: string) {
  const program = `
    import { installDebian, POPPLER } from ${JSON.stringify(MODULE)};
    console.log(installDebian(${packages}).said);`;
  return spawnSync(process.execPath, ['--input-type=module', '-e', program], {
    encoding: 'utf8',
    env: { PATH: bin },
  });
}

function commands(): string[] {
  return readFileSync(log, 'utf8')
    .trim()
    .split('\n')
    .map((line) => line.replaceAll(/ -o \S+| -q| -y| --no-install-recommends/g, ''));
}

beforeEach(() => {
  made += 1;
  bin = path.join(folder, `bin-${made}`);
  mkdirSync(bin);
  symlinkSync('/bin/sh', path.join(bin, 'sh'));
  // without root it asks sudo, which here lets it
  putProgram('sudo', 'shift; exec "$@"');
  writeFileSync(log, '');
});

afterAll(remove);

describe('installDebian', () => {
  it('leaves apt-get alone where all is there', () => {
    putProgram('apt-get', 'exit 1');
    putProgram('pdftotext', '');
    expect(install('POPPLER').stdout.trim()).toBe('there');
    expect(commands()).toEqual(['']);
  });

  it('brings the lists up to date where the first try fails, and tries again', () => {
    putStaleApt();
    expect(install('POPPLER').stdout.trim()).toBe('installed poppler-utils');
    const tries = commands().filter((line) => line.startsWith('apt-get'));
    expect(tries).toEqual([
      'apt-get install poppler-utils',
      'apt-get update',
      'apt-get install poppler-utils',
    ]);
  });

  it('waits for another installation, and asks nothing', () => {
    putStaleApt();
    install('POPPLER');
    const [first = ''] = readFileSync(log, 'utf8')
      .split('\n')
      .filter((line) => line.startsWith('apt-get'));
    expect(first).toContain('-o DPkg::Lock::Timeout=300');
    expect(first).toContain('-y --no-install-recommends install');
  });

  it('says in a sentence what to do where it cannot install', () => {
    putProgram('apt-get', 'exit 100');
    expect(install('POPPLER').stderr).toContain('try by hand: apt-get install poppler-utils');
  });

  it('says in a sentence what to do where there is no apt-get', () => {
    expect(install('POPPLER').stderr).toContain(
      'Install it by hand and start again: poppler-utils',
    );
  });
});
