/*
 * The sweep of a ladder as a plain C loop, the yardstick for the one in TypeScript: the same arithmetic in the same
 * order. Reads one case from a file, sweeps it ROUNDS times after half as many to warm up, writes the last result to another file and prints the
 * nanoseconds of processor time that one sweep took in the mean.
 *
 * usage: sweep-loop CASE RESULT ROUNDS
 * CASE:   int32 arms, int32 frequencies, int32 conjugate, int32 unused, then doubles: shunt[arms] (1 or 0),
 *         coefficients[4*arms], then frequency, rs, xs, rl, xl, each [frequencies]
 * RESULT: doubles gain, gammaRe, gammaIm, each [frequencies]
 */
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

static void sweep(int arms, const uint8_t *shunt, const double *coefficients, int conjugate, int n,
                  const double *frequency, const double *rs, const double *xs, const double *rl, const double *xl,
                  double *gain, double *gamma_re, double *gamma_im) {
  for (int k = 0; k < n; k++) {
    const double omega = 2 * 3.141592653589793 * frequency[k];
    const double inverse = 1 / omega;
    double vr = rl[k], vi = xl[k], ir = 1, ii = 0;
    for (int arm = 0, c = 0; arm < arms; arm++, c += 4) {
      const double p = coefficients[c] * omega + coefficients[c + 2] * inverse;
      const double q = coefficients[c + 1] * omega + coefficients[c + 3] * inverse;
      if (shunt[arm] == 1) {
        ir += p * vr - q * vi;
        ii += p * vi + q * vr;
      } else {
        vr += p * ir - q * ii;
        vi += p * ii + q * ir;
      }
    }
    const double zr = rs[k], zi = xs[k];
    const double sum_re = vr + ir * zr - ii * zi;
    const double sum_im = vi + ir * zi + ii * zr;
    const double x_aim = conjugate ? -zi : zi;
    const double difference_re = vr - ir * zr + ii * x_aim;
    const double difference_im = vi - ir * x_aim - ii * zr;
    const double scale = 1 / (sum_re * sum_re + sum_im * sum_im);
    gain[k] = 4 * zr * rl[k] * scale;
    gamma_re[k] = (difference_re * sum_re + difference_im * sum_im) * scale;
    gamma_im[k] = (difference_im * sum_re - difference_re * sum_im) * scale;
  }
}

static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &t);
  return t.tv_sec * 1e9 + t.tv_nsec;
}

int main(int argc, char **argv) {
  if (argc != 4) return 2;
  FILE *in = fopen(argv[1], "rb");
  int32_t head[4];
  if (!in || fread(head, sizeof head, 1, in) != 1) return 2;
  const size_t arms = head[0], n = head[1], doubles = 5 * arms + 5 * n;
  double *data = malloc(doubles * sizeof *data), *out = malloc(3 * n * sizeof *out);
  uint8_t *shunt = malloc(arms);
  if (!data || !out || !shunt || fread(data, sizeof *data, doubles, in) != doubles) return 2;
  fclose(in);
  for (size_t arm = 0; arm < arms; arm++) shunt[arm] = data[arm] == 1;
  const double *ends = data + 5 * arms;
  const int rounds = atoi(argv[3]);
  /* Called through a volatile pointer, so that no round is folded into another. */
  void (*volatile run)(int, const uint8_t *, const double *, int, int, const double *, const double *, const double *,
                       const double *, const double *, double *, double *, double *) = sweep;
  double start = 0;
  for (int round = -rounds / 2; round < rounds; round++) {
    if (round == 0) start = now();
    run(arms, shunt, data + arms, head[2], n, ends, ends + n, ends + 2 * n, ends + 3 * n, ends + 4 * n, out, out + n,
        out + 2 * n);
  }
  printf("%.1f\n", (now() - start) / rounds);
  FILE *result = fopen(argv[2], "wb");
  if (!result || fwrite(out, sizeof *out, 3 * n, result) != 3 * n) return 2;
  return fclose(result);
}
