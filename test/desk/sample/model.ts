import type { DeskModel } from '../../../components/desk/model/desk-model.js';
import type { Json } from '../../../components/store/path.js';
import { sampleAlong } from './along.js';
import { sampleCase, sampleDocument } from './case.js';
import { sampleWeighing } from './weighing.js';

/** A desk at rest on the invented case with the invented results. */
export const sampleModel: DeskModel = {
  draft: {
    document: sampleDocument as unknown as Json,
    files: {},
    case: sampleCase,
    assumed: sampleWeighing.assumed,
    faults: [],
  },
  weighing: sampleWeighing,
  along: sampleAlong,
  others: [],
  stale: false,
  sizeName: 'median',
  left: 0,
  right: 1,
};
