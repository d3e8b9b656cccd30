import { describe, expect, it } from 'vitest';
import { neighbourDays, trackPattern } from '../../../core/index';

const coprime = (one: number, other: number): boolean => (other === 0 ? one === 1 : coprime(other, one % other));

describe('neighbourDays', () => {
  it('is the nearer of the two neighbours of the pattern, for every cycle of up to 40 days', () => {
    for (let days = 1; days <= 40; days += 1) {
      for (let revolutions = 13 * days; revolutions <= 16 * days; revolutions += 1) {
        if (!coprime(revolutions, days)) continue;
        const { eastNeighbour, westNeighbour } = trackPattern({ revolutions, days });
        const expected = days === 1 ? 0 : Math.min(eastNeighbour.wholeDays, westNeighbour.wholeDays);
        expect(neighbourDays({ revolutions, days }), `${revolutions}/${days}`).toBe(expected);
      }
    }
  });

  it('finds by trial the first day that lies one spacing away', () => {
    // 233 revolutions in 16 days: 7 · 233 = 1631 = 102 · 16 − 1.
    expect(neighbourDays({ revolutions: 233, days: 16 })).toBe(7);
    expect(neighbourDays({ revolutions: 15, days: 1 })).toBe(0);
  });
});
