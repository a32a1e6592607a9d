import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { useLayoutEffect, useRef } from 'react';
import { createPortal } from 'react-dom';
import { Caution } from '../../../components/caution';
import { listed } from '../../../lib/words';
import { useFormat } from '../../../lib/use-format';
import { useCase } from '../../cases/api/get-case';
import { useLedger } from '../ledger/ledger-context';
import { useInFull } from '../why-sum/use-in-full';
import { methodSentences, pairWords } from './method-words';
import { SheetGroups, SheetPeople, usePeople } from './sheet-people';
import { SheetTable } from './sheet-table';
import { TwoPoolsTable } from './two-pools-table';
import { partingWords } from './two-pools';
import { useFitted } from './use-fitted';
import './pooled-sheet.css';

interface Props {
  panel: PanelView;
  assessment: AssessmentView;
  onPrinted: () => void;
}

/**
 * How it was pooled on one A4 page: everything that the method was given. On paper alone; it stands beside the page, so
 * that printing it prints nothing else.
 */
export function PooledSheet({ panel, assessment, onPrinted }: Props) {
  const { differential, columns, reading } = useLedger();
  const case_ = useCase(differential.caseId).data;
  const format = useFormat();
  const people = usePeople(panel);
  const inFull = useInFull(panel);
  const ready = panel.tempering === 1 || inFull !== null;
  const sheet = useRef<HTMLElement>(null);
  useFitted(sheet, ready);
  const printed = useRef(onPrinted);
  useLayoutEffect(() => {
    printed.current = onPrinted;
  });
  useLayoutEffect(() => {
    if (!ready) return;
    const done = () => {
      printed.current();
    };
    window.addEventListener('afterprint', done);
    const timer = setTimeout(() => {
      window.print();
    });
    return () => {
      clearTimeout(timer);
      window.removeEventListener('afterprint', done);
    };
  }, [ready]);
  const root = document.querySelector('.radix-themes[data-is-root-theme="true"]');
  if (!root) return null;
  const { shownRound, settings, candidateSet } = differential;
  return createPortal(
    <section ref={sheet} className="pooled-sheet" aria-hidden="true">
      <header>
        <h1>How it was pooled{case_ ? `: ${case_.number}` : ''}</h1>
        <p>
          {case_?.question} {!reading.panelsOwn && <b>One person’s reading, not the panel’s own. </b>}
          {shownRound &&
            `Round ${String(shownRound.number)}, ${shownRound.live ? 'live' : 'as it was unsealed'}. `}
          {shownRound && shownRound.notIn.length > 0 && `Not in: ${listed(shownRound.notIn)}. `}
          Candidate set {candidateSet}. Method {assessment.method}
          {assessment.exact ? '' : ', sets beyond a size left out'}. Printed {format.date(format.today())}.
        </p>
      </header>
      <div className="sheet-top">
        <div>
          <SheetPeople people={people} />
          <p>
            On a row a judgement counts weight times exposure: seldom a quarter, sometimes half, often in
            full. A blank has no weight.
          </p>
        </div>
        <div>
          {methodSentences(panel, pairWords(settings.together, columns)).map((sentence) => (
            <p key={sentence}>{sentence}</p>
          ))}
          <SheetGroups panel={panel} />
        </div>
        <div>
          <TwoPoolsTable assessment={assessment} inFull={inFull} />
        </div>
      </div>
      <p>{partingWords(assessment, columns)}</p>
      <SheetTable panel={panel} assessment={assessment} people={people} />
      <Caution />
    </section>,
    root,
  );
}
