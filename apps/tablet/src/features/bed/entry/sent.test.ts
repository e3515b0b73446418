import { describe, expect, it } from 'vitest';
import { afterRefusal, type Reviewed, sending, wayBack } from './sent.ts';

const step: Reviewed = { is: 'review', observedAt: 0, body: { cuffCmH2O: 27 }, key: 'k1' };
const open = { ...step, isOpen: true };

describe('an entry that is sent', () => {
  it('is open from the second try on, for the first was not answered', () => {
    const first = sending(step, undefined);
    expect(first.isOpen).toBe(false);
    expect(sending(step, first).isOpen).toBe(true);
  });

  it('is a new act under a new key', () => {
    expect(sending({ ...step, key: 'k2' }, open).isOpen).toBe(false);
  });

  it('is closed by a refusal of the entry itself', () => {
    expect([400, 404, 409, 422].map((status) => afterRefusal(open, status))).toEqual([
      null,
      null,
      null,
      null,
    ]);
  });

  it('stays open where only the sender was refused, unless nothing was open', () => {
    expect(afterRefusal(open, 401)).toEqual(open);
    expect(afterRefusal({ ...step, isOpen: false }, 401)).toBeNull();
  });

  it('is open once the server broke over it', () => {
    expect(afterRefusal({ ...step, isOpen: false }, 500)).toEqual(open);
  });
});

describe('the way back to the values', () => {
  it('is plain before anything was sent, and after a refusal', () => {
    expect(wayBack({ held: undefined, wasSent: false })).toBe('back');
  });

  it('is to stop while the outcome is open, on this visit or from an earlier one', () => {
    expect(wayBack({ held: open, wasSent: false })).toBe('stop');
    expect(wayBack({ held: sending(step, undefined), wasSent: true })).toBe('stop');
  });
});
