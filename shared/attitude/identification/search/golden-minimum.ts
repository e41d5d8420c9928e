/** Where a function with one minimum between low and high is least, to 1e-5 of their distance. */
export function goldenMinimum(f: (x: number) => number, low: number, high: number): number {
  const ratio = (Math.sqrt(5) - 1) / 2;
  let [a, b] = [low, high];
  let c = b - ratio * (b - a), d = a + ratio * (b - a);
  let fc = f(c), fd = f(d);
  for (let step = 0; step < 24; step++) {
    if (fc <= fd) {
      [b, d, fd] = [d, c, fc];
      c = b - ratio * (b - a);
      fc = f(c);
    } else {
      [a, c, fc] = [c, d, fd];
      d = a + ratio * (b - a);
      fd = f(d);
    }
  }
  return (a + b) / 2;
}
