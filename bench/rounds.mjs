// Times contestants in turn, round after round, so that all of them meet the same weather on the machine.

const sorted = (list) => Float64Array.from(list).sort();

/** Median, quartiles and least of a list. */
export function spreadOf(list) {
  const s = sorted(list);
  const at = (share) => {
    const place = share * (s.length - 1);
    const low = Math.floor(place);
    return s[low] + (place - low) * (s[Math.min(low + 1, s.length - 1)] - s[low]);
  };
  return { least: s[0], quartile: at(0.25), median: at(0.5), upper: at(0.75) };
}

/**
 * Runs `time()` of every contestant once a round (after three rounds that do not count) and returns their times. Where the
 * order is always the same, one contestant always follows another: it is turned by one place each round.
 */
export async function interleave(contestants, rounds) {
  const times = new Map(contestants.map((contestant) => [contestant, []]));
  for (let round = -3; round < rounds; round++) {
    for (let i = 0; i < contestants.length; i++) {
      const contestant = contestants[(i + round + 3) % contestants.length];
      const time = await contestant.time();
      if (round >= 0) times.get(contestant).push(time);
    }
  }
  return contestants.map((contestant) => ({ ...contestant, times: times.get(contestant) }));
}

/** Times against those of a reference in the same round: median and quartiles of the ratios. */
export const ratioOf = (times, reference) => spreadOf(times.map((time, round) => time / reference[round]));

/** Processor time of this process so far, in nanoseconds, all its threads: what others run at the same time is not in it. */
export const processorTime = () => {
  const { user, system } = process.cpuUsage();
  return (user + system) * 1000;
};

/** Nanoseconds an item of work that does `count` items; what it returns is kept, so that it cannot be left out. */
export function timed(count, work) {
  const start = processorTime();
  kept += Number(work()) || 0;
  return (processorTime() - start) / count;
}
let kept = 0;
export const consumed = () => kept;
