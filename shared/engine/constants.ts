/** Speed of light in vacuum, m/s (exact by definition of the metre). */
export const C0_M_PER_S = 299_792_458;
/** Magnetic constant, H/m. The value 4π·1e-7 (SI before 2019; the present one differs by 5e-10). */
export const MU0_H_PER_M = 4e-7 * Math.PI;
/** Electric constant, F/m: 1/(μ₀c²). */
export const EPS0_F_PER_M = 1 / (MU0_H_PER_M * C0_M_PER_S * C0_M_PER_S);
