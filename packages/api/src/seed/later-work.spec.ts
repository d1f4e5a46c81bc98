import closeUps from './data/close-ups.json' with { type: 'json' };
import digest from './data/digest.json' with { type: 'json' };
import handOver from './data/hand-over.json' with { type: 'json' };
import hours from './data/hours.json' with { type: 'json' };
import loans from './data/loans.json' with { type: 'json' };
import majorPortion from './data/major-portion.json' with { type: 'json' };
import noticeAnswers from './data/notice-answers.json' with { type: 'json' };
import openItems from './data/open-items.json' with { type: 'json' };
import partsReceived from './data/parts-received.json' with { type: 'json' };
import rivets from './data/rivets.json' with { type: 'json' };
import sealant from './data/sealant.json' with { type: 'json' };
import signUps from './data/sign-ups.json' with { type: 'json' };
import similarCases from './data/similar-cases.json' with { type: 'json' };
import skills from './data/skills.json' with { type: 'json' };
import stampAuthority from './data/stamp-authority.json' with { type: 'json' };
import tools from './data/tools.json' with { type: 'json' };
import visits from './data/visits.json' with { type: 'json' };
import weighing from './data/weighing.json' with { type: 'json' };
import workshops from './data/workshops.json' with { type: 'json' };
import { readSeedWorld } from './seed-world.js';

const world = readSeedWorld();
const sum = (numbers: readonly number[]) => numbers.reduce((total, one) => total + one, 0);
const keys = (list: readonly { key: string }[]) => list.map(({ key }) => key);
const people = keys(world.people);
const builds = keys(world.builds);
const questions = keys(world.questions);
const steps = world.sections.flatMap((section) => section.steps);

describe('workshops kept ready', () => {
  it('are six, and their sign-ups name workshops, people and states that add up to each tally', () => {
    expect(workshops).toHaveLength(6);
    expect(signUps).toHaveLength(36);
    for (const { workshop, who } of signUps) {
      expect(keys(workshops)).toContain(workshop);
      expect(people).toEqual(expect.arrayContaining(who));
    }
    for (const workshop of workshops) {
      const seats = (...states: string[]) =>
        sum(
          signUps
            .filter((one) => one.workshop === workshop.key && states.includes(one.state))
            .map(({ who }) => who.length),
        );
      const { confirmed, offered, waitlisted, free } = workshop.tally;
      expect(seats('confirmed', 'attended', 'attendedInPart', 'absent')).toBe(confirmed);
      expect(seats('offered', 'heldForWaiver')).toBe(offered);
      expect(seats('waitlisted')).toBe(waitlisted);
      expect(workshop.capacity).toBe(confirmed + offered + free);
    }
  });

  it('hold no more than their room, benches, instructors and kits allow', () => {
    for (const { capacity, seats, helpers } of workshops) {
      const taught = seats.learnersPerInstructor * (1 + helpers.length);
      expect(capacity).toBeLessThanOrEqual(Math.min(seats.room, taught, seats.kits));
    }
  });
});

describe('the crib kept ready', () => {
  it('has tools, and loans of them to people', () => {
    expect(tools).toHaveLength(16);
    expect(loans).toHaveLength(15);
    for (const { tool, borrower } of loans) {
      expect(keys(tools)).toContain(tool);
      expect(people).toContain(borrower);
    }
  });

  it('never lends out more of a tool than there are on a day, the day for cleaning counted', () => {
    for (const { key, quantity, turnRoundDays } of tools) {
      const taken = loans.filter(({ tool, state }) => tool === key && state !== 'refused');
      for (const { from } of taken) {
        const busy = taken.filter((loan) => {
          const free = new Date(Date.parse(loan.to) + turnRoundDays * 86_400_000).toISOString().slice(0, 10);
          return loan.from <= from && from <= free;
        });
        expect(busy.length).toBeLessThanOrEqual(quantity);
      }
    }
  });
});

