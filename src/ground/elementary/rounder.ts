/** 1.5·2^52: adding it and taking it away again rounds a number of size below 2^51 to the nearest integer. */
export const ROUNDER = 6755399441055744;
