/**
 * Numbers of the setup and the visit that a person types, by the name they are stored under. Apart from the stored rows, so that a page can have the
 * names without the schemas.
 */
export const TYPED_FIELDS = [
  'elevation',
  'stationPressure',
  'targetSubcooling',
  'targetSuperheat',
  'superheatLow',
  'superheatHigh',
  'nominalCapacity',
  'designAirflow',
  'factoryCharge',
  'maxHighPressure',
  'expectedCompressorCurrent',
  'lineLength',
  'mostLineLength',
  'lift',
  'lowestReturnDryBulb',
  'instrumentsCheckedDaysAgo',
  'hoursOff',
  'addedThisVisit',
  'additionsOnEarlierVisits',
] as const;
export type TypedField = (typeof TYPED_FIELDS)[number];
