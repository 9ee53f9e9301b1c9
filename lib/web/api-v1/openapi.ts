import { createDocument } from 'zod-openapi';
import {
  problemSchema,
  rosterCheckAnswerSchema,
  rosterCheckRequestSchema,
  ruleCatalogueSchema,
} from './roster-check-schemas';

const problem = (description: string) => ({
  description,
  content: { 'application/problem+json': { schema: problemSchema } },
});

/** The public API as an OpenAPI 3.1 document, made from the schemas that also check the requests. */
export function makeOpenApiDocument(baseUrl: string) {
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Raglan public API',
      version: '1',
      description:
        'Checks a roster against a published numbering code or your own rules. Nothing that is sent is stored. ' +
        'At most 1 MB and 60 requests a minute per address.',
      license: { name: 'MIT', identifier: 'MIT' },
    },
    servers: [{ url: baseUrl }],
    paths: {
      '/api/v1/roster-checks': {
        post: {
          operationId: 'checkRoster',
          summary: 'Check a roster; nothing is stored',
          requestBody: {
            required: true,
            content: { 'application/json': { schema: rosterCheckRequestSchema } },
          },
          responses: {
            '200': {
              description: 'What was found; `row` counts players from 0 and is null for the list as a whole.',
              content: { 'application/json': { schema: rosterCheckAnswerSchema } },
            },
            '404': problem('The catalogue has no such preset.'),
            '413': problem('The body is over 1 MB.'),
            '415': problem('The body is not JSON.'),
            '422': problem('The body does not fit the schema; `errors` names each place.'),
            '429': problem('More than 60 requests in a minute; `Retry-After` says how long to wait.'),
          },
        },
      },
      '/api/v1/rule-catalogue': {
        get: {
          operationId: 'listRuleCatalogue',
          summary: 'The numbering codes a check can use, each with its citation',
          responses: {
            '200': {
              description: 'Every preset.',
              content: { 'application/json': { schema: ruleCatalogueSchema } },
            },
            '429': problem('More than 60 requests in a minute.'),
          },
        },
      },
    },
  });
}
