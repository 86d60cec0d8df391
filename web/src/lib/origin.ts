/** Where a number comes from: in words, with the numbers it is made of. */
import type { Demand, Quantity } from '@groundward/engine/path/result';
import { levelName, levelsAscending, type Facts } from './demands';
import { dimension, quantity, senseSign, words } from './format';

/** Member, quantity, case, sense and combination of a demand, and what it comes from. */
export function originOf(demand: Demand, facts: Facts): string {
  const combination = demand.combination ?? 'unfactored';
  const place =
    demand.at === undefined
      ? ''
      : ` at x ${dimension(demand.at[0])}, y ${dimension(demand.at[1], facts.building.units.length)}`;
  const head = `${memberName(demand, facts)} (${demand.member}): ${words(demand.quantity)} ${quantity(demand.value, demand.unit, 5)}${place}. Case ${demand.case}, sense ${senseSign(demand.sense)}, ${combination}.`;
  return `${head}\nFrom ${madeOf(demand, facts)}.`;
}

function memberName({ kind, member }: Demand, { building }: Facts): string {
  const parts = member.split('/');
  const [first = '', second = '', third = ''] = parts;
  switch (kind) {
    case 'level':
      return levelName(building, first);
    case 'diaphragm-span':
      return `${levelName(building, first)}, span ${third}`;
    case 'opening':
      return `${levelName(building, first)}, opening ${third}`;
    case 'transfer-diaphragm':
      return `${levelName(building, first)}, transfer diaphragm at ${third} of ${second}`;
    case 'strut':
      return `${levelName(building, first)}, ${STRUTS[parts[3] ?? ''] ?? 'strut'} at ${third} of ${second}`;
    case 'collector':
      return `${levelName(building, first)}, collector on line ${second}`;
    case 'wall-line':
      return `Line ${first} under ${levelName(building, second)}`;
    case 'pier':
      return `Pier ${third} of line ${first} under ${levelName(building, second)}`;
    case 'support':
      return parts.length === 2 ? `Foot of pier ${second}, line ${first}` : `End post at the foundation, line ${first}`;
  }
}

const STRUTS: Readonly<Record<string, string>> = {
  strut: 'strut of the interrupted chord',
  drag: 'drag strut along the step',
  end: 'drag strut along the end of the transfer diaphragm',
};

const PLAIN: Partial<Record<`${Demand['kind']}/${Quantity}`, string>> = {
  'level/diaphragm-force': 'the diaphragm design forces of the load case',
  'level/overturning-moment': 'storey shears times storey heights, down to the foot of the storey under this level',
  'level/torsion': 'the moment about the centre of rigidity of all that acts on the rigid diaphragm',
  'level/torsional-ratio': 'the largest over the average displacement of the two edges across the load',
  'level/torsional-amplification':
    'the square of the largest over 1.2 times the average edge displacement, from 1 to 3',
  'level/drift': 'the displacement of the rigid diaphragm at its farthest edge',
  'diaphragm-span/shear':
    'the diaphragm design force and transfers, carried to the wall lines: the largest V of the span',
  'diaphragm-span/unit-shear': 'the largest V over the net depth of the cut where it occurs',
  'diaphragm-span/net-unit-shear':
    'V over the net depth with what interrupted chords give off in the transfer diaphragms beside the steps of the outline',
  'transfer-diaphragm/shear':
    'the chord forces that end at the step, carried to the edges of the floor as by a beam that lies across',
  'transfer-diaphragm/net-unit-shear':
    'V over the net depth with the shear of the transfer diaphragm over its length, panel by panel',
  'transfer-diaphragm/chord-force': 'M over the depth with the part of the interrupted chords that the edge takes',
  'strut/axial-tension': 'net unit shears on both sides, summed along the strut',
  'strut/axial-compression': 'net unit shears on both sides, summed along the strut',
  'diaphragm-span/moment': 'the area under V: the largest M of the span',
  'diaphragm-span/chord-force': 'the largest M over the distance between the outermost edges where it occurs',
  'opening/secondary-moment': 'the shear of the strip beside the opening times half its length',
  'opening/chord-force': 'the chord force of the diaphragm and that of the strip on its own',
  'opening/corner-force': 'the edge force of the strip, to be tied into the floor beyond the corner',
  'collector/axial-tension': 'floor shear on both sides and piers above and below, summed along the line',
  'collector/axial-compression': 'floor shear on both sides and piers above and below, summed along the line',
  'collector/design-tension':
    'the axial force of the set of forces that governs, at strength level: storey or diaphragm forces with overstrength, or the diaphragm forces themselves',
  'collector/design-compression':
    'the axial force of the set of forces that governs, at strength level: storey or diaphragm forces with overstrength, or the diaphragm forces themselves',
  'collector/connection-force':
    'what the floor hands to the wall line under the diaphragm forces, raised by 25 % for irregularities',
  'support/moment': 'the couple of the end-post forces at the foot of the lowest pier',
  'support/uplift': 'the tension of the end post, with what stands on it from above and the gravity of the combination',
  'support/bearing':
    'the compression of the end post, with what stands on it from above and the gravity of the combination',
};

