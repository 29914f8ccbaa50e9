import { bindAnew, bringInViews } from './bring-in-views.ts';
import { demoReplacement } from './calibrations.ts';
import { closeDemoCase, sendDemoCase } from './close-demo-case.ts';
import type { DemoCase } from './demo-case.ts';
import { DrawnAhead } from './draw-ahead.ts';
import { drawReading } from './draw-readings.ts';
import { replaceScale } from './found-laboratory.ts';
import { glassCases } from './glass-cases.ts';
import type { Hands } from './hands.ts';
import { makeDemoEstimates, renewStale } from './make-demo-estimates.ts';
import { oxideCases } from './oxide-cases.ts';
import { moveOn, receiveCase, takeUpCase } from './receive-case.ts';
import { serviceCases } from './service-cases.ts';
import { workingDay } from './story-clock.ts';
import { viewsOf } from './views.ts';
import { writeDemoFindings } from './write-demo-findings.ts';

export const demoCases = [...oxideCases, ...glassCases, ...serviceCases].sort((one, other) =>
  one.code < other.code ? -1 : 1,
);

/** What happens on a morning or afternoon of the story. */
export type Scene = {
  readonly on: string;
  readonly at: string;
  readonly play: () => Promise<void>;
  readonly says?: string;
};

const firstMonday = '2026-05-04';
const workingDaysAWeek = 5;

/** Everything that happens in the demo laboratory, in the order of its days. `pixelFactor`: see viewsOf. */
export function scenesOf(hands: Hands, pixelFactor: number): Scene[] {
  const inOrder = demoCases.map((told, index) => {
    const receivedOn = workingDay(firstMonday, index * workingDaysAWeek);
    return { told, receivedOn, examinedOn: told.examinedOn ?? workingDay(receivedOn, 2) };
  });
  const drawn = [...inOrder].sort((one, other) => (one.examinedOn < other.examinedOn ? -1 : 1));
  const pictures = new DrawnAhead(drawn.flatMap(({ told }) => viewsOf(told, pixelFactor)));
  const scenes: Scene[] = drawn.flatMap((each, index) => {
    const says = `case ${index + 1} of ${drawn.length}`;
    return scenesOfCase(hands, { ...each, pixelFactor, pictures, says });
  });
  scenes.push({ on: demoReplacement.on, at: '08:30', play: () => replaceScale(hands, pixelFactor) });
  return scenes.sort((one, other) => (`${one.on} ${one.at}` < `${other.on} ${other.at}` ? -1 : 1));
}

type OneCase = {
  readonly told: DemoCase;
  readonly receivedOn: string;
  readonly examinedOn: string;
  readonly pixelFactor: number;
  readonly pictures: DrawnAhead;
  readonly says: string;
};

function scenesOfCase(hands: Hands, { told, receivedOn, examinedOn, pixelFactor, pictures, says }: OneCase): Scene[] {
  const views = viewsOf(told, pixelFactor);
  const { sentOn, closedOn, scaleFound } = told;
  const writtenOn = sentOn ? workingDay(sentOn, -1) : workingDay(examinedOn, 6);
  const scenes: Scene[] = [
    { on: receivedOn, at: '09:05', play: () => receiveCase(hands, told, receivedOn) },
    { on: workingDay(receivedOn, 1), at: '10:15', play: () => takeUpCase(hands, told, receivedOn) },
    {
      on: examinedOn,
      at: '09:30',
      play: () => bringInViews(hands, { told, views, pictures }),
      says,
    },
    ...readingScenes(hands, { told, views, examinedOn }),
  ];
  if (told.end !== 'examining')
    scenes.push({
      on: writtenOn,
      at: '13:20',
      play: async () => {
        await moveOn(hands, told, 'drafting');
        await writeDemoFindings(hands, told);
      },
    });
  if (scaleFound) scenes.push({ on: scaleFound.on, at: '11:00', play: () => findScale(hands, told, pixelFactor) });
  if (sentOn) scenes.push({ on: sentOn, at: '15:10', play: () => sendDemoCase(hands, told) });
  if (closedOn) scenes.push({ on: closedOn, at: '14:00', play: () => closeDemoCase(hands, told) });
  return scenes;
}

/** Each round of estimates on the day after its reading; a second reader reads some days after the first. */
function readingScenes(
  hands: Hands,
  { told, views, examinedOn }: { told: DemoCase; views: ReturnType<typeof viewsOf>; examinedOn: string },
): Scene[] {
  const readings = told.readings.map((reading, place) => ({
    on: workingDay(examinedOn, 1 + 3 * place),
    at: '10:40',
    play: () => drawReading(hands, told, views, reading),
  }));
  const estimates = told.estimates.map((round, place) => ({
    on: workingDay(examinedOn, 2 + 3 * place),
    at: '09:20',
    play: () => makeDemoEstimates(hands, { told, round, place: place + 1 }),
  }));
  return [...readings, ...estimates];
}

async function findScale(hands: Hands, told: DemoCase, pixelFactor: number): Promise<void> {
  const views = viewsOf(told, pixelFactor);
  const wrong = told.readings.filter(({ boundTo }) => boundTo).map(({ figure }) => figure);
  const reason = told.scaleFound?.reason ?? '';
  for (const view of views.filter(({ figure }) => wrong.includes(figure))) await bindAnew(hands, told, view, reason);
  await renewStale(hands, told, reason);
}
