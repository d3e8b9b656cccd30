/**
 * The solution of a small square system, by elimination with the largest pivot of each column; null where a pivot
 * vanishes beside the column's largest entry. `matrix[row][column]`.
 */
export function solveLinear(matrix: readonly (readonly number[])[], right: readonly number[]): number[] | null {
  const size = right.length;
  const rows = matrix.map((row, index) => [...row, right[index] as number]);
  const largest = rows.reduce((most, row) => row.reduce((top, entry) => Math.max(top, Math.abs(entry)), most), 0);
  for (let column = 0; column < size; column += 1) {
    const pivot = pivotRow(rows, column);
    [rows[column], rows[pivot]] = [rows[pivot] as number[], rows[column] as number[]];
    const top = rows[column] as number[];
    const lead = top[column] as number;
    if (!(Math.abs(lead) > 1e-14 * largest)) return null;
    for (const row of rows.slice(column + 1)) {
      const factor = (row[column] as number) / lead;
      for (let k = column; k <= size; k += 1) row[k] = (row[k] as number) - factor * (top[k] as number);
    }
  }
  return backSubstituted(rows, size);
}

function pivotRow(rows: readonly (readonly number[])[], column: number): number {
  let best = column;
  for (let row = column + 1; row < rows.length; row += 1) {
    if (Math.abs(rows[row]?.[column] ?? 0) > Math.abs(rows[best]?.[column] ?? 0)) best = row;
  }
  return best;
}

function backSubstituted(rows: readonly (readonly number[])[], size: number): number[] {
  const solution = new Array<number>(size).fill(0);
  for (let row = size - 1; row >= 0; row -= 1) {
    const entries = rows[row] as readonly number[];
    let rest = entries[size] as number;
    for (let k = row + 1; k < size; k += 1) rest -= (entries[k] as number) * (solution[k] as number);
    solution[row] = rest / (entries[row] as number);
  }
  return solution;
}
