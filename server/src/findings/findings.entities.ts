import { CandidatePair } from './candidate-pair.entity.js';
import { CandidateRow } from './candidate.entity.js';
import { FindingGroup } from './finding-group.entity.js';
import { FindingLevel } from './finding-level.entity.js';
import { FindingRow } from './finding.entity.js';
import { SettingsChange } from './settings-change.entity.js';

/** The tables of this domain. */
export const findingsEntities = [
  CandidateRow,
  CandidatePair,
  FindingRow,
  FindingLevel,
  FindingGroup,
  SettingsChange,
];
