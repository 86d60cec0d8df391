'use client';
import type { Fault } from '@groundward/engine/building/fault';
import { faultSentence } from '@groundward/engine/building/fault';
import type { ClipboardEvent, KeyboardEvent } from 'react';

/** One cell: a field, or a choice; Enter and the arrows up and down go from row to row, as in a spreadsheet. */
export function EditCell({
  label,
  where,
  text,
  was,
  faults,
  locked,
  wide,
  choices,
  onType,
  onPaste,
}: {
  readonly label: string;
  /** The value's path in the file, by which a fault finds its field. */
  readonly where: string;
  readonly text: string;
  readonly was: string;
  readonly faults: readonly Fault[];
  readonly locked: boolean;
  readonly wide: boolean;
  readonly choices: readonly string[] | undefined;
  readonly onType: (text: string) => void;
  readonly onPaste: (event: ClipboardEvent) => void;
}) {
  const shared = {
    'aria-label': label,
    'aria-invalid': faults.length > 0,
    'data-path': where,
    title: text === was ? undefined : `saved: ${was === '' ? 'nothing' : was}`,
    onKeyDown: step,
  } as const;
  return (
    <td className={text === was ? undefined : 'changed'}>
      {choices !== undefined ? (
        <select {...shared} disabled={locked} value={text} onChange={(event) => onType(event.target.value)}>
          {[...new Set(['', ...choices, text])].map((choice) => (
            <option key={choice} value={choice}>
              {choice === '' ? '–' : choice}
            </option>
          ))}
        </select>
      ) : (
        <input
          {...shared}
          key={text}
          className={wide ? 'text' : undefined}
          readOnly={locked}
          defaultValue={text}
          inputMode={wide ? 'text' : 'decimal'}
          onPaste={(event) => !locked && onPaste(event)}
          onBlur={(event) => {
            if (!locked && event.target.value.trim() !== text) onType(event.target.value.trim());
          }}
        />
      )}
      {faults.map((fault) => (
        <div key={faultSentence(fault)} className="fault">
          {faultSentence(fault)}
        </div>
      ))}
    </td>
  );
}

const ROWS: Readonly<Record<string, number>> = { Enter: 1, ArrowDown: 1, ArrowUp: -1 };

function step(event: KeyboardEvent<HTMLElement>): void {
  const rows = ROWS[event.key];
  const field = event.currentTarget;
  const cell = field.closest('td');
  const row = field.closest('tr');
  if (rows === undefined || cell === null || row === null || field instanceof HTMLSelectElement) return;
  event.preventDefault();
  const next = row.closest('table')?.rows[row.rowIndex + rows]?.cells[cell.cellIndex];
  field.blur();
  const there = next?.querySelector<HTMLElement>('input, select');
  there?.focus();
  if (there instanceof HTMLInputElement) there.select();
}
