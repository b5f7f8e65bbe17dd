/** Ratio of the molar masses of water and dry air. ASHRAE Handbook—Fundamentals, ch. 1, eq. 20. */
export const MOLAR_MASS_RATIO = 0.621945;
/** Its inverse as the handbook's volume equation has it (eq. 26). */
export const INVERSE_MOLAR_MASS_RATIO = 1.607858;
/** Gas constant of dry air, kJ/(kg K). Eq. 26. */
export const DRY_AIR_GAS_CONSTANT = 0.287042;
/** Specific heats in kJ/(kg K) and the datum of water vapour at 0 °C in kJ/kg. Eq. 30. */
export const DRY_AIR_SPECIFIC_HEAT = 1.006;
export const VAPOUR_SPECIFIC_HEAT = 1.86;
export const VAPOUR_ENTHALPY_0C = 2501;
/** Liquid water, kJ/(kg K). Eq. 33. */
export const LIQUID_SPECIFIC_HEAT = 4.186;
export const KELVIN = 273.15;
/** Above it saturation is taken over liquid water, at and below it over ice, °C: where the two curves meet. */
export const ICE_LIMIT = 0.01;

/** What the relations are offered for. Outside, inputs are refused rather than extrapolated. */
export const DRY_BULB_RANGE = { min: -60, max: 100 } as const;
export const PRESSURE_RANGE = { min: 30, max: 120 } as const;
