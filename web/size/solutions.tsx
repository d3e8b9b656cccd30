/** Every orbit that meets the conditions, or the nearest thing that exists; one tap takes it. */
import { degPerRad, formatNumber, type MeanElements, type Settlement, unitOf } from '../../core/index';
import { useApp } from '../state/appContext';
import { takeElements } from '../state/entryActions';

export function Solutions({ settlement }: { readonly settlement: Settlement }) {
  const { document } = useApp();
  if (!settlement.ok) {
    const { nearest } = settlement;
    if (!nearest) return null;
    return (
      <>
        <p class="soft small">Nearest that exists: {useMeanText()(nearest)}</p>
        <button type="button" onClick={() => takeElements(document, nearest)}>
          Take the nearest
        </button>
      </>
    );
  }
  if (settlement.all.length < 2) return null;
  return (
    <>
      <p class="soft small">{settlement.all.length} orbits meet this; the nearest to what was typed is taken.</p>
      <ul class="solutions">
        {settlement.all.map((mean) => (
          <Solution key={`${mean.semiMajorAxisKm} ${mean.eccentricity} ${mean.inclinationRad}`} mean={mean} />
        ))}
      </ul>
    </>
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
function useMeanText(): (mean: MeanElements) => string {
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