describe('the record kept ready', () => {
  it('has sessions that add up as expected', () => {
    const { sessions, expected } = hours;
    expect(sessions).toHaveLength(expected.sessions);
    expect(sum(sessions.map(({ clockHours }) => clockHours))).toBeCloseTo(expected.clockHours, 6);
    expect(sum(sessions.map(({ personHours }) => personHours))).toBeCloseTo(expected.personHours, 6);
    for (const { step, clockHours, who, personHours } of sessions) {
      expect(steps.map(({ code }) => code)).toContain(step);
      expect(personHours).toBeCloseTo(clockHours * who.length, 6);
    }
  });

  it('has as many finished steps in its first build as the sessions say', () => {
    const driven = Object.values(world.builds.find(({ key }) => key === 'B1')!.progress).filter(
      (state) => state === 'driven',
    );
    expect(driven).toHaveLength(hours.expected.finishedSteps);
  });

  it('has a major-portion tally that adds up in tenths', () => {
    const { tasks, expected } = majorPortion;
    const applicable = tasks.flatMap(({ tenths }) => (tenths ? [tenths] : []));
    expect(tasks).toHaveLength(expected.tasksListed);
    expect(applicable).toHaveLength(expected.applicable);
    for (const one of applicable) expect(sum(Object.values(one))).toBe(10);
    for (const column of ['maker', 'commercial', 'assembly', 'fabrication'] as const)
      expect(sum(applicable.map((one) => one[column]))).toBe(expected.tenths[column]);
    const own = expected.tenths.assembly + expected.tenths.fabrication;
    expect((100 * own) / (expected.applicable * 10)).toBeCloseTo(expected.ownShare, 2);
  });

  it('has open items, close-ups, notice answers and visits of builds and questions that there are', () => {
    expect(openItems).toHaveLength(21);
    expect(closeUps).toHaveLength(9);
    expect(noticeAnswers).toHaveLength(13);
    expect(visits).toHaveLength(6);
    for (const { build } of [...openItems, ...closeUps, ...noticeAnswers, ...visits, ...sealant])
      expect(builds).toContain(build);
    for (const { question } of openItems) if (question) expect(questions).toContain(question);
    for (const { closeUp } of openItems) if (closeUp) expect(keys(closeUps)).toContain(closeUp);
    for (const { openItems: items, questions: asked } of closeUps) {
      expect(keys(openItems)).toEqual(expect.arrayContaining(items));
      expect(questions).toEqual(expect.arrayContaining(asked));
    }
    for (const { openItem } of noticeAnswers) if (openItem) expect(keys(openItems)).toContain(openItem);
  });

  it('received what the kit has, part by part', () => {
    expect(partsReceived.parts.map(({ part }) => part).sort()).toEqual(
      world.parts.map(({ number }) => number).sort(),
    );
    for (const { part, needed, received, short } of partsReceived.parts) {
      expect(needed).toBe(world.parts.find(({ number }) => number === part)!.quantity);
      if (short !== null) expect(needed - received).toBe(short);
    }
  });

  it('weighs what the scales read less the tare', () => {
    const moment = (items: readonly { weight: number; arm: number }[]) =>
      sum(items.map(({ weight, arm }) => weight * arm));
    const net = weighing.readings.map(({ scale, tare, arm }) => ({ weight: scale - tare, arm }));
    expect(sum(net.map(({ weight }) => weight))).toBeCloseTo(weighing.asWeighed.weight, 6);
    expect(moment(net)).toBeCloseTo(weighing.asWeighed.moment, 6);
    expect(moment([...net, ...weighing.adjustments])).toBeCloseTo(weighing.empty.moment, 6);
    expect(weighing.loaded.moment / weighing.loaded.weight).toBeCloseTo(weighing.loaded.cg, 3);
  });

  it('counts its rivets from the hole lines', () => {
    for (const { callOut, wholeAircraft, holeLines } of rivets.toOrder.lines) {
      const lines = world.holeLines.filter((line) => line.callOut === callOut);
      expect(lines.map(({ code }) => code).sort()).toEqual([...holeLines].sort());
      expect(sum(lines.map(({ count, repeats }) => count * repeats))).toBe(wholeAircraft);
    }
  });

  it('names who has seen which skill', () => {
    expect(skills.skills).toHaveLength(12);
    for (const { person, skill, seenBy } of skills.seen) {
      expect(people).toEqual(expect.arrayContaining([person, seenBy]));
      expect(keys(skills.skills)).toContain(skill);
    }
    for (const { skills: held } of world.people)
      expect(keys(skills.skills)).toEqual(expect.arrayContaining(held));
  });
});

it('ranks similar cases among the questions that there are, nearest first', () => {
  expect(sum(Object.values(similarCases.weights))).toBeCloseTo(1, 9);
  expect(similarCases.cases.map(({ question }) => question).sort()).toEqual([...questions].sort());
  for (const { top } of similarCases.cases) {
    expect(questions).toEqual(expect.arrayContaining(top.map(({ question }) => question)));
    expect(top.map(({ score }) => score)).toEqual(top.map(({ score }) => score).sort((a, b) => b - a));
  }
});

it('tells a digest in the order of its consequences, and hands over what is listed', () => {
  const ranks = digest.items.map(({ consequence }) => digest.order.indexOf(consequence));
  expect(ranks).toEqual([...ranks].sort((a, b) => a - b));
  expect(handOver.items.map(({ number }) => number)).toEqual(handOver.items.map((_, index) => index + 1));
  expect(questions).toContain(stampAuthority.refusedToday[0]!.question);
});
