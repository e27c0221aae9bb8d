/** Every formula of the engine, with what it stands on and where it is met. */
import type { Formula } from '../derivation/formula';
import * as airSide from '../methods/air-side';
import * as airToRefrigerant from '../methods/air-to-refrigerant';
import * as airProperties from '../methods/airflow/air-properties';
import * as airflow from '../methods/airflow/airflow-formulas';
import * as fanTable from '../methods/airflow/fan-table';
import * as heat from '../methods/airflow/heat-input';
import { standardAirflow } from '../methods/airflow/standard-air';
import * as capacity from '../methods/capacity/capacity-formulas';
import * as supplyAir from '../methods/capacity/supply-air';
import * as cycle from '../methods/cycle-points';
import { SUPERHEAT_CHART_A } from '../methods/data/superheat-chart-a';
import { makersTargetFormula } from '../methods/makers-chart/makers-table';
import * as tests from '../methods/separating-tests';
import * as targets from '../methods/targets';
import * as charge from '../methods/weigh-in/charge-formulas';
import { CORRECTIONS } from '../methods/weigh-in/corrections';
import { lineRateByDensity } from '../methods/weigh-in/line-rate';
import * as moistAir from '../training/worked-examples/moist-air-steps';
import type { SourcePlace, SourceStanding } from './source-entry';

/** Of a formula that is made for one refrigerant: any serves for its text, and its curve has an entry of its own. */
const ANY_REFRIGERANT = 'R-410A';
const REFRIGERANT_CURVES =
  'Curve through the published equation of state of the refrigerant, in this list by its own name';
/** Of a formula that reads the chart the rules name. */
const CHART_OF_THE_RULES = 'The chart that the rules name, in this list by its own name';

interface SourceFormula {
  readonly formula: Text;
  readonly standing: SourceStanding;
  readonly places: readonly SourcePlace[];
}

type Text = Pick<Formula, 'text' | 'source'>;

const standing =
  (of: SourceStanding, ...places: readonly SourcePlace[]) =>
  (formula: Text): SourceFormula => ({ formula, standing: of, places });

const ofAnyCurve = ({ text }: Text): Text => ({ text, source: REFRIGERANT_CURVES });

const readForCheck = standing('read', 'check');
const defined = standing('definition', 'check');
const practice = standing('practice', 'check');
const computed = standing('computed', 'check', 'refrigerant');
/** The Handbook itself was not opened: its printed values were read as others quote them, and the equations meet them. */
const handbook = standing('memory', 'check', 'moist-air', 'examples');
const handbookForCapacity = standing('memory', 'airflow');
const definedForAirflow = standing('definition', 'airflow');
const fromMemoryForAirflow = standing('memory', 'airflow');
const practiceForAirflow = standing('practice', 'airflow');
const makersRule = standing('practice', 'weigh-in');

