import type { Summary } from '@weighhouse/shared/contracts/summaries';
import type { OpenedCase } from '../cases/case-access.js';
import type { ContactRow } from './contact.entity.js';
import type { CurrentSummary } from './summary-reader.js';

/** Everything that a summary's page is put together from. */
export interface SummaryParts extends CurrentSummary {
  opened: OpenedCase;
  actorId: string;
  contacts: readonly ContactRow[];
  nameOf: (personId: string) => string;
}

export function summaryView({ opened, actorId, plan, row, body, contacts, nameOf }: SummaryParts): Summary {
  const actions = plan?.actions ?? [];
  return {
    caseId: opened.file.id,
    number: opened.file.number,
    state: plan ? (row?.state ?? 'draft') : 'none',
    version: row?.version ?? 0,
    body,
    planNumber: plan?.number ?? null,
    safetyNet: plan?.safetyNet ?? null,
    actions: actions
      .filter((action) => action.concernsPatient || action.owner?.id === actorId)
      .map((action) => ({
        id: action.id,
        what: action.what,
        due: action.due,
        mine: action.owner?.id === actorId,
        doneAt: action.doneAt,
      })),
    returnedWords: row?.returnedWords ?? null,
    approvedBy: row?.approvedById == null ? null : nameOf(row.approvedById),
    approvedAt: row?.approvedAt?.toISOString() ?? null,
    toldAt: row?.toldAt?.toISOString() ?? null,
    contacts: contacts.map((contact) => ({
      id: contact.id,
      at: contact.at.toISOString(),
      how: contact.how,
      reached: contact.reached,
      understood: contact.understood,
      questions: contact.questions,
      notes: contact.notes,
      told: contact.toldPlanNumber !== null,
      by: nameOf(contact.byId),
    })),
    abilities: abilitiesNow(opened, row),
  };
}

/** What can be done with the text in its state. */
function abilitiesNow({ abilities }: OpenedCase, row: CurrentSummary['row']): string[] {
  const saved = row?.state === 'draft' || row?.state === 'waiting';
  const not = new Set<string>([
    ...(saved ? [] : ['summary.approve']),
    ...(row?.state === 'told' ? ['summary.write'] : []),
  ]);
  return abilities.filter((action) => action.startsWith('summary.') && !not.has(action));
}
