/*
 * A plain C loop of the demo's year, to hold the program's time against: hot water, degree hours with gains, emitters, the
 * full map with its lowest level, humidity frost, cycling, backup, auxiliaries. What depends on weather alone is prepared
 * and handed in, as it is for the program. Reads columns from the file named first, runs the year as often as the second
 * argument says, and prints nanoseconds an hour and the electricity of the year.
 *
 * Build: cc -O3 -march=native -o year year.c -lm
 */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define MAX_COLUMNS 8
#define MAX_ROWS 32

static int hours, rows, columns;
static double *outdoor, *meanSun, *frost, *draw, *cold, *hygiene;
static double rowAt[MAX_ROWS], columnAt[MAX_COLUMNS];
static double *fullCapacity, *fullEta, *leastCapacity, *leastEta;
static struct {
  double heatLoss, designLoad, setPoint, gains, aperture;
  double room, over, exponent, spread, lowest, highest;
  double highestFlow, capacityLoss, copLoss, degradation, cycleWater;
  double backup, pump, standby, crankcase, crankcaseBelow;
  double volume, waterSet, hysteresis, waterLoss, surrounding, hygieneTemperature, immersion;
} p;

static double *need, *flowOf, *heat, *electricity, *helped, *unmet, *waitingOf, *starts, *total, *share, *waterHeat,
    *waterElectricity, *waterHelp, *cylinder;

static double *column(FILE *f, int n) {
  double *c = malloc(sizeof(double) * n);
  if (!c || (f && fread(c, sizeof(double), n, f) != (size_t)n)) exit(2);
  return c;
}

static void readMap(const double *capacity, const double *eta, double t, double f, double *kW, double *cop) {
  double ht = fmin(fmax(t, rowAt[0]), rowAt[rows - 1]);
  double hf = fmin(fmax(f, columnAt[0]), columnAt[columns - 1]);
  int r = 0, c = 0;
  while (r < rows - 2 && ht >= rowAt[r + 1]) r++;
  while (c < columns - 2 && hf >= columnAt[c + 1]) c++;
  double u = (ht - rowAt[r]) / (rowAt[r + 1] - rowAt[r]);
  double v = (hf - columnAt[c]) / (columnAt[c + 1] - columnAt[c]);
  const double *ca = capacity + r * columns + c, *cb = ca + columns, *ea = eta + r * columns + c, *eb = ea + columns;
  double qa = (1 - v) * ca[0] + v * ca[1], qb = (1 - v) * cb[0] + v * cb[1];
  double share = (1 - u) * ((1 - v) * ea[0] + v * ea[1]) + u * ((1 - v) * eb[0] + v * eb[1]);
  *kW = (1 - u) * qa + u * qb;
  if (t < ht) *kW = fmax(qa - (ht - t) * fmax((qb - qa) / (rowAt[1] - rowAt[0]), 0.01 * qa), 0.3 * qa);
  double kt = fmin(t, rowAt[rows - 1] + 5), kf = fmax(f, columnAt[0]);
  *cop = share * (kf + 276.15) / fmax(kf - kt + 10, 15);
  if (f < columnAt[0]) *cop *= 1 + 0.02 * fmin(columnAt[0] - f, 10);
}

