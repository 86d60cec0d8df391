/** The command line: one verb, a building file, a readable table or the JSON of the contract. */
import { readBuildingText } from '../src/building/read.js';
import { buildingSchema } from '../src/building/json-schema.js';
import { faultSentence, type Fault } from '../src/building/fault.js';
import type { Building } from '../src/building/definition.js';
import { compareWithCauses } from '../src/compare/causes.js';
import { compare } from '../src/compare/compare.js';
import { foundationCsv } from '../src/foundation/csv.js';
import { foundation } from '../src/foundation/foundation.js';
import { analyse } from '../src/path/analyse.js';
import { analysisSchema } from '../src/path/json-schema.js';
import type { Analysis } from '../src/path/result.js';
import { workingContext } from '../src/working/context.js';
import { demandFor, explain } from '../src/working/explain.js';
import { workingSchema } from '../src/working/json-schema.js';
import { analysisText } from './analysis-text.js';
import { comparisonText } from './comparison-text.js';
import { foundationText } from './foundation-text.js';
import { workingText } from './working-text.js';

export type Io = {
  readonly readFile: (path: string) => Promise<string>;
  readonly readStdin: () => Promise<string>;
  readonly out: (text: string) => void;
  readonly err: (text: string) => void;
};

/** 0 done, 1 the file is at fault, 2 wrong use, 3 the analysis was refused. */
export type ExitCode = 0 | 1 | 2 | 3;

const USAGE = `groundward analyse FILE [--json]              demands, findings and certificate of a building file
groundward foundation FILE [--json | --csv]   what arrives at every support
groundward compare BEFORE AFTER [--json] [--no-causes]   what changed, by member, and why
groundward explain FILE MEMBER QUANTITY [--case C] [--sense 1 | -1] [--combination K] [--json]
                                              the working behind one demand; the largest where several are meant
groundward check FILE                         validates only
groundward schema building | analysis | working
                                              the JSON Schema

FILE is a path, or - for standard input.
Exit code: 0 done, 1 the file is at fault, 2 wrong use, 3 the analysis was refused.
`;

/** Ends a command early with its exit code. */
class Stop extends Error {
  readonly code: ExitCode;
  readonly text: string;

  constructor(code: ExitCode, text: string) {
    super(text);
    this.code = code;
    this.text = text;
  }
}

/** @param argv the words after the command's name */
export async function main(argv: readonly string[], io: Io): Promise<ExitCode> {
  try {
    await run(argv, io);
    return 0;
  } catch (error) {
    if (!(error instanceof Stop)) throw error;
    io.err(error.text);
    return error.code;
  }
}

async function run(argv: readonly string[], io: Io): Promise<void> {
  const [verb, ...rest] = argv;
  if (verb === undefined) throw new Stop(2, USAGE);
  if (verb === '--help' || verb === '-h' || verb === 'help') {
    io.out(USAGE);
    return;
  }
  switch (verb) {
    case 'analyse': {
      const { files, options } = words(rest, 1, ['--json']);
      const { building, analysis } = await analysed(files[0] as string, io);
      io.out(options.has('--json') ? json(analysis) : analysisText(building, analysis));
      return;
    }
    case 'foundation': {
      const { files, options } = words(rest, 1, ['--json', '--csv']);
      if (options.size > 1) throw wrong('--json and --csv exclude each other');
      const { building, analysis } = await analysed(files[0] as string, io);
      const demands = foundation(building, analysis);
      io.out(
        options.has('--json') ? json(demands) : options.has('--csv') ? foundationCsv(demands) : foundationText(demands),
      );
      return;
    }
    case 'compare': {
      const { files, options } = words(rest, 2, ['--json', '--no-causes']);
      if (files[0] === '-' && files[1] === '-') throw wrong('only one file can come from standard input');
      const before = await analysed(files[0] as string, io);
      const after = await analysed(files[1] as string, io);
      const comparison = options.has('--no-causes') ? compare(before, after) : compareWithCauses(before, after);
      io.out(options.has('--json') ? json(comparison) : comparisonText(comparison));
      return;
    }
    case 'explain': {
      io.out(await explained(rest, io));
      return;
    }
    case 'check': {
      const { files, options } = words(rest, 1, ['--json']);
      const building = await read(files[0] as string, io);
      io.out(options.has('--json') ? json({ valid: true, name: building.name }) : `${building.name}: no fault\n`);
      return;
    }
    case 'schema': {
      const { files } = words(rest, 1, ['--json']);
      if (files[0] === 'building') {
        io.out(json(buildingSchema()));
        return;
      }
      if (files[0] === 'analysis') {
        io.out(json(analysisSchema()));
        return;
      }
      if (files[0] === 'working') {
        io.out(json(workingSchema()));
        return;
      }
      throw wrong(`no schema "${files[0] as string}"`);
    }
    default:
      throw wrong(`no verb "${verb}"`);
  }
}

