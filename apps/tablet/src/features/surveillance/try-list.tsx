import { Button } from '@windrow/ui/controls/button';
import { TextField } from '@windrow/ui/controls/text-field';
import { judgeTypedList, type TypedList } from '@windrow/ventilation/surveillance/day-list';
import { useState } from 'react';
import { DayTable } from './day-table.tsx';
import { EventCard } from './event-card.tsx';

const NOTHING = { peep: '', fio2: '' };

/** The rule on day minima that a person types; nothing of it is stored. */
export function TryList() {
  const [typed, setTyped] = useState(NOTHING);
  const list = judgeTypedList(typed);
  const faultOf = (parameter: 'peep' | 'fio2') =>
    list.state === 'refused'
      ? list.faults.find((fault) => fault.parameter === parameter)?.message
      : undefined;
  return (
    <section aria-labelledby="try-list" className="flex flex-col gap-3 rounded-xl bg-tile px-4 py-3">
      <h2 id="try-list" className="font-bold text-lg">
        Try the rule on a list
      </h2>
      <p className="text-ink-muted">
        Type the minimum of each ventilation day, beginning with day 1, parted by commas. An empty place or a
        dash is a day without a minimum. Nothing is stored, and nothing of this patient is used.
      </p>
      <div className="grid gap-3 sm:grid-cols-2">
        <TextField
          label="PEEP by day"
          hint="cmH2O, such as: 5, 5, 8, 8"
          error={faultOf('peep')}
          value={typed.peep}
          onChange={(event) => setTyped({ ...typed, peep: event.target.value })}
        />
        <TextField
          label="FiO2 by day"
          hint="% or a fraction, such as: 40, 40, 40, 40"
          error={faultOf('fio2')}
          value={typed.fio2}
          onChange={(event) => setTyped({ ...typed, fio2: event.target.value })}
        />
      </div>
      <p role="status" className="font-bold empty:hidden">
        {resultInWords(list)}
      </p>
      {list.state === 'judged' && <Judged list={list} />}
      {list.state !== 'empty' && (
        <Button tone="quiet" className="self-start" onClick={() => setTyped(NOTHING)}>
          Clear the list
        </Button>
      )}
    </section>
  );
}

function Judged({ list: { rows, events } }: { list: Extract<TypedList, { state: 'judged' }> }) {
  const first = Date.parse(`${rows[0]?.day}T00:00:00Z`);
  const dayName = (day: string) =>
    `day ${Math.round((Date.parse(`${day}T00:00:00Z`) - first) / 86_400_000) + 1}`;
  return (
    <>
      {events.map((event) => (
        <EventCard key={event.onset} event={event} dayName={dayName} />
      ))}
      <DayTable caption="Days of the typed list" rows={rows} dayName={dayName} />
    </>
  );
}

function resultInWords(list: TypedList): string {
  if (list.state === 'empty') return '';
  if (list.state === 'refused') return 'The list is not understood yet.';
  const count = list.events.length;
  const events = count === 0 ? 'No event' : count === 1 ? 'One event' : `${count} events`;
  return `${events} in ${list.rows.length} ${list.rows.length === 1 ? 'day' : 'days'}.`;
}
