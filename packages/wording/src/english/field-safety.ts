/** Cautions of the airflow and the weigh-in page, where the hazard arises. The maker, the local code and the licence come first. */
export const fieldSafetyWords = {
  electric:
    'Volts and amps are read beside live parts: only if you are qualified for it. Clamp on one conductor. Before you touch anything: lock out, test dead. Panels back on before the air is read.',
  gas: 'Carbon monoxide alarm on you, flue open and drawing. Plenum, flue and heat exchanger are hot. Other gas appliances off while you clock the meter; light their pilots again afterwards. Smell of gas: out, and call the supplier.',
  blower: 'The blower can start by itself: keep hands, sleeves and probes clear of the wheel.',
  drilling: 'Drill only where no coil, pipe, wire or heat exchanger lies behind. Close the holes again.',
  scale: 'Scale level, out of the wind, hoses not pulling on it. Weigh before and after.',
  blend: 'This is a blend: charge it as liquid, throttled into the suction side, never as vapor.',
  throttle: 'Into the suction side only throttled: liquid that reaches the compressor destroys it.',
  recover:
    'What comes out is recovered, never vented: a proper cylinder, one refrigerant only, at most 80 % full, on the scale. Single-use cylinders are never refilled.',
  nitrogen: 'Pressure test with dry nitrogen through a regulator, never oxygen or air. Nitrogen flows while you braze.',
  skin: 'Liquid refrigerant freezes skin and eyes: gloves and closed glasses.',
};
