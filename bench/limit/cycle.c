/*
 * The closed cycle of lib/calc/cycle, written as the equations stand: the speed to aim at.
 * Prints one line of JSON: cycles a second, and the figures of the first cycle, to be held against the library's.
 * Built by the bench with -O2; -DMERGED gathers the powers as the library does.
 */
#define _POSIX_C_SOURCE 199309L
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define PI 3.14159265358979323846
#define DEG (PI / 180)

static const double bore = 0.096, stroke = 0.084, rod = 0.137, ratio = 8.5, ivc = -120, evo = 115;
static const double rpm = 2700, p1 = 112, t1 = 370, residual = 0.06, afr = 12.8;
static const double delay = 9, duration = 68, a = 5, efficiency = 0.85, heating = 44e6;
static const double wall = 470, head = 1.2, octane = 95;

static double area, vd, vc, v1, mr, heat, gas, stir, knock_factor, start;
static double cool, wall_area;
static double still;

typedef struct { double volume, spread, cooling, motored, release; } Node;

static double travel(double theta) {
  double r = stroke / 2, s = sin(theta * DEG);
  return r * (1 - cos(theta * DEG)) + rod - sqrt(rod * rod - r * r * s * s);
}

static Node node_at(double theta, int burning) {
  Node n;
  double r = stroke / 2, s = sin(theta * DEG), c = cos(theta * DEG);
  double root = sqrt(rod * rod - r * r * s * s);
  double x = r * (1 - c) + rod - root;
  n.volume = vc + area * x;
  n.spread = area * r * DEG * s * (1 + r * c / root);
#ifdef MERGED
  double u = exp(-0.05 * log(n.volume / v1)), u2 = u * u, u4 = u2 * u2, u11 = u4 * u4 * u2 * u;
  n.cooling = cool * (wall_area + PI * bore * x) * u11;
  n.motored = p1 * u11 * u11 * u4;
#else
  n.cooling = 3.26 * pow(bore, -0.2) * (wall_area + PI * bore * x) / (6 * rpm);
  n.motored = p1 * pow(v1 / n.volume, 1.3);
#endif
  n.release = 0;
  if (burning) {
    double z = (theta - start) / duration;
    if (z < 0) z = 0;
    n.release = heat * a * 3 / duration * z * z * exp(-a * z * z * z);
  }
  return n;
}

static double loss_at(double p, const Node *n, int fired) {
  double t = p * 1000 * n->volume / mr, w = gas;
  double excess = p - n->motored;
#ifdef MERGED
  double stirred = still;
  if (fired && excess > 0) stirred = exp(0.8 * log(w + stir * excess));
  return n->cooling * sqrt(sqrt(p)) * stirred * (t - wall);
#else
  if (fired && excess > 0) w += stir * excess;
  return n->cooling * pow(p, 0.8) * pow(t, -0.55) * pow(w, 0.8) * (t - wall);
#endif
}

static double slope_at(double p, const Node *n, double loss) {
  double t = p * 1000 * n->volume / mr, gamma = 1.338 - 6e-5 * t + 1e-8 * t * t;
  return (-gamma * p * n->spread + (gamma - 1) * (n->release - loss) * 1e-3) / n->volume;
}

static double knock_at(double p) {
#ifdef MERGED
  double l = log(p / p1);
  return knock_factor * exp(1.7 * l - 3800 / t1 * exp(-0.33 / 1.33 * l));
#else
  double tu = t1 * pow(p / p1, 0.33 / 1.33);
  double tau = 17.68 * pow(octane / 100, 3.402) * pow(p / 101.325, -1.7) * exp(3800 / tu);
  return 1 / tau / (0.006 * rpm);
#endif
}

static double state[4];

static void segment(double from, double to, double step, int burning, int knocking, int fired) {
  if (!(to > from)) return;
  int steps = (int)ceil((to - from) / step - 1e-9);
  double h = (to - from) / steps, p = state[0], work = 0, heat_loss = 0, knock = 0;
  Node n0 = node_at(from, burning);
  double l1 = loss_at(p, &n0, fired), s1 = slope_at(p, &n0, l1), rate = knocking ? knock_at(p) : 0;
  for (int k = 0; k < steps; k++) {
    Node n1 = node_at(from + (k + 0.5) * h, burning), n2 = node_at(from + (k + 1) * h, burning);
    double p2 = p + h / 2 * s1, l2 = loss_at(p2, &n1, fired), s2 = slope_at(p2, &n1, l2);
    double p3 = p + h / 2 * s2, l3 = loss_at(p3, &n1, fired), s3 = slope_at(p3, &n1, l3);
    double p4 = p + h * s3, l4 = loss_at(p4, &n2, fired), s4 = slope_at(p4, &n2, l4);
    double next = p + h / 6 * (s1 + 2 * (s2 + s3) + s4);
    work += p * n0.spread + 2 * (p2 + p3) * n1.spread + p4 * n2.spread;
    heat_loss += l1 + 2 * (l2 + l3) + l4;
    l1 = loss_at(next, &n2, fired);
    double slope = slope_at(next, &n2, l1);
    if (knocking) {
      double end = knock_at(next);
      knock += rate + 4 * knock_at((p + next) / 2 + h / 8 * (s1 - slope)) + end;
      rate = end;
    }
    s1 = slope;
    p = next;
    n0 = n2;
  }
  state[0] = p;
  state[1] += work * h * 1000 / 6;
  state[2] += heat_loss * h / 6;
  state[3] += knock * h / 6;
}

static void cycle(double spark, double step) {
  area = PI / 4 * bore * bore;
  vd = area * stroke;
  vc = vd / (ratio - 1);
  v1 = vc + area * travel(ivc);
  mr = p1 * 1000 * v1 / t1;
  heat = mr / 287 * (1 - residual) / (1 + afr) * heating * efficiency;
  gas = 2.28 * 2 * stroke * rpm / 60;
  still = pow(gas, 0.8);
  stir = 3.24e-3 * vd * t1 / (p1 * v1);
  wall_area = 2 * area * head + PI * bore * vc / area;
  cool = 3.26 * pow(bore, -0.2) * pow(t1 / p1, -0.55) / (6 * rpm);
  knock_factor = pow(p1 / 101.325, 1.7) / (17.68 * pow(octane / 100, 3.402)) / (0.006 * rpm);
  start = delay - spark;
  double ninety = start + duration * pow(log(10) / a, 1.0 / 3), end = start + duration;
  state[0] = p1;
  state[1] = state[2] = state[3] = 0;
  segment(ivc, start, step, 0, 1, 0);
  segment(start, ninety, step, 1, 1, 1);
  segment(ninety, end, step, 1, 0, 1);
  segment(end, evo, step, 0, 0, 1);
}

int main(int argc, char **argv) {
  int count = argc > 1 ? atoi(argv[1]) : 20000;
  double step = argc > 2 ? atof(argv[2]) : 0.5;
  struct timespec from, to;
  double sum = 0;
  clock_gettime(CLOCK_MONOTONIC, &from);
  for (int i = 0; i < count; i++) {
    cycle(20 + (i % 100) / 10.0, step);
    sum += state[1];
  }
  clock_gettime(CLOCK_MONOTONIC, &to);
  cycle(20, step);
  printf("{\"perSecond\":%.6g,\"workJ\":%.17g,\"heatLossJ\":%.17g,\"knock\":%.17g,\"sum\":%.17g}\n",
         count / ((to.tv_sec - from.tv_sec) + 1e-9 * (to.tv_nsec - from.tv_nsec)), state[1], state[2], state[3], sum);
  return 0;
}
