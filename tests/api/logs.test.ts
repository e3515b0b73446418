import { afterAll, beforeAll, expect, it } from 'vitest';
import { aCheck, anAdmission, aPatient } from '../support/entries.ts';
import { type House, openHouse, PASSWORD } from '../support/house.ts';
import { listen } from '../support/listening.ts';

const lines: string[] = [];
let house: House;
beforeAll(async () => {
  house = await openHouse({ logTo: { write: (line) => void lines.push(line) } });
});
afterAll(() => house.close());

const IDENTITY = ['Quillfeather', 'Zebedee', 'HN-CANARY', '1937-11-23', 'airborne-canary', 'note-canary'];
const [familyName, givenName, hospitalNumber, bornOn, precautions, note] = IDENTITY;
const patient = aPatient({ familyName, givenName, hospitalNumber, bornOn });

/** A day's work with everything that goes wrong in one, down to a database that fails half-way. */
async function workADay(): Promise<void> {
  const therapist = house.as('therapist');
  const { stayId } = await house.admit(house.bed(house.alder, 0), { patient, precautions });
  const check = `/api/stays/${stayId}/checks`;
  await therapist.post(check, aCheck(house.ago(1), { note }));
  await therapist.post(check, aCheck(house.ago(1), { note, settings: { fio2Percent: 0.4 } }));
  await therapist.ask('POST', check, { raw: `{"note":"${note}", ` });
  await therapist.post(check, { note, padding: 'x'.repeat(100_000) });
  await therapist.post('/api/stays', anAdmission(house.bed(house.alder, 1), house.ago(1), { patient }));
  await therapist.get(`/api/stays/${stayId}/record?cursor=${hospitalNumber}`);
  await therapist.get(`/api/no-such-address/${familyName}`);
  await house.anybody().signIn('therapist', 'Quillfeather was here');
  const screen = await listen(house.as('charge'));
  await therapist.post(check, aCheck(house.ago(0), { note }));
  screen.close();
}

it('say which route was asked for and how it was answered, one line a request', async () => {
  await workADay();
  const requests = lines.map((line) => JSON.parse(line)).filter(({ msg }) => msg === 'request completed');
  expect(requests.length).toBeGreaterThan(9);
  expect(requests).toContainEqual(
    expect.objectContaining({
      route: '/stays/:stayId/checks',
      req: { method: 'POST' },
      res: { status: 201 },
    }),
  );
});

it('name a failing of the database, and hold none of the values that it was given', async () => {
  await house.db.raw(
    "CREATE TRIGGER fails BEFORE INSERT ON observations WHEN NEW.kind = 'check' BEGIN SELECT RAISE(ABORT, 'made to fail'); END",
  );
  await house.db.raw(
    "CREATE TRIGGER fails_too BEFORE INSERT ON stays BEGIN SELECT RAISE(ABORT, 'made to fail'); END",
  );
  const board = await house.board(house.alder);
  const stayId = board.beds[0]?.stay?.stayId;
  const before = lines.length;
  const failed = [
    await house.as('therapist').post(`/api/stays/${stayId}/checks`, aCheck(house.ago(0), { note })),
    await house.as('therapist').post(
      '/api/stays',
      anAdmission(house.bed(house.alder, 1), house.ago(1), {
        patient: { ...patient, hospitalNumber: `${hospitalNumber}2` },
      }),
    ),
  ];
  for (const { status, problem, text } of failed) {
    expect(status).toBe(500);
    expect(problem.title).toBe('Internal error');
    expect(text).not.toMatch(/sqlite|insert|made to fail/i);
  }
  const said = lines.slice(before).join('');
  expect(said).toContain('made to fail');
  expect(said).toContain('"level":50');
});

it('hold no patient, no value, no password and no session', () => {
  const said = lines.join('');
  for (const word of [...IDENTITY, PASSWORD, 'Quillfeather was here', 'fio2Percent', '7.36']) {
    const line = lines.find((each) => each.includes(word));
    expect(line, `${word} stands in the log`).toBeUndefined();
  }
  expect(said).not.toMatch(/windrow=|\$argon2/);
  expect(said).not.toContain(house.as('therapist').cookieHeader.split('=')[1]);
});
