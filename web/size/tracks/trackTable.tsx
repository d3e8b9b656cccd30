/** The list of tracks. Only the rows in view exist, so that 170 000 scroll as lightly as ten. */
import { degPerRad, formatNumber } from '../../../core/index';
import { useApp } from '../../state/appContext';
import { rounded } from './answer';
import { rowAt, type SortColumn, type TrackRow } from './listing';
import { TableHead } from './tableHead';
import './trackTable.css';
import type { Listing, TracksModel } from './tracksModel';
import { useRowsInView } from './useRowsInView';
import { useTaking } from './useTaking';

interface TableProps {
  readonly model: TracksModel;
  readonly listing: Listing;
}

export function TrackTable({ model, listing }: TableProps) {
  const { order, tracks } = listing;
  const rows = useRowsInView(order);
  const taking = useTaking(model);
  if (order.length === 0) return null;
  const above = rows.places[0] ?? 0;
  const below = order.length - above - rows.places.length;
  return (
    <div class={`tracks-table${listing.staleBecause ? ' is-stale' : ''}`}>
      <div class="tracks-scroll" ref={rows.box} onScroll={rows.onScroll}>
        <table aria-label="Repeat tracks" aria-rowcount={order.length + 1} style={{ '--row-px': `${rows.rowPx}px` }}>
          <TableHead model={model} />
          <tbody onKeyDown={rows.onKeyDown}>
            <Spacer rows={above} rowPx={rows.rowPx} />
            {rows.places.map((place) => {
              const row = rowAt(tracks, order[place] ?? Number.NaN);
              const onTake = taking.blocked ? undefined : () => taking.take(row);
              const isCurrent = taking.isCurrent(row);
              const isStop = place === rows.stop;
              return <Row key={place} {...{ row, place, listing, isCurrent, isStop, onTake }} />;
            })}
            <Spacer rows={below} rowPx={rows.rowPx} />
          </tbody>
        </table>
      </div>
      <p class="soft small tracks-count">
        {formatNumber(order.length, { digits: 0 })} listed of {formatNumber(tracks.columns.days.length, { digits: 0 })}{' '}
        found. A tap makes one the candidate.
      </p>
    </div>
  );
}

/** Stands for the rows that are not there. */
function Spacer({ rows, rowPx }: { readonly rows: number; readonly rowPx: number }) {
  if (rows <= 0) return null;
  return (
    <tr class="tracks-spacer">
      <td colSpan={7} style={{ height: `${rows * rowPx}px` }} />
    </tr>
  );
}

interface RowProps {
  readonly row: TrackRow;
  readonly place: number;
  readonly listing: Listing;
  readonly isCurrent: boolean;
  /** The one row that the Tab key stops at. */
  readonly isStop: boolean;
  readonly onTake: (() => void) | undefined;
}

function Row({ row, place, listing, isCurrent, isStop, onTake }: RowProps) {
  const unit = useApp().preferences.values.value.lengthUnit;
  const cells = cellsOf(row, listing, unit);
  return (
    <tr class={`tracks-row${isCurrent ? ' is-current' : ''}`} aria-rowindex={place + 2}>
      <th scope="row" class="of-cycle">
        <button
          type="button"
          class="tracks-take"
          data-place={place}
          tabIndex={isStop ? 0 : -1}
          disabled={!onTake}
          aria-current={isCurrent || undefined}
          onClick={onTake}
        >
          {row.revolutions}/{row.days}
        </button>
      </th>
      {dataColumns.map((column) => (
        <td key={column} class={`of-${column}`}>
          {cells[column]}
          {column === 'across' && <Overlap row={row} listing={listing} unit={unit} />}
        </td>
      ))}
    </tr>
  );
}

const dataColumns = ['altitude', 'inclination', 'spacing', 'across', 'neighbour', 'perDay'] as const;

function cellsOf(row: TrackRow, { tracks }: Listing, unit: 'km' | 'NM'): Record<Exclude<SortColumn, 'cycle'>, string> {
  return {
    altitude: rounded(row.semiMajorAxisKm - tracks.body.equatorialRadiusKm, unit, 2),
    inclination: formatNumber(row.inclinationRad * degPerRad, { digits: 3 }),
    spacing: rounded(row.spacingKm, unit, 1),
    across: rounded(row.acrossKm, unit, 1),
    neighbour: row.neighbourDays === 0 ? '< 1' : String(row.neighbourDays),
    perDay: formatNumber(row.revolutions / row.days, { digits: 4 }),
  };
}

/** How much swath is left over, or how much is missing. */
function Overlap({ row, listing, unit }: Pick<RowProps, 'row' | 'listing'> & { readonly unit: 'km' | 'NM' }) {
  const { swathKm } = listing;
  if (swathKm === null || Number.isNaN(row.acrossKm)) return null;
  const overKm = swathKm - row.acrossKm;
  const text = rounded(Math.abs(overKm), unit, 0);
  return <span class="tracks-overlap">{overKm >= 0 ? `+${text}` : `gap ${text}`}</span>;
}
