/*
 * The yardstick of bench.ts: the same scheme as server/solvers on wet, regular flow, in plain C.
 *
 * stdin (binary doubles): n, dx, g, dt, steps, then fourteen arrays of n + 2 numbers in the order of
 * `given` in main. stdout: seconds of the steps, the sum of the areas, and how often a level was left. What the water of the benchmark never does
 * (leave its active level, dry out, meet an abrupt section) is tested for all the same; the program ends where it
 * matters. Both ends are walls.
 */
#define _POSIX_C_SOURCE 199309L
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_MONOTONIC, &t);
  return t.tv_sec + 1e-9 * t.tv_nsec;
}

static int n;
static int left;
static double dx, g;
static double *area, *flow, *stage, *width, *celerity, *reach, *friction, *slopeFloor;
static double *bed, *levelZ, *levelArea, *levelEnd, *levelB0, *levelB1, *levelV0, *levelV1, *levelV2;
static double *slopeStage, *slopeFlow, *fluxArea, *fluxLeft, *fluxRight;
static double *oldArea, *halfFlow, *implicitShare;

static void place(int i, double a) {
  if (a < levelArea[i] || a >= levelEnd[i] || a <= 0) left++;
  double da = a - levelArea[i], b0 = levelB0[i];
  double b = sqrt(b0 * b0 + 4 * levelB1[i] * da);
  double s = da > 0 ? 2 * da / (b0 + b) : 0;
  double quarter = 0.25 * a / b;
  double v = levelV0[i] + s * (levelV1[i] + s * levelV2[i]);
  area[i] = a;
  stage[i] = levelZ[i] + s;
  width[i] = b;
  reach[i] = quarter;
  celerity[i] = sqrt(4 * g * quarter);
  friction[i] = g / (a * v * v);
}

static void limitedSlopes(void) {
  double etaI = stage[1], etaJ = stage[2];
  double lowEta = etaJ - etaI, lowQ = flow[2] - flow[1];
  for (int i = 2; i < n; i++) {
    double etaK = stage[i + 1], highEta = etaK - etaJ, highQ = flow[i + 1] - flow[i];
    double floor = slopeFloor[i], sEta = 0, sQ = 0;
    if (etaI > floor && etaJ > floor && etaK > floor) {
      double p = lowEta * highEta;
      if (p > 0) {
        double most = 4 * reach[i];
        sEta = 2 * p / (lowEta + highEta);
        if (sEta > most) sEta = most;
        else if (sEta < -most) sEta = -most;
      }
      double q = lowQ * highQ;
      if (q > 0) sQ = 2 * q / (lowQ + highQ);
    }
    slopeStage[i] = sEta;
    slopeFlow[i] = sQ;
    etaI = etaJ;
    etaJ = etaK;
    lowEta = highEta;
    lowQ = highQ;
  }
}

static void interiorFluxes(void) {
  double halfG = 0.5 * g;
  for (int i = 1; i < n; i++) {
    int j = i + 1;
    double areaI = area[i], areaJ = area[j], etaI = stage[i], etaJ = stage[j];
    double etaL = etaI + 0.5 * slopeStage[i], etaR = etaJ - 0.5 * slopeStage[j];
    double iL = etaL - etaI, iR = etaR - etaI, jL = etaL - etaJ, jR = etaR - etaJ;
    double wI = width[i], wJ = width[j], kI = levelB1[i], kJ = levelB1[j];
    double reachI = reach[i], reachJ = reach[j];
    if (!(fabs(iL) <= reachI && fabs(iR) <= reachI && fabs(jL) <= reachJ && fabs(jR) <= reachJ)) exit(3);
    double a1 = areaI + iL * (wI + iL * kI), a2 = areaI + iR * (wI + iR * kI);
    double b1 = areaJ + jL * (wJ + jL * kJ), b2 = areaJ + jR * (wJ + jR * kJ);
    double k3 = kI * (1.0 / 3), m3 = kJ * (1.0 / 3);
    double dPi = iR * (areaI + iR * (0.5 * wI + iR * k3)) - iL * (areaI + iL * (0.5 * wI + iL * k3));
    double dPj = jR * (areaJ + jR * (0.5 * wJ + jR * m3)) - jL * (areaJ + jL * (0.5 * wJ + jL * m3));
    if (!(a1 <= 1.5 * b1 && b1 <= 1.5 * a1 && a2 <= 1.5 * b2 && b2 <= 1.5 * a2)) exit(4);
    double aL = 0.5 * (a1 + b1), aR = 0.5 * (a2 + b2);
    double qL = flow[i] + 0.5 * slopeFlow[i], qR = flow[j] - 0.5 * slopeFlow[j];
    if (fabs(iL) > 0.5 * reachI || fabs(jR) > 0.5 * reachJ) exit(5);
    double uL = qL / aL, uR = qR / aR, cI = celerity[i], cJ = celerity[j];
    double lI = uL - cI, lJ = uR - cJ, rI = uL + cI, rJ = uR + cJ;
    double sL = lI < lJ ? lI : lJ, sR = rI > rJ ? rI : rJ;
    if (sL > 0) sL = 0;
    if (sR < 0) sR = 0;
    double dAi = a2 - a1, dAj = b2 - b1, dA = fabs(dAi) < fabs(dAj) ? dAi : dAj;
    double dP = halfG * (dPi + dPj), inverse = 1 / (sR - sL), product = sL * sR;
    double momentum = (sR * qL * uL - sL * (qR * uR + dP) + product * (qR - qL)) * inverse;
    fluxArea[i] = (sR * qL - sL * qR + product * dA) * inverse;
    fluxLeft[i] = momentum + halfG * iL * (areaI + aL);
    fluxRight[i] = momentum - dP + halfG * jR * (areaJ + aR);
  }
  fluxArea[0] = fluxArea[n] = 0;
  fluxRight[0] = fluxLeft[n] = 0;
}

