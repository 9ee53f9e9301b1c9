// Which launcher runs this installation at the moment: one at a time may.
import fs from 'node:fs';
import path from 'node:path';
import { dataFolder } from './place.mjs';

const note = path.join(dataFolder, 'running.json');

/** The launcher that runs this installation, if any. @returns {{ pid: number, url: string } | null} */
export function findRunning() {
  try {
    const noted = JSON.parse(fs.readFileSync(note, 'utf8'));
    const command = fs.readFileSync(`/proc/${noted.pid}/cmdline`, 'utf8');
    return noted.pid !== process.pid && /scripts\/(start|dev)\.mjs/.test(command) ? noted : null;
  } catch {
    return null; // no note, or its process is gone
  }
}

/** @param {string} url */
export const noteRunning = (url) => fs.writeFileSync(note, JSON.stringify({ pid: process.pid, url }));

export const forgetRunning = () => fs.rmSync(note, { force: true });
