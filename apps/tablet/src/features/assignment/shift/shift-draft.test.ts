import { describe, expect, it } from 'vitest';
import { type ShiftDraft, shiftFrom, spanOfDraft, usualMinutes } from './shift-draft.ts';

const now = Date.parse('2026-03-05T10:00:00Z');
const timeZone = 'Europe/London';
const day: ShiftDraft = {
  kind: 'day',
  name: '',
  day: '',
  from: '',
  to: '',
  people: { ao: '690', mk: '450' },
};
const make = (draft: ShiftDraft) => shiftFrom({ draft, span: spanOfDraft({ draft, now, timeZone }) });

describe('shiftFrom', () => {
  it('makes the preset shift with its people', () => {
    expect(make(day)).toEqual({
      shift: {
        name: 'Day',
        startsAt: '2026-03-05T07:00:00.000Z',
        endsAt: '2026-03-05T19:00:00.000Z',
        people: [
          { personId: 'ao', minutesAvailable: 690 },
          { personId: 'mk', minutesAvailable: 450 },
        ],
      },
    });
  });

  it('makes a shift of other times, over midnight where the end is not after the start', () => {
    const draft: ShiftDraft = {
      ...day,
      kind: 'other',
      name: 'Late',
      day: '2026-03-05',
      from: '15:00',
      to: '01:00',
    };
    expect(make(draft)).toMatchObject({
      shift: { name: 'Late', startsAt: '2026-03-05T15:00:00.000Z', endsAt: '2026-03-06T01:00:00.000Z' },
    });
  });

  it('says what is wrong beside its field', () => {
    expect(make({ ...day, people: {} })).toMatchObject({ errors: { people: 'choose who is on' } });
    expect(make({ ...day, people: { ao: '690', mk: '' } })).toMatchObject({
      errors: { minutes: { mk: expect.any(String) } },
    });
    expect(make({ ...day, people: { ao: '29' } })).toMatchObject({
      errors: { minutes: { ao: expect.any(String) } },
    });
    expect(
      make({ ...day, kind: 'other', name: '', day: '2026-03-05', from: '07:00', to: '19:00' }),
    ).toMatchObject({ errors: { name: expect.any(String) } });
    expect(
      make({ ...day, kind: 'other', name: 'Late', day: '2026-03-05', from: '', to: '19:00' }),
    ).toMatchObject({ errors: { span: expect.any(String) } });
  });
});

describe('usualMinutes', () => {
  it('is the shift less its breaks', () => {
    expect(usualMinutes(spanOfDraft({ draft: day, now, timeZone }))).toBe(690);
  });
});
