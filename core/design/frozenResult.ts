/** What is said about a frozen orbit: the orbit, or the reason why there is none. */

export interface FrozenShape {
  readonly eccentricity: number;
  /** 90° or 270°, in rad. */
  readonly perigeeRad: number;
}

export interface FrozenOrbit extends FrozenShape {
  readonly ok: true;
  /** Highest degree of the zonals that took part. */
  readonly degree: number;
  /** J3 and J2 alone, e = −(J3/2J2)(R/a) sin i: for a check by hand. */
  readonly hand: FrozenShape;
  /** What makes the result less sure, as sentences; empty where nothing does. */
  readonly cautions: readonly string[];
}

export type FrozenRefusal =
  | 'badInput'
  | 'oblatenessUnknown'
  | 'oddZonalsUnknown'
  | 'insideBody'
  | 'criticalInclination'
  | 'noSolution'
  | 'notConverged';

export interface NoFrozenOrbit {
  readonly ok: false;
  readonly reason: FrozenRefusal;
  readonly message: string;
}

export type FrozenResult = FrozenOrbit | NoFrozenOrbit;

export function refuse(reason: FrozenRefusal, message: string): NoFrozenOrbit {
  return { ok: false, reason, message };
}
