/** The version of this package, echoed by results that are published whole. */
export const VERSION = "0.1.0";
