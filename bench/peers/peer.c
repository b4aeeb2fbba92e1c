// Answers timing requests on standard input, one a line, so that its rounds can be put between the rounds of others.
//   closed N | residual N | slope N      → nanoseconds an evaluation, checksum (over the rows of the file `ice`)
//   ice | vapour                         → nanoseconds a planet, number of states, for all rows of the file
//   write ice FILE | write vapour FILE   → writes for each row: number of states, then MOST temperatures
// Arguments: the two files of rows (doubles, row by row).
#include "split.h"
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

#define LOW 2.7
#define HIGH 2000.

typedef struct {
  double *rows;
  long count;
  int columns;
} table;

static table read_table(const char *name, int columns) {
  FILE *f = fopen(name, "rb");
  if (!f) exit(2);
  fseek(f, 0, SEEK_END);
  long bytes = ftell(f);
  rewind(f);
  table t = {malloc(bytes), bytes / (long)(sizeof(double) * columns), columns};
  if (fread(t.rows, 1, bytes, f) != (size_t)bytes) exit(2);
  fclose(f);
  return t;
}

// Processor time of this process: what others run at the same time is not in it.
static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &t);
  return t.tv_sec * 1e9 + t.tv_nsec;
}

__attribute__((noinline)) static double closed_form(const double *row) {
  double heating = 0.25 * row[FLUX] * (1 - row[COLD]) + row[INTERNAL];
  return sqrt(sqrt(heating / (row[EMISSIVITY] * SIGMA)));
}

__attribute__((noinline)) static double residual(const double *row, double x) {
  double open = (1 + tanh((x - row[MIDPOINT]) / row[WIDTH])) / 2;
  double albedo = row[COLD] + (row[WARM] - row[COLD]) * open;
  return row[FLUX] * (1 - albedo) / 4 + row[INTERNAL] - row[EMISSIVITY] * SIGMA * ((x * x) * (x * x));
}

__attribute__((noinline)) static double with_slope(const double *row, double x, double *slope) {
  double t = tanh((x - row[MIDPOINT]) / row[WIDTH]);
  double albedo = row[COLD] + (row[WARM] - row[COLD]) * ((1 + t) / 2);
  double sun = row[FLUX] / 4, s = row[EMISSIVITY] * SIGMA, cube = x * x * x;
  *slope = sun * (row[COLD] - row[WARM]) / 2 * (1 - t * t) / row[WIDTH] - 4 * s * cube;
  return sun * (1 - albedo) + row[INTERNAL] - s * cube * x;
}

static int solve(int is_ice, const double *row, double *out) {
  planet p = is_ice ? icy(row) : vaporous(row);
  return is_ice ? states_ice(&p, LOW, HIGH, out) : states_vapour(&p, LOW, HIGH, out);
}

static void evaluate(const char *what, long n, const table *t) {
  double total = 0, start = now();
  for (long i = 0; i < n; i++) {
    const double *row = t->rows + (i & 1023) * t->columns;
    double x = 200 + (i & 127);
    if (*what == 'c') total += closed_form(row);
    else if (*what == 'r') total += residual(row, x);
    else {
      double slope;
      total += with_slope(row, x, &slope);
      total += slope;
    }
  }
  printf("%.6g %.17g\n", (now() - start) / n, total);
}

static void time_states(int is_ice, const table *t) {
  double out[MOST], total = 0, start = now();
  long states = 0;
  for (long i = 0; i < t->count; i++) {
    int found = solve(is_ice, t->rows + i * t->columns, out);
    states += found;
    if (found) total += out[found - 1];
  }
  double each = (now() - start) / t->count;
  printf("%.6g %ld %.17g\n", each, states, total);
}

static void write_states(int is_ice, const table *t, const char *name) {
  FILE *f = fopen(name, "wb");
  if (!f) exit(2);
  for (long i = 0; i < t->count; i++) {
    double out[1 + MOST] = {0};
    out[0] = solve(is_ice, t->rows + i * t->columns, out + 1);
    fwrite(out, sizeof(double), 1 + MOST, f);
  }
  fclose(f);
  printf("0 %ld\n", t->count);
}

int main(int argc, char **argv) {
  if (argc != 3) return 2;
  table tables[2] = {read_table(argv[2], VAPOUR_COLUMNS), read_table(argv[1], ICE_COLUMNS)};
  char line[4096], what[64], which[64], name[3900];
  while (fgets(line, sizeof line, stdin)) {
    int words = sscanf(line, "%63s %63s %3899[^\n]", what, which, name);
    if (words == 3) write_states(!strcmp(which, "ice"), &tables[!strcmp(which, "ice")], name);
    else if (words == 2) evaluate(what, atol(which), &tables[1]);
    else time_states(!strcmp(what, "ice"), &tables[!strcmp(what, "ice")]);
    fflush(stdout);
  }
  return 0;
}
