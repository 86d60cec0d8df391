/** The path graph: members as nodes, forces as edges, for each load sub-case in sense 1. */
import type { Inertia } from '../diaphragms/inertia.js';
import { flexibleSpans, supportsOf, type Support } from '../diaphragms/flexible.js';
import type { SpanLoad } from '../statics/span-load.js';
import type { Landing, PierFeet, PostDescent } from '../walls/posts.js';
import type { LineModel, PierModel } from '../walls/wall-line.js';
import type { DiaphragmOutcome, LevelOutcome } from './descent.js';
import type { Model } from './model.js';
import type { PathEdge, PathNode } from './result.js';

export type Graph = { readonly nodes: Map<string, PathNode>; readonly edges: PathEdge[] };

export function emptyGraph(): Graph {
  return { nodes: new Map(), edges: [] };
}

function node(graph: Graph, kind: PathNode['kind'], member: string, level: string): string {
  const id = `${kind}:${member}`;
  if (!graph.nodes.has(id)) graph.nodes.set(id, { id, kind, member, level });
  return id;
}

function edge(graph: Graph, from: string, to: string, caseId: string, force: number, acts: PathEdge['acts']): void {
  if (force !== 0) graph.edges.push({ from, to, case: caseId, force, acts });
}

/** The horizontal way of one load sub-case, from the masses to the feet of the lowest piers. */
export function addHorizontal(
  graph: Graph,
  model: Model,
  outcomes: readonly (LevelOutcome | undefined)[],
  caseId: string,
): void {
  for (let i = outcomes.length - 1; i > 0; i--) {
    const outcome = outcomes[i];
    if (outcome === undefined) continue;
    const held = new Set<LineModel>();
    for (const diaphragm of outcome.diaphragms) {
      if (diaphragm.rigid === undefined) addFlexible(graph, model, outcome, diaphragm, caseId);
      else addRigid(graph, model, outcome, diaphragm, caseId);
      for (const line of diaphragm.taken.keys()) held.add(line);
    }
    for (const line of model.lines) {
      const storey = line.storeys[i];
      if (storey === undefined) continue;
      const below = outcome.below[line.index]?.[0] ?? 0;
      if (below === 0) continue;
      const lineNode = node(graph, 'wall-line', `${line.line.id}/${outcome.level.id}`, outcome.level.id);
      if (!held.has(line)) {
        const above = outcome.above[line.index]?.[0] ?? 0;
        fromPiersAbove(graph, model, line, i, above, lineNode, caseId);
      }
      for (const pier of storey.piers) {
        const pierNode = node(graph, 'pier', pier.key, outcome.level.id);
        edge(graph, lineNode, pierNode, caseId, below * pier.share, 'horizontal');
        if (i === 1) {
          const base = model.levels[0]?.id ?? '';
          const support = node(graph, 'support', `${line.line.id}/${pier.pier.id}`, base);
          edge(graph, pierNode, support, caseId, below * pier.share, 'horizontal');
        }
      }
    }
  }
}

/** The piers of the storey above hand their shear on. */
function fromPiersAbove(
  graph: Graph,
  model: Model,
  line: LineModel,
  level: number,
  shear: number,
  to: string,
  caseId: string,
): void {
  if (shear === 0) return;
  const above = model.levels[level + 1]?.id ?? '';
  for (const pier of line.storeys[level + 1]?.piers ?? []) {
    edge(graph, node(graph, 'pier', pier.key, above), to, caseId, shear * pier.share, 'horizontal');
  }
}

function addRigid(graph: Graph, model: Model, level: LevelOutcome, outcome: DiaphragmOutcome, caseId: string): void {
  const { id, index } = level.level;
  const key = outcome.diaphragm.key;
  const body = node(graph, 'diaphragm-span', key, id);
  const { inertia, force } = outcome.pushed;
  edge(graph, node(graph, 'mass', key, id), body, caseId, inertia.share * (force[0] as number), 'horizontal');
  for (const [line, taken] of outcome.taken) {
    const above = level.above[line.index]?.[0] ?? 0;
    fromPiersAbove(graph, model, line, index, above, body, caseId);
    // What a flexible neighbour gives to a line that this body holds.
    const rest = (taken[0] as number) - above;
    if (Math.abs(rest) > 1e-12 * Math.abs(taken[0] as number)) {
      edge(graph, node(graph, 'collector', `${id}/${line.line.id}`, id), body, caseId, rest, 'horizontal');
    }
  }
  for (const [line, given] of outcome.given) {
    const collector = node(graph, 'collector', `${id}/${line.line.id}`, id);
    edge(graph, body, collector, caseId, given[0] as number, 'horizontal');
    edge(
      graph,
      collector,
      node(graph, 'wall-line', `${line.line.id}/${id}`, id),
      caseId,
      given[0] as number,
      'horizontal',
    );
  }
}

