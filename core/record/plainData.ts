/**
 * Checks that a value is plain data (what JSON can hold) and of a bearable size, without
 * recursion, so that a hostile file cannot exhaust the stack.
 */
export interface PlainDataLimits {
  readonly depth: number;
  readonly values: number;
  readonly characters: number;
}

/** Generous for anything a place writes, small enough to be saved at every keystroke. */
export const planLimits: PlainDataLimits = { depth: 24, values: 20_000, characters: 400_000 };

/** What is wrong with the value, in words, or null. */
export function plainDataProblem(value: unknown, limits: PlainDataLimits = planLimits): string | null {
  const waiting: { value: unknown; depth: number }[] = [{ value, depth: 0 }];
  let values = 0;
  let characters = 0;
  for (let item = waiting.pop(); item; item = waiting.pop()) {
    values += 1;
    if (values > limits.values) return `Expected at most ${limits.values} values.`;
    if (item.depth > limits.depth) return `Expected at most ${limits.depth} levels.`;
    if (typeof item.value === 'string') characters += item.value.length;
    else if (typeof item.value === 'number') {
      if (!Number.isFinite(item.value)) return 'Expected finite numbers.';
    } else if (typeof item.value === 'object' && item.value !== null) {
      for (const [key, inner] of Object.entries(item.value)) {
        characters += key.length;
        waiting.push({ value: inner, depth: item.depth + 1 });
      }
    } else if (item.value !== null && typeof item.value !== 'boolean') return 'Expected plain data.';
    if (characters > limits.characters) return `Expected at most ${limits.characters} characters.`;
  }
  return null;
}
