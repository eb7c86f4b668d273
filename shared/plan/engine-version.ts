/** Moves when the same request would give another plan; a project keeps the one it was made with. */
export const ENGINE_VERSION = '1.0.0';
