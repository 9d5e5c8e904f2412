/** What must be read before anything Stratabeam says is used; stands under every help text. */
export const cautions = [
  'Stratabeam is a planning and documentation aid for qualified medical physicists.',
  'Its values are modelled: confirm them by measurement before clinical use.',
  'Local regulations and licensed practice decide. Enter no patient identifiers.',
  "It is not for decisions on an individual's treatment.",
].join('\n');
