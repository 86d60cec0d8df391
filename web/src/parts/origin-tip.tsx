'use client';
import { useEffect, useState } from 'react';

type Shown = { readonly text: string; readonly x: number; readonly y: number; readonly below: boolean };

const WIDTH = 340;

/** Says where a number comes from, for whatever carries `data-from`: while it is pointed at, has the focus or was touched. */
export function OriginTip() {
  const [shown, setShown] = useState<Shown | null>(null);
  useEffect(() => {
    const showFor = (element: Element | null): void => {
      const target = element?.closest('[data-from]') ?? null;
      setShown(target === null ? null : placed(target));
    };
    const follow = (event: Event): void => showFor(event.target instanceof Element ? event.target : null);
    const scrolled = (): void => showFor(document.activeElement);
    const escape = (event: KeyboardEvent): void => {
      if (event.key === 'Escape') setShown(null);
    };
    document.addEventListener('pointerover', follow);
    document.addEventListener('focusin', follow);
    document.addEventListener('keydown', escape);
    document.addEventListener('scroll', scrolled, true);
    return () => {
      document.removeEventListener('pointerover', follow);
      document.removeEventListener('focusin', follow);
      document.removeEventListener('keydown', escape);
      document.removeEventListener('scroll', scrolled, true);
    };
  }, []);
  return (
    <div aria-live="polite">
      {shown !== null && (
        <div
          className="tip"
          role="tooltip"
          style={{ left: shown.x, maxWidth: WIDTH, ...(shown.below ? { top: shown.y } : { bottom: shown.y }) }}
        >
          {shown.text}
        </div>
      )}
    </div>
  );
}

/** Below its number where there is room, else above; never beyond the window. */
function placed(target: Element): Shown {
  const box = target.getBoundingClientRect();
  const below = box.bottom + 140 < window.innerHeight;
  const x = Math.max(8, Math.min(box.left, window.innerWidth - WIDTH - 8));
  const text = target.getAttribute('data-from') ?? '';
  return { text, x, y: below ? box.bottom + 6 : window.innerHeight - box.top + 6, below };
}
