/* Factors and solves a matrix of the frame benchmark with CHOLMOD, supernodal, and prints times, operations and the backward error.
   Usage: factor FILE ROUNDS */
#include <suitesparse/cholmod.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>
#include <math.h>

static double now(void)
{
    struct timespec t;
    clock_gettime(CLOCK_MONOTONIC, &t);
    return t.tv_sec + 1e-9 * t.tv_nsec;
}

int main(int argc, char **argv)
{
    if (argc < 3) return 64;
    FILE *file = fopen(argv[1], "rb");
    int n, entries;
    if (!file || fread(&n, 4, 1, file) != 1 || fread(&entries, 4, 1, file) != 1) return 74;

    cholmod_common c;
    cholmod_start(&c);
    c.supernodal = CHOLMOD_SUPERNODAL;
    cholmod_triplet *t = cholmod_allocate_triplet(n, n, entries, -1, CHOLMOD_REAL, &c);
    for (int k = 0; k < entries; k++)
    {
        int place[2];
        double value;
        if (fread(place, 4, 2, file) != 2 || fread(&value, 8, 1, file) != 1) return 74;
        ((int *)t->i)[k] = place[0];
        ((int *)t->j)[k] = place[1];
        ((double *)t->x)[k] = value;
    }

    t->nnz = entries;
    cholmod_sparse *a = cholmod_triplet_to_sparse(t, entries, &c);
    cholmod_dense *b = cholmod_ones(n, 1, CHOLMOD_REAL, &c);
    for (int i = 0; i < n; i++) ((double *)b->x)[i] = sin(i);
    for (int round = 0; round < atoi(argv[2]); round++)
    {
        double start = now();
        cholmod_factor *l = cholmod_analyze(a, &c);
        double analysed = now();
        cholmod_factorize(a, l, &c);
        double factored = now();
        cholmod_dense *x = cholmod_solve(CHOLMOD_A, l, b, &c);
        double solved = now();
        cholmod_dense *r = cholmod_copy_dense(b, &c);
        double one[2] = {1, 0}, minus[2] = {-1, 0};
        cholmod_sdmult(a, 0, minus, one, x, r, &c);
        double error = cholmod_norm_dense(r, 0, &c) / (cholmod_norm_sparse(a, 0, &c) * cholmod_norm_dense(x, 0, &c) + cholmod_norm_dense(b, 0, &c));
        printf("cholmod unknowns %d: analyse %.3f factor %.3f solve %.3f; %.1f GFlop, %.1f M; backward %.1e\n",
               n, analysed - start, factored - analysed, solved - factored, c.fl / 1e9, c.lnz / 1e6, error);
        cholmod_free_factor(&l, &c);
        cholmod_free_dense(&x, &c);
        cholmod_free_dense(&r, &c);
    }

    return 0;
}