static double timeStep(void) {
  double fastest = 0;
  for (int i = 1; i <= n; i++) {
    double speed = fabs(flow[i]) / area[i] + celerity[i];
    if (speed > fastest) fastest = speed;
  }
  return 0.8 * dx / fastest;
}

static void limitOutflow(double dt) {
  double toFlow = dx / dt;
  for (int i = 1; i <= n; i++) {
    double left = fluxArea[i - 1], right = fluxArea[i];
    double out = (right > 0 ? right : 0) - (left < 0 ? left : 0);
    if (out > area[i] * toFlow) exit(7);
  }
}

static void predict(double dt) {
  limitOutflow(dt);
  double ratio = dt / dx;
  for (int i = 1; i <= n; i++) {
    double old = area[i], q0 = flow[i];
    oldArea[i] = old;
    double a = old - ratio * (fluxArea[i] - fluxArea[i - 1]);
    double q = q0 - ratio * (fluxLeft[i] - fluxRight[i - 1]);
    double half = 0.5 * dt * friction[i] * fabs(q0), e = half < 0.25 ? half : 0.25;
    implicitShare[i] = half < 0.25 ? 0.5 : 1 - 0.125 / half;
    halfFlow[i] = 0.5 * (q0 + q) - e * q0;
    place(i, a);
    flow[i] = stage[i] - bed[i] > 0.001 ? 2 * q / (1 + sqrt(1 + 4 * dt * friction[i] * fabs(q))) : 0;
  }
}

static void correct(double dt) {
  limitOutflow(dt);
  double ratio = dt / dx;
  for (int i = 1; i <= n; i++) {
    double a = area[i] - ratio * (fluxArea[i] - fluxArea[i - 1]);
    double q = halfFlow[i] - 0.5 * ratio * (fluxLeft[i] - fluxRight[i - 1]);
    place(i, 0.5 * (oldArea[i] + a));
    flow[i] = stage[i] - bed[i] > 0.001 ? 2 * q / (1 + sqrt(1 + 4 * dt * implicitShare[i] * friction[i] * fabs(q))) : 0;
  }
}

static double *array(int size, int isGiven) {
  double *values = calloc(size, sizeof(double));
  if (!values || (isGiven && fread(values, sizeof(double), size, stdin) != (size_t)size)) exit(2);
  return values;
}

int main(void) {
  double head[5];
  if (fread(head, sizeof(double), 5, stdin) != 5) return 2;
  n = (int)head[0];
  dx = head[1];
  g = head[2];
  double limit = head[3];
  int steps = (int)head[4], size = n + 2;
  double **given[] = {&area,   &flow,      &stage,    &width,   &slopeFloor, &bed,     &levelZ,
                      &levelArea, &levelEnd, &levelB0, &levelB1, &levelV0,    &levelV1, &levelV2};
  double **own[] = {&celerity, &reach,     &friction,  &slopeStage, &slopeFlow,       &fluxArea,
                    &fluxLeft, &fluxRight, &oldArea,   &halfFlow,   &implicitShare};
  for (int k = 0; k < 14; k++) *given[k] = array(size, 1);
  for (int k = 0; k < 11; k++) *own[k] = array(size, 0);
  for (int i = 1; i <= n; i++) place(i, area[i]);
  double began = now();
  for (int step = 0; step < steps; step++) {
    limitedSlopes();
    interiorFluxes();
    double dt = timeStep();
    if (dt > limit) dt = limit;
    predict(dt);
    limitedSlopes();
    interiorFluxes();
    correct(dt);
  }
  double seconds = now() - began, sum = 0;
  for (int i = 1; i <= n; i++) sum += area[i];
  printf("%.6f %.17g %d\n", seconds, sum, left);
  return 0;
}
