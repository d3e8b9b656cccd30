/** Line drawings of the places, drawn for Driftbook. */
import type { Place } from '../state/route';

const drawings: Readonly<Record<Place, preact.JSX.Element>> = {
  size: (
    <g>
      <ellipse cx="14" cy="14" rx="11.5" ry="7.5" transform="rotate(-24 14 14)" />
      <circle cx="11" cy="15.5" r="3.4" />
      <path d="M23.2 6.9l2.2 2.2-2.2 2.2-2.2-2.2z" class="filled" />
    </g>
  ),
  drift: (
    <g>
      <path d="M4 3.5v20.5h21" />
      <path d="M7 20.5c5-1 10-4 15-13.5" />
      <path d="M7 20.5c6 0 11-1.5 16-5" stroke-dasharray="3.2 2.4" />
    </g>
  ),
  book: (
    <g>
      <path d="M5.5 4.5h15.5a2 2 0 0 1 2 2v17h-15.5a2.2 2.2 0 0 1-2-2.2z" />
      <path d="M9.5 4.5v19" />
      <path d="M13 10h6.5M13 14h6.5" />
    </g>
  ),
};

export function PlaceIcon({ place }: { readonly place: Place }) {
  return (
    <svg viewBox="0 0 28 28" fill="none" stroke="currentColor" stroke-width="1.6" aria-hidden="true">
      {drawings[place]}
    </svg>
  );
}
