import { AgendaItemRow } from './agenda/agenda-item.entity.js';
import { JudgementDraftRow } from './judgements/judgement-draft.entity.js';
import { JudgementValue } from './judgements/judgement-value.entity.js';
import { JudgementVersion } from './judgements/judgement-version.entity.js';
import { StandingShare } from './pool/standing-share.entity.js';
import { StandingSnapshot } from './pool/standing-snapshot.entity.js';
import { HandInRow } from './rounds/hand-in.entity.js';
import { RoundAbsence } from './rounds/round-absence.entity.js';
import { RoundRow } from './rounds/round.entity.js';

/** The tables of this domain. */
export const differentialEntities = [
  RoundRow,
  RoundAbsence,
  HandInRow,
  JudgementVersion,
  JudgementValue,
  JudgementDraftRow,
  StandingSnapshot,
  StandingShare,
  AgendaItemRow,
];