static double year(void) {
  const double c = p.volume * 1.163e-3;
  double t = p.waterSet, waiting = 0, sum = 0;
  int reheating = 0, pending = 0;
  for (int i = 0; i < hours; i++) {
    /* hot water */
    double served = fmin(draw[i], fmax(0, c * (t - cold[i])));
    double loss = p.waterLoss * (t - p.surrounding);
    double tau = 0, wh = 0, we = 0, wb = 0, kW, cop;
    t -= (served + loss) / c;
    if (hygiene[i] != 0) pending = 1;
    if (reheating || pending || t < p.waterSet - p.hysteresis) {
      double target = pending ? p.hygieneTemperature : p.waterSet;
      double reach = fmin(target, p.highestFlow - 5);
      int finished = 1;
      if (reach > t) {
        readMap(fullCapacity, fullEta, outdoor[i], (t + reach) / 2 + 5, &kW, &cop);
        kW *= 1 - fmin(p.capacityLoss * frost[i], 0.5);
        cop *= 1 - fmin(p.copLoss * frost[i], 0.5);
        double wanted = c * (reach - t);
        finished = wanted <= kW;
        wh = finished ? wanted : kW;
        tau = finished ? wanted / kW : 1;
        we = wh / cop;
      }
      double lacking = c * (target - t) - wh;
      if (finished && lacking > 0) wb = fmin(lacking, p.immersion * (1 - tau));
      t += (wh + wb) / c;
      reheating = t < target - 1e-9;
      if (!reheating) pending = 0;
    }
    share[i] = tau, waterHeat[i] = wh, waterElectricity[i] = we, waterHelp[i] = wb, cylinder[i] = t;
    /* need and flow */
    double q = p.heatLoss * fmax(0, p.setPoint - (p.gains + p.aperture * meanSun[i] / 1000) / p.heatLoss - outdoor[i]);
    double flow = 0, given = 0, e = 0, n = 0, b = 0, lack = 0;
    need[i] = q;
    if (q > 0 || waiting > 0) {
      double x = q / p.designLoad, free = 1 - tau, full, fullCop, least, leastCop;
      if ((tau > 0 || waiting > 0) && tau < 1) x = fmin(fmax(1, x), (q + waiting) / (free * p.designLoad));
      flow = fmin(fmax(p.room + p.over * pow(x, p.exponent) + x * p.spread / 2, p.lowest), p.highest);
      double f = fmin(flow, p.highestFlow);
      /* map and frost */
      readMap(fullCapacity, fullEta, outdoor[i], f, &full, &fullCop);
      readMap(leastCapacity, leastEta, outdoor[i], f, &least, &leastCop);
      double lq = fmin(p.capacityLoss * frost[i], 0.5), lc = fmin(p.copLoss * frost[i], 0.5), level = least / full;
      full *= 1 - lq, fullCop *= 1 - lc, least *= 1 - lq * level, leastCop *= 1 - lc * level;
      /* running */
      double carried = q;
      if (flow > p.highestFlow) {
        double back = flow - fmin(fmax(x, 0.2), 1) * p.spread;
        carried = q * fmin(fmax((p.highestFlow - back) / (flow - back), 0), 1);
      }
      double can = full * free, asked = carried + waiting;
      given = fmin(asked, can);
      waiting = i == hours - 1 ? 0 : fmin(fmin(asked - given, 2 * p.designLoad), waiting + full - can);
      if (given > 0) {
        int single = least >= full;
        double low = single ? full : least, lowCop = single ? fullCop : leastCop, rate = given / free;
        if (rate >= low) e = given / (single ? lowCop : lowCop + (fullCop - lowCop) * (rate - low) / (full - low));
        else {
          double on = rate / low;
          e = given / (lowCop * (1 - p.degradation * (1 - on)));
          n = fmin(6, low * on * (1 - on) * free / (p.cycleWater * 1.163e-3 * 5));
        }
      }
      double ask = q - carried + (asked - given - waiting);
      b = fmin(p.backup, fmax(0, ask));
      lack = fmax(0, ask - b);
    }
    flowOf[i] = flow, heat[i] = given, electricity[i] = e, helped[i] = b, unmet[i] = lack, waitingOf[i] = waiting, starts[i] = n;
    /* auxiliaries */
    int idle = given == 0 && tau == 0;
    total[i] = e + we + b + wb + p.pump * (q > 0 ? 1 : tau) + (idle ? p.standby : 0) +
               (idle && outdoor[i] < p.crankcaseBelow ? p.crankcase : 0);
    sum += total[i];
  }
  return sum;
}

int main(int argc, char **argv) {
  FILE *f = argc > 2 ? fopen(argv[1], "rb") : 0;
  double head[3];
  if (!f || fread(head, sizeof(double), 3, f) != 3) return 2;
  hours = (int)head[0], rows = (int)head[1], columns = (int)head[2];
  if (rows > MAX_ROWS || columns > MAX_COLUMNS || fread(&p, sizeof p, 1, f) != 1) return 2;
  if (fread(rowAt, sizeof(double), rows, f) != (size_t)rows) return 2;
  if (fread(columnAt, sizeof(double), columns, f) != (size_t)columns) return 2;
  fullCapacity = column(f, rows * columns), fullEta = column(f, rows * columns);
  leastCapacity = column(f, rows * columns), leastEta = column(f, rows * columns);
  outdoor = column(f, hours), meanSun = column(f, hours), frost = column(f, hours);
  draw = column(f, hours), cold = column(f, hours), hygiene = column(f, hours);
  double **out[] = {&need, &flowOf, &heat, &electricity, &helped, &unmet, &waitingOf, &starts, &total, &share, &waterHeat,
                    &waterElectricity, &waterHelp, &cylinder};
  for (unsigned k = 0; k < sizeof out / sizeof *out; k++) *out[k] = column(0, hours);
  int times = atoi(argv[2]);
  double sum = year();
  struct timespec a, b;
  clock_gettime(CLOCK_MONOTONIC, &a);
  for (int k = 0; k < times; k++) sum = year();
  clock_gettime(CLOCK_MONOTONIC, &b);
  double ns = (b.tv_sec - a.tv_sec) * 1e9 + (b.tv_nsec - a.tv_nsec);
  printf("%.3f %.6f\n", ns / times / hours, sum);
  return 0;
}
