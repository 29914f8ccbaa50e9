/**
 * Solves a small system A x = b by elimination with pivoting; `undefined` when A is singular to rounding.
 * `matrix`: n rows of n numbers; `right`: n numbers. Neither is changed.
 */
export function solveLinear(matrix: readonly (readonly number[])[], right: readonly number[]): number[] | undefined {
  const rows = matrix.map((row, index) => [...row, right[index] ?? Number.NaN]);
  const size = rows.length;
  const scale = Math.max(...rows.flatMap((row) => row.slice(0, size).map(Math.abs)));
  for (let column = 0; column < size; column += 1) {
    const candidates = rows.slice(column).sort((one, other) => Math.abs(at(other, column)) - Math.abs(at(one, column)));
    rows.splice(column, size - column, ...candidates);
    const pivot = rows[column] ?? [];
    if (!(Math.abs(at(pivot, column)) > scale * 1e-13)) return undefined;
    for (const row of rows.slice(column + 1)) {
      const factor = at(row, column) / at(pivot, column);
      for (let index = column; index <= size; index += 1) row[index] = at(row, index) - factor * at(pivot, index);
    }
  }
  return backSubstituted(rows);
}

function backSubstituted(rows: readonly (readonly number[])[]): number[] {
  const size = rows.length;
  const solution = new Array<number>(size).fill(0);
  for (let index = size - 1; index >= 0; index -= 1) {
    const row = rows[index] ?? [];
    const known = solution.reduce((sum, value, column) => (column > index ? sum + at(row, column) * value : sum), 0);
    solution[index] = (at(row, size) - known) / at(row, index);
  }
  return solution;
}

function at(row: readonly number[], index: number): number {
  return row[index] ?? Number.NaN;
}
