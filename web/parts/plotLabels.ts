/** Labels beside line ends: each as near to its line as can be, none on another. Pure. */

/**
 * Centres of labels, top to bottom in px, for wanted centres in px.
 *
 * Labels keep the order of what they name; those that would overlap are moved apart evenly about
 * their common middle, then all are brought inside 0 to `heightPx` with half their height,
 * as far as there is room.
 */
export function spreadLabels(wantedPx: readonly number[], gapPx: number, heightPx: number): number[] {
  const order = wantedPx.map((_, index) => index).sort((one, other) => at(wantedPx, one) - at(wantedPx, other));
  const groups: { members: number[]; middlePx: number }[] = [];
  for (const index of order) {
    groups.push({ members: [index], middlePx: at(wantedPx, index) });
    joinOverlapping(groups, gapPx);
  }
  const placed = new Array<number>(wantedPx.length).fill(0);
  for (const { members, middlePx } of groups) {
    const halfPx = ((members.length - 1) * gapPx) / 2;
    const reachPx = halfPx + gapPx / 2;
    const middle = Math.max(reachPx, Math.min(heightPx - reachPx, middlePx));
    members.forEach((index, place) => {
      placed[index] = middle - halfPx + place * gapPx;
    });
  }
  return placed;
}

function joinOverlapping(groups: { members: number[]; middlePx: number }[], gapPx: number): void {
  for (;;) {
    const last = groups.at(-1);
    const before = groups.at(-2);
    if (!last || !before) return;
    const reachPx = ((last.members.length + before.members.length) / 2) * gapPx;
    if (last.middlePx - before.middlePx >= reachPx) return;
    const count = last.members.length + before.members.length;
    const middlePx = (last.middlePx * last.members.length + before.middlePx * before.members.length) / count;
    groups.splice(-2, 2, { members: [...before.members, ...last.members], middlePx });
  }
}

function at(values: readonly number[], index: number): number {
  return values[index] ?? 0;
}
