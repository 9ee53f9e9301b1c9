// Child processes that run to their end.
import { spawn } from 'node:child_process';

/** @type {Set<import('node:child_process').ChildProcess>} */
const running = new Set();

/** Ends every program that `run` is waiting for; for a command that was told to stop. */
export function endRunning() {
  for (const child of running) child.kill('SIGTERM');
}

/**
 * @typedef {{ code: number, stdout: string, stderr: string, output: string }} Outcome
 * `code` is 127 when the program does not exist, 128 when a signal ended it.
 */

/**
 * Runs a program, waits for its end and answers what it printed; never throws for a failing program.
 * @param {string} program
 * @param {string[]} args
 * @param {Omit<import('node:child_process').SpawnOptions, 'env'> & { input?: string, env?: Record<string, string | undefined> }} [options]
 * @returns {Promise<Outcome>}
 */
export function run(program, args, options = {}) {
  const { input, ...rest } = options;
  return new Promise((resolve) => {
    const child = spawn(program, args, {
      stdio: ['pipe', 'pipe', 'pipe'],
      .../** @type {import('node:child_process').SpawnOptions} */ (rest),
    });
    running.add(child);
    let stdout = '';
    let stderr = '';
    let output = '';
    child.stdout?.setEncoding('utf8').on('data', (text) => {
      stdout += text;
      output += text;
    });
    child.stderr?.setEncoding('utf8').on('data', (text) => {
      stderr += text;
      output += text;
    });
    child.stdin?.on('error', () => {}); // the program may end without reading
    child.stdin?.end(input ?? '');
    child.on('error', (error) => {
      running.delete(child);
      resolve({ code: 127, stdout, stderr, output: output + error.message });
    });
    child.on('close', (code) => {
      running.delete(child);
      resolve({ code: code ?? 128, stdout, stderr, output });
    });
  });
}

/** Whether a program can be found in PATH. @param {string} program */
export async function isInPath(program) {
  const { code } = await run('sh', ['-c', 'command -v "$1"', 'sh', program]);
  return code === 0;
}

/** The last lines of a text, without blank ones. @param {string} text @param {number} count */
export const lastLines = (text, count) =>
  text
    .split('\n')
    .filter((line) => line.trim() !== '')
    .slice(-count)
    .join('\n');
