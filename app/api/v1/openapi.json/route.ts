import { getEnv } from '@/lib/platform/env';
import { makeOpenApiDocument } from '@/lib/web/api-v1/openapi';
import { defineRoute } from '@/lib/web/route';

/** The description of the public API. */
export const GET = defineRoute({
  access: 'public',
  run: async () => Response.json(makeOpenApiDocument(getEnv().RAGLAN_BASE_URL)),
});
