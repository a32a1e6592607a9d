import { useLedger } from '../ledger/ledger-context';

/** Leads from the standing to the combinations behind it, where candidates may coexist. */
export function CombinationsButton() {
  const { differential, open } = useLedger();
  if (!differential.assessment || differential.settings.coexistence === 0) return null;
  return (
    <button
      type="button"
      className="text-button no-print"
      onClick={() => {
        open({ kind: 'sets' });
      }}
    >
      Which combinations
    </button>
  );
}
