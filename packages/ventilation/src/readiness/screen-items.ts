import { READING_FIELDS, SETTING_FIELDS } from '../entry/fields.ts';
import { formatNumber, formatWithUnit } from '../format/number.ts';
import { supportEntry } from '../support/catalogue.ts';
import { SCREEN_ANSWERS, type ScreenAnswerKey } from './screen-answers.ts';
import type { ScreenFacts, ScreenItem } from './screen-item.ts';
import { oxygenationMet, SCREENING_LIMITS } from './screening-limits.ts';

type Judged = Omit<ScreenItem, 'id' | 'label'>;
type Item<Id extends string> = { id: Id; label: string; judge: (facts: ScreenFacts) => Judged };

const { peepAtMostCmH2O, rateAtMostPerMin, vtAboveMlPerKg, rsbiAtMostPerMinL } = SCREENING_LIMITS;
const PER_KG = { unit: 'mL/kg', decimals: 1 } as const;
const INDEX = { unit: '/min/L', decimals: 0 } as const;

/** Every item of the screen, in the order in which it is read at the bed. */
export const SCREEN_ITEMS = [
  answered('cause', 'causeImproving'),
  {
    id: 'oxygenation',
    label: 'SpO2 above 90 % on at most 40 % oxygen, or P/F 150 or more',
    judge: oxygenation,
  },
  {
    id: 'peep',
    label: `PEEP at most ${peepAtMostCmH2O} cmH2O`,
    judge: fromCheck('PEEP', ({ settings: { peepCmH2O } }) =>
      peepCmH2O === undefined
        ? null
        : { isMet: peepCmH2O <= peepAtMostCmH2O, found: formatWithUnit(peepCmH2O, SETTING_FIELDS.peepCmH2O) },
    ),
  },
  {
    id: 'rate',
    label: `Rate at most ${rateAtMostPerMin} /min`,
    judge: fromCheck('the total rate', ({ readings: { rateTotalPerMin: rate } }) =>
      rate === undefined
        ? null
        : { isMet: rate <= rateAtMostPerMin, found: formatWithUnit(rate, READING_FIELDS.rateTotalPerMin) },
    ),
  },
  {
    id: 'volume',
    label: `Own breaths above ${vtAboveMlPerKg} mL/kg`,
    judge: ownBreath('tidal volume, sex or height', ({ derived: { vtPerKgMl } }) =>
      vtPerKgMl === null
        ? null
        : { isMet: vtPerKgMl > vtAboveMlPerKg, found: formatWithUnit(vtPerKgMl, PER_KG) },
    ),
  },
  {
    id: 'rate-over-vt',
    label: `Rate over Vt at most ${rsbiAtMostPerMinL} /min/L`,
    judge: ownBreath('rate or tidal volume', ({ derived: { rsbiPerMinL } }) =>
      rsbiPerMinL === null
        ? null
        : { isMet: rsbiPerMinL <= rsbiAtMostPerMinL, found: formatWithUnit(rsbiPerMinL, INDEX) },
    ),
  },
  { id: 'acidosis', label: SCREEN_ANSWERS.noAcidosis, judge: acidosis },
  answered('heart-rate', 'heartRateStable'),
  answered('blood-pressure', 'bloodPressureStable'),
  answered('vasopressors', 'vasopressorsMinimal'),
  answered('temperature', 'temperatureNormal'),
  answered('cough', 'coughAdequate'),
  answered('mentation', 'mentationAdequate'),
] as const satisfies readonly Item<string>[];
export type ScreenItemId = (typeof SCREEN_ITEMS)[number]['id'];

function answered<Id extends string>(id: Id, key: ScreenAnswerKey): Item<Id> {
  return { id, label: SCREEN_ANSWERS[key], judge: (facts) => byAnswer(facts, key) };
}

function byAnswer({ screen }: ScreenFacts, key: ScreenAnswerKey): Judged {
  const answer = screen?.answers[key];
  if (!screen || answer === undefined)
    return notKnown(screen ? 'not answered in the screen' : 'not screened');
  return {
    ...known(answer, answer ? 'yes' : 'no'),
    source: { group: 'screen', observedAt: screen.observedAt },
  };
}

