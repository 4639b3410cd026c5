/** Boards per property: a few in `make test`; PROPERTY_RUNS=5000 asks for more. */
export const propertyRuns = Number(process.env.PROPERTY_RUNS ?? 40);

/** One seed for all, so that a run can be repeated; fast-check prints the path to a failing board, shrunk. */
export const propertySeed = 60913;

/** With PROPERTY_RUNS a property may run for an hour, ms. */
export const propertyTimeout = process.env.PROPERTY_RUNS ? 3_600_000 : 60_000;
