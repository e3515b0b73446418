import { describe, expect, it } from 'vitest';
import { judgeTypedList } from './day-list.ts';

const onsets = (peep: string, fio2 = '') => {
  const list = judgeTypedList({ peep, fio2 });
  if (list.state !== 'judged') throw new Error(list.state);
  return list.rows
    .filter(({ marks }) => marks.some(({ kind }) => kind === 'onset'))
    .map((row) => row.ventilationDay);
};
const faults = (peep: string, fio2 = '') => {
  const list = judgeTypedList({ peep, fio2 });
  return list.state === 'refused' ? list.faults.map(({ message }) => message.replaceAll('\u00a0', ' ')) : [];
};

describe('judgeTypedList', () => {
  it('finds the event of a list typed in, by PEEP or by oxygen in percent or as a fraction', () => {
    expect(onsets('5, 5, 8, 8')).toEqual([3]);
    expect(onsets('', '40,40,60,60')).toEqual([3]);
    expect(onsets('5,5,5,5', '0.4, 0.4, 0.6, 1.0')).toEqual([3]);
    expect(onsets('10,5,8,8')).toEqual([]);
  });

  it('calls days by their number in its sentences', () => {
    const list = judgeTypedList({ peep: '5,5,8,8,5,5,8,8', fio2: '' });
    expect(list.state === 'judged' && list.rows[6]?.marks[0]?.why).toContain('the event of day 3.');
  });

  it('takes an empty place and a dash for a day without a minimum', () => {
    expect(onsets('5,5,,8,8')).toEqual([]);
    expect(onsets('-,-,5,5,8,8')).toEqual([5]);
  });

  it('says which day it does not understand, and what is accepted', () => {
    expect(faults('5,x,8')).toEqual(['PEEP of day 2 must be 0 to 40 cmH2O, not x.']);
    expect(faults('5', '40,12')).toEqual(['FiO2 of day 2 must be 20 to 100 %, not 12.']);
    expect(faults('41')).toHaveLength(1);
    expect(faults(Array.from({ length: 121 }, () => '5').join())).toEqual(['At most 120 days, not 121.']);
    expect(judgeTypedList({ peep: ' ', fio2: '' })).toEqual({ state: 'empty' });
  });
});
