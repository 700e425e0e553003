/*
 * Worst reflection of many networks of real parts as a plain C loop, the yardstick for the one in the project: the same
 * draws, the same steps, the same arithmetic, one network after the other. Reads one case from a file, works it out, writes
 * the result to another file and prints the seconds of processor time.
 *
 * usage: monte-carlo CASE RESULT
 * CASE:   int32 networks, frequencies, arms, steps, seed, unused, then doubles: tolerance[arms], inverse[arms], of each
 *         step its kind and its arm[2*steps], then of each frequency its numbers[12 + 8*steps]
 * RESULT: doubles worst[networks]
 */
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

enum { SERIES_REAL, SHUNT_REAL, SERIES_LINEAR, SHUNT_LINEAR, SERIES_RECIPROCAL, SHUNT_RECIPROCAL };
enum { BLOCK = 256, MOST_ARMS = 16 };

/* Philox4x32-10 */
static void philox(uint32_t c0, uint32_t c1, uint32_t c2, uint32_t c3, uint32_t k0, uint32_t k1, uint32_t *out) {
  for (int round = 0; round < 10; round++) {
    const uint64_t p0 = (uint64_t)0xd2511f53 * c0, p1 = (uint64_t)0xcd9e8d57 * c2;
    c0 = (uint32_t)(p1 >> 32) ^ c1 ^ k0;
    c1 = (uint32_t)p1;
    c2 = (uint32_t)(p0 >> 32) ^ c3 ^ k1;
    c3 = (uint32_t)p0;
    k0 += 0x9e3779b9;
    k1 += 0xbb67ae85;
  }
  out[0] = c0, out[1] = c1, out[2] = c2, out[3] = c3;
}

/* Uniform within the tolerance; the first group of four columns is the ends', which don't vary here. */
static void draw(double u[][MOST_ARMS + 1], int from, int count, int arms, uint32_t seed, const double *tolerance,
                 const double *inverse) {
  for (int d = 0; d < count; d++) {
    for (int first = 0; first < arms; first += 4) {
      uint32_t words[4];
      philox(from + d, 0, 1 + first / 4, 0, seed, 0, words);
      for (int k = 0; k < 4 && first + k < arms; k++) {
        const int arm = first + k;
        const double s = 1 + tolerance[arm] * (2 * ((words[k] + 0.5) / 4294967296.0) - 1);
        u[d][arm] = inverse[arm] ? 1 / s : s;
      }
    }
    u[d][arms] = 0;
  }
}

static void sweep(const double *numbers, const int *kind, const int *slot, int steps, double u[][MOST_ARMS + 1],
                  int count, double *worst) {
  for (int d = 0; d < count; d++) {
    double vr = numbers[0], vi = numbers[1], jr = numbers[4], ji = numbers[5];
    const double *n = numbers + 12;
    for (int step = 0; step < steps; step++, n += 8) {
      const double t = u[d][slot[step]];
      double p = n[0], q = n[1];
      if (kind[step] <= SHUNT_REAL) {
        p += t * n[2];
        if (kind[step] == SERIES_REAL) {
          vr += p * jr;
          vi += p * ji;
        } else {
          jr += p * vr;
          ji += p * vi;
        }
        continue;
      }
      if (kind[step] <= SHUNT_LINEAR) {
        p += t * n[2];
        q += t * n[3];
      } else {
        const double a = n[4] + t * n[6], b = n[5] + t * n[7], c = 1 / (a * a + b * b);
        p += a * c;
        q -= b * c;
      }
      if (kind[step] == SERIES_LINEAR || kind[step] == SERIES_RECIPROCAL) {
        vr += p * jr - q * ji;
        vi += p * ji + q * jr;
      } else {
        jr += p * vr - q * vi;
        ji += p * vi + q * vr;
      }
    }
    const double wr = numbers[6] * jr - numbers[7] * ji, wi = numbers[6] * ji + numbers[7] * jr;
    const double back = (vr - wr) * (vr - wr) + (vi - wi) * (vi - wi);
    const double forth = (vr + wr) * (vr + wr) + (vi + wi) * (vi + wi);
    const double found = back / forth;
    if (found > worst[d]) worst[d] = found;
  }
}

static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &t);
  return t.tv_sec + t.tv_nsec / 1e9;
}

int main(int argc, char **argv) {
  if (argc != 3) return 2;
  FILE *in = fopen(argv[1], "rb");
  int32_t head[6];
  if (!in || fread(head, sizeof head, 1, in) != 1) return 2;
  const int networks = head[0], frequencies = head[1], arms = head[2], steps = head[3];
  const size_t width = 12 + 8 * (size_t)steps, doubles = 2 * arms + 2 * steps + width * frequencies;
  double *data = malloc(doubles * sizeof *data), *worst = calloc(networks, sizeof *worst);
  int *kind = malloc(steps * sizeof *kind), *slot = malloc(steps * sizeof *slot);
  if (!data || !worst || !kind || !slot || arms > MOST_ARMS) return 2;
  if (fread(data, sizeof *data, doubles, in) != doubles) return 2;
  fclose(in);
  const double *rest = data + 2 * arms;
  for (int step = 0; step < steps; step++) kind[step] = rest[2 * step], slot[step] = rest[2 * step + 1];
  const double *numbers = rest + 2 * steps;
  static double u[BLOCK][MOST_ARMS + 1];
  double start = 0;
  /* A fifth of the work to warm up, then all of it. */
  for (int turn = 0; turn < 2; turn++) {
    const int all = turn == 0 ? networks / 5 : networks;
    if (turn == 1) start = now();
    for (int from = 0; from < all; from += BLOCK) {
      const int count = all - from < BLOCK ? all - from : BLOCK;
      draw(u, from, count, arms, head[4], data, data + arms);
      for (int k = 0; k < frequencies; k++) sweep(numbers + k * width, kind, slot, steps, u, count, worst + from);
    }
  }
  printf("%.6f\n", now() - start);
  FILE *result = fopen(argv[2], "wb");
  if (!result || fwrite(worst, sizeof *worst, networks, result) != (size_t)networks) return 2;
  return fclose(result);
}
