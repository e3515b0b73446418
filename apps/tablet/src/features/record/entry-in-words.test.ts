import { describe, expect, it } from 'vitest';
import { entryInWords } from './entry-in-words.ts';

const text = (kind: Parameters<typeof entryInWords>[0]['kind'], body: Record<string, unknown>) =>
  entryInWords({ kind, body }).map(({ label, text: said }) => (label ? `${label}: ${said}` : said));

describe('entryInWords', () => {
  it('says a check with units, limits that are off, and what was kept', () => {
    expect(
      text('check', {
        mode: 'ac-vc',
        settings: { vtSetMl: 430, peepCmH2O: 22 },
        readings: { plateauCmH2O: 24 },
        limits: { highPressureCmH2O: 'off' },
        passive: false,
        confirmedUnusual: ['peepCmH2O'],
        note: 'coughing',
      }),
    ).toEqual([
      'AC/VC, Assist-control, volume',
      'Settings: Tidal volume set 430\u00a0mL, PEEP 22\u00a0cmH2O',
      'Readings: Plateau 24\u00a0cmH2O',
      'Alarm limits: High pressure limit off',
      'patient made an effort',
      'Unusual, asked about and kept: PEEP',
      'Note: coughing',
    ]);
  });

  it('says a gas with the zeros that carry meaning', () => {
    expect(text('gas', { site: 'arterial', ph: 7.4, pco2MmHg: 40, po2MmHg: 80 })).toEqual([
      'Arterial',
      'pH 7.40, PCO2 40\u00a0mmHg, PO2 80\u00a0mmHg',
    ]);
  });

  it('says devices, checks of them and what became of them', () => {
    expect(
      text('airway', {
        event: 'placed',
        kind: 'oral-tube',
        sizeMm: 8,
        depthCm: 22,
        depthMark: 'lip',
        cuffed: true,
      }),
    ).toEqual([
      'Placed, oral tube',
      'Tube size (inner diameter) 8.0\u00a0mm, Depth 22\u00a0cm, at lip, cuffed',
    ]);
    expect(text('airway', { event: 'removed' })).toEqual(['Device taken out']);
    expect(text('airway-check', { cuffCmH2O: 26, secured: false })).toEqual([
      'Cuff pressure 26\u00a0cmH2O, not secured',
    ]);
  });

  it('says happenings with what follows', () => {
    expect(text('happening', { kind: 'extubated-planned', toSupport: 'hfnc' })).toEqual([
      'Extubated, planned',
      'Breathes with from then on: HFNC, High-flow nasal',
    ]);
    expect(text('happening', { kind: 'trial-failed', detail: 'tired' })).toEqual([
      'Breathing trial failed',
      'Detail: tired',
    ]);
    expect(text('happening', { kind: 'trial-failed', criteria: ['rate', 'arrhythmia'] })).toEqual([
      'Breathing trial failed',
      'Criteria met: Rate above 35 /min, or up by half; Arrhythmia',
    ]);
    expect(text('happening', { kind: 'trial-started', method: 't-piece', plannedMinutes: 30 })).toEqual([
      'Breathing trial started',
      'On: T-piece',
      'Planned for 30\u00a0min',
    ]);
    expect(
      text('happening', { kind: 'screened', screen: { coughAdequate: true, mentationAdequate: false } }),
    ).toEqual(['Screened for readiness', 'Yes: Cough is adequate', 'No: Awake enough to protect the airway']);
  });

  it('says what was entered for surveillance', () => {
    expect(text('infection-sign', { sign: 'temperature', temperatureC: 38 })).toEqual([
      'Temperature 38.0\u00a0°C',
    ]);
    expect(text('infection-sign', { sign: 'antimicrobial', agent: 'meropenem', day: '2026-03-04' })).toEqual([
      'Antimicrobial given, meropenem, 04-Mar-2026',
    ]);
  });

  it('says who it is and where', () => {
    expect(
      text('details', {
        patient: {
          familyName: 'Halloran',
          givenName: 'Peter',
          bornOn: '1961-03-04',
          hospitalNumber: 'H-1',
          sex: null,
          heightCm: null,
        },
        difficultAirway: true,
        precautions: null,
        careLimits: null,
        orders: { checkEveryMinutes: 120, gasEveryMinutes: null },
      }),
    ).toEqual([
      'Halloran, Peter, born 04-Mar-1961, No. H-1',
      'sex not recorded, no height',
      'Difficult airway',
      'Ordered: check every 120 min',
    ]);
    expect(text('place', { event: 'left', outcome: 'ward' })).toEqual(['Stay ended, to a ward']);
  });

  it('says nothing of an entry that was struck', () => {
    expect(text('check', {})).toEqual([]);
  });
});
