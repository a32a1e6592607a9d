import { useSearchParams } from 'react-router-dom';
import { Failure } from '../../../components/failure';
import { SkeletonRows } from '../../../components/skeleton';
import { useCaseId } from '../../cases/api/get-case';
import { useDifferential } from '../api/get-differential';
import { ColumnChoiceProvider } from '../columns/column-choice-context';
import { DraftsProvider } from '../drafts/drafts-context';
import { LedgerProvider, type Panel } from '../ledger/ledger-context';
import { LedgerScreen } from '../ledger/ledger-screen';
import { WithoutProvider } from '../without/without-context';
import '../ledger/ledger.css';
import '../ledger/standing.css';
import '../coexistence/coexistence.css';
import '../trial/trial.css';
import '../ledger/narrow-rows.css';
import '../columns/columns.css';
import '../ledger/side.css';
import '../editor/editor.css';
import '../cards/cards.css';
import '../prior-first/prior-first.css';
import '../ledger/print.css';

/** The differential: the ledger of a case. */
export default function DifferentialRoute() {
  const caseId = useCaseId();
  const found = useDifferential(caseId);
  const [params] = useSearchParams();
  if (found.data)
    return (
      <DraftsProvider key={caseId} differential={found.data}>
        <LedgerProvider differential={found.data} first={firstPanel(params)}>
          <ColumnChoiceProvider caseId={caseId}>
            <WithoutProvider>
              <LedgerScreen />
            </WithoutProvider>
          </ColumnChoiceProvider>
        </LedgerProvider>
      </DraftsProvider>
    );
  return (
    <div className="page">
      {found.isPending ? (
        <SkeletonRows rows={8} />
      ) : (
        <Failure
          error={found.error}
          what="The differential could not be opened."
          retry={() => void found.refetch()}
        />
      )}
    </div>
  );
}

/** A link can lead to a finding, or to adding one from a page of a report. */
function firstPanel(params: URLSearchParams): Panel | null {
  const findingId = params.get('finding');
  if (findingId === 'new') return { kind: 'finding', findingId: null };
  return findingId === null ? null : { kind: 'row', findingId, at: null };
}
