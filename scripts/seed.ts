// Loads the demo leagues, once.
import { closeDatabase } from '@/db/client';
import { loadDemo } from '@/db/seed/load-demo';

const { loaded } = await loadDemo(new Date());
await closeDatabase();
if (loaded) console.log('Demo leagues loaded.');
