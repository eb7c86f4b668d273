import { makeOpenApiDocument } from '../../../server/features/openapi/document';
import { PROBLEMS } from '../../../sync/protocol/problem';

const document = makeOpenApiDocument();
const text = JSON.stringify(document);

it('is an OpenAPI 3.1 document of every address under /api', () => {
  expect(document.openapi).toBe('3.1.0');
  const operations = Object.entries(document.paths ?? {}).flatMap(([path, methods]) =>
    Object.keys(methods).map((method) => `${method} ${path}`),
  );
  expect(operations.sort()).toEqual([
    'get /api/health',
    'get /api/openapi.json',
    'post /api/v1/plans',
  ]);
});

it('refers only to schemas that it holds', () => {
  const schemas = Object.keys(document.components?.schemas ?? {});
  const references = [...text.matchAll(/"#\/components\/schemas\/(\w+)"/g)].map(([, name]) => name);
  expect(new Set(references)).toEqual(new Set(['Health', 'Plan', 'PlanRequest', 'Problem']));
  expect(schemas).toEqual(expect.arrayContaining([...new Set(references)]));
});

it('requires of a plan request every field the schema requires, and refuses others', () => {
  const request = document.components?.schemas?.PlanRequest;
  expect(request).toMatchObject({ type: 'object', additionalProperties: false });
  expect(request).toHaveProperty('required', expect.arrayContaining(['block', 'wedges', 'tip']));
  expect(request).toHaveProperty('properties.block.pattern', '^-?\\d+(\\/[1-9]\\d*)?$');
});

it('names every code a client can meet at the plans', () => {
  const plans = JSON.stringify(document.paths?.['/api/v1/plans']?.post?.responses);
  const absent = ['not-found', 'method-not-allowed', 'database-away'];
  for (const code of Object.keys(PROBLEMS)) {
    expect({ code, named: plans.includes(`\`${code}\``) }).toEqual({
      code,
      named: !absent.includes(code),
    });
  }
});
