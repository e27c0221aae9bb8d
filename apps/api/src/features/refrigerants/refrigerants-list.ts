import type { RefrigerantsAnswer } from '@chargewright/contract/refrigerant';
import {
  REFRIGERANT_IDS,
  bubbleTemperatureK,
  dewPressurePa,
  refrigerantFacts,
  refrigerantModel,
  temperatureToK,
} from '@chargewright/engine';
import type { RefrigerantId } from '@chargewright/engine';
import { presentValue } from '@chargewright/wording';

/** A usual evaporating temperature, which lies on the curves of every refrigerant; at 1 atm some have no liquid. */
const GLIDE_AT_DEW_TEMPERATURE_K = temperatureToK(5, 'degC');

/** Every refrigerant with curves, in SI units. */
export const refrigerantsList = (): RefrigerantsAnswer => ({ refrigerants: REFRIGERANT_IDS.map(refrigerant) });

function refrigerant(id: RefrigerantId): RefrigerantsAnswer['refrigerants'][number] {
  const { safetyClass, grade, criticalTemperatureK, criticalPressurePa } = refrigerantFacts(id);
  return {
    id,
    safetyClass,
    criticalPoint: {
      temperature: presentValue('temperatureK', criticalTemperatureK, 'C-kPa'),
      pressure: presentValue('pressurePa', criticalPressurePa, 'C-kPa'),
    },
    glide: {
      value: glideK(id),
      unit: 'deltaC',
      atDewTemperature: presentValue('temperatureK', GLIDE_AT_DEW_TEMPERATURE_K, 'C-kPa'),
    },
    composition: refrigerantModel(id).composition.map(({ id: component, massFraction }) => ({
      id: component,
      massFraction,
    })),
    modelGrade: grade,
  };
}

function glideK(id: RefrigerantId): number {
  if (refrigerantFacts(id).kind === 'pure') return 0;
  const pressurePa = dewPressurePa({ refrigerant: id, temperatureK: GLIDE_AT_DEW_TEMPERATURE_K });
  return GLIDE_AT_DEW_TEMPERATURE_K - bubbleTemperatureK({ refrigerant: id, pressurePa });
}
