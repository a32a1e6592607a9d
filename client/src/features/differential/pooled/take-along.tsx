import { Button } from '@radix-ui/themes';
import { useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { useCase } from '../../cases/api/get-case';
import { useDownloadExport } from '../api/download-export';
import { useLedger } from '../ledger/ledger-context';
import { usePanelInForce } from '../why-sum/use-panel-in-force';
import { PooledSheet } from './pooled-sheet';

/** The panel on one page of paper, and as the file that the method takes: for checking outside. */
export function TakeAlong() {
  const { differential, may, reading } = useLedger();
  const { panel } = usePanelInForce();
  const case_ = useCase(differential.caseId).data;
  const download = useDownloadExport(differential.caseId, case_?.number ?? 'case');
  const [printing, setPrinting] = useState(false);
  const { sealed, shownRound, assessment } = differential;
  if (!assessment) return null;
  return (
    <section className="no-print" aria-label="Take it along">
      <div className="actions">
        {panel && (
          <Button
            variant="outline"
            disabled={printing}
            onClick={() => {
              setPrinting(true);
            }}
          >
            Print this page
          </Button>
        )}
        {may('export.read') && may('panel.read') && (
          <Button
            variant="outline"
            loading={download.isPending}
            onClick={() => {
              download.mutate('panel');
            }}
          >
            Panel as JSON
          </Button>
        )}
      </div>
      {sealed && shownRound && (
        <p className="small soft">
          Both hold what round {shownRound.number} left, as it was unsealed: nothing of the sealed round.
        </p>
      )}
      {!reading.panelsOwn && (
        <p className="small soft">
          The page holds your reading, and says so; the JSON holds the panel’s own numbers.
        </p>
      )}
      <FailureLine error={download.error} />
      {printing && panel && (
        <PooledSheet
          panel={panel}
          assessment={assessment}
          onPrinted={() => {
            setPrinting(false);
          }}
        />
      )}
    </section>
  );
}
