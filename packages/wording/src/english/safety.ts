/** Cautions shown where the hazard arises. The maker, the local code and the licence always come first; `standing` is on every page and answer. */
export const safetyWords = {
  standing:
    'The maker’s instructions, the local code and your licence come first. This is arithmetic and a record, not permission.',
  limits:
    '“Within” means inside the stated tolerance, under these conditions, with these instruments. It does not certify capacity, tightness, safety or code.',
  hoses: 'Liquid refrigerant freezes skin and eyes: gloves and closed glasses. Lose as little as you can; never vent.',
  discharge: 'The discharge line burns skin.',
  electricity:
    'Lock out and test dead before touching terminals. Capacitors keep their charge. Fans can start by themselves.',
  climbing: 'Phone in the pocket on the ladder. Attics are hot: keep it short, tell someone. Step on joists only.',
  ice: 'A thawing coil can come through the ceiling: check pan and drain.',
  cylinder:
    'A proper recovery cylinder, one refrigerant only, at most 80 % full, on the scale. Single-use cylinders are never refilled.',
  breathing: 'Vapor is heavier than air and takes the oxygen in pits, closets and attics. No flame near refrigerant.',
  pressureTest: 'Dry nitrogen through a regulator, never oxygen or compressed air.',
  flammable:
    'This refrigerant burns. Ventilate, no ignition source; leak detector, vacuum pump and recovery machine listed for it. Purge with nitrogen before brazing. Leave the leak sensor in service. Never put it into a unit not made for it.',
};
