import type { Fault } from '../fault.js';
import type { Case } from '../schema.js';
import { agentFaults } from './agent-rules.js';
import { beamPathFaults } from './beam-rules.js';
import { materialFaults } from './material-rules.js';
import { patientFaults, patientMaterialFaults } from './patient-rules.js';
import { roomFaults, roomMaterialFaults } from './room-rules.js';
import { detailFaults, taskMaterialFaults } from './task-rules.js';
import { measuredCheckFaults, techniqueFaults } from './technique-rules.js';

/**
 * What one part of a case asks of another. Each rule names the parts it looks at, so that it can
 * speak up even while another part of the file is broken.
 */
export const crossRules: readonly {
  readonly needs: readonly (keyof Case)[];
  readonly faults: (c: Case) => readonly Fault[];
}[] = [
  { needs: ['materials'], faults: materialFaults },
  { needs: ['room'], faults: roomFaults },
  { needs: ['room', 'materials'], faults: roomMaterialFaults },
  { needs: ['patient'], faults: patientFaults },
  { needs: ['patient', 'materials'], faults: patientMaterialFaults },
  { needs: ['task', 'materials'], faults: taskMaterialFaults },
  { needs: ['task', 'patient'], faults: detailFaults },
  { needs: ['techniques', 'room'], faults: techniqueFaults },
  { needs: ['room', 'materials', 'techniques'], faults: beamPathFaults },
  { needs: ['measuredChecks', 'techniques', 'patient'], faults: measuredCheckFaults },
  {
    needs: ['agentsCompared', 'materials'],
    faults: (c) =>
      c.agentsCompared.flatMap((compared, index) =>
        agentFaults(['agentsCompared', index], compared, c),
      ),
  },
];
