import type { DemoPerson } from './demo-types.ts';

/** Who works here. All invented. The first eight are the sign-ins that are printed at the start. */
export const DEMO_PEOPLE: DemoPerson[] = [
  staff('therapist', 'Ama Osei', 'AO', 'therapist', 'harbour'),
  staff('therapist2', 'Mirek Kolar', 'MK', 'therapist', 'harbour'),
  {
    ...staff('charge', 'Tove Ravn', 'TR', 'charge', 'harbour'),
    grants: [
      { role: 'charge', unitKey: 'harbour' },
      { role: 'charge', unitKey: 'lantern' },
    ],
  },
  staff('supervisor', 'Ruth Amari', 'RA', 'supervisor', null),
  staff('clinician', 'Leo Brandt', 'LB', 'clinician', null),
  staff('biomed', 'Kofi Mensah', 'KM', 'biomedical', null),
  staff('admin', 'Dana Whitlock', 'DW', 'administrator', null),
  staff('display', 'Wall displays', 'WD', 'display', null),

  staff('hana.sato', 'Hana Sato', 'HS', 'therapist', 'harbour'),
  staff('owen.price', 'Owen Price', 'OP', 'therapist', 'harbour'),
  staff('ines.duarte', 'Inês Duarte', 'ID', 'therapist', 'lantern'),
  staff('yusuf.demir', 'Yusuf Demir', 'YD', 'therapist', 'lantern'),
  staff('ilse.maas', 'Ilse Maas', 'IM', 'charge', 'lantern'),
  staff('sami.laine', 'Sami Laine', 'SL', 'therapist', 'orchard'),
  staff('priya.nair', 'Priya Nair', 'PN', 'therapist', 'orchard'),
  staff('caleb.okafor', 'Caleb Okafor', 'CO', 'therapist', 'orchard'),
  staff('lucia.ferrer', 'Lucía Ferrer', 'LF', 'therapist', 'orchard'),
  staff('tomasz.wrona', 'Tomasz Wrona', 'TW', 'therapist', 'orchard'),
  staff('noor.haddad', 'Noor Haddad', 'NH', 'charge', 'orchard'),
];

function staff(
  username: string,
  displayName: string,
  initials: string,
  role: DemoPerson['grants'][number]['role'],
  unitKey: string | null,
): DemoPerson {
  return { username, displayName, initials, grants: [{ role, unitKey }] };
}
