import { useQuery } from '@tanstack/react-query';
import { buttonClass } from '@windrow/ui/controls/button';
import type { Unit } from '@windrow/ventilation/contract/board';
import { Check } from 'lucide-react';
import { Link } from 'react-router-dom';
import { peopleQuery } from '../setup-queries.ts';
import { type Step, stepsLeft } from './steps-left.ts';

const WORDS: Record<Step['id'], { title: string; words: string; part: string; link: string }> = {
  unit: {
    title: 'Add a unit',
    words: 'Its name as staff say it, and its time zone.',
    part: 'units',
    link: 'To the units',
  },
  beds: {
    title: 'Lay out its beds',
    words: 'Each with its label, where it stands on the floor plan.',
    part: 'units',
    link: 'To the beds',
  },
  people: {
    title: 'Add people',
    words:
      'Charge therapists and therapists of each unit. They sign in with the name and password that you give them.',
    part: 'people',
    link: 'To the people',
  },
  ventilators: {
    title: 'Have the ventilators added',
    words:
      'Add a house supervisor or biomedical engineer; they enter the machines under Capacity. You, as administrator, see no machines and no patients.',
    part: 'people',
    link: 'To the people',
  },
};

/** What to do first, in order; gone once all of it is done. */
export function FirstSteps({ units }: { units: readonly Unit[] }) {
  const people = useQuery(peopleQuery());
  if (!people.data) return null;
  const steps = stepsLeft({ units, people: people.data });
  const next = steps.find(({ isDone }) => !isDone);
  if (!next) return null;
  return (
    <section
      aria-labelledby="first-steps"
      className="flex flex-col gap-3 rounded-xl border-2 border-note bg-tile p-4"
    >
      <h2 id="first-steps" className="font-bold text-lg">
        To switch on, {steps.filter(({ isDone }) => !isDone).length} of {steps.length} steps are left
      </h2>
      <ol className="grid gap-3 md:grid-cols-2 xl:grid-cols-4">
        {steps.map((step, index) => (
          <StepItem key={step.id} step={step} number={index + 1} isNext={step === next} />
        ))}
      </ol>
    </section>
  );
}

function StepItem({ step, number, isNext }: { step: Step; number: number; isNext: boolean }) {
  const { title, words, part, link } = WORDS[step.id];
  return (
    <li className="flex items-start gap-3">
      <span
        aria-hidden="true"
        className={`flex size-8 shrink-0 items-center justify-center rounded-full border-2 border-ink font-bold ${step.isDone ? 'bg-ink text-ground' : ''}`}
      >
        {step.isDone ? <Check size={18} strokeWidth={3} /> : number}
      </span>
      <div className="flex flex-col items-start gap-1">
        <h3 className="font-bold">
          {title}
          {step.isDone && <span className="font-normal"> · done</span>}
        </h3>
        {!step.isDone && <p className="text-ink-muted text-sm">{words}</p>}
        {isNext && (
          <Link to={`?part=${part}`} className={buttonClass()}>
            {link}
          </Link>
        )}
      </div>
    </li>
  );
}
