import { BothTexts } from '../../../components/both-texts';
import { RichTextView } from '../../../components/rich-text-view';
import { type DraftForm, draftLabels } from './draft-form';
import type { useDraft } from './use-draft';

const labels: Record<keyof DraftForm, string> = {
  question: 'Question',
  age: 'Age',
  sex: 'Sex',
  urgency: 'Urgency',
  urgencyReason: draftLabels.urgencyReason ?? '',
  consentHow: 'Consent',
  consentOn: 'Consent given on',
  historyHtml: 'History',
};

/** The fields that somebody else saved differently meanwhile, side by side. */
export function DraftConflict({ draft }: { draft: ReturnType<typeof useDraft> }) {
  if (!draft.theirs) return null;
  const { form, differ } = draft.theirs;
  const column = (text: DraftForm) => (
    <dl className="conflict-fields">
      {differ.map((key) => (
        <div key={key}>
          <dt className="soft small">{labels[key]}</dt>
          <dd>
            {key === 'historyHtml' ? (
              <RichTextView html={text[key]} />
            ) : text[key] === '' ? (
              'empty'
            ) : (
              text[key]
            )}
          </dd>
        </div>
      ))}
    </dl>
  );
  return (
    <BothTexts
      what="this referral"
      mine={column(draft.form)}
      theirs={column(form)}
      onKeepMine={draft.keepMine}
      onTakeTheirs={draft.takeTheirs}
    />
  );
}
