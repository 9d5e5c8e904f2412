/** Version of the models and data, stamped on every result. Kept equal to package.json by a test. */
export const version = '0.1.0';
