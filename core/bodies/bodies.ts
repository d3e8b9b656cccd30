import type { Body } from './body';
import { gravitySets } from './earth';
import { mercury, venus } from './innerPlanets';
import { mars } from './mars';
import { moon } from './moon';
import { jupiter, saturn } from './outerPlanets';

/** The bodies that come with Driftbook; the Earth under EGM2008. */
export const bodies = {
  earth: gravitySets.EGM2008,
  moon,
  mars,
  venus,
  mercury,
  jupiter,
  saturn,
} as const satisfies Record<string, Body>;