function madeOf(demand: Demand, facts: Facts): string {
  switch (`${demand.kind}/${demand.quantity}`) {
    case 'level/force':
      return `load case ${demand.case}: ${sourceOfCase(demand.case, facts)}`;
    case 'level/storey-shear':
      return storeyShear(demand, facts);
    case 'wall-line/reaction':
      return reaction(demand, facts);
    case 'wall-line/shear':
      return lineShear(demand, facts);
    case 'wall-line/overturning-moment':
      return lineMoment(demand, facts);
    case 'pier/shear':
      return pierShare(demand, facts);
    case 'pier/unit-shear':
      return pierUnitShear(demand, facts);
    case 'pier/end-tension':
    case 'pier/end-compression':
      return endForce(demand, facts);
    case 'support/shear':
      return `the shear of the lowest pier of line ${demand.member.split('/')[0] ?? ''}`;
    default:
      return PLAIN[`${demand.kind}/${demand.quantity}`] ?? `the analysis of ${words(demand.kind)} members`;
  }
}

function sourceOfCase(caseId: string, { building }: Facts): string {
  const found = building.loadCases.find((candidate) => candidate.id === caseId.split('/')[0]);
  if (found === undefined) return 'the building file';
  return found.from === 'stated' ? 'stated in the building file' : 'computed from the basis of design and the weights';
}

function storeyShear(demand: Demand, { building, index }: Facts): string {
  const levels = levelsAscending(building);
  const here = levels.findIndex((level) => level.id === demand.member);
  const forces = levels
    .slice(here)
    .reverse()
    .flatMap((level) => {
      const force = index.of(level.id, 'force', demand.case, demand.sense);
      return force === undefined ? [] : [`${quantity(force.value, force.unit)} (${level.id})`];
    });
  return `the storey forces of this level and all above: ${forces.join(' + ')}`;
}

/** The spans that end at the line, or the rigid diaphragm; and the lines whose walls stop at the level. */
function reaction(demand: Demand, { building, analysis }: Facts): string {
  const [line = '', level = ''] = demand.member.split('/');
  const parts = analysis.diagrams.flatMap((diagram) => {
    if (diagram.kind !== 'diaphragm' || diagram.level !== level || diagram.case !== demand.case) return [];
    const at = diagram.lines.find((candidate) => candidate.line === line);
    const [, diaphragmId = ''] = diagram.member.split('/');
    const behaviour =
      building.levels.find(({ id }) => id === level)?.diaphragms?.find(({ id }) => id === diaphragmId)?.behaviour ??
      'flexible';
    if (behaviour !== 'flexible') return [`the ${behaviour} diaphragm ${diaphragmId}, direct and torsional part`];
    if (at === undefined) return [];
    const near = Math.max(...diagram.spans.map((span) => Math.abs(span.to - span.from))) * 1e-6;
    const spans = diagram.spans
      .filter((span) => Math.abs(span.from - at.s) < near || Math.abs(span.to - at.s) < near)
      .map((span) => span.member.split('/')[2] ?? span.member);
    return [`reaction of span${spans.length > 1 ? 's' : ''} ${spans.join(' and ')} at line ${line}`];
  });
  const stopping = stoppingAt(building, level);
  const transfers = stopping.length === 0 ? '' : `, with the transfer from line ${stopping.join(' and ')}`;
  return `${parts.length === 0 ? 'the diaphragm of this level' : parts.join('; ')}${transfers}`;
}

