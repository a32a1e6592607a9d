import { Button } from '@radix-ui/themes';
import { useRef } from 'react';
import { Caution } from '../../../components/caution';
import { MarksKey } from '../../../components/marks/marks-key';
import { LedgerCards } from '../cards/ledger-cards';
import { DoubleCounting } from '../double-counting/double-counting';
import { SidePanel } from '../panels/side-panel';
import { PriorFirst } from '../prior-first/prior-first';
import { AssumptionSwitch } from '../reading/assumption-switch';
import { ReadingBand } from '../reading/reading-band';
import { RoundBar } from '../rounds/round-bar';
import { useSeenDigests } from '../seals/use-seen-digests';
import { usePointing } from '../without/use-pointing';
import { WithoutStatus } from '../without/without-status';
import '../without/without.css';
import { EmptyLedger } from './empty-ledger';
import { useLedger } from './ledger-context';
import { LedgerTable } from './ledger-table';
import { PriorAgain } from './prior-again';
import { StandingAnnouncements } from './standing-announcements';
import { useCompact } from './use-compact';
import { usePhone } from './use-media';

/** The whole section: the round, the ledger, and what stands at its side. */
export function LedgerScreen() {
  const { differential, saved, canJudge, columns, rows, open, may } = useLedger();
  const phone = usePhone();
  const [compact, setCompact] = useCompact();
  const main = useRef<HTMLDivElement>(null);
  const pointing = usePointing();
  useSeenDigests(differential.round);

  // The prior comes before the rows, so that the findings are not counted twice.
  if (canJudge && saved.mine?.prior === null) return <PriorFirst />;
  const empty = columns.length === 1 && rows.length === 0;
  return (
    <section className="ledger-section" aria-label="Differential" {...pointing}>
      <RoundBar>
        {!empty && (saved.assessment ?? saved.mine) && (
          <Button
            variant="ghost"
            onClick={() => {
              open({ kind: 'trial', findingId: null });
            }}
          >
            What if
          </Button>
        )}
        {!empty && (
          <Button
            variant="ghost"
            onClick={() => {
              open({ kind: 'discuss' });
            }}
          >
            Discuss first
          </Button>
        )}
        {!phone && !empty && (
          <Button
            variant="ghost"
            onClick={() => {
              open({ kind: 'columns' });
            }}
          >
            Columns
          </Button>
        )}
        {!phone && !empty && (
          <Button
            variant="ghost"
            aria-pressed={compact}
            onClick={() => {
              setCompact(!compact);
            }}
          >
            {compact ? 'Wider rows' : 'Narrower rows'}
          </Button>
        )}
      </RoundBar>
      <ReadingBand />
      <PriorAgain />
      <div className="ledger-work">
        <div ref={main} className="ledger-main">
          {empty ? (
            <EmptyLedger />
          ) : phone ? (
            <>
              <div className="cards-assumption">
                <AssumptionSwitch />
              </div>
              <LedgerCards />
            </>
          ) : (
            <LedgerTable compact={compact} />
          )}
          <div className="ledger-foot">
            {!empty && (
              <MarksKey
                own={differential.mine !== null}
                sealed={differential.assessment === null && differential.sealed}
                before={differential.before !== null && differential.assessment !== null}
              />
            )}
            <DoubleCounting />
            <div className="actions no-print ledger-add">
              {may('finding.add') && (
                <Button
                  variant="outline"
                  onClick={() => {
                    open({ kind: 'finding', findingId: null });
                  }}
                >
                  Add a finding
                </Button>
              )}
              <Button
                variant="outline"
                onClick={() => {
                  open({ kind: 'candidates' });
                }}
              >
                {may('candidate.add') ? 'Add or retire candidates' : 'Candidates'}
              </Button>
              {may('settings.change') && (
                <Button
                  variant="outline"
                  onClick={() => {
                    open({ kind: 'groups' });
                  }}
                >
                  Findings that overlap
                </Button>
              )}
            </div>
            <Caution />
          </div>
        </div>
        <SidePanel
          onClosed={() => {
            // Back to the cell that the person came from.
            main.current?.querySelector<HTMLElement>('.ledger [tabindex="0"], .card button')?.focus();
          }}
        />
      </div>
      <StandingAnnouncements />
      <WithoutStatus />
    </section>
  );
}
