/** A reading as text, in the units the user has chosen. */
import { formatQuantity, type Quantity, type Reading, unitOf } from '../../core/index';
import { useApp } from '../state/appContext';

export interface ReadingText {
  readonly value: string;
  readonly unit: string;
}

/** The display unit of a quantity under the user's preferences; undefined for its usual one. */
export function usePreferredUnit(): (quantity: Quantity) => string | undefined {
  const { lengthUnit, rateUnit } = useApp().preferences.values.value;
  return (quantity) => {
    if (quantity === 'length') return lengthUnit;
    if (quantity === 'angleRate') return rateUnit === 'degPerYear' ? 'deg/yr' : 'deg/day';
    return undefined;
  };
}

/** Degrees are written with their sign. */
const spoken = (symbol: string): string => symbol.replace(/^deg\b/, '°');

export function quantityText(quantity: Quantity, value: number, unitId?: string): ReadingText {
  return { value: formatQuantity(quantity, value, unitId), unit: spoken(unitOf(quantity, unitId).symbol) };
}

export function useReadingText(reading: Reading): ReadingText {
  return quantityText(reading.quantity, reading.value, usePreferredUnit()(reading.quantity));
}
