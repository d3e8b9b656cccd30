/** One piece of drawing a frame, so that a stack of plots never holds up a finger for the sum of them. */
const waiting = new Map<object, () => void>();
let isRunning = false;

/** Runs in a coming frame; a newer piece of the same owner takes the place of one that waits. */
export function inTurn(owner: object, draw: () => void): void {
  waiting.set(owner, draw);
  if (isRunning) return;
  isRunning = true;
  requestAnimationFrame(next);
}

/** Whatever of this owner waits is not run any more. */
export function leaveTurn(owner: object): void {
  waiting.delete(owner);
}

function next(): void {
  const [first] = waiting;
  if (!first) {
    isRunning = false;
    return;
  }
  const [owner, draw] = first;
  waiting.delete(owner);
  requestAnimationFrame(next);
  draw();
}
