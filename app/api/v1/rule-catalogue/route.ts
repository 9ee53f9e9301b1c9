import { listCataloguePresets } from '@/lib/domain/rules/catalogue/catalogue';
import { ruleCatalogueSchema } from '@/lib/web/api-v1/roster-check-schemas';
import { defineRoute } from '@/lib/web/route';

/** Every numbering code of the catalogue with its citation. */
export const GET = defineRoute({
  access: 'public',
  // Parsed on the way out: what the schema does not name does not leave.
  run: async () => Response.json(ruleCatalogueSchema.parse({ presets: listCataloguePresets() })),
});
