'use client';
import type { DiaphragmDiagram, Sense } from '@groundward/engine/path/result';
import { useState, type KeyboardEvent, type PointerEvent } from 'react';
import { PlanDrawing, planBox, type PlanView } from '@/drawings/plan';
import { boxOf, fitWidth, type Box } from '@/drawings/scale';
import { AXIS, CAPTION, ORDINATES, RIGHT, SpanDiagrams, type SpanDiagramsView } from '@/drawings/span-diagrams';
import { dimension, quantity } from '@/lib/format';
import { pointsOf, readAt } from '@/lib/polynomial';

export type LevelSheetView = {
  readonly plan: PlanView;
  readonly diagrams: readonly DiaphragmDiagram[];
  readonly sense: Sense;
};

const LEAST = 640;

/**
 * The plan of a level with the diagrams along its span: under it where the span runs across the sheet, beside it where it runs up
 * the sheet, on one scale. A cut can be moved along the span, by pointer or by arrow keys, and is read off exactly.
 */
export function LevelSheet({
  view,
  width,
  onPick,
}: {
  readonly view: LevelSheetView;
  readonly width: number;
  readonly onPick: (line: string) => void;
}) {
  const [s, setS] = useState<number | null>(null);
  const { plan, diagrams, sense } = view;
  const first = diagrams[0];
  const across = first?.across ?? [1, 0];
  const upright = Math.abs(across[1]) > Math.abs(across[0]);
  const box = boxOf(planBox(plan.building));
  const full = upright ? Math.max(width, LEAST) : width;
  const margin = { left: AXIS, right: upright ? 44 : RIGHT, top: upright ? CAPTION + 4 : 42, bottom: 44 };
  const scale = fitWidth(box, upright ? full * 0.58 : full, margin, upright ? 560 : 400);
  const extent = extentAlong(box, across);
  const at = s === null ? undefined : readAt(diagrams, s, sense);
  const shown: SpanDiagramsView = {
    series: diagrams.map((diagram) => pointsOf(diagram, sense)),
    lines: diagrams.flatMap((diagram) => diagram.lines),
    units: plan.building.units,
    ...extent,
  };
  const drawn: PlanView = {
    ...plan,
    ...(s === null ? {} : { cursor: { across, s } }),
    ...(oblique(across) ? { spans: [] } : {}),
  };
  const length = scale.height - margin.top - margin.bottom;
  const each = Math.max(56, (full - scale.width - 8 * ORDINATES.length) / ORDINATES.length);
  const place =
    s === null ? 0 : ((s - extent.from) / (extent.to - extent.from)) * (upright ? length : scale.width - AXIS - RIGHT);
  return (
    <div className="scroll">
      {oblique(across) && (
        <p className="note">
          The load acts at an angle to the sheet: the diagrams run along s, square to the load, and are not in line with
          the plan. A cut is drawn where it is.
        </p>
      )}
      <p className="reading" aria-hidden={at === undefined}>
        {at === undefined
          ? 'Point at the diagrams, or use the arrow keys on them, to read them at any cut.'
          : reading(at, shown.units, 'symbol').map((text) => <span key={text}>{text}</span>)}
      </p>
      <div style={upright ? { display: 'flex', width: full, gap: 8 } : { width: scale.width }}>
        <PlanDrawing plan={drawn} scale={scale} box={box} onPick={onPick} />
        <div
          className={upright ? 'cut upright' : 'cut'}
          style={upright ? { marginTop: margin.top - CAPTION } : undefined}
          role="slider"
          tabIndex={0}
          aria-label="Cut along the span"
          aria-orientation={upright ? 'vertical' : 'horizontal'}
          aria-valuemin={extent.from}
          aria-valuemax={extent.to}
          aria-valuenow={s ?? extent.from}
          aria-valuetext={at === undefined ? 'not set' : reading(at, shown.units, 'name').join(', ')}
          onPointerMove={(event) => setS(pointed(event, upright, extent, upright ? length : scale.width))}
          onPointerLeave={() => setS(null)}
          onKeyDown={(event) => moved(event, s, extent, setS)}
        >
          <SpanDiagrams view={shown} upright={upright} width={upright ? each : scale.width} length={length} />
          {s !== null && (
            <div
              className="cursor-line"
              style={
                upright
                  ? { top: CAPTION + length - place, left: 0, right: 0 }
                  : { left: AXIS + place, top: 0, bottom: 0 }
              }
            />
          )}
        </div>
      </div>
    </div>
  );
}

function oblique(across: readonly [number, number]): boolean {
  return Math.min(Math.abs(across[0]), Math.abs(across[1])) > 1e-9;
}

type Extent = { readonly from: number; readonly to: number };

/** The plan's extent along s. */
function extentAlong(box: Box, across: readonly [number, number]): Extent {
  const values = [box.x0, box.x1].flatMap((x) => [box.y0, box.y1].map((y) => across[0] * x + across[1] * y));
  return { from: Math.min(...values), to: Math.max(...values) };
}

function pointed(event: PointerEvent<HTMLElement>, upright: boolean, { from, to }: Extent, size: number): number {
  const frame = event.currentTarget.getBoundingClientRect();
  const share = upright
    ? 1 - (event.clientY - frame.top - CAPTION) / size
    : (event.clientX - frame.left - AXIS) / (size - AXIS - RIGHT);
  return from + Math.min(1, Math.max(0, share)) * (to - from);
}

const STEPS: Readonly<Record<string, number>> = {
  ArrowLeft: -1,
  ArrowDown: -1,
  ArrowRight: 1,
  ArrowUp: 1,
  PageDown: -10,
  PageUp: 10,
};

function moved(
  event: KeyboardEvent<HTMLElement>,
  s: number | null,
  { from, to }: Extent,
  set: (s: number | null) => void,
): void {
  if (event.key === 'Escape') {
    set(null);
    return;
  }
  const step = STEPS[event.key];
  const next =
    event.key === 'Home'
      ? from
      : event.key === 'End'
        ? to
        : step === undefined
          ? undefined
          : (s ?? from) + (step * (to - from)) / 100;
  if (next === undefined) return;
  event.preventDefault();
  set(Math.min(to, Math.max(from, next)));
}

function reading(
  at: NonNullable<ReturnType<typeof readAt>>,
  units: SpanDiagramsView['units'],
  by: 'name' | 'symbol',
): string[] {
  return [
    `s ${dimension(Number(at.s.toPrecision(4)), units.length)}`,
    ...ORDINATES.map(
      (ordinate) => `${ordinate[by]} ${quantity(at[ordinate.key], ordinate.unit(units.force, units.length), 4)}`,
    ),
  ];
}
