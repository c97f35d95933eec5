/** Version of the catalogue: faults, checks, bands, rules. Raised with every change of what they say. */
export const CATALOGUE_VERSION = "2026.12.1";

/** Version of the model of the unit: sequence and timings. */
export const MODEL_VERSION = "2026.12.1";
