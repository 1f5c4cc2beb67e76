import { existsSync } from 'node:fs';
import { logPath, run } from './run.mjs';
import { PlainProblem, say } from './say.mjs';

/**
 * Installs packages from Debian's archive: as root, or through sudo when it needs no password.
 * @param {readonly string[]} packages
 * @param {string} what in plain words, for the sentences
 */
export async function installDebianPackages(packages, what) {
  const names = packages.join(' ');
  if (!existsSync('/usr/bin/apt-get')) {
    throw new PlainProblem(
      `${what} is missing and this is no Debian: install ${names} by hand and start again.`,
    );
  }
  const prefix = process.getuid?.() === 0 ? [] : ['sudo', '--non-interactive'];
  if (prefix.length > 0 && (await run('sudo', ['--non-interactive', 'true'])).code !== 0) {
    throw new PlainProblem(
      `${what} is missing. Install it with “sudo apt-get install ${names}” and start again.`,
    );
  }
  say(`Installing ${what} from Debian's packages (${names}).`);
  const apt = (/** @type {string[]} */ ...args) => {
    const [command = '', ...rest] = [
      ...prefix,
      'env',
      'DEBIAN_FRONTEND=noninteractive',
      'apt-get',
      ...args,
    ];
    return run(command, rest, { log: 'apt' });
  };
  await apt('update', '--quiet');
  const installed = await apt(
    'install',
    '--yes',
    '--quiet',
    '--no-install-recommends',
    ...packages,
  );
  if (installed.code !== 0) {
    throw new PlainProblem(
      `${what} could not be installed; ${logPath('apt')} says why. Install ${names} by hand and start again.`,
    );
  }
}
