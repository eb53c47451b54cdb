/* Usage: PROGRAM repeats tolerance from rows radiation matter curvature dark
   With 0 repeats it prints the rows, else the nanoseconds that each repeat took, after one that does not count. */
#define _POSIX_C_SOURCE 200809L
#include <stdio.h>
#include <stdlib.h>
#include <time.h>
#include "rows.h"

/* Of the processor, so that other processes do not count. */
static double nanoseconds(void) {
  struct timespec now;
  clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &now);
  return 1e9 * now.tv_sec + now.tv_nsec;
}

int main(int count, char **words) {
  if (count != 9) return 2;
  double number[8];
  for (int i = 0; i < 8; i++) number[i] = atof(words[i + 1]);
  const int repeats = (int)number[0], rows = (int)number[3];
  const double tolerance = number[1], from = number[2];
  const struct model m = {number[4], number[5], number[6], number[7]};
  double(*table)[COLUMNS] = malloc(rows * sizeof *table);
  if (!table) return 1;

  fill(&m, from, rows, tolerance, table);
  for (int i = 0; i < repeats; i++) {
    const double start = nanoseconds();
    fill(&m, from, rows, tolerance, table);
    printf("%.0f\n", nanoseconds() - start);
  }
  if (repeats == 0) {
    for (int i = 0; i < rows; i++) {
      for (int j = 0; j < COLUMNS; j++) printf("%.17g%c", table[i][j], j + 1 < COLUMNS ? ' ' : '\n');
    }
  }
  free(table);
  return 0;
}
