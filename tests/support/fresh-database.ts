// Runs before each test file of a database project, and before that file loads any module of ours.
import { randomUUID } from 'node:crypto';
import { inject } from 'vitest';
import { copyTemplate } from '../../scripts/test-cluster.mjs';
import { makeTestEnvironment } from './environment';

// Nothing drops it: the whole cluster goes when the run ends, and until then a failure can be looked at.
const urls = await copyTemplate(inject('cluster'), `test_${randomUUID().replaceAll('-', '')}`);
Object.assign(process.env, makeTestEnvironment(urls), { RAGLAN_TEST_ADMIN_URL: urls.adminUrl });
