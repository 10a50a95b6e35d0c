/** Semantic version of the numbers: a change above 1e-9 relative is minor, of a status major. */
export const ENGINE_VERSION = '1.0.0';
