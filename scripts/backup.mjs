// npm run backup [-- FILE]: the whole database into one file. Raglan may go on working meanwhile.
import fs from 'node:fs';
import path from 'node:path';
import { writeBackup } from './backup-file.mjs';
import { withInstallation } from './installation.mjs';
import { dataFolder } from './place.mjs';
import { Halt, say, sayFailure } from './say.mjs';

/** @param {Date} now */
const nameBackup = (now) =>
  path.join(dataFolder, 'backups', `raglan-${now.toISOString().slice(0, 19).replaceAll(':', '')}Z.dump`);

try {
  const now = new Date();
  const file = path.resolve(process.argv[2] ?? nameBackup(now));
  if (fs.existsSync(file)) throw new Halt(`${file} is there already. Name another file, or move it away.`);
  fs.mkdirSync(path.dirname(file), { recursive: true, mode: 0o700 });
  const note = await withInstallation(({ urls, bin }) =>
    writeBackup({ adminUrl: urls.adminUrl, bin, file, now }),
  );
  const leagues = note.rows['public.leagues'] ?? 0;
  say(`Backed up ${leagues} ${leagues === 1 ? 'league' : 'leagues'} to ${file}`);
  say(`Keep ${path.basename(file)}.json with it: a restore checks the file and every table against it.`);
} catch (error) {
  process.exitCode = sayFailure(error);
}
