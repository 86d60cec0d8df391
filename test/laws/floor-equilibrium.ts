/** Equilibrium of a whole floor, read off its net unit shears alone. */
import { expect } from 'vitest';
import { momentAt, unitShear, SteppedCase, type SteppedFloor } from './stepped-floor.js';

/**
 * Axial force of the edges and chords that lie at one t, from the near end up to `s`: the sum of the unit shear below less that above.
 * Exact where unit shears are linear between stations.
 */
function barAlong(found: SteppedCase, floor: SteppedFloor, t: number, s: number): number {
  const stations = new Set(found.floor.pieces.flatMap(({ from, to }) => [from, to]));
  for (const { panels } of found.transfers) for (const { from, to } of panels) stations.add(from).add(to);
  const sorted = [...stations].sort((a, b) => a - b).filter((each) => each <= s + 1e-9);
  const inside = (x: number, y: number): boolean => {
    let odd = false;
    for (const ring of [floor.outline, ...(floor.openings ?? [])]) {
      ring.forEach(([x0, y0], i) => {
        const [x1, y1] = ring[(i + 1) % ring.length] as [number, number];
        if (x0 > x !== x1 > x && y < y0 + ((y1 - y0) * (x - x0)) / (x1 - x0)) odd = !odd;
      });
    }
    return odd;
  };
  const step = 1e-6;
  let force = 0;
  for (let i = 0; i + 1 < sorted.length; i++) {
    const [a, b] = [sorted[i] as number, sorted[i + 1] as number];
    const middle = (a + b) / 2;
    const difference = (x: number): number =>
      (inside(middle, t - step) ? unitShear(found, x, t - step) : 0) -
      (inside(middle, t + step) ? unitShear(found, x, t + step) : 0);
    // Both sides of a station carry different shears: read just inside.
    const reach = (b - a) * 1e-9;
    force += ((difference(a + reach) + difference(b - reach)) / 2) * (b - a);
  }
  return force;
}

/**
 * Net unit shears, summed along every edge, chord and tie of a rectilinear floor, give bars that carry the moment at every cut and nothing
 * else, and end in nothing; drag struts and collectors close; every transfer diaphragm is in equilibrium.
 */
export function holds(floor: SteppedFloor, found = new SteppedCase(floor)): void {
  expect(found.analysis.certificate.worstResidual).toBeLessThan(1e-9);
  const places = [...new Set([floor.outline, ...(floor.openings ?? [])].flat().map(([, y]) => y))];
  const stations = [...new Set(found.floor.pieces.map(({ to }) => to))];
  const largest = Math.max(...stations.map((s) => Math.abs(momentAt(found, s))), 1);
  for (const s of stations) {
    const bars = places.map((t) => ({ t, force: barAlong(found, floor, t, s) }));
    const sum = bars.reduce((total, { force }) => total + force, 0);
    const moment = bars.reduce((total, { t, force }) => total + force * t, 0);
    expect(Math.abs(sum), `forces across x = ${s}`).toBeLessThan(1e-6 * largest);
    expect(Math.abs(moment - momentAt(found, s)), `moment at x = ${s}`).toBeLessThan(1e-6 * largest);
  }
  const end = Math.max(...stations);
  for (const t of places)
    expect(Math.abs(barAlong(found, floor, t, end)), `bar at y = ${t}`).toBeLessThan(1e-6 * largest);
  for (const { kind, member, points } of found.bars) {
    if (kind === 'strut' && member.endsWith('/strut')) continue;
    const scale = Math.max(1, ...points.map(({ axial }) => Math.abs(axial)));
    expect(Math.abs(points[0]?.axial ?? 0), member).toBeLessThan(1e-9 * scale);
    expect(Math.abs(points[points.length - 1]?.axial ?? 0), member).toBeLessThan(1e-9 * scale);
  }
  for (const transfer of found.transfers) {
    const forces = [...transfer.chords, ...transfer.edges];
    const scale = Math.max(1, ...forces.map(({ axial }) => Math.abs(axial)));
    expect(Math.abs(forces.reduce((total, { axial }) => total + axial, 0))).toBeLessThan(1e-9 * scale);
    expect(Math.abs(forces.reduce((total, { axial, t }) => total + axial * t, 0))).toBeLessThan(1e-7 * scale);
    for (const panel of transfer.panels) {
      const middle = (panel.to - panel.from) / 2;
      const net = found.value(transfer.member, 'net-unit-shear');
      const here = panel.shear.reduceRight((total, c) => total * middle + c, 0) / (panel.depth[0] ?? 0);
      expect(Math.abs(here)).toBeLessThanOrEqual(net * (1 + 1e-9));
    }
  }
}
