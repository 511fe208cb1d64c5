/** Version of the engine; results of different versions are not joined. */
export const ENGINE_VERSION = '0.1.0';
