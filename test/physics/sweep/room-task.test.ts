import { describe, expect, it } from 'vitest';
import { rulesOfThumb } from '../../../physics/rules-of-thumb.js';
import { percentileResult, thicknessNodes } from '../../../physics/sizes.js';
import { solve } from '../../../physics/solve.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import { type RoomTask, runRoomTask, thicknessOf } from '../../../physics/sweep/room-task.js';
import { sweepPiece, wholeRoom } from '../../../physics/sweep.js';
import { sampleCase } from '../sample-case.js';

const c = sampleCase({
  room: { tube: { potential_kV: { min: 60, max: 100, step: 20 } } },
  patient: {
    sizes: [
      { name: 'small', thickness_mm: 150 },
      { name: 'large', thickness_mm: 250 },
    ],
  },
}).case;
const [small, large] = sizesOf(c.patient);
const request = wholeRoom(c);
const question = {
  what: 'bestSetting',
  size: large,
  cost: 'incidentAirKerma',
  holdConstant: 'sdnr',
} as const;
const tasks: readonly RoomTask[] = [
  { kind: 'sweepPiece', request, index: 5 },
  { kind: 'percentile', percentile: 50 },
  { kind: 'thickness', size: small },
  { kind: 'rules', size: large },
  { kind: 'solve', question },
];

describe('a task of the room', () => {
  it('is answered like the function it stands for, after the post as before', () => {
    const posted = structuredClone(tasks);
    const answers = posted.map((task) => structuredClone(runRoomTask(c, task)));
    expect(answers[0]).toEqual(sweepPiece(c, request, 5));
    expect(answers[1]).toEqual(percentileResult(c, 50));
    expect(answers[2]).toMatchObject({ thickness_mm: 150 });
    expect(answers[3]).toEqual(rulesOfThumb(c, large));
    expect(answers[4]).toEqual(solve(c, question));
  });

  it('names the thickness whose scatter it needs', () => {
    expect(tasks.map(thicknessOf)).toEqual([250, null, 150, 250, 250]);
  });
});

describe('thicknesses of a chart over the mix', () => {
  it('are the sizes, where nothing follows a control curve', () => {
    expect(thicknessNodes(c)).toEqual([small, large]);
  });

  it('stand on both sides of every change of filter', () => {
    const row = { potential_kV: 80, tubeCurrent_mA: 200, exposureTime_ms: 50 };
    const rows = [
      { ...row, thickness_mm: 100, filter: '0.3 Cu' },
      { ...row, thickness_mm: 180, filter: '0.3 Cu' },
      { ...row, thickness_mm: 220, filter: 'none' },
    ];
    const [current] = c.techniques;
    const curved = { ...c, techniques: [{ ...current, control: { curve: 'a.csv', rows } }] };
    const nodes = thicknessNodes(curved).map(({ thickness_mm }) => thickness_mm);
    expect(nodes).toEqual([150, 180, 219.99, 220, 250]);
  });
});
