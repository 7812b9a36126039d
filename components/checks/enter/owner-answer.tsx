'use client';

import { Field, Select } from '@/components/ui/field';
import { useDrawing } from '@/lib/client/use-drawing';
import { ANSWER_CLASSES, type AnswerClass } from '@/lib/layout';

const ANSWERS = { marked: 'marked', clear: 'clear', waiting: 'waiting' } as const;
type Answer = keyof typeof ANSWERS;

const isClass = (subject: string | null): subject is AnswerClass =>
  (ANSWER_CLASSES as readonly (string | null)[]).includes(subject);

/** What the owner of one class of buried lines answered. Waiting is an answer still to come. */
export function OwnerAnswer({ subject }: { subject: string | null }) {
  const given = useDrawing((s) => (isClass(subject) ? s.sheet.site.answers[subject] : null));
  const canChangeSite = useDrawing((s) => s.canChangeSite);
  const apply = useDrawing((s) => s.apply);
  if (!isClass(subject)) return null;

  const enter = (chosen: string): void => {
    const answer = (Object.keys(ANSWERS) as Answer[]).find((one) => one === chosen);
    apply(
      {
        type: 'set-ground',
        answers: { [subject]: answer ? { answer, at: new Date().toISOString() } : null },
      },
      `Record the owner's answer for ${subject}`,
    );
  };

  return (
    <Field label={<span className="sr-only">Owner’s answer for {subject}</span>}>
      {(ties) => (
        <Select
          {...ties}
          className="!py-1"
          disabled={!canChangeSite}
          value={given?.answer ?? ''}
          onChange={(event) => enter(event.target.value)}
        >
          <option value="">Owner has not answered</option>
          <option value="waiting">Asked, waiting</option>
          <option value="marked">Marked on the ground</option>
          <option value="clear">Clear: owner has no lines here</option>
        </Select>
      )}
    </Field>
  );
}
