/** Places for labels beside their points, so that none covers another label or another point. */
export type Labelled = { readonly x: number; readonly y: number; readonly text: string };
export type Label = { readonly x: number; readonly y: number; readonly anchor: 'start' | 'middle' | 'end' };

type Frame = { readonly x0: number; readonly x1: number; readonly y0: number; readonly y1: number };

const PER_LETTER = 5.6;
const HEIGHT = 11;
const POINT = 5;

/** @returns a place for every point in their order; undefined where there is none */
export function placeLabels(
  points: readonly Labelled[],
  sheet: { readonly width: number; readonly height: number },
): (Label | undefined)[] {
  const taken: Frame[] = points.map(({ x, y }) => ({ x0: x - POINT, x1: x + POINT, y0: y - POINT, y1: y + POINT }));
  return points.map((point) => {
    const width = point.text.length * PER_LETTER;
    for (const label of around(point)) {
      const left = label.anchor === 'start' ? label.x : label.anchor === 'end' ? label.x - width : label.x - width / 2;
      const frame = { x0: left, x1: left + width, y0: label.y - HEIGHT + 2, y1: label.y + 2 };
      const inside = frame.x0 >= 0 && frame.x1 <= sheet.width && frame.y0 >= 0 && frame.y1 <= sheet.height;
      if (!inside || taken.some((other) => meet(frame, other))) continue;
      taken.push(frame);
      return label;
    }
    return undefined;
  });
}

function around({ x, y }: Labelled): Label[] {
  return [
    { x: x + 7, y: y - 6, anchor: 'start' },
    { x, y: y - 8, anchor: 'middle' },
    { x: x + 8, y: y + 4, anchor: 'start' },
    { x: x - 7, y: y - 6, anchor: 'end' },
    { x: x - 8, y: y + 4, anchor: 'end' },
    { x, y: y + 16, anchor: 'middle' },
    { x: x + 7, y: y + 14, anchor: 'start' },
    { x: x - 7, y: y + 14, anchor: 'end' },
  ];
}

function meet(a: Frame, b: Frame): boolean {
  return a.x0 < b.x1 && b.x0 < a.x1 && a.y0 < b.y1 && b.y0 < a.y1;
}
