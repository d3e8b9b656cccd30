/** Heads of the columns; each sorts by its column, and turns the order round when it is pressed again. */
import { useApp } from '../../state/appContext';
import { type SortColumn, sortColumns } from './listing';
import type { TracksModel } from './tracksModel';

export function TableHead({ model }: { readonly model: TracksModel }) {
  const { lengthUnit } = useApp().preferences.values.value;
  const { column: sortedBy, falls } = model.sort.value;
  const latitude = model.texts.value.latitude.trim() || '0';
  const words: Readonly<Record<SortColumn, readonly [string, string]>> = {
    cycle: ['N/D', ''],
    altitude: ['Altitude', lengthUnit],
    inclination: ['i', '°'],
    spacing: ['At equator', lengthUnit],
    across: [`Across at ${latitude}°`, lengthUnit],
    neighbour: ['Sub-cycle', 'd'],
    perDay: ['Rev/day', ''],
  };
  return (
    <thead>
      <tr aria-rowindex={1}>
        {sortColumns.map((column) => {
          const [label, unit] = words[column];
          const isSorted = column === sortedBy;
          return (
            <th
              key={column}
              scope="col"
              class={`of-${column}`}
              aria-sort={isSorted ? (falls ? 'descending' : 'ascending') : undefined}
            >
              <button
                type="button"
                class="plain"
                onClick={() => {
                  model.sort.value = { column, falls: isSorted && !falls };
                }}
              >
                {isSorted && <span aria-hidden="true">{falls ? '▾' : '▴'} </span>}
                {label} {unit && <span class="unit">{unit}</span>}
              </button>
            </th>
          );
        })}
      </tr>
    </thead>
  );
}