/** By the name under which each is exported. */
export const SOURCE_FORMULAS = {
  superheat: readForCheck(cycle.superheat),
  subcooling: readForCheck(cycle.subcooling),
  temperatureSplit: readForCheck(airSide.temperatureSplit),
  targetSuperheat: defined({ ...targets.targetSuperheat(SUPERHEAT_CHART_A), source: CHART_OF_THE_RULES }),
  targetTemperatureSplit: standing('memory', 'check')(targets.targetTemperatureSplit),
  makersTargetFormula: standing(
    'entered',
    'check',
    'makers-data',
  )(
    makersTargetFormula({
      kind: 'subcooling',
      grid: { rows: [], columns: [], cells: [] },
      rowUnit: 'degF',
      columnUnit: null,
      cellUnit: 'deltaF',
      resolution: 1,
    }),
  ),
  deviation: defined(targets.deviation('superheat', 'differenceK')),
  absolutePressure: defined(cycle.absolutePressure('suctionPressure')),
  siteGaugePressure: defined(cycle.siteGaugePressure('liquidPressure')),
  evaporatingDewTemperature: computed(ofAnyCurve(cycle.evaporatingDewTemperature(ANY_REFRIGERANT))),
  condensingBubbleTemperature: computed(ofAnyCurve(cycle.condensingBubbleTemperature(ANY_REFRIGERANT))),
  meanEvaporatingTemperature: practice(cycle.meanEvaporatingTemperature(ANY_REFRIGERANT)),
  condensingOverAmbient: defined(cycle.condensingOverAmbient),
  returnOverEvaporating: defined(airToRefrigerant.returnOverEvaporating),
  liquidLineApproach: defined(airToRefrigerant.liquidLineApproach),
  currentOffExpected: defined(airToRefrigerant.currentOffExpected),
  drierDrop: defined(tests.drierDrop),
  standingSaturation: standing('computed', 'check')(ofAnyCurve(tests.standingSaturation(ANY_REFRIGERANT))),
  standingExcess: practice(tests.standingExcess),
  bracketedWetBulb: practice(tests.bracketedWetBulb),
  returnWetBulbFromHumidity: handbook(airSide.returnWetBulbFromHumidity),
  returnHumidityRatio: handbook(airSide.returnHumidityRatio),
  returnRelativeHumidity: handbook(airSide.returnRelativeHumidity),
  returnEnthalpy: handbook(airSide.returnEnthalpy),
  humidityRatioStep: handbook(moistAir.humidityRatioStep),
  relativeHumidityStep: handbook(moistAir.relativeHumidityStep),
  dewPointStep: handbook(moistAir.dewPointStep),
  enthalpyStep: handbook(moistAir.enthalpyStep),
  specificVolumeStep: handbook(moistAir.specificVolumeStep),
  temperatureRise: definedForAirflow(airflow.temperatureRise),
  dryAirMassFlowFromHeat: practiceForAirflow(airflow.dryAirMassFlowFromHeat),
  airflowFromMass: definedForAirflow(airflow.airflowFromMass('supply')),
  dryAirMassFlowFromVolume: definedForAirflow(airflow.dryAirMassFlowFromVolume),
  dryAirMassFlowFromStandard: fromMemoryForAirflow(capacity.dryAirMassFlowFromStandard),
  standardAirflow: fromMemoryForAirflow(standardAirflow),
  airflowPerCapacity: definedForAirflow(airflow.airflowPerCapacity),
  airSpecificVolume: handbookForCapacity(airProperties.airSpecificVolume('supply')),
  airSpecificHeat: handbookForCapacity(airProperties.airSpecificHeat),
  electricHeat: definedForAirflow(heat.electricHeat),
  gasInput: practiceForAirflow(heat.gasInput),
  gasHeat: definedForAirflow(heat.gasHeat),
  totalHeat: definedForAirflow(heat.totalHeat),
  totalExternalStatic: practiceForAirflow(fanTable.totalExternalStatic),
  staticInStandardAir: fromMemoryForAirflow(fanTable.staticInStandardAir),
  fanTableAirflow: standing('entered', 'airflow')(fanTable.fanTableAirflow({ source: '', blowerTap: '', rows: [] })),
  supplyWetBulbFromHumidity: handbookForCapacity(supplyAir.supplyWetBulbFromHumidity),
  supplyHumidityRatio: handbookForCapacity(supplyAir.supplyHumidityRatio),
  supplyEnthalpy: handbookForCapacity(supplyAir.supplyEnthalpy),
  totalCapacity: fromMemoryForAirflow(capacity.totalCapacity),
  condensateEnthalpy: fromMemoryForAirflow(capacity.condensateEnthalpy),
  totalCapacityLessCondensate: fromMemoryForAirflow(capacity.totalCapacityLessCondensate),
  sensibleCapacity: fromMemoryForAirflow(capacity.sensibleCapacity),
  sensibleHeatRatio: definedForAirflow(capacity.sensibleHeatRatio),
  capacityRatio: definedForAirflow(capacity.capacityRatio),
  lineRateByDensity: standing('computed', 'weigh-in')(lineRateByDensity('lineRate')),
  lineAdjustment: makersRule(charge.lineAdjustment('subtract')),
  lineAdjustmentOfTwoSizes: makersRule(charge.lineAdjustmentOfTwoSizes('subtract')),
  extraLength: makersRule(charge.extraLength),
  lineCharge: makersRule(charge.lineCharge('installed')),
  requiredAdjustment: makersRule(charge.requiredAdjustment(CORRECTIONS)),
  requiredCharge: makersRule(charge.requiredCharge),
  chargeAfterAdjustment: standing('definition', 'weigh-in')(charge.chargeAfterAdjustment),
  chargeDifference: standing('read', 'weigh-in')(charge.chargeDifference),
} as const satisfies Readonly<Record<string, SourceFormula>>;
export type SourceFormulaId = keyof typeof SOURCE_FORMULAS;
