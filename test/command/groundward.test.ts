import { readFile } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { Ajv2020 } from 'ajv/dist/2020.js';
import { describe, expect, test } from 'vitest';
import { main } from '../../engine/command/groundward.js';

const demo = (name: string): string => fileURLToPath(new URL(`../../prisma/demo/${name}.json`, import.meta.url));
const FIRST = demo('1-first-design');
const SECOND = demo('2-client-changes');

async function run(argv: string[], stdin = ''): Promise<{ code: number; out: string; err: string }> {
  let out = '';
  let err = '';
  const code = await main(argv, {
    readFile: (path) => readFile(path, 'utf8'),
    readStdin: () => Promise.resolve(stdin),
    out: (text) => (out += text),
    err: (text) => (err += text),
  });
  return { code, out, err };
}

async function changed(change: (building: never) => void): Promise<string> {
  const building = JSON.parse(await readFile(FIRST, 'utf8')) as never;
  change(building);
  return JSON.stringify(building);
}

test('analyse --json answers the contract’s document, valid against the schema that the command prints', async () => {
  const { code, out, err } = await run(['analyse', FIRST, '--json']);
  expect([code, err]).toEqual([0, '']);
  const schema = JSON.parse((await run(['schema', 'analysis'])).out) as object;
  const validate = new Ajv2020({ strict: false }).compile(schema);
  const document = JSON.parse(out) as { demands: unknown[]; certificate: { worstResidual: number } };
  expect(validate(document), JSON.stringify(validate.errors)).toBe(true);
  expect(document.demands.length).toBeGreaterThan(1000);
  expect(document.certificate.worstResidual).toBeLessThan(1e-9);
});

test('the building schema holds for the demo and not for a mistyped key', async () => {
  const schema = JSON.parse((await run(['schema', 'building'])).out) as object;
  const validate = new Ajv2020({ strict: false }).compile(schema);
  const building = JSON.parse(await readFile(FIRST, 'utf8')) as Record<string, unknown>;
  expect(validate(building), JSON.stringify(validate.errors)).toBe(true);
  expect(validate({ ...building, nmae: 'x' })).toBe(false);
});

test('the same file gives the same bytes, from a path and from standard input', async () => {
  const first = await run(['analyse', FIRST, '--json']);
  const second = await run(['analyse', '-', '--json'], await readFile(FIRST, 'utf8'));
  expect(second.out).toBe(first.out);
});

test('the readable table has levels, walls, supports, findings, certificate and the caution', async () => {
  const { code, out } = await run(['analyse', FIRST]);
  expect(code).toBe(0);
  for (const title of [
    'Levels',
    'Diaphragm spans',
    'Collectors',
    'Wall lines by storey',
    'Piers',
    'Supports',
    'Findings',
    'Certificate',
  ]) {
    expect(out).toContain(`\n${title}\n`);
  }
  expect(out).toContain('licensed');
});

test('foundation as table, JSON and CSV', async () => {
  const json = JSON.parse((await run(['foundation', FIRST, '--json'])).out) as {
    schema: string;
    supports: { label: string }[];
  };
  expect(json.schema).toBe('groundward.foundation/1');
  const csv = (await run(['foundation', FIRST, '--csv'])).out.split('\r\n');
  expect(csv[0]).toBe('support,member,line,x,y,length unit,quantity,case,sense,combination,value,unit,governing');
  expect(csv.length).toBeGreaterThan(json.supports.length);
  expect((await run(['foundation', FIRST])).out).toContain('F1');
});

test('compare names edits and changed members', async () => {
  const { code, out } = await run(['compare', FIRST, SECOND, '--json']);
  expect(code).toBe(0);
  const comparison = JSON.parse(out) as { schema: string; edits: { what: string }[]; changes: { class: string }[] };
  expect(comparison.schema).toBe('groundward.comparison/1');
  expect(comparison.edits.map((edit) => edit.what)).toContain(
    'wall line A, storey under L2, pier Ac, from: 17 → 18.6 m',
  );
  expect(new Set(comparison.changes.map((change) => change.class))).toContain('raised');
  expect((await run(['compare', FIRST, SECOND])).out).toContain('pier Ac');
});

