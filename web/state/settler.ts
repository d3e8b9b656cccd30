/** Loaded when a candidate has conditions: solving is not among what every start needs. */
import { settleOrbit } from '../../core/index';

export const settle = settleOrbit;
