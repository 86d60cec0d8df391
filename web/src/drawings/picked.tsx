'use client';
import type { ReactNode } from 'react';

/** A part of a drawing that can be picked by pointer and by keys. */
export function Picked({
  label,
  shown,
  onPick,
  children,
}: {
  readonly label: string;
  readonly shown: boolean;
  readonly onPick: () => void;
  readonly children: ReactNode;
}) {
  return (
    <g
      className="pick"
      tabIndex={0}
      role="button"
      aria-label={label}
      aria-pressed={shown}
      onClick={onPick}
      onKeyDown={(event) => {
        if (event.key !== 'Enter' && event.key !== ' ') return;
        event.preventDefault();
        onPick();
      }}
    >
      {children}
    </g>
  );
}
