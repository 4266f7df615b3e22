/** Goes up when the same input gives other figures. */
export const ENGINE_VERSION = '1.0.0'
