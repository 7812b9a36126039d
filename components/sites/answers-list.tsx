import { Input, Select } from '@/components/ui/field';
import { fromLocalEntry, toLocalEntry } from '@/components/ui/local-time';
import { StatusMark } from '@/components/ui/status-mark';
import { When } from '@/components/ui/when';
import { buriedLinesKnown, CLASS_WORDS } from '@/lib/checks/buried-lines-known';
import { emptyLayout, type AnswerClass, type SiteGround } from '@/lib/layout';
import { limitsFrom } from '@/lib/limits';
import type { GroundDraft } from './ground-draft';

type Edit = ((part: Partial<GroundDraft>) => void) | null;
const ANSWERS = ['marked', 'clear', 'waiting'] as const;

/** One line a class: the check's own answer, so that the site and the drawing never disagree. */
export function AnswersList({
  ground,
  edit,
  answers,
}: {
  ground: SiteGround;
  edit: Edit;
  answers: GroundDraft['answers'];
}) {
  // The rule looks at the site alone; what it asks for besides is empty.
  const findings = buriedLinesKnown.check({
    layout: emptyLayout([0, 0]),
    site: ground,
    limits: limitsFrom(),
    asOf: null,
  });
  return (
    <ul aria-label="Owners’ answers by class of buried line">
      {findings.map((finding) => {
        const name = finding.subjects[0] as AnswerClass;
        return (
          <li
            key={name}
            className="flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1 border-b border-rule-faint py-2"
          >
            <StatusMark status={finding.status} className="font-semibold">
              {finding.message}
            </StatusMark>
            {edit ? (
              <AnswerEntry
                name={name}
                ground={ground}
                put={(answer) => edit({ answers: { ...answers, [name]: answer } })}
              />
            ) : (
              <Answered at={ground.answers[name]?.at} />
            )}
          </li>
        );
      })}
    </ul>
  );
}

const Answered = ({ at }: { at: string | null | undefined }) =>
  at ? <When at={at} /> : <span className="text-ink-soft">time not entered</span>;

function AnswerEntry({
  name,
  ground,
  put,
}: {
  name: AnswerClass;
  ground: SiteGround;
  put: (answer: SiteGround['answers'][AnswerClass]) => void;
}) {
  const given = ground.answers[name] ?? null;
  return (
    <span className="flex flex-wrap gap-2">
      <Select
        aria-label={`${CLASS_WORDS[name]}: owner’s answer`}
        className="!w-36"
        value={given?.answer ?? ''}
        onChange={(event) => {
          const answer = ANSWERS.find((candidate) => candidate === event.target.value);
          put(answer ? { ...given, answer, at: new Date().toISOString() } : null);
        }}
      >
        <option value="">not asked</option>
        {ANSWERS.map((answer) => (
          <option key={answer}>{answer}</option>
        ))}
      </Select>
      {given && (
        <Input
          aria-label={`${CLASS_WORDS[name]}: answered at`}
          className="!w-56"
          type="datetime-local"
          value={toLocalEntry(given.at)}
          onChange={(event) => put({ ...given, at: fromLocalEntry(event.target.value) })}
        />
      )}
    </span>
  );
}
