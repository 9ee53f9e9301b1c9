// Installing what is missing from Debian's packages, when this user may.
import { isInPath, lastLines, run } from './run.mjs';
import { Halt, say } from './say.mjs';

const isRoot = () => process.getuid?.() === 0;

/** How this user may install packages: directly, through sudo without a password, or not at all. */
async function findAdminPrefix() {
  if (!(await isInPath('apt-get'))) return null;
  if (isRoot()) return [];
  const { code } = await run('sudo', ['-n', 'true']);
  return code === 0 ? ['sudo', '-n'] : null;
}

/**
 * Installs Debian packages without their recommendations; halts with the command to type when this user may not.
 * @param {string[]} packages
 * @param {string} purpose what they are for, as the end of "… is needed"
 */
export async function installFromDebian(packages, purpose) {
  const list = packages.join(' ');
  const byHand = `apt-get update && apt-get install -y --no-install-recommends ${list}`;
  const prefix = await findAdminPrefix();
  if (prefix === null) {
    throw new Halt(`${list} ${purpose}. As an administrator run:\n\n  ${byHand}\n\nthen start again.`);
  }
  say(`Installing ${list} from Debian's packages…`);
  for (const args of [
    ['apt-get', 'update', '-q'],
    ['apt-get', 'install', '-y', '-q', '--no-install-recommends', ...packages],
  ]) {
    const [program = '', ...rest] = [...prefix, 'env', 'DEBIAN_FRONTEND=noninteractive', ...args];
    const { code, output } = await run(program, rest);
    // A mirror that cannot be reached matters only if the package is not there either.
    if (code !== 0 && args[1] === 'install') {
      throw new Halt(
        `Installing ${list} failed:\n${lastLines(output, 8)}\n\nInstall it by hand (${byHand}), then start again.`,
      );
    }
  }
}
