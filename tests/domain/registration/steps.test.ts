import { describe, expect, test } from 'vitest';
import type { Answers } from '@/lib/domain/registration/answers';
import { currentAnswers } from '@/lib/domain/registration/current-answers';
import { firstUnanswered, isComplete, isReachable, nextStep, STEPS } from '@/lib/domain/registration/steps';

const who = {
  attendeeName: 'Noor',
  attendeeEmail: 'n@example.test',
  payer: 'attendee',
  payerName: '',
  payerEmail: '',
  minor: false,
} as const;
const track = { trackId: 'trk_a', electives: [] } as const;
const harps = { harpIds: [] };
const needs = {
  diet: '',
  access: '',
  emergencyName: 'S',
  emergencyPhone: '+442079460018',
  guardianName: '',
  guardianEmail: '',
  guardianPhone: '',
  consent: false,
};
const all = { who, track: { trackId: 'trk_a', electives: [] }, harps, needs } satisfies Answers;

describe('the first step still to do', () => {
  test.each<[string, Answers, string]>([
    ['nothing', {}, 'who'],
    ['who', { who }, 'track'],
    ['who and track', { who, track: { ...track, electives: [] } }, 'harps'],
    ['no harps at all, which is an answer', { who, track: { ...track, electives: [] }, harps }, 'needs'],
    ['everything', all, 'check'],
    ['a later step without an earlier one', { harps, needs }, 'who'],
    ['a minor without a guardian', { ...all, who: { ...who, minor: true } }, 'needs'],
    [
      'a minor whose guardian has not agreed',
      { ...all, who: { ...who, minor: true }, needs: { ...needs, guardianName: 'S', guardianPhone: '+1' } },
      'needs',
    ],
    [
      'a minor with all',
      {
        ...all,
        who: { ...who, minor: true },
        needs: { ...needs, guardianName: 'S', guardianPhone: '+1', consent: true },
      },
      'check',
    ],
  ])('%s', (_what, answers, step) => {
    expect(firstUnanswered(answers)).toBe(step);
    expect(isComplete(answers)).toBe(step === 'check');
  });
});

test('steps cannot be skipped and can be gone back to (ASVS 2.3.1)', () => {
  expect(isReachable('harps', { who })).toBe(false);
  expect(isReachable('track', { who })).toBe(true);
  expect(isReachable('who', all)).toBe(true);
  expect(isReachable('check', { who, harps, needs })).toBe(false);
});

test('the steps follow one another', () => {
  expect(STEPS.slice(0, -1).map((step) => nextStep(step as 'who'))).toEqual(STEPS.slice(1));
});

test('what the programme no longer has is asked for again or left out', () => {
  const programme = {
    tracks: [{ id: 'trk_a', name: 'A', level: 'start', gate: '', capacity: 1, price: null }],
    workshops: [
      {
        id: 'wsh_e',
        title: 'E',
        description: '',
        kind: 'jam',
        audience: 'elective',
        lengthMinutes: 60,
        capacity: null,
        trackIds: [],
        instructorIds: [],
        needs: [],
      },
    ],
  } satisfies Parameters<typeof currentAnswers>[1];
  const chosen: Answers = { ...all, track: { trackId: 'trk_a', electives: ['wsh_e', 'wsh_gone'] } };
  expect(currentAnswers(chosen, programme).track).toEqual({ trackId: 'trk_a', electives: ['wsh_e'] });
  expect(
    currentAnswers({ ...all, track: { trackId: 'trk_gone', electives: [] } }, programme).track,
  ).toBeUndefined();
});
