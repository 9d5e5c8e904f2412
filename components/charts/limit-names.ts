/** Short names of limits, as they stand on a plot; the finding itself says the rest. */
const names: Readonly<Record<string, string>> = {
  potentialRange: 'outside the tube’s potentials',
  potentialStep: 'between the tube’s steps',
  power: 'beyond tube power',
  tubeCurrent: 'beyond tube current',
  tubeCurrentFloor: 'below least current',
  exposureTime: 'beyond exposure time',
  exposureTimeFloor: 'below least exposure time',
  heatPerRun: 'beyond anode heat',
  minimumHvl: 'below minimum half-value layer',
  kermaRate: 'beyond kerma rate',
  sourceToSkin: 'skin too near',
  motion: 'too slow for the motion',
  detectorFloor: 'below the detector floor',
  detectorCeiling: 'above the detector ceiling',
  agentAmount: 'more agent than deliverable',
  equalityUnreachable: 'equality out of reach',
  offControlCurve: 'off the control curve',
};

/** The name of a limit by the code of its finding. */
export const limitName = (code: string): string =>
  names[code] ?? code.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
