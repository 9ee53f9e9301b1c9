// npm start: from a bare clone to a running application. Plain Node: it runs before any package is installed.
import { launch } from './launch.mjs';

process.exit(await launch('production'));
