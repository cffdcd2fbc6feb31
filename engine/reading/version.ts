/** Version of the computations: part of every cache key. Raised whenever a reading can come out differently. */
export const ENGINE_VERSION = '1.0.0';