async function explained(rest: readonly string[], io: Io): Promise<string> {
  const { rest: others, named } = namedWords(rest, ['--case', '--sense', '--combination']);
  const { files, options } = words(others, 3, ['--json']);
  const [file, member, quantity] = files as [string, string, string];
  const sense = named.get('--sense') ?? '1';
  if (sense !== '1' && sense !== '-1') throw wrong(`--sense is 1 or -1, not "${sense}"`);
  const context = workingContext(await read(file, io));
  if (!context.ok) throw refused(file, context.faults);
  const demand = demandFor(context.value, {
    member,
    quantity,
    case: named.get('--case'),
    sense: Number(sense),
    combination: named.get('--combination'),
  });
  if (!demand.ok) throw new Stop(2, `groundward: ${demand.faults.map(faultSentence).join('\n')}\n`);
  const working = explain(context.value, demand.value);
  return options.has('--json') ? json(working) : workingText(working);
}

/** Options with a value behind them, taken out of the words. */
function namedWords(
  rest: readonly string[],
  names: readonly string[],
): { rest: string[]; named: ReadonlyMap<string, string> } {
  const left: string[] = [];
  const named = new Map<string, string>();
  for (let i = 0; i < rest.length; i++) {
    const word = rest[i] as string;
    if (!names.includes(word)) left.push(word);
    else {
      const value = rest[++i];
      if (value === undefined) throw wrong(`${word} wants a word behind it`);
      named.set(word, value);
    }
  }
  return { rest: left, named };
}

function wrong(why: string): Stop {
  return new Stop(2, `groundward: ${why}\n\n${USAGE}`);
}

function words(
  rest: readonly string[],
  count: number,
  known: readonly string[],
): { files: string[]; options: Set<string> } {
  const files: string[] = [];
  const options = new Set<string>();
  for (const word of rest) {
    if (word === '-' || !word.startsWith('-')) files.push(word);
    else if (known.includes(word)) options.add(word);
    else throw wrong(`no option "${word}" here`);
  }
  if (files.length !== count)
    throw wrong(`expected ${count} ${count === 1 ? 'word' : 'words'} after the verb, found ${files.length}`);
  return { files, options };
}

async function read(file: string, io: Io): Promise<Building> {
  let text: string;
  try {
    text = file === '-' ? await io.readStdin() : await io.readFile(file);
  } catch (error) {
    throw new Stop(2, `groundward: cannot read ${file}: ${error instanceof Error ? error.message : String(error)}\n`);
  }
  const result = readBuildingText(text);
  if (!result.ok) throw new Stop(1, faultList(file, result.faults));
  return result.value;
}

async function analysed(file: string, io: Io): Promise<{ building: Building; analysis: Analysis }> {
  const building = await read(file, io);
  const result = analyse(building);
  if (!result.ok) throw refused(file, result.faults);
  return { building, analysis: result.value };
}

function refused(file: string, faults: readonly Fault[]): Stop {
  return new Stop(3, `the analysis is refused\n${faultList(file, faults)}`);
}

function faultList(file: string, faults: readonly Fault[]): string {
  const name = file === '-' ? 'standard input' : file;
  return faults.map((fault) => `${name}: ${faultSentence(fault)}\n`).join('');
}

function json(value: unknown): string {
  return `${JSON.stringify(value)}\n`;
}
