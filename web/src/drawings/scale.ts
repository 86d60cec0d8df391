/** From the plan to the sheet: one scale in both directions, y upwards. */
export type Box = { readonly x0: number; readonly x1: number; readonly y0: number; readonly y1: number };

export type Scale = {
  readonly width: number;
  readonly height: number;
  readonly perUnit: number;
  readonly x: (value: number) => number;
  readonly y: (value: number) => number;
};

export type Margin = { readonly left: number; readonly right: number; readonly top: number; readonly bottom: number };

export function boxOf(points: readonly (readonly [number, number])[]): Box {
  const xs = points.map((point) => point[0]);
  const ys = points.map((point) => point[1]);
  return { x0: Math.min(...xs), x1: Math.max(...xs), y0: Math.min(...ys), y1: Math.max(...ys) };
}

/** Fits a box to a width. */
export function fitWidth(box: Box, width: number, margin: Margin, most = Infinity): Scale {
  const free = Math.max(1, width - margin.left - margin.right);
  const perUnit = Math.min(free / Math.max(box.x1 - box.x0, 1e-9), most / Math.max(box.y1 - box.y0, 1e-9));
  const height = (box.y1 - box.y0) * perUnit + margin.top + margin.bottom;
  return {
    width: (box.x1 - box.x0) * perUnit + margin.left + margin.right,
    height,
    perUnit,
    x: (value) => margin.left + (value - box.x0) * perUnit,
    y: (value) => height - margin.bottom - (value - box.y0) * perUnit,
  };
}

/** A length of the scale bar: 1, 2 or 5 times a power of ten, about a fifth of the width. */
export function barLength(box: Box): number {
  const about = (box.x1 - box.x0) / 5;
  const power = 10 ** Math.floor(Math.log10(about));
  return [5, 2, 1].map((n) => n * power).find((n) => n <= about) ?? power;
}
