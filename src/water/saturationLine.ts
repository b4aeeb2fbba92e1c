// The saturation line of water between its triple and its critical point: one equation, solved for pressure or temperature.

/** Coefficients n₁ … n₁₀ of IAPWS-IF97, region 4. */
export const N1 = 1167.0521452767;
export const N2 = -724213.16703206;
export const N3 = -17.073846940092;
export const N4 = 12020.82470247;
export const N5 = -3232555.0322333;
export const N6 = 14.91510861353;
export const N7 = -4823.2657361591;
export const N8 = 405113.40542057;
export const N9 = -0.23855557567849;
export const N10 = 650.17534844798;

/** The pressure that the equation counts in, Pa. */
export const MEGAPASCAL = 1e6;

/** Triple and critical temperature of water, K. */
export const LIQUID_WATER = [273.16, 647.096] as const;

/** Pressures at the ends of the line, Pa; the equation itself puts the upper one 0.0003 Pa above 22.064 MPa. */
export const LINE_PRESSURES = [611.657, 22064000.001] as const;

export const IF97 =
  "IAPWS R7-97(2012), Industrial Formulation 1997, region 4; Wagner et al. 2000, J. Eng. Gas Turbines Power 122, 150";
