import { type SortKey, sortKeys } from './listing';
import { useBook } from './useBook';

const sortLabels: Readonly<Record<SortKey, string>> = {
  saved: 'Saved',
  name: 'Name',
  altitude: 'Altitude',
  inclination: 'Inclination',
};

/** Search and order of the list. */
export function ListTools() {
  const { view } = useBook();
  if (view.listed.value.length < 2) return null;
  return (
    <search class="book-tools">
      <label>
        <span class="small soft">Search</span>
        <input
          type="search"
          placeholder="name, notes …"
          autocomplete="off"
          spellcheck={false}
          value={view.query.value}
          onInput={(event) => {
            view.query.value = event.currentTarget.value;
          }}
        />
      </label>
      <label class="book-order">
        <span class="small soft">Order</span>
        <select
          value={view.sort.value}
          onChange={(event) => {
            view.sort.value = sortKeys.find((key) => key === event.currentTarget.value) ?? 'saved';
          }}
        >
          {sortKeys.map((key) => (
            <option key={key} value={key}>
              {sortLabels[key]}
            </option>
          ))}
        </select>
      </label>
    </search>
  );
}
