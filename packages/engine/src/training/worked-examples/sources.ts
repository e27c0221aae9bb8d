/** Where the printed figures of the examples were read. Manuals are named by their document numbers, as with the charts. */
export const R410A_TABLE = 'R-410A temperature-pressure table (installation manual 506083-01, 03/2008, table 5)';
export const R22_ZERO_SUPERHEAT_ROW =
  'R-22 charging table (heat-pump installation guide, table 5), row of zero superheat';
export const R22_SATURATED = 'R-22 saturated temperatures (chiller installation manual, table 13)';
export const R32_SATURATION_LINE = 'R-32 on the saturation line (online refrigerants reference, appendix 9)';
/** No producer's table of R-454B, and no dew column of R-407C, was found to read. */
export const EQUATIONS_OF_STATE = 'Published equations of state, by an independent open library';
export const HANDBOOK_EXAMPLE =
  'ASHRAE Handbook - Fundamentals (2017), ch. 1, example 1, as quoted in the tests of an open library; read off a chart there';
export const STANDARD_ATMOSPHERE = 'ICAO standard atmosphere (ASHRAE Handbook - Fundamentals (2017), ch. 1, eq. 3)';
export const MAKERS_LINE_EXAMPLE = "A maker's installation manual, worked example of a line set";
export const SHORT_FORMULA = 'Common practice, no source';
export const DEFINITION = 'Definition';
