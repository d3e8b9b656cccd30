/** Labels that keep out of each other's way and off the lines. */
export interface LabelBox {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export interface LabelPlaces {
  isFree(box: LabelBox): boolean;
  take(box: LabelBox): void;
  readonly taken: readonly LabelBox[];
}

export function labelPlaces(): LabelPlaces {
  const taken: LabelBox[] = [];
  return {
    taken,
    isFree: (box) => taken.every((other) => !overlaps(box, other)),
    take: (box) => {
      taken.push(box);
    },
  };
}

function overlaps(one: LabelBox, other: LabelBox): boolean {
  return one.left < other.right && other.left < one.right && one.top < other.bottom && other.top < one.bottom;
}

/** The pieces of a stretch that keep out of what blocks it, each by its two ends. */
export function clearPieces(from: number, to: number, blocked: readonly (readonly [number, number])[]) {
  const pieces: [number, number][] = [];
  let at = from;
  for (const [start, end] of [...blocked].sort(([one], [other]) => one - other)) {
    if (start > at) pieces.push([at, Math.min(start, to)]);
    at = Math.max(at, end);
  }
  if (at < to) pieces.push([at, to]);
  return pieces.filter(([start, end]) => end > start);
}

export interface BoxSize {
  readonly width: number;
  readonly height: number;
}

export function boxAround(x: number, y: number, { width, height }: BoxSize): LabelBox {
  return { left: x - width / 2, right: x + width / 2, top: y - height / 2, bottom: y + height / 2 };
}

/** A polyline in pixels; NaN breaks it. */
export interface PixelLine {
  readonly x: Float64Array;
  readonly y: Float64Array;
}

/** Whether any piece of the line passes through the box. */
export function touches({ x, y }: PixelLine, box: LabelBox): boolean {
  for (let index = 1; index < x.length; index += 1) {
    const [x0, y0, x1, y1] = [x[index - 1] ?? 0, y[index - 1] ?? 0, x[index] ?? 0, y[index] ?? 0];
    if (pieceTouches(x0, y0, x1, y1, box)) return true;
  }
  return false;
}

/** Liang and Barsky's clipping of a segment by a rectangle (from memory). */
function pieceTouches(x0: number, y0: number, x1: number, y1: number, box: LabelBox): boolean {
  if (Number.isNaN(x0 + y0 + x1 + y1)) return false;
  let [from, to] = [0, 1];
  const edges = [
    [x0 - x1, x0 - box.left],
    [x1 - x0, box.right - x0],
    [y0 - y1, y0 - box.top],
    [y1 - y0, box.bottom - y0],
  ] as const;
  for (const [direction, room] of edges) {
    if (direction === 0) {
      if (room < 0) return false;
    } else if (direction < 0) from = Math.max(from, room / direction);
    else to = Math.min(to, room / direction);
  }
  return from <= to;
}
