// Where the sums and the fraction stop: the next term adds nothing that a double could hold.
const SETTLED = 1e-16;
const MOST_TERMS = 100_000;
// From this shape on the sums would take thousands of terms, and Temme's expansion is right to 1e-13.
const LARGE_SHAPE = 1e7;
// Stirling's series is right to rounding from here on.
const STIRLING_FROM = 15;

/**
 * P(X > x) for X gamma distributed with this shape and scale 1. By the power series below the mean, by the
 * continued fraction above it (Abramowitz and Stegun 6.5.29 and 6.5.31), by Temme's uniform expansion for
 * large shapes (SIAM Journal on Mathematical Analysis 10, 1979; references from memory).
 */
export function gammaSurvival(x: number, shape: number): number {
  if (x <= 0) return 1;
  if (x === Infinity) return 0;
  if (shape > LARGE_SHAPE) return temme(x, shape);
  const survival = x < shape + 1 ? 1 - lowerSeries(x, shape) : upperFraction(x, shape);
  return Math.min(1, Math.max(0, survival));
}

function lowerSeries(x: number, shape: number): number {
  let term = 1;
  let sum = 1;
  for (let n = 1; term > SETTLED * sum; n += 1) {
    term *= x / (shape + n);
    sum += term;
  }
  return density(x, shape) * sum;
}

/** Lentz's way of evaluating the fraction from the front. */
function upperFraction(x: number, shape: number): number {
  let b = x + 1 - shape;
  let c = Infinity;
  let d = 1 / b;
  let fraction = d;
  for (let n = 1; n < MOST_TERMS; n += 1) {
    const a = n * (shape - n);
    b += 2;
    d = 1 / (b + a * d);
    c = b + a / c;
    fraction *= c * d;
    if (Math.abs(c * d - 1) < 1e-15) break;
  }
  return shape * density(x, shape) * fraction;
}

/** x^shape e^−x ÷ Γ(shape + 1), by Stirling's series; small shapes are first raised to where it holds. */
function density(x: number, shape: number): number {
  let raised = shape;
  let log = 0;
  while (raised < STIRLING_FROM) {
    raised += 1;
    log += Math.log(raised / x);
  }
  log -= raised * excess(x, raised) + Math.log(2 * Math.PI * raised) / 2 + stirling(raised);
  return Math.exp(log);
}

/** μ − 1 − ln μ for μ = x ÷ shape. */
function excess(x: number, shape: number): number {
  const off = (x - shape) / shape;
  return off - (Math.abs(off) < 0.5 ? Math.log1p(off) : Math.log(x / shape));
}

/** ln Γ(a) less its leading part (a − ½) ln a − a + ½ ln 2π. */
function stirling(a: number): number {
  const s = 1 / (a * a);
  return (1 / 12 - s * (1 / 360 - s * (1 / 1260 - s * (1 / 1680 - s * (1 / 1188 - (s * 691) / 360360))))) / a;
}

function temme(x: number, shape: number): number {
  const half = shape * excess(x, shape);
  const eta = Math.sign(x - shape) * Math.sqrt((2 * half) / shape);
  // P(Z > z) for the standard normal, from the gamma of shape ½.
  const tail = gammaSurvival(half, 0.5) / 2;
  const normal = eta >= 0 ? tail : 1 - tail;
  const first = -1 / 3 + eta * (1 / 12 - (eta * 2) / 135);
  return Math.min(1, Math.max(0, normal + (Math.exp(-half) / Math.sqrt(2 * Math.PI * shape)) * first));
}
