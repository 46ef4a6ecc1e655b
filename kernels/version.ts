/** Version of the numerical engine, as results state it; raised whenever a number may change. */
export const ENGINE = '0.1.0';
