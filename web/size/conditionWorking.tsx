/** The working of one condition: what has to hold, what was asked, what the orbit has, and how far apart they are. */
import { conditionWorkings, formatSignificant, type OrbitCondition } from '../../core/index';
import { useApp } from '../state/appContext';

export function ConditionWorkingView({ condition }: { readonly condition: OrbitCondition }) {
  const { document } = useApp();
  const entered = document.entered.value;
  const settlement = document.conditions.settlement.value;
  if (!entered.ok) return <p class="soft small">The entry cannot be read yet.</p>;
  const { body } = entered.orbit;
  const mean = settlement?.ok ? settlement.orbit.mean : entered.orbit.mean;
  // The one theory that conditions are solved with.
  const [working] = conditionWorkings({ body, theory: 'second', mean, conditions: [condition] });
  if (!working) return <p class="soft small">This condition asks for nothing that can be compared here.</p>;
  const { formula, quantity, asked, reached, residual } = working;
  return (
    <dl class="condition-working">
      <dt>Has to hold</dt>
      <dd>{formula}</dd>
      <dt>Asked, {quantity}</dt>
      <dd>{asked}</dd>
      <dt>{settlement?.ok ? 'Reached' : 'As typed'}</dt>
      <dd>{reached}</dd>
      <dt>Residual, as a share</dt>
      <dd>{formatSignificant(residual, 2)}</dd>
    </dl>
  );
}
