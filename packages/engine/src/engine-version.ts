/** Version of the calculation. Kept with every number; raised whenever any result may change. */
export const ENGINE_VERSION = '1.0.0';