type Read = (check: NonNullable<ScreenFacts['check']['fact']>) => { isMet: boolean; found: string } | null;

function fromCheck(what: string, read: Read): (facts: ScreenFacts) => Judged {
  return ({ check: { fact: check, why } }) => {
    if (!check) return notKnown(why);
    const value = read(check);
    if (!value) return notKnown(`${what} not in the check`);
    return {
      ...known(value.isMet, value.found),
      source: { group: 'check', observedAt: check.observedAt },
    };
  };
}

/** Of a breath that the ventilator gives nothing follows about the patient's own. */
function ownBreath(what: string, read: Read): (facts: ScreenFacts) => Judged {
  const judge = fromCheck(what, read);
  return (facts) => {
    const mode = facts.check.fact?.mode;
    if (mode === undefined || supportEntry(mode).sequence === 'CSV') return judge(facts);
    return {
      ...notKnown(`${supportEntry(mode).shortName} cannot tell; read it early in the trial`),
      isNeeded: false,
    };
  };
}

function oxygenation({
  check: { fact: check, why },
  gas: { fact: gas, why: whyNoGas },
}: ScreenFacts): Judged {
  const saturationPercent = check?.readings.spo2Percent;
  const fio2Percent = check?.settings.fio2Percent;
  const pfMmHg = gas?.pfMmHg ?? null;
  const bySaturation = oxygenationMet({ saturationPercent, fio2Percent, pfMmHg: null });
  const isMet = oxygenationMet({ saturationPercent, fio2Percent, pfMmHg });
  const parts = [
    saturationPercent === undefined ? null : `SpO2 ${formatNumber(saturationPercent, { decimals: 0 })} %`,
    fio2Percent === undefined ? null : `oxygen ${formatNumber(fio2Percent, { decimals: 0 })} %`,
    pfMmHg === null ? null : `P/F ${formatNumber(pfMmHg, { decimals: 0 })}`,
  ].filter((part) => part !== null);
  if (isMet === null) {
    const lacking = check && saturationPercent === undefined ? 'SpO2 not in the check' : why;
    const noRatio = pfMmHg === null ? (whyNoGas ?? 'no oxygen recorded with the gas') : null;
    const reasons = [...parts, ...[lacking, noRatio].filter((reason) => reason !== null)];
    return notKnown(reasons.join('; '));
  }
  // What settles it is what it is from; where both speak against it, the check is the later fact.
  const source = bySaturation === true || !gas ? check : isMet ? gas : (check ?? gas);
  return {
    ...known(isMet, parts.join(', ')),
    source: source && { group: source === gas ? 'gas' : 'check', observedAt: source.observedAt },
  };
}

/**
 * From the gas and from whoever screened the patient: a "no" at the bedside stands whatever an older gas
 * said; otherwise the later of the two counts.
 */
function acidosis(facts: ScreenFacts): Judged {
  const { fact: gas, why } = facts.gas;
  const ph = gas?.values.ph;
  const byHand = byAnswer(facts, 'noAcidosis');
  if (!gas || ph === undefined)
    return byHand.state === 'not-known' ? notKnown(`${why}; ${byHand.why}`) : byHand;
  const byGas: Judged = {
    ...known(ph >= facts.phLow, `pH ${ph.toFixed(2)}`),
    source: { group: 'gas', observedAt: gas.observedAt },
  };
  if (byHand.state === 'not-known') return byGas;
  if (byHand.state === 'not-met') return byHand;
  return facts.screen && facts.screen.observedAt > gas.observedAt ? byHand : byGas;
}

function known(isMet: boolean, found: string): Judged {
  return { state: isMet ? 'met' : 'not-met', found, source: null, why: null, isNeeded: true };
}

function notKnown(why: string | null): Judged {
  return { state: 'not-known', found: null, source: null, why, isNeeded: true };
}
