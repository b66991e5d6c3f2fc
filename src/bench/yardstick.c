/* The work of SpeedOfSeries by FLINT, the yardstick of the table of speeds.
   Prints one line "task n milliseconds" for each row: the best of up to five runs.
   gcc -O2 yardstick.c -o yardstick -lflint -lgmp */
#include <stdio.h>
#include <string.h>
#include <time.h>
#include <flint/arith.h>
#include <flint/flint.h>
#include <flint/fmpq_poly.h>
#include <flint/fmpz_poly.h>
#include <flint/fmpz_vec.h>
#include <flint/nmod_poly.h>

#define PRIME 998244353UL
#define BUDGET 10.0 /* seconds after which a row is not run again */

static const char *wanted;
static flint_rand_t dice;

static double now(void)
{
    struct timespec t;
    clock_gettime(CLOCK_MONOTONIC, &t);
    return t.tv_sec + 1e-9 * t.tv_nsec;
}

static int chosen(const char *task)
{
    return wanted == NULL || strstr(task, wanted) != NULL;
}

#define MEASURE(task, n, work)                                      \
    if (chosen(task)) {                                             \
        double best_ = 1e300, spent_ = 0;                           \
        for (int run_ = 0; run_ < 5 && spent_ < BUDGET; run_++) {   \
            double start_ = now();                                  \
            work;                                                   \
            double took_ = now() - start_;                          \
            spent_ += took_;                                        \
            if (took_ < best_) best_ = took_;                       \
        }                                                           \
        printf("%s %d %.6f\n", task, n, best_ * 1e3);               \
        fflush(stdout);                                             \
    }

static void modular(int n)
{
    nmod_poly_t f, g, h;
    nmod_poly_init(f, PRIME);
    nmod_poly_init(g, PRIME);
    nmod_poly_init(h, PRIME);
    for (int i = 0; i < n; i++) {
        nmod_poly_set_coeff_ui(f, i, n_randint(dice, PRIME));
        nmod_poly_set_coeff_ui(g, i, n_randint(dice, PRIME));
    }
    nmod_poly_set_coeff_ui(f, 0, 0);
    nmod_poly_set_coeff_ui(f, 1, 3);
    MEASURE("reversionModulo", n, nmod_poly_revert_series(h, f, n))
    MEASURE("compositionModulo", n, nmod_poly_compose_series(h, g, f, n))
}

static void exponentials(int n)
{
    fmpq_poly_t t, e, less, times, h;
    fmpq_poly_init(t);
    fmpq_poly_init(e);
    fmpq_poly_init(less);
    fmpq_poly_init(times);
    fmpq_poly_init(h);
    fmpq_poly_set_coeff_si(t, 1, 1);
    fmpq_poly_exp_series(e, t, n + 1);
    fmpq_poly_set(less, e);
    fmpq_poly_set_coeff_si(less, 0, 0);
    fmpq_poly_shift_left(times, e, 1);
    fmpq_poly_truncate(times, n + 1);
    MEASURE("reversionOfTimes", n, fmpq_poly_revert_series(h, times, n + 1))
    MEASURE("reversionOfLess", n, fmpq_poly_revert_series(h, less, n + 1))
    MEASURE("compositionOfExponentials", n, fmpq_poly_compose_series(h, e, less, n + 1))
}

static void small_rationals(int n)
{
    fmpq_poly_t a, h;
    fmpq_t q;
    fmpq_poly_init(a);
    fmpq_poly_init(h);
    fmpq_init(q);
    for (int k = 1; k <= n; k++) {
        fmpq_set_si(q, (slong) n_randint(dice, 19) - 9, 1 + n_randint(dice, 9));
        fmpq_poly_set_coeff_fmpq(a, k, q);
    }
    MEASURE("exponential", n, fmpq_poly_exp_series(h, a, n + 1))
    fmpq_poly_set_coeff_si(a, 0, 1);
    MEASURE("logarithm", n, fmpq_poly_log_series(h, a, n + 1))
}

static void numbers(int n)
{
    fmpz *top = _fmpz_vec_init(n + 1), *bottom = _fmpz_vec_init(n + 1);
    fmpz *given = _fmpz_vec_init(n), *points = _fmpz_vec_init(n), *c = _fmpz_vec_init(n);
    for (int k = 0; k < n; k++) {
        fmpz_set_si(given + k, (slong) n_randlimb(dice));
        fmpz_set_si(points + k, k);
    }
    MEASURE("bernoulli", n, _arith_bernoulli_number_vec(top, bottom, n + 1))
    MEASURE("bell", n, arith_bell_number_vec(top, n + 1))
    MEASURE("stirlingFirst", n, arith_stirling_number_1_vec(top, n, n + 1))
    MEASURE("stirlingSecond", n, arith_stirling_number_2_vec(top, n, n + 1))
    MEASURE("toFalling", n, _fmpz_vec_set(c, given, n); _fmpz_poly_monomial_to_newton(c, points, n))
    MEASURE("fromFalling", n, _fmpz_vec_set(c, given, n); _fmpz_poly_newton_to_monomial(c, points, n))
}

static void words(int n)
{
    fmpz_poly_t a, b, c;
    fmpz_poly_init(a);
    fmpz_poly_init(b);
    fmpz_poly_init(c);
    for (int k = 0; k < n; k++) {
        fmpz_poly_set_coeff_si(a, k, (slong) n_randlimb(dice));
        fmpz_poly_set_coeff_si(b, k, (slong) n_randlimb(dice));
    }
    MEASURE("product", n, fmpz_poly_mul(c, a, b))
}

int main(int count, char **arguments)
{
    int largest = count > 2 ? atoi(arguments[2]) : 1 << 30;
    const int orders[] = {20, 50, 100, 200, 500, 1000, 2000};
    wanted = count > 1 && strcmp(arguments[1], "all") != 0 ? arguments[1] : NULL;
    flint_randinit(dice);
    for (int k = 10; k <= 16; k += k == 10 ? 4 : 2)
        if (1 << k <= largest) modular(1 << k);
    for (int k = 0; k < 7; k++)
        if (orders[k] <= largest) exponentials(orders[k]);
    for (int n = 500; n <= 2000 && n <= largest; n *= 4) small_rationals(n);
    for (int n = 1000; n <= 5000 && n <= largest; n *= 5) numbers(n);
    for (int n = 1000; n <= 100000 && n <= largest; n *= 100) words(n);
    return 0;
}
