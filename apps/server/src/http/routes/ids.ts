import { Id } from '@windrow/ventilation/contract/instant';
import { z } from 'zod';
import type { Deps } from '../../deps.ts';
import { notFound } from '../../errors.ts';
import { type ObservationRow, observationById } from '../../queries/observations.ts';
import { type StayRow, stayById } from '../../queries/stays.ts';
import { type BedRow, bedById, type UnitRow, unitById } from '../../queries/units.ts';

export const UnitParams = z.object({ unitId: Id });
export const StayParams = z.object({ stayId: Id });
export const BedParams = z.object({ bedId: Id });
export const ShiftParams = z.object({ shiftId: Id });
export const PersonParams = z.object({ personId: Id });
export const VentilatorParams = z.object({ ventilatorId: Id });
export const ObservationParams = z.object({ observationId: Id });

type Db = Deps['db'];

export async function requireUnit(db: Db, unitId: string): Promise<UnitRow> {
  const unit = await unitById(db, unitId);
  if (!unit) throw notFound('unit', 'unitId', unitId);
  return unit;
}

export async function requireBed(db: Db, bedId: string): Promise<BedRow> {
  const bed = await bedById(db, bedId);
  if (!bed) throw notFound('bed', 'bedId', bedId);
  return bed;
}

export async function requireStay(db: Db, stayId: string): Promise<StayRow> {
  const stay = await stayById(db, stayId);
  if (!stay) throw notFound('stay', 'stayId', stayId);
  return stay;
}

export async function requireObservation(db: Db, id: string): Promise<ObservationRow> {
  const observation = await observationById(db, id);
  if (!observation) throw notFound('observation', 'observationId', id);
  return observation;
}

/** Where the authority over each thing lies. */
export const inUnit = async ({ db }: Deps, { params }: { params: { unitId: string } }) =>
  (await requireUnit(db, params.unitId)).id;
export const inUnitOfStay = async ({ db }: Deps, { params }: { params: { stayId: string } }) =>
  (await requireStay(db, params.stayId)).unit_id;
export const inUnitOfBed = async ({ db }: Deps, { params }: { params: { bedId: string } }) =>
  (await requireBed(db, params.bedId)).unit_id;
