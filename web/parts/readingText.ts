/** A reading as text, in the units the user has chosen. */
import { formatNumber, formatQuantity, type Quantity, type Reading, unitOf } from '../../core/index';
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

/** Two significant figures: all that a sensitivity or a doubt is worth. */
export function roundedText(
  quantity: Quantity,
  value: number,
  options: { unitId?: string | undefined; plus: boolean },
) {
  const shown = value * unitOf(quantity, options.unitId).perCore;
  const leading = Math.floor(Math.log10(Math.abs(shown) || 1));
  return formatNumber(shown, { digits: Math.min(7, Math.max(0, 1 - leading)), plus: options.plus });
}

/** How wrong the method may be, such as "± 0.00016"; empty where no figure is known. */
export function doubtText({ quantity, doubt }: Reading, unitId?: string): string {
  return doubt && doubt.size > 0 ? `± ${roundedText(quantity, doubt.size, { unitId, plus: false })}` : '';
}

export function useReadingText(reading: Reading): ReadingText {
  return quantityText(reading.quantity, reading.value, usePreferredUnit()(reading.quantity));
}