/** Lines with walls above a level and none under it. */
function stoppingAt(building: Facts['building'], level: string): string[] {
  const levels = levelsAscending(building);
  const above = levels[levels.findIndex(({ id }) => id === level) + 1];
  if (above === undefined) return [];
  return building.wallLines
    .filter(
      ({ storeys }) => storeys.some(({ under }) => under === above.id) && !storeys.some(({ under }) => under === level),
    )
    .map(({ id }) => id);
}

function fromAbove(demand: Demand, what: Quantity, { building, index }: Facts): Demand | undefined {
  const [line = '', level = ''] = demand.member.split('/');
  const levels = levelsAscending(building);
  const above = levels[levels.findIndex(({ id }) => id === level) + 1];
  return above === undefined ? undefined : index.of(`${line}/${above.id}`, what, demand.case, demand.sense);
}

function lineShear(demand: Demand, facts: Facts): string {
  const own = facts.index.of(demand.member, 'reaction', demand.case, demand.sense);
  const above = fromAbove(demand, 'shear', facts);
  const level = own === undefined ? '' : `${quantity(own.value, own.unit)} from this level’s diaphragm`;
  return above === undefined ? level : `${quantity(above.value, above.unit)} from the storey above and ${level}`;
}

function lineMoment(demand: Demand, facts: Facts): string {
  const [, level = ''] = demand.member.split('/');
  const shear = facts.index.of(demand.member, 'shear', demand.case, demand.sense);
  const levels = levelsAscending(facts.building);
  const i = levels.findIndex(({ id }) => id === level);
  const height = (levels[i]?.elevation ?? 0) - (levels[i - 1]?.elevation ?? 0);
  const above = fromAbove(demand, 'overturning-moment', facts);
  const own = `shear ${shear === undefined ? '' : quantity(Math.abs(shear.value), shear.unit)} times the storey height ${dimension(height, facts.building.units.length)}`;
  return above === undefined ? own : `${quantity(above.value, above.unit)} of the storey above, and ${own}`;
}

function pierShare(demand: Demand, { building, index }: Facts): string {
  const [lineId = '', level = ''] = demand.member.split('/');
  const line = building.wallLines.find(({ id }) => id === lineId);
  const piers = line?.storeys.find(({ under }) => under === level)?.piers.length ?? 0;
  const whole = index.of(`${lineId}/${level}`, 'shear', demand.case, demand.sense);
  return `the line’s shear${whole === undefined ? '' : ` ${quantity(whole.value, whole.unit)}`}, shared by ${line?.shareBy ?? 'length'} among ${piers} pier${piers === 1 ? '' : 's'}`;
}

function pierUnitShear(demand: Demand, { building, index }: Facts): string {
  const [lineId = '', level = '', pierId = ''] = demand.member.split('/');
  const pier = building.wallLines
    .find(({ id }) => id === lineId)
    ?.storeys.find(({ under }) => under === level)
    ?.piers.find(({ id }) => id === pierId);
  const shear = index.of(demand.member, 'shear', demand.case, demand.sense);
  const length = pier === undefined ? '' : ` ${dimension(pier.to - pier.from, building.units.length)}`;
  return `the pier’s shear${shear === undefined ? '' : ` ${quantity(Math.abs(shear.value), shear.unit)}`} over its length${length}`;
}

function endForce(demand: Demand, facts: Facts): string {
  const shear = facts.index.of(demand.member, 'shear', demand.case, demand.sense);
  const gravity = demand.combination === undefined ? '' : `, and gravity as factored in ${demand.combination}`;
  return `the couple of the pier’s shear${shear === undefined ? '' : ` ${quantity(Math.abs(shear.value), shear.unit)}`} at the arm of its end posts, what stands on them from above${gravity}`;
}
