import { HAPPENING_KINDS, Happening, type HappeningKind } from '@windrow/ventilation/contract/observations';
import { SUPPORT_CATALOGUE } from '@windrow/ventilation/support/catalogue';
import { pick } from '../entry-body.ts';
import type { EntryRow } from '../entry-field.ts';
import type { EntryPlan } from '../entry-plan.ts';
import { choiceRow, type Earlier, textRow } from '../rows.ts';

const KINDS = Object.entries(HAPPENING_KINDS).map(([value, { label }]) => ({ value, label }));

/** What can follow a tube: everything that needs none. */
const AFTER_TUBE = SUPPORT_CATALOGUE.filter(({ kind }) => kind !== 'invasive').map(
  ({ id, shortName, fullName }) => ({
    value: id,
    label: shortName === fullName ? shortName : `${shortName} · ${fullName}`,
  }),
);

/** Something that changes what comes next; what else is asked follows from what it was. */
export function happeningPlan({ kind, earlier }: { kind: string; earlier: Earlier }): EntryPlan {
  const known = isHappening(kind) ? kind : null;
  const changesSupport = known !== null && HAPPENING_KINDS[known].support;
  return {
    kind: 'happening',
    title: 'Happening',
    timeLabel: 'Happened',
    sections: [
      {
        title: 'What happened',
        rows: [choiceRow({ key: 'kind', label: 'What happened', options: KINDS, earlier, needed: true })],
      },
      ...(known === null
        ? []
        : [
            {
              title: 'More about it',
              rows: [...(changesSupport ? [supportRow(earlier)] : []), detailRow(known)],
            },
          ]),
    ],
    schema: Happening,
    bodyOf: (values) => pick(values, ['kind', 'detail', ...(changesSupport ? ['toSupport'] : [])]),
  };
}

function supportRow(earlier: Earlier): EntryRow {
  return choiceRow({
    key: 'toSupport',
    label: 'Breathes with from then on',
    options: AFTER_TUBE,
    earlier,
    needed: true,
  });
}

function detailRow(kind: HappeningKind): EntryRow {
  switch (kind) {
    case 'left-for-transport':
      return textRow({ key: 'detail', label: 'Where to', hint: 'such as: CT' });
    case 'trial-failed':
      return textRow({
        key: 'detail',
        label: 'Why it failed',
        hint: 'such as: rate 38, tired',
        needed: true,
      });
    default:
      return textRow({ key: 'detail', label: 'Detail' });
  }
}

function isHappening(kind: string): kind is HappeningKind {
  return kind in HAPPENING_KINDS;
}
