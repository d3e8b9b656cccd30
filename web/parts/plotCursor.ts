/** Where the cursor goes: by key, and by a finger that may only want to scroll. Pure. */

/** A page of the keyboard moves a tenth of the span. */
const pageParts = 10;

/** The sample that a key moves the cursor to, or null where the key is not one of the cursor's. */
export function sampleAfterKey(key: string, sample: number, last: number): number | null {
  const page = Math.max(1, Math.round(last / pageParts));
  const moves: Readonly<Record<string, number>> = {
    ArrowLeft: sample - 1,
    ArrowDown: sample - 1,
    ArrowRight: sample + 1,
    ArrowUp: sample + 1,
    PageDown: sample - page,
    PageUp: sample + page,
    Home: 0,
    End: last,
  };
  const next = moves[key];
  return next === undefined ? null : Math.max(0, Math.min(last, next));
}

/** The sample nearest to a place across the plotting area, in px from its left edge. */
export function sampleAt(placePx: number, widthPx: number, last: number): number {
  if (!(widthPx > 0)) return 0;
  return Math.max(0, Math.min(last, Math.round((placePx / widthPx) * last)));
}

/** A touch that moved less than this across may still become a scroll. */
const slackPx = 6;

/** True once a pressed pointer steers the cursor: a mouse or pen at once, a finger when it moves across. */
export function steersCursor(pointerType: string, movedPx: number): boolean {
  return pointerType !== 'touch' || Math.abs(movedPx) >= slackPx;
}
