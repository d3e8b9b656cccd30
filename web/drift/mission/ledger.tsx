/** The effects ledger: what each effect adds by the end of the span, switched on one after another. */
import { apsisName, type EffectChange, type MissionSettings } from '../../../core/index';
import { useApp } from '../../state/appContext';
import type { MissionResult } from '../../state/mission';
import type { LedgerPart } from '../../work/missionCalls';
import { spanText } from '../spans';
import {
  absentText,
  boundNames,
  dragText,
  type EffectColumn,
  effectColumns,
  effectNames,
  leftOutSum,
  sizeText,
} from './effectWords';

export interface LedgerProps {
  readonly result: MissionResult;
  readonly settings: MissionSettings;
}

export function Ledger({ result, settings }: LedgerProps) {
  const { lengthUnit } = useApp().preferences.values.value;
  const { ledger, request } = result;
  if (!ledger) {
    return (
      <section class="ledger" aria-busy="true">
        <h2>What moved the orbit</h2>
        <p class="soft small">Each effect is being switched on in turn.</p>
      </section>
    );
  }
  const columns = effectColumns(lengthUnit, apsisName(request.body));
  const left = leftOutSum(ledger.bounds);
  const sizes = left && {
    node: [`±${sizeText(left.nodeDeg)}`, `±${sizeText(left.localTimeMin)}`, `±${sizeText(left.inclinationDeg)}`],
    shape: ['–', `±${sizeText(left.eccentricity)}`, '–'],
  };
  const span = spanText(ledger.endDays);
  const drag = dragText(ledger, request);
  return (
    <section class="ledger" aria-label="Effects ledger">
      <LedgerTable name={`What moved the node, ${span}`} columns={columns.node} ledger={ledger} left={sizes?.node} />
      <LedgerTable name={`What moved the shape, ${span}`} columns={columns.shape} ledger={ledger} left={sizes?.shape} />
      <div class="ledger-notes">
        {drag && <p>{drag}</p>}
        {ledger.perigeeIsVague && (
          <p class="soft">At so small an e the perigee’s rows hang on the order of the effects.</p>
        )}
        {absentText(settings, result.history.leftOut).map((text) => (
          <p key={text} class="soft">
            {text}
          </p>
        ))}
        <Sources ledger={ledger} />
      </div>
    </section>
  );
}

interface LedgerTableProps {
  readonly name: string;
  readonly columns: readonly EffectColumn[];
  readonly ledger: LedgerPart;
  readonly left: readonly string[] | undefined;
}

function LedgerTable({ name, columns, ledger, left }: LedgerTableProps) {
  return (
    <div class="drift-table ledger-table">
      <table>
        <caption>
          <span>{name}</span>
        </caption>
        <thead>
          <tr>
            <th scope="col">effect</th>
            {columns.map(({ id, title, unit, hue }) => (
              <th key={id} scope="col" class={`mark-${hue}`}>
                {title} <span class="unit">{unit}</span>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {ledger.rows.map(({ effect, change }) => (
            <LedgerRow key={effect} name={effectNames[effect]} change={change} columns={columns} />
          ))}
          <LedgerRow name="all" change={ledger.sum} columns={columns} isSum />
          {left && (
            <tr class="ledger-left">
              <th scope="row">left out, at most</th>
              {columns.map(({ id, title }, index) => (
                <td key={id} data-label={title}>
                  {left[index]}
                </td>
              ))}
            </tr>
          )}
        </tbody>
      </table>
    </div>
  );
}

interface LedgerRowProps {
  readonly name: string;
  readonly change: EffectChange;
  readonly columns: readonly EffectColumn[];
  readonly isSum?: boolean;
}

function LedgerRow({ name, change, columns, isSum = false }: LedgerRowProps) {
  return (
    <tr class={isSum ? 'ledger-sum' : ''}>
      <th scope="row">{name}</th>
      {columns.map(({ id, title, write }) => (
        <td key={id} data-label={title}>
          {write(change)}
        </td>
      ))}
    </tr>
  );
}

/** Where the bounds of what is left out come from. */
function Sources({ ledger }: { readonly ledger: LedgerPart }) {
  if (ledger.bounds.length === 0) {
    return <p class="soft">How much is left out is not known for this body.</p>;
  }
  return (
    <details class="fold">
      <summary>
        <span class="fold-title">What is left out</span> <span class="fold-says">how its bound is known</span>
      </summary>
      <dl>
        {ledger.bounds.map((bound) => (
          <div key={bound.effect}>
            <dt>
              {boundNames[bound.effect]}: ±{sizeText((bound.nodeRad * 180) / Math.PI)}° of node,{' '}
              {bound.basis === 'practice' ? 'common practice' : bound.basis}
            </dt>
            <dd class="soft">{bound.source}.</dd>
          </div>
        ))}
      </dl>
    </details>
  );
}
