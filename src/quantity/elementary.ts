/**
 * Elementary functions of + − × ÷ and √ alone. Those of a browser and of Node differ in the last bit from version to
 * version; these give the same double everywhere, so that a record gives the same report wherever it is made. Error about
 * one unit in the last place within the ranges stated. Argument reductions and minimax polynomials are those of fdlibm
 * (Sun Microsystems, 1993); small differences by W. Kahan's quotients.
 */

const ln2High = 6.93147180369123816e-1;
const ln2Low = 1.9082149292705877e-10;
const log10Of2High = 3.01029995663611771e-1;
const log10Of2Low = 3.69423907715893079e-13;

const bits = new DataView(new ArrayBuffer(8));

/** 2^k, exact; k from −1074 to 1023. */
function powerOfTwo(k: number): number {
  if (k < -1022) return powerOfTwo(k + 64) * 2 ** -64;
  bits.setUint32(0, (k + 1023) << 20);
  bits.setUint32(4, 0);
  return bits.getFloat64(0);
}

/** x = m·2^k with m from √½ to √2; x > 0, finite. */
function split(x: number): { readonly m: number; readonly k: number } {
  if (x < 2 ** -1022) {
    const scaled = split(x * 2 ** 64);
    return { m: scaled.m, k: scaled.k - 64 };
  }
  bits.setFloat64(0, x);
  const high = bits.getUint32(0);
  bits.setUint32(0, (high & 0xfffff) | 0x3ff00000);
  const m = bits.getFloat64(0);
  const k = (high >>> 20) - 1023;
  return m > Math.SQRT2 ? { m: m / 2, k: k + 1 } : { m, k };
}

/** eˣ; 0 below −745, Infinity above 709.78. */
export function exp(x: number): number {
  if (Number.isNaN(x)) return x;
  if (x > 709.782712893384) return Infinity;
  if (x < -745.1332191019412) return 0;
  const k = Math.round(x * Math.LOG2E);
  const high = x - k * ln2High;
  const low = k * ln2Low;
  const r = high - low;
  const t = r * r;
  const c =
    r -
    t *
      (1.66666666666666019e-1 +
        t *
          (-2.77777777770155934e-3 +
            t * (6.61375632143793436e-5 + t * (-1.65339022054652515e-6 + t * 4.13813679705723846e-8))));
  const y = 1 - (low - (r * c) / (2 - c) - high);
  return k > 1023 ? y * 2 * powerOfTwo(k - 1) : y * powerOfTwo(k);
}

/** Natural logarithm; −Infinity of 0, NaN below. */
export function log(x: number): number {
  if (!(x > 0)) return x === 0 ? -Infinity : Number.NaN;
  if (x === Infinity) return x;
  const { m, k } = split(x);
  const f = m - 1;
  if (f === 0) return k * ln2High + k * ln2Low;
  const s = f / (2 + f);
  const z = s * s;
  const w = z * z;
  const odd = w * (3.99999999994094191e-1 + w * (2.2222198432149784e-1 + w * 1.53138376992093733e-1));
  const even =
    z *
    (6.66666666666673513e-1 + w * (2.85714287436623915e-1 + w * (1.81835721616180501e-1 + w * 1.47981986051165859e-1)));
  const half = 0.5 * f * f;
  return k * ln2High - (half - (s * (half + odd + even) + k * ln2Low) - f);
}

/** Decimal logarithm; a whole number of a power of ten. */
export function log10(x: number): number {
  if (!(x > 0) || x === Infinity) return log(x);
  const { m, k } = split(x);
  const found = k * log10Of2Low + Math.LOG10E * log(m) + k * log10Of2High;
  const whole = Math.round(found);
  return Math.abs(found - whole) < 1e-12 && Number(`1e${String(whole)}`) === x ? whole : found;
}

/** Binary logarithm; a whole number of a power of two. */
export function log2(x: number): number {
  if (!(x > 0) || x === Infinity) return log(x);
  const { m, k } = split(x);
  return k + log(m) / Math.LN2;
}

/** xʸ of x > 0; relative error about 1e-16 times 1 + |y·ln x|, less for ½ and a small whole y. */
export function power(x: number, y: number): number {
  if (y === 0.5) return Math.sqrt(x);
  if (!Number.isInteger(y) || y < 0 || y > 8) return exp(y * log(x));
  let product = 1;
  for (let k = 0; k < y; k += 1) product *= x;
  return product;
}

/** eˣ − 1, also of a small x. */
export function expm1(x: number): number {
  const u = exp(x);
  if (u === 1) return x;
  return u === 0 || u === Infinity ? u - 1 : ((u - 1) * x) / log(u);
}

/** ln(1 + x), also of a small x. */
export function log1p(x: number): number {
  const u = 1 + x;
  return u === 1 || u === Infinity ? x : (log(u) * x) / (u - 1);
}

