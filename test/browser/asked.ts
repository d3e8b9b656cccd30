/**
 * The figures that the app is asked to keep at a processor slowed four times, and what a machine may take that others share.
 *
 * Every run prints what it measured. The asked figures bind where DRIFTBOOK_QUIET is set, on a machine that does nothing
 * else; elsewhere only a fault of the app, not a neighbour's work, should fail a run, and that takes several times as long.
 */
const isQuiet = Boolean(process.env['DRIFTBOOK_QUIET']);

/** What neighbours on a shared machine of two processors were seen to cost, at the 95th percentile, and some room. */
const sharedFactor = 8;

/** The bound of this run for a figure that is asked for. */
export const boundOf = (asked: number, factor = sharedFactor): number => (isQuiet ? asked : asked * factor);
