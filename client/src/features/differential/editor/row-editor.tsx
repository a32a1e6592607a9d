import { Button, TextArea } from '@radix-ui/themes';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { useId } from 'react';
import { SaveState } from '../../../components/save-state';
import { useLedger } from '../ledger/ledger-context';
import { askedWords, isPresence, levelName } from '../model/finding-words';
import { textsOf } from '../typing/draft';
import { ChangedMeanwhile } from './changed-meanwhile';
import { ExposureChoice } from './exposure-choice';
import { LevelLines } from './level-lines';
import { LikelihoodLine } from './likelihood-line';
import { othersMarks } from './others-marks';
import { OvertakenNote } from './overtaken-note';
import { useRowSaving } from './use-row-saving';

/** Where a contributor judges one finding: exposure, one number for each candidate, a reason. */
export function RowEditor({ finding }: { finding: Finding }) {
  const { columns, differential } = useLedger();
  const row = useRowSaving(finding);
  const reasonId = useId();
  const faultAt = (columnId: string | null) =>
    row.faults.find((fault) => fault.columnId === columnId)?.message ?? null;
  const blank = row.saved.cells.size === 0;
  return (
    <form
      className="row-editor"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void row.save();
      }}
    >
      <ExposureChoice
        value={row.draft.exposure}
        fault={faultAt(null)}
        onChange={(exposure) => {
          row.typeMore({ exposure });
        }}
      />
      <h3 className="row-question">If it were each of these alone, how many of 100 {askedWords(finding)}?</h3>
      <p className="small soft">
        {finding.observed === 0 && row.levels === 2
          ? isPresence(finding)
            ? 'It is absent here; still say how many would show it. '
            : `Here it is “${levelName(finding, 0)}”; still say how many ${askedWords(finding)}. `
          : ''}
        Blank is no opinion.
      </p>
      <div className="likelihoods">
        {columns.map((column) =>
          row.levels > 2 ? (
            <LevelLines
              key={column.id}
              finding={finding}
              column={column}
              texts={textsOf(row.draft, column.id, row.levels)}
              fault={faultAt(column.id)}
              onChange={(level, text) => {
                row.typeText(column.id, level, text);
              }}
            />
          ) : (
            <LikelihoodLine
              key={column.id}
              column={column}
              asked={askedWords(finding)}
              text={textsOf(row.draft, column.id, 1)[0] ?? ''}
              others={othersMarks(differential, finding.id, column.index)}
              fault={faultAt(column.id)}
              onChange={(text) => {
                row.typeText(column.id, 0, text);
              }}
            />
          ),
        )}
      </div>
      <label className="reason-label" htmlFor={reasonId}>
        Reason <span className="soft">(may be left out)</span>
      </label>
      <TextArea
        id={reasonId}
        rows={2}
        maxLength={4000}
        value={row.draft.reason}
        onChange={(event) => {
          row.typeMore({ reason: event.target.value });
        }}
      />
      {row.overtaken && <OvertakenNote row={row} />}
      {!row.overtaken && <ChangedMeanwhile error={row.error} draft={row.changed ? row.draft : null} />}
      {row.faults.length > 0 && (
        <p className="field-fault" role="alert">
          Not saved: see the {row.faults.length === 1 ? 'field' : 'fields'} named above.
        </p>
      )}
      <div className="actions editor-actions">
        <Button type="submit" loading={row.busy}>
          Save judgement
        </Button>
        {!blank && (
          <Button type="button" variant="outline" disabled={row.busy} onClick={() => void row.clear()}>
            Clear mine
          </Button>
        )}
        {row.cleared && (
          <Button type="button" variant="outline" disabled={row.busy} onClick={() => void row.takeBack()}>
            Take clearing back
          </Button>
        )}
      </div>
      <EditorState row={row} />
    </form>
  );
}

/** How far the typing has come: kept as a draft is not yet saved as a judgement. */
function EditorState({ row }: { row: ReturnType<typeof useRowSaving> }) {
  if (row.cleared && !row.changed)
    return (
      <p className="small soft" role="status">
        Your judgement of this row is cleared.
      </p>
    );
  if (!row.changed)
    return (
      <p className="small soft" role="status">
        {row.saved.cells.size === 0 ? 'You have not judged this row.' : 'What stands here is saved.'}
      </p>
    );
  return (
    <p className="small soft editor-state">
      <span>Typed and not saved as a judgement. Draft: </span>
      <SaveState saving={row.saving} />{' '}
      <button type="button" className="text-button" onClick={row.backToSaved}>
        Back to what is saved
      </button>
    </p>
  );
}
