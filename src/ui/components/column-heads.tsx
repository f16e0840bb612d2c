/** A column's head; `number` where its cells are numbers. */
export type ColumnHead = string | { number: string };

/** The head row of a ruled table. */
export function ColumnHeads({ heads }: { heads: readonly ColumnHead[] }) {
  return (
    <thead>
      <tr>
        {heads.map((head) =>
          typeof head === 'string' ? (
            <th key={head} scope="col">
              {head}
            </th>
          ) : (
            <th key={head.number} scope="col" class="number">
              {head.number}
            </th>
          ),
        )}
      </tr>
    </thead>
  );
}
