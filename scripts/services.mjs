// The long-running processes of one installation: started together, watched, stopped in order.
import fs from 'node:fs';
import path from 'node:path';
import { spawn } from 'node:child_process';
import { dataFolder, root } from './place.mjs';
import { lastLines } from './run.mjs';
import { Halt, say } from './say.mjs';

/**
 * @typedef {{
 *   name: string,
 *   args: string[],
 *   env: NodeJS.ProcessEnv,
 *   whenItEnds: 'restart' | 'end all',
 *   toTerminal: boolean,
 * }} ServicePlan
 */

const tether = path.join(root, 'scripts', 'tether.mjs');
const logFolder = path.join(dataFolder, 'logs');

/** Where a service writes: the terminal, or a file of its own beside the one of the run before. @param {ServicePlan} plan */
function openLog({ name, toTerminal }) {
  if (toTerminal) return /** @type {const} */ ('inherit');
  fs.mkdirSync(logFolder, { recursive: true, mode: 0o700 });
  const file = path.join(logFolder, `${name}.log`);
  if (fs.existsSync(file)) fs.renameSync(file, `${file}.1`);
  return fs.openSync(file, 'a', 0o600);
}

/** The last lines that a service wrote into its log file. @param {string} name */
export function readLogTail(name) {
  const file = path.join(logFolder, `${name}.log`);
  return fs.existsSync(file) ? lastLines(fs.readFileSync(file, 'utf8'), 12) : '';
}

/** Starts services and keeps them; `failed` rejects when one ends that all the rest depend on. */
export class Services {
  /** @type {Map<string, import('node:child_process').ChildProcess>} */
  #children = new Map();
  #stopping = false;
  /** @type {(reason: Error) => void} */
  #fail = () => {};
  /** @type {Promise<never>} */
  failed = new Promise((_, reject) => {
    this.#fail = reject;
  });

  constructor() {
    this.failed.catch(() => {}); // whoever waits for it sees it; until then it is not unhandled
  }

  /** @param {ServicePlan} plan */
  start(plan) {
    this.#spawn(plan, openLog(plan), 0);
  }

  /** @param {ServicePlan} plan @param {number | 'inherit'} log @param {number} restarts */
  #spawn(plan, log, restarts) {
    const began = performance.now();
    const child = spawn(process.execPath, ['--import', tether, ...plan.args], {
      cwd: root,
      env: plan.env,
      stdio: ['ignore', log, log, 'ipc'],
      // A group of its own: Ctrl-C reaches the launcher alone, which then stops things in their right order.
      detached: true,
    });
    this.#children.set(plan.name, child);
    child.once('exit', (code, signal) => {
      this.#children.delete(plan.name);
      if (this.#stopping) return;
      const how = signal ? `was ended by ${signal}` : `ended with code ${code}`;
      if (plan.whenItEnds === 'end all') {
        const tail = plan.toTerminal ? '' : `\n\n${readLogTail(plan.name)}`;
        this.#fail(new Halt(`The ${plan.name} process ${how}, so Raglan stops.${tail}`));
        return;
      }
      const tries = performance.now() - began > 60_000 ? 0 : restarts;
      const delay = Math.min(30_000, 1000 * 2 ** tries);
      say(`The ${plan.name} process ${how}; it starts again in ${delay / 1000} s.`);
      setTimeout(() => {
        if (!this.#stopping) this.#spawn(plan, log, tries + 1);
      }, delay).unref();
    });
  }

  /** Asks every service to end, waits up to `limitMs` for jobs and requests under way, then ends what is left. */
  async stop(limitMs = 15_000) {
    this.#stopping = true;
    const ends = [...this.#children.values()].map(
      (child) =>
        new Promise((resolve) => {
          if (child.exitCode !== null || child.signalCode !== null) return resolve(undefined);
          child.once('exit', resolve);
          child.kill('SIGTERM');
        }),
    );
    const timer = setTimeout(() => this.kill(), limitMs);
    await Promise.all(ends);
    clearTimeout(timer);
  }

  /** Ends every service at once, with whatever it started. */
  kill() {
    for (const child of this.#children.values()) {
      try {
        if (child.pid) process.kill(-child.pid, 'SIGKILL');
      } catch {
        // it has just ended by itself
      }
    }
  }
}

/**
 * Waits until the application says that it is ready: database, migrations and queue.
 * @param {string} url
 * @param {number} limitMs
 */
export async function waitUntilReady(url, limitMs) {
  const end = performance.now() + limitMs;
  let last = 'nothing answered';
  while (performance.now() < end) {
    try {
      const response = await fetch(url, { signal: AbortSignal.timeout(10_000) });
      if (response.ok) return;
      last = `${response.status} ${(await response.text()).slice(0, 300)}`;
    } catch (error) {
      last = error instanceof Error ? error.message : String(error);
    }
    await new Promise((resolve) => setTimeout(resolve, 150));
  }
  throw new Halt(`Raglan did not become ready in ${limitMs / 1000} s; ${url} last said: ${last}`);
}
