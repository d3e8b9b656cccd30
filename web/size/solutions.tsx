/** Every orbit that meets the conditions, or the nearest thing that exists; one tap takes it. */
import { degPerRad, formatNumber, type MeanElements, type Settlement, unitOf } from '../../core/index';
import { useApp } from '../state/appContext';
import { takeElements } from '../state/entryActions';

export function Solutions({ settlement }: { readonly settlement: Settlement }) {
  const { document } = useApp();
  const meanText = useMeanText();
  if (!settlement.ok) {
    const { nearest } = settlement;
    if (!nearest) return null;
    const entered = document.entered.value;
    const isTaken = entered.ok && isSameOrbit(entered.orbit.mean, nearest);
    return (
      <>
        <p class="soft small">
          {isTaken ? 'The entry is the nearest that exists' : 'Nearest that exists'}: {meanText(nearest)}
        </p>
        {!isTaken && (
          <button type="button" onClick={() => takeElements(document, nearest)}>
            Take the nearest
          </button>
        )}
      </>
    );
  }
  if (settlement.all.length < 2) return null;
  return (
    <>
      <p class="soft small">{settlement.all.length} orbits meet this; the nearest to what was typed is taken.</p>
      <ul class="solutions">
        {[...settlement.all].sort(byPlace).map((mean) => (
          <Solution key={`${mean.semiMajorAxisKm} ${mean.eccentricity} ${mean.inclinationRad}`} mean={mean} />
        ))}
      </ul>
    </>
  );
}

/** However the solver came to them, each keeps its place when another is taken. */
function byPlace(one: MeanElements, other: MeanElements): number {
  return one.inclinationRad - other.inclinationRad || one.semiMajorAxisKm - other.semiMajorAxisKm;
}

/** As far as the fields of an entry write an orbit. */
function isSameOrbit(one: MeanElements, other: MeanElements): boolean {
  return (
    Math.abs(one.semiMajorAxisKm - other.semiMajorAxisKm) < 0.01 &&
    Math.abs(one.eccentricity - other.eccentricity) < 1e-6 &&
    Math.abs(one.inclinationRad - other.inclinationRad) < 1e-6
  );
}

function Solution({ mean }: { readonly mean: MeanElements }) {
  const { document } = useApp();
  const settlement = document.conditions.settlement.value;
  const isTaken = settlement?.ok && settlement.orbit.mean === mean;
  return (
    <li>
      <button type="button" aria-pressed={isTaken ?? false} onClick={() => takeElements(document, mean)}>
        {useMeanText()(mean)}
      </button>
    </li>
  );
}

/** Altitudes and inclination in one line. */
export function useMeanText(): (mean: MeanElements) => string {
  const { document, preferences } = useApp();
  const { symbol, perCore } = unitOf('length', preferences.values.value.lengthUnit);
  const entered = document.entered.value;
  const radiusKm = entered.ok ? entered.orbit.body.equatorialRadiusKm : 0;
  return ({ semiMajorAxisKm: a, eccentricity: e, inclinationRad }) => {
    const altitude = (km: number) => formatNumber((km - radiusKm) * perCore, { digits: 1 });
    const inclination = formatNumber(inclinationRad * degPerRad, { digits: 3 });
    return `${altitude(a * (1 - e))} × ${altitude(a * (1 + e))} ${symbol}, ${inclination}°`;
  };
}
