// npm run dev: as npm start, with hot reload instead of a build, and the logs on the terminal.
import { launch } from './launch.mjs';

process.exit(await launch('development'));
