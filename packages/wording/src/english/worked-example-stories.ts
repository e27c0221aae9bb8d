/** The worked examples told: the situation, what is asked, what the key answers, and what stays. Figures by the reader's units. */
import type { WorkedExampleId } from '@chargewright/engine/training';
import { sayIn } from '../message-texts';
import type { UnitSystem } from '../unit-system';

export interface WorkedExampleStory {
  readonly title: string;
  /** For the list. */
  readonly teaches: string;
  readonly story: string;
  readonly questions: readonly string[];
  /** One for each question. */
  readonly answers: readonly string[];
  readonly point: string;
}

export function workedExampleStories(system: UnitSystem): Readonly<Record<WorkedExampleId, WorkedExampleStory>> {
  const { degF, deltaF } = sayIn(system);
  return {
    'handbook-moist-air': {
      title: 'The state of moist air',
      teaches: 'From dry bulb and wet bulb to humidity ratio, dew point and enthalpy',
      story: `A worked example of the Handbook: air of ${degF(100)} dry bulb and ${degF(65)} wet bulb at sea level. The Handbook read its answers off a chart.`,
      questions: [
        'What are humidity ratio, relative humidity and dew point of this air?',
        'What are its enthalpy and its volume?',
        'How closely can a chart be read?',
      ],
      answers: [
        'Dry bulb, wet bulb and air pressure fix the humidity ratio. Relative humidity and dew point follow from it.',
        'Both count per mass of dry air: it stays the same while water comes and goes.',
        'Chart and equations part in the third figure. That is about the width of a line on paper.',
      ],
      point: 'Two readings and the air pressure fix everything else about the air.',
    },
    'healthy-orifice': {
      title: 'A fixed orifice as it should be',
      teaches: 'Superheat, its target, and the split before both',
      story:
        'An older split system with a piston, on a summer day. It has run for 20 minutes; filter and coils are clean, and the gauge was zeroed.',
      questions: [
        'What are the evaporating temperature and the superheat?',
        'What is the target at these conditions, and is the superheat within it?',
        'Does the split point to low airflow?',
        'What is the next step?',
      ],
      answers: [
        'The suction pressure gives the evaporating temperature, in the dew column. Superheat is the suction line less that.',
        `The chart is entered with outdoor air and return wet bulb. The superheat may lie ${deltaF(5)} to either side of the target, and never under ${deltaF(5)} itself.`,
        'No: it lies on its target. That does not prove the airflow, it only does not speak against it.',
        'Record it, put the caps back, label the unit. The subcooling is usual, but a fixed orifice is not judged by it.',
      ],
      point: 'On a fixed orifice the target moves with the weather and the house. No superheat is right by itself.',
    },
    'healthy-valve-metric': {
      title: 'A valve as it should be, in °C and kPa',
      teaches: 'Subcooling against the nameplate, superheat in its window',
      story:
        'A newer split system with an electronic valve, read on metric instruments. The nameplate states the target subcooling.',
      questions: [
        'What are the condensing temperature and the subcooling?',
        'Is the subcooling within its limits?',
        'Why is the superheat looked at as well, and against what?',
      ],
      answers: [
        'The liquid pressure gives the condensing temperature, in the bubble column. Subcooling is that less the liquid line.',
        `Yes: it lies on the nameplate’s target, and ${deltaF(3)} to either side would pass.`,
        `The valve holds the superheat whatever the charge. Between ${deltaF(4)} and ${deltaF(25)} it shows that the valve works, not that the charge is right.`,
      ],
      point: 'A valve is judged by subcooling. The superheat tells whether the valve does its work.',
    },
    'low-airflow-floods': {
      title: 'Near its target, and flooding',
      teaches: 'Low airflow on a fixed orifice, and the floor under superheat',
      story:
        'A split system with a piston. The owner says that it cools poorly. The filter looks clean, and both sides have been read.',
      questions: [
        `How far is the superheat off its target? Would it pass a rule of ± ${deltaF(5)}?`,
        'Why does the check stop all the same?',
        'Which reading shows the cause?',
        'What must not be done?',
      ],
      answers: [
        `About ${deltaF(4.5)} below its target, so inside ± ${deltaF(5)}.`,
        `The superheat itself is under ${deltaF(5)} at the service valve. That is too little to be sure that no liquid reaches the compressor.`,
        `The split, ${deltaF(4.5)} above its target: air that moves slowly is cooled further. Read the wet bulb again first, since a drying wick looks the same. Then filter, coil, blower, duct.`,
        'No refrigerant is added. With the air put right the superheat comes up by itself.',
      ],
      point: 'Airflow before charge. On a fixed orifice low airflow can hide behind a superheat that passes.',
    },
    'valve-hides-low-charge': {
      title: 'A fine superheat, and short of refrigerant',
      teaches: 'A valve hides a low charge from the superheat',
      story:
        'A split system with a TXV. The suction line is cold, the superheat is as it should be, and the owner says that it runs longer than last year.',
      questions: [
        'What are superheat and subcooling?',
        'Which of them judges this charge, and how does it come out?',
        'What is done first?',
      ],
      answers: [
        `Superheat about ${deltaF(10)}, well inside the valve’s window. Subcooling about ${deltaF(4)}, where the nameplate asks for ${deltaF(10)}.`,
        'Subcooling, and it is below its target. The valve opens further and holds the superheat; only the liquid side shows what is missing.',
        'The leak search. Refrigerant does not wear out: what is missing has gone somewhere.',
      ],
      point: 'Superheat on a valve passes almost any charge. Read the liquid side.',
    },
    'undercharge-low-split': {
      title: 'Short of refrigerant, with every sign',
      teaches: 'The pattern of a low charge on a fixed orifice',
      story:
        'An older split system with a piston that no longer keeps the house cool. As far as the owner knows, nobody has added anything.',
      questions: [
        'Which way does each number lie: evaporating temperature, superheat, subcooling, split?',
        'Which cause fits all four?',
        'The split is low. Does that mean too much air?',
        'What is done first?',
      ],
      answers: [
        `Evaporating temperature low, superheat ${deltaF(13)} above its target, subcooling about ${deltaF(3)}, split ${deltaF(6)} below its target.`,
        'A low charge. A restriction would raise the subcooling before it; low airflow would lower the superheat and raise the split.',
        'Not by itself. Less refrigerant takes up less heat, so the air is cooled less.',
        'The leak search. Nothing is added before it.',
      ],
      point: 'One number has many causes. Four that point the same way have few.',
    },
    'restriction-with-ice': {
      title: 'Ice, and not for want of charge',
      teaches: 'A restriction told from a low charge by the liquid line',
      story:
        'Ice on the indoor coil and on the suction line. Suction is low, superheat is very high, and the air is hardly cooled. It looks like a lost charge.',
      questions: [
        'How cold does the coil run, and what follows from that at once?',
        'What would a low charge do to the subcooling, and what is it here?',
        'What is measured once the ice is gone?',
        'What would adding refrigerant do?',
      ],
      answers: [
        `At ${degF(24)} ice grows. Compressor off, blower on, watch the pan. While there is ice, nothing is found on the charge.`,
        `It would lower it. Here it is about ${deltaF(12)}: liquid is there, it only does not get through.`,
        `The temperature drop over the drier and along the line. More than about ${deltaF(3)} is the restriction.`,
        'It would pile up in the condenser and raise the head pressure. The coil would starve as before.',
      ],
      point:
        'Low suction with high superheat is a starved coil. The liquid line tells whether refrigerant is missing or held up.',
    },
    'overcharge-or-air': {
      title: 'Too much refrigerant, or air',
      teaches: 'Two causes with the same readings, and the test between them',
      story:
        'A split system with a TXV that was opened last year. Head pressure and subcooling are high. Too much refrigerant does that, and so does air in the condenser.',
      questions: [
        'What are the subcooling, and the condensing temperature over the outdoor air?',
        'Why is nothing recovered yet?',
        `The system is stopped until both coils stand at ${degF(85)}. What pressure must stand if there is nothing but refrigerant in it?`,
        'Two such systems were stopped. Which of them has air in it?',
      ],
      answers: [
        `Subcooling about ${deltaF(18)}, ${deltaF(8)} above its target; condensing ${deltaF(28)} over the outdoor air.`,
        'Air adds its own pressure, and the gauge turns that into a subcooling that is not there. Recovering would take a right charge away and leave the air.',
        'The bubble pressure at that temperature, and no more.',
        `The second one. It stands for ${deltaF(9)} more than the coils have: more than ${deltaF(3)}, and more than the instruments can be wrong by. Then: recover all of it, evacuate, weigh in. The first one stands as the table prints: no air, so refrigerant is recovered in steps.`,
      ],
      point: 'Before recovering for a high subcooling, let the system stand.',
    },
    'formula-in-a-dash': {
      title: 'A number where the chart has a dash',
      teaches: 'The short formula knows no limits',
      story:
        'A hot and dry afternoon. Somebody remembers the short formula: three times the wet bulb less 80 less the outdoor air, all in °F, and half of that.',
      questions: [
        'What target does the formula give?',
        `What does the chart print at ${degF(100)} outdoors and ${degF(64)} wet bulb?`,
        'What would be done by the formula, and why is that wrong?',
        'What can be done today?',
      ],
      answers: [
        '(3 × 64 − 80 − 100) ÷ 2 = 6 °F.',
        `A dash: the target would be under ${deltaF(5)}, and no valid test exists.`,
        `The superheat is twice that number, so refrigerant would be added until it came down to it: ${deltaF(1)} above the floor, by instruments that are good to ${deltaF(2)}. On a hotter or drier day liquid could reach the compressor.`,
        'Warm the house until the chart has a target, with the heating or open windows, or come back on another day. No refrigerant is moved.',
      ],
      point: 'A formula always has an answer. A dash is an answer too: there is no valid test here.',
    },
    'sea-level-chart': {
      title: 'A mile high, by a chart for sea level',
      teaches: 'Gauge pressure counts from the air around you',
      story:
        'A split system with a piston, a mile above the sea. The gauge was zeroed on the site. The pocket chart was printed for sea level. The target superheat is the maker’s for today.',
      questions: [
        'What is the pressure of the air here?',
        'What evaporating temperature does the sea-level chart give, and what is it really?',
        'How does the superheat come out, either way?',
      ],
      answers: [
        'About a sixth less than at sea level. The same gauge reading is a lower absolute pressure.',
        `The chart gives ${degF(37)}; the coil boils at ${degF(35.1)}.`,
        `By the chart it is ${deltaF(4)} above its target: within, and the visit would end. Really it is ${deltaF(5.9)} above, and the subcooling is low as well: the leak search comes first.`,
      ],
      point: 'Enter the elevation once. A chart for sea level can make a low charge look right.',
    },
    'wrong-column': {
      title: 'R-454B, read in the dew column',
      teaches: 'Bubble for subcooling, dew for superheat',
      story:
        'A new split system with a TXV. The chart has two columns for this blend, and the condensing temperature was written down from the dew column.',
      questions: [
        'Which column belongs to subcooling, which to superheat?',
        'What is the subcooling by the right column, and by the wrong one?',
        'What does the slip hide?',
      ],
      answers: [
        'Subcooling counts from the bubble point, where the liquid would begin to boil. Superheat counts from the dew point, where the last of it has boiled away.',
        `${deltaF(5)} by the bubble column, ${deltaF(7.6)} by the dew column. Between them lies the glide.`,
        `The target is ${deltaF(10)}, with ${deltaF(3)} to either side. The wrong column passes; in truth ${deltaF(5)} are missing.`,
      ],
      point: 'On a blend with glide the wrong column costs almost the whole tolerance.',
    },
    'wide-glide-wrong-column': {
      title: 'R-407C, read in the bubble column',
      teaches: 'With a wide glide the wrong column becomes a wrong repair',
      story:
        'A split system with a piston, converted to R-407C. The evaporating temperature was written down from the bubble column, and the superheat looks huge.',
      questions: [
        'What is the superheat by each column?',
        'What would be done by the wrong one?',
        'What else should have made you doubt it?',
      ],
      answers: [
        `${deltaF(13)} by the dew column, on its target. ${deltaF(24)} by the bubble column, ${deltaF(11)} above.`,
        'A leak would be searched for in a tight system, or refrigerant added to a right charge.',
        `The split lies on its target, the subcooling is usual, and a coil that boils at ${degF(29)} would show ice.`,
      ],
      point: 'When one number says low charge and the others do not, doubt the number.',
    },
    'wrong-scale': {
      title: 'The gauge on another refrigerant',
      teaches: 'A right charge that looks low',
      story:
        'A new R-454B system with a TXV. The gauge set still stood on R-410A from the last job, and its saturation temperatures were written down.',
      questions: [
        'What does that scale make of the subcooling?',
        'What is it by the refrigerant on the nameplate?',
        'What in the record gives the slip away?',
      ],
      answers: [
        `About ${deltaF(5.7)}, where ${deltaF(10)} is wanted: too low. Somebody would search for a leak, or add.`,
        `${deltaF(9)}: within its limits.`,
        `The written saturation temperatures lie more than ${deltaF(3)} from those of the nameplate’s refrigerant. Nameplate and retrofit label come before everything else.`,
      ],
      point: 'Set the refrigerant first. Every number after it hangs on it.',
    },
    'too-close-to-call': {
      title: 'Too close to call',
      teaches: 'What the instruments can tell, and what settles it',
      story: 'A split system with a TXV. The subcooling passes by the rule, by a hair.',
      questions: [
        'How far is it off its target, and how much is allowed?',
        'How sure is that, with the usual instruments?',
        'What would settle it?',
      ],
      answers: [
        `Between ${deltaF(2.5)} and ${deltaF(2.8)} below, by the printed table or by the curve; ${deltaF(3)} is allowed.`,
        'Not sure: the uncertainty is wider than the way to the limit. Inside against outside stands at about three to two.',
        `A second careful reading: the clamp set again on clean metal, wrapped and shaded. ${deltaF(1.5)} cooler, and it would be clear. A better instrument settles it too.`,
      ],
      point: 'A number beside its limit is not a finding. Say so, and read again.',
    },
    'dry-house': {
      title: 'A dry house with a large split',
      teaches: 'The split has no fixed right value',
      story: `A dry house. The air drops by ${deltaF(24)} across the coil, and somebody says that the airflow must be low.`,
      questions: [
        'What does the table want at these conditions?',
        'Is the airflow low?',
        'What if the wick had dried out a little?',
      ],
      answers: [
        `${deltaF(24.6)}. Dry air gives up no water, so all of the cooling goes into its temperature.`,
        `The split does not say so: it is ${deltaF(0.6)} below its target. So the charge is judged, and it is within.`,
        `A wet bulb ${deltaF(7)} too high asks for ${deltaF(20.6)}. The same split then lies above its band and looks like low airflow. So the wet bulb is read again first.`,
      ],
      point: `A fixed ${deltaF(20)} misjudges dry houses and humid ones. Look the target up.`,
    },
    'printed-sum': {
      title: 'A printed sum that is wrong',
      teaches: 'Weigh-in: work the sum yourself',
      story:
        'A maker’s manual works an example of two line sets: so many feet beyond the included length, at so many ounces a foot. Its sums are wrong.',
      questions: [
        'What do 45 ft at 0.40 oz/ft take? The manual prints 9 oz, and 4.5 oz in another place.',
        'What do 25 ft at 0.60 oz/ft take? The manual prints 13.5 oz.',
        'What if the printed sums were weighed in?',
      ],
      answers: [
        '45 × 0.40 = 18 oz.',
        '25 × 0.60 = 15 oz.',
        'The first system would be 9 oz or 13.5 oz short, the second 1.5 oz. The scale shows each of them.',
      ],
      point: 'Show the sum you did. Print has errors as well.',
    },
  };
}
