import type { Finding } from '@weighhouse/shared/contracts/findings';
import { useId, useState } from 'react';
import { SelectBox } from '../../../components/select-box';
import { ExposureChoice } from '../editor/exposure-choice';
import { LevelLines } from '../editor/level-lines';
import { LikelihoodLine } from '../editor/likelihood-line';
import { othersMarks } from '../editor/others-marks';
import { useLedger } from '../ledger/ledger-context';
import type { Column } from '../model/columns';
import { askedWords, isTwoLevel, levelCount, levelName } from '../model/finding-words';
import { numberText, parseOutOf100 } from '../typing/parse-number';
import { readShares } from '../typing/sum';
import { type TrialCell, withCell, withExposure, withObserved } from './trial';
import { triedText } from './tried-text';

/** Tries one finding in another state, and other numbers of one's own on it. */
export function TrialRowForm({ finding }: { finding: Finding }) {
  const { reading, saved, columns } = useLedger();
  const id = useId();
  const { trial } = reading;
  const tried = trial.observed[finding.id];
  const observed = tried === undefined ? finding.observed : tried;
  const row = trial.rows[finding.id];
  const known = saved.mine?.findings.find((one) => one.findingId === finding.id);
  const exposure = row?.exposure ?? known?.exposure ?? null;
  return (
    <div className="row-editor">
      <div className="tried-line" data-tried={tried !== undefined || undefined}>
        <label htmlFor={id}>If it were</label>
        <SelectBox
          id={id}
          value={observed === null ? 'pending' : String(observed)}
          onChange={(event) => {
            const { value } = event.target;
            const next = value === 'pending' ? null : Number(value);
            reading.tryOut(withObserved(trial, finding.id, next === finding.observed ? undefined : next));
          }}
        >
          {finding.levelLabels.map((_, level) => (
            <option key={level} value={level}>
              {levelName(finding, level)}
            </option>
          ))}
          <option value="pending">not known</option>
        </SelectBox>
      </div>
      {saved.mine && (
        <>
          <ExposureChoice
            value={exposure}
            fault={
              row && exposure === null
                ? 'say how often you see this picture: until then it does not count'
                : null
            }
            onChange={(next) => {
              reading.tryOut(withExposure(trial, finding.id, next === known?.exposure ? null : next));
            }}
          />
          <h3 className="row-question">
            And if you had said: of 100 with each of these alone, how many {askedWords(finding)}?
          </h3>
          <div className="likelihoods">
            {columns.map((column) => (
              <TriedCell
                key={column.id}
                finding={finding}
                column={column}
                saved={known?.outOf100[column.index] ?? null}
                tried={row?.cells[column.id]}
              />
            ))}
          </div>
        </>
      )}
    </div>
  );
}

interface CellProps {
  finding: Finding;
  column: Column;
  saved: TrialCell;
  /** Undefined while nothing is tried. */
  tried: TrialCell | undefined;
}

function TriedCell({ finding, column, saved, tried }: CellProps) {
  const { reading, differential } = useLedger();
  const [typed, setTyped] = useState<string[]>([]);
  const current = tried === undefined ? saved : tried;
  const tryOut = (value: TrialCell) => {
    const same = JSON.stringify(value) === JSON.stringify(saved);
    reading.tryOut(withCell(reading.trial, finding.id, column.id, same ? undefined : value));
  };
  const levels = levelCount(finding);
  if (isTwoLevel(finding)) {
    const text = triedText(typed[0], typeof current === 'number' ? current : null);
    const read = parseOutOf100(text);
    return (
      <div data-tried={tried !== undefined || undefined} className="tried-cell">
        <LikelihoodLine
          column={column}
          asked={askedWords(finding)}
          text={text}
          others={othersMarks(differential, finding.id, column.index)}
          fault={read.kind === 'fault' ? read.message : null}
          onChange={(next) => {
            setTyped([next]);
            const now = parseOutOf100(next);
            if (now.kind !== 'fault') tryOut(now.kind === 'blank' ? null : now.value);
          }}
        />
      </div>
    );
  }
  const shares = typeof current === 'number' || current === null ? [] : current;
  // What sums to 100, or is all blank, is in the trial, and is shown as it stands there.
  const unfinished = typed.some((text) => text.trim() !== '') && !readShares(typed).complete;
  const shown = Array.from({ length: levels }, (_, level) => {
    const share = shares[level];
    if (unfinished) return typed[level] ?? '';
    return share === undefined ? '' : numberText(share);
  });
  return (
    <div data-tried={tried !== undefined || undefined} className="tried-cell">
      <LevelLines
        finding={finding}
        column={column}
        texts={shown}
        fault={null}
        onChange={(level, text) => {
          const texts = shown.map((one, at) => (at === level ? text : one));
          setTyped(texts);
          const now = readShares(texts);
          if (now.complete) tryOut(now.values.map((value) => value ?? 0));
          else if (texts.every((one) => one.trim() === '')) tryOut(null);
        }}
      />
    </div>
  );
}
