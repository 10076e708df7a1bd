/**
 * Version of the computations behind a result. It goes up whenever any stored number could change,
 * so that a pinned result says what made it.
 */
export const ENGINE_VERSION = '2';