describe('explain', () => {
  const words = ['explain', FIRST, '1/L3', 'shear', '--case', 'EY', '--sense', '-1'];

  test('--json answers the working, valid against the schema that the command prints', async () => {
    const { code, out, err } = await run([...words, '--json']);
    expect([code, err]).toEqual([0, '']);
    const schema = JSON.parse((await run(['schema', 'working'])).out) as object;
    const validate = new Ajv2020({ strict: false }).compile(schema);
    const working = JSON.parse(out) as { demand: { value: number }; steps: { result: number; formula: string }[] };
    expect(validate(working), JSON.stringify(validate.errors)).toBe(true);
    expect(working.steps.at(-1)?.result).toBeCloseTo(working.demand.value, 9);
  });

  test('the readable text has formula, values with their origin, and the law', async () => {
    const { out } = await run(words);
    expect(out).toContain('V = V_above + R = ');
    expect(out).toContain('1/L4 shear EY -1');
    expect(out).toContain('[equilibrium of the wall line]');
  });

  test('what is left out: sense 1, no combination, the case with the largest value', async () => {
    const named = await run(['explain', FIRST, '1/L3/1a', 'end-tension', '--json']);
    const analysis = JSON.parse((await run(['analyse', FIRST, '--json'])).out) as {
      demands: { member: string; quantity: string; sense: number; combination?: string; value: number }[];
    };
    const rows = analysis.demands.filter(
      (row) =>
        row.member === '1/L3/1a' && row.quantity === 'end-tension' && row.sense === 1 && row.combination === undefined,
    );
    const { demand } = JSON.parse(named.out) as { demand: { value: number } };
    expect(demand.value).toBe(Math.max(...rows.map((row) => row.value)));
  });

  test.each([
    [['1/L3/1z', 'shear'], 'no demand of member 1/L3/1z'],
    [['1/L3', 'uplift'], 'it has reaction, shear, overturning-moment'],
    [['1/L3', 'shear', '--case', 'EZ'], 'under EZ with sense 1'],
    [['1/L3', 'shear', '--combination', 'D'], 'with combination D'],
    [['1/L3', 'shear', '--sense', '2'], '--sense is 1 or -1'],
    [['1/L3', 'shear', '--case'], '--case wants a word'],
  ])('2 for what is not in the table: %j', async (asked, why) => {
    const { code, out, err } = await run(['explain', FIRST, ...asked]);
    expect([code, out]).toEqual([2, '']);
    expect(err).toContain(why);
  });
});

describe('exit codes', () => {
  test('0 where a file is sound', async () => {
    expect(await run(['check', FIRST])).toMatchObject({ code: 0, err: '' });
  });

  test('1 where the file is at fault, with every fault on standard error', async () => {
    const text = await changed((building: { name?: string; levels: { elevation: unknown }[] }) => {
      delete building.name;
      (building.levels[2] as { elevation: unknown }).elevation = 'high';
    });
    for (const verb of ['check', 'analyse', 'foundation']) {
      const { code, out, err } = await run([verb, '-'], text);
      expect([code, out]).toEqual([1, '']);
      expect(err).toContain('name: found nothing');
      expect(err).toContain('levels[2].elevation: found "high"');
    }
    expect((await run(['analyse', '-'], 'not json')).code).toBe(1);
  });

  test.each([
    [[]],
    [['draw', FIRST]],
    [['analyse']],
    [['analyse', FIRST, FIRST]],
    [['analyse', FIRST, '--yaml']],
    [['foundation', FIRST, '--csv', '--json']],
    [['compare', FIRST]],
    [['compare', '-', '-']],
    [['schema', 'wall']],
    [['analyse', '/nowhere/building.json']],
  ])('2 for wrong use: %j', async (argv) => {
    const { code, out, err } = await run(argv);
    expect([code, out]).toEqual([2, '']);
    expect(err).not.toBe('');
  });

  test('3 where the analysis is refused, with the reason', async () => {
    const text = await changed((building: { wallLines: { id: string }[] }) => {
      building.wallLines = building.wallLines.filter((line) => 'A123456'.includes(line.id));
    });
    const { code, out, err } = await run(['analyse', '-'], text);
    expect([code, out]).toEqual([3, '']);
    expect(err).toContain('line A alone');
    expect(err).toContain('rigid or semi-rigid');
  });
});
