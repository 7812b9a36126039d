import { COMMON_PRACTICE } from '../limits';
import { answer } from './support/answer';
import type { Check } from './types';

const rule = { id: 'liquid-known', gate: 'ack', backing: COMMON_PRACTICE } as const;

export const liquidKnown: Check = {
  ...rule,
  question: 'Are the systems complete?',
  title: 'Liquid named, with its flash point',
  check({ layout }) {
    const { name, flash_point_c } = layout.liquid ?? {};
    const named = typeof name === 'string' && name.trim() !== '';
    const flash = typeof flash_point_c === 'number';
    if (named && flash) {
      return [answer(rule, [], 'meets', `${name}, flash point ${flash_point_c} °C`)];
    }
    const lacks = [...(named ? [] : ['its name']), ...(flash ? [] : ['its flash point'])];
    return [
      answer(rule, [], 'not-known', `The liquid lacks ${lacks.join(' and ')}`, {
        missing: ['liquid'],
      }),
    ];
  },
};
