/**
 * Conversions between the units of gauges in the trade and SI, for display: a stored reading is never
 * converted. Factors are exact by definition where that is said.
 */

/** One inch of water column in pascals: 25.4 mm of water of 1000 kg/m3 under 9.80665 m/s2 (conventional inch). */
export const PASCALS_PER_INCH_WATER = 249.08891;
/** One inch of water at 4 degrees Celsius in pascals (water of 999.972 kg/m3). Published conversion tables. */
export const PASCALS_PER_INCH_WATER_4C = 249.082;
/** One inch of water at 60 degrees Fahrenheit in pascals. NIST SP 811, from memory. */
export const PASCALS_PER_INCH_WATER_60F = 248.84;
/** One pound-force a square inch in pascals: 0.45359237 kg x 9.80665 m/s2 over 0.0254 m squared. */
export const PASCALS_PER_PSI = 6894.757293168361;
/** One cubic foot in litres: 0.3048 m cubed, exact. */
export const LITRES_PER_CUBIC_FOOT = 28.316846592;
/** One Btu (International Table) an hour in watts: 1055.05585262 J / 3600 s. */
export const WATTS_PER_BTUH = 0.2930710701722222;
/** One inch in millimetres, exact. */
export const MILLIMETRES_PER_INCH = 25.4;
/** One foot in metres, exact. */
export const METRES_PER_FOOT = 0.3048;

/**
 * Which inch of water a gauge means. The three differ by 0.1 percent, less than a field gauge can tell; the
 * conventional one is used wherever none is named.
 */
export type InchWaterConvention = "conventional" | "4C" | "60F";

const PASCALS: Record<InchWaterConvention, number> = {
  conventional: PASCALS_PER_INCH_WATER,
  "4C": PASCALS_PER_INCH_WATER_4C,
  "60F": PASCALS_PER_INCH_WATER_60F,
};

/** Inches of water column to pascals, in the convention named. */
export const inchesWaterToPascals = (
  inchesWater: number,
  convention: InchWaterConvention = "conventional",
): number => inchesWater * PASCALS[convention];
/** Pascals to inches of water column, in the convention named. */
export const pascalsToInchesWater = (
  pascals: number,
  convention: InchWaterConvention = "conventional",
): number => pascals / PASCALS[convention];
/** Inches of water column to pounds a square inch, in the convention named. */
export const inchesWaterToPsi = (
  inchesWater: number,
  convention: InchWaterConvention = "conventional",
): number => inchesWaterToPascals(inchesWater, convention) / PASCALS_PER_PSI;
/** Pounds a square inch to inches of water column, in the convention named. */
export const psiToInchesWater = (psi: number, convention: InchWaterConvention = "conventional"): number =>
  pascalsToInchesWater(psi * PASCALS_PER_PSI, convention);

/** A temperature in degrees Fahrenheit to degrees Celsius. */
export const fahrenheitToCelsius = (fahrenheit: number): number => ((fahrenheit - 32) * 5) / 9;
/** A temperature in degrees Celsius to degrees Fahrenheit. */
export const celsiusToFahrenheit = (celsius: number): number => (celsius * 9) / 5 + 32;
/** A difference of temperature, such as a rise, in Fahrenheit degrees to Celsius degrees: no offset. */
export const fahrenheitRiseToCelsius = (rise: number): number => (rise * 5) / 9;
/** A difference of temperature in Celsius degrees to Fahrenheit degrees: no offset. */
export const celsiusRiseToFahrenheit = (rise: number): number => (rise * 9) / 5;

/** Cubic feet a minute to litres a second. */
export const cfmToLitresPerSecond = (cfm: number): number => (cfm * LITRES_PER_CUBIC_FOOT) / 60;
/** Litres a second to cubic feet a minute. */
export const litresPerSecondToCfm = (litresPerSecond: number): number =>
  (litresPerSecond * 60) / LITRES_PER_CUBIC_FOOT;
/** Cubic feet an hour to cubic metres an hour. */
export const cfhToCubicMetresPerHour = (cfh: number): number => (cfh * LITRES_PER_CUBIC_FOOT) / 1000;
/** Cubic metres an hour to cubic feet an hour. */
export const cubicMetresPerHourToCfh = (cubicMetres: number): number =>
  (cubicMetres * 1000) / LITRES_PER_CUBIC_FOOT;
/** Btu an hour to kilowatts. */
export const btuhToKilowatts = (btuh: number): number => (btuh * WATTS_PER_BTUH) / 1000;
/** Kilowatts to Btu an hour. */
export const kilowattsToBtuh = (kilowatts: number): number => (kilowatts * 1000) / WATTS_PER_BTUH;
/** Inches to millimetres. */
export const inchesToMillimetres = (inches: number): number => inches * MILLIMETRES_PER_INCH;
/** Millimetres to inches. */
export const millimetresToInches = (millimetres: number): number => millimetres / MILLIMETRES_PER_INCH;
/** Feet to metres. */
export const feetToMetres = (feet: number): number => feet * METRES_PER_FOOT;
/** Metres to feet. */
export const metresToFeet = (metres: number): number => metres / METRES_PER_FOOT;
