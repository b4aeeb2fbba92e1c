// How exp splits its argument, x = k·(ln 2)/128 + r, and where its results stay finite and above 0.

/** The greatest double whose exponential is finite. */
export const GREATEST = 709.782712893384;
/** The least double whose exponential does not round to 0. */
export const LEAST = -745.1332191019411;
/** 128/ln 2. */
export const STEPS = 184.6649652337873;
/** (ln 2)/128 to 35 bits, so that k times it is exact for |k| < 2^18 (Cody and Waite 1980). */
export const STEP_HIGH = 0.0054152123482253955;
/** (ln 2)/128 − STEP_HIGH. */
export const STEP_LOW = -1.0082281460997769e-13;
