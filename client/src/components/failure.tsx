import { Button } from '@radix-ui/themes';
import { errorWords } from '../lib/error-words';

interface Props {
  error: unknown;
  /** What did not work, as in "The reports could not be loaded". */
  what?: string;
  retry?: () => void;
}

/** A failure in place of what was asked for: what happened, that nothing was lost, what to do. */
export function Failure({ error, what, retry }: Props) {
  const words = errorWords(error);
  return (
    <div className="failure" role="alert">
      {what !== undefined && <p className="failure-title">{what}</p>}
      <p>{words.what}</p>
      {words.todo !== '' && <p className="soft">{words.todo}</p>}
      {retry && words.retry && (
        <Button variant="outline" onClick={retry}>
          Try again
        </Button>
      )}
    </div>
  );
}

/** The same in one line, beside a button that failed. */
export function FailureLine({ error }: { error: unknown }) {
  if (error === null || error === undefined) return null;
  const words = errorWords(error);
  return (
    <p className="failure-line" role="alert">
      {words.what} {words.todo}
    </p>
  );
}
