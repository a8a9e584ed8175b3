import { mountedRoutes } from '../support/mounted-routes';
import { openTestShop, type TestShop } from '../support/test-shop';

type Json = Record<string, unknown>;

interface Description {
  readonly openapi: string;
  readonly paths: Record<string, Record<string, Json>>;
  readonly components: { readonly schemas: Record<string, Json> };
}

describe('the API’s own description', () => {
  let shop: TestShop;
  let description: Description;

  beforeAll(async () => {
    shop = await openTestShop();
    description = (await (await shop.visitor()).get('/api/openapi.json')).body as Description;
  });

  afterAll(() => shop.close());

  it('has every route that is mounted, and no other', () => {
    const described = Object.entries(description.paths).flatMap(([path, methods]) =>
      Object.keys(methods).map((method) => `${method} ${path}`),
    );
    const mounted = mountedRoutes(shop.express).map((route) => route.replace(/:(\w+)/g, '{$1}'));
    expect(described.sort()).toEqual(mounted.sort());
  });

  it('names every parameter of a path', () => {
    for (const [path, methods] of Object.entries(description.paths)) {
      for (const operation of Object.values(methods)) {
        const named = (operation['parameters'] as { name: string; in: string }[]).filter(({ in: at }) => at === 'path');
        expect(named.map(({ name }) => `{${name}}`)).toEqual(path.match(/\{\w+\}/g) ?? []);
      }
    }
  });

  it('points only at schemas that it has', () => {
    const names = [...JSON.stringify(description).matchAll(/"\$ref":"([^"]+)"/g)].map(([, name]) => name ?? '');
    expect(names.length).toBeGreaterThan(0);
    for (const name of names) {
      const schema = name.replace('#/components/schemas/', '');
      expect(description.components.schemas[schema]).withContext(name).toBeDefined();
    }
  });

  it('describes what a new part must have, by the schema that checks it', () => {
    const body = description.paths['/api/parts']?.['post']?.['requestBody'] as {
      content: Record<string, { schema: Json & { properties: Record<string, Json> } }>;
    };
    const schema = body.content['application/json']?.schema;
    expect(schema?.['required']).toEqual(jasmine.arrayWithExactContents(['number', 'title', 'document']));
    expect(schema?.['additionalProperties']).toBeFalse();
    expect(schema?.properties['number']?.['maxLength']).toBe(40);
    expect(schema?.properties['document']).toEqual({ $ref: '#/components/schemas/PartDocument' });
  });

  it('says which version it speaks', () => {
    expect(description.openapi).toBe('3.1.0');
  });
});
