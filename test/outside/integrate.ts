/** ∫f from a to b by Simpson's rule over `parts` parts, an even number. */
export function integrate(f: (x: number) => number, a: number, b: number, parts = 20_000): number {
  const step = (b - a) / parts;
  let sum = f(a) + f(b);
  for (let i = 1; i < parts; i++) sum += (i % 2 === 0 ? 2 : 4) * f(a + i * step);
  return (sum * step) / 3;
}
