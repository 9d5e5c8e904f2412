/** What must be read before anything Stratabeam says is used: on the desk, in help and in print. */
export const cautions: readonly string[] = [
  'A planning and documentation aid for qualified medical physicists.',
  'Modelled values need confirmation by measurement before clinical use.',
  'Local regulations and licensed practice decide. No patient identifiers.',
  'Not for decisions on an individual’s treatment.',
];
