import type { OwnAppointment } from '../../../../shared/schemas/appointments.ts';
import type { OwnMatter } from '../../../../shared/schemas/matter-answers.ts';
import type { Own, OwnBuilding } from '../../../../shared/schemas/own.ts';
import { can } from '../../schemes/can.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { OwnMap } from '../map/own-map.tsx';
import { nextStep } from '../next-step.ts';
import { timelineOf } from '../timeline-of.ts';
import { Certainty } from './certainty.tsx';
import { Contact } from './contact.tsx';
import { Forecast } from './forecast.tsx';
import { NextStepBox } from './next-step-box.tsx';
import { OwnLetters } from './own-letters.tsx';
import { OwnMatters } from './own-matters.tsx';
import { SpeakUp } from './speak-up.tsx';
import { Timeline } from './timeline.tsx';

type BuildingViewProps = {
  readonly own: Own;
  readonly building: OwnBuilding;
  readonly appointments: readonly OwnAppointment[];
  readonly matters: readonly OwnMatter[];
};

/** Everything about one building: what to expect and what to do, then where and when. */
export function BuildingView({ own, building, appointments, matters }: BuildingViewProps) {
  const mayAnswer = can(useScheme(), 'answerAsOwner');
  const now = new Date();
  const letters = own.letters.filter(({ buildings }) => buildings.includes(building.id));
  const visits = appointments.filter((one) => one.building.id === building.id);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_452px] items-start gap-x-12 max-lg:block print:block">
      <div className="min-w-0">
        <Forecast building={building} repairs={own.repairs} />
        {mayAnswer && <NextStepBox step={nextStep(letters, visits, now)} />}
        <SpeakUp building={building} answerDays={own.answerDays} mayAnswer={mayAnswer} />
      </div>
      <div className="min-w-0 max-lg:mt-5 print:mt-4 print:max-w-[452px]">
        <OwnMap building={building} />
        <Timeline
          steps={timelineOf(letters, visits, own.milestones, { now, zone: own.timeZone })}
        />
      </div>
      {building.figures !== null && (
        <section className="mt-5 hidden print:block">
          <h2 className="mb-1 text-h2">How sure we are</h2>
          <Certainty figures={building.figures} />
        </section>
      )}
      <div className="col-span-2">
        <OwnMatters
          matters={matters.filter((one) => one.building.id === building.id)}
          mayAnswer={mayAnswer}
        />
        <OwnLetters letters={letters} />
        <Contact contact={own.contact} />
      </div>
    </div>
  );
}
