import type { Plan, PlanView } from '@weighhouse/shared/contracts/plans';
import { capital, counted, listed, numberWord } from '../../../lib/words';

/**
 * What is so with the plan, as a title.
 * @param working the case is being worked on, for the first time or again
 */
export function planTitle({ draft, signed }: PlanView, working: boolean): string {
  const newest = signed[0];
  if (!draft) {
    if (!newest) return 'No plan yet';
    const number = String(newest.number);
    return working ? `Reopened since plan ${number}; no later plan yet` : `Closed with plan ${number}`;
  }
  const name = `Plan ${String(draft.number)}`;
  if (draft.askedAt === null) return `${name} is a draft; nobody has been asked yet`;
  const { answered, asked } = progress(draft);
  if (answered < asked)
    return `${name}: ${answered === 0 ? 'none' : numberWord(answered)} of ${numberWord(asked)} contributors answered`;
  return `${name}: every contributor answered`;
}

export function progress({ stances }: Plan): { asked: number; answered: number } {
  return { asked: stances.length, answered: stances.filter((one) => one.stance !== null).length };
}

/** "Dr A and Dr B have not answered yet.", or nothing when everybody has. */
export function waitingWords({ stances }: Plan): string {
  const names = stances.filter((one) => one.stance === null).map((one) => one.person.name);
  if (names.length === 0) return '';
  return `${listed(names)} ${names.length === 1 ? 'has' : 'have'} not answered yet.`;
}

/** "Two agree, one dissents." */
export function stanceCount({ stances }: Plan): string {
  const count = (stance: 'agree' | 'dissent') => stances.filter((one) => one.stance === stance).length;
  const [agree, dissent] = [count('agree'), count('dissent')];
  if (agree + dissent === 0) return 'Nobody has answered yet.';
  const said = (people: number, one: string, many: string) =>
    people === 0 ? `nobody ${one}` : `${numberWord(people)} ${people === 1 ? one : many}`;
  return `${capital(said(agree, 'agrees', 'agree'))}, ${said(dissent, 'dissents', 'dissent')}.`;
}

/** How late an action is that is not done; null while it is in time. Both are calendar days, YYYY-MM-DD. */
export function lateWords(due: string, today: string): string | null {
  const days = Math.round((Date.parse(today) - Date.parse(due)) / 86_400_000);
  return days > 0 ? `${counted(days, 'day')} late` : null;
}
