'use client';
import type { KeyboardEvent, ReactNode } from 'react';

const STEPS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowUp: [-1, 0],
  ArrowDown: [1, 0],
  ArrowLeft: [0, -1],
  ArrowRight: [0, 1],
};

/**
 * A table that scrolls inside its own box. It is one stop for the Tab key; from there the arrow keys go from number to number, and
 * each says where it comes from.
 */
export function Table({
  label,
  className,
  children,
}: {
  readonly label: string;
  readonly className?: string;
  readonly children: ReactNode;
}) {
  return (
    <div className="scroll" role="region" aria-label={label} tabIndex={0} onKeyDown={walk}>
      <table className={className}>{children}</table>
    </div>
  );
}

function walk(event: KeyboardEvent<HTMLDivElement>): void {
  const step = STEPS[event.key];
  const at = event.target;
  if (step === undefined || !(at instanceof HTMLElement)) return;
  const figures = [...event.currentTarget.querySelectorAll<HTMLElement>('.figure')];
  const next = at === event.currentTarget ? figures[0] : beside(at, step);
  if (next === undefined) return;
  event.preventDefault();
  next.focus();
}

function beside(from: HTMLElement, [down, right]: readonly [number, number]): HTMLElement | undefined {
  const cell = from.closest('td');
  const row = from.closest('tr');
  if (cell === null || row === null || !from.classList.contains('figure')) return undefined;
  let [r, c] = [row.rowIndex, cell.cellIndex];
  const rows = row.closest('table')?.rows;
  while (rows !== undefined) {
    r += down;
    c += right;
    const next = rows[r]?.cells[c];
    if (next === undefined) return undefined;
    const figure = next.querySelector<HTMLElement>('.figure');
    if (figure !== null) return figure;
  }
  return undefined;
}