export function sinh(x: number): number {
  const e = expm1(Math.abs(x));
  const half = e > 1e300 ? exp(Math.abs(x) / 2) ** 2 / 2 : (e + e / (e + 1)) / 2;
  return x < 0 ? -half : half;
}

export const cosh = (x: number): number => (exp(x) + exp(-x)) / 2;

export function tanh(x: number): number {
  if (Math.abs(x) > 20) return x < 0 ? -1 : 1;
  const e = expm1(2 * x);
  return e / (e + 2);
}

export function asinh(x: number): number {
  const size = Math.abs(x);
  const found = log1p(size + (size * size) / (1 + Math.sqrt(size * size + 1)));
  return x < 0 ? -found : found;
}

/** Of x >= 1. */
export const acosh = (x: number): number => log1p(x - 1 + Math.sqrt((x - 1) * (x + 1)));

/** x − n·π/2 for the nearest n; |x| up to 1e5. */
function reduced(x: number): { readonly y: number; readonly low: number; readonly n: number } {
  const n = Math.round(x * (2 / Math.PI));
  const r = x - n * 1.57079632673412561;
  const w = n * 6.07710050650619225e-11;
  const y = r - w;
  return { y, low: r - y - w, n: ((n % 4) + 4) % 4 };
}

function sinOf(y: number, low: number): number {
  const z = y * y;
  const v = z * y;
  const r =
    8.33333333332248946e-3 +
    z *
      (-1.98412698298579493e-4 +
        z * (2.75573137070700677e-6 + z * (-2.50507602534068634e-8 + z * 1.5896909952115501e-10)));
  return y - (z * (0.5 * low - v * r) - low + v * 1.66666666666666324e-1);
}

function cosOf(y: number, low: number): number {
  const z = y * y;
  const r =
    z *
    (4.16666666666666019e-2 +
      z *
        (-1.38888888888741096e-3 +
          z *
            (2.48015872894767294e-5 +
              z * (-2.75573143513906633e-7 + z * (2.08757232129817483e-9 - z * 1.13596475577881948e-11)))));
  const half = 0.5 * z;
  const w = 1 - half;
  return w + (1 - w - half + (z * r - y * low));
}

/** |x| up to 1e5. */
export function sin(x: number): number {
  const { y, low, n } = reduced(x);
  const found = n % 2 === 0 ? sinOf(y, low) : cosOf(y, low);
  return n > 1 ? -found : found;
}

/** |x| up to 1e5. */
export function cos(x: number): number {
  const { y, low, n } = reduced(x);
  const found = n % 2 === 0 ? cosOf(y, low) : sinOf(y, low);
  return n === 1 || n === 2 ? -found : found;
}

export const tan = (x: number): number => sin(x) / cos(x);

const steps = [
  { to: 0.4375, at: 0, high: 0, low: 0 },
  { to: 0.6875, at: 0.5, high: 4.63647609000806094e-1, low: 2.26987774529616871e-17 },
  { to: 1.1875, at: 1, high: 7.85398163397448279e-1, low: 3.06161699786838302e-17 },
  { to: 2.4375, at: 1.5, high: 9.82793723247329054e-1, low: 1.39033110312309985e-17 },
  { to: Infinity, at: Infinity, high: 1.57079632679489656, low: 6.12323399573676604e-17 },
] as const;
const series = [
  3.33333333333329318e-1, -1.99999999998764832e-1, 1.42857142725034664e-1, -1.11111104054623558e-1,
  9.09088713343650656e-2, -7.69187620504482999e-2, 6.66107313738753121e-2, -5.83357013379057349e-2,
  4.97687799461593236e-2, -3.65315727442169155e-2, 1.62858201153657824e-2,
];

export function atan(x: number): number {
  const size = Math.abs(x);
  const { at, high, low } = steps.find(({ to }) => size < to) ?? steps[4];
  const t = at === Infinity ? -1 / size : at === 0 ? size : (size - at) / (1 + size * at);
  const z = t * t;
  const sum = series.reduceRight((total, coefficient) => coefficient + z * total, 0) * z;
  const found = at === 0 ? t - t * sum : high - (t * sum - low - t);
  return x < 0 ? -found : found;
}

/** Angle of the point (x, y), −π to π. */
export function atan2(y: number, x: number): number {
  if (x === 0) return y === 0 ? 0 : y < 0 ? -Math.PI / 2 : Math.PI / 2;
  const base = atan(y / x);
  if (x > 0) return base;
  return y < 0 ? base - Math.PI : base + Math.PI;
}

/** Of −1 to 1. */
export const asin = (x: number): number => atan2(x, Math.sqrt((1 - x) * (1 + x)));
