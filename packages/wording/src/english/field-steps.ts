/** What a step of an airflow, a capacity or a weigh-in gives. */
import { findingPhrases } from './findings';

const STEP_NAMES: Readonly<Record<string, string>> = {
  electricHeat: 'Heat of the elements',
  gasInput: 'Gas input',
  gasHeat: 'Heat to the air',
  totalHeat: 'Heat with the blower’s',
  temperatureRise: 'Temperature rise',
  airSpecificHeat: 'Specific heat of the air',
  dryAirMassFlow: 'Dry air moved',
  returnSpecificVolume: 'Volume of the return air',
  supplySpecificVolume: 'Volume of the supply air',
  returnAirflow: 'Airflow at the return',
  supplyAirflow: 'Airflow at the supply',
  standardAirflow: 'As standard air',
  airflowPerCapacity: 'Airflow per nominal capacity',
  totalExternalStatic: 'Total external static pressure',
  staticInStandardAir: 'The same in standard air',
  fanTableAirflow: 'Airflow by the fan table',
  supplyWetBulb: 'Supply wet bulb',
  supplyHumidityRatio: 'Supply humidity ratio',
  supplyEnthalpy: 'Supply enthalpy',
  condensateEnthalpy: 'Carried off by the condensate',
  totalCapacity: 'Total cooling',
  sensibleCapacity: 'Sensible cooling',
  sensibleHeatRatio: 'Sensible heat ratio',
  capacityRatio: 'Part of the nominal capacity',
  lineRate: 'Rate of this refrigerant',
  includedLineRate: 'Rate of the included line',
  lineAdjustment: 'For the line set',
  requiredAdjustment: 'Adjustment with corrections',
  requiredCharge: 'Whole charge required',
  chargeAfterAdjustment: 'Whole charge now',
  chargeDifference: 'Weighed in less required',
};

export const fieldStepName = (id: string): string => STEP_NAMES[id] ?? findingPhrases.stepName(id);
