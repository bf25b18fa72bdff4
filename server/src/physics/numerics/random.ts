/** A stream of numbers spread evenly over 0 … 1, the same for the same seed (xoshiro128**, Blackman & Vigna 2021). */
export function randomStream(seed: number): () => number {
  const state = seeded(seed);
  return () => {
    const [a, b, c, d] = state as unknown as [number, number, number, number];
    const mixed = Math.imul(rotate(Math.imul(b, 5), 7), 9) >>> 0;
    const shifted = b << 9;
    const third = c ^ a;
    const fourth = d ^ b;
    state[1] = b ^ third;
    state[0] = a ^ fourth;
    state[2] = third ^ shifted;
    state[3] = rotate(fourth, 11);
    return mixed / 2 ** 32;
  };
}

/** Four words from one by the mixing step of SplitMix. */
function seeded(seed: number): Int32Array {
  let word = seed | 0;
  return Int32Array.from({ length: 4 }, () => {
    word = (word + 0x9e3779b9) | 0;
    const once = Math.imul(word ^ (word >>> 16), 0x21f0aaad);
    const twice = Math.imul(once ^ (once >>> 15), 0x735a2d97);
    return twice ^ (twice >>> 15);
  });
}

function rotate(x: number, by: number): number {
  return (x << by) | (x >>> (32 - by));
}
