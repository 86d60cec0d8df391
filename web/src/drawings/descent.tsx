'use client';
import type { Building } from '@groundward/engine/building/definition';
import type { Sense } from '@groundward/engine/path/result';
import { levelsAscending, type DemandIndex } from '@/lib/demands';
import { figure } from '@/lib/format';
import { useWidth } from './use-width';

export type DescentView = {
  readonly building: Building;
  readonly index: DemandIndex;
  readonly caseId: string;
  readonly sense: Sense;
  readonly shown?: string | undefined;
};

const LEFT = 120;
const MOST_COLUMN = 96;
const LEAST_COLUMN = 46;
const STOREY = 92;
const TOP = 30;

/**
 * The whole building with its horizontal forces flowing down: a bar for every diaphragm, a column for every wall line, and in every
 * storey a ribbon as wide as the line's shear. A ribbon that ends at a bar hands its force to that diaphragm.
 */
export function DescentDrawing({
  view,
  onPick,
}: {
  readonly view: DescentView;
  readonly onPick: (member: string) => void;
}) {
  const [ref, free] = useWidth<HTMLDivElement>();
  const { building, index, caseId, sense } = view;
  const levels = levelsAscending(building);
  const lines = building.wallLines.filter((line) =>
    line.storeys.some((storey) => index.of(`${line.id}/${storey.under}`, 'shear', caseId, sense) !== undefined),
  );
  const shearOf = (line: string, level: string): number =>
    index.of(`${line}/${level}`, 'shear', caseId, sense)?.value ?? 0;
  const most = Math.max(1e-12, ...lines.flatMap((line) => levels.map((level) => Math.abs(shearOf(line.id, level.id)))));
  const column = Math.min(MOST_COLUMN, Math.max(LEAST_COLUMN, (free - LEFT - 20) / Math.max(1, lines.length)));
  const width = LEFT + column * lines.length + 20;
  const height = TOP + STOREY * (levels.length - 1) + 24;
  const y = (i: number): number => TOP + STOREY * (levels.length - 1 - i);
  const x = (c: number): number => LEFT + column * (c + 0.5);
  const { force } = building.units;
  return (
    <div className="scroll" ref={ref}>
      <svg width={width} height={height} role="group" aria-label={`Forces down the building under ${caseId}`}>
        {levels.map((level, i) => {
          const own = index.of(level.id, 'force', caseId, sense);
          const total = index.of(level.id, 'storey-shear', caseId, sense);
          return (
            <g key={level.id}>
              <text x={0} y={y(i) + 2} fontSize={12.5} className="t-ink">
                {level.name ?? level.id}
              </text>
              {own !== undefined && (
                <text x={0} y={y(i) + 17} fontSize={11} className="t-force">
                  {`+ ${figure(own.value, 3)} ${force}`}
                </text>
              )}
              {total !== undefined && (
                <text x={0} y={y(i) + STOREY / 2 + 12} fontSize={11}>
                  {`Σ ${figure(total.value, 4)} ${force}`}
                </text>
              )}
              {(level.diaphragms ?? []).map((diaphragm, d, all) => (
                <g
                  key={diaphragm.id}
                  className="pick"
                  tabIndex={0}
                  role="button"
                  aria-label={`Mass of ${level.id}/${diaphragm.id}`}
                  onClick={() => onPick(`${level.id}/${diaphragm.id}`)}
                  onKeyDown={(event) => event.key === 'Enter' && onPick(`${level.id}/${diaphragm.id}`)}
                >
                  <rect
                    x={LEFT - 6 + ((width - LEFT - 8) * d) / all.length}
                    y={y(i) - 6}
                    width={(width - LEFT - 8) / all.length - 2}
                    height={12}
                    fill={view.shown === `${level.id}/${diaphragm.id}` ? 'var(--force)' : 'var(--sheet)'}
                    stroke="var(--ink)"
                    strokeDasharray={diaphragm.behaviour === 'rigid' ? undefined : '6 3'}
                  />
                  <title>{`${diaphragm.name ?? diaphragm.id}: ${diaphragm.behaviour ?? 'flexible'}`}</title>
                </g>
              ))}
            </g>
          );
        })}
        {lines.map((line, c) => (
          <g key={line.id}>
            <text x={x(c)} y={14} fontSize={12} textAnchor="middle" className="t-ink">
              {line.id}
            </text>
            {levels.slice(1).map((level, i) => {
              const member = `${line.id}/${level.id}`;
              const shear = index.of(member, 'shear', caseId, sense);
              if (shear === undefined) return null;
              const w = Math.max(1, (Math.abs(shear.value) / most) * (column - 22));
              const reaction = index.of(member, 'reaction', caseId, sense);
              const on = view.shown === member;
              const against = shear.value < 0;
              return (
                <g
                  key={level.id}
                  className="pick"
                  tabIndex={0}
                  role="button"
                  aria-label={`${member}, shear ${figure(shear.value)} ${force}`}
                  onClick={() => onPick(member)}
                  onKeyDown={(event) => event.key === 'Enter' && onPick(member)}
                >
                  <rect
                    x={x(c) - w / 2}
                    y={y(i + 1) + 6}
                    width={w}
                    height={STOREY - 12}
                    fill="var(--force)"
                    fillOpacity={on ? 0.85 : 0.32}
                    stroke="var(--force)"
                    strokeDasharray={against ? '3 2' : undefined}
                  />
                  <rect x={x(c) - column / 2} y={y(i + 1) + 6} width={column} height={STOREY - 12} fill="transparent" />
                  <text
                    x={x(c)}
                    y={y(i + 1) + STOREY / 2 + 16}
                    fontSize={11.5}
                    textAnchor="middle"
                    className="t-ink"
                    stroke="var(--paper)"
                    strokeWidth={3}
                    paintOrder="stroke"
                  >
                    {figure(shear.value, 3)}
                  </text>
                  {reaction !== undefined && (
                    <text
                      x={x(c)}
                      y={y(i + 1) + 20}
                      fontSize={10}
                      textAnchor="middle"
                      stroke="var(--paper)"
                      strokeWidth={3}
                      paintOrder="stroke"
                    >
                      {`${reaction.value < 0 ? '' : '+'}${figure(reaction.value, 3)}`}
                    </text>
                  )}
                  <title>{`Wall line ${line.id} under ${level.id}: shear ${figure(shear.value)} ${force}, of it ${figure(reaction?.value ?? 0)} from this level`}</title>
                </g>
              );
            })}
          </g>
        ))}
        <line x1={LEFT - 6} x2={width - 10} y1={y(0) + 8} y2={y(0) + 8} stroke="var(--ink)" strokeWidth={3} />
      </svg>
    </div>
  );
}
