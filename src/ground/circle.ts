// Multiples of π as literals, the nearest doubles: never made from a power or a product.

/** 4π: the area of a unit sphere. */
export const FOUR_PI = 12.566370614359172;
/** 4π². */
export const FOUR_PI_SQUARED = 39.47841760435743;
