/** A real operator on the determinant space, by columns: `columns[j]` lists the rows i and values ⟨i|O|j⟩. */
export interface SparseOperator {
  readonly size: number;
  readonly columns: readonly { readonly rows: readonly number[]; readonly values: readonly number[] }[];
}

export function apply(operator: SparseOperator, vector: Float64Array): Float64Array {
  const result = new Float64Array(operator.size);
  for (let j = 0; j < operator.size; j++) {
    const x = vector[j]!;
    if (x === 0) continue;
    const { rows, values } = operator.columns[j]!;
    for (let k = 0; k < rows.length; k++) result[rows[k]!]! += values[k]! * x;
  }
  return result;
}

export function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i]! * b[i]!;
  return sum;
}
