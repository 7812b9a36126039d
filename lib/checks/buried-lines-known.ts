import { COMMON_PRACTICE } from '../limits';
import { ANSWER_CLASSES, piecesOf, type AnswerClass, type SiteGround } from '../layout';
import { answer } from './support/answer';
import type { Check, Finding, Gate } from './types';

const rule = { id: 'buried-lines-known', gate: 'ack', backing: COMMON_PRACTICE } as const;

/** Classes that kill or burn when a rod strikes them: not knowing is a stop. */
const STOPS: readonly AnswerClass[] = ['electric', 'gas-oil-steam'];

export const CLASS_WORDS: Record<AnswerClass, string> = {
  electric: 'Electric',
  'gas-oil-steam': 'Gas, oil, steam',
  communications: 'Communications',
  'potable-water': 'Potable water',
  'reclaimed-water': 'Reclaimed water',
  sewer: 'Sewer',
  private: 'Private lines',
};

export const buriedLinesKnown: Check = {
  ...rule,
  question: 'What is under and over us?',
  title: 'Owners have answered',
  check: ({ site }) => ANSWER_CLASSES.map((name) => judge(site, name)),
};

function judge(site: SiteGround, name: AnswerClass): Finding {
  const gate: Gate = STOPS.includes(name) ? 'stop' : 'ack';
  const given = site.answers[name]?.answer ?? null;
  const word = CLASS_WORDS[name];
  if (given === null || given === 'waiting') {
    return answer(
      rule,
      [name],
      'not-known',
      given === null ? `${word}: nobody has answered` : `${word}: the owner has not answered yet`,
      { gate, missing: ['owner-answer'] },
    );
  }
  const drawn = linesOfClass(site, name);
  if (given === 'marked') {
    return drawn > 0
      ? answer(rule, [name], 'meets', `${word}: marked, ${drawn} drawn`, { gate })
      : answer(rule, [name], 'caution', `${word}: marked on the ground, but none is drawn`, {
          gate,
          missing: ['buried-lines'],
        });
  }
  return drawn === 0
    ? answer(rule, [name], 'meets', `${word}: clear`, { gate })
    : answer(rule, [name], 'caution', `${word}: answered clear, but ${drawn} drawn`, { gate });
}

/** A private line answers for `private` and for no other class. */
function linesOfClass(site: SiteGround, name: AnswerClass): number {
  return piecesOf(site.features, 'buried-line').filter((line) =>
    line.private ? name === 'private' : line.utility === name,
  ).length;
}