function addFlexible(graph: Graph, model: Model, level: LevelOutcome, outcome: DiaphragmOutcome, caseId: string): void {
  const { id, index } = level.level;
  const { diaphragm, pushed } = outcome;
  const own = pushed.force[0] as number;
  const mass = node(graph, 'mass', diaphragm.key, id);
  if (own !== 0)
    carry(graph, outcome, pushed.inertia.frame, scaledLoad(pushed.inertia, own), id, caseId, (to, part) =>
      edge(graph, mass, to, caseId, part, 'horizontal'),
    );
  for (const [line, taken] of outcome.taken) {
    const force = (taken[0] as number) * line.sign;
    if (force === 0) continue;
    const load: SpanLoad = { pieces: [], points: [{ s: line.s, force }] };
    carry(graph, outcome, line.family, load, id, caseId, (to, part) =>
      fromPiersAbove(graph, model, line, index, part * line.sign, to, caseId),
    );
  }
  for (const [line, given] of outcome.given) {
    const collector = node(graph, 'collector', `${id}/${line.line.id}`, id);
    edge(
      graph,
      collector,
      node(graph, 'wall-line', `${line.line.id}/${id}`, id),
      caseId,
      given[0] as number,
      'horizontal',
    );
  }
}

function scaledLoad(inertia: Inertia, force: number): SpanLoad {
  return {
    pieces: inertia.load.pieces.map((piece) => ({ ...piece, w: piece.w.map((w) => w * force) })),
    points: inertia.load.points.map((point) => ({ s: point.s, force: point.force * force })),
  };
}

/** A load on a flexible diaphragm: into spans, and from them into the collectors at their ends. */
function carry(
  graph: Graph,
  outcome: DiaphragmOutcome,
  frame: number,
  load: SpanLoad,
  level: string,
  caseId: string,
  arrive: (to: string, force: number) => void,
): void {
  const { diaphragm } = outcome;
  const supports = supportsOf(diaphragm, frame);
  const { spans, direct } = flexibleSpans(diaphragm, frame, supports, load);
  const into = (from: string | undefined, support: Support, force: number): void => {
    for (const { line, part } of support.lines) {
      const collector = node(graph, 'collector', `${level}/${line.line.id}`, level);
      if (from === undefined) arrive(collector, force * part);
      else edge(graph, from, collector, caseId, force * part * line.sign, 'horizontal');
    }
  };
  spans.forEach((span, i) => {
    const near = supports[i] as Support;
    const far = supports[i + 1] as Support;
    if (span.near === 0 && span.far === 0) return;
    const spanNode = node(graph, 'diaphragm-span', `${diaphragm.key}/${near.name}-${far.name}`, level);
    arrive(spanNode, span.force);
    into(spanNode, near, span.near);
    into(spanNode, far, span.far);
  });
  direct.forEach((force, i) => {
    if (force !== 0) into(undefined, supports[i] as Support, force);
  });
}

/** The vertical way: piers into end posts, posts into what they land on, down to the supports. */
export function addVertical(
  graph: Graph,
  model: Model,
  descent: PostDescent,
  cases: readonly { id: string; component: number }[],
): void {
  const base = model.levels[0]?.id ?? '';
  const levelOf = (index: number): string => model.levels[index]?.id ?? '';
  const post = (pier: PierModel, end: 'from' | 'to', level: string): string =>
    node(graph, 'end-post', `${pier.key}/${end}`, level);
  const onto = new Map<PierFeet, Landing[]>();
  const landed = new Map<string, Landing>();
  for (const landing of descent.landings) {
    if (landing.foot === undefined) continue;
    landed.set(landing.column.key, landing);
    const known = onto.get(landing.foot);
    if (known === undefined) onto.set(landing.foot, [landing]);
    else known.push(landing);
  }
  for (const { id, component } of cases) {
    for (let index = descent.feet.length - 1; index > 0; index--) {
      for (const foot of descent.feet[index] ?? []) {
        const near = foot.near[component] as number;
        const far = foot.far[component] as number;
        if (near === 0 && far === 0) continue;
        const level = levelOf(index);
        let arrivingNear = 0;
        let arrivingFar = 0;
        for (const { column } of onto.get(foot) ?? []) {
          const part = placeOn(column.place, foot);
          arrivingNear += (column.force[component] as number) * (1 - part);
          arrivingFar += (column.force[component] as number) * part;
        }
        const pierNode = node(graph, 'pier', foot.pier.key, level);
        edge(graph, pierNode, post(foot.pier, 'from', level), id, clean(near - arrivingNear, near), 'vertical');
        edge(graph, pierNode, post(foot.pier, 'to', level), id, clean(far - arrivingFar, far), 'vertical');
        for (const end of ['from', 'to'] as const) {
          const force = end === 'from' ? near : far;
          const key = `${foot.pier.key}/${end}`;
          const landing = landed.get(key);
          if (landing?.foot !== undefined) {
            const { pier } = landing.foot;
            const part = placeOn(landing.column.place, landing.foot);
            const below = levelOf(landing.level);
            edge(graph, `end-post:${key}`, post(pier, 'from', below), id, clean(force * (1 - part), force), 'vertical');
            edge(graph, `end-post:${key}`, post(pier, 'to', below), id, clean(force * part, force), 'vertical');
          } else {
            const member = index === 1 ? `${foot.line.line.id}/${foot.pier.pier.id}/${end}` : key;
            edge(graph, `end-post:${key}`, node(graph, 'support', member, base), id, force, 'vertical');
          }
        }
      }
    }
  }
}

function clean(value: number, scale: number): number {
  return Math.abs(value) <= 1e-12 * Math.abs(scale) ? 0 : value;
}

/** Part of a force at a place that the pier's far post takes. */
function placeOn(place: readonly [number, number], { line, pier }: PierFeet): number {
  const [x, y] = line.line.axis[0];
  const at = (place[0] - x) * line.along[0] + (place[1] - y) * line.along[1];
  return (at - pier.posts[0]) / pier.arm;
}
