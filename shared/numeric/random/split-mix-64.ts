// Chance that can be repeated: the same seed gives the same digits. Nothing here asks the machine for chance.

const step = 0x9e3779b97f4a7c15n;

/**
 * The first outputs of SplitMix64 for a seed, as unsigned 64-bit numbers. `seed`: taken modulo 2⁶⁴; `count` ≥ 0.
 * Source: Steele, Lea and Flood 2014; Vigna's public-domain reference.
 */
export function splitMix64(seed: bigint, count: number): bigint[] {
  return Array.from({ length: count }, (_, index) => mixed(BigInt.asUintN(64, seed + step * BigInt(index + 1))));
}

/** A seed of its own for a numbered task, so that tasks run in any order give the same digits. `task` ≥ 0. */
export function seedOfTask(seed: bigint, task: number): bigint {
  return mixed(BigInt.asUintN(64, seed + step * BigInt(task + 1)));
}

function mixed(state: bigint): bigint {
  const once = BigInt.asUintN(64, (state ^ (state >> 30n)) * 0xbf58476d1ce4e5b9n);
  const twice = BigInt.asUintN(64, (once ^ (once >> 27n)) * 0x94d049bb133111ebn);
  return twice ^ (twice >> 31n);
}
