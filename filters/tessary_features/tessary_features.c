/* tessary_features: the code of the bank; tessary_features.h describes it.
 *
 * The content of this folder is its maker's own. The parts that come from patchlab's
 * templates are granted to everyone for any use, without conditions or attribution.
 *
 * How it works: the picture is walked from top to bottom, once. A ring holds the
 * working values of the last 25 rows. For every stretch of tessary_features_CHUNK output pixels
 * the rows of the ring are folded (added and subtracted about the middle row) and
 * dotted with the plan's coefficients; a kernel's response is a signed sum of such
 * products. Kernels by tile transforms or at half resolution, where the plan
 * has any, take blocks of rows instead.
 * The plan: tile FFT, 1403 multiplies a pixel.
 *
 * This file includes itself once for every instruction set, with tessary_features_LANES set to the
 * floats in one vector. -Dtessary_features_MAX_LANES=1 leaves nothing but plain C.
 */
#if defined(tessary_features_LANES)

/* ============================================== read once for every instruction set */

#if tessary_features_LANES == 1
typedef float tessary_features_FN(vec);
typedef float tessary_features_FN(any);
#else
typedef float tessary_features_FN(vec) __attribute__((vector_size(4 * tessary_features_LANES)));
typedef float tessary_features_FN(any) __attribute__((vector_size(4 * tessary_features_LANES), aligned(4), may_alias));
#endif

#define tessary_features_LOAD(p) (*(const tessary_features_FN(any) *)(const void *)(p))
#define tessary_features_STORE(p, v) (*(tessary_features_FN(any) *)(void *)(p) = (v))

#if tessary_features_LANES == 16
#define tessary_features_MUL_ADD(sum, v, k) \
    ((sum) = (tessary_features_FN(vec))_mm512_fmadd_ps((__m512)(v), _mm512_set1_ps(k), (__m512)(sum)))
#define tessary_features_STREAM(p, v) _mm512_stream_ps((p), (__m512)(v))
#define tessary_features_TAKE(v, turn)                                                            \
    do {                                                                             \
        const __mmask16 m = _mm512_cmp_ps_mask((__m512)(v), (__m512)best, _CMP_GT_OQ); \
        best = (tessary_features_FN(vec))_mm512_mask_mov_ps((__m512)best, m, (__m512)(v));        \
        who = (tessary_features_FN(vec))_mm512_mask_mov_ps((__m512)who, m, _mm512_set1_ps(turn)); \
    } while (0)
#elif tessary_features_LANES == 8
#define tessary_features_MUL_ADD(sum, v, k) \
    ((sum) = (tessary_features_FN(vec))_mm256_fmadd_ps((__m256)(v), _mm256_set1_ps(k), (__m256)(sum)))
#define tessary_features_STREAM(p, v) _mm256_stream_ps((p), (__m256)(v))
#define tessary_features_TAKE(v, turn)                                                            \
    do {                                                                             \
        const __m256 m = _mm256_cmp_ps((__m256)(v), (__m256)best, _CMP_GT_OQ);       \
        best = (tessary_features_FN(vec))_mm256_blendv_ps((__m256)best, (__m256)(v), m);          \
        who = (tessary_features_FN(vec))_mm256_blendv_ps((__m256)who, _mm256_set1_ps(turn), m);   \
    } while (0)
#elif tessary_features_LANES == 4 && defined(__aarch64__)
#define tessary_features_MUL_ADD(sum, v, k) \
    ((sum) = (tessary_features_FN(vec))vfmaq_n_f32((float32x4_t)(sum), (float32x4_t)(v), (k)))
#else
#define tessary_features_MUL_ADD(sum, v, k) ((sum) += (v) * (k))
#if tessary_features_LANES == 4 && defined(__SSE2__)
#define tessary_features_STREAM(p, v) _mm_stream_ps((p), (__m128)(v))
#endif
#endif

/* Keep the largest value so far and whose it is; among equals the first stays. */
#if tessary_features_LANES == 1
#define tessary_features_TAKE(v, turn)        \
    do {                         \
        if ((v) > best) {        \
            best = (v);          \
            who = (turn);        \
        }                        \
    } while (0)
#define tessary_features_ABS(v) ((v) < 0.0f ? -(v) : (v))
#else
typedef int tessary_features_FN(bits) __attribute__((vector_size(4 * tessary_features_LANES)));
#ifndef tessary_features_TAKE
#define tessary_features_TAKE(v, turn)                                                            \
    do {                                                                             \
        const tessary_features_FN(bits) m = (v) > best;                                           \
        const tessary_features_FN(vec) t_ = (v) - (v) + (turn);                                   \
        best = (tessary_features_FN(vec))(((tessary_features_FN(bits))(v) & m) | ((tessary_features_FN(bits))best & ~m));   \
        who = (tessary_features_FN(vec))(((tessary_features_FN(bits))t_ & m) | ((tessary_features_FN(bits))who & ~m));      \
    } while (0)
#endif
#define tessary_features_ABS(v) ((tessary_features_FN(vec))((tessary_features_FN(bits))(v) & 0x7fffffff))
#endif

/* The middle row, then the sums and then the differences of the rows about it. */
static tessary_features_TARGET void tessary_features_FN(fold)(const float *const *rows, ptrdiff_t at, float *s)
{
    int j, x;
    for (x = 0; x < tessary_features_LINE; x += tessary_features_LANES) {
        tessary_features_STORE(s + x, tessary_features_LOAD(rows[tessary_features_RADIUS] + at + x));
    }
    for (j = 1; j <= tessary_features_RADIUS; ++j) {
        const float *const below = rows[tessary_features_RADIUS + j] + at;
        const float *const above = rows[tessary_features_RADIUS - j] + at;
        float *const sum = s + (ptrdiff_t)j * tessary_features_LINE;
        float *const difference = s + (ptrdiff_t)(tessary_features_RADIUS + j) * tessary_features_LINE;
        for (x = 0; x < tessary_features_LINE; x += tessary_features_LANES) {
            const tessary_features_FN(vec) b = tessary_features_LOAD(below + x), a = tessary_features_LOAD(above + x);
            tessary_features_STORE(sum + x, b + a);
            tessary_features_STORE(difference + x, b - a);
        }
    }
}

/* 5 x 13 x 13 coefficients, even in y, even in x */
static tessary_features_TARGET void tessary_features_FN(group0)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; x += 2 * tessary_features_LANES) {
        const float *k = tessary_features_group0_taps;
        tessary_features_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_features_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_features_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        tessary_features_FN(vec) a3 = {0.0f}, b3 = {0.0f};
        tessary_features_FN(vec) a4 = {0.0f}, b4 = {0.0f};
        int j, i;
        for (j = 0; j < 13; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_features_LINE + x + tessary_features_RADIUS;
            {
                const tessary_features_FN(vec) p = tessary_features_LOAD(r);
                const tessary_features_FN(vec) q = tessary_features_LOAD(r + tessary_features_LANES);
                tessary_features_MUL_ADD(a0, p, k[0]);
                tessary_features_MUL_ADD(b0, q, k[0]);
                tessary_features_MUL_ADD(a1, p, k[1]);
                tessary_features_MUL_ADD(b1, q, k[1]);
                tessary_features_MUL_ADD(a2, p, k[2]);
                tessary_features_MUL_ADD(b2, q, k[2]);
                tessary_features_MUL_ADD(a3, p, k[3]);
                tessary_features_MUL_ADD(b3, q, k[3]);
                tessary_features_MUL_ADD(a4, p, k[4]);
                tessary_features_MUL_ADD(b4, q, k[4]);
                k += 5;
            }
            for (i = 1; i < 13; ++i) {
                const tessary_features_FN(vec) p = tessary_features_LOAD(r + i) + tessary_features_LOAD(r - i);
                const tessary_features_FN(vec) q = tessary_features_LOAD(r + tessary_features_LANES + i) + tessary_features_LOAD(r + tessary_features_LANES - i);
                tessary_features_MUL_ADD(a0, p, k[0]);
                tessary_features_MUL_ADD(b0, q, k[0]);
                tessary_features_MUL_ADD(a1, p, k[1]);
                tessary_features_MUL_ADD(b1, q, k[1]);
                tessary_features_MUL_ADD(a2, p, k[2]);
                tessary_features_MUL_ADD(b2, q, k[2]);
                tessary_features_MUL_ADD(a3, p, k[3]);
                tessary_features_MUL_ADD(b3, q, k[3]);
                tessary_features_MUL_ADD(a4, p, k[4]);
                tessary_features_MUL_ADD(b4, q, k[4]);
                k += 5;
            }
        }
        tessary_features_STORE(t + 8 * tessary_features_CHUNK + x, a0);
        tessary_features_STORE(t + 8 * tessary_features_CHUNK + x + tessary_features_LANES, b0);
        tessary_features_STORE(t + 9 * tessary_features_CHUNK + x, a1);
        tessary_features_STORE(t + 9 * tessary_features_CHUNK + x + tessary_features_LANES, b1);
        tessary_features_STORE(t + 11 * tessary_features_CHUNK + x, a2);
        tessary_features_STORE(t + 11 * tessary_features_CHUNK + x + tessary_features_LANES, b2);
        tessary_features_STORE(t + 13 * tessary_features_CHUNK + x, a3);
        tessary_features_STORE(t + 13 * tessary_features_CHUNK + x + tessary_features_LANES, b3);
        tessary_features_STORE(t + 15 * tessary_features_CHUNK + x, a4);
        tessary_features_STORE(t + 15 * tessary_features_CHUNK + x + tessary_features_LANES, b4);
    }
}

/* 3 x 12 x 12 coefficients, odd in y, odd in x */
static tessary_features_TARGET void tessary_features_FN(group1)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; x += 2 * tessary_features_LANES) {
        const float *k = tessary_features_group1_taps;
        tessary_features_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_features_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_features_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        int j, i;
        for (j = 13; j < 25; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_features_LINE + x + tessary_features_RADIUS;
            for (i = 1; i < 13; ++i) {
                const tessary_features_FN(vec) p = tessary_features_LOAD(r + i) - tessary_features_LOAD(r - i);
                const tessary_features_FN(vec) q = tessary_features_LOAD(r + tessary_features_LANES + i) - tessary_features_LOAD(r + tessary_features_LANES - i);
                tessary_features_MUL_ADD(a0, p, k[0]);
                tessary_features_MUL_ADD(b0, q, k[0]);
                tessary_features_MUL_ADD(a1, p, k[1]);
                tessary_features_MUL_ADD(b1, q, k[1]);
                tessary_features_MUL_ADD(a2, p, k[2]);
                tessary_features_MUL_ADD(b2, q, k[2]);
                k += 3;
            }
        }
        tessary_features_STORE(t + 10 * tessary_features_CHUNK + x, a0);
        tessary_features_STORE(t + 10 * tessary_features_CHUNK + x + tessary_features_LANES, b0);
        tessary_features_STORE(t + 12 * tessary_features_CHUNK + x, a1);
        tessary_features_STORE(t + 12 * tessary_features_CHUNK + x + tessary_features_LANES, b1);
        tessary_features_STORE(t + 14 * tessary_features_CHUNK + x, a2);
        tessary_features_STORE(t + 14 * tessary_features_CHUNK + x + tessary_features_LANES, b2);
    }
}

/* 4 x 13 x 12 coefficients, even in y, odd in x */
static tessary_features_TARGET void tessary_features_FN(group2)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; x += 2 * tessary_features_LANES) {
        const float *k = tessary_features_group2_taps;
        tessary_features_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_features_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_features_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        tessary_features_FN(vec) a3 = {0.0f}, b3 = {0.0f};
        int j, i;
        for (j = 0; j < 13; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_features_LINE + x + tessary_features_RADIUS;
            for (i = 1; i < 13; ++i) {
                const tessary_features_FN(vec) p = tessary_features_LOAD(r + i) - tessary_features_LOAD(r - i);
                const tessary_features_FN(vec) q = tessary_features_LOAD(r + tessary_features_LANES + i) - tessary_features_LOAD(r + tessary_features_LANES - i);
                tessary_features_MUL_ADD(a0, p, k[0]);
                tessary_features_MUL_ADD(b0, q, k[0]);
                tessary_features_MUL_ADD(a1, p, k[1]);
                tessary_features_MUL_ADD(b1, q, k[1]);
                tessary_features_MUL_ADD(a2, p, k[2]);
                tessary_features_MUL_ADD(b2, q, k[2]);
                tessary_features_MUL_ADD(a3, p, k[3]);
                tessary_features_MUL_ADD(b3, q, k[3]);
                k += 4;
            }
        }
        tessary_features_STORE(t + 0 * tessary_features_CHUNK + x, a0);
        tessary_features_STORE(t + 0 * tessary_features_CHUNK + x + tessary_features_LANES, b0);
        tessary_features_STORE(t + 1 * tessary_features_CHUNK + x, a1);
        tessary_features_STORE(t + 1 * tessary_features_CHUNK + x + tessary_features_LANES, b1);
        tessary_features_STORE(t + 3 * tessary_features_CHUNK + x, a2);
        tessary_features_STORE(t + 3 * tessary_features_CHUNK + x + tessary_features_LANES, b2);
        tessary_features_STORE(t + 5 * tessary_features_CHUNK + x, a3);
        tessary_features_STORE(t + 5 * tessary_features_CHUNK + x + tessary_features_LANES, b3);
    }
}

/* 4 x 12 x 13 coefficients, odd in y, even in x */
static tessary_features_TARGET void tessary_features_FN(group3)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; x += 2 * tessary_features_LANES) {
        const float *k = tessary_features_group3_taps;
        tessary_features_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_features_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_features_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        tessary_features_FN(vec) a3 = {0.0f}, b3 = {0.0f};
        int j, i;
        for (j = 13; j < 25; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_features_LINE + x + tessary_features_RADIUS;
            {
                const tessary_features_FN(vec) p = tessary_features_LOAD(r);
                const tessary_features_FN(vec) q = tessary_features_LOAD(r + tessary_features_LANES);
                tessary_features_MUL_ADD(a0, p, k[0]);
                tessary_features_MUL_ADD(b0, q, k[0]);
                tessary_features_MUL_ADD(a1, p, k[1]);
                tessary_features_MUL_ADD(b1, q, k[1]);
                tessary_features_MUL_ADD(a2, p, k[2]);
                tessary_features_MUL_ADD(b2, q, k[2]);
                tessary_features_MUL_ADD(a3, p, k[3]);
                tessary_features_MUL_ADD(b3, q, k[3]);
                k += 4;
            }
            for (i = 1; i < 13; ++i) {
                const tessary_features_FN(vec) p = tessary_features_LOAD(r + i) + tessary_features_LOAD(r - i);
                const tessary_features_FN(vec) q = tessary_features_LOAD(r + tessary_features_LANES + i) + tessary_features_LOAD(r + tessary_features_LANES - i);
                tessary_features_MUL_ADD(a0, p, k[0]);
                tessary_features_MUL_ADD(b0, q, k[0]);
                tessary_features_MUL_ADD(a1, p, k[1]);
                tessary_features_MUL_ADD(b1, q, k[1]);
                tessary_features_MUL_ADD(a2, p, k[2]);
                tessary_features_MUL_ADD(b2, q, k[2]);
                tessary_features_MUL_ADD(a3, p, k[3]);
                tessary_features_MUL_ADD(b3, q, k[3]);
                k += 4;
            }
        }
        tessary_features_STORE(t + 2 * tessary_features_CHUNK + x, a0);
        tessary_features_STORE(t + 2 * tessary_features_CHUNK + x + tessary_features_LANES, b0);
        tessary_features_STORE(t + 4 * tessary_features_CHUNK + x, a1);
        tessary_features_STORE(t + 4 * tessary_features_CHUNK + x + tessary_features_LANES, b1);
        tessary_features_STORE(t + 6 * tessary_features_CHUNK + x, a2);
        tessary_features_STORE(t + 6 * tessary_features_CHUNK + x + tessary_features_LANES, b2);
        tessary_features_STORE(t + 7 * tessary_features_CHUNK + x, a3);
        tessary_features_STORE(t + 7 * tessary_features_CHUNK + x + tessary_features_LANES, b3);
    }
}

/* Send a stretch of a plane to the caller, past the cache where the planes are large. */
static tessary_features_TARGET void tessary_features_FN(put)(const float *from, float *to, int n, int stream)
{
    int x = 0;
#ifdef tessary_features_STREAM
    if (stream) {
        const int head = (int)(((64u - ((uintptr_t)to & 63u)) & 63u) / 4u);
        for (; x < head && x < n; ++x) to[x] = from[x];
        for (; x + tessary_features_LANES <= n; x += tessary_features_LANES) tessary_features_STREAM(to + x, tessary_features_LOAD(from + x));
    }
#else
    (void)stream;
#endif
    if (x < n) memcpy(to + x, from + x, (size_t)(n - x) * sizeof(float));
}

static tessary_features_TARGET void tessary_features_FN(responses)(const float *const *rows, ptrdiff_t at, int n,
    float *work, char *out, ptrdiff_t plane, int stream)
{
    float *const t = work + tessary_features_FOLDED; /* products */
    (void)rows;
    (void)at;
    (void)t;
    (void)out;
    (void)plane;
    (void)stream;
    (void)n;
}

/* Strength and winner of scale 0. */
static tessary_features_TARGET void tessary_features_FN(edges0)(const float *const *rows, ptrdiff_t at,
    int n, float *work, float *strength, unsigned char *orientation)
{
    float *const t = work + tessary_features_FOLDED; /* products */
    float *const top = t + 16 * tessary_features_CHUNK;
    float *const winner = top + tessary_features_CHUNK;
    int x;
    tessary_features_FN(fold)(rows, at, work);
    tessary_features_FN(group0)(work, t);
    tessary_features_FN(group1)(work, t);
    tessary_features_FN(group2)(work, t);
    tessary_features_FN(group3)(work, t);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_LANES) {
        tessary_features_FN(vec) v, best, e, o, who = {0.0f};
        e = tessary_features_LOAD(t + 8 * tessary_features_CHUNK + x);
        o = tessary_features_LOAD(t + 0 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        best = v;
        e = tessary_features_LOAD(t + 9 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 10 * tessary_features_CHUNK + x);
        o = tessary_features_LOAD(t + 1 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 2 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 1.0f);
        e = tessary_features_LOAD(t + 11 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 12 * tessary_features_CHUNK + x);
        o = tessary_features_LOAD(t + 3 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 4 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 2.0f);
        e = tessary_features_LOAD(t + 13 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 14 * tessary_features_CHUNK + x);
        o = tessary_features_LOAD(t + 5 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 6 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 3.0f);
        e = tessary_features_LOAD(t + 15 * tessary_features_CHUNK + x);
        o = tessary_features_LOAD(t + 7 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 4.0f);
        e = tessary_features_LOAD(t + 13 * tessary_features_CHUNK + x) - tessary_features_LOAD(t + 14 * tessary_features_CHUNK + x);
        o = - tessary_features_LOAD(t + 5 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 6 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 5.0f);
        e = tessary_features_LOAD(t + 11 * tessary_features_CHUNK + x) - tessary_features_LOAD(t + 12 * tessary_features_CHUNK + x);
        o = - tessary_features_LOAD(t + 3 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 4 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 6.0f);
        e = tessary_features_LOAD(t + 9 * tessary_features_CHUNK + x) - tessary_features_LOAD(t + 10 * tessary_features_CHUNK + x);
        o = - tessary_features_LOAD(t + 1 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 2 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 7.0f);
        tessary_features_STORE(top + x, best);
        tessary_features_STORE(winner + x, who);
    }
    for (x = 0; x < tessary_features_CHUNK; ++x) top[x] = sqrtf(top[x]);
    memcpy(strength, top, (size_t)n * sizeof(float));
    for (x = 0; x < n; ++x) orientation[x] = (unsigned char)winner[x];
}

/* Strengths and winners of all scales. */
static tessary_features_TARGET void tessary_features_FN(edges_all)(const float *const *rows, ptrdiff_t at, int n,
    float *work, char *strength, ptrdiff_t plane, unsigned char *orientation,
    ptrdiff_t turns)
{
    float *const t = work + tessary_features_FOLDED; /* products */
    float *const top = t + 16 * tessary_features_CHUNK;
    float *const winner = top + tessary_features_CHUNK;
    int x;
    tessary_features_FN(fold)(rows, at, work);
    tessary_features_FN(group0)(work, t);
    tessary_features_FN(group1)(work, t);
    tessary_features_FN(group2)(work, t);
    tessary_features_FN(group3)(work, t);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_LANES) {
        tessary_features_FN(vec) v, best, e, o, who = {0.0f};
        e = tessary_features_LOAD(t + 8 * tessary_features_CHUNK + x);
        o = tessary_features_LOAD(t + 0 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        best = v;
        e = tessary_features_LOAD(t + 9 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 10 * tessary_features_CHUNK + x);
        o = tessary_features_LOAD(t + 1 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 2 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 1.0f);
        e = tessary_features_LOAD(t + 11 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 12 * tessary_features_CHUNK + x);
        o = tessary_features_LOAD(t + 3 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 4 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 2.0f);
        e = tessary_features_LOAD(t + 13 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 14 * tessary_features_CHUNK + x);
        o = tessary_features_LOAD(t + 5 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 6 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 3.0f);
        e = tessary_features_LOAD(t + 15 * tessary_features_CHUNK + x);
        o = tessary_features_LOAD(t + 7 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 4.0f);
        e = tessary_features_LOAD(t + 13 * tessary_features_CHUNK + x) - tessary_features_LOAD(t + 14 * tessary_features_CHUNK + x);
        o = - tessary_features_LOAD(t + 5 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 6 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 5.0f);
        e = tessary_features_LOAD(t + 11 * tessary_features_CHUNK + x) - tessary_features_LOAD(t + 12 * tessary_features_CHUNK + x);
        o = - tessary_features_LOAD(t + 3 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 4 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 6.0f);
        e = tessary_features_LOAD(t + 9 * tessary_features_CHUNK + x) - tessary_features_LOAD(t + 10 * tessary_features_CHUNK + x);
        o = - tessary_features_LOAD(t + 1 * tessary_features_CHUNK + x) + tessary_features_LOAD(t + 2 * tessary_features_CHUNK + x);
        v = e * e + o * o;
        tessary_features_TAKE(v, 7.0f);
        tessary_features_STORE(top + x, best);
        tessary_features_STORE(winner + x, who);
    }
    for (x = 0; x < tessary_features_CHUNK; ++x) top[x] = sqrtf(top[x]);
    memcpy((float *)(void *)(strength + 0 * plane), top, (size_t)n * sizeof(float));
    for (x = 0; x < n; ++x) (orientation + 0 * turns)[x] = (unsigned char)winner[x];
}

/* ---- tile transforms */

#if tessary_features_LANES == 16
#define tessary_features_MUL_SUB(sum, v, k) \
    ((sum) = (tessary_features_FN(vec))_mm512_fnmadd_ps((__m512)(v), _mm512_set1_ps(k), (__m512)(sum)))
#elif tessary_features_LANES == 8
#define tessary_features_MUL_SUB(sum, v, k) \
    ((sum) = (tessary_features_FN(vec))_mm256_fnmadd_ps((__m256)(v), _mm256_set1_ps(k), (__m256)(sum)))
#elif tessary_features_LANES == 4 && defined(__aarch64__)
#define tessary_features_MUL_SUB(sum, v, k) \
    ((sum) = (tessary_features_FN(vec))vfmsq_n_f32((float32x4_t)(sum), (float32x4_t)(v), (k)))
#else
#define tessary_features_MUL_SUB(sum, v, k) ((sum) -= (v) * (k))
#endif

static inline tessary_features_TARGET tessary_features_FN(vec) tessary_features_FN(turn)(tessary_features_FN(vec) a, tessary_features_FN(vec) b, float c, float s)
{
    tessary_features_FN(vec) v = a * c;
    tessary_features_MUL_ADD(v, b, s);
    return v;
}

/* Columns of a block to their spectra. */
static tessary_features_TARGET void tessary_features_FN(fft_forward)(const float *x, float *s)
{
    const tessary_features_FN(vec) v0 = tessary_features_LOAD(x + 0 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v1 = tessary_features_LOAD(x + 32 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v2 = v0 + v1;
    const tessary_features_FN(vec) v3 = v0 - v1;
    const tessary_features_FN(vec) v4 = tessary_features_LOAD(x + 16 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v5 = tessary_features_LOAD(x + 48 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v6 = v4 + v5;
    const tessary_features_FN(vec) v7 = v4 - v5;
    const tessary_features_FN(vec) v8 = v2 + v6;
    const tessary_features_FN(vec) v9 = v2 - v6;
    const tessary_features_FN(vec) v10 = -v7;
    const tessary_features_FN(vec) v11 = tessary_features_LOAD(x + 8 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v12 = tessary_features_LOAD(x + 40 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v13 = v11 + v12;
    const tessary_features_FN(vec) v14 = v11 - v12;
    const tessary_features_FN(vec) v15 = tessary_features_LOAD(x + 24 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v16 = tessary_features_LOAD(x + 56 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v17 = v15 + v16;
    const tessary_features_FN(vec) v18 = v15 - v16;
    const tessary_features_FN(vec) v19 = v13 + v17;
    const tessary_features_FN(vec) v20 = v13 - v17;
    const tessary_features_FN(vec) v21 = -v18;
    const tessary_features_FN(vec) v22 = v8 + v19;
    const tessary_features_FN(vec) v23 = v8 - v19;
    const tessary_features_FN(vec) v24 = tessary_features_FN(turn)(v14, v21, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v25 = tessary_features_FN(turn)(v21, v14, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v26 = v3 + v24;
    const tessary_features_FN(vec) v27 = v10 + v25;
    const tessary_features_FN(vec) v28 = v3 - v24;
    const tessary_features_FN(vec) v29 = v25 - v10;
    const tessary_features_FN(vec) v30 = -v20;
    const tessary_features_FN(vec) v31 = tessary_features_LOAD(x + 4 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v32 = tessary_features_LOAD(x + 36 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v33 = v31 + v32;
    const tessary_features_FN(vec) v34 = v31 - v32;
    const tessary_features_FN(vec) v35 = tessary_features_LOAD(x + 20 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v36 = tessary_features_LOAD(x + 52 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v37 = v35 + v36;
    const tessary_features_FN(vec) v38 = v35 - v36;
    const tessary_features_FN(vec) v39 = v33 + v37;
    const tessary_features_FN(vec) v40 = v33 - v37;
    const tessary_features_FN(vec) v41 = -v38;
    const tessary_features_FN(vec) v42 = tessary_features_LOAD(x + 12 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v43 = tessary_features_LOAD(x + 44 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v44 = v42 + v43;
    const tessary_features_FN(vec) v45 = v42 - v43;
    const tessary_features_FN(vec) v46 = tessary_features_LOAD(x + 28 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v47 = tessary_features_LOAD(x + 60 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v48 = v46 + v47;
    const tessary_features_FN(vec) v49 = v46 - v47;
    const tessary_features_FN(vec) v50 = v44 + v48;
    const tessary_features_FN(vec) v51 = v44 - v48;
    const tessary_features_FN(vec) v52 = -v49;
    const tessary_features_FN(vec) v53 = v39 + v50;
    const tessary_features_FN(vec) v54 = v39 - v50;
    const tessary_features_FN(vec) v55 = tessary_features_FN(turn)(v45, v52, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v56 = tessary_features_FN(turn)(v52, v45, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v57 = v34 + v55;
    const tessary_features_FN(vec) v58 = v41 + v56;
    const tessary_features_FN(vec) v59 = v34 - v55;
    const tessary_features_FN(vec) v60 = v56 - v41;
    const tessary_features_FN(vec) v61 = -v51;
    const tessary_features_FN(vec) v62 = v22 + v53;
    const tessary_features_FN(vec) v63 = v22 - v53;
    const tessary_features_FN(vec) v64 = tessary_features_FN(turn)(v57, v58, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v65 = tessary_features_FN(turn)(v58, v57, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v66 = v26 + v64;
    const tessary_features_FN(vec) v67 = v27 + v65;
    const tessary_features_FN(vec) v68 = v26 - v64;
    const tessary_features_FN(vec) v69 = v65 - v27;
    const tessary_features_FN(vec) v70 = tessary_features_FN(turn)(v40, v61, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v71 = tessary_features_FN(turn)(v61, v40, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v72 = v9 + v70;
    const tessary_features_FN(vec) v73 = v30 + v71;
    const tessary_features_FN(vec) v74 = v9 - v70;
    const tessary_features_FN(vec) v75 = v71 - v30;
    const tessary_features_FN(vec) v76 = tessary_features_FN(turn)(v59, v60, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v77 = tessary_features_FN(turn)(v60, v59, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v78 = v28 + v76;
    const tessary_features_FN(vec) v79 = v29 + v77;
    const tessary_features_FN(vec) v80 = v28 - v76;
    const tessary_features_FN(vec) v81 = v77 - v29;
    const tessary_features_FN(vec) v82 = -v54;
    const tessary_features_FN(vec) v83 = tessary_features_LOAD(x + 2 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v84 = tessary_features_LOAD(x + 34 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v85 = v83 + v84;
    const tessary_features_FN(vec) v86 = v83 - v84;
    const tessary_features_FN(vec) v87 = tessary_features_LOAD(x + 18 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v88 = tessary_features_LOAD(x + 50 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v89 = v87 + v88;
    const tessary_features_FN(vec) v90 = v87 - v88;
    const tessary_features_FN(vec) v91 = v85 + v89;
    const tessary_features_FN(vec) v92 = v85 - v89;
    const tessary_features_FN(vec) v93 = -v90;
    const tessary_features_FN(vec) v94 = tessary_features_LOAD(x + 10 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v95 = tessary_features_LOAD(x + 42 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v96 = v94 + v95;
    const tessary_features_FN(vec) v97 = v94 - v95;
    const tessary_features_FN(vec) v98 = tessary_features_LOAD(x + 26 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v99 = tessary_features_LOAD(x + 58 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v100 = v98 + v99;
    const tessary_features_FN(vec) v101 = v98 - v99;
    const tessary_features_FN(vec) v102 = v96 + v100;
    const tessary_features_FN(vec) v103 = v96 - v100;
    const tessary_features_FN(vec) v104 = -v101;
    const tessary_features_FN(vec) v105 = v91 + v102;
    const tessary_features_FN(vec) v106 = v91 - v102;
    const tessary_features_FN(vec) v107 = tessary_features_FN(turn)(v97, v104, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v108 = tessary_features_FN(turn)(v104, v97, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v109 = v86 + v107;
    const tessary_features_FN(vec) v110 = v93 + v108;
    const tessary_features_FN(vec) v111 = v86 - v107;
    const tessary_features_FN(vec) v112 = v108 - v93;
    const tessary_features_FN(vec) v113 = -v103;
    const tessary_features_FN(vec) v114 = tessary_features_LOAD(x + 6 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v115 = tessary_features_LOAD(x + 38 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v116 = v114 + v115;
    const tessary_features_FN(vec) v117 = v114 - v115;
    const tessary_features_FN(vec) v118 = tessary_features_LOAD(x + 22 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v119 = tessary_features_LOAD(x + 54 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v120 = v118 + v119;
    const tessary_features_FN(vec) v121 = v118 - v119;
    const tessary_features_FN(vec) v122 = v116 + v120;
    const tessary_features_FN(vec) v123 = v116 - v120;
    const tessary_features_FN(vec) v124 = -v121;
    const tessary_features_FN(vec) v125 = tessary_features_LOAD(x + 14 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v126 = tessary_features_LOAD(x + 46 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v127 = v125 + v126;
    const tessary_features_FN(vec) v128 = v125 - v126;
    const tessary_features_FN(vec) v129 = tessary_features_LOAD(x + 30 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v130 = tessary_features_LOAD(x + 62 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v131 = v129 + v130;
    const tessary_features_FN(vec) v132 = v129 - v130;
    const tessary_features_FN(vec) v133 = v127 + v131;
    const tessary_features_FN(vec) v134 = v127 - v131;
    const tessary_features_FN(vec) v135 = -v132;
    const tessary_features_FN(vec) v136 = v122 + v133;
    const tessary_features_FN(vec) v137 = v122 - v133;
    const tessary_features_FN(vec) v138 = tessary_features_FN(turn)(v128, v135, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v139 = tessary_features_FN(turn)(v135, v128, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v140 = v117 + v138;
    const tessary_features_FN(vec) v141 = v124 + v139;
    const tessary_features_FN(vec) v142 = v117 - v138;
    const tessary_features_FN(vec) v143 = v139 - v124;
    const tessary_features_FN(vec) v144 = -v134;
    const tessary_features_FN(vec) v145 = v105 + v136;
    const tessary_features_FN(vec) v146 = v105 - v136;
    const tessary_features_FN(vec) v147 = tessary_features_FN(turn)(v140, v141, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v148 = tessary_features_FN(turn)(v141, v140, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v149 = v109 + v147;
    const tessary_features_FN(vec) v150 = v110 + v148;
    const tessary_features_FN(vec) v151 = v109 - v147;
    const tessary_features_FN(vec) v152 = v148 - v110;
    const tessary_features_FN(vec) v153 = tessary_features_FN(turn)(v123, v144, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v154 = tessary_features_FN(turn)(v144, v123, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v155 = v92 + v153;
    const tessary_features_FN(vec) v156 = v113 + v154;
    const tessary_features_FN(vec) v157 = v92 - v153;
    const tessary_features_FN(vec) v158 = v154 - v113;
    const tessary_features_FN(vec) v159 = tessary_features_FN(turn)(v142, v143, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v160 = tessary_features_FN(turn)(v143, v142, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v161 = v111 + v159;
    const tessary_features_FN(vec) v162 = v112 + v160;
    const tessary_features_FN(vec) v163 = v111 - v159;
    const tessary_features_FN(vec) v164 = v160 - v112;
    const tessary_features_FN(vec) v165 = -v137;
    const tessary_features_FN(vec) v166 = v62 + v145;
    const tessary_features_FN(vec) v167 = v62 - v145;
    const tessary_features_FN(vec) v168 = tessary_features_FN(turn)(v149, v150, 0.980785251f, 0.195090324f);
    const tessary_features_FN(vec) v169 = tessary_features_FN(turn)(v150, v149, 0.980785251f, -0.195090324f);
    const tessary_features_FN(vec) v170 = v66 + v168;
    const tessary_features_FN(vec) v171 = v67 + v169;
    const tessary_features_FN(vec) v172 = v66 - v168;
    const tessary_features_FN(vec) v173 = v169 - v67;
    const tessary_features_FN(vec) v174 = tessary_features_FN(turn)(v155, v156, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v175 = tessary_features_FN(turn)(v156, v155, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v176 = v72 + v174;
    const tessary_features_FN(vec) v177 = v73 + v175;
    const tessary_features_FN(vec) v178 = v72 - v174;
    const tessary_features_FN(vec) v179 = v175 - v73;
    const tessary_features_FN(vec) v180 = tessary_features_FN(turn)(v161, v162, 0.831469595f, 0.555570245f);
    const tessary_features_FN(vec) v181 = tessary_features_FN(turn)(v162, v161, 0.831469595f, -0.555570245f);
    const tessary_features_FN(vec) v182 = v78 + v180;
    const tessary_features_FN(vec) v183 = v79 + v181;
    const tessary_features_FN(vec) v184 = v78 - v180;
    const tessary_features_FN(vec) v185 = v181 - v79;
    const tessary_features_FN(vec) v186 = tessary_features_FN(turn)(v106, v165, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v187 = tessary_features_FN(turn)(v165, v106, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v188 = v23 + v186;
    const tessary_features_FN(vec) v189 = v82 + v187;
    const tessary_features_FN(vec) v190 = v23 - v186;
    const tessary_features_FN(vec) v191 = v187 - v82;
    const tessary_features_FN(vec) v192 = tessary_features_FN(turn)(v163, v164, 0.555570245f, 0.831469595f);
    const tessary_features_FN(vec) v193 = tessary_features_FN(turn)(v164, v163, 0.555570245f, -0.831469595f);
    const tessary_features_FN(vec) v194 = v80 + v192;
    const tessary_features_FN(vec) v195 = v81 + v193;
    const tessary_features_FN(vec) v196 = v80 - v192;
    const tessary_features_FN(vec) v197 = v193 - v81;
    const tessary_features_FN(vec) v198 = tessary_features_FN(turn)(v157, v158, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v199 = tessary_features_FN(turn)(v158, v157, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v200 = v74 + v198;
    const tessary_features_FN(vec) v201 = v75 + v199;
    const tessary_features_FN(vec) v202 = v74 - v198;
    const tessary_features_FN(vec) v203 = v199 - v75;
    const tessary_features_FN(vec) v204 = tessary_features_FN(turn)(v151, v152, 0.195090324f, 0.980785251f);
    const tessary_features_FN(vec) v205 = tessary_features_FN(turn)(v152, v151, 0.195090324f, -0.980785251f);
    const tessary_features_FN(vec) v206 = v68 + v204;
    const tessary_features_FN(vec) v207 = v69 + v205;
    const tessary_features_FN(vec) v208 = v68 - v204;
    const tessary_features_FN(vec) v209 = v205 - v69;
    const tessary_features_FN(vec) v210 = -v146;
    const tessary_features_FN(vec) v211 = tessary_features_LOAD(x + 1 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v212 = tessary_features_LOAD(x + 33 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v213 = v211 + v212;
    const tessary_features_FN(vec) v214 = v211 - v212;
    const tessary_features_FN(vec) v215 = tessary_features_LOAD(x + 17 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v216 = tessary_features_LOAD(x + 49 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v217 = v215 + v216;
    const tessary_features_FN(vec) v218 = v215 - v216;
    const tessary_features_FN(vec) v219 = v213 + v217;
    const tessary_features_FN(vec) v220 = v213 - v217;
    const tessary_features_FN(vec) v221 = -v218;
    const tessary_features_FN(vec) v222 = tessary_features_LOAD(x + 9 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v223 = tessary_features_LOAD(x + 41 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v224 = v222 + v223;
    const tessary_features_FN(vec) v225 = v222 - v223;
    const tessary_features_FN(vec) v226 = tessary_features_LOAD(x + 25 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v227 = tessary_features_LOAD(x + 57 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v228 = v226 + v227;
    const tessary_features_FN(vec) v229 = v226 - v227;
    const tessary_features_FN(vec) v230 = v224 + v228;
    const tessary_features_FN(vec) v231 = v224 - v228;
    const tessary_features_FN(vec) v232 = -v229;
    const tessary_features_FN(vec) v233 = v219 + v230;
    const tessary_features_FN(vec) v234 = v219 - v230;
    const tessary_features_FN(vec) v235 = tessary_features_FN(turn)(v225, v232, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v236 = tessary_features_FN(turn)(v232, v225, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v237 = v214 + v235;
    const tessary_features_FN(vec) v238 = v221 + v236;
    const tessary_features_FN(vec) v239 = v214 - v235;
    const tessary_features_FN(vec) v240 = v236 - v221;
    const tessary_features_FN(vec) v241 = -v231;
    const tessary_features_FN(vec) v242 = tessary_features_LOAD(x + 5 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v243 = tessary_features_LOAD(x + 37 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v244 = v242 + v243;
    const tessary_features_FN(vec) v245 = v242 - v243;
    const tessary_features_FN(vec) v246 = tessary_features_LOAD(x + 21 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v247 = tessary_features_LOAD(x + 53 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v248 = v246 + v247;
    const tessary_features_FN(vec) v249 = v246 - v247;
    const tessary_features_FN(vec) v250 = v244 + v248;
    const tessary_features_FN(vec) v251 = v244 - v248;
    const tessary_features_FN(vec) v252 = -v249;
    const tessary_features_FN(vec) v253 = tessary_features_LOAD(x + 13 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v254 = tessary_features_LOAD(x + 45 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v255 = v253 + v254;
    const tessary_features_FN(vec) v256 = v253 - v254;
    const tessary_features_FN(vec) v257 = tessary_features_LOAD(x + 29 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v258 = tessary_features_LOAD(x + 61 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v259 = v257 + v258;
    const tessary_features_FN(vec) v260 = v257 - v258;
    const tessary_features_FN(vec) v261 = v255 + v259;
    const tessary_features_FN(vec) v262 = v255 - v259;
    const tessary_features_FN(vec) v263 = -v260;
    const tessary_features_FN(vec) v264 = v250 + v261;
    const tessary_features_FN(vec) v265 = v250 - v261;
    const tessary_features_FN(vec) v266 = tessary_features_FN(turn)(v256, v263, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v267 = tessary_features_FN(turn)(v263, v256, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v268 = v245 + v266;
    const tessary_features_FN(vec) v269 = v252 + v267;
    const tessary_features_FN(vec) v270 = v245 - v266;
    const tessary_features_FN(vec) v271 = v267 - v252;
    const tessary_features_FN(vec) v272 = -v262;
    const tessary_features_FN(vec) v273 = v233 + v264;
    const tessary_features_FN(vec) v274 = v233 - v264;
    const tessary_features_FN(vec) v275 = tessary_features_FN(turn)(v268, v269, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v276 = tessary_features_FN(turn)(v269, v268, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v277 = v237 + v275;
    const tessary_features_FN(vec) v278 = v238 + v276;
    const tessary_features_FN(vec) v279 = v237 - v275;
    const tessary_features_FN(vec) v280 = v276 - v238;
    const tessary_features_FN(vec) v281 = tessary_features_FN(turn)(v251, v272, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v282 = tessary_features_FN(turn)(v272, v251, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v283 = v220 + v281;
    const tessary_features_FN(vec) v284 = v241 + v282;
    const tessary_features_FN(vec) v285 = v220 - v281;
    const tessary_features_FN(vec) v286 = v282 - v241;
    const tessary_features_FN(vec) v287 = tessary_features_FN(turn)(v270, v271, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v288 = tessary_features_FN(turn)(v271, v270, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v289 = v239 + v287;
    const tessary_features_FN(vec) v290 = v240 + v288;
    const tessary_features_FN(vec) v291 = v239 - v287;
    const tessary_features_FN(vec) v292 = v288 - v240;
    const tessary_features_FN(vec) v293 = -v265;
    const tessary_features_FN(vec) v294 = tessary_features_LOAD(x + 3 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v295 = tessary_features_LOAD(x + 35 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v296 = v294 + v295;
    const tessary_features_FN(vec) v297 = v294 - v295;
    const tessary_features_FN(vec) v298 = tessary_features_LOAD(x + 19 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v299 = tessary_features_LOAD(x + 51 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v300 = v298 + v299;
    const tessary_features_FN(vec) v301 = v298 - v299;
    const tessary_features_FN(vec) v302 = v296 + v300;
    const tessary_features_FN(vec) v303 = v296 - v300;
    const tessary_features_FN(vec) v304 = -v301;
    const tessary_features_FN(vec) v305 = tessary_features_LOAD(x + 11 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v306 = tessary_features_LOAD(x + 43 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v307 = v305 + v306;
    const tessary_features_FN(vec) v308 = v305 - v306;
    const tessary_features_FN(vec) v309 = tessary_features_LOAD(x + 27 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v310 = tessary_features_LOAD(x + 59 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v311 = v309 + v310;
    const tessary_features_FN(vec) v312 = v309 - v310;
    const tessary_features_FN(vec) v313 = v307 + v311;
    const tessary_features_FN(vec) v314 = v307 - v311;
    const tessary_features_FN(vec) v315 = -v312;
    const tessary_features_FN(vec) v316 = v302 + v313;
    const tessary_features_FN(vec) v317 = v302 - v313;
    const tessary_features_FN(vec) v318 = tessary_features_FN(turn)(v308, v315, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v319 = tessary_features_FN(turn)(v315, v308, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v320 = v297 + v318;
    const tessary_features_FN(vec) v321 = v304 + v319;
    const tessary_features_FN(vec) v322 = v297 - v318;
    const tessary_features_FN(vec) v323 = v319 - v304;
    const tessary_features_FN(vec) v324 = -v314;
    const tessary_features_FN(vec) v325 = tessary_features_LOAD(x + 7 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v326 = tessary_features_LOAD(x + 39 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v327 = v325 + v326;
    const tessary_features_FN(vec) v328 = v325 - v326;
    const tessary_features_FN(vec) v329 = tessary_features_LOAD(x + 23 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v330 = tessary_features_LOAD(x + 55 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v331 = v329 + v330;
    const tessary_features_FN(vec) v332 = v329 - v330;
    const tessary_features_FN(vec) v333 = v327 + v331;
    const tessary_features_FN(vec) v334 = v327 - v331;
    const tessary_features_FN(vec) v335 = -v332;
    const tessary_features_FN(vec) v336 = tessary_features_LOAD(x + 15 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v337 = tessary_features_LOAD(x + 47 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v338 = v336 + v337;
    const tessary_features_FN(vec) v339 = v336 - v337;
    const tessary_features_FN(vec) v340 = tessary_features_LOAD(x + 31 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v341 = tessary_features_LOAD(x + 63 * tessary_features_FFT_ROW);
    const tessary_features_FN(vec) v342 = v340 + v341;
    const tessary_features_FN(vec) v343 = v340 - v341;
    const tessary_features_FN(vec) v344 = v338 + v342;
    const tessary_features_FN(vec) v345 = v338 - v342;
    const tessary_features_FN(vec) v346 = -v343;
    const tessary_features_FN(vec) v347 = v333 + v344;
    const tessary_features_FN(vec) v348 = v333 - v344;
    const tessary_features_FN(vec) v349 = tessary_features_FN(turn)(v339, v346, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v350 = tessary_features_FN(turn)(v346, v339, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v351 = v328 + v349;
    const tessary_features_FN(vec) v352 = v335 + v350;
    const tessary_features_FN(vec) v353 = v328 - v349;
    const tessary_features_FN(vec) v354 = v350 - v335;
    const tessary_features_FN(vec) v355 = -v345;
    const tessary_features_FN(vec) v356 = v316 + v347;
    const tessary_features_FN(vec) v357 = v316 - v347;
    const tessary_features_FN(vec) v358 = tessary_features_FN(turn)(v351, v352, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v359 = tessary_features_FN(turn)(v352, v351, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v360 = v320 + v358;
    const tessary_features_FN(vec) v361 = v321 + v359;
    const tessary_features_FN(vec) v362 = v320 - v358;
    const tessary_features_FN(vec) v363 = v359 - v321;
    const tessary_features_FN(vec) v364 = tessary_features_FN(turn)(v334, v355, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v365 = tessary_features_FN(turn)(v355, v334, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v366 = v303 + v364;
    const tessary_features_FN(vec) v367 = v324 + v365;
    const tessary_features_FN(vec) v368 = v303 - v364;
    const tessary_features_FN(vec) v369 = v365 - v324;
    const tessary_features_FN(vec) v370 = tessary_features_FN(turn)(v353, v354, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v371 = tessary_features_FN(turn)(v354, v353, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v372 = v322 + v370;
    const tessary_features_FN(vec) v373 = v323 + v371;
    const tessary_features_FN(vec) v374 = v322 - v370;
    const tessary_features_FN(vec) v375 = v371 - v323;
    const tessary_features_FN(vec) v376 = -v348;
    const tessary_features_FN(vec) v377 = v273 + v356;
    const tessary_features_FN(vec) v378 = v273 - v356;
    const tessary_features_FN(vec) v379 = tessary_features_FN(turn)(v360, v361, 0.980785251f, 0.195090324f);
    const tessary_features_FN(vec) v380 = tessary_features_FN(turn)(v361, v360, 0.980785251f, -0.195090324f);
    const tessary_features_FN(vec) v381 = v277 + v379;
    const tessary_features_FN(vec) v382 = v278 + v380;
    const tessary_features_FN(vec) v383 = v277 - v379;
    const tessary_features_FN(vec) v384 = v380 - v278;
    const tessary_features_FN(vec) v385 = tessary_features_FN(turn)(v366, v367, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v386 = tessary_features_FN(turn)(v367, v366, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v387 = v283 + v385;
    const tessary_features_FN(vec) v388 = v284 + v386;
    const tessary_features_FN(vec) v389 = v283 - v385;
    const tessary_features_FN(vec) v390 = v386 - v284;
    const tessary_features_FN(vec) v391 = tessary_features_FN(turn)(v372, v373, 0.831469595f, 0.555570245f);
    const tessary_features_FN(vec) v392 = tessary_features_FN(turn)(v373, v372, 0.831469595f, -0.555570245f);
    const tessary_features_FN(vec) v393 = v289 + v391;
    const tessary_features_FN(vec) v394 = v290 + v392;
    const tessary_features_FN(vec) v395 = v289 - v391;
    const tessary_features_FN(vec) v396 = v392 - v290;
    const tessary_features_FN(vec) v397 = tessary_features_FN(turn)(v317, v376, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v398 = tessary_features_FN(turn)(v376, v317, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v399 = v234 + v397;
    const tessary_features_FN(vec) v400 = v293 + v398;
    const tessary_features_FN(vec) v401 = v234 - v397;
    const tessary_features_FN(vec) v402 = v398 - v293;
    const tessary_features_FN(vec) v403 = tessary_features_FN(turn)(v374, v375, 0.555570245f, 0.831469595f);
    const tessary_features_FN(vec) v404 = tessary_features_FN(turn)(v375, v374, 0.555570245f, -0.831469595f);
    const tessary_features_FN(vec) v405 = v291 + v403;
    const tessary_features_FN(vec) v406 = v292 + v404;
    const tessary_features_FN(vec) v407 = v291 - v403;
    const tessary_features_FN(vec) v408 = v404 - v292;
    const tessary_features_FN(vec) v409 = tessary_features_FN(turn)(v368, v369, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v410 = tessary_features_FN(turn)(v369, v368, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v411 = v285 + v409;
    const tessary_features_FN(vec) v412 = v286 + v410;
    const tessary_features_FN(vec) v413 = v285 - v409;
    const tessary_features_FN(vec) v414 = v410 - v286;
    const tessary_features_FN(vec) v415 = tessary_features_FN(turn)(v362, v363, 0.195090324f, 0.980785251f);
    const tessary_features_FN(vec) v416 = tessary_features_FN(turn)(v363, v362, 0.195090324f, -0.980785251f);
    const tessary_features_FN(vec) v417 = v279 + v415;
    const tessary_features_FN(vec) v418 = v280 + v416;
    const tessary_features_FN(vec) v419 = v279 - v415;
    const tessary_features_FN(vec) v420 = v416 - v280;
    const tessary_features_FN(vec) v421 = -v357;
    const tessary_features_FN(vec) v422 = v166 + v377;
    const tessary_features_FN(vec) v423 = v166 - v377;
    const tessary_features_FN(vec) v424 = tessary_features_FN(turn)(v381, v382, 0.99518472f, 0.0980171412f);
    const tessary_features_FN(vec) v425 = tessary_features_FN(turn)(v382, v381, 0.99518472f, -0.0980171412f);
    const tessary_features_FN(vec) v426 = v170 + v424;
    const tessary_features_FN(vec) v427 = v171 + v425;
    const tessary_features_FN(vec) v428 = v170 - v424;
    const tessary_features_FN(vec) v429 = v425 - v171;
    const tessary_features_FN(vec) v430 = tessary_features_FN(turn)(v387, v388, 0.980785251f, 0.195090324f);
    const tessary_features_FN(vec) v431 = tessary_features_FN(turn)(v388, v387, 0.980785251f, -0.195090324f);
    const tessary_features_FN(vec) v432 = v176 + v430;
    const tessary_features_FN(vec) v433 = v177 + v431;
    const tessary_features_FN(vec) v434 = v176 - v430;
    const tessary_features_FN(vec) v435 = v431 - v177;
    const tessary_features_FN(vec) v436 = tessary_features_FN(turn)(v393, v394, 0.956940353f, 0.290284663f);
    const tessary_features_FN(vec) v437 = tessary_features_FN(turn)(v394, v393, 0.956940353f, -0.290284663f);
    const tessary_features_FN(vec) v438 = v182 + v436;
    const tessary_features_FN(vec) v439 = v183 + v437;
    const tessary_features_FN(vec) v440 = v182 - v436;
    const tessary_features_FN(vec) v441 = v437 - v183;
    const tessary_features_FN(vec) v442 = tessary_features_FN(turn)(v399, v400, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v443 = tessary_features_FN(turn)(v400, v399, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v444 = v188 + v442;
    const tessary_features_FN(vec) v445 = v189 + v443;
    const tessary_features_FN(vec) v446 = v188 - v442;
    const tessary_features_FN(vec) v447 = v443 - v189;
    const tessary_features_FN(vec) v448 = tessary_features_FN(turn)(v405, v406, 0.881921291f, 0.471396744f);
    const tessary_features_FN(vec) v449 = tessary_features_FN(turn)(v406, v405, 0.881921291f, -0.471396744f);
    const tessary_features_FN(vec) v450 = v194 + v448;
    const tessary_features_FN(vec) v451 = v195 + v449;
    const tessary_features_FN(vec) v452 = v194 - v448;
    const tessary_features_FN(vec) v453 = v449 - v195;
    const tessary_features_FN(vec) v454 = tessary_features_FN(turn)(v411, v412, 0.831469595f, 0.555570245f);
    const tessary_features_FN(vec) v455 = tessary_features_FN(turn)(v412, v411, 0.831469595f, -0.555570245f);
    const tessary_features_FN(vec) v456 = v200 + v454;
    const tessary_features_FN(vec) v457 = v201 + v455;
    const tessary_features_FN(vec) v458 = v200 - v454;
    const tessary_features_FN(vec) v459 = v455 - v201;
    const tessary_features_FN(vec) v460 = tessary_features_FN(turn)(v417, v418, 0.773010433f, 0.634393275f);
    const tessary_features_FN(vec) v461 = tessary_features_FN(turn)(v418, v417, 0.773010433f, -0.634393275f);
    const tessary_features_FN(vec) v462 = v206 + v460;
    const tessary_features_FN(vec) v463 = v207 + v461;
    const tessary_features_FN(vec) v464 = v206 - v460;
    const tessary_features_FN(vec) v465 = v461 - v207;
    const tessary_features_FN(vec) v466 = tessary_features_FN(turn)(v274, v421, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v467 = tessary_features_FN(turn)(v421, v274, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v468 = v63 + v466;
    const tessary_features_FN(vec) v469 = v210 + v467;
    const tessary_features_FN(vec) v470 = v63 - v466;
    const tessary_features_FN(vec) v471 = v467 - v210;
    const tessary_features_FN(vec) v472 = tessary_features_FN(turn)(v419, v420, 0.634393275f, 0.773010433f);
    const tessary_features_FN(vec) v473 = tessary_features_FN(turn)(v420, v419, 0.634393275f, -0.773010433f);
    const tessary_features_FN(vec) v474 = v208 + v472;
    const tessary_features_FN(vec) v475 = v209 + v473;
    const tessary_features_FN(vec) v476 = v208 - v472;
    const tessary_features_FN(vec) v477 = v473 - v209;
    const tessary_features_FN(vec) v478 = tessary_features_FN(turn)(v413, v414, 0.555570245f, 0.831469595f);
    const tessary_features_FN(vec) v479 = tessary_features_FN(turn)(v414, v413, 0.555570245f, -0.831469595f);
    const tessary_features_FN(vec) v480 = v202 + v478;
    const tessary_features_FN(vec) v481 = v203 + v479;
    const tessary_features_FN(vec) v482 = v202 - v478;
    const tessary_features_FN(vec) v483 = v479 - v203;
    const tessary_features_FN(vec) v484 = tessary_features_FN(turn)(v407, v408, 0.471396744f, 0.881921291f);
    const tessary_features_FN(vec) v485 = tessary_features_FN(turn)(v408, v407, 0.471396744f, -0.881921291f);
    const tessary_features_FN(vec) v486 = v196 + v484;
    const tessary_features_FN(vec) v487 = v197 + v485;
    const tessary_features_FN(vec) v488 = v196 - v484;
    const tessary_features_FN(vec) v489 = v485 - v197;
    const tessary_features_FN(vec) v490 = tessary_features_FN(turn)(v401, v402, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v491 = tessary_features_FN(turn)(v402, v401, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v492 = v190 + v490;
    const tessary_features_FN(vec) v493 = v191 + v491;
    const tessary_features_FN(vec) v494 = v190 - v490;
    const tessary_features_FN(vec) v495 = v491 - v191;
    const tessary_features_FN(vec) v496 = tessary_features_FN(turn)(v395, v396, 0.290284663f, 0.956940353f);
    const tessary_features_FN(vec) v497 = tessary_features_FN(turn)(v396, v395, 0.290284663f, -0.956940353f);
    const tessary_features_FN(vec) v498 = v184 + v496;
    const tessary_features_FN(vec) v499 = v185 + v497;
    const tessary_features_FN(vec) v500 = v184 - v496;
    const tessary_features_FN(vec) v501 = v497 - v185;
    const tessary_features_FN(vec) v502 = tessary_features_FN(turn)(v389, v390, 0.195090324f, 0.980785251f);
    const tessary_features_FN(vec) v503 = tessary_features_FN(turn)(v390, v389, 0.195090324f, -0.980785251f);
    const tessary_features_FN(vec) v504 = v178 + v502;
    const tessary_features_FN(vec) v505 = v179 + v503;
    const tessary_features_FN(vec) v506 = v178 - v502;
    const tessary_features_FN(vec) v507 = v503 - v179;
    const tessary_features_FN(vec) v508 = tessary_features_FN(turn)(v383, v384, 0.0980171412f, 0.99518472f);
    const tessary_features_FN(vec) v509 = tessary_features_FN(turn)(v384, v383, 0.0980171412f, -0.99518472f);
    const tessary_features_FN(vec) v510 = v172 + v508;
    const tessary_features_FN(vec) v511 = v173 + v509;
    const tessary_features_FN(vec) v512 = v172 - v508;
    const tessary_features_FN(vec) v513 = v509 - v173;
    const tessary_features_FN(vec) v514 = -v378;
    const tessary_features_FN(vec) v515 = v422 - v422;
    tessary_features_STORE(s + 0 * tessary_features_LINE, v422);
    tessary_features_STORE(s + 1 * tessary_features_LINE, v515);
    tessary_features_STORE(s + 2 * tessary_features_LINE, v426);
    tessary_features_STORE(s + 3 * tessary_features_LINE, v427);
    tessary_features_STORE(s + 4 * tessary_features_LINE, v432);
    tessary_features_STORE(s + 5 * tessary_features_LINE, v433);
    tessary_features_STORE(s + 6 * tessary_features_LINE, v438);
    tessary_features_STORE(s + 7 * tessary_features_LINE, v439);
    tessary_features_STORE(s + 8 * tessary_features_LINE, v444);
    tessary_features_STORE(s + 9 * tessary_features_LINE, v445);
    tessary_features_STORE(s + 10 * tessary_features_LINE, v450);
    tessary_features_STORE(s + 11 * tessary_features_LINE, v451);
    tessary_features_STORE(s + 12 * tessary_features_LINE, v456);
    tessary_features_STORE(s + 13 * tessary_features_LINE, v457);
    tessary_features_STORE(s + 14 * tessary_features_LINE, v462);
    tessary_features_STORE(s + 15 * tessary_features_LINE, v463);
    tessary_features_STORE(s + 16 * tessary_features_LINE, v468);
    tessary_features_STORE(s + 17 * tessary_features_LINE, v469);
    tessary_features_STORE(s + 18 * tessary_features_LINE, v474);
    tessary_features_STORE(s + 19 * tessary_features_LINE, v475);
    tessary_features_STORE(s + 20 * tessary_features_LINE, v480);
    tessary_features_STORE(s + 21 * tessary_features_LINE, v481);
    tessary_features_STORE(s + 22 * tessary_features_LINE, v486);
    tessary_features_STORE(s + 23 * tessary_features_LINE, v487);
    tessary_features_STORE(s + 24 * tessary_features_LINE, v492);
    tessary_features_STORE(s + 25 * tessary_features_LINE, v493);
    tessary_features_STORE(s + 26 * tessary_features_LINE, v498);
    tessary_features_STORE(s + 27 * tessary_features_LINE, v499);
    tessary_features_STORE(s + 28 * tessary_features_LINE, v504);
    tessary_features_STORE(s + 29 * tessary_features_LINE, v505);
    tessary_features_STORE(s + 30 * tessary_features_LINE, v510);
    tessary_features_STORE(s + 31 * tessary_features_LINE, v511);
    tessary_features_STORE(s + 32 * tessary_features_LINE, v167);
    tessary_features_STORE(s + 33 * tessary_features_LINE, v514);
    tessary_features_STORE(s + 34 * tessary_features_LINE, v512);
    tessary_features_STORE(s + 35 * tessary_features_LINE, v513);
    tessary_features_STORE(s + 36 * tessary_features_LINE, v506);
    tessary_features_STORE(s + 37 * tessary_features_LINE, v507);
    tessary_features_STORE(s + 38 * tessary_features_LINE, v500);
    tessary_features_STORE(s + 39 * tessary_features_LINE, v501);
    tessary_features_STORE(s + 40 * tessary_features_LINE, v494);
    tessary_features_STORE(s + 41 * tessary_features_LINE, v495);
    tessary_features_STORE(s + 42 * tessary_features_LINE, v488);
    tessary_features_STORE(s + 43 * tessary_features_LINE, v489);
    tessary_features_STORE(s + 44 * tessary_features_LINE, v482);
    tessary_features_STORE(s + 45 * tessary_features_LINE, v483);
    tessary_features_STORE(s + 46 * tessary_features_LINE, v476);
    tessary_features_STORE(s + 47 * tessary_features_LINE, v477);
    tessary_features_STORE(s + 48 * tessary_features_LINE, v470);
    tessary_features_STORE(s + 49 * tessary_features_LINE, v471);
    tessary_features_STORE(s + 50 * tessary_features_LINE, v464);
    tessary_features_STORE(s + 51 * tessary_features_LINE, v465);
    tessary_features_STORE(s + 52 * tessary_features_LINE, v458);
    tessary_features_STORE(s + 53 * tessary_features_LINE, v459);
    tessary_features_STORE(s + 54 * tessary_features_LINE, v452);
    tessary_features_STORE(s + 55 * tessary_features_LINE, v453);
    tessary_features_STORE(s + 56 * tessary_features_LINE, v446);
    tessary_features_STORE(s + 57 * tessary_features_LINE, v447);
    tessary_features_STORE(s + 58 * tessary_features_LINE, v440);
    tessary_features_STORE(s + 59 * tessary_features_LINE, v441);
    tessary_features_STORE(s + 60 * tessary_features_LINE, v434);
    tessary_features_STORE(s + 61 * tessary_features_LINE, v435);
    tessary_features_STORE(s + 62 * tessary_features_LINE, v428);
    tessary_features_STORE(s + 63 * tessary_features_LINE, v429);
    tessary_features_STORE(s + 64 * tessary_features_LINE, v423);
    tessary_features_STORE(s + 65 * tessary_features_LINE, v515);
}

/* Spectra back to columns, the rows that are right. */
static tessary_features_TARGET void tessary_features_FN(fft_backward)(const float *s, float *x)
{
    const tessary_features_FN(vec) v0 = tessary_features_LOAD(s + 0 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v1 = tessary_features_LOAD(s + 2 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v2 = tessary_features_LOAD(s + 3 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v3 = tessary_features_LOAD(s + 4 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v4 = tessary_features_LOAD(s + 5 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v5 = tessary_features_LOAD(s + 6 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v6 = tessary_features_LOAD(s + 7 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v7 = tessary_features_LOAD(s + 8 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v8 = tessary_features_LOAD(s + 9 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v9 = tessary_features_LOAD(s + 10 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v10 = tessary_features_LOAD(s + 11 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v11 = tessary_features_LOAD(s + 12 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v12 = tessary_features_LOAD(s + 13 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v13 = tessary_features_LOAD(s + 14 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v14 = tessary_features_LOAD(s + 15 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v15 = tessary_features_LOAD(s + 16 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v16 = tessary_features_LOAD(s + 17 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v17 = tessary_features_LOAD(s + 18 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v18 = tessary_features_LOAD(s + 19 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v19 = tessary_features_LOAD(s + 20 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v20 = tessary_features_LOAD(s + 21 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v21 = tessary_features_LOAD(s + 22 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v22 = tessary_features_LOAD(s + 23 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v23 = tessary_features_LOAD(s + 24 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v24 = tessary_features_LOAD(s + 25 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v25 = tessary_features_LOAD(s + 26 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v26 = tessary_features_LOAD(s + 27 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v27 = tessary_features_LOAD(s + 28 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v28 = tessary_features_LOAD(s + 29 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v29 = tessary_features_LOAD(s + 30 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v30 = tessary_features_LOAD(s + 31 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v31 = tessary_features_LOAD(s + 32 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v32 = tessary_features_LOAD(s + 33 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v33 = tessary_features_LOAD(s + 34 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v34 = tessary_features_LOAD(s + 35 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v35 = tessary_features_LOAD(s + 36 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v36 = tessary_features_LOAD(s + 37 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v37 = tessary_features_LOAD(s + 38 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v38 = tessary_features_LOAD(s + 39 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v39 = tessary_features_LOAD(s + 40 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v40 = tessary_features_LOAD(s + 41 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v41 = tessary_features_LOAD(s + 42 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v42 = tessary_features_LOAD(s + 43 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v43 = tessary_features_LOAD(s + 44 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v44 = tessary_features_LOAD(s + 45 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v45 = tessary_features_LOAD(s + 46 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v46 = tessary_features_LOAD(s + 47 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v47 = tessary_features_LOAD(s + 48 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v48 = tessary_features_LOAD(s + 49 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v49 = tessary_features_LOAD(s + 50 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v50 = tessary_features_LOAD(s + 51 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v51 = tessary_features_LOAD(s + 52 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v52 = tessary_features_LOAD(s + 53 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v53 = tessary_features_LOAD(s + 54 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v54 = tessary_features_LOAD(s + 55 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v55 = tessary_features_LOAD(s + 56 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v56 = tessary_features_LOAD(s + 57 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v57 = tessary_features_LOAD(s + 58 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v58 = tessary_features_LOAD(s + 59 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v59 = tessary_features_LOAD(s + 60 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v60 = tessary_features_LOAD(s + 61 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v61 = tessary_features_LOAD(s + 62 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v62 = tessary_features_LOAD(s + 63 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v63 = tessary_features_LOAD(s + 64 * tessary_features_CHUNK);
    const tessary_features_FN(vec) v64 = v0 + v63;
    const tessary_features_FN(vec) v65 = v0 - v63;
    const tessary_features_FN(vec) v66 = v1 + v61;
    const tessary_features_FN(vec) v67 = v2 - v62;
    const tessary_features_FN(vec) v68 = v1 - v61;
    const tessary_features_FN(vec) v69 = v2 + v62;
    const tessary_features_FN(vec) v70 = tessary_features_FN(turn)(v68, v69, 0.99518472f, -0.0980171412f);
    const tessary_features_FN(vec) v71 = tessary_features_FN(turn)(v69, v68, 0.99518472f, 0.0980171412f);
    const tessary_features_FN(vec) v72 = v3 + v59;
    const tessary_features_FN(vec) v73 = v4 - v60;
    const tessary_features_FN(vec) v74 = v3 - v59;
    const tessary_features_FN(vec) v75 = v4 + v60;
    const tessary_features_FN(vec) v76 = tessary_features_FN(turn)(v74, v75, 0.980785251f, -0.195090324f);
    const tessary_features_FN(vec) v77 = tessary_features_FN(turn)(v75, v74, 0.980785251f, 0.195090324f);
    const tessary_features_FN(vec) v78 = v5 + v57;
    const tessary_features_FN(vec) v79 = v6 - v58;
    const tessary_features_FN(vec) v80 = v5 - v57;
    const tessary_features_FN(vec) v81 = v6 + v58;
    const tessary_features_FN(vec) v82 = tessary_features_FN(turn)(v80, v81, 0.956940353f, -0.290284663f);
    const tessary_features_FN(vec) v83 = tessary_features_FN(turn)(v81, v80, 0.956940353f, 0.290284663f);
    const tessary_features_FN(vec) v84 = v7 + v55;
    const tessary_features_FN(vec) v85 = v8 - v56;
    const tessary_features_FN(vec) v86 = v7 - v55;
    const tessary_features_FN(vec) v87 = v8 + v56;
    const tessary_features_FN(vec) v88 = tessary_features_FN(turn)(v86, v87, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v89 = tessary_features_FN(turn)(v87, v86, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v90 = v9 + v53;
    const tessary_features_FN(vec) v91 = v10 - v54;
    const tessary_features_FN(vec) v92 = v9 - v53;
    const tessary_features_FN(vec) v93 = v10 + v54;
    const tessary_features_FN(vec) v94 = tessary_features_FN(turn)(v92, v93, 0.881921291f, -0.471396744f);
    const tessary_features_FN(vec) v95 = tessary_features_FN(turn)(v93, v92, 0.881921291f, 0.471396744f);
    const tessary_features_FN(vec) v96 = v11 + v51;
    const tessary_features_FN(vec) v97 = v12 - v52;
    const tessary_features_FN(vec) v98 = v11 - v51;
    const tessary_features_FN(vec) v99 = v12 + v52;
    const tessary_features_FN(vec) v100 = tessary_features_FN(turn)(v98, v99, 0.831469595f, -0.555570245f);
    const tessary_features_FN(vec) v101 = tessary_features_FN(turn)(v99, v98, 0.831469595f, 0.555570245f);
    const tessary_features_FN(vec) v102 = v13 + v49;
    const tessary_features_FN(vec) v103 = v14 - v50;
    const tessary_features_FN(vec) v104 = v13 - v49;
    const tessary_features_FN(vec) v105 = v14 + v50;
    const tessary_features_FN(vec) v106 = tessary_features_FN(turn)(v104, v105, 0.773010433f, -0.634393275f);
    const tessary_features_FN(vec) v107 = tessary_features_FN(turn)(v105, v104, 0.773010433f, 0.634393275f);
    const tessary_features_FN(vec) v108 = v15 + v47;
    const tessary_features_FN(vec) v109 = v16 - v48;
    const tessary_features_FN(vec) v110 = v15 - v47;
    const tessary_features_FN(vec) v111 = v16 + v48;
    const tessary_features_FN(vec) v112 = tessary_features_FN(turn)(v110, v111, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v113 = tessary_features_FN(turn)(v111, v110, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v114 = v17 + v45;
    const tessary_features_FN(vec) v115 = v18 - v46;
    const tessary_features_FN(vec) v116 = v17 - v45;
    const tessary_features_FN(vec) v117 = v18 + v46;
    const tessary_features_FN(vec) v118 = tessary_features_FN(turn)(v116, v117, 0.634393275f, -0.773010433f);
    const tessary_features_FN(vec) v119 = tessary_features_FN(turn)(v117, v116, 0.634393275f, 0.773010433f);
    const tessary_features_FN(vec) v120 = v19 + v43;
    const tessary_features_FN(vec) v121 = v20 - v44;
    const tessary_features_FN(vec) v122 = v19 - v43;
    const tessary_features_FN(vec) v123 = v20 + v44;
    const tessary_features_FN(vec) v124 = tessary_features_FN(turn)(v122, v123, 0.555570245f, -0.831469595f);
    const tessary_features_FN(vec) v125 = tessary_features_FN(turn)(v123, v122, 0.555570245f, 0.831469595f);
    const tessary_features_FN(vec) v126 = v21 + v41;
    const tessary_features_FN(vec) v127 = v22 - v42;
    const tessary_features_FN(vec) v128 = v21 - v41;
    const tessary_features_FN(vec) v129 = v22 + v42;
    const tessary_features_FN(vec) v130 = tessary_features_FN(turn)(v128, v129, 0.471396744f, -0.881921291f);
    const tessary_features_FN(vec) v131 = tessary_features_FN(turn)(v129, v128, 0.471396744f, 0.881921291f);
    const tessary_features_FN(vec) v132 = v23 + v39;
    const tessary_features_FN(vec) v133 = v24 - v40;
    const tessary_features_FN(vec) v134 = v23 - v39;
    const tessary_features_FN(vec) v135 = v24 + v40;
    const tessary_features_FN(vec) v136 = tessary_features_FN(turn)(v134, v135, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v137 = tessary_features_FN(turn)(v135, v134, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v138 = v25 + v37;
    const tessary_features_FN(vec) v139 = v26 - v38;
    const tessary_features_FN(vec) v140 = v25 - v37;
    const tessary_features_FN(vec) v141 = v26 + v38;
    const tessary_features_FN(vec) v142 = tessary_features_FN(turn)(v140, v141, 0.290284663f, -0.956940353f);
    const tessary_features_FN(vec) v143 = tessary_features_FN(turn)(v141, v140, 0.290284663f, 0.956940353f);
    const tessary_features_FN(vec) v144 = v27 + v35;
    const tessary_features_FN(vec) v145 = v28 - v36;
    const tessary_features_FN(vec) v146 = v27 - v35;
    const tessary_features_FN(vec) v147 = v28 + v36;
    const tessary_features_FN(vec) v148 = tessary_features_FN(turn)(v146, v147, 0.195090324f, -0.980785251f);
    const tessary_features_FN(vec) v149 = tessary_features_FN(turn)(v147, v146, 0.195090324f, 0.980785251f);
    const tessary_features_FN(vec) v150 = v29 + v33;
    const tessary_features_FN(vec) v151 = v30 - v34;
    const tessary_features_FN(vec) v152 = v29 - v33;
    const tessary_features_FN(vec) v153 = v30 + v34;
    const tessary_features_FN(vec) v154 = tessary_features_FN(turn)(v152, v153, 0.0980171412f, -0.99518472f);
    const tessary_features_FN(vec) v155 = tessary_features_FN(turn)(v153, v152, 0.0980171412f, 0.99518472f);
    const tessary_features_FN(vec) v156 = v31 + v31;
    const tessary_features_FN(vec) v157 = -(v32 + v32);
    const tessary_features_FN(vec) v158 = v64 + v156;
    const tessary_features_FN(vec) v159 = v64 - v156;
    const tessary_features_FN(vec) v160 = v66 + v150;
    const tessary_features_FN(vec) v161 = v67 - v151;
    const tessary_features_FN(vec) v162 = v66 - v150;
    const tessary_features_FN(vec) v163 = v67 + v151;
    const tessary_features_FN(vec) v164 = tessary_features_FN(turn)(v162, v163, 0.980785251f, -0.195090324f);
    const tessary_features_FN(vec) v165 = tessary_features_FN(turn)(v163, v162, 0.980785251f, 0.195090324f);
    const tessary_features_FN(vec) v166 = v72 + v144;
    const tessary_features_FN(vec) v167 = v73 - v145;
    const tessary_features_FN(vec) v168 = v72 - v144;
    const tessary_features_FN(vec) v169 = v73 + v145;
    const tessary_features_FN(vec) v170 = tessary_features_FN(turn)(v168, v169, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v171 = tessary_features_FN(turn)(v169, v168, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v172 = v78 + v138;
    const tessary_features_FN(vec) v173 = v79 - v139;
    const tessary_features_FN(vec) v174 = v78 - v138;
    const tessary_features_FN(vec) v175 = v79 + v139;
    const tessary_features_FN(vec) v176 = tessary_features_FN(turn)(v174, v175, 0.831469595f, -0.555570245f);
    const tessary_features_FN(vec) v177 = tessary_features_FN(turn)(v175, v174, 0.831469595f, 0.555570245f);
    const tessary_features_FN(vec) v178 = v84 + v132;
    const tessary_features_FN(vec) v179 = v85 - v133;
    const tessary_features_FN(vec) v180 = v84 - v132;
    const tessary_features_FN(vec) v181 = v85 + v133;
    const tessary_features_FN(vec) v182 = tessary_features_FN(turn)(v180, v181, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v183 = tessary_features_FN(turn)(v181, v180, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v184 = v90 + v126;
    const tessary_features_FN(vec) v185 = v91 - v127;
    const tessary_features_FN(vec) v186 = v90 - v126;
    const tessary_features_FN(vec) v187 = v91 + v127;
    const tessary_features_FN(vec) v188 = tessary_features_FN(turn)(v186, v187, 0.555570245f, -0.831469595f);
    const tessary_features_FN(vec) v189 = tessary_features_FN(turn)(v187, v186, 0.555570245f, 0.831469595f);
    const tessary_features_FN(vec) v190 = v96 + v120;
    const tessary_features_FN(vec) v191 = v97 - v121;
    const tessary_features_FN(vec) v192 = v96 - v120;
    const tessary_features_FN(vec) v193 = v97 + v121;
    const tessary_features_FN(vec) v194 = tessary_features_FN(turn)(v192, v193, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v195 = tessary_features_FN(turn)(v193, v192, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v196 = v102 + v114;
    const tessary_features_FN(vec) v197 = v103 - v115;
    const tessary_features_FN(vec) v198 = v102 - v114;
    const tessary_features_FN(vec) v199 = v103 + v115;
    const tessary_features_FN(vec) v200 = tessary_features_FN(turn)(v198, v199, 0.195090324f, -0.980785251f);
    const tessary_features_FN(vec) v201 = tessary_features_FN(turn)(v199, v198, 0.195090324f, 0.980785251f);
    const tessary_features_FN(vec) v202 = v108 + v108;
    const tessary_features_FN(vec) v203 = -(v109 + v109);
    const tessary_features_FN(vec) v204 = v158 + v202;
    const tessary_features_FN(vec) v205 = v158 - v202;
    const tessary_features_FN(vec) v206 = v160 + v196;
    const tessary_features_FN(vec) v207 = v161 - v197;
    const tessary_features_FN(vec) v208 = v160 - v196;
    const tessary_features_FN(vec) v209 = v161 + v197;
    const tessary_features_FN(vec) v210 = tessary_features_FN(turn)(v208, v209, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v211 = tessary_features_FN(turn)(v209, v208, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v212 = v166 + v190;
    const tessary_features_FN(vec) v213 = v167 - v191;
    const tessary_features_FN(vec) v214 = v166 - v190;
    const tessary_features_FN(vec) v215 = v167 + v191;
    const tessary_features_FN(vec) v216 = tessary_features_FN(turn)(v214, v215, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v217 = tessary_features_FN(turn)(v215, v214, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v218 = v172 + v184;
    const tessary_features_FN(vec) v219 = v173 - v185;
    const tessary_features_FN(vec) v220 = v172 - v184;
    const tessary_features_FN(vec) v221 = v173 + v185;
    const tessary_features_FN(vec) v222 = tessary_features_FN(turn)(v220, v221, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v223 = tessary_features_FN(turn)(v221, v220, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v224 = v178 + v178;
    const tessary_features_FN(vec) v225 = -(v179 + v179);
    const tessary_features_FN(vec) v226 = v204 + v224;
    const tessary_features_FN(vec) v227 = v204 - v224;
    const tessary_features_FN(vec) v228 = v206 + v218;
    const tessary_features_FN(vec) v229 = v207 - v219;
    const tessary_features_FN(vec) v230 = v206 - v218;
    const tessary_features_FN(vec) v231 = v207 + v219;
    const tessary_features_FN(vec) v232 = tessary_features_FN(turn)(v230, v231, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v233 = tessary_features_FN(turn)(v231, v230, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v234 = v212 + v212;
    const tessary_features_FN(vec) v235 = -(v213 + v213);
    const tessary_features_FN(vec) v236 = v226 + v234;
    const tessary_features_FN(vec) v237 = v226 - v234;
    const tessary_features_FN(vec) v238 = v228 + v228;
    const tessary_features_FN(vec) v239 = -(v229 + v229);
    const tessary_features_FN(vec) v240 = v236 + v238;
    const tessary_features_FN(vec) v241 = v236 - v238;
    tessary_features_STORE(x + 0 * tessary_features_CHUNK, v240);
    tessary_features_STORE(x + 32 * tessary_features_CHUNK, v241);
    const tessary_features_FN(vec) v244 = v237 + v239;
    tessary_features_STORE(x + 16 * tessary_features_CHUNK, v244);
    const tessary_features_FN(vec) v247 = v227 + v235;
    const tessary_features_FN(vec) v248 = v227 - v235;
    const tessary_features_FN(vec) v249 = v232 + v232;
    const tessary_features_FN(vec) v250 = -(v233 + v233);
    const tessary_features_FN(vec) v251 = v247 + v249;
    tessary_features_STORE(x + 8 * tessary_features_CHUNK, v251);
    const tessary_features_FN(vec) v254 = v248 + v250;
    tessary_features_STORE(x + 24 * tessary_features_CHUNK, v254);
    const tessary_features_FN(vec) v257 = v205 + v225;
    const tessary_features_FN(vec) v258 = v205 - v225;
    const tessary_features_FN(vec) v259 = v210 + v222;
    const tessary_features_FN(vec) v260 = v211 - v223;
    const tessary_features_FN(vec) v261 = v210 - v222;
    const tessary_features_FN(vec) v262 = v211 + v223;
    const tessary_features_FN(vec) v263 = tessary_features_FN(turn)(v261, v262, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v264 = tessary_features_FN(turn)(v262, v261, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v265 = v216 + v216;
    const tessary_features_FN(vec) v266 = -(v217 + v217);
    const tessary_features_FN(vec) v267 = v257 + v265;
    const tessary_features_FN(vec) v268 = v257 - v265;
    const tessary_features_FN(vec) v269 = v259 + v259;
    const tessary_features_FN(vec) v270 = -(v260 + v260);
    const tessary_features_FN(vec) v271 = v267 + v269;
    const tessary_features_FN(vec) v272 = v267 - v269;
    tessary_features_STORE(x + 4 * tessary_features_CHUNK, v271);
    tessary_features_STORE(x + 36 * tessary_features_CHUNK, v272);
    const tessary_features_FN(vec) v275 = v268 + v270;
    tessary_features_STORE(x + 20 * tessary_features_CHUNK, v275);
    const tessary_features_FN(vec) v278 = v258 + v266;
    const tessary_features_FN(vec) v279 = v258 - v266;
    const tessary_features_FN(vec) v280 = v263 + v263;
    const tessary_features_FN(vec) v281 = -(v264 + v264);
    const tessary_features_FN(vec) v282 = v278 + v280;
    tessary_features_STORE(x + 12 * tessary_features_CHUNK, v282);
    const tessary_features_FN(vec) v285 = v279 + v281;
    tessary_features_STORE(x + 28 * tessary_features_CHUNK, v285);
    const tessary_features_FN(vec) v288 = v159 + v203;
    const tessary_features_FN(vec) v289 = v159 - v203;
    const tessary_features_FN(vec) v290 = v164 + v200;
    const tessary_features_FN(vec) v291 = v165 - v201;
    const tessary_features_FN(vec) v292 = v164 - v200;
    const tessary_features_FN(vec) v293 = v165 + v201;
    const tessary_features_FN(vec) v294 = tessary_features_FN(turn)(v292, v293, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v295 = tessary_features_FN(turn)(v293, v292, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v296 = v170 + v194;
    const tessary_features_FN(vec) v297 = v171 - v195;
    const tessary_features_FN(vec) v298 = v170 - v194;
    const tessary_features_FN(vec) v299 = v171 + v195;
    const tessary_features_FN(vec) v300 = tessary_features_FN(turn)(v298, v299, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v301 = tessary_features_FN(turn)(v299, v298, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v302 = v176 + v188;
    const tessary_features_FN(vec) v303 = v177 - v189;
    const tessary_features_FN(vec) v304 = v176 - v188;
    const tessary_features_FN(vec) v305 = v177 + v189;
    const tessary_features_FN(vec) v306 = tessary_features_FN(turn)(v304, v305, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v307 = tessary_features_FN(turn)(v305, v304, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v308 = v182 + v182;
    const tessary_features_FN(vec) v309 = -(v183 + v183);
    const tessary_features_FN(vec) v310 = v288 + v308;
    const tessary_features_FN(vec) v311 = v288 - v308;
    const tessary_features_FN(vec) v312 = v290 + v302;
    const tessary_features_FN(vec) v313 = v291 - v303;
    const tessary_features_FN(vec) v314 = v290 - v302;
    const tessary_features_FN(vec) v315 = v291 + v303;
    const tessary_features_FN(vec) v316 = tessary_features_FN(turn)(v314, v315, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v317 = tessary_features_FN(turn)(v315, v314, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v318 = v296 + v296;
    const tessary_features_FN(vec) v319 = -(v297 + v297);
    const tessary_features_FN(vec) v320 = v310 + v318;
    const tessary_features_FN(vec) v321 = v310 - v318;
    const tessary_features_FN(vec) v322 = v312 + v312;
    const tessary_features_FN(vec) v323 = -(v313 + v313);
    const tessary_features_FN(vec) v324 = v320 + v322;
    const tessary_features_FN(vec) v325 = v320 - v322;
    tessary_features_STORE(x + 2 * tessary_features_CHUNK, v324);
    tessary_features_STORE(x + 34 * tessary_features_CHUNK, v325);
    const tessary_features_FN(vec) v328 = v321 + v323;
    tessary_features_STORE(x + 18 * tessary_features_CHUNK, v328);
    const tessary_features_FN(vec) v331 = v311 + v319;
    const tessary_features_FN(vec) v332 = v311 - v319;
    const tessary_features_FN(vec) v333 = v316 + v316;
    const tessary_features_FN(vec) v334 = -(v317 + v317);
    const tessary_features_FN(vec) v335 = v331 + v333;
    tessary_features_STORE(x + 10 * tessary_features_CHUNK, v335);
    const tessary_features_FN(vec) v338 = v332 + v334;
    tessary_features_STORE(x + 26 * tessary_features_CHUNK, v338);
    const tessary_features_FN(vec) v341 = v289 + v309;
    const tessary_features_FN(vec) v342 = v289 - v309;
    const tessary_features_FN(vec) v343 = v294 + v306;
    const tessary_features_FN(vec) v344 = v295 - v307;
    const tessary_features_FN(vec) v345 = v294 - v306;
    const tessary_features_FN(vec) v346 = v295 + v307;
    const tessary_features_FN(vec) v347 = tessary_features_FN(turn)(v345, v346, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v348 = tessary_features_FN(turn)(v346, v345, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v349 = v300 + v300;
    const tessary_features_FN(vec) v350 = -(v301 + v301);
    const tessary_features_FN(vec) v351 = v341 + v349;
    const tessary_features_FN(vec) v352 = v341 - v349;
    const tessary_features_FN(vec) v353 = v343 + v343;
    const tessary_features_FN(vec) v354 = -(v344 + v344);
    const tessary_features_FN(vec) v355 = v351 + v353;
    const tessary_features_FN(vec) v356 = v351 - v353;
    tessary_features_STORE(x + 6 * tessary_features_CHUNK, v355);
    tessary_features_STORE(x + 38 * tessary_features_CHUNK, v356);
    const tessary_features_FN(vec) v359 = v352 + v354;
    tessary_features_STORE(x + 22 * tessary_features_CHUNK, v359);
    const tessary_features_FN(vec) v362 = v342 + v350;
    const tessary_features_FN(vec) v363 = v342 - v350;
    const tessary_features_FN(vec) v364 = v347 + v347;
    const tessary_features_FN(vec) v365 = -(v348 + v348);
    const tessary_features_FN(vec) v366 = v362 + v364;
    tessary_features_STORE(x + 14 * tessary_features_CHUNK, v366);
    const tessary_features_FN(vec) v369 = v363 + v365;
    tessary_features_STORE(x + 30 * tessary_features_CHUNK, v369);
    const tessary_features_FN(vec) v372 = v65 + v157;
    const tessary_features_FN(vec) v373 = v65 - v157;
    const tessary_features_FN(vec) v374 = v70 + v154;
    const tessary_features_FN(vec) v375 = v71 - v155;
    const tessary_features_FN(vec) v376 = v70 - v154;
    const tessary_features_FN(vec) v377 = v71 + v155;
    const tessary_features_FN(vec) v378 = tessary_features_FN(turn)(v376, v377, 0.980785251f, -0.195090324f);
    const tessary_features_FN(vec) v379 = tessary_features_FN(turn)(v377, v376, 0.980785251f, 0.195090324f);
    const tessary_features_FN(vec) v380 = v76 + v148;
    const tessary_features_FN(vec) v381 = v77 - v149;
    const tessary_features_FN(vec) v382 = v76 - v148;
    const tessary_features_FN(vec) v383 = v77 + v149;
    const tessary_features_FN(vec) v384 = tessary_features_FN(turn)(v382, v383, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v385 = tessary_features_FN(turn)(v383, v382, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v386 = v82 + v142;
    const tessary_features_FN(vec) v387 = v83 - v143;
    const tessary_features_FN(vec) v388 = v82 - v142;
    const tessary_features_FN(vec) v389 = v83 + v143;
    const tessary_features_FN(vec) v390 = tessary_features_FN(turn)(v388, v389, 0.831469595f, -0.555570245f);
    const tessary_features_FN(vec) v391 = tessary_features_FN(turn)(v389, v388, 0.831469595f, 0.555570245f);
    const tessary_features_FN(vec) v392 = v88 + v136;
    const tessary_features_FN(vec) v393 = v89 - v137;
    const tessary_features_FN(vec) v394 = v88 - v136;
    const tessary_features_FN(vec) v395 = v89 + v137;
    const tessary_features_FN(vec) v396 = tessary_features_FN(turn)(v394, v395, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v397 = tessary_features_FN(turn)(v395, v394, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v398 = v94 + v130;
    const tessary_features_FN(vec) v399 = v95 - v131;
    const tessary_features_FN(vec) v400 = v94 - v130;
    const tessary_features_FN(vec) v401 = v95 + v131;
    const tessary_features_FN(vec) v402 = tessary_features_FN(turn)(v400, v401, 0.555570245f, -0.831469595f);
    const tessary_features_FN(vec) v403 = tessary_features_FN(turn)(v401, v400, 0.555570245f, 0.831469595f);
    const tessary_features_FN(vec) v404 = v100 + v124;
    const tessary_features_FN(vec) v405 = v101 - v125;
    const tessary_features_FN(vec) v406 = v100 - v124;
    const tessary_features_FN(vec) v407 = v101 + v125;
    const tessary_features_FN(vec) v408 = tessary_features_FN(turn)(v406, v407, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v409 = tessary_features_FN(turn)(v407, v406, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v410 = v106 + v118;
    const tessary_features_FN(vec) v411 = v107 - v119;
    const tessary_features_FN(vec) v412 = v106 - v118;
    const tessary_features_FN(vec) v413 = v107 + v119;
    const tessary_features_FN(vec) v414 = tessary_features_FN(turn)(v412, v413, 0.195090324f, -0.980785251f);
    const tessary_features_FN(vec) v415 = tessary_features_FN(turn)(v413, v412, 0.195090324f, 0.980785251f);
    const tessary_features_FN(vec) v416 = v112 + v112;
    const tessary_features_FN(vec) v417 = -(v113 + v113);
    const tessary_features_FN(vec) v418 = v372 + v416;
    const tessary_features_FN(vec) v419 = v372 - v416;
    const tessary_features_FN(vec) v420 = v374 + v410;
    const tessary_features_FN(vec) v421 = v375 - v411;
    const tessary_features_FN(vec) v422 = v374 - v410;
    const tessary_features_FN(vec) v423 = v375 + v411;
    const tessary_features_FN(vec) v424 = tessary_features_FN(turn)(v422, v423, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v425 = tessary_features_FN(turn)(v423, v422, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v426 = v380 + v404;
    const tessary_features_FN(vec) v427 = v381 - v405;
    const tessary_features_FN(vec) v428 = v380 - v404;
    const tessary_features_FN(vec) v429 = v381 + v405;
    const tessary_features_FN(vec) v430 = tessary_features_FN(turn)(v428, v429, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v431 = tessary_features_FN(turn)(v429, v428, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v432 = v386 + v398;
    const tessary_features_FN(vec) v433 = v387 - v399;
    const tessary_features_FN(vec) v434 = v386 - v398;
    const tessary_features_FN(vec) v435 = v387 + v399;
    const tessary_features_FN(vec) v436 = tessary_features_FN(turn)(v434, v435, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v437 = tessary_features_FN(turn)(v435, v434, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v438 = v392 + v392;
    const tessary_features_FN(vec) v439 = -(v393 + v393);
    const tessary_features_FN(vec) v440 = v418 + v438;
    const tessary_features_FN(vec) v441 = v418 - v438;
    const tessary_features_FN(vec) v442 = v420 + v432;
    const tessary_features_FN(vec) v443 = v421 - v433;
    const tessary_features_FN(vec) v444 = v420 - v432;
    const tessary_features_FN(vec) v445 = v421 + v433;
    const tessary_features_FN(vec) v446 = tessary_features_FN(turn)(v444, v445, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v447 = tessary_features_FN(turn)(v445, v444, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v448 = v426 + v426;
    const tessary_features_FN(vec) v449 = -(v427 + v427);
    const tessary_features_FN(vec) v450 = v440 + v448;
    const tessary_features_FN(vec) v451 = v440 - v448;
    const tessary_features_FN(vec) v452 = v442 + v442;
    const tessary_features_FN(vec) v453 = -(v443 + v443);
    const tessary_features_FN(vec) v454 = v450 + v452;
    const tessary_features_FN(vec) v455 = v450 - v452;
    tessary_features_STORE(x + 1 * tessary_features_CHUNK, v454);
    tessary_features_STORE(x + 33 * tessary_features_CHUNK, v455);
    const tessary_features_FN(vec) v458 = v451 + v453;
    tessary_features_STORE(x + 17 * tessary_features_CHUNK, v458);
    const tessary_features_FN(vec) v461 = v441 + v449;
    const tessary_features_FN(vec) v462 = v441 - v449;
    const tessary_features_FN(vec) v463 = v446 + v446;
    const tessary_features_FN(vec) v464 = -(v447 + v447);
    const tessary_features_FN(vec) v465 = v461 + v463;
    tessary_features_STORE(x + 9 * tessary_features_CHUNK, v465);
    const tessary_features_FN(vec) v468 = v462 + v464;
    tessary_features_STORE(x + 25 * tessary_features_CHUNK, v468);
    const tessary_features_FN(vec) v471 = v419 + v439;
    const tessary_features_FN(vec) v472 = v419 - v439;
    const tessary_features_FN(vec) v473 = v424 + v436;
    const tessary_features_FN(vec) v474 = v425 - v437;
    const tessary_features_FN(vec) v475 = v424 - v436;
    const tessary_features_FN(vec) v476 = v425 + v437;
    const tessary_features_FN(vec) v477 = tessary_features_FN(turn)(v475, v476, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v478 = tessary_features_FN(turn)(v476, v475, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v479 = v430 + v430;
    const tessary_features_FN(vec) v480 = -(v431 + v431);
    const tessary_features_FN(vec) v481 = v471 + v479;
    const tessary_features_FN(vec) v482 = v471 - v479;
    const tessary_features_FN(vec) v483 = v473 + v473;
    const tessary_features_FN(vec) v484 = -(v474 + v474);
    const tessary_features_FN(vec) v485 = v481 + v483;
    const tessary_features_FN(vec) v486 = v481 - v483;
    tessary_features_STORE(x + 5 * tessary_features_CHUNK, v485);
    tessary_features_STORE(x + 37 * tessary_features_CHUNK, v486);
    const tessary_features_FN(vec) v489 = v482 + v484;
    tessary_features_STORE(x + 21 * tessary_features_CHUNK, v489);
    const tessary_features_FN(vec) v492 = v472 + v480;
    const tessary_features_FN(vec) v493 = v472 - v480;
    const tessary_features_FN(vec) v494 = v477 + v477;
    const tessary_features_FN(vec) v495 = -(v478 + v478);
    const tessary_features_FN(vec) v496 = v492 + v494;
    tessary_features_STORE(x + 13 * tessary_features_CHUNK, v496);
    const tessary_features_FN(vec) v499 = v493 + v495;
    tessary_features_STORE(x + 29 * tessary_features_CHUNK, v499);
    const tessary_features_FN(vec) v502 = v373 + v417;
    const tessary_features_FN(vec) v503 = v373 - v417;
    const tessary_features_FN(vec) v504 = v378 + v414;
    const tessary_features_FN(vec) v505 = v379 - v415;
    const tessary_features_FN(vec) v506 = v378 - v414;
    const tessary_features_FN(vec) v507 = v379 + v415;
    const tessary_features_FN(vec) v508 = tessary_features_FN(turn)(v506, v507, 0.923879504f, -0.382683426f);
    const tessary_features_FN(vec) v509 = tessary_features_FN(turn)(v507, v506, 0.923879504f, 0.382683426f);
    const tessary_features_FN(vec) v510 = v384 + v408;
    const tessary_features_FN(vec) v511 = v385 - v409;
    const tessary_features_FN(vec) v512 = v384 - v408;
    const tessary_features_FN(vec) v513 = v385 + v409;
    const tessary_features_FN(vec) v514 = tessary_features_FN(turn)(v512, v513, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v515 = tessary_features_FN(turn)(v513, v512, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v516 = v390 + v402;
    const tessary_features_FN(vec) v517 = v391 - v403;
    const tessary_features_FN(vec) v518 = v390 - v402;
    const tessary_features_FN(vec) v519 = v391 + v403;
    const tessary_features_FN(vec) v520 = tessary_features_FN(turn)(v518, v519, 0.382683426f, -0.923879504f);
    const tessary_features_FN(vec) v521 = tessary_features_FN(turn)(v519, v518, 0.382683426f, 0.923879504f);
    const tessary_features_FN(vec) v522 = v396 + v396;
    const tessary_features_FN(vec) v523 = -(v397 + v397);
    const tessary_features_FN(vec) v524 = v502 + v522;
    const tessary_features_FN(vec) v525 = v502 - v522;
    const tessary_features_FN(vec) v526 = v504 + v516;
    const tessary_features_FN(vec) v527 = v505 - v517;
    const tessary_features_FN(vec) v528 = v504 - v516;
    const tessary_features_FN(vec) v529 = v505 + v517;
    const tessary_features_FN(vec) v530 = tessary_features_FN(turn)(v528, v529, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v531 = tessary_features_FN(turn)(v529, v528, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v532 = v510 + v510;
    const tessary_features_FN(vec) v533 = -(v511 + v511);
    const tessary_features_FN(vec) v534 = v524 + v532;
    const tessary_features_FN(vec) v535 = v524 - v532;
    const tessary_features_FN(vec) v536 = v526 + v526;
    const tessary_features_FN(vec) v537 = -(v527 + v527);
    const tessary_features_FN(vec) v538 = v534 + v536;
    const tessary_features_FN(vec) v539 = v534 - v536;
    tessary_features_STORE(x + 3 * tessary_features_CHUNK, v538);
    tessary_features_STORE(x + 35 * tessary_features_CHUNK, v539);
    const tessary_features_FN(vec) v542 = v535 + v537;
    tessary_features_STORE(x + 19 * tessary_features_CHUNK, v542);
    const tessary_features_FN(vec) v545 = v525 + v533;
    const tessary_features_FN(vec) v546 = v525 - v533;
    const tessary_features_FN(vec) v547 = v530 + v530;
    const tessary_features_FN(vec) v548 = -(v531 + v531);
    const tessary_features_FN(vec) v549 = v545 + v547;
    tessary_features_STORE(x + 11 * tessary_features_CHUNK, v549);
    const tessary_features_FN(vec) v552 = v546 + v548;
    tessary_features_STORE(x + 27 * tessary_features_CHUNK, v552);
    const tessary_features_FN(vec) v555 = v503 + v523;
    const tessary_features_FN(vec) v556 = v503 - v523;
    const tessary_features_FN(vec) v557 = v508 + v520;
    const tessary_features_FN(vec) v558 = v509 - v521;
    const tessary_features_FN(vec) v559 = v508 - v520;
    const tessary_features_FN(vec) v560 = v509 + v521;
    const tessary_features_FN(vec) v561 = tessary_features_FN(turn)(v559, v560, 0.707106769f, -0.707106769f);
    const tessary_features_FN(vec) v562 = tessary_features_FN(turn)(v560, v559, 0.707106769f, 0.707106769f);
    const tessary_features_FN(vec) v563 = v514 + v514;
    const tessary_features_FN(vec) v564 = -(v515 + v515);
    const tessary_features_FN(vec) v565 = v555 + v563;
    const tessary_features_FN(vec) v566 = v555 - v563;
    const tessary_features_FN(vec) v567 = v557 + v557;
    const tessary_features_FN(vec) v568 = -(v558 + v558);
    const tessary_features_FN(vec) v569 = v565 + v567;
    const tessary_features_FN(vec) v570 = v565 - v567;
    tessary_features_STORE(x + 7 * tessary_features_CHUNK, v569);
    tessary_features_STORE(x + 39 * tessary_features_CHUNK, v570);
    const tessary_features_FN(vec) v573 = v566 + v568;
    tessary_features_STORE(x + 23 * tessary_features_CHUNK, v573);
    const tessary_features_FN(vec) v576 = v556 + v564;
    const tessary_features_FN(vec) v577 = v556 - v564;
    const tessary_features_FN(vec) v578 = v561 + v561;
    const tessary_features_FN(vec) v579 = -(v562 + v562);
    const tessary_features_FN(vec) v580 = v576 + v578;
    tessary_features_STORE(x + 15 * tessary_features_CHUNK, v580);
    const tessary_features_FN(vec) v583 = v577 + v579;
    tessary_features_STORE(x + 31 * tessary_features_CHUNK, v583);
}

static tessary_features_TARGET void tessary_features_FN(fft_product)(const float *s, const float *taps, float *r)
{
    int x;
#if tessary_features_LANES == 16
    for (x = 0; x < tessary_features_CHUNK; x += 4 * tessary_features_LANES) {
        const float *k = taps;
        int i;
        tessary_features_FN(vec) a00 = {0.0f}, b00 = {0.0f};
        tessary_features_FN(vec) a01 = {0.0f}, b01 = {0.0f};
        tessary_features_FN(vec) a02 = {0.0f}, b02 = {0.0f};
        tessary_features_FN(vec) a03 = {0.0f}, b03 = {0.0f};
        tessary_features_FN(vec) a10 = {0.0f}, b10 = {0.0f};
        tessary_features_FN(vec) a11 = {0.0f}, b11 = {0.0f};
        tessary_features_FN(vec) a12 = {0.0f}, b12 = {0.0f};
        tessary_features_FN(vec) a13 = {0.0f}, b13 = {0.0f};
        for (i = 0; i < tessary_features_FFT_SIZE; ++i, k += 4) {
            const float *const re = s + tessary_features_FFT_FIRST + x + i, *const im = re + tessary_features_LINE;
            {
                const tessary_features_FN(vec) p = tessary_features_LOAD(re + 0 * tessary_features_LANES);
                const tessary_features_FN(vec) q = tessary_features_LOAD(im + 0 * tessary_features_LANES);
                tessary_features_MUL_ADD(a00, p, k[0]);
                tessary_features_MUL_ADD(b00, q, k[0]);
                tessary_features_MUL_SUB(a00, q, k[1]);
                tessary_features_MUL_ADD(b00, p, k[1]);
                tessary_features_MUL_ADD(a10, p, k[2]);
                tessary_features_MUL_ADD(b10, q, k[2]);
                tessary_features_MUL_SUB(a10, q, k[3]);
                tessary_features_MUL_ADD(b10, p, k[3]);
            }
            {
                const tessary_features_FN(vec) p = tessary_features_LOAD(re + 1 * tessary_features_LANES);
                const tessary_features_FN(vec) q = tessary_features_LOAD(im + 1 * tessary_features_LANES);
                tessary_features_MUL_ADD(a01, p, k[0]);
                tessary_features_MUL_ADD(b01, q, k[0]);
                tessary_features_MUL_SUB(a01, q, k[1]);
                tessary_features_MUL_ADD(b01, p, k[1]);
                tessary_features_MUL_ADD(a11, p, k[2]);
                tessary_features_MUL_ADD(b11, q, k[2]);
                tessary_features_MUL_SUB(a11, q, k[3]);
                tessary_features_MUL_ADD(b11, p, k[3]);
            }
            {
                const tessary_features_FN(vec) p = tessary_features_LOAD(re + 2 * tessary_features_LANES);
                const tessary_features_FN(vec) q = tessary_features_LOAD(im + 2 * tessary_features_LANES);
                tessary_features_MUL_ADD(a02, p, k[0]);
                tessary_features_MUL_ADD(b02, q, k[0]);
                tessary_features_MUL_SUB(a02, q, k[1]);
                tessary_features_MUL_ADD(b02, p, k[1]);
                tessary_features_MUL_ADD(a12, p, k[2]);
                tessary_features_MUL_ADD(b12, q, k[2]);
                tessary_features_MUL_SUB(a12, q, k[3]);
                tessary_features_MUL_ADD(b12, p, k[3]);
            }
            {
                const tessary_features_FN(vec) p = tessary_features_LOAD(re + 3 * tessary_features_LANES);
                const tessary_features_FN(vec) q = tessary_features_LOAD(im + 3 * tessary_features_LANES);
                tessary_features_MUL_ADD(a03, p, k[0]);
                tessary_features_MUL_ADD(b03, q, k[0]);
                tessary_features_MUL_SUB(a03, q, k[1]);
                tessary_features_MUL_ADD(b03, p, k[1]);
                tessary_features_MUL_ADD(a13, p, k[2]);
                tessary_features_MUL_ADD(b13, q, k[2]);
                tessary_features_MUL_SUB(a13, q, k[3]);
                tessary_features_MUL_ADD(b13, p, k[3]);
            }
        }
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 0 * tessary_features_LANES, a00);
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 0 * tessary_features_LANES + tessary_features_CHUNK, b00);
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 1 * tessary_features_LANES, a01);
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 1 * tessary_features_LANES + tessary_features_CHUNK, b01);
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 2 * tessary_features_LANES, a02);
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 2 * tessary_features_LANES + tessary_features_CHUNK, b02);
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 3 * tessary_features_LANES, a03);
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 3 * tessary_features_LANES + tessary_features_CHUNK, b03);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 0 * tessary_features_LANES, a10);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 0 * tessary_features_LANES + tessary_features_CHUNK, b10);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 1 * tessary_features_LANES, a11);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 1 * tessary_features_LANES + tessary_features_CHUNK, b11);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 2 * tessary_features_LANES, a12);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 2 * tessary_features_LANES + tessary_features_CHUNK, b12);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 3 * tessary_features_LANES, a13);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 3 * tessary_features_LANES + tessary_features_CHUNK, b13);
    }
#else
    for (x = 0; x < tessary_features_CHUNK; x += 2 * tessary_features_LANES) {
        const float *k = taps;
        int i;
        tessary_features_FN(vec) a00 = {0.0f}, b00 = {0.0f};
        tessary_features_FN(vec) a01 = {0.0f}, b01 = {0.0f};
        tessary_features_FN(vec) a10 = {0.0f}, b10 = {0.0f};
        tessary_features_FN(vec) a11 = {0.0f}, b11 = {0.0f};
        for (i = 0; i < tessary_features_FFT_SIZE; ++i, k += 4) {
            const float *const re = s + tessary_features_FFT_FIRST + x + i, *const im = re + tessary_features_LINE;
            {
                const tessary_features_FN(vec) p = tessary_features_LOAD(re + 0 * tessary_features_LANES);
                const tessary_features_FN(vec) q = tessary_features_LOAD(im + 0 * tessary_features_LANES);
                tessary_features_MUL_ADD(a00, p, k[0]);
                tessary_features_MUL_ADD(b00, q, k[0]);
                tessary_features_MUL_SUB(a00, q, k[1]);
                tessary_features_MUL_ADD(b00, p, k[1]);
                tessary_features_MUL_ADD(a10, p, k[2]);
                tessary_features_MUL_ADD(b10, q, k[2]);
                tessary_features_MUL_SUB(a10, q, k[3]);
                tessary_features_MUL_ADD(b10, p, k[3]);
            }
            {
                const tessary_features_FN(vec) p = tessary_features_LOAD(re + 1 * tessary_features_LANES);
                const tessary_features_FN(vec) q = tessary_features_LOAD(im + 1 * tessary_features_LANES);
                tessary_features_MUL_ADD(a01, p, k[0]);
                tessary_features_MUL_ADD(b01, q, k[0]);
                tessary_features_MUL_SUB(a01, q, k[1]);
                tessary_features_MUL_ADD(b01, p, k[1]);
                tessary_features_MUL_ADD(a11, p, k[2]);
                tessary_features_MUL_ADD(b11, q, k[2]);
                tessary_features_MUL_SUB(a11, q, k[3]);
                tessary_features_MUL_ADD(b11, p, k[3]);
            }
        }
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 0 * tessary_features_LANES, a00);
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 0 * tessary_features_LANES + tessary_features_CHUNK, b00);
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 1 * tessary_features_LANES, a01);
        tessary_features_STORE(r + 0 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 1 * tessary_features_LANES + tessary_features_CHUNK, b01);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 0 * tessary_features_LANES, a10);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 0 * tessary_features_LANES + tessary_features_CHUNK, b10);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 1 * tessary_features_LANES, a11);
        tessary_features_STORE(r + 1 * tessary_features_FFT_BINS * tessary_features_CHUNK + x + 1 * tessary_features_LANES + tessary_features_CHUNK, b11);
    }
#endif
}

/* One block and chunk: rows of the block to all kernels' outputs, rows first .. last - 1. */
static tessary_features_TARGET void tessary_features_FN(fft_block)(const float *block, int first, int last, int n, float *work,
    char *out, ptrdiff_t row, ptrdiff_t plane, int stream)
{
    static const int kernels[tessary_features_FFT_COUNT] = {0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15};
    float *const s = work;
    float *const r = s + tessary_features_FFT_BINS * tessary_features_LINE;
    float *const y = r + 2 * tessary_features_FFT_BINS * tessary_features_CHUNK;
    const float *taps = tessary_features_spectra;
    int x, k, f, one, j;
    for (x = 0; x < tessary_features_LINE; x += tessary_features_LANES) tessary_features_FN(fft_forward)(block + x, s + x);
    for (k = 0; k < tessary_features_FFT_COUNT; k += 2) {
        for (f = 0; f < tessary_features_FFT_BINS; f += 2, taps += 4 * tessary_features_FFT_SIZE) {
            tessary_features_FN(fft_product)(s + f * tessary_features_LINE, taps, r + f * tessary_features_CHUNK);
        }
        for (one = 0; one < 2 && k + one < tessary_features_FFT_COUNT; ++one) {
            char *const to = out + (ptrdiff_t)kernels[k + one] * plane;
            for (x = 0; x < tessary_features_CHUNK; x += tessary_features_LANES) {
                tessary_features_FN(fft_backward)(r + one * tessary_features_FFT_BINS * tessary_features_CHUNK + x, y + x);
            }
            for (j = first; j < last; ++j) {
                tessary_features_FN(put)(y + j * tessary_features_CHUNK, (float *)(void *)(to + (ptrdiff_t)(j - first) * row),
                    n, stream);
            }
        }
    }
}

#undef tessary_features_MUL_SUB

#if tessary_features_LANES == 16
/* with a full mask, as some compilers take the plain form's own header for a mistake */
#define tessary_features_LEAST(a, b) \
    ((tessary_features_FN(vec))_mm512_maskz_min_ps((__mmask16)0xffff, (__m512)(a), (__m512)(b)))
#define tessary_features_MOST(a, b) \
    ((tessary_features_FN(vec))_mm512_maskz_max_ps((__mmask16)0xffff, (__m512)(a), (__m512)(b)))
#elif tessary_features_LANES == 8
#define tessary_features_LEAST(a, b) ((tessary_features_FN(vec))_mm256_min_ps((__m256)(a), (__m256)(b)))
#define tessary_features_MOST(a, b) ((tessary_features_FN(vec))_mm256_max_ps((__m256)(a), (__m256)(b)))
#elif tessary_features_LANES == 4 && defined(__SSE2__)
#define tessary_features_LEAST(a, b) ((tessary_features_FN(vec))_mm_min_ps((__m128)(a), (__m128)(b)))
#define tessary_features_MOST(a, b) ((tessary_features_FN(vec))_mm_max_ps((__m128)(a), (__m128)(b)))
#elif tessary_features_LANES == 4 && defined(__aarch64__)
#define tessary_features_LEAST(a, b) ((tessary_features_FN(vec))vminq_f32((float32x4_t)(a), (float32x4_t)(b)))
#define tessary_features_MOST(a, b) ((tessary_features_FN(vec))vmaxq_f32((float32x4_t)(a), (float32x4_t)(b)))
#elif tessary_features_LANES == 4
typedef int tessary_features_FN(pick) __attribute__((vector_size(16)));
static inline tessary_features_FN(vec) tessary_features_FN(least)(tessary_features_FN(vec) a, tessary_features_FN(vec) b)
{
    const tessary_features_FN(pick) m = a < b;
    return (tessary_features_FN(vec))(((tessary_features_FN(pick))a & m) | ((tessary_features_FN(pick))b & ~m));
}
#define tessary_features_LEAST(a, b) tessary_features_FN(least)((a), (b))
#define tessary_features_MOST(a, b) (-tessary_features_FN(least)(-(a), -(b)))
#else
#define tessary_features_LEAST(a, b) ((a) < (b) ? (a) : (b))
#define tessary_features_MOST(a, b) ((a) > (b) ? (a) : (b))
#endif

/* The least and the largest values of stretches of a row, 16 of each side by side. */
static tessary_features_TARGET void tessary_features_FN(range)(const float *row, int stretches, float *to)
{
    int s, x, i;
    for (s = 0; s < stretches; ++s, row += tessary_features_CHUNK, to += 32) {
        for (x = 0; x < 16; x += tessary_features_LANES) {
            tessary_features_FN(vec) low = tessary_features_LOAD(row + x), high = low;
            for (i = 16; i < tessary_features_CHUNK; i += 16) {
                const tessary_features_FN(vec) v = tessary_features_LOAD(row + i + x);
                low = tessary_features_LEAST(low, v);
                high = tessary_features_MOST(high, v);
            }
            tessary_features_STORE(to + x, low);
            tessary_features_STORE(to + 16 + x, high);
        }
    }
}

/* The least and the largest value of some rows' stretches. */
static tessary_features_TARGET void tessary_features_FN(spread)(const float *const *ranges, int at, float *low, float *high)
{
    float found[32];
    int x, j, s;
    for (x = 0; x < 16; x += tessary_features_LANES) {
        tessary_features_FN(vec) l = tessary_features_LOAD(ranges[0] + at * 32 + x);
        tessary_features_FN(vec) h = tessary_features_LOAD(ranges[0] + at * 32 + 16 + x);
        for (j = 0; j < tessary_features_FLAT_ROWS; ++j) {
            for (s = at; s < at + tessary_features_FLAT_SPAN; ++s) {
                l = tessary_features_LEAST(l, tessary_features_LOAD(ranges[j] + s * 32 + x));
                h = tessary_features_MOST(h, tessary_features_LOAD(ranges[j] + s * 32 + 16 + x));
            }
        }
        tessary_features_STORE(found + x, l);
        tessary_features_STORE(found + 16 + x, h);
    }
    *low = found[0];
    *high = found[16];
    for (x = 1; x < 16; ++x) {
        if (found[x] < *low) *low = found[x];
        if (found[16 + x] > *high) *high = found[16 + x];
    }
}

#undef tessary_features_LEAST
#undef tessary_features_MOST

/* ---- fixed point: 16-bit codes and coefficients, exact sums in 32 bits */

#if tessary_features_LANES == 16
#define tessary_features_TARGET_Q \
    __attribute__((target("avx512f,avx512vl,avx512bw,avx512dq,avx512vnni,avx2,fma")))
#else
#define tessary_features_TARGET_Q tessary_features_TARGET
#endif
#define tessary_features_QFN static inline tessary_features_TARGET_Q

#if tessary_features_LANES == 16

#define tessary_features_WIDE 32 /* codes in one vector */
typedef __m512i tessary_features_FN(q16);
typedef __m512i tessary_features_FN(q32);
#define tessary_features_X86(name) _mm512_##name
#define tessary_features_X86_STREAM(p, v) _mm512_stream_si512((__m512i *)(p), (v))

#elif tessary_features_LANES == 8

#define tessary_features_WIDE 16
typedef __m256i tessary_features_FN(q16);
typedef __m256i tessary_features_FN(q32);
#define tessary_features_X86(name) _mm256_##name
#define tessary_features_X86_STREAM(p, v) _mm256_stream_si256((__m256i *)(p), (v))

#elif tessary_features_LANES == 4 && defined(__SSE2__)

#define tessary_features_WIDE 8
typedef __m128i tessary_features_FN(q16);
typedef __m128i tessary_features_FN(q32);
#define tessary_features_X86(name) _mm_##name
#define tessary_features_X86_STREAM(p, v) _mm_stream_si128((__m128i *)(p), (v))

#elif tessary_features_LANES == 4 && defined(__aarch64__)

#define tessary_features_WIDE 8
typedef int16x8_t tessary_features_FN(q16);
typedef int32x4_t tessary_features_FN(q32);

#else

#define tessary_features_WIDE 8
typedef struct { int16_t v[8]; } tessary_features_FN(q16);
typedef struct { int32_t v[4]; } tessary_features_FN(q32);

#endif

#if defined(tessary_features_X86)

/* On x86 a pair of vectors is two halves of interleaved codes, in the order that packing
 * undoes; products stand in memory in that order too. */
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_load)(const int16_t *p)
{
    tessary_features_FN(q16) v;
    memcpy(&v, p, sizeof v);
    return v;
}
tessary_features_QFN void tessary_features_FN(q_store)(int16_t *p, tessary_features_FN(q16) v) { memcpy(p, &v, sizeof v); }
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_sum)(const int32_t *p)
{
    tessary_features_FN(q32) v;
    memcpy(&v, p, sizeof v);
    return v;
}
tessary_features_QFN void tessary_features_FN(q_keep)(int32_t *p, tessary_features_FN(q32) v) { memcpy(p, &v, sizeof v); }
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_add)(tessary_features_FN(q16) a, tessary_features_FN(q16) b) { return tessary_features_X86(add_epi16)(a, b); }
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_sub)(tessary_features_FN(q16) a, tessary_features_FN(q16) b) { return tessary_features_X86(sub_epi16)(a, b); }
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_plus)(tessary_features_FN(q32) a, tessary_features_FN(q32) b) { return tessary_features_X86(add_epi32)(a, b); }
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_minus)(tessary_features_FN(q32) a, tessary_features_FN(q32) b) { return tessary_features_X86(sub_epi32)(a, b); }
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_nought)(void) { return tessary_features_X86(set1_epi32)(0); }
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_low)(tessary_features_FN(q16) v, tessary_features_FN(q16) w) { return tessary_features_X86(unpacklo_epi16)(v, w); }
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_high)(tessary_features_FN(q16) v, tessary_features_FN(q16) w) { return tessary_features_X86(unpackhi_epi16)(v, w); }
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_mac)(tessary_features_FN(q32) sum, tessary_features_FN(q16) pairs, const int16_t *k)
{
    int32_t both;
    memcpy(&both, k, sizeof both);
#if tessary_features_LANES == 16
    return _mm512_dpwssd_epi32(sum, pairs, _mm512_set1_epi32(both));
#else
    return tessary_features_FN(q_plus)(sum, tessary_features_X86(madd_epi16)(pairs, tessary_features_X86(set1_epi32)(both)));
#endif
}
#define tessary_features_PAIR(v, w) const tessary_features_FN(q16) l = tessary_features_FN(q_low)(v, w), h = tessary_features_FN(q_high)(v, w)
#define tessary_features_MAC(a, b, k) (a = tessary_features_FN(q_mac)(a, l, k), b = tessary_features_FN(q_mac)(b, h, k))
typedef int32_t tessary_features_FN(q_signed) __attribute__((vector_size(2 * tessary_features_WIDE)));
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_down)(tessary_features_FN(q32) v, int bits)
{
    /* an arithmetic shift: every compiler with these vectors makes it one */
    return (tessary_features_FN(q32))(((tessary_features_FN(q_signed))v + (1 << bits >> 1)) >> bits);
}
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_round)(tessary_features_FN(q32) l, tessary_features_FN(q32) h, int bits)
{
    return tessary_features_X86(max_epi16)(tessary_features_X86(packs_epi32)(tessary_features_FN(q_down)(l, bits), tessary_features_FN(q_down)(h, bits)),
        tessary_features_X86(set1_epi16)(-32767));
}

#elif tessary_features_LANES == 4 && defined(__aarch64__)

tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_load)(const int16_t *p) { return vld1q_s16(p); }
tessary_features_QFN void tessary_features_FN(q_store)(int16_t *p, tessary_features_FN(q16) v) { vst1q_s16(p, v); }
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_sum)(const int32_t *p) { return vld1q_s32(p); }
tessary_features_QFN void tessary_features_FN(q_keep)(int32_t *p, tessary_features_FN(q32) v) { vst1q_s32(p, v); }
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_add)(tessary_features_FN(q16) a, tessary_features_FN(q16) b) { return vaddq_s16(a, b); }
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_sub)(tessary_features_FN(q16) a, tessary_features_FN(q16) b) { return vsubq_s16(a, b); }
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_plus)(tessary_features_FN(q32) a, tessary_features_FN(q32) b) { return vaddq_s32(a, b); }
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_minus)(tessary_features_FN(q32) a, tessary_features_FN(q32) b) { return vsubq_s32(a, b); }
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_nought)(void) { return vdupq_n_s32(0); }
#define tessary_features_PAIR(v, w) const tessary_features_FN(q16) l = (v), h = (w)
#define tessary_features_MAC(a, b, k)                                            \
    (a = vmlal_n_s16(vmlal_n_s16(a, vget_low_s16(l), (k)[0]), vget_low_s16(h), (k)[1]), \
     b = vmlal_n_s16(vmlal_n_s16(b, vget_high_s16(l), (k)[0]), vget_high_s16(h), (k)[1]))
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_round)(tessary_features_FN(q32) l, tessary_features_FN(q32) h, int bits)
{
    const int32x4_t half = vdupq_n_s32(1 << bits >> 1), down = vdupq_n_s32(-bits);
    return vmaxq_s16(vcombine_s16(vqmovn_s32(vshlq_s32(vaddq_s32(l, half), down)),
        vqmovn_s32(vshlq_s32(vaddq_s32(h, half), down))), vdupq_n_s16(-32767));
}

#else

/* The portable twin: the same bits, in plain C. */
#define tessary_features_EACH(n) for (i = 0; i < (n); ++i)
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_load)(const int16_t *p)
{
    tessary_features_FN(q16) v;
    memcpy(&v, p, sizeof v);
    return v;
}
tessary_features_QFN void tessary_features_FN(q_store)(int16_t *p, tessary_features_FN(q16) v) { memcpy(p, &v, sizeof v); }
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_sum)(const int32_t *p)
{
    tessary_features_FN(q32) v;
    memcpy(&v, p, sizeof v);
    return v;
}
tessary_features_QFN void tessary_features_FN(q_keep)(int32_t *p, tessary_features_FN(q32) v) { memcpy(p, &v, sizeof v); }
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_add)(tessary_features_FN(q16) a, tessary_features_FN(q16) b)
{
    int i;
    tessary_features_EACH(8) a.v[i] = (int16_t)(a.v[i] + b.v[i]);
    return a;
}
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_sub)(tessary_features_FN(q16) a, tessary_features_FN(q16) b)
{
    int i;
    tessary_features_EACH(8) a.v[i] = (int16_t)(a.v[i] - b.v[i]);
    return a;
}
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_plus)(tessary_features_FN(q32) a, tessary_features_FN(q32) b)
{
    int i;
    tessary_features_EACH(4) a.v[i] += b.v[i];
    return a;
}
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_minus)(tessary_features_FN(q32) a, tessary_features_FN(q32) b)
{
    int i;
    tessary_features_EACH(4) a.v[i] -= b.v[i];
    return a;
}
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_nought)(void)
{
    tessary_features_FN(q32) a;
    memset(&a, 0, sizeof a);
    return a;
}
tessary_features_QFN tessary_features_FN(q32) tessary_features_FN(q_mac)(tessary_features_FN(q32) sum, const int16_t *v, const int16_t *w,
    const int16_t *k)
{
    int i;
    tessary_features_EACH(4) sum.v[i] += (int32_t)v[i] * k[0] + (int32_t)w[i] * k[1];
    return sum;
}
#define tessary_features_PAIR(v, w) const tessary_features_FN(q16) l = (v), h = (w)
#define tessary_features_MAC(a, b, k) \
    (a = tessary_features_FN(q_mac)(a, l.v, h.v, k), b = tessary_features_FN(q_mac)(b, l.v + 4, h.v + 4, k))
tessary_features_QFN int16_t tessary_features_FN(q_one)(int32_t v, int bits)
{
    /* the floor of a division, without shifting a negative number */
    v += 1 << bits >> 1;
    v = v >= 0 ? v >> bits : -1 - ((-1 - v) >> bits);
    return (int16_t)(v > 32767 ? 32767 : v < -32767 ? -32767 : v);
}
tessary_features_QFN tessary_features_FN(q16) tessary_features_FN(q_round)(tessary_features_FN(q32) l, tessary_features_FN(q32) h, int bits)
{
    tessary_features_FN(q16) r;
    int i;
    tessary_features_EACH(4) r.v[i] = tessary_features_FN(q_one)(l.v[i], bits);
    tessary_features_EACH(4) r.v[i + 4] = tessary_features_FN(q_one)(h.v[i], bits);
    return r;
}
#undef tessary_features_EACH

#endif

/* The middle row, then the sums and then the differences of the rows about it. */
static tessary_features_TARGET_Q void tessary_features_FN(q_fold)(const int16_t *const *rows, ptrdiff_t at, int16_t *s)
{
    int j, x;
    for (x = 0; x < tessary_features_LINE_Q; x += tessary_features_WIDE) {
        tessary_features_FN(q_store)(s + x, tessary_features_FN(q_load)(rows[tessary_features_RADIUS] + at + x));
    }
    for (j = 1; j <= tessary_features_RADIUS; ++j) {
        const int16_t *const below = rows[tessary_features_RADIUS + j] + at;
        const int16_t *const above = rows[tessary_features_RADIUS - j] + at;
        int16_t *const sum = s + (ptrdiff_t)j * tessary_features_LINE_Q;
        int16_t *const difference = s + (ptrdiff_t)(tessary_features_RADIUS + j) * tessary_features_LINE_Q;
        for (x = 0; x < tessary_features_LINE_Q; x += tessary_features_WIDE) {
            const tessary_features_FN(q16) b = tessary_features_FN(q_load)(below + x), a = tessary_features_FN(q_load)(above + x);
            tessary_features_FN(q_store)(sum + x, tessary_features_FN(q_add)(b, a));
            tessary_features_FN(q_store)(difference + x, tessary_features_FN(q_sub)(b, a));
        }
    }
}

static tessary_features_TARGET_Q void tessary_features_FN(q_group0)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const int16_t *k = tessary_features_group0_counts;
        tessary_features_FN(q32) a0 = tessary_features_FN(q_nought)(), b0 = a0;
        tessary_features_FN(q32) a1 = tessary_features_FN(q_nought)(), b1 = a1;
        tessary_features_FN(q32) a2 = tessary_features_FN(q_nought)(), b2 = a2;
        tessary_features_FN(q32) a3 = tessary_features_FN(q_nought)(), b3 = a3;
        tessary_features_FN(q32) a4 = tessary_features_FN(q_nought)(), b4 = a4;
        int j;
        for (j = 0; j < 13; j += 1) {
            const int16_t *const r = s + (ptrdiff_t)(j) * tessary_features_LINE_Q + x + tessary_features_RADIUS;
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_load)(r);
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 1), tessary_features_FN(q_load)(r - 1));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                tessary_features_MAC(a4, b4, k + 8);
                k += 10;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 2), tessary_features_FN(q_load)(r - 2));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 3), tessary_features_FN(q_load)(r - 3));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                tessary_features_MAC(a4, b4, k + 8);
                k += 10;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 4), tessary_features_FN(q_load)(r - 4));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 5), tessary_features_FN(q_load)(r - 5));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                tessary_features_MAC(a4, b4, k + 8);
                k += 10;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 6), tessary_features_FN(q_load)(r - 6));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 7), tessary_features_FN(q_load)(r - 7));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                tessary_features_MAC(a4, b4, k + 8);
                k += 10;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 8), tessary_features_FN(q_load)(r - 8));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 9), tessary_features_FN(q_load)(r - 9));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                tessary_features_MAC(a4, b4, k + 8);
                k += 10;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 10), tessary_features_FN(q_load)(r - 10));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 11), tessary_features_FN(q_load)(r - 11));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                tessary_features_MAC(a4, b4, k + 8);
                k += 10;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 12), tessary_features_FN(q_load)(r - 12));
                const tessary_features_FN(q16) w = v;
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                tessary_features_MAC(a4, b4, k + 8);
                k += 10;
            }
        }
        tessary_features_FN(q_keep)(t + 8 * tessary_features_CHUNK + x, a0);
        tessary_features_FN(q_keep)(t + 8 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b0);
        tessary_features_FN(q_keep)(t + 9 * tessary_features_CHUNK + x, a1);
        tessary_features_FN(q_keep)(t + 9 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b1);
        tessary_features_FN(q_keep)(t + 11 * tessary_features_CHUNK + x, a2);
        tessary_features_FN(q_keep)(t + 11 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b2);
        tessary_features_FN(q_keep)(t + 13 * tessary_features_CHUNK + x, a3);
        tessary_features_FN(q_keep)(t + 13 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b3);
        tessary_features_FN(q_keep)(t + 15 * tessary_features_CHUNK + x, a4);
        tessary_features_FN(q_keep)(t + 15 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b4);
    }
}

static tessary_features_TARGET_Q void tessary_features_FN(q_group1)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const int16_t *k = tessary_features_group1_counts;
        tessary_features_FN(q32) a0 = tessary_features_FN(q_nought)(), b0 = a0;
        tessary_features_FN(q32) a1 = tessary_features_FN(q_nought)(), b1 = a1;
        tessary_features_FN(q32) a2 = tessary_features_FN(q_nought)(), b2 = a2;
        int j;
        for (j = 13; j < 25; j += 1) {
            const int16_t *const r = s + (ptrdiff_t)(j) * tessary_features_LINE_Q + x + tessary_features_RADIUS;
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 1), tessary_features_FN(q_load)(r - 1));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 2), tessary_features_FN(q_load)(r - 2));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 3), tessary_features_FN(q_load)(r - 3));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 4), tessary_features_FN(q_load)(r - 4));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 5), tessary_features_FN(q_load)(r - 5));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 6), tessary_features_FN(q_load)(r - 6));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 7), tessary_features_FN(q_load)(r - 7));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 8), tessary_features_FN(q_load)(r - 8));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 9), tessary_features_FN(q_load)(r - 9));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 10), tessary_features_FN(q_load)(r - 10));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 11), tessary_features_FN(q_load)(r - 11));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 12), tessary_features_FN(q_load)(r - 12));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                k += 6;
            }
        }
        tessary_features_FN(q_keep)(t + 10 * tessary_features_CHUNK + x, a0);
        tessary_features_FN(q_keep)(t + 10 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b0);
        tessary_features_FN(q_keep)(t + 12 * tessary_features_CHUNK + x, a1);
        tessary_features_FN(q_keep)(t + 12 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b1);
        tessary_features_FN(q_keep)(t + 14 * tessary_features_CHUNK + x, a2);
        tessary_features_FN(q_keep)(t + 14 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b2);
    }
}

static tessary_features_TARGET_Q void tessary_features_FN(q_group2)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const int16_t *k = tessary_features_group2_counts;
        tessary_features_FN(q32) a0 = tessary_features_FN(q_nought)(), b0 = a0;
        tessary_features_FN(q32) a1 = tessary_features_FN(q_nought)(), b1 = a1;
        tessary_features_FN(q32) a2 = tessary_features_FN(q_nought)(), b2 = a2;
        tessary_features_FN(q32) a3 = tessary_features_FN(q_nought)(), b3 = a3;
        int j;
        for (j = 0; j < 13; j += 1) {
            const int16_t *const r = s + (ptrdiff_t)(j) * tessary_features_LINE_Q + x + tessary_features_RADIUS;
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 1), tessary_features_FN(q_load)(r - 1));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 2), tessary_features_FN(q_load)(r - 2));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 3), tessary_features_FN(q_load)(r - 3));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 4), tessary_features_FN(q_load)(r - 4));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 5), tessary_features_FN(q_load)(r - 5));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 6), tessary_features_FN(q_load)(r - 6));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 7), tessary_features_FN(q_load)(r - 7));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 8), tessary_features_FN(q_load)(r - 8));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 9), tessary_features_FN(q_load)(r - 9));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 10), tessary_features_FN(q_load)(r - 10));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 11), tessary_features_FN(q_load)(r - 11));
                const tessary_features_FN(q16) w = tessary_features_FN(q_sub)(tessary_features_FN(q_load)(r + 12), tessary_features_FN(q_load)(r - 12));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
        }
        tessary_features_FN(q_keep)(t + 0 * tessary_features_CHUNK + x, a0);
        tessary_features_FN(q_keep)(t + 0 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b0);
        tessary_features_FN(q_keep)(t + 1 * tessary_features_CHUNK + x, a1);
        tessary_features_FN(q_keep)(t + 1 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b1);
        tessary_features_FN(q_keep)(t + 3 * tessary_features_CHUNK + x, a2);
        tessary_features_FN(q_keep)(t + 3 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b2);
        tessary_features_FN(q_keep)(t + 5 * tessary_features_CHUNK + x, a3);
        tessary_features_FN(q_keep)(t + 5 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b3);
    }
}

static tessary_features_TARGET_Q void tessary_features_FN(q_group3)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const int16_t *k = tessary_features_group3_counts;
        tessary_features_FN(q32) a0 = tessary_features_FN(q_nought)(), b0 = a0;
        tessary_features_FN(q32) a1 = tessary_features_FN(q_nought)(), b1 = a1;
        tessary_features_FN(q32) a2 = tessary_features_FN(q_nought)(), b2 = a2;
        tessary_features_FN(q32) a3 = tessary_features_FN(q_nought)(), b3 = a3;
        int j;
        for (j = 13; j < 25; j += 2) {
            const int16_t *const r = s + (ptrdiff_t)(j) * tessary_features_LINE_Q + x + tessary_features_RADIUS;
            const int16_t *const r2 = s + (ptrdiff_t)(j + 1) * tessary_features_LINE_Q + x + tessary_features_RADIUS;
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_load)(r);
                const tessary_features_FN(q16) w = tessary_features_FN(q_load)(r2);
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 1), tessary_features_FN(q_load)(r - 1));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 1), tessary_features_FN(q_load)(r2 - 1));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 2), tessary_features_FN(q_load)(r - 2));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 2), tessary_features_FN(q_load)(r2 - 2));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 3), tessary_features_FN(q_load)(r - 3));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 3), tessary_features_FN(q_load)(r2 - 3));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 4), tessary_features_FN(q_load)(r - 4));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 4), tessary_features_FN(q_load)(r2 - 4));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 5), tessary_features_FN(q_load)(r - 5));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 5), tessary_features_FN(q_load)(r2 - 5));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 6), tessary_features_FN(q_load)(r - 6));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 6), tessary_features_FN(q_load)(r2 - 6));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 7), tessary_features_FN(q_load)(r - 7));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 7), tessary_features_FN(q_load)(r2 - 7));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 8), tessary_features_FN(q_load)(r - 8));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 8), tessary_features_FN(q_load)(r2 - 8));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 9), tessary_features_FN(q_load)(r - 9));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 9), tessary_features_FN(q_load)(r2 - 9));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 10), tessary_features_FN(q_load)(r - 10));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 10), tessary_features_FN(q_load)(r2 - 10));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 11), tessary_features_FN(q_load)(r - 11));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 11), tessary_features_FN(q_load)(r2 - 11));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_features_FN(q16) v = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r + 12), tessary_features_FN(q_load)(r - 12));
                const tessary_features_FN(q16) w = tessary_features_FN(q_add)(tessary_features_FN(q_load)(r2 + 12), tessary_features_FN(q_load)(r2 - 12));
                tessary_features_PAIR(v, w);
                tessary_features_MAC(a0, b0, k + 0);
                tessary_features_MAC(a1, b1, k + 2);
                tessary_features_MAC(a2, b2, k + 4);
                tessary_features_MAC(a3, b3, k + 6);
                k += 8;
            }
        }
        tessary_features_FN(q_keep)(t + 2 * tessary_features_CHUNK + x, a0);
        tessary_features_FN(q_keep)(t + 2 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b0);
        tessary_features_FN(q_keep)(t + 4 * tessary_features_CHUNK + x, a1);
        tessary_features_FN(q_keep)(t + 4 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b1);
        tessary_features_FN(q_keep)(t + 6 * tessary_features_CHUNK + x, a2);
        tessary_features_FN(q_keep)(t + 6 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b2);
        tessary_features_FN(q_keep)(t + 7 * tessary_features_CHUNK + x, a3);
        tessary_features_FN(q_keep)(t + 7 * tessary_features_CHUNK + x + tessary_features_WIDE / 2, b3);
    }
}

/* Counts go to the caller, past the cache where the planes are large. */
static tessary_features_TARGET_Q void tessary_features_FN(q_put)(const int16_t *from, int16_t *to, int n, int stream)
{
    int x = 0;
#if defined(tessary_features_X86)
    if (stream) {
        const int head = (int)(((64u - ((uintptr_t)to & 63u)) & 63u) / 2u);
        for (; x < head && x < n; ++x) to[x] = from[x];
        for (; x + tessary_features_WIDE <= n; x += tessary_features_WIDE)
            tessary_features_X86_STREAM((void *)(to + x), tessary_features_FN(q_load)(from + x));
    }
#else
    (void)stream;
#endif
    if (x < n) memcpy(to + x, from + x, (size_t)(n - x) * sizeof(int16_t));
}

static tessary_features_TARGET_Q uint64_t tessary_features_FN(q_responses)(const int16_t *const *rows, ptrdiff_t at, int n,
    void *work, char *out, ptrdiff_t plane, int stream)
{
    int16_t *const s = (int16_t *)work; /* folded rows */
    int32_t *const t = (int32_t *)(void *)(s + tessary_features_FOLDED_Q); /* products */
    int16_t *const r = (int16_t *)(void *)(t + 16 * tessary_features_CHUNK); /* counts */
    uint64_t ends = 0;
    int x;
    tessary_features_FN(q_fold)(rows, at, s);
    tessary_features_FN(q_group0)(s, t);
    tessary_features_FN(q_group1)(s, t);
    tessary_features_FN(q_group2)(s, t);
    tessary_features_FN(q_group3)(s, t);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_sum)(t + 0 * tessary_features_CHUNK + x);
        const tessary_features_FN(q32) h = tessary_features_FN(q_sum)(t + 0 * tessary_features_CHUNK + x + tessary_features_WIDE / 2);
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 0 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 1 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 2 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 1 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 2 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 1 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 3 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 4 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 3 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 4 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 2 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 5 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 6 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 5 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 6 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 3 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_sum)(t + 7 * tessary_features_CHUNK + x);
        const tessary_features_FN(q32) h = tessary_features_FN(q_sum)(t + 7 * tessary_features_CHUNK + x + tessary_features_WIDE / 2);
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 4 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 5 * tessary_features_CHUNK + x)), tessary_features_FN(q_sum)(t + 6 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 5 * tessary_features_CHUNK + x + tessary_features_WIDE / 2)), tessary_features_FN(q_sum)(t + 6 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 5 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 3 * tessary_features_CHUNK + x)), tessary_features_FN(q_sum)(t + 4 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 3 * tessary_features_CHUNK + x + tessary_features_WIDE / 2)), tessary_features_FN(q_sum)(t + 4 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 6 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 1 * tessary_features_CHUNK + x)), tessary_features_FN(q_sum)(t + 2 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 1 * tessary_features_CHUNK + x + tessary_features_WIDE / 2)), tessary_features_FN(q_sum)(t + 2 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 7 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_sum)(t + 8 * tessary_features_CHUNK + x);
        const tessary_features_FN(q32) h = tessary_features_FN(q_sum)(t + 8 * tessary_features_CHUNK + x + tessary_features_WIDE / 2);
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 8 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 9 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 10 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 9 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 10 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 9 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 11 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 12 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 11 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 12 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 10 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 13 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 14 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 13 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 14 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 11 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_sum)(t + 15 * tessary_features_CHUNK + x);
        const tessary_features_FN(q32) h = tessary_features_FN(q_sum)(t + 15 * tessary_features_CHUNK + x + tessary_features_WIDE / 2);
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 12 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 13 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 14 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 13 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 14 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 13 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 11 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 12 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 11 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 12 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 14 * plane), n, stream);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 9 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 10 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 9 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 10 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_put)(r, (int16_t *)(void *)(out + 15 * plane), n, stream);
    return ends;
}

/* Keep the largest value so far and whose it is; among equals the first stays. */
static tessary_features_TARGET_Q void tessary_features_FN(q_take)(const int16_t *e, const int16_t *o, int turn,
    int32_t *best, int32_t *who)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; ++x) {
        const int32_t v = (int32_t)e[x] * e[x] + (int32_t)o[x] * o[x];
        who[x] = v > best[x] ? turn : who[x];
        best[x] = v > best[x] ? v : best[x];
    }
}

/* Strength and winner of scale 0. */
static tessary_features_TARGET_Q void tessary_features_FN(q_edges0)(const int16_t *const *rows,
    ptrdiff_t at, int n, void *work, float *strength, unsigned char *orientation)
{
    int16_t *const s = (int16_t *)work; /* folded rows */
    int32_t *const t = (int32_t *)(void *)(s + tessary_features_FOLDED_Q); /* products */
    int32_t *const best = t + 16 * tessary_features_CHUNK;
    int32_t *const who = best + tessary_features_CHUNK;
    int16_t *const r = (int16_t *)(void *)(who + tessary_features_CHUNK);
    int x;
    tessary_features_FN(q_fold)(rows, at, s);
    tessary_features_FN(q_group0)(s, t);
    tessary_features_FN(q_group1)(s, t);
    tessary_features_FN(q_group2)(s, t);
    tessary_features_FN(q_group3)(s, t);
    for (x = 0; x < tessary_features_CHUNK; ++x) best[x] = -1;
    for (x = 0; x < tessary_features_CHUNK; ++x) who[x] = 0;
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_sum)(t + 8 * tessary_features_CHUNK + x);
        const tessary_features_FN(q32) h = tessary_features_FN(q_sum)(t + 8 * tessary_features_CHUNK + x + tessary_features_WIDE / 2);
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_sum)(t + 0 * tessary_features_CHUNK + x);
        const tessary_features_FN(q32) h = tessary_features_FN(q_sum)(t + 0 * tessary_features_CHUNK + x + tessary_features_WIDE / 2);
        tessary_features_FN(q_store)(r + tessary_features_CHUNK + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_take)(r, r + tessary_features_CHUNK, 0, best, who);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 9 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 10 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 9 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 10 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 1 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 2 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 1 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 2 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + tessary_features_CHUNK + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_take)(r, r + tessary_features_CHUNK, 1, best, who);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 11 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 12 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 11 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 12 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 3 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 4 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 3 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 4 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + tessary_features_CHUNK + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_take)(r, r + tessary_features_CHUNK, 2, best, who);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 13 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 14 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 13 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 14 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 5 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 6 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_sum)(t + 5 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 6 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + tessary_features_CHUNK + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_take)(r, r + tessary_features_CHUNK, 3, best, who);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_sum)(t + 15 * tessary_features_CHUNK + x);
        const tessary_features_FN(q32) h = tessary_features_FN(q_sum)(t + 15 * tessary_features_CHUNK + x + tessary_features_WIDE / 2);
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_sum)(t + 7 * tessary_features_CHUNK + x);
        const tessary_features_FN(q32) h = tessary_features_FN(q_sum)(t + 7 * tessary_features_CHUNK + x + tessary_features_WIDE / 2);
        tessary_features_FN(q_store)(r + tessary_features_CHUNK + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_take)(r, r + tessary_features_CHUNK, 4, best, who);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 13 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 14 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 13 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 14 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 5 * tessary_features_CHUNK + x)), tessary_features_FN(q_sum)(t + 6 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 5 * tessary_features_CHUNK + x + tessary_features_WIDE / 2)), tessary_features_FN(q_sum)(t + 6 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + tessary_features_CHUNK + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_take)(r, r + tessary_features_CHUNK, 5, best, who);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 11 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 12 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 11 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 12 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 3 * tessary_features_CHUNK + x)), tessary_features_FN(q_sum)(t + 4 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 3 * tessary_features_CHUNK + x + tessary_features_WIDE / 2)), tessary_features_FN(q_sum)(t + 4 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + tessary_features_CHUNK + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_take)(r, r + tessary_features_CHUNK, 6, best, who);
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 9 * tessary_features_CHUNK + x), tessary_features_FN(q_sum)(t + 10 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_minus)(tessary_features_FN(q_sum)(t + 9 * tessary_features_CHUNK + x + tessary_features_WIDE / 2), tessary_features_FN(q_sum)(t + 10 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + x, tessary_features_FN(q_round)(l, h, 15));
    }
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_WIDE) {
        const tessary_features_FN(q32) l = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 1 * tessary_features_CHUNK + x)), tessary_features_FN(q_sum)(t + 2 * tessary_features_CHUNK + x));
        const tessary_features_FN(q32) h = tessary_features_FN(q_plus)(tessary_features_FN(q_minus)(tessary_features_FN(q_nought)(), tessary_features_FN(q_sum)(t + 1 * tessary_features_CHUNK + x + tessary_features_WIDE / 2)), tessary_features_FN(q_sum)(t + 2 * tessary_features_CHUNK + x + tessary_features_WIDE / 2));
        tessary_features_FN(q_store)(r + tessary_features_CHUNK + x, tessary_features_FN(q_round)(l, h, 15));
    }
    tessary_features_FN(q_take)(r, r + tessary_features_CHUNK, 7, best, who);
    for (x = 0; x < n; ++x) strength[x] = 0.0133973919f * sqrtf((float)best[x]);
    for (x = 0; x < n; ++x) orientation[x] = (unsigned char)who[x];
}

#undef tessary_features_TARGET_Q
#undef tessary_features_QFN
#undef tessary_features_WIDE
#undef tessary_features_X86
#undef tessary_features_X86_STREAM
#undef tessary_features_PAIR
#undef tessary_features_MAC
/* ---- edge elements: least squares */

static tessary_features_TARGET double tessary_features_FN(dot)(const double *a, const double *b, int n)
{
    double s0 = 0.0, s1 = 0.0, s2 = 0.0, s3 = 0.0, s4 = 0.0, s5 = 0.0, s6 = 0.0, s7 = 0.0;
    int i;
    for (i = 0; i < n; i += 8) {
        s0 += a[i] * b[i];
        s1 += a[i + 1] * b[i + 1];
        s2 += a[i + 2] * b[i + 2];
        s3 += a[i + 3] * b[i + 3];
        s4 += a[i + 4] * b[i + 4];
        s5 += a[i + 5] * b[i + 5];
        s6 += a[i + 6] * b[i + 6];
        s7 += a[i + 7] * b[i + 7];
    }
    return ((s0 + s4) + (s2 + s6)) + ((s1 + s5) + (s3 + s7));
}

/* The model at q against the data. Returns the sum of squares of what is left. */
static tessary_features_TARGET double tessary_features_FN(residual)(const struct tessary_features_problem *p, const double *q,
    struct tessary_features_slopes *to)
{
    struct tessary_features_work *const w = p->work;
    const double *const px = p->disk->x, *const py = p->disk->y;
    double *const u = w->u, *const shape = w->shape, *const slope = w->slope, *const a = w->a;
    double *const light = w->light, *const inside = w->inside, *const from = w->from;
    double *const rises = w->rises, *const gains = w->gains;
    int *const at = w->at;
    const int n = p->disk->padded;
    const double step = q[3] - q[2], bend = q[4];
    const double blur = q[5] == p->log_blur ? p->blur : tessary_features_exp(q[5]);
    double sine, cosine;
    int i;
    tessary_features_turn(q[1], &sine, &cosine);
    for (i = 0; i < n; ++i) {
        const double along = py[i] * cosine - px[i] * sine;
        const double across = px[i] * cosine + py[i] * sine;
        u[i] = (across - q[0] - bend * (along * along) / 2) / blur;
    }
    /* loops of their own, as compilers make vectors of these and not of one long loop */
    for (i = 0; i < n; ++i) {
        const double v = tessary_features_magnitude(u[i]);
        a[i] = v < 8.5 ? v : 8.5; /* beyond, all is done to the last bit */
    }
    for (i = 0; i < n; ++i) {
        const double z = a[i] * a[i] * (-1.0 / 128.0);
        const double e1 = 1.0 + z * (1.0 + z * (1.0 / 2 + z * (1.0 / 6 + z * (1.0 / 24
            + z * (1.0 / 120 + z * (1.0 / 720 + z * (1.0 / 5040 + z * (1.0 / 40320
            + z * (1.0 / 362880 + z * (1.0 / 3628800))))))))));
        const double e2 = e1 * e1, e4 = e2 * e2, e8 = e4 * e4, e16 = e8 * e8, e32 = e16 * e16;
        const double bell = 0.39894228040143270 * (e32 * e32);
        const double t = 1.9411764705882355 - 11.764705882352942 / (a[i] + 4.0);
        slope[i] = bell;
        a[i] = 0.5 - bell * (0.41203077947424244 + t * (-0.47133828047847964 + t * (0.24919232279170117 + t * (-0.094562716637217742 + t * (0.023789135973789375 + t * (-0.0028538115956059729 + t * (-0.00031780601883045988 + t * (0.00014539073621716082 + t * (3.8754096662636588e-06 + t * (-6.9703666881244076e-06 + t * (-2.40788948985068e-07 + t * (3.6963931056189636e-07 + t * (3.7496750115510685e-08 + t * (-1.8941757186515375e-08 + t * (-4.2770711897314712e-09 + t * (6.7946299171902166e-10 + t * 2.8944222336603035e-10)))
            )))
            )))
            )))
            )))
            );
    }
    for (i = 0; i < n; ++i) shape[i] = 0.5 + (u[i] < 0.0 ? -a[i] : a[i]);
    if (p->line) {
        for (i = 0; i < n; ++i) {
            shape[i] = 2.5066282746310002 * slope[i];
            slope[i] = -u[i] * shape[i];
        }
    }
    for (i = 0; i < n; ++i) light[i] = q[2] + step * shape[i];
    for (i = 0; i < n; ++i) a[i] = light[i] > tessary_features_LIGHT(0) ? light[i] : tessary_features_LIGHT(0);
    for (i = 0; i < n; ++i) inside[i] = a[i] < tessary_features_LIGHT(255) ? a[i] : tessary_features_LIGHT(255);
    for (i = 0; i < n; ++i) a[i] = inside[i] - tessary_features_LIGHT(0);
    for (i = 0; i < n; ++i) a[i] = a[i] > 0.0 ? a[i] : 0.0;
    for (i = 0; i < n; ++i) a[i] = a[i] < 254.0 ? a[i] : 254.0;
    for (i = 0; i < n; ++i) at[i] = (int)a[i];
    for (i = 0; i < n; ++i) {
        from[i] = tessary_features_KNOT(at[i]);
        rises[i] = tessary_features_KNOT(at[i] + 1) - from[i];
    }
    for (i = 0; i < n; ++i) gains[i] = rises[i] * (double)(inside[i] == light[i]);
    for (i = 0; i < n; ++i) {
        const double along = py[i] * cosine - px[i] * sine;
        const double across = px[i] * cosine + py[i] * sine;
        const double value = from[i] + rises[i] * (inside[i] - tessary_features_LIGHT(at[i]));
        const double gain = w->weight[i] * gains[i];
        const double by_u = gain * step * slope[i];
        to->left[i] = w->weight[i] * (w->data[i] - value);
        to->by[0][i] = -by_u / blur;
        to->by[1][i] = by_u * (along + bend * along * across) / blur;
        to->by[2][i] = gain * (1.0 - shape[i]);
        to->by[3][i] = gain * shape[i];
        to->by[4][i] = -by_u * (along * along) / 2 / blur;
        to->by[5][i] = -by_u * u[i];
    }
    return tessary_features_FN(dot)(to->left, to->left, n);
}

static double tessary_features_FN(known)(const struct tessary_features_problem *p, const double *q, const int *is_free)
{
    double sum = 0.0;
    int i;
    for (i = 0; i < 6; ++i) {
        const double off = q[i] - tessary_features_middle(p, i);
        if (is_free[i]) sum += off * off * tessary_features_before(p, i);
    }
    return sum;
}

/* Normal matrix and right side of the free parameters. */
static tessary_features_TARGET void tessary_features_FN(normal)(const struct tessary_features_problem *p, const double *q,
    const struct tessary_features_slopes *s, const int *is_free, double matrix[6][6], double *right)
{
    double top = 0.0;
    int i, j;
    for (i = 0; i < 6; ++i) {
        if (!is_free[i]) continue;
        for (j = 0; j <= i; ++j) {
            if (is_free[j]) matrix[i][j] = matrix[j][i] =
                tessary_features_FN(dot)(s->by[i], s->by[j], p->disk->padded);
        }
        matrix[i][i] += tessary_features_before(p, i);
        if (matrix[i][i] > top) top = matrix[i][i];
        right[i] = tessary_features_FN(dot)(s->by[i], s->left, p->disk->padded)
            - tessary_features_before(p, i) * (q[i] - tessary_features_middle(p, i));
    }
    /* a ridge: parameters that the pixels cannot tell apart get no step and a huge error */
    for (i = 0; i < 6; ++i) {
        if (is_free[i]) matrix[i][i] += 1e-12 + 1e-10 * top;
    }
}

static double tessary_features_FN(freedom)(const struct tessary_features_problem *p, const int *is_free)
{
    int i, left = p->pixels;
    for (i = 0; i < 6; ++i) left -= is_free[i];
    return left > 1 ? (double)left : 1.0;
}

/* Damped Gauss-Newton. On entry and at the end *s belongs to q. Returns whether it settled. */
static tessary_features_TARGET int tessary_features_FN(descend)(const struct tessary_features_problem *p, double *q,
    struct tessary_features_slopes **s, struct tessary_features_slopes **spare, double *square, const int *is_free)
{
    const double loose = tessary_features_FN(freedom)(p, is_free), origin = q[0];
    double matrix[6][6], right[6], damping = 0.001;
    int round, i, moved = 1;
    for (round = 0; round < 12; ++round) {
        double damped[6][6], step[6], trial[6], part = 1.0, promise = 0.0, before, after, squared;
        if (moved) tessary_features_FN(normal)(p, q, *s, is_free, matrix, right);
        memcpy(damped, matrix, sizeof(damped));
        for (i = 0; i < 6; ++i) {
            if (is_free[i]) damped[i][i] *= 1.0 + damping;
        }
        if (!tessary_features_solve(damped, right, is_free, step)) return 0;
        for (i = 0; i < 6; ++i) {
            const double size = tessary_features_magnitude(step[i]);
            if (tessary_features_largest_step[i] > 0.0 && size > 1e-30 && tessary_features_largest_step[i] / size < part)
                part = tessary_features_largest_step[i] / size;
        }
        for (i = 0; i < 6; ++i) {
            step[i] *= part;
            trial[i] = q[i] + step[i];
            if (is_free[i]) promise += step[i] * right[i];
        }
        before = *square + tessary_features_FN(known)(p, q, is_free);
        squared = tessary_features_FN(residual)(p, trial, *spare);
        after = squared + tessary_features_FN(known)(p, trial, is_free);
        moved = after <= before;
        if (moved) {
            struct tessary_features_slopes *const swap = *s;
            *s = *spare;
            *spare = swap;
            memcpy(q, trial, sizeof(trial));
            *square = squared;
        }
        if (before - after >= 0.25 * promise) {
            damping = damping / 5.0 > 0.001 ? damping / 5.0 : 0.001;
        } else {
            damping = damping * 5.0 > 0.29999999999999999 ? damping * 5.0 : 0.29999999999999999;
        }
        if (promise < 0.001 * (before / loose > 1.0 ? before / loose : 1.0)) return 1;
        if (!(tessary_features_magnitude(q[0] - origin) <= p->slack * 2.02)) return 0;
    }
    return 0;
}

/* The inverse normal matrix times a vector, for errors: the start saw the same noise, so it adds
 * no knowledge of the position. Returns 0 when there is none. */
static tessary_features_TARGET int tessary_features_FN(error_row)(const struct tessary_features_problem *p, const double *q,
    const struct tessary_features_slopes *s, const int *is_free, const double *of, double *x)
{
    double matrix[6][6], right[6];
    tessary_features_FN(normal)(p, q, s, is_free, matrix, right);
    matrix[0][0] -= tessary_features_before(p, 0);
    return tessary_features_solve(matrix, of, is_free, x);
}

/* Would the sum of squares fall enough if one more parameter were let free? */
static tessary_features_TARGET int tessary_features_FN(asks)(const struct tessary_features_problem *p, const double *q,
    const struct tessary_features_slopes *s, const int *is_free, int extra)
{
    const int n = p->disk->padded;
    double cross[6], x[6], room, push;
    int i;
    for (i = 0; i < 6; ++i) {
        cross[i] = is_free[i] ? tessary_features_FN(dot)(s->by[i], s->by[extra], n) : 0.0;
    }
    if (is_free[extra] || !tessary_features_FN(error_row)(p, q, s, is_free, cross, x)) return 0;
    room = tessary_features_FN(dot)(s->by[extra], s->by[extra], n);
    for (i = 0; i < 6; ++i) room -= cross[i] * x[i];
    push = tessary_features_FN(dot)(s->by[extra], s->left, n);
    return push * push > 9.0 * (room > 1e-9 ? room : 1e-9);
}

/* Fit: q holds where to start. */
static tessary_features_TARGET void tessary_features_FN(fit)(const struct tessary_features_problem *p, struct tessary_features_fitted *f)
{
    static const double first[6] = {1.0, 0.0, 0.0, 0.0, 0.0, 0.0};
    struct tessary_features_slopes *s = &p->work->slopes[0], *spare = &p->work->slopes[1];
    double x[6], square;
    int is_free[6] = {1, 1, 1, 1, 0, 0};
    int i, extra;
    is_free[5] = !p->blur_known;
    square = tessary_features_FN(residual)(p, f->q, s);
    f->ok = tessary_features_FN(descend)(p, f->q, &s, &spare, &square, is_free);
    for (extra = 4; extra < 6; ++extra) {
        if (tessary_features_FN(asks)(p, f->q, s, is_free, extra)) {
            is_free[extra] = 1;
            f->ok = tessary_features_FN(descend)(p, f->q, &s, &spare, &square, is_free);
        }
    }
    f->misfit = square / tessary_features_FN(freedom)(p, is_free);
    f->sd = 0.0;
    if (!tessary_features_FN(error_row)(p, f->q, s, is_free, first, x)) f->ok = 0;
    else f->sd = sqrt(tessary_features_variance(p, s, x));
    for (i = 0; i < 6; ++i) {
        if (!(tessary_features_magnitude(f->q[i]) < 1e300)) f->ok = 0;
    }
    if (!(f->sd < 1e300)) f->ok = 0;
}

#undef tessary_features_LOAD
#undef tessary_features_STORE
#undef tessary_features_MUL_ADD
#undef tessary_features_STREAM
#undef tessary_features_TAKE
#undef tessary_features_ABS

#else /* ============================================================ read once in all */

#ifndef tessary_features_BUILD_LIBRARY
#define tessary_features_BUILD_LIBRARY
#endif
#include "tessary_features.h"

#include <math.h>
#include <string.h>

#if defined(__GNUC__) && defined(__x86_64__)
#include <cpuid.h>
#include <immintrin.h>
#elif defined(__GNUC__) && defined(__aarch64__)
#include <arm_neon.h>
#endif

#ifndef tessary_features_MAX_LANES
#define tessary_features_MAX_LANES 16
#endif

#define tessary_features_SIZE 25
#define tessary_features_RADIUS 12
#define tessary_features_CHUNK 64 /* output pixels computed together */
#define tessary_features_LINE 96 /* a chunk with its halo, in whole vectors */
#define tessary_features_FOLDED 2400 /* floats of the folded rows of a chunk */
#define tessary_features_TILE 1920 /* widest part of the picture that the ring holds */
#define tessary_features_COLUMNS 1152 /* floats of products, and then columns of separable ones */
#define tessary_features_SCRATCH 3552 /* floats of scratch memory beside the ring */
#define tessary_features_LINE_Q 96 /* the same in 16-bit codes */
#define tessary_features_FOLDED_Q 2400 /* codes of the folded rows of a chunk */
#define tessary_features_SCRATCH_Q 9664 /* bytes of scratch memory beside the ring of codes */
#define tessary_features_LONGEST 16777216 /* pixels of a side */
#define tessary_features_STREAM_FROM 8388608.0 /* bytes of output from which stores pass the cache */

/* ---- what the bank is made of */

/* The input table: working value of every Mono8 code. */
static const float tessary_features_table[256] = {
    0.0f, 1.80598032f, 2.54398108f, 3.5567894f, 4.39676523f, 5.15184975f, 5.86980581f,
    6.54924822f, 7.18991995f, 7.79828596f, 8.37996101f, 8.93846035f, 9.47628403f, 9.99540901f,
    10.4975758f, 10.9843588f, 11.4571056f, 11.9169836f, 12.3649902f, 12.8019981f, 13.2287769f,
    13.6460114f, 14.0543137f, 14.4542322f, 14.8462648f, 15.2308588f, 15.6084232f, 15.9793291f,
    16.3439178f, 16.7024994f, 17.0553646f, 17.4027748f, 17.744976f, 18.0821972f, 18.4146481f,
    18.742527f, 19.0660172f, 19.3852882f, 19.7005043f, 20.0118122f, 20.3193588f, 20.6232719f,
    20.9236794f, 21.2207012f, 21.5144482f, 21.8050251f, 22.092535f, 22.3770714f, 22.6587238f,
    22.9375801f, 23.2137203f, 23.4872246f, 23.7581635f, 24.0266113f, 24.2926331f, 24.5562954f,
    24.8176575f, 25.0767803f, 25.3337212f, 25.5885315f, 25.8412666f, 26.0919724f, 26.3407021f,
    26.5874977f, 26.8324051f, 27.0754662f, 27.3167248f, 27.5562172f, 27.7939816f, 28.0300579f,
    28.2644787f, 28.4972801f, 28.7284946f, 28.9581528f, 29.1862869f, 29.4129295f, 29.6381054f,
    29.8618431f, 30.0841713f, 30.3051167f, 30.524704f, 30.7429581f, 30.9599037f, 31.1755619f,
    31.3899574f, 31.6031094f, 31.8150444f, 32.0257759f, 32.2353325f, 32.4437256f, 32.6509819f,
    32.8571129f, 33.0621414f, 33.2660828f, 33.468956f, 33.6707726f, 33.8715553f, 34.0713158f,
    34.2700729f, 34.4678383f, 34.6646309f, 34.8604584f, 35.0553398f, 35.2492867f, 35.4423141f,
    35.6344337f, 35.8256569f, 36.0159988f, 36.205471f, 36.3940849f, 36.581852f, 36.7687798f,
    36.9548874f, 37.1401787f, 37.3246689f, 37.5083618f, 37.6912766f, 37.8734169f, 38.0547943f,
    38.2354164f, 38.4152985f, 38.5944405f, 38.7728615f, 38.9505615f, 39.127552f, 39.3038445f,
    39.4794426f, 39.6543579f, 39.828598f, 40.0021667f, 40.1750793f, 40.3473358f, 40.5189438f,
    40.6899185f, 40.8602562f, 41.0299721f, 41.19907f, 41.3675575f, 41.5354385f, 41.7027245f,
    41.8694153f, 42.0355225f, 42.2010498f, 42.3660049f, 42.5303917f, 42.6942177f, 42.8574829f,
    43.0202026f, 43.1823769f, 43.3440132f, 43.5051117f, 43.6656837f, 43.8257332f, 43.9852638f,
    44.1442795f, 44.3027878f, 44.4607925f, 44.6182976f, 44.7753067f, 44.9318275f, 45.0878639f,
    45.2434196f, 45.3984985f, 45.5531044f, 45.7072449f, 45.86092f, 46.0141335f, 46.1668968f,
    46.3192062f, 46.4710693f, 46.6224861f, 46.773468f, 46.924015f, 47.0741348f, 47.2238274f,
    47.3731003f, 47.5219536f, 47.6703911f, 47.8184166f, 47.9660339f, 48.1132355f, 48.2600288f,
    48.406414f, 48.5523987f, 48.6979828f, 48.8431702f, 48.9879646f, 49.13237f, 49.2763863f,
    49.4200249f, 49.563282f, 49.7061615f, 49.848671f, 49.9908104f, 50.1325836f, 50.2739906f,
    50.4150391f, 50.5557671f, 50.6962204f, 50.8364029f, 50.9763145f, 51.1159592f, 51.2553406f,
    51.394455f, 51.5333138f, 51.6719093f, 51.8101921f, 51.9477882f, 52.0847092f, 52.2209625f,
    52.3565445f, 52.4914665f, 52.6257324f, 52.759346f, 52.8923149f, 53.0246353f, 53.1569977f,
    53.2900581f, 53.4238205f, 53.5582886f, 53.6934738f, 53.82938f, 53.9660072f, 54.1033669f,
    54.2414665f, 54.3803062f, 54.5178566f, 54.6526299f, 54.784687f, 54.9140892f, 55.0408897f,
    55.1651497f, 55.2869186f, 55.4062538f, 55.5232086f, 55.6378288f, 55.7519493f, 55.8693581f,
    55.9901619f, 56.1144714f, 56.2424049f, 56.3740845f, 56.5096397f, 56.6492004f, 56.7929077f,
    56.9408951f, 57.0933151f, 57.2465477f, 57.3994713f, 57.5520897f, 57.7044067f, 57.8564186f,
    58.0081329f, 58.1595459f, 58.3106651f, 58.4614906f
};

/* 5 x 13 x 13 coefficients, even in y, even in x */
static const float tessary_features_group0_taps[845] = {
    0.230330527f, 0.230295897f, 0.230292082f, 0.230295897f, 0.230330527f, 0.152449429f,
    0.162057877f, 0.186349243f, 0.212102622f, 0.223243922f, 0.0f, 0.0215548575f, 0.0842016339f,
    0.164190024f, 0.203265905f, -0.0934717059f, -0.0779455304f, -0.0143128037f, 0.102986097f,
    0.173862547f, -0.0935155153f, -0.0937878489f, -0.0660440326f, 0.046418339f, 0.139702499f,
    -0.0531300604f, -0.0618553758f, -0.069457233f, 0.00630626082f, 0.105452955f, -0.0204699337f,
    -0.0280376077f, -0.0484357178f, -0.014531225f, 0.0747773647f, -0.00566825271f,
    -0.00933945179f, -0.0256857276f, -0.0201997161f, 0.0498124659f, -0.00115901232f,
    -0.00235542655f, -0.0108679235f, -0.0174000561f, 0.0311718285f, -0.000177651644f,
    -0.000457078218f, -0.00375384092f, -0.011851728f, 0.0183249712f, -2.05934048e-05f,
    -6.89327717e-05f, -0.00107219815f, -0.00682643056f, 0.0101200044f, -1.81794167e-06f,
    -8.13603401e-06f, -0.000255316496f, -0.0034212172f, 0.00525018573f, -1.1920929e-07f,
    -7.4505806e-07f, -5.09619713e-05f, -0.00151434541f, 0.00255873799f, 0.223243922f,
    0.212102622f, 0.186349243f, 0.162057877f, 0.152449429f, 0.14775905f, 0.150350869f,
    0.152985796f, 0.150350869f, 0.14775905f, 0.0f, 0.0222106725f, 0.0741170645f, 0.119220942f,
    0.134536147f, -0.0905958712f, -0.0704266131f, -0.00492934883f, 0.0786426365f, 0.115074873f,
    -0.0906383395f, -0.087196812f, -0.050165832f, 0.0398644358f, 0.0924652517f, -0.0514954329f,
    -0.058870241f, -0.057261318f, 0.0108525455f, 0.069796443f, -0.0198401213f, -0.0273742378f,
    -0.0425548702f, -0.00577223301f, 0.0494930744f, -0.00549387932f, -0.00938387215f,
    -0.0240525007f, -0.0119030476f, 0.0329695046f, -0.00112333894f, -0.00244367123f,
    -0.0108841211f, -0.0115340203f, 0.0206317902f, -0.000172168016f, -0.000491246581f,
    -0.00403706729f, -0.00848063827f, 0.0121288002f, -1.9967556e-05f, -7.69793987e-05f,
    -0.00124312937f, -0.00521028042f, 0.00669816136f, -1.75833702e-06f, -9.46223736e-06f,
    -0.000320240855f, -0.0027744025f, 0.00347495079f, -1.1920929e-07f, -9.23871994e-07f,
    -6.93649054e-05f, -0.00130350888f, 0.00169354677f, 0.203265905f, 0.164190024f,
    0.0842016339f, 0.0215548575f, 0.0f, 0.134536147f, 0.119220942f, 0.0741170645f,
    0.0222106725f, 0.0f, 0.0f, 0.0233384371f, 0.0472747386f, 0.0233384371f, 0.0f,
    -0.0824884772f, -0.0508937985f, 0.0135080963f, 0.0231321305f, 0.0f, -0.0825271606f,
    -0.0695671439f, -0.0143930614f, 0.0203118324f, 0.0f, -0.0468871295f, -0.0505755395f,
    -0.0278241783f, 0.015105933f, 0.0f, -0.0180646479f, -0.0253566951f, -0.0271021724f,
    0.0090162158f, 0.0f, -0.00500223041f, -0.00940744579f, -0.0189795494f, 0.00376339257f, 0.0f,
    -0.0010228157f, -0.00266005099f, -0.0103665441f, 0.000345781446f, 0.0f, -0.000156760216f,
    -0.000581949949f, -0.00456266105f, -0.00120642781f, 0.0f, -1.81794167e-05f,
    -9.93609428e-05f, -0.00164577365f, -0.00147567689f, 0.0f, -1.60932541e-06f,
    -1.33216381e-05f, -0.000491470098f, -0.00114993751f, 0.0f, -1.1920929e-07f,
    -1.40070915e-06f, -0.000122338533f, -0.000709176064f, 0.0f, 0.173862547f, 0.102986097f,
    -0.0143128037f, -0.0779455304f, -0.0934717059f, 0.115074873f, 0.0786426365f,
    -0.00492934883f, -0.0704266131f, -0.0905958712f, 0.0f, 0.0231321305f, 0.0135080963f,
    -0.0508937985f, -0.0824884772f, -0.070556134f, -0.0267137438f, 0.0231045932f,
    -0.0267137438f, -0.070556134f, -0.0705892146f, -0.0463287085f, 0.0168242306f,
    -0.00568474829f, -0.0566934347f, -0.0401046872f, -0.0387775898f, 0.00261081755f,
    0.00747469068f, -0.042794466f, -0.0154515207f, -0.0220018625f, -0.00810468197f,
    0.0122868568f, -0.0303458273f, -0.00427863002f, -0.00915513933f, -0.0108796358f,
    0.0112809092f, -0.0202146769f, -0.000874876976f, -0.00288206339f, -0.00832109153f,
    0.00778791308f, -0.012650013f, -0.000134080648f, -0.000697344542f, -0.00461757183f,
    0.00427724421f, -0.00743657351f, -1.55568123e-05f, -0.000130921602f, -0.00199741125f,
    0.00184491277f, -0.00410684943f, -1.37090683e-06f, -1.91777945e-05f, -0.000695616007f,
    0.000558301806f, -0.00213059783f, -8.94069672e-08f, -2.20537186e-06f, -0.000198513269f,
    4.5850873e-05f, -0.00103837252f, 0.139702499f, 0.046418339f, -0.0660440326f, -0.0937878489f,
    -0.0935155153f, 0.0924652517f, 0.0398644358f, -0.050165832f, -0.087196812f, -0.0906383395f,
    0.0f, 0.0203118324f, -0.0143930614f, -0.0695671439f, -0.0825271606f, -0.0566934347f,
    -0.00568474829f, 0.0168242306f, -0.0463287085f, -0.0705892146f, -0.0567200184f,
    -0.0237815827f, 0.0275888443f, -0.0237815827f, -0.0567200184f, -0.0322250128f,
    -0.0259221047f, 0.0201438814f, -0.00661897659f, -0.042814523f, -0.0124156475f,
    -0.0175656676f, 0.00699129701f, 0.00337867439f, -0.030360043f, -0.00343796611f,
    -0.00839875638f, -0.00197817385f, 0.00709705055f, -0.020224154f, -0.00070297718f,
    -0.00296981633f, -0.00465726852f, 0.00682428479f, -0.0126559436f, -0.000107735395f,
    -0.000795409083f, -0.0037009418f, 0.00488765538f, -0.00744006038f, -1.24871731e-05f,
    -0.000163674355f, -0.00199529529f, 0.00284993649f, -0.00410878658f, -1.10268593e-06f,
    -2.61217356e-05f, -0.000822156668f, 0.00138388574f, -0.00213161111f, -5.96046448e-08f,
    -3.2633543e-06f, -0.000270694494f, 0.000554770231f, -0.00103884935f, 0.105452955f,
    0.00630626082f, -0.069457233f, -0.0618553758f, -0.0531300604f, 0.069796443f, 0.0108525455f,
    -0.057261318f, -0.058870241f, -0.0514954329f, 0.0f, 0.015105933f, -0.0278241783f,
    -0.0505755395f, -0.0468871295f, -0.042794466f, 0.00747469068f, 0.00261081755f,
    -0.0387775898f, -0.0401046872f, -0.042814523f, -0.00661897659f, 0.0201438814f,
    -0.0259221047f, -0.0322250128f, -0.0243247151f, -0.0143729001f, 0.021578297f,
    -0.0143729001f, -0.0243247151f, -0.00937181711f, -0.0126264542f, 0.0134564042f,
    -0.00573047996f, -0.0172488093f, -0.00259512663f, -0.00709226727f, 0.0044965297f,
    -0.000487521291f, -0.011490196f, -0.00053063035f, -0.00282981992f, -0.000639542937f,
    0.0018440932f, -0.00719037652f, -8.13305378e-05f, -0.000838145614f, -0.00199320912f,
    0.00226770341f, -0.0042270124f, -9.41753387e-06f, -0.000188589096f, -0.00152751803f,
    0.00179213285f, -0.00233438611f, -8.34465027e-07f, -3.26931477e-05f, -0.000778704882f,
    0.00111828744f, -0.00121104717f, -5.96046448e-08f, -4.39584255e-06f, -0.000302061439f,
    0.000581339002f, -0.000590234995f, 0.0747773647f, -0.014531225f, -0.0484357178f,
    -0.0280376077f, -0.0204699337f, 0.0494930744f, -0.00577223301f, -0.0425548702f,
    -0.0273742378f, -0.0198401213f, 0.0f, 0.0090162158f, -0.0271021724f, -0.0253566951f,
    -0.0180646479f, -0.0303458273f, 0.0122868568f, -0.00810468197f, -0.0220018625f,
    -0.0154515207f, -0.030360043f, 0.00337867439f, 0.00699129701f, -0.0175656676f,
    -0.0124156475f, -0.0172488093f, -0.00573047996f, 0.0134564042f, -0.0126264542f,
    -0.00937181711f, -0.00664561987f, -0.00794297457f, 0.0118946135f, -0.00794297457f,
    -0.00664561987f, -0.001840204f, -0.00541308522f, 0.00669050217f, -0.00416922569f,
    -0.00442692637f, -0.000376284122f, -0.00245474279f, 0.00208389759f, -0.0016207546f,
    -0.00277030468f, -5.76674938e-05f, -0.000805214047f, -0.000247001648f, -0.00023022294f,
    -0.00162857771f, -6.67572021e-06f, -0.000198170543f, -0.000776916742f, 0.000318720937f,
    -0.000899374485f, -5.96046448e-07f, -3.73125076e-05f, -0.000561386347f, 0.000397726893f,
    -0.000466585159f, -2.98023224e-08f, -5.43892384e-06f, -0.000269040465f, 0.000294536352f,
    -0.00022739172f, 0.0498124659f, -0.0201997161f, -0.0256857276f, -0.00933945179f,
    -0.00566825271f, 0.0329695046f, -0.0119030476f, -0.0240525007f, -0.00938387215f,
    -0.00549387932f, 0.0f, 0.00376339257f, -0.0189795494f, -0.00940744579f, -0.00500223041f,
    -0.0202146769f, 0.0112809092f, -0.0108796358f, -0.00915513933f, -0.00427863002f,
    -0.020224154f, 0.00709705055f, -0.00197817385f, -0.00839875638f, -0.00343796611f,
    -0.011490196f, -0.000487521291f, 0.0044965297f, -0.00709226727f, -0.00259512663f,
    -0.00442692637f, -0.00416922569f, 0.00669050217f, -0.00541308522f, -0.001840204f,
    -0.00122585893f, -0.00367391109f, 0.00537250936f, -0.00367391109f, -0.00122585893f,
    -0.000250667334f, -0.00192007422f, 0.00281123817f, -0.00217436254f, -0.000767111778f,
    -3.84151936e-05f, -0.000700950623f, 0.000820457935f, -0.00108607113f, -0.000450968742f,
    -4.44054604e-06f, -0.000189095736f, -9.01371241e-05f, -0.000424578786f, -0.000249058008f,
    -3.87430191e-07f, -3.87132168e-05f, -0.000268384814f, -9.70810652e-05f, -0.000129193068f,
    -2.98023224e-08f, -6.10947609e-06f, -0.000182241201f, 2.39312649e-05f, -6.29723072e-05f,
    0.0311718285f, -0.0174000561f, -0.0108679235f, -0.00235542655f, -0.00115901232f,
    0.0206317902f, -0.0115340203f, -0.0108841211f, -0.00244367123f, -0.00112333894f, 0.0f,
    0.000345781446f, -0.0103665441f, -0.00266005099f, -0.0010228157f, -0.012650013f,
    0.00778791308f, -0.00832109153f, -0.00288206339f, -0.000874876976f, -0.0126559436f,
    0.00682428479f, -0.00465726852f, -0.00296981633f, -0.00070297718f, -0.00719037652f,
    0.0018440932f, -0.000639542937f, -0.00282981992f, -0.00053063035f, -0.00277030468f,
    -0.0016207546f, 0.00208389759f, -0.00245474279f, -0.000376284122f, -0.000767111778f,
    -0.00217436254f, 0.00281123817f, -0.00192007422f, -0.000250667334f, -0.000156849623f,
    -0.00134381652f, 0.00210857391f, -0.00134381652f, -0.000156849623f, -2.40504742e-05f,
    -0.000550672412f, 0.00103501976f, -0.000834137201f, -9.22083855e-05f, -2.8014183e-06f,
    -0.000163510442f, 0.000283673406f, -0.000453263521f, -5.0932169e-05f, -2.38418579e-07f,
    -3.64929438e-05f, -2.92509794e-05f, -0.000210672617f, -2.64048576e-05f, -2.98023224e-08f,
    -6.24358654e-06f, -8.18520784e-05f, -7.96914101e-05f, -1.28746033e-05f, 0.0183249712f,
    -0.011851728f, -0.00375384092f, -0.000457078218f, -0.000177651644f, 0.0121288002f,
    -0.00848063827f, -0.00403706729f, -0.000491246581f, -0.000172168016f, 0.0f, -0.00120642781f,
    -0.00456266105f, -0.000581949949f, -0.000156760216f, -0.00743657351f, 0.00427724421f,
    -0.00461757183f, -0.000697344542f, -0.000134080648f, -0.00744006038f, 0.00488765538f,
    -0.0037009418f, -0.000795409083f, -0.000107735395f, -0.0042270124f, 0.00226770341f,
    -0.00199320912f, -0.000838145614f, -8.13305378e-05f, -0.00162857771f, -0.00023022294f,
    -0.000247001648f, -0.000805214047f, -5.76674938e-05f, -0.000450968742f, -0.00108607113f,
    0.000820457935f, -0.000700950623f, -3.84151936e-05f, -9.22083855e-05f, -0.000834137201f,
    0.00103501976f, -0.000550672412f, -2.40504742e-05f, -1.41263008e-05f, -0.000388994813f,
    0.000728845596f, -0.000388994813f, -1.41263008e-05f, -1.63912773e-06f, -0.000127866864f,
    0.000336036086f, -0.000245943666f, -7.80820847e-06f, -1.49011612e-07f, -3.12179327e-05f,
    8.65161419e-05f, -0.000138282776f, -4.05311584e-06f, 0.0f, -5.7965517e-06f,
    -8.37445259e-06f, -6.84559345e-05f, -1.96695328e-06f, 0.0101200044f, -0.00682643056f,
    -0.00107219815f, -6.89327717e-05f, -2.05934048e-05f, 0.00669816136f, -0.00521028042f,
    -0.00124312937f, -7.69793987e-05f, -1.9967556e-05f, 0.0f, -0.00147567689f, -0.00164577365f,
    -9.93609428e-05f, -1.81794167e-05f, -0.00410684943f, 0.00184491277f, -0.00199741125f,
    -0.000130921602f, -1.55568123e-05f, -0.00410878658f, 0.00284993649f, -0.00199529529f,
    -0.000163674355f, -1.24871731e-05f, -0.00233438611f, 0.00179213285f, -0.00152751803f,
    -0.000188589096f, -9.41753387e-06f, -0.000899374485f, 0.000318720937f, -0.000776916742f,
    -0.000198170543f, -6.67572021e-06f, -0.000249058008f, -0.000424578786f, -9.01371241e-05f,
    -0.000189095736f, -4.44054604e-06f, -5.0932169e-05f, -0.000453263521f, 0.000283673406f,
    -0.000163510442f, -2.8014183e-06f, -7.80820847e-06f, -0.000245943666f, 0.000336036086f,
    -0.000127866864f, -1.63912773e-06f, -8.94069672e-07f, -9.02563334e-05f, 0.000222280622f,
    -9.02563334e-05f, -8.94069672e-07f, -8.94069672e-08f, -2.41845846e-05f, 9.62764025e-05f,
    -5.73396683e-05f, -4.76837158e-07f, 0.0f, -4.88758087e-06f, 2.32905149e-05f,
    -3.26633453e-05f, -2.38418579e-07f, 0.00525018573f, -0.0034212172f, -0.000255316496f,
    -8.13603401e-06f, -1.81794167e-06f, 0.00347495079f, -0.0027744025f, -0.000320240855f,
    -9.46223736e-06f, -1.75833702e-06f, 0.0f, -0.00114993751f, -0.000491470098f,
    -1.33216381e-05f, -1.60932541e-06f, -0.00213059783f, 0.000558301806f, -0.000695616007f,
    -1.91777945e-05f, -1.37090683e-06f, -0.00213161111f, 0.00138388574f, -0.000822156668f,
    -2.61217356e-05f, -1.10268593e-06f, -0.00121104717f, 0.00111828744f, -0.000778704882f,
    -3.26931477e-05f, -8.34465027e-07f, -0.000466585159f, 0.000397726893f, -0.000561386347f,
    -3.73125076e-05f, -5.96046448e-07f, -0.000129193068f, -9.70810652e-05f, -0.000268384814f,
    -3.87132168e-05f, -3.87430191e-07f, -2.64048576e-05f, -0.000210672617f, -2.92509794e-05f,
    -3.64929438e-05f, -2.38418579e-07f, -4.05311584e-06f, -0.000138282776f, 8.65161419e-05f,
    -3.12179327e-05f, -1.49011612e-07f, -4.76837158e-07f, -5.73396683e-05f, 9.62764025e-05f,
    -2.41845846e-05f, -8.94069672e-08f, -2.98023224e-08f, -1.69724226e-05f, 5.98281622e-05f,
    -1.69724226e-05f, -2.98023224e-08f, 0.0f, -3.75509262e-06f, 2.43484974e-05f,
    -1.07437372e-05f, -2.98023224e-08f, 0.00255873799f, -0.00151434541f, -5.09619713e-05f,
    -7.4505806e-07f, -1.1920929e-07f, 0.00169354677f, -0.00130350888f, -6.93649054e-05f,
    -9.23871994e-07f, -1.1920929e-07f, 0.0f, -0.000709176064f, -0.000122338533f,
    -1.40070915e-06f, -1.1920929e-07f, -0.00103837252f, 4.5850873e-05f, -0.000198513269f,
    -2.20537186e-06f, -8.94069672e-08f, -0.00103884935f, 0.000554770231f, -0.000270694494f,
    -3.2633543e-06f, -5.96046448e-08f, -0.000590234995f, 0.000581339002f, -0.000302061439f,
    -4.39584255e-06f, -5.96046448e-08f, -0.00022739172f, 0.000294536352f, -0.000269040465f,
    -5.43892384e-06f, -2.98023224e-08f, -6.29723072e-05f, 2.39312649e-05f, -0.000182241201f,
    -6.10947609e-06f, -2.98023224e-08f, -1.28746033e-05f, -7.96914101e-05f, -8.18520784e-05f,
    -6.24358654e-06f, -2.98023224e-08f, -1.96695328e-06f, -6.84559345e-05f, -8.37445259e-06f,
    -5.7965517e-06f, 0.0f, -2.38418579e-07f, -3.26633453e-05f, 2.32905149e-05f,
    -4.88758087e-06f, 0.0f, -2.98023224e-08f, -1.07437372e-05f, 2.43484974e-05f,
    -3.75509262e-06f, 0.0f, 0.0f, -2.60770321e-06f, 1.42157078e-05f, -2.60770321e-06f, 0.0f
};

/* 3 x 12 x 12 coefficients, odd in y, odd in x */
static const float tessary_features_group1_taps[432] = {
    -0.0447133183f, -0.063353613f, -0.0447133183f, -0.0523924679f, -0.0903355777f,
    -0.0760631263f, -0.0282523334f, -0.0747349709f, -0.0869458318f, -0.00276555121f,
    -0.0390190184f, -0.0788782388f, 0.00740481913f, -0.00894245505f, -0.0595447719f,
    0.00640919805f, 0.00518234074f, -0.0379057825f, 0.00301374495f, 0.00721994042f,
    -0.0202119052f, 0.000966787338f, 0.00469507277f, -0.00872279704f, 0.000226572156f,
    0.00215528905f, -0.00271764398f, 3.99947166e-05f, 0.000766173005f, -0.000280112028f,
    5.40912151e-06f, 0.000218912959f, 0.000369474292f, 5.66244125e-07f, 5.12450933e-05f,
    0.000357791781f, -0.0760631263f, -0.0903355777f, -0.0523924679f, -0.0902717113f,
    -0.132076949f, -0.0902717113f, -0.0501861125f, -0.114567742f, -0.105453089f,
    -0.00632667542f, -0.0654639304f, -0.0987310708f, 0.0121895522f, -0.0201631039f,
    -0.0778041482f, 0.0111980289f, 0.00409480929f, -0.0524776578f, 0.00546847284f,
    0.00997453928f, -0.0303179473f, 0.00181870162f, 0.0074519664f, -0.014784649f,
    0.000442504883f, 0.00377626717f, -0.0058234334f, 8.13007355e-05f, 0.00146794319f,
    -0.00160174072f, 1.14738941e-05f, 0.000457644463f, -6.49541616e-05f, 1.25169754e-06f,
    0.000116914511f, 0.000275701284f, -0.0869458318f, -0.0747349709f, -0.0282523334f,
    -0.105453089f, -0.114567742f, -0.0501861125f, -0.0616308898f, -0.108111903f, -0.0616308898f,
    -0.0105735213f, -0.0712009221f, -0.0617999882f, 0.0130139291f, -0.0303630084f,
    -0.0531199574f, 0.0133498013f, -0.00345799327f, -0.0398406833f, 0.00694473088f,
    0.00689586997f, -0.026202485f, 0.00244632363f, 0.00717692077f, -0.0150633454f,
    0.00063046813f, 0.00434213877f, -0.00747941434f, 0.000122874975f, 0.0019416213f,
    -0.00311967731f, 1.84327364e-05f, 0.000686079264f, -0.00101800263f, 2.14576721e-06f,
    0.000197142363f, -0.000196203589f, -0.0788782388f, -0.0390190184f, -0.00276555121f,
    -0.0987310708f, -0.0654639304f, -0.00632667542f, -0.0617999882f, -0.0712009221f,
    -0.0105735213f, -0.0143854171f, -0.057130903f, -0.0143854171f, 0.0103188604f, -0.033246085f,
    -0.0163851678f, 0.0127748847f, -0.0117966235f, -0.0158768445f, 0.00727210939f,
    0.000509008765f, -0.0132320076f, 0.00276453793f, 0.00428080559f, -0.00954988599f,
    0.000766202807f, 0.00361979008f, -0.0059851259f, 0.000160425901f, 0.00198054314f,
    -0.00325089693f, 2.58237123e-05f, 0.000819891691f, -0.00151689351f, 3.23355198e-06f,
    0.000270396471f, -0.000594884157f, -0.0595447719f, -0.00894245505f, 0.00740481913f,
    -0.0778041482f, -0.0201631039f, 0.0121895522f, -0.0531199574f, -0.0303630084f,
    0.0130139291f, -0.0163851678f, -0.033246085f, 0.0103188604f, 0.00582836568f, -0.0266935378f,
    0.00582836568f, 0.0102200061f, -0.0151211917f, 0.00149294734f, 0.0065703392f,
    -0.00495062768f, -0.0014180392f, 0.00274181366f, 0.000535324216f, -0.00262187421f,
    0.000826522708f, 0.00197303295f, -0.00255610049f, 0.000187397003f, 0.00152420998f,
    -0.00188931823f, 3.26037407e-05f, 0.000778257847f, -0.00114808977f, 4.39584255e-06f,
    0.000302001834f, -0.00058965385f, -0.0379057825f, 0.00518234074f, 0.00640919805f,
    -0.0524776578f, 0.00409480929f, 0.0111980289f, -0.0398406833f, -0.00345799327f,
    0.0133498013f, -0.0158768445f, -0.0117966235f, 0.0127748847f, 0.00149294734f,
    -0.0151211917f, 0.0102200061f, 0.00684541464f, -0.0123780072f, 0.00684541464f,
    0.00519317389f, -0.00680857897f, 0.00371438265f, 0.00242038071f, -0.00210824609f,
    0.00144936144f, 0.00080101192f, 0.000242769718f, 0.000171482563f, 0.00019775331f,
    0.000776290894f, -0.000337049365f, 3.72827053e-05f, 0.00056129694f, -0.0004029423f,
    5.43892384e-06f, 0.000269040465f, -0.000295877457f, -0.0202119052f, 0.00721994042f,
    0.00301374495f, -0.0303179473f, 0.00997453928f, 0.00546847284f, -0.026202485f,
    0.00689586997f, 0.00694473088f, -0.0132320076f, 0.000509008765f, 0.00727210939f,
    -0.0014180392f, -0.00495062768f, 0.0065703392f, 0.00371438265f, -0.00680857897f,
    0.00519317389f, 0.00358960032f, -0.00539840758f, 0.00358960032f, 0.00190785527f,
    -0.00281603634f, 0.00214494765f, 0.000699549913f, -0.000821202993f, 0.0010767132f,
    0.000188976526f, 9.00477171e-05f, 0.000421866775f, 3.87132168e-05f, 0.000268384814f,
    9.63658094e-05f, 6.10947609e-06f, 0.000182241201f, -2.41100788e-05f, -0.00872279704f,
    0.00469507277f, 0.000966787338f, -0.014784649f, 0.0074519664f, 0.00181870162f,
    -0.0150633454f, 0.00717692077f, 0.00244632363f, -0.00954988599f, 0.00428080559f,
    0.00276453793f, -0.00262187421f, 0.000535324216f, 0.00274181366f, 0.00144936144f,
    -0.00210824609f, 0.00242038071f, 0.00214494765f, -0.00281603634f, 0.00190785527f,
    0.00133985281f, -0.00210937858f, 0.00133985281f, 0.000550255179f, -0.00103513896f,
    0.000832974911f, 0.000163480639f, -0.000283673406f, 0.000452935696f, 3.64929438e-05f,
    2.92509794e-05f, 0.00021058321f, 6.24358654e-06f, 8.18520784e-05f, 7.96616077e-05f,
    -0.00271764398f, 0.00215528905f, 0.000226572156f, -0.0058234334f, 0.00377626717f,
    0.000442504883f, -0.00747941434f, 0.00434213877f, 0.00063046813f, -0.0059851259f,
    0.00361979008f, 0.000766202807f, -0.00255610049f, 0.00197303295f, 0.000826522708f,
    0.000171482563f, 0.000242769718f, 0.00080101192f, 0.0010767132f, -0.000821202993f,
    0.000699549913f, 0.000832974911f, -0.00103513896f, 0.000550255179f, 0.000388875604f,
    -0.000728845596f, 0.000388875604f, 0.000127866864f, -0.000336036086f, 0.000245913863f,
    3.12179327e-05f, -8.65161419e-05f, 0.000138282776f, 5.7965517e-06f, 8.37445259e-06f,
    6.84559345e-05f, -0.000280112028f, 0.000766173005f, 3.99947166e-05f, -0.00160174072f,
    0.00146794319f, 8.13007355e-05f, -0.00311967731f, 0.0019416213f, 0.000122874975f,
    -0.00325089693f, 0.00198054314f, 0.000160425901f, -0.00188931823f, 0.00152420998f,
    0.000187397003f, -0.000337049365f, 0.000776290894f, 0.00019775331f, 0.000421866775f,
    9.00477171e-05f, 0.000188976526f, 0.000452935696f, -0.000283673406f, 0.000163480639f,
    0.000245913863f, -0.000336036086f, 0.000127866864f, 9.02563334e-05f, -0.000222280622f,
    9.02563334e-05f, 2.41845846e-05f, -9.62764025e-05f, 5.73396683e-05f, 4.88758087e-06f,
    -2.32905149e-05f, 3.26633453e-05f, 0.000369474292f, 0.000218912959f, 5.40912151e-06f,
    -6.49541616e-05f, 0.000457644463f, 1.14738941e-05f, -0.00101800263f, 0.000686079264f,
    1.84327364e-05f, -0.00151689351f, 0.000819891691f, 2.58237123e-05f, -0.00114808977f,
    0.000778257847f, 3.26037407e-05f, -0.0004029423f, 0.00056129694f, 3.72827053e-05f,
    9.63658094e-05f, 0.000268384814f, 3.87132168e-05f, 0.00021058321f, 2.92509794e-05f,
    3.64929438e-05f, 0.000138282776f, -8.65161419e-05f, 3.12179327e-05f, 5.73396683e-05f,
    -9.62764025e-05f, 2.41845846e-05f, 1.69724226e-05f, -5.98281622e-05f, 1.69724226e-05f,
    3.75509262e-06f, -2.43484974e-05f, 1.07437372e-05f, 0.000357791781f, 5.12450933e-05f,
    5.66244125e-07f, 0.000275701284f, 0.000116914511f, 1.25169754e-06f, -0.000196203589f,
    0.000197142363f, 2.14576721e-06f, -0.000594884157f, 0.000270396471f, 3.23355198e-06f,
    -0.00058965385f, 0.000302001834f, 4.39584255e-06f, -0.000295877457f, 0.000269040465f,
    5.43892384e-06f, -2.41100788e-05f, 0.000182241201f, 6.10947609e-06f, 7.96616077e-05f,
    8.18520784e-05f, 6.24358654e-06f, 6.84559345e-05f, 8.37445259e-06f, 5.7965517e-06f,
    3.26633453e-05f, -2.32905149e-05f, 4.88758087e-06f, 1.07437372e-05f, -2.43484974e-05f,
    3.75509262e-06f, 2.60770321e-06f, -1.42157078e-05f, 2.60770321e-06f
};

/* 4 x 13 x 12 coefficients, even in y, odd in x */
static const float tessary_features_group2_taps[624] = {
    0.124474436f, 0.11658892f, 0.0922403336f, 0.051602602f, 0.171099901f, 0.16699928f,
    0.145936221f, 0.0901775956f, 0.137374759f, 0.14361003f, 0.148118079f, 0.108023554f,
    0.0763550997f, 0.087872684f, 0.11429888f, 0.105127692f, 0.0309861004f, 0.0403502285f,
    0.0707275569f, 0.0876634419f, 0.00940141082f, 0.0142383873f, 0.0359375179f, 0.0641390383f,
    0.0021597743f, 0.0039101541f, 0.0151849985f, 0.0416987836f, 0.000378519297f,
    0.000842005014f, 0.00537610054f, 0.0242717564f, 5.08725643e-05f, 0.000142872334f,
    0.00160259008f, 0.0127107203f, 5.24520874e-06f, 1.91628933e-05f, 0.00040358305f,
    0.00600865483f, 4.17232513e-07f, 2.02655792e-06f, 8.60691071e-05f, 0.00257009268f,
    2.98023224e-08f, 1.78813934e-07f, 1.55568123e-05f, 0.000996440649f, 0.120644778f,
    0.108643189f, 0.0776741505f, 0.0388758332f, 0.165835708f, 0.156662688f, 0.124620795f,
    0.0684414804f, 0.133148193f, 0.136222839f, 0.129428089f, 0.082995981f, 0.0740059018f,
    0.0846446753f, 0.103085235f, 0.0821534246f, 0.0300327539f, 0.0396352559f, 0.0663718134f,
    0.0699966699f, 0.00911214948f, 0.0143194497f, 0.0353521705f, 0.0525563359f, 0.00209334493f,
    0.00404155254f, 0.0157648474f, 0.0352097601f, 0.000366896391f, 0.000897705555f,
    0.00592619181f, 0.021201238f, 4.92930412e-05f, 0.000157654285f, 0.00188574195f,
    0.0115270764f, 5.09619713e-06f, 2.19643116e-05f, 0.000509291887f, 0.00567625463f,
    4.17232513e-07f, 2.42888927e-06f, 0.000116944313f, 0.00253687799f, 2.98023224e-08f,
    2.23517418e-07f, 2.28583813e-05f, 0.00103056431f, 0.10984832f, 0.0875201821f, 0.0432189703f,
    0.0121270865f, 0.150995135f, 0.128931895f, 0.0733813345f, 0.0224007815f, 0.121232808f,
    0.116051793f, 0.0831519067f, 0.0292773992f, 0.0673831403f, 0.0755245388f, 0.0738828778f,
    0.0318864882f, 0.0273451209f, 0.0374082029f, 0.0538256019f, 0.0303217024f, 0.00829672813f,
    0.0144113004f, 0.0326860845f, 0.0256288648f, 0.00190600753f, 0.0043643564f, 0.0166640282f,
    0.0194082558f, 0.000334054232f, 0.00104495883f, 0.00715884566f, 0.0132216215f,
    4.48822975e-05f, 0.000198438764f, 0.00259746611f, 0.00812210143f, 4.64916229e-06f,
    2.9951334e-05f, 0.000797301531f, 0.00450675189f, 3.57627869e-07f, 3.59117985e-06f,
    0.000207319856f, 0.00226172805f, 2.98023224e-08f, 3.42726707e-07f, 4.57316637e-05f,
    0.00102771819f, 0.0939582288f, 0.0599719286f, 0.00844269991f, -0.00815203786f, 0.129152983f,
    0.0920713097f, 0.0197561085f, -0.0132011175f, 0.103695929f, 0.0882596225f, 0.0315361619f,
    -0.0136522502f, 0.0576358438f, 0.0621029884f, 0.0378589481f, -0.0101844519f, 0.0233895183f,
    0.0335548073f, 0.0354388952f, -0.00493563712f, 0.00709655881f, 0.0141565055f, 0.0265116245f,
    -0.000161543489f, 0.00163030624f, 0.00469757617f, 0.0161312968f, 0.00280514359f,
    0.000285744667f, 0.00123056769f, 0.00808358192f, 0.00380215049f, 3.83853912e-05f,
    0.000255048275f, 0.0033659637f, 0.00343361497f, 3.96370888e-06f, 4.18871641e-05f,
    0.00117214024f, 0.00248387456f, 3.27825546e-07f, 5.46872616e-06f, 0.000342965126f,
    0.00152516365f, 2.98023224e-08f, 5.66244125e-07f, 8.46236944e-05f, 0.000816076994f,
    0.0754975677f, 0.0335421115f, -0.0122692436f, -0.0135309696f, 0.103777349f, 0.0555966198f,
    -0.014631927f, -0.0233879089f, 0.0833220184f, 0.0591768175f, -0.00571231544f,
    -0.0274247974f, 0.0463117063f, 0.0466703326f, 0.0073068887f, -0.0257204622f, 0.0187940001f,
    0.028205052f, 0.0160104483f, -0.0201605558f, 0.00570225716f, 0.0132178813f, 0.0171857327f,
    -0.0132999867f, 0.00130999088f, 0.00483372808f, 0.0131171644f, -0.00722974539f,
    0.000229597092f, 0.00138558447f, 0.00779186189f, -0.00299343467f, 3.08454037e-05f,
    0.000312432647f, 0.00373865664f, -0.000646173954f, 3.1888485e-06f, 5.55813313e-05f,
    0.00147686899f, 0.000316619873f, 2.68220901e-07f, 7.82310963e-06f, 0.000485643744f,
    0.000510901213f, 2.98023224e-08f, 8.64267349e-07f, 0.000133857131f, 0.000401437283f,
    0.0569885671f, 0.0134943277f, -0.0172510296f, -0.00964863598f, 0.0783352554f, 0.0265814513f,
    -0.0254562944f, -0.0171597898f, 0.0628947616f, 0.0341069847f, -0.0217105448f, -0.021121487f,
    0.0349579155f, 0.0316659808f, -0.0104168504f, -0.0212580413f, 0.0141864717f, 0.0219016969f,
    0.000962674618f, -0.0183677971f, 0.00430428982f, 0.0114893019f, 0.00735335052f,
    -0.0138637573f, 0.000988811255f, 0.00463186204f, 0.00825618207f, -0.00917436182f,
    0.000173300505f, 0.00144901872f, 0.00609371066f, -0.00528927147f, 2.32756138e-05f,
    0.000354260206f, 0.00343470275f, -0.00260567665f, 2.41398811e-06f, 6.8038702e-05f,
    0.00155417621f, -0.00104513764f, 1.78813934e-07f, 1.03116035e-05f, 0.000577643514f,
    -0.000292599201f, 0.0f, 1.23679638e-06f, 0.000178560615f, -8.59797001e-06f, 0.0404109359f,
    0.00150924921f, -0.0132581294f, -0.00454303622f, 0.0555480123f, 0.00784921646f,
    -0.0213048756f, -0.00830167532f, 0.0445990562f, 0.0159307271f, -0.021575287f,
    -0.0106797069f, 0.0247888565f, 0.0190481693f, -0.0153770298f, -0.0114154667f, 0.0100597143f,
    0.0155011564f, -0.00679217279f, -0.01063779f, 0.00305220485f, 0.00916534662f,
    7.38501549e-05f, -0.00879865885f, 0.000701189041f, 0.00407479703f, 0.00335744023f,
    -0.00650018454f, 0.000122904778f, 0.00138939917f, 0.00363601744f, -0.00429095328f,
    1.65104866e-05f, 0.000367790461f, 0.00253467262f, -0.00252135098f, 1.69873238e-06f,
    7.61896372e-05f, 0.00134409964f, -0.00130745769f, 1.49011612e-07f, 1.24126673e-05f,
    0.000571623445f, -0.000588461757f, 0.0f, 1.59442425e-06f, 0.000199615955f, -0.000222072005f,
    0.0269194841f, -0.00366292894f, -0.00743816793f, -0.00155213475f, 0.0370029509f,
    -0.00155997276f, -0.012819618f, -0.00292034447f, 0.0297093689f, 0.00494143367f,
    -0.0146318227f, -0.00393415987f, 0.0165129602f, 0.00984379649f, -0.0126219094f,
    -0.0044657886f, 0.0067012012f, 0.00986562669f, -0.00811742246f, -0.00447015464f,
    0.00203320384f, 0.00664415956f, -0.00332441926f, -0.00400997698f, 0.000467091799f,
    0.0032659322f, 3.33786011e-06f, -0.00324223936f, 8.18669796e-05f, 0.00121457875f,
    0.00139328837f, -0.00236576796f, 1.0997057e-05f, 0.000348210335f, 0.00142274797f,
    -0.00155611336f, 1.13248825e-06f, 7.78138638e-05f, 0.000932276249f, -0.000920057297f,
    8.94069672e-08f, 1.36345625e-05f, 0.000464484096f, -0.000486627221f, 0.0f, 1.89244747e-06f,
    0.000185579062f, -0.000228464603f, 0.0168457925f, -0.00456734002f, -0.00328397751f,
    -0.000399529934f, 0.0231558681f, -0.00458690524f, -0.00606182218f, -0.000776201487f,
    0.0185916424f, -0.000341206789f, -0.00769788027f, -0.00109836459f, 0.0103335381f,
    0.00407600403f, -0.00767682493f, -0.00132624805f, 0.00419351459f, 0.0055552572f,
    -0.00606456399f, -0.00142472982f, 0.00127235055f, 0.0043425113f, -0.00362972915f,
    -0.00138033926f, 0.000292301178f, 0.00237366557f, -0.00139212608f, -0.00121147931f,
    5.12301922e-05f, 0.000965178013f, 8.94069672e-08f, -0.000964224339f, 6.88433647e-06f,
    0.000300094485f, 0.000512361526f, -0.000695586205f, 7.15255737e-07f, 7.23898411e-05f,
    0.000491648912f, -0.000454232097f, 5.96046448e-08f, 1.36643648e-05f, 0.000302657485f,
    -0.000267952681f, 0.0f, 2.02655792e-06f, 0.000141665339f, -0.000142380595f, 0.00990313292f,
    -0.00358487666f, -0.00117745996f, -7.89761543e-05f, 0.013612628f, -0.00432734191f,
    -0.00233237445f, -0.000158920884f, 0.0109294653f, -0.00202646852f, -0.00328180194f,
    -0.000236928463f, 0.00607478619f, 0.00105461478f, -0.00371597707f, -0.000304862857f,
    0.00246524811f, 0.00269898772f, -0.00342948735f, -0.000351369381f, 0.000747978687f,
    0.00253818929f, -0.00253365934f, -0.000366777182f, 0.000171840191f, 0.00155852735f,
    -0.00142256916f, -0.000347882509f, 3.01301479e-05f, 0.000695854425f, -0.000512331724f,
    -0.000300005078f, 4.05311584e-06f, 0.000235185027f, 0.0f, -0.000235155225f, 4.17232513e-07f,
    6.13480806e-05f, 0.000166341662f, -0.000167414546f, 2.98023224e-08f, 1.24871731e-05f,
    0.000149950385f, -0.000108137727f, 0.0f, 1.9967556e-06f, 8.6709857e-05f, -6.32852316e-05f,
    0.00546902418f, -0.00223694742f, -0.000348508358f, -1.21295452e-05f, 0.00751760602f,
    -0.00299046934f, -0.000742971897f, -2.5331974e-05f, 0.00603583455f, -0.00196295977f,
    -0.00115655363f, -3.99202108e-05f, 0.00335481763f, -0.000176161528f, -0.00147305429f,
    -5.48064709e-05f, 0.00136142969f, 0.00107499957f, -0.00155337155f, -6.77704811e-05f,
    0.000413060188f, 0.00131246448f, -0.00134395063f, -7.61002302e-05f, 9.48905945e-05f,
    0.000920712948f, -0.000932246447f, -7.77840614e-05f, 1.66296959e-05f, 0.000454291701f,
    -0.000491648912f, -7.23898411e-05f, 2.23517418e-06f, 0.000167414546f, -0.000166341662f,
    -6.13480806e-05f, 2.38418579e-07f, 4.72962856e-05f, 0.0f, -4.72962856e-05f, 2.98023224e-08f,
    1.03861094e-05f, 4.76539135e-05f, -3.31699848e-05f, 0.0f, 1.78813934e-06f, 4.03523445e-05f,
    -2.11298466e-05f, 0.0028373003f, -0.0011844784f, -8.59797001e-05f, -1.44541264e-06f,
    0.00390008092f, -0.00171050429f, -0.000197872519f, -3.17394733e-06f, 0.00313135982f,
    -0.00134950876f, -0.000340521336f, -5.28991222e-06f, 0.00174045563f, -0.000466883183f,
    -0.000485107303f, -7.76350498e-06f, 0.000706315041f, 0.000301301479f, -0.000577554107f,
    -1.02818012e-05f, 0.0002143085f, 0.000589832664f, -0.000571593642f, -1.24126673e-05f,
    4.92334366e-05f, 0.000486806035f, -0.000464484096f, -1.36345625e-05f, 8.64267349e-06f,
    0.000267982483f, -0.000302657485f, -1.36643648e-05f, 1.16229057e-06f, 0.000108137727f,
    -0.000149950385f, -1.24871731e-05f, 1.1920929e-07f, 3.31699848e-05f, -4.76539135e-05f,
    -1.03861094e-05f, 0.0f, 7.86781311e-06f, 0.0f, -7.86781311e-06f, 0.0f, 1.4603138e-06f,
    1.20550394e-05f, -5.42402267e-06f, 0.00138279796f, -0.000547230244f, -1.77919865e-05f,
    -1.34110451e-07f, 0.00190076232f, -0.000845298171f, -4.43309546e-05f, -3.12924385e-07f,
    0.00152608752f, -0.000762104988f, -8.42958689e-05f, -5.66244125e-07f, 0.0008482337f,
    -0.000388860703f, -0.000133797526f, -8.64267349e-07f, 0.000344216824f, 1.09225512e-05f,
    -0.000178560615f, -1.23679638e-06f, 0.000104427338f, 0.000222399831f, -0.000199615955f,
    -1.59442425e-06f, 2.39908695e-05f, 0.000228494406f, -0.000185579062f, -1.89244747e-06f,
    4.20212746e-06f, 0.000142380595f, -0.000141665339f, -2.02655792e-06f, 5.66244125e-07f,
    6.32852316e-05f, -8.6709857e-05f, -1.9967556e-06f, 5.96046448e-08f, 2.11298466e-05f,
    -4.03523445e-05f, -1.78813934e-06f, 0.0f, 5.42402267e-06f, -1.20550394e-05f,
    -1.4603138e-06f, 0.0f, 1.08778477e-06f, 0.0f, -1.08778477e-06f
};

/* 4 x 12 x 13 coefficients, odd in y, even in x */
static const float tessary_features_group3_taps[624] = {
    0.051602602f, 0.0922403336f, 0.11658892f, 0.124474436f, 0.0388758332f, 0.0776741505f,
    0.108643189f, 0.120644778f, 0.0121270865f, 0.0432189703f, 0.0875201821f, 0.10984832f,
    -0.00815203786f, 0.00844269991f, 0.0599719286f, 0.0939582288f, -0.0135309696f,
    -0.0122692436f, 0.0335421115f, 0.0754975677f, -0.00964863598f, -0.0172510296f,
    0.0134943277f, 0.0569885671f, -0.00454303622f, -0.0132581294f, 0.00150924921f,
    0.0404109359f, -0.00155213475f, -0.00743816793f, -0.00366292894f, 0.0269194841f,
    -0.000399529934f, -0.00328397751f, -0.00456734002f, 0.0168457925f, -7.89761543e-05f,
    -0.00117745996f, -0.00358487666f, 0.00990313292f, -1.21295452e-05f, -0.000348508358f,
    -0.00223694742f, 0.00546902418f, -1.44541264e-06f, -8.59797001e-05f, -0.0011844784f,
    0.0028373003f, -1.34110451e-07f, -1.77919865e-05f, -0.000547230244f, 0.00138279796f,
    0.0901775956f, 0.145936221f, 0.16699928f, 0.171099901f, 0.0684414804f, 0.124620795f,
    0.156662688f, 0.165835708f, 0.0224007815f, 0.0733813345f, 0.128931895f, 0.150995135f,
    -0.0132011175f, 0.0197561085f, 0.0920713097f, 0.129152983f, -0.0233879089f, -0.014631927f,
    0.0555966198f, 0.103777349f, -0.0171597898f, -0.0254562944f, 0.0265814513f, 0.0783352554f,
    -0.00830167532f, -0.0213048756f, 0.00784921646f, 0.0555480123f, -0.00292034447f,
    -0.012819618f, -0.00155997276f, 0.0370029509f, -0.000776201487f, -0.00606182218f,
    -0.00458690524f, 0.0231558681f, -0.000158920884f, -0.00233237445f, -0.00432734191f,
    0.013612628f, -2.5331974e-05f, -0.000742971897f, -0.00299046934f, 0.00751760602f,
    -3.17394733e-06f, -0.000197872519f, -0.00171050429f, 0.00390008092f, -3.12924385e-07f,
    -4.43309546e-05f, -0.000845298171f, 0.00190076232f, 0.108023554f, 0.148118079f, 0.14361003f,
    0.137374759f, 0.082995981f, 0.129428089f, 0.136222839f, 0.133148193f, 0.0292773992f,
    0.0831519067f, 0.116051793f, 0.121232808f, -0.0136522502f, 0.0315361619f, 0.0882596225f,
    0.103695929f, -0.0274247974f, -0.00571231544f, 0.0591768175f, 0.0833220184f, -0.021121487f,
    -0.0217105448f, 0.0341069847f, 0.0628947616f, -0.0106797069f, -0.021575287f, 0.0159307271f,
    0.0445990562f, -0.00393415987f, -0.0146318227f, 0.00494143367f, 0.0297093689f,
    -0.00109836459f, -0.00769788027f, -0.000341206789f, 0.0185916424f, -0.000236928463f,
    -0.00328180194f, -0.00202646852f, 0.0109294653f, -3.99202108e-05f, -0.00115655363f,
    -0.00196295977f, 0.00603583455f, -5.28991222e-06f, -0.000340521336f, -0.00134950876f,
    0.00313135982f, -5.66244125e-07f, -8.42958689e-05f, -0.000762104988f, 0.00152608752f,
    0.105127692f, 0.11429888f, 0.087872684f, 0.0763550997f, 0.0821534246f, 0.103085235f,
    0.0846446753f, 0.0740059018f, 0.0318864882f, 0.0738828778f, 0.0755245388f, 0.0673831403f,
    -0.0101844519f, 0.0378589481f, 0.0621029884f, 0.0576358438f, -0.0257204622f, 0.0073068887f,
    0.0466703326f, 0.0463117063f, -0.0212580413f, -0.0104168504f, 0.0316659808f, 0.0349579155f,
    -0.0114154667f, -0.0153770298f, 0.0190481693f, 0.0247888565f, -0.0044657886f,
    -0.0126219094f, 0.00984379649f, 0.0165129602f, -0.00132624805f, -0.00767682493f,
    0.00407600403f, 0.0103335381f, -0.000304862857f, -0.00371597707f, 0.00105461478f,
    0.00607478619f, -5.48064709e-05f, -0.00147305429f, -0.000176161528f, 0.00335481763f,
    -7.76350498e-06f, -0.000485107303f, -0.000466883183f, 0.00174045563f, -8.64267349e-07f,
    -0.000133797526f, -0.000388860703f, 0.0008482337f, 0.0876634419f, 0.0707275569f,
    0.0403502285f, 0.0309861004f, 0.0699966699f, 0.0663718134f, 0.0396352559f, 0.0300327539f,
    0.0303217024f, 0.0538256019f, 0.0374082029f, 0.0273451209f, -0.00493563712f, 0.0354388952f,
    0.0335548073f, 0.0233895183f, -0.0201605558f, 0.0160104483f, 0.028205052f, 0.0187940001f,
    -0.0183677971f, 0.000962674618f, 0.0219016969f, 0.0141864717f, -0.01063779f,
    -0.00679217279f, 0.0155011564f, 0.0100597143f, -0.00447015464f, -0.00811742246f,
    0.00986562669f, 0.0067012012f, -0.00142472982f, -0.00606456399f, 0.0055552572f,
    0.00419351459f, -0.000351369381f, -0.00342948735f, 0.00269898772f, 0.00246524811f,
    -6.77704811e-05f, -0.00155337155f, 0.00107499957f, 0.00136142969f, -1.02818012e-05f,
    -0.000577554107f, 0.000301301479f, 0.000706315041f, -1.23679638e-06f, -0.000178560615f,
    1.09225512e-05f, 0.000344216824f, 0.0641390383f, 0.0359375179f, 0.0142383873f,
    0.00940141082f, 0.0525563359f, 0.0353521705f, 0.0143194497f, 0.00911214948f, 0.0256288648f,
    0.0326860845f, 0.0144113004f, 0.00829672813f, -0.000161543489f, 0.0265116245f,
    0.0141565055f, 0.00709655881f, -0.0132999867f, 0.0171857327f, 0.0132178813f, 0.00570225716f,
    -0.0138637573f, 0.00735335052f, 0.0114893019f, 0.00430428982f, -0.00879865885f,
    7.38501549e-05f, 0.00916534662f, 0.00305220485f, -0.00400997698f, -0.00332441926f,
    0.00664415956f, 0.00203320384f, -0.00138033926f, -0.00362972915f, 0.0043425113f,
    0.00127235055f, -0.000366777182f, -0.00253365934f, 0.00253818929f, 0.000747978687f,
    -7.61002302e-05f, -0.00134395063f, 0.00131246448f, 0.000413060188f, -1.24126673e-05f,
    -0.000571593642f, 0.000589832664f, 0.0002143085f, -1.59442425e-06f, -0.000199615955f,
    0.000222399831f, 0.000104427338f, 0.0416987836f, 0.0151849985f, 0.0039101541f,
    0.0021597743f, 0.0352097601f, 0.0157648474f, 0.00404155254f, 0.00209334493f, 0.0194082558f,
    0.0166640282f, 0.0043643564f, 0.00190600753f, 0.00280514359f, 0.0161312968f, 0.00469757617f,
    0.00163030624f, -0.00722974539f, 0.0131171644f, 0.00483372808f, 0.00130999088f,
    -0.00917436182f, 0.00825618207f, 0.00463186204f, 0.000988811255f, -0.00650018454f,
    0.00335744023f, 0.00407479703f, 0.000701189041f, -0.00324223936f, 3.33786011e-06f,
    0.0032659322f, 0.000467091799f, -0.00121147931f, -0.00139212608f, 0.00237366557f,
    0.000292301178f, -0.000347882509f, -0.00142256916f, 0.00155852735f, 0.000171840191f,
    -7.77840614e-05f, -0.000932246447f, 0.000920712948f, 9.48905945e-05f, -1.36345625e-05f,
    -0.000464484096f, 0.000486806035f, 4.92334366e-05f, -1.89244747e-06f, -0.000185579062f,
    0.000228494406f, 2.39908695e-05f, 0.0242717564f, 0.00537610054f, 0.000842005014f,
    0.000378519297f, 0.021201238f, 0.00592619181f, 0.000897705555f, 0.000366896391f,
    0.0132216215f, 0.00715884566f, 0.00104495883f, 0.000334054232f, 0.00380215049f,
    0.00808358192f, 0.00123056769f, 0.000285744667f, -0.00299343467f, 0.00779186189f,
    0.00138558447f, 0.000229597092f, -0.00528927147f, 0.00609371066f, 0.00144901872f,
    0.000173300505f, -0.00429095328f, 0.00363601744f, 0.00138939917f, 0.000122904778f,
    -0.00236576796f, 0.00139328837f, 0.00121457875f, 8.18669796e-05f, -0.000964224339f,
    8.94069672e-08f, 0.000965178013f, 5.12301922e-05f, -0.000300005078f, -0.000512331724f,
    0.000695854425f, 3.01301479e-05f, -7.23898411e-05f, -0.000491648912f, 0.000454291701f,
    1.66296959e-05f, -1.36643648e-05f, -0.000302657485f, 0.000267982483f, 8.64267349e-06f,
    -2.02655792e-06f, -0.000141665339f, 0.000142380595f, 4.20212746e-06f, 0.0127107203f,
    0.00160259008f, 0.000142872334f, 5.08725643e-05f, 0.0115270764f, 0.00188574195f,
    0.000157654285f, 4.92930412e-05f, 0.00812210143f, 0.00259746611f, 0.000198438764f,
    4.48822975e-05f, 0.00343361497f, 0.0033659637f, 0.000255048275f, 3.83853912e-05f,
    -0.000646173954f, 0.00373865664f, 0.000312432647f, 3.08454037e-05f, -0.00260567665f,
    0.00343470275f, 0.000354260206f, 2.32756138e-05f, -0.00252135098f, 0.00253467262f,
    0.000367790461f, 1.65104866e-05f, -0.00155611336f, 0.00142274797f, 0.000348210335f,
    1.0997057e-05f, -0.000695586205f, 0.000512361526f, 0.000300094485f, 6.88433647e-06f,
    -0.000235155225f, 0.0f, 0.000235185027f, 4.05311584e-06f, -6.13480806e-05f,
    -0.000166341662f, 0.000167414546f, 2.23517418e-06f, -1.24871731e-05f, -0.000149950385f,
    0.000108137727f, 1.16229057e-06f, -1.9967556e-06f, -8.6709857e-05f, 6.32852316e-05f,
    5.66244125e-07f, 0.00600865483f, 0.00040358305f, 1.91628933e-05f, 5.24520874e-06f,
    0.00567625463f, 0.000509291887f, 2.19643116e-05f, 5.09619713e-06f, 0.00450675189f,
    0.000797301531f, 2.9951334e-05f, 4.64916229e-06f, 0.00248387456f, 0.00117214024f,
    4.18871641e-05f, 3.96370888e-06f, 0.000316619873f, 0.00147686899f, 5.55813313e-05f,
    3.1888485e-06f, -0.00104513764f, 0.00155417621f, 6.8038702e-05f, 2.41398811e-06f,
    -0.00130745769f, 0.00134409964f, 7.61896372e-05f, 1.69873238e-06f, -0.000920057297f,
    0.000932276249f, 7.78138638e-05f, 1.13248825e-06f, -0.000454232097f, 0.000491648912f,
    7.23898411e-05f, 7.15255737e-07f, -0.000167414546f, 0.000166341662f, 6.13480806e-05f,
    4.17232513e-07f, -4.72962856e-05f, 0.0f, 4.72962856e-05f, 2.38418579e-07f, -1.03861094e-05f,
    -4.76539135e-05f, 3.31699848e-05f, 1.1920929e-07f, -1.78813934e-06f, -4.03523445e-05f,
    2.11298466e-05f, 5.96046448e-08f, 0.00257009268f, 8.60691071e-05f, 2.02655792e-06f,
    4.17232513e-07f, 0.00253687799f, 0.000116944313f, 2.42888927e-06f, 4.17232513e-07f,
    0.00226172805f, 0.000207319856f, 3.59117985e-06f, 3.57627869e-07f, 0.00152516365f,
    0.000342965126f, 5.46872616e-06f, 3.27825546e-07f, 0.000510901213f, 0.000485643744f,
    7.82310963e-06f, 2.68220901e-07f, -0.000292599201f, 0.000577643514f, 1.03116035e-05f,
    1.78813934e-07f, -0.000588461757f, 0.000571623445f, 1.24126673e-05f, 1.49011612e-07f,
    -0.000486627221f, 0.000464484096f, 1.36345625e-05f, 8.94069672e-08f, -0.000267952681f,
    0.000302657485f, 1.36643648e-05f, 5.96046448e-08f, -0.000108137727f, 0.000149950385f,
    1.24871731e-05f, 2.98023224e-08f, -3.31699848e-05f, 4.76539135e-05f, 1.03861094e-05f,
    2.98023224e-08f, -7.86781311e-06f, 0.0f, 7.86781311e-06f, 0.0f, -1.4603138e-06f,
    -1.20550394e-05f, 5.42402267e-06f, 0.0f, 0.000996440649f, 1.55568123e-05f, 1.78813934e-07f,
    2.98023224e-08f, 0.00103056431f, 2.28583813e-05f, 2.23517418e-07f, 2.98023224e-08f,
    0.00102771819f, 4.57316637e-05f, 3.42726707e-07f, 2.98023224e-08f, 0.000816076994f,
    8.46236944e-05f, 5.66244125e-07f, 2.98023224e-08f, 0.000401437283f, 0.000133857131f,
    8.64267349e-07f, 2.98023224e-08f, -8.59797001e-06f, 0.000178560615f, 1.23679638e-06f, 0.0f,
    -0.000222072005f, 0.000199615955f, 1.59442425e-06f, 0.0f, -0.000228464603f, 0.000185579062f,
    1.89244747e-06f, 0.0f, -0.000142380595f, 0.000141665339f, 2.02655792e-06f, 0.0f,
    -6.32852316e-05f, 8.6709857e-05f, 1.9967556e-06f, 0.0f, -2.11298466e-05f, 4.03523445e-05f,
    1.78813934e-06f, 0.0f, -5.42402267e-06f, 1.20550394e-05f, 1.4603138e-06f, 0.0f,
    -1.08778477e-06f, 0.0f, 1.08778477e-06f, 0.0f
};

static const int16_t tessary_features_group0_counts[910] = {
    4020, 2661, 4020, 2829, 4020, 3253, 4020, 3703, 4020, 3897, 0, -1632, 376, -1361, 1470,
    -250, 2866, 1798, 3548, 3035, -1633, -928, -1637, -1080, -1153, -1212, 810, 110, 2439, 1841,
    -357, -99, -490, -163, -846, -448, -254, -353, 1305, 870, -20, -3, -41, -8, -190, -66, -304,
    -207, 544, 320, 0, 0, -1, 0, -19, -4, -119, -60, 177, 92, 0, 0, 0, 0, -1, 0, -26, 0, 45, 0,
    3897, 2579, 3703, 2625, 3253, 2671, 2829, 2625, 2661, 2579, 0, -1582, 388, -1229, 1294, -86,
    2081, 1373, 2348, 2009, -1582, -899, -1522, -1028, -876, -1000, 696, 189, 1614, 1218, -346,
    -96, -478, -164, -743, -420, -101, -208, 864, 575, -20, -3, -43, -9, -190, -70, -201, -148,
    360, 212, 0, 0, -1, 0, -22, -6, -91, -48, 117, 61, 0, 0, 0, 0, -1, 0, -23, 0, 30, 0, 3548,
    2348, 2866, 2081, 1470, 1294, 376, 388, 0, 0, 0, -1440, 407, -888, 825, 236, 407, 404, 0, 0,
    -1441, -819, -1214, -883, -251, -486, 355, 264, 0, 0, -315, -87, -443, -164, -473, -331,
    157, 66, 0, 0, -18, -3, -46, -10, -181, -80, 6, -21, 0, 0, 0, 0, -2, 0, -29, -9, -26, -20,
    0, 0, 0, 0, 0, 0, -2, 0, -12, 0, 0, 0, 3035, 2009, 1798, 1373, -250, -86, -1361, -1229,
    -1632, -1582, 0, -1232, 404, -466, 236, 403, -888, -466, -1440, -1232, -1232, -700, -809,
    -677, 294, 46, -99, 130, -990, -747, -270, -75, -384, -160, -141, -190, 214, 197, -530,
    -353, -15, -2, -50, -12, -145, -81, 136, 75, -221, -130, 0, 0, -2, 0, -35, -12, 32, 10, -72,
    -37, 0, 0, 0, 0, -3, 0, 1, 0, -18, 0, 2439, 1614, 810, 696, -1153, -876, -1637, -1522,
    -1633, -1582, 0, -990, 355, -99, -251, 294, -1214, -809, -1441, -1232, -990, -563, -415,
    -453, 482, 352, -415, -116, -990, -747, -217, -60, -307, -147, 122, -35, 59, 124, -530,
    -353, -12, -2, -52, -14, -81, -65, 119, 85, -221, -130, 0, 0, -3, 0, -35, -14, 50, 24, -72,
    -37, 0, 0, 0, 0, -5, 0, 10, 0, -18, 0, 1841, 1218, 110, 189, -1212, -1000, -1080, -1028,
    -928, -899, 0, -747, 264, 130, -486, 46, -883, -677, -819, -700, -747, -425, -116, -251,
    352, 377, -453, -251, -563, -425, -164, -45, -220, -124, 235, 79, -100, -9, -301, -201, -9,
    -1, -49, -15, -11, -35, 32, 40, -126, -74, 0, 0, -3, -1, -27, -14, 31, 20, -41, -21, 0, 0,
    0, 0, -5, 0, 10, 0, -10, 0, 1305, 864, -254, -101, -846, -743, -490, -478, -357, -346, 0,
    -530, 157, 214, -473, -141, -443, -384, -315, -270, -530, -301, 59, -100, 122, 235, -307,
    -220, -217, -164, -116, -32, -139, -95, 208, 117, -139, -73, -116, -77, -7, -1, -43, -14,
    36, -4, -28, -4, -48, -28, 0, 0, -3, -1, -14, -10, 6, 7, -16, -8, 0, 0, 0, 0, -5, 0, 5, 0,
    -4, 0, 870, 575, -353, -208, -448, -420, -163, -164, -99, -96, 0, -353, 66, 197, -331, -190,
    -164, -160, -87, -75, -353, -201, 124, -9, -35, 79, -147, -124, -60, -45, -77, -21, -73,
    -64, 117, 94, -95, -64, -32, -21, -4, -1, -34, -12, 49, 14, -38, -19, -13, -8, 0, 0, -3, -1,
    -2, -5, -7, -2, -4, -2, 0, 0, 0, 0, -3, 0, 0, 0, -1, 0, 544, 360, -304, -201, -190, -190,
    -41, -43, -20, -20, 0, -221, 6, 136, -181, -145, -46, -50, -18, -15, -221, -126, 119, 32,
    -81, -11, -52, -49, -12, -9, -48, -13, -28, -38, 36, 49, -43, -34, -7, -4, -3, 0, -23, -10,
    37, 18, -23, -15, -3, -2, 0, 0, -3, -1, 5, 0, -8, -4, -1, -1, 0, 0, 0, 0, -1, 0, -1, 0, 0,
    0, 320, 212, -207, -148, -66, -70, -8, -9, -3, -3, 0, -130, -21, 75, -80, -81, -10, -12, -3,
    -2, -130, -74, 85, 40, -65, -35, -14, -15, -2, -1, -28, -8, -4, -19, -4, 14, -14, -12, -1,
    -1, -2, 0, -15, -7, 18, 13, -10, -7, 0, 0, 0, 0, -2, -1, 6, 2, -4, -2, 0, 0, 0, 0, 0, 0, 0,
    0, -1, 0, 0, 0, 177, 117, -119, -91, -19, -22, -1, -1, 0, 0, 0, -72, -26, 32, -29, -35, -2,
    -2, 0, 0, -72, -41, 50, 31, -35, -27, -3, -3, 0, 0, -16, -4, 6, -7, -14, -2, -3, -3, 0, 0,
    -1, 0, -8, -4, 5, 6, -3, -2, 0, 0, 0, 0, -2, 0, 4, 2, -2, -1, 0, 0, 0, 0, 0, 0, 0, 0, -1, 0,
    0, 0, 92, 61, -60, -48, -4, -6, 0, 0, 0, 0, 0, -37, -20, 10, -9, -12, 0, 0, 0, 0, -37, -21,
    24, 20, -14, -14, 0, -1, 0, 0, -8, -2, 7, -2, -10, -5, -1, -1, 0, 0, -1, 0, -4, -2, 0, 2,
    -1, -1, 0, 0, 0, 0, -1, 0, 2, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 45, 30, -26, -23,
    -1, -1, 0, 0, 0, 0, 0, -18, -12, 1, -2, -3, 0, 0, 0, 0, -18, -10, 10, 10, -5, -5, 0, 0, 0,
    0, -4, -1, 5, 0, -5, -3, 0, 0, 0, 0, 0, 0, -1, -1, -1, 0, 0, 0, 0, 0, 0, 0, -1, 0, 0, 0, 0,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0
};

static const int16_t tessary_features_group1_counts[432] = {
    -781, -915, -1106, -1577, -781, -1328, -493, -48, -1305, -681, -1518, -1377, 129, 112, -156,
    90, -1039, -662, 53, 17, 126, 82, -353, -152, 4, 1, 38, 13, -47, -5, 0, 0, 4, 1, 6, 6,
    -1328, -1576, -1577, -2306, -915, -1576, -876, -110, -2000, -1143, -1841, -1724, 213, 195,
    -352, 71, -1358, -916, 95, 32, 174, 130, -529, -258, 8, 1, 66, 26, -102, -28, 0, 0, 8, 2,
    -1, 5, -1518, -1841, -1305, -2000, -493, -876, -1076, -185, -1887, -1243, -1076, -1079, 227,
    233, -530, -60, -927, -695, 121, 43, 120, 125, -457, -263, 11, 2, 76, 34, -131, -54, 0, 0,
    12, 3, -18, -3, -1377, -1724, -681, -1143, -48, -110, -1079, -251, -1243, -997, -185, -251,
    180, 223, -580, -206, -286, -277, 127, 48, 9, 75, -231, -167, 13, 3, 63, 35, -104, -57, 0,
    0, 14, 5, -26, -10, -1039, -1358, -156, -352, 129, 213, -927, -286, -530, -580, 227, 180,
    102, 178, -466, -264, 102, 26, 115, 48, -86, 9, -25, -46, 14, 3, 34, 27, -45, -33, 1, 0, 14,
    5, -20, -10, -662, -916, 90, 71, 112, 195, -695, -277, -60, -206, 233, 223, 26, 119, -264,
    -216, 178, 119, 91, 42, -119, -37, 65, 25, 14, 3, 4, 14, 3, -6, 1, 0, 10, 5, -7, -5, -353,
    -529, 126, 174, 53, 95, -457, -231, 120, 9, 121, 127, -25, 65, -86, -119, 115, 91, 63, 33,
    -94, -49, 63, 37, 12, 3, -14, 2, 19, 7, 1, 0, 5, 3, 2, 0, -152, -258, 82, 130, 17, 32, -263,
    -167, 125, 75, 43, 48, -46, 25, 9, -37, 48, 42, 37, 23, -49, -37, 33, 23, 10, 3, -18, -5,
    15, 8, 1, 0, 1, 1, 4, 1, -47, -102, 38, 66, 4, 8, -131, -104, 76, 63, 11, 13, -45, 3, 34, 4,
    14, 14, 19, 15, -14, -18, 12, 10, 7, 2, -13, -6, 7, 4, 1, 0, -2, 0, 2, 1, -5, -28, 13, 26,
    1, 1, -54, -57, 34, 35, 2, 3, -33, -6, 27, 14, 3, 3, 7, 8, 2, -5, 3, 3, 4, 2, -6, -4, 2, 2,
    0, 0, -2, 0, 1, 1, 6, -1, 4, 8, 0, 0, -18, -26, 12, 14, 0, 0, -20, -7, 14, 10, 1, 1, 2, 4,
    5, 1, 1, 1, 2, 1, -2, -2, 1, 0, 0, 0, -1, 0, 0, 0, 6, 5, 1, 2, 0, 0, -3, -10, 3, 5, 0, 0,
    -10, -5, 5, 5, 0, 0, 0, 1, 3, 1, 0, 0, 1, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0
};

static const int16_t tessary_features_group2_counts[624] = {
    2173, 2987, 2035, 2915, 1610, 2548, 901, 1574, 2398, 1333, 2507, 1534, 2586, 1995, 1886,
    1835, 541, 164, 704, 249, 1235, 627, 1530, 1120, 38, 7, 68, 15, 265, 94, 728, 424, 1, 0, 2,
    0, 28, 7, 222, 105, 0, 0, 0, 0, 2, 0, 45, 17, 2106, 2895, 1897, 2735, 1356, 2175, 679, 1195,
    2324, 1292, 2378, 1478, 2259, 1800, 1449, 1434, 524, 159, 692, 250, 1159, 617, 1222, 917,
    37, 6, 71, 16, 275, 103, 615, 370, 1, 0, 3, 0, 33, 9, 201, 99, 0, 0, 0, 0, 2, 0, 44, 18,
    1918, 2636, 1528, 2251, 754, 1281, 212, 391, 2116, 1176, 2026, 1318, 1452, 1290, 511, 557,
    477, 145, 653, 252, 940, 571, 529, 447, 33, 6, 76, 18, 291, 125, 339, 231, 1, 0, 3, 1, 45,
    14, 142, 79, 0, 0, 0, 0, 4, 1, 39, 18, 1640, 2255, 1047, 1607, 147, 345, -142, -230, 1810,
    1006, 1541, 1084, 551, 661, -238, -178, 408, 124, 586, 247, 619, 463, -86, -3, 28, 5, 82,
    21, 282, 141, 49, 66, 1, 0, 4, 1, 59, 20, 60, 43, 0, 0, 0, 0, 6, 1, 27, 14, 1318, 1812, 586,
    971, -214, -255, -236, -408, 1455, 808, 1033, 815, -100, 128, -479, -449, 328, 100, 492,
    231, 279, 300, -352, -232, 23, 4, 84, 24, 229, 136, -126, -52, 1, 0, 5, 1, 65, 26, -11, 6,
    0, 0, 0, 0, 8, 2, 9, 7, 995, 1367, 236, 464, -301, -444, -168, -300, 1098, 610, 595, 553,
    -379, -182, -369, -371, 248, 75, 382, 201, 17, 128, -321, -242, 17, 3, 81, 25, 144, 106,
    -160, -92, 0, 0, 6, 1, 60, 27, -45, -18, 0, 0, 0, 0, 10, 3, -5, 0, 705, 970, 26, 137, -231,
    -372, -79, -145, 779, 433, 278, 333, -377, -268, -186, -199, 176, 53, 271, 160, -119, 1,
    -186, -154, 12, 2, 71, 24, 59, 63, -113, -75, 0, 0, 6, 1, 44, 23, -44, -23, 0, 0, 0, 0, 10,
    3, -10, -4, 470, 646, -64, -27, -130, -224, -27, -51, 519, 288, 86, 172, -255, -220, -69,
    -78, 117, 35, 172, 116, -142, -58, -78, -70, 8, 1, 57, 21, 0, 24, -57, -41, 0, 0, 6, 1, 25,
    16, -27, -16, 0, 0, 0, 0, 8, 3, -8, -4, 294, 404, -80, -80, -57, -106, -7, -14, 325, 180,
    -6, 71, -134, -134, -19, -23, 73, 22, 97, 76, -106, -63, -25, -24, 5, 1, 41, 17, -24, 0,
    -21, -17, 0, 0, 5, 1, 9, 9, -12, -8, 0, 0, 0, 0, 5, 2, -5, -2, 173, 238, -63, -76, -21, -41,
    -1, -3, 191, 106, -35, 18, -57, -65, -4, -5, 43, 13, 47, 44, -60, -44, -6, -6, 3, 1, 27, 12,
    -25, -9, -6, -5, 0, 0, 4, 1, 0, 3, -4, -3, 0, 0, 0, 0, 3, 2, -2, -1, 95, 131, -39, -52, -6,
    -13, 0, 0, 105, 59, -34, -3, -20, -26, -1, -1, 24, 7, 19, 23, -27, -23, -1, -1, 2, 0, 16, 8,
    -16, -9, -1, -1, 0, 0, 3, 1, -3, 0, -1, -1, 0, 0, 0, 0, 1, 1, -1, 0, 50, 68, -21, -30, -2,
    -3, 0, 0, 55, 30, -24, -8, -6, -8, 0, 0, 12, 4, 5, 10, -10, -10, 0, 0, 1, 0, 8, 5, -8, -5,
    0, 0, 0, 0, 2, 1, -3, -1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 24, 33, -10, -15, 0, -1, 0, 0, 27,
    15, -13, -7, -1, -2, 0, 0, 6, 2, 0, 4, -3, -3, 0, 0, 0, 0, 4, 2, -3, -2, 0, 0, 0, 0, 1, 0,
    -2, -1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0
};

static const int16_t tessary_features_group3_counts[624] = {
    901, 1574, 1610, 2548, 2035, 2915, 2173, 2987, 679, 1195, 1356, 2175, 1897, 2735, 2106,
    2895, 212, 391, 754, 1281, 1528, 2251, 1918, 2636, -142, -230, 147, 345, 1047, 1607, 1640,
    2255, -236, -408, -214, -255, 586, 971, 1318, 1812, -168, -300, -301, -444, 236, 464, 995,
    1367, -79, -145, -231, -372, 26, 137, 705, 970, -27, -51, -130, -224, -64, -27, 470, 646,
    -7, -14, -57, -106, -80, -80, 294, 404, -1, -3, -21, -41, -63, -76, 173, 238, 0, 0, -6, -13,
    -39, -52, 95, 131, 0, 0, -2, -3, -21, -30, 50, 68, 0, 0, 0, -1, -10, -15, 24, 33, 1886,
    1835, 2586, 1995, 2507, 1534, 2398, 1333, 1449, 1434, 2259, 1800, 2378, 1478, 2324, 1292,
    511, 557, 1452, 1290, 2026, 1318, 2116, 1176, -238, -178, 551, 661, 1541, 1084, 1810, 1006,
    -479, -449, -100, 128, 1033, 815, 1455, 808, -369, -371, -379, -182, 595, 553, 1098, 610,
    -186, -199, -377, -268, 278, 333, 779, 433, -69, -78, -255, -220, 86, 172, 519, 288, -19,
    -23, -134, -134, -6, 71, 325, 180, -4, -5, -57, -65, -35, 18, 191, 106, -1, -1, -20, -26,
    -34, -3, 105, 59, 0, 0, -6, -8, -24, -8, 55, 30, 0, 0, -1, -2, -13, -7, 27, 15, 1530, 1120,
    1235, 627, 704, 249, 541, 164, 1222, 917, 1159, 617, 692, 250, 524, 159, 529, 447, 940, 571,
    653, 252, 477, 145, -86, -3, 619, 463, 586, 247, 408, 124, -352, -232, 279, 300, 492, 231,
    328, 100, -321, -242, 17, 128, 382, 201, 248, 75, -186, -154, -119, 1, 271, 160, 176, 53,
    -78, -70, -142, -58, 172, 116, 117, 35, -25, -24, -106, -63, 97, 76, 73, 22, -6, -6, -60,
    -44, 47, 44, 43, 13, -1, -1, -27, -23, 19, 23, 24, 7, 0, 0, -10, -10, 5, 10, 12, 4, 0, 0,
    -3, -3, 0, 4, 6, 2, 728, 424, 265, 94, 68, 15, 38, 7, 615, 370, 275, 103, 71, 16, 37, 6,
    339, 231, 291, 125, 76, 18, 33, 6, 49, 66, 282, 141, 82, 21, 28, 5, -126, -52, 229, 136, 84,
    24, 23, 4, -160, -92, 144, 106, 81, 25, 17, 3, -113, -75, 59, 63, 71, 24, 12, 2, -57, -41,
    0, 24, 57, 21, 8, 1, -21, -17, -24, 0, 41, 17, 5, 1, -6, -5, -25, -9, 27, 12, 3, 1, -1, -1,
    -16, -9, 16, 8, 2, 0, 0, 0, -8, -5, 8, 5, 1, 0, 0, 0, -3, -2, 4, 2, 0, 0, 222, 105, 28, 7,
    2, 0, 1, 0, 201, 99, 33, 9, 3, 0, 1, 0, 142, 79, 45, 14, 3, 1, 1, 0, 60, 43, 59, 20, 4, 1,
    1, 0, -11, 6, 65, 26, 5, 1, 1, 0, -45, -18, 60, 27, 6, 1, 0, 0, -44, -23, 44, 23, 6, 1, 0,
    0, -27, -16, 25, 16, 6, 1, 0, 0, -12, -8, 9, 9, 5, 1, 0, 0, -4, -3, 0, 3, 4, 1, 0, 0, -1,
    -1, -3, 0, 3, 1, 0, 0, 0, 0, -3, -1, 2, 1, 0, 0, 0, 0, -2, -1, 1, 0, 0, 0, 45, 17, 2, 0, 0,
    0, 0, 0, 44, 18, 2, 0, 0, 0, 0, 0, 39, 18, 4, 1, 0, 0, 0, 0, 27, 14, 6, 1, 0, 0, 0, 0, 9, 7,
    8, 2, 0, 0, 0, 0, -5, 0, 10, 3, 0, 0, 0, 0, -10, -4, 10, 3, 0, 0, 0, 0, -8, -4, 8, 3, 0, 0,
    0, 0, -5, -2, 5, 2, 0, 0, 0, 0, -2, -1, 3, 2, 0, 0, 0, 0, -1, 0, 1, 1, 0, 0, 0, 0, 0, 0, 0,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0
};

/* Code of every Mono8 value. */
static const int16_t tessary_features_codes[256] = {
    0, 253, 356, 498, 616, 722, 822, 918, 1007, 1093, 1174, 1252, 1328, 1400, 1471, 1539, 1605,
    1670, 1732, 1794, 1853, 1912, 1969, 2025, 2080, 2134, 2187, 2239, 2290, 2340, 2390, 2438,
    2486, 2533, 2580, 2626, 2671, 2716, 2760, 2804, 2847, 2890, 2932, 2973, 3014, 3055, 3095,
    3135, 3175, 3214, 3252, 3291, 3329, 3366, 3404, 3441, 3477, 3513, 3549, 3585, 3621, 3656,
    3691, 3725, 3759, 3794, 3827, 3861, 3894, 3927, 3960, 3993, 4025, 4057, 4089, 4121, 4153,
    4184, 4215, 4246, 4277, 4307, 4338, 4368, 4398, 4428, 4458, 4487, 4516, 4546, 4575, 4604,
    4632, 4661, 4689, 4718, 4746, 4774, 4802, 4829, 4857, 4884, 4912, 4939, 4966, 4993, 5020,
    5046, 5073, 5099, 5125, 5152, 5178, 5204, 5230, 5255, 5281, 5306, 5332, 5357, 5382, 5407,
    5432, 5457, 5482, 5507, 5531, 5556, 5580, 5605, 5629, 5653, 5677, 5701, 5725, 5749, 5772,
    5796, 5820, 5843, 5866, 5890, 5913, 5936, 5959, 5982, 6005, 6028, 6050, 6073, 6095, 6118,
    6140, 6163, 6185, 6207, 6229, 6251, 6273, 6295, 6317, 6339, 6361, 6382, 6404, 6426, 6447,
    6468, 6490, 6511, 6532, 6553, 6574, 6596, 6616, 6637, 6658, 6679, 6700, 6720, 6741, 6762,
    6782, 6803, 6823, 6843, 6864, 6884, 6904, 6924, 6944, 6964, 6984, 7004, 7024, 7044, 7064,
    7083, 7103, 7123, 7142, 7162, 7181, 7201, 7220, 7240, 7259, 7278, 7298, 7317, 7336, 7355,
    7373, 7392, 7411, 7429, 7448, 7466, 7485, 7504, 7523, 7542, 7561, 7580, 7600, 7619, 7638,
    7657, 7676, 7694, 7712, 7729, 7746, 7763, 7779, 7795, 7811, 7828, 7845, 7862, 7880, 7899,
    7918, 7937, 7957, 7978, 7999, 8021, 8042, 8064, 8085, 8106, 8127, 8149, 8170, 8191
};
#define tessary_features_FFT_COUNT 16 /* kernels by tile transforms */
#define tessary_features_FFT_SIZE 25
#define tessary_features_FFT_FIRST 0
#define tessary_features_FFT_LENGTH 64 /* rows of a block */
#define tessary_features_FFT_VALID 40 /* rows of its output */
#define tessary_features_FFT_BINS 66 /* real numbers of a spectrum */
#define tessary_features_FFT_ROW 160 /* floats of a row of a block */
#define tessary_features_FFT_SCRATCH (27584 * sizeof(float) + 64)

/* Spectra of the kernels' columns, two kernels together: by bin, column, kernel. */
static const float tessary_features_spectra[26400] = {
    -4.19095159e-09f, 0.0f, -4.7404319e-07f, 0.0f, -6.61239028e-08f, 0.0f, -3.32854688e-06f,
    0.0f, -8.22357833e-07f, 0.0f, -1.92606822e-05f, 0.0f, -7.95396045e-06f, 0.0f,
    -9.18558799e-05f, 0.0f, -5.92018478e-05f, 0.0f, -0.000361203216f, 0.0f, -0.000337777659f,
    0.0f, -0.00116978399f, 0.0f, -0.00147031946f, 0.0f, -0.00311026676f, 0.0f, -0.00484601734f,
    0.0f, -0.00674651191f, 0.0f, -0.0119414283f, 0.0f, -0.0117979851f, 0.0f, -0.0214844979f,
    0.0f, -0.0162516553f, 0.0f, -0.0267588831f, 0.0f, -0.0167241357f, 0.0f, -0.0194669738f,
    0.0f, -0.0108497385f, 0.0f, 0.0f, -0.0f, 0.0f, -0.0f, 0.0194669738f, -0.0f, 0.0108497385f,
    -0.0f, 0.0267588831f, -0.0f, 0.0167241357f, -0.0f, 0.0214844979f, -0.0f, 0.0162516553f,
    -0.0f, 0.0119414283f, -0.0f, 0.0117979851f, -0.0f, 0.00484601734f, -0.0f, 0.00674651191f,
    -0.0f, 0.00147031946f, -0.0f, 0.00311026676f, -0.0f, 0.000337777659f, -0.0f, 0.00116978399f,
    -0.0f, 5.92018478e-05f, -0.0f, 0.000361203216f, -0.0f, 7.95396045e-06f, -0.0f,
    9.18558799e-05f, -0.0f, 8.22357833e-07f, -0.0f, 1.92606822e-05f, -0.0f, 6.61239028e-08f,
    -0.0f, 3.32854688e-06f, -0.0f, 4.19095159e-09f, -0.0f, 4.7404319e-07f, -0.0f,
    -1.55276736e-09f, -3.74871201e-09f, 1.61016459e-07f, -4.27453358e-07f, -2.34923458e-08f,
    -5.67155389e-08f, 9.53964786e-07f, -3.05061326e-06f, -2.91700076e-07f, -7.04226238e-07f,
    4.38458392e-06f, -1.79119925e-05f, -2.82161477e-06f, -6.81198071e-06f, 1.49679881e-05f,
    -8.64553585e-05f, -2.10016569e-05f, -5.07024852e-05f, 3.35006625e-05f, -0.000342860643f,
    -0.000119826123f, -0.000289285847f, 2.00949889e-05f, -0.00111479731f, -0.000521593785f,
    -0.00125923881f, -0.000199029993f, -0.00295925932f, -0.00171911798f, -0.00415031798f,
    -0.00102490094f, -0.00636380725f, -0.00423620502f, -0.0102271037f, -0.00294785737f,
    -0.0109305717f, -0.00762159564f, -0.0184001587f, -0.00595810032f, -0.0145772276f,
    -0.00949267671f, -0.0229173489f, -0.00886396412f, -0.0140971504f, -0.00690588169f,
    -0.0166722741f, -0.00956489611f, -0.0076549123f, 0.0f, -0.0f, -0.00672185374f,
    0.0027842829f, 0.00690588169f, 0.0166722741f, -0.00135056279f, 0.0121762436f,
    0.00949267671f, 0.0229173489f, 0.00370042166f, 0.0162359606f, 0.00762159564f, 0.0184001587f,
    0.00609464338f, 0.0145206694f, 0.00423620502f, 0.0102271037f, 0.00564463157f, 0.0098135313f,
    0.00171911798f, 0.00415031798f, 0.00377517683f, 0.00522460556f, 0.000521593785f,
    0.00125923881f, 0.00195177679f, 0.00223324774f, 0.000119826123f, 0.000289285847f,
    0.000802490045f, 0.000774071435f, 2.10016569e-05f, 5.07024852e-05f, 0.000266127638f,
    0.000218750545f, 2.82161477e-06f, 6.81198071e-06f, 7.17171351e-05f, 5.05492062e-05f,
    2.91700076e-07f, 7.04226238e-07f, 1.57660597e-05f, 9.56532222e-06f, 2.34923458e-08f,
    5.67155389e-08f, 2.83166423e-06f, 1.48255435e-06f, 1.55276736e-09f, 3.74871201e-09f,
    4.16110993e-07f, 1.88399341e-07f, 2.59679989e-09f, -2.59679989e-09f, 3.04251728e-07f,
    2.72459715e-07f, 3.46275932e-08f, -3.46275932e-08f, 2.30942715e-06f, 1.63264303e-06f,
    4.286359e-07f, -4.286359e-07f, 1.42822391e-05f, 7.58128544e-06f, 4.14713759e-06f,
    -4.14713759e-06f, 7.17870644e-05f, 2.61299556e-05f, 3.08683157e-05f, -3.08683157e-05f,
    0.000292675744f, 5.91391763e-05f, 0.000176123562f, -0.000176123562f, 0.000964093371f,
    3.7943526e-05f, 0.000766652811f, -0.000766652811f, 0.00254857005f, -0.000337279664f,
    0.0025268069f, -0.0025268069f, 0.00534128072f, -0.00174591166f, 0.00622649072f,
    -0.00622649072f, 0.00866972841f, -0.00496710697f, 0.0112024322f, -0.0112024322f,
    0.0103397304f, -0.00982616935f, 0.0139525989f, -0.0139525989f, 0.00767887523f,
    -0.0141150756f, 0.0101504549f, -0.0101504549f, 0.000207628153f, -0.0143433623f, 0.0f, 0.0f,
    -0.00877481233f, -0.00877481233f, -0.0101504549f, 0.0101504549f, -0.0143433623f,
    0.000207628153f, -0.0139525989f, 0.0139525989f, -0.0141150756f, 0.00767887523f,
    -0.0112024322f, 0.0112024322f, -0.00982616935f, 0.0103397304f, -0.00622649072f,
    0.00622649072f, -0.00496710697f, 0.00866972841f, -0.0025268069f, 0.0025268069f,
    -0.00174591166f, 0.00534128072f, -0.000766652811f, 0.000766652811f, -0.000337279664f,
    0.00254857005f, -0.000176123562f, 0.000176123562f, 3.7943526e-05f, 0.000964093371f,
    -3.08683157e-05f, 3.08683157e-05f, 5.91391763e-05f, 0.000292675744f, -4.14713759e-06f,
    4.14713759e-06f, 2.61299556e-05f, 7.17870644e-05f, -4.286359e-07f, 4.286359e-07f,
    7.58128544e-06f, 1.42822391e-05f, -3.46275932e-08f, 3.46275932e-08f, 1.63264303e-06f,
    2.30942715e-06f, -2.59679989e-09f, 2.59679989e-09f, 2.72459715e-07f, 3.04251728e-07f,
    2.84413937e-09f, 1.17808108e-09f, -3.0473646e-07f, 1.46952374e-07f, 3.07335384e-08f,
    1.2730248e-08f, -1.86754426e-06f, 1.34399068e-06f, 3.80810263e-07f, 1.57736778e-07f,
    -8.84493875e-06f, 9.45239663e-06f, 3.6851925e-06f, 1.52645669e-06f, -3.10315554e-05f,
    5.18552515e-05f, 2.74298964e-05f, 1.13618353e-05f, -7.1593211e-05f, 0.000223328592f,
    0.0001565087f, 6.48280256e-05f, -5.05051867e-05f, 0.00075474038f, 0.000681271777f,
    0.000282191992f, 0.000383593579f, 0.00198599882f, 0.00224540173f, 0.000930075825f,
    0.00200354331f, 0.00398944551f, 0.00553305959f, 0.00229186821f, 0.00559733761f,
    0.0058339308f, 0.00995484181f, 0.00412343023f, 0.0106716957f, 0.00536507275f, 0.0123987272f,
    0.00513572106f, 0.0143879531f, 0.00075313315f, 0.00902002025f, 0.00373621471f,
    0.0129659055f, -0.00689128647f, 0.0f, -0.0f, 0.00545712048f, -0.0131746549f,
    -0.00902002025f, -0.00373621471f, -0.00429540407f, -0.0140411546f, -0.0123987272f,
    -0.00513572106f, -0.0107063642f, -0.00964127388f, -0.00995484181f, -0.00412343023f,
    -0.0113397073f, -0.00375234941f, -0.00553305959f, -0.00229186821f, -0.00808312744f,
    0.000167296646f, -0.00224540173f, -0.000930075825f, -0.00423768302f, 0.00140424503f,
    -0.000681271777f, -0.000282191992f, -0.00167555478f, 0.00113307161f, -0.0001565087f,
    -6.48280256e-05f, -0.000497969508f, 0.000569394615f, -2.74298964e-05f, -1.13618353e-05f,
    -0.000107293112f, 0.000208541212f, -3.6851925e-06f, -1.52645669e-06f, -1.47245755e-05f,
    5.86098213e-05f, -3.80810263e-07f, -1.57736778e-07f, -4.29537749e-07f, 1.29381697e-05f,
    -3.07335384e-08f, -1.2730248e-08f, 3.70208227e-07f, 2.27089799e-06f, -2.84413937e-09f,
    -1.17808108e-09f, 1.11570195e-07f, 3.19392228e-07f, -1.55096365e-25f, 2.34103736e-09f,
    -5.90060401e-09f, -2.59023096e-07f, -1.03397577e-24f, 1.89941876e-08f, -4.41452897e-07f,
    -1.65582549e-06f, -1.32348898e-23f, 2.39030641e-07f, -4.74175658e-06f, -8.12266262e-06f,
    -1.05879118e-22f, 2.31272179e-06f, -3.16216938e-05f, -2.93584617e-05f, -4.23516474e-22f,
    1.72123437e-05f, -0.000150668056f, -6.97110227e-05f, -5.08219768e-21f, 9.82117053e-05f,
    -0.000532545033f, -5.46668161e-05f, -2.71050543e-20f, 0.000427509658f, -0.00139915477f,
    0.000346847402f, -8.13151629e-20f, 0.00140903122f, -0.00265207794f, 0.0018345156f,
    -1.62630326e-19f, 0.00347209722f, -0.00326314662f, 0.0049962122f, -2.16840434e-19f,
    0.00624684757f, -0.00137962226f, 0.00902283471f, -3.25260652e-19f, 0.00778043037f,
    0.00386146223f, 0.0109910183f, -2.16840434e-19f, 0.00566022983f, 0.0101753324f,
    0.00783035252f, 0.0f, -0.0f, 0.0130705722f, 6.50521303e-19f, 2.16840434e-19f,
    -0.00566022983f, 0.0101753324f, -0.00783035252f, 3.25260652e-19f, -0.00778043037f,
    0.00386146223f, -0.0109910183f, 2.16840434e-19f, -0.00624684757f, -0.00137962226f,
    -0.00902283471f, 1.62630326e-19f, -0.00347209722f, -0.00326314662f, -0.0049962122f,
    8.13151629e-20f, -0.00140903122f, -0.00265207794f, -0.0018345156f, 2.71050543e-20f,
    -0.000427509658f, -0.00139915477f, -0.000346847402f, 5.08219768e-21f, -9.82117053e-05f,
    -0.000532545033f, 5.46668161e-05f, 4.23516474e-22f, -1.72123437e-05f, -0.000150668056f,
    6.97110227e-05f, 1.05879118e-22f, -2.31272179e-06f, -3.16216938e-05f, 2.93584617e-05f,
    1.32348898e-23f, -2.39030641e-07f, -4.74175658e-06f, 8.12266262e-06f, 1.03397577e-24f,
    -1.89941876e-08f, -4.41452897e-07f, 1.65582549e-06f, 1.55096365e-25f, -2.34103736e-09f,
    -5.90060401e-09f, 2.59023096e-07f, -1.42214018e-09f, 5.89069737e-10f, 1.64235445e-07f,
    8.11703629e-08f, -8.36816216e-09f, 3.46620643e-09f, 1.14665102e-06f, 1.74882629e-07f,
    -1.09787244e-07f, 4.54753675e-08f, 6.00915882e-06f, -1.21709854e-06f, -1.06088805e-06f,
    4.39434245e-07f, 2.28512872e-05f, -1.52532211e-05f, -7.8922003e-06f, 3.26905638e-06f,
    5.66132912e-05f, -8.83591929e-05f, -4.50317057e-05f, 1.86527432e-05f, 4.92524669e-05f,
    -0.000336660887f, -0.000196020512f, 8.11943537e-05f, -0.000263136899f, -0.000889781921f,
    -0.000646068424f, 0.000267610303f, -0.00141212903f, -0.00156909367f, -0.00159202446f,
    0.000659438141f, -0.00372107513f, -0.00144506583f, -0.00286430074f, 0.0011864322f,
    -0.006236271f, 0.00083462667f, -0.00356747792f, 0.00147769775f, -0.00646977499f,
    0.00531334849f, -0.00259532547f, 0.00107501901f, -0.00256334711f, 0.00932252593f, 0.0f,
    -0.0f, 0.00385515369f, 0.0093071647f, 0.00259532547f, -0.00107501901f, 0.00840458088f,
    0.00477946084f, 0.00356747792f, -0.00147769775f, 0.00833192654f, -0.00081771682f,
    0.00286430074f, -0.0011864322f, 0.00499987975f, -0.00381953921f, 0.00159202446f,
    -0.000659438141f, 0.00160938152f, -0.00365301338f, 0.000646068424f, -0.000267610303f,
    -0.000110990695f, -0.00210804283f, 0.000196020512f, -8.11943537e-05f, -0.000443104946f,
    -0.000815236708f, 4.50317057e-05f, -1.86527432e-05f, -0.000272881967f, -0.000203228454f,
    7.8922003e-06f, -3.26905638e-06f, -0.000102511025f, -2.24477426e-05f, 1.06088805e-06f,
    -4.39434245e-07f, -2.6943957e-05f, 5.37264441e-06f, 1.09787244e-07f, -4.54753675e-08f,
    -5.10973541e-06f, 3.38849827e-06f, 8.36816216e-09f, -3.46620643e-09f, -6.87143995e-07f,
    9.3446539e-07f, 1.42214018e-09f, -5.89069737e-10f, -5.87358784e-08f, 1.73528107e-07f,
    -5.3470911e-10f, -5.3470911e-10f, -1.02517951e-07f, 6.22952783e-08f, -2.65488986e-09f,
    -2.65488986e-09f, -4.21088345e-07f, 5.65284154e-07f, -3.65903432e-08f, -3.65903432e-08f,
    -6.48444825e-07f, 3.44448972e-06f, -3.52746952e-07f, -3.52746952e-07f, 4.87491525e-06f,
    1.44282667e-05f, -2.62099616e-06f, -2.62099616e-06f, 4.40924523e-05f, 3.82104154e-05f,
    -1.4953921e-05f, -1.4953921e-05f, 0.000189556638f, 3.65035594e-05f, -6.50933725e-05f,
    -6.50933725e-05f, 0.000509664067f, -0.000172155196f, -0.000214544722f, -0.000214544722f,
    0.000825323281f, -0.000934425159f, -0.000528674806f, -0.000528674806f, 0.000432709465f,
    -0.00236252882f, -0.000951167371f, -0.000951167371f, -0.00148974755f, -0.0035793893f,
    -0.00118467608f, -0.00118467608f, -0.00450914819f, -0.00282385619f, -0.000861847366f,
    -0.000861847366f, -0.00630555628f, 0.00062654668f, 0.0f, -0.0f, -0.0047336123f,
    0.0047336123f, 0.000861847366f, 0.000861847366f, -0.00062654668f, 0.00630555628f,
    0.00118467608f, 0.00118467608f, 0.00282385619f, 0.00450914819f, 0.000951167371f,
    0.000951167371f, 0.0035793893f, 0.00148974755f, 0.000528674806f, 0.000528674806f,
    0.00236252882f, -0.000432709465f, 0.000214544722f, 0.000214544722f, 0.000934425159f,
    -0.000825323281f, 6.50933725e-05f, 6.50933725e-05f, 0.000172155196f, -0.000509664067f,
    1.4953921e-05f, 1.4953921e-05f, -3.65035594e-05f, -0.000189556638f, 2.62099616e-06f,
    2.62099616e-06f, -3.82104154e-05f, -4.40924523e-05f, 3.52746952e-07f, 3.52746952e-07f,
    -1.44282667e-05f, -4.87491525e-06f, 3.65903432e-08f, 3.65903432e-08f, -3.44448972e-06f,
    6.48444825e-07f, 2.65488986e-09f, 2.65488986e-09f, -5.65284154e-07f, 4.21088345e-07f,
    5.3470911e-10f, 5.3470911e-10f, -6.22952783e-08f, 1.02517951e-07f, 2.595478e-11f,
    -6.26603769e-11f, 1.07264313e-08f, -7.3162127e-08f, 5.98176231e-10f, -1.44412526e-09f,
    -1.13611165e-07f, -3.61351397e-07f, 7.68532527e-09f, -1.8554017e-08f, -1.30638125e-06f,
    -1.03512934e-06f, 7.43454507e-08f, -1.79485795e-07f, -6.94389882e-06f, 2.8452132e-07f,
    5.50920504e-07f, -1.33003982e-06f, -2.07596004e-05f, 1.86253183e-05f, 3.1429513e-06f,
    -7.58775559e-06f, -2.14466763e-05f, 9.51878901e-05f, 1.36808831e-05f, -3.30285729e-05f,
    9.93282083e-05f, 0.000262581423f, 4.50920452e-05f, -0.00010886183f, 0.000537552114f,
    0.000384224346f, 0.000111114066f, -0.00026825309f, 0.00129016f, 7.17252897e-06f,
    0.000199910603f, -0.0004826269f, 0.00170149782f, -0.00127311458f, 0.000248988246f,
    -0.000601110747f, 0.000737559982f, -0.00290203257f, 0.000181138123f, -0.000437306124f,
    -0.00161114591f, -0.0032782678f, 0.0f, -0.0f, -0.00360066863f, -0.00149144582f,
    -0.000181138123f, 0.000437306124f, -0.00345733762f, 0.00117883331f, -0.000248988246f,
    0.000601110747f, -0.00153051328f, 0.00257358048f, -0.000199910603f, 0.0004826269f,
    0.000302912696f, 0.00210336875f, -0.000111114066f, 0.00026825309f, 0.000917352678f,
    0.000907209178f, -4.50920452e-05f, 0.00010886183f, 0.000651794369f, 0.000108419117f,
    -1.36808831e-05f, 3.30285729e-05f, 0.000255908759f, -0.000115437448f, -3.1429513e-06f,
    7.58775559e-06f, 5.21429138e-05f, -8.2473096e-05f, -5.50920504e-07f, 1.33003982e-06f,
    -1.50916537e-06f, -2.78493426e-05f, -7.43454507e-08f, 1.79485795e-07f, -4.70889063e-06f,
    -5.11126473e-06f, -7.68532527e-09f, 1.8554017e-08f, -1.65569804e-06f, -1.91804105e-07f,
    -5.98176231e-10f, 1.44412526e-09f, -3.35849251e-07f, 1.75178812e-07f, -2.595478e-11f,
    6.26603769e-11f, -4.41487025e-08f, 5.93181682e-08f, -4.65661287e-10f, 0.0f, 2.38907933e-08f,
    3.85522689e-08f, 6.58544497e-10f, 0.0f, 1.53034051e-07f, 1.05990907e-07f, 6.08669026e-09f,
    0.0f, 5.62797879e-07f, -8.61085638e-08f, 6.19911091e-08f, 0.0f, 3.90716423e-07f,
    -2.1488886e-06f, 4.56694664e-07f, 0.0f, -7.51176776e-06f, -8.5465872e-06f, 2.6065336e-06f,
    0.0f, -4.39186078e-05f, -9.35092066e-06f, 1.13459628e-05f, 0.0f, -0.000122240439f,
    5.17240878e-05f, 3.73966504e-05f, 0.0f, -0.000156295107f, 0.000271033612f, 9.21502651e-05f,
    0.0f, 0.000103609404f, 0.000608099625f, 0.000165790276f, 0.0f, 0.000808199053f,
    0.000655024603f, 0.000206492681f, 0.0f, 0.00150265743f, -8.54420869e-05f, 0.000150222826f,
    0.0f, 0.00129120832f, -0.00135282264f, 0.0f, 0.0f, 0.0f, -0.00200788165f, -0.000150222826f,
    0.0f, -0.00129120832f, -0.00135282264f, -0.000206492681f, 0.0f, -0.00150265743f,
    -8.54420869e-05f, -0.000165790276f, 0.0f, -0.000808199053f, 0.000655024603f,
    -9.21502651e-05f, 0.0f, -0.000103609404f, 0.000608099625f, -3.73966504e-05f, 0.0f,
    0.000156295107f, 0.000271033612f, -1.13459628e-05f, 0.0f, 0.000122240439f, 5.17240878e-05f,
    -2.6065336e-06f, 0.0f, 4.39186078e-05f, -9.35092066e-06f, -4.56694664e-07f, 0.0f,
    7.51176776e-06f, -8.5465872e-06f, -6.19911091e-08f, 0.0f, -3.90716423e-07f, -2.1488886e-06f,
    -6.08669026e-09f, 0.0f, -5.62797879e-07f, -8.61085638e-08f, -6.58544497e-10f, 0.0f,
    -1.53034051e-07f, 1.05990907e-07f, 4.65661287e-10f, 0.0f, -2.38907933e-08f, 3.85522689e-08f,
    -3.0882133e-10f, -7.45560613e-10f, -2.77892482e-08f, -1.50962176e-08f, 1.09759276e-11f,
    2.64982324e-11f, -1.11675199e-07f, -3.92371433e-08f, 7.89162277e-11f, 1.90520627e-10f,
    -2.18801404e-07f, -6.43240909e-08f, 2.92490299e-09f, 7.0613404e-09f, 2.7937304e-07f,
    -4.73159133e-07f, 2.07597264e-08f, 5.01184125e-08f, 2.70903433e-06f, -4.27146551e-06f,
    1.19462484e-07f, 2.88407961e-07f, 3.05436993e-06f, -2.03687741e-05f, 5.20411049e-07f,
    1.25638337e-06f, -2.45179162e-05f, -5.2582338e-05f, 1.71562158e-06f, 4.14187707e-06f,
    -0.000121352939f, -5.3902073e-05f, 4.22709172e-06f, 1.02051017e-05f, -0.000249520846f,
    9.38922167e-05f, 7.60448847e-06f, 1.83588581e-05f, -0.000194214997f, 0.000422519166f,
    9.47217359e-06f, 2.28678509e-05f, 0.000234189181f, 0.000643334584f, 6.89101626e-06f,
    1.66363843e-05f, 0.000776241533f, 0.000350360904f, 0.0f, -0.0f, 0.000843150134f,
    -0.000349244219f, -6.89101626e-06f, -1.66363843e-05f, 0.000301143067f, -0.000796628243f,
    -9.47217359e-06f, -2.28678509e-05f, -0.000289309508f, -0.000620503037f, -7.60448847e-06f,
    -1.83588581e-05f, -0.000436096918f, -0.000161435426f, -4.22709172e-06f, -1.02051017e-05f,
    -0.000242829716f, 0.000110046065f, -1.71562158e-06f, -4.14187707e-06f, -4.76949645e-05f,
    0.000123924008f, -5.20411049e-07f, -1.25638337e-06f, 1.9844545e-05f, 5.45181138e-05f,
    -1.19462484e-07f, -2.88407961e-07f, 1.65626643e-05f, 1.2243132e-05f, -2.07597264e-08f,
    -5.01184125e-08f, 4.93595871e-06f, 1.10480562e-06f, -2.92490299e-09f, -7.0613404e-09f,
    5.32120623e-07f, 1.3702747e-07f, -7.89162277e-11f, -1.90520627e-10f, -1.09231948e-07f,
    2.00199949e-07f, -1.09759276e-11f, -2.64982324e-11f, -5.12214378e-08f, 1.06711141e-07f,
    3.0882133e-10f, 7.45560613e-10f, -8.97532715e-09f, 3.03246033e-08f, 6.68426148e-10f,
    -6.68426148e-10f, 2.75300529e-08f, -5.53759989e-11f, 2.88322477e-10f, -2.88322477e-10f,
    1.165876e-07f, -5.7670424e-09f, 7.5037021e-10f, -7.5037021e-10f, 3.7314885e-07f,
    2.25306689e-08f, 2.99787883e-09f, -2.99787883e-09f, 1.08072879e-06f, 3.68317643e-07f,
    2.31357351e-08f, -2.31357351e-08f, 3.40024235e-06f, 1.60997558e-06f, 1.30105761e-07f,
    -1.30105761e-07f, 1.04062565e-05f, 1.95987604e-06f, 5.6450682e-07f, -5.6450682e-07f,
    2.19153717e-05f, -9.83858354e-06f, 1.85949227e-06f, -1.85949227e-06f, 1.50263768e-05f,
    -4.97462097e-05f, 4.58300565e-06f, -4.58300565e-06f, -5.84747504e-05f, -9.32751573e-05f,
    8.24621929e-06f, -8.24621929e-06f, -0.000191354004f, -4.23868078e-05f, 1.02693803e-05f,
    -1.02693803e-05f, -0.000233683924f, 0.000156066773f, 7.47073409e-06f, -7.47073409e-06f,
    -4.03590457e-05f, 0.000335127843f, 0.0f, -0.0f, 0.000252093741f, 0.000252093741f,
    -7.47073409e-06f, 7.47073409e-06f, 0.000335127843f, -4.03590457e-05f, -1.02693803e-05f,
    1.02693803e-05f, 0.000156066773f, -0.000233683924f, -8.24621929e-06f, 8.24621929e-06f,
    -4.23868078e-05f, -0.000191354004f, -4.58300565e-06f, 4.58300565e-06f, -9.32751573e-05f,
    -5.84747504e-05f, -1.85949227e-06f, 1.85949227e-06f, -4.97462097e-05f, 1.50263768e-05f,
    -5.6450682e-07f, 5.6450682e-07f, -9.83858354e-06f, 2.19153717e-05f, -1.30105761e-07f,
    1.30105761e-07f, 1.95987604e-06f, 1.04062565e-05f, -2.31357351e-08f, 2.31357351e-08f,
    1.60997558e-06f, 3.40024235e-06f, -2.99787883e-09f, 2.99787883e-09f, 3.68317643e-07f,
    1.08072879e-06f, -7.5037021e-10f, 7.5037021e-10f, 2.25306689e-08f, 3.7314885e-07f,
    -2.88322477e-10f, 2.88322477e-10f, -5.7670424e-09f, 1.165876e-07f, -6.68426148e-10f,
    6.68426148e-10f, -5.53759989e-11f, 2.75300529e-08f, 8.27769353e-10f, 3.42873313e-10f,
    -2.15765983e-08f, 1.54202446e-08f, 3.8166556e-10f, 1.58091054e-10f, -9.32936075e-08f,
    7.36874455e-08f, 2.92758456e-11f, 1.21264526e-11f, -3.39824226e-07f, 2.60363635e-07f,
    -3.56320351e-09f, -1.47592727e-09f, -1.01880823e-06f, 7.60285445e-07f, -2.60004906e-08f,
    -1.07697558e-08f, -2.36310279e-06f, 2.03327136e-06f, -1.49452987e-07f, -6.19054532e-08f,
    -3.15764009e-06f, 5.03399406e-06f, -6.54158782e-07f, -2.70961436e-07f, 2.08747747e-06f,
    8.94322329e-06f, -2.15770956e-06f, -8.93752542e-07f, 1.9640087e-05f, 3.77686956e-06f,
    -5.31525302e-06f, -2.20164998e-06f, 3.63631843e-05f, -2.78215248e-05f, -9.563003e-06f,
    -3.96112546e-06f, 1.14454715e-05f, -7.47434242e-05f, -1.19110027e-05f, -4.93369862e-06f,
    -6.44260363e-05f, -7.2183022e-05f, -8.66565915e-06f, -3.58943362e-06f, -0.000109391796f,
    1.75846726e-05f, 0.0f, -0.0f, -4.49407162e-05f, 0.000108496482f, 8.66565915e-06f,
    3.58943362e-06f, 6.49174399e-05f, 8.97859209e-05f, 1.19110027e-05f, 4.93369862e-06f,
    9.65971922e-05f, -5.48501339e-06f, 9.563003e-06f, 3.96112546e-06f, 4.47584134e-05f,
    -6.09447561e-05f, 5.31525302e-06f, 2.20164998e-06f, -6.03986518e-06f, -4.53854445e-05f,
    2.15770956e-06f, 8.93752542e-07f, -1.65582896e-05f, -1.12169892e-05f, 6.54158782e-07f,
    2.70961436e-07f, -7.79988295e-06f, 4.84774409e-06f, 1.49452987e-07f, 6.19054532e-08f,
    -1.32678258e-06f, 5.7923603e-06f, 2.60004906e-08f, 1.07697558e-08f, 2.33225975e-07f,
    3.1087061e-06f, 3.56320351e-09f, 1.47592727e-09f, 1.82803234e-07f, 1.25800921e-06f,
    -2.92758456e-11f, -1.21264526e-11f, 5.61871261e-08f, 4.24396916e-07f, -3.8166556e-10f,
    -1.58091054e-10f, 1.38636507e-08f, 1.1807343e-07f, -8.27769353e-10f, -3.42873313e-10f,
    4.35319913e-09f, 2.6160718e-08f, 1.55096365e-25f, 6.96911362e-10f, 6.38090736e-09f,
    -2.43188971e-08f, 1.24077092e-24f, 3.27863049e-11f, 2.45347476e-08f, -1.12719469e-07f,
    6.6174449e-24f, -7.88265675e-10f, 7.7391114e-08f, -4.1521551e-07f, 5.29395592e-23f,
    -9.02916852e-09f, 1.60270091e-07f, -1.19104448e-06f, 0.0f, -6.65271855e-08f,
    8.06801737e-08f, -2.577038e-06f, 5.08219768e-21f, -3.79682575e-07f, -8.00949465e-07f,
    -3.66053496e-06f, 2.71050543e-20f, -1.65705524e-06f, -2.67568294e-06f, -1.31026047e-06f,
    8.13151629e-20f, -5.46300998e-06f, -2.14304873e-06f, 7.46382557e-06f, 1.62630326e-19f,
    -1.34591555e-05f, 6.93804441e-06f, 1.65328001e-05f, 1.08420217e-19f, -2.4215813e-05f,
    1.93707874e-05f, 9.39584788e-06f, 1.08420217e-19f, -3.01595483e-05f, 1.23276586e-05f,
    -1.48042027e-05f, 3.25260652e-19f, -2.19414433e-05f, -2.00437407e-05f, -2.42709266e-05f,
    0.0f, -0.0f, -4.03672821e-05f, 6.50521303e-19f, -3.25260652e-19f, 2.19414433e-05f,
    -2.00437407e-05f, 2.42709266e-05f, -1.08420217e-19f, 3.01595483e-05f, 1.23276586e-05f,
    1.48042027e-05f, -1.08420217e-19f, 2.4215813e-05f, 1.93707874e-05f, -9.39584788e-06f,
    -1.62630326e-19f, 1.34591555e-05f, 6.93804441e-06f, -1.65328001e-05f, -8.13151629e-20f,
    5.46300998e-06f, -2.14304873e-06f, -7.46382557e-06f, -2.71050543e-20f, 1.65705524e-06f,
    -2.67568294e-06f, 1.31026047e-06f, -5.08219768e-21f, 3.79682575e-07f, -8.00949465e-07f,
    3.66053496e-06f, 0.0f, 6.65271855e-08f, 8.06801737e-08f, 2.577038e-06f, -5.29395592e-23f,
    9.02916852e-09f, 1.60270091e-07f, 1.19104448e-06f, -6.6174449e-24f, 7.88265675e-10f,
    7.7391114e-08f, 4.1521551e-07f, -1.24077092e-24f, -3.27863049e-11f, 2.45347476e-08f,
    1.12719469e-07f, -1.55096365e-25f, -6.96911362e-10f, 6.38090736e-09f, 2.43188971e-08f,
    -3.7128578e-10f, 1.53791604e-10f, 9.94559279e-09f, 2.11146585e-08f, 3.15046961e-10f,
    -1.30496725e-10f, 5.11537905e-08f, 9.66673639e-08f, 2.60575783e-10f, -1.0793403e-10f,
    2.02211623e-07f, 3.45845592e-07f, 2.03406914e-09f, -8.42539039e-10f, 6.15944145e-07f,
    9.30003353e-07f, 1.39702498e-08f, -5.78666715e-09f, 1.40650593e-06f, 1.80298275e-06f,
    8.04287978e-08f, -3.33146986e-08f, 2.19372691e-06f, 2.1879373e-06f, 3.53443198e-07f,
    -1.46400964e-07f, 1.55564123e-06f, 7.85172006e-07f, 1.16600654e-06f, -4.82975736e-07f,
    -1.9454933e-06f, -2.2307247e-06f, 2.87071134e-06f, -1.18908758e-06f, -6.19231105e-06f,
    -4.21882214e-06f, 5.1653692e-06f, -2.13956605e-06f, -5.41894315e-06f, -4.96189705e-06f,
    6.43218709e-06f, -2.66429902e-06f, 9.06241127e-08f, -9.71460304e-06f, 4.679624e-06f,
    -1.93836377e-06f, 3.05509786e-08f, -1.85477129e-05f, 0.0f, -0.0f, -8.61473563e-06f,
    -2.07978119e-05f, -4.679624e-06f, 1.93836377e-06f, -1.3136817e-05f, -1.30936114e-05f,
    -6.43218709e-06f, 2.66429902e-06f, -6.93334277e-06f, -6.80518087e-06f, -5.1653692e-06f,
    2.13956605e-06f, 3.23180387e-07f, -7.34036257e-06f, -2.87071134e-06f, 1.18908758e-06f,
    1.39546739e-06f, -7.36178299e-06f, -1.16600654e-06f, 4.82975736e-07f, -2.01689019e-07f,
    -2.95303198e-06f, -3.53443198e-07f, 1.46400964e-07f, -5.44804038e-07f, 1.65520498e-06f,
    -8.04287978e-08f, 3.33146986e-08f, -4.09398382e-09f, 3.09830443e-06f, -1.39702498e-08f,
    5.78666715e-09f, 2.80351372e-07f, 2.26945122e-06f, -2.03406914e-09f, 8.42539039e-10f,
    2.22073396e-07f, 1.09314999e-06f, -2.60575783e-10f, 1.0793403e-10f, 1.01564545e-07f,
    3.87534982e-07f, -3.15046961e-10f, 1.30496725e-10f, 3.21829532e-08f, 1.04525341e-07f,
    3.7128578e-10f, -1.53791604e-10f, 7.89772159e-09f, 2.19629133e-08f, -5.08743152e-11f,
    -5.08743152e-11f, -1.99768433e-08f, -9.44218836e-09f, 2.5940855e-10f, 2.5940855e-10f,
    -9.58258468e-08f, -3.85894907e-08f, -4.45548654e-10f, -4.45548654e-10f, -3.57583872e-07f,
    -1.25434667e-07f, -4.75142237e-09f, -4.75142237e-09f, -1.00714215e-06f, -2.99001698e-07f,
    -3.68062452e-08f, -3.68062452e-08f, -2.09240466e-06f, -4.9208694e-07f, -2.08188681e-07f,
    -2.08188681e-07f, -2.94521442e-06f, -4.64869771e-07f, -9.04760782e-07f, -9.04760782e-07f,
    -2.06810319e-06f, -5.98872196e-09f, -2.98112013e-06f, -2.98112013e-06f, 1.49161394e-06f,
    7.88422028e-07f, -7.34725882e-06f, -7.34725882e-06f, 6.42831628e-06f, 1.87105707e-06f,
    -1.32190753e-05f, -1.32190753e-05f, 1.04123483e-05f, 3.33466892e-06f, -1.64643188e-05f,
    -1.64643188e-05f, 1.25132092e-05f, 3.63524828e-06f, -1.19777678e-05f, -1.19777678e-05f,
    1.18353228e-05f, -9.28126909e-08f, 0.0f, -0.0f, 6.93201946e-06f, -6.93201946e-06f,
    1.19777678e-05f, 1.19777678e-05f, 9.28126909e-08f, -1.18353228e-05f, 1.64643188e-05f,
    1.64643188e-05f, -3.63524828e-06f, -1.25132092e-05f, 1.32190753e-05f, 1.32190753e-05f,
    -3.33466892e-06f, -1.04123483e-05f, 7.34725882e-06f, 7.34725882e-06f, -1.87105707e-06f,
    -6.42831628e-06f, 2.98112013e-06f, 2.98112013e-06f, -7.88422028e-07f, -1.49161394e-06f,
    9.04760782e-07f, 9.04760782e-07f, 5.98872196e-09f, 2.06810319e-06f, 2.08188681e-07f,
    2.08188681e-07f, 4.64869771e-07f, 2.94521442e-06f, 3.68062452e-08f, 3.68062452e-08f,
    4.9208694e-07f, 2.09240466e-06f, 4.75142237e-09f, 4.75142237e-09f, 2.99001698e-07f,
    1.00714215e-06f, 4.45548654e-10f, 4.45548654e-10f, 1.25434667e-07f, 3.57583872e-07f,
    -2.5940855e-10f, -2.5940855e-10f, 3.85894907e-08f, 9.58258468e-08f, 5.08743152e-11f,
    5.08743152e-11f, 9.44218836e-09f, 1.99768433e-08f, -8.93950747e-11f, 2.15818793e-10f,
    2.05637285e-08f, -5.77332493e-09f, -4.42320312e-11f, 1.06785567e-10f, 9.32151991e-08f,
    -3.10245767e-08f, 2.58773614e-10f, -6.24734764e-10f, 3.35643108e-07f, -1.29020208e-07f,
    2.13794316e-09f, -5.16145171e-09f, 9.17608588e-07f, -3.97783737e-07f, 1.68858278e-08f,
    -4.07659932e-08f, 1.84516318e-06f, -9.1162849e-07f, 9.4982255e-08f, -2.29307446e-07f,
    2.51775214e-06f, -1.45513945e-06f, 4.13297784e-07f, -9.9778913e-07f, 1.66165898e-06f,
    -1.36177289e-06f, 1.36168399e-06f, -3.28739588e-06f, -1.64248684e-06f, 2.80217307e-08f,
    3.35557706e-06f, -8.1010794e-06f, -6.55881013e-06f, 2.44064813e-06f, 6.03762601e-06f,
    -1.45761187e-05f, -1.0547531e-05f, 4.61669924e-06f, 7.51922926e-06f, -1.81530249e-05f,
    -1.12065618e-05f, 5.16948512e-06f, 5.47031686e-06f, -1.32065134e-05f, -8.4888552e-06f,
    2.9798282e-06f, 0.0f, -0.0f, -5.15827378e-06f, -2.13662679e-06f, -5.47031686e-06f,
    1.32065134e-05f, -3.8954704e-06f, -8.10958409e-06f, -7.51922926e-06f, 1.81530249e-05f,
    -4.26885754e-06f, -1.15796138e-05f, -6.03762601e-06f, 1.45761187e-05f, -4.19373146e-06f,
    -1.07227306e-05f, -3.35557706e-06f, 8.1010794e-06f, -2.91198035e-06f, -6.363578e-06f,
    -1.36168399e-06f, 3.28739588e-06f, -1.14159923e-06f, -1.18122796e-06f, -4.13297784e-07f,
    9.9778913e-07f, 2.12051461e-07f, 2.13788917e-06f, -9.4982255e-08f, 2.29307446e-07f,
    7.51380639e-07f, 2.8092586e-06f, -1.68858278e-08f, 4.07659932e-08f, 6.60108697e-07f,
    1.94934614e-06f, -2.13794316e-09f, 5.16145171e-09f, 3.67571687e-07f, 9.30122837e-07f,
    -2.58773614e-10f, 6.24734764e-10f, 1.46104455e-07f, 3.28566585e-07f, 4.42320312e-11f,
    -1.06785567e-10f, 4.39754118e-08f, 8.78507862e-08f, 8.93950747e-11f, -2.15818793e-10f,
    1.0458395e-08f, 1.86231084e-08f, -4.65661287e-10f, 0.0f, -1.07102096e-08f, 1.72294676e-08f,
    0.0f, -0.0f, -4.79631126e-08f, 8.05594027e-08f, 0.0f, -0.0f, -1.63912773e-07f,
    3.00817192e-07f, -3.25962901e-09f, 0.0f, -4.25148755e-07f, 8.57748091e-07f,
    -2.18860805e-08f, 0.0f, -7.96746463e-07f, 1.81095675e-06f, -1.27591193e-07f, 0.0f,
    -9.71835107e-07f, 2.64449045e-06f, -5.54602593e-07f, 0.0f, -4.02331352e-07f,
    2.06800178e-06f, -1.82865188e-06f, 0.0f, 1.18790194e-06f, -1.05192885e-06f,
    -4.50666994e-06f, 0.0f, 3.21026891e-06f, -6.06430694e-06f, -8.10716301e-06f, 0.0f,
    4.40748408e-06f, -1.03786588e-05f, -1.0099262e-05f, 0.0f, 3.95579264e-06f, -1.17653981e-05f,
    -7.34673813e-06f, 0.0f, 2.20257789e-06f, -1.07199885e-05f, 0.0f, -0.0f, 0.0f,
    -9.86456871e-06f, 7.34673813e-06f, -0.0f, -2.20257789e-06f, -1.07199885e-05f,
    1.0099262e-05f, -0.0f, -3.95579264e-06f, -1.17653981e-05f, 8.10716301e-06f, -0.0f,
    -4.40748408e-06f, -1.03786588e-05f, 4.50666994e-06f, -0.0f, -3.21026891e-06f,
    -6.06430694e-06f, 1.82865188e-06f, -0.0f, -1.18790194e-06f, -1.05192885e-06f,
    5.54602593e-07f, -0.0f, 4.02331352e-07f, 2.06800178e-06f, 1.27591193e-07f, -0.0f,
    9.71835107e-07f, 2.64449045e-06f, 2.18860805e-08f, -0.0f, 7.96746463e-07f, 1.81095675e-06f,
    3.25962901e-09f, -0.0f, 4.25148755e-07f, 8.57748091e-07f, 0.0f, -0.0f, 1.63912773e-07f,
    3.00817192e-07f, 0.0f, -0.0f, 4.79631126e-08f, 8.05594027e-08f, 4.65661287e-10f, -0.0f,
    1.07102096e-08f, 1.72294676e-08f, -2.2644403e-10f, -5.46684253e-10f, -3.17397464e-09f,
    -1.85143438e-08f, -1.31679084e-10f, -3.17901427e-10f, -1.57369069e-08f, -8.78493438e-08f,
    -8.07196393e-11f, -1.9487445e-10f, -6.78765275e-08f, -3.21361568e-07f, -2.82466006e-09f,
    -6.81933265e-09f, -2.23120153e-07f, -8.92484934e-07f, -2.04012025e-08f, -4.92528613e-08f,
    -5.40627752e-07f, -1.82891972e-06f, -1.16749092e-07f, -2.8185724e-07f, -9.24099595e-07f,
    -2.56501312e-06f, -5.07678124e-07f, -1.22564336e-06f, -9.75075864e-07f, -1.80763641e-06f,
    -1.67314795e-06f, -4.03933655e-06f, -1.93079273e-07f, 1.4559439e-06f, -4.12327154e-06f,
    -9.95445862e-06f, 1.40749694e-06f, 6.33281707e-06f, -7.41835584e-06f, -1.7909495e-05f,
    2.96419148e-06f, 9.9830022e-06f, -9.23968764e-06f, -2.23065781e-05f, 3.36529456e-06f,
    9.91709476e-06f, -6.72158421e-06f, -1.62273391e-05f, 2.18563218e-06f, 6.01706233e-06f, 0.0f,
    -0.0f, -1.1997875e-07f, 4.96968227e-08f, 6.72158421e-06f, 1.62273391e-05f, -2.70923033e-06f,
    -5.80018104e-06f, 9.23968764e-06f, 2.23065781e-05f, -4.63282231e-06f, -9.39206711e-06f,
    7.41835584e-06f, 1.7909495e-05f, -4.96304847e-06f, -9.15504825e-06f, 4.12327154e-06f,
    9.95445862e-06f, -3.48272715e-06f, -5.47322861e-06f, 1.67314795e-06f, 4.03933655e-06f,
    -1.16603553e-06f, -8.92980154e-07f, 5.07678124e-07f, 1.22564336e-06f, 5.88709213e-07f,
    1.96767473e-06f, 1.16749092e-07f, 2.8185724e-07f, 1.16030105e-06f, 2.46717514e-06f,
    2.04012025e-08f, 4.92528613e-08f, 9.10960011e-07f, 1.67552309e-06f, 2.82466006e-09f,
    6.81933265e-09f, 4.73312355e-07f, 7.88851935e-07f, 8.07196393e-11f, 1.9487445e-10f,
    1.79240999e-07f, 2.75232907e-07f, 1.31679084e-10f, 3.17901427e-10f, 5.09911935e-08f,
    7.32465395e-08f, 2.2644403e-10f, 5.46684253e-10f, 1.08472786e-08f, 1.53359565e-08f,
    4.23909824e-10f, -4.23909824e-10f, 1.33868125e-08f, 1.14698455e-08f, 7.24026117e-10f,
    -7.24026117e-10f, 6.61166126e-08f, 5.40005303e-08f, -3.84853899e-10f, 3.84853899e-10f,
    2.51569901e-07f, 1.9158739e-07f, 1.13278553e-09f, -1.13278553e-09f, 7.23231437e-07f,
    5.13462055e-07f, 7.74307729e-09f, -7.74307729e-09f, 1.54233828e-06f, 1.00720229e-06f,
    4.39970229e-08f, -4.39970229e-08f, 2.28648923e-06f, 1.32354842e-06f, 1.90343741e-07f,
    -1.90343741e-07f, 1.85161082e-06f, 7.57447708e-07f, 6.26904637e-07f, -6.26904637e-07f,
    -7.70525617e-07f, -1.14657576e-06f, 1.54561826e-06f, -1.54561826e-06f, -5.04658783e-06f,
    -3.80133133e-06f, 2.78134257e-06f, -2.78134257e-06f, -8.70044096e-06f, -5.80220103e-06f,
    3.46328238e-06f, -3.46328238e-06f, -9.72881753e-06f, -6.34330581e-06f, 2.51882602e-06f,
    -2.51882602e-06f, -8.40271514e-06f, -6.16659827e-06f, 0.0f, -0.0f, -6.72698661e-06f,
    -6.72698661e-06f, -2.51882602e-06f, 2.51882602e-06f, -6.16659827e-06f, -8.40271514e-06f,
    -3.46328238e-06f, 3.46328238e-06f, -6.34330581e-06f, -9.72881753e-06f, -2.78134257e-06f,
    2.78134257e-06f, -5.80220103e-06f, -8.70044096e-06f, -1.54561826e-06f, 1.54561826e-06f,
    -3.80133133e-06f, -5.04658783e-06f, -6.26904637e-07f, 6.26904637e-07f, -1.14657576e-06f,
    -7.70525617e-07f, -1.90343741e-07f, 1.90343741e-07f, 7.57447708e-07f, 1.85161082e-06f,
    -4.39970229e-08f, 4.39970229e-08f, 1.32354842e-06f, 2.28648923e-06f, -7.74307729e-09f,
    7.74307729e-09f, 1.00720229e-06f, 1.54233828e-06f, -1.13278553e-09f, 1.13278553e-09f,
    5.13462055e-07f, 7.23231437e-07f, 3.84853899e-10f, -3.84853899e-10f, 1.9158739e-07f,
    2.51569901e-07f, -7.24026117e-10f, 7.24026117e-10f, 5.40005303e-08f, 6.61166126e-08f,
    -4.23909824e-10f, 4.23909824e-10f, 1.14698455e-08f, 1.33868125e-08f, 4.59417587e-10f,
    1.90296987e-10f, -1.71970704e-08f, -2.41871578e-10f, 1.42050693e-09f, 5.88393223e-10f,
    -8.2627345e-08f, 2.1320925e-09f, -1.31722411e-09f, -5.45612056e-10f, -3.0433884e-07f,
    1.92228935e-08f, -5.2560809e-09f, -2.17714002e-09f, -8.53398376e-07f, 8.01713469e-08f,
    -4.01318232e-08f, -1.66231455e-08f, -1.76997889e-06f, 2.28347034e-07f, -2.29329643e-07f,
    -9.49914494e-08f, -2.52565701e-06f, 4.53546733e-07f, -1.00013449e-06f, -4.14269266e-07f,
    -1.8676493e-06f, 5.79068853e-07f, -3.29605405e-06f, -1.36527024e-06f, 1.24038593e-06f,
    3.13412642e-07f, -8.12064718e-06f, -3.36368225e-06f, 6.01444162e-06f, -4.62034109e-07f,
    -1.46094808e-05f, -6.05144487e-06f, 9.7595148e-06f, -1.47463504e-06f, -1.81974283e-05f,
    -7.53762197e-06f, 1.00905581e-05f, -2.40156942e-06f, -1.32397172e-05f, -5.4840707e-06f,
    6.94590517e-06f, -3.42116186e-06f, 0.0f, -0.0f, 2.10630628e-06f, -5.0850731e-06f,
    1.32397172e-05f, 5.4840707e-06f, -2.49236973e-06f, -7.33062325e-06f, 1.81974283e-05f,
    7.53762197e-06f, -5.43693659e-06f, -8.83326811e-06f, 1.46094808e-05f, 6.05144487e-06f,
    -5.85829457e-06f, -7.94374319e-06f, 8.12064718e-06f, 3.36368225e-06f, -3.92614493e-06f,
    -4.57956003e-06f, 3.29605405e-06f, 1.36527024e-06f, -1.09870143e-06f, -6.5546908e-07f,
    1.00013449e-06f, 4.14269266e-07f, 9.11163966e-07f, 1.73009107e-06f, 2.29329643e-07f,
    9.49914494e-08f, 1.46520324e-06f, 2.10661528e-06f, 4.01318232e-08f, 1.66231455e-08f,
    1.09009829e-06f, 1.41302974e-06f, 5.2560809e-09f, 2.17714002e-09f, 5.46754052e-07f,
    6.6013348e-07f, 1.31722411e-09f, 5.45612056e-10f, 2.01607421e-07f, 2.287927e-07f,
    -1.42050693e-09f, -5.88393223e-10f, 5.69187364e-08f, 5.99339742e-08f, -4.59417587e-10f,
    -1.90296987e-10f, 1.23311947e-08f, 1.19891368e-08f, -5.16987883e-26f, 3.11144915e-10f,
    1.28572877e-08f, -1.10477512e-08f, -4.13590306e-25f, 1.443478e-09f, 5.90796425e-08f,
    -5.45484689e-08f, 6.6174449e-24f, -1.43407652e-09f, 2.10312066e-07f, -2.07056274e-07f,
    5.29395592e-23f, -4.61962957e-09f, 5.75172464e-07f, -5.99083535e-07f, 0.0f,
    -3.63261883e-08f, 1.15972853e-06f, -1.28870442e-06f, -1.69406589e-21f, -2.07905444e-07f,
    1.5868585e-06f, -1.9290062e-06f, 0.0f, -9.07396554e-07f, 1.04164508e-06f, -1.60492277e-06f,
    -2.71050543e-20f, -2.98903592e-06f, -1.07612072e-06f, 5.49792503e-07f, -5.42101086e-20f,
    -7.36420861e-06f, -4.17277079e-06f, 4.09211907e-06f, 1.08420217e-19f, -1.32488603e-05f,
    -6.57929922e-06f, 7.01554472e-06f, 1.08420217e-19f, -1.65017482e-05f, -7.11289294e-06f,
    7.29462954e-06f, -1.08420217e-19f, -1.20061904e-05f, -6.31863304e-06f, 4.54942301e-06f,
    0.0f, -0.0f, -5.77810442e-06f, 2.16840434e-19f, 1.08420217e-19f, 1.20061904e-05f,
    -6.31863304e-06f, -4.54942301e-06f, -1.08420217e-19f, 1.65017482e-05f, -7.11289294e-06f,
    -7.29462954e-06f, -1.08420217e-19f, 1.32488603e-05f, -6.57929922e-06f, -7.01554472e-06f,
    5.42101086e-20f, 7.36420861e-06f, -4.17277079e-06f, -4.09211907e-06f, 2.71050543e-20f,
    2.98903592e-06f, -1.07612072e-06f, -5.49792503e-07f, 0.0f, 9.07396554e-07f, 1.04164508e-06f,
    1.60492277e-06f, 1.69406589e-21f, 2.07905444e-07f, 1.5868585e-06f, 1.9290062e-06f, 0.0f,
    3.63261883e-08f, 1.15972853e-06f, 1.28870442e-06f, -5.29395592e-23f, 4.61962957e-09f,
    5.75172464e-07f, 5.99083535e-07f, -6.6174449e-24f, 1.43407652e-09f, 2.10312066e-07f,
    2.07056274e-07f, 4.13590306e-25f, -1.443478e-09f, 5.90796425e-08f, 5.45484689e-08f,
    5.16987883e-26f, -3.11144915e-10f, 1.28572877e-08f, 1.10477512e-08f, -7.35962888e-11f,
    3.04845801e-11f, -2.08376538e-09f, 1.63081513e-08f, -6.97665037e-10f, 2.8898231e-10f,
    -7.95625166e-09f, 7.77017917e-08f, 6.50203724e-10f, -2.69323203e-10f, -2.19890346e-08f,
    2.85790151e-07f, -2.7509619e-09f, 1.13948573e-09f, -4.15743138e-08f, 8.06610274e-07f,
    -1.79995681e-08f, 7.45566542e-09f, -3.65570507e-08f, 1.68625809e-06f, -1.00830576e-07f,
    4.17653929e-08f, 4.35758842e-08f, 2.43648583e-06f, -4.368855e-07f, 1.80963895e-07f,
    2.22244807e-07f, 1.85868532e-06f, -1.44153955e-06f, 5.9710527e-07f, 3.95091519e-07f,
    -1.07361882e-06f, -3.55192265e-06f, 1.47125456e-06f, 3.81721605e-07f, -5.69812755e-06f,
    -6.39088285e-06f, 2.64719029e-06f, 6.95589222e-08f, -9.56628628e-06f, -7.96052882e-06f,
    3.29735917e-06f, -5.58251202e-07f, -1.06610132e-05f, -5.79043808e-06f, 2.39847805e-06f,
    -1.61819389e-06f, -9.43462874e-06f, 0.0f, -0.0f, -3.33378625e-06f, -8.0484715e-06f,
    5.79043808e-06f, -2.39847805e-06f, -5.52705387e-06f, -7.81552535e-06f, 7.96052882e-06f,
    -3.29735917e-06f, -7.14373164e-06f, -7.9332176e-06f, 6.39088285e-06f, -2.64719029e-06f,
    -6.81357142e-06f, -6.71520002e-06f, 3.55192265e-06f, -1.47125456e-06f, -4.29910233e-06f,
    -3.75926652e-06f, 1.44153955e-06f, -5.9710527e-07f, -1.03853506e-06f, -4.79791197e-07f,
    4.368855e-07f, -1.80963895e-07f, 1.15713817e-06f, 1.47143976e-06f, 1.00830576e-07f,
    -4.17653929e-08f, 1.69204282e-06f, 1.75366836e-06f, 1.79995681e-08f, -7.45566542e-09f,
    1.21821427e-06f, 1.16651472e-06f, 2.7509619e-09f, -1.13948573e-09f, 5.99757072e-07f,
    5.40962105e-07f, -6.50203724e-10f, 2.69323203e-10f, 2.17632746e-07f, 1.86535544e-07f,
    6.97665037e-10f, -2.8898231e-10f, 6.05693842e-08f, 4.93175456e-08f, 7.35962888e-11f,
    -3.04845801e-11f, 1.30050495e-08f, 1.00581605e-08f, 1.08380069e-10f, 1.08380069e-10f,
    -8.89047147e-09f, -1.31558719e-08f, 5.49689877e-11f, 5.49689877e-11f, -4.41924257e-08f,
    -6.17996534e-08f, 1.38309766e-10f, 1.38309766e-10f, -1.6673161e-07f, -2.23896876e-07f,
    -4.70556039e-09f, -4.70556039e-09f, -4.85380951e-07f, -6.20033006e-07f, -3.32868488e-08f,
    -3.32868488e-08f, -1.04763171e-06f, -1.26968007e-06f, -1.8742756e-07f, -1.8742756e-07f,
    -1.58269779e-06f, -1.78240771e-06f, -8.15234444e-07f, -8.15234444e-07f, -1.33976027e-06f,
    -1.25945326e-06f, -2.68706026e-06f, -2.68706026e-06f, 3.94565689e-07f, 1.00162458e-06f,
    -6.61940476e-06f, -6.61940476e-06f, 3.28883198e-06f, 4.38637198e-06f, -1.19101933e-05f,
    -1.19101933e-05f, 5.70854945e-06f, 6.9364869e-06f, -1.48345471e-05f, -1.48345471e-05f,
    5.96656173e-06f, 6.92795766e-06f, -1.07917722e-05f, -1.07917722e-05f, 3.68426709e-06f,
    4.26917359e-06f, 0.0f, -0.0f, -2.07412242e-07f, 2.07412242e-07f, 1.07917722e-05f,
    1.07917722e-05f, -4.26917359e-06f, -3.68426709e-06f, 1.48345471e-05f, 1.48345471e-05f,
    -6.92795766e-06f, -5.96656173e-06f, 1.19101933e-05f, 1.19101933e-05f, -6.9364869e-06f,
    -5.70854945e-06f, 6.61940476e-06f, 6.61940476e-06f, -4.38637198e-06f, -3.28883198e-06f,
    2.68706026e-06f, 2.68706026e-06f, -1.00162458e-06f, -3.94565689e-07f, 8.15234444e-07f,
    8.15234444e-07f, 1.25945326e-06f, 1.33976027e-06f, 1.8742756e-07f, 1.8742756e-07f,
    1.78240771e-06f, 1.58269779e-06f, 3.32868488e-08f, 3.32868488e-08f, 1.26968007e-06f,
    1.04763171e-06f, 4.70556039e-09f, 4.70556039e-09f, 6.20033006e-07f, 4.85380951e-07f,
    -1.38309766e-10f, -1.38309766e-10f, 2.23896876e-07f, 1.6673161e-07f, -5.49689877e-11f,
    -5.49689877e-11f, 6.17996534e-08f, 4.41924257e-08f, -1.08380069e-10f, -1.08380069e-10f,
    1.31558719e-08f, 8.89047147e-09f, -1.32382522e-10f, 3.1959968e-10f, 1.50225041e-08f,
    3.98215549e-09f, -2.21541299e-10f, 5.34847999e-10f, 7.21280315e-08f, 1.66370295e-08f,
    -1.27570732e-10f, 3.07982972e-10f, 2.6710407e-07f, 5.76751482e-08f, 6.21314333e-10f,
    -1.49998547e-09f, 7.55323867e-07f, 1.45757099e-07f, 4.14167101e-09f, -9.99887817e-09f,
    1.58892874e-06f, 2.68617185e-07f, 2.2563647e-08f, -5.4473464e-08f, 2.31390413e-06f,
    3.13953649e-07f, 9.87617526e-08f, -2.38431966e-07f, 1.80303596e-06f, 9.83634223e-08f,
    3.24957341e-07f, -7.8451643e-07f, -9.37104346e-07f, -4.57027056e-07f, 7.99107056e-07f,
    -1.92921516e-06f, -5.31066507e-06f, -1.14429497e-06f, 1.43850127e-06f, -3.47284913e-06f,
    -9.01673229e-06f, -1.62380263e-06f, 1.79150504e-06f, -4.32507568e-06f, -1.01255237e-05f,
    -1.84517387e-06f, 1.30324577e-06f, -3.14631347e-06f, -9.05878096e-06f, -2.23551683e-06f,
    0.0f, -0.0f, -7.90914874e-06f, -3.27607677e-06f, -1.30324577e-06f, 3.14631347e-06f,
    -7.9862748e-06f, -4.82477662e-06f, -1.79150504e-06f, 4.32507568e-06f, -8.46456078e-06f,
    -5.85509133e-06f, -1.43850127e-06f, 3.47284913e-06f, -7.5239941e-06f, -5.22759046e-06f,
    -7.99107056e-07f, 1.92921516e-06f, -4.564346e-06f, -2.94606843e-06f, -3.24957341e-07f,
    7.8451643e-07f, -9.85799829e-07f, -3.39465913e-07f, -9.87617526e-08f, 2.38431966e-07f,
    1.34449238e-06f, 1.2053855e-06f, -2.2563647e-08f, 5.4473464e-08f, 1.85817601e-06f,
    1.41417854e-06f, -4.14167101e-09f, 9.99887817e-09f, 1.31348327e-06f, 9.33601257e-07f,
    -6.21314333e-10f, 1.49998547e-09f, 6.3716044e-07f, 4.31028781e-07f, 1.27570732e-10f,
    -3.07982972e-10f, 2.2965358e-07f, 1.48088603e-07f, 2.21541299e-10f, -5.34847999e-10f,
    6.27663752e-08f, 3.92380635e-08f, 1.32382522e-10f, -3.1959968e-10f, 1.34383242e-08f,
    7.8067055e-09f, -4.65661287e-10f, 0.0f, -1.36462441e-08f, 6.88730184e-09f, -6.58544497e-10f,
    0.0f, -6.36270912e-08f, 3.4279072e-08f, -4.98754815e-10f, 0.0f, -2.34040996e-07f,
    1.30889589e-07f, -5.1804312e-09f, 0.0f, -6.52418066e-07f, 3.78720927e-07f, -3.85308176e-08f,
    0.0f, -1.34976665e-06f, 8.22518302e-07f, -2.18622432e-07f, 0.0f, -1.92388325e-06f,
    1.24753035e-06f, -9.47746173e-07f, 0.0f, -1.42057161e-06f, 1.0694514e-06f, -3.12491056e-06f,
    0.0f, 9.44910141e-07f, -2.89513082e-07f, -7.70352199e-06f, 0.0f, 4.57023452e-06f,
    -2.6067878e-06f, -1.38580344e-05f, 0.0f, 7.36942866e-06f, -4.70662326e-06f,
    -1.72609798e-05f, 0.0f, 7.43085457e-06f, -5.52529855e-06f, -1.25575198e-05f, 0.0f,
    4.55659165e-06f, -5.23514245e-06f, 0.0f, -0.0f, 0.0f, -4.93077732e-06f, 1.25575198e-05f,
    -0.0f, -4.55659165e-06f, -5.23514245e-06f, 1.72609798e-05f, -0.0f, -7.43085457e-06f,
    -5.52529855e-06f, 1.38580344e-05f, -0.0f, -7.36942866e-06f, -4.70662326e-06f,
    7.70352199e-06f, -0.0f, -4.57023452e-06f, -2.6067878e-06f, 3.12491056e-06f, -0.0f,
    -9.44910141e-07f, -2.89513082e-07f, 9.47746173e-07f, -0.0f, 1.42057161e-06f, 1.0694514e-06f,
    2.18622432e-07f, -0.0f, 1.92388325e-06f, 1.24753035e-06f, 3.85308176e-08f, -0.0f,
    1.34976665e-06f, 8.22518302e-07f, 5.1804312e-09f, -0.0f, 6.52418066e-07f, 3.78720927e-07f,
    4.98754815e-10f, -0.0f, 2.34040996e-07f, 1.30889589e-07f, 6.58544497e-10f, -0.0f,
    6.36270912e-08f, 3.4279072e-08f, 4.65661287e-10f, -0.0f, 1.36462441e-08f, 6.88730184e-09f,
    -1.89036509e-10f, -4.56374522e-10f, 5.52336266e-09f, -1.39025893e-08f, -2.4605129e-10f,
    -5.94020388e-10f, 2.47744314e-08f, -6.6648397e-08f, -9.55184803e-12f, -2.30602013e-11f,
    8.70000179e-08f, -2.47794873e-07f, -1.82789128e-09f, -4.41291981e-09f, 2.37670406e-07f,
    -7.02577609e-07f, -1.34338602e-08f, -3.2432208e-08f, 4.71106688e-07f, -1.48052322e-06f,
    -7.42335118e-08f, -1.79215547e-07f, 6.32243598e-07f, -2.1674266e-06f, -3.2102156e-07f,
    -7.75014598e-07f, 3.8705096e-07f, -1.71103659e-06f, -1.05779372e-06f, -2.55373993e-06f,
    -4.94494202e-07f, 8.1950725e-07f, -2.60660022e-06f, -6.29288934e-06f, -1.76414449e-06f,
    4.86103045e-06f, -4.68962025e-06f, -1.13217457e-05f, -2.79617166e-06f, 8.16055217e-06f,
    -5.8409546e-06f, -1.41013115e-05f, -3.27474163e-06f, 8.60254659e-06f, -4.249418e-06f,
    -1.02590029e-05f, -3.69480335e-06f, 6.03923672e-06f, 0.0f, -0.0f, -4.8820275e-06f,
    2.0222019e-06f, 4.249418e-06f, 1.02590029e-05f, -6.88300588e-06f, -1.65776476e-06f,
    5.8409546e-06f, 1.41013115e-05f, -8.39851054e-06f, -3.76732692e-06f, 4.68962025e-06f,
    1.13217457e-05f, -7.74757336e-06f, -3.79318953e-06f, 2.60660022e-06f, 6.29288934e-06f,
    -4.68470625e-06f, -2.18982905e-06f, 1.05779372e-06f, 2.55373993e-06f, -9.29139389e-07f,
    -2.29818937e-07f, 3.2102156e-07f, 7.75014598e-07f, 1.48357196e-06f, 9.36199228e-07f,
    7.42335118e-08f, 1.79215547e-07f, 1.97966574e-06f, 1.08553832e-06f, 1.34338602e-08f,
    3.2432208e-08f, 1.38001076e-06f, 7.13765303e-07f, 1.82789128e-09f, 4.41291981e-09f,
    6.64855747e-07f, 3.28739048e-07f, 9.55184803e-12f, 2.30602013e-11f, 2.3673573e-07f,
    1.1369913e-07f, 2.4605129e-10f, 5.94020388e-10f, 6.46456968e-08f, 2.96093621e-08f,
    1.89036509e-10f, 4.56374522e-10f, 1.37362219e-08f, 5.9250076e-09f, 3.03459036e-10f,
    -3.03459036e-10f, 4.8851474e-09f, 1.39463063e-08f, 6.36158515e-10f, -6.36158515e-10f,
    2.55239101e-08f, 6.53205419e-08f, -5.282631e-10f, 5.282631e-10f, 9.59585265e-08f,
    2.39334042e-07f, -1.36885181e-09f, 1.36885181e-09f, 2.79627898e-07f, 6.74629462e-07f,
    -1.00150155e-08f, 1.00150155e-08f, 6.06558899e-07f, 1.4053287e-06f, -6.31970707e-08f,
    6.31970707e-08f, 9.25375275e-07f, 2.02470551e-06f, -2.79119604e-07f, 2.79119604e-07f,
    8.00026839e-07f, 1.5360024e-06f, -9.21359174e-07f, 9.21359174e-07f, -2.01158088e-07f,
    -9.10430174e-07f, -2.27230976e-06f, 2.27230976e-06f, -1.93032724e-06f, -4.75187107e-06f,
    -4.0869304e-06f, 4.0869304e-06f, -3.56180817e-06f, -7.93275467e-06f, -5.09091024e-06f,
    5.09091024e-06f, -4.41024122e-06f, -8.72039709e-06f, -3.70336124e-06f, 3.70336124e-06f,
    -4.79295841e-06f, -7.40170799e-06f, 0.0f, -0.0f, -5.69200847e-06f, -5.69200847e-06f,
    3.70336124e-06f, -3.70336124e-06f, -7.40170799e-06f, -4.79295841e-06f, 5.09091024e-06f,
    -5.09091024e-06f, -8.72039709e-06f, -4.41024122e-06f, 4.0869304e-06f, -4.0869304e-06f,
    -7.93275467e-06f, -3.56180817e-06f, 2.27230976e-06f, -2.27230976e-06f, -4.75187107e-06f,
    -1.93032724e-06f, 9.21359174e-07f, -9.21359174e-07f, -9.10430174e-07f, -2.01158088e-07f,
    2.79119604e-07f, -2.79119604e-07f, 1.5360024e-06f, 8.00026839e-07f, 6.31970707e-08f,
    -6.31970707e-08f, 2.02470551e-06f, 9.25375275e-07f, 1.00150155e-08f, -1.00150155e-08f,
    1.4053287e-06f, 6.06558899e-07f, 1.36885181e-09f, -1.36885181e-09f, 6.74629462e-07f,
    2.79627898e-07f, 5.282631e-10f, -5.282631e-10f, 2.39334042e-07f, 9.59585265e-08f,
    -6.36158515e-10f, 6.36158515e-10f, 6.53205419e-08f, 2.55239101e-08f, -3.03459036e-10f,
    3.03459036e-10f, 1.39463063e-08f, 4.8851474e-09f, 2.64196359e-10f, 1.09433719e-10f,
    -1.30108138e-08f, -7.27389571e-09f, 1.31325306e-09f, 5.4396726e-10f, -6.1177424e-08f,
    -3.11055715e-08f, -7.86573084e-10f, -3.25809241e-10f, -2.27309641e-07f, -1.15442681e-07f,
    -5.35692424e-09f, -2.21891083e-09f, -6.46472984e-07f, -3.19172187e-07f, -3.84608327e-08f,
    -1.59309987e-08f, -1.36427298e-06f, -6.54445614e-07f, -2.25066771e-07f, -9.3225708e-08f,
    -2.00087379e-06f, -9.16664078e-07f, -9.83994255e-07f, -4.07583769e-07f, -1.58910075e-06f,
    -6.46841954e-07f, -3.24374355e-06f, -1.34360266e-06f, 7.33073989e-07f, 5.16212651e-07f,
    -7.99584814e-06f, -3.31198885e-06f, 4.44640727e-06f, 2.25817848e-06f, -1.43832176e-05f,
    -5.95772417e-06f, 7.43826104e-06f, 3.57186718e-06f, -1.79151921e-05f, -7.42071597e-06f,
    7.64130709e-06f, 3.57465478e-06f, -1.30331582e-05f, -5.39851089e-06f, 4.71770363e-06f,
    2.22724839e-06f, 0.0f, -0.0f, -7.47020152e-08f, 1.80346618e-07f, 1.30331582e-05f,
    5.39851089e-06f, -4.91082255e-06f, -1.76101764e-06f, 1.79151921e-05f, 7.42071597e-06f,
    -7.93088293e-06f, -2.87555758e-06f, 1.43832176e-05f, 5.95772417e-06f, -7.78533649e-06f,
    -2.73395335e-06f, 7.99584814e-06f, 3.31198885e-06f, -4.740858e-06f, -1.5473114e-06f,
    3.24374355e-06f, 1.34360266e-06f, -8.83379016e-07f, -1.53344118e-07f, 9.83994255e-07f,
    4.07583769e-07f, 1.58105024e-06f, 6.66277515e-07f, 2.25066771e-07f, 9.3225708e-08f,
    2.06301092e-06f, 7.66652136e-07f, 3.84608327e-08f, 1.59309987e-08f, 1.42744955e-06f,
    5.01923751e-07f, 5.35692424e-09f, 2.21891083e-09f, 6.82814232e-07f, 2.31436601e-07f,
    7.86573084e-10f, 3.25809241e-10f, 2.42362489e-07f, 7.91018877e-08f, -1.31325306e-09f,
    -5.4396726e-10f, 6.52539356e-08f, 2.12640128e-08f, -2.64196359e-10f, -1.09433719e-10f,
    1.43434553e-08f, 4.05661371e-09f, 5.16987883e-26f, 9.2625789e-11f, 1.46020867e-08f,
    -3.60808916e-09f, 2.06795153e-25f, 1.77842729e-09f, 6.54032277e-08f, -1.62687073e-08f, 0.0f,
    -3.3758548e-11f, 2.44475331e-07f, -6.3453804e-08f, 0.0f, -1.86191673e-09f, 6.89046942e-07f,
    -1.84210407e-07f, 4.23516474e-22f, -1.11366845e-08f, 1.44422108e-06f, -4.00750395e-07f,
    1.69406589e-21f, -6.47651532e-08f, 2.09360724e-06f, -6.11723806e-07f, 0.0f, -2.8505076e-07f,
    1.61452988e-06f, -5.32550985e-07f, 2.71050543e-20f, -9.36797676e-07f, -8.83274311e-07f,
    1.19442106e-07f, 5.42101086e-20f, -2.30934825e-06f, -4.8561451e-06f, 1.22950109e-06f, 0.0f,
    -4.15274872e-06f, -8.23531809e-06f, 2.17623665e-06f, 1.08420217e-19f, -5.17233411e-06f,
    -9.33066985e-06f, 2.2992499e-06f, 0.0f, -3.76308844e-06f, -8.61245189e-06f, 1.44785258e-06f,
    0.0f, -0.0f, -8.01992064e-06f, 2.16840434e-19f, 0.0f, 3.76308844e-06f, -8.61245189e-06f,
    -1.44785258e-06f, -1.08420217e-19f, 5.17233411e-06f, -9.33066985e-06f, -2.2992499e-06f,
    0.0f, 4.15274872e-06f, -8.23531809e-06f, -2.17623665e-06f, -5.42101086e-20f,
    2.30934825e-06f, -4.8561451e-06f, -1.22950109e-06f, -2.71050543e-20f, 9.36797676e-07f,
    -8.83274311e-07f, -1.19442106e-07f, 0.0f, 2.8505076e-07f, 1.61452988e-06f, 5.32550985e-07f,
    -1.69406589e-21f, 6.47651532e-08f, 2.09360724e-06f, 6.11723806e-07f, -4.23516474e-22f,
    1.11366845e-08f, 1.44422108e-06f, 4.00750395e-07f, 0.0f, 1.86191673e-09f, 6.89046942e-07f,
    1.84210407e-07f, 0.0f, 3.3758548e-11f, 2.44475331e-07f, 6.3453804e-08f, -2.06795153e-25f,
    -1.77842729e-09f, 6.54032277e-08f, 1.62687073e-08f, -5.16987883e-26f, -9.2625789e-11f,
    1.46020867e-08f, 3.60808916e-09f, 1.05677501e-10f, -4.37730546e-11f, -7.87133203e-09f,
    1.24918351e-08f, -1.39058065e-09f, 5.75997361e-10f, -3.87783743e-08f, 5.52352049e-08f,
    -7.21165516e-10f, 2.98716524e-10f, -1.39745922e-07f, 2.07281133e-07f, -3.86684329e-09f,
    1.601699e-09f, -3.93695046e-07f, 5.8763959e-07f, -3.20513109e-08f, 1.32760869e-08f,
    -8.17594071e-07f, 1.24086966e-06f, -1.84185822e-07f, 7.62922667e-08f, -1.17242564e-06f,
    1.81959126e-06f, -7.99998304e-07f, 3.3137016e-07f, -8.7996051e-07f, 1.44239323e-06f,
    -2.6414898e-06f, 1.09414088e-06f, 5.41486827e-07f, -6.76434297e-07f, -6.50995344e-06f,
    2.69651105e-06f, 2.72932334e-06f, -4.0896698e-06f, -1.17131194e-05f, 4.85173314e-06f,
    4.38158759e-06f, -6.96950201e-06f, -1.45891681e-05f, 6.04303114e-06f, 4.22145695e-06f,
    -7.68178052e-06f, -1.06133166e-05f, 4.39617997e-06f, 1.93693063e-06f, -6.34625076e-06f,
    0.0f, -0.0f, -1.83513816e-06f, -4.43041517e-06f, 1.06133166e-05f, -4.39617997e-06f,
    -5.85709358e-06f, -3.11785993e-06f, 1.45891681e-05f, -6.04303114e-06f, -8.41686051e-06f,
    -2.4468186e-06f, 1.17131194e-05f, -4.85173314e-06f, -8.02643262e-06f, -1.82993199e-06f,
    6.50995344e-06f, -2.69651105e-06f, -4.82175619e-06f, -9.61910018e-07f, 2.6414898e-06f,
    -1.09414088e-06f, -8.61200306e-07f, -9.54222799e-08f, 7.99998304e-07f, -3.3137016e-07f,
    1.64215203e-06f, 3.97699978e-07f, 1.84185822e-07f, -7.62922667e-08f, 2.11567544e-06f,
    4.57615272e-07f, 3.20513109e-08f, -1.32760869e-08f, 1.45555373e-06f, 2.99301064e-07f,
    3.86684329e-09f, -1.601699e-09f, 6.93908362e-07f, 1.37139509e-07f, 7.21165516e-10f,
    -2.98716524e-10f, 2.45385166e-07f, 4.77546038e-08f, 1.39058065e-09f, -5.75997361e-10f,
    6.64776394e-08f, 1.16367342e-08f, -1.05677501e-10f, 4.37730546e-11f, 1.43989336e-08f,
    3.26718919e-09f, 2.09898821e-10f, 2.09898821e-10f, -2.60162669e-09f, -1.38229312e-08f,
    -4.07976597e-10f, -4.07976597e-10f, -8.22184187e-09f, -6.72530973e-08f, -4.20091989e-10f,
    -4.20091989e-10f, -3.16809015e-08f, -2.4602457e-07f, -2.80042278e-09f, -2.80042278e-09f,
    -9.1104944e-08f, -6.97951577e-07f, -2.37189166e-08f, -2.37189166e-08f, -1.98234005e-07f,
    -1.46506227e-06f, -1.34924676e-07f, -1.34924676e-07f, -3.04388408e-07f, -2.13206704e-06f,
    -5.86431554e-07f, -5.86431554e-07f, -2.65775157e-07f, -1.66131838e-06f, -1.93614346e-06f,
    -1.93614346e-06f, 5.13173184e-08f, 8.5650953e-07f, -4.77153753e-06f, -4.77153753e-06f,
    5.73665375e-07f, 4.85686496e-06f, -8.58458861e-06f, -8.58458861e-06f, 9.24344533e-07f,
    8.14585837e-06f, -1.06919861e-05f, -1.06919861e-05f, 5.8034243e-07f, 8.73581757e-06f,
    -7.77843888e-06f, -7.77843888e-06f, -8.67587062e-07f, 6.64022582e-06f, 0.0f, -0.0f,
    -3.49174275e-06f, 3.49174275e-06f, 7.77843888e-06f, 7.77843888e-06f, -6.64022582e-06f,
    8.67587062e-07f, 1.06919861e-05f, 1.06919861e-05f, -8.73581757e-06f, -5.8034243e-07f,
    8.58458861e-06f, 8.58458861e-06f, -8.14585837e-06f, -9.24344533e-07f, 4.77153753e-06f,
    4.77153753e-06f, -4.85686496e-06f, -5.73665375e-07f, 1.93614346e-06f, 1.93614346e-06f,
    -8.5650953e-07f, -5.13173184e-08f, 5.86431554e-07f, 5.86431554e-07f, 1.66131838e-06f,
    2.65775157e-07f, 1.34924676e-07f, 1.34924676e-07f, 2.13206704e-06f, 3.04388408e-07f,
    2.37189166e-08f, 2.37189166e-08f, 1.46506227e-06f, 1.98234005e-07f, 2.80042278e-09f,
    2.80042278e-09f, 6.97951577e-07f, 9.1104944e-08f, 4.20091989e-10f, 4.20091989e-10f,
    2.4602457e-07f, 3.16809015e-08f, 4.07976597e-10f, 4.07976597e-10f, 6.72530973e-08f,
    8.22184187e-09f, -2.09898821e-10f, -2.09898821e-10f, 1.38229312e-08f, 2.60162669e-09f,
    -1.61285943e-10f, 3.89378724e-10f, 1.04057385e-08f, 8.34861602e-09f, -1.80905568e-10f,
    4.36744668e-10f, 5.05132185e-08f, 4.38267982e-08f, -1.44381049e-10f, 3.48566703e-10f,
    1.85504007e-07f, 1.63229728e-07f, -8.67666494e-10f, 2.09473239e-09f, 5.27327927e-07f,
    4.6229502e-07f, -4.76946704e-09f, 1.15145111e-08f, 1.11025588e-06f, 9.69418579e-07f,
    -2.9130641e-08f, 7.03275873e-08f, 1.6220821e-06f, 1.4057423e-06f, -1.27216822e-07f,
    3.07128573e-07f, 1.27573117e-06f, 1.08882477e-06f, -4.18405108e-07f, 1.01011926e-06f,
    -6.31115086e-07f, -5.82393227e-07f, -1.03135221e-06f, 2.48990432e-06f, -3.70539169e-06f,
    -3.23380755e-06f, -1.85573549e-06f, 4.4801418e-06f, -6.37996345e-06f, -5.42339239e-06f,
    -2.31195031e-06f, 5.5815417e-06f, -7.38618201e-06f, -5.8869764e-06f, -1.68171653e-06f,
    4.06002255e-06f, -7.15517581e-06f, -4.7068911e-06f, 0.0f, -0.0f, -7.25018799e-06f,
    -3.00312604e-06f, 1.68171653e-06f, -4.06002255e-06f, -8.38774849e-06f, -1.73119872e-06f,
    2.31195031e-06f, -5.5815417e-06f, -9.38554058e-06f, -1.06009827e-06f, 1.85573549e-06f,
    -4.4801418e-06f, -8.34623279e-06f, -6.76397747e-07f, 1.03135221e-06f, -2.48990432e-06f,
    -4.90675484e-06f, -3.33460406e-07f, 4.18405108e-07f, -1.01011926e-06f, -8.58079943e-07f,
    -3.44515811e-08f, 1.27216822e-07f, -3.07128573e-07f, 1.67199357e-06f, 1.3216281e-07f,
    2.9130641e-08f, -7.03275873e-08f, 2.14099509e-06f, 1.52975304e-07f, 4.76946704e-09f,
    -1.15145111e-08f, 1.47055187e-06f, 9.95870195e-08f, 8.67666494e-10f, -2.09473239e-09f,
    6.99769089e-07f, 4.59852068e-08f, 1.44381049e-10f, -3.48566703e-10f, 2.46591981e-07f,
    1.57502971e-08f, 1.80905568e-10f, -4.36744668e-10f, 6.67084663e-08f, 4.7280122e-09f,
    1.61285943e-10f, -3.89378724e-10f, 1.32613316e-08f, 1.45460499e-09f, -4.65661287e-10f, 0.0f,
    -1.3038516e-08f, 0.0f, -9.31322575e-10f, 0.0f, -6.61239028e-08f, 0.0f, -9.31322575e-10f,
    0.0f, -2.46800482e-07f, 0.0f, -6.05359674e-09f, 0.0f, -6.99888915e-07f, 0.0f,
    -4.0512532e-08f, 0.0f, -1.47148967e-06f, 0.0f, -2.38418579e-07f, 0.0f, -2.14297324e-06f,
    0.0f, -1.03889033e-06f, 0.0f, -1.6768463e-06f, 0.0f, -3.42307612e-06f, 0.0f, 8.4284693e-07f,
    -0.0f, -8.4368512e-06f, 0.0f, 4.83775511e-06f, -0.0f, -1.51796266e-05f, 0.0f,
    8.02567229e-06f, -0.0f, -1.89086422e-05f, 0.0f, 8.21659341e-06f, -0.0f, -1.37551688e-05f,
    0.0f, 5.08362427e-06f, -0.0f, 0.0f, -0.0f, 0.0f, -0.0f, 1.37551688e-05f, -0.0f,
    -5.08362427e-06f, 0.0f, 1.89086422e-05f, -0.0f, -8.21659341e-06f, 0.0f, 1.51796266e-05f,
    -0.0f, -8.02567229e-06f, 0.0f, 8.4368512e-06f, -0.0f, -4.83775511e-06f, 0.0f,
    3.42307612e-06f, -0.0f, -8.4284693e-07f, 0.0f, 1.03889033e-06f, -0.0f, 1.6768463e-06f,
    -0.0f, 2.38418579e-07f, -0.0f, 2.14297324e-06f, -0.0f, 4.0512532e-08f, -0.0f,
    1.47148967e-06f, -0.0f, 6.05359674e-09f, -0.0f, 6.99888915e-07f, -0.0f, 9.31322575e-10f,
    -0.0f, 2.46800482e-07f, -0.0f, 9.31322575e-10f, -0.0f, 6.61239028e-08f, -0.0f,
    4.65661287e-10f, -0.0f, 1.3038516e-08f, -0.0f, -3.5605859e-05f, 0.0f, -9.62992199e-05f,
    0.0f, -0.000103058293f, 0.0f, -0.000197920017f, 0.0f, -0.000267435331f, 0.0f,
    -0.00037606433f, 0.0f, -0.00062158145f, 0.0f, -0.000659445766f, 0.0f, -0.00129135419f, 0.0f,
    -0.00106466096f, 0.0f, -0.00239030598f, 0.0f, -0.0015772921f, 0.0f, -0.00392276887f, 0.0f,
    -0.00213386165f, 0.0f, -0.00566437747f, 0.0f, -0.00261633657f, 0.0f, -0.00710571371f, 0.0f,
    -0.00287078135f, 0.0f, -0.00756200543f, 0.0f, -0.0027528652f, 0.0f, -0.00647294568f, 0.0f,
    -0.00218738383f, 0.0f, -0.00376017811f, 0.0f, -0.00121516222f, 0.0f, 0.0f, -0.0f, 0.0f,
    -0.0f, 0.00376017811f, -0.0f, 0.00121516222f, -0.0f, 0.00647294568f, -0.0f, 0.00218738383f,
    -0.0f, 0.00756200543f, -0.0f, 0.0027528652f, -0.0f, 0.00710571371f, -0.0f, 0.00287078135f,
    -0.0f, 0.00566437747f, -0.0f, 0.00261633657f, -0.0f, 0.00392276887f, -0.0f, 0.00213386165f,
    -0.0f, 0.00239030598f, -0.0f, 0.0015772921f, -0.0f, 0.00129135419f, -0.0f, 0.00106466096f,
    -0.0f, 0.00062158145f, -0.0f, 0.000659445766f, -0.0f, 0.000267435331f, -0.0f,
    0.00037606433f, -0.0f, 0.000103058293f, -0.0f, 0.000197920017f, -0.0f, 3.5605859e-05f,
    -0.0f, 9.62992199e-05f, -0.0f, 6.49440881e-06f, -3.41543637e-05f, -3.36821104e-05f,
    -9.29088346e-05f, 1.17982618e-05f, -0.000100083416f, -8.03355651e-05f, -0.000188452148f,
    1.14735385e-05f, -0.000261850975f, -0.000175677982f, -0.000352190313f, -2.01488347e-05f,
    -0.000610750576f, -0.000352957693f, -0.000604799599f, -0.000144733247f, -0.00126667996f,
    -0.000652340415f, -0.000950683141f, -0.000471946201f, -0.0023265339f, -0.001109901f,
    -0.00136003993f, -0.00114179787f, -0.00376077997f, -0.00173881941f, -0.00175462151f,
    -0.00225333637f, -0.00529618049f, -0.00250783213f, -0.00200912473f, -0.00374859083f,
    -0.00638147956f, -0.00332756364f, -0.00197809772f, -0.00532039721f, -0.00633905269f,
    -0.00405702973f, -0.00154711562f, -0.00644745771f, -0.00470262859f, -0.00453626085f,
    -0.000690746296f, -0.00660520559f, -0.00156840577f, -0.00463761855f, 0.000491686922f,
    -0.00556217413f, 0.00230392814f, -0.00431505311f, 0.00178735342f, -0.00356155518f,
    0.00577961607f, -0.00362696685f, 0.0029316165f, -0.00123378064f, 0.00788430125f,
    -0.00271918927f, 0.00369605212f, 0.000720298209f, 0.00824447535f, -0.00177477731f,
    0.00396272913f, 0.00186173327f, 0.00716304127f, -0.000954216521f, 0.00375166931f,
    0.00215161592f, 0.00533831446f, -0.000352639356f, 0.00319397077f, 0.0018518999f,
    0.00346664595f, 1.11737081e-05f, 0.00247023581f, 0.00131139148f, 0.00197882415f,
    0.000176874921f, 0.0017465119f, 0.000793336134f, 0.000998019823f, 0.000210960163f,
    0.00113350886f, 0.000417618518f, 0.000446113263f, 0.000178079121f, 0.000677236705f,
    0.000193269618f, 0.000177043577f, 0.000124813072f, 0.000373259245f, 7.91122948e-05f,
    6.24270324e-05f, 7.64499637e-05f, 0.000190061619f, 2.8743023e-05f, 1.95585417e-05f,
    4.18796189e-05f, 8.95133198e-05f, 3.00740321e-05f, 1.19454526e-05f, 8.33382655e-05f,
    -6.29778733e-05f, 9.15471974e-05f, 2.21994578e-05f, 0.000161949763f, -0.00014955888f,
    0.000245492731f, 2.27954388e-05f, 0.000285850401f, -0.000324986962f, 0.00057872833f,
    -3.3666478e-05f, 0.00045403422f, -0.00064748025f, 0.00119475659f, -0.000261458044f,
    0.000638567086f, -0.00118411984f, 0.00214551436f, -0.000861185079f, 0.000769942591f,
    -0.00198879861f, 0.00331176072f, -0.00207850197f, 0.000733829744f, -0.00306740636f,
    0.00429516658f, -0.00405924302f, 0.000391319278f, -0.00434147939f, 0.0044481447f,
    -0.00663030287f, -0.000372866809f, -0.00563100632f, 0.00313936011f, -0.00915384851f,
    -0.00158653408f, -0.0066774385f, 0.000182452146f, -0.0106519265f, -0.00314006303f,
    -0.00721296761f, -0.00385421095f, -0.0102574881f, -0.00478397682f, -0.00705587585f,
    -0.00776183093f, -0.00776183093f, -0.00618973142f, -0.00618973142f, -0.0102574881f,
    -0.00385421095f, -0.00705587585f, -0.00478397682f, -0.0106519265f, 0.000182452146f,
    -0.00721296761f, -0.00314006303f, -0.00915384851f, 0.00313936011f, -0.0066774385f,
    -0.00158653408f, -0.00663030287f, 0.0044481447f, -0.00563100632f, -0.000372866809f,
    -0.00405924302f, 0.00429516658f, -0.00434147939f, 0.000391319278f, -0.00207850197f,
    0.00331176072f, -0.00306740636f, 0.000733829744f, -0.000861185079f, 0.00214551436f,
    -0.00198879861f, 0.000769942591f, -0.000261458044f, 0.00119475659f, -0.00118411984f,
    0.000638567086f, -3.3666478e-05f, 0.00057872833f, -0.00064748025f, 0.00045403422f,
    2.27954388e-05f, 0.000245492731f, -0.000324986962f, 0.000285850401f, 2.21994578e-05f,
    9.15471974e-05f, -0.00014955888f, 0.000161949763f, 1.19454526e-05f, 3.00740321e-05f,
    -6.29778733e-05f, 8.33382655e-05f, -1.5555137e-05f, 2.41159414e-05f, 8.44369133e-05f,
    6.92277245e-05f, -3.00021311e-05f, 7.85588491e-05f, 0.000199065806f, 0.000123565886f,
    -3.3396409e-05f, 0.00021959997f, 0.000427938474f, 0.000191266998f, 3.64645566e-05f,
    0.000527137308f, 0.000840408378f, 0.000242376555f, 0.000330522744f, 0.00108175166f,
    0.00150893221f, 0.000207462945f, 0.00110822055f, 0.00187520729f, 0.00247668056f,
    -3.06519833e-05f, 0.00266476278f, 0.00267324201f, 0.00371227134f, -0.000623390602f,
    0.00511374278f, 0.0029299485f, 0.00507041905f, -0.00171041931f, 0.00809304323f,
    0.00191595079f, 0.00628741691f, -0.00334610231f, 0.0106318602f, -0.000864138943f,
    0.00703467149f, -0.00542667601f, 0.0114438031f, -0.00515611656f, 0.00702686794f,
    -0.00766200013f, 0.00963658467f, -0.00977026206f, 0.00614457391f, -0.00962646399f,
    0.00540057477f, -0.0130381407f, 0.00450914726f, -0.0108860442f, 9.4523959e-05f,
    -0.0137227131f, 0.00246206834f, -0.0111518074f, -0.00444606552f, -0.0117379157f,
    0.000449106417f, -0.0103865983f, -0.00690682186f, -0.00812889915f, -0.00113702449f,
    -0.00881150365f, -0.00707742758f, -0.00436786423f, -0.00207982352f, -0.00681192661f,
    -0.00568774855f, -0.00154417555f, -0.00237587863f, -0.00479477691f, -0.00377453933f,
    5.99579698e-06f, -0.00218416867f, -0.00306577608f, -0.00210960209f, 0.000542341557f,
    -0.00172960339f, -0.0017729518f, -0.000998628791f, 0.000531199097f, -0.00121367467f,
    -0.000920277729f, -0.000398526696f, 0.000346958026f, -0.000765644596f, -0.00042287237f,
    -0.000131665802f, 0.000178895454f, -0.000437844399f, -0.000167352002f, -3.4334782e-05f,
    7.6764205e-05f, -0.000228135061f, -5.33865059e-05f, -6.05340301e-06f, 2.80516906e-05f,
    -0.00010865731f, -1.07545202e-05f, -1.73161025e-05f, -1.69449413e-05f, -5.28297351e-05f,
    9.62062841e-05f, -6.27819245e-05f, -3.43859174e-05f, -8.02590366e-05f, 0.000224491931f,
    -0.000186350691f, -4.21540863e-05f, -8.73641693e-05f, 0.0004752065f, -0.000459220639f,
    2.84307953e-05f, -1.59857882e-05f, 0.000913776399f, -0.000937471865f, 0.000345785229f,
    0.000240630747f, 0.00159591122f, -0.00155370636f, 0.0011912639f, 0.000836378429f,
    0.00252724695f, -0.00196983456f, 0.00285102311f, 0.00193899358f, 0.00361547759f,
    -0.00152980885f, 0.00533724995f, 0.0036585466f, 0.00464169681f, 0.000496683177f,
    0.00806177314f, 0.00595558435f, 0.00528424932f, 0.0043543037f, 0.00978940539f,
    0.00857419893f, 0.00521201733f, 0.00926736742f, 0.00915686041f, 0.0110538732f,
    0.00422454719f, 0.0134888627f, 0.00559914811f, 0.0128457267f, 0.00237480551f, 0.0151626933f,
    8.67361738e-19f, 0.0135008413f, 6.50521303e-19f, 0.0134888627f, -0.00559914811f,
    0.0128457267f, -0.00237480551f, 0.00926736742f, -0.00915686041f, 0.0110538732f,
    -0.00422454719f, 0.0043543037f, -0.00978940539f, 0.00857419893f, -0.00521201733f,
    0.000496683177f, -0.00806177314f, 0.00595558435f, -0.00528424932f, -0.00152980885f,
    -0.00533724995f, 0.0036585466f, -0.00464169681f, -0.00196983456f, -0.00285102311f,
    0.00193899358f, -0.00361547759f, -0.00155370636f, -0.0011912639f, 0.000836378429f,
    -0.00252724695f, -0.000937471865f, -0.000345785229f, 0.000240630747f, -0.00159591122f,
    -0.000459220639f, -2.84307953e-05f, -1.59857882e-05f, -0.000913776399f, -0.000186350691f,
    4.21540863e-05f, -8.73641693e-05f, -0.0004752065f, -6.27819245e-05f, 3.43859174e-05f,
    -8.02590366e-05f, -0.000224491931f, -1.73161025e-05f, 1.69449413e-05f, -5.28297351e-05f,
    -9.62062841e-05f, 1.62109645e-05f, -1.07418209e-05f, -9.82443744e-05f, -3.64628431e-05f,
    3.50607916e-05f, -4.61678937e-05f, -0.00022619417f, -3.897446e-05f, 4.76609275e-05f,
    -0.000148831576f, -0.000469075545f, 7.48265893e-06f, -1.31755323e-05f, -0.000380158861f,
    -0.000876346312f, 0.000181591211f, -0.000314807898f, -0.000774536864f, -0.00147144042f,
    0.000612522592f, -0.00112732523f, -0.00122016564f, -0.00220777327f, 0.00146635983f,
    -0.00268395292f, -0.00131500536f, -0.00292708562f, 0.00289385975f, -0.00486456929f,
    -0.000370160968f, -0.00335312006f, 0.00494096521f, -0.00688695721f, 0.00223894441f,
    -0.00315256696f, 0.00745440414f, -0.00740100211f, 0.00642627012f, -0.00206562784f,
    0.0100410869f, -0.00523005566f, 0.0109464759f, -5.86967544e-05f, 0.0121350391f,
    -0.000392034854f, 0.0137636485f, 0.00258574402f, 0.0131758787f, 0.00549503975f,
    0.0132661993f, 0.00531457411f, 0.0128305163f, 0.0100095803f, 0.00945515931f, 0.00748835597f,
    0.0111451503f, 0.0114385346f, 0.00404211925f, 0.0086222738f, 0.00853926409f, 0.0097773578f,
    -0.000689239707f, 0.00856074039f, 0.00563950138f, 0.00645298697f, -0.00328664132f,
    0.00750026107f, 0.00304185832f, 0.00317802653f, -0.00370151317f, 0.00586480414f,
    0.00112277607f, 0.000967992062f, -0.00282769045f, 0.00411602994f, -2.3494169e-05f,
    -6.56480479e-05f, -0.00165992673f, 0.00259800442f, -0.000524258474f, -0.000325077475f,
    -0.000770283106f, 0.00147358445f, -0.00060734665f, -0.000259496388f, -0.000278129417f,
    0.000748074788f, -0.000491266081f, -0.000138941177f, -7.15384449e-05f, 0.000336977537f,
    -0.000326395471f, -5.74373516e-05f, -7.85390603e-06f, 0.000132384317f, -0.000187502534f,
    -1.90584979e-05f, 3.86726879e-06f, 4.3686141e-05f, -9.52523842e-05f, 5.25175392e-06f,
    1.38512105e-05f, 2.20207166e-05f, -9.2072245e-05f, 3.06224756e-05f, 3.23366257e-05f,
    5.06397009e-06f, -0.00020847343f, 0.000110735258f, 4.87841644e-05f, -7.98663896e-05f,
    -0.000421125122f, 0.000296824175f, 3.69591999e-06f, -0.000320419291f, -0.000757193659f,
    0.000607056485f, -0.000254499901f, -0.00084850454f, -0.00120283873f, 0.00090734486f,
    -0.000961066049f, -0.00181438832f, -0.00166114373f, 0.000783790427f, -0.00227590743f,
    -0.00332054589f, -0.00192437437f, -0.000401339872f, -0.00396154495f, -0.00532689225f,
    -0.00169607461f, -0.0030851115f, -0.00513600092f, -0.00757263135f, -0.000687138934f,
    -0.00685555441f, -0.00452233385f, -0.00957905035f, 0.00123191683f, -0.0101848822f,
    -0.00133765745f, -0.0107743023f, 0.00389377284f, -0.0111210821f, 0.00376277557f,
    -0.010712686f, 0.00680633541f, -0.00867866352f, 0.00867866352f, -0.00928632077f,
    0.00928632077f, -0.00376277557f, 0.0111210821f, -0.00680633541f, 0.010712686f,
    0.00133765745f, 0.0101848822f, -0.00389377284f, 0.0107743023f, 0.00452233385f,
    0.00685555441f, -0.00123191683f, 0.00957905035f, 0.00513600092f, 0.0030851115f,
    0.000687138934f, 0.00757263135f, 0.00396154495f, 0.000401339872f, 0.00169607461f,
    0.00532689225f, 0.00227590743f, -0.000783790427f, 0.00192437437f, 0.00332054589f,
    0.000961066049f, -0.00090734486f, 0.00166114373f, 0.00181438832f, 0.000254499901f,
    -0.000607056485f, 0.00120283873f, 0.00084850454f, -3.69591999e-06f, -0.000296824175f,
    0.000757193659f, 0.000320419291f, -4.87841644e-05f, -0.000110735258f, 0.000421125122f,
    7.98663896e-05f, -3.23366257e-05f, -3.06224756e-05f, 0.00020847343f, -5.06397009e-06f,
    -1.38512105e-05f, -5.25175392e-06f, 9.2072245e-05f, -2.20207166e-05f, -1.05959716e-05f,
    1.33604237e-06f, 8.01953211e-05f, 1.06702537e-05f, -2.70704422e-05f, 1.7667091e-05f,
    0.000177947819f, -1.86059006e-05f, -4.52325839e-05f, 7.57631642e-05f, 0.000347855559f,
    -0.000123630656f, -1.69231371e-05f, 0.000216806555f, 0.000594677578f, -0.000389272027f,
    0.00018441127f, 0.000448819454f, 0.00087254867f, -0.000932278228f, 0.00074727356f,
    0.000637554156f, 0.00105015631f, -0.00186551444f, 0.0017601971f, 0.000404399994f,
    0.000901413616f, -0.00322606624f, 0.00291620614f, -0.000775474531f, 0.000154733003f,
    -0.00488922885f, 0.00335268793f, -0.00312637887f, -0.00138793781f, -0.00652169855f,
    0.0020252848f, -0.00600494863f, -0.00370099186f, -0.00763383228f, -0.00137760863f,
    -0.00785974693f, -0.00644070841f, -0.00774876261f, -0.00572406268f, -0.00715019461f,
    -0.00899332669f, -0.00662718248f, -0.0088593103f, -0.00366964657f, -0.0106821842f,
    -0.00442470564f, -0.00910347514f, 0.00100842759f, -0.0110453675f, -0.00167311635f,
    -0.00653179688f, 0.00458356412f, -0.0100334715f, 0.000924934051f, -0.00281404727f,
    0.00567823276f, -0.00801493134f, 0.00278093829f, 0.000160024676f, 0.00458139181f,
    -0.0055929576f, 0.00363011705f, 0.00151372573f, 0.00261041243f, -0.00334779429f,
    0.00356661971f, 0.00153060129f, 0.000958693272f, -0.00164377771f, 0.00291856891f,
    0.000979221077f, 7.75833178e-05f, -0.000576545252f, 0.00206169044f, 0.000447761733f,
    -0.000186964811f, -4.22351623e-05f, 0.00127620529f, 0.000141338925f, -0.000165271849f,
    0.00014524367f, 0.000695757451f, 2.15883811e-05f, -8.5556916e-05f, 0.000158550945f,
    0.000333391101f, -6.64917343e-06f, -3.16342121e-05f, 0.000112671754f, 0.000138984469f,
    -6.54775886e-06f, -8.43720773e-06f, 6.42516607e-05f, 4.91616447e-05f, 9.26989458e-07f,
    -7.19981108e-06f, -2.7883616e-06f, 6.54098912e-05f, -8.1781991e-06f, -2.04777116e-05f,
    3.17169615e-05f, 0.000141694196f, -4.6881647e-05f, -3.78253644e-05f, 0.000139688331f,
    0.000265964947f, -0.000146925027f, -2.34814124e-05f, 0.00039423717f, 0.000425230945f,
    -0.000311235141f, 0.00012052527f, 0.000885465124f, 0.000553519581f, -0.00042198255f,
    0.000534273859f, 0.00167941779f, 0.0005078697f, -0.000166674698f, 0.00125126145f,
    0.00274953223f, 7.75456356e-05f, 0.000840718218f, 0.00195271941f, 0.0039106207f,
    -0.000947347842f, 0.00264305295f, 0.00189578044f, 0.00480985921f, -0.00265190657f,
    0.00450948207f, 0.000348658592f, 0.00502090249f, -0.00487212231f, 0.00509872613f,
    -0.00259343255f, 0.00423092302f, -0.00715946453f, 0.00344513124f, -0.00561118871f,
    0.00243302714f, -0.00889814552f, 0.0f, -0.00690018944f, 0.0f, -0.00954919215f,
    -0.00344513124f, -0.00561118871f, -0.00243302714f, -0.00889814552f, -0.00509872613f,
    -0.00259343255f, -0.00423092302f, -0.00715946453f, -0.00450948207f, 0.000348658592f,
    -0.00502090249f, -0.00487212231f, -0.00264305295f, 0.00189578044f, -0.00480985921f,
    -0.00265190657f, -0.000840718218f, 0.00195271941f, -0.0039106207f, -0.000947347842f,
    0.000166674698f, 0.00125126145f, -0.00274953223f, 7.75456356e-05f, 0.00042198255f,
    0.000534273859f, -0.00167941779f, 0.0005078697f, 0.000311235141f, 0.00012052527f,
    -0.000885465124f, 0.000553519581f, 0.000146925027f, -2.34814124e-05f, -0.00039423717f,
    0.000425230945f, 4.6881647e-05f, -3.78253644e-05f, -0.000139688331f, 0.000265964947f,
    8.1781991e-06f, -2.04777116e-05f, -3.17169615e-05f, 0.000141694196f, -9.26989458e-07f,
    -7.19981108e-06f, 2.7883616e-06f, 6.54098912e-05f, 4.25971939e-06f, 1.80059396e-06f,
    -5.0202947e-05f, 1.89905882e-06f, 1.38435862e-05f, -2.2813731e-06f, -0.000105725732f,
    3.58988473e-05f, 2.83032696e-05f, -2.56960629e-05f, -0.000188749604f, 0.000133977417f,
    2.3276456e-05f, -9.1747781e-05f, -0.000275532337f, 0.000352736621f, -7.17236253e-05f,
    -0.000201524512f, -0.000293735764f, 0.000752078136f, -0.000353717012f, -0.000262255373f,
    -0.000110205656f, 0.0013542102f, -0.000822196947f, -3.89113957e-05f, 0.000445199898f,
    0.00208598352f, -0.00119354506f, 0.00072276243f, 0.00150321913f, 0.00273842178f,
    -0.000898944098f, 0.00194820645f, 0.00304411422f, 0.0029920456f, 0.000489497266f,
    0.00295521715f, 0.00481476123f, 0.00253470358f, 0.00262528658f, 0.00274718809f,
    0.00635220623f, 0.00123639032f, 0.00428757258f, 0.000905172783f, 0.00714489259f,
    -0.000718371128f, 0.00424542138f, -0.00175851106f, 0.00686839269f, -0.00284498138f,
    0.00239171786f, -0.0036718254f, 0.00556016713f, -0.00454423716f, -8.61973094e-05f,
    -0.00379891321f, 0.00361742801f, -0.00536594819f, -0.00174352725f, -0.00243578083f,
    0.00161224429f, -0.00519685633f, -0.00201323954f, -0.000741940516f, 3.68180845e-05f,
    -0.00426820945f, -0.00135503395f, 0.0003328936f, -0.000873420096f, -0.00299929292f,
    -0.000553866499f, 0.000608895556f, -0.00116020918f, -0.00178981689f, -6.46731569e-05f,
    0.000435558264f, -0.00103549834f, -0.000879644067f, 9.17830912e-05f, 0.000193215616f,
    -0.00073950208f, -0.000324096996f, 8.13344159e-05f, 4.84165394e-05f, -0.000444253266f,
    -5.45916773e-05f, 3.81832942e-05f, -1.84357305e-06f, -0.000228202465f, 3.87297878e-05f,
    1.14020686e-05f, -8.17571981e-06f, -0.000100143705f, 4.93750667e-05f, 1.7388644e-06f,
    -4.28528892e-06f, -3.68416804e-05f, 3.4156008e-05f, -1.74348349e-06f, 2.10843154e-06f,
    -4.06658864e-06f, -3.63792133e-05f, -5.63237336e-07f, 8.21676349e-06f, -3.38077589e-05f,
    -7.41345721e-05f, 1.21985486e-05f, 1.87529204e-05f, -0.00011465139f, -0.00012437308f,
    5.27132252e-05f, 1.8526127e-05f, -0.000286048307f, -0.000159558345f, 0.000121761048f,
    -3.96101568e-05f, -0.000580780732f, -0.00011246268f, 0.000152947032f, -0.000218451838f,
    -0.000988626503f, 0.000125774939f, -1.59089104e-05f, -0.000501872273f, -0.0014138252f,
    0.000673565897f, -0.000534439576f, -0.000667150307f, -0.00165937899f, 0.00158625538f,
    -0.00127777993f, -0.000324700784f, -0.00147577445f, 0.00277028629f, -0.00169930258f,
    0.000719146279f, -0.000680822937f, 0.003945251f, -0.00116422807f, 0.00203614426f,
    0.000701558834f, 0.00471155951f, 0.00035845465f, 0.00268464931f, 0.00237833639f,
    0.00472190464f, 0.00200926815f, 0.00200926815f, 0.00387073588f, 0.00387073588f,
    0.00268464931f, 0.00035845465f, 0.00472190464f, 0.00237833639f, 0.00203614426f,
    -0.00116422807f, 0.00471155951f, 0.000701558834f, 0.000719146279f, -0.00169930258f,
    0.003945251f, -0.000680822937f, -0.000324700784f, -0.00127777993f, 0.00277028629f,
    -0.00147577445f, -0.000667150307f, -0.000534439576f, 0.00158625538f, -0.00165937899f,
    -0.000501872273f, -1.59089104e-05f, 0.000673565897f, -0.0014138252f, -0.000218451838f,
    0.000152947032f, 0.000125774939f, -0.000988626503f, -3.96101568e-05f, 0.000121761048f,
    -0.00011246268f, -0.000580780732f, 1.8526127e-05f, 5.27132252e-05f, -0.000159558345f,
    -0.000286048307f, 1.87529204e-05f, 1.21985486e-05f, -0.00012437308f, -0.00011465139f,
    8.21676349e-06f, -5.63237336e-07f, -7.41345721e-05f, -3.38077589e-05f, 2.10843154e-06f,
    -1.74348349e-06f, -3.63792133e-05f, -4.06658864e-06f, -8.01661201e-07f, -1.2438087e-06f,
    2.49479253e-05f, -4.52661607e-06f, -4.18626269e-06f, -1.31006789e-06f, 4.89374252e-05f,
    -2.82371329e-05f, -1.09062848e-05f, 5.00402848e-06f, 7.59376562e-05f, -8.95592966e-05f,
    -1.23218006e-05f, 2.82176588e-05f, 7.99218178e-05f, -0.00021309375f, 2.0877409e-05f,
    6.91791211e-05f, 5.80704955e-06f, -0.000411384855f, 0.000126727624f, 8.42864829e-05f,
    -0.000225308642f, -0.000656085904f, 0.000285828894f, -2.96653889e-05f, -0.000682458107f,
    -0.000851065211f, 0.000341237901f, -0.000350728835f, -0.00136440666f, -0.000835869345f,
    5.35558065e-05f, -0.000753396889f, -0.00214351318f, -0.000444034551f, -0.000625993242f,
    -0.000853850157f, -0.00276541873f, 0.000393181428f, -0.00131144037f, -0.000311570388f,
    -0.00293822889f, 0.00155518879f, -0.00138769369f, 0.000708890613f, -0.00248395978f,
    0.00272937887f, -0.000625861867f, 0.00151096424f, -0.0014623215f, 0.00353035633f,
    0.000479986251f, 0.00148250896f, -0.00017353741f, 0.00368638709f, 0.00114764192f,
    0.000707014813f, 0.000977957039f, 0.00317732617f, 0.00104640727f, -0.000161119184f,
    0.00167742511f, 0.00223346753f, 0.000494862383f, -0.000570601725f, 0.00182967249f,
    0.00120171276f, 6.71109638e-06f, -0.000489294354f, 0.00155583001f, 0.000373732328f,
    -0.000181134965f, -0.000223088151f, 0.00108436472f, -0.000119223223f, -0.000149209503f,
    -3.00104221e-05f, 0.000623240077f, -0.000304605521f, -6.36795812e-05f, 3.41544655e-05f,
    0.000286786817f, -0.000294999219f, -1.12400694e-05f, 2.86657269e-05f, 9.41667749e-05f,
    -0.000207193298f, 4.17352567e-06f, 1.12502903e-05f, 9.63195544e-06f, -0.000117024021f,
    3.88649278e-06f, 2.03377681e-06f, -1.46373168e-05f, -5.45706534e-05f, 1.44636567e-06f,
    -3.12645511e-07f, -1.44400465e-05f, -2.08416477e-05f, 6.86528153e-07f, -1.85311791e-07f,
    4.02652813e-06f, 1.62174692e-05f, 9.9780857e-07f, -1.81588518e-06f, 2.14960855e-05f,
    3.04399746e-05f, -1.98205953e-06f, -5.63095909e-06f, 6.46547851e-05f, 4.27425839e-05f,
    -1.46196626e-05f, -7.15816032e-06f, 0.000146971506f, 3.16529768e-05f, -3.77139077e-05f,
    1.05623631e-05f, 0.000268500648f, -4.33488021e-05f, -4.47776838e-05f, 6.91397945e-05f,
    0.000395360752f, -0.00023292785f, 2.5020212e-05f, 0.000152178181f, 0.000446057966f,
    -0.000567774987f, 0.000207086196f, 0.00015939241f, 0.000306352915f, -0.00101432134f,
    0.000401165336f, -4.12631052e-05f, -0.000114994778f, -0.00144558761f, 0.000368507957f,
    -0.000430090411f, -0.000808727928f, -0.00166499394f, -3.70410417e-05f, -0.000721450546f,
    -0.00161860185f, -0.00149520964f, -0.000606094429f, -0.000575834187f, -0.00227834587f,
    -0.00089131319f, -0.000877726823f, 8.67361738e-19f, -0.00253328728f, 4.33680869e-19f,
    -0.000606094429f, 0.000575834187f, -0.00227834587f, 0.00089131319f, -3.70410417e-05f,
    0.000721450546f, -0.00161860185f, 0.00149520964f, 0.000368507957f, 0.000430090411f,
    -0.000808727928f, 0.00166499394f, 0.000401165336f, 4.12631052e-05f, -0.000114994778f,
    0.00144558761f, 0.000207086196f, -0.00015939241f, 0.000306352915f, 0.00101432134f,
    2.5020212e-05f, -0.000152178181f, 0.000446057966f, 0.000567774987f, -4.47776838e-05f,
    -6.91397945e-05f, 0.000395360752f, 0.00023292785f, -3.77139077e-05f, -1.05623631e-05f,
    0.000268500648f, 4.33488021e-05f, -1.46196626e-05f, 7.15816032e-06f, 0.000146971506f,
    -3.16529768e-05f, -1.98205953e-06f, 5.63095909e-06f, 6.46547851e-05f, -4.27425839e-05f,
    9.9780857e-07f, 1.81588518e-06f, 2.14960855e-05f, -3.04399746e-05f, 6.86528153e-07f,
    1.85311791e-07f, 4.02652813e-06f, -1.62174692e-05f, 5.23494714e-09f, 2.87189181e-07f,
    -1.00036732e-05f, 3.13569058e-06f, 7.50400659e-07f, 4.53932955e-07f, -1.78441405e-05f,
    1.51306576e-05f, 2.81946996e-06f, -1.02353147e-06f, -2.19556241e-05f, 4.34601643e-05f,
    4.09837276e-06f, -7.7159857e-06f, -6.41963925e-06f, 9.42924817e-05f, -4.60666161e-06f,
    -2.02250849e-05f, 5.57536077e-05f, 0.000161738921f, -3.48899594e-05f, -2.35653188e-05f,
    0.000193013751f, 0.00021481984f, -7.52855412e-05f, 1.56058886e-05f, 0.000411573943f,
    0.000193103959f, -6.72551541e-05f, 0.000110637848f, 0.000666915905f, 2.5673191e-05f,
    5.44396244e-05f, 0.000193010579f, 0.00085456064f, -0.000323434768f, 0.000251005607f,
    0.000130449145f, 0.000843828893f, -0.000805525749f, 0.000341555307f, -0.00011889344f,
    0.00055138208f, -0.00127486989f, 0.000171469932f, -0.000382192811f, 1.1971505e-05f,
    -0.00154226786f, -0.000168332554f, -0.000406390755f, -0.000611180614f, -0.00147552043f,
    -0.000391498674f, -0.000149003565f, -0.00109901314f, -0.00108208286f, -0.000325586443f,
    0.000157445713f, -0.00129135512f, -0.000511583115f, -8.52462908e-05f, 0.000269729237f,
    -0.00116626988f, 2.70844193e-05f, 9.79844554e-05f, 0.000174973713f, -0.000832968508f,
    0.000375562697f, 0.000125789345f, 3.06761976e-05f, -0.000453427056f, 0.000489734462f,
    6.42699451e-05f, -4.21998848e-05f, -0.000154481604f, 0.000427571853f, 8.00772978e-06f,
    -4.13341222e-05f, 1.54192367e-05f, 0.000288381911f, -1.10438932e-05f, -1.75586956e-05f,
    7.49429382e-05f, 0.000153790446f, -8.35401352e-06f, -2.55803866e-06f, 7.1214221e-05f,
    6.21354775e-05f, -2.71741237e-06f, 1.26992018e-06f, 4.62559474e-05f, 1.52060065e-05f,
    -2.09634322e-07f, 8.51592461e-07f, 2.33167029e-05f, -1.91872277e-06f, 1.9937174e-07f,
    2.0677507e-07f, 9.29093312e-06f, -4.85639703e-06f, -9.67996883e-08f, 1.51070534e-08f,
    -2.2157576e-06f, -5.85898397e-06f, -1.30122388e-07f, 4.3878299e-07f, -9.93249523e-06f,
    -9.8517512e-06f, 6.37085122e-07f, 1.68139354e-06f, -2.73337191e-05f, -1.00874777e-05f,
    4.06967411e-06f, 2.81750613e-06f, -5.64328839e-05f, 4.19722528e-06f, 1.05668269e-05f,
    -8.91509387e-07f, -8.9839501e-05f, 4.93213847e-05f, 1.22219371e-05f, -1.54139088e-05f,
    -0.000103480314f, 0.000138742369f, -8.00811176e-06f, -3.37908969e-05f, -5.75837475e-05f,
    0.000266416115f, -5.37734122e-05f, -2.46367163e-05f, 8.54665632e-05f, 0.000391034788f,
    -8.37695407e-05f, 4.07789485e-05f, 0.000328786322f, 0.000438563206f, -3.26638474e-05f,
    0.000128300817f, 0.000614489836f, 0.00033515488f, 9.81244448e-05f, 0.000138174655f,
    0.000831404992f, 5.92155957e-05f, 0.000195528963f, 1.65771471e-05f, 0.000867186347f,
    -0.000323583605f, 0.000145679151f, -0.000145679151f, 0.000677756092f, -0.000677756092f,
    -1.65771471e-05f, -0.000195528963f, 0.000323583605f, -0.000867186347f, -0.000138174655f,
    -9.81244448e-05f, -5.92155957e-05f, -0.000831404992f, -0.000128300817f, 3.26638474e-05f,
    -0.00033515488f, -0.000614489836f, -4.07789485e-05f, 8.37695407e-05f, -0.000438563206f,
    -0.000328786322f, 2.46367163e-05f, 5.37734122e-05f, -0.000391034788f, -8.54665632e-05f,
    3.37908969e-05f, 8.00811176e-06f, -0.000266416115f, 5.75837475e-05f, 1.54139088e-05f,
    -1.22219371e-05f, -0.000138742369f, 0.000103480314f, 8.91509387e-07f, -1.05668269e-05f,
    -4.93213847e-05f, 8.9839501e-05f, -2.81750613e-06f, -4.06967411e-06f, -4.19722528e-06f,
    5.64328839e-05f, -1.68139354e-06f, -6.37085122e-07f, 1.00874777e-05f, 2.73337191e-05f,
    -4.3878299e-07f, 1.30122388e-07f, 9.8517512e-06f, 9.93249523e-06f, -1.51070534e-08f,
    9.67996883e-08f, 5.85898397e-06f, 2.2157576e-06f, -4.7719606e-08f, -5.74113947e-08f,
    3.25944711e-06f, -1.44771059e-06f, -3.75794031e-07f, -1.06213925e-07f, 5.1154534e-06f,
    -6.11642054e-06f, -1.25137069e-06f, 1.70563197e-07f, 3.96340874e-06f, -1.61402222e-05f,
    -2.29387774e-06f, 1.69993518e-06f, -6.88938508e-06f, -3.15550424e-05f, -1.14086072e-06f,
    4.77475896e-06f, -3.63741819e-05f, -4.58415343e-05f, 5.21521861e-06f, 5.5636192e-06f,
    -8.92681783e-05f, -4.24805403e-05f, 1.30500366e-05f, -4.04430557e-06f, -0.000155715388f,
    1.84011287e-06f, 6.84943416e-06f, -2.42907863e-05f, -0.000204153606f, 0.000103158891f,
    -2.45545543e-05f, -3.29133472e-05f, -0.000188796272f, 0.000250016077f, -5.83905457e-05f,
    -1.29205284e-06f, -7.58050446e-05f, 0.000392887014f, -4.64519144e-05f, 5.81077911e-05f,
    0.000125092527f, 0.000459828443f, 2.13458479e-05f, 8.32443548e-05f, 0.000349695096f,
    0.000397224561f, 8.33243976e-05f, 3.45140979e-05f, 0.000506327196f, 0.000209727586f,
    7.39564421e-05f, -4.37688577e-05f, 0.000528151984f, -3.36084122e-05f, 8.24194922e-06f,
    -7.39348761e-05f, 0.000413601578f, -0.000236694046f, -4.2201973e-05f, -4.03747326e-05f,
    0.000224210817f, -0.000331415358f, -4.06359432e-05f, 5.91055914e-06f, 4.32889356e-05f,
    -0.000310287171f, -1.23328982e-05f, 2.20194615e-05f, -7.14140479e-05f, -0.000217302746f,
    6.3680136e-06f, 1.20875256e-05f, -0.000108806249f, -0.000111408561f, 7.62178934e-06f,
    -2.4635645e-07f, -9.31604081e-05f, -3.30838557e-05f, 2.56955423e-06f, -4.18297486e-06f,
    -5.81352906e-05f, 6.69442898e-06f, -4.19980722e-07f, -2.82405222e-06f, -2.71843146e-05f,
    1.74412526e-05f, -7.64246295e-07f, -1.00545913e-06f, -8.6103073e-06f, 1.4215414e-05f,
    -3.40831093e-07f, -1.90621918e-07f, -7.07790718e-07f, 7.94213429e-06f, -7.43388426e-08f,
    6.85313095e-09f, 1.28109116e-06f, 3.32846298e-06f, 7.49714673e-08f, -3.53902578e-08f,
    8.85222107e-07f, 1.72387809e-06f, 2.28639692e-07f, -2.64961272e-07f, 3.54880467e-06f,
    2.49361619e-06f, 3.57627869e-07f, -8.46106559e-07f, 8.9709647e-06f, 1.16648152e-06f,
    6.05359674e-09f, -1.64145604e-06f, 1.64937228e-05f, -6.10155985e-06f, -1.09756365e-06f,
    -1.52597204e-06f, 2.13151798e-05f, -2.36909837e-05f, -1.33551657e-06f, 9.73697752e-07f,
    1.32503919e-05f, -5.21903858e-05f, 2.83867121e-06f, 4.08105552e-06f, -1.97966583e-05f,
    -8.2491897e-05f, 1.0904856e-05f, 7.20843673e-07f, -8.21580179e-05f, -9.37147997e-05f,
    1.20964833e-05f, -1.28322281e-05f, -0.000159376767f, -6.12116419e-05f, -4.51505184e-06f,
    -2.38395296e-05f, -0.000216571148f, 2.5597401e-05f, -2.8016977e-05f, -1.19130127e-05f,
    -0.000214081258f, 0.000147096347f, -2.92756595e-05f, 1.94320455e-05f, -0.000134335831f,
    0.000255289953f, 0.0f, 3.69166955e-05f, 0.0f, 0.000298744068f, 2.92756595e-05f,
    1.94320455e-05f, 0.000134335831f, 0.000255289953f, 2.8016977e-05f, -1.19130127e-05f,
    0.000214081258f, 0.000147096347f, 4.51505184e-06f, -2.38395296e-05f, 0.000216571148f,
    2.5597401e-05f, -1.20964833e-05f, -1.28322281e-05f, 0.000159376767f, -6.12116419e-05f,
    -1.0904856e-05f, 7.20843673e-07f, 8.21580179e-05f, -9.37147997e-05f, -2.83867121e-06f,
    4.08105552e-06f, 1.97966583e-05f, -8.2491897e-05f, 1.33551657e-06f, 9.73697752e-07f,
    -1.32503919e-05f, -5.21903858e-05f, 1.09756365e-06f, -1.52597204e-06f, -2.13151798e-05f,
    -2.36909837e-05f, -6.05359674e-09f, -1.64145604e-06f, -1.64937228e-05f, -6.10155985e-06f,
    -3.57627869e-07f, -8.46106559e-07f, -8.9709647e-06f, 1.16648152e-06f, -2.28639692e-07f,
    -2.64961272e-07f, -3.54880467e-06f, 2.49361619e-06f, -7.49714673e-08f, -3.53902578e-08f,
    -8.85222107e-07f, 1.72387809e-06f, -1.30426407e-08f, 7.78440921e-08f, -8.69091082e-07f,
    5.1034948e-07f, 5.14451379e-08f, 2.9806526e-07f, -1.14000818e-06f, 1.94634231e-06f,
    2.66079439e-07f, 6.53974837e-07f, -9.21139289e-08f, 4.70214172e-06f, 6.09126346e-07f,
    9.2099566e-07f, 4.31780018e-06f, 8.0549562e-06f, 6.26559086e-07f, 8.43629948e-07f,
    1.39705426e-05f, 8.88778777e-06f, -3.11890147e-07f, 9.4402435e-07f, 2.7936745e-05f,
    1.5140331e-06f, -1.41563089e-06f, 2.60085244e-06f, 3.95331081e-05f, -1.9508916e-05f,
    2.76323902e-07f, 5.36390417e-06f, 3.65614651e-05f, -5.34701539e-05f, 5.69953227e-06f,
    4.57673468e-06f, 7.72206749e-06f, -8.84118854e-05f, 8.59141528e-06f, -3.23530776e-06f,
    -4.68015351e-05f, -0.000103265746f, 1.45733395e-06f, -1.13649003e-05f, -0.00010891509f,
    -7.98503752e-05f, -1.07418937e-05f, -8.06098797e-06f, -0.000148917839f, -1.79517792e-05f,
    -1.31101879e-05f, 5.43041779e-06f, -0.000143512283f, 5.94447374e-05f, -1.89568675e-06f,
    1.32956447e-05f, -9.26069915e-05f, 0.000117994641f, 9.06668902e-06f, 7.00570763e-06f,
    -2.05518591e-05f, 0.000133477341f, 8.36275558e-06f, -3.78733989e-06f, 3.99262281e-05f,
    0.000106113592f, 7.93937772e-07f, -7.26641838e-06f, 6.79769655e-05f, 5.70563134e-05f,
    -3.59746241e-06f, -3.98824341e-06f, 6.36619661e-05f, 1.19562465e-05f, -2.84008252e-06f,
    -8.38078222e-07f, 4.17490155e-05f, -1.41592427e-05f, -8.88065642e-07f, -4.46986377e-07f,
    1.86836787e-05f, -2.08248457e-05f, -1.53492266e-07f, -1.03958064e-06f, 3.59405044e-06f,
    -1.61632797e-05f, -2.2052491e-07f, -1.08195957e-06f, -2.64256869e-06f, -8.74886064e-06f,
    -2.74283479e-07f, -6.50576624e-07f, -3.39005055e-06f, -3.25978181e-06f, -1.7438677e-07f,
    -2.47141173e-07f, -2.18237938e-06f, -5.70164332e-07f, -6.42666222e-08f, -4.58215439e-08f,
    -9.75411808e-07f, 2.53668617e-07f, -4.2873662e-08f, -5.66484957e-08f, -2.77469582e-07f,
    -4.20060928e-07f, -2.13223046e-07f, -1.6157e-07f, -1.01014609e-06f, -4.89587876e-07f,
    -5.30822604e-07f, -3.03063104e-07f, -2.32570233e-06f, 2.02607197e-07f, -8.96876543e-07f,
    -4.49533474e-07f, -3.66753056e-06f, 2.66141319e-06f, -1.13107546e-06f, -6.83560245e-07f,
    -3.209336e-06f, 7.55351311e-06f, -1.33114361e-06f, -1.1478088e-06f, 1.92960124e-06f,
    1.37348134e-05f, -1.9572235e-06f, -1.46095181e-06f, 1.37584138e-05f, 1.6987904e-05f,
    -2.74209629e-06f, -5.03779006e-07f, 3.01917698e-05f, 1.0984666e-05f, -1.87531191e-06f,
    1.73754154e-06f, 4.32176166e-05f, -8.40452412e-06f, 1.46519062e-06f, 2.43870136e-06f,
    4.18004383e-05f, -3.76424359e-05f, 3.89684965e-06f, -7.78014623e-07f, 1.95904413e-05f,
    -6.40818907e-05f, 1.38345524e-06f, -4.6757059e-06f, -1.80060215e-05f, -7.22170953e-05f,
    -3.65855749e-06f, -3.65855749e-06f, -5.45027215e-05f, -5.45027215e-05f, -4.6757059e-06f,
    1.38345524e-06f, -7.22170953e-05f, -1.80060215e-05f, -7.78014623e-07f, 3.89684965e-06f,
    -6.40818907e-05f, 1.95904413e-05f, 2.43870136e-06f, 1.46519062e-06f, -3.76424359e-05f,
    4.18004383e-05f, 1.73754154e-06f, -1.87531191e-06f, -8.40452412e-06f, 4.32176166e-05f,
    -5.03779006e-07f, -2.74209629e-06f, 1.0984666e-05f, 3.01917698e-05f, -1.46095181e-06f,
    -1.9572235e-06f, 1.6987904e-05f, 1.37584138e-05f, -1.1478088e-06f, -1.33114361e-06f,
    1.37348134e-05f, 1.92960124e-06f, -6.83560245e-07f, -1.13107546e-06f, 7.55351311e-06f,
    -3.209336e-06f, -4.49533474e-07f, -8.96876543e-07f, 2.66141319e-06f, -3.66753056e-06f,
    -3.03063104e-07f, -5.30822604e-07f, 2.02607197e-07f, -2.32570233e-06f, -1.6157e-07f,
    -2.13223046e-07f, -4.89587876e-07f, -1.01014609e-06f, -5.66484957e-08f, -4.2873662e-08f,
    -4.20060928e-07f, -2.77469582e-07f, 6.34145536e-08f, 1.14466001e-08f, 1.95970856e-07f,
    -1.40391109e-07f, 2.47616526e-07f, -1.44454697e-08f, 1.98221642e-07f, -4.94304857e-07f,
    5.722016e-07f, -8.44154329e-08f, -2.07448394e-07f, -1.08313839e-06f, 9.9581132e-07f,
    -1.7710893e-07f, -1.4774746e-06f, -1.54827922e-06f, 1.43594298e-06f, -2.44115228e-07f,
    -3.77031756e-06f, -9.11411234e-07f, 1.79777078e-06f, -3.30739425e-07f, -6.20103583e-06f,
    2.14652005e-06f, 1.85014642e-06f, -5.94995527e-07f, -6.40924418e-06f, 8.12528742e-06f,
    1.21834842e-06f, -8.81888866e-07f, -1.49477762e-06f, 1.51412405e-05f, 1.16486184e-07f,
    -5.02305681e-07f, 9.46212549e-06f, 1.8583487e-05f, -2.27922484e-07f, 6.70774568e-07f,
    2.29850557e-05f, 1.34786596e-05f, 8.41812891e-07f, 1.19057245e-06f, 3.17181984e-05f,
    -1.23923053e-06f, 1.73167086e-06f, -8.72884556e-08f, 2.89269756e-05f, -2.01562343e-05f,
    6.7836811e-07f, -1.63772552e-06f, 1.39725989e-05f, -3.37328383e-05f, -1.16275396e-06f,
    -1.28619843e-06f, -6.20184983e-06f, -3.47070709e-05f, -1.43711338e-06f, 2.46610199e-07f,
    -2.15518849e-05f, -2.33044211e-05f, -3.13143715e-07f, 6.35474748e-07f, -2.57837419e-05f,
    -6.7220376e-06f, 2.72815583e-07f, -4.37551904e-07f, -1.98312428e-05f, 6.44977672e-06f,
    -2.37912829e-07f, -1.48509196e-06f, -9.64950686e-06f, 1.17634418e-05f, -8.87525744e-07f,
    -1.72897649e-06f, -1.21342578e-06f, 1.02774657e-05f, -1.03734783e-06f, -1.50508401e-06f,
    2.86697559e-06f, 5.90261334e-06f, -8.42749444e-07f, -1.1879805e-06f, 3.31048204e-06f,
    2.02155206e-06f, -5.78910033e-07f, -8.29379871e-07f, 2.13953103e-06f, -5.00664541e-08f,
    -3.44916941e-07f, -4.64298381e-07f, 9.12582664e-07f, -6.19206332e-07f, -1.64876823e-07f,
    -1.85305808e-07f, 2.0936244e-07f, -4.89690194e-07f, -5.29348299e-08f, -3.67468935e-08f,
    -3.9300815e-08f, -2.37843821e-07f, -5.11799279e-08f, 3.08825427e-08f, 6.39850199e-08f,
    8.77653434e-08f, -1.70558991e-07f, 1.63803051e-07f, 2.25522612e-07f, 7.47092628e-08f,
    -3.76038315e-07f, 4.18244724e-07f, 4.71617568e-07f, -1.41857399e-07f, -6.46595367e-07f,
    7.73745398e-07f, 5.98469228e-07f, -7.52689289e-07f, -9.03613739e-07f, 1.14341685e-06f,
    1.22930558e-07f, -1.74537536e-06f, -1.0167762e-06f, 1.4053561e-06f, -1.49427262e-06f,
    -2.5631191e-06f, -8.71568318e-07f, 1.41814689e-06f, -4.22446601e-06f, -2.01798889e-06f,
    -5.69201859e-07f, 1.06137134e-06f, -6.80498943e-06f, 1.04089509e-06f, -4.45200584e-07f,
    5.10166501e-07f, -6.90711204e-06f, 6.42704663e-06f, -5.75159333e-07f, 2.7232781e-07f,
    -2.67003065e-06f, 1.17544405e-05f, -4.63194965e-07f, 5.06399488e-07f, 5.25364567e-06f,
    1.33636131e-05f, 1.27643844e-07f, 5.64020581e-07f, 1.31805282e-05f, 8.98039343e-06f,
    5.10912628e-07f, -0.0f, 1.6516733e-05f, -4.33680869e-19f, 1.27643844e-07f, -5.64020581e-07f,
    1.31805282e-05f, -8.98039343e-06f, -4.63194965e-07f, -5.06399488e-07f, 5.25364567e-06f,
    -1.33636131e-05f, -5.75159333e-07f, -2.7232781e-07f, -2.67003065e-06f, -1.17544405e-05f,
    -4.45200584e-07f, -5.10166501e-07f, -6.90711204e-06f, -6.42704663e-06f, -5.69201859e-07f,
    -1.06137134e-06f, -6.80498943e-06f, -1.04089509e-06f, -8.71568318e-07f, -1.41814689e-06f,
    -4.22446601e-06f, 2.01798889e-06f, -1.0167762e-06f, -1.4053561e-06f, -1.49427262e-06f,
    2.5631191e-06f, -9.03613739e-07f, -1.14341685e-06f, 1.22930558e-07f, 1.74537536e-06f,
    -6.46595367e-07f, -7.73745398e-07f, 5.98469228e-07f, 7.52689289e-07f, -3.76038315e-07f,
    -4.18244724e-07f, 4.71617568e-07f, 1.41857399e-07f, -1.70558991e-07f, -1.63803051e-07f,
    2.25522612e-07f, -7.47092628e-08f, -5.11799279e-08f, -3.08825427e-08f, 6.39850199e-08f,
    -8.77653434e-08f, 1.71809198e-08f, -5.39184271e-08f, -3.58160506e-08f, 2.52013788e-08f,
    2.13703775e-08f, -2.26480296e-07f, -2.33891537e-08f, 9.46176471e-08f, 1.44821444e-08f,
    -5.48541323e-07f, 8.37102831e-08f, 1.89942895e-07f, -1.43744883e-08f, -9.90316266e-07f,
    3.58514143e-07f, 2.06834599e-07f, -6.78225618e-08f, -1.42027795e-06f, 7.53837753e-07f,
    -7.61734853e-08f, -1.34661093e-07f, -1.65669474e-06f, 9.64768446e-07f, -8.50226343e-07f,
    -1.76409401e-07f, -1.57559657e-06f, 4.51285587e-07f, -1.97564509e-06f, -1.326828e-07f,
    -1.24030362e-06f, -1.16182821e-06f, -2.74088529e-06f, -4.32368346e-08f, -8.73730755e-07f,
    -3.48961953e-06f, -2.10947564e-06f, -4.70869814e-08f, -5.98743782e-07f, -5.18995785e-06f,
    4.33144891e-07f, -1.52611847e-07f, -3.14937694e-07f, -4.70532723e-06f, 4.04359116e-06f,
    -1.40991645e-07f, -8.84710527e-09f, -1.59820149e-06f, 6.70422605e-06f, 3.57283518e-08f,
    8.62558664e-08f, 2.73133651e-06f, 6.59402986e-06f, 9.34402991e-08f, -1.0595199e-07f,
    5.87070281e-06f, 3.61050456e-06f, -1.14781706e-07f, -3.30607435e-07f, 6.1864198e-06f,
    -4.67917914e-07f, -3.9008026e-07f, -4.5667133e-07f, 3.97613439e-06f, -3.36357493e-06f,
    -5.87247882e-07f, -6.48394007e-07f, 9.75909188e-07f, -3.95915822e-06f, -7.83206133e-07f,
    -9.70847964e-07f, -1.11656198e-06f, -2.75963521e-06f, -9.89374712e-07f, -1.23885525e-06f,
    -1.71609906e-06f, -1.07788492e-06f, -1.07624032e-06f, -1.26667987e-06f, -1.28339514e-06f,
    8.09935372e-08f, -9.56330382e-07f, -1.05224592e-06f, -5.86906538e-07f, 4.79180983e-07f,
    -6.90095021e-07f, -7.10423649e-07f, -1.07253641e-07f, 3.99761944e-07f, -3.98117692e-07f,
    -3.77636866e-07f, 7.51177964e-08f, 1.93502018e-07f, -1.75256901e-07f, -1.45034619e-07f,
    8.34434104e-08f, 5.03661539e-08f, -5.02748314e-08f, -2.59773412e-08f, 4.31458389e-08f,
    -7.50570717e-09f, 2.22294645e-08f, 4.96022601e-08f, -9.26547017e-09f, -1.11228173e-08f,
    1.27976321e-07f, 1.79539711e-07f, -3.74654725e-08f, -2.24246333e-09f, 3.38868972e-07f,
    4.14920663e-07f, -7.14429973e-08f, 4.75150479e-08f, 6.42002249e-07f, 7.24493475e-07f,
    -6.24658441e-08f, 1.63958859e-07f, 9.50952824e-07f, 1.01118565e-06f, 8.40627692e-08f,
    3.0755632e-07f, 1.14070099e-06f, 1.15350974e-06f, 4.22529695e-07f, 3.28714549e-07f,
    1.12110433e-06f, 1.09189727e-06f, 8.38581968e-07f, 7.06694969e-09f, 9.1553585e-07f,
    8.8016435e-07f, 9.79175752e-07f, -7.4168878e-07f, 6.44513477e-07f, 6.04462286e-07f,
    4.43546583e-07f, -1.62287154e-06f, 4.00218426e-07f, 3.31840539e-07f, -8.16867043e-07f,
    -1.98764405e-06f, 1.9090875e-07f, 1.20672226e-07f, -2.21518371e-06f, -1.28463785e-06f,
    3.26559579e-08f, 3.4242948e-08f, -2.82217025e-06f, 3.69163303e-07f, -2.70287153e-08f,
    2.70287153e-08f, -2.08414781e-06f, 2.08414781e-06f, -3.4242948e-08f, -3.26559579e-08f,
    -3.69163303e-07f, 2.82217025e-06f, -1.20672226e-07f, -1.9090875e-07f, 1.28463785e-06f,
    2.21518371e-06f, -3.31840539e-07f, -4.00218426e-07f, 1.98764405e-06f, 8.16867043e-07f,
    -6.04462286e-07f, -6.44513477e-07f, 1.62287154e-06f, -4.43546583e-07f, -8.8016435e-07f,
    -9.1553585e-07f, 7.4168878e-07f, -9.79175752e-07f, -1.09189727e-06f, -1.12110433e-06f,
    -7.06694969e-09f, -8.38581968e-07f, -1.15350974e-06f, -1.14070099e-06f, -3.28714549e-07f,
    -4.22529695e-07f, -1.01118565e-06f, -9.50952824e-07f, -3.0755632e-07f, -8.40627692e-08f,
    -7.24493475e-07f, -6.42002249e-07f, -1.63958859e-07f, 6.24658441e-08f, -4.14920663e-07f,
    -3.38868972e-07f, -4.75150479e-08f, 7.14429973e-08f, -1.79539711e-07f, -1.27976321e-07f,
    2.24246333e-09f, 3.74654725e-08f, -4.96022601e-08f, -2.22294645e-08f, 1.11228173e-08f,
    9.26547017e-09f, -4.79985864e-08f, -2.06729887e-08f, 9.87921411e-10f, -5.70244474e-09f,
    -2.09139017e-07f, -4.94749557e-08f, -4.72558526e-09f, -1.69763439e-08f, -5.15713054e-07f,
    -8.98767922e-08f, -2.65322413e-08f, -2.84025123e-08f, -9.38485698e-07f, -1.29078231e-07f,
    -7.34988035e-08f, -1.85149513e-08f, -1.35285597e-06f, -1.49502469e-07f, -1.20598941e-07f,
    4.99909483e-08f, -1.58877674e-06f, -1.41100998e-07f, -1.00342056e-07f, 1.85985328e-07f,
    -1.54270663e-06f, -1.10639853e-07f, 6.55981296e-08f, 3.22329498e-07f, -1.25610461e-06f,
    -7.1197384e-08f, 3.75942165e-07f, 3.00434294e-07f, -8.59655643e-07f, -3.23657581e-08f,
    6.62030686e-07f, -7.94517252e-09f, -4.91292667e-07f, -6.76747325e-09f, 6.49134449e-07f,
    -5.44725481e-07f, -2.31118463e-07f, -6.45951648e-09f, 1.90698998e-07f, -9.92447667e-07f,
    -1.03087139e-07f, -1.88547933e-08f, -5.32917454e-07f, -9.89333103e-07f, -6.89640913e-08f,
    -2.85658626e-08f, -1.07483686e-06f, -4.45212009e-07f, -8.62259668e-08f, -5.95612626e-08f,
    -1.07639369e-06f, 3.22734593e-07f, -1.67992994e-07f, -1.58857858e-07f, -5.66921983e-07f,
    8.36611036e-07f, -3.52181701e-07f, -3.4261106e-07f, 7.38283177e-08f, 8.44186445e-07f,
    -6.30754414e-07f, -5.84982274e-07f, 4.62508297e-07f, 4.73744478e-07f, -9.38544247e-07f,
    -8.37855964e-07f, 4.78270351e-07f, 5.33921352e-08f, -1.16909246e-06f, -1.01262412e-06f,
    2.74306274e-07f, -1.81536493e-07f, -1.2232083e-06f, -1.02366141e-06f, 6.05589392e-08f,
    -2.02464037e-07f, -1.06232778e-06f, -8.50899426e-07f, -4.99273867e-08f, -1.20625259e-07f,
    -7.54881682e-07f, -5.72337512e-07f, -6.50635457e-08f, -3.88794561e-08f, -4.28216708e-07f,
    -3.01111726e-07f, -3.88447354e-08f, 1.32248168e-09f, -1.82867694e-07f, -1.12899535e-07f,
    -1.53455808e-08f, 8.66259509e-09f, -4.85581388e-08f, -1.93221172e-08f, -3.33367134e-09f,
    4.7308033e-09f, 4.71739767e-08f, -1.65198504e-08f, 6.50118093e-09f, -6.17497331e-10f,
    1.84657523e-07f, -9.85112862e-08f, 1.13360672e-08f, -3.73752806e-09f, 4.39384934e-07f,
    -2.64192522e-07f, 1.56468989e-08f, -1.2402201e-08f, 7.81892481e-07f, -5.047537e-07f,
    9.37471345e-09f, -3.04942525e-08f, 1.10658925e-06f, -7.52487324e-07f, -2.04188062e-08f,
    -4.45598438e-08f, 1.28178863e-06f, -9.08789843e-07f, -7.08980892e-08f, -2.52017784e-08f,
    1.23176142e-06f, -9.02715954e-07f, -1.09696252e-07f, 4.93497652e-08f, 9.89690534e-07f,
    -7.47387787e-07f, -7.1580061e-08f, 1.63923815e-07f, 6.67387383e-07f, -5.18981153e-07f,
    7.34717673e-08f, 2.38337677e-07f, 3.78506343e-07f, -3.02382745e-07f, 2.71065346e-07f,
    1.70714401e-07f, 1.8301057e-07f, -1.48132912e-07f, 3.78278912e-07f, -5.54730875e-08f,
    7.02733161e-08f, -6.88815618e-08f, 2.77496554e-07f, -3.20478762e-07f, 0.0f,
    -4.65308965e-08f, 0.0f, -4.38400718e-07f, -7.02733161e-08f, -6.88815618e-08f,
    -2.77496554e-07f, -3.20478762e-07f, -1.8301057e-07f, -1.48132912e-07f, -3.78278912e-07f,
    -5.54730875e-08f, -3.78506343e-07f, -3.02382745e-07f, -2.71065346e-07f, 1.70714401e-07f,
    -6.67387383e-07f, -5.18981153e-07f, -7.34717673e-08f, 2.38337677e-07f, -9.89690534e-07f,
    -7.47387787e-07f, 7.1580061e-08f, 1.63923815e-07f, -1.23176142e-06f, -9.02715954e-07f,
    1.09696252e-07f, 4.93497652e-08f, -1.28178863e-06f, -9.08789843e-07f, 7.08980892e-08f,
    -2.52017784e-08f, -1.10658925e-06f, -7.52487324e-07f, 2.04188062e-08f, -4.45598438e-08f,
    -7.81892481e-07f, -5.047537e-07f, -9.37471345e-09f, -3.04942525e-08f, -4.39384934e-07f,
    -2.64192522e-07f, -1.56468989e-08f, -1.2402201e-08f, -1.84657523e-07f, -9.85112862e-08f,
    -1.13360672e-08f, -3.73752806e-09f, -4.71739767e-08f, -1.65198504e-08f, -6.50118093e-09f,
    -6.17497331e-10f, -2.29225758e-08f, 4.22273239e-08f, -1.8987103e-09f, 6.33471009e-09f,
    -7.2412611e-08f, 1.91090663e-07f, -9.67351532e-10f, 8.4784979e-09f, -1.55690799e-07f,
    4.79164385e-07f, 1.6252325e-09f, 1.08900968e-08f, -2.57585839e-07f, 8.79033678e-07f,
    8.01252042e-09f, 7.50824913e-09f, -3.45959705e-07f, 1.27274063e-06f, 1.22220056e-08f,
    -4.99924191e-09f, -3.79831448e-07f, 1.50237247e-06f, 9.58330748e-10f, -2.24586234e-08f,
    -3.4881424e-07f, 1.46700506e-06f, -2.8048472e-08f, -3.12359916e-08f, -2.6932554e-07f,
    1.19610991e-06f, -6.49748415e-08f, -7.88485188e-09f, -1.7428863e-07f, 8.18343665e-07f,
    -7.58059784e-08f, 5.09174178e-08f, -9.65891473e-08f, 4.71112543e-07f, -2.98061522e-08f,
    1.12537883e-07f, -4.76186912e-08f, 2.29425709e-07f, 6.39950244e-08f, 1.23318372e-07f,
    -2.53917687e-08f, 8.99397463e-08f, 1.42913578e-07f, 5.27051647e-08f, -3.28196847e-08f,
    1.35943576e-08f, 1.45228498e-07f, -6.01556138e-08f, -8.1551697e-08f, -4.56423095e-08f,
    6.37869775e-08f, -1.38323344e-07f, -1.95899972e-07f, -1.28556977e-07f, -4.19479385e-08f,
    -1.32450566e-07f, -4.01425723e-07f, -2.64828032e-07f, -1.00652429e-07f, -5.85001665e-08f,
    -7.01897022e-07f, -4.55415659e-07f, -8.96069707e-08f, 1.75988699e-08f, -1.03621926e-06f,
    -6.55335441e-07f, -4.03687181e-08f, 5.1519585e-08f, -1.28397812e-06f, -7.9068036e-07f,
    2.2539175e-09f, 4.19204476e-08f, -1.33091908e-06f, -7.93756328e-07f, 1.65582872e-08f,
    1.52030033e-08f, -1.14459397e-06f, -6.55333054e-07f, 1.2177261e-08f, -5.10726528e-09f,
    -8.03711373e-07f, -4.39429982e-07f, 3.56573548e-10f, -1.09748415e-08f, -4.48910384e-07f,
    -2.28730343e-07f, -6.55124799e-09f, -8.84967388e-09f, -1.86324954e-07f, -8.39180601e-08f,
    -6.67922428e-09f, -5.3111826e-09f, -4.60679352e-08f, -1.36505189e-08f, -5.8219074e-09f,
    -3.13672555e-09f, -1.11697469e-08f, -4.53893207e-08f, -3.32407724e-09f, -4.50382442e-09f,
    -7.04233614e-08f, -1.88648357e-07f, -3.81369869e-09f, -5.11995957e-09f, -1.94521519e-07f,
    -4.56313415e-07f, -5.38596989e-09f, -5.06647346e-09f, -3.74088017e-07f, -8.20928335e-07f,
    -3.5966472e-09f, -3.3119758e-09f, -5.60001979e-07f, -1.17632248e-06f, 1.53612723e-09f,
    -1.71146397e-09f, -6.78490778e-07f, -1.37261463e-06f, 7.20352933e-09f, -6.77095802e-09f,
    -6.77325545e-07f, -1.32880643e-06f, 7.60136043e-09f, -1.54779922e-08f, -5.62863647e-07f,
    -1.07534947e-06f, -3.3194425e-09f, -2.56101327e-08f, -3.9151368e-07f, -7.30578449e-07f,
    -2.42497951e-08f, -2.20330474e-08f, -2.29504167e-07f, -4.19708073e-07f, -3.99786657e-08f,
    1.77761375e-10f, -1.15632446e-07f, -2.05168604e-07f, -3.29558354e-08f, 3.48930449e-08f,
    -5.59457547e-08f, -8.81281395e-08f, 3.87065796e-10f, 5.21118082e-08f, -4.56300455e-08f,
    -4.56300455e-08f, 3.80657994e-08f, 3.80657994e-08f, -8.81281395e-08f, -5.59457547e-08f,
    5.21118082e-08f, 3.87065796e-10f, -2.05168604e-07f, -1.15632446e-07f, 3.48930449e-08f,
    -3.29558354e-08f, -4.19708073e-07f, -2.29504167e-07f, 1.77761375e-10f, -3.99786657e-08f,
    -7.30578449e-07f, -3.9151368e-07f, -2.20330474e-08f, -2.42497951e-08f, -1.07534947e-06f,
    -5.62863647e-07f, -2.56101327e-08f, -3.3194425e-09f, -1.32880643e-06f, -6.77325545e-07f,
    -1.54779922e-08f, 7.60136043e-09f, -1.37261463e-06f, -6.78490778e-07f, -6.77095802e-09f,
    7.20352933e-09f, -1.17632248e-06f, -5.60001979e-07f, -1.71146397e-09f, 1.53612723e-09f,
    -8.20928335e-07f, -3.74088017e-07f, -3.3119758e-09f, -3.5966472e-09f, -4.56313415e-07f,
    -1.94521519e-07f, -5.06647346e-09f, -5.38596989e-09f, -1.88648357e-07f, -7.04233614e-08f,
    -5.11995957e-09f, -3.81369869e-09f, -4.53893207e-08f, -1.11697469e-08f, -4.50382442e-09f,
    -3.32407724e-09f, 3.80740595e-08f, 2.51456544e-08f, 4.46604931e-09f, 1.19004229e-09f,
    1.75872287e-07f, 9.31262392e-08f, 5.53514168e-09f, 1.86995419e-09f, 4.40301562e-07f,
    2.13131173e-07f, 6.11931439e-09f, 1.31295153e-09f, 8.09674873e-07f, 3.7271505e-07f,
    5.99651528e-09f, 2.46951837e-09f, 1.17879051e-06f, 5.2053457e-07f, 5.13249443e-09f,
    4.25605018e-09f, 1.39443193e-06f, 5.96375344e-07f, 7.04249503e-09f, 5.75918291e-09f,
    1.36538904e-06f, 5.6654801e-07f, 8.07220157e-09f, 4.07222833e-09f, 1.11542977e-06f,
    4.51591944e-07f, 1.04856621e-08f, -1.41501655e-09f, 7.65088828e-07f, 3.02766495e-07f,
    6.79611345e-09f, -8.24167223e-09f, 4.41771164e-07f, 1.7080032e-07f, -2.58467514e-09f,
    -1.17293366e-08f, 2.14218531e-07f, 8.13070855e-08f, -1.4111353e-08f, -5.57207702e-09f,
    8.00735407e-08f, 2.94549185e-08f, -1.63231828e-08f, 6.71231248e-09f, 1.08596843e-09f,
    -2.6217597e-09f, -7.08693548e-09f, 1.71093752e-08f, -7.74483127e-08f, -3.57927696e-08f,
    6.79591095e-09f, 1.62885545e-08f, -2.0896816e-07f, -9.39825782e-08f, 1.3918287e-08f,
    6.03817973e-09f, -4.33153446e-07f, -1.91605309e-07f, 1.01215347e-08f, -6.46625198e-09f,
    -7.5508774e-07f, -3.26911277e-07f, 1.02216424e-09f, -1.063332e-08f, -1.10805172e-06f,
    -4.69404227e-07f, -6.41391473e-09f, -8.41504999e-09f, -1.36608571e-06f, -5.648659e-07f,
    -8.58740901e-09f, -2.82840795e-09f, -1.40771328e-06f, -5.64311222e-07f, -9.05215369e-09f,
    -9.07438735e-10f, -1.20160428e-06f, -4.65457219e-07f, -6.63870381e-09f, -6.19739815e-10f,
    -8.36075913e-07f, -3.08977263e-07f, -5.98639005e-09f, -2.49396348e-09f, -4.62046728e-07f,
    -1.60633718e-07f, -5.25540589e-09f, -3.39861184e-09f, -1.90210685e-07f, -5.85102917e-08f,
    -5.23619326e-09f, -2.59167865e-09f, -4.47030857e-08f, -9.14176201e-09f, -3.99946076e-09f,
    -2.31648678e-09f, -4.39374475e-08f, 7.12002812e-09f, -4.33840963e-09f, 1.46889823e-09f,
    -1.90616262e-07f, 4.663627e-08f, -5.51212009e-09f, 1.78570814e-09f, -4.67043094e-07f,
    1.27291059e-07f, -5.94204419e-09f, 2.10898743e-09f, -8.4896169e-07f, 2.46011041e-07f,
    -6.93546065e-09f, 2.45053866e-09f, -1.22190465e-06f, 3.71168795e-07f, -7.14591319e-09f,
    1.82608517e-09f, -1.43524392e-06f, 4.51349592e-07f, -6.8943713e-09f, 2.69165201e-09f,
    -1.39488077e-06f, 4.51947784e-07f, -5.22509014e-09f, 2.25474328e-09f, -1.13454303e-06f,
    3.75963339e-07f, -1.55530799e-09f, 2.85231661e-09f, -7.74385626e-07f, 2.62831549e-07f,
    1.19893862e-09f, 2.21240737e-09f, -4.45781637e-07f, 1.53193525e-07f, 1.8933306e-09f,
    -1.91778793e-09f, -2.20066426e-07f, 7.57329914e-08f, -6.31470987e-10f, -4.40821335e-09f,
    -9.91332314e-08f, 2.84573183e-08f, -4.79655604e-09f, -4.73969086e-09f, -6.23506224e-08f,
    0.0f, -7.23145099e-09f, -2.16840434e-19f, -9.91332314e-08f, -2.84573183e-08f,
    -4.79655604e-09f, 4.73969086e-09f, -2.20066426e-07f, -7.57329914e-08f, -6.31470987e-10f,
    4.40821335e-09f, -4.45781637e-07f, -1.53193525e-07f, 1.8933306e-09f, 1.91778793e-09f,
    -7.74385626e-07f, -2.62831549e-07f, 1.19893862e-09f, -2.21240737e-09f, -1.13454303e-06f,
    -3.75963339e-07f, -1.55530799e-09f, -2.85231661e-09f, -1.39488077e-06f, -4.51947784e-07f,
    -5.22509014e-09f, -2.25474328e-09f, -1.43524392e-06f, -4.51349592e-07f, -6.8943713e-09f,
    -2.69165201e-09f, -1.22190465e-06f, -3.71168795e-07f, -7.14591319e-09f, -1.82608517e-09f,
    -8.4896169e-07f, -2.46011041e-07f, -6.93546065e-09f, -2.45053866e-09f, -4.67043094e-07f,
    -1.27291059e-07f, -5.94204419e-09f, -2.10898743e-09f, -1.90616262e-07f, -4.663627e-08f,
    -5.51212009e-09f, -1.78570814e-09f, -4.39374475e-08f, -7.12002812e-09f, -4.33840963e-09f,
    -1.46889823e-09f, 2.71977569e-08f, -3.42878472e-08f, 2.50632004e-09f, -4.06169498e-09f,
    1.10807569e-07f, -1.59615851e-07f, 3.53754426e-09f, -5.01214092e-09f, 2.65836917e-07f,
    -4.00232466e-07f, 3.64851349e-09f, -5.79332005e-09f, 4.76184908e-07f, -7.37148468e-07f,
    3.11493542e-09f, -6.50369714e-09f, 6.78550748e-07f, -1.07157427e-06f, 3.70850195e-09f,
    -6.32081942e-09f, 7.90307979e-07f, -1.26842224e-06f, 3.0695857e-09f, -5.25049337e-09f,
    7.63374601e-07f, -1.24122562e-06f, 2.41816611e-09f, -4.53034188e-09f, 6.16896102e-07f,
    -1.01598732e-06f, 2.03675521e-09f, -2.41203946e-09f, 4.17985348e-07f, -6.96883774e-07f,
    4.39638992e-10f, -6.13104123e-10f, 2.40034865e-07f, -4.02803522e-07f, 1.85901283e-09f,
    -1.1347886e-09f, 1.13125971e-07f, -1.98533854e-07f, 1.59401936e-09f, -6.59504618e-10f,
    3.78766956e-08f, -8.42993373e-08f, 1.53686563e-09f, -2.54699617e-09f, -1.54503823e-08f,
    -3.730052e-08f, -1.20006205e-09f, -2.89720603e-09f, -8.6391502e-08f, -3.28257634e-08f,
    -2.8877265e-09f, -7.14270254e-10f, -2.20376776e-07f, -6.03925017e-08f, -1.59348212e-09f,
    6.60801691e-10f, -4.54555391e-07f, -1.15094807e-07f, -2.11693729e-09f, 5.12103915e-10f,
    -7.88331533e-07f, -1.9721098e-07f, -7.44401818e-10f, -1.2265837e-10f, -1.15462296e-06f,
    -2.82200091e-07f, -3.14577298e-09f, -2.65366062e-10f, -1.41746636e-06f, -3.37891692e-07f,
    -4.91333685e-09f, -1.49353385e-09f, -1.45574211e-06f, -3.38077825e-07f, -5.88318416e-09f,
    -1.54213453e-09f, -1.23752523e-06f, -2.77909578e-07f, -7.09180137e-09f, -1.84718751e-09f,
    -8.57956252e-07f, -1.84529085e-07f, -6.80140033e-09f, -2.39621634e-09f, -4.70982172e-07f,
    -9.50319858e-08f, -6.67638433e-09f, -1.5166074e-09f, -1.91218234e-07f, -3.45126736e-08f,
    -6.04554051e-09f, -1.04269726e-09f, -4.34768879e-08f, -5.01345054e-09f, -4.64428807e-09f,
    -1.09981613e-09f, 3.14258619e-09f, 4.33772662e-08f, 6.69135025e-10f, 4.71431605e-09f,
    2.32399398e-08f, 1.9187091e-07f, 1.00030373e-09f, 6.60289645e-09f, 6.32532604e-08f,
    4.7342786e-07f, 1.29837474e-09f, 6.92558588e-09f, 1.22799634e-07f, 8.63676576e-07f,
    1.26233191e-09f, 6.28164587e-09f, 1.84994207e-07f, 1.24811174e-06f, 1.55530244e-09f,
    6.85238177e-09f, 2.24958711e-07f, 1.47074502e-06f, 4.21530283e-10f, 6.4007839e-09f,
    2.2452879e-07f, 1.43444231e-06f, 9.32146471e-10f, 4.6501567e-09f, 1.88212638e-07f,
    1.16896513e-06f, 8.80166884e-10f, 4.0521746e-09f, 1.30979871e-07f, 7.9946517e-07f,
    1.95576028e-10f, 2.11073004e-09f, 7.5693805e-08f, 4.61967858e-07f, 1.05079023e-09f,
    1.43631851e-09f, 3.58838754e-08f, 2.23847991e-07f, 1.24404228e-11f, 1.65582537e-09f,
    5.93401905e-09f, 9.07943161e-08f, 7.9503093e-10f, 8.53453364e-10f, -2.64602882e-08f,
    2.64602882e-08f, 7.01926683e-10f, -7.01926683e-10f, -9.07943161e-08f, -5.93401905e-09f,
    -8.53453364e-10f, -7.9503093e-10f, -2.23847991e-07f, -3.58838754e-08f, -1.65582537e-09f,
    -1.2440422e-11f, -4.61967858e-07f, -7.5693805e-08f, -1.43631851e-09f, -1.05079023e-09f,
    -7.9946517e-07f, -1.30979871e-07f, -2.11073004e-09f, -1.95576028e-10f, -1.16896513e-06f,
    -1.88212638e-07f, -4.0521746e-09f, -8.80166884e-10f, -1.43444231e-06f, -2.2452879e-07f,
    -4.6501567e-09f, -9.32146471e-10f, -1.47074502e-06f, -2.24958711e-07f, -6.4007839e-09f,
    -4.21530283e-10f, -1.24811174e-06f, -1.84994207e-07f, -6.85238177e-09f, -1.55530244e-09f,
    -8.63676576e-07f, -1.22799634e-07f, -6.28164587e-09f, -1.26233191e-09f, -4.7342786e-07f,
    -6.32532604e-08f, -6.92558588e-09f, -1.29837474e-09f, -1.9187091e-07f, -2.32399398e-08f,
    -6.60289645e-09f, -1.00030373e-09f, -4.33772662e-08f, -3.14258619e-09f, -4.71431605e-09f,
    -6.69135025e-10f, -3.17420366e-08f, -2.95548848e-08f, -3.62321995e-09f, -3.35832717e-09f,
    -1.43971405e-07f, -1.26790098e-07f, -5.10107689e-09f, -3.600511e-09f, -3.58059594e-07f,
    -3.13512544e-07f, -5.34672084e-09f, -4.13180201e-09f, -6.56551492e-07f, -5.70211057e-07f,
    -4.86788299e-09f, -5.09789677e-09f, -9.52339462e-07f, -8.22149104e-07f, -5.24202637e-09f,
    -4.05217015e-09f, -1.12586952e-06f, -9.66557536e-07f, -5.03985653e-09f, -4.77357531e-09f,
    -1.10084738e-06f, -9.42345991e-07f, -3.55006069e-09f, -3.28129324e-09f, -8.99202519e-07f,
    -7.6584115e-07f, -2.99199621e-09f, -1.59827995e-09f, -6.16605178e-07f, -5.23235315e-07f,
    -1.89544025e-09f, -5.97796646e-10f, -3.57293544e-07f, -3.02765955e-07f, -6.30347441e-10f,
    -4.93592944e-10f, -1.76110419e-07f, -1.47654575e-07f, -1.46539014e-09f, 1.84182961e-10f,
    -8.15182659e-08f, -6.23143848e-08f, -5.83212645e-10f, -1.93064259e-10f, -5.76268242e-08f,
    -2.3869811e-08f, 1.78203806e-11f, 7.38144268e-12f, -1.01705041e-07f, -1.35791973e-08f,
    -5.48910695e-10f, -2.75876599e-10f, -2.28936429e-07f, -2.01213251e-08f, -9.05950259e-10f,
    -1.16642429e-09f, -4.66732558e-07f, -3.85568306e-08f, -7.9474588e-10f, -9.67000369e-11f,
    -8.05988975e-07f, -6.60224515e-08f, -1.76298465e-09f, -9.17572573e-10f, -1.17736363e-06f,
    -9.43007379e-08f, -3.24581539e-09f, -9.85506232e-10f, -1.44475587e-06f, -1.12077444e-07f,
    -4.83049689e-09f, -1.90047297e-10f, -1.47956939e-06f, -1.1265054e-07f, -6.93914437e-09f,
    -1.88289107e-10f, -1.25475287e-06f, -9.20585066e-08f, -6.57198918e-09f, -8.41355319e-10f,
    -8.67452115e-07f, -6.10519422e-08f, -7.0468702e-09f, 1.62644245e-10f, -4.74873218e-07f,
    -3.14995212e-08f, -6.70232758e-09f, -8.59077087e-10f, -1.91457289e-07f, -1.21490178e-08f,
    -6.15295193e-09f, -1.06106046e-09f, -4.33434693e-08f, -1.54654867e-09f, -4.93669949e-09f,
    -1.87307461e-10f, 4.33064997e-08f, -0.0f, 5.12227416e-09f, -0.0f, 1.90921128e-07f, -0.0f,
    5.58793545e-09f, -0.0f, 4.75440174e-07f, -0.0f, 6.51925802e-09f, -0.0f, 8.68923962e-07f,
    -0.0f, 7.91624188e-09f, -0.0f, 1.25728548e-06f, -0.0f, 6.51925802e-09f, -0.0f,
    1.48219988e-06f, -0.0f, 6.98491931e-09f, -0.0f, 1.4482066e-06f, -0.0f, 5.12227416e-09f,
    -0.0f, 1.1799857e-06f, -0.0f, 2.79396772e-09f, -0.0f, 8.07456672e-07f, -0.0f,
    9.31322575e-10f, -0.0f, 4.67058271e-07f, -0.0f, 1.39698386e-09f, -0.0f, 2.25845724e-07f,
    -0.0f, -4.65661287e-10f, 0.0f, 8.52160156e-08f, -0.0f, 4.65661287e-10f, -0.0f, 0.0f, -0.0f,
    0.0f, -0.0f, -8.52160156e-08f, 0.0f, -4.65661287e-10f, 0.0f, -2.25845724e-07f, 0.0f,
    4.65661287e-10f, -0.0f, -4.67058271e-07f, 0.0f, -1.39698386e-09f, 0.0f, -8.07456672e-07f,
    0.0f, -9.31322575e-10f, 0.0f, -1.1799857e-06f, 0.0f, -2.79396772e-09f, 0.0f,
    -1.4482066e-06f, 0.0f, -5.12227416e-09f, 0.0f, -1.48219988e-06f, 0.0f, -6.98491931e-09f,
    0.0f, -1.25728548e-06f, 0.0f, -6.51925802e-09f, 0.0f, -8.68923962e-07f, 0.0f,
    -7.91624188e-09f, 0.0f, -4.75440174e-07f, 0.0f, -6.51925802e-09f, 0.0f, -1.90921128e-07f,
    0.0f, -5.58793545e-09f, 0.0f, -4.33064997e-08f, 0.0f, -5.12227416e-09f, 0.0f, 0.0f, -0.0f,
    9.62992199e-05f, -0.0f, 0.0f, -0.0f, 0.000197920017f, -0.0f, 0.0f, -0.0f, 0.00037606433f,
    -0.0f, 0.0f, -0.0f, 0.000659445766f, -0.0f, 0.0f, -0.0f, 0.00106466096f, -0.0f, 0.0f, -0.0f,
    0.0015772921f, -0.0f, 0.0f, -0.0f, 0.00213386165f, -0.0f, 0.0f, -0.0f, 0.00261633657f,
    -0.0f, 0.0f, -0.0f, 0.00287078135f, -0.0f, 0.0f, -0.0f, 0.0027528652f, -0.0f, 0.0f, -0.0f,
    0.00218738383f, -0.0f, 0.0f, -0.0f, 0.00121516222f, -0.0f, 0.0f, -0.0f, 0.0f, -0.0f, 0.0f,
    -0.0f, -0.00121516222f, 0.0f, 0.0f, -0.0f, -0.00218738383f, 0.0f, 0.0f, -0.0f,
    -0.0027528652f, 0.0f, 0.0f, -0.0f, -0.00287078135f, 0.0f, 0.0f, -0.0f, -0.00261633657f,
    0.0f, 0.0f, -0.0f, -0.00213386165f, 0.0f, 0.0f, -0.0f, -0.0015772921f, 0.0f, 0.0f, -0.0f,
    -0.00106466096f, 0.0f, 0.0f, -0.0f, -0.000659445766f, 0.0f, 0.0f, -0.0f, -0.00037606433f,
    0.0f, 0.0f, -0.0f, -0.000197920017f, 0.0f, 0.0f, -0.0f, -9.62992199e-05f, 0.0f,
    -4.3679891e-05f, 1.80928037e-05f, 4.18796189e-05f, 8.95133198e-05f, -8.96267593e-05f,
    3.71246169e-05f, 7.64499637e-05f, 0.000190061619f, -0.00017275913f, 7.15591741e-05f,
    0.000124813072f, 0.000373259245f, -0.000312826625f, 0.000129577034f, 0.000178079121f,
    0.000677236705f, -0.000532135018f, 0.000220417554f, 0.000210960163f, 0.00113350886f,
    -0.000850348559f, 0.000352225907f, 0.000176874921f, 0.0017465119f, -0.00127652509f,
    0.000528754026f, 1.11737081e-05f, 0.00247023581f, -0.00180018775f, 0.000745662197f,
    -0.000352639356f, 0.00319397077f, -0.0023848631f, 0.000987842679f, -0.000954216521f,
    0.00375166931f, -0.00296800933f, 0.0012293898f, -0.00177477731f, 0.00396272913f,
    -0.00346995401f, 0.00143730198f, -0.00271918927f, 0.00369605212f, -0.00381099922f,
    0.00157856755f, -0.00362696685f, 0.0029316165f, -0.0039319722f, 0.0016286762f,
    -0.00431505311f, 0.00178735342f, -0.00381099922f, 0.00157856755f, -0.00463761855f,
    0.000491686922f, -0.00346995401f, 0.00143730198f, -0.00453626085f, -0.000690746296f,
    -0.00296800933f, 0.0012293898f, -0.00405702973f, -0.00154711562f, -0.0023848631f,
    0.000987842679f, -0.00332756364f, -0.00197809772f, -0.00180018775f, 0.000745662197f,
    -0.00250783213f, -0.00200912473f, -0.00127652509f, 0.000528754026f, -0.00173881941f,
    -0.00175462151f, -0.000850348559f, 0.000352225907f, -0.001109901f, -0.00136003993f,
    -0.000532135018f, 0.000220417554f, -0.000652340415f, -0.000950683141f, -0.000312826625f,
    0.000129577034f, -0.000352957693f, -0.000604799599f, -0.00017275913f, 7.15591741e-05f,
    -0.000175677982f, -0.000352190313f, -8.96267593e-05f, 3.71246169e-05f, -8.03355651e-05f,
    -0.000188452148f, -4.3679891e-05f, 1.80928037e-05f, -3.36821104e-05f, -9.29088346e-05f,
    -6.31054791e-05f, -6.31054791e-05f, -6.29778733e-05f, 8.33382655e-05f, -0.000129485823f,
    -0.000129485823f, -0.00014955888f, 0.000161949763f, -0.000249588833f, -0.000249588833f,
    -0.000324986962f, 0.000285850401f, -0.00045194765f, -0.00045194765f, -0.00064748025f,
    0.00045403422f, -0.000768787519f, -0.000768787519f, -0.00118411984f, 0.000638567086f,
    -0.0012285182f, -0.0012285182f, -0.00198879861f, 0.000769942591f, -0.00184422475f,
    -0.00184422475f, -0.00306740636f, 0.000733829744f, -0.00260077277f, -0.00260077277f,
    -0.00434147939f, 0.000391319278f, -0.00344546558f, -0.00344546558f, -0.00563100632f,
    -0.000372866809f, -0.00428795023f, -0.00428795023f, -0.0066774385f, -0.00158653408f,
    -0.00501312129f, -0.00501312129f, -0.00721296761f, -0.00314006303f, -0.00550583703f,
    -0.00550583703f, -0.00705587585f, -0.00478397682f, -0.00568060996f, -0.00568060996f,
    -0.00618973142f, -0.00618973142f, -0.00550583703f, -0.00550583703f, -0.00478397682f,
    -0.00705587585f, -0.00501312129f, -0.00501312129f, -0.00314006303f, -0.00721296761f,
    -0.00428795023f, -0.00428795023f, -0.00158653408f, -0.0066774385f, -0.00344546558f,
    -0.00344546558f, -0.000372866809f, -0.00563100632f, -0.00260077277f, -0.00260077277f,
    0.000391319278f, -0.00434147939f, -0.00184422475f, -0.00184422475f, 0.000733829744f,
    -0.00306740636f, -0.0012285182f, -0.0012285182f, 0.000769942591f, -0.00198879861f,
    -0.000768787519f, -0.000768787519f, 0.000638567086f, -0.00118411984f, -0.00045194765f,
    -0.00045194765f, 0.00045403422f, -0.00064748025f, -0.000249588833f, -0.000249588833f,
    0.000285850401f, -0.000324986962f, -0.000129485823f, -0.000129485823f, 0.000161949763f,
    -0.00014955888f, -6.31054791e-05f, -6.31054791e-05f, 8.33382655e-05f, -6.29778733e-05f,
    4.65217199e-05f, -0.000112313362f, -0.00010865731f, -1.07545202e-05f, 9.54573406e-05f,
    -0.000230454418f, -0.000228135061f, -5.33865059e-05f, 0.000183997574f, -0.000444209436f,
    -0.000437844399f, -0.000167352002f, 0.000333177217f, -0.000804360956f, -0.000765644596f,
    -0.00042287237f, 0.000566752744f, -0.00136826211f, -0.00121367467f, -0.000920277729f,
    0.000905667956f, -0.00218647602f, -0.00172960339f, -0.0017729518f, 0.00135956879f,
    -0.00328228949f, -0.00218416867f, -0.00306577608f, 0.00191729923f, -0.00462877005f,
    -0.00237587863f, -0.00479477691f, 0.00254000863f, -0.00613212306f, -0.00207982352f,
    -0.00681192661f, 0.00316109159f, -0.00763155008f, -0.00113702449f, -0.00881150365f,
    0.00369569054f, -0.00892218575f, 0.000449106417f, -0.0103865983f, 0.00405892218f,
    -0.00979910418f, 0.00246206834f, -0.0111518074f, 0.00418776553f, -0.0101101603f,
    0.00450914726f, -0.0108860442f, 0.00405892218f, -0.00979910418f, 0.00614457391f,
    -0.00962646399f, 0.00369569054f, -0.00892218575f, 0.00702686794f, -0.00766200013f,
    0.00316109159f, -0.00763155008f, 0.00703467149f, -0.00542667601f, 0.00254000863f,
    -0.00613212306f, 0.00628741691f, -0.00334610231f, 0.00191729923f, -0.00462877005f,
    0.00507041905f, -0.00171041931f, 0.00135956879f, -0.00328228949f, 0.00371227134f,
    -0.000623390602f, 0.000905667956f, -0.00218647602f, 0.00247668056f, -3.06519833e-05f,
    0.000566752744f, -0.00136826211f, 0.00150893221f, 0.000207462945f, 0.000333177217f,
    -0.000804360956f, 0.000840408378f, 0.000242376555f, 0.000183997574f, -0.000444209436f,
    0.000427938474f, 0.000191266998f, 9.54573406e-05f, -0.000230454418f, 0.000199065806f,
    0.000123565886f, 4.65217199e-05f, -0.000112313362f, 8.44369133e-05f, 6.92277245e-05f,
    0.000141629644f, 6.77626358e-21f, -5.28297351e-05f, -9.62062841e-05f, 0.000290606782f,
    1.35525272e-20f, -8.02590366e-05f, -0.000224491931f, 0.000560156011f, 2.71050543e-20f,
    -8.73641693e-05f, -0.0004752065f, 0.00101431319f, 5.42101086e-20f, -1.59857882e-05f,
    -0.000913776399f, 0.00172540336f, 8.13151629e-20f, 0.000240630747f, -0.00159591122f,
    0.00275718654f, 1.08420217e-19f, 0.000836378429f, -0.00252724695f, 0.00413902663f,
    2.16840434e-19f, 0.00193899358f, -0.00361547759f, 0.00583696505f, 2.16840434e-19f,
    0.0036585466f, -0.00464169681f, 0.00773271965f, 3.25260652e-19f, 0.00595558435f,
    -0.00528424932f, 0.00962352473f, 4.33680869e-19f, 0.00857419893f, -0.00521201733f,
    0.0112510407f, 4.33680869e-19f, 0.0110538732f, -0.00422454719f, 0.0123568503f,
    4.33680869e-19f, 0.0128457267f, -0.00237480551f, 0.0127490992f, 8.67361738e-19f,
    0.0135008413f, 6.50521303e-19f, 0.0123568503f, 4.33680869e-19f, 0.0128457267f,
    0.00237480551f, 0.0112510407f, 4.33680869e-19f, 0.0110538732f, 0.00422454719f,
    0.00962352473f, 4.33680869e-19f, 0.00857419893f, 0.00521201733f, 0.00773271965f,
    3.25260652e-19f, 0.00595558435f, 0.00528424932f, 0.00583696505f, 2.16840434e-19f,
    0.0036585466f, 0.00464169681f, 0.00413902663f, 2.16840434e-19f, 0.00193899358f,
    0.00361547759f, 0.00275718654f, 1.08420217e-19f, 0.000836378429f, 0.00252724695f,
    0.00172540336f, 8.13151629e-20f, 0.000240630747f, 0.00159591122f, 0.00101431319f,
    5.42101086e-20f, -1.59857882e-05f, 0.000913776399f, 0.000560156011f, 2.71050543e-20f,
    -8.73641693e-05f, 0.0004752065f, 0.000290606782f, 1.35525272e-20f, -8.02590366e-05f,
    0.000224491931f, 0.000141629644f, 6.77626358e-21f, -5.28297351e-05f, 9.62062841e-05f,
    5.69586373e-05f, 0.000137510317f, 4.3686141e-05f, -9.52523842e-05f, 0.000116871575f,
    0.000282152934f, 0.000132384317f, -0.000187502534f, 0.000225275275f, 0.000543862581f,
    0.000336977537f, -0.000326395471f, 0.000407920917f, 0.000984808197f, 0.000748074788f,
    -0.000491266081f, 0.000693896727f, 0.00167521485f, 0.00147358445f, -0.00060734665f,
    0.00110884383f, 0.00267698593f, 0.00259800442f, -0.000524258474f, 0.00166457158f,
    0.0040186313f, 0.00411602994f, -2.3494169e-05f, 0.002347423f, 0.00566718075f,
    0.00586480414f, 0.00112277607f, 0.00310982927f, 0.00750779221f, 0.00750026107f,
    0.00304185832f, 0.00387024507f, 0.00934359804f, 0.00856074039f, 0.00563950138f,
    0.00452477532f, 0.0109237731f, 0.0086222738f, 0.00853926409f, 0.00496949302f, 0.0119974175f,
    0.00748835597f, 0.0111451503f, 0.00512724183f, 0.0123782568f, 0.00531457411f, 0.0128305163f,
    0.00496949302f, 0.0119974175f, 0.00258574402f, 0.0131758787f, 0.00452477532f, 0.0109237731f,
    -5.86967544e-05f, 0.0121350391f, 0.00387024507f, 0.00934359804f, -0.00206562784f,
    0.0100410869f, 0.00310982927f, 0.00750779221f, -0.00315256696f, 0.00745440414f,
    0.002347423f, 0.00566718075f, -0.00335312006f, 0.00494096521f, 0.00166457158f,
    0.0040186313f, -0.00292708562f, 0.00289385975f, 0.00110884383f, 0.00267698593f,
    -0.00220777327f, 0.00146635983f, 0.000693896727f, 0.00167521485f, -0.00147144042f,
    0.000612522592f, 0.000407920917f, 0.000984808197f, -0.000876346312f, 0.000181591211f,
    0.000225275275f, 0.000543862581f, -0.000469075545f, 7.48265893e-06f, 0.000116871575f,
    0.000282152934f, -0.00022619417f, -3.897446e-05f, 5.69586373e-05f, 0.000137510317f,
    -9.82443744e-05f, -3.64628431e-05f, -0.000102164115f, 0.000102164115f, 9.2072245e-05f,
    -2.20207166e-05f, -0.000209626145f, 0.000209626145f, 0.00020847343f, -5.06397009e-06f,
    -0.000404065562f, 0.000404065562f, 0.000421125122f, 7.98663896e-05f, -0.00073166698f,
    0.00073166698f, 0.000757193659f, 0.000320419291f, -0.00124460796f, 0.00124460796f,
    0.00120283873f, 0.00084850454f, -0.00198887778f, 0.00198887778f, 0.00166114373f,
    0.00181438832f, -0.00298565906f, 0.00298565906f, 0.00192437437f, 0.00332054589f,
    -0.00421045581f, 0.00421045581f, 0.00169607461f, 0.00532689225f, -0.00557794701f,
    0.00557794701f, 0.000687138934f, 0.00757263135f, -0.0069418666f, 0.0069418666f,
    -0.00123191683f, 0.00957905035f, -0.00811586436f, 0.00811586436f, -0.00389377284f,
    0.0107743023f, -0.00891353376f, 0.00891353376f, -0.00680633541f, 0.010712686f,
    -0.0091964798f, 0.0091964798f, -0.00928632077f, 0.00928632077f, -0.00891353376f,
    0.00891353376f, -0.010712686f, 0.00680633541f, -0.00811586436f, 0.00811586436f,
    -0.0107743023f, 0.00389377284f, -0.0069418666f, 0.0069418666f, -0.00957905035f,
    0.00123191683f, -0.00557794701f, 0.00557794701f, -0.00757263135f, -0.000687138934f,
    -0.00421045581f, 0.00421045581f, -0.00532689225f, -0.00169607461f, -0.00298565906f,
    0.00298565906f, -0.00332054589f, -0.00192437437f, -0.00198887778f, 0.00198887778f,
    -0.00181438832f, -0.00166114373f, -0.00124460796f, 0.00124460796f, -0.00084850454f,
    -0.00120283873f, -0.00073166698f, 0.00073166698f, -0.000320419291f, -0.000757193659f,
    -0.000404065562f, 0.000404065562f, -7.98663896e-05f, -0.000421125122f, -0.000209626145f,
    0.000209626145f, 5.06397009e-06f, -0.00020847343f, -0.000102164115f, 0.000102164115f,
    2.20207166e-05f, -9.2072245e-05f, -0.000121211648f, -5.0207509e-05f, 6.42516607e-05f,
    4.91616447e-05f, -0.000248707889f, -0.000103018188f, 0.000112671754f, 0.000138984469f,
    -0.000479399168f, -0.000198573645f, 0.000158550945f, 0.000333391101f, -0.000868077041f,
    -0.000359569269f, 0.00014524367f, 0.000695757451f, -0.00147664989f, -0.000611648429f,
    -4.22351623e-05f, 0.00127620529f, -0.00235967943f, -0.000977411168f, -0.000576545252f,
    0.00206169044f, -0.00354229822f, -0.00146726798f, -0.00164377771f, 0.00291856891f,
    -0.00499544293f, -0.00206918013f, -0.00334779429f, 0.00356661971f, -0.00661788648f,
    -0.00274121831f, -0.0055929576f, 0.00363011705f, -0.00823609252f, -0.00341150118f,
    -0.00801493134f, 0.00278093829f, -0.00962896738f, -0.003988449f, -0.0100334715f,
    0.000924934051f, -0.0105753522f, -0.00438045431f, -0.0110453675f, -0.00167311635f,
    -0.0109110493f, -0.00451950449f, -0.0106821842f, -0.00442470564f, -0.0105753522f,
    -0.00438045431f, -0.00899332669f, -0.00662718248f, -0.00962896738f, -0.003988449f,
    -0.00644070841f, -0.00774876261f, -0.00823609252f, -0.00341150118f, -0.00370099186f,
    -0.00763383228f, -0.00661788648f, -0.00274121831f, -0.00138793781f, -0.00652169855f,
    -0.00499544293f, -0.00206918013f, 0.000154733003f, -0.00488922885f, -0.00354229822f,
    -0.00146726798f, 0.000901413616f, -0.00322606624f, -0.00235967943f, -0.000977411168f,
    0.00105015631f, -0.00186551444f, -0.00147664989f, -0.000611648429f, 0.00087254867f,
    -0.000932278228f, -0.000868077041f, -0.000359569269f, 0.000594677578f, -0.000389272027f,
    -0.000479399168f, -0.000198573645f, 0.000347855559f, -0.000123630656f, -0.000248707889f,
    -0.000103018188f, 0.000177947819f, -1.86059006e-05f, -0.000121211648f, -5.0207509e-05f,
    8.01953211e-05f, 1.06702537e-05f, 0.0f, -0.000112291418f, 2.7883616e-06f, 6.54098912e-05f,
    0.0f, -0.000230404374f, -3.17169615e-05f, 0.000141694196f, 0.0f, -0.000444117992f,
    -0.000139688331f, 0.000265964947f, 0.0f, -0.000804191339f, -0.00039423717f, 0.000425230945f,
    0.0f, -0.00136797631f, -0.000885465124f, 0.000553519581f, 0.0f, -0.00218601921f,
    -0.00167941779f, 0.0005078697f, 0.0f, -0.0032816038f, -0.00274953223f, 7.75456356e-05f,
    0.0f, -0.00462780427f, -0.0039106207f, -0.000947347842f, 0.0f, -0.00613084435f,
    -0.00480985921f, -0.00265190657f, 0.0f, -0.00762995845f, -0.00502090249f, -0.00487212231f,
    0.0f, -0.00892032497f, -0.00423092302f, -0.00715946453f, 0.0f, -0.00979706086f,
    -0.00243302714f, -0.00889814552f, 0.0f, -0.0101080518f, 0.0f, -0.00954919215f, 0.0f,
    -0.00979706086f, 0.00243302714f, -0.00889814552f, 0.0f, -0.00892032497f, 0.00423092302f,
    -0.00715946453f, 0.0f, -0.00762995845f, 0.00502090249f, -0.00487212231f, 0.0f,
    -0.00613084435f, 0.00480985921f, -0.00265190657f, 0.0f, -0.00462780427f, 0.0039106207f,
    -0.000947347842f, 0.0f, -0.0032816038f, 0.00274953223f, 7.75456356e-05f, 0.0f,
    -0.00218601921f, 0.00167941779f, 0.0005078697f, 0.0f, -0.00136797631f, 0.000885465124f,
    0.000553519581f, 0.0f, -0.000804191339f, 0.00039423717f, 0.000425230945f, 0.0f,
    -0.000444117992f, 0.000139688331f, 0.000265964947f, 0.0f, -0.000230404374f, 3.17169615e-05f,
    0.000141694196f, 0.0f, -0.000112291418f, -2.7883616e-06f, 6.54098912e-05f, 8.41001165e-05f,
    -3.48354115e-05f, -3.68416804e-05f, 3.4156008e-05f, 0.000172560205f, -7.14767739e-05f,
    -0.000100143705f, 4.93750667e-05f, 0.000332618627f, -0.000137775147f, -0.000228202465f,
    3.87297878e-05f, 0.000602293992f, -0.000249478355f, -0.000444253266f, -5.45916773e-05f,
    0.00102453667f, -0.00042437698f, -0.00073950208f, -0.000324096996f, 0.00163720432f,
    -0.000678152253f, -0.00103549834f, -0.000879644067f, 0.0024577349f, -0.00101802719f,
    -0.00116020918f, -0.00178981689f, 0.00346596213f, -0.00143564853f, -0.000873420096f,
    -0.00299929292f, 0.00459165312f, -0.00190192508f, 3.68180845e-05f, -0.00426820945f,
    0.00571440486f, -0.00236698403f, 0.00161224429f, -0.00519685633f, 0.00668081641f,
    -0.00276728463f, 0.00361742801f, -0.00536594819f, 0.0073374412f, -0.00303926761f,
    0.00556016713f, -0.00454423716f, 0.00757035566f, -0.00313574402f, 0.00686839269f,
    -0.00284498138f, 0.0073374412f, -0.00303926761f, 0.00714489259f, -0.000718371128f,
    0.00668081641f, -0.00276728463f, 0.00635220623f, 0.00123639032f, 0.00571440486f,
    -0.00236698403f, 0.00481476123f, 0.00253470358f, 0.00459165312f, -0.00190192508f,
    0.00304411422f, 0.0029920456f, 0.00346596213f, -0.00143564853f, 0.00150321913f,
    0.00273842178f, 0.0024577349f, -0.00101802719f, 0.000445199898f, 0.00208598352f,
    0.00163720432f, -0.000678152253f, -0.000110205656f, 0.0013542102f, 0.00102453667f,
    -0.00042437698f, -0.000293735764f, 0.000752078136f, 0.000602293992f, -0.000249478355f,
    -0.000275532337f, 0.000352736621f, 0.000332618627f, -0.000137775147f, -0.000188749604f,
    0.000133977417f, 0.000172560205f, -7.14767739e-05f, -0.000105725732f, 3.58988473e-05f,
    8.41001165e-05f, -3.48354115e-05f, -5.0202947e-05f, 1.89905882e-06f, 4.9586306e-05f,
    4.9586306e-05f, -3.63792133e-05f, -4.06658864e-06f, 0.000101743462f, 0.000101743462f,
    -7.41345721e-05f, -3.38077589e-05f, 0.000196114663f, 0.000196114663f, -0.00012437308f,
    -0.00011465139f, 0.000355118682f, 0.000355118682f, -0.000159558345f, -0.000286048307f,
    0.000604077009f, 0.000604077009f, -0.00011246268f, -0.000580780732f, 0.000965311949f,
    0.000965311949f, 0.000125774939f, -0.000988626503f, 0.00144910498f, 0.00144910498f,
    0.000673565897f, -0.0014138252f, 0.00204356527f, 0.00204356527f, 0.00158625538f,
    -0.00165937899f, 0.00270728394f, 0.00270728394f, 0.00277028629f, -0.00147577445f,
    0.00336926919f, 0.00336926919f, 0.003945251f, -0.000680822937f, 0.00393907493f,
    0.00393907493f, 0.00471155951f, 0.000701558834f, 0.00432622712f, 0.00432622712f,
    0.00472190464f, 0.00237833639f, 0.00446355529f, 0.00446355529f, 0.00387073588f,
    0.00387073588f, 0.00432622712f, 0.00432622712f, 0.00237833639f, 0.00472190464f,
    0.00393907493f, 0.00393907493f, 0.000701558834f, 0.00471155951f, 0.00336926919f,
    0.00336926919f, -0.000680822937f, 0.003945251f, 0.00270728394f, 0.00270728394f,
    -0.00147577445f, 0.00277028629f, 0.00204356527f, 0.00204356527f, -0.00165937899f,
    0.00158625538f, 0.00144910498f, 0.00144910498f, -0.0014138252f, 0.000673565897f,
    0.000965311949f, 0.000965311949f, -0.000988626503f, 0.000125774939f, 0.000604077009f,
    0.000604077009f, -0.000580780732f, -0.00011246268f, 0.000355118682f, 0.000355118682f,
    -0.000286048307f, -0.000159558345f, 0.000196114663f, 0.000196114663f, -0.00011465139f,
    -0.00012437308f, 0.000101743462f, 0.000101743462f, -3.38077589e-05f, -7.41345721e-05f,
    4.9586306e-05f, 4.9586306e-05f, -4.06658864e-06f, -3.63792133e-05f, -1.96925594e-05f,
    4.75420456e-05f, -1.44400465e-05f, -2.08416477e-05f, -4.04061939e-05f, 9.75491785e-05f,
    -1.46373168e-05f, -5.45706534e-05f, -7.78843751e-05f, 0.000188029517f, 9.63195544e-06f,
    -0.000117024021f, -0.000141031123f, 0.000340479251f, 9.41667749e-05f, -0.000207193298f,
    -0.000239902016f, 0.000579174724f, 0.000286786817f, -0.000294999219f, -0.000383362087f,
    0.000925517932f, 0.000623240077f, -0.000304605521f, -0.000575494894f, 0.00138936751f,
    0.00108436472f, -0.000119223223f, -0.000811577309f, 0.00195932086f, 0.00155583001f,
    0.000373732328f, -0.0010751657f, 0.0025956796f, 0.00182967249f, 0.00120171276f,
    -0.00133806514f, 0.003230375f, 0.00167742511f, 0.00223346753f, -0.00156435638f,
    0.00377669046f, 0.000977957039f, 0.00317732617f, -0.00171810924f, 0.00414788257f,
    -0.00017353741f, 0.00368638709f, -0.00177264749f, 0.0042795497f, -0.0014623215f,
    0.00353035633f, -0.00171810924f, 0.00414788257f, -0.00248395978f, 0.00272937887f,
    -0.00156435638f, 0.00377669046f, -0.00293822889f, 0.00155518879f, -0.00133806514f,
    0.003230375f, -0.00276541873f, 0.000393181428f, -0.0010751657f, 0.0025956796f,
    -0.00214351318f, -0.000444034551f, -0.000811577309f, 0.00195932086f, -0.00136440666f,
    -0.000835869345f, -0.000575494894f, 0.00138936751f, -0.000682458107f, -0.000851065211f,
    -0.000383362087f, 0.000925517932f, -0.000225308642f, -0.000656085904f, -0.000239902016f,
    0.000579174724f, 5.80704955e-06f, -0.000411384855f, -0.000141031123f, 0.000340479251f,
    7.99218178e-05f, -0.00021309375f, -7.78843751e-05f, 0.000188029517f, 7.59376562e-05f,
    -8.95592966e-05f, -4.04061939e-05f, 9.75491785e-05f, 4.89374252e-05f, -2.82371329e-05f,
    -1.96925594e-05f, 4.75420456e-05f, 2.49479253e-05f, -4.52661607e-06f, -3.60329104e-05f,
    1.01643954e-20f, 4.02652813e-06f, -1.62174692e-05f, -7.39341776e-05f, 6.77626358e-21f,
    2.14960855e-05f, -3.04399746e-05f, -0.000142511388f, 4.06575815e-20f, 6.46547851e-05f,
    -4.27425839e-05f, -0.000258056069f, 2.71050543e-20f, 0.000146971506f, -3.16529768e-05f,
    -0.000438969058f, 1.08420217e-19f, 0.000268500648f, 4.33488021e-05f, -0.000701469311f,
    5.42101086e-20f, 0.000395360752f, 0.00023292785f, -0.0010530313f, 3.25260652e-19f,
    0.000446057966f, 0.000567774987f, -0.00148501026f, 3.25260652e-19f, 0.000306352915f,
    0.00101432134f, -0.00196732092f, 4.33680869e-19f, -0.000114994778f, 0.00144558761f,
    -0.00244836928f, 2.16840434e-19f, -0.000808727928f, 0.00166499394f, -0.00286243297f,
    6.50521303e-19f, -0.00161860185f, 0.00149520964f, -0.00314376736f, 2.16840434e-19f,
    -0.00227834587f, 0.00089131319f, -0.0032435602f, 4.33680869e-19f, -0.00253328728f,
    4.33680869e-19f, -0.00314376736f, 2.16840434e-19f, -0.00227834587f, -0.00089131319f,
    -0.00286243297f, 6.50521303e-19f, -0.00161860185f, -0.00149520964f, -0.00244836928f,
    2.16840434e-19f, -0.000808727928f, -0.00166499394f, -0.00196732092f, 4.33680869e-19f,
    -0.000114994778f, -0.00144558761f, -0.00148501026f, 3.25260652e-19f, 0.000306352915f,
    -0.00101432134f, -0.0010530313f, 3.25260652e-19f, 0.000446057966f, -0.000567774987f,
    -0.000701469311f, 5.42101086e-20f, 0.000395360752f, -0.00023292785f, -0.000438969058f,
    1.08420217e-19f, 0.000268500648f, -4.33488021e-05f, -0.000258056069f, 2.71050543e-20f,
    0.000146971506f, 3.16529768e-05f, -0.000142511388f, 4.06575815e-20f, 6.46547851e-05f,
    4.27425839e-05f, -7.39341776e-05f, 6.77626358e-21f, 2.14960855e-05f, 3.04399746e-05f,
    -3.60329104e-05f, 1.01643954e-20f, 4.02652813e-06f, 1.62174692e-05f, -9.22586059e-06f,
    -2.22731978e-05f, 9.29093312e-06f, -4.85639703e-06f, -1.89300099e-05f, -4.57010865e-05f,
    2.33167029e-05f, -1.91872277e-06f, -3.64887637e-05f, -8.80916705e-05f, 4.62559474e-05f,
    1.52060065e-05f, -6.60727746e-05f, -0.000159513787f, 7.1214221e-05f, 6.21354775e-05f,
    -0.000112394162f, -0.00027134351f, 7.49429382e-05f, 0.000153790446f, -0.000179604642f,
    -0.000433603971f, 1.54192367e-05f, 0.000288381911f, -0.00026961902f, -0.000650917878f,
    -0.000154481604f, 0.000427571853f, -0.000380223268f, -0.000917940168f, -0.000453427056f,
    0.000489734462f, -0.000503714313f, -0.00121607387f, -0.000832968508f, 0.000375562697f,
    -0.000626882073f, -0.00151342712f, -0.00116626988f, 2.70844193e-05f, -0.000732899411f,
    -0.00176937575f, -0.00129135512f, -0.000511583115f, -0.000804932439f, -0.00194327882f,
    -0.00109901314f, -0.00108208286f, -0.000830483565f, -0.00200496451f, -0.000611180614f,
    -0.00147552043f, -0.000804932439f, -0.00194327882f, 1.1971505e-05f, -0.00154226786f,
    -0.000732899411f, -0.00176937575f, 0.00055138208f, -0.00127486989f, -0.000626882073f,
    -0.00151342712f, 0.000843828893f, -0.000805525749f, -0.000503714313f, -0.00121607387f,
    0.00085456064f, -0.000323434768f, -0.000380223268f, -0.000917940168f, 0.000666915905f,
    2.5673191e-05f, -0.00026961902f, -0.000650917878f, 0.000411573943f, 0.000193103959f,
    -0.000179604642f, -0.000433603971f, 0.000193013751f, 0.00021481984f, -0.000112394162f,
    -0.00027134351f, 5.57536077e-05f, 0.000161738921f, -6.60727746e-05f, -0.000159513787f,
    -6.41963925e-06f, 9.42924817e-05f, -3.64887637e-05f, -8.80916705e-05f, -2.19556241e-05f,
    4.34601643e-05f, -1.89300099e-05f, -4.57010865e-05f, -1.78441405e-05f, 1.51306576e-05f,
    -9.22586059e-06f, -2.22731978e-05f, -1.00036732e-05f, 3.13569058e-06f, 1.09095063e-05f,
    -1.09095063e-05f, 5.85898397e-06f, 2.2157576e-06f, 2.23843235e-05f, -2.23843235e-05f,
    9.8517512e-06f, 9.93249523e-06f, 4.31472326e-05f, -4.31472326e-05f, 1.00874777e-05f,
    2.73337191e-05f, 7.81297931e-05f, -7.81297931e-05f, -4.19722528e-06f, 5.64328839e-05f,
    0.000132904213f, -0.000132904213f, -4.93213847e-05f, 8.9839501e-05f, 0.000212378814f,
    -0.000212378814f, -0.000138742369f, 0.000103480314f, 0.000318819104f, -0.000318819104f,
    -0.000266416115f, 5.75837475e-05f, 0.000449607149f, -0.000449607149f, -0.000391034788f,
    -8.54665632e-05f, 0.000595631544f, -0.000595631544f, -0.000438563206f, -0.000328786322f,
    0.000741274678f, -0.000741274678f, -0.00033515488f, -0.000614489836f, 0.000866639195f,
    -0.000866639195f, -5.92155957e-05f, -0.000831404992f, 0.000951816444f, -0.000951816444f,
    0.000323583605f, -0.000867186347f, 0.000982030644f, -0.000982030644f, 0.000677756092f,
    -0.000677756092f, 0.000951816444f, -0.000951816444f, 0.000867186347f, -0.000323583605f,
    0.000866639195f, -0.000866639195f, 0.000831404992f, 5.92155957e-05f, 0.000741274678f,
    -0.000741274678f, 0.000614489836f, 0.00033515488f, 0.000595631544f, -0.000595631544f,
    0.000328786322f, 0.000438563206f, 0.000449607149f, -0.000449607149f, 8.54665632e-05f,
    0.000391034788f, 0.000318819104f, -0.000318819104f, -5.75837475e-05f, 0.000266416115f,
    0.000212378814f, -0.000212378814f, -0.000103480314f, 0.000138742369f, 0.000132904213f,
    -0.000132904213f, -8.9839501e-05f, 4.93213847e-05f, 7.81297931e-05f, -7.81297931e-05f,
    -5.64328839e-05f, 4.19722528e-06f, 4.31472326e-05f, -4.31472326e-05f, -2.73337191e-05f,
    -1.00874777e-05f, 2.23843235e-05f, -2.23843235e-05f, -9.93249523e-06f, -9.8517512e-06f,
    1.09095063e-05f, -1.09095063e-05f, -2.2157576e-06f, -5.85898397e-06f, 8.73242698e-06f,
    3.61708953e-06f, 1.28109116e-06f, 3.32846298e-06f, 1.79169929e-05f, 7.42146131e-06f,
    -7.07790718e-07f, 7.94213429e-06f, 3.45353219e-05f, 1.43049983e-05f, -8.6103073e-06f,
    1.4215414e-05f, 6.25364337e-05f, 2.59034405e-05f, -2.71843146e-05f, 1.74412526e-05f,
    0.000106378422f, 4.40633848e-05f, -5.81352906e-05f, 6.69442898e-06f, 0.00016999057f,
    7.04124031e-05f, -9.31604081e-05f, -3.30838557e-05f, 0.00025518646f, 0.000105701693f,
    -0.000108806249f, -0.000111408561f, 0.000359871978f, 0.000149063853f, -7.14140479e-05f,
    -0.000217302746f, 0.000476749905f, 0.000197476271f, 4.32889356e-05f, -0.000310287171f,
    0.000593324425f, 0.000245763018f, 0.000224210817f, -0.000331415358f, 0.000693669252f,
    0.000287327217f, 0.000413601578f, -0.000236694046f, 0.000761845731f, 0.000315566838f,
    0.000528151984f, -3.36084122e-05f, 0.000786030549f, 0.000325584522f, 0.000506327196f,
    0.000209727586f, 0.000761845731f, 0.000315566838f, 0.000349695096f, 0.000397224561f,
    0.000693669252f, 0.000287327217f, 0.000125092527f, 0.000459828443f, 0.000593324425f,
    0.000245763018f, -7.58050446e-05f, 0.000392887014f, 0.000476749905f, 0.000197476271f,
    -0.000188796272f, 0.000250016077f, 0.000359871978f, 0.000149063853f, -0.000204153606f,
    0.000103158891f, 0.00025518646f, 0.000105701693f, -0.000155715388f, 1.84011287e-06f,
    0.00016999057f, 7.04124031e-05f, -8.92681783e-05f, -4.24805403e-05f, 0.000106378422f,
    4.40633848e-05f, -3.63741819e-05f, -4.58415343e-05f, 6.25364337e-05f, 2.59034405e-05f,
    -6.88938508e-06f, -3.15550424e-05f, 3.45353219e-05f, 1.43049983e-05f, 3.96340874e-06f,
    -1.61402222e-05f, 1.79169929e-05f, 7.42146131e-06f, 5.1154534e-06f, -6.11642054e-06f,
    8.73242698e-06f, 3.61708953e-06f, 3.25944711e-06f, -1.44771059e-06f, 0.0f, 5.54695725e-06f,
    -8.85222107e-07f, 1.72387809e-06f, 0.0f, 1.13807619e-05f, -3.54880467e-06f, 2.49361619e-06f,
    0.0f, 2.19354406e-05f, -8.9709647e-06f, 1.16648152e-06f, 0.0f, 3.97218391e-05f,
    -1.64937228e-05f, -6.10155985e-06f, 0.0f, 6.75683841e-05f, -2.13151798e-05f,
    -2.36909837e-05f, 0.0f, 0.000107972883f, -1.32503919e-05f, -5.21903858e-05f, 0.0f,
    0.00016208645f, 1.97966583e-05f, -8.2491897e-05f, 0.0f, 0.000228580087f, 8.21580179e-05f,
    -9.37147997e-05f, 0.0f, 0.000302816741f, 0.000159376767f, -6.12116419e-05f, 0.0f,
    0.000376861542f, 0.000216571148f, 2.5597401e-05f, 0.0f, 0.000440598466f, 0.000214081258f,
    0.000147096347f, 0.0f, 0.000483902171f, 0.000134335831f, 0.000255289953f, 0.0f,
    0.000499264337f, 0.0f, 0.000298744068f, 0.0f, 0.000483902171f, -0.000134335831f,
    0.000255289953f, 0.0f, 0.000440598466f, -0.000214081258f, 0.000147096347f, 0.0f,
    0.000376861542f, -0.000216571148f, 2.5597401e-05f, 0.0f, 0.000302816741f, -0.000159376767f,
    -6.12116419e-05f, 0.0f, 0.000228580087f, -8.21580179e-05f, -9.37147997e-05f, 0.0f,
    0.00016208645f, -1.97966583e-05f, -8.2491897e-05f, 0.0f, 0.000107972883f, 1.32503919e-05f,
    -5.21903858e-05f, 0.0f, 6.75683841e-05f, 2.13151798e-05f, -2.36909837e-05f, 0.0f,
    3.97218391e-05f, 1.64937228e-05f, -6.10155985e-06f, 0.0f, 2.19354406e-05f, 8.9709647e-06f,
    1.16648152e-06f, 0.0f, 1.13807619e-05f, 3.54880467e-06f, 2.49361619e-06f, 0.0f,
    5.54695725e-06f, 8.85222107e-07f, 1.72387809e-06f, -2.88252113e-06f, 1.1939793e-06f,
    -9.75411808e-07f, 2.53668617e-07f, -5.91373237e-06f, 2.44954822e-06f, -2.18237938e-06f,
    -5.70164332e-07f, -1.13977812e-05f, 4.7211156e-06f, -3.39005055e-06f, -3.25978181e-06f,
    -2.06403292e-05f, 8.54950395e-06f, -2.64256869e-06f, -8.74886064e-06f, -3.51091112e-05f,
    1.45426702e-05f, 3.59405044e-06f, -1.61632797e-05f, -5.61038396e-05f, 2.32389721e-05f,
    1.86836787e-05f, -2.08248457e-05f, -8.42216978e-05f, 3.48857684e-05f, 4.17490155e-05f,
    -1.41592427e-05f, -0.000118772019f, 4.91969804e-05f, 6.36619661e-05f, 1.19562465e-05f,
    -0.000157346702f, 6.51751398e-05f, 6.79769655e-05f, 5.70563134e-05f, -0.000195821354f,
    8.11118589e-05f, 3.99262281e-05f, 0.000106113592f, -0.000228939432f, 9.48298184e-05f,
    -2.05518591e-05f, 0.000133477341f, -0.000251441379f, 0.000104150429f, -9.26069915e-05f,
    0.000117994641f, -0.000259423396f, 0.00010745669f, -0.000143512283f, 5.94447374e-05f,
    -0.000251441379f, 0.000104150429f, -0.000148917839f, -1.79517792e-05f, -0.000228939432f,
    9.48298184e-05f, -0.00010891509f, -7.98503752e-05f, -0.000195821354f, 8.11118589e-05f,
    -4.68015351e-05f, -0.000103265746f, -0.000157346702f, 6.51751398e-05f, 7.72206749e-06f,
    -8.84118854e-05f, -0.000118772019f, 4.91969804e-05f, 3.65614651e-05f, -5.34701539e-05f,
    -8.42216978e-05f, 3.48857684e-05f, 3.95331081e-05f, -1.9508916e-05f, -5.61038396e-05f,
    2.32389721e-05f, 2.7936745e-05f, 1.5140331e-06f, -3.51091112e-05f, 1.45426702e-05f,
    1.39705426e-05f, 8.88778777e-06f, -2.06403292e-05f, 8.54950395e-06f, 4.31780018e-06f,
    8.0549562e-06f, -1.13977812e-05f, 4.7211156e-06f, -9.21139289e-08f, 4.70214172e-06f,
    -5.91373237e-06f, 2.44954822e-06f, -1.14000818e-06f, 1.94634231e-06f, -2.88252113e-06f,
    1.1939793e-06f, -8.69091082e-07f, 5.1034948e-07f, -1.18989669e-06f, -1.18989669e-06f,
    -4.20060928e-07f, -2.77469582e-07f, -2.44077046e-06f, -2.44077046e-06f, -4.89587876e-07f,
    -1.01014609e-06f, -4.70460373e-06f, -4.70460373e-06f, 2.02607197e-07f, -2.32570233e-06f,
    -8.51945333e-06f, -8.51945333e-06f, 2.66141319e-06f, -3.66753056e-06f, -1.44911583e-05f,
    -1.44911583e-05f, 7.55351311e-06f, -3.209336e-06f, -2.3156832e-05f, -2.3156832e-05f,
    1.37348134e-05f, 1.92960124e-06f, -3.47623791e-05f, -3.47623791e-05f, 1.6987904e-05f,
    1.37584138e-05f, -4.90223174e-05f, -4.90223174e-05f, 1.0984666e-05f, 3.01917698e-05f,
    -6.49444773e-05f, -6.49444773e-05f, -8.40452412e-06f, 4.32176166e-05f, -8.08249097e-05f,
    -8.08249097e-05f, -3.76424359e-05f, 4.18004383e-05f, -9.44936837e-05f, -9.44936837e-05f,
    -6.40818907e-05f, 1.95904413e-05f, -0.000103782317f, -0.000103782317f, -7.22170953e-05f,
    -1.80060215e-05f, -0.000107075917f, -0.000107075917f, -5.45027215e-05f, -5.45027215e-05f,
    -0.000103782317f, -0.000103782317f, -1.80060215e-05f, -7.22170953e-05f, -9.44936837e-05f,
    -9.44936837e-05f, 1.95904413e-05f, -6.40818907e-05f, -8.08249097e-05f, -8.08249097e-05f,
    4.18004383e-05f, -3.76424359e-05f, -6.49444773e-05f, -6.49444773e-05f, 4.32176166e-05f,
    -8.40452412e-06f, -4.90223174e-05f, -4.90223174e-05f, 3.01917698e-05f, 1.0984666e-05f,
    -3.47623791e-05f, -3.47623791e-05f, 1.37584138e-05f, 1.6987904e-05f, -2.3156832e-05f,
    -2.3156832e-05f, 1.92960124e-06f, 1.37348134e-05f, -1.44911583e-05f, -1.44911583e-05f,
    -3.209336e-06f, 7.55351311e-06f, -8.51945333e-06f, -8.51945333e-06f, -3.66753056e-06f,
    2.66141319e-06f, -4.70460373e-06f, -4.70460373e-06f, -2.32570233e-06f, 2.02607197e-07f,
    -2.44077046e-06f, -2.44077046e-06f, -1.01014609e-06f, -4.89587876e-07f, -1.18989669e-06f,
    -1.18989669e-06f, -2.77469582e-07f, -4.20060928e-07f, 3.33199665e-07f, -8.04415208e-07f,
    -3.9300815e-08f, -2.37843821e-07f, 6.83182691e-07f, -1.64934897e-06f, 2.0936244e-07f,
    -4.89690194e-07f, 1.31724687e-06f, -3.1801153e-06f, 9.12582664e-07f, -6.19206332e-07f,
    2.38509392e-06f, -5.75812601e-06f, 2.13953103e-06f, -5.00664541e-08f, 4.05686978e-06f,
    -9.79415017e-06f, 3.31048204e-06f, 2.02155206e-06f, 6.48294281e-06f, -1.56512087e-05f,
    2.86697559e-06f, 5.90261334e-06f, 9.73182705e-06f, -2.34947074e-05f, -1.21342578e-06f,
    1.02774657e-05f, 1.3723843e-05f, -3.31322881e-05f, -9.64950686e-06f, 1.17634418e-05f,
    1.81812902e-05f, -4.38935167e-05f, -1.98312428e-05f, 6.44977672e-06f, 2.26270713e-05f,
    -5.46265801e-05f, -2.57837419e-05f, -6.7220376e-06f, 2.64535392e-05f, -6.38644924e-05f,
    -2.15518849e-05f, -2.33044211e-05f, 2.9054283e-05f, -7.01432436e-05f, -6.20184983e-06f,
    -3.47070709e-05f, 2.99756975e-05f, -7.23677367e-05f, 1.39725989e-05f, -3.37328383e-05f,
    2.9054283e-05f, -7.01432436e-05f, 2.89269756e-05f, -2.01562343e-05f, 2.64535392e-05f,
    -6.38644924e-05f, 3.17181984e-05f, -1.23923053e-06f, 2.26270713e-05f, -5.46265801e-05f,
    2.29850557e-05f, 1.34786596e-05f, 1.81812902e-05f, -4.38935167e-05f, 9.46212549e-06f,
    1.8583487e-05f, 1.3723843e-05f, -3.31322881e-05f, -1.49477762e-06f, 1.51412405e-05f,
    9.73182705e-06f, -2.34947074e-05f, -6.40924418e-06f, 8.12528742e-06f, 6.48294281e-06f,
    -1.56512087e-05f, -6.20103583e-06f, 2.14652005e-06f, 4.05686978e-06f, -9.79415017e-06f,
    -3.77031756e-06f, -9.11411234e-07f, 2.38509392e-06f, -5.75812601e-06f, -1.4774746e-06f,
    -1.54827922e-06f, 1.31724687e-06f, -3.1801153e-06f, -2.07448394e-07f, -1.08313839e-06f,
    6.83182691e-07f, -1.64934897e-06f, 1.98221642e-07f, -4.94304857e-07f, 3.33199665e-07f,
    -8.04415208e-07f, 1.95970856e-07f, -1.40391109e-07f, 4.32450548e-07f, 3.38813179e-21f,
    6.39850199e-08f, -8.77653434e-08f, 8.85884333e-07f, -6.77626358e-21f, 2.25522612e-07f,
    -7.47092628e-08f, 1.70878889e-06f, 1.35525272e-20f, 4.71617568e-07f, 1.41857399e-07f,
    3.09350662e-06f, -2.71050543e-20f, 5.98469228e-07f, 7.52689289e-07f, 5.26185113e-06f, -0.0f,
    1.22930558e-07f, 1.74537536e-06f, 8.40876692e-06f, -5.42101086e-20f, -1.49427262e-06f,
    2.5631191e-06f, 1.26217174e-05f, 1.08420217e-19f, -4.22446601e-06f, 2.01798889e-06f,
    1.78002047e-05f, 1.08420217e-19f, -6.80498943e-06f, -1.04089509e-06f, 2.35808584e-05f,
    -0.0f, -6.90711204e-06f, -6.42704663e-06f, 2.93468547e-05f, -2.16840434e-19f,
    -2.67003065e-06f, -1.17544405e-05f, 3.43105276e-05f, 2.16840434e-19f, 5.25364567e-06f,
    -1.33636131e-05f, 3.76835123e-05f, -2.16840434e-19f, 1.31805282e-05f, -8.98039343e-06f,
    3.88775079e-05f, -4.33680869e-19f, 1.6516733e-05f, -4.33680869e-19f, 3.76835123e-05f,
    -2.16840434e-19f, 1.31805282e-05f, 8.98039343e-06f, 3.43105276e-05f, 2.16840434e-19f,
    5.25364567e-06f, 1.33636131e-05f, 2.93468547e-05f, -2.16840434e-19f, -2.67003065e-06f,
    1.17544405e-05f, 2.35808584e-05f, -0.0f, -6.90711204e-06f, 6.42704663e-06f, 1.78002047e-05f,
    1.08420217e-19f, -6.80498943e-06f, 1.04089509e-06f, 1.26217174e-05f, 1.08420217e-19f,
    -4.22446601e-06f, -2.01798889e-06f, 8.40876692e-06f, -5.42101086e-20f, -1.49427262e-06f,
    -2.5631191e-06f, 5.26185113e-06f, -0.0f, 1.22930558e-07f, -1.74537536e-06f, 3.09350662e-06f,
    -2.71050543e-20f, 5.98469228e-07f, -7.52689289e-07f, 1.70878889e-06f, 1.35525272e-20f,
    4.71617568e-07f, -1.41857399e-07f, 8.85884333e-07f, -6.77626358e-21f, 2.25522612e-07f,
    7.47092628e-08f, 4.32450548e-07f, 3.38813179e-21f, 6.39850199e-08f, 8.77653434e-08f,
    7.89336241e-08f, 1.90562616e-07f, 4.31458389e-08f, -7.50570717e-09f, 1.61496757e-07f,
    3.89887646e-07f, 8.34434104e-08f, 5.03661539e-08f, 3.11506597e-07f, 7.52043434e-07f,
    7.51177964e-08f, 1.93502018e-07f, 5.63932474e-07f, 1.36145331e-06f, -1.07253641e-07f,
    3.99761944e-07f, 9.59191993e-07f, 2.31569447e-06f, -5.86906538e-07f, 4.79180983e-07f,
    1.53300414e-06f, 3.70099929e-06f, -1.28339514e-06f, 8.09935372e-08f, 2.30055889e-06f,
    5.5540404e-06f, -1.71609906e-06f, -1.07788492e-06f, 3.24510233e-06f, 7.83437008e-06f,
    -1.11656198e-06f, -2.75963521e-06f, 4.29874945e-06f, 1.03780985e-05f, 9.75909188e-07f,
    -3.95915822e-06f, 5.34972423e-06f, 1.29153768e-05f, 3.97613439e-06f, -3.36357493e-06f,
    6.25513803e-06f, 1.51012391e-05f, 6.1864198e-06f, -4.67917914e-07f, 6.86959038e-06f,
    1.65846577e-05f, 5.87070281e-06f, 3.61050456e-06f, 7.08723564e-06f, 1.71101001e-05f,
    2.73133651e-06f, 6.59402986e-06f, 6.86959038e-06f, 1.65846577e-05f, -1.59820149e-06f,
    6.70422605e-06f, 6.25513803e-06f, 1.51012391e-05f, -4.70532723e-06f, 4.04359116e-06f,
    5.34972423e-06f, 1.29153768e-05f, -5.18995785e-06f, 4.33144891e-07f, 4.29874945e-06f,
    1.03780985e-05f, -3.48961953e-06f, -2.10947564e-06f, 3.24510233e-06f, 7.83437008e-06f,
    -1.16182821e-06f, -2.74088529e-06f, 2.30055889e-06f, 5.5540404e-06f, 4.51285587e-07f,
    -1.97564509e-06f, 1.53300414e-06f, 3.70099929e-06f, 9.64768446e-07f, -8.50226343e-07f,
    9.59191993e-07f, 2.31569447e-06f, 7.53837753e-07f, -7.61734853e-08f, 5.63932474e-07f,
    1.36145331e-06f, 3.58514143e-07f, 2.06834599e-07f, 3.11506597e-07f, 7.52043434e-07f,
    8.37102831e-08f, 1.89942895e-07f, 1.61496757e-07f, 3.89887646e-07f, -2.33891537e-08f,
    9.46176471e-08f, 7.89336241e-08f, 1.90562616e-07f, -3.58160506e-08f, 2.52013788e-08f,
    -6.672186e-08f, 6.672186e-08f, 1.11228173e-08f, 9.26547017e-09f, -1.36565404e-07f,
    1.36565404e-07f, 2.24246333e-09f, 3.74654725e-08f, -2.63085042e-07f, 2.63085042e-07f,
    -4.75150479e-08f, 7.14429973e-08f, -4.76468188e-07f, 4.76468188e-07f, -1.63958859e-07f,
    6.24658441e-08f, -8.10302197e-07f, 8.10302197e-07f, -3.0755632e-07f, -8.40627692e-08f,
    -1.29544435e-06f, 1.29544435e-06f, -3.28714549e-07f, -4.22529695e-07f, -1.94336167e-06f,
    1.94336167e-06f, -7.06694969e-09f, -8.38581968e-07f, -2.74207446e-06f, 2.74207446e-06f,
    7.4168878e-07f, -9.79175752e-07f, -3.63267714e-06f, 3.63267714e-06f, 1.62287154e-06f,
    -4.43546583e-07f, -4.52039376e-06f, 4.52039376e-06f, 1.98764405e-06f, 8.16867043e-07f,
    -5.28624741e-06f, 5.28624741e-06f, 1.28463785e-06f, 2.21518371e-06f, -5.80460028e-06f,
    5.80460028e-06f, -3.69163303e-07f, 2.82217025e-06f, -5.98900442e-06f, 5.98900442e-06f,
    -2.08414781e-06f, 2.08414781e-06f, -5.80460028e-06f, 5.80460028e-06f, -2.82217025e-06f,
    3.69163303e-07f, -5.28624741e-06f, 5.28624741e-06f, -2.21518371e-06f, -1.28463785e-06f,
    -4.52039376e-06f, 4.52039376e-06f, -8.16867043e-07f, -1.98764405e-06f, -3.63267714e-06f,
    3.63267714e-06f, 4.43546583e-07f, -1.62287154e-06f, -2.74207446e-06f, 2.74207446e-06f,
    9.79175752e-07f, -7.4168878e-07f, -1.94336167e-06f, 1.94336167e-06f, 8.38581968e-07f,
    7.06694969e-09f, -1.29544435e-06f, 1.29544435e-06f, 4.22529695e-07f, 3.28714549e-07f,
    -8.10302197e-07f, 8.10302197e-07f, 8.40627692e-08f, 3.0755632e-07f, -4.76468188e-07f,
    4.76468188e-07f, -6.24658441e-08f, 1.63958859e-07f, -2.63085042e-07f, 2.63085042e-07f,
    -7.14429973e-08f, 4.75150479e-08f, -1.36565404e-07f, 1.36565404e-07f, -3.74654725e-08f,
    -2.24246333e-09f, -6.672186e-08f, 6.672186e-08f, -9.26547017e-09f, -1.11228173e-08f,
    -3.79934342e-08f, -1.57373954e-08f, -3.33367134e-09f, 4.7308033e-09f, -7.85375747e-08f,
    -3.25313287e-08f, -1.53455808e-08f, 8.66259509e-09f, -1.50846574e-07f, -6.24826981e-08f,
    -3.88447354e-08f, 1.32248168e-09f, -2.7327323e-07f, -1.13193472e-07f, -6.50635457e-08f,
    -3.88794561e-08f, -4.64563385e-07f, -1.92428445e-07f, -4.99273867e-08f, -1.20625259e-07f,
    -7.43251633e-07f, -3.07864923e-07f, 6.05589392e-08f, -2.02464037e-07f, -1.11486736e-06f,
    -4.61793178e-07f, 2.74306274e-07f, -1.81536493e-07f, -1.5729172e-06f, -6.51523635e-07f,
    4.78270351e-07f, 5.33921352e-08f, -2.08460142e-06f, -8.6347012e-07f, 4.62508297e-07f,
    4.73744478e-07f, -2.59360399e-06f, -1.07430594e-06f, 7.38283177e-08f, 8.44186445e-07f,
    -3.03312299e-06f, -1.25636075e-06f, -5.66921983e-07f, 8.36611036e-07f, -3.33009871e-06f,
    -1.37937207e-06f, -1.07639369e-06f, 3.22734593e-07f, -3.43653733e-06f, -1.42346039e-06f,
    -1.07483686e-06f, -4.45212009e-07f, -3.33009871e-06f, -1.37937207e-06f, -5.32917454e-07f,
    -9.89333103e-07f, -3.03312299e-06f, -1.25636075e-06f, 1.90698998e-07f, -9.92447667e-07f,
    -2.59360399e-06f, -1.07430594e-06f, 6.49134449e-07f, -5.44725481e-07f, -2.08460142e-06f,
    -8.6347012e-07f, 6.62030686e-07f, -7.94517252e-09f, -1.5729172e-06f, -6.51523635e-07f,
    3.75942165e-07f, 3.00434294e-07f, -1.11486736e-06f, -4.61793178e-07f, 6.55981296e-08f,
    3.22329498e-07f, -7.43251633e-07f, -3.07864923e-07f, -1.00342056e-07f, 1.85985328e-07f,
    -4.64563385e-07f, -1.92428445e-07f, -1.20598941e-07f, 4.99909483e-08f, -2.7327323e-07f,
    -1.13193472e-07f, -7.34988035e-08f, -1.85149513e-08f, -1.50846574e-07f, -6.24826981e-08f,
    -2.65322413e-08f, -2.84025123e-08f, -7.85375747e-08f, -3.25313287e-08f, -4.72558526e-09f,
    -1.69763439e-08f, -3.79934342e-08f, -1.57373954e-08f, 9.87921411e-10f, -5.70244474e-09f,
    0.0f, -1.67593655e-08f, -6.50118093e-09f, -6.17497331e-10f, 0.0f, -3.61508228e-08f,
    -1.13360672e-08f, -3.73752806e-09f, 0.0f, -6.89689514e-08f, -1.56468989e-08f,
    -1.2402201e-08f, 0.0f, -1.24655486e-07f, -9.37471345e-09f, -3.04942525e-08f, 0.0f,
    -2.11785519e-07f, 2.04188062e-08f, -4.45598438e-08f, 0.0f, -3.39287368e-07f,
    7.08980892e-08f, -2.52017784e-08f, 0.0f, -5.09627e-07f, 1.09696252e-07f, 4.93497652e-08f,
    0.0f, -7.17950115e-07f, 7.1580061e-08f, 1.63923815e-07f, 0.0f, -9.5180792e-07f,
    -7.34717673e-08f, 2.38337677e-07f, 0.0f, -1.18418268e-06f, -2.71065346e-07f,
    1.70714401e-07f, 0.0f, -1.38420455e-06f, -3.78278912e-07f, -5.54730875e-08f, 0.0f,
    -1.52012751e-06f, -2.77496554e-07f, -3.20478762e-07f, 0.0f, -1.56875763e-06f, 0.0f,
    -4.38400718e-07f, 0.0f, -1.52012751e-06f, 2.77496554e-07f, -3.20478762e-07f, 0.0f,
    -1.38420455e-06f, 3.78278912e-07f, -5.54730875e-08f, 0.0f, -1.18418268e-06f,
    2.71065346e-07f, 1.70714401e-07f, 0.0f, -9.5180792e-07f, 7.34717673e-08f, 2.38337677e-07f,
    0.0f, -7.17950115e-07f, -7.1580061e-08f, 1.63923815e-07f, 0.0f, -5.09627e-07f,
    -1.09696252e-07f, 4.93497652e-08f, 0.0f, -3.39287368e-07f, -7.08980892e-08f,
    -2.52017784e-08f, 0.0f, -2.11785519e-07f, -2.04188062e-08f, -4.45598438e-08f, 0.0f,
    -1.24655486e-07f, 9.37471345e-09f, -3.04942525e-08f, 0.0f, -6.89689514e-08f,
    1.56468989e-08f, -1.2402201e-08f, 0.0f, -3.61508228e-08f, 1.13360672e-08f, -3.73752806e-09f,
    0.0f, -1.67593655e-08f, 6.50118093e-09f, -6.17497331e-10f, 5.68082381e-09f,
    -2.35307418e-09f, -5.8219074e-09f, -3.13672555e-09f, 1.40002276e-08f, -5.79908432e-09f,
    -6.67922428e-09f, -5.3111826e-09f, 2.59751189e-08f, -1.07592468e-08f, -6.55124799e-09f,
    -8.84967388e-09f, 4.65814551e-08f, -1.92946708e-08f, 3.56573548e-10f, -1.09748415e-08f,
    7.90571875e-08f, -3.27465592e-08f, 1.2177261e-08f, -5.10726528e-09f, 1.26861352e-07f,
    -5.25476906e-08f, 1.65582872e-08f, 1.52030033e-08f, 1.91539982e-07f, -7.93384629e-08f,
    2.2539175e-09f, 4.19204476e-08f, 2.69162456e-07f, -1.11490735e-07f, -4.03687181e-08f,
    5.1519585e-08f, 3.5612041e-07f, -1.47509908e-07f, -8.96069707e-08f, 1.75988699e-08f,
    4.43422522e-07f, -1.83671617e-07f, -1.00652429e-07f, -5.85001665e-08f, 5.17745605e-07f,
    -2.14457245e-07f, -4.19479385e-08f, -1.32450566e-07f, 5.69101644e-07f, -2.35729615e-07f,
    6.37869775e-08f, -1.38323344e-07f, 5.86624594e-07f, -2.42987852e-07f, 1.45228498e-07f,
    -6.01556138e-08f, 5.69101644e-07f, -2.35729615e-07f, 1.42913578e-07f, 5.27051647e-08f,
    5.17745605e-07f, -2.14457245e-07f, 6.39950244e-08f, 1.23318372e-07f, 4.43422522e-07f,
    -1.83671617e-07f, -2.98061522e-08f, 1.12537883e-07f, 3.5612041e-07f, -1.47509908e-07f,
    -7.58059784e-08f, 5.09174178e-08f, 2.69162456e-07f, -1.11490735e-07f, -6.49748415e-08f,
    -7.88485188e-09f, 1.91539982e-07f, -7.93384629e-08f, -2.8048472e-08f, -3.12359916e-08f,
    1.26861352e-07f, -5.25476906e-08f, 9.58330748e-10f, -2.24586234e-08f, 7.90571875e-08f,
    -3.27465592e-08f, 1.22220056e-08f, -4.99924191e-09f, 4.65814551e-08f, -1.92946708e-08f,
    8.01252042e-09f, 7.50824913e-09f, 2.59751189e-08f, -1.07592468e-08f, 1.6252325e-09f,
    1.08900968e-08f, 1.40002276e-08f, -5.79908432e-09f, -9.67351532e-10f, 8.4784979e-09f,
    5.68082381e-09f, -2.35307418e-09f, -1.8987103e-09f, 6.33471009e-09f, 1.34313971e-09f,
    1.34313971e-09f, -4.50382442e-09f, -3.32407724e-09f, 4.67595029e-09f, 4.67595029e-09f,
    -5.11995957e-09f, -3.81369869e-09f, 7.75082043e-09f, 7.75082043e-09f, -5.06647346e-09f,
    -5.38596989e-09f, 1.37985197e-08f, 1.37985197e-08f, -3.3119758e-09f, -3.5966472e-09f,
    2.33376589e-08f, 2.33376589e-08f, -1.71146397e-09f, 1.53612723e-09f, 3.74564273e-08f,
    3.74564273e-08f, -6.77095802e-09f, 7.20352933e-09f, 5.72431063e-08f, 5.72431063e-08f,
    -1.54779922e-08f, 7.60136043e-09f, 8.0721648e-08f, 8.0721648e-08f, -2.56101327e-08f,
    -3.3194425e-09f, 1.05869077e-07f, 1.05869077e-07f, -2.20330474e-08f, -2.42497951e-08f,
    1.32232628e-07f, 1.32232628e-07f, 1.77761375e-10f, -3.99786657e-08f, 1.5434992e-07f,
    1.5434992e-07f, 3.48930449e-08f, -3.29558354e-08f, 1.69721147e-07f, 1.69721147e-07f,
    5.21118082e-08f, 3.87065796e-10f, 1.74143864e-07f, 1.74143864e-07f, 3.80657994e-08f,
    3.80657994e-08f, 1.69721147e-07f, 1.69721147e-07f, 3.87065796e-10f, 5.21118082e-08f,
    1.5434992e-07f, 1.5434992e-07f, -3.29558354e-08f, 3.48930449e-08f, 1.32232628e-07f,
    1.32232628e-07f, -3.99786657e-08f, 1.77761375e-10f, 1.05869077e-07f, 1.05869077e-07f,
    -2.42497951e-08f, -2.20330474e-08f, 8.0721648e-08f, 8.0721648e-08f, -3.3194425e-09f,
    -2.56101327e-08f, 5.72431063e-08f, 5.72431063e-08f, 7.60136043e-09f, -1.54779922e-08f,
    3.74564273e-08f, 3.74564273e-08f, 7.20352933e-09f, -6.77095802e-09f, 2.33376589e-08f,
    2.33376589e-08f, 1.53612723e-09f, -1.71146397e-09f, 1.37985197e-08f, 1.37985197e-08f,
    -3.5966472e-09f, -3.3119758e-09f, 7.75082043e-09f, 7.75082043e-09f, -5.38596989e-09f,
    -5.06647346e-09f, 4.67595029e-09f, 4.67595029e-09f, -3.81369869e-09f, -5.11995957e-09f,
    1.34313971e-09f, 1.34313971e-09f, -3.32407724e-09f, -4.50382442e-09f, -1.60513422e-10f,
    3.87513688e-10f, -3.99946076e-09f, -2.31648678e-09f, -1.21651067e-09f, 2.93691649e-09f,
    -5.23619326e-09f, -2.59167865e-09f, -1.50166879e-09f, 3.62534913e-09f, -5.25540589e-09f,
    -3.39861184e-09f, -2.72691314e-09f, 6.58335075e-09f, -5.98639005e-09f, -2.49396348e-09f,
    -4.56399007e-09f, 1.10184466e-08f, -6.63870381e-09f, -6.19739815e-10f, -7.26906801e-09f,
    1.75490822e-08f, -9.05215369e-09f, -9.07438735e-10f, -1.14186181e-08f, 2.75669834e-08f,
    -8.58740901e-09f, -2.82840795e-09f, -1.65256004e-08f, 3.9896328e-08f, -6.41391473e-09f,
    -8.41504999e-09f, -2.13288747e-08f, 5.14924565e-08f, 1.02216424e-09f, -1.063332e-08f,
    -2.6850941e-08f, 6.4823908e-08f, 1.01215347e-08f, -6.46625198e-09f, -3.14468593e-08f,
    7.59194307e-08f, 1.3918287e-08f, 6.03817973e-09f, -3.44871829e-08f, 8.32594296e-08f,
    6.79591095e-09f, 1.62885545e-08f, -3.50106539e-08f, 8.45231938e-08f, -7.08693548e-09f,
    1.71093752e-08f, -3.44871829e-08f, 8.32594296e-08f, -1.63231828e-08f, 6.71231248e-09f,
    -3.14468593e-08f, 7.59194307e-08f, -1.4111353e-08f, -5.57207702e-09f, -2.6850941e-08f,
    6.4823908e-08f, -2.58467514e-09f, -1.17293366e-08f, -2.13288747e-08f, 5.14924565e-08f,
    6.79611345e-09f, -8.24167223e-09f, -1.65256004e-08f, 3.9896328e-08f, 1.04856621e-08f,
    -1.41501655e-09f, -1.14186181e-08f, 2.75669834e-08f, 8.07220157e-09f, 4.07222833e-09f,
    -7.26906801e-09f, 1.75490822e-08f, 7.04249503e-09f, 5.75918291e-09f, -4.56399007e-09f,
    1.10184466e-08f, 5.13249443e-09f, 4.25605018e-09f, -2.72691314e-09f, 6.58335075e-09f,
    5.99651528e-09f, 2.46951837e-09f, -1.50166879e-09f, 3.62534913e-09f, 6.11931439e-09f,
    1.31295153e-09f, -1.21651067e-09f, 2.93691649e-09f, 5.53514168e-09f, 1.86995419e-09f,
    -1.60513422e-10f, 3.87513688e-10f, 4.46604931e-09f, 1.19004229e-09f, 2.39974395e-11f, -0.0f,
    -4.33840963e-09f, -1.46889823e-09f, -1.53462953e-09f, 0.0f, -5.51212009e-09f,
    -1.78570814e-09f, -1.22622457e-09f, 0.0f, -5.94204419e-09f, -2.10898743e-09f,
    -2.33544428e-09f, 0.0f, -6.93546065e-09f, -2.45053866e-09f, -3.86817289e-09f,
    -2.71050543e-20f, -7.14591319e-09f, -1.82608517e-09f, -5.91477711e-09f, 0.0f,
    -6.8943713e-09f, -2.69165201e-09f, -1.0196783e-08f, 0.0f, -5.22509014e-09f,
    -2.25474328e-09f, -1.53783688e-08f, 0.0f, -1.55530799e-09f, -2.85231661e-09f,
    -1.98190993e-08f, -1.08420217e-19f, 1.19893862e-09f, -2.21240737e-09f, -2.5424594e-08f,
    0.0f, 1.8933306e-09f, 1.91778793e-09f, -2.97180094e-08f, 0.0f, -6.31470987e-10f,
    4.40821335e-09f, -3.27898597e-08f, 0.0f, -4.79655604e-09f, 4.73969086e-09f,
    -3.28083445e-08f, 0.0f, -7.23145099e-09f, -2.16840434e-19f, -3.27898597e-08f, 0.0f,
    -4.79655604e-09f, -4.73969086e-09f, -2.97180094e-08f, 0.0f, -6.31470987e-10f,
    -4.40821335e-09f, -2.5424594e-08f, 0.0f, 1.8933306e-09f, -1.91778793e-09f, -1.98190993e-08f,
    -1.08420217e-19f, 1.19893862e-09f, 2.21240737e-09f, -1.53783688e-08f, 0.0f,
    -1.55530799e-09f, 2.85231661e-09f, -1.0196783e-08f, 0.0f, -5.22509014e-09f, 2.25474328e-09f,
    -5.91477711e-09f, 0.0f, -6.8943713e-09f, 2.69165201e-09f, -3.86817289e-09f,
    -2.71050543e-20f, -7.14591319e-09f, 1.82608517e-09f, -2.33544428e-09f, 0.0f,
    -6.93546065e-09f, 2.45053866e-09f, -1.22622457e-09f, 0.0f, -5.94204419e-09f,
    2.10898743e-09f, -1.53462953e-09f, 0.0f, -5.51212009e-09f, 1.78570814e-09f, 2.39974395e-11f,
    -0.0f, -4.33840963e-09f, 1.46889823e-09f, 6.60167476e-11f, 1.59378524e-10f,
    -4.64428807e-09f, -1.09981613e-09f, -1.81287374e-10f, -4.37666431e-10f, -6.04554051e-09f,
    -1.04269726e-09f, -1.62826627e-10f, -3.93098248e-10f, -6.67638433e-09f, -1.5166074e-09f,
    -2.21387506e-10f, -5.34476685e-10f, -6.80140033e-09f, -2.39621634e-09f, -4.10081052e-10f,
    -9.90023175e-10f, -7.09180137e-09f, -1.84718751e-09f, -5.13917631e-10f, -1.24070698e-09f,
    -5.88318416e-09f, -1.54213453e-09f, -1.35194744e-09f, -3.26388983e-09f, -4.91333685e-09f,
    -1.49353385e-09f, -1.77414927e-09f, -4.28317515e-09f, -3.14577298e-09f, -2.65366062e-10f,
    -2.50333443e-09f, -6.04358386e-09f, -7.44401818e-10f, -1.2265837e-10f, -3.38655481e-09f,
    -8.17586621e-09f, -2.11693729e-09f, 5.12103915e-10f, -3.66272723e-09f, -8.84260576e-09f,
    -1.59348212e-09f, 6.60801691e-10f, -4.47184911e-09f, -1.07959988e-08f, -2.8877265e-09f,
    -7.14270254e-10f, -4.47845405e-09f, -1.08119442e-08f, -1.20006205e-09f, -2.89720603e-09f,
    -4.47184911e-09f, -1.07959988e-08f, 1.53686563e-09f, -2.54699617e-09f, -3.66272723e-09f,
    -8.84260576e-09f, 1.59401936e-09f, -6.59504618e-10f, -3.38655481e-09f, -8.17586621e-09f,
    1.85901283e-09f, -1.1347886e-09f, -2.50333443e-09f, -6.04358386e-09f, 4.39638992e-10f,
    -6.13104123e-10f, -1.77414927e-09f, -4.28317515e-09f, 2.03675521e-09f, -2.41203946e-09f,
    -1.35194744e-09f, -3.26388983e-09f, 2.41816611e-09f, -4.53034188e-09f, -5.13917631e-10f,
    -1.24070698e-09f, 3.0695857e-09f, -5.25049337e-09f, -4.10081052e-10f, -9.90023175e-10f,
    3.70850195e-09f, -6.32081942e-09f, -2.21387506e-10f, -5.34476685e-10f, 3.11493542e-09f,
    -6.50369714e-09f, -1.62826627e-10f, -3.93098248e-10f, 3.64851349e-09f, -5.79332005e-09f,
    -1.81287374e-10f, -4.37666431e-10f, 3.53754426e-09f, -5.01214092e-09f, 6.60167476e-11f,
    1.59378524e-10f, 2.50632004e-09f, -4.06169498e-09f, -1.5779604e-10f, 1.5779604e-10f,
    -4.71431605e-09f, -6.69135025e-10f, -1.18500224e-10f, 1.18500224e-10f, -6.60289645e-09f,
    -1.00030373e-09f, 2.2160361e-10f, -2.2160361e-10f, -6.92558588e-09f, -1.29837474e-09f,
    1.49574016e-11f, -1.49574016e-11f, -6.28164587e-09f, -1.26233191e-09f, 1.96696215e-10f,
    -1.96696215e-10f, -6.85238177e-09f, -1.55530244e-09f, 6.19578278e-11f, -6.19578278e-11f,
    -6.4007839e-09f, -4.21530283e-10f, 1.19421306e-09f, -1.19421306e-09f, -4.6501567e-09f,
    -9.32146471e-10f, 5.392925e-10f, -5.392925e-10f, -4.0521746e-09f, -8.80166884e-10f,
    1.25596611e-09f, -1.25596611e-09f, -2.11073004e-09f, -1.95576028e-10f, 2.00891859e-09f,
    -2.00891859e-09f, -1.43631851e-09f, -1.05079023e-09f, 1.36719158e-09f, -1.36719158e-09f,
    -1.65582537e-09f, -1.2440422e-11f, 2.89760882e-09f, -2.89760882e-09f, -8.53453364e-10f,
    -7.9503093e-10f, 3.06469961e-09f, -3.06469961e-09f, 7.01926683e-10f, -7.01926683e-10f,
    2.89760882e-09f, -2.89760882e-09f, 7.9503093e-10f, 8.53453364e-10f, 1.36719158e-09f,
    -1.36719158e-09f, 1.24404228e-11f, 1.65582537e-09f, 2.00891859e-09f, -2.00891859e-09f,
    1.05079023e-09f, 1.43631851e-09f, 1.25596611e-09f, -1.25596611e-09f, 1.95576028e-10f,
    2.11073004e-09f, 5.392925e-10f, -5.392925e-10f, 8.80166884e-10f, 4.0521746e-09f,
    1.19421306e-09f, -1.19421306e-09f, 9.32146471e-10f, 4.6501567e-09f, 6.19578278e-11f,
    -6.19578278e-11f, 4.21530283e-10f, 6.4007839e-09f, 1.96696215e-10f, -1.96696215e-10f,
    1.55530244e-09f, 6.85238177e-09f, 1.49574016e-11f, -1.49574016e-11f, 1.26233191e-09f,
    6.28164587e-09f, 2.2160361e-10f, -2.2160361e-10f, 1.29837474e-09f, 6.92558588e-09f,
    -1.18500224e-10f, 1.18500224e-10f, 1.00030373e-09f, 6.60289645e-09f, -1.5779604e-10f,
    1.5779604e-10f, 6.69135025e-10f, 4.71431605e-09f, -1.49479637e-10f, -6.19164928e-11f,
    -4.93669949e-09f, -1.87307461e-10f, -2.64069155e-10f, -1.09381032e-10f, -6.15295193e-09f,
    -1.06106046e-09f, 2.16629284e-10f, 8.97307853e-11f, -6.70232758e-09f, -8.59077087e-10f,
    -6.38666203e-11f, -2.6454422e-11f, -7.0468702e-09f, 1.62644245e-10f, 8.53737012e-11f,
    3.53629452e-11f, -6.57198918e-09f, -8.41355319e-10f, -6.7926588e-11f, -2.81361132e-11f,
    -6.93914437e-09f, -1.88289107e-10f, 8.5579982e-10f, 3.54483914e-10f, -4.83049689e-09f,
    -1.90047297e-10f, -1.76239565e-10f, -7.30008137e-11f, -3.24581539e-09f, -9.85506232e-10f,
    2.57105337e-10f, 1.0649652e-10f, -1.76298465e-09f, -9.17572573e-10f, 6.8820416e-10f,
    2.85063501e-10f, -7.9474588e-10f, -9.67000369e-11f, -2.20991808e-10f, -9.15378051e-11f,
    -9.05950259e-10f, -1.16642429e-09f, 1.2002831e-09f, 4.97173525e-10f, -5.48910695e-10f,
    -2.75876599e-10f, 1.41261103e-09f, 5.85122673e-10f, 1.78203806e-11f, 7.38144268e-12f,
    1.2002831e-09f, 4.97173525e-10f, -5.83212645e-10f, -1.93064259e-10f, -2.20991808e-10f,
    -9.15378051e-11f, -1.46539014e-09f, 1.84182961e-10f, 6.8820416e-10f, 2.85063501e-10f,
    -6.30347441e-10f, -4.93592944e-10f, 2.57105337e-10f, 1.0649652e-10f, -1.89544025e-09f,
    -5.97796646e-10f, -1.76239565e-10f, -7.30008137e-11f, -2.99199621e-09f, -1.59827995e-09f,
    8.5579982e-10f, 3.54483914e-10f, -3.55006069e-09f, -3.28129324e-09f, -6.7926588e-11f,
    -2.81361132e-11f, -5.03985653e-09f, -4.77357531e-09f, 8.53737012e-11f, 3.53629452e-11f,
    -5.24202637e-09f, -4.05217015e-09f, -6.38666203e-11f, -2.6454422e-11f, -4.86788299e-09f,
    -5.09789677e-09f, 2.16629284e-10f, 8.97307853e-11f, -5.34672084e-09f, -4.13180201e-09f,
    -2.64069155e-10f, -1.09381032e-10f, -5.10107689e-09f, -3.600511e-09f, -1.49479637e-10f,
    -6.19164928e-11f, -3.62321995e-09f, -3.35832717e-09f, 0.0f, -0.0f, -5.12227416e-09f, 0.0f,
    0.0f, -0.0f, -5.58793545e-09f, 0.0f, 0.0f, -0.0f, -6.51925802e-09f, 0.0f, 0.0f, -0.0f,
    -7.91624188e-09f, 0.0f, 0.0f, -0.0f, -6.51925802e-09f, 0.0f, 0.0f, -0.0f, -6.98491931e-09f,
    0.0f, 0.0f, -0.0f, -5.12227416e-09f, 0.0f, 0.0f, -0.0f, -2.79396772e-09f, 0.0f, 0.0f, -0.0f,
    -9.31322575e-10f, 0.0f, 0.0f, -0.0f, -1.39698386e-09f, 0.0f, 0.0f, -0.0f, 4.65661287e-10f,
    -0.0f, 0.0f, -0.0f, -4.65661287e-10f, 0.0f, 0.0f, -0.0f, 0.0f, -0.0f, 0.0f, -0.0f,
    4.65661287e-10f, -0.0f, 0.0f, -0.0f, -4.65661287e-10f, 0.0f, 0.0f, -0.0f, 1.39698386e-09f,
    -0.0f, 0.0f, -0.0f, 9.31322575e-10f, -0.0f, 0.0f, -0.0f, 2.79396772e-09f, -0.0f, 0.0f,
    -0.0f, 5.12227416e-09f, -0.0f, 0.0f, -0.0f, 6.98491931e-09f, -0.0f, 0.0f, -0.0f,
    6.51925802e-09f, -0.0f, 0.0f, -0.0f, 7.91624188e-09f, -0.0f, 0.0f, -0.0f, 6.51925802e-09f,
    -0.0f, 0.0f, -0.0f, 5.58793545e-09f, -0.0f, 0.0f, -0.0f, 5.12227416e-09f, -0.0f,
    3.5605859e-05f, -0.0f, 4.7404319e-07f, -0.0f, 0.000103058293f, -0.0f, 3.32854688e-06f,
    -0.0f, 0.000267435331f, -0.0f, 1.92606822e-05f, -0.0f, 0.00062158145f, -0.0f,
    9.18558799e-05f, -0.0f, 0.00129135419f, -0.0f, 0.000361203216f, -0.0f, 0.00239030598f,
    -0.0f, 0.00116978399f, -0.0f, 0.00392276887f, -0.0f, 0.00311026676f, -0.0f, 0.00566437747f,
    -0.0f, 0.00674651191f, -0.0f, 0.00710571371f, -0.0f, 0.0117979851f, -0.0f, 0.00756200543f,
    -0.0f, 0.0162516553f, -0.0f, 0.00647294568f, -0.0f, 0.0167241357f, -0.0f, 0.00376017811f,
    -0.0f, 0.0108497385f, -0.0f, 0.0f, -0.0f, 0.0f, -0.0f, -0.00376017811f, 0.0f,
    -0.0108497385f, 0.0f, -0.00647294568f, 0.0f, -0.0167241357f, 0.0f, -0.00756200543f, 0.0f,
    -0.0162516553f, 0.0f, -0.00710571371f, 0.0f, -0.0117979851f, 0.0f, -0.00566437747f, 0.0f,
    -0.00674651191f, 0.0f, -0.00392276887f, 0.0f, -0.00311026676f, 0.0f, -0.00239030598f, 0.0f,
    -0.00116978399f, 0.0f, -0.00129135419f, 0.0f, -0.000361203216f, 0.0f, -0.00062158145f, 0.0f,
    -9.18558799e-05f, 0.0f, -0.000267435331f, 0.0f, -1.92606822e-05f, 0.0f, -0.000103058293f,
    0.0f, -3.32854688e-06f, 0.0f, -3.5605859e-05f, 0.0f, -4.7404319e-07f, 0.0f, 2.8743023e-05f,
    1.95585417e-05f, 4.16110993e-07f, 1.88399341e-07f, 7.91122948e-05f, 6.24270324e-05f,
    2.83166423e-06f, 1.48255435e-06f, 0.000193269618f, 0.000177043577f, 1.57660597e-05f,
    9.56532222e-06f, 0.000417618518f, 0.000446113263f, 7.17171351e-05f, 5.05492062e-05f,
    0.000793336134f, 0.000998019823f, 0.000266127638f, 0.000218750545f, 0.00131139148f,
    0.00197882415f, 0.000802490045f, 0.000774071435f, 0.0018518999f, 0.00346664595f,
    0.00195177679f, 0.00223324774f, 0.00215161592f, 0.00533831446f, 0.00377517683f,
    0.00522460556f, 0.00186173327f, 0.00716304127f, 0.00564463157f, 0.0098135313f,
    0.000720298209f, 0.00824447535f, 0.00609464338f, 0.0145206694f, -0.00123378064f,
    0.00788430125f, 0.00370042166f, 0.0162359606f, -0.00356155518f, 0.00577961607f,
    -0.00135056279f, 0.0121762436f, -0.00556217413f, 0.00230392814f, -0.00672185374f,
    0.0027842829f, -0.00660520559f, -0.00156840577f, -0.00956489611f, -0.0076549123f,
    -0.00644745771f, -0.00470262859f, -0.00886396412f, -0.0140971504f, -0.00532039721f,
    -0.00633905269f, -0.00595810032f, -0.0145772276f, -0.00374859083f, -0.00638147956f,
    -0.00294785737f, -0.0109305717f, -0.00225333637f, -0.00529618049f, -0.00102490094f,
    -0.00636380725f, -0.00114179787f, -0.00376077997f, -0.000199029993f, -0.00295925932f,
    -0.000471946201f, -0.0023265339f, 2.00949889e-05f, -0.00111479731f, -0.000144733247f,
    -0.00126667996f, 3.35006625e-05f, -0.000342860643f, -2.01488347e-05f, -0.000610750576f,
    1.49679881e-05f, -8.64553585e-05f, 1.14735385e-05f, -0.000261850975f, 4.38458392e-06f,
    -1.79119925e-05f, 1.17982618e-05f, -0.000100083416f, 9.53964786e-07f, -3.05061326e-06f,
    6.49440881e-06f, -3.41543637e-05f, 1.61016459e-07f, -4.27453358e-07f, 1.19454526e-05f,
    3.00740321e-05f, 2.72459715e-07f, 3.04251728e-07f, 2.21994578e-05f, 9.15471974e-05f,
    1.63264303e-06f, 2.30942715e-06f, 2.27954388e-05f, 0.000245492731f, 7.58128544e-06f,
    1.42822391e-05f, -3.3666478e-05f, 0.00057872833f, 2.61299556e-05f, 7.17870644e-05f,
    -0.000261458044f, 0.00119475659f, 5.91391763e-05f, 0.000292675744f, -0.000861185079f,
    0.00214551436f, 3.7943526e-05f, 0.000964093371f, -0.00207850197f, 0.00331176072f,
    -0.000337279664f, 0.00254857005f, -0.00405924302f, 0.00429516658f, -0.00174591166f,
    0.00534128072f, -0.00663030287f, 0.0044481447f, -0.00496710697f, 0.00866972841f,
    -0.00915384851f, 0.00313936011f, -0.00982616935f, 0.0103397304f, -0.0106519265f,
    0.000182452146f, -0.0141150756f, 0.00767887523f, -0.0102574881f, -0.00385421095f,
    -0.0143433623f, 0.000207628153f, -0.00776183093f, -0.00776183093f, -0.00877481233f,
    -0.00877481233f, -0.00385421095f, -0.0102574881f, 0.000207628153f, -0.0143433623f,
    0.000182452146f, -0.0106519265f, 0.00767887523f, -0.0141150756f, 0.00313936011f,
    -0.00915384851f, 0.0103397304f, -0.00982616935f, 0.0044481447f, -0.00663030287f,
    0.00866972841f, -0.00496710697f, 0.00429516658f, -0.00405924302f, 0.00534128072f,
    -0.00174591166f, 0.00331176072f, -0.00207850197f, 0.00254857005f, -0.000337279664f,
    0.00214551436f, -0.000861185079f, 0.000964093371f, 3.7943526e-05f, 0.00119475659f,
    -0.000261458044f, 0.000292675744f, 5.91391763e-05f, 0.00057872833f, -3.3666478e-05f,
    7.17870644e-05f, 2.61299556e-05f, 0.000245492731f, 2.27954388e-05f, 1.42822391e-05f,
    7.58128544e-06f, 9.15471974e-05f, 2.21994578e-05f, 2.30942715e-06f, 1.63264303e-06f,
    3.00740321e-05f, 1.19454526e-05f, 3.04251728e-07f, 2.72459715e-07f, -6.05340301e-06f,
    2.80516906e-05f, 1.11570195e-07f, 3.19392228e-07f, -3.4334782e-05f, 7.6764205e-05f,
    3.70208227e-07f, 2.27089799e-06f, -0.000131665802f, 0.000178895454f, -4.29537749e-07f,
    1.29381697e-05f, -0.000398526696f, 0.000346958026f, -1.47245755e-05f, 5.86098213e-05f,
    -0.000998628791f, 0.000531199097f, -0.000107293112f, 0.000208541212f, -0.00210960209f,
    0.000542341557f, -0.000497969508f, 0.000569394615f, -0.00377453933f, 5.99579698e-06f,
    -0.00167555478f, 0.00113307161f, -0.00568774855f, -0.00154417555f, -0.00423768302f,
    0.00140424503f, -0.00707742758f, -0.00436786423f, -0.00808312744f, 0.000167296646f,
    -0.00690682186f, -0.00812889915f, -0.0113397073f, -0.00375234941f, -0.00444606552f,
    -0.0117379157f, -0.0107063642f, -0.00964127388f, 9.4523959e-05f, -0.0137227131f,
    -0.00429540407f, -0.0140411546f, 0.00540057477f, -0.0130381407f, 0.00545712048f,
    -0.0131746549f, 0.00963658467f, -0.00977026206f, 0.0129659055f, -0.00689128647f,
    0.0114438031f, -0.00515611656f, 0.0143879531f, 0.00075313315f, 0.0106318602f,
    -0.000864138943f, 0.0106716957f, 0.00536507275f, 0.00809304323f, 0.00191595079f,
    0.00559733761f, 0.0058339308f, 0.00511374278f, 0.0029299485f, 0.00200354331f,
    0.00398944551f, 0.00266476278f, 0.00267324201f, 0.000383593579f, 0.00198599882f,
    0.00110822055f, 0.00187520729f, -5.05051867e-05f, 0.00075474038f, 0.000330522744f,
    0.00108175166f, -7.1593211e-05f, 0.000223328592f, 3.64645566e-05f, 0.000527137308f,
    -3.10315554e-05f, 5.18552515e-05f, -3.3396409e-05f, 0.00021959997f, -8.84493875e-06f,
    9.45239663e-06f, -3.00021311e-05f, 7.85588491e-05f, -1.86754426e-06f, 1.34399068e-06f,
    -1.5555137e-05f, 2.41159414e-05f, -3.0473646e-07f, 1.46952374e-07f, -1.73161025e-05f,
    1.69449413e-05f, -5.90060401e-09f, 2.59023096e-07f, -6.27819245e-05f, 3.43859174e-05f,
    -4.41452897e-07f, 1.65582549e-06f, -0.000186350691f, 4.21540863e-05f, -4.74175658e-06f,
    8.12266262e-06f, -0.000459220639f, -2.84307953e-05f, -3.16216938e-05f, 2.93584617e-05f,
    -0.000937471865f, -0.000345785229f, -0.000150668056f, 6.97110227e-05f, -0.00155370636f,
    -0.0011912639f, -0.000532545033f, 5.46668161e-05f, -0.00196983456f, -0.00285102311f,
    -0.00139915477f, -0.000346847402f, -0.00152980885f, -0.00533724995f, -0.00265207794f,
    -0.0018345156f, 0.000496683177f, -0.00806177314f, -0.00326314662f, -0.0049962122f,
    0.0043543037f, -0.00978940539f, -0.00137962226f, -0.00902283471f, 0.00926736742f,
    -0.00915686041f, 0.00386146223f, -0.0109910183f, 0.0134888627f, -0.00559914811f,
    0.0101753324f, -0.00783035252f, 0.0151626933f, 8.67361738e-19f, 0.0130705722f,
    6.50521303e-19f, 0.0134888627f, 0.00559914811f, 0.0101753324f, 0.00783035252f,
    0.00926736742f, 0.00915686041f, 0.00386146223f, 0.0109910183f, 0.0043543037f,
    0.00978940539f, -0.00137962226f, 0.00902283471f, 0.000496683177f, 0.00806177314f,
    -0.00326314662f, 0.0049962122f, -0.00152980885f, 0.00533724995f, -0.00265207794f,
    0.0018345156f, -0.00196983456f, 0.00285102311f, -0.00139915477f, 0.000346847402f,
    -0.00155370636f, 0.0011912639f, -0.000532545033f, -5.46668161e-05f, -0.000937471865f,
    0.000345785229f, -0.000150668056f, -6.97110227e-05f, -0.000459220639f, 2.84307953e-05f,
    -3.16216938e-05f, -2.93584617e-05f, -0.000186350691f, -4.21540863e-05f, -4.74175658e-06f,
    -8.12266262e-06f, -6.27819245e-05f, -3.43859174e-05f, -4.41452897e-07f, -1.65582549e-06f,
    -1.73161025e-05f, -1.69449413e-05f, -5.90060401e-09f, -2.59023096e-07f, -1.90584979e-05f,
    3.86726879e-06f, -5.87358784e-08f, 1.73528107e-07f, -5.74373516e-05f, -7.85390603e-06f,
    -6.87143995e-07f, 9.3446539e-07f, -0.000138941177f, -7.15384449e-05f, -5.10973541e-06f,
    3.38849827e-06f, -0.000259496388f, -0.000278129417f, -2.6943957e-05f, 5.37264441e-06f,
    -0.000325077475f, -0.000770283106f, -0.000102511025f, -2.24477426e-05f, -6.56480479e-05f,
    -0.00165992673f, -0.000272881967f, -0.000203228454f, 0.000967992062f, -0.00282769045f,
    -0.000443104946f, -0.000815236708f, 0.00317802653f, -0.00370151317f, -0.000110990695f,
    -0.00210804283f, 0.00645298697f, -0.00328664132f, 0.00160938152f, -0.00365301338f,
    0.0097773578f, -0.000689239707f, 0.00499987975f, -0.00381953921f, 0.0114385346f,
    0.00404211925f, 0.00833192654f, -0.00081771682f, 0.0100095803f, 0.00945515931f,
    0.00840458088f, 0.00477946084f, 0.00549503975f, 0.0132661993f, 0.00385515369f,
    0.0093071647f, -0.000392034854f, 0.0137636485f, -0.00256334711f, 0.00932252593f,
    -0.00523005566f, 0.0109464759f, -0.00646977499f, 0.00531334849f, -0.00740100211f,
    0.00642627012f, -0.006236271f, 0.00083462667f, -0.00688695721f, 0.00223894441f,
    -0.00372107513f, -0.00144506583f, -0.00486456929f, -0.000370160968f, -0.00141212903f,
    -0.00156909367f, -0.00268395292f, -0.00131500536f, -0.000263136899f, -0.000889781921f,
    -0.00112732523f, -0.00122016564f, 4.92524669e-05f, -0.000336660887f, -0.000314807898f,
    -0.000774536864f, 5.66132912e-05f, -8.83591929e-05f, -1.31755323e-05f, -0.000380158861f,
    2.28512872e-05f, -1.52532211e-05f, 4.76609275e-05f, -0.000148831576f, 6.00915882e-06f,
    -1.21709854e-06f, 3.50607916e-05f, -4.61678937e-05f, 1.14665102e-06f, 1.74882629e-07f,
    1.62109645e-05f, -1.07418209e-05f, 1.64235445e-07f, 8.11703629e-08f, -1.38512105e-05f,
    -5.25175392e-06f, -6.22952783e-08f, 1.02517951e-07f, -3.23366257e-05f, -3.06224756e-05f,
    -5.65284154e-07f, 4.21088345e-07f, -4.87841644e-05f, -0.000110735258f, -3.44448972e-06f,
    6.48444825e-07f, -3.69591999e-06f, -0.000296824175f, -1.44282667e-05f, -4.87491525e-06f,
    0.000254499901f, -0.000607056485f, -3.82104154e-05f, -4.40924523e-05f, 0.000961066049f,
    -0.00090734486f, -3.65035594e-05f, -0.000189556638f, 0.00227590743f, -0.000783790427f,
    0.000172155196f, -0.000509664067f, 0.00396154495f, 0.000401339872f, 0.000934425159f,
    -0.000825323281f, 0.00513600092f, 0.0030851115f, 0.00236252882f, -0.000432709465f,
    0.00452233385f, 0.00685555441f, 0.0035793893f, 0.00148974755f, 0.00133765745f,
    0.0101848822f, 0.00282385619f, 0.00450914819f, -0.00376277557f, 0.0111210821f,
    -0.00062654668f, 0.00630555628f, -0.00867866352f, 0.00867866352f, -0.0047336123f,
    0.0047336123f, -0.0111210821f, 0.00376277557f, -0.00630555628f, 0.00062654668f,
    -0.0101848822f, -0.00133765745f, -0.00450914819f, -0.00282385619f, -0.00685555441f,
    -0.00452233385f, -0.00148974755f, -0.0035793893f, -0.0030851115f, -0.00513600092f,
    0.000432709465f, -0.00236252882f, -0.000401339872f, -0.00396154495f, 0.000825323281f,
    -0.000934425159f, 0.000783790427f, -0.00227590743f, 0.000509664067f, -0.000172155196f,
    0.00090734486f, -0.000961066049f, 0.000189556638f, 3.65035594e-05f, 0.000607056485f,
    -0.000254499901f, 4.40924523e-05f, 3.82104154e-05f, 0.000296824175f, 3.69591999e-06f,
    4.87491525e-06f, 1.44282667e-05f, 0.000110735258f, 4.87841644e-05f, -6.48444825e-07f,
    3.44448972e-06f, 3.06224756e-05f, 3.23366257e-05f, -4.21088345e-07f, 5.65284154e-07f,
    5.25175392e-06f, 1.38512105e-05f, -1.02517951e-07f, 6.22952783e-08f, -6.54775886e-06f,
    -8.43720773e-06f, -4.41487025e-08f, 5.93181682e-08f, -6.64917343e-06f, -3.16342121e-05f,
    -3.35849251e-07f, 1.75178812e-07f, 2.15883811e-05f, -8.5556916e-05f, -1.65569804e-06f,
    -1.91804105e-07f, 0.000141338925f, -0.000165271849f, -4.70889063e-06f, -5.11126473e-06f,
    0.000447761733f, -0.000186964811f, -1.50916537e-06f, -2.78493426e-05f, 0.000979221077f,
    7.75833178e-05f, 5.21429138e-05f, -8.2473096e-05f, 0.00153060129f, 0.000958693272f,
    0.000255908759f, -0.000115437448f, 0.00151372573f, 0.00261041243f, 0.000651794369f,
    0.000108419117f, 0.000160024676f, 0.00458139181f, 0.000917352678f, 0.000907209178f,
    -0.00281404727f, 0.00567823276f, 0.000302912696f, 0.00210336875f, -0.00653179688f,
    0.00458356412f, -0.00153051328f, 0.00257358048f, -0.00910347514f, 0.00100842759f,
    -0.00345733762f, 0.00117883331f, -0.0088593103f, -0.00366964657f, -0.00360066863f,
    -0.00149144582f, -0.00572406268f, -0.00715019461f, -0.00161114591f, -0.0032782678f,
    -0.00137760863f, -0.00785974693f, 0.000737559982f, -0.00290203257f, 0.0020252848f,
    -0.00600494863f, 0.00170149782f, -0.00127311458f, 0.00335268793f, -0.00312637887f,
    0.00129016f, 7.17252897e-06f, 0.00291620614f, -0.000775474531f, 0.000537552114f,
    0.000384224346f, 0.0017601971f, 0.000404399994f, 9.93282083e-05f, 0.000262581423f,
    0.00074727356f, 0.000637554156f, -2.14466763e-05f, 9.51878901e-05f, 0.00018441127f,
    0.000448819454f, -2.07596004e-05f, 1.86253183e-05f, -1.69231371e-05f, 0.000216806555f,
    -6.94389882e-06f, 2.8452132e-07f, -4.52325839e-05f, 7.57631642e-05f, -1.30638125e-06f,
    -1.03512934e-06f, -2.70704422e-05f, 1.7667091e-05f, -1.13611165e-07f, -3.61351397e-07f,
    -1.05959716e-05f, 1.33604237e-06f, 1.07264313e-08f, -7.3162127e-08f, -9.26989458e-07f,
    -7.19981108e-06f, -2.38907933e-08f, 3.85522689e-08f, 8.1781991e-06f, -2.04777116e-05f,
    -1.53034051e-07f, 1.05990907e-07f, 4.6881647e-05f, -3.78253644e-05f, -5.62797879e-07f,
    -8.61085638e-08f, 0.000146925027f, -2.34814124e-05f, -3.90716423e-07f, -2.1488886e-06f,
    0.000311235141f, 0.00012052527f, 7.51176776e-06f, -8.5465872e-06f, 0.00042198255f,
    0.000534273859f, 4.39186078e-05f, -9.35092066e-06f, 0.000166674698f, 0.00125126145f,
    0.000122240439f, 5.17240878e-05f, -0.000840718218f, 0.00195271941f, 0.000156295107f,
    0.000271033612f, -0.00264305295f, 0.00189578044f, -0.000103609404f, 0.000608099625f,
    -0.00450948207f, 0.000348658592f, -0.000808199053f, 0.000655024603f, -0.00509872613f,
    -0.00259343255f, -0.00150265743f, -8.54420869e-05f, -0.00344513124f, -0.00561118871f,
    -0.00129120832f, -0.00135282264f, 0.0f, -0.00690018944f, 0.0f, -0.00200788165f,
    0.00344513124f, -0.00561118871f, 0.00129120832f, -0.00135282264f, 0.00509872613f,
    -0.00259343255f, 0.00150265743f, -8.54420869e-05f, 0.00450948207f, 0.000348658592f,
    0.000808199053f, 0.000655024603f, 0.00264305295f, 0.00189578044f, 0.000103609404f,
    0.000608099625f, 0.000840718218f, 0.00195271941f, -0.000156295107f, 0.000271033612f,
    -0.000166674698f, 0.00125126145f, -0.000122240439f, 5.17240878e-05f, -0.00042198255f,
    0.000534273859f, -4.39186078e-05f, -9.35092066e-06f, -0.000311235141f, 0.00012052527f,
    -7.51176776e-06f, -8.5465872e-06f, -0.000146925027f, -2.34814124e-05f, 3.90716423e-07f,
    -2.1488886e-06f, -4.6881647e-05f, -3.78253644e-05f, 5.62797879e-07f, -8.61085638e-08f,
    -8.1781991e-06f, -2.04777116e-05f, 1.53034051e-07f, 1.05990907e-07f, 9.26989458e-07f,
    -7.19981108e-06f, 2.38907933e-08f, 3.85522689e-08f, 1.7388644e-06f, -4.28528892e-06f,
    -8.97532715e-09f, 3.03246033e-08f, 1.14020686e-05f, -8.17571981e-06f, -5.12214378e-08f,
    1.06711141e-07f, 3.81832942e-05f, -1.84357305e-06f, -1.09231948e-07f, 2.00199949e-07f,
    8.13344159e-05f, 4.84165394e-05f, 5.32120623e-07f, 1.3702747e-07f, 9.17830912e-05f,
    0.000193215616f, 4.93595871e-06f, 1.10480562e-06f, -6.46731569e-05f, 0.000435558264f,
    1.65626643e-05f, 1.2243132e-05f, -0.000553866499f, 0.000608895556f, 1.9844545e-05f,
    5.45181138e-05f, -0.00135503395f, 0.0003328936f, -4.76949645e-05f, 0.000123924008f,
    -0.00201323954f, -0.000741940516f, -0.000242829716f, 0.000110046065f, -0.00174352725f,
    -0.00243578083f, -0.000436096918f, -0.000161435426f, -8.61973094e-05f, -0.00379891321f,
    -0.000289309508f, -0.000620503037f, 0.00239171786f, -0.0036718254f, 0.000301143067f,
    -0.000796628243f, 0.00424542138f, -0.00175851106f, 0.000843150134f, -0.000349244219f,
    0.00428757258f, 0.000905172783f, 0.000776241533f, 0.000350360904f, 0.00262528658f,
    0.00274718809f, 0.000234189181f, 0.000643334584f, 0.000489497266f, 0.00295521715f,
    -0.000194214997f, 0.000422519166f, -0.000898944098f, 0.00194820645f, -0.000249520846f,
    9.38922167e-05f, -0.00119354506f, 0.00072276243f, -0.000121352939f, -5.3902073e-05f,
    -0.000822196947f, -3.89113957e-05f, -2.45179162e-05f, -5.2582338e-05f, -0.000353717012f,
    -0.000262255373f, 3.05436993e-06f, -2.03687741e-05f, -7.17236253e-05f, -0.000201524512f,
    2.70903433e-06f, -4.27146551e-06f, 2.3276456e-05f, -9.1747781e-05f, 2.7937304e-07f,
    -4.73159133e-07f, 2.83032696e-05f, -2.56960629e-05f, -2.18801404e-07f, -6.43240909e-08f,
    1.38435862e-05f, -2.2813731e-06f, -1.11675199e-07f, -3.92371433e-08f, 4.25971939e-06f,
    1.80059396e-06f, -2.77892482e-08f, -1.50962176e-08f, 2.10843154e-06f, -1.74348349e-06f,
    -5.53759989e-11f, 2.75300529e-08f, 8.21676349e-06f, -5.63237336e-07f, -5.7670424e-09f,
    1.165876e-07f, 1.87529204e-05f, 1.21985486e-05f, 2.25306689e-08f, 3.7314885e-07f,
    1.8526127e-05f, 5.27132252e-05f, 3.68317643e-07f, 1.08072879e-06f, -3.96101568e-05f,
    0.000121761048f, 1.60997558e-06f, 3.40024235e-06f, -0.000218451838f, 0.000152947032f,
    1.95987604e-06f, 1.04062565e-05f, -0.000501872273f, -1.59089104e-05f, -9.83858354e-06f,
    2.19153717e-05f, -0.000667150307f, -0.000534439576f, -4.97462097e-05f, 1.50263768e-05f,
    -0.000324700784f, -0.00127777993f, -9.32751573e-05f, -5.84747504e-05f, 0.000719146279f,
    -0.00169930258f, -4.23868078e-05f, -0.000191354004f, 0.00203614426f, -0.00116422807f,
    0.000156066773f, -0.000233683924f, 0.00268464931f, 0.00035845465f, 0.000335127843f,
    -4.03590457e-05f, 0.00200926815f, 0.00200926815f, 0.000252093741f, 0.000252093741f,
    0.00035845465f, 0.00268464931f, -4.03590457e-05f, 0.000335127843f, -0.00116422807f,
    0.00203614426f, -0.000233683924f, 0.000156066773f, -0.00169930258f, 0.000719146279f,
    -0.000191354004f, -4.23868078e-05f, -0.00127777993f, -0.000324700784f, -5.84747504e-05f,
    -9.32751573e-05f, -0.000534439576f, -0.000667150307f, 1.50263768e-05f, -4.97462097e-05f,
    -1.59089104e-05f, -0.000501872273f, 2.19153717e-05f, -9.83858354e-06f, 0.000152947032f,
    -0.000218451838f, 1.04062565e-05f, 1.95987604e-06f, 0.000121761048f, -3.96101568e-05f,
    3.40024235e-06f, 1.60997558e-06f, 5.27132252e-05f, 1.8526127e-05f, 1.08072879e-06f,
    3.68317643e-07f, 1.21985486e-05f, 1.87529204e-05f, 3.7314885e-07f, 2.25306689e-08f,
    -5.63237336e-07f, 8.21676349e-06f, 1.165876e-07f, -5.7670424e-09f, -1.74348349e-06f,
    2.10843154e-06f, 2.75300529e-08f, -5.53759989e-11f, 1.44636567e-06f, -3.12645511e-07f,
    4.35319913e-09f, 2.6160718e-08f, 3.88649278e-06f, 2.03377681e-06f, 1.38636507e-08f,
    1.1807343e-07f, 4.17352567e-06f, 1.12502903e-05f, 5.61871261e-08f, 4.24396916e-07f,
    -1.12400694e-05f, 2.86657269e-05f, 1.82803234e-07f, 1.25800921e-06f, -6.36795812e-05f,
    3.41544655e-05f, 2.33225975e-07f, 3.1087061e-06f, -0.000149209503f, -3.00104221e-05f,
    -1.32678258e-06f, 5.7923603e-06f, -0.000181134965f, -0.000223088151f, -7.79988295e-06f,
    4.84774409e-06f, 6.71109638e-06f, -0.000489294354f, -1.65582896e-05f, -1.12169892e-05f,
    0.000494862383f, -0.000570601725f, -6.03986518e-06f, -4.53854445e-05f, 0.00104640727f,
    -0.000161119184f, 4.47584134e-05f, -6.09447561e-05f, 0.00114764192f, 0.000707014813f,
    9.65971922e-05f, -5.48501339e-06f, 0.000479986251f, 0.00148250896f, 6.49174399e-05f,
    8.97859209e-05f, -0.000625861867f, 0.00151096424f, -4.49407162e-05f, 0.000108496482f,
    -0.00138769369f, 0.000708890613f, -0.000109391796f, 1.75846726e-05f, -0.00131144037f,
    -0.000311570388f, -6.44260363e-05f, -7.2183022e-05f, -0.000625993242f, -0.000853850157f,
    1.14454715e-05f, -7.47434242e-05f, 5.35558065e-05f, -0.000753396889f, 3.63631843e-05f,
    -2.78215248e-05f, 0.000341237901f, -0.000350728835f, 1.9640087e-05f, 3.77686956e-06f,
    0.000285828894f, -2.96653889e-05f, 2.08747747e-06f, 8.94322329e-06f, 0.000126727624f,
    8.42864829e-05f, -3.15764009e-06f, 5.03399406e-06f, 2.0877409e-05f, 6.91791211e-05f,
    -2.36310279e-06f, 2.03327136e-06f, -1.23218006e-05f, 2.82176588e-05f, -1.01880823e-06f,
    7.60285445e-07f, -1.09062848e-05f, 5.00402848e-06f, -3.39824226e-07f, 2.60363635e-07f,
    -4.18626269e-06f, -1.31006789e-06f, -9.32936075e-08f, 7.36874455e-08f, -8.01661201e-07f,
    -1.2438087e-06f, -2.15765983e-08f, 1.54202446e-08f, 6.86528153e-07f, 1.85311791e-07f,
    6.38090736e-09f, 2.43188971e-08f, 9.9780857e-07f, 1.81588518e-06f, 2.45347476e-08f,
    1.12719469e-07f, -1.98205953e-06f, 5.63095909e-06f, 7.7391114e-08f, 4.1521551e-07f,
    -1.46196626e-05f, 7.15816032e-06f, 1.60270091e-07f, 1.19104448e-06f, -3.77139077e-05f,
    -1.05623631e-05f, 8.06801737e-08f, 2.577038e-06f, -4.47776838e-05f, -6.91397945e-05f,
    -8.00949465e-07f, 3.66053496e-06f, 2.5020212e-05f, -0.000152178181f, -2.67568294e-06f,
    1.31026047e-06f, 0.000207086196f, -0.00015939241f, -2.14304873e-06f, -7.46382557e-06f,
    0.000401165336f, 4.12631052e-05f, 6.93804441e-06f, -1.65328001e-05f, 0.000368507957f,
    0.000430090411f, 1.93707874e-05f, -9.39584788e-06f, -3.70410417e-05f, 0.000721450546f,
    1.23276586e-05f, 1.48042027e-05f, -0.000606094429f, 0.000575834187f, -2.00437407e-05f,
    2.42709266e-05f, -0.000877726823f, 8.67361738e-19f, -4.03672821e-05f, 6.50521303e-19f,
    -0.000606094429f, -0.000575834187f, -2.00437407e-05f, -2.42709266e-05f, -3.70410417e-05f,
    -0.000721450546f, 1.23276586e-05f, -1.48042027e-05f, 0.000368507957f, -0.000430090411f,
    1.93707874e-05f, 9.39584788e-06f, 0.000401165336f, -4.12631052e-05f, 6.93804441e-06f,
    1.65328001e-05f, 0.000207086196f, 0.00015939241f, -2.14304873e-06f, 7.46382557e-06f,
    2.5020212e-05f, 0.000152178181f, -2.67568294e-06f, -1.31026047e-06f, -4.47776838e-05f,
    6.91397945e-05f, -8.00949465e-07f, -3.66053496e-06f, -3.77139077e-05f, 1.05623631e-05f,
    8.06801737e-08f, -2.577038e-06f, -1.46196626e-05f, -7.15816032e-06f, 1.60270091e-07f,
    -1.19104448e-06f, -1.98205953e-06f, -5.63095909e-06f, 7.7391114e-08f, -4.1521551e-07f,
    9.9780857e-07f, -1.81588518e-06f, 2.45347476e-08f, -1.12719469e-07f, 6.86528153e-07f,
    -1.85311791e-07f, 6.38090736e-09f, -2.43188971e-08f, 1.9937174e-07f, 2.0677507e-07f,
    7.89772159e-09f, 2.19629133e-08f, -2.09634322e-07f, 8.51592461e-07f, 3.21829532e-08f,
    1.04525341e-07f, -2.71741237e-06f, 1.26992018e-06f, 1.01564545e-07f, 3.87534982e-07f,
    -8.35401352e-06f, -2.55803866e-06f, 2.22073396e-07f, 1.09314999e-06f, -1.10438932e-05f,
    -1.75586956e-05f, 2.80351372e-07f, 2.26945122e-06f, 8.00772978e-06f, -4.13341222e-05f,
    -4.09398382e-09f, 3.09830443e-06f, 6.42699451e-05f, -4.21998848e-05f, -5.44804038e-07f,
    1.65520498e-06f, 0.000125789345f, 3.06761976e-05f, -2.01689019e-07f, -2.95303198e-06f,
    9.79844554e-05f, 0.000174973713f, 1.39546739e-06f, -7.36178299e-06f, -8.52462908e-05f,
    0.000269729237f, 3.23180387e-07f, -7.34036257e-06f, -0.000325586443f, 0.000157445713f,
    -6.93334277e-06f, -6.80518087e-06f, -0.000391498674f, -0.000149003565f, -1.3136817e-05f,
    -1.30936114e-05f, -0.000168332554f, -0.000406390755f, -8.61473563e-06f, -2.07978119e-05f,
    0.000171469932f, -0.000382192811f, 3.05509786e-08f, -1.85477129e-05f, 0.000341555307f,
    -0.00011889344f, 9.06241127e-08f, -9.71460304e-06f, 0.000251005607f, 0.000130449145f,
    -5.41894315e-06f, -4.96189705e-06f, 5.44396244e-05f, 0.000193010579f, -6.19231105e-06f,
    -4.21882214e-06f, -6.72551541e-05f, 0.000110637848f, -1.9454933e-06f, -2.2307247e-06f,
    -7.52855412e-05f, 1.56058886e-05f, 1.55564123e-06f, 7.85172006e-07f, -3.48899594e-05f,
    -2.35653188e-05f, 2.19372691e-06f, 2.1879373e-06f, -4.60666161e-06f, -2.02250849e-05f,
    1.40650593e-06f, 1.80298275e-06f, 4.09837276e-06f, -7.7159857e-06f, 6.15944145e-07f,
    9.30003353e-07f, 2.81946996e-06f, -1.02353147e-06f, 2.02211623e-07f, 3.45845592e-07f,
    7.50400659e-07f, 4.53932955e-07f, 5.11537905e-08f, 9.66673639e-08f, 5.23494714e-09f,
    2.87189181e-07f, 9.94559279e-09f, 2.11146585e-08f, -1.51070534e-08f, 9.67996883e-08f,
    9.44218836e-09f, 1.99768433e-08f, -4.3878299e-07f, 1.30122388e-07f, 3.85894907e-08f,
    9.58258468e-08f, -1.68139354e-06f, -6.37085122e-07f, 1.25434667e-07f, 3.57583872e-07f,
    -2.81750613e-06f, -4.06967411e-06f, 2.99001698e-07f, 1.00714215e-06f, 8.91509387e-07f,
    -1.05668269e-05f, 4.9208694e-07f, 2.09240466e-06f, 1.54139088e-05f, -1.22219371e-05f,
    4.64869771e-07f, 2.94521442e-06f, 3.37908969e-05f, 8.00811176e-06f, 5.98872196e-09f,
    2.06810319e-06f, 2.46367163e-05f, 5.37734122e-05f, -7.88422028e-07f, -1.49161394e-06f,
    -4.07789485e-05f, 8.37695407e-05f, -1.87105707e-06f, -6.42831628e-06f, -0.000128300817f,
    3.26638474e-05f, -3.33466892e-06f, -1.04123483e-05f, -0.000138174655f, -9.81244448e-05f,
    -3.63524828e-06f, -1.25132092e-05f, -1.65771471e-05f, -0.000195528963f, 9.28126909e-08f,
    -1.18353228e-05f, 0.000145679151f, -0.000145679151f, 6.93201946e-06f, -6.93201946e-06f,
    0.000195528963f, 1.65771471e-05f, 1.18353228e-05f, -9.28126909e-08f, 9.81244448e-05f,
    0.000138174655f, 1.25132092e-05f, 3.63524828e-06f, -3.26638474e-05f, 0.000128300817f,
    1.04123483e-05f, 3.33466892e-06f, -8.37695407e-05f, 4.07789485e-05f, 6.42831628e-06f,
    1.87105707e-06f, -5.37734122e-05f, -2.46367163e-05f, 1.49161394e-06f, 7.88422028e-07f,
    -8.00811176e-06f, -3.37908969e-05f, -2.06810319e-06f, -5.98872196e-09f, 1.22219371e-05f,
    -1.54139088e-05f, -2.94521442e-06f, -4.64869771e-07f, 1.05668269e-05f, -8.91509387e-07f,
    -2.09240466e-06f, -4.9208694e-07f, 4.06967411e-06f, 2.81750613e-06f, -1.00714215e-06f,
    -2.99001698e-07f, 6.37085122e-07f, 1.68139354e-06f, -3.57583872e-07f, -1.25434667e-07f,
    -1.30122388e-07f, 4.3878299e-07f, -9.58258468e-08f, -3.85894907e-08f, -9.67996883e-08f,
    1.51070534e-08f, -1.99768433e-08f, -9.44218836e-09f, -7.43388426e-08f, 6.85313095e-09f,
    1.0458395e-08f, 1.86231084e-08f, -3.40831093e-07f, -1.90621918e-07f, 4.39754118e-08f,
    8.78507862e-08f, -7.64246295e-07f, -1.00545913e-06f, 1.46104455e-07f, 3.28566585e-07f,
    -4.19980722e-07f, -2.82405222e-06f, 3.67571687e-07f, 9.30122837e-07f, 2.56955423e-06f,
    -4.18297486e-06f, 6.60108697e-07f, 1.94934614e-06f, 7.62178934e-06f, -2.4635645e-07f,
    7.51380639e-07f, 2.8092586e-06f, 6.3680136e-06f, 1.20875256e-05f, 2.12051461e-07f,
    2.13788917e-06f, -1.23328982e-05f, 2.20194615e-05f, -1.14159923e-06f, -1.18122796e-06f,
    -4.06359432e-05f, 5.91055914e-06f, -2.91198035e-06f, -6.363578e-06f, -4.2201973e-05f,
    -4.03747326e-05f, -4.19373146e-06f, -1.07227306e-05f, 8.24194922e-06f, -7.39348761e-05f,
    -4.26885754e-06f, -1.15796138e-05f, 7.39564421e-05f, -4.37688577e-05f, -3.8954704e-06f,
    -8.10958409e-06f, 8.33243976e-05f, 3.45140979e-05f, -5.15827378e-06f, -2.13662679e-06f,
    2.13458479e-05f, 8.32443548e-05f, -8.4888552e-06f, 2.9798282e-06f, -4.64519144e-05f,
    5.81077911e-05f, -1.12065618e-05f, 5.16948512e-06f, -5.83905457e-05f, -1.29205284e-06f,
    -1.0547531e-05f, 4.61669924e-06f, -2.45545543e-05f, -3.29133472e-05f, -6.55881013e-06f,
    2.44064813e-06f, 6.84943416e-06f, -2.42907863e-05f, -1.64248684e-06f, 2.80217307e-08f,
    1.30500366e-05f, -4.04430557e-06f, 1.66165898e-06f, -1.36177289e-06f, 5.21521861e-06f,
    5.5636192e-06f, 2.51775214e-06f, -1.45513945e-06f, -1.14086072e-06f, 4.77475896e-06f,
    1.84516318e-06f, -9.1162849e-07f, -2.29387774e-06f, 1.69993518e-06f, 9.17608588e-07f,
    -3.97783737e-07f, -1.25137069e-06f, 1.70563197e-07f, 3.35643108e-07f, -1.29020208e-07f,
    -3.75794031e-07f, -1.06213925e-07f, 9.32151991e-08f, -3.10245767e-08f, -4.7719606e-08f,
    -5.74113947e-08f, 2.05637285e-08f, -5.77332493e-09f, -7.49714673e-08f, -3.53902578e-08f,
    1.07102096e-08f, 1.72294676e-08f, -2.28639692e-07f, -2.64961272e-07f, 4.79631126e-08f,
    8.05594027e-08f, -3.57627869e-07f, -8.46106559e-07f, 1.63912773e-07f, 3.00817192e-07f,
    -6.05359674e-09f, -1.64145604e-06f, 4.25148755e-07f, 8.57748091e-07f, 1.09756365e-06f,
    -1.52597204e-06f, 7.96746463e-07f, 1.81095675e-06f, 1.33551657e-06f, 9.73697752e-07f,
    9.71835107e-07f, 2.64449045e-06f, -2.83867121e-06f, 4.08105552e-06f, 4.02331352e-07f,
    2.06800178e-06f, -1.0904856e-05f, 7.20843673e-07f, -1.18790194e-06f, -1.05192885e-06f,
    -1.20964833e-05f, -1.28322281e-05f, -3.21026891e-06f, -6.06430694e-06f, 4.51505184e-06f,
    -2.38395296e-05f, -4.40748408e-06f, -1.03786588e-05f, 2.8016977e-05f, -1.19130127e-05f,
    -3.95579264e-06f, -1.17653981e-05f, 2.92756595e-05f, 1.94320455e-05f, -2.20257789e-06f,
    -1.07199885e-05f, 0.0f, 3.69166955e-05f, 0.0f, -9.86456871e-06f, -2.92756595e-05f,
    1.94320455e-05f, 2.20257789e-06f, -1.07199885e-05f, -2.8016977e-05f, -1.19130127e-05f,
    3.95579264e-06f, -1.17653981e-05f, -4.51505184e-06f, -2.38395296e-05f, 4.40748408e-06f,
    -1.03786588e-05f, 1.20964833e-05f, -1.28322281e-05f, 3.21026891e-06f, -6.06430694e-06f,
    1.0904856e-05f, 7.20843673e-07f, 1.18790194e-06f, -1.05192885e-06f, 2.83867121e-06f,
    4.08105552e-06f, -4.02331352e-07f, 2.06800178e-06f, -1.33551657e-06f, 9.73697752e-07f,
    -9.71835107e-07f, 2.64449045e-06f, -1.09756365e-06f, -1.52597204e-06f, -7.96746463e-07f,
    1.81095675e-06f, 6.05359674e-09f, -1.64145604e-06f, -4.25148755e-07f, 8.57748091e-07f,
    3.57627869e-07f, -8.46106559e-07f, -1.63912773e-07f, 3.00817192e-07f, 2.28639692e-07f,
    -2.64961272e-07f, -4.79631126e-08f, 8.05594027e-08f, 7.49714673e-08f, -3.53902578e-08f,
    -1.07102096e-08f, 1.72294676e-08f, -6.42666222e-08f, -4.58215439e-08f, 1.08472786e-08f,
    1.53359565e-08f, -1.7438677e-07f, -2.47141173e-07f, 5.09911935e-08f, 7.32465395e-08f,
    -2.74283479e-07f, -6.50576624e-07f, 1.79240999e-07f, 2.75232907e-07f, -2.2052491e-07f,
    -1.08195957e-06f, 4.73312355e-07f, 7.88851935e-07f, -1.53492266e-07f, -1.03958064e-06f,
    9.10960011e-07f, 1.67552309e-06f, -8.88065642e-07f, -4.46986377e-07f, 1.16030105e-06f,
    2.46717514e-06f, -2.84008252e-06f, -8.38078222e-07f, 5.88709213e-07f, 1.96767473e-06f,
    -3.59746241e-06f, -3.98824341e-06f, -1.16603553e-06f, -8.92980154e-07f, 7.93937772e-07f,
    -7.26641838e-06f, -3.48272715e-06f, -5.47322861e-06f, 8.36275558e-06f, -3.78733989e-06f,
    -4.96304847e-06f, -9.15504825e-06f, 9.06668902e-06f, 7.00570763e-06f, -4.63282231e-06f,
    -9.39206711e-06f, -1.89568675e-06f, 1.32956447e-05f, -2.70923033e-06f, -5.80018104e-06f,
    -1.31101879e-05f, 5.43041779e-06f, -1.1997875e-07f, 4.96968227e-08f, -1.07418937e-05f,
    -8.06098797e-06f, 2.18563218e-06f, 6.01706233e-06f, 1.45733395e-06f, -1.13649003e-05f,
    3.36529456e-06f, 9.91709476e-06f, 8.59141528e-06f, -3.23530776e-06f, 2.96419148e-06f,
    9.9830022e-06f, 5.69953227e-06f, 4.57673468e-06f, 1.40749694e-06f, 6.33281707e-06f,
    2.76323902e-07f, 5.36390417e-06f, -1.93079273e-07f, 1.4559439e-06f, -1.41563089e-06f,
    2.60085244e-06f, -9.75075864e-07f, -1.80763641e-06f, -3.11890147e-07f, 9.4402435e-07f,
    -9.24099595e-07f, -2.56501312e-06f, 6.26559086e-07f, 8.43629948e-07f, -5.40627752e-07f,
    -1.82891972e-06f, 6.09126346e-07f, 9.2099566e-07f, -2.23120153e-07f, -8.92484934e-07f,
    2.66079439e-07f, 6.53974837e-07f, -6.78765275e-08f, -3.21361568e-07f, 5.14451379e-08f,
    2.9806526e-07f, -1.57369069e-08f, -8.78493438e-08f, -1.30426407e-08f, 7.78440921e-08f,
    -3.17397464e-09f, -1.85143438e-08f, -5.66484957e-08f, -4.2873662e-08f, 1.14698455e-08f,
    1.33868125e-08f, -1.6157e-07f, -2.13223046e-07f, 5.40005303e-08f, 6.61166126e-08f,
    -3.03063104e-07f, -5.30822604e-07f, 1.9158739e-07f, 2.51569901e-07f, -4.49533474e-07f,
    -8.96876543e-07f, 5.13462055e-07f, 7.23231437e-07f, -6.83560245e-07f, -1.13107546e-06f,
    1.00720229e-06f, 1.54233828e-06f, -1.1478088e-06f, -1.33114361e-06f, 1.32354842e-06f,
    2.28648923e-06f, -1.46095181e-06f, -1.9572235e-06f, 7.57447708e-07f, 1.85161082e-06f,
    -5.03779006e-07f, -2.74209629e-06f, -1.14657576e-06f, -7.70525617e-07f, 1.73754154e-06f,
    -1.87531191e-06f, -3.80133133e-06f, -5.04658783e-06f, 2.43870136e-06f, 1.46519062e-06f,
    -5.80220103e-06f, -8.70044096e-06f, -7.78014623e-07f, 3.89684965e-06f, -6.34330581e-06f,
    -9.72881753e-06f, -4.6757059e-06f, 1.38345524e-06f, -6.16659827e-06f, -8.40271514e-06f,
    -3.65855749e-06f, -3.65855749e-06f, -6.72698661e-06f, -6.72698661e-06f, 1.38345524e-06f,
    -4.6757059e-06f, -8.40271514e-06f, -6.16659827e-06f, 3.89684965e-06f, -7.78014623e-07f,
    -9.72881753e-06f, -6.34330581e-06f, 1.46519062e-06f, 2.43870136e-06f, -8.70044096e-06f,
    -5.80220103e-06f, -1.87531191e-06f, 1.73754154e-06f, -5.04658783e-06f, -3.80133133e-06f,
    -2.74209629e-06f, -5.03779006e-07f, -7.70525617e-07f, -1.14657576e-06f, -1.9572235e-06f,
    -1.46095181e-06f, 1.85161082e-06f, 7.57447708e-07f, -1.33114361e-06f, -1.1478088e-06f,
    2.28648923e-06f, 1.32354842e-06f, -1.13107546e-06f, -6.83560245e-07f, 1.54233828e-06f,
    1.00720229e-06f, -8.96876543e-07f, -4.49533474e-07f, 7.23231437e-07f, 5.13462055e-07f,
    -5.30822604e-07f, -3.03063104e-07f, 2.51569901e-07f, 1.9158739e-07f, -2.13223046e-07f,
    -1.6157e-07f, 6.61166126e-08f, 5.40005303e-08f, -4.2873662e-08f, -5.66484957e-08f,
    1.33868125e-08f, 1.14698455e-08f, -5.29348299e-08f, -3.67468935e-08f, 1.23311947e-08f,
    1.19891368e-08f, -1.64876823e-07f, -1.85305808e-07f, 5.69187364e-08f, 5.99339742e-08f,
    -3.44916941e-07f, -4.64298381e-07f, 2.01607421e-07f, 2.287927e-07f, -5.78910033e-07f,
    -8.29379871e-07f, 5.46754052e-07f, 6.6013348e-07f, -8.42749444e-07f, -1.1879805e-06f,
    1.09009829e-06f, 1.41302974e-06f, -1.03734783e-06f, -1.50508401e-06f, 1.46520324e-06f,
    2.10661528e-06f, -8.87525744e-07f, -1.72897649e-06f, 9.11163966e-07f, 1.73009107e-06f,
    -2.37912829e-07f, -1.48509196e-06f, -1.09870143e-06f, -6.5546908e-07f, 2.72815583e-07f,
    -4.37551904e-07f, -3.92614493e-06f, -4.57956003e-06f, -3.13143715e-07f, 6.35474748e-07f,
    -5.85829457e-06f, -7.94374319e-06f, -1.43711338e-06f, 2.46610199e-07f, -5.43693659e-06f,
    -8.83326811e-06f, -1.16275396e-06f, -1.28619843e-06f, -2.49236973e-06f, -7.33062325e-06f,
    6.7836811e-07f, -1.63772552e-06f, 2.10630628e-06f, -5.0850731e-06f, 1.73167086e-06f,
    -8.72884556e-08f, 6.94590517e-06f, -3.42116186e-06f, 8.41812891e-07f, 1.19057245e-06f,
    1.00905581e-05f, -2.40156942e-06f, -2.27922484e-07f, 6.70774568e-07f, 9.7595148e-06f,
    -1.47463504e-06f, 1.16486184e-07f, -5.02305681e-07f, 6.01444162e-06f, -4.62034109e-07f,
    1.21834842e-06f, -8.81888866e-07f, 1.24038593e-06f, 3.13412642e-07f, 1.85014642e-06f,
    -5.94995527e-07f, -1.8676493e-06f, 5.79068853e-07f, 1.79777078e-06f, -3.30739425e-07f,
    -2.52565701e-06f, 4.53546733e-07f, 1.43594298e-06f, -2.44115228e-07f, -1.76997889e-06f,
    2.28347034e-07f, 9.9581132e-07f, -1.7710893e-07f, -8.53398376e-07f, 8.01713469e-08f,
    5.722016e-07f, -8.44154329e-08f, -3.0433884e-07f, 1.92228935e-08f, 2.47616526e-07f,
    -1.44454697e-08f, -8.2627345e-08f, 2.1320925e-09f, 6.34145536e-08f, 1.14466001e-08f,
    -1.71970704e-08f, -2.41871578e-10f, -5.11799279e-08f, -3.08825427e-08f, 1.28572877e-08f,
    1.10477512e-08f, -1.70558991e-07f, -1.63803051e-07f, 5.90796425e-08f, 5.45484689e-08f,
    -3.76038315e-07f, -4.18244724e-07f, 2.10312066e-07f, 2.07056274e-07f, -6.46595367e-07f,
    -7.73745398e-07f, 5.75172464e-07f, 5.99083535e-07f, -9.03613739e-07f, -1.14341685e-06f,
    1.15972853e-06f, 1.28870442e-06f, -1.0167762e-06f, -1.4053561e-06f, 1.5868585e-06f,
    1.9290062e-06f, -8.71568318e-07f, -1.41814689e-06f, 1.04164508e-06f, 1.60492277e-06f,
    -5.69201859e-07f, -1.06137134e-06f, -1.07612072e-06f, -5.49792503e-07f, -4.45200584e-07f,
    -5.10166501e-07f, -4.17277079e-06f, -4.09211907e-06f, -5.75159333e-07f, -2.7232781e-07f,
    -6.57929922e-06f, -7.01554472e-06f, -4.63194965e-07f, -5.06399488e-07f, -7.11289294e-06f,
    -7.29462954e-06f, 1.27643844e-07f, -5.64020581e-07f, -6.31863304e-06f, -4.54942301e-06f,
    5.10912628e-07f, -0.0f, -5.77810442e-06f, 2.16840434e-19f, 1.27643844e-07f, 5.64020581e-07f,
    -6.31863304e-06f, 4.54942301e-06f, -4.63194965e-07f, 5.06399488e-07f, -7.11289294e-06f,
    7.29462954e-06f, -5.75159333e-07f, 2.7232781e-07f, -6.57929922e-06f, 7.01554472e-06f,
    -4.45200584e-07f, 5.10166501e-07f, -4.17277079e-06f, 4.09211907e-06f, -5.69201859e-07f,
    1.06137134e-06f, -1.07612072e-06f, 5.49792503e-07f, -8.71568318e-07f, 1.41814689e-06f,
    1.04164508e-06f, -1.60492277e-06f, -1.0167762e-06f, 1.4053561e-06f, 1.5868585e-06f,
    -1.9290062e-06f, -9.03613739e-07f, 1.14341685e-06f, 1.15972853e-06f, -1.28870442e-06f,
    -6.46595367e-07f, 7.73745398e-07f, 5.75172464e-07f, -5.99083535e-07f, -3.76038315e-07f,
    4.18244724e-07f, 2.10312066e-07f, -2.07056274e-07f, -1.70558991e-07f, 1.63803051e-07f,
    5.90796425e-08f, -5.45484689e-08f, -5.11799279e-08f, 3.08825427e-08f, 1.28572877e-08f,
    -1.10477512e-08f, -5.02748314e-08f, -2.59773412e-08f, 1.30050495e-08f, 1.00581605e-08f,
    -1.75256901e-07f, -1.45034619e-07f, 6.05693842e-08f, 4.93175456e-08f, -3.98117692e-07f,
    -3.77636866e-07f, 2.17632746e-07f, 1.86535544e-07f, -6.90095021e-07f, -7.10423649e-07f,
    5.99757072e-07f, 5.40962105e-07f, -9.56330382e-07f, -1.05224592e-06f, 1.21821427e-06f,
    1.16651472e-06f, -1.07624032e-06f, -1.26667987e-06f, 1.69204282e-06f, 1.75366836e-06f,
    -9.89374712e-07f, -1.23885525e-06f, 1.15713817e-06f, 1.47143976e-06f, -7.83206133e-07f,
    -9.70847964e-07f, -1.03853506e-06f, -4.79791197e-07f, -5.87247882e-07f, -6.48394007e-07f,
    -4.29910233e-06f, -3.75926652e-06f, -3.9008026e-07f, -4.5667133e-07f, -6.81357142e-06f,
    -6.71520002e-06f, -1.14781706e-07f, -3.30607435e-07f, -7.14373164e-06f, -7.9332176e-06f,
    9.34402991e-08f, -1.0595199e-07f, -5.52705387e-06f, -7.81552535e-06f, 3.57283518e-08f,
    8.62558664e-08f, -3.33378625e-06f, -8.0484715e-06f, -1.40991645e-07f, -8.84710527e-09f,
    -1.61819389e-06f, -9.43462874e-06f, -1.52611847e-07f, -3.14937694e-07f, -5.58251202e-07f,
    -1.06610132e-05f, -4.70869814e-08f, -5.98743782e-07f, 6.95589222e-08f, -9.56628628e-06f,
    -4.32368346e-08f, -8.73730755e-07f, 3.81721605e-07f, -5.69812755e-06f, -1.326828e-07f,
    -1.24030362e-06f, 3.95091519e-07f, -1.07361882e-06f, -1.76409401e-07f, -1.57559657e-06f,
    2.22244807e-07f, 1.85868532e-06f, -1.34661093e-07f, -1.65669474e-06f, 4.35758842e-08f,
    2.43648583e-06f, -6.78225618e-08f, -1.42027795e-06f, -3.65570507e-08f, 1.68625809e-06f,
    -1.43744883e-08f, -9.90316266e-07f, -4.15743138e-08f, 8.06610274e-07f, 1.44821444e-08f,
    -5.48541323e-07f, -2.19890346e-08f, 2.85790151e-07f, 2.13703775e-08f, -2.26480296e-07f,
    -7.95625166e-09f, 7.77017917e-08f, 1.71809198e-08f, -5.39184271e-08f, -2.08376538e-09f,
    1.63081513e-08f, -4.96022601e-08f, -2.22294645e-08f, 1.31558719e-08f, 8.89047147e-09f,
    -1.79539711e-07f, -1.27976321e-07f, 6.17996534e-08f, 4.41924257e-08f, -4.14920663e-07f,
    -3.38868972e-07f, 2.23896876e-07f, 1.6673161e-07f, -7.24493475e-07f, -6.42002249e-07f,
    6.20033006e-07f, 4.85380951e-07f, -1.01118565e-06f, -9.50952824e-07f, 1.26968007e-06f,
    1.04763171e-06f, -1.15350974e-06f, -1.14070099e-06f, 1.78240771e-06f, 1.58269779e-06f,
    -1.09189727e-06f, -1.12110433e-06f, 1.25945326e-06f, 1.33976027e-06f, -8.8016435e-07f,
    -9.1553585e-07f, -1.00162458e-06f, -3.94565689e-07f, -6.04462286e-07f, -6.44513477e-07f,
    -4.38637198e-06f, -3.28883198e-06f, -3.31840539e-07f, -4.00218426e-07f, -6.9364869e-06f,
    -5.70854945e-06f, -1.20672226e-07f, -1.9090875e-07f, -6.92795766e-06f, -5.96656173e-06f,
    -3.4242948e-08f, -3.26559579e-08f, -4.26917359e-06f, -3.68426709e-06f, -2.70287153e-08f,
    2.70287153e-08f, -2.07412242e-07f, 2.07412242e-07f, 3.26559579e-08f, 3.4242948e-08f,
    3.68426709e-06f, 4.26917359e-06f, 1.9090875e-07f, 1.20672226e-07f, 5.96656173e-06f,
    6.92795766e-06f, 4.00218426e-07f, 3.31840539e-07f, 5.70854945e-06f, 6.9364869e-06f,
    6.44513477e-07f, 6.04462286e-07f, 3.28883198e-06f, 4.38637198e-06f, 9.1553585e-07f,
    8.8016435e-07f, 3.94565689e-07f, 1.00162458e-06f, 1.12110433e-06f, 1.09189727e-06f,
    -1.33976027e-06f, -1.25945326e-06f, 1.14070099e-06f, 1.15350974e-06f, -1.58269779e-06f,
    -1.78240771e-06f, 9.50952824e-07f, 1.01118565e-06f, -1.04763171e-06f, -1.26968007e-06f,
    6.42002249e-07f, 7.24493475e-07f, -4.85380951e-07f, -6.20033006e-07f, 3.38868972e-07f,
    4.14920663e-07f, -1.6673161e-07f, -2.23896876e-07f, 1.27976321e-07f, 1.79539711e-07f,
    -4.41924257e-08f, -6.17996534e-08f, 2.22294645e-08f, 4.96022601e-08f, -8.89047147e-09f,
    -1.31558719e-08f, -4.85581388e-08f, -1.93221172e-08f, 1.34383242e-08f, 7.8067055e-09f,
    -1.82867694e-07f, -1.12899535e-07f, 6.27663752e-08f, 3.92380635e-08f, -4.28216708e-07f,
    -3.01111726e-07f, 2.2965358e-07f, 1.48088603e-07f, -7.54881682e-07f, -5.72337512e-07f,
    6.3716044e-07f, 4.31028781e-07f, -1.06232778e-06f, -8.50899426e-07f, 1.31348327e-06f,
    9.33601257e-07f, -1.2232083e-06f, -1.02366141e-06f, 1.85817601e-06f, 1.41417854e-06f,
    -1.16909246e-06f, -1.01262412e-06f, 1.34449238e-06f, 1.2053855e-06f, -9.38544247e-07f,
    -8.37855964e-07f, -9.85799829e-07f, -3.39465913e-07f, -6.30754414e-07f, -5.84982274e-07f,
    -4.564346e-06f, -2.94606843e-06f, -3.52181701e-07f, -3.4261106e-07f, -7.5239941e-06f,
    -5.22759046e-06f, -1.67992994e-07f, -1.58857858e-07f, -8.46456078e-06f, -5.85509133e-06f,
    -8.62259668e-08f, -5.95612626e-08f, -7.9862748e-06f, -4.82477662e-06f, -6.89640913e-08f,
    -2.85658626e-08f, -7.90914874e-06f, -3.27607677e-06f, -1.03087139e-07f, -1.88547933e-08f,
    -9.05878096e-06f, -2.23551683e-06f, -2.31118463e-07f, -6.45951648e-09f, -1.01255237e-05f,
    -1.84517387e-06f, -4.91292667e-07f, -6.76747325e-09f, -9.01673229e-06f, -1.62380263e-06f,
    -8.59655643e-07f, -3.23657581e-08f, -5.31066507e-06f, -1.14429497e-06f, -1.25610461e-06f,
    -7.1197384e-08f, -9.37104346e-07f, -4.57027056e-07f, -1.54270663e-06f, -1.10639853e-07f,
    1.80303596e-06f, 9.83634223e-08f, -1.58877674e-06f, -1.41100998e-07f, 2.31390413e-06f,
    3.13953649e-07f, -1.35285597e-06f, -1.49502469e-07f, 1.58892874e-06f, 2.68617185e-07f,
    -9.38485698e-07f, -1.29078231e-07f, 7.55323867e-07f, 1.45757099e-07f, -5.15713054e-07f,
    -8.98767922e-08f, 2.6710407e-07f, 5.76751482e-08f, -2.09139017e-07f, -4.94749557e-08f,
    7.21280315e-08f, 1.66370295e-08f, -4.79985864e-08f, -2.06729887e-08f, 1.50225041e-08f,
    3.98215549e-09f, -4.71739767e-08f, -1.65198504e-08f, 1.36462441e-08f, 6.88730184e-09f,
    -1.84657523e-07f, -9.85112862e-08f, 6.36270912e-08f, 3.4279072e-08f, -4.39384934e-07f,
    -2.64192522e-07f, 2.34040996e-07f, 1.30889589e-07f, -7.81892481e-07f, -5.047537e-07f,
    6.52418066e-07f, 3.78720927e-07f, -1.10658925e-06f, -7.52487324e-07f, 1.34976665e-06f,
    8.22518302e-07f, -1.28178863e-06f, -9.08789843e-07f, 1.92388325e-06f, 1.24753035e-06f,
    -1.23176142e-06f, -9.02715954e-07f, 1.42057161e-06f, 1.0694514e-06f, -9.89690534e-07f,
    -7.47387787e-07f, -9.44910141e-07f, -2.89513082e-07f, -6.67387383e-07f, -5.18981153e-07f,
    -4.57023452e-06f, -2.6067878e-06f, -3.78506343e-07f, -3.02382745e-07f, -7.36942866e-06f,
    -4.70662326e-06f, -1.8301057e-07f, -1.48132912e-07f, -7.43085457e-06f, -5.52529855e-06f,
    -7.02733161e-08f, -6.88815618e-08f, -4.55659165e-06f, -5.23514245e-06f, 0.0f,
    -4.65308965e-08f, 0.0f, -4.93077732e-06f, 7.02733161e-08f, -6.88815618e-08f,
    4.55659165e-06f, -5.23514245e-06f, 1.8301057e-07f, -1.48132912e-07f, 7.43085457e-06f,
    -5.52529855e-06f, 3.78506343e-07f, -3.02382745e-07f, 7.36942866e-06f, -4.70662326e-06f,
    6.67387383e-07f, -5.18981153e-07f, 4.57023452e-06f, -2.6067878e-06f, 9.89690534e-07f,
    -7.47387787e-07f, 9.44910141e-07f, -2.89513082e-07f, 1.23176142e-06f, -9.02715954e-07f,
    -1.42057161e-06f, 1.0694514e-06f, 1.28178863e-06f, -9.08789843e-07f, -1.92388325e-06f,
    1.24753035e-06f, 1.10658925e-06f, -7.52487324e-07f, -1.34976665e-06f, 8.22518302e-07f,
    7.81892481e-07f, -5.047537e-07f, -6.52418066e-07f, 3.78720927e-07f, 4.39384934e-07f,
    -2.64192522e-07f, -2.34040996e-07f, 1.30889589e-07f, 1.84657523e-07f, -9.85112862e-08f,
    -6.36270912e-08f, 3.4279072e-08f, 4.71739767e-08f, -1.65198504e-08f, -1.36462441e-08f,
    6.88730184e-09f, -4.60679352e-08f, -1.36505189e-08f, 1.37362219e-08f, 5.9250076e-09f,
    -1.86324954e-07f, -8.39180601e-08f, 6.46456968e-08f, 2.96093621e-08f, -4.48910384e-07f,
    -2.28730343e-07f, 2.3673573e-07f, 1.1369913e-07f, -8.03711373e-07f, -4.39429982e-07f,
    6.64855747e-07f, 3.28739048e-07f, -1.14459397e-06f, -6.55333054e-07f, 1.38001076e-06f,
    7.13765303e-07f, -1.33091908e-06f, -7.93756328e-07f, 1.97966574e-06f, 1.08553832e-06f,
    -1.28397812e-06f, -7.9068036e-07f, 1.48357196e-06f, 9.36199228e-07f, -1.03621926e-06f,
    -6.55335441e-07f, -9.29139389e-07f, -2.29818937e-07f, -7.01897022e-07f, -4.55415659e-07f,
    -4.68470625e-06f, -2.18982905e-06f, -4.01425723e-07f, -2.64828032e-07f, -7.74757336e-06f,
    -3.79318953e-06f, -1.95899972e-07f, -1.28556977e-07f, -8.39851054e-06f, -3.76732692e-06f,
    -8.1551697e-08f, -4.56423095e-08f, -6.88300588e-06f, -1.65776476e-06f, -3.28196847e-08f,
    1.35943576e-08f, -4.8820275e-06f, 2.0222019e-06f, -2.53917687e-08f, 8.99397463e-08f,
    -3.69480335e-06f, 6.03923672e-06f, -4.76186912e-08f, 2.29425709e-07f, -3.27474163e-06f,
    8.60254659e-06f, -9.65891473e-08f, 4.71112543e-07f, -2.79617166e-06f, 8.16055217e-06f,
    -1.7428863e-07f, 8.18343665e-07f, -1.76414449e-06f, 4.86103045e-06f, -2.6932554e-07f,
    1.19610991e-06f, -4.94494202e-07f, 8.1950725e-07f, -3.4881424e-07f, 1.46700506e-06f,
    3.8705096e-07f, -1.71103659e-06f, -3.79831448e-07f, 1.50237247e-06f, 6.32243598e-07f,
    -2.1674266e-06f, -3.45959705e-07f, 1.27274063e-06f, 4.71106688e-07f, -1.48052322e-06f,
    -2.57585839e-07f, 8.79033678e-07f, 2.37670406e-07f, -7.02577609e-07f, -1.55690799e-07f,
    4.79164385e-07f, 8.70000179e-08f, -2.47794873e-07f, -7.2412611e-08f, 1.91090663e-07f,
    2.47744314e-08f, -6.6648397e-08f, -2.29225758e-08f, 4.22273239e-08f, 5.52336266e-09f,
    -1.39025893e-08f, -4.53893207e-08f, -1.11697469e-08f, 1.39463063e-08f, 4.8851474e-09f,
    -1.88648357e-07f, -7.04233614e-08f, 6.53205419e-08f, 2.55239101e-08f, -4.56313415e-07f,
    -1.94521519e-07f, 2.39334042e-07f, 9.59585265e-08f, -8.20928335e-07f, -3.74088017e-07f,
    6.74629462e-07f, 2.79627898e-07f, -1.17632248e-06f, -5.60001979e-07f, 1.4053287e-06f,
    6.06558899e-07f, -1.37261463e-06f, -6.78490778e-07f, 2.02470551e-06f, 9.25375275e-07f,
    -1.32880643e-06f, -6.77325545e-07f, 1.5360024e-06f, 8.00026839e-07f, -1.07534947e-06f,
    -5.62863647e-07f, -9.10430174e-07f, -2.01158088e-07f, -7.30578449e-07f, -3.9151368e-07f,
    -4.75187107e-06f, -1.93032724e-06f, -4.19708073e-07f, -2.29504167e-07f, -7.93275467e-06f,
    -3.56180817e-06f, -2.05168604e-07f, -1.15632446e-07f, -8.72039709e-06f, -4.41024122e-06f,
    -8.81281395e-08f, -5.59457547e-08f, -7.40170799e-06f, -4.79295841e-06f, -4.56300455e-08f,
    -4.56300455e-08f, -5.69200847e-06f, -5.69200847e-06f, -5.59457547e-08f, -8.81281395e-08f,
    -4.79295841e-06f, -7.40170799e-06f, -1.15632446e-07f, -2.05168604e-07f, -4.41024122e-06f,
    -8.72039709e-06f, -2.29504167e-07f, -4.19708073e-07f, -3.56180817e-06f, -7.93275467e-06f,
    -3.9151368e-07f, -7.30578449e-07f, -1.93032724e-06f, -4.75187107e-06f, -5.62863647e-07f,
    -1.07534947e-06f, -2.01158088e-07f, -9.10430174e-07f, -6.77325545e-07f, -1.32880643e-06f,
    8.00026839e-07f, 1.5360024e-06f, -6.78490778e-07f, -1.37261463e-06f, 9.25375275e-07f,
    2.02470551e-06f, -5.60001979e-07f, -1.17632248e-06f, 6.06558899e-07f, 1.4053287e-06f,
    -3.74088017e-07f, -8.20928335e-07f, 2.79627898e-07f, 6.74629462e-07f, -1.94521519e-07f,
    -4.56313415e-07f, 9.59585265e-08f, 2.39334042e-07f, -7.04233614e-08f, -1.88648357e-07f,
    2.55239101e-08f, 6.53205419e-08f, -1.11697469e-08f, -4.53893207e-08f, 4.8851474e-09f,
    1.39463063e-08f, -4.47030857e-08f, -9.14176201e-09f, 1.43434553e-08f, 4.05661371e-09f,
    -1.90210685e-07f, -5.85102917e-08f, 6.52539356e-08f, 2.12640128e-08f, -4.62046728e-07f,
    -1.60633718e-07f, 2.42362489e-07f, 7.91018877e-08f, -8.36075913e-07f, -3.08977263e-07f,
    6.82814232e-07f, 2.31436601e-07f, -1.20160428e-06f, -4.65457219e-07f, 1.42744955e-06f,
    5.01923751e-07f, -1.40771328e-06f, -5.64311222e-07f, 2.06301092e-06f, 7.66652136e-07f,
    -1.36608571e-06f, -5.648659e-07f, 1.58105024e-06f, 6.66277515e-07f, -1.10805172e-06f,
    -4.69404227e-07f, -8.83379016e-07f, -1.53344118e-07f, -7.5508774e-07f, -3.26911277e-07f,
    -4.740858e-06f, -1.5473114e-06f, -4.33153446e-07f, -1.91605309e-07f, -7.78533649e-06f,
    -2.73395335e-06f, -2.0896816e-07f, -9.39825782e-08f, -7.93088293e-06f, -2.87555758e-06f,
    -7.74483127e-08f, -3.57927696e-08f, -4.91082255e-06f, -1.76101764e-06f, 1.08596843e-09f,
    -2.6217597e-09f, -7.47020152e-08f, 1.80346618e-07f, 8.00735407e-08f, 2.94549185e-08f,
    4.71770363e-06f, 2.22724839e-06f, 2.14218531e-07f, 8.13070855e-08f, 7.64130709e-06f,
    3.57465478e-06f, 4.41771164e-07f, 1.7080032e-07f, 7.43826104e-06f, 3.57186718e-06f,
    7.65088828e-07f, 3.02766495e-07f, 4.44640727e-06f, 2.25817848e-06f, 1.11542977e-06f,
    4.51591944e-07f, 7.33073989e-07f, 5.16212651e-07f, 1.36538904e-06f, 5.6654801e-07f,
    -1.58910075e-06f, -6.46841954e-07f, 1.39443193e-06f, 5.96375344e-07f, -2.00087379e-06f,
    -9.16664078e-07f, 1.17879051e-06f, 5.2053457e-07f, -1.36427298e-06f, -6.54445614e-07f,
    8.09674873e-07f, 3.7271505e-07f, -6.46472984e-07f, -3.19172187e-07f, 4.40301562e-07f,
    2.13131173e-07f, -2.27309641e-07f, -1.15442681e-07f, 1.75872287e-07f, 9.31262392e-08f,
    -6.1177424e-08f, -3.11055715e-08f, 3.80740595e-08f, 2.51456544e-08f, -1.30108138e-08f,
    -7.27389571e-09f, -4.39374475e-08f, -7.12002812e-09f, 1.46020867e-08f, 3.60808916e-09f,
    -1.90616262e-07f, -4.663627e-08f, 6.54032277e-08f, 1.62687073e-08f, -4.67043094e-07f,
    -1.27291059e-07f, 2.44475331e-07f, 6.3453804e-08f, -8.4896169e-07f, -2.46011041e-07f,
    6.89046942e-07f, 1.84210407e-07f, -1.22190465e-06f, -3.71168795e-07f, 1.44422108e-06f,
    4.00750395e-07f, -1.43524392e-06f, -4.51349592e-07f, 2.09360724e-06f, 6.11723806e-07f,
    -1.39488077e-06f, -4.51947784e-07f, 1.61452988e-06f, 5.32550985e-07f, -1.13454303e-06f,
    -3.75963339e-07f, -8.83274311e-07f, -1.19442106e-07f, -7.74385626e-07f, -2.62831549e-07f,
    -4.8561451e-06f, -1.22950109e-06f, -4.45781637e-07f, -1.53193525e-07f, -8.23531809e-06f,
    -2.17623665e-06f, -2.20066426e-07f, -7.57329914e-08f, -9.33066985e-06f, -2.2992499e-06f,
    -9.91332314e-08f, -2.84573183e-08f, -8.61245189e-06f, -1.44785258e-06f, -6.23506224e-08f,
    0.0f, -8.01992064e-06f, 2.16840434e-19f, -9.91332314e-08f, 2.84573183e-08f,
    -8.61245189e-06f, 1.44785258e-06f, -2.20066426e-07f, 7.57329914e-08f, -9.33066985e-06f,
    2.2992499e-06f, -4.45781637e-07f, 1.53193525e-07f, -8.23531809e-06f, 2.17623665e-06f,
    -7.74385626e-07f, 2.62831549e-07f, -4.8561451e-06f, 1.22950109e-06f, -1.13454303e-06f,
    3.75963339e-07f, -8.83274311e-07f, 1.19442106e-07f, -1.39488077e-06f, 4.51947784e-07f,
    1.61452988e-06f, -5.32550985e-07f, -1.43524392e-06f, 4.51349592e-07f, 2.09360724e-06f,
    -6.11723806e-07f, -1.22190465e-06f, 3.71168795e-07f, 1.44422108e-06f, -4.00750395e-07f,
    -8.4896169e-07f, 2.46011041e-07f, 6.89046942e-07f, -1.84210407e-07f, -4.67043094e-07f,
    1.27291059e-07f, 2.44475331e-07f, -6.3453804e-08f, -1.90616262e-07f, 4.663627e-08f,
    6.54032277e-08f, -1.62687073e-08f, -4.39374475e-08f, 7.12002812e-09f, 1.46020867e-08f,
    -3.60808916e-09f, -4.34768879e-08f, -5.01345054e-09f, 1.43989336e-08f, 3.26718919e-09f,
    -1.91218234e-07f, -3.45126736e-08f, 6.64776394e-08f, 1.16367342e-08f, -4.70982172e-07f,
    -9.50319858e-08f, 2.45385166e-07f, 4.77546038e-08f, -8.57956252e-07f, -1.84529085e-07f,
    6.93908362e-07f, 1.37139509e-07f, -1.23752523e-06f, -2.77909578e-07f, 1.45555373e-06f,
    2.99301064e-07f, -1.45574211e-06f, -3.38077825e-07f, 2.11567544e-06f, 4.57615272e-07f,
    -1.41746636e-06f, -3.37891692e-07f, 1.64215203e-06f, 3.97699978e-07f, -1.15462296e-06f,
    -2.82200091e-07f, -8.61200306e-07f, -9.54222799e-08f, -7.88331533e-07f, -1.9721098e-07f,
    -4.82175619e-06f, -9.61910018e-07f, -4.54555391e-07f, -1.15094807e-07f, -8.02643262e-06f,
    -1.82993199e-06f, -2.20376776e-07f, -6.03925017e-08f, -8.41686051e-06f, -2.4468186e-06f,
    -8.6391502e-08f, -3.28257634e-08f, -5.85709358e-06f, -3.11785993e-06f, -1.54503823e-08f,
    -3.730052e-08f, -1.83513816e-06f, -4.43041517e-06f, 3.78766956e-08f, -8.42993373e-08f,
    1.93693063e-06f, -6.34625076e-06f, 1.13125971e-07f, -1.98533854e-07f, 4.22145695e-06f,
    -7.68178052e-06f, 2.40034865e-07f, -4.02803522e-07f, 4.38158759e-06f, -6.96950201e-06f,
    4.17985348e-07f, -6.96883774e-07f, 2.72932334e-06f, -4.0896698e-06f, 6.16896102e-07f,
    -1.01598732e-06f, 5.41486827e-07f, -6.76434297e-07f, 7.63374601e-07f, -1.24122562e-06f,
    -8.7996051e-07f, 1.44239323e-06f, 7.90307979e-07f, -1.26842224e-06f, -1.17242564e-06f,
    1.81959126e-06f, 6.78550748e-07f, -1.07157427e-06f, -8.17594071e-07f, 1.24086966e-06f,
    4.76184908e-07f, -7.37148468e-07f, -3.93695046e-07f, 5.8763959e-07f, 2.65836917e-07f,
    -4.00232466e-07f, -1.39745922e-07f, 2.07281133e-07f, 1.10807569e-07f, -1.59615851e-07f,
    -3.87783743e-08f, 5.52352049e-08f, 2.71977569e-08f, -3.42878472e-08f, -7.87133203e-09f,
    1.24918351e-08f, -4.33772662e-08f, -3.14258619e-09f, 1.38229312e-08f, 2.60162669e-09f,
    -1.9187091e-07f, -2.32399398e-08f, 6.72530973e-08f, 8.22184187e-09f, -4.7342786e-07f,
    -6.32532604e-08f, 2.4602457e-07f, 3.16809015e-08f, -8.63676576e-07f, -1.22799634e-07f,
    6.97951577e-07f, 9.1104944e-08f, -1.24811174e-06f, -1.84994207e-07f, 1.46506227e-06f,
    1.98234005e-07f, -1.47074502e-06f, -2.24958711e-07f, 2.13206704e-06f, 3.04388408e-07f,
    -1.43444231e-06f, -2.2452879e-07f, 1.66131838e-06f, 2.65775157e-07f, -1.16896513e-06f,
    -1.88212638e-07f, -8.5650953e-07f, -5.13173184e-08f, -7.9946517e-07f, -1.30979871e-07f,
    -4.85686496e-06f, -5.73665375e-07f, -4.61967858e-07f, -7.5693805e-08f, -8.14585837e-06f,
    -9.24344533e-07f, -2.23847991e-07f, -3.58838754e-08f, -8.73581757e-06f, -5.8034243e-07f,
    -9.07943161e-08f, -5.93401905e-09f, -6.64022582e-06f, 8.67587062e-07f, -2.64602882e-08f,
    2.64602882e-08f, -3.49174275e-06f, 3.49174275e-06f, 5.93401905e-09f, 9.07943161e-08f,
    -8.67587062e-07f, 6.64022582e-06f, 3.58838754e-08f, 2.23847991e-07f, 5.8034243e-07f,
    8.73581757e-06f, 7.5693805e-08f, 4.61967858e-07f, 9.24344533e-07f, 8.14585837e-06f,
    1.30979871e-07f, 7.9946517e-07f, 5.73665375e-07f, 4.85686496e-06f, 1.88212638e-07f,
    1.16896513e-06f, 5.13173184e-08f, 8.5650953e-07f, 2.2452879e-07f, 1.43444231e-06f,
    -2.65775157e-07f, -1.66131838e-06f, 2.24958711e-07f, 1.47074502e-06f, -3.04388408e-07f,
    -2.13206704e-06f, 1.84994207e-07f, 1.24811174e-06f, -1.98234005e-07f, -1.46506227e-06f,
    1.22799634e-07f, 8.63676576e-07f, -9.1104944e-08f, -6.97951577e-07f, 6.32532604e-08f,
    4.7342786e-07f, -3.16809015e-08f, -2.4602457e-07f, 2.32399398e-08f, 1.9187091e-07f,
    -8.22184187e-09f, -6.72530973e-08f, 3.14258619e-09f, 4.33772662e-08f, -2.60162669e-09f,
    -1.38229312e-08f, -4.33434693e-08f, -1.54654867e-09f, 1.32613316e-08f, 1.45460499e-09f,
    -1.91457289e-07f, -1.21490178e-08f, 6.67084663e-08f, 4.7280122e-09f, -4.74873218e-07f,
    -3.14995212e-08f, 2.46591981e-07f, 1.57502971e-08f, -8.67452115e-07f, -6.10519422e-08f,
    6.99769089e-07f, 4.59852068e-08f, -1.25475287e-06f, -9.20585066e-08f, 1.47055187e-06f,
    9.95870195e-08f, -1.47956939e-06f, -1.1265054e-07f, 2.14099509e-06f, 1.52975304e-07f,
    -1.44475587e-06f, -1.12077444e-07f, 1.67199357e-06f, 1.3216281e-07f, -1.17736363e-06f,
    -9.43007379e-08f, -8.58079943e-07f, -3.44515811e-08f, -8.05988975e-07f, -6.60224515e-08f,
    -4.90675484e-06f, -3.33460406e-07f, -4.66732558e-07f, -3.85568306e-08f, -8.34623279e-06f,
    -6.76397747e-07f, -2.28936429e-07f, -2.01213251e-08f, -9.38554058e-06f, -1.06009827e-06f,
    -1.01705041e-07f, -1.35791973e-08f, -8.38774849e-06f, -1.73119872e-06f, -5.76268242e-08f,
    -2.3869811e-08f, -7.25018799e-06f, -3.00312604e-06f, -8.15182659e-08f, -6.23143848e-08f,
    -7.15517581e-06f, -4.7068911e-06f, -1.76110419e-07f, -1.47654575e-07f, -7.38618201e-06f,
    -5.8869764e-06f, -3.57293544e-07f, -3.02765955e-07f, -6.37996345e-06f, -5.42339239e-06f,
    -6.16605178e-07f, -5.23235315e-07f, -3.70539169e-06f, -3.23380755e-06f, -8.99202519e-07f,
    -7.6584115e-07f, -6.31115086e-07f, -5.82393227e-07f, -1.10084738e-06f, -9.42345991e-07f,
    1.27573117e-06f, 1.08882477e-06f, -1.12586952e-06f, -9.66557536e-07f, 1.6220821e-06f,
    1.4057423e-06f, -9.52339462e-07f, -8.22149104e-07f, 1.11025588e-06f, 9.69418579e-07f,
    -6.56551492e-07f, -5.70211057e-07f, 5.27327927e-07f, 4.6229502e-07f, -3.58059594e-07f,
    -3.13512544e-07f, 1.85504007e-07f, 1.63229728e-07f, -1.43971405e-07f, -1.26790098e-07f,
    5.05132185e-08f, 4.38267982e-08f, -3.17420366e-08f, -2.95548848e-08f, 1.04057385e-08f,
    8.34861602e-09f, -4.33064997e-08f, 0.0f, 1.3038516e-08f, -0.0f, -1.90921128e-07f, 0.0f,
    6.61239028e-08f, -0.0f, -4.75440174e-07f, 0.0f, 2.46800482e-07f, -0.0f, -8.68923962e-07f,
    0.0f, 6.99888915e-07f, -0.0f, -1.25728548e-06f, 0.0f, 1.47148967e-06f, -0.0f,
    -1.48219988e-06f, 0.0f, 2.14297324e-06f, -0.0f, -1.4482066e-06f, 0.0f, 1.6768463e-06f,
    -0.0f, -1.1799857e-06f, 0.0f, -8.4284693e-07f, 0.0f, -8.07456672e-07f, 0.0f,
    -4.83775511e-06f, 0.0f, -4.67058271e-07f, 0.0f, -8.02567229e-06f, 0.0f, -2.25845724e-07f,
    0.0f, -8.21659341e-06f, 0.0f, -8.52160156e-08f, 0.0f, -5.08362427e-06f, 0.0f, 0.0f, -0.0f,
    0.0f, -0.0f, 8.52160156e-08f, -0.0f, 5.08362427e-06f, -0.0f, 2.25845724e-07f, -0.0f,
    8.21659341e-06f, -0.0f, 4.67058271e-07f, -0.0f, 8.02567229e-06f, -0.0f, 8.07456672e-07f,
    -0.0f, 4.83775511e-06f, -0.0f, 1.1799857e-06f, -0.0f, 8.4284693e-07f, -0.0f, 1.4482066e-06f,
    -0.0f, -1.6768463e-06f, 0.0f, 1.48219988e-06f, -0.0f, -2.14297324e-06f, 0.0f,
    1.25728548e-06f, -0.0f, -1.47148967e-06f, 0.0f, 8.68923962e-07f, -0.0f, -6.99888915e-07f,
    0.0f, 4.75440174e-07f, -0.0f, -2.46800482e-07f, 0.0f, 1.90921128e-07f, -0.0f,
    -6.61239028e-08f, 0.0f, 4.33064997e-08f, -0.0f, -1.3038516e-08f, 0.0f, -1.86264515e-08f,
    0.0f, -1.48126855e-06f, 0.0f, -2.84519047e-07f, 0.0f, -9.39005986e-06f, 0.0f,
    -3.22097912e-06f, 0.0f, -4.85279597e-05f, 0.0f, -2.77808867e-05f, 0.0f, -0.000204098411f,
    0.0f, -0.00018126145f, 0.0f, -0.000695610419f, 0.0f, -0.000886478927f, 0.0f,
    -0.00190476142f, 0.0f, -0.00320135942f, 0.0f, -0.00412174733f, 0.0f, -0.00830918923f, 0.0f,
    -0.00681439089f, 0.0f, -0.0146252019f, 0.0f, -0.00791908987f, 0.0f, -0.0146183483f, 0.0f,
    -0.00459796842f, 0.0f, 0.0f, -0.0f, 0.00385814393f, -0.0f, 0.0238420721f, -0.0f,
    0.0135306949f, -0.0f, 0.0360221453f, -0.0f, 0.0178564563f, -0.0f, 0.0238420721f, -0.0f,
    0.0135306949f, -0.0f, 0.0f, -0.0f, 0.00385814393f, -0.0f, -0.0146183483f, 0.0f,
    -0.00459796842f, 0.0f, -0.0146252019f, 0.0f, -0.00791908987f, 0.0f, -0.00830918923f, 0.0f,
    -0.00681439089f, 0.0f, -0.00320135942f, 0.0f, -0.00412174733f, 0.0f, -0.000886478927f, 0.0f,
    -0.00190476142f, 0.0f, -0.00018126145f, 0.0f, -0.000695610419f, 0.0f, -2.77808867e-05f,
    0.0f, -0.000204098411f, 0.0f, -3.22097912e-06f, 0.0f, -4.85279597e-05f, 0.0f,
    -2.84519047e-07f, 0.0f, -9.39005986e-06f, 0.0f, -1.86264515e-08f, 0.0f, -1.48126855e-06f,
    0.0f, -6.66396005e-09f, -1.60882223e-08f, 4.48212916e-07f, -1.35222137e-06f,
    -1.00898411e-07f, -2.43590307e-07f, 2.26130169e-06f, -8.71553402e-06f, -1.14259774e-06f,
    -2.75847492e-06f, 8.3130144e-06f, -4.56804482e-05f, -9.85523548e-06f, -2.37926433e-05f,
    1.91207655e-05f, -0.000194128093f, -6.43022649e-05f, -0.00015523941f, 4.99088173e-06f,
    -0.000665108673f, -0.000314477162f, -0.000759214978f, -0.000171801614f, -0.00181795203f,
    -0.00113567803f, -0.00274176919f, -0.000838810462f, -0.00388711831f, -0.00294767343f,
    -0.00711631309f, -0.00236416981f, -0.00624246383f, -0.00518827001f, -0.012525592f,
    -0.00452608289f, -0.00676320773f, -0.00518583879f, -0.0125197228f, -0.00583482347f,
    -0.00281708082f, 0.0f, -0.0f, -0.00413772836f, 0.00571357366f, 0.00845794193f,
    0.0204192791f, 0.00105585763f, 0.0143442536f, 0.0127788065f, 0.0308507681f, 0.00694520772f,
    0.016767215f, 0.00845794193f, 0.0204192791f, 0.00939631555f, 0.0108895237f, 0.0f, -0.0f,
    0.00696592219f, 0.00111429114f, -0.00518583879f, -0.0125197228f, 0.00213386631f,
    -0.00611782027f, -0.00518827001f, -0.012525592f, -0.0015818862f, -0.00798273366f,
    -0.00294767343f, -0.00711631309f, -0.0027423678f, -0.00608580885f, -0.00113567803f,
    -0.00274176919f, -0.00215547904f, -0.00334173627f, -0.000314477162f, -0.000759214978f,
    -0.00116400409f, -0.00140696834f, -6.43022649e-05f, -0.00015523941f, -0.000473831926f,
    -0.000466773752f, -9.85523548e-06f, -2.37926433e-05f, -0.000150789725f, -0.000123748876f,
    -1.14259774e-06f, -2.75847492e-06f, -3.81791433e-05f, -2.64227656e-05f, -1.00898411e-07f,
    -2.43590307e-07f, -7.76179513e-06f, -4.56383123e-06f, -6.66396005e-09f, -1.60882223e-08f,
    -1.27309931e-06f, -6.39230507e-07f, 1.00205426e-08f, -1.00205426e-08f, 1.00870113e-06f,
    7.65718482e-07f, 1.48189642e-07f, -1.48189642e-07f, 6.9015714e-06f, 3.9098145e-06f,
    1.67934832e-06f, -1.67934832e-06f, 3.79395824e-05f, 1.454227e-05f, 1.44854957e-05f,
    -1.44854957e-05f, 0.000166761602f, 3.39334292e-05f, 9.45132633e-05f, -9.45132633e-05f,
    0.000581091095f, 1.07705537e-05f, 0.000462227094f, -0.000462227094f, 0.00158102927f,
    -0.000294252968f, 0.00166925148f, -0.00166925148f, 0.00326141901f, -0.00144006603f,
    0.00433257129f, -0.00433257129f, 0.0047646421f, -0.00400340883f, 0.00762586296f,
    -0.00762586296f, 0.00388570339f, -0.00743812695f, 0.00762228994f, -0.00762228994f,
    -0.0014025647f, -0.00900948048f, 0.0f, 0.0f, -0.00972600933f, -0.00520773372f,
    -0.0124317175f, 0.0124317175f, -0.0154055413f, 0.00403210521f, -0.0187826436f,
    0.0187826436f, -0.0131525705f, 0.0131525705f, -0.0124317175f, 0.0124317175f,
    -0.00403210521f, 0.0154055413f, 0.0f, 0.0f, 0.00520773372f, 0.00972600933f, 0.00762228994f,
    -0.00762228994f, 0.00900948048f, 0.0014025647f, 0.00762586296f, -0.00762586296f,
    0.00743812695f, -0.00388570339f, 0.00433257129f, -0.00433257129f, 0.00400340883f,
    -0.0047646421f, 0.00166925148f, -0.00166925148f, 0.00144006603f, -0.00326141901f,
    0.000462227094f, -0.000462227094f, 0.000294252968f, -0.00158102927f, 9.45132633e-05f,
    -9.45132633e-05f, -1.07705537e-05f, -0.000581091095f, 1.44854957e-05f, -1.44854957e-05f,
    -3.39334292e-05f, -0.000166761602f, 1.67934832e-06f, -1.67934832e-06f, -1.454227e-05f,
    -3.79395824e-05f, 1.48189642e-07f, -1.48189642e-07f, -3.9098145e-06f, -6.9015714e-06f,
    1.00205426e-08f, -1.00205426e-08f, -7.65718482e-07f, -1.00870113e-06f, 9.15895537e-09f,
    3.79376353e-09f, -8.72824955e-07f, 5.63163553e-07f, 1.31634451e-07f, 5.45247758e-08f,
    -4.56120824e-06f, 4.49240588e-06f, 1.49256016e-06f, 6.1823863e-07f, -1.73383341e-05f,
    2.7402315e-05f, 1.28722168e-05f, 5.33184675e-06f, -4.14861133e-05f, 0.000128688203f,
    8.39873028e-05f, 3.4788678e-05f, -1.68766746e-05f, 0.000463125354f, 0.000410749752f,
    0.000170138112f, 0.000340254715f, 0.00125390966f, 0.00148335099f, 0.000614424061f,
    0.00167384127f, 0.00243722741f, 0.00385006145f, 0.00159474765f, 0.00454967702f,
    0.00294797542f, 0.00677658711f, 0.00280695432f, 0.00802431349f, 0.000646170462f,
    0.00677341223f, 0.00280563906f, 0.00861837342f, -0.00557903806f, 0.0f, -0.0f, 0.0026800402f,
    -0.0126680983f, -0.0110472245f, -0.00457591005f, -0.00838069431f, -0.0142026274f,
    -0.0166908614f, -0.0069135814f, -0.0168886315f, -0.00699550007f, -0.0110472245f,
    -0.00457591005f, -0.0159688201f, 0.00411672797f, 0.0f, -0.0f, -0.00706262374f,
    0.0108527727f, 0.00677341223f, 0.00280563906f, 0.00214913441f, 0.0100390855f,
    0.00677658711f, 0.00280695432f, 0.00613095798f, 0.00521713495f, 0.00385006145f,
    0.00159474765f, 0.00530164083f, 0.00113257405f, 0.00148335099f, 0.000614424061f,
    0.00290696439f, -0.000539795496f, 0.000410749752f, 0.000170138112f, 0.00112724444f,
    -0.000646051602f, 8.39873028e-05f, 3.4788678e-05f, 0.000315545476f, -0.000339412683f,
    1.28722168e-05f, 5.33184675e-06f, 6.16611869e-05f, -0.00012033141f, 1.49256016e-06f,
    6.1823863e-07f, 7.11630855e-06f, -3.16364167e-05f, 1.31634451e-07f, 5.45247758e-08f,
    -4.86505272e-08f, -6.40187181e-06f, 9.15895537e-09f, 3.79376353e-09f, -2.18963677e-07f,
    -1.01539717e-06f, -3.1019273e-25f, 5.84464743e-09f, -1.50363761e-07f, -7.68875168e-07f,
    -4.13590306e-24f, 8.27060944e-08f, -2.15201248e-06f, -4.18822719e-06f, -3.97046694e-23f,
    9.37346101e-07f, -1.66760201e-05f, -1.65143992e-05f, -4.23516474e-22f, 8.0774771e-06f,
    -8.83462926e-05f, -4.10574903e-05f, -1.69406589e-21f, 5.27029915e-05f, -0.000335689343f,
    -2.15301279e-05f, -1.35525272e-20f, 0.000257753098f, -0.000907782931f, 0.000313867902f,
    -5.42101086e-20f, 0.000930829789f, -0.00162575534f, 0.00155946042f, -1.35525272e-19f,
    0.00241598464f, -0.00136429304f, 0.00411094259f, -2.16840434e-19f, 0.00425243331f,
    0.0017040252f, 0.00670848507f, -2.16840434e-19f, 0.00425044121f, 0.00769089209f,
    0.00579616474f, 0.0f, -0.0f, 0.0124213807f, -0.0013522394f, 4.33680869e-19f,
    -0.00693233777f, 0.00997228082f, -0.0115428977f, 5.42101086e-19f, -0.010473825f,
    8.67361738e-19f, -0.0164883118f, 4.33680869e-19f, -0.00693233777f, -0.00997228082f,
    -0.0115428977f, 0.0f, -0.0f, -0.0124213807f, -0.0013522394f, -2.16840434e-19f,
    0.00425044121f, -0.00769089209f, 0.00579616474f, -2.16840434e-19f, 0.00425243331f,
    -0.0017040252f, 0.00670848507f, -1.35525272e-19f, 0.00241598464f, 0.00136429304f,
    0.00411094259f, -5.42101086e-20f, 0.000930829789f, 0.00162575534f, 0.00155946042f,
    -1.35525272e-20f, 0.000257753098f, 0.000907782931f, 0.000313867902f, -1.69406589e-21f,
    5.27029915e-05f, 0.000335689343f, -2.15301279e-05f, -4.23516474e-22f, 8.0774771e-06f,
    8.83462926e-05f, -4.10574903e-05f, -3.97046694e-23f, 9.37346101e-07f, 1.66760201e-05f,
    -1.65143992e-05f, -4.13590306e-24f, 8.27060944e-08f, 2.15201248e-06f, -4.18822719e-06f,
    -3.1019273e-25f, 5.84464743e-09f, 1.50363761e-07f, -7.68875168e-07f, -2.65683298e-09f,
    1.10049625e-09f, 5.25532016e-07f, 1.25616666e-07f, -3.80470837e-08f, 1.57596176e-08f,
    3.09739357e-06f, -4.16457993e-07f, -4.30657792e-07f, 1.78384298e-07f, 1.30017024e-05f,
    -7.96465156e-06f, -3.70373164e-06f, 1.53413589e-06f, 3.42265776e-05f, -5.31462065e-05f,
    -2.41646267e-05f, 1.00093166e-05f, 2.28349872e-05f, -0.000220265007f, -0.000118185002f,
    4.89538324e-05f, -0.000242412076f, -0.000600120926f, -0.000426802551f, 0.000176787406f,
    -0.00122573052f, -0.000971345813f, -0.00110777607f, 0.00045885588f, -0.00311187049f,
    -0.000327066431f, -0.001949823f, 0.000807643111f, -0.0045518605f, 0.00266203377f,
    -0.00194890902f, 0.000807264529f, -0.00252724136f, 0.00732506299f, 0.0f, -0.0f,
    0.00428692298f, 0.00935837813f, 0.00317861047f, -0.00131662365f, 0.0115853548f,
    0.00448286813f, 0.00480245147f, -0.00198924053f, 0.0122791007f, -0.00508617004f,
    0.00317861047f, -0.00131662365f, 0.00502221659f, -0.0113619501f, 0.0f, -0.0f,
    -0.00358606037f, -0.00964868441f, -0.00194890902f, 0.000807264529f, -0.00696663093f,
    -0.00339257228f, -0.001949823f, 0.000807643111f, -0.00510099391f, 0.00133630924f,
    -0.00110777607f, 0.00045885588f, -0.00196915376f, 0.00243169558f, -0.000426802551f,
    0.000176787406f, -0.000179877126f, 0.00155356759f, -0.000118185002f, 4.89538324e-05f,
    0.000252938364f, 0.000595760823f, -2.41646267e-05f, 1.00093166e-05f, 0.000171897656f,
    0.000139604104f, -3.70373164e-06f, 1.53413589e-06f, 6.17818878e-05f, 1.33781996e-05f,
    -4.30657792e-07f, 1.78384298e-07f, 1.48254512e-05f, -3.56173314e-06f, -3.80470837e-08f,
    1.57596176e-08f, 2.48466813e-06f, -1.89570767e-06f, -2.65683298e-09f, 1.10049625e-09f,
    2.82782878e-07f, -4.60431664e-07f, -9.32569688e-10f, -9.32569688e-10f, -2.26936393e-07f,
    2.50306158e-07f, -1.26176447e-08f, -1.26176447e-08f, -4.78507786e-07f, 1.77309528e-06f,
    -1.43478204e-07f, -1.43478204e-07f, 2.41105454e-06f, 8.37799325e-06f, -1.23013808e-06f,
    -1.23013808e-06f, 2.74531376e-05f, 2.41129492e-05f, -8.02408613e-06f, -8.02408613e-06f,
    0.000130044355f, 2.01999974e-05f, -3.92467664e-05f, -3.92467664e-05f, 0.000361659331f,
    -0.0001593872f, -0.000141730445f, -0.000141730445f, 0.000521518057f, -0.000829404977f,
    -0.000367866975f, -0.000367866975f, -0.000159999399f, -0.00201659859f, -0.000647490902f,
    -0.000647490902f, -0.00248872163f, -0.00253340765f, -0.000647186942f, -0.000647186942f,
    -0.00542403664f, -0.000235665881f, 0.0f, -0.0f, -0.00540965237f, 0.00498544844f,
    0.00105554215f, 0.00105554215f, -0.00019418f, 0.00886807777f, 0.00159478176f,
    0.00159478176f, 0.00668587442f, 0.00668587442f, 0.00105554215f, 0.00105554215f,
    0.00886807777f, -0.00019418f, 0.0f, -0.0f, 0.00498544844f, -0.00540965237f,
    -0.000647186942f, -0.000647186942f, -0.000235665881f, -0.00542403664f, -0.000647490902f,
    -0.000647490902f, -0.00253340765f, -0.00248872163f, -0.000367866975f, -0.000367866975f,
    -0.00201659859f, -0.000159999399f, -0.000141730445f, -0.000141730445f, -0.000829404977f,
    0.000521518057f, -3.92467664e-05f, -3.92467664e-05f, -0.0001593872f, 0.000361659331f,
    -8.02408613e-06f, -8.02408613e-06f, 2.01999974e-05f, 0.000130044355f, -1.23013808e-06f,
    -1.23013808e-06f, 2.41129492e-05f, 2.74531376e-05f, -1.43478204e-07f, -1.43478204e-07f,
    8.37799325e-06f, 2.41105454e-06f, -1.26176447e-08f, -1.26176447e-08f, 1.77309528e-06f,
    -4.78507786e-07f, -9.32569688e-10f, -9.32569688e-10f, 2.50306158e-07f, -2.26936393e-07f,
    3.37201239e-10f, -8.14075807e-10f, -3.89551253e-08f, -1.85783591e-07f, 2.55824384e-09f,
    -6.17614671e-09f, -6.67699339e-07f, -6.27781333e-07f, 3.02020275e-08f, -7.29141405e-08f,
    -4.20030165e-06f, -6.39633058e-08f, 2.58734445e-07f, -6.24640222e-07f, -1.41085948e-05f,
    1.19997912e-05f, 1.68639269e-06f, -4.07131211e-06f, -1.4818771e-05f, 6.86949425e-05f,
    8.24882954e-06f, -1.99144361e-05f, 8.95981357e-05f, 0.000197499307f, 2.97879124e-05f,
    -7.19143791e-05f, 0.000486946054f, 0.000250864599f, 7.73163265e-05f, -0.00018665813f,
    0.0011286831f, -0.000277655345f, 0.000136086164f, -0.000328541064f, 0.00113980751f,
    -0.0017825719f, 0.00013602218f, -0.00032838661f, -0.000751312764f, -0.0032515442f, 0.0f,
    -0.0f, -0.00398920104f, -0.00227853609f, -0.000221847848f, 0.000535588071f, -0.00526690762f,
    0.00177686615f, -0.000335182092f, 0.000809201098f, -0.0022671083f, 0.00547328359f,
    -0.000221847848f, 0.000535588071f, 0.00246783206f, 0.00498070009f, 0.0f, -0.0f,
    0.00443195924f, 0.00120962271f, 0.00013602218f, -0.00032838661f, 0.0028304474f,
    -0.00176793057f, 0.000136086164f, -0.000328541064f, 0.000454503024f, -0.00206643436f,
    7.73163265e-05f, -0.00018665813f, -0.000601767504f, -0.000994431437f, 2.97879124e-05f,
    -7.19143791e-05f, -0.000521710899f, -0.000166934813f, 8.24882954e-06f, -1.99144361e-05f,
    -0.000203008545f, 7.62976488e-05f, 1.68639269e-06f, -4.07131211e-06f, -3.80962047e-05f,
    5.90531126e-05f, 2.58734445e-07f, -6.24640222e-07f, 1.49114908e-06f, 1.84614164e-05f,
    3.02020275e-08f, -7.29141405e-08f, 3.01529053e-06f, 2.92483287e-06f, 2.55824384e-09f,
    -6.17614671e-09f, 9.16043177e-07f, 2.82263084e-08f, 3.37201239e-10f, -8.14075807e-10f,
    1.58914261e-07f, -1.03823396e-07f, 9.31322575e-10f, 0.0f, 7.79422606e-08f, 6.07402058e-08f,
    1.78275028e-09f, 0.0f, 3.48608751e-07f, -3.49520128e-08f, 2.48124223e-08f, 0.0f,
    4.28898005e-07f, -1.44392061e-06f, 2.15089685e-07f, 0.0f, -4.6911905e-06f, -6.65353764e-06f,
    1.39873464e-06f, 0.0f, -3.25124784e-05f, -8.91296531e-06f, 6.84131328e-06f, 0.0f,
    -9.64631035e-05f, 4.32562956e-05f, 2.47040189e-05f, 0.0f, -0.00010527706f, 0.00024907873f,
    6.41208244e-05f, 0.0f, 0.000228727295f, 0.0005471154f, 0.000112860725f, 0.0f,
    0.00104889704f, 0.00039077815f, 0.000112808193f, 0.0f, 0.00159795408f, -0.000841915258f,
    0.0f, 0.0f, 0.000537229585f, -0.00245997845f, -0.000183985219f, 0.0f, -0.00192230672f,
    -0.00239995169f, -0.000277976971f, 0.0f, -0.00329053449f, 0.0f, -0.000183985219f, 0.0f,
    -0.00192230672f, 0.00239995169f, 0.0f, 0.0f, 0.000537229585f, 0.00245997845f,
    0.000112808193f, 0.0f, 0.00159795408f, 0.000841915258f, 0.000112860725f, 0.0f,
    0.00104889704f, -0.00039077815f, 6.41208244e-05f, 0.0f, 0.000228727295f, -0.0005471154f,
    2.47040189e-05f, 0.0f, -0.00010527706f, -0.00024907873f, 6.84131328e-06f, 0.0f,
    -9.64631035e-05f, -4.32562956e-05f, 1.39873464e-06f, 0.0f, -3.25124784e-05f,
    8.91296531e-06f, 2.15089685e-07f, 0.0f, -4.6911905e-06f, 6.65353764e-06f, 2.48124223e-08f,
    0.0f, 4.28898005e-07f, 1.44392061e-06f, 1.78275028e-09f, 0.0f, 3.48608751e-07f,
    3.49520128e-08f, 9.31322575e-10f, 0.0f, 7.79422606e-08f, -6.07402058e-08f, 3.35367373e-10f,
    8.09648459e-10f, -5.86724127e-08f, -1.82253235e-08f, -3.70741181e-11f, -8.9504841e-11f,
    -1.25164149e-07f, 2.33376096e-10f, 1.00889197e-09f, 2.43568055e-09f, 2.74842932e-07f,
    -6.48632508e-08f, 1.00470636e-08f, 2.42557565e-08f, 2.57653937e-06f, -2.195354e-06f,
    6.42353442e-08f, 1.55077842e-07f, 4.41397515e-06f, -1.41353694e-05f, 3.13874352e-07f,
    7.57759722e-07f, -1.85614299e-05f, -4.12554473e-05f, 1.13323858e-06f, 2.73587989e-06f,
    -0.000112744332f, -3.50174778e-05f, 2.94135566e-06f, 7.10106087e-06f, -0.000231325044f,
    0.000145125246f, 5.17719263e-06f, 1.24988483e-05f, -8.14418454e-05f, 0.000524463307f,
    5.17526587e-06f, 1.24941971e-05f, 0.00057939114f, 0.00064032292f, 0.0f, -0.0f,
    0.00121412054f, -0.000113215639f, -8.43982798e-06f, -2.0375548e-05f, 0.000778715534f,
    -0.00130088825f, -1.27519688e-05f, -3.07859736e-05f, -0.000625964196f, -0.00151121127f,
    -8.43982798e-06f, -2.0375548e-05f, -0.001470502f, -0.000369231886f, 0.0f, -0.0f,
    -0.000938568439f, 0.000778457324f, 5.17526587e-06f, 1.24941971e-05f, 4.3085307e-05f,
    0.000862468092f, 5.17719263e-06f, 1.24988483e-05f, 0.000428439642f, 0.000313263503f,
    2.94135566e-06f, 7.10106087e-06f, 0.00026619056f, -6.09524614e-05f, 1.13323858e-06f,
    2.73587989e-06f, 5.49611832e-05f, -0.000104483377f, 3.13874352e-07f, 7.57759722e-07f,
    -1.60470936e-05f, -4.22969169e-05f, 6.42353442e-08f, 1.55077842e-07f, -1.3116367e-05f,
    -6.87406373e-06f, 1.00470636e-08f, 2.42557565e-08f, -3.3742383e-06f, 2.69538816e-07f,
    1.00889197e-09f, 2.43568055e-09f, -2.4020855e-07f, 1.48478065e-07f, -3.70741181e-11f,
    -8.9504841e-11f, 8.8669438e-08f, -8.8339398e-08f, 3.35367373e-10f, 8.09648459e-10f,
    2.86004109e-08f, -5.43749117e-08f, -3.16435628e-10f, 3.16435628e-10f, 5.64511602e-08f,
    -4.63708938e-09f, 2.1934865e-10f, -2.1934865e-10f, 1.76622507e-07f, -1.41458179e-09f,
    1.56586843e-09f, -1.56586843e-09f, 4.54256252e-07f, 2.05906076e-07f, 1.04005018e-08f,
    -1.04005018e-08f, 1.51465167e-06f, 1.22281199e-06f, 6.95646776e-08f, -6.95646776e-08f,
    6.01815282e-06f, 2.04484058e-06f, 3.40344883e-07f, -3.40344883e-07f, 1.5223116e-05f,
    -8.05531454e-06f, 1.2288458e-06f, -1.2288458e-06f, 6.44163083e-06f, -4.8172722e-05f,
    3.18907087e-06f, -3.18907087e-06f, -7.90862541e-05f, -8.92676762e-05f, 5.61320257e-06f,
    -5.61320257e-06f, -0.000228515535f, 5.91310709e-06f, 5.60944454e-06f, -5.60944454e-06f,
    -0.000204851502f, 0.000305641384f, 0.0f, -0.0f, 0.000206470984f, 0.000487948273f,
    -9.15044347e-06f, 9.15044347e-06f, 0.000656036311f, 0.000126257233f, -1.38231817e-05f,
    1.38231817e-05f, 0.000510235259f, -0.000510235259f, -9.15044347e-06f, 9.15044347e-06f,
    -0.000126257233f, -0.000656036311f, 0.0f, -0.0f, -0.000487948273f, -0.000206470984f,
    5.60944454e-06f, -5.60944454e-06f, -0.000305641384f, 0.000204851502f, 5.61320257e-06f,
    -5.61320257e-06f, -5.91310709e-06f, 0.000228515535f, 3.18907087e-06f, -3.18907087e-06f,
    8.92676762e-05f, 7.90862541e-05f, 1.2288458e-06f, -1.2288458e-06f, 4.8172722e-05f,
    -6.44163083e-06f, 3.40344883e-07f, -3.40344883e-07f, 8.05531454e-06f, -1.5223116e-05f,
    6.95646776e-08f, -6.95646776e-08f, -2.04484058e-06f, -6.01815282e-06f, 1.04005018e-08f,
    -1.04005018e-08f, -1.22281199e-06f, -1.51465167e-06f, 1.56586843e-09f, -1.56586843e-09f,
    -2.05906076e-07f, -4.54256252e-07f, 2.1934865e-10f, -2.1934865e-10f, 1.41458179e-09f,
    -1.76622507e-07f, -3.16435628e-10f, 3.16435628e-10f, 4.63708938e-09f, -5.64511602e-08f,
    2.19293708e-10f, 9.08344233e-11f, -4.44511272e-08f, 3.54998626e-08f, -1.68912648e-10f,
    -6.99659081e-11f, -1.64581152e-07f, 1.30403706e-07f, -7.14605541e-10f, -2.95999308e-10f,
    -5.01449676e-07f, 3.58701442e-07f, -1.26874546e-08f, -5.25531574e-09f, -1.18759726e-06f,
    9.1701645e-07f, -8.04299134e-08f, -3.33151604e-08f, -1.30318631e-06f, 2.5832835e-06f,
    -3.94218318e-07f, -1.63290579e-07f, 4.23367237e-06f, 5.31329124e-06f, -1.42430792e-06f,
    -5.89967669e-07f, 2.23935131e-05f, -5.35316531e-07f, -3.69801478e-06f, -1.53176791e-06f,
    3.6423171e-05f, -3.66441927e-05f, -6.50931861e-06f, -2.69624798e-06f, -1.24907483e-05f,
    -8.77493803e-05f, -6.50725269e-06f, -2.69539237e-06f, -0.0001331971f, -5.03632436e-05f,
    0.0f, -0.0f, -0.000166578568f, 0.000129400549f, 1.0611705e-05f, 4.39551195e-06f,
    2.53219659e-05f, 0.000253734004f, 1.60355121e-05f, 6.64212712e-06f, 0.00024476304f,
    0.000101384168f, 1.0611705e-05f, 4.39551195e-06f, 0.00019732237f, -0.000161511707f, 0.0f,
    -0.0f, -2.62888279e-05f, -0.000209288846f, -6.50725269e-06f, -2.69539237e-06f,
    -0.000129796768f, -5.85723792e-05f, -6.50931861e-06f, -2.69624798e-06f, -7.08804728e-05f,
    5.32158883e-05f, -3.69801478e-06f, -1.53176791e-06f, -1.56285367e-07f, 5.16664295e-05f,
    -1.42430792e-06f, -5.89967669e-07f, 1.54560785e-05f, 1.62131309e-05f, -3.94218318e-07f,
    -1.63290579e-07f, 6.7507226e-06f, -7.63405751e-07f, -8.04299134e-08f, -3.33151604e-08f,
    9.05165393e-07f, -2.7481492e-06f, -1.26874546e-08f, -5.25531574e-09f, -1.91329562e-07f,
    -1.48818663e-06f, -7.14605541e-10f, -2.95999308e-10f, -1.00938259e-07f, -6.0821867e-07f,
    -1.68912648e-10f, -6.99659081e-11f, -2.41671128e-08f, -2.08585789e-07f, 2.19293708e-10f,
    9.08344233e-11f, -6.32950004e-09f, -5.65338887e-08f, 2.06795153e-25f, 8.35535641e-10f,
    1.23432891e-08f, -5.40852589e-08f, 1.65436123e-24f, -5.25040955e-10f, 3.69196904e-08f,
    -2.08338903e-07f, 3.97046694e-23f, -2.38730968e-09f, 7.35265004e-08f, -5.95653603e-07f,
    2.11758237e-22f, -3.17618891e-08f, -1.97432293e-08f, -1.19920037e-06f, 2.54109884e-21f,
    -2.03968483e-07f, -8.19963759e-07f, -1.14870318e-06f, 2.03287907e-20f, -9.98806286e-07f,
    -2.64922437e-06f, 2.36004826e-06f, 5.42101086e-20f, -3.607601e-06f, -1.66329187e-06f,
    1.18065236e-05f, 5.42101086e-20f, -9.36434208e-06f, 1.07820952e-05f, 1.79980616e-05f,
    1.08420217e-19f, -1.64837329e-05f, 2.73398909e-05f, -3.50276559e-06f, 1.08420217e-19f,
    -1.64763187e-05f, 8.60102227e-06f, -4.94939159e-05f, 0.0f, -0.0f, -5.40415713e-05f,
    -5.29890203e-05f, -2.16840434e-19f, 2.68716831e-05f, -7.57962334e-05f, 1.9981444e-05f,
    -2.16840434e-19f, 4.06012368e-05f, -4.33680869e-19f, 7.18244701e-05f, -2.16840434e-19f,
    2.68716831e-05f, 7.57962334e-05f, 1.9981444e-05f, 0.0f, -0.0f, 5.40415713e-05f,
    -5.29890203e-05f, 1.08420217e-19f, -1.64763187e-05f, -8.60102227e-06f, -4.94939159e-05f,
    1.08420217e-19f, -1.64837329e-05f, -2.73398909e-05f, -3.50276559e-06f, 5.42101086e-20f,
    -9.36434208e-06f, -1.07820952e-05f, 1.79980616e-05f, 5.42101086e-20f, -3.607601e-06f,
    1.66329187e-06f, 1.18065236e-05f, 2.03287907e-20f, -9.98806286e-07f, 2.64922437e-06f,
    2.36004826e-06f, 2.54109884e-21f, -2.03968483e-07f, 8.19963759e-07f, -1.14870318e-06f,
    2.11758237e-22f, -3.17618891e-08f, 1.97432293e-08f, -1.19920037e-06f, 3.97046694e-23f,
    -2.38730968e-09f, -7.35265004e-08f, -5.95653603e-07f, 1.65436123e-24f, -5.25040955e-10f,
    -3.69196904e-08f, -2.08338903e-07f, 2.06795153e-25f, 8.35535641e-10f, -1.23432891e-08f,
    -5.40852589e-08f, -9.65378666e-10f, 3.9987294e-10f, 2.42563374e-08f, 4.7297064e-08f,
    3.84498794e-10f, -1.59264615e-10f, 1.03962229e-07f, 1.73235009e-07f, -4.65416289e-10f,
    1.92781749e-10f, 3.19531836e-07f, 4.59063926e-07f, 7.10739734e-09f, -2.94398039e-09f,
    6.91591367e-07f, 7.60640262e-07f, 4.33894769e-08f, -1.79725106e-08f, 7.98935162e-07f,
    2.74489338e-07f, 2.12983522e-07f, -8.82206663e-08f, -6.82527116e-07f, -2.08280517e-06f,
    7.69527389e-07f, -3.18748704e-07f, -4.84925749e-06f, -4.97528754e-06f, 1.99659803e-06f,
    -8.27017971e-07f, -7.91340153e-06f, -3.24035182e-06f, 3.51589142e-06f, -1.45632998e-06f,
    -7.24045606e-07f, 3.04628361e-06f, 3.51431936e-06f, -1.45567867e-06f, 1.40720704e-05f,
    7.16787497e-07f, 0.0f, -0.0f, 1.24991966e-05f, -1.34006195e-05f, -5.73149327e-06f,
    2.37406221e-06f, -1.11167546e-05f, -1.37129673e-05f, -8.65983748e-06f, 3.58702232e-06f,
    -2.00403738e-05f, 8.30099452e-06f, -5.73149327e-06f, 2.37406221e-06f, 1.83579982e-06f,
    1.75572659e-05f, 0.0f, -0.0f, 1.83139364e-05f, 6.37402024e-07f, 3.51431936e-06f,
    -1.45567867e-06f, 9.44361091e-06f, -1.04573019e-05f, 3.51589142e-06f, -1.45632998e-06f,
    -2.66602524e-06f, -1.64207017e-06f, 1.99659803e-06f, -8.27017971e-07f, -3.304345e-06f,
    7.88689431e-06f, 7.69527389e-07f, -3.18748704e-07f, 8.91164333e-08f, 6.94700248e-06f,
    2.12983522e-07f, -8.82206663e-08f, 9.90146077e-07f, 1.95538519e-06f, 4.33894769e-08f,
    -1.79725106e-08f, 3.70839189e-07f, -7.59025738e-07f, 7.10739734e-09f, -2.94398039e-09f,
    -4.8824905e-08f, -1.02688284e-06f, -4.65416289e-10f, 1.92781749e-10f, -9.86640885e-08f,
    -5.5055034e-07f, 3.84498794e-10f, -1.59264615e-10f, -4.89832566e-08f, -1.96008045e-07f,
    -9.65378666e-10f, 3.9987294e-10f, -1.62922529e-08f, -5.05958937e-08f, -5.71737435e-10f,
    -5.71737435e-10f, -4.66346286e-08f, -1.91298373e-08f, 7.78574705e-11f, 7.78574705e-11f,
    -1.80895256e-07f, -6.12049931e-08f, -2.46051468e-09f, -2.46051468e-09f, -5.08853759e-07f,
    -1.37708625e-07f, -1.6876351e-08f, -1.6876351e-08f, -9.40009329e-07f, -1.53175336e-07f,
    -1.11634606e-07f, -1.11634606e-07f, -7.34553737e-07f, 1.18438486e-07f, -5.45466548e-07f,
    -5.45466548e-07f, 1.37923416e-06f, 7.26584688e-07f, -1.96940073e-06f, -1.96940073e-06f,
    5.20459889e-06f, 1.09278369e-06f, -5.11297321e-06f, -5.11297321e-06f, 7.18727642e-06f,
    9.21257481e-07f, -8.99870884e-06f, -8.99870884e-06f, 4.29557167e-06f, 1.29434409e-06f,
    -8.9941359e-06f, -8.9941359e-06f, -3.61265734e-07f, 1.14107479e-06f, 0.0f, -0.0f,
    -3.69407712e-06f, -4.61656191e-06f, 1.46693365e-05f, 1.46693365e-05f, -9.49491459e-06f,
    -1.41872406e-05f, 2.21634709e-05f, 2.21634709e-05f, -1.62858596e-05f, -1.62858596e-05f,
    1.46693365e-05f, 1.46693365e-05f, -1.41872406e-05f, -9.49491459e-06f, 0.0f, -0.0f,
    -4.61656191e-06f, -3.69407712e-06f, -8.9941359e-06f, -8.9941359e-06f, 1.14107479e-06f,
    -3.61265734e-07f, -8.99870884e-06f, -8.99870884e-06f, 1.29434409e-06f, 4.29557167e-06f,
    -5.11297321e-06f, -5.11297321e-06f, 9.21257481e-07f, 7.18727642e-06f, -1.96940073e-06f,
    -1.96940073e-06f, 1.09278369e-06f, 5.20459889e-06f, -5.45466548e-07f, -5.45466548e-07f,
    7.26584688e-07f, 1.37923416e-06f, -1.11634606e-07f, -1.11634606e-07f, 1.18438486e-07f,
    -7.34553737e-07f, -1.6876351e-08f, -1.6876351e-08f, -1.53175336e-07f, -9.40009329e-07f,
    -2.46051468e-09f, -2.46051468e-09f, -1.37708625e-07f, -5.08853759e-07f, 7.78574705e-11f,
    7.78574705e-11f, -6.12049931e-08f, -1.80895256e-07f, -5.71737435e-10f, -5.71737435e-10f,
    -1.91298373e-08f, -4.66346286e-08f, 1.31915034e-10f, -3.18471055e-10f, 4.54038513e-08f,
    -1.48610155e-08f, 6.07253761e-11f, -1.46604034e-10f, 1.68805343e-07f, -6.6493044e-08f,
    7.39820649e-10f, -1.78608506e-09f, 4.55994893e-07f, -2.10729652e-07f, 7.74753772e-09f,
    -1.87042097e-08f, 7.92080471e-07f, -4.51572845e-07f, 5.1054851e-08f, -1.23257323e-07f,
    5.2873628e-07f, -5.19379171e-07f, 2.49210643e-07f, -6.01647741e-07f, -1.32182902e-06f,
    2.23925483e-07f, 8.99396468e-07f, -2.17133515e-06f, -4.60383217e-06f, 2.02223782e-06f,
    2.33511128e-06f, -5.63745698e-06f, -6.83927101e-06f, 3.60849435e-06f, 4.11011206e-06f,
    -9.92268815e-06f, -5.04845639e-06f, 3.0718536e-06f, 4.10782513e-06f, -9.91716752e-06f,
    1.05297363e-06f, 2.00405026e-07f, 0.0f, -0.0f, 8.14329542e-06f, -4.28755857e-06f,
    -6.6997527e-06f, 1.61746339e-05f, 1.07609821e-05f, -1.02458525e-05f, -1.01222222e-05f,
    2.44372077e-05f, 6.30016257e-06f, -1.52099383e-05f, -6.6997527e-06f, 1.61746339e-05f,
    -3.64251349e-07f, -1.48540757e-05f, 0.0f, -0.0f, -2.72641728e-06f, -8.78994069e-06f,
    4.10782513e-06f, -9.91716752e-06f, -8.86272517e-07f, -6.02857028e-07f, 4.11011206e-06f,
    -9.92268815e-06f, 1.39766905e-06f, 5.74192609e-06f, 2.33511128e-06f, -5.63745698e-06f,
    2.28450403e-06f, 7.38768586e-06f, 8.99396468e-07f, -2.17133515e-06f, 1.82546273e-06f,
    4.68533881e-06f, 2.49210643e-07f, -6.01647741e-07f, 7.76335014e-07f, 1.09301345e-06f,
    5.1054851e-08f, -1.23257323e-07f, -6.61646693e-09f, -7.41129554e-07f, 7.74753772e-09f,
    -1.87042097e-08f, -2.4077525e-07f, -8.79395714e-07f, 7.39820649e-10f, -1.78608506e-09f,
    -1.73428717e-07f, -4.71445446e-07f, 6.07253761e-11f, -1.46604034e-10f, -7.23457134e-08f,
    -1.66381085e-07f, 1.31915034e-10f, -3.18471055e-10f, -2.15970477e-08f, -4.26136957e-08f,
    0.0f, -0.0f, -2.37487257e-08f, 3.91155481e-08f, 4.65661287e-10f, -0.0f, -8.14907253e-08f,
    1.52736902e-07f, -2.32830644e-09f, 0.0f, -2.03959644e-07f, 4.35393304e-07f,
    -1.07102096e-08f, 0.0f, -3.11527401e-07f, 8.22823495e-07f, -6.79865479e-08f, 0.0f,
    -9.31322575e-08f, 7.24568963e-07f, -3.33879143e-07f, 0.0f, 8.18632543e-07f, -9.406358e-07f,
    -1.20839104e-06f, 0.0f, 2.19559297e-06f, -4.35765833e-06f, -3.13529745e-06f, 0.0f,
    2.79769301e-06f, -7.16513023e-06f, -5.51808625e-06f, 0.0f, 1.31502748e-06f,
    -5.83054498e-06f, -5.51622361e-06f, 0.0f, -1.92876905e-06f, 1.02445483e-08f, 0.0f, -0.0f,
    -4.78466973e-06f, 5.75184822e-06f, 8.99750739e-06f, -0.0f, -5.70574775e-06f,
    5.85848466e-06f, 1.35954469e-05f, -0.0f, -5.64008951e-06f, 0.0f, 8.99750739e-06f, -0.0f,
    -5.70574775e-06f, -5.85848466e-06f, 0.0f, -0.0f, -4.78466973e-06f, -5.75184822e-06f,
    -5.51622361e-06f, 0.0f, -1.92876905e-06f, -1.02445483e-08f, -5.51808625e-06f, 0.0f,
    1.31502748e-06f, 5.83054498e-06f, -3.13529745e-06f, 0.0f, 2.79769301e-06f, 7.16513023e-06f,
    -1.20839104e-06f, 0.0f, 2.19559297e-06f, 4.35765833e-06f, -3.33879143e-07f, 0.0f,
    8.18632543e-07f, 9.406358e-07f, -6.79865479e-08f, 0.0f, -9.31322575e-08f, -7.24568963e-07f,
    -1.07102096e-08f, 0.0f, -3.11527401e-07f, -8.22823495e-07f, -2.32830644e-09f, 0.0f,
    -2.03959644e-07f, -4.35393304e-07f, 4.65661287e-10f, -0.0f, -8.14907253e-08f,
    -1.52736902e-07f, 0.0f, -0.0f, -2.37487257e-08f, -3.91155481e-08f, 1.04638147e-11f,
    2.52618829e-11f, -7.66690622e-09f, -4.32639382e-08f, 3.20929339e-10f, 7.74791953e-10f,
    -3.55680214e-08f, -1.61668964e-07f, -1.40964762e-09f, -3.4031904e-09f, -1.20974676e-07f,
    -4.46412145e-07f, -9.76698988e-09f, -2.35796005e-08f, -2.79588278e-07f, -8.03516116e-07f,
    -6.25573406e-08f, -1.51026782e-07f, -3.73020271e-07f, -6.09689891e-07f, -3.05761688e-07f,
    -7.38173981e-07f, -6.75949163e-09f, 1.17135733e-06f, -1.10538349e-06f, -2.66863185e-06f,
    1.10418557e-06f, 4.5573679e-06f, -2.86881982e-06f, -6.92594358e-06f, 2.38953385e-06f,
    6.98448457e-06f, -5.04956643e-06f, -1.21907315e-05f, 2.44121088e-06f, 4.85423016e-06f,
    -5.047169e-06f, -1.21849434e-05f, 4.45126233e-07f, -2.15151795e-06f, 0.0f, -0.0f,
    -2.67902897e-06f, -9.97625557e-06f, 8.23239498e-06f, 1.98747603e-05f, -5.24885718e-06f,
    -1.46784687e-05f, 1.2438727e-05f, 3.00297434e-05f, -6.55455688e-06f, -1.58241e-05f,
    8.23239498e-06f, 1.98747603e-05f, -6.66774213e-06f, -1.40907468e-05f, 0.0f, -0.0f,
    -5.1599186e-06f, -8.94863751e-06f, -5.047169e-06f, -1.21849434e-05f, -1.83610462e-06f,
    -1.20660115e-06f, -5.04956643e-06f, -1.21907315e-05f, 1.70626242e-06f, 5.15865622e-06f,
    -2.86881982e-06f, -6.92594358e-06f, 3.24912094e-06f, 6.62843195e-06f, -1.10538349e-06f,
    -2.66863185e-06f, 2.44176886e-06f, 4.00332283e-06f, -3.05761688e-07f, -7.38173981e-07f,
    8.33054401e-07f, 8.23495043e-07f, -6.25573406e-08f, -1.51026782e-07f, -1.67350692e-07f,
    -6.9488101e-07f, -9.76698988e-09f, -2.35796005e-08f, -3.70472918e-07f, -7.65870482e-07f,
    -1.40964762e-09f, -3.4031904e-09f, -2.30119042e-07f, -4.01203067e-07f, 3.20929339e-10f,
    7.74791953e-10f, -8.91668321e-08f, -1.39467616e-07f, 1.04638147e-11f, 2.52618829e-11f,
    -2.51709036e-08f, -3.60135459e-08f, -3.02793846e-10f, 3.02793846e-10f, 3.27397807e-08f,
    2.61011071e-08f, -6.56413812e-10f, 6.56413812e-10f, 1.27034568e-07f, 9.61403472e-08f,
    2.3962124e-10f, -2.3962124e-10f, 3.68640372e-07f, 2.51467867e-07f, 3.95076016e-09f,
    -3.95076016e-09f, 7.09001938e-07f, 4.20376267e-07f, 2.40008227e-08f, -2.40008227e-08f,
    6.57698877e-07f, 2.32450986e-07f, 1.14301898e-07f, -1.14301898e-07f, -7.23300616e-07f,
    -8.36035156e-07f, 4.14376416e-07f, -4.14376416e-07f, -3.66504651e-06f, -2.64706591e-06f,
    1.07513313e-06f, -1.07513313e-06f, -6.16459647e-06f, -3.71005353e-06f, 1.89291973e-06f,
    -1.89291973e-06f, -5.03416186e-06f, -2.36137157e-06f, 1.89155503e-06f, -1.89155503e-06f,
    1.60167147e-07f, 8.40011694e-07f, 0.0f, -0.0f, 5.49193146e-06f, 2.88663182e-06f,
    -3.08629456e-06f, 3.08629456e-06f, 6.56901057e-06f, 1.30103695e-06f, -4.66419306e-06f,
    4.66419306e-06f, 3.10853125e-06f, -3.10853125e-06f, -3.08629456e-06f, 3.08629456e-06f,
    -1.30103695e-06f, -6.56901057e-06f, 0.0f, -0.0f, -2.88663182e-06f, -5.49193146e-06f,
    1.89155503e-06f, -1.89155503e-06f, -8.40011694e-07f, -1.60167147e-07f, 1.89291973e-06f,
    -1.89291973e-06f, 2.36137157e-06f, 5.03416186e-06f, 1.07513313e-06f, -1.07513313e-06f,
    3.71005353e-06f, 6.16459647e-06f, 4.14376416e-07f, -4.14376416e-07f, 2.64706591e-06f,
    3.66504651e-06f, 1.14301898e-07f, -1.14301898e-07f, 8.36035156e-07f, 7.23300616e-07f,
    2.40008227e-08f, -2.40008227e-08f, -2.32450986e-07f, -6.57698877e-07f, 3.95076016e-09f,
    -3.95076016e-09f, -4.20376267e-07f, -7.09001938e-07f, 2.3962124e-10f, -2.3962124e-10f,
    -2.51467867e-07f, -3.68640372e-07f, -6.56413812e-10f, 6.56413812e-10f, -9.61403472e-08f,
    -1.27034568e-07f, -3.02793846e-10f, 3.02793846e-10f, -2.61011071e-08f, -3.27397807e-08f,
    -8.80291673e-10f, -3.64628744e-10f, -4.00088069e-08f, 1.60500191e-09f, -3.44305667e-10f,
    -1.42616072e-10f, -1.54203533e-07f, 9.81217596e-09f, -3.12668647e-09f, -1.2951159e-09f,
    -4.28259909e-07f, 4.75572044e-08f, -1.87666664e-08f, -7.7734077e-09f, -7.88391844e-07f,
    1.3420231e-07f, -1.21769119e-07f, -5.04384197e-08f, -6.40959229e-07f, 2.30347098e-07f,
    -6.02970317e-07f, -2.497585e-07f, 1.03727916e-06f, 1.39301505e-07f, -2.17675324e-06f,
    -9.01640703e-07f, 4.34026106e-06f, -3.75102047e-07f, -5.65039318e-06f, -2.34046956e-06f,
    6.84574388e-06f, -1.16168269e-06f, -9.94519996e-06f, -4.11943665e-06f, 5.03662977e-06f,
    -1.56857095e-06f, -9.94090624e-06f, -4.11765814e-06f, -1.46264142e-06f, -1.25603651e-06f,
    0.0f, -0.0f, -8.64648791e-06f, -1.07375274e-06f, 1.62127744e-05f, 6.71555108e-06f,
    -1.2481657e-05f, -2.40619102e-06f, 2.44936182e-05f, 1.01455889e-05f, -1.25880661e-05f,
    -5.21414768e-06f, 1.62127744e-05f, 6.71555108e-06f, -1.05272984e-05f, -7.12443079e-06f,
    0.0f, -0.0f, -6.87324837e-06f, -5.35473237e-06f, -9.94090624e-06f, -4.11765814e-06f,
    -1.92239554e-06f, -1.46091736e-07f, -9.94519996e-06f, -4.11943665e-06f, 2.45228784e-06f,
    4.67058226e-06f, -5.65039318e-06f, -2.34046956e-06f, 4.01923808e-06f, 5.66210565e-06f,
    -2.17675324e-06f, -9.01640703e-07f, 2.80379072e-06f, 3.3342651e-06f, -6.02970317e-07f,
    -2.497585e-07f, 8.3196818e-07f, 6.34966113e-07f, -1.21769119e-07f, -5.04384197e-08f,
    -2.90346605e-07f, -6.16106604e-07f, -1.87666664e-08f, -7.7734077e-09f, -4.62581852e-07f,
    -6.52372592e-07f, -3.12668647e-09f, -1.2951159e-09f, -2.69197471e-07f, -3.36453496e-07f,
    -3.44305667e-10f, -1.42616072e-10f, -1.0210011e-07f, -1.15976619e-07f, -8.80291673e-10f,
    -3.64628744e-10f, -2.71555916e-08f, -2.94254061e-08f, 2.06795153e-25f, -1.25308619e-09f,
    2.8225049e-08f, -2.65581921e-08f, 1.65436123e-24f, 5.54715385e-10f, 1.0652176e-07f,
    -1.0582243e-07f, -1.32348898e-23f, -2.8157443e-09f, 2.85072645e-07f, -3.05294378e-07f,
    2.11758237e-22f, -1.75463146e-08f, 4.98801398e-07f, -5.96282291e-07f, -8.47032947e-22f,
    -1.09958961e-07f, 3.40816342e-07f, -5.71975306e-07f, -6.77626358e-21f, -5.46627007e-07f,
    -8.25877294e-07f, 5.56701309e-07f, 0.0f, -1.97361192e-06f, -2.94864367e-06f,
    3.01400178e-06f, 5.42101086e-20f, -5.12329598e-06f, -4.38061579e-06f, 5.14219255e-06f,
    1.08420217e-19f, -9.01859039e-06f, -3.02709714e-06f, 4.15455133e-06f, 1.08420217e-19f,
    -9.01383464e-06f, 8.47208241e-07f, -7.02777754e-07f, 0.0f, -0.0f, 4.06199842e-06f,
    -6.79191908e-06f, -2.16840434e-19f, 1.47025412e-05f, 3.66569679e-06f, -1.09693156e-05f,
    -2.16840434e-19f, 2.22112212e-05f, -4.33680869e-19f, -1.22993952e-05f, -2.16840434e-19f,
    1.47025412e-05f, -3.66569679e-06f, -1.09693156e-05f, 0.0f, -0.0f, -4.06199842e-06f,
    -6.79191908e-06f, 1.08420217e-19f, -9.01383464e-06f, -8.47208241e-07f, -7.02777754e-07f,
    1.08420217e-19f, -9.01859039e-06f, 3.02709714e-06f, 4.15455133e-06f, 5.42101086e-20f,
    -5.12329598e-06f, 4.38061579e-06f, 5.14219255e-06f, 0.0f, -1.97361192e-06f, 2.94864367e-06f,
    3.01400178e-06f, -6.77626358e-21f, -5.46627007e-07f, 8.25877294e-07f, 5.56701309e-07f,
    -8.47032947e-22f, -1.09958961e-07f, -3.40816342e-07f, -5.71975306e-07f, 2.11758237e-22f,
    -1.75463146e-08f, -4.98801398e-07f, -5.96282291e-07f, -1.32348898e-23f, -2.8157443e-09f,
    -2.85072645e-07f, -3.05294378e-07f, 1.65436123e-24f, 5.54715385e-10f, -1.0652176e-07f,
    -1.0582243e-07f, 2.06795153e-25f, -1.25308619e-09f, -2.8225049e-08f, -2.65581921e-08f,
    1.00934727e-09f, -4.18085344e-10f, -3.53790375e-09f, 3.73528479e-08f, -9.27929511e-10f,
    3.84360987e-10f, -9.84956117e-09f, 1.4526573e-07f, -1.0475405e-09f, 4.33905495e-10f,
    -1.59197704e-08f, 4.06622121e-07f, -7.69904851e-09f, 3.18905014e-09f, 8.14299561e-09f,
    7.57302075e-07f, -5.49868773e-08f, 2.27763106e-08f, 9.932252e-08f, 6.43817884e-07f,
    -2.63378638e-07f, 1.09095005e-07f, 2.33109347e-07f, -9.2237741e-07f, -9.53055803e-07f,
    3.94768648e-07f, 2.40413812e-07f, -4.09007453e-06f, -2.4724859e-06f, 1.02413719e-06f,
    -6.02256591e-08f, -6.6152752e-06f, -4.35085076e-06f, 1.80218149e-06f, -5.84993131e-07f,
    -5.17721628e-06f, -4.34992626e-06f, 1.80179836e-06f, -1.09064865e-06f, 4.06094529e-07f,
    0.0f, -0.0f, -1.71183456e-06f, 5.74557271e-06f, 7.09230426e-06f, -2.9377286e-06f,
    -3.04163336e-06f, 6.27491499e-06f, 1.07179167e-05f, -4.43950648e-06f, -5.14834892e-06f,
    2.13251587e-06f, 7.09230426e-06f, -2.9377286e-06f, -6.58779436e-06f, -2.28627528e-06f, 0.0f,
    -0.0f, -5.27318343e-06f, -2.85228339e-06f, -4.34992626e-06f, 1.80179836e-06f,
    -1.05835727e-06f, 4.84052862e-07f, -4.35085076e-06f, 1.80218149e-06f, 3.24719213e-06f,
    4.07449761e-06f, -2.4724859e-06f, 1.02413719e-06f, 4.63512015e-06f, 4.72029205e-06f,
    -9.53055803e-07f, 3.94768648e-07f, 3.06211768e-06f, 2.72212128e-06f, -2.63378638e-07f,
    1.09095005e-07f, 8.17052523e-07f, 4.87386103e-07f, -5.49868773e-08f, 2.27763106e-08f,
    -3.85016364e-07f, -5.25479606e-07f, -7.69904851e-09f, 3.18905014e-09f, -5.29735473e-07f,
    -5.41251438e-07f, -1.0475405e-09f, 4.33905495e-10f, -2.98782254e-07f, -2.76268281e-07f,
    -9.27929511e-10f, 3.84360987e-10f, -1.09683072e-07f, -9.57536912e-08f, 1.00934727e-09f,
    -4.18085344e-10f, -2.89141262e-08f, -2.39107756e-08f, 3.44183737e-10f, 3.44183737e-10f,
    -2.10998348e-08f, -2.95815692e-08f, -3.31568023e-10f, -3.31568023e-10f, -8.55212576e-08f,
    -1.12383702e-07f, -2.454704e-09f, -2.454704e-09f, -2.48534406e-07f, -3.0948928e-07f,
    -1.52916915e-08f, -1.52916915e-08f, -4.86864792e-07f, -5.56405155e-07f, -1.00559511e-07f,
    -1.00559511e-07f, -4.78204981e-07f, -4.24022005e-07f, -4.90687455e-07f, -4.90687455e-07f,
    4.23523119e-07f, 8.0886997e-07f, -1.77533275e-06f, -1.77533275e-06f, 2.42753322e-06f,
    3.15440161e-06f, -4.60624642e-06f, -4.60624642e-06f, 4.20407332e-06f, 4.83984741e-06f,
    -8.10782694e-06f, -8.10782694e-06f, 3.46062711e-06f, 3.38209384e-06f, -8.10474103e-06f,
    -8.10474103e-06f, -4.82848179e-07f, -1.4387075e-06f, 0.0f, -0.0f, -5.5453047e-06f,
    -6.83835424e-06f, 1.32170208e-05f, 1.32170208e-05f, -9.1988104e-06f, -1.00713351e-05f,
    1.99704828e-05f, 1.99704828e-05f, -1.06944335e-05f, -1.06944335e-05f, 1.32170208e-05f,
    1.32170208e-05f, -1.00713351e-05f, -9.1988104e-06f, 0.0f, -0.0f, -6.83835424e-06f,
    -5.5453047e-06f, -8.10474103e-06f, -8.10474103e-06f, -1.4387075e-06f, -4.82848179e-07f,
    -8.10782694e-06f, -8.10782694e-06f, 3.38209384e-06f, 3.46062711e-06f, -4.60624642e-06f,
    -4.60624642e-06f, 4.83984741e-06f, 4.20407332e-06f, -1.77533275e-06f, -1.77533275e-06f,
    3.15440161e-06f, 2.42753322e-06f, -4.90687455e-07f, -4.90687455e-07f, 8.0886997e-07f,
    4.23523119e-07f, -1.00559511e-07f, -1.00559511e-07f, -4.24022005e-07f, -4.78204981e-07f,
    -1.52916915e-08f, -1.52916915e-08f, -5.56405155e-07f, -4.86864792e-07f, -2.454704e-09f,
    -2.454704e-09f, -3.0948928e-07f, -2.48534406e-07f, -3.31568023e-10f, -3.31568023e-10f,
    -1.12383702e-07f, -8.55212576e-08f, 3.44183737e-10f, 3.44183737e-10f, -2.95815692e-08f,
    -2.10998348e-08f, 1.16946786e-10f, -2.82334517e-10f, 3.48225093e-08f, 8.48702175e-09f,
    -1.9619327e-10f, 4.73652451e-10f, 1.34893057e-07f, 2.79617538e-08f, 6.30266006e-10f,
    -1.52159685e-09f, 3.81054662e-07f, 6.89136499e-08f, 2.114664e-09f, -5.10525044e-09f,
    7.17144587e-07f, 1.03197998e-07f, 1.19360237e-08f, -2.88161104e-08f, 6.28287921e-07f,
    1.89740224e-08f, 5.8834754e-08f, -1.42039667e-07f, -8.27065776e-07f, -3.06445514e-07f,
    2.14631996e-07f, -5.1816744e-07f, -3.81731934e-06f, -7.69531709e-07f, 5.55893052e-07f,
    -1.34204458e-06f, -6.26163137e-06f, -9.30148985e-07f, 9.79260221e-07f, -2.36414326e-06f,
    -4.9973869e-06f, -4.52262043e-07f, 9.78888124e-07f, -2.36324513e-06f, 2.28727302e-07f,
    2.69404637e-07f, 0.0f, -0.0f, 5.27267593e-06f, 2.27232306e-07f, -1.59624699e-06f,
    3.85368139e-06f, 5.69409485e-06f, -1.24675671e-06f, -2.41185239e-06f, 5.82272651e-06f,
    1.47790013e-06f, -3.56796659e-06f, -1.59624699e-06f, 3.85368139e-06f, -3.14474278e-06f,
    -4.90792308e-06f, 0.0f, -0.0f, -3.88902254e-06f, -3.56766759e-06f, 9.78888124e-07f,
    -2.36324513e-06f, -3.52232462e-07f, 2.87632176e-08f, 9.79260221e-07f, -2.36414326e-06f,
    3.85348403e-06f, 3.2138887e-06f, 5.55893052e-07f, -1.34204458e-06f, 5.08535641e-06f,
    3.76992739e-06f, 2.14631996e-07f, -5.1816744e-07f, 3.24339362e-06f, 2.15511136e-06f,
    5.8834754e-08f, -1.42039667e-07f, 8.01513522e-07f, 3.68134124e-07f, 1.19360237e-08f,
    -2.88161104e-08f, -4.57683313e-07f, -4.3084998e-07f, 2.114664e-09f, -5.10525044e-09f,
    -5.80069809e-07f, -4.34125809e-07f, 6.30266006e-10f, -1.52159685e-09f, -3.18175665e-07f,
    -2.20717027e-07f, -1.9619327e-10f, 4.73652451e-10f, -1.15155743e-07f, -7.5611851e-08f,
    1.16946786e-10f, -2.82334517e-10f, -3.0624463e-08f, -1.86220017e-08f, 9.31322575e-10f,
    -0.0f, -3.13761284e-08f, 1.69680447e-08f, -8.51427706e-10f, 0.0f, -1.17640759e-07f,
    6.65621513e-08f, -1.52935797e-09f, 0.0f, -3.26452522e-07f, 1.93344533e-07f,
    -1.67179799e-08f, 0.0f, -5.99653276e-07f, 3.83535564e-07f, -1.17234798e-07f, 0.0f,
    -4.86142483e-07f, 3.8349674e-07f, -5.72580916e-07f, 0.0f, 7.92063588e-07f, -3.16560943e-07f,
    -2.0644984e-06f, 0.0f, 3.30375792e-06f, -1.89406319e-06f, -5.36088919e-06f, 0.0f,
    5.19951163e-06f, -3.34003357e-06f, -9.43362647e-06f, 0.0f, 3.77966103e-06f,
    -2.92637378e-06f, -9.42952283e-06f, 0.0f, -1.33185267e-06f, -3.46074046e-07f, 0.0f, -0.0f,
    -7.26421649e-06f, 2.25871395e-06f, 1.53785877e-05f, -0.0f, -1.10676883e-05f, 2.3893308e-06f,
    2.32360253e-05f, -0.0f, -1.22091096e-05f, 0.0f, 1.53785877e-05f, -0.0f, -1.10676883e-05f,
    -2.3893308e-06f, 0.0f, -0.0f, -7.26421649e-06f, -2.25871395e-06f, -9.42952283e-06f, 0.0f,
    -1.33185267e-06f, 3.46074046e-07f, -9.43362647e-06f, 0.0f, 3.77966103e-06f, 2.92637378e-06f,
    -5.36088919e-06f, 0.0f, 5.19951163e-06f, 3.34003357e-06f, -2.0644984e-06f, 0.0f,
    3.30375792e-06f, 1.89406319e-06f, -5.72580916e-07f, 0.0f, 7.92063588e-07f, 3.16560943e-07f,
    -1.17234798e-07f, 0.0f, -4.86142483e-07f, -3.8349674e-07f, -1.67179799e-08f, 0.0f,
    -5.99653276e-07f, -3.83535564e-07f, -1.52935797e-09f, 0.0f, -3.26452522e-07f,
    -1.93344533e-07f, -8.51427706e-10f, 0.0f, -1.17640759e-07f, -6.65621513e-08f,
    9.31322575e-10f, -0.0f, -3.13761284e-08f, -1.69680447e-08f, 4.35576603e-10f,
    1.05157494e-09f, 1.11339631e-08f, -3.28738281e-08f, -5.73660321e-11f, -1.38493855e-10f,
    4.33604619e-08f, -1.2525534e-07f, -7.61463448e-10f, -1.83833537e-09f, 1.17456224e-07f,
    -3.5473991e-07f, -5.65694247e-09f, -1.36570675e-08f, 1.99556851e-07f, -6.70769737e-07f,
    -3.94139938e-08f, -9.51538013e-08f, 1.23068048e-07f, -5.97792621e-07f, -1.93351653e-07f,
    -4.66792159e-07f, -3.66396506e-07f, 7.45312832e-07f, -6.98748238e-07f, -1.68692748e-06f,
    -1.22377662e-06f, 3.53233577e-06f, -1.81377948e-06f, -4.37885092e-06f, -1.77368008e-06f,
    5.81650011e-06f, -3.19235369e-06f, -7.70702354e-06f, -1.23578457e-06f, 4.54839073e-06f,
    -3.19093238e-06f, -7.70359202e-06f, 9.65674261e-08f, -8.38909727e-07f, 0.0f, -0.0f,
    6.4624146e-07f, -7.06559877e-06f, 5.20390722e-06f, 1.25633433e-05f, -9.85613042e-07f,
    -1.04762403e-05f, 7.8629464e-06f, 1.89828315e-05f, -4.30553564e-06f, -1.03944822e-05f,
    5.20390722e-06f, 1.25633433e-05f, -6.71088674e-06f, -8.10475376e-06f, 0.0f, -0.0f,
    -5.45309422e-06f, -4.53917073e-06f, -3.19093238e-06f, -7.70359202e-06f, -6.61482204e-07f,
    -5.24915265e-07f, -3.19235369e-06f, -7.70702354e-06f, 4.09002951e-06f, 2.34236632e-06f,
    -1.81377948e-06f, -4.37885092e-06f, 5.36706784e-06f, 2.85870533e-06f, -6.98748238e-07f,
    -1.68692748e-06f, 3.36307926e-06f, 1.6323977e-06f, -1.93351653e-07f, -4.66792159e-07f,
    7.86097189e-07f, 2.67934297e-07f, -3.94139938e-08f, -9.51538013e-08f, -5.0972551e-07f,
    -3.35680994e-07f, -5.65694247e-09f, -1.36570675e-08f, -6.15413853e-07f, -3.33197818e-07f,
    -7.61463448e-10f, -1.83833537e-09f, -3.33893098e-07f, -1.67784904e-07f, -5.73660321e-11f,
    -1.38493855e-10f, -1.19229384e-07f, -5.79084265e-08f, 4.35576603e-10f, 1.05157494e-09f,
    -3.11182085e-08f, -1.53724056e-08f, -6.3824418e-10f, 6.3824418e-10f, 1.28541924e-08f,
    3.05288665e-08f, -5.5734023e-10f, 5.5734023e-10f, 4.88807501e-08f, 1.20481175e-07f,
    -1.94317548e-10f, 1.94317548e-10f, 1.43279166e-07f, 3.39131049e-07f, -5.61067415e-09f,
    5.61067415e-09f, 2.83479125e-07f, 6.29380338e-07f, -3.50993687e-08f, 3.50993687e-08f,
    2.87467572e-07f, 5.29553176e-07f, -1.69522153e-07f, 1.69522153e-07f, -2.25780767e-07f,
    -7.80061896e-07f, -6.08893345e-07f, 6.08893345e-07f, -1.3920677e-06f, -3.41043346e-06f,
    -1.58136265e-06f, 1.58136265e-06f, -2.48188599e-06f, -5.49055039e-06f, -2.78234552e-06f,
    2.78234552e-06f, -2.248177e-06f, -4.25431062e-06f, -2.78118864e-06f, 2.78118864e-06f,
    -5.42711689e-07f, 4.92118204e-07f, 0.0f, -0.0f, 8.43048952e-07f, 5.20600133e-06f,
    4.53628809e-06f, -4.53628809e-06f, -1.74420421e-07f, 6.19743378e-06f, 6.85321811e-06f,
    -6.85321811e-06f, -3.47132732e-06f, 3.47132732e-06f, 4.53628809e-06f, -4.53628809e-06f,
    -6.19743378e-06f, 1.74420421e-07f, 0.0f, -0.0f, -5.20600133e-06f, -8.43048952e-07f,
    -2.78118864e-06f, 2.78118864e-06f, -4.92118204e-07f, 5.42711689e-07f, -2.78234552e-06f,
    2.78234552e-06f, 4.25431062e-06f, 2.248177e-06f, -1.58136265e-06f, 1.58136265e-06f,
    5.49055039e-06f, 2.48188599e-06f, -6.08893345e-07f, 6.08893345e-07f, 3.41043346e-06f,
    1.3920677e-06f, -1.69522153e-07f, 1.69522153e-07f, 7.80061896e-07f, 2.25780767e-07f,
    -3.50993687e-08f, 3.50993687e-08f, -5.29553176e-07f, -2.87467572e-07f, -5.61067415e-09f,
    5.61067415e-09f, -6.29380338e-07f, -2.83479125e-07f, -1.94317548e-10f, 1.94317548e-10f,
    -3.39131049e-07f, -1.43279166e-07f, -5.5734023e-10f, 5.5734023e-10f, -1.20481175e-07f,
    -4.88807501e-08f, -6.3824418e-10f, 6.3824418e-10f, -3.05288665e-08f, -1.28541924e-08f,
    -3.87405774e-10f, -1.60468722e-10f, -2.86977606e-08f, -1.47661074e-08f, -8.066533e-10f,
    -3.34126726e-10f, -1.14822299e-07f, -5.804851e-08f, -1.50736412e-09f, -6.24370666e-10f,
    -3.26192151e-07f, -1.58959097e-07f, -1.85462667e-08f, -7.68211539e-09f, -6.19648858e-07f,
    -2.86479093e-07f, -1.21971283e-07f, -5.05221571e-08f, -5.55000724e-07f, -2.16692769e-07f,
    -5.94533333e-07f, -2.46263767e-07f, 6.76659738e-07f, 4.16531179e-07f, -2.14312126e-06f,
    -8.87709859e-07f, 3.24496614e-06f, 1.62310459e-06f, -5.5637438e-06f, -2.30457817e-06f,
    5.35595609e-06f, 2.48889864e-06f, -9.79184733e-06f, -4.05591618e-06f, 4.15920977e-06f,
    1.74008358e-06f, -9.78746721e-06f, -4.05410174e-06f, -9.82400024e-07f, -7.32652154e-07f,
    0.0f, -0.0f, -7.26994995e-06f, -3.49343964e-06f, 1.59624797e-05f, 6.61187551e-06f,
    -1.15338344e-05f, -5.11587314e-06f, 2.41175021e-05f, 9.98979704e-06f, -1.29613254e-05f,
    -5.36875677e-06f, 1.59624797e-05f, 6.61187551e-06f, -1.17731215e-05f, -4.53818393e-06f,
    0.0f, -0.0f, -7.61086585e-06f, -2.67039604e-06f, -9.78746721e-06f, -4.05410174e-06f,
    -1.21272501e-06f, -1.76598377e-07f, -9.79184733e-06f, -4.05591618e-06f, 4.17143019e-06f,
    1.71058048e-06f, -5.5637438e-06f, -2.30457817e-06f, 5.54715007e-06f, 2.02731576e-06f,
    -2.14312126e-06f, -8.87709859e-07f, 3.44224577e-06f, 1.14682928e-06f, -5.94533333e-07f,
    -2.46263767e-07f, 7.73002739e-07f, 1.83938653e-07f, -1.21971283e-07f, -5.05221571e-08f,
    -5.45669707e-07f, -2.39219844e-07f, -1.85462667e-08f, -7.68211539e-09f, -6.4072924e-07f,
    -2.35586583e-07f, -1.50736412e-09f, -6.24370666e-10f, -3.43053756e-07f, -1.18251627e-07f,
    -8.066533e-10f, -3.34126726e-10f, -1.2223812e-07f, -4.01451281e-08f, -3.87405774e-10f,
    -1.60468722e-10f, -3.07335952e-08f, -9.85116611e-09f, -1.03397577e-25f, 3.07352165e-11f,
    3.15643263e-08f, -7.46592121e-09f, 8.27180613e-25f, -3.31839868e-11f, 1.23574111e-07f,
    -3.25949969e-08f, 1.32348898e-23f, 7.17136767e-12f, 3.47101775e-07f, -9.35326128e-08f, 0.0f,
    -5.22555688e-09f, 6.48876039e-07f, -1.87909009e-07f, 0.0f, -3.50671066e-08f, 5.5895174e-07f,
    -1.90494063e-07f, 0.0f, -1.71549374e-07f, -7.69392159e-07f, 1.44145119e-07f, 0.0f,
    -6.18983165e-07f, -3.47804621e-06f, 9.11736151e-07f, 2.71050543e-20f, -1.60609898e-06f,
    -5.6726949e-06f, 1.61403204e-06f, 0.0f, -2.82807605e-06f, -4.52141285e-06f, 1.36623885e-06f,
    0.0f, -2.82648284e-06f, 1.32540208e-07f, -1.29131649e-07f, 0.0f, -0.0f, 4.44507759e-06f,
    -2.08640495e-06f, 0.0f, 4.60881483e-06f, 4.35373249e-06f, -3.47868627e-06f,
    -1.08420217e-19f, 6.96451434e-06f, 0.0f, -3.93537903e-06f, 0.0f, 4.60881483e-06f,
    -4.35373249e-06f, -3.47868627e-06f, 0.0f, -0.0f, -4.44507759e-06f, -2.08640495e-06f, 0.0f,
    -2.82648284e-06f, -1.32540208e-07f, -1.29131649e-07f, 0.0f, -2.82807605e-06f,
    4.52141285e-06f, 1.36623885e-06f, 2.71050543e-20f, -1.60609898e-06f, 5.6726949e-06f,
    1.61403204e-06f, 0.0f, -6.18983165e-07f, 3.47804621e-06f, 9.11736151e-07f, 0.0f,
    -1.71549374e-07f, 7.69392159e-07f, 1.44145119e-07f, 0.0f, -3.50671066e-08f, -5.5895174e-07f,
    -1.90494063e-07f, 0.0f, -5.22555688e-09f, -6.48876039e-07f, -1.87909009e-07f,
    1.32348898e-23f, 7.17136767e-12f, -3.47101775e-07f, -9.35326128e-08f, 8.27180613e-25f,
    -3.31839868e-11f, -1.23574111e-07f, -3.25949969e-08f, -1.03397577e-25f, 3.07352165e-11f,
    -3.15643263e-08f, -7.46592121e-09f, -2.29330832e-10f, 9.49919379e-11f, -1.86148128e-08f,
    2.67377693e-08f, -6.18952112e-10f, 2.56378363e-10f, -6.95916782e-08f, 1.04933619e-07f,
    -2.19585083e-09f, 9.09551157e-10f, -1.98070865e-07f, 2.97290939e-07f, -1.50646251e-08f,
    6.23997209e-09f, -3.64479746e-07f, 5.62627974e-07f, -9.92058418e-08f, 4.10924024e-08f,
    -3.01881443e-07f, 5.0387797e-07f, -4.84042289e-07f, 2.00496885e-07f, 4.65576505e-07f,
    -6.17170258e-07f, -1.74484671e-06f, 7.22739173e-07f, 1.9868271e-06f, -2.95416885e-06f,
    -4.53095299e-06f, 1.87678222e-06f, 3.15011494e-06f, -4.89733611e-06f, -7.97242501e-06f,
    3.30228636e-06f, 2.27093938e-06f, -3.9290303e-06f, -7.96936092e-06f, 3.30101716e-06f,
    -1.00606553e-06f, 2.98627612e-07f, 0.0f, -0.0f, -5.14439762e-06f, 4.77352705e-06f,
    1.29985556e-05f, -5.38417771e-06f, -8.49735716e-06f, 6.19396769e-06f, 1.96374112e-05f,
    -8.13408224e-06f, -1.04787896e-05f, 4.3404566e-06f, 1.29985556e-05f, -5.38417771e-06f,
    -1.03883358e-05f, 1.62874233e-06f, 0.0f, -0.0f, -7.01303179e-06f, 2.62244811e-07f,
    -7.96936092e-06f, 3.30101716e-06f, -9.22557376e-07f, 5.00234137e-07f, -7.97242501e-06f,
    3.30228636e-06f, 4.38404049e-06f, 1.17244724e-06f, -4.53095299e-06f, 1.87678222e-06f,
    5.69040731e-06f, 1.23547204e-06f, -1.74484671e-06f, 7.22739173e-07f, 3.49381185e-06f,
    6.84013969e-07f, -4.84042289e-07f, 2.00496885e-07f, 7.65617585e-07f, 1.07192974e-07f,
    -9.92058418e-08f, 4.10924024e-08f, -5.69757958e-07f, -1.4283313e-07f, -1.50646251e-08f,
    6.23997209e-09f, -6.55564122e-07f, -1.40111965e-07f, -2.19585083e-09f, 9.09551157e-10f,
    -3.50273694e-07f, -7.01591887e-08f, -6.18952112e-10f, 2.56378363e-10f, -1.23408014e-07f,
    -2.49905252e-08f, -2.29330832e-10f, 9.49919379e-11f, -3.20691207e-08f, -5.74379744e-09f,
    -1.52364565e-10f, -1.52364565e-10f, -3.96214128e-09f, -3.20839142e-08f, -2.13431217e-10f,
    -2.13431217e-10f, -1.60039484e-08f, -1.23166572e-07f, -1.47174684e-09f, -1.47174684e-09f,
    -4.6890797e-08f, -3.5180031e-07f, -1.08744711e-08f, -1.08744711e-08f, -9.35119076e-08f,
    -6.60571686e-07f, -7.2627131e-08f, -7.2627131e-08f, -9.54591926e-08f, -5.76343325e-07f,
    -3.55073979e-07f, -3.55073979e-07f, 7.04226792e-08f, 7.63399441e-07f, -1.27864303e-06f,
    -1.27864303e-06f, 4.47816063e-07f, 3.51120912e-06f, -3.32065952e-06f, -3.32065952e-06f,
    7.79777167e-07f, 5.73992065e-06f, -5.8433202e-06f, -5.8433202e-06f, 5.6631842e-07f,
    4.48340961e-06f, -5.84102418e-06f, -5.84102418e-06f, -5.19602395e-07f, -6.94594576e-07f,
    0.0f, -0.0f, -2.45183696e-06f, -6.39134714e-06f, 9.52668415e-06f, 9.52668415e-06f,
    -5.06475817e-06f, -8.89531566e-06f, 1.43918587e-05f, 1.43918587e-05f, -7.7815921e-06f,
    -7.7815921e-06f, 9.52668415e-06f, 9.52668415e-06f, -8.89531566e-06f, -5.06475817e-06f, 0.0f,
    -0.0f, -6.39134714e-06f, -2.45183696e-06f, -5.84102418e-06f, -5.84102418e-06f,
    -6.94594576e-07f, -5.19602395e-07f, -5.8433202e-06f, -5.8433202e-06f, 4.48340961e-06f,
    5.6631842e-07f, -3.32065952e-06f, -3.32065952e-06f, 5.73992065e-06f, 7.79777167e-07f,
    -1.27864303e-06f, -1.27864303e-06f, 3.51120912e-06f, 4.47816063e-07f, -3.55073979e-07f,
    -3.55073979e-07f, 7.63399441e-07f, 7.04226792e-08f, -7.2627131e-08f, -7.2627131e-08f,
    -5.76343325e-07f, -9.54591926e-08f, -1.08744711e-08f, -1.08744711e-08f, -6.60571686e-07f,
    -9.35119076e-08f, -1.47174684e-09f, -1.47174684e-09f, -3.5180031e-07f, -4.6890797e-08f,
    -2.13431217e-10f, -2.13431217e-10f, -1.23166572e-07f, -1.60039484e-08f, -1.52364565e-10f,
    -1.52364565e-10f, -3.20839142e-08f, -3.96214128e-09f, 2.81330393e-11f, -6.79191633e-11f,
    2.40681874e-08f, 2.13017231e-08f, -3.06555281e-10f, 7.40089878e-10f, 9.29715611e-08f,
    8.2852857e-08f, -2.61624722e-10f, 6.3161798e-10f, 2.65905669e-07f, 2.33091058e-07f,
    -2.55103472e-09f, 6.1587424e-09f, 5.02015951e-07f, 4.35237638e-07f, -1.57317714e-08f,
    3.79798557e-08f, 4.43848194e-07f, 3.77411538e-07f, -7.61523111e-08f, 1.83847945e-07f,
    -5.6415837e-07f, -5.13219959e-07f, -2.76817644e-07f, 6.68296934e-07f, -2.65324434e-06f,
    -2.3305995e-06f, -7.17790215e-07f, 1.7328988e-06f, -4.38960706e-06f, -3.79690823e-06f,
    -1.26327984e-06f, 3.04982746e-06f, -3.59070532e-06f, -2.96695112e-06f, -1.26264683e-06f,
    3.04829905e-06f, -1.31287592e-07f, 3.90562832e-07f, 0.0f, -0.0f, 2.94582173e-06f,
    3.94841072e-06f, 2.05945912e-06f, -4.97197379e-06f, 2.37335939e-06f, 5.20825597e-06f,
    3.11269946e-06f, -7.51472135e-06f, -1.65573408e-06f, 3.99729561e-06f, 2.05945912e-06f,
    -4.97197379e-06f, -5.36101152e-06f, 2.00457475e-06f, 0.0f, -0.0f, -4.87495845e-06f,
    7.08937364e-07f, -1.26264683e-06f, 3.04829905e-06f, -1.83335288e-07f, 3.6900397e-07f,
    -1.26327984e-06f, 3.04982746e-06f, 4.63696324e-06f, 4.4106082e-07f, -7.17790215e-07f,
    1.7328988e-06f, 5.78874051e-06f, 4.19101411e-07f, -2.76817644e-07f, 6.68296934e-07f,
    3.52410984e-06f, 2.28144401e-07f, -7.61523111e-08f, 1.83847945e-07f, 7.61821525e-07f,
    3.60188821e-08f, -1.57317714e-08f, 3.79798557e-08f, -5.80718336e-07f, -4.69778065e-08f,
    -2.55103472e-09f, 6.1587424e-09f, -6.6273833e-07f, -4.72193733e-08f, -2.61624722e-10f,
    6.3161798e-10f, -3.52843983e-07f, -2.32034463e-08f, -3.06555281e-10f, 7.40089878e-10f,
    -1.24326633e-07f, -7.15500548e-09f, 2.81330393e-11f, -6.79191633e-11f, -3.20813704e-08f,
    -1.95618499e-09f, 0.0f, -0.0f, -3.21306288e-08f, 0.0f, -1.39698386e-09f, 0.0f,
    -1.25262886e-07f, 0.0f, -2.32830644e-09f, 0.0f, -3.53436917e-07f, 0.0f, -2.00234354e-08f,
    0.0f, -6.63101673e-07f, 0.0f, -1.28522515e-07f, 0.0f, -5.83007932e-07f, 0.0f,
    -6.25383109e-07f, 0.0f, 7.59959221e-07f, -0.0f, -2.2626482e-06f, 0.0f, 3.51993367e-06f,
    -0.0f, -5.87152317e-06f, 0.0f, 5.75045124e-06f, -0.0f, -1.0333024e-05f, 0.0f,
    4.40375879e-06f, -0.0f, -1.03283674e-05f, 0.0f, -1.1427328e-06f, 0.0f, 0.0f, -0.0f,
    -7.84127042e-06f, 0.0f, 1.68457627e-05f, -0.0f, -1.23027712e-05f, 0.0f, 2.54549086e-05f,
    -0.0f, -1.36895105e-05f, 0.0f, 1.68457627e-05f, -0.0f, -1.23027712e-05f, 0.0f, 0.0f, -0.0f,
    -7.84127042e-06f, 0.0f, -1.03283674e-05f, 0.0f, -1.1427328e-06f, 0.0f, -1.0333024e-05f,
    0.0f, 4.40375879e-06f, -0.0f, -5.87152317e-06f, 0.0f, 5.75045124e-06f, -0.0f,
    -2.2626482e-06f, 0.0f, 3.51993367e-06f, -0.0f, -6.25383109e-07f, 0.0f, 7.59959221e-07f,
    -0.0f, -1.28522515e-07f, 0.0f, -5.83007932e-07f, 0.0f, -2.00234354e-08f, 0.0f,
    -6.63101673e-07f, 0.0f, -2.32830644e-09f, 0.0f, -3.53436917e-07f, 0.0f, -1.39698386e-09f,
    0.0f, -1.25262886e-07f, 0.0f, 0.0f, -0.0f, -3.21306288e-08f, 0.0f, -4.5878347e-05f, 0.0f,
    -4.57372516e-05f, 0.0f, -0.000119621865f, 0.0f, -8.4401574e-05f, 0.0f, -0.00027658511f,
    0.0f, -0.000141768251f, 0.0f, -0.000563652255f, 0.0f, -0.000215144828f, 0.0f,
    -0.00100285094f, 0.0f, -0.000291494653f, 0.0f, -0.00153382029f, 0.0f, -0.000345223583f,
    0.0f, -0.00195991294f, 0.0f, -0.000341984909f, 0.0f, -0.0019615381f, 0.0f, -0.000250560697f,
    0.0f, -0.0012330371f, 0.0f, -6.01783395e-05f, 0.0f, 0.000285858288f, -0.0f, 0.000204970594f,
    -0.0f, 0.00223478023f, -0.0f, 0.00048430264f, -0.0f, 0.00389874028f, -0.0f, 0.000698087271f,
    -0.0f, 0.00455503631f, -0.0f, 0.00077826716f, -0.0f, 0.00389874028f, -0.0f, 0.000698087271f,
    -0.0f, 0.00223478023f, -0.0f, 0.00048430264f, -0.0f, 0.000285858288f, -0.0f,
    0.000204970594f, -0.0f, -0.0012330371f, 0.0f, -6.01783395e-05f, 0.0f, -0.0019615381f, 0.0f,
    -0.000250560697f, 0.0f, -0.00195991294f, 0.0f, -0.000341984909f, 0.0f, -0.00153382029f,
    0.0f, -0.000345223583f, 0.0f, -0.00100285094f, 0.0f, -0.000291494653f, 0.0f,
    -0.000563652255f, 0.0f, -0.000215144828f, 0.0f, -0.00027658511f, 0.0f, -0.000141768251f,
    0.0f, -0.000119621865f, 0.0f, -8.4401574e-05f, 0.0f, -4.5878347e-05f, 0.0f,
    -4.57372516e-05f, 0.0f, 1.73438502e-06f, -4.53283646e-05f, -3.30165822e-05f,
    -3.84626474e-05f, -6.22633206e-06f, -0.000118831762f, -6.93981929e-05f, -6.67342101e-05f,
    -4.1270403e-05f, -0.000274253514f, -0.000133469206f, -0.000102672857f, -0.000144656311f,
    -0.00055291818f, -0.000234382096f, -0.00013616604f, -0.000381248508f, -0.000961569429f,
    -0.000374573428f, -0.000145685772f, -0.000815541425f, -0.00141058047f, -0.000541896268f,
    -9.91427951e-05f, -0.00144937914f, -0.00166586775f, -0.000703570084f, 3.75158561e-05f,
    -0.00214196253f, -0.0013874186f, -0.000807492994f, 0.000283586822f, -0.00258195633f,
    -0.000306027243f, -0.00079519226f, 0.000624464417f, -0.00239181425f, 0.00152064196f,
    -0.000624964712f, 0.00100120157f, -0.00136196672f, 0.0035641971f, -0.000296069367f,
    0.00131958304f, 0.000328578171f, 0.00498669269f, 0.000139702417f, 0.00148075132f,
    0.00210814015f, 0.00508950092f, 0.000588936149f, 0.00142181758f, 0.00329378434f,
    0.00375846401f, 0.000948264787f, 0.00114583387f, 0.00348332385f, 0.00155721197f,
    0.00114243873f, 0.00072373345f, 0.00276652421f, -0.000616011734f, 0.00114987313f,
    0.000266039599f, 0.00160932483f, -0.00204211264f, 0.00100384885f, -0.000120722805f,
    0.000533543061f, -0.00249564927f, 0.000771509949f, -0.000370457623f, -0.000153080517f,
    -0.00220281235f, 0.000524026866f, -0.000470971456f, -0.000420756143f, -0.00157410593f,
    0.000313073979f, -0.000453283079f, -0.000410348875f, -0.00094951567f, 0.000161848016f,
    -0.00036787882f, -0.000288684707f, -0.000493259635f, 6.9449241e-05f, -0.0002620171f,
    -0.000164743949f, -0.000223109106f, 2.17763099e-05f, -0.000166977654f, -7.96240638e-05f,
    -8.84294277e-05f, 1.88371826e-06f, -9.6260148e-05f, -3.32783893e-05f, -3.08255985e-05f,
    -3.850952e-06f, -5.05434473e-05f, 4.35823822e-05f, 3.79912149e-06f, 1.83964694e-05f,
    -6.05518981e-05f, 0.000116135147f, -1.02397007e-05f, 1.83057327e-05f, -0.000124697035f,
    0.00026692712f, -7.47659433e-05f, -3.61688467e-06f, -0.000233573504f, 0.00052222755f,
    -0.000267206604f, -7.63449352e-05f, -0.000396288757f, 0.000847576477f, -0.000705585757f,
    -0.000241648202f, -0.000604803674f, 0.00107575336f, -0.00149430917f, -0.000544328475f,
    -0.00082042336f, 0.000878176244f, -0.00259586866f, -0.00101076532f, -0.000967175409f,
    -0.00012314097f, -0.00368282758f, -0.00162070943f, -0.000942589715f, -0.00207089703f,
    -0.00412193313f, -0.00228655594f, -0.000651240349f, -0.00456495536f, -0.0032384838f,
    -0.00285820174f, -5.30323414e-05f, -0.00663360301f, -0.000805674121f, -0.00316340826f,
    0.000796469802f, -0.00717485836f, 0.00258432096f, -0.00307361898f, 0.00174073759f,
    -0.00566329621f, 0.00566329621f, -0.00256508915f, 0.00256508915f, -0.00258432096f,
    0.00717485836f, -0.00174073759f, 0.00307361898f, 0.000805674121f, 0.00663360301f,
    -0.000796469802f, 0.00316340826f, 0.0032384838f, 0.00456495536f, 5.30323414e-05f,
    0.00285820174f, 0.00412193313f, 0.00207089703f, 0.000651240349f, 0.00228655594f,
    0.00368282758f, 0.00012314097f, 0.000942589715f, 0.00162070943f, 0.00259586866f,
    -0.000878176244f, 0.000967175409f, 0.00101076532f, 0.00149430917f, -0.00107575336f,
    0.00082042336f, 0.000544328475f, 0.000705585757f, -0.000847576477f, 0.000604803674f,
    0.000241648202f, 0.000267206604f, -0.00052222755f, 0.000396288757f, 7.63449352e-05f,
    7.47659433e-05f, -0.00026692712f, 0.000233573504f, 3.61688467e-06f, 1.02397007e-05f,
    -0.000116135147f, 0.000124697035f, -1.83057327e-05f, -3.79912149e-06f, -4.35823822e-05f,
    6.05518981e-05f, -1.83964694e-05f, -6.28632233e-06f, 4.04308994e-05f, 7.85389639e-05f,
    -9.73501483e-06f, 1.06505995e-05f, 0.000110744622f, 0.000155884642f, -4.8668473e-05f,
    9.48625166e-05f, 0.000253819482f, 0.0002776724f, -0.000147983577f, 0.000350809947f,
    0.000475642359f, 0.000438884541f, -0.00035837121f, 0.000929875125f, 0.000686823507f,
    0.000602374435f, -0.000740755408f, 0.00193767564f, 0.000620495412f, 0.000684323197f,
    -0.00134295423f, 0.00323822629f, -0.000159434203f, 0.000556554005f, -0.00216164021f,
    0.00426402502f, -0.00203337776f, 7.92242645e-05f, -0.00310383155f, 0.00408016657f,
    -0.00489862077f, -0.000835760555f, -0.00397409359f, 0.00188698666f, -0.00783918053f,
    -0.00215345086f, -0.0045118467f, -0.00223689503f, -0.00933710486f, -0.0036780762f,
    -0.00448068464f, -0.00696924282f, -0.00814322382f, -0.00508535421f, -0.00377638801f,
    -0.0102846846f, -0.00426005572f, -0.00602731202f, -0.00249659456f, -0.0106861275f,
    0.000830130186f, -0.00626619812f, -0.000925578992f, -0.00818405394f, 0.00502060633f,
    -0.00576911494f, 0.0005675297f, -0.0042088367f, 0.00687743863f, -0.0047130771f,
    0.00166763761f, -0.000578734558f, 0.00634896103f, -0.00340108038f, 0.00221913657f,
    0.00157730584f, 0.00445293635f, -0.00213872036f, 0.00225076033f, 0.00217703474f,
    0.00240250886f, -0.00113496732f, 0.00192205352f, 0.00180890015f, 0.000931387069f,
    -0.000465722493f, 0.0014335016f, 0.00114317855f, 0.000171863445f, -9.78501339e-05f,
    0.000949736219f, 0.000584390014f, -8.82698587e-05f, 5.69315198e-05f, 0.000563744921f,
    0.000246555399f, -0.000112399546f, 9.17038487e-05f, 0.000300984248f, 8.58393832e-05f,
    -7.07771615e-05f, 7.5813281e-05f, 0.000144640901f, 2.41438629e-05f, -3.30340663e-05f,
    4.86517383e-05f, 6.24191307e-05f, -3.57432255e-05f, -8.93642573e-06f, 3.96662836e-05f,
    8.52524172e-05f, -0.000101892263f, 7.3745141e-06f, 0.000118237025f, 0.000159603835f,
    -0.000234223073f, 9.94896836e-05f, 0.000293139019f, 0.000260303059f, -0.000418586103f,
    0.000387491484f, 0.000629846647f, 0.000355716649f, -0.000512234052f, 0.00103388808f,
    0.0011938042f, 0.000365622371f, -0.000158197246f, 0.00210832804f, 0.00201143418f,
    0.000152300097f, 0.00115220086f, 0.00333225355f, 0.00301803835f, -0.000457579474f,
    0.00372124137f, 0.00388670643f, 0.00401943317f, -0.00160788989f, 0.00708779786f,
    0.00262909383f, 0.00470513152f, -0.00331740291f, 0.00976307318f, -0.00111662096f,
    0.00473684445f, -0.0053989077f, 0.00981911551f, -0.00663919281f, 0.00389370439f,
    -0.00745362742f, 0.00623877486f, -0.0117149446f, 0.00220685964f, -0.00897568557f,
    6.50521303e-19f, -0.013785135f, 1.08420217e-19f, -0.00953867938f, -0.00623877486f,
    -0.0117149446f, -0.00220685964f, -0.00897568557f, -0.00981911551f, -0.00663919281f,
    -0.00389370439f, -0.00745362742f, -0.00976307318f, -0.00111662096f, -0.00473684445f,
    -0.0053989077f, -0.00708779786f, 0.00262909383f, -0.00470513152f, -0.00331740291f,
    -0.00372124137f, 0.00388670643f, -0.00401943317f, -0.00160788989f, -0.00115220086f,
    0.00333225355f, -0.00301803835f, -0.000457579474f, 0.000158197246f, 0.00210832804f,
    -0.00201143418f, 0.000152300097f, 0.000512234052f, 0.00103388808f, -0.0011938042f,
    0.000365622371f, 0.000418586103f, 0.000387491484f, -0.000629846647f, 0.000355716649f,
    0.000234223073f, 9.94896836e-05f, -0.000293139019f, 0.000260303059f, 0.000101892263f,
    7.3745141e-06f, -0.000118237025f, 0.000159603835f, 3.57432255e-05f, -8.93642573e-06f,
    -3.96662836e-05f, 8.52524172e-05f, 1.12102762e-05f, -2.96656672e-05f, -8.14700397e-05f,
    6.53698953e-05f, -1.58485466e-06f, -8.936425e-05f, -0.000139363969f, 0.000175481182f,
    -9.03420514e-05f, -0.000208130994f, -0.000193118627f, 0.000405501807f, -0.000379069941f,
    -0.000356491888f, -0.000179107839f, 0.000822040543f, -0.00102219719f, -0.000353168085f,
    2.72652233e-05f, 0.00147316488f, -0.00203108252f, 0.000214204119f, 0.000607518828f,
    0.00233562756f, -0.00297992304f, 0.00186222431f, 0.00175072032f, 0.0032575957f,
    -0.00285638869f, 0.00472928956f, 0.00355366967f, 0.00393725745f, -0.000478411239f,
    0.00794997904f, 0.00590361189f, 0.00398157444f, 0.00445174146f, 0.00957325008f,
    0.00841407664f, 0.00305628357f, 0.0104149273f, 0.00760948937f, 0.0104852179f,
    0.00107465952f, 0.0144357169f, 0.00174882682f, 0.0115025155f, -0.00168026355f, 0.013981604f,
    -0.00579136983f, 0.0110959802f, -0.00459610531f, 0.00897098612f, -0.0114442008f,
    0.00932163186f, -0.00694538094f, 0.00198374433f, -0.0127451876f, 0.00665426953f,
    -0.00817406736f, -0.00362145365f, -0.00991716702f, 0.00378853176f, -0.00811076909f,
    -0.00595977157f, -0.00528319599f, 0.00135908567f, -0.00698988233f, -0.00536388485f,
    -0.00132434093f, -0.00027123763f, -0.0052968855f, -0.00342391524f, 0.000790332386f,
    -0.00106552173f, -0.00354141416f, -0.00158765737f, 0.00128472701f, -0.00122195738f,
    -0.00208111876f, -0.000473075052f, 0.000972530106f, -0.00102240546f, -0.00106096431f,
    -1.59650917e-05f, 0.000520120782f, -0.000707918836f, -0.000454622088f, 8.32893566e-05f,
    0.000211052306f, -0.000423288555f, -0.000150177584f, 6.20694045e-05f, 6.43107269e-05f,
    -0.00022262914f, -2.55387222e-05f, 2.89036561e-05f, 1.3049932e-05f, -0.000103831517f,
    1.13845181e-05f, 2.27112887e-05f, 1.25127535e-05f, -8.25608367e-05f, -6.98996955e-05f,
    7.38276867e-05f, 4.81432744e-06f, -0.000210400249f, -0.000103572616f, 0.000176664777f,
    -7.19246455e-05f, -0.000464409561f, -9.90100671e-05f, 0.000293843943f, -0.000335398276f,
    -0.00089755957f, 3.54864387e-05f, 0.00022782982f, -0.000919187965f, -0.00152101484f,
    0.00045579343f, -0.000443172088f, -0.00177446299f, -0.00224370603f, 0.00135932991f,
    -0.00217763637f, -0.00236706552f, -0.00282283779f, 0.00290655787f, -0.00490364479f,
    -0.00160750886f, -0.00287637301f, 0.00509522157f, -0.00741417659f, 0.00153431366f,
    -0.00199866784f, 0.00764451874f, -0.00755921612f, 0.00681889476f, 3.56201599e-05f,
    0.00997976772f, -0.00371305156f, 0.012004301f, 0.00307326228f, 0.0113827726f,
    0.00340917823f, 0.0138380518f, 0.00652428577f, 0.0112792989f, 0.0105090188f, 0.0105090188f,
    0.00952605624f, 0.00952605624f, 0.0138380518f, 0.00340917823f, 0.0112792989f,
    0.00652428577f, 0.012004301f, -0.00371305156f, 0.0113827726f, 0.00307326228f,
    0.00681889476f, -0.00755921612f, 0.00997976772f, 3.56201599e-05f, 0.00153431366f,
    -0.00741417659f, 0.00764451874f, -0.00199866784f, -0.00160750886f, -0.00490364479f,
    0.00509522157f, -0.00287637301f, -0.00236706552f, -0.00217763637f, 0.00290655787f,
    -0.00282283779f, -0.00177446299f, -0.000443172088f, 0.00135932991f, -0.00224370603f,
    -0.000919187965f, 0.00022782982f, 0.00045579343f, -0.00152101484f, -0.000335398276f,
    0.000293843943f, 3.54864387e-05f, -0.00089755957f, -7.19246455e-05f, 0.000176664777f,
    -9.90100671e-05f, -0.000464409561f, 4.81432744e-06f, 7.38276867e-05f, -0.000103572616f,
    -0.000210400249f, 1.25127535e-05f, 2.27112887e-05f, -6.98996955e-05f, -8.25608367e-05f,
    -1.24578946e-05f, 1.56806782e-05f, 5.41670634e-05f, -8.94778714e-05f, -9.94487255e-06f,
    5.67879106e-05f, 6.23898959e-05f, -0.000219714304f, 4.9883387e-05f, 0.000142102042f,
    3.42801286e-06f, -0.000465716963f, 0.000270799675f, 0.00023387518f, -0.000230987673f,
    -0.000856310537f, 0.000759921328f, 0.000141076234f, -0.000805345713f, -0.00135659019f,
    0.00142356206f, -0.000525013194f, -0.00189750548f, -0.00180883717f, 0.00168620329f,
    -0.00212074141f, -0.00359726604f, -0.00190360146f, 0.000514843385f, -0.00437887665f,
    -0.00577303302f, -0.00123598764f, -0.00282525201f, -0.00591090834f, -0.00798574463f,
    0.000526103657f, -0.00756527204f, -0.00469277613f, -0.00954728853f, 0.00341177173f,
    -0.0110729225f, 0.000217725028f, -0.00976152625f, 0.00698645879f, -0.0104315924f,
    0.00710614584f, -0.00826218352f, 0.0104020741f, -0.00504518114f, 0.012180144f,
    -0.00525820209f, 0.0126944222f, 0.00235144538f, 0.0124010537f, -0.00151313073f,
    0.0131976232f, 0.00767578371f, 0.00798369385f, 0.00196226873f, 0.0118426131f,
    0.00866774935f, 0.00203116122f, 0.00433846517f, 0.00916343927f, 0.00617739791f,
    -0.00218188856f, 0.00527476287f, 0.00601878576f, 0.00273228413f, -0.00346038258f,
    0.00495612575f, 0.00320817553f, 0.000307264883f, -0.00269191642f, 0.00388970086f,
    0.00119760178f, -0.00063537003f, -0.00137785077f, 0.00262078014f, 6.26979599e-05f,
    -0.000637101475f, -0.000437589566f, 0.00152871956f, -0.000389788707f, -0.000356859004f,
    -2.61095574e-05f, 0.000768835947f, -0.000442170043f, -0.000135754206f, 6.52084418e-05f,
    0.000326887646f, -0.000331735617f, -3.31230294e-05f, 4.71872045e-05f, 0.00011124515f,
    -0.000199477785f, -2.27885243e-06f, 1.98969756e-05f, 2.49685108e-05f, -0.00010157231f,
    -9.43920259e-06f, -1.10464662e-05f, 8.68163625e-05f, 3.77656688e-05f, -4.01891011e-05f,
    -1.2611622e-05f, 0.000206348894f, 2.46941308e-05f, -0.000107464199f, 2.92789919e-05f,
    0.000419517572f, -7.34317437e-05f, -0.000178801653f, 0.000200025694f, 0.000727734645f,
    -0.000366697583f, -8.73131576e-05f, 0.000580398191f, 0.0010540504f, -0.00100430439f,
    0.000493640429f, 0.00105567253f, 0.00119455613f, -0.00211489922f, 0.00180556532f,
    0.00107948924f, 0.000818182889f, -0.00369485654f, 0.00345260603f, -0.000218425048f,
    -0.000434807211f, -0.00548945228f, 0.00406390103f, -0.00322925299f, -0.00275247637f,
    -0.00695933448f, 0.00200745719f, -0.00682222284f, -0.00593458768f, -0.00741855241f,
    -0.00289006298f, -0.00841856562f, -0.00931253005f, -0.00633828854f, -0.00828257948f,
    -0.00592182204f, -0.0119240656f, -0.00367372436f, -0.0106481221f, 0.0f, -0.0129095642f,
    0.0f, -0.00828257948f, 0.00592182204f, -0.0119240656f, 0.00367372436f, -0.00289006298f,
    0.00841856562f, -0.00931253005f, 0.00633828854f, 0.00200745719f, 0.00682222284f,
    -0.00593458768f, 0.00741855241f, 0.00406390103f, 0.00322925299f, -0.00275247637f,
    0.00695933448f, 0.00345260603f, 0.000218425048f, -0.000434807211f, 0.00548945228f,
    0.00180556532f, -0.00107948924f, 0.000818182889f, 0.00369485654f, 0.000493640429f,
    -0.00105567253f, 0.00119455613f, 0.00211489922f, -8.73131576e-05f, -0.000580398191f,
    0.0010540504f, 0.00100430439f, -0.000178801653f, -0.000200025694f, 0.000727734645f,
    0.000366697583f, -0.000107464199f, -2.92789919e-05f, 0.000419517572f, 7.34317437e-05f,
    -4.01891011e-05f, 1.2611622e-05f, 0.000206348894f, -2.46941308e-05f, -9.43920259e-06f,
    1.10464662e-05f, 8.68163625e-05f, -3.77656688e-05f, 8.6732698e-06f, -4.64893492e-06f,
    -2.33007922e-05f, 7.700469e-05f, 1.26065179e-05f, -2.58344699e-05f, 3.8530161e-06f,
    0.000177255148f, -1.33878611e-05f, -7.58092428e-05f, 0.00012097929f, 0.000344041473f,
    -0.000134966656f, -0.000130232627f, 0.000426721352f, 0.000555169012f, -0.000410055625f,
    -5.60659064e-05f, 0.00103751465f, 0.000706095016f, -0.000725762977f, 0.000399015553f,
    0.00201860419f, 0.000578226754f, -0.000617797661f, 0.00137530151f, 0.00327721843f,
    -0.000131838635f, 0.000568950607f, 0.00243576616f, 0.00447656959f, -0.00168459478f,
    0.0029287443f, 0.00239524385f, 0.00506346812f, -0.00409534853f, 0.00521568069f,
    0.000138174888f, 0.00446879119f, -0.00696914224f, 0.00528132403f, -0.00389289926f,
    0.0024252513f, -0.00952281523f, 0.0020217672f, -0.00724967057f, -0.000779298716f,
    -0.0108632417f, -0.00301490794f, -0.00727863144f, -0.00431320956f, -0.0104130087f,
    -0.00655589672f, -0.00369668589f, -0.00713042449f, -0.00823251903f, -0.00648715533f,
    0.000981764519f, -0.00844855886f, -0.00501873577f, -0.00359033886f, 0.00378574757f,
    -0.00808783993f, -0.00176801533f, -0.000377241755f, 0.0037646282f, -0.00647626119f,
    0.000684563711f, 0.00132003787f, 0.00212465553f, -0.00435660128f, 0.00197422435f,
    0.0014093339f, 0.000535636093f, -0.00241056737f, 0.00222411938f, 0.000795338536f,
    -0.000231045327f, -0.00101850065f, 0.0018362368f, 0.000250308542f, -0.000329597708f,
    -0.000234349049f, 0.00123291812f, 3.34746619e-06f, -0.000187524201f, 9.08262155e-05f,
    0.000694301329f, -4.41385819e-05f, -6.30718787e-05f, 0.000157728791f, 0.000328819355f,
    -2.71818826e-05f, -9.35357457e-06f, 0.000122613827f, 0.000128062806f, -9.42022143e-06f,
    2.84563475e-06f, 7.09266824e-05f, 3.79743906e-05f, 1.5757422e-06f, 5.96701921e-06f,
    -6.31975636e-05f, -1.21776357e-05f, 1.48755398e-05f, 1.05868385e-05f, -0.000140662873f,
    2.12886025e-05f, 4.94967026e-05f, -3.32321042e-06f, -0.000258740358f, 0.000138461037f,
    8.94119148e-05f, -8.28537886e-05f, -0.000379954727f, 0.000418045791f, 3.7284517e-05f,
    -0.00026782151f, -0.000390928122f, 0.000936575467f, -0.000287039438f, -0.000462796132f,
    -8.95135017e-05f, 0.00169931247f, -0.000950085523f, -0.000310888339f, 0.000763057731f,
    0.00255132187f, -0.00154944975f, 0.000629790127f, 0.00230495539f, 0.00313319825f,
    -0.00117747032f, 0.00225907168f, 0.004398969f, 0.00296170218f, 0.000791023951f,
    0.003441168f, 0.00654163724f, 0.00165859645f, 0.0035836976f, 0.00264717988f, 0.00797950942f,
    -0.00076954969f, 0.00510716997f, -0.000379352743f, 0.0080394363f, -0.00379204284f,
    0.00379320793f, -0.00379320793f, 0.00650556386f, -0.00650556386f, 0.000379352743f,
    -0.00510716997f, 0.00379204284f, -0.0080394363f, -0.00264717988f, -0.0035836976f,
    0.00076954969f, -0.00797950942f, -0.003441168f, -0.000791023951f, -0.00165859645f,
    -0.00654163724f, -0.00225907168f, 0.00117747032f, -0.00296170218f, -0.004398969f,
    -0.000629790127f, 0.00154944975f, -0.00313319825f, -0.00230495539f, 0.000310888339f,
    0.000950085523f, -0.00255132187f, -0.000763057731f, 0.000462796132f, 0.000287039438f,
    -0.00169931247f, 8.95135017e-05f, 0.00026782151f, -3.7284517e-05f, -0.000936575467f,
    0.000390928122f, 8.28537886e-05f, -8.94119148e-05f, -0.000418045791f, 0.000379954727f,
    3.32321042e-06f, -4.94967026e-05f, -0.000138461037f, 0.000258740358f, -1.05868385e-05f,
    -1.48755398e-05f, -2.12886025e-05f, 0.000140662873f, -5.96701921e-06f, -1.5757422e-06f,
    1.21776357e-05f, 6.31975636e-05f, -3.54540839e-06f, 5.37247935e-08f, 4.69425322e-06f,
    -4.8360831e-05f, -7.64729248e-06f, 7.57363023e-06f, -2.86401792e-05f, -0.000103776358f,
    -1.58404953e-06f, 2.96955495e-05f, -0.000132146335f, -0.000179066032f, 4.60779229e-05f,
    5.71583842e-05f, -0.000361831742f, -0.000230943711f, 0.000161631178f, 2.43851464e-05f,
    -0.000757036905f, -0.000153998888f, 0.000273679645f, -0.000187871992f, -0.00127932138f,
    0.000215802967f, 0.000132228597f, -0.000601280772f, -0.00174881343f, 0.00103706704f,
    -0.000529796118f, -0.000893223332f, -0.00183958234f, 0.00233599939f, -0.00152687193f,
    -0.000443720375f, -0.00119277008f, 0.00387859554f, -0.00196902128f, 0.00100575096f,
    0.000364464591f, 0.00515517825f, -0.000935179531f, 0.00263516349f, 0.00261446997f,
    0.00555829192f, 0.00130707375f, 0.00294140144f, 0.00492935022f, 0.00470335083f,
    0.00311652524f, 0.00129090704f, 0.00651584286f, 0.00269895047f, 0.00300412555f,
    -0.00115564419f, 0.00681134826f, 0.000159805626f, 0.00120207015f, -0.00252461364f,
    0.00577901537f, -0.00208159629f, -0.00068113493f, -0.00210348167f, 0.0039029771f,
    -0.00338754617f, -0.00139341922f, -0.000765903795f, 0.00189916545f, -0.00358599704f,
    -0.00100622675f, 0.000256981875f, 0.000351019786f, -0.0029525822f, -0.000331669959f,
    0.000518669432f, -0.000503280724f, -0.00196991488f, 6.06751673e-05f, 0.00032636628f,
    -0.000752021035f, -0.00105721247f, 0.000131533408f, 9.7047603e-05f, -0.00064419955f,
    -0.00042641224f, 7.29990934e-05f, -7.83506857e-06f, -0.000419155549f, -9.25518107e-05f,
    1.98778325e-05f, -2.21180162e-05f, -0.000220060378f, 3.3177228e-05f, -5.20872199e-08f,
    -1.07628175e-05f, -9.36326323e-05f, 5.31293008e-05f, -2.46899322e-06f, -2.54497149e-06f,
    -3.0876934e-05f, 3.75156123e-05f, 3.87885166e-07f, -1.80200811e-06f, 3.46878551e-05f,
    3.80071668e-07f, -3.39999951e-06f, -4.81908319e-06f, 7.14780253e-05f, -2.86277027e-05f,
    -1.62938213e-05f, -2.96799021e-06f, 0.000114091134f, -0.000111354304f, -3.36197991e-05f,
    2.32505972e-05f, 0.000121282792f, -0.000283068541f, -1.46122738e-05f, 9.04553963e-05f,
    6.47984143e-06f, -0.000554953876f, 0.000114002971f, 0.000150529959f, -0.000347676425f,
    -0.000865999784f, 0.000351801398f, 4.29406355e-05f, -0.00102492678f, -0.00104539294f,
    0.00046858078f, -0.000376441021f, -0.00197273656f, -0.000837093161f, 8.5325657e-05f,
    -0.000917861122f, -0.00292679528f, -2.08526671e-05f, -0.000839494751f, -0.000970704248f,
    -0.00345374923f, 0.00140844821f, -0.00162351644f, -7.98846886e-05f, -0.00314774457f,
    0.00312439143f, -0.00135719287f, 0.00129157642f, -0.00189162139f, 0.00454257848f,
    -2.16840434e-19f, 0.0019644734f, -1.08420217e-19f, 0.00509409839f, 0.00135719287f,
    0.00129157642f, 0.00189162139f, 0.00454257848f, 0.00162351644f, -7.98846886e-05f,
    0.00314774457f, 0.00312439143f, 0.000839494751f, -0.000970704248f, 0.00345374923f,
    0.00140844821f, -8.5325657e-05f, -0.000917861122f, 0.00292679528f, -2.08526671e-05f,
    -0.00046858078f, -0.000376441021f, 0.00197273656f, -0.000837093161f, -0.000351801398f,
    4.29406355e-05f, 0.00102492678f, -0.00104539294f, -0.000114002971f, 0.000150529959f,
    0.000347676425f, -0.000865999784f, 1.46122738e-05f, 9.04553963e-05f, -6.47984143e-06f,
    -0.000554953876f, 3.36197991e-05f, 2.32505972e-05f, -0.000121282792f, -0.000283068541f,
    1.62938213e-05f, -2.96799021e-06f, -0.000114091134f, -0.000111354304f, 3.39999951e-06f,
    -4.81908319e-06f, -7.14780253e-05f, -2.86277027e-05f, -3.87885166e-07f, -1.80200811e-06f,
    -3.46878551e-05f, 3.80071668e-07f, 8.15745068e-07f, 3.0526698e-07f, 1.60285481e-06f,
    2.34069466e-05f, 2.72009493e-06f, -1.3870972e-06f, 2.43787017e-05f, 4.60872361e-05f,
    2.57816168e-06f, -8.19585239e-06f, 8.50078941e-05f, 6.67402346e-05f, -1.0877171e-05f,
    -1.80806474e-05f, 0.000202680123f, 5.10063255e-05f, -4.76221321e-05f, -7.6087731e-06f,
    0.000371433503f, -6.48440764e-05f, -7.80321207e-05f, 6.50554066e-05f, 0.00052644161f,
    -0.0003543731f, -7.05340381e-06f, 0.000191810424f, 0.000527996803f, -0.000845053815f,
    0.000234190098f, 0.000224537565f, 0.000201400631f, -0.00144569611f, 0.00049403205f,
    -4.42875826e-05f, -0.000554679078f, -0.00191613263f, 0.000402034028f, -0.000561770634f,
    -0.0016425231f, -0.00194180012f, -0.000208942278f, -0.000851527613f, -0.00272630085f,
    -0.00131119811f, -0.000903161417f, -0.000457216578f, -0.00335584441f, -9.33507472e-05f,
    -0.000981207122f, 0.000406429288f, -0.00321111479f, 0.00133008731f, -0.000315330602f,
    0.00096193247f, -0.00230693142f, 0.00243894942f, 0.000454376452f, 0.000749865489f,
    -0.00100062869f, 0.00285494281f, 0.000681512814f, 0.000112950846f, 0.00021162082f,
    0.00253449939f, 0.000380649464f, -0.000318017352f, 0.000962693011f, 0.00174712762f,
    6.82537075e-06f, -0.000324369437f, 0.00116467325f, 0.000879849773f, -0.000140617965f,
    -0.000130642948f, 0.000970893423f, 0.000224193194f, -0.000101178157f, 9.17592479e-06f,
    0.000622830063f, -0.000121670819f, -2.82937181e-05f, 3.905415e-05f, 0.00030849484f,
    -0.00021679145f, 5.09362735e-06f, 2.04762709e-05f, 0.000107249565f, -0.000179383409f,
    7.61837873e-06f, 3.97230724e-06f, 1.29171849e-05f, -0.000107302134f, 2.90422349e-06f,
    -9.4257183e-07f, -1.53502515e-05f, -4.98269401e-05f, 3.60962503e-07f, -7.92675223e-07f,
    -1.54178215e-05f, -1.76846006e-05f, -1.33280494e-07f, 4.05736898e-07f, -1.48954396e-05f,
    2.13022599e-06f, 5.47049183e-07f, 1.46985985e-06f, -2.78596453e-05f, 1.85369699e-05f,
    3.84292616e-06f, 1.70580756e-06f, -3.55833872e-05f, 5.96139434e-05f, 9.01960902e-06f,
    -5.00768283e-06f, -1.23820564e-05f, 0.000133807393f, 3.57629142e-06f, -2.43160957e-05f,
    8.40699577e-05f, 0.000227617376f, -3.47651148e-05f, -3.93258524e-05f, 0.00029321789f,
    0.000284744601f, -9.75706134e-05f, 2.20954576e-06f, 0.000608746486f, 0.000204667362f,
    -9.81879202e-05f, 0.000128971617f, 0.000934337266f, -0.00011474012f, 6.49311842e-05f,
    0.00023801389f, 0.00108442735f, -0.000693313195f, 0.000319749059f, 0.000129668566f,
    0.000865354261f, -0.00139507558f, 0.000379534438f, -0.000222373419f, 0.000211282415f,
    -0.00194180082f, 6.47674606e-05f, -0.000504758675f, -0.000719898904f, -0.00204490917f,
    -0.000377702061f, -0.000377702061f, -0.00158717297f, -0.00158717297f, -0.000504758675f,
    6.47674606e-05f, -0.00204490917f, -0.000719898904f, -0.000222373419f, 0.000379534438f,
    -0.00194180082f, 0.000211282415f, 0.000129668566f, 0.000319749059f, -0.00139507558f,
    0.000865354261f, 0.00023801389f, 6.49311842e-05f, -0.000693313195f, 0.00108442735f,
    0.000128971617f, -9.81879202e-05f, -0.00011474012f, 0.000934337266f, 2.20954576e-06f,
    -9.75706134e-05f, 0.000204667362f, 0.000608746486f, -3.93258524e-05f, -3.47651148e-05f,
    0.000284744601f, 0.00029321789f, -2.43160957e-05f, 3.57629142e-06f, 0.000227617376f,
    8.40699577e-05f, -5.00768283e-06f, 9.01960902e-06f, 0.000133807393f, -1.23820564e-05f,
    1.70580756e-06f, 3.84292616e-06f, 5.96139434e-05f, -3.55833872e-05f, 1.46985985e-06f,
    5.47049183e-07f, 1.85369699e-05f, -2.78596453e-05f, 4.05736898e-07f, -1.33280494e-07f,
    2.13022599e-06f, -1.48954396e-05f, -2.82267365e-07f, -7.76953257e-08f, -1.91656977e-06f,
    -8.9510313e-06f, -8.39004258e-07f, 1.75046239e-07f, -1.28677484e-05f, -1.57934719e-05f,
    -9.9905742e-07f, 1.73181877e-06f, -3.87286018e-05f, -1.70223702e-05f, 2.41189377e-06f,
    4.45181922e-06f, -8.18169938e-05f, 4.82745736e-06f, 1.24052913e-05f, 2.10684311e-06f,
    -0.000127647392f, 7.51380139e-05f, 1.99636179e-05f, -1.65092697e-05f, -0.000133814974f,
    0.000210796628f, -1.75489265e-06f, -4.53583052e-05f, -3.6210673e-05f, 0.00039089148f,
    -6.28172857e-05f, -3.81481659e-05f, 0.000214057131f, 0.000534415769f, -0.000101849611f,
    4.92767649e-05f, 0.000593893928f, 0.000517083332f, -2.31632839e-05f, 0.000159058211f,
    0.000975202245f, 0.000241576374f, 0.000150593507f, 0.000140743956f, 0.00116393331f,
    -0.000273479411f, 0.000233143204f, -5.02040057e-05f, 0.00101131015f, -0.000859492924f,
    9.57470402e-05f, -0.000231153812f, 0.000525886368f, -0.00126960198f, -0.000129357548f,
    -0.000200356735f, -0.00010735097f, -0.00132285757f, -0.000206006691f, -6.96468442e-06f,
    -0.000629646005f, -0.00101640425f, -9.60922262e-05f, 0.000128850064f, -0.000860392407f,
    -0.000518751855f, 3.71746173e-05f, 0.000106862484f, -0.000785579556f, -5.43133065e-05f,
    7.1393355e-05f, 1.74437009e-05f, -0.000529250246f, 0.000226527773f, 3.33140633e-05f,
    -3.08322706e-05f, -0.000250797224f, 0.00030200684f, -2.44259309e-06f, -2.57902266e-05f,
    -5.44342511e-05f, 0.00024367719f, -1.02616286e-05f, -7.28210216e-06f, 3.71297356e-05f,
    0.000143390935f, -4.85337796e-06f, 1.44244495e-06f, 5.44398245e-05f, 6.12668809e-05f,
    -5.18140496e-07f, 1.93102119e-06f, 3.94218914e-05f, 1.53486235e-05f, 4.69489237e-07f,
    7.17041985e-07f, 2.02665433e-05f, -2.06879872e-06f, 2.54532068e-07f, 1.44654265e-07f,
    7.68455448e-06f, -4.97411565e-06f, 1.33644789e-07f, -2.05822289e-07f, 5.08129597e-06f,
    -1.44261867e-06f, 5.82076609e-08f, -5.00585884e-07f, 8.38749111e-06f, -8.26036558e-06f,
    -7.50645995e-07f, -5.92321157e-07f, 7.05569983e-06f, -2.34409235e-05f, -2.42469832e-06f,
    1.09197572e-06f, -9.80077311e-06f, -4.64566983e-05f, -2.04797834e-06f, 6.08991832e-06f,
    -5.58537431e-05f, -6.52340241e-05f, 5.84824011e-06f, 9.92929563e-06f, -0.000135439448f,
    -5.13680279e-05f, 1.78990886e-05f, -2.87313014e-07f, -0.000225693453f, 3.12998891e-05f,
    1.15297735e-05f, -2.72630714e-05f, -0.000268467236f, 0.000199152157f, -3.0127354e-05f,
    -3.83346342e-05f, -0.000191499479f, 0.000415347517f, -7.05556013e-05f, 7.05895945e-06f,
    4.00226563e-05f, 0.000582303386f, -4.08724882e-05f, 8.08392651e-05f, 0.000374501105f,
    0.000585153233f, 5.42574562e-05f, 8.88956711e-05f, 0.000676576514f, 0.000370273367f,
    0.000109043904f, -0.0f, 0.000798612833f, -0.0f, 5.42574562e-05f, -8.88956711e-05f,
    0.000676576514f, -0.000370273367f, -4.08724882e-05f, -8.08392651e-05f, 0.000374501105f,
    -0.000585153233f, -7.05556013e-05f, -7.05895945e-06f, 4.00226563e-05f, -0.000582303386f,
    -3.0127354e-05f, 3.83346342e-05f, -0.000191499479f, -0.000415347517f, 1.15297735e-05f,
    2.72630714e-05f, -0.000268467236f, -0.000199152157f, 1.78990886e-05f, 2.87313014e-07f,
    -0.000225693453f, -3.12998891e-05f, 5.84824011e-06f, -9.92929563e-06f, -0.000135439448f,
    5.13680279e-05f, -2.04797834e-06f, -6.08991832e-06f, -5.58537431e-05f, 6.52340241e-05f,
    -2.42469832e-06f, -1.09197572e-06f, -9.80077311e-06f, 4.64566983e-05f, -7.50645995e-07f,
    5.92321157e-07f, 7.05569983e-06f, 2.34409235e-05f, 5.82076609e-08f, 5.00585884e-07f,
    8.38749111e-06f, 8.26036558e-06f, 1.33644789e-07f, 2.05822289e-07f, 5.08129597e-06f,
    1.44261867e-06f, 7.67616157e-08f, 1.9273044e-07f, 9.70745077e-07f, 2.72590478e-06f,
    2.33650084e-07f, 2.03648611e-07f, 4.94887126e-06f, 4.16428475e-06f, 3.72404912e-07f,
    -2.66113574e-07f, 1.32763262e-05f, 2.3056607e-06f, -2.02656111e-07f, -1.45625779e-06f,
    2.45311712e-05f, -9.09718801e-06f, -2.26582574e-06f, -2.09288964e-06f, 3.00875345e-05f,
    -3.65619599e-05f, -3.87770933e-06f, 4.80547953e-07f, 1.28241691e-05f, -7.88579273e-05f,
    6.20820344e-07f, 4.8251718e-06f, -4.50343214e-05f, -0.00011736236f, 1.1496656e-05f,
    9.47434785e-07f, -0.000143824363f, -0.000115499424f, 1.31240295e-05f, -1.66669488e-05f,
    -0.000249663222f, -3.73971816e-05f, -9.40145492e-06f, -2.85581609e-05f, -0.000299325911f,
    0.000119316712f, -3.63104446e-05f, -7.46586511e-06f, -0.000236233347f, 0.000302228553f,
    -2.68736367e-05f, 3.24962748e-05f, -5.74808546e-05f, 0.000422001933f, 1.69008981e-05f,
    4.0802377e-05f, 0.000168767278f, 0.000407440239f, 4.19808639e-05f, 3.9758047e-06f,
    0.000339045539f, 0.000257755339f, 2.0396199e-05f, -3.09545285e-05f, 0.000380750076f,
    4.66656638e-05f, -1.35458376e-05f, -2.68415024e-05f, 0.000296025042f, -0.000127285719f,
    -2.10654034e-05f, -2.50522271e-06f, 0.000150094769f, -0.000202982366f, -7.45942589e-06f,
    8.79930121e-06f, 2.00287595e-05f, -0.000183369615f, 2.97292536e-06f, 3.85089788e-06f,
    -5.11436447e-05f, -0.000114831797f, 3.08175322e-06f, -2.40215581e-06f, -6.48290297e-05f,
    -4.66929159e-05f, 1.22284177e-07f, -3.08207723e-06f, -4.71283092e-05f, -4.57811075e-06f,
    -8.86430257e-07f, -1.17302932e-06f, -2.37788408e-05f, 1.09134744e-05f, -4.51500767e-07f,
    7.51593348e-08f, -7.75743229e-06f, 1.10181281e-05f, -2.12142464e-08f, 3.09216887e-07f,
    -5.54786254e-07f, 6.4439746e-06f, 8.20023516e-08f, 1.9055966e-07f, 1.24108533e-06f,
    2.6139262e-06f, -1.64532139e-07f, -7.29741174e-08f, -1.38576615e-06f, 6.03895614e-07f,
    -2.14662904e-07f, -9.00672159e-09f, -1.93050255e-06f, 2.78810194e-06f, 1.51731996e-08f,
    2.09171318e-07f, -3.75727495e-07f, 7.06336641e-06f, 7.43088037e-07f, 3.80512915e-07f,
    6.58494127e-06f, 1.20529794e-05f, 1.47666697e-06f, 1.16204212e-07f, 2.1605354e-05f,
    1.22739521e-05f, 9.81975177e-07f, 5.75608761e-09f, 4.18902891e-05f, -1.60189927e-06f,
    -2.68143054e-07f, 2.12234818e-06f, 5.46816773e-05f, -3.6892623e-05f, 1.73237402e-06f,
    6.08251912e-06f, 3.96321411e-05f, -8.83275352e-05f, 8.39162476e-06f, 5.16718455e-06f,
    -1.76795074e-05f, -0.000131340013f, 1.06463604e-05f, -5.05377193e-06f, -0.000107616681f,
    -0.000130553817f, -6.34610331e-07f, -1.35795508e-05f, -0.000190845443f, -6.44782995e-05f,
    -1.48384288e-05f, -5.36165862e-06f, -0.000217796696f, 5.09477795e-05f, -1.18678763e-05f,
    1.18678763e-05f, -0.000163778474f, 0.000163778474f, 5.36165862e-06f, 1.48384288e-05f,
    -5.09477795e-05f, 0.000217796696f, 1.35795508e-05f, 6.34610331e-07f, 6.44782995e-05f,
    0.000190845443f, 5.05377193e-06f, -1.06463604e-05f, 0.000130553817f, 0.000107616681f,
    -5.16718455e-06f, -8.39162476e-06f, 0.000131340013f, 1.76795074e-05f, -6.08251912e-06f,
    -1.73237402e-06f, 8.83275352e-05f, -3.96321411e-05f, -2.12234818e-06f, 2.68143054e-07f,
    3.6892623e-05f, -5.46816773e-05f, -5.75608761e-09f, -9.81975177e-07f, 1.60189927e-06f,
    -4.18902891e-05f, -1.16204212e-07f, -1.47666697e-06f, -1.22739521e-05f, -2.1605354e-05f,
    -3.80512915e-07f, -7.43088037e-07f, -1.20529794e-05f, -6.58494127e-06f, -2.09171318e-07f,
    -1.51731996e-08f, -7.06336641e-06f, 3.75727495e-07f, 9.00672159e-09f, 2.14662904e-07f,
    -2.78810194e-06f, 1.93050255e-06f, 7.29741174e-08f, 1.64532139e-07f, -6.03895614e-07f,
    1.38576615e-06f, 1.58275952e-07f, -4.5528779e-08f, -3.53024348e-07f, -6.74169144e-07f,
    1.6278031e-07f, -9.15197091e-08f, -1.48473464e-06f, -8.3992802e-07f, -5.99128782e-08f,
    -7.97767825e-08f, -3.54044619e-06f, 2.15776808e-07f, -5.55873669e-07f, 8.7197968e-08f,
    -5.50615141e-06f, 4.10661596e-06f, -1.14560078e-06f, 2.69393382e-07f, -4.22531593e-06f,
    1.16663241e-05f, -1.81798271e-06f, 4.39647572e-08f, 4.89096828e-06f, 2.03458603e-05f,
    -3.04285413e-06f, -3.4286407e-07f, 2.406965e-05f, 2.24783889e-05f, -4.34736057e-06f,
    6.31131684e-07f, 4.7675243e-05f, 8.07192282e-06f, -3.1394477e-06f, 3.10244286e-06f,
    6.05747737e-05f, -2.67390187e-05f, 1.37159543e-06f, 3.20712229e-06f, 4.57567658e-05f,
    -7.11036773e-05f, 3.88549461e-06f, -1.59465139e-06f, -1.15667842e-06f, -0.000100680467f,
    -2.90163058e-07f, -5.6438339e-06f, -6.26499459e-05f, -9.26068533e-05f, -5.72222507e-06f,
    -2.37022323e-06f, -0.000106966028f, -4.43067802e-05f, -4.19596972e-06f, 3.78561685e-06f,
    -0.000109783134f, 2.11827319e-05f, 1.61987089e-06f, 3.87504861e-06f, -7.20097378e-05f,
    7.03739424e-05f, 3.2376422e-06f, -1.29791351e-06f, -1.79229719e-05f, 8.26328105e-05f,
    -2.61663704e-08f, -4.4136832e-06f, 2.39254914e-05f, 6.17401747e-05f, -2.62777075e-06f,
    -3.52032566e-06f, 3.94191993e-05f, 2.80037766e-05f, -2.39406427e-06f, -1.90918126e-06f,
    3.2914435e-05f, 1.12519092e-06f, -1.25442011e-06f, -1.31659567e-06f, 1.78451319e-05f,
    -1.09282582e-05f, -6.19572177e-07f, -1.00055195e-06f, 5.26158738e-06f, -1.12370863e-05f,
    -3.31403754e-07f, -4.54720293e-07f, -9.89621071e-07f, -6.79725281e-06f, -9.87755087e-08f,
    1.40458987e-08f, -2.35089624e-06f, -2.65605081e-06f, 5.03888522e-08f, 1.79817263e-07f,
    -1.64378469e-06f, -4.55947117e-07f, 7.97242876e-08f, 1.44111709e-07f, -7.26335486e-07f,
    2.27083675e-07f, -8.98799826e-08f, 1.28864187e-07f, 3.20185876e-07f, -1.92058863e-07f,
    -7.88828132e-08f, 1.66405826e-07f, 3.5013511e-07f, -7.45374223e-07f, 5.97985945e-08f,
    4.58683083e-08f, -2.76629237e-07f, -1.670448e-06f, 3.7517367e-07f, -3.30977684e-07f,
    -2.28441013e-06f, -2.32720186e-06f, 8.75696003e-07f, -9.09823143e-07f, -5.78865138e-06f,
    -1.05498464e-06f, 1.51147219e-06f, -1.57184854e-06f, -9.01547446e-06f, 4.16913963e-06f,
    1.92596394e-06f, -2.29512443e-06f, -7.8493913e-06f, 1.35417877e-05f, 1.45316085e-06f,
    -2.72776265e-06f, 1.97702457e-06f, 2.29169309e-05f, 2.60748664e-07f, -1.94799304e-06f,
    2.02334322e-05f, 2.41589914e-05f, 1.55547042e-08f, -6.45391438e-08f, 3.88693479e-05f,
    1.04491901e-05f, 1.37977111e-06f, 6.64983077e-07f, 4.50510452e-05f, -1.63676596e-05f,
    1.9470549e-06f, -9.36197125e-07f, 3.05435788e-05f, -4.35918337e-05f, -2.16840434e-19f,
    -2.21634696e-06f, -1.08420217e-19f, -5.51181729e-05f, -1.9470549e-06f, -9.36197125e-07f,
    -3.05435788e-05f, -4.35918337e-05f, -1.37977111e-06f, 6.64983077e-07f, -4.50510452e-05f,
    -1.63676596e-05f, -1.55547042e-08f, -6.45391438e-08f, -3.88693479e-05f, 1.04491901e-05f,
    -2.60748664e-07f, -1.94799304e-06f, -2.02334322e-05f, 2.41589914e-05f, -1.45316085e-06f,
    -2.72776265e-06f, -1.97702457e-06f, 2.29169309e-05f, -1.92596394e-06f, -2.29512443e-06f,
    7.8493913e-06f, 1.35417877e-05f, -1.51147219e-06f, -1.57184854e-06f, 9.01547446e-06f,
    4.16913963e-06f, -8.75696003e-07f, -9.09823143e-07f, 5.78865138e-06f, -1.05498464e-06f,
    -3.7517367e-07f, -3.30977684e-07f, 2.28441013e-06f, -2.32720186e-06f, -5.97985945e-08f,
    4.58683083e-08f, 2.76629237e-07f, -1.670448e-06f, 7.88828132e-08f, 1.66405826e-07f,
    -3.5013511e-07f, -7.45374223e-07f, 8.98799826e-08f, 1.28864187e-07f, -3.20185876e-07f,
    -1.92058863e-07f, -1.22681048e-08f, -1.52690916e-07f, 9.17519571e-08f, 1.50820242e-07f,
    -4.13929371e-08f, -1.78360693e-07f, 3.45174016e-07f, 1.44234761e-07f, -7.37058201e-08f,
    -1.11545688e-08f, 7.32946091e-07f, -1.91164546e-07f, -8.95278376e-08f, 4.82280427e-07f,
    8.93211677e-07f, -1.15214073e-06f, -7.43611395e-08f, 1.2912858e-06f, 2.48603094e-08f,
    -2.64539131e-06f, 5.46707923e-09f, 2.18284299e-06f, -2.65650738e-06f, -3.61916636e-06f,
    2.0706932e-07f, 2.725993e-06f, -6.78131755e-06f, -2.0852242e-06f, 4.06926546e-07f,
    2.52157042e-06f, -9.84068447e-06f, 3.47782702e-06f, 2.50454178e-07f, 1.73645367e-06f,
    -7.98745441e-06f, 1.18604494e-05f, -2.01664307e-07f, 1.17331808e-06f, 8.3947873e-07f,
    1.8241366e-05f, -2.00756219e-07f, 1.11373572e-06f, 1.37578818e-05f, 1.68371953e-05f,
    3.95840601e-07f, 7.53962638e-07f, 2.34137169e-05f, 5.89222145e-06f, 5.23717574e-07f,
    -2.16930914e-07f, 2.30988298e-05f, -9.56784879e-06f, -2.53230525e-07f, -8.13033637e-07f,
    1.23895679e-05f, -2.07224275e-05f, -9.29486134e-07f, -6.45573948e-07f, -2.1774033e-06f,
    -2.16339868e-05f, -9.72259386e-07f, -6.87062936e-07f, -1.23049922e-05f, -1.34921938e-05f,
    -1.05076037e-06f, -1.40495604e-06f, -1.40345874e-05f, -2.73862133e-06f, -1.49527898e-06f,
    -2.07076005e-06f, -9.41760936e-06f, 4.49921936e-06f, -1.78114806e-06f, -2.0739883e-06f,
    -3.32063951e-06f, 6.26959172e-06f, -1.53963731e-06f, -1.54736892e-06f, 6.80702726e-07f,
    4.43757153e-06f, -9.6565816e-07f, -8.60495675e-07f, 1.88815295e-06f, 1.85299518e-06f,
    -4.04329512e-07f, -2.77718016e-07f, 1.44628257e-06f, 1.83090449e-07f, -4.42304113e-08f,
    6.00053554e-08f, 6.53444886e-07f, -3.83097415e-07f, 9.68508331e-08f, 1.55389287e-07f,
    1.42085511e-07f, -3.46064269e-07f, 9.92939206e-08f, 1.16643641e-07f, -4.17675849e-08f,
    -1.71524448e-07f, 1.05574635e-07f, 1.06636612e-07f, -6.73737404e-08f, 3.2833519e-08f,
    1.42432583e-07f, 1.10932326e-07f, -5.62526381e-08f, 1.39484584e-07f, 6.25052081e-08f,
    -3.24654472e-08f, 1.09113763e-07f, 2.88890334e-07f, -2.43608497e-07f, -4.14599924e-07f,
    5.37405981e-07f, 2.93755647e-07f, -7.88200339e-07f, -1.00072623e-06f, 1.11921975e-06f,
    -1.99546378e-07f, -1.40770578e-06f, -1.57580041e-06f, 1.30215039e-06f, -1.44738453e-06f,
    -1.81519681e-06f, -1.85139311e-06f, 2.2044172e-07f, -3.07222354e-06f, -1.77718823e-06f,
    -1.72344642e-06f, -2.52289055e-06f, -3.75581635e-06f, -1.36911865e-06f, -1.38284861e-06f,
    -5.88684679e-06f, -1.90768969e-06f, -9.50573678e-07f, -9.9836609e-07f, -7.40747419e-06f,
    2.73487876e-06f, -6.76345849e-07f, -5.30349269e-07f, -4.90974298e-06f, 8.01612805e-06f,
    -3.62281298e-07f, -9.64953983e-08f, 1.22866936e-06f, 1.03653902e-05f, -4.69809969e-08f,
    -4.69809969e-08f, 7.64410561e-06f, 7.64410561e-06f, -9.64953983e-08f, -3.62281298e-07f,
    1.03653902e-05f, 1.22866936e-06f, -5.30349269e-07f, -6.76345849e-07f, 8.01612805e-06f,
    -4.90974298e-06f, -9.9836609e-07f, -9.50573678e-07f, 2.73487876e-06f, -7.40747419e-06f,
    -1.38284861e-06f, -1.36911865e-06f, -1.90768969e-06f, -5.88684679e-06f, -1.72344642e-06f,
    -1.77718823e-06f, -3.75581635e-06f, -2.52289055e-06f, -1.85139311e-06f, -1.81519681e-06f,
    -3.07222354e-06f, 2.2044172e-07f, -1.57580041e-06f, -1.40770578e-06f, -1.44738453e-06f,
    1.30215039e-06f, -1.00072623e-06f, -7.88200339e-07f, -1.99546378e-07f, 1.11921975e-06f,
    -4.14599924e-07f, -2.43608497e-07f, 2.93755647e-07f, 5.37405981e-07f, -3.24654472e-08f,
    6.25052081e-08f, 2.88890334e-07f, 1.09113763e-07f, 1.10932326e-07f, 1.42432583e-07f,
    1.39484584e-07f, -5.62526381e-08f, 1.06636612e-07f, 1.05574635e-07f, 3.2833519e-08f,
    -6.73737404e-08f, -1.46167892e-07f, -1.28076785e-08f, -4.82709295e-09f, -2.22076864e-08f,
    -1.78615224e-07f, 4.26092717e-09f, -4.51014941e-08f, -1.25955806e-08f, -2.82263972e-08f,
    5.73295544e-08f, -9.66388214e-08f, 6.50576766e-08f, 4.4478432e-07f, 1.42194679e-07f,
    -6.97547051e-08f, 2.44136658e-07f, 1.22052893e-06f, 2.27348309e-07f, 1.76881571e-07f,
    4.49176099e-07f, 2.03856553e-06f, 2.70097217e-07f, 7.06662036e-07f, 4.18769105e-07f,
    2.52202381e-06f, 2.49064129e-07f, 1.2699785e-06f, -1.85754701e-07f, 2.46092941e-06f,
    1.96816586e-07f, 1.25219572e-06f, -1.38838118e-06f, 1.97212762e-06f, 1.35709215e-07f,
    9.28453474e-08f, -2.54650695e-06f, 1.31716672e-06f, 4.87880563e-08f, -1.99565557e-06f,
    -2.56636736e-06f, 6.9649235e-07f, -2.77771157e-08f, -3.78543632e-06f, -8.197498e-07f,
    2.45804245e-07f, -3.40008377e-08f, -3.8111923e-06f, 1.99757346e-06f, 1.72235346e-08f,
    -4.15812877e-08f, -1.7060031e-06f, 4.11865585e-06f, -1.49767615e-07f, -1.9785206e-07f,
    1.2824222e-06f, 4.10741768e-06f, -4.72853088e-07f, -5.12135841e-07f, 3.25635847e-06f,
    2.09705718e-06f, -9.6587587e-07f, -8.96879158e-07f, 3.22583742e-06f, -4.03554253e-07f,
    -1.49046559e-06f, -1.29854379e-06f, 1.73500086e-06f, -1.86630393e-06f, -1.87931016e-06f,
    -1.60096954e-06f, 9.62976827e-08f, -1.86716989e-06f, -1.95945495e-06f, -1.60722516e-06f,
    -7.66661969e-07f, -1.02935883e-06f, -1.63247103e-06f, -1.25049587e-06f, -7.95799963e-07f,
    -2.03571048e-07f, -1.02380386e-06f, -7.02284751e-07f, -4.42689611e-07f, 1.92541307e-07f,
    -4.15056832e-07f, -2.13963176e-07f, -1.23306663e-07f, 2.21954721e-07f, -2.05790407e-08f,
    6.0497193e-08f, 2.23312426e-08f, 1.14336686e-07f, 1.23287109e-07f, 1.29312966e-07f,
    4.07979925e-08f, 2.29851516e-08f, 1.12412707e-07f, 9.42999137e-08f, 1.91164755e-08f,
    -1.22899353e-08f, 1.17595128e-07f, -8.29364168e-08f, -2.19577512e-09f, 5.40021583e-10f,
    1.32918871e-07f, -1.16067362e-07f, -1.06448459e-08f, -1.38576892e-08f, -9.49321066e-09f,
    -5.67378891e-08f, -4.70756802e-08f, -2.95548457e-08f, -4.11821333e-07f, 1.84353681e-07f,
    -1.18387106e-07f, -7.00687197e-09f, -1.0451422e-06f, 6.14526527e-07f, -1.82544809e-07f,
    1.03711436e-07f, -1.68975885e-06f, 1.09971302e-06f, -1.26565126e-07f, 3.10268803e-07f,
    -2.05173592e-06f, 1.42003103e-06f, 1.66546045e-07f, 4.75878039e-07f, -1.98222847e-06f,
    1.43134037e-06f, 6.3953388e-07f, 3.45281506e-07f, -1.56114743e-06f, 1.16981573e-06f,
    9.63994694e-07f, -2.38918574e-07f, -1.00663772e-06f, 7.85075883e-07f, 7.19096874e-07f,
    -1.05167999e-06f, -5.41563622e-07f, 4.2247126e-07f, -1.89427553e-07f, -1.51097311e-06f,
    -2.76270868e-07f, 1.62108378e-07f, -1.2702194e-06f, -1.11992938e-06f, -1.97503823e-07f,
    0.0f, -1.7551007e-06f, 0.0f, -2.76270868e-07f, -1.62108378e-07f, -1.2702194e-06f,
    1.11992938e-06f, -5.41563622e-07f, -4.2247126e-07f, -1.89427553e-07f, 1.51097311e-06f,
    -1.00663772e-06f, -7.85075883e-07f, 7.19096874e-07f, 1.05167999e-06f, -1.56114743e-06f,
    -1.16981573e-06f, 9.63994694e-07f, 2.38918574e-07f, -1.98222847e-06f, -1.43134037e-06f,
    6.3953388e-07f, -3.45281506e-07f, -2.05173592e-06f, -1.42003103e-06f, 1.66546045e-07f,
    -4.75878039e-07f, -1.68975885e-06f, -1.09971302e-06f, -1.26565126e-07f, -3.10268803e-07f,
    -1.0451422e-06f, -6.14526527e-07f, -1.82544809e-07f, -1.03711436e-07f, -4.11821333e-07f,
    -1.84353681e-07f, -1.18387106e-07f, 7.00687197e-09f, -9.49321066e-09f, 5.67378891e-08f,
    -4.70756802e-08f, 2.95548457e-08f, 1.32918871e-07f, 1.16067362e-07f, -1.06448459e-08f,
    1.38576892e-08f, 1.17595128e-07f, 8.29364168e-08f, -2.19577512e-09f, -5.40021583e-10f,
    -3.54169991e-08f, 1.37304724e-07f, 6.28489749e-09f, -1.04667253e-08f, -2.78983059e-08f,
    1.71296776e-07f, 1.33088092e-08f, -1.73873236e-08f, 3.63007793e-08f, 3.67341002e-08f,
    1.85548679e-08f, -3.44400348e-08f, 1.79610396e-07f, -3.99560406e-07f, 6.47569376e-09f,
    -6.1735868e-08f, 3.77200081e-07f, -1.12737848e-06f, -3.83652896e-08f, -7.91988413e-08f,
    5.54284441e-07f, -1.9047078e-06f, -1.13489733e-07f, -4.05683771e-08f, 6.29125452e-07f,
    -2.3806615e-06f, -1.51769569e-07f, 8.66863488e-08f, 5.72371448e-07f, -2.34550203e-06f,
    -5.98993068e-08f, 2.5374689e-07f, 4.2495364e-07f, -1.87592514e-06f, 1.90084819e-07f,
    3.15283671e-07f, 2.60784674e-07f, -1.23284758e-06f, 4.6023095e-07f, 1.33690193e-07f,
    1.29086104e-07f, -6.77023252e-07f, 5.13237694e-07f, -2.56826695e-07f, 3.01958778e-08f,
    -3.3097632e-07f, 2.2334585e-07f, -5.96566451e-07f, -7.80807525e-08f, -1.88503606e-07f,
    -2.52548887e-07f, -6.09706944e-07f, -2.55387334e-07f, -2.12683901e-07f, -5.79765526e-07f,
    -2.63906799e-07f, -5.70005398e-07f, -3.87450086e-07f, -5.44517775e-07f, 1.81309943e-07f,
    -1.05615754e-06f, -6.87352269e-07f, -2.30899175e-07f, 4.19965659e-07f, -1.62696699e-06f,
    -1.02599176e-06f, 8.85289566e-08f, 3.57349478e-07f, -2.06324808e-06f, -1.25379268e-06f,
    2.21781349e-07f, 1.37070927e-07f, -2.12824079e-06f, -1.23852305e-06f, 1.68613809e-07f,
    -4.60207907e-08f, -1.73877004e-06f, -9.54893494e-07f, 5.15631875e-08f, -1.08935538e-07f,
    -1.06389768e-06f, -5.30456248e-07f, -2.88736821e-08f, -8.3130395e-08f, -4.09535602e-07f,
    -1.55528156e-07f, -4.82328559e-08f, -3.90748447e-08f, 3.06405012e-10f, 5.16434575e-08f,
    -3.74730575e-08f, -1.123251e-08f, 1.40852194e-07f, 1.0139803e-07f, -2.17054428e-08f,
    -2.88394486e-09f, 1.22132704e-07f, 7.20454949e-08f, -1.18451862e-08f, -2.95699865e-09f,
    -6.14120665e-08f, -1.25766405e-07f, 5.97749672e-09f, 1.37008183e-08f, -8.65844996e-08f,
    -1.48646336e-07f, 9.69903446e-09f, 1.94350349e-08f, -4.55659972e-08f, -8.89272211e-09f,
    1.60312421e-08f, 2.29275319e-08f, 1.29833609e-07f, 4.07852468e-07f, 2.54363322e-08f,
    1.91144096e-08f, 4.49073696e-07f, 1.0787752e-06f, 2.95966647e-08f, 2.50318122e-09f,
    8.13437396e-07f, 1.77892662e-06f, 9.28307564e-09f, -2.35874094e-08f, 1.05987704e-06f,
    2.18960645e-06f, -3.9194795e-08f, -3.00319947e-08f, 1.07366998e-06f, 2.13244311e-06f,
    -9.08609081e-08f, 1.36638914e-08f, 8.78339563e-07f, 1.6866635e-06f, -8.85738274e-08f,
    1.04606649e-07f, 5.86357885e-07f, 1.09994187e-06f, 4.57030147e-09f, 1.77078888e-07f,
    3.16745883e-07f, 5.93096331e-07f, 1.48115333e-07f, 1.45988452e-07f, 1.18413126e-07f,
    2.52796355e-07f, 2.28145623e-07f, 2.46966531e-10f, -4.42238246e-08f, 4.42238246e-08f,
    1.66952134e-07f, -1.66952134e-07f, -2.52796355e-07f, -1.18413126e-07f, -2.46966531e-10f,
    -2.28145623e-07f, -5.93096331e-07f, -3.16745883e-07f, -1.45988452e-07f, -1.48115333e-07f,
    -1.09994187e-06f, -5.86357885e-07f, -1.77078888e-07f, -4.57030147e-09f, -1.6866635e-06f,
    -8.78339563e-07f, -1.04606649e-07f, 8.85738274e-08f, -2.13244311e-06f, -1.07366998e-06f,
    -1.36638914e-08f, 9.08609081e-08f, -2.18960645e-06f, -1.05987704e-06f, 3.00319947e-08f,
    3.9194795e-08f, -1.77892662e-06f, -8.13437396e-07f, 2.35874094e-08f, -9.28307564e-09f,
    -1.0787752e-06f, -4.49073696e-07f, -2.50318122e-09f, -2.95966647e-08f, -4.07852468e-07f,
    -1.29833609e-07f, -1.91144096e-08f, -2.54363322e-08f, 8.89272211e-09f, 4.55659972e-08f,
    -2.29275319e-08f, -1.60312421e-08f, 1.48646336e-07f, 8.65844996e-08f, -1.94350349e-08f,
    -9.69903446e-09f, 1.25766405e-07f, 6.14120665e-08f, -1.37008183e-08f, -5.97749672e-09f,
    1.27086579e-07f, 5.51113111e-08f, -1.35520617e-08f, -4.46145298e-09f, 1.61204682e-07f,
    5.79890163e-08f, -1.78038242e-08f, -5.01611019e-09f, 3.89966246e-08f, -1.60300662e-08f,
    -2.08108197e-08f, -5.44502932e-09f, -3.61500668e-07f, -2.11836991e-07f, -2.12619184e-08f,
    -3.48775586e-09f, -1.03342074e-06f, -5.10186339e-07f, -1.51049822e-08f, -2.77030421e-09f,
    -1.75741309e-06f, -8.03962735e-07f, -6.80946055e-09f, -1.09648663e-08f, -2.20553329e-06f,
    -9.60623538e-07f, -5.26240118e-09f, -2.49293794e-08f, -2.18063883e-06f, -9.15992644e-07f,
    -2.20054162e-08f, -3.63479984e-08f, -1.74712329e-06f, -7.1122156e-07f, -4.93092642e-08f,
    -2.51006913e-08f, -1.1541016e-06f, -4.57521423e-07f, -6.17269436e-08f, 1.64240515e-08f,
    -6.40726171e-07f, -2.49439324e-07f, -3.27601839e-08f, 6.24934131e-08f, -3.23566155e-07f,
    -1.25596415e-07f, 2.63626987e-08f, 7.19215194e-08f, -2.18397531e-07f, -9.04632174e-08f,
    7.37649302e-08f, 3.05544354e-08f, -3.17605895e-07f, -1.39985744e-07f, 6.94974389e-08f,
    -3.22149525e-08f, -6.29442013e-07f, -2.76681561e-07f, 2.10245688e-08f, -6.73544704e-08f,
    -1.13958947e-06f, -4.92556524e-07f, -3.20339808e-08f, -5.5261097e-08f, -1.73831233e-06f,
    -7.32493163e-07f, -5.26157855e-08f, -1.71180456e-08f, -2.18964919e-06f, -8.94239975e-07f,
    -4.12620942e-08f, 1.01417372e-08f, -2.23881102e-06f, -8.80284119e-07f, -2.13488143e-08f,
    1.39066536e-08f, -1.81116616e-06f, -6.74191199e-07f, -1.25683473e-08f, 2.93831559e-09f,
    -1.09149505e-06f, -3.69982587e-07f, -1.26397364e-08f, -8.72193429e-09f, -4.05410958e-07f,
    -1.05828214e-07f, -1.75006623e-08f, -1.25682309e-08f, 1.62398095e-08f, 3.89097465e-08f,
    -1.85656894e-08f, -1.08652545e-08f, 1.54993344e-07f, 7.29844984e-08f, -1.61361307e-08f,
    -9.04227893e-09f, 1.28833364e-07f, 5.08942009e-08f, -1.27374786e-08f, -6.42803055e-09f,
    -1.31302599e-07f, 4.08329832e-08f, 1.21570798e-08f, -4.87342922e-09f, -1.58877583e-07f,
    5.90945604e-08f, 1.5890171e-08f, -5.83443382e-09f, -2.21130811e-08f, 3.19783595e-08f,
    1.9529045e-08f, -7.04179026e-09f, 4.03778046e-07f, -8.26110096e-08f, 2.02846877e-08f,
    -7.87543897e-09f, 1.10143071e-06f, -2.94114102e-07f, 2.07827995e-08f, -5.20615018e-09f,
    1.83685313e-06f, -5.36459709e-07f, 2.23269581e-08f, -3.94481736e-09f, 2.27974965e-06f,
    -7.01751731e-07f, 2.32585098e-08f, -3.43978357e-09f, 2.23560892e-06f, -7.14563214e-07f,
    2.15200497e-08f, -1.09682254e-08f, 1.77833795e-06f, -5.8654291e-07f, 1.18817312e-08f,
    -1.80233375e-08f, 1.16375179e-06f, -3.95086659e-07f, -6.19142027e-09f, -1.76044885e-08f,
    6.26382814e-07f, -2.232062e-07f, -1.98754417e-08f, -3.50591911e-09f, 2.54082266e-07f,
    -1.14608113e-07f, -1.72034103e-08f, 1.693091e-08f, -2.16840434e-19f, -7.92879931e-08f,
    1.08420217e-19f, 2.62285802e-08f, -2.54082266e-07f, -1.14608113e-07f, 1.72034103e-08f,
    1.693091e-08f, -6.26382814e-07f, -2.232062e-07f, 1.98754417e-08f, -3.50591911e-09f,
    -1.16375179e-06f, -3.95086659e-07f, 6.19142027e-09f, -1.76044885e-08f, -1.77833795e-06f,
    -5.8654291e-07f, -1.18817312e-08f, -1.80233375e-08f, -2.23560892e-06f, -7.14563214e-07f,
    -2.15200497e-08f, -1.09682254e-08f, -2.27974965e-06f, -7.01751731e-07f, -2.32585098e-08f,
    -3.43978357e-09f, -1.83685313e-06f, -5.36459709e-07f, -2.23269581e-08f, -3.94481736e-09f,
    -1.10143071e-06f, -2.94114102e-07f, -2.07827995e-08f, -5.20615018e-09f, -4.03778046e-07f,
    -8.26110096e-08f, -2.02846877e-08f, -7.87543897e-09f, 2.21130811e-08f, 3.19783595e-08f,
    -1.9529045e-08f, -7.04179026e-09f, 1.58877583e-07f, 5.90945604e-08f, -1.5890171e-08f,
    -5.83443382e-09f, 1.31302599e-07f, 4.08329832e-08f, -1.21570798e-08f, -4.87342922e-09f,
    7.19626101e-08f, -1.15736349e-07f, -6.58500543e-09f, 1.12401839e-08f, 8.33046485e-08f,
    -1.45668665e-07f, -9.30840116e-09f, 1.51290731e-08f, 1.17779764e-09f, -3.58834811e-08f,
    -1.08013811e-08f, 1.82657818e-08f, -2.4139112e-07f, 3.28166607e-07f, -1.19655832e-08f,
    1.941536e-08f, -6.28167356e-07f, 9.38618768e-07f, -1.30570399e-08f, 2.02600692e-08f,
    -1.02963827e-06f, 1.59632657e-06f, -1.12824798e-08f, 1.93883931e-08f, -1.26227144e-06f,
    2.00577142e-06f, -9.58282254e-09f, 1.76608328e-08f, -1.22667745e-06f, 1.98538237e-06f,
    -3.40055384e-09f, 1.34398714e-08f, -9.68835593e-07f, 1.59077194e-06f, -2.97797925e-10f,
    7.14141546e-09f, -6.33442028e-07f, 1.04844537e-06f, 3.56715185e-10f, -2.36071883e-12f,
    -3.52216148e-07f, 5.72556246e-07f, -3.22881499e-09f, -4.03548928e-09f, -1.92293882e-07f,
    2.53959598e-07f, -8.65773586e-09f, -1.13344278e-09f, -1.7254294e-07f, 7.14696284e-08f,
    -8.66693028e-09f, 3.58996011e-09f, -3.15548874e-07f, -4.36042562e-08f, -5.32047828e-09f,
    6.92340851e-09f, -6.53912821e-07f, -1.55803988e-07f, 5.70404723e-10f, 5.13663867e-09f,
    -1.18927392e-06f, -2.93451649e-07f, 2.53905008e-10f, -2.50566456e-10f, -1.80991594e-06f,
    -4.3977542e-07f, -5.2603184e-09f, -4.83916862e-09f, -2.2712693e-06f, -5.36485459e-07f,
    -1.19079786e-08f, -7.09886949e-09f, -2.31085528e-06f, -5.25733924e-07f, -1.92641743e-08f,
    -5.71201575e-09f, -1.85683746e-06f, -4.00709155e-07f, -2.16875815e-08f, -5.73174574e-09f,
    -1.10788505e-06f, -2.19522292e-07f, -2.35587532e-08f, -5.09331066e-09f, -4.02738152e-07f,
    -6.13595361e-08f, -2.21896777e-08f, -5.26778798e-09f, 2.62062834e-08f, 2.45406255e-08f,
    -2.05535873e-08f, -5.27812816e-09f, 1.61908588e-07f, 4.40980195e-08f, -1.72799037e-08f,
    -4.11583745e-09f, 1.32723201e-07f, 3.09527088e-08f, -1.26043123e-08f, -3.29170868e-09f,
    2.06090043e-08f, 1.33452687e-07f, -2.26112484e-09f, -1.29852262e-08f, 2.94345863e-08f,
    1.64611635e-07f, -3.31966588e-09f, -1.75333081e-08f, 1.61689702e-08f, 2.90761442e-08f,
    -3.3922245e-09f, -2.07749622e-08f, -4.08036662e-08f, -4.0112451e-07f, -4.18045731e-09f,
    -2.37632047e-08f, -1.45372084e-07f, -1.11264967e-06f, -4.2971191e-09f, -2.37613094e-08f,
    -2.66652961e-07f, -1.87060039e-06f, -3.89994925e-09f, -2.11593605e-08f, -3.50357766e-07f,
    -2.33211358e-06f, -3.84221321e-09f, -1.75748394e-08f, -3.58659776e-07f, -2.29434522e-06f,
    -2.58579114e-09f, -1.19347607e-08f, -2.93785433e-07f, -1.83146039e-06f, -5.00235853e-10f,
    -8.81453399e-09f, -1.99203996e-07f, -1.20510117e-06f, 7.66103347e-10f, -5.1450515e-09f,
    -1.19828997e-07f, -6.602138e-07f, 7.70124076e-10f, -4.21303614e-09f, -8.8590113e-08f,
    -3.0744971e-07f, -1.41758072e-09f, -3.70142117e-09f, -1.3513889e-07f, -1.3513889e-07f,
    -2.31589214e-09f, -2.31589214e-09f, -3.0744971e-07f, -8.8590113e-08f, -3.70142117e-09f,
    -1.41758072e-09f, -6.602138e-07f, -1.19828997e-07f, -4.21303614e-09f, 7.70124076e-10f,
    -1.20510117e-06f, -1.99203996e-07f, -5.1450515e-09f, 7.66103347e-10f, -1.83146039e-06f,
    -2.93785433e-07f, -8.81453399e-09f, -5.00235853e-10f, -2.29434522e-06f, -3.58659776e-07f,
    -1.19347607e-08f, -2.58579114e-09f, -2.33211358e-06f, -3.50357766e-07f, -1.75748394e-08f,
    -3.84221321e-09f, -1.87060039e-06f, -2.66652961e-07f, -2.11593605e-08f, -3.89994925e-09f,
    -1.11264967e-06f, -1.45372084e-07f, -2.37613094e-08f, -4.2971191e-09f, -4.0112451e-07f,
    -4.08036662e-08f, -2.37632047e-08f, -4.18045731e-09f, 2.90761442e-08f, 1.61689702e-08f,
    -2.07749622e-08f, -3.3922245e-09f, 1.64611635e-07f, 2.94345863e-08f, -1.75333081e-08f,
    -3.31966588e-09f, 1.33452687e-07f, 2.06090043e-08f, -1.29852262e-08f, -2.26112484e-09f,
    -1.0201768e-07f, -8.77339232e-08f, 1.00517363e-08f, 8.37557135e-09f, -1.27889905e-07f,
    -1.06506e-07f, 1.34259555e-08f, 1.09401297e-08f, -2.76809651e-08f, -1.68409056e-08f,
    1.60439093e-08f, 1.41942964e-08f, 2.97202973e-07f, 2.68971888e-07f, 1.86145694e-08f,
    1.36705056e-08f, 8.4020246e-07f, 7.37710764e-07f, 1.82336208e-08f, 1.4869201e-08f,
    1.42247325e-06f, 1.23420591e-06f, 1.64448739e-08f, 1.3757929e-08f, 1.78176356e-06f,
    1.53382655e-06f, 1.34625946e-08f, 1.14845173e-08f, 1.7584216e-06f, 1.50586663e-06f,
    1.00231006e-08f, 8.09609624e-09f, 1.40745999e-06f, 1.20101106e-06f, 7.70590702e-09f,
    6.38046416e-09f, 9.26167559e-07f, 7.88332841e-07f, 4.11878398e-09f, 4.81439066e-09f,
    4.98267127e-07f, 4.29821426e-07f, 2.74756484e-09f, 1.88091653e-09f, 1.95015602e-07f,
    1.93203547e-07f, 8.99153807e-10f, 7.60810803e-10f, -2.71127902e-08f, 6.54560637e-08f,
    -1.39507281e-10f, 3.36800365e-10f, -2.74512388e-07f, -1.28131961e-09f, -1.17377219e-09f,
    -9.78232703e-11f, -6.56257725e-07f, -4.83984195e-08f, -3.27283045e-09f, -6.12812801e-10f,
    -1.21233484e-06f, -9.74638539e-08f, -6.31670849e-09f, 4.91868379e-10f, -1.84446765e-06f,
    -1.45981446e-07f, -9.96056837e-09f, -9.3722996e-10f, -2.30820046e-06f, -1.78583335e-07f,
    -1.28122064e-08f, -1.3625977e-09f, -2.34447634e-06f, -1.75317865e-07f, -1.76402715e-08f,
    -1.39871148e-09f, -1.87855585e-06f, -1.33125056e-07f, -2.13566054e-08f, -1.89995708e-09f,
    -1.11575321e-06f, -7.24725595e-08f, -2.34072299e-08f, -2.37900433e-09f, -4.00346096e-07f,
    -1.99623962e-08f, -2.28289956e-08f, -3.49598128e-09f, 3.1481715e-08f, 7.66507924e-09f,
    -2.13816413e-08f, -1.30787459e-09f, 1.65742932e-07f, 1.51207011e-08f, -1.72294232e-08f,
    -1.75774417e-09f, 1.34174641e-07f, 1.01001421e-08f, -1.30300739e-08f, -1.1852278e-09f,
    1.34576112e-07f, -0.0f, -1.3038516e-08f, 0.0f, 1.65775418e-07f, -0.0f, -1.72294676e-08f,
    0.0f, 3.25962901e-08f, -0.0f, -2.18860805e-08f, 0.0f, -4.00468707e-07f, 0.0f,
    -2.14204192e-08f, 0.0f, -1.11665577e-06f, 0.0f, -2.32830644e-08f, 0.0f, -1.8812716e-06f,
    0.0f, -2.14204192e-08f, 0.0f, -2.34832987e-06f, 0.0f, -1.81607902e-08f, 0.0f,
    -2.31387094e-06f, 0.0f, -1.25728548e-08f, 0.0f, -1.85007229e-06f, 0.0f, -9.31322575e-09f,
    0.0f, -1.21910125e-06f, 0.0f, -6.98491931e-09f, 0.0f, -6.76140189e-07f, 0.0f,
    -2.79396772e-09f, 0.0f, -3.42261046e-07f, 0.0f, -2.32830644e-09f, 0.0f, -2.33761966e-07f,
    0.0f, -1.86264515e-09f, 0.0f, -3.42261046e-07f, 0.0f, -2.32830644e-09f, 0.0f,
    -6.76140189e-07f, 0.0f, -2.79396772e-09f, 0.0f, -1.21910125e-06f, 0.0f, -6.98491931e-09f,
    0.0f, -1.85007229e-06f, 0.0f, -9.31322575e-09f, 0.0f, -2.31387094e-06f, 0.0f,
    -1.25728548e-08f, 0.0f, -2.34832987e-06f, 0.0f, -1.81607902e-08f, 0.0f, -1.8812716e-06f,
    0.0f, -2.14204192e-08f, 0.0f, -1.11665577e-06f, 0.0f, -2.32830644e-08f, 0.0f,
    -4.00468707e-07f, 0.0f, -2.14204192e-08f, 0.0f, 3.25962901e-08f, -0.0f, -2.18860805e-08f,
    0.0f, 1.65775418e-07f, -0.0f, -1.72294676e-08f, 0.0f, 1.34576112e-07f, -0.0f,
    -1.3038516e-08f, 0.0f, -4.65661287e-10f, 0.0f, -4.57372516e-05f, 0.0f, 1.39698386e-09f,
    -0.0f, -8.4401574e-05f, 0.0f, -4.65661287e-10f, 0.0f, -0.000141768251f, 0.0f,
    -9.31322575e-10f, 0.0f, -0.000215144828f, 0.0f, -4.65661287e-10f, 0.0f, -0.000291494653f,
    0.0f, -4.65661287e-10f, 0.0f, -0.000345223583f, 0.0f, 0.0f, -0.0f, -0.000341984909f, 0.0f,
    0.0f, -0.0f, -0.000250560697f, 0.0f, 1.86264515e-09f, -0.0f, -6.01783395e-05f, 0.0f,
    -4.65661287e-10f, 0.0f, 0.000204970594f, -0.0f, -9.31322575e-10f, 0.0f, 0.00048430264f,
    -0.0f, 4.65661287e-10f, -0.0f, 0.000698087271f, -0.0f, 9.31322575e-10f, -0.0f,
    0.00077826716f, -0.0f, 4.65661287e-10f, -0.0f, 0.000698087271f, -0.0f, -9.31322575e-10f,
    0.0f, 0.00048430264f, -0.0f, -4.65661287e-10f, 0.0f, 0.000204970594f, -0.0f,
    1.86264515e-09f, -0.0f, -6.01783395e-05f, 0.0f, 0.0f, -0.0f, -0.000250560697f, 0.0f, 0.0f,
    -0.0f, -0.000341984909f, 0.0f, -4.65661287e-10f, 0.0f, -0.000345223583f, 0.0f,
    -4.65661287e-10f, 0.0f, -0.000291494653f, 0.0f, -9.31322575e-10f, 0.0f, -0.000215144828f,
    0.0f, -4.65661287e-10f, 0.0f, -0.000141768251f, 0.0f, 1.39698386e-09f, -0.0f,
    -8.4401574e-05f, 0.0f, -4.65661287e-10f, 0.0f, -4.57372516e-05f, 0.0f, 2.90052844e-06f,
    7.00249529e-06f, -3.850952e-06f, -5.05434473e-05f, 5.95210759e-06f, 1.43696589e-05f,
    1.88371826e-06f, -9.6260148e-05f, 1.14721061e-05f, 2.76961127e-05f, 2.17763099e-05f,
    -0.000166977654f, 2.07731737e-05f, 5.01508766e-05f, 6.9449241e-05f, -0.0002620171f,
    3.53369796e-05f, 8.53110105e-05f, 0.000161848016f, -0.00036787882f, 5.64682196e-05f,
    0.000136326344f, 0.000313073979f, -0.000453283079f, 8.47690171e-05f, 0.000204650511f,
    0.000524026866f, -0.000470971456f, 0.000119543591f, 0.00028860374f, 0.000771509949f,
    -0.000370457623f, 0.000158370065f, 0.000382339145f, 0.00100384885f, -0.000120722805f,
    0.000197093948f, 0.000475826877f, 0.00114987313f, 0.000266039599f, 0.000230426071f,
    0.000556297775f, 0.00114243873f, 0.00072373345f, 0.000253073929f, 0.000610974501f,
    0.000948264787f, 0.00114583387f, 0.000261107576f, 0.000630369468f, 0.000588936149f,
    0.00142181758f, 0.000253073929f, 0.000610974501f, 0.000139702417f, 0.00148075132f,
    0.000230426071f, 0.000556297775f, -0.000296069367f, 0.00131958304f, 0.000197093948f,
    0.000475826877f, -0.000624964712f, 0.00100120157f, 0.000158370065f, 0.000382339145f,
    -0.00079519226f, 0.000624464417f, 0.000119543591f, 0.00028860374f, -0.000807492994f,
    0.000283586822f, 8.47690171e-05f, 0.000204650511f, -0.000703570084f, 3.75158561e-05f,
    5.64682196e-05f, 0.000136326344f, -0.000541896268f, -9.91427951e-05f, 3.53369796e-05f,
    8.53110105e-05f, -0.000374573428f, -0.000145685772f, 2.07731737e-05f, 5.01508766e-05f,
    -0.000234382096f, -0.00013616604f, 1.14721061e-05f, 2.76961127e-05f, -0.000133469206f,
    -0.000102672857f, 5.95210759e-06f, 1.43696589e-05f, -6.93981929e-05f, -6.67342101e-05f,
    2.90052844e-06f, 7.00249529e-06f, -3.30165822e-05f, -3.84626474e-05f, -2.02341325e-05f,
    2.02341325e-05f, 6.05518981e-05f, -1.83964694e-05f, -4.15177456e-05f, 4.15177456e-05f,
    0.000124697035f, -1.83057327e-05f, -8.0027341e-05f, 8.0027341e-05f, 0.000233573504f,
    3.61688467e-06f, -0.000144910184f, 0.000144910184f, 0.000396288757f, 7.63449352e-05f,
    -0.000246502255f, 0.000246502255f, 0.000604803674f, 0.000241648202f, -0.000393908558f,
    0.000393908558f, 0.00082042336f, 0.000544328475f, -0.000591326738f, 0.000591326738f,
    0.000967175409f, 0.00101076532f, -0.000833904953f, 0.000833904953f, 0.000942589715f,
    0.00162070943f, -0.00110474485f, 0.00110474485f, 0.000651240349f, 0.00228655594f,
    -0.00137487694f, 0.00137487694f, 5.30323414e-05f, 0.00285820174f, -0.00160739396f,
    0.00160739396f, -0.000796469802f, 0.00316340826f, -0.00176537689f, 0.00176537689f,
    -0.00174073759f, 0.00307361898f, -0.00182141666f, 0.00182141666f, -0.00256508915f,
    0.00256508915f, -0.00176537689f, 0.00176537689f, -0.00307361898f, 0.00174073759f,
    -0.00160739396f, 0.00160739396f, -0.00316340826f, 0.000796469802f, -0.00137487694f,
    0.00137487694f, -0.00285820174f, -5.30323414e-05f, -0.00110474485f, 0.00110474485f,
    -0.00228655594f, -0.000651240349f, -0.000833904953f, 0.000833904953f, -0.00162070943f,
    -0.000942589715f, -0.000591326738f, 0.000591326738f, -0.00101076532f, -0.000967175409f,
    -0.000393908558f, 0.000393908558f, -0.000544328475f, -0.00082042336f, -0.000246502255f,
    0.000246502255f, -0.000241648202f, -0.000604803674f, -0.000144910184f, 0.000144910184f,
    -7.63449352e-05f, -0.000396288757f, -8.0027341e-05f, 8.0027341e-05f, -3.61688467e-06f,
    -0.000233573504f, -4.15177456e-05f, 4.15177456e-05f, 1.83057327e-05f, -0.000124697035f,
    -2.02341325e-05f, 2.02341325e-05f, 1.83964694e-05f, -6.05518981e-05f, -5.40181063e-05f,
    -2.23750321e-05f, 4.86517383e-05f, 6.24191307e-05f, -0.000110836998f, -4.59101866e-05f,
    7.5813281e-05f, 0.000144640901f, -0.000213645457f, -8.84948458e-05f, 9.17038487e-05f,
    0.000300984248f, -0.000386860804f, -0.000160242998f, 5.69315198e-05f, 0.000563744921f,
    -0.000658074452f, -0.000272583362f, -9.78501339e-05f, 0.000949736219f, -0.00105159881f,
    -0.000435586466f, -0.000465722493f, 0.0014335016f, -0.00157863612f, -0.000653892523f,
    -0.00113496732f, 0.00192205352f, -0.00222623465f, -0.000922136533f, -0.00213872036f,
    0.00225076033f, -0.0029492816f, -0.00122163247f, -0.00340108038f, 0.00221913657f,
    -0.00367044099f, -0.00152034638f, -0.0047130771f, 0.00166763761f, -0.00429118006f,
    -0.00177746487f, -0.00576911494f, 0.0005675297f, -0.00471293833f, -0.00195216306f,
    -0.00626619812f, -0.000925578992f, -0.00486254459f, -0.00201413198f, -0.00602731202f,
    -0.00249659456f, -0.00471293833f, -0.00195216306f, -0.00508535421f, -0.00377638801f,
    -0.00429118006f, -0.00177746487f, -0.0036780762f, -0.00448068464f, -0.00367044099f,
    -0.00152034638f, -0.00215345086f, -0.0045118467f, -0.0029492816f, -0.00122163247f,
    -0.000835760555f, -0.00397409359f, -0.00222623465f, -0.000922136533f, 7.92242645e-05f,
    -0.00310383155f, -0.00157863612f, -0.000653892523f, 0.000556554005f, -0.00216164021f,
    -0.00105159881f, -0.000435586466f, 0.000684323197f, -0.00134295423f, -0.000658074452f,
    -0.000272583362f, 0.000602374435f, -0.000740755408f, -0.000386860804f, -0.000160242998f,
    0.000438884541f, -0.00035837121f, -0.000213645457f, -8.84948458e-05f, 0.0002776724f,
    -0.000147983577f, -0.000110836998f, -4.59101866e-05f, 0.000155884642f, -4.8668473e-05f,
    -5.40181063e-05f, -2.23750321e-05f, 7.85389639e-05f, -9.73501483e-06f, 7.19978005e-21f,
    -9.08233851e-05f, -3.96662836e-05f, 8.52524172e-05f, 7.62329653e-21f, -0.000186356701f,
    -0.000118237025f, 0.000159603835f, 1.52465931e-20f, -0.000359214697f, -0.000293139019f,
    0.000260303059f, 3.04931861e-20f, -0.000650452625f, -0.000629846647f, 0.000355716649f,
    3.38813179e-20f, -0.0011064579f, -0.0011938042f, 0.000365622371f, 6.77626358e-21f,
    -0.00176811474f, -0.00201143418f, 0.000152300097f, 1.21972744e-19f, -0.00265425351f,
    -0.00301803835f, -0.000457579474f, 2.71050543e-20f, -0.00374309765f, -0.00401943317f,
    -0.00160788989f, 2.16840434e-19f, -0.00495879864f, -0.00470513152f, -0.00331740291f,
    4.60785923e-19f, -0.00617132569f, -0.00473684445f, -0.0053989077f, 2.71050543e-20f,
    -0.00721500954f, -0.00389370439f, -0.00745362742f, 2.43945489e-19f, -0.00792413764f,
    -0.00220685964f, -0.00897568557f, 5.42101086e-20f, -0.00817567855f, 1.08420217e-19f,
    -0.00953867938f, 2.43945489e-19f, -0.00792413764f, 0.00220685964f, -0.00897568557f,
    2.71050543e-20f, -0.00721500954f, 0.00389370439f, -0.00745362742f, 4.60785923e-19f,
    -0.00617132569f, 0.00473684445f, -0.0053989077f, 2.16840434e-19f, -0.00495879864f,
    0.00470513152f, -0.00331740291f, 2.71050543e-20f, -0.00374309765f, 0.00401943317f,
    -0.00160788989f, 1.21972744e-19f, -0.00265425351f, 0.00301803835f, -0.000457579474f,
    6.77626358e-21f, -0.00176811474f, 0.00201143418f, 0.000152300097f, 3.38813179e-20f,
    -0.0011064579f, 0.0011938042f, 0.000365622371f, 3.04931861e-20f, -0.000650452625f,
    0.000629846647f, 0.000355716649f, 1.52465931e-20f, -0.000359214697f, 0.000293139019f,
    0.000260303059f, 7.62329653e-21f, -0.000186356701f, 0.000118237025f, 0.000159603835f,
    7.19978005e-21f, -9.08233851e-05f, 3.96662836e-05f, 8.52524172e-05f, 0.000110226516f,
    -4.5657318e-05f, -0.000103831517f, 1.13845181e-05f, 0.000226170348f, -9.36828292e-05f,
    -0.00022262914f, -2.55387222e-05f, 0.000435957336f, -0.000180579431f, -0.000423288555f,
    -0.000150177584f, 0.000789416255f, -0.000326986919f, -0.000707918836f, -0.000454622088f,
    0.00134284119f, -0.000556223036f, -0.00102240546f, -0.00106096431f, 0.00214585592f,
    -0.000888842565f, -0.00122195738f, -0.00208111876f, 0.00322130974f, -0.00133431016f,
    -0.00106552173f, -0.00354141416f, 0.00454277452f, -0.00188167882f, -0.00027123763f,
    -0.0052968855f, 0.00601819903f, -0.00249281968f, 0.00135908567f, -0.00698988233f,
    0.00748976972f, -0.00310236425f, 0.00378853176f, -0.00811076909f, 0.00875642709f,
    -0.00362703064f, 0.00665426953f, -0.00817406736f, 0.00961705297f, -0.00398351392f,
    0.00932163186f, -0.00694538094f, 0.00992233306f, -0.00410996471f, 0.0110959802f,
    -0.00459610531f, 0.00961705297f, -0.00398351392f, 0.0115025155f, -0.00168026355f,
    0.00875642709f, -0.00362703064f, 0.0104852179f, 0.00107465952f, 0.00748976972f,
    -0.00310236425f, 0.00841407664f, 0.00305628357f, 0.00601819903f, -0.00249281968f,
    0.00590361189f, 0.00398157444f, 0.00454277452f, -0.00188167882f, 0.00355366967f,
    0.00393725745f, 0.00322130974f, -0.00133431016f, 0.00175072032f, 0.0032575957f,
    0.00214585592f, -0.000888842565f, 0.000607518828f, 0.00233562756f, 0.00134284119f,
    -0.000556223036f, 2.72652233e-05f, 0.00147316488f, 0.000789416255f, -0.000326986919f,
    -0.000179107839f, 0.000822040543f, 0.000435957336f, -0.000180579431f, -0.000193118627f,
    0.000405501807f, 0.000226170348f, -9.36828292e-05f, -0.000139363969f, 0.000175481182f,
    0.000110226516f, -4.5657318e-05f, -8.14700397e-05f, 6.53698953e-05f, 9.82718266e-05f,
    9.82718266e-05f, -6.98996955e-05f, -8.25608367e-05f, 0.00020164132f, 0.00020164132f,
    -0.000103572616f, -0.000210400249f, 0.000388675398f, 0.000388675398f, -9.90100671e-05f,
    -0.000464409561f, 0.00070380047f, 0.00070380047f, 3.54864387e-05f, -0.00089755957f,
    0.00119720341f, 0.00119720341f, 0.00045579343f, -0.00152101484f, 0.00191312749f,
    0.00191312749f, 0.00135932991f, -0.00224370603f, 0.0028719434f, 0.0028719434f,
    0.00290655787f, -0.00282283779f, 0.00405008905f, 0.00405008905f, 0.00509522157f,
    -0.00287637301f, 0.0053654965f, 0.0053654965f, 0.00764451874f, -0.00199866784f,
    0.00667746784f, 0.00667746784f, 0.00997976772f, 3.56201599e-05f, 0.00780675048f,
    0.00780675048f, 0.0113827726f, 0.00307326228f, 0.00857403781f, 0.00857403781f,
    0.0112792989f, 0.00652428577f, 0.00884620752f, 0.00884620752f, 0.00952605624f,
    0.00952605624f, 0.00857403781f, 0.00857403781f, 0.00652428577f, 0.0112792989f,
    0.00780675048f, 0.00780675048f, 0.00307326228f, 0.0113827726f, 0.00667746784f,
    0.00667746784f, 3.56201599e-05f, 0.00997976772f, 0.0053654965f, 0.0053654965f,
    -0.00199866784f, 0.00764451874f, 0.00405008905f, 0.00405008905f, -0.00287637301f,
    0.00509522157f, 0.0028719434f, 0.0028719434f, -0.00282283779f, 0.00290655787f,
    0.00191312749f, 0.00191312749f, -0.00224370603f, 0.00135932991f, 0.00119720341f,
    0.00119720341f, -0.00152101484f, 0.00045579343f, 0.00070380047f, 0.00070380047f,
    -0.00089755957f, 3.54864387e-05f, 0.000388675398f, 0.000388675398f, -0.000464409561f,
    -9.90100671e-05f, 0.00020164132f, 0.00020164132f, -0.000210400249f, -0.000103572616f,
    9.82718266e-05f, 9.82718266e-05f, -8.25608367e-05f, -6.98996955e-05f, -5.6343757e-05f,
    0.000136025861f, 2.49685108e-05f, -0.00010157231f, -0.000115610135f, 0.000279107539f,
    0.00011124515f, -0.000199477785f, -0.000222844901f, 0.000537995191f, 0.000326887646f,
    -0.000331735617f, -0.000403520418f, 0.000974184484f, 0.000768835947f, -0.000442170043f,
    -0.000686410698f, 0.00165714207f, 0.00152871956f, -0.000389788707f, -0.00109688181f,
    0.00264810701f, 0.00262078014f, 6.26979599e-05f, -0.00164661428f, 0.0039752787f,
    0.00388970086f, 0.00119760178f, -0.00232209824f, 0.00560604129f, 0.00495612575f,
    0.00320817553f, -0.00307628023f, 0.00742679741f, 0.00527476287f, 0.00601878576f,
    -0.00382849271f, 0.00924279913f, 0.00433846517f, 0.00916343927f, -0.00447596144f,
    0.0108059272f, 0.00196226873f, 0.0118426131f, -0.0049158819f, 0.0118679879f,
    -0.00151313073f, 0.0131976232f, -0.00507192872f, 0.0122447191f, -0.00525820209f,
    0.0126944222f, -0.0049158819f, 0.0118679879f, -0.00826218352f, 0.0104020741f,
    -0.00447596144f, 0.0108059272f, -0.00976152625f, 0.00698645879f, -0.00382849271f,
    0.00924279913f, -0.00954728853f, 0.00341177173f, -0.00307628023f, 0.00742679741f,
    -0.00798574463f, 0.000526103657f, -0.00232209824f, 0.00560604129f, -0.00577303302f,
    -0.00123598764f, -0.00164661428f, 0.0039752787f, -0.00359726604f, -0.00190360146f,
    -0.00109688181f, 0.00264810701f, -0.00189750548f, -0.00180883717f, -0.000686410698f,
    0.00165714207f, -0.000805345713f, -0.00135659019f, -0.000403520418f, 0.000974184484f,
    -0.000230987673f, -0.000856310537f, -0.000222844901f, 0.000537995191f, 3.42801286e-06f,
    -0.000465716963f, -0.000115610135f, 0.000279107539f, 6.23898959e-05f, -0.000219714304f,
    -5.6343757e-05f, 0.000136025861f, 5.41670634e-05f, -8.94778714e-05f, -0.000144017613f, 0.0f,
    8.68163625e-05f, -3.77656688e-05f, -0.000295505073f, 0.0f, 0.000206348894f,
    -2.46941308e-05f, -0.000569601369f, 0.0f, 0.000419517572f, 7.34317437e-05f, -0.00103141647f,
    0.0f, 0.000727734645f, 0.000366697583f, -0.00175449764f, 0.0f, 0.0010540504f,
    0.00100430439f, -0.00280367932f, 0.0f, 0.00119455613f, 0.00211489922f, -0.00420882087f,
    0.0f, 0.000818182889f, 0.00369485654f, -0.00593538908f, 0.0f, -0.000434807211f,
    0.00548945228f, -0.00786311179f, 0.0f, -0.00275247637f, 0.00695933448f, -0.00978580117f,
    0.0f, -0.00593458768f, 0.00741855241f, -0.0114407623f, 0.0f, -0.00931253005f,
    0.00633828854f, -0.0125652179f, 0.0f, -0.0119240656f, 0.00367372436f, -0.012964082f, 0.0f,
    -0.0129095642f, 0.0f, -0.0125652179f, 0.0f, -0.0119240656f, -0.00367372436f, -0.0114407623f,
    0.0f, -0.00931253005f, -0.00633828854f, -0.00978580117f, 0.0f, -0.00593458768f,
    -0.00741855241f, -0.00786311179f, 0.0f, -0.00275247637f, -0.00695933448f, -0.00593538908f,
    0.0f, -0.000434807211f, -0.00548945228f, -0.00420882087f, 0.0f, 0.000818182889f,
    -0.00369485654f, -0.00280367932f, 0.0f, 0.00119455613f, -0.00211489922f, -0.00175449764f,
    0.0f, 0.0010540504f, -0.00100430439f, -0.00103141647f, 0.0f, 0.000727734645f,
    -0.000366697583f, -0.000569601369f, 0.0f, 0.000419517572f, -7.34317437e-05f,
    -0.000295505073f, 0.0f, 0.000206348894f, 2.46941308e-05f, -0.000144017613f, 0.0f,
    8.68163625e-05f, 3.77656688e-05f, -5.02622279e-05f, -0.00012134375f, 7.09266824e-05f,
    3.79743906e-05f, -0.000103131482f, -0.000248981436f, 0.000122613827f, 0.000128062806f,
    -0.000198790935f, -0.000479923794f, 0.000157728791f, 0.000328819355f, -0.000359964557f,
    -0.000869031297f, 9.08262155e-05f, 0.000694301329f, -0.000612320087f, -0.00147827144f,
    -0.000234349049f, 0.00123291812f, -0.000978484401f, -0.00236227037f, -0.00101850065f,
    0.0018362368f, -0.00146887929f, -0.00354618835f, -0.00241056737f, 0.00222411938f,
    -0.00207145163f, -0.00500092702f, -0.00435660128f, 0.00197422435f, -0.00274422741f,
    -0.00662515126f, -0.00647626119f, 0.000684563711f, -0.00341524649f, -0.00824513473f,
    -0.00808783993f, -0.00176801533f, -0.00399282807f, -0.00963953976f, -0.00844855886f,
    -0.00501873577f, -0.00438526319f, -0.0105869621f, -0.00713042449f, -0.00823251903f,
    -0.00452446705f, -0.0109230299f, -0.00431320956f, -0.0104130087f, -0.00438526319f,
    -0.0105869621f, -0.000779298716f, -0.0108632417f, -0.00399282807f, -0.00963953976f,
    0.0024252513f, -0.00952281523f, -0.00341524649f, -0.00824513473f, 0.00446879119f,
    -0.00696914224f, -0.00274422741f, -0.00662515126f, 0.00506346812f, -0.00409534853f,
    -0.00207145163f, -0.00500092702f, 0.00447656959f, -0.00168459478f, -0.00146887929f,
    -0.00354618835f, 0.00327721843f, -0.000131838635f, -0.000978484401f, -0.00236227037f,
    0.00201860419f, 0.000578226754f, -0.000612320087f, -0.00147827144f, 0.00103751465f,
    0.000706095016f, -0.000359964557f, -0.000869031297f, 0.000426721352f, 0.000555169012f,
    -0.000198790935f, -0.000479923794f, 0.00012097929f, 0.000344041473f, -0.000103131482f,
    -0.000248981436f, 3.8530161e-06f, 0.000177255148f, -5.02622279e-05f, -0.00012134375f,
    -2.33007922e-05f, 7.700469e-05f, 7.94947409e-05f, -7.94947409e-05f, 1.21776357e-05f,
    6.31975636e-05f, 0.000163113451f, -0.000163113451f, -2.12886025e-05f, 0.000140662873f,
    0.000314408651f, -0.000314408651f, -0.000138461037f, 0.000258740358f, 0.000569321448f,
    -0.000569321448f, -0.000418045791f, 0.000379954727f, 0.000968448003f, -0.000968448003f,
    -0.000936575467f, 0.000390928122f, 0.00154757535f, -0.00154757535f, -0.00169931247f,
    8.95135017e-05f, 0.00232318626f, -0.00232318626f, -0.00255132187f, -0.000763057731f,
    0.00327621703f, -0.00327621703f, -0.00313319825f, -0.00230495539f, 0.00434028264f,
    -0.00434028264f, -0.00296170218f, -0.004398969f, 0.00540156895f, -0.00540156895f,
    -0.00165859645f, -0.00654163724f, 0.00631507346f, -0.00631507346f, 0.00076954969f,
    -0.00797950942f, 0.006935752f, -0.006935752f, 0.00379204284f, -0.0080394363f,
    0.00715591758f, -0.00715591758f, 0.00650556386f, -0.00650556386f, 0.006935752f,
    -0.006935752f, 0.0080394363f, -0.00379204284f, 0.00631507346f, -0.00631507346f,
    0.00797950942f, -0.00076954969f, 0.00540156895f, -0.00540156895f, 0.00654163724f,
    0.00165859645f, 0.00434028264f, -0.00434028264f, 0.004398969f, 0.00296170218f,
    0.00327621703f, -0.00327621703f, 0.00230495539f, 0.00313319825f, 0.00232318626f,
    -0.00232318626f, 0.000763057731f, 0.00255132187f, 0.00154757535f, -0.00154757535f,
    -8.95135017e-05f, 0.00169931247f, 0.000968448003f, -0.000968448003f, -0.000390928122f,
    0.000936575467f, 0.000569321448f, -0.000569321448f, -0.000379954727f, 0.000418045791f,
    0.000314408651f, -0.000314408651f, -0.000258740358f, 0.000138461037f, 0.000163113451f,
    -0.000163113451f, -0.000140662873f, 2.12886025e-05f, 7.94947409e-05f, -7.94947409e-05f,
    -6.31975636e-05f, -1.21776357e-05f, 8.38389024e-05f, 3.47272107e-05f, -3.0876934e-05f,
    3.75156123e-05f, 0.000172028129f, 7.12563851e-05f, -9.36326323e-05f, 5.31293008e-05f,
    0.00033159231f, 0.000137350027f, -0.000220060378f, 3.3177228e-05f, 0.000600436702f,
    0.000248709024f, -0.000419155549f, -9.25518107e-05f, 0.00102137681f, 0.000423068122f,
    -0.00064419955f, -0.00042641224f, 0.00163215643f, 0.000676061318f, -0.000752021035f,
    -0.00105721247f, 0.00245015672f, 0.00101488817f, -0.000503280724f, -0.00196991488f,
    0.00345527404f, 0.00143122138f, 0.000351019786f, -0.0029525822f, 0.00457749469f,
    0.0018960603f, 0.00189916545f, -0.00358599704f, 0.00569678377f, 0.00235968526f,
    0.0039029771f, -0.00338754617f, 0.00666021463f, 0.00275875116f, 0.00577901537f,
    -0.00208159629f, 0.00731481519f, 0.00302989571f, 0.00681134826f, 0.000159805626f,
    0.00754701486f, 0.00312607596f, 0.00651584286f, 0.00269895047f, 0.00731481519f,
    0.00302989571f, 0.00492935022f, 0.00470335083f, 0.00666021463f, 0.00275875116f,
    0.00261446997f, 0.00555829192f, 0.00569678377f, 0.00235968526f, 0.000364464591f,
    0.00515517825f, 0.00457749469f, 0.0018960603f, -0.00119277008f, 0.00387859554f,
    0.00345527404f, 0.00143122138f, -0.00183958234f, 0.00233599939f, 0.00245015672f,
    0.00101488817f, -0.00174881343f, 0.00103706704f, 0.00163215643f, 0.000676061318f,
    -0.00127932138f, 0.000215802967f, 0.00102137681f, 0.000423068122f, -0.000757036905f,
    -0.000153998888f, 0.000600436702f, 0.000248709024f, -0.000361831742f, -0.000230943711f,
    0.00033159231f, 0.000137350027f, -0.000132146335f, -0.000179066032f, 0.000172028129f,
    7.12563851e-05f, -2.86401792e-05f, -0.000103776358f, 8.38389024e-05f, 3.47272107e-05f,
    4.69425322e-06f, -4.8360831e-05f, -4.23516474e-22f, 6.93195543e-05f, -3.46878551e-05f,
    3.80071668e-07f, -8.47032947e-22f, 0.000142236211f, -7.14780253e-05f, -2.86277027e-05f,
    -1.69406589e-21f, 0.000274168182f, -0.000114091134f, -0.000111354304f, -3.38813179e-21f,
    0.00049645442f, -0.000121282792f, -0.000283068541f, -6.77626358e-21f, 0.000844497408f,
    -6.47984143e-06f, -0.000554953876f, -6.77626358e-21f, 0.00134950504f, 0.000347676425f,
    -0.000865999784f, -1.35525272e-20f, 0.00202584569f, 0.00102492678f, -0.00104539294f,
    -2.71050543e-20f, 0.00285690022f, 0.00197273656f, -0.000837093161f, 0.0f, 0.00378477713f,
    0.00292679528f, -2.08526671e-05f, 1.8973538e-19f, 0.00471023098f, 0.00345374923f,
    0.00140844821f, 1.8973538e-19f, 0.00550681772f, 0.00314774457f, 0.00312439143f,
    -2.71050543e-20f, 0.00604805676f, 0.00189162139f, 0.00454257848f, -5.42101086e-20f,
    0.00624004472f, -1.08420217e-19f, 0.00509409839f, -2.71050543e-20f, 0.00604805676f,
    -0.00189162139f, 0.00454257848f, 1.8973538e-19f, 0.00550681772f, -0.00314774457f,
    0.00312439143f, 1.8973538e-19f, 0.00471023098f, -0.00345374923f, 0.00140844821f, 0.0f,
    0.00378477713f, -0.00292679528f, -2.08526671e-05f, -2.71050543e-20f, 0.00285690022f,
    -0.00197273656f, -0.000837093161f, -1.35525272e-20f, 0.00202584569f, -0.00102492678f,
    -0.00104539294f, -6.77626358e-21f, 0.00134950504f, -0.000347676425f, -0.000865999784f,
    -6.77626358e-21f, 0.000844497408f, 6.47984143e-06f, -0.000554953876f, -3.38813179e-21f,
    0.00049645442f, 0.000121282792f, -0.000283068541f, -1.69406589e-21f, 0.000274168182f,
    0.000114091134f, -0.000111354304f, -8.47032947e-22f, 0.000142236211f, 7.14780253e-05f,
    -2.86277027e-05f, -4.23516474e-22f, 6.93195543e-05f, 3.46878551e-05f, 3.80071668e-07f,
    -4.64198529e-05f, 1.9227733e-05f, -1.54178215e-05f, -1.76846006e-05f, -9.52475311e-05f,
    3.94528215e-05f, -1.53502515e-05f, -4.98269401e-05f, -0.000183596276f, 7.60480689e-05f,
    1.29171849e-05f, -0.000107302134f, -0.000332449737f, 0.000137705196f, 0.000107249565f,
    -0.000179383409f, -0.000565516122f, 0.00023424445f, 0.00030849484f, -0.00021679145f,
    -0.000903694192f, 0.000374322408f, 0.000622830063f, -0.000121670819f, -0.00135660439f,
    0.000561923953f, 0.000970893423f, 0.000224193194f, -0.00191311911f, 0.000792439911f,
    0.00116467325f, 0.000879849773f, -0.00253447006f, 0.00104981184f, 0.000962693011f,
    0.00174712762f, -0.00315419887f, 0.00130651193f, 0.00021162082f, 0.00253449939f,
    -0.00368763227f, 0.00152746728f, -0.00100062869f, 0.00285494281f, -0.00405007182f,
    0.00167759461f, -0.00230693142f, 0.00243894942f, -0.00417863624f, 0.00173084775f,
    -0.00321111479f, 0.00133008731f, -0.00405007182f, 0.00167759461f, -0.00335584441f,
    -9.33507472e-05f, -0.00368763227f, 0.00152746728f, -0.00272630085f, -0.00131119811f,
    -0.00315419887f, 0.00130651193f, -0.0016425231f, -0.00194180012f, -0.00253447006f,
    0.00104981184f, -0.000554679078f, -0.00191613263f, -0.00191311911f, 0.000792439911f,
    0.000201400631f, -0.00144569611f, -0.00135660439f, 0.000561923953f, 0.000527996803f,
    -0.000845053815f, -0.000903694192f, 0.000374322408f, 0.00052644161f, -0.0003543731f,
    -0.000565516122f, 0.00023424445f, 0.000371433503f, -6.48440764e-05f, -0.000332449737f,
    0.000137705196f, 0.000202680123f, 5.10063255e-05f, -0.000183596276f, 7.60480689e-05f,
    8.50078941e-05f, 6.67402346e-05f, -9.52475311e-05f, 3.94528215e-05f, 2.43787017e-05f,
    4.60872361e-05f, -4.64198529e-05f, 1.9227733e-05f, 1.60285481e-06f, 2.34069466e-05f,
    -2.44857438e-05f, -2.44857438e-05f, 2.13022599e-06f, -1.48954396e-05f, -5.02404982e-05f,
    -5.02404982e-05f, 1.85369699e-05f, -2.78596453e-05f, -9.68425229e-05f, -9.68425229e-05f,
    5.96139434e-05f, -3.55833872e-05f, -0.000175359426f, -0.000175359426f, 0.000133807393f,
    -1.23820564e-05f, -0.000298296189f, -0.000298296189f, 0.000227617376f, 8.40699577e-05f,
    -0.000476676913f, -0.000476676913f, 0.000284744601f, 0.00029321789f, -0.000715576694f,
    -0.000715576694f, 0.000204667362f, 0.000608746486f, -0.00100912503f, -0.00100912503f,
    -0.00011474012f, 0.000934337266f, -0.00133687304f, -0.00133687304f, -0.000693313195f,
    0.00108442735f, -0.00166376517f, -0.00166376517f, -0.00139507558f, 0.000865354261f,
    -0.00194513868f, -0.00194513868f, -0.00194180082f, 0.000211282415f, -0.00213631685f,
    -0.00213631685f, -0.00204490917f, -0.000719898904f, -0.00220413157f, -0.00220413157f,
    -0.00158717297f, -0.00158717297f, -0.00213631685f, -0.00213631685f, -0.000719898904f,
    -0.00204490917f, -0.00194513868f, -0.00194513868f, 0.000211282415f, -0.00194180082f,
    -0.00166376517f, -0.00166376517f, 0.000865354261f, -0.00139507558f, -0.00133687304f,
    -0.00133687304f, 0.00108442735f, -0.000693313195f, -0.00100912503f, -0.00100912503f,
    0.000934337266f, -0.00011474012f, -0.000715576694f, -0.000715576694f, 0.000608746486f,
    0.000204667362f, -0.000476676913f, -0.000476676913f, 0.00029321789f, 0.000284744601f,
    -0.000298296189f, -0.000298296189f, 8.40699577e-05f, 0.000227617376f, -0.000175359426f,
    -0.000175359426f, -1.23820564e-05f, 0.000133807393f, -9.68425229e-05f, -9.68425229e-05f,
    -3.55833872e-05f, 5.96139434e-05f, -5.02404982e-05f, -5.02404982e-05f, -2.78596453e-05f,
    1.85369699e-05f, -2.44857438e-05f, -2.44857438e-05f, -1.48954396e-05f, 2.13022599e-06f,
    8.69810538e-06f, -2.09990831e-05f, 7.68455448e-06f, -4.97411565e-06f, 1.78466762e-05f,
    -4.3085689e-05f, 2.02665433e-05f, -2.06879872e-06f, 3.44005493e-05f, -8.30502759e-05f,
    3.94218914e-05f, 1.53486235e-05f, 6.22918378e-05f, -0.000150385808f, 5.44398245e-05f,
    6.12668809e-05f, 0.000105961815f, -0.000255814462f, 3.71297356e-05f, 0.000143390935f,
    0.000169326449f, -0.000408790191f, -5.44342511e-05f, 0.00024367719f, 0.000254189596f,
    -0.000613668002f, -0.000250797224f, 0.00030200684f, 0.000358464662f, -0.000865410257f,
    -0.000529250246f, 0.000226527773f, 0.000474888831f, -0.001146483f, -0.000785579556f,
    -5.43133065e-05f, 0.000591008458f, -0.00142682064f, -0.000860392407f, -0.000518751855f,
    0.000690958754f, -0.00166812201f, -0.000629646005f, -0.00101640425f, 0.000758869806f,
    -0.00183207379f, -0.00010735097f, -0.00132285757f, 0.000782959221f, -0.00189023081f,
    0.000525886368f, -0.00126960198f, 0.000758869806f, -0.00183207379f, 0.00101131015f,
    -0.000859492924f, 0.000690958754f, -0.00166812201f, 0.00116393331f, -0.000273479411f,
    0.000591008458f, -0.00142682064f, 0.000975202245f, 0.000241576374f, 0.000474888831f,
    -0.001146483f, 0.000593893928f, 0.000517083332f, 0.000358464662f, -0.000865410257f,
    0.000214057131f, 0.000534415769f, 0.000254189596f, -0.000613668002f, -3.6210673e-05f,
    0.00039089148f, 0.000169326449f, -0.000408790191f, -0.000133814974f, 0.000210796628f,
    0.000105961815f, -0.000255814462f, -0.000127647392f, 7.51380139e-05f, 6.22918378e-05f,
    -0.000150385808f, -8.18169938e-05f, 4.82745736e-06f, 3.44005493e-05f, -8.30502759e-05f,
    -3.87286018e-05f, -1.70223702e-05f, 1.78466762e-05f, -4.3085689e-05f, -1.28677484e-05f,
    -1.57934719e-05f, 8.69810538e-06f, -2.09990831e-05f, -1.91656977e-06f, -8.9510313e-06f,
    1.42273493e-05f, -0.0f, 5.08129597e-06f, 1.44261867e-06f, 2.91918404e-05f, -0.0f,
    8.38749111e-06f, 8.26036558e-06f, 5.62672503e-05f, -0.0f, 7.05569983e-06f, 2.34409235e-05f,
    0.000101888552f, -0.0f, -9.80077311e-06f, 4.64566983e-05f, 0.000173318665f, -0.0f,
    -5.58537431e-05f, 6.52340241e-05f, 0.000276960898f, -0.0f, -0.000135439448f,
    5.13680279e-05f, 0.000415769406f, -0.0f, -0.000225693453f, -3.12998891e-05f,
    0.000586328097f, -0.0f, -0.000268467236f, -0.000199152157f, 0.00077676028f, -0.0f,
    -0.000191499479f, -0.000415347517f, 0.000966692809f, -0.0f, 4.00226563e-05f,
    -0.000582303386f, 0.00113017764f, -0.0f, 0.000374501105f, -0.000585153233f, 0.00124125788f,
    -0.0f, 0.000676576514f, -0.000370273367f, 0.00128066074f, -0.0f, 0.000798612833f, -0.0f,
    0.00124125788f, -0.0f, 0.000676576514f, 0.000370273367f, 0.00113017764f, -0.0f,
    0.000374501105f, 0.000585153233f, 0.000966692809f, -0.0f, 4.00226563e-05f, 0.000582303386f,
    0.00077676028f, -0.0f, -0.000191499479f, 0.000415347517f, 0.000586328097f, -0.0f,
    -0.000268467236f, 0.000199152157f, 0.000415769406f, -0.0f, -0.000225693453f,
    3.12998891e-05f, 0.000276960898f, -0.0f, -0.000135439448f, -5.13680279e-05f,
    0.000173318665f, -0.0f, -5.58537431e-05f, -6.52340241e-05f, 0.000101888552f, -0.0f,
    -9.80077311e-06f, -4.64566983e-05f, 5.62672503e-05f, -0.0f, 7.05569983e-06f,
    -2.34409235e-05f, 2.91918404e-05f, -0.0f, 8.38749111e-06f, -8.26036558e-06f,
    1.42273493e-05f, -0.0f, 5.08129597e-06f, -1.44261867e-06f, 3.25346673e-06f, 7.85456359e-06f,
    1.24108533e-06f, 2.6139262e-06f, 6.67582754e-06f, 1.61168737e-05f, -5.54786254e-07f,
    6.4439746e-06f, 1.28671481e-05f, 3.10640426e-05f, -7.75743229e-06f, 1.10181281e-05f,
    2.32998173e-05f, 5.62507375e-05f, -2.37788408e-05f, 1.09134744e-05f, 3.96350406e-05f,
    9.56874501e-05f, -4.71283092e-05f, -4.57811075e-06f, 6.33358213e-05f, 0.000152906199f,
    -6.48290297e-05f, -4.66929159e-05f, 9.5078758e-05f, 0.000229540427f, -5.11436447e-05f,
    -0.000114831797f, 0.000134082264f, 0.000323703192f, 2.00287595e-05f, -0.000183369615f,
    0.000177630762f, 0.000428838597f, 0.000150094769f, -0.000202982366f, 0.000221064693f,
    0.00053369737f, 0.000296025042f, -0.000127285719f, 0.000258450571f, 0.000623954926f,
    0.000380750076f, 4.66656638e-05f, 0.000283852598f, 0.000685280771f, 0.000339045539f,
    0.000257755339f, 0.000292863668f, 0.000707035419f, 0.000168767278f, 0.000407440239f,
    0.000283852598f, 0.000685280771f, -5.74808546e-05f, 0.000422001933f, 0.000258450571f,
    0.000623954926f, -0.000236233347f, 0.000302228553f, 0.000221064693f, 0.00053369737f,
    -0.000299325911f, 0.000119316712f, 0.000177630762f, 0.000428838597f, -0.000249663222f,
    -3.73971816e-05f, 0.000134082264f, 0.000323703192f, -0.000143824363f, -0.000115499424f,
    9.5078758e-05f, 0.000229540427f, -4.50343214e-05f, -0.00011736236f, 6.33358213e-05f,
    0.000152906199f, 1.28241691e-05f, -7.88579273e-05f, 3.96350406e-05f, 9.56874501e-05f,
    3.00875345e-05f, -3.65619599e-05f, 2.32998173e-05f, 5.62507375e-05f, 2.45311712e-05f,
    -9.09718801e-06f, 1.28671481e-05f, 3.10640426e-05f, 1.32763262e-05f, 2.3056607e-06f,
    6.67582754e-06f, 1.61168737e-05f, 4.94887126e-06f, 4.16428475e-06f, 3.25346673e-06f,
    7.85456359e-06f, 9.70745077e-07f, 2.72590478e-06f, -3.4325717e-06f, 3.4325717e-06f,
    -6.03895614e-07f, 1.38576615e-06f, -7.0434653e-06f, 7.0434653e-06f, -2.78810194e-06f,
    1.93050255e-06f, -1.35759574e-05f, 1.35759574e-05f, -7.06336641e-06f, 3.75727495e-07f,
    -2.4582574e-05f, 2.4582574e-05f, -1.20529794e-05f, -6.58494127e-06f, -4.18181589e-05f,
    4.18181589e-05f, -1.22739521e-05f, -2.1605354e-05f, -6.6824352e-05f, 6.6824352e-05f,
    1.60189927e-06f, -4.18902891e-05f, -0.00010031517f, 0.00010031517f, 3.6892623e-05f,
    -5.46816773e-05f, -0.000141466575f, 0.000141466575f, 8.83275352e-05f, -3.96321411e-05f,
    -0.00018741349f, 0.00018741349f, 0.000131340013f, 1.76795074e-05f, -0.000233239305f,
    0.000233239305f, 0.000130553817f, 0.000107616681f, -0.000272684323f, 0.000272684323f,
    6.44782995e-05f, 0.000190845443f, -0.000299485022f, 0.000299485022f, -5.09477795e-05f,
    0.000217796696f, -0.00030899304f, 0.00030899304f, -0.000163778474f, 0.000163778474f,
    -0.000299485022f, 0.000299485022f, -0.000217796696f, 5.09477795e-05f, -0.000272684323f,
    0.000272684323f, -0.000190845443f, -6.44782995e-05f, -0.000233239305f, 0.000233239305f,
    -0.000107616681f, -0.000130553817f, -0.00018741349f, 0.00018741349f, -1.76795074e-05f,
    -0.000131340013f, -0.000141466575f, 0.000141466575f, 3.96321411e-05f, -8.83275352e-05f,
    -0.00010031517f, 0.00010031517f, 5.46816773e-05f, -3.6892623e-05f, -6.6824352e-05f,
    6.6824352e-05f, 4.18902891e-05f, -1.60189927e-06f, -4.18181589e-05f, 4.18181589e-05f,
    2.1605354e-05f, 1.22739521e-05f, -2.4582574e-05f, 2.4582574e-05f, 6.58494127e-06f,
    1.20529794e-05f, -1.35759574e-05f, 1.35759574e-05f, -3.75727495e-07f, 7.06336641e-06f,
    -7.0434653e-06f, 7.0434653e-06f, -1.93050255e-06f, 2.78810194e-06f, -3.4325717e-06f,
    3.4325717e-06f, -1.38576615e-06f, 6.03895614e-07f, -2.44912962e-06f, -1.01446267e-06f,
    -7.26335486e-07f, 2.27083675e-07f, -5.02444527e-06f, -2.08119354e-06f, -1.64378469e-06f,
    -4.55947117e-07f, -9.68601671e-06f, -4.01207944e-06f, -2.35089624e-06f, -2.65605081e-06f,
    -1.75372716e-05f, -7.26417602e-06f, -9.89621071e-07f, -6.79725281e-06f, -2.98332434e-05f,
    -1.23573336e-05f, 5.26158738e-06f, -1.12370863e-05f, -4.76739006e-05f, -1.97471763e-05f,
    1.78451319e-05f, -1.09282582e-05f, -7.15663118e-05f, -2.96437374e-05f, 3.2914435e-05f,
    1.12519092e-06f, -0.000100923724f, -4.18039745e-05f, 3.94191993e-05f, 2.80037766e-05f,
    -0.000133702953f, -5.53815771e-05f, 2.39254914e-05f, 6.17401747e-05f, -0.000166395315f,
    -6.89231965e-05f, -1.79229719e-05f, 8.26328105e-05f, -0.000194536013f, -8.05794552e-05f,
    -7.20097378e-05f, 7.03739424e-05f, -0.000213655483f, -8.84989931e-05f, -0.000109783134f,
    2.11827319e-05f, -0.000220439179f, -9.13088952e-05f, -0.000106966028f, -4.43067802e-05f,
    -0.000213655483f, -8.84989931e-05f, -6.26499459e-05f, -9.26068533e-05f, -0.000194536013f,
    -8.05794552e-05f, -1.15667842e-06f, -0.000100680467f, -0.000166395315f, -6.89231965e-05f,
    4.57567658e-05f, -7.11036773e-05f, -0.000133702953f, -5.53815771e-05f, 6.05747737e-05f,
    -2.67390187e-05f, -0.000100923724f, -4.18039745e-05f, 4.7675243e-05f, 8.07192282e-06f,
    -7.15663118e-05f, -2.96437374e-05f, 2.406965e-05f, 2.24783889e-05f, -4.76739006e-05f,
    -1.97471763e-05f, 4.89096828e-06f, 2.03458603e-05f, -2.98332434e-05f, -1.23573336e-05f,
    -4.22531593e-06f, 1.16663241e-05f, -1.75372716e-05f, -7.26417602e-06f, -5.50615141e-06f,
    4.10661596e-06f, -9.68601671e-06f, -4.01207944e-06f, -3.54044619e-06f, 2.15776808e-07f,
    -5.02444527e-06f, -2.08119354e-06f, -1.48473464e-06f, -8.3992802e-07f, -2.44912962e-06f,
    -1.01446267e-06f, -3.53024348e-07f, -6.74169144e-07f, -4.23516474e-22f, -1.38574262e-06f,
    -3.20185876e-07f, -1.92058863e-07f, -8.47032947e-22f, -2.8409786e-06f, -3.5013511e-07f,
    -7.45374223e-07f, -1.69406589e-21f, -5.47858008e-06f, 2.76629237e-07f, -1.670448e-06f,
    -3.38813179e-21f, -9.91785691e-06f, 2.28441013e-06f, -2.32720186e-06f, -6.77626358e-21f,
    -1.68702081e-05f, 5.78865138e-06f, -1.05498464e-06f, -6.77626358e-21f, -2.69606062e-05f,
    9.01547446e-06f, 4.16913963e-06f, -1.35525272e-20f, -4.04719794e-05f, 7.8493913e-06f,
    1.35417877e-05f, -2.71050543e-20f, -5.70731572e-05f, -1.97702457e-06f, 2.29169309e-05f,
    0.0f, -7.56109948e-05f, -2.02334322e-05f, 2.41589914e-05f, -2.43945489e-19f,
    -9.40985774e-05f, -3.88693479e-05f, 1.04491901e-05f, -2.43945489e-19f, -0.000110012319f,
    -4.50510452e-05f, -1.63676596e-05f, -2.71050543e-20f, -0.000120824479f, -3.05435788e-05f,
    -4.35918337e-05f, -5.42101086e-20f, -0.000124660699f, -1.08420217e-19f, -5.51181729e-05f,
    -2.71050543e-20f, -0.000120824479f, 3.05435788e-05f, -4.35918337e-05f, -2.43945489e-19f,
    -0.000110012319f, 4.50510452e-05f, -1.63676596e-05f, -2.43945489e-19f, -9.40985774e-05f,
    3.88693479e-05f, 1.04491901e-05f, 0.0f, -7.56109948e-05f, 2.02334322e-05f, 2.41589914e-05f,
    -2.71050543e-20f, -5.70731572e-05f, 1.97702457e-06f, 2.29169309e-05f, -1.35525272e-20f,
    -4.04719794e-05f, -7.8493913e-06f, 1.35417877e-05f, -6.77626358e-21f, -2.69606062e-05f,
    -9.01547446e-06f, 4.16913963e-06f, -6.77626358e-21f, -1.68702081e-05f, -5.78865138e-06f,
    -1.05498464e-06f, -3.38813179e-21f, -9.91785691e-06f, -2.28441013e-06f, -2.32720186e-06f,
    -1.69406589e-21f, -5.47858008e-06f, -2.76629237e-07f, -1.670448e-06f, -8.47032947e-22f,
    -2.8409786e-06f, 3.5013511e-07f, -7.45374223e-07f, -4.23516474e-22f, -1.38574262e-06f,
    3.20185876e-07f, -1.92058863e-07f, 6.4106024e-07f, -2.65535846e-07f, -4.17675849e-08f,
    -1.71524448e-07f, 1.31300226e-06f, -5.43863337e-07f, 1.42085511e-07f, -3.46064269e-07f,
    2.53232179e-06f, -1.04892194e-06f, 6.53444886e-07f, -3.83097415e-07f, 4.5836814e-06f,
    -1.89862305e-06f, 1.44628257e-06f, 1.83090449e-07f, 7.79543916e-06f, -3.22897654e-06f,
    1.88815295e-06f, 1.85299518e-06f, 1.24590888e-05f, -5.1607235e-06f, 6.80702726e-07f,
    4.43757153e-06f, 1.87027908e-05f, -7.74694945e-06f, -3.32063951e-06f, 6.26959172e-06f,
    2.63739839e-05f, -1.0924462e-05f, -9.41760936e-06f, 4.49921936e-06f, 3.49415823e-05f,
    -1.44732767e-05f, -1.40345874e-05f, -2.73862133e-06f, 4.34849026e-05f, -1.80120369e-05f,
    -1.23049922e-05f, -1.34921938e-05f, 5.08386875e-05f, -2.10580747e-05f, -2.1774033e-06f,
    -2.16339868e-05f, 5.58354659e-05f, -2.31278082e-05f, 1.23895679e-05f, -2.07224275e-05f,
    5.76076782e-05f, -2.38618813e-05f, 2.30988298e-05f, -9.56784879e-06f, 5.58354659e-05f,
    -2.31278082e-05f, 2.34137169e-05f, 5.89222145e-06f, 5.08386875e-05f, -2.10580747e-05f,
    1.37578818e-05f, 1.68371953e-05f, 4.34849026e-05f, -1.80120369e-05f, 8.3947873e-07f,
    1.8241366e-05f, 3.49415823e-05f, -1.44732767e-05f, -7.98745441e-06f, 1.18604494e-05f,
    2.63739839e-05f, -1.0924462e-05f, -9.84068447e-06f, 3.47782702e-06f, 1.87027908e-05f,
    -7.74694945e-06f, -6.78131755e-06f, -2.0852242e-06f, 1.24590888e-05f, -5.1607235e-06f,
    -2.65650738e-06f, -3.61916636e-06f, 7.79543916e-06f, -3.22897654e-06f, 2.48603094e-08f,
    -2.64539131e-06f, 4.5836814e-06f, -1.89862305e-06f, 8.93211677e-07f, -1.15214073e-06f,
    2.53232179e-06f, -1.04892194e-06f, 7.32946091e-07f, -1.91164546e-07f, 1.31300226e-06f,
    -5.43863337e-07f, 3.45174016e-07f, 1.44234761e-07f, 6.4106024e-07f, -2.65535846e-07f,
    9.17519571e-08f, 1.50820242e-07f, 2.35265432e-07f, 2.35265432e-07f, 3.2833519e-08f,
    -6.73737404e-08f, 4.81964435e-07f, 4.81964435e-07f, 1.39484584e-07f, -5.62526381e-08f,
    9.2850695e-07f, 9.2850695e-07f, 2.88890334e-07f, 1.09113763e-07f, 1.68085217e-06f,
    1.68085217e-06f, 2.93755647e-07f, 5.37405981e-07f, 2.85851002e-06f, 2.85851002e-06f,
    -1.99546378e-07f, 1.11921975e-06f, 4.56846556e-06f, 4.56846556e-06f, -1.44738453e-06f,
    1.30215039e-06f, 6.85747182e-06f, 6.85747182e-06f, -3.07222354e-06f, 2.2044172e-07f,
    9.67047527e-06f, 9.67047527e-06f, -3.75581635e-06f, -2.52289055e-06f, 1.28123756e-05f,
    1.28123756e-05f, -1.90768969e-06f, -5.88684679e-06f, 1.59451574e-05f, 1.59451574e-05f,
    2.73487876e-06f, -7.40747419e-06f, 1.86417656e-05f, 1.86417656e-05f, 8.01612805e-06f,
    -4.90974298e-06f, 2.04742501e-05f, 2.04742501e-05f, 1.03653902e-05f, 1.22866936e-06f,
    2.11235547e-05f, 2.11235547e-05f, 7.64410561e-06f, 7.64410561e-06f, 2.04742501e-05f,
    2.04742501e-05f, 1.22866936e-06f, 1.03653902e-05f, 1.86417656e-05f, 1.86417656e-05f,
    -4.90974298e-06f, 8.01612805e-06f, 1.59451574e-05f, 1.59451574e-05f, -7.40747419e-06f,
    2.73487876e-06f, 1.28123756e-05f, 1.28123756e-05f, -5.88684679e-06f, -1.90768969e-06f,
    9.67047527e-06f, 9.67047527e-06f, -2.52289055e-06f, -3.75581635e-06f, 6.85747182e-06f,
    6.85747182e-06f, 2.2044172e-07f, -3.07222354e-06f, 4.56846556e-06f, 4.56846556e-06f,
    1.30215039e-06f, -1.44738453e-06f, 2.85851002e-06f, 2.85851002e-06f, 1.11921975e-06f,
    -1.99546378e-07f, 1.68085217e-06f, 1.68085217e-06f, 5.37405981e-07f, 2.93755647e-07f,
    9.2850695e-07f, 9.2850695e-07f, 1.09113763e-07f, 2.88890334e-07f, 4.81964435e-07f,
    4.81964435e-07f, -5.62526381e-08f, 1.39484584e-07f, 2.35265432e-07f, 2.35265432e-07f,
    -6.73737404e-08f, 3.2833519e-08f, -5.83255897e-08f, 1.40810428e-07f, 1.91164755e-08f,
    -1.22899353e-08f, -1.20080017e-07f, 2.89898821e-07f, 4.07979925e-08f, 2.29851516e-08f,
    -2.30496639e-07f, 5.56468081e-07f, 2.23312426e-08f, 1.14336686e-07f, -4.17470631e-07f,
    1.00786326e-06f, -1.23306663e-07f, 2.21954721e-07f, -7.10424615e-07f, 1.7151167e-06f,
    -4.42689611e-07f, 1.92541307e-07f, -1.1349897e-06f, 2.74010745e-06f, -7.95799963e-07f,
    -2.03571048e-07f, -1.70336955e-06f, 4.11229803e-06f, -7.66661969e-07f, -1.02935883e-06f,
    -2.40254462e-06f, 5.80025562e-06f, 9.62976827e-08f, -1.86716989e-06f, -3.18301045e-06f,
    7.68446716e-06f, 1.73500086e-06f, -1.86630393e-06f, -3.96139831e-06f, 9.56366148e-06f,
    3.22583742e-06f, -4.03554253e-07f, -4.63167089e-06f, 1.11818426e-05f, 3.25635847e-06f,
    2.09705718e-06f, -5.08695939e-06f, 1.22810061e-05f, 1.2824222e-06f, 4.10741768e-06f,
    -5.24821098e-06f, 1.26703026e-05f, -1.7060031e-06f, 4.11865585e-06f, -5.08695939e-06f,
    1.22810061e-05f, -3.8111923e-06f, 1.99757346e-06f, -4.63167089e-06f, 1.11818426e-05f,
    -3.78543632e-06f, -8.197498e-07f, -3.96139831e-06f, 9.56366148e-06f, -1.99565557e-06f,
    -2.56636736e-06f, -3.18301045e-06f, 7.68446716e-06f, 9.28453474e-08f, -2.54650695e-06f,
    -2.40254462e-06f, 5.80025562e-06f, 1.25219572e-06f, -1.38838118e-06f, -1.70336955e-06f,
    4.11229803e-06f, 1.2699785e-06f, -1.85754701e-07f, -1.1349897e-06f, 2.74010745e-06f,
    7.06662036e-07f, 4.18769105e-07f, -7.10424615e-07f, 1.7151167e-06f, 1.76881571e-07f,
    4.49176099e-07f, -4.17470631e-07f, 1.00786326e-06f, -6.97547051e-08f, 2.44136658e-07f,
    -2.30496639e-07f, 5.56468081e-07f, -9.66388214e-08f, 6.50576766e-08f, -1.20080017e-07f,
    2.89898821e-07f, -4.51014941e-08f, -1.25955806e-08f, -5.83255897e-08f, 1.40810428e-07f,
    -4.82709295e-09f, -2.22076864e-08f, -6.63700988e-08f, 0.0f, -2.19577512e-09f,
    -5.40021583e-10f, -1.3863162e-07f, 0.0f, -1.06448459e-08f, 1.38576892e-08f,
    -2.64643518e-07f, 0.0f, -4.70756802e-08f, 2.95548457e-08f, -4.79580081e-07f, 0.0f,
    -1.18387106e-07f, 7.00687197e-09f, -8.17280977e-07f, 0.0f, -1.82544809e-07f,
    -1.03711436e-07f, -1.30504407e-06f, 0.0f, -1.26565126e-07f, -3.10268803e-07f,
    -1.95839198e-06f, 0.0f, 1.66546045e-07f, -4.75878039e-07f, -2.76294668e-06f, 0.0f,
    6.3953388e-07f, -3.45281506e-07f, -3.65988876e-06f, 0.0f, 9.63994694e-07f, 2.38918574e-07f,
    -4.55464033e-06f, 0.0f, 7.19096874e-07f, 1.05167999e-06f, -5.32641616e-06f, 0.0f,
    -1.89427553e-07f, 1.51097311e-06f, -5.84959298e-06f, 0.0f, -1.2702194e-06f, 1.11992938e-06f,
    -6.03595572e-06f, 0.0f, -1.7551007e-06f, 0.0f, -5.84959298e-06f, 0.0f, -1.2702194e-06f,
    -1.11992938e-06f, -5.32641616e-06f, 0.0f, -1.89427553e-07f, -1.51097311e-06f,
    -4.55464033e-06f, 0.0f, 7.19096874e-07f, -1.05167999e-06f, -3.65988876e-06f, 0.0f,
    9.63994694e-07f, -2.38918574e-07f, -2.76294668e-06f, 0.0f, 6.3953388e-07f, 3.45281506e-07f,
    -1.95839198e-06f, 0.0f, 1.66546045e-07f, 4.75878039e-07f, -1.30504407e-06f, 0.0f,
    -1.26565126e-07f, 3.10268803e-07f, -8.17280977e-07f, 0.0f, -1.82544809e-07f,
    1.03711436e-07f, -4.79580081e-07f, 0.0f, -1.18387106e-07f, -7.00687197e-09f,
    -2.64643518e-07f, 0.0f, -4.70756802e-08f, -2.95548457e-08f, -1.3863162e-07f, 0.0f,
    -1.06448459e-08f, -1.38576892e-08f, -6.63700988e-08f, 0.0f, -2.19577512e-09f,
    5.40021583e-10f, -1.04617994e-08f, -2.52570178e-08f, -1.18451862e-08f, -2.95699865e-09f,
    -2.24035048e-08f, -5.4086847e-08f, -2.17054428e-08f, -2.88394486e-09f, -4.26927542e-08f,
    -1.03069425e-07f, -3.74730575e-08f, -1.123251e-08f, -7.73748994e-08f, -1.86799525e-07f,
    -4.82328559e-08f, -3.90748447e-08f, -1.31803233e-07f, -3.1820116e-07f, -2.88736821e-08f,
    -8.3130395e-08f, -2.10661497e-07f, -5.0858182e-07f, 5.15631875e-08f, -1.08935538e-07f,
    -3.16504355e-07f, -7.64109132e-07f, 1.68613809e-07f, -4.60207907e-08f, -4.4626708e-07f,
    -1.07738401e-06f, 2.21781349e-07f, 1.37070927e-07f, -5.91167009e-07f, -1.42720342e-06f,
    8.85289566e-08f, 3.57349478e-07f, -7.35287244e-07f, -1.7751405e-06f, -2.30899175e-07f,
    4.19965659e-07f, -8.60108514e-07f, -2.07648554e-06f, -5.44517775e-07f, 1.81309943e-07f,
    -9.44387466e-07f, -2.27995292e-06f, -5.79765526e-07f, -2.63906799e-07f, -9.75242301e-07f,
    -2.35444304e-06f, -2.52548887e-07f, -6.09706944e-07f, -9.44387466e-07f, -2.27995292e-06f,
    2.2334585e-07f, -5.96566451e-07f, -8.60108514e-07f, -2.07648554e-06f, 5.13237694e-07f,
    -2.56826695e-07f, -7.35287244e-07f, -1.7751405e-06f, 4.6023095e-07f, 1.33690193e-07f,
    -5.91167009e-07f, -1.42720342e-06f, 1.90084819e-07f, 3.15283671e-07f, -4.4626708e-07f,
    -1.07738401e-06f, -5.98993068e-08f, 2.5374689e-07f, -3.16504355e-07f, -7.64109132e-07f,
    -1.51769569e-07f, 8.66863488e-08f, -2.10661497e-07f, -5.0858182e-07f, -1.13489733e-07f,
    -4.05683771e-08f, -1.31803233e-07f, -3.1820116e-07f, -3.83652896e-08f, -7.91988413e-08f,
    -7.73748994e-08f, -1.86799525e-07f, 6.47569376e-09f, -6.1735868e-08f, -4.26927542e-08f,
    -1.03069425e-07f, 1.85548679e-08f, -3.44400348e-08f, -2.24035048e-08f, -5.4086847e-08f,
    1.33088092e-08f, -1.73873236e-08f, -1.04617994e-08f, -2.52570178e-08f, 6.28489749e-09f,
    -1.04667253e-08f, 7.56327001e-09f, -7.56327001e-09f, -1.37008183e-08f, -5.97749672e-09f,
    1.6582236e-08f, -1.6582236e-08f, -1.94350349e-08f, -9.69903446e-09f, 3.18521707e-08f,
    -3.18521707e-08f, -2.29275319e-08f, -1.60312421e-08f, 5.7975523e-08f, -5.7975523e-08f,
    -1.91144096e-08f, -2.54363322e-08f, 9.78975763e-08f, -9.78975763e-08f, -2.50318122e-09f,
    -2.95966647e-08f, 1.57329737e-07f, -1.57329737e-07f, 2.35874094e-08f, -9.28307564e-09f,
    2.37668957e-07f, -2.37668957e-07f, 3.00319947e-08f, 3.9194795e-08f, 3.33713871e-07f,
    -3.33713871e-07f, -1.36638914e-08f, 9.08609081e-08f, 4.42864433e-07f, -4.42864433e-07f,
    -1.04606649e-07f, 8.85738274e-08f, 5.49863842e-07f, -5.49863842e-07f, -1.77078888e-07f,
    -4.57030147e-09f, 6.42968416e-07f, -6.42968416e-07f, -1.45988452e-07f, -1.48115333e-07f,
    7.05678417e-07f, -7.05678417e-07f, -2.46966531e-10f, -2.28145623e-07f, 7.30431736e-07f,
    -7.30431736e-07f, 1.66952134e-07f, -1.66952134e-07f, 7.05678417e-07f, -7.05678417e-07f,
    2.28145623e-07f, 2.46966531e-10f, 6.42968416e-07f, -6.42968416e-07f, 1.48115333e-07f,
    1.45988452e-07f, 5.49863842e-07f, -5.49863842e-07f, 4.57030147e-09f, 1.77078888e-07f,
    4.42864433e-07f, -4.42864433e-07f, -8.85738274e-08f, 1.04606649e-07f, 3.33713871e-07f,
    -3.33713871e-07f, -9.08609081e-08f, 1.36638914e-08f, 2.37668957e-07f, -2.37668957e-07f,
    -3.9194795e-08f, -3.00319947e-08f, 1.57329737e-07f, -1.57329737e-07f, 9.28307564e-09f,
    -2.35874094e-08f, 9.78975763e-08f, -9.78975763e-08f, 2.95966647e-08f, 2.50318122e-09f,
    5.7975523e-08f, -5.7975523e-08f, 2.54363322e-08f, 1.91144096e-08f, 3.18521707e-08f,
    -3.18521707e-08f, 1.60312421e-08f, 2.29275319e-08f, 1.6582236e-08f, -1.6582236e-08f,
    9.69903446e-09f, 1.94350349e-08f, 7.56327001e-09f, -7.56327001e-09f, 5.97749672e-09f,
    1.37008183e-08f, 3.80676868e-09f, 1.57681512e-09f, -1.27374786e-08f, -6.42803055e-09f,
    8.23647195e-09f, 3.41165829e-09f, -1.61361307e-08f, -9.04227893e-09f, 1.56588733e-08f,
    6.48611742e-09f, -1.85656894e-08f, -1.08652545e-08f, 2.95560838e-08f, 1.22425314e-08f,
    -1.75006623e-08f, -1.25682309e-08f, 4.90986061e-08f, 2.03373087e-08f, -1.26397364e-08f,
    -8.72193429e-09f, 7.9603609e-08f, 3.2972892e-08f, -1.25683473e-08f, 2.93831559e-09f,
    1.21731929e-07f, 5.04230151e-08f, -2.13488143e-08f, 1.39066536e-08f, 1.68900556e-07f,
    6.99608975e-08f, -4.12620942e-08f, 1.01417372e-08f, 2.2565554e-07f, 9.34695876e-08f,
    -5.26157855e-08f, -1.71180456e-08f, 2.79451228e-07f, 1.15752485e-07f, -3.20339808e-08f,
    -5.5261097e-08f, 3.25896849e-07f, 1.34990898e-07f, 2.10245688e-08f, -6.73544704e-08f,
    3.57448272e-07f, 1.48059925e-07f, 6.94974389e-08f, -3.22149525e-08f, 3.71785603e-07f,
    1.53998641e-07f, 7.37649302e-08f, 3.05544354e-08f, 3.57448272e-07f, 1.48059925e-07f,
    2.63626987e-08f, 7.19215194e-08f, 3.25896849e-07f, 1.34990898e-07f, -3.27601839e-08f,
    6.24934131e-08f, 2.79451228e-07f, 1.15752485e-07f, -6.17269436e-08f, 1.64240515e-08f,
    2.2565554e-07f, 9.34695876e-08f, -4.93092642e-08f, -2.51006913e-08f, 1.68900556e-07f,
    6.99608975e-08f, -2.20054162e-08f, -3.63479984e-08f, 1.21731929e-07f, 5.04230151e-08f,
    -5.26240118e-09f, -2.49293794e-08f, 7.9603609e-08f, 3.2972892e-08f, -6.80946055e-09f,
    -1.09648663e-08f, 4.90986061e-08f, 2.03373087e-08f, -1.51049822e-08f, -2.77030421e-09f,
    2.95560838e-08f, 1.22425314e-08f, -2.12619184e-08f, -3.48775586e-09f, 1.56588733e-08f,
    6.48611742e-09f, -2.08108197e-08f, -5.44502932e-09f, 8.23647195e-09f, 3.41165829e-09f,
    -1.78038242e-08f, -5.01611019e-09f, 3.80676868e-09f, 1.57681512e-09f, -1.35520617e-08f,
    -4.46145298e-09f, -6.3527471e-21f, 1.76752724e-09f, -1.21570798e-08f, -4.87342922e-09f,
    -5.92923063e-21f, 3.32781691e-09f, -1.5890171e-08f, -5.83443382e-09f, -1.18584613e-20f,
    5.34000888e-09f, -1.9529045e-08f, -7.04179026e-09f, -2.37169225e-20f, 1.18186145e-08f,
    -2.02846877e-08f, -7.87543897e-09f, -2.03287907e-20f, 1.99975094e-08f, -2.07827995e-08f,
    -5.20615018e-09f, 6.77626358e-21f, 3.21384839e-08f, -2.23269581e-08f, -3.94481736e-09f,
    -9.48676901e-20f, 4.97009971e-08f, -2.32585098e-08f, -3.43978357e-09f, 2.71050543e-20f,
    6.75494505e-08f, -2.15200497e-08f, -1.09682254e-08f, -2.16840434e-19f, 9.1503459e-08f,
    -1.18817312e-08f, -1.80233375e-08f, -4.06575815e-19f, 1.13510445e-07f, 6.19142027e-09f,
    -1.76044885e-08f, 2.71050543e-20f, 1.31554387e-07f, 1.98754417e-08f, -3.50591911e-09f,
    -1.8973538e-19f, 1.44161476e-07f, 1.72034103e-08f, 1.693091e-08f, 5.42101086e-20f,
    1.50984008e-07f, 1.08420217e-19f, 2.62285802e-08f, -1.8973538e-19f, 1.44161476e-07f,
    -1.72034103e-08f, 1.693091e-08f, 2.71050543e-20f, 1.31554387e-07f, -1.98754417e-08f,
    -3.50591911e-09f, -4.06575815e-19f, 1.13510445e-07f, -6.19142027e-09f, -1.76044885e-08f,
    -2.16840434e-19f, 9.1503459e-08f, 1.18817312e-08f, -1.80233375e-08f, 2.71050543e-20f,
    6.75494505e-08f, 2.15200497e-08f, -1.09682254e-08f, -9.48676901e-20f, 4.97009971e-08f,
    2.32585098e-08f, -3.43978357e-09f, 6.77626358e-21f, 3.21384839e-08f, 2.23269581e-08f,
    -3.94481736e-09f, -2.03287907e-20f, 1.99975094e-08f, 2.07827995e-08f, -5.20615018e-09f,
    -2.37169225e-20f, 1.18186145e-08f, 2.02846877e-08f, -7.87543897e-09f, -1.18584613e-20f,
    5.34000888e-09f, 1.9529045e-08f, -7.04179026e-09f, -5.92923063e-21f, 3.32781691e-09f,
    1.5890171e-08f, -5.83443382e-09f, -6.3527471e-21f, 1.76752724e-09f, 1.21570798e-08f,
    -4.87342922e-09f, -1.01697906e-09f, 4.2124651e-10f, -1.26043123e-08f, -3.29170868e-09f,
    -1.15389631e-09f, 4.77959505e-10f, -1.72799037e-08f, -4.11583745e-09f, -1.0023341e-09f,
    4.1518039e-10f, -2.05535873e-08f, -5.27812816e-09f, -3.70725273e-09f, 1.53559443e-09f,
    -2.21896777e-08f, -5.26778798e-09f, -7.1549322e-09f, 2.96366998e-09f, -2.35587532e-08f,
    -5.09331066e-09f, -1.09151337e-08f, 4.52119631e-09f, -2.16875815e-08f, -5.73174574e-09f,
    -1.65229803e-08f, 6.84404267e-09f, -1.92641743e-08f, -5.71201575e-09f, -2.19719123e-08f,
    9.1010639e-09f, -1.19079786e-08f, -7.09886949e-09f, -3.01523322e-08f, 1.24895045e-08f,
    -5.2603184e-09f, -4.83916862e-09f, -3.79983902e-08f, 1.57394489e-08f, 2.53905008e-10f,
    -2.50566456e-10f, -4.38680132e-08f, 1.81707271e-08f, 5.70404723e-10f, 5.13663867e-09f,
    -4.81394196e-08f, 1.99399999e-08f, -5.32047828e-09f, 6.92340851e-09f, -5.06922966e-08f,
    2.09974367e-08f, -8.66693028e-09f, 3.58996011e-09f, -4.81394196e-08f, 1.99399999e-08f,
    -8.65773586e-09f, -1.13344278e-09f, -4.38680132e-08f, 1.81707271e-08f, -3.22881499e-09f,
    -4.03548928e-09f, -3.79983902e-08f, 1.57394489e-08f, 3.56715185e-10f, -2.36071883e-12f,
    -3.01523322e-08f, 1.24895045e-08f, -2.97797925e-10f, 7.14141546e-09f, -2.19719123e-08f,
    9.1010639e-09f, -3.40055384e-09f, 1.34398714e-08f, -1.65229803e-08f, 6.84404267e-09f,
    -9.58282254e-09f, 1.76608328e-08f, -1.09151337e-08f, 4.52119631e-09f, -1.12824798e-08f,
    1.93883931e-08f, -7.1549322e-09f, 2.96366998e-09f, -1.30570399e-08f, 2.02600692e-08f,
    -3.70725273e-09f, 1.53559443e-09f, -1.19655832e-08f, 1.941536e-08f, -1.0023341e-09f,
    4.1518039e-10f, -1.08013811e-08f, 1.82657818e-08f, -1.15389631e-09f, 4.77959505e-10f,
    -9.30840116e-09f, 1.51290731e-08f, -1.01697906e-09f, 4.2124651e-10f, -6.58500543e-09f,
    1.12401839e-08f, -7.77985676e-10f, -7.77985676e-10f, -1.29852262e-08f, -2.26112484e-09f,
    -2.17077634e-10f, -2.17077634e-10f, -1.75333081e-08f, -3.31966588e-09f, -2.53709748e-10f,
    -2.53709748e-10f, -2.07749622e-08f, -3.3922245e-09f, -1.0043435e-09f, -1.0043435e-09f,
    -2.37632047e-08f, -4.18045731e-09f, -1.99242334e-09f, -1.99242334e-09f, -2.37613094e-08f,
    -4.2971191e-09f, -3.19646376e-09f, -3.19646376e-09f, -2.11593605e-08f, -3.89994925e-09f,
    -4.44394876e-09f, -4.44394876e-09f, -1.75748394e-08f, -3.84221321e-09f, -5.75184211e-09f,
    -5.75184211e-09f, -1.19347607e-08f, -2.58579114e-09f, -7.7208977e-09f, -7.7208977e-09f,
    -8.81453399e-09f, -5.00235853e-10f, -9.87083926e-09f, -9.87083926e-09f, -5.1450515e-09f,
    7.66103347e-10f, -1.1726792e-08f, -1.1726792e-08f, -4.21303614e-09f, 7.70124076e-10f,
    -1.31686919e-08f, -1.31686919e-08f, -3.70142117e-09f, -1.41758072e-09f, -1.39031826e-08f,
    -1.39031826e-08f, -2.31589214e-09f, -2.31589214e-09f, -1.31686919e-08f, -1.31686919e-08f,
    -1.41758072e-09f, -3.70142117e-09f, -1.1726792e-08f, -1.1726792e-08f, 7.70124076e-10f,
    -4.21303614e-09f, -9.87083926e-09f, -9.87083926e-09f, 7.66103347e-10f, -5.1450515e-09f,
    -7.7208977e-09f, -7.7208977e-09f, -5.00235853e-10f, -8.81453399e-09f, -5.75184211e-09f,
    -5.75184211e-09f, -2.58579114e-09f, -1.19347607e-08f, -4.44394876e-09f, -4.44394876e-09f,
    -3.84221321e-09f, -1.75748394e-08f, -3.19646376e-09f, -3.19646376e-09f, -3.89994925e-09f,
    -2.11593605e-08f, -1.99242334e-09f, -1.99242334e-09f, -4.2971191e-09f, -2.37613094e-08f,
    -1.0043435e-09f, -1.0043435e-09f, -4.18045731e-09f, -2.37632047e-08f, -2.53709748e-10f,
    -2.53709748e-10f, -3.3922245e-09f, -2.07749622e-08f, -2.17077634e-10f, -2.17077634e-10f,
    -3.31966588e-09f, -1.75333081e-08f, -7.77985676e-10f, -7.77985676e-10f, -2.26112484e-09f,
    -1.29852262e-08f, 4.95542385e-10f, -1.19634525e-09f, -1.30300739e-08f, -1.1852278e-09f,
    -9.74531705e-11f, 2.35272773e-10f, -1.72294232e-08f, -1.75774417e-09f, 3.75851045e-10f,
    -9.07384667e-10f, -2.13816413e-08f, -1.30787459e-09f, 3.51810137e-10f, -8.49344761e-10f,
    -2.28289956e-08f, -3.49598128e-09f, 1.43732845e-10f, -3.47001788e-10f, -2.34072299e-08f,
    -2.37900433e-09f, 7.7014739e-10f, -1.85930027e-09f, -2.13566054e-08f, -1.89995708e-09f,
    1.00096287e-09f, -2.41653808e-09f, -1.76402715e-08f, -1.39871148e-09f, 1.15561971e-09f,
    -2.78991275e-09f, -1.28122064e-08f, -1.3625977e-09f, 1.36232436e-09f, -3.28894201e-09f,
    -9.96056837e-09f, -9.3722996e-10f, 1.52055457e-09f, -3.67094333e-09f, -6.31670849e-09f,
    4.91868379e-10f, 2.13269269e-09f, -5.14877563e-09f, -3.27283045e-09f, -6.12812801e-10f,
    2.68751377e-09f, -6.48823217e-09f, -1.17377219e-09f, -9.78232703e-11f, 2.89050295e-09f,
    -6.97829128e-09f, -1.39507281e-10f, 3.36800365e-10f, 2.68751377e-09f, -6.48823217e-09f,
    8.99153807e-10f, 7.60810803e-10f, 2.13269269e-09f, -5.14877563e-09f, 2.74756484e-09f,
    1.88091653e-09f, 1.52055457e-09f, -3.67094333e-09f, 4.11878398e-09f, 4.81439066e-09f,
    1.36232436e-09f, -3.28894201e-09f, 7.70590702e-09f, 6.38046416e-09f, 1.15561971e-09f,
    -2.78991275e-09f, 1.00231006e-08f, 8.09609624e-09f, 1.00096287e-09f, -2.41653808e-09f,
    1.34625946e-08f, 1.14845173e-08f, 7.7014739e-10f, -1.85930027e-09f, 1.64448739e-08f,
    1.3757929e-08f, 1.43732845e-10f, -3.47001788e-10f, 1.82336208e-08f, 1.4869201e-08f,
    3.51810137e-10f, -8.49344761e-10f, 1.86145694e-08f, 1.36705056e-08f, 3.75851045e-10f,
    -9.07384667e-10f, 1.60439093e-08f, 1.41942964e-08f, -9.74531705e-11f, 2.35272773e-10f,
    1.34259555e-08f, 1.09401297e-08f, 4.95542385e-10f, -1.19634525e-09f, 1.00517363e-08f,
    8.37557135e-09f, 1.39698386e-09f, -0.0f, -1.3038516e-08f, 0.0f, -4.65661287e-10f, 0.0f,
    -1.72294676e-08f, 0.0f, 1.39698386e-09f, -0.0f, -2.18860805e-08f, 0.0f, 9.31322575e-10f,
    -0.0f, -2.14204192e-08f, 0.0f, -4.65661287e-10f, 0.0f, -2.32830644e-08f, 0.0f,
    1.39698386e-09f, -0.0f, -2.14204192e-08f, 0.0f, 1.86264515e-09f, -0.0f, -1.81607902e-08f,
    0.0f, 1.86264515e-09f, -0.0f, -1.25728548e-08f, 0.0f, 1.86264515e-09f, -0.0f,
    -9.31322575e-09f, 0.0f, 1.39698386e-09f, -0.0f, -6.98491931e-09f, 0.0f, 2.79396772e-09f,
    -0.0f, -2.79396772e-09f, 0.0f, 4.19095159e-09f, -0.0f, -2.32830644e-09f, 0.0f,
    4.65661287e-09f, -0.0f, -1.86264515e-09f, 0.0f, 4.19095159e-09f, -0.0f, -2.32830644e-09f,
    0.0f, 2.79396772e-09f, -0.0f, -2.79396772e-09f, 0.0f, 1.39698386e-09f, -0.0f,
    -6.98491931e-09f, 0.0f, 1.86264515e-09f, -0.0f, -9.31322575e-09f, 0.0f, 1.86264515e-09f,
    -0.0f, -1.25728548e-08f, 0.0f, 1.86264515e-09f, -0.0f, -1.81607902e-08f, 0.0f,
    1.39698386e-09f, -0.0f, -2.14204192e-08f, 0.0f, -4.65661287e-10f, 0.0f, -2.32830644e-08f,
    0.0f, 9.31322575e-10f, -0.0f, -2.14204192e-08f, 0.0f, 1.39698386e-09f, -0.0f,
    -2.18860805e-08f, 0.0f, -4.65661287e-10f, 0.0f, -1.72294676e-08f, 0.0f, 1.39698386e-09f,
    -0.0f, -1.3038516e-08f, 0.0f, -4.5878347e-05f, 0.0f, -1.48126855e-06f, 0.0f,
    -0.000119621865f, 0.0f, -9.39005986e-06f, 0.0f, -0.00027658511f, 0.0f, -4.85279597e-05f,
    0.0f, -0.000563652255f, 0.0f, -0.000204098411f, 0.0f, -0.00100285094f, 0.0f,
    -0.000695610419f, 0.0f, -0.00153382029f, 0.0f, -0.00190476142f, 0.0f, -0.00195991294f, 0.0f,
    -0.00412174733f, 0.0f, -0.0019615381f, 0.0f, -0.00681439089f, 0.0f, -0.0012330371f, 0.0f,
    -0.00791908987f, 0.0f, 0.000285858288f, -0.0f, -0.00459796842f, 0.0f, 0.00223478023f, -0.0f,
    0.00385814393f, -0.0f, 0.00389874028f, -0.0f, 0.0135306949f, -0.0f, 0.00455503631f, -0.0f,
    0.0178564563f, -0.0f, 0.00389874028f, -0.0f, 0.0135306949f, -0.0f, 0.00223478023f, -0.0f,
    0.00385814393f, -0.0f, 0.000285858288f, -0.0f, -0.00459796842f, 0.0f, -0.0012330371f, 0.0f,
    -0.00791908987f, 0.0f, -0.0019615381f, 0.0f, -0.00681439089f, 0.0f, -0.00195991294f, 0.0f,
    -0.00412174733f, 0.0f, -0.00153382029f, 0.0f, -0.00190476142f, 0.0f, -0.00100285094f, 0.0f,
    -0.000695610419f, 0.0f, -0.000563652255f, 0.0f, -0.000204098411f, 0.0f, -0.00027658511f,
    0.0f, -4.85279597e-05f, 0.0f, -0.000119621865f, 0.0f, -9.39005986e-06f, 0.0f,
    -4.5878347e-05f, 0.0f, -1.48126855e-06f, 0.0f, -3.32783893e-05f, -3.08255985e-05f,
    -1.27309931e-06f, -6.39230507e-07f, -7.96240638e-05f, -8.84294277e-05f, -7.76179513e-06f,
    -4.56383123e-06f, -0.000164743949f, -0.000223109106f, -3.81791433e-05f, -2.64227656e-05f,
    -0.000288684707f, -0.000493259635f, -0.000150789725f, -0.000123748876f, -0.000410348875f,
    -0.00094951567f, -0.000473831926f, -0.000466773752f, -0.000420756143f, -0.00157410593f,
    -0.00116400409f, -0.00140696834f, -0.000153080517f, -0.00220281235f, -0.00215547904f,
    -0.00334173627f, 0.000533543061f, -0.00249564927f, -0.0027423678f, -0.00608580885f,
    0.00160932483f, -0.00204211264f, -0.0015818862f, -0.00798273366f, 0.00276652421f,
    -0.000616011734f, 0.00213386631f, -0.00611782027f, 0.00348332385f, 0.00155721197f,
    0.00696592219f, 0.00111429114f, 0.00329378434f, 0.00375846401f, 0.00939631555f,
    0.0108895237f, 0.00210814015f, 0.00508950092f, 0.00694520772f, 0.016767215f,
    0.000328578171f, 0.00498669269f, 0.00105585763f, 0.0143442536f, -0.00136196672f,
    0.0035641971f, -0.00413772836f, 0.00571357366f, -0.00239181425f, 0.00152064196f,
    -0.00583482347f, -0.00281708082f, -0.00258195633f, -0.000306027243f, -0.00452608289f,
    -0.00676320773f, -0.00214196253f, -0.0013874186f, -0.00236416981f, -0.00624246383f,
    -0.00144937914f, -0.00166586775f, -0.000838810462f, -0.00388711831f, -0.000815541425f,
    -0.00141058047f, -0.000171801614f, -0.00181795203f, -0.000381248508f, -0.000961569429f,
    4.99088173e-06f, -0.000665108673f, -0.000144656311f, -0.00055291818f, 1.91207655e-05f,
    -0.000194128093f, -4.1270403e-05f, -0.000274253514f, 8.3130144e-06f, -4.56804482e-05f,
    -6.22633206e-06f, -0.000118831762f, 2.26130169e-06f, -8.71553402e-06f, 1.73438502e-06f,
    -4.53283646e-05f, 4.48212916e-07f, -1.35222137e-06f, -3.79912149e-06f, -4.35823822e-05f,
    -7.65718482e-07f, -1.00870113e-06f, 1.02397007e-05f, -0.000116135147f, -3.9098145e-06f,
    -6.9015714e-06f, 7.47659433e-05f, -0.00026692712f, -1.454227e-05f, -3.79395824e-05f,
    0.000267206604f, -0.00052222755f, -3.39334292e-05f, -0.000166761602f, 0.000705585757f,
    -0.000847576477f, -1.07705537e-05f, -0.000581091095f, 0.00149430917f, -0.00107575336f,
    0.000294252968f, -0.00158102927f, 0.00259586866f, -0.000878176244f, 0.00144006603f,
    -0.00326141901f, 0.00368282758f, 0.00012314097f, 0.00400340883f, -0.0047646421f,
    0.00412193313f, 0.00207089703f, 0.00743812695f, -0.00388570339f, 0.0032384838f,
    0.00456495536f, 0.00900948048f, 0.0014025647f, 0.000805674121f, 0.00663360301f,
    0.00520773372f, 0.00972600933f, -0.00258432096f, 0.00717485836f, -0.00403210521f,
    0.0154055413f, -0.00566329621f, 0.00566329621f, -0.0131525705f, 0.0131525705f,
    -0.00717485836f, 0.00258432096f, -0.0154055413f, 0.00403210521f, -0.00663360301f,
    -0.000805674121f, -0.00972600933f, -0.00520773372f, -0.00456495536f, -0.0032384838f,
    -0.0014025647f, -0.00900948048f, -0.00207089703f, -0.00412193313f, 0.00388570339f,
    -0.00743812695f, -0.00012314097f, -0.00368282758f, 0.0047646421f, -0.00400340883f,
    0.000878176244f, -0.00259586866f, 0.00326141901f, -0.00144006603f, 0.00107575336f,
    -0.00149430917f, 0.00158102927f, -0.000294252968f, 0.000847576477f, -0.000705585757f,
    0.000581091095f, 1.07705537e-05f, 0.00052222755f, -0.000267206604f, 0.000166761602f,
    3.39334292e-05f, 0.00026692712f, -7.47659433e-05f, 3.79395824e-05f, 1.454227e-05f,
    0.000116135147f, -1.02397007e-05f, 6.9015714e-06f, 3.9098145e-06f, 4.35823822e-05f,
    3.79912149e-06f, 1.00870113e-06f, 7.65718482e-07f, 2.41438629e-05f, -3.30340663e-05f,
    -2.18963677e-07f, -1.01539717e-06f, 8.58393832e-05f, -7.07771615e-05f, -4.86505272e-08f,
    -6.40187181e-06f, 0.000246555399f, -0.000112399546f, 7.11630855e-06f, -3.16364167e-05f,
    0.000584390014f, -8.82698587e-05f, 6.16611869e-05f, -0.00012033141f, 0.00114317855f,
    0.000171863445f, 0.000315545476f, -0.000339412683f, 0.00180890015f, 0.000931387069f,
    0.00112724444f, -0.000646051602f, 0.00217703474f, 0.00240250886f, 0.00290696439f,
    -0.000539795496f, 0.00157730584f, 0.00445293635f, 0.00530164083f, 0.00113257405f,
    -0.000578734558f, 0.00634896103f, 0.00613095798f, 0.00521713495f, -0.0042088367f,
    0.00687743863f, 0.00214913441f, 0.0100390855f, -0.00818405394f, 0.00502060633f,
    -0.00706262374f, 0.0108527727f, -0.0106861275f, 0.000830130186f, -0.0159688201f,
    0.00411672797f, -0.0102846846f, -0.00426005572f, -0.0168886315f, -0.00699550007f,
    -0.00696924282f, -0.00814322382f, -0.00838069431f, -0.0142026274f, -0.00223689503f,
    -0.00933710486f, 0.0026800402f, -0.0126680983f, 0.00188698666f, -0.00783918053f,
    0.00861837342f, -0.00557903806f, 0.00408016657f, -0.00489862077f, 0.00802431349f,
    0.000646170462f, 0.00426402502f, -0.00203337776f, 0.00454967702f, 0.00294797542f,
    0.00323822629f, -0.000159434203f, 0.00167384127f, 0.00243722741f, 0.00193767564f,
    0.000620495412f, 0.000340254715f, 0.00125390966f, 0.000929875125f, 0.000686823507f,
    -1.68766746e-05f, 0.000463125354f, 0.000350809947f, 0.000475642359f, -4.14861133e-05f,
    0.000128688203f, 9.48625166e-05f, 0.000253819482f, -1.73383341e-05f, 2.7402315e-05f,
    1.06505995e-05f, 0.000110744622f, -4.56120824e-06f, 4.49240588e-06f, -6.28632233e-06f,
    4.04308994e-05f, -8.72824955e-07f, 5.63163553e-07f, 3.57432255e-05f, -8.93642573e-06f,
    1.50363761e-07f, -7.68875168e-07f, 0.000101892263f, 7.3745141e-06f, 2.15201248e-06f,
    -4.18822719e-06f, 0.000234223073f, 9.94896836e-05f, 1.66760201e-05f, -1.65143992e-05f,
    0.000418586103f, 0.000387491484f, 8.83462926e-05f, -4.10574903e-05f, 0.000512234052f,
    0.00103388808f, 0.000335689343f, -2.15301279e-05f, 0.000158197246f, 0.00210832804f,
    0.000907782931f, 0.000313867902f, -0.00115220086f, 0.00333225355f, 0.00162575534f,
    0.00155946042f, -0.00372124137f, 0.00388670643f, 0.00136429304f, 0.00411094259f,
    -0.00708779786f, 0.00262909383f, -0.0017040252f, 0.00670848507f, -0.00976307318f,
    -0.00111662096f, -0.00769089209f, 0.00579616474f, -0.00981911551f, -0.00663919281f,
    -0.0124213807f, -0.0013522394f, -0.00623877486f, -0.0117149446f, -0.00997228082f,
    -0.0115428977f, 6.50521303e-19f, -0.013785135f, 8.67361738e-19f, -0.0164883118f,
    0.00623877486f, -0.0117149446f, 0.00997228082f, -0.0115428977f, 0.00981911551f,
    -0.00663919281f, 0.0124213807f, -0.0013522394f, 0.00976307318f, -0.00111662096f,
    0.00769089209f, 0.00579616474f, 0.00708779786f, 0.00262909383f, 0.0017040252f,
    0.00670848507f, 0.00372124137f, 0.00388670643f, -0.00136429304f, 0.00411094259f,
    0.00115220086f, 0.00333225355f, -0.00162575534f, 0.00155946042f, -0.000158197246f,
    0.00210832804f, -0.000907782931f, 0.000313867902f, -0.000512234052f, 0.00103388808f,
    -0.000335689343f, -2.15301279e-05f, -0.000418586103f, 0.000387491484f, -8.83462926e-05f,
    -4.10574903e-05f, -0.000234223073f, 9.94896836e-05f, -1.66760201e-05f, -1.65143992e-05f,
    -0.000101892263f, 7.3745141e-06f, -2.15201248e-06f, -4.18822719e-06f, -3.57432255e-05f,
    -8.93642573e-06f, -1.50363761e-07f, -7.68875168e-07f, 2.89036561e-05f, 1.3049932e-05f,
    2.82782878e-07f, -4.60431664e-07f, 6.20694045e-05f, 6.43107269e-05f, 2.48466813e-06f,
    -1.89570767e-06f, 8.32893566e-05f, 0.000211052306f, 1.48254512e-05f, -3.56173314e-06f,
    -1.59650917e-05f, 0.000520120782f, 6.17818878e-05f, 1.33781996e-05f, -0.000473075052f,
    0.000972530106f, 0.000171897656f, 0.000139604104f, -0.00158765737f, 0.00128472701f,
    0.000252938364f, 0.000595760823f, -0.00342391524f, 0.000790332386f, -0.000179877126f,
    0.00155356759f, -0.00536388485f, -0.00132434093f, -0.00196915376f, 0.00243169558f,
    -0.00595977157f, -0.00528319599f, -0.00510099391f, 0.00133630924f, -0.00362145365f,
    -0.00991716702f, -0.00696663093f, -0.00339257228f, 0.00198374433f, -0.0127451876f,
    -0.00358606037f, -0.00964868441f, 0.00897098612f, -0.0114442008f, 0.00502221659f,
    -0.0113619501f, 0.013981604f, -0.00579136983f, 0.0122791007f, -0.00508617004f,
    0.0144357169f, 0.00174882682f, 0.0115853548f, 0.00448286813f, 0.0104149273f, 0.00760948937f,
    0.00428692298f, 0.00935837813f, 0.00445174146f, 0.00957325008f, -0.00252724136f,
    0.00732506299f, -0.000478411239f, 0.00794997904f, -0.0045518605f, 0.00266203377f,
    -0.00285638869f, 0.00472928956f, -0.00311187049f, -0.000327066431f, -0.00297992304f,
    0.00186222431f, -0.00122573052f, -0.000971345813f, -0.00203108252f, 0.000214204119f,
    -0.000242412076f, -0.000600120926f, -0.00102219719f, -0.000353168085f, 2.28349872e-05f,
    -0.000220265007f, -0.000379069941f, -0.000356491888f, 3.42265776e-05f, -5.31462065e-05f,
    -9.03420514e-05f, -0.000208130994f, 1.30017024e-05f, -7.96465156e-06f, -1.58485466e-06f,
    -8.936425e-05f, 3.09739357e-06f, -4.16457993e-07f, 1.12102762e-05f, -2.96656672e-05f,
    5.25532016e-07f, 1.25616666e-07f, 1.25127535e-05f, 2.27112887e-05f, 2.50306158e-07f,
    -2.26936393e-07f, 4.81432744e-06f, 7.38276867e-05f, 1.77309528e-06f, -4.78507786e-07f,
    -7.19246455e-05f, 0.000176664777f, 8.37799325e-06f, 2.41105454e-06f, -0.000335398276f,
    0.000293843943f, 2.41129492e-05f, 2.74531376e-05f, -0.000919187965f, 0.00022782982f,
    2.01999974e-05f, 0.000130044355f, -0.00177446299f, -0.000443172088f, -0.0001593872f,
    0.000361659331f, -0.00236706552f, -0.00217763637f, -0.000829404977f, 0.000521518057f,
    -0.00160750886f, -0.00490364479f, -0.00201659859f, -0.000159999399f, 0.00153431366f,
    -0.00741417659f, -0.00253340765f, -0.00248872163f, 0.00681889476f, -0.00755921612f,
    -0.000235665881f, -0.00542403664f, 0.012004301f, -0.00371305156f, 0.00498544844f,
    -0.00540965237f, 0.0138380518f, 0.00340917823f, 0.00886807777f, -0.00019418f, 0.0105090188f,
    0.0105090188f, 0.00668587442f, 0.00668587442f, 0.00340917823f, 0.0138380518f, -0.00019418f,
    0.00886807777f, -0.00371305156f, 0.012004301f, -0.00540965237f, 0.00498544844f,
    -0.00755921612f, 0.00681889476f, -0.00542403664f, -0.000235665881f, -0.00741417659f,
    0.00153431366f, -0.00248872163f, -0.00253340765f, -0.00490364479f, -0.00160750886f,
    -0.000159999399f, -0.00201659859f, -0.00217763637f, -0.00236706552f, 0.000521518057f,
    -0.000829404977f, -0.000443172088f, -0.00177446299f, 0.000361659331f, -0.0001593872f,
    0.00022782982f, -0.000919187965f, 0.000130044355f, 2.01999974e-05f, 0.000293843943f,
    -0.000335398276f, 2.74531376e-05f, 2.41129492e-05f, 0.000176664777f, -7.19246455e-05f,
    2.41105454e-06f, 8.37799325e-06f, 7.38276867e-05f, 4.81432744e-06f, -4.78507786e-07f,
    1.77309528e-06f, 2.27112887e-05f, 1.25127535e-05f, -2.26936393e-07f, 2.50306158e-07f,
    -2.27885243e-06f, 1.98969756e-05f, 1.58914261e-07f, -1.03823396e-07f, -3.31230294e-05f,
    4.71872045e-05f, 9.16043177e-07f, 2.82263084e-08f, -0.000135754206f, 6.52084418e-05f,
    3.01529053e-06f, 2.92483287e-06f, -0.000356859004f, -2.61095574e-05f, 1.49114908e-06f,
    1.84614164e-05f, -0.000637101475f, -0.000437589566f, -3.80962047e-05f, 5.90531126e-05f,
    -0.00063537003f, -0.00137785077f, -0.000203008545f, 7.62976488e-05f, 0.000307264883f,
    -0.00269191642f, -0.000521710899f, -0.000166934813f, 0.00273228413f, -0.00346038258f,
    -0.000601767504f, -0.000994431437f, 0.00617739791f, -0.00218188856f, 0.000454503024f,
    -0.00206643436f, 0.00866774935f, 0.00203116122f, 0.0028304474f, -0.00176793057f,
    0.00767578371f, 0.00798369385f, 0.00443195924f, 0.00120962271f, 0.00235144538f,
    0.0124010537f, 0.00246783206f, 0.00498070009f, -0.00504518114f, 0.012180144f,
    -0.0022671083f, 0.00547328359f, -0.0104315924f, 0.00710614584f, -0.00526690762f,
    0.00177686615f, -0.0110729225f, 0.000217725028f, -0.00398920104f, -0.00227853609f,
    -0.00756527204f, -0.00469277613f, -0.000751312764f, -0.0032515442f, -0.00282525201f,
    -0.00591090834f, 0.00113980751f, -0.0017825719f, 0.000514843385f, -0.00437887665f,
    0.0011286831f, -0.000277655345f, 0.00168620329f, -0.00212074141f, 0.000486946054f,
    0.000250864599f, 0.00142356206f, -0.000525013194f, 8.95981357e-05f, 0.000197499307f,
    0.000759921328f, 0.000141076234f, -1.4818771e-05f, 6.86949425e-05f, 0.000270799675f,
    0.00023387518f, -1.41085948e-05f, 1.19997912e-05f, 4.9883387e-05f, 0.000142102042f,
    -4.20030165e-06f, -6.39633058e-08f, -9.94487255e-06f, 5.67879106e-05f, -6.67699339e-07f,
    -6.27781333e-07f, -1.24578946e-05f, 1.56806782e-05f, -3.89551253e-08f, -1.85783591e-07f,
    -9.43920259e-06f, 1.10464662e-05f, 7.79422606e-08f, -6.07402058e-08f, -4.01891011e-05f,
    1.2611622e-05f, 3.48608751e-07f, 3.49520128e-08f, -0.000107464199f, -2.92789919e-05f,
    4.28898005e-07f, 1.44392061e-06f, -0.000178801653f, -0.000200025694f, -4.6911905e-06f,
    6.65353764e-06f, -8.73131576e-05f, -0.000580398191f, -3.25124784e-05f, 8.91296531e-06f,
    0.000493640429f, -0.00105567253f, -9.64631035e-05f, -4.32562956e-05f, 0.00180556532f,
    -0.00107948924f, -0.00010527706f, -0.00024907873f, 0.00345260603f, 0.000218425048f,
    0.000228727295f, -0.0005471154f, 0.00406390103f, 0.00322925299f, 0.00104889704f,
    -0.00039077815f, 0.00200745719f, 0.00682222284f, 0.00159795408f, 0.000841915258f,
    -0.00289006298f, 0.00841856562f, 0.000537229585f, 0.00245997845f, -0.00828257948f,
    0.00592182204f, -0.00192230672f, 0.00239995169f, -0.0106481221f, 0.0f, -0.00329053449f,
    0.0f, -0.00828257948f, -0.00592182204f, -0.00192230672f, -0.00239995169f, -0.00289006298f,
    -0.00841856562f, 0.000537229585f, -0.00245997845f, 0.00200745719f, -0.00682222284f,
    0.00159795408f, -0.000841915258f, 0.00406390103f, -0.00322925299f, 0.00104889704f,
    0.00039077815f, 0.00345260603f, -0.000218425048f, 0.000228727295f, 0.0005471154f,
    0.00180556532f, 0.00107948924f, -0.00010527706f, 0.00024907873f, 0.000493640429f,
    0.00105567253f, -9.64631035e-05f, 4.32562956e-05f, -8.73131576e-05f, 0.000580398191f,
    -3.25124784e-05f, -8.91296531e-06f, -0.000178801653f, 0.000200025694f, -4.6911905e-06f,
    -6.65353764e-06f, -0.000107464199f, 2.92789919e-05f, 4.28898005e-07f, -1.44392061e-06f,
    -4.01891011e-05f, -1.2611622e-05f, 3.48608751e-07f, -3.49520128e-08f, -9.43920259e-06f,
    -1.10464662e-05f, 7.79422606e-08f, 6.07402058e-08f, -9.42022143e-06f, 2.84563475e-06f,
    2.86004109e-08f, -5.43749117e-08f, -2.71818826e-05f, -9.35357457e-06f, 8.8669438e-08f,
    -8.8339398e-08f, -4.41385819e-05f, -6.30718787e-05f, -2.4020855e-07f, 1.48478065e-07f,
    3.34746619e-06f, -0.000187524201f, -3.3742383e-06f, 2.69538816e-07f, 0.000250308542f,
    -0.000329597708f, -1.3116367e-05f, -6.87406373e-06f, 0.000795338536f, -0.000231045327f,
    -1.60470936e-05f, -4.22969169e-05f, 0.0014093339f, 0.000535636093f, 5.49611832e-05f,
    -0.000104483377f, 0.00132003787f, 0.00212465553f, 0.00026619056f, -6.09524614e-05f,
    -0.000377241755f, 0.0037646282f, 0.000428439642f, 0.000313263503f, -0.00359033886f,
    0.00378574757f, 4.3085307e-05f, 0.000862468092f, -0.00648715533f, 0.000981764519f,
    -0.000938568439f, 0.000778457324f, -0.00655589672f, -0.00369668589f, -0.001470502f,
    -0.000369231886f, -0.00301490794f, -0.00727863144f, -0.000625964196f, -0.00151121127f,
    0.0020217672f, -0.00724967057f, 0.000778715534f, -0.00130088825f, 0.00528132403f,
    -0.00389289926f, 0.00121412054f, -0.000113215639f, 0.00521568069f, 0.000138174888f,
    0.00057939114f, 0.00064032292f, 0.0029287443f, 0.00239524385f, -8.14418454e-05f,
    0.000524463307f, 0.000568950607f, 0.00243576616f, -0.000231325044f, 0.000145125246f,
    -0.000617797661f, 0.00137530151f, -0.000112744332f, -3.50174778e-05f, -0.000725762977f,
    0.000399015553f, -1.85614299e-05f, -4.12554473e-05f, -0.000410055625f, -5.60659064e-05f,
    4.41397515e-06f, -1.41353694e-05f, -0.000134966656f, -0.000130232627f, 2.57653937e-06f,
    -2.195354e-06f, -1.33878611e-05f, -7.58092428e-05f, 2.74842932e-07f, -6.48632508e-08f,
    1.26065179e-05f, -2.58344699e-05f, -1.25164149e-07f, 2.33376096e-10f, 8.6732698e-06f,
    -4.64893492e-06f, -5.86724127e-08f, -1.82253235e-08f, -5.96701921e-06f, -1.5757422e-06f,
    4.63708938e-09f, -5.64511602e-08f, -1.05868385e-05f, -1.48755398e-05f, 1.41458179e-09f,
    -1.76622507e-07f, 3.32321042e-06f, -4.94967026e-05f, -2.05906076e-07f, -4.54256252e-07f,
    8.28537886e-05f, -8.94119148e-05f, -1.22281199e-06f, -1.51465167e-06f, 0.00026782151f,
    -3.7284517e-05f, -2.04484058e-06f, -6.01815282e-06f, 0.000462796132f, 0.000287039438f,
    8.05531454e-06f, -1.5223116e-05f, 0.000310888339f, 0.000950085523f, 4.8172722e-05f,
    -6.44163083e-06f, -0.000629790127f, 0.00154944975f, 8.92676762e-05f, 7.90862541e-05f,
    -0.00225907168f, 0.00117747032f, -5.91310709e-06f, 0.000228515535f, -0.003441168f,
    -0.000791023951f, -0.000305641384f, 0.000204851502f, -0.00264717988f, -0.0035836976f,
    -0.000487948273f, -0.000206470984f, 0.000379352743f, -0.00510716997f, -0.000126257233f,
    -0.000656036311f, 0.00379320793f, -0.00379320793f, 0.000510235259f, -0.000510235259f,
    0.00510716997f, -0.000379352743f, 0.000656036311f, 0.000126257233f, 0.0035836976f,
    0.00264717988f, 0.000206470984f, 0.000487948273f, 0.000791023951f, 0.003441168f,
    -0.000204851502f, 0.000305641384f, -0.00117747032f, 0.00225907168f, -0.000228515535f,
    5.91310709e-06f, -0.00154944975f, 0.000629790127f, -7.90862541e-05f, -8.92676762e-05f,
    -0.000950085523f, -0.000310888339f, 6.44163083e-06f, -4.8172722e-05f, -0.000287039438f,
    -0.000462796132f, 1.5223116e-05f, -8.05531454e-06f, 3.7284517e-05f, -0.00026782151f,
    6.01815282e-06f, 2.04484058e-06f, 8.94119148e-05f, -8.28537886e-05f, 1.51465167e-06f,
    1.22281199e-06f, 4.94967026e-05f, -3.32321042e-06f, 4.54256252e-07f, 2.05906076e-07f,
    1.48755398e-05f, 1.05868385e-05f, 1.76622507e-07f, -1.41458179e-09f, 1.5757422e-06f,
    5.96701921e-06f, 5.64511602e-08f, -4.63708938e-09f, -2.46899322e-06f, -2.54497149e-06f,
    -6.32950004e-09f, -5.65338887e-08f, -5.20872199e-08f, -1.07628175e-05f, -2.41671128e-08f,
    -2.08585789e-07f, 1.98778325e-05f, -2.21180162e-05f, -1.00938259e-07f, -6.0821867e-07f,
    7.29990934e-05f, -7.83506857e-06f, -1.91329562e-07f, -1.48818663e-06f, 0.000131533408f,
    9.7047603e-05f, 9.05165393e-07f, -2.7481492e-06f, 6.06751673e-05f, 0.00032636628f,
    6.7507226e-06f, -7.63405751e-07f, -0.000331669959f, 0.000518669432f, 1.54560785e-05f,
    1.62131309e-05f, -0.00100622675f, 0.000256981875f, -1.56285367e-07f, 5.16664295e-05f,
    -0.00139341922f, -0.000765903795f, -7.08804728e-05f, 5.32158883e-05f, -0.00068113493f,
    -0.00210348167f, -0.000129796768f, -5.85723792e-05f, 0.00120207015f, -0.00252461364f,
    -2.62888279e-05f, -0.000209288846f, 0.00300412555f, -0.00115564419f, 0.00019732237f,
    -0.000161511707f, 0.00311652524f, 0.00129090704f, 0.00024476304f, 0.000101384168f,
    0.00130707375f, 0.00294140144f, 2.53219659e-05f, 0.000253734004f, -0.000935179531f,
    0.00263516349f, -0.000166578568f, 0.000129400549f, -0.00196902128f, 0.00100575096f,
    -0.0001331971f, -5.03632436e-05f, -0.00152687193f, -0.000443720375f, -1.24907483e-05f,
    -8.77493803e-05f, -0.000529796118f, -0.000893223332f, 3.6423171e-05f, -3.66441927e-05f,
    0.000132228597f, -0.000601280772f, 2.23935131e-05f, -5.35316531e-07f, 0.000273679645f,
    -0.000187871992f, 4.23367237e-06f, 5.31329124e-06f, 0.000161631178f, 2.43851464e-05f,
    -1.30318631e-06f, 2.5832835e-06f, 4.60779229e-05f, 5.71583842e-05f, -1.18759726e-06f,
    9.1701645e-07f, -1.58404953e-06f, 2.96955495e-05f, -5.01449676e-07f, 3.58701442e-07f,
    -7.64729248e-06f, 7.57363023e-06f, -1.64581152e-07f, 1.30403706e-07f, -3.54540839e-06f,
    5.37247935e-08f, -4.44511272e-08f, 3.54998626e-08f, -3.87885166e-07f, -1.80200811e-06f,
    -1.23432891e-08f, -5.40852589e-08f, 3.39999951e-06f, -4.81908319e-06f, -3.69196904e-08f,
    -2.08338903e-07f, 1.62938213e-05f, -2.96799021e-06f, -7.35265004e-08f, -5.95653603e-07f,
    3.36197991e-05f, 2.32505972e-05f, 1.97432293e-08f, -1.19920037e-06f, 1.46122738e-05f,
    9.04553963e-05f, 8.19963759e-07f, -1.14870318e-06f, -0.000114002971f, 0.000150529959f,
    2.64922437e-06f, 2.36004826e-06f, -0.000351801398f, 4.29406355e-05f, 1.66329187e-06f,
    1.18065236e-05f, -0.00046858078f, -0.000376441021f, -1.07820952e-05f, 1.79980616e-05f,
    -8.5325657e-05f, -0.000917861122f, -2.73398909e-05f, -3.50276559e-06f, 0.000839494751f,
    -0.000970704248f, -8.60102227e-06f, -4.94939159e-05f, 0.00162351644f, -7.98846886e-05f,
    5.40415713e-05f, -5.29890203e-05f, 0.00135719287f, 0.00129157642f, 7.57962334e-05f,
    1.9981444e-05f, -2.16840434e-19f, 0.0019644734f, -4.33680869e-19f, 7.18244701e-05f,
    -0.00135719287f, 0.00129157642f, -7.57962334e-05f, 1.9981444e-05f, -0.00162351644f,
    -7.98846886e-05f, -5.40415713e-05f, -5.29890203e-05f, -0.000839494751f, -0.000970704248f,
    8.60102227e-06f, -4.94939159e-05f, 8.5325657e-05f, -0.000917861122f, 2.73398909e-05f,
    -3.50276559e-06f, 0.00046858078f, -0.000376441021f, 1.07820952e-05f, 1.79980616e-05f,
    0.000351801398f, 4.29406355e-05f, -1.66329187e-06f, 1.18065236e-05f, 0.000114002971f,
    0.000150529959f, -2.64922437e-06f, 2.36004826e-06f, -1.46122738e-05f, 9.04553963e-05f,
    -8.19963759e-07f, -1.14870318e-06f, -3.36197991e-05f, 2.32505972e-05f, -1.97432293e-08f,
    -1.19920037e-06f, -1.62938213e-05f, -2.96799021e-06f, 7.35265004e-08f, -5.95653603e-07f,
    -3.39999951e-06f, -4.81908319e-06f, 3.69196904e-08f, -2.08338903e-07f, 3.87885166e-07f,
    -1.80200811e-06f, 1.23432891e-08f, -5.40852589e-08f, 3.60962503e-07f, -7.92675223e-07f,
    -1.62922529e-08f, -5.05958937e-08f, 2.90422349e-06f, -9.4257183e-07f, -4.89832566e-08f,
    -1.96008045e-07f, 7.61837873e-06f, 3.97230724e-06f, -9.86640885e-08f, -5.5055034e-07f,
    5.09362735e-06f, 2.04762709e-05f, -4.8824905e-08f, -1.02688284e-06f, -2.82937181e-05f,
    3.905415e-05f, 3.70839189e-07f, -7.59025738e-07f, -0.000101178157f, 9.17592479e-06f,
    9.90146077e-07f, 1.95538519e-06f, -0.000140617965f, -0.000130642948f, 8.91164333e-08f,
    6.94700248e-06f, 6.82537075e-06f, -0.000324369437f, -3.304345e-06f, 7.88689431e-06f,
    0.000380649464f, -0.000318017352f, -2.66602524e-06f, -1.64207017e-06f, 0.000681512814f,
    0.000112950846f, 9.44361091e-06f, -1.04573019e-05f, 0.000454376452f, 0.000749865489f,
    1.83139364e-05f, 6.37402024e-07f, -0.000315330602f, 0.00096193247f, 1.83579982e-06f,
    1.75572659e-05f, -0.000981207122f, 0.000406429288f, -2.00403738e-05f, 8.30099452e-06f,
    -0.000903161417f, -0.000457216578f, -1.11167546e-05f, -1.37129673e-05f, -0.000208942278f,
    -0.000851527613f, 1.24991966e-05f, -1.34006195e-05f, 0.000402034028f, -0.000561770634f,
    1.40720704e-05f, 7.16787497e-07f, 0.00049403205f, -4.42875826e-05f, -7.24045606e-07f,
    3.04628361e-06f, 0.000234190098f, 0.000224537565f, -7.91340153e-06f, -3.24035182e-06f,
    -7.05340381e-06f, 0.000191810424f, -4.84925749e-06f, -4.97528754e-06f, -7.80321207e-05f,
    6.50554066e-05f, -6.82527116e-07f, -2.08280517e-06f, -4.76221321e-05f, -7.6087731e-06f,
    7.98935162e-07f, 2.74489338e-07f, -1.0877171e-05f, -1.80806474e-05f, 6.91591367e-07f,
    7.60640262e-07f, 2.57816168e-06f, -8.19585239e-06f, 3.19531836e-07f, 4.59063926e-07f,
    2.72009493e-06f, -1.3870972e-06f, 1.03962229e-07f, 1.73235009e-07f, 8.15745068e-07f,
    3.0526698e-07f, 2.42563374e-08f, 4.7297064e-08f, 4.05736898e-07f, -1.33280494e-07f,
    -1.91298373e-08f, -4.66346286e-08f, 1.46985985e-06f, 5.47049183e-07f, -6.12049931e-08f,
    -1.80895256e-07f, 1.70580756e-06f, 3.84292616e-06f, -1.37708625e-07f, -5.08853759e-07f,
    -5.00768283e-06f, 9.01960902e-06f, -1.53175336e-07f, -9.40009329e-07f, -2.43160957e-05f,
    3.57629142e-06f, 1.18438486e-07f, -7.34553737e-07f, -3.93258524e-05f, -3.47651148e-05f,
    7.26584688e-07f, 1.37923416e-06f, 2.20954576e-06f, -9.75706134e-05f, 1.09278369e-06f,
    5.20459889e-06f, 0.000128971617f, -9.81879202e-05f, 9.21257481e-07f, 7.18727642e-06f,
    0.00023801389f, 6.49311842e-05f, 1.29434409e-06f, 4.29557167e-06f, 0.000129668566f,
    0.000319749059f, 1.14107479e-06f, -3.61265734e-07f, -0.000222373419f, 0.000379534438f,
    -4.61656191e-06f, -3.69407712e-06f, -0.000504758675f, 6.47674606e-05f, -1.41872406e-05f,
    -9.49491459e-06f, -0.000377702061f, -0.000377702061f, -1.62858596e-05f, -1.62858596e-05f,
    6.47674606e-05f, -0.000504758675f, -9.49491459e-06f, -1.41872406e-05f, 0.000379534438f,
    -0.000222373419f, -3.69407712e-06f, -4.61656191e-06f, 0.000319749059f, 0.000129668566f,
    -3.61265734e-07f, 1.14107479e-06f, 6.49311842e-05f, 0.00023801389f, 4.29557167e-06f,
    1.29434409e-06f, -9.81879202e-05f, 0.000128971617f, 7.18727642e-06f, 9.21257481e-07f,
    -9.75706134e-05f, 2.20954576e-06f, 5.20459889e-06f, 1.09278369e-06f, -3.47651148e-05f,
    -3.93258524e-05f, 1.37923416e-06f, 7.26584688e-07f, 3.57629142e-06f, -2.43160957e-05f,
    -7.34553737e-07f, 1.18438486e-07f, 9.01960902e-06f, -5.00768283e-06f, -9.40009329e-07f,
    -1.53175336e-07f, 3.84292616e-06f, 1.70580756e-06f, -5.08853759e-07f, -1.37708625e-07f,
    5.47049183e-07f, 1.46985985e-06f, -1.80895256e-07f, -6.12049931e-08f, -1.33280494e-07f,
    4.05736898e-07f, -4.66346286e-08f, -1.91298373e-08f, 2.54532068e-07f, 1.44654265e-07f,
    -2.15970477e-08f, -4.26136957e-08f, 4.69489237e-07f, 7.17041985e-07f, -7.23457134e-08f,
    -1.66381085e-07f, -5.18140496e-07f, 1.93102119e-06f, -1.73428717e-07f, -4.71445446e-07f,
    -4.85337796e-06f, 1.44244495e-06f, -2.4077525e-07f, -8.79395714e-07f, -1.02616286e-05f,
    -7.28210216e-06f, -6.61646693e-09f, -7.41129554e-07f, -2.44259309e-06f, -2.57902266e-05f,
    7.76335014e-07f, 1.09301345e-06f, 3.33140633e-05f, -3.08322706e-05f, 1.82546273e-06f,
    4.68533881e-06f, 7.1393355e-05f, 1.74437009e-05f, 2.28450403e-06f, 7.38768586e-06f,
    3.71746173e-05f, 0.000106862484f, 1.39766905e-06f, 5.74192609e-06f, -9.60922262e-05f,
    0.000128850064f, -8.86272517e-07f, -6.02857028e-07f, -0.000206006691f, -6.96468442e-06f,
    -2.72641728e-06f, -8.78994069e-06f, -0.000129357548f, -0.000200356735f, -3.64251349e-07f,
    -1.48540757e-05f, 9.57470402e-05f, -0.000231153812f, 6.30016257e-06f, -1.52099383e-05f,
    0.000233143204f, -5.02040057e-05f, 1.07609821e-05f, -1.02458525e-05f, 0.000150593507f,
    0.000140743956f, 8.14329542e-06f, -4.28755857e-06f, -2.31632839e-05f, 0.000159058211f,
    1.05297363e-06f, 2.00405026e-07f, -0.000101849611f, 4.92767649e-05f, -5.04845639e-06f,
    3.0718536e-06f, -6.28172857e-05f, -3.81481659e-05f, -6.83927101e-06f, 3.60849435e-06f,
    -1.75489265e-06f, -4.53583052e-05f, -4.60383217e-06f, 2.02223782e-06f, 1.99636179e-05f,
    -1.65092697e-05f, -1.32182902e-06f, 2.23925483e-07f, 1.24052913e-05f, 2.10684311e-06f,
    5.2873628e-07f, -5.19379171e-07f, 2.41189377e-06f, 4.45181922e-06f, 7.92080471e-07f,
    -4.51572845e-07f, -9.9905742e-07f, 1.73181877e-06f, 4.55994893e-07f, -2.10729652e-07f,
    -8.39004258e-07f, 1.75046239e-07f, 1.68805343e-07f, -6.6493044e-08f, -2.82267365e-07f,
    -7.76953257e-08f, 4.54038513e-08f, -1.48610155e-08f, 1.33644789e-07f, 2.05822289e-07f,
    -2.37487257e-08f, -3.91155481e-08f, 5.82076609e-08f, 5.00585884e-07f, -8.14907253e-08f,
    -1.52736902e-07f, -7.50645995e-07f, 5.92321157e-07f, -2.03959644e-07f, -4.35393304e-07f,
    -2.42469832e-06f, -1.09197572e-06f, -3.11527401e-07f, -8.22823495e-07f, -2.04797834e-06f,
    -6.08991832e-06f, -9.31322575e-08f, -7.24568963e-07f, 5.84824011e-06f, -9.92929563e-06f,
    8.18632543e-07f, 9.406358e-07f, 1.78990886e-05f, 2.87313014e-07f, 2.19559297e-06f,
    4.35765833e-06f, 1.15297735e-05f, 2.72630714e-05f, 2.79769301e-06f, 7.16513023e-06f,
    -3.0127354e-05f, 3.83346342e-05f, 1.31502748e-06f, 5.83054498e-06f, -7.05556013e-05f,
    -7.05895945e-06f, -1.92876905e-06f, -1.02445483e-08f, -4.08724882e-05f, -8.08392651e-05f,
    -4.78466973e-06f, -5.75184822e-06f, 5.42574562e-05f, -8.88956711e-05f, -5.70574775e-06f,
    -5.85848466e-06f, 0.000109043904f, -0.0f, -5.64008951e-06f, 0.0f, 5.42574562e-05f,
    8.88956711e-05f, -5.70574775e-06f, 5.85848466e-06f, -4.08724882e-05f, 8.08392651e-05f,
    -4.78466973e-06f, 5.75184822e-06f, -7.05556013e-05f, 7.05895945e-06f, -1.92876905e-06f,
    1.02445483e-08f, -3.0127354e-05f, -3.83346342e-05f, 1.31502748e-06f, -5.83054498e-06f,
    1.15297735e-05f, -2.72630714e-05f, 2.79769301e-06f, -7.16513023e-06f, 1.78990886e-05f,
    -2.87313014e-07f, 2.19559297e-06f, -4.35765833e-06f, 5.84824011e-06f, 9.92929563e-06f,
    8.18632543e-07f, -9.406358e-07f, -2.04797834e-06f, 6.08991832e-06f, -9.31322575e-08f,
    7.24568963e-07f, -2.42469832e-06f, 1.09197572e-06f, -3.11527401e-07f, 8.22823495e-07f,
    -7.50645995e-07f, -5.92321157e-07f, -2.03959644e-07f, 4.35393304e-07f, 5.82076609e-08f,
    -5.00585884e-07f, -8.14907253e-08f, 1.52736902e-07f, 1.33644789e-07f, -2.05822289e-07f,
    -2.37487257e-08f, 3.91155481e-08f, 8.20023516e-08f, 1.9055966e-07f, -2.51709036e-08f,
    -3.60135459e-08f, -2.12142464e-08f, 3.09216887e-07f, -8.91668321e-08f, -1.39467616e-07f,
    -4.51500767e-07f, 7.51593348e-08f, -2.30119042e-07f, -4.01203067e-07f, -8.86430257e-07f,
    -1.17302932e-06f, -3.70472918e-07f, -7.65870482e-07f, 1.22284177e-07f, -3.08207723e-06f,
    -1.67350692e-07f, -6.9488101e-07f, 3.08175322e-06f, -2.40215581e-06f, 8.33054401e-07f,
    8.23495043e-07f, 2.97292536e-06f, 3.85089788e-06f, 2.44176886e-06f, 4.00332283e-06f,
    -7.45942589e-06f, 8.79930121e-06f, 3.24912094e-06f, 6.62843195e-06f, -2.10654034e-05f,
    -2.50522271e-06f, 1.70626242e-06f, 5.15865622e-06f, -1.35458376e-05f, -2.68415024e-05f,
    -1.83610462e-06f, -1.20660115e-06f, 2.0396199e-05f, -3.09545285e-05f, -5.1599186e-06f,
    -8.94863751e-06f, 4.19808639e-05f, 3.9758047e-06f, -6.66774213e-06f, -1.40907468e-05f,
    1.69008981e-05f, 4.0802377e-05f, -6.55455688e-06f, -1.58241e-05f, -2.68736367e-05f,
    3.24962748e-05f, -5.24885718e-06f, -1.46784687e-05f, -3.63104446e-05f, -7.46586511e-06f,
    -2.67902897e-06f, -9.97625557e-06f, -9.40145492e-06f, -2.85581609e-05f, 4.45126233e-07f,
    -2.15151795e-06f, 1.31240295e-05f, -1.66669488e-05f, 2.44121088e-06f, 4.85423016e-06f,
    1.1496656e-05f, 9.47434785e-07f, 2.38953385e-06f, 6.98448457e-06f, 6.20820344e-07f,
    4.8251718e-06f, 1.10418557e-06f, 4.5573679e-06f, -3.87770933e-06f, 4.80547953e-07f,
    -6.75949163e-09f, 1.17135733e-06f, -2.26582574e-06f, -2.09288964e-06f, -3.73020271e-07f,
    -6.09689891e-07f, -2.02656111e-07f, -1.45625779e-06f, -2.79588278e-07f, -8.03516116e-07f,
    3.72404912e-07f, -2.66113574e-07f, -1.20974676e-07f, -4.46412145e-07f, 2.33650084e-07f,
    2.03648611e-07f, -3.55680214e-08f, -1.61668964e-07f, 7.67616157e-08f, 1.9273044e-07f,
    -7.66690622e-09f, -4.32639382e-08f, 7.29741174e-08f, 1.64532139e-07f, -2.61011071e-08f,
    -3.27397807e-08f, 9.00672159e-09f, 2.14662904e-07f, -9.61403472e-08f, -1.27034568e-07f,
    -2.09171318e-07f, -1.51731996e-08f, -2.51467867e-07f, -3.68640372e-07f, -3.80512915e-07f,
    -7.43088037e-07f, -4.20376267e-07f, -7.09001938e-07f, -1.16204212e-07f, -1.47666697e-06f,
    -2.32450986e-07f, -6.57698877e-07f, -5.75608761e-09f, -9.81975177e-07f, 8.36035156e-07f,
    7.23300616e-07f, -2.12234818e-06f, 2.68143054e-07f, 2.64706591e-06f, 3.66504651e-06f,
    -6.08251912e-06f, -1.73237402e-06f, 3.71005353e-06f, 6.16459647e-06f, -5.16718455e-06f,
    -8.39162476e-06f, 2.36137157e-06f, 5.03416186e-06f, 5.05377193e-06f, -1.06463604e-05f,
    -8.40011694e-07f, -1.60167147e-07f, 1.35795508e-05f, 6.34610331e-07f, -2.88663182e-06f,
    -5.49193146e-06f, 5.36165862e-06f, 1.48384288e-05f, -1.30103695e-06f, -6.56901057e-06f,
    -1.18678763e-05f, 1.18678763e-05f, 3.10853125e-06f, -3.10853125e-06f, -1.48384288e-05f,
    -5.36165862e-06f, 6.56901057e-06f, 1.30103695e-06f, -6.34610331e-07f, -1.35795508e-05f,
    5.49193146e-06f, 2.88663182e-06f, 1.06463604e-05f, -5.05377193e-06f, 1.60167147e-07f,
    8.40011694e-07f, 8.39162476e-06f, 5.16718455e-06f, -5.03416186e-06f, -2.36137157e-06f,
    1.73237402e-06f, 6.08251912e-06f, -6.16459647e-06f, -3.71005353e-06f, -2.68143054e-07f,
    2.12234818e-06f, -3.66504651e-06f, -2.64706591e-06f, 9.81975177e-07f, 5.75608761e-09f,
    -7.23300616e-07f, -8.36035156e-07f, 1.47666697e-06f, 1.16204212e-07f, 6.57698877e-07f,
    2.32450986e-07f, 7.43088037e-07f, 3.80512915e-07f, 7.09001938e-07f, 4.20376267e-07f,
    1.51731996e-08f, 2.09171318e-07f, 3.68640372e-07f, 2.51467867e-07f, -2.14662904e-07f,
    -9.00672159e-09f, 1.27034568e-07f, 9.61403472e-08f, -1.64532139e-07f, -7.29741174e-08f,
    3.27397807e-08f, 2.61011071e-08f, 7.97242876e-08f, 1.44111709e-07f, -2.71555916e-08f,
    -2.94254061e-08f, 5.03888522e-08f, 1.79817263e-07f, -1.0210011e-07f, -1.15976619e-07f,
    -9.87755087e-08f, 1.40458987e-08f, -2.69197471e-07f, -3.36453496e-07f, -3.31403754e-07f,
    -4.54720293e-07f, -4.62581852e-07f, -6.52372592e-07f, -6.19572177e-07f, -1.00055195e-06f,
    -2.90346605e-07f, -6.16106604e-07f, -1.25442011e-06f, -1.31659567e-06f, 8.3196818e-07f,
    6.34966113e-07f, -2.39406427e-06f, -1.90918126e-06f, 2.80379072e-06f, 3.3342651e-06f,
    -2.62777075e-06f, -3.52032566e-06f, 4.01923808e-06f, 5.66210565e-06f, -2.61663704e-08f,
    -4.4136832e-06f, 2.45228784e-06f, 4.67058226e-06f, 3.2376422e-06f, -1.29791351e-06f,
    -1.92239554e-06f, -1.46091736e-07f, 1.61987089e-06f, 3.87504861e-06f, -6.87324837e-06f,
    -5.35473237e-06f, -4.19596972e-06f, 3.78561685e-06f, -1.05272984e-05f, -7.12443079e-06f,
    -5.72222507e-06f, -2.37022323e-06f, -1.25880661e-05f, -5.21414768e-06f, -2.90163058e-07f,
    -5.6438339e-06f, -1.2481657e-05f, -2.40619102e-06f, 3.88549461e-06f, -1.59465139e-06f,
    -8.64648791e-06f, -1.07375274e-06f, 1.37159543e-06f, 3.20712229e-06f, -1.46264142e-06f,
    -1.25603651e-06f, -3.1394477e-06f, 3.10244286e-06f, 5.03662977e-06f, -1.56857095e-06f,
    -4.34736057e-06f, 6.31131684e-07f, 6.84574388e-06f, -1.16168269e-06f, -3.04285413e-06f,
    -3.4286407e-07f, 4.34026106e-06f, -3.75102047e-07f, -1.81798271e-06f, 4.39647572e-08f,
    1.03727916e-06f, 1.39301505e-07f, -1.14560078e-06f, 2.69393382e-07f, -6.40959229e-07f,
    2.30347098e-07f, -5.55873669e-07f, 8.7197968e-08f, -7.88391844e-07f, 1.3420231e-07f,
    -5.99128782e-08f, -7.97767825e-08f, -4.28259909e-07f, 4.75572044e-08f, 1.6278031e-07f,
    -9.15197091e-08f, -1.54203533e-07f, 9.81217596e-09f, 1.58275952e-07f, -4.5528779e-08f,
    -4.00088069e-08f, 1.60500191e-09f, 8.98799826e-08f, 1.28864187e-07f, -2.8225049e-08f,
    -2.65581921e-08f, 7.88828132e-08f, 1.66405826e-07f, -1.0652176e-07f, -1.0582243e-07f,
    -5.97985945e-08f, 4.58683083e-08f, -2.85072645e-07f, -3.05294378e-07f, -3.7517367e-07f,
    -3.30977684e-07f, -4.98801398e-07f, -5.96282291e-07f, -8.75696003e-07f, -9.09823143e-07f,
    -3.40816342e-07f, -5.71975306e-07f, -1.51147219e-06f, -1.57184854e-06f, 8.25877294e-07f,
    5.56701309e-07f, -1.92596394e-06f, -2.29512443e-06f, 2.94864367e-06f, 3.01400178e-06f,
    -1.45316085e-06f, -2.72776265e-06f, 4.38061579e-06f, 5.14219255e-06f, -2.60748664e-07f,
    -1.94799304e-06f, 3.02709714e-06f, 4.15455133e-06f, -1.55547042e-08f, -6.45391438e-08f,
    -8.47208241e-07f, -7.02777754e-07f, -1.37977111e-06f, 6.64983077e-07f, -4.06199842e-06f,
    -6.79191908e-06f, -1.9470549e-06f, -9.36197125e-07f, -3.66569679e-06f, -1.09693156e-05f,
    -2.16840434e-19f, -2.21634696e-06f, -4.33680869e-19f, -1.22993952e-05f, 1.9470549e-06f,
    -9.36197125e-07f, 3.66569679e-06f, -1.09693156e-05f, 1.37977111e-06f, 6.64983077e-07f,
    4.06199842e-06f, -6.79191908e-06f, 1.55547042e-08f, -6.45391438e-08f, 8.47208241e-07f,
    -7.02777754e-07f, 2.60748664e-07f, -1.94799304e-06f, -3.02709714e-06f, 4.15455133e-06f,
    1.45316085e-06f, -2.72776265e-06f, -4.38061579e-06f, 5.14219255e-06f, 1.92596394e-06f,
    -2.29512443e-06f, -2.94864367e-06f, 3.01400178e-06f, 1.51147219e-06f, -1.57184854e-06f,
    -8.25877294e-07f, 5.56701309e-07f, 8.75696003e-07f, -9.09823143e-07f, 3.40816342e-07f,
    -5.71975306e-07f, 3.7517367e-07f, -3.30977684e-07f, 4.98801398e-07f, -5.96282291e-07f,
    5.97985945e-08f, 4.58683083e-08f, 2.85072645e-07f, -3.05294378e-07f, -7.88828132e-08f,
    1.66405826e-07f, 1.0652176e-07f, -1.0582243e-07f, -8.98799826e-08f, 1.28864187e-07f,
    2.8225049e-08f, -2.65581921e-08f, 9.92939206e-08f, 1.16643641e-07f, -2.89141262e-08f,
    -2.39107756e-08f, 9.68508331e-08f, 1.55389287e-07f, -1.09683072e-07f, -9.57536912e-08f,
    -4.42304113e-08f, 6.00053554e-08f, -2.98782254e-07f, -2.76268281e-07f, -4.04329512e-07f,
    -2.77718016e-07f, -5.29735473e-07f, -5.41251438e-07f, -9.6565816e-07f, -8.60495675e-07f,
    -3.85016364e-07f, -5.25479606e-07f, -1.53963731e-06f, -1.54736892e-06f, 8.17052523e-07f,
    4.87386103e-07f, -1.78114806e-06f, -2.0739883e-06f, 3.06211768e-06f, 2.72212128e-06f,
    -1.49527898e-06f, -2.07076005e-06f, 4.63512015e-06f, 4.72029205e-06f, -1.05076037e-06f,
    -1.40495604e-06f, 3.24719213e-06f, 4.07449761e-06f, -9.72259386e-07f, -6.87062936e-07f,
    -1.05835727e-06f, 4.84052862e-07f, -9.29486134e-07f, -6.45573948e-07f, -5.27318343e-06f,
    -2.85228339e-06f, -2.53230525e-07f, -8.13033637e-07f, -6.58779436e-06f, -2.28627528e-06f,
    5.23717574e-07f, -2.16930914e-07f, -5.14834892e-06f, 2.13251587e-06f, 3.95840601e-07f,
    7.53962638e-07f, -3.04163336e-06f, 6.27491499e-06f, -2.00756219e-07f, 1.11373572e-06f,
    -1.71183456e-06f, 5.74557271e-06f, -2.01664307e-07f, 1.17331808e-06f, -1.09064865e-06f,
    4.06094529e-07f, 2.50454178e-07f, 1.73645367e-06f, -5.84993131e-07f, -5.17721628e-06f,
    4.06926546e-07f, 2.52157042e-06f, -6.02256591e-08f, -6.6152752e-06f, 2.0706932e-07f,
    2.725993e-06f, 2.40413812e-07f, -4.09007453e-06f, 5.46707923e-09f, 2.18284299e-06f,
    2.33109347e-07f, -9.2237741e-07f, -7.43611395e-08f, 1.2912858e-06f, 9.932252e-08f,
    6.43817884e-07f, -8.95278376e-08f, 4.82280427e-07f, 8.14299561e-09f, 7.57302075e-07f,
    -7.37058201e-08f, -1.11545688e-08f, -1.59197704e-08f, 4.06622121e-07f, -4.13929371e-08f,
    -1.78360693e-07f, -9.84956117e-09f, 1.4526573e-07f, -1.22681048e-08f, -1.52690916e-07f,
    -3.53790375e-09f, 3.73528479e-08f, 1.06636612e-07f, 1.05574635e-07f, -2.95815692e-08f,
    -2.10998348e-08f, 1.10932326e-07f, 1.42432583e-07f, -1.12383702e-07f, -8.55212576e-08f,
    -3.24654472e-08f, 6.25052081e-08f, -3.0948928e-07f, -2.48534406e-07f, -4.14599924e-07f,
    -2.43608497e-07f, -5.56405155e-07f, -4.86864792e-07f, -1.00072623e-06f, -7.88200339e-07f,
    -4.24022005e-07f, -4.78204981e-07f, -1.57580041e-06f, -1.40770578e-06f, 8.0886997e-07f,
    4.23523119e-07f, -1.85139311e-06f, -1.81519681e-06f, 3.15440161e-06f, 2.42753322e-06f,
    -1.72344642e-06f, -1.77718823e-06f, 4.83984741e-06f, 4.20407332e-06f, -1.38284861e-06f,
    -1.36911865e-06f, 3.38209384e-06f, 3.46062711e-06f, -9.9836609e-07f, -9.50573678e-07f,
    -1.4387075e-06f, -4.82848179e-07f, -5.30349269e-07f, -6.76345849e-07f, -6.83835424e-06f,
    -5.5453047e-06f, -9.64953983e-08f, -3.62281298e-07f, -1.00713351e-05f, -9.1988104e-06f,
    -4.69809969e-08f, -4.69809969e-08f, -1.06944335e-05f, -1.06944335e-05f, -3.62281298e-07f,
    -9.64953983e-08f, -9.1988104e-06f, -1.00713351e-05f, -6.76345849e-07f, -5.30349269e-07f,
    -5.5453047e-06f, -6.83835424e-06f, -9.50573678e-07f, -9.9836609e-07f, -4.82848179e-07f,
    -1.4387075e-06f, -1.36911865e-06f, -1.38284861e-06f, 3.46062711e-06f, 3.38209384e-06f,
    -1.77718823e-06f, -1.72344642e-06f, 4.20407332e-06f, 4.83984741e-06f, -1.81519681e-06f,
    -1.85139311e-06f, 2.42753322e-06f, 3.15440161e-06f, -1.40770578e-06f, -1.57580041e-06f,
    4.23523119e-07f, 8.0886997e-07f, -7.88200339e-07f, -1.00072623e-06f, -4.78204981e-07f,
    -4.24022005e-07f, -2.43608497e-07f, -4.14599924e-07f, -4.86864792e-07f, -5.56405155e-07f,
    6.25052081e-08f, -3.24654472e-08f, -2.48534406e-07f, -3.0948928e-07f, 1.42432583e-07f,
    1.10932326e-07f, -8.55212576e-08f, -1.12383702e-07f, 1.05574635e-07f, 1.06636612e-07f,
    -2.10998348e-08f, -2.95815692e-08f, 1.12412707e-07f, 9.42999137e-08f, -3.0624463e-08f,
    -1.86220017e-08f, 1.23287109e-07f, 1.29312966e-07f, -1.15155743e-07f, -7.5611851e-08f,
    -2.05790407e-08f, 6.0497193e-08f, -3.18175665e-07f, -2.20717027e-07f, -4.15056832e-07f,
    -2.13963176e-07f, -5.80069809e-07f, -4.34125809e-07f, -1.02380386e-06f, -7.02284751e-07f,
    -4.57683313e-07f, -4.3084998e-07f, -1.63247103e-06f, -1.25049587e-06f, 8.01513522e-07f,
    3.68134124e-07f, -1.95945495e-06f, -1.60722516e-06f, 3.24339362e-06f, 2.15511136e-06f,
    -1.87931016e-06f, -1.60096954e-06f, 5.08535641e-06f, 3.76992739e-06f, -1.49046559e-06f,
    -1.29854379e-06f, 3.85348403e-06f, 3.2138887e-06f, -9.6587587e-07f, -8.96879158e-07f,
    -3.52232462e-07f, 2.87632176e-08f, -4.72853088e-07f, -5.12135841e-07f, -3.88902254e-06f,
    -3.56766759e-06f, -1.49767615e-07f, -1.9785206e-07f, -3.14474278e-06f, -4.90792308e-06f,
    1.72235346e-08f, -4.15812877e-08f, 1.47790013e-06f, -3.56796659e-06f, 2.45804245e-07f,
    -3.40008377e-08f, 5.69409485e-06f, -1.24675671e-06f, 6.9649235e-07f, -2.77771157e-08f,
    5.27267593e-06f, 2.27232306e-07f, 1.31716672e-06f, 4.87880563e-08f, 2.28727302e-07f,
    2.69404637e-07f, 1.97212762e-06f, 1.35709215e-07f, -4.9973869e-06f, -4.52262043e-07f,
    2.46092941e-06f, 1.96816586e-07f, -6.26163137e-06f, -9.30148985e-07f, 2.52202381e-06f,
    2.49064129e-07f, -3.81731934e-06f, -7.69531709e-07f, 2.03856553e-06f, 2.70097217e-07f,
    -8.27065776e-07f, -3.06445514e-07f, 1.22052893e-06f, 2.27348309e-07f, 6.28287921e-07f,
    1.89740224e-08f, 4.4478432e-07f, 1.42194679e-07f, 7.17144587e-07f, 1.03197998e-07f,
    -2.82263972e-08f, 5.73295544e-08f, 3.81054662e-07f, 6.89136499e-08f, -1.78615224e-07f,
    4.26092717e-09f, 1.34893057e-07f, 2.79617538e-08f, -1.46167892e-07f, -1.28076785e-08f,
    3.48225093e-08f, 8.48702175e-09f, 1.17595128e-07f, 8.29364168e-08f, -3.13761284e-08f,
    -1.69680447e-08f, 1.32918871e-07f, 1.16067362e-07f, -1.17640759e-07f, -6.65621513e-08f,
    -9.49321066e-09f, 5.67378891e-08f, -3.26452522e-07f, -1.93344533e-07f, -4.11821333e-07f,
    -1.84353681e-07f, -5.99653276e-07f, -3.83535564e-07f, -1.0451422e-06f, -6.14526527e-07f,
    -4.86142483e-07f, -3.8349674e-07f, -1.68975885e-06f, -1.09971302e-06f, 7.92063588e-07f,
    3.16560943e-07f, -2.05173592e-06f, -1.42003103e-06f, 3.30375792e-06f, 1.89406319e-06f,
    -1.98222847e-06f, -1.43134037e-06f, 5.19951163e-06f, 3.34003357e-06f, -1.56114743e-06f,
    -1.16981573e-06f, 3.77966103e-06f, 2.92637378e-06f, -1.00663772e-06f, -7.85075883e-07f,
    -1.33185267e-06f, 3.46074046e-07f, -5.41563622e-07f, -4.2247126e-07f, -7.26421649e-06f,
    -2.25871395e-06f, -2.76270868e-07f, -1.62108378e-07f, -1.10676883e-05f, -2.3893308e-06f,
    -1.97503823e-07f, 0.0f, -1.22091096e-05f, 0.0f, -2.76270868e-07f, 1.62108378e-07f,
    -1.10676883e-05f, 2.3893308e-06f, -5.41563622e-07f, 4.2247126e-07f, -7.26421649e-06f,
    2.25871395e-06f, -1.00663772e-06f, 7.85075883e-07f, -1.33185267e-06f, -3.46074046e-07f,
    -1.56114743e-06f, 1.16981573e-06f, 3.77966103e-06f, -2.92637378e-06f, -1.98222847e-06f,
    1.43134037e-06f, 5.19951163e-06f, -3.34003357e-06f, -2.05173592e-06f, 1.42003103e-06f,
    3.30375792e-06f, -1.89406319e-06f, -1.68975885e-06f, 1.09971302e-06f, 7.92063588e-07f,
    -3.16560943e-07f, -1.0451422e-06f, 6.14526527e-07f, -4.86142483e-07f, 3.8349674e-07f,
    -4.11821333e-07f, 1.84353681e-07f, -5.99653276e-07f, 3.83535564e-07f, -9.49321066e-09f,
    -5.67378891e-08f, -3.26452522e-07f, 1.93344533e-07f, 1.32918871e-07f, -1.16067362e-07f,
    -1.17640759e-07f, 6.65621513e-08f, 1.17595128e-07f, -8.29364168e-08f, -3.13761284e-08f,
    1.69680447e-08f, 1.22132704e-07f, 7.20454949e-08f, -3.11182085e-08f, -1.53724056e-08f,
    1.40852194e-07f, 1.0139803e-07f, -1.19229384e-07f, -5.79084265e-08f, 3.06405012e-10f,
    5.16434575e-08f, -3.33893098e-07f, -1.67784904e-07f, -4.09535602e-07f, -1.55528156e-07f,
    -6.15413853e-07f, -3.33197818e-07f, -1.06389768e-06f, -5.30456248e-07f, -5.0972551e-07f,
    -3.35680994e-07f, -1.73877004e-06f, -9.54893494e-07f, 7.86097189e-07f, 2.67934297e-07f,
    -2.12824079e-06f, -1.23852305e-06f, 3.36307926e-06f, 1.6323977e-06f, -2.06324808e-06f,
    -1.25379268e-06f, 5.36706784e-06f, 2.85870533e-06f, -1.62696699e-06f, -1.02599176e-06f,
    4.09002951e-06f, 2.34236632e-06f, -1.05615754e-06f, -6.87352269e-07f, -6.61482204e-07f,
    -5.24915265e-07f, -5.70005398e-07f, -3.87450086e-07f, -5.45309422e-06f, -4.53917073e-06f,
    -2.55387334e-07f, -2.12683901e-07f, -6.71088674e-06f, -8.10475376e-06f, -7.80807525e-08f,
    -1.88503606e-07f, -4.30553564e-06f, -1.03944822e-05f, 3.01958778e-08f, -3.3097632e-07f,
    -9.85613042e-07f, -1.04762403e-05f, 1.29086104e-07f, -6.77023252e-07f, 6.4624146e-07f,
    -7.06559877e-06f, 2.60784674e-07f, -1.23284758e-06f, 9.65674261e-08f, -8.38909727e-07f,
    4.2495364e-07f, -1.87592514e-06f, -1.23578457e-06f, 4.54839073e-06f, 5.72371448e-07f,
    -2.34550203e-06f, -1.77368008e-06f, 5.81650011e-06f, 6.29125452e-07f, -2.3806615e-06f,
    -1.22377662e-06f, 3.53233577e-06f, 5.54284441e-07f, -1.9047078e-06f, -3.66396506e-07f,
    7.45312832e-07f, 3.77200081e-07f, -1.12737848e-06f, 1.23068048e-07f, -5.97792621e-07f,
    1.79610396e-07f, -3.99560406e-07f, 1.99556851e-07f, -6.70769737e-07f, 3.63007793e-08f,
    3.67341002e-08f, 1.17456224e-07f, -3.5473991e-07f, -2.78983059e-08f, 1.71296776e-07f,
    4.33604619e-08f, -1.2525534e-07f, -3.54169991e-08f, 1.37304724e-07f, 1.11339631e-08f,
    -3.28738281e-08f, 1.25766405e-07f, 6.14120665e-08f, -3.05288665e-08f, -1.28541924e-08f,
    1.48646336e-07f, 8.65844996e-08f, -1.20481175e-07f, -4.88807501e-08f, 8.89272211e-09f,
    4.55659972e-08f, -3.39131049e-07f, -1.43279166e-07f, -4.07852468e-07f, -1.29833609e-07f,
    -6.29380338e-07f, -2.83479125e-07f, -1.0787752e-06f, -4.49073696e-07f, -5.29553176e-07f,
    -2.87467572e-07f, -1.77892662e-06f, -8.13437396e-07f, 7.80061896e-07f, 2.25780767e-07f,
    -2.18960645e-06f, -1.05987704e-06f, 3.41043346e-06f, 1.3920677e-06f, -2.13244311e-06f,
    -1.07366998e-06f, 5.49055039e-06f, 2.48188599e-06f, -1.6866635e-06f, -8.78339563e-07f,
    4.25431062e-06f, 2.248177e-06f, -1.09994187e-06f, -5.86357885e-07f, -4.92118204e-07f,
    5.42711689e-07f, -5.93096331e-07f, -3.16745883e-07f, -5.20600133e-06f, -8.43048952e-07f,
    -2.52796355e-07f, -1.18413126e-07f, -6.19743378e-06f, 1.74420421e-07f, -4.42238246e-08f,
    4.42238246e-08f, -3.47132732e-06f, 3.47132732e-06f, 1.18413126e-07f, 2.52796355e-07f,
    -1.74420421e-07f, 6.19743378e-06f, 3.16745883e-07f, 5.93096331e-07f, 8.43048952e-07f,
    5.20600133e-06f, 5.86357885e-07f, 1.09994187e-06f, -5.42711689e-07f, 4.92118204e-07f,
    8.78339563e-07f, 1.6866635e-06f, -2.248177e-06f, -4.25431062e-06f, 1.07366998e-06f,
    2.13244311e-06f, -2.48188599e-06f, -5.49055039e-06f, 1.05987704e-06f, 2.18960645e-06f,
    -1.3920677e-06f, -3.41043346e-06f, 8.13437396e-07f, 1.77892662e-06f, -2.25780767e-07f,
    -7.80061896e-07f, 4.49073696e-07f, 1.0787752e-06f, 2.87467572e-07f, 5.29553176e-07f,
    1.29833609e-07f, 4.07852468e-07f, 2.83479125e-07f, 6.29380338e-07f, -4.55659972e-08f,
    -8.89272211e-09f, 1.43279166e-07f, 3.39131049e-07f, -8.65844996e-08f, -1.48646336e-07f,
    4.88807501e-08f, 1.20481175e-07f, -6.14120665e-08f, -1.25766405e-07f, 1.28541924e-08f,
    3.05288665e-08f, 1.28833364e-07f, 5.08942009e-08f, -3.07335952e-08f, -9.85116611e-09f,
    1.54993344e-07f, 7.29844984e-08f, -1.2223812e-07f, -4.01451281e-08f, 1.62398095e-08f,
    3.89097465e-08f, -3.43053756e-07f, -1.18251627e-07f, -4.05410958e-07f, -1.05828214e-07f,
    -6.4072924e-07f, -2.35586583e-07f, -1.09149505e-06f, -3.69982587e-07f, -5.45669707e-07f,
    -2.39219844e-07f, -1.81116616e-06f, -6.74191199e-07f, 7.73002739e-07f, 1.83938653e-07f,
    -2.23881102e-06f, -8.80284119e-07f, 3.44224577e-06f, 1.14682928e-06f, -2.18964919e-06f,
    -8.94239975e-07f, 5.54715007e-06f, 2.02731576e-06f, -1.73831233e-06f, -7.32493163e-07f,
    4.17143019e-06f, 1.71058048e-06f, -1.13958947e-06f, -4.92556524e-07f, -1.21272501e-06f,
    -1.76598377e-07f, -6.29442013e-07f, -2.76681561e-07f, -7.61086585e-06f, -2.67039604e-06f,
    -3.17605895e-07f, -1.39985744e-07f, -1.17731215e-05f, -4.53818393e-06f, -2.18397531e-07f,
    -9.04632174e-08f, -1.29613254e-05f, -5.36875677e-06f, -3.23566155e-07f, -1.25596415e-07f,
    -1.15338344e-05f, -5.11587314e-06f, -6.40726171e-07f, -2.49439324e-07f, -7.26994995e-06f,
    -3.49343964e-06f, -1.1541016e-06f, -4.57521423e-07f, -9.82400024e-07f, -7.32652154e-07f,
    -1.74712329e-06f, -7.1122156e-07f, 4.15920977e-06f, 1.74008358e-06f, -2.18063883e-06f,
    -9.15992644e-07f, 5.35595609e-06f, 2.48889864e-06f, -2.20553329e-06f, -9.60623538e-07f,
    3.24496614e-06f, 1.62310459e-06f, -1.75741309e-06f, -8.03962735e-07f, 6.76659738e-07f,
    4.16531179e-07f, -1.03342074e-06f, -5.10186339e-07f, -5.55000724e-07f, -2.16692769e-07f,
    -3.61500668e-07f, -2.11836991e-07f, -6.19648858e-07f, -2.86479093e-07f, 3.89966246e-08f,
    -1.60300662e-08f, -3.26192151e-07f, -1.58959097e-07f, 1.61204682e-07f, 5.79890163e-08f,
    -1.14822299e-07f, -5.804851e-08f, 1.27086579e-07f, 5.51113111e-08f, -2.86977606e-08f,
    -1.47661074e-08f, 1.31302599e-07f, 4.08329832e-08f, -3.15643263e-08f, -7.46592121e-09f,
    1.58877583e-07f, 5.90945604e-08f, -1.23574111e-07f, -3.25949969e-08f, 2.21130811e-08f,
    3.19783595e-08f, -3.47101775e-07f, -9.35326128e-08f, -4.03778046e-07f, -8.26110096e-08f,
    -6.48876039e-07f, -1.87909009e-07f, -1.10143071e-06f, -2.94114102e-07f, -5.5895174e-07f,
    -1.90494063e-07f, -1.83685313e-06f, -5.36459709e-07f, 7.69392159e-07f, 1.44145119e-07f,
    -2.27974965e-06f, -7.01751731e-07f, 3.47804621e-06f, 9.11736151e-07f, -2.23560892e-06f,
    -7.14563214e-07f, 5.6726949e-06f, 1.61403204e-06f, -1.77833795e-06f, -5.8654291e-07f,
    4.52141285e-06f, 1.36623885e-06f, -1.16375179e-06f, -3.95086659e-07f, -1.32540208e-07f,
    -1.29131649e-07f, -6.26382814e-07f, -2.232062e-07f, -4.44507759e-06f, -2.08640495e-06f,
    -2.54082266e-07f, -1.14608113e-07f, -4.35373249e-06f, -3.47868627e-06f, -2.16840434e-19f,
    -7.92879931e-08f, 0.0f, -3.93537903e-06f, 2.54082266e-07f, -1.14608113e-07f,
    4.35373249e-06f, -3.47868627e-06f, 6.26382814e-07f, -2.232062e-07f, 4.44507759e-06f,
    -2.08640495e-06f, 1.16375179e-06f, -3.95086659e-07f, 1.32540208e-07f, -1.29131649e-07f,
    1.77833795e-06f, -5.8654291e-07f, -4.52141285e-06f, 1.36623885e-06f, 2.23560892e-06f,
    -7.14563214e-07f, -5.6726949e-06f, 1.61403204e-06f, 2.27974965e-06f, -7.01751731e-07f,
    -3.47804621e-06f, 9.11736151e-07f, 1.83685313e-06f, -5.36459709e-07f, -7.69392159e-07f,
    1.44145119e-07f, 1.10143071e-06f, -2.94114102e-07f, 5.5895174e-07f, -1.90494063e-07f,
    4.03778046e-07f, -8.26110096e-08f, 6.48876039e-07f, -1.87909009e-07f, -2.21130811e-08f,
    3.19783595e-08f, 3.47101775e-07f, -9.35326128e-08f, -1.58877583e-07f, 5.90945604e-08f,
    1.23574111e-07f, -3.25949969e-08f, -1.31302599e-07f, 4.08329832e-08f, 3.15643263e-08f,
    -7.46592121e-09f, 1.32723201e-07f, 3.09527088e-08f, -3.20691207e-08f, -5.74379744e-09f,
    1.61908588e-07f, 4.40980195e-08f, -1.23408014e-07f, -2.49905252e-08f, 2.62062834e-08f,
    2.45406255e-08f, -3.50273694e-07f, -7.01591887e-08f, -4.02738152e-07f, -6.13595361e-08f,
    -6.55564122e-07f, -1.40111965e-07f, -1.10788505e-06f, -2.19522292e-07f, -5.69757958e-07f,
    -1.4283313e-07f, -1.85683746e-06f, -4.00709155e-07f, 7.65617585e-07f, 1.07192974e-07f,
    -2.31085528e-06f, -5.25733924e-07f, 3.49381185e-06f, 6.84013969e-07f, -2.2712693e-06f,
    -5.36485459e-07f, 5.69040731e-06f, 1.23547204e-06f, -1.80991594e-06f, -4.3977542e-07f,
    4.38404049e-06f, 1.17244724e-06f, -1.18927392e-06f, -2.93451649e-07f, -9.22557376e-07f,
    5.00234137e-07f, -6.53912821e-07f, -1.55803988e-07f, -7.01303179e-06f, 2.62244811e-07f,
    -3.15548874e-07f, -4.36042562e-08f, -1.03883358e-05f, 1.62874233e-06f, -1.7254294e-07f,
    7.14696284e-08f, -1.04787896e-05f, 4.3404566e-06f, -1.92293882e-07f, 2.53959598e-07f,
    -8.49735716e-06f, 6.19396769e-06f, -3.52216148e-07f, 5.72556246e-07f, -5.14439762e-06f,
    4.77352705e-06f, -6.33442028e-07f, 1.04844537e-06f, -1.00606553e-06f, 2.98627612e-07f,
    -9.68835593e-07f, 1.59077194e-06f, 2.27093938e-06f, -3.9290303e-06f, -1.22667745e-06f,
    1.98538237e-06f, 3.15011494e-06f, -4.89733611e-06f, -1.26227144e-06f, 2.00577142e-06f,
    1.9868271e-06f, -2.95416885e-06f, -1.02963827e-06f, 1.59632657e-06f, 4.65576505e-07f,
    -6.17170258e-07f, -6.28167356e-07f, 9.38618768e-07f, -3.01881443e-07f, 5.0387797e-07f,
    -2.4139112e-07f, 3.28166607e-07f, -3.64479746e-07f, 5.62627974e-07f, 1.17779764e-09f,
    -3.58834811e-08f, -1.98070865e-07f, 2.97290939e-07f, 8.33046485e-08f, -1.45668665e-07f,
    -6.95916782e-08f, 1.04933619e-07f, 7.19626101e-08f, -1.15736349e-07f, -1.86148128e-08f,
    2.67377693e-08f, 1.33452687e-07f, 2.06090043e-08f, -3.20839142e-08f, -3.96214128e-09f,
    1.64611635e-07f, 2.94345863e-08f, -1.23166572e-07f, -1.60039484e-08f, 2.90761442e-08f,
    1.61689702e-08f, -3.5180031e-07f, -4.6890797e-08f, -4.0112451e-07f, -4.08036662e-08f,
    -6.60571686e-07f, -9.35119076e-08f, -1.11264967e-06f, -1.45372084e-07f, -5.76343325e-07f,
    -9.54591926e-08f, -1.87060039e-06f, -2.66652961e-07f, 7.63399441e-07f, 7.04226792e-08f,
    -2.33211358e-06f, -3.50357766e-07f, 3.51120912e-06f, 4.47816063e-07f, -2.29434522e-06f,
    -3.58659776e-07f, 5.73992065e-06f, 7.79777167e-07f, -1.83146039e-06f, -2.93785433e-07f,
    4.48340961e-06f, 5.6631842e-07f, -1.20510117e-06f, -1.99203996e-07f, -6.94594576e-07f,
    -5.19602395e-07f, -6.602138e-07f, -1.19828997e-07f, -6.39134714e-06f, -2.45183696e-06f,
    -3.0744971e-07f, -8.8590113e-08f, -8.89531566e-06f, -5.06475817e-06f, -1.3513889e-07f,
    -1.3513889e-07f, -7.7815921e-06f, -7.7815921e-06f, -8.8590113e-08f, -3.0744971e-07f,
    -5.06475817e-06f, -8.89531566e-06f, -1.19828997e-07f, -6.602138e-07f, -2.45183696e-06f,
    -6.39134714e-06f, -1.99203996e-07f, -1.20510117e-06f, -5.19602395e-07f, -6.94594576e-07f,
    -2.93785433e-07f, -1.83146039e-06f, 5.6631842e-07f, 4.48340961e-06f, -3.58659776e-07f,
    -2.29434522e-06f, 7.79777167e-07f, 5.73992065e-06f, -3.50357766e-07f, -2.33211358e-06f,
    4.47816063e-07f, 3.51120912e-06f, -2.66652961e-07f, -1.87060039e-06f, 7.04226792e-08f,
    7.63399441e-07f, -1.45372084e-07f, -1.11264967e-06f, -9.54591926e-08f, -5.76343325e-07f,
    -4.08036662e-08f, -4.0112451e-07f, -9.35119076e-08f, -6.60571686e-07f, 1.61689702e-08f,
    2.90761442e-08f, -4.6890797e-08f, -3.5180031e-07f, 2.94345863e-08f, 1.64611635e-07f,
    -1.60039484e-08f, -1.23166572e-07f, 2.06090043e-08f, 1.33452687e-07f, -3.96214128e-09f,
    -3.20839142e-08f, 1.34174641e-07f, 1.01001421e-08f, -3.20813704e-08f, -1.95618499e-09f,
    1.65742932e-07f, 1.51207011e-08f, -1.24326633e-07f, -7.15500548e-09f, 3.1481715e-08f,
    7.66507924e-09f, -3.52843983e-07f, -2.32034463e-08f, -4.00346096e-07f, -1.99623962e-08f,
    -6.6273833e-07f, -4.72193733e-08f, -1.11575321e-06f, -7.24725595e-08f, -5.80718336e-07f,
    -4.69778065e-08f, -1.87855585e-06f, -1.33125056e-07f, 7.61821525e-07f, 3.60188821e-08f,
    -2.34447634e-06f, -1.75317865e-07f, 3.52410984e-06f, 2.28144401e-07f, -2.30820046e-06f,
    -1.78583335e-07f, 5.78874051e-06f, 4.19101411e-07f, -1.84446765e-06f, -1.45981446e-07f,
    4.63696324e-06f, 4.4106082e-07f, -1.21233484e-06f, -9.74638539e-08f, -1.83335288e-07f,
    3.6900397e-07f, -6.56257725e-07f, -4.83984195e-08f, -4.87495845e-06f, 7.08937364e-07f,
    -2.74512388e-07f, -1.28131961e-09f, -5.36101152e-06f, 2.00457475e-06f, -2.71127902e-08f,
    6.54560637e-08f, -1.65573408e-06f, 3.99729561e-06f, 1.95015602e-07f, 1.93203547e-07f,
    2.37335939e-06f, 5.20825597e-06f, 4.98267127e-07f, 4.29821426e-07f, 2.94582173e-06f,
    3.94841072e-06f, 9.26167559e-07f, 7.88332841e-07f, -1.31287592e-07f, 3.90562832e-07f,
    1.40745999e-06f, 1.20101106e-06f, -3.59070532e-06f, -2.96695112e-06f, 1.7584216e-06f,
    1.50586663e-06f, -4.38960706e-06f, -3.79690823e-06f, 1.78176356e-06f, 1.53382655e-06f,
    -2.65324434e-06f, -2.3305995e-06f, 1.42247325e-06f, 1.23420591e-06f, -5.6415837e-07f,
    -5.13219959e-07f, 8.4020246e-07f, 7.37710764e-07f, 4.43848194e-07f, 3.77411538e-07f,
    2.97202973e-07f, 2.68971888e-07f, 5.02015951e-07f, 4.35237638e-07f, -2.76809651e-08f,
    -1.68409056e-08f, 2.65905669e-07f, 2.33091058e-07f, -1.27889905e-07f, -1.06506e-07f,
    9.29715611e-08f, 8.2852857e-08f, -1.0201768e-07f, -8.77339232e-08f, 2.40681874e-08f,
    2.13017231e-08f, 1.34576112e-07f, -0.0f, -3.21306288e-08f, 0.0f, 1.65775418e-07f, -0.0f,
    -1.25262886e-07f, 0.0f, 3.25962901e-08f, -0.0f, -3.53436917e-07f, 0.0f, -4.00468707e-07f,
    0.0f, -6.63101673e-07f, 0.0f, -1.11665577e-06f, 0.0f, -5.83007932e-07f, 0.0f,
    -1.8812716e-06f, 0.0f, 7.59959221e-07f, -0.0f, -2.34832987e-06f, 0.0f, 3.51993367e-06f,
    -0.0f, -2.31387094e-06f, 0.0f, 5.75045124e-06f, -0.0f, -1.85007229e-06f, 0.0f,
    4.40375879e-06f, -0.0f, -1.21910125e-06f, 0.0f, -1.1427328e-06f, 0.0f, -6.76140189e-07f,
    0.0f, -7.84127042e-06f, 0.0f, -3.42261046e-07f, 0.0f, -1.23027712e-05f, 0.0f,
    -2.33761966e-07f, 0.0f, -1.36895105e-05f, 0.0f, -3.42261046e-07f, 0.0f, -1.23027712e-05f,
    0.0f, -6.76140189e-07f, 0.0f, -7.84127042e-06f, 0.0f, -1.21910125e-06f, 0.0f,
    -1.1427328e-06f, 0.0f, -1.85007229e-06f, 0.0f, 4.40375879e-06f, -0.0f, -2.31387094e-06f,
    0.0f, 5.75045124e-06f, -0.0f, -2.34832987e-06f, 0.0f, 3.51993367e-06f, -0.0f,
    -1.8812716e-06f, 0.0f, 7.59959221e-07f, -0.0f, -1.11665577e-06f, 0.0f, -5.83007932e-07f,
    0.0f, -4.00468707e-07f, 0.0f, -6.63101673e-07f, 0.0f, 3.25962901e-08f, -0.0f,
    -3.53436917e-07f, 0.0f, 1.65775418e-07f, -0.0f, -1.25262886e-07f, 0.0f, 1.34576112e-07f,
    -0.0f, -3.21306288e-08f, 0.0f
};
#define tessary_features_FLAT_ROWS 27 /* a kernel's, one above, one below */
#define tessary_features_FLAT_SPAN 2 /* stretches that a chunk depends on */
/* ---- edge elements: tables */

#define tessary_features_WINDOW 56 /* pixels of the widest disk, in whole eights */

/* The disks of pixels that an edge is fitted in: offsets from the middle, then zeros. */
struct tessary_features_disk {
    int count, padded;
    const double *x, *y;
};

static const double tessary_features_disk_x0[56] = {
    0.0, -2.0, -1.0, 0.0, 1.0, 2.0, -3.0, -2.0, -1.0, 0.0, 1.0, 2.0, 3.0, -3.0, -2.0, -1.0, 0.0,
    1.0, 2.0, 3.0, -4.0, -3.0, -2.0, -1.0, 0.0, 1.0, 2.0, 3.0, 4.0, -3.0, -2.0, -1.0, 0.0, 1.0,
    2.0, 3.0, -3.0, -2.0, -1.0, 0.0, 1.0, 2.0, 3.0, -2.0, -1.0, 0.0, 1.0, 2.0, 0.0, 0.0, 0.0,
    0.0, 0.0, 0.0, 0.0, 0.0
};
static const double tessary_features_disk_y0[56] = {
    -4.0, -3.0, -3.0, -3.0, -3.0, -3.0, -2.0, -2.0, -2.0, -2.0, -2.0, -2.0, -2.0, -1.0, -1.0,
    -1.0, -1.0, -1.0, -1.0, -1.0, 0.0, 0.0, 0.0, 0.0, 0.0, 0.0, 0.0, 0.0, 0.0, 1.0, 1.0, 1.0,
    1.0, 1.0, 1.0, 1.0, 2.0, 2.0, 2.0, 2.0, 2.0, 2.0, 2.0, 3.0, 3.0, 3.0, 3.0, 3.0, 4.0, 0.0,
    0.0, 0.0, 0.0, 0.0, 0.0, 0.0
};
static const double tessary_features_disk_x1[24] = {
    -1.0, 0.0, 1.0, -2.0, -1.0, 0.0, 1.0, 2.0, -2.0, -1.0, 0.0, 1.0, 2.0, -2.0, -1.0, 0.0, 1.0,
    2.0, -1.0, 0.0, 1.0, 0.0, 0.0, 0.0
};
static const double tessary_features_disk_y1[24] = {
    -2.0, -2.0, -2.0, -1.0, -1.0, -1.0, -1.0, -1.0, 0.0, 0.0, 0.0, 0.0, 0.0, 1.0, 1.0, 1.0, 1.0,
    1.0, 2.0, 2.0, 2.0, 0.0, 0.0, 0.0
};
static const struct tessary_features_disk tessary_features_disks[2] = {
    {49, 56, tessary_features_disk_x0, tessary_features_disk_y0},
    {21, 24, tessary_features_disk_x1, tessary_features_disk_y1}
};

/* Largest step of each parameter, and one over the variance of what is known of it before. */
static const double tessary_features_largest_step[6] = {0.5, 0.29999999999999999, 0.0, 0.0, 0.10000000000000001, 0.40000000000000002};
static const double tessary_features_prior[6] = {1.0, 0.0, 0.0, 0.0, 16.0, 2.0408163265306123};

#define tessary_features_LIGHT(i) (0.0 + 1.0 * (double)(i))
#define tessary_features_KNOT(i) ((double)tessary_features_table[(i) + 0])

static double tessary_features_magnitude(double v) { return v < 0.0 ? -v : v; }

/* Sine and cosine of an angle of a few turns; not-a-number for others. */
static void tessary_features_turn(double angle, double *sine, double *cosine)
{
    double k, r, z, s, c;
    int quarter;
    if (!(tessary_features_magnitude(angle) < 1e4)) {
        *sine = *cosine = (angle - angle) / (angle - angle);
        return;
    }
    quarter = (int)(angle * 0.63661977236758134 + (angle < 0.0 ? -0.5 : 0.5));
    k = (double)quarter;
    /* pi / 2 in three parts; the first two times a small whole number are exact */
    r = ((angle - k * 1.5707963267341256) - k * 6.0771005063039659e-11)
        - k * 2.0222662487959506e-21;
    z = r * r;
    s = r + r * z * (-1.0 / 6 + z * (1.0 / 120 + z * (-1.0 / 5040 + z * (1.0 / 362880
        + z * (-1.0 / 39916800 + z * (1.0 / 6227020800.0 - z / 1307674368000.0))))));
    c = 1.0 - z * (0.5 - z * (1.0 / 24 - z * (1.0 / 720 - z * (1.0 / 40320 - z * (1.0 / 3628800
        - z * (1.0 / 479001600 - z * (1.0 / 87178291200.0 - z / 20922789888000.0)))))));
    quarter &= 3;
    *sine = quarter == 0 ? s : quarter == 1 ? c : quarter == 2 ? -s : -c;
    *cosine = quarter == 0 ? c : quarter == 1 ? -s : quarter == 2 ? -c : s;
}

/* The exponential function between e^-50 and e^50; not-a-number beyond. */
static double tessary_features_exp(double x)
{
    double r, sum, power = 1.0, base;
    int k, n;
    if (!(tessary_features_magnitude(x) < 50.0)) return (x - x) / (x - x);
    k = (int)(x * 1.4426950408889634 + (x < 0.0 ? -0.5 : 0.5));
    r = (x - (double)k * 0.69314718036912382) - (double)k * 1.9082149292705877e-10;
    sum = 1.0 + r * (1.0 + r * (1.0 / 2 + r * (1.0 / 6 + r * (1.0 / 24 + r * (1.0 / 120
        + r * (1.0 / 720 + r * (1.0 / 5040 + r * (1.0 / 40320 + r * (1.0 / 362880
        + r * (1.0 / 3628800 + r * (1.0 / 39916800 + r / 479001600)))))))))));
    base = k < 0 ? 0.5 : 2.0;
    for (n = k < 0 ? -k : k; n > 0; --n) power *= base;
    return sum * power;
}

/* Light that a pixel stands for. */
static double tessary_features_to_light(tessary_features_pixel p) { return (double)p; }

/* What the model leaves of the data, and its derivatives; in eights, as vectors take them. */
struct tessary_features_slopes {
    double left[tessary_features_WINDOW];
    double by[6][tessary_features_WINDOW];
};

/* Memory of a fit; a part of the scratch memory. */
struct tessary_features_work {
    double data[tessary_features_WINDOW]; /* working values */
    double weight[tessary_features_WINDOW]; /* one over their noise; 0 outside the picture */
    struct tessary_features_slopes slopes[2];
    double u[tessary_features_WINDOW], shape[tessary_features_WINDOW], slope[tessary_features_WINDOW]; /* of the edge's profile */
    double light[tessary_features_WINDOW], inside[tessary_features_WINDOW], from[tessary_features_WINDOW]; /* of the curve ... */
    double rises[tessary_features_WINDOW], gains[tessary_features_WINDOW], a[tessary_features_WINDOW];
    int at[tessary_features_WINDOW]; /* ... and its knots */
};

/* A blurred edge in a disk of pixels. Its parameters q: position along the normal from the middle
 * pixel, direction of the normal, light on either side, curvature, logarithm of the blur. */
struct tessary_features_problem {
    const struct tessary_features_disk *disk;
    struct tessary_features_work *work;
    int line; /* a line, else a step */
    int blur_known, pixels; /* pixels with a weight */
    double slack; /* how many times farther than usual the edge may lie from its start */
    double start; /* its position */
    double blur, log_blur; /* that is known, or expected */
};

struct tessary_features_fitted {
    double q[6];
    double sd; /* standard error of the position, were the noise as stated */
    double misfit; /* squared residual over the noise's variance, per degree of freedom */
    int ok; /* it settled */
};

/* What was known of a parameter before looking: its middle, and one over its variance. */
static double tessary_features_middle(const struct tessary_features_problem *p, int i)
{
    return i == 0 ? p->start : i == 5 ? p->log_blur : 0.0;
}

static double tessary_features_before(const struct tessary_features_problem *p, int i)
{
    return i == 0 ? tessary_features_prior[0] / (p->slack * p->slack) : tessary_features_prior[i];
}

/* Solve matrix x = right for the parameters that are free. Returns 0 when that cannot be done. */
static int tessary_features_solve(double matrix[6][6], const double *right, const int *is_free, double *x)
{
    double lower[6][6], scaled[6][6], inverse[6], y[6]; /* matrix is lower D lower' */
    int where[6], n = 0, i, j, k;
    for (i = 0; i < 6; ++i) {
        x[i] = 0.0;
        if (is_free[i]) where[n++] = i;
    }
    for (i = 0; i < n; ++i) {
        double pivot = matrix[where[i]][where[i]];
        for (j = 0; j < i; ++j) {
            double sum = matrix[where[i]][where[j]];
            for (k = 0; k < j; ++k) sum -= scaled[i][k] * lower[j][k];
            scaled[i][j] = sum;
            lower[i][j] = sum * inverse[j];
            pivot -= sum * lower[i][j];
        }
        if (!(pivot > 0.0)) return 0;
        inverse[i] = 1.0 / pivot;
        y[i] = right[where[i]];
        for (k = 0; k < i; ++k) y[i] -= lower[i][k] * y[k];
    }
    for (i = n - 1; i >= 0; --i) {
        y[i] *= inverse[i];
        for (k = i + 1; k < n; ++k) y[i] -= lower[k][i] * y[k];
        x[where[i]] = y[i];
    }
    return 1;
}

/* Variance of the position for white noise; x is its row of the inverse normal matrix. */
static double tessary_features_variance(const struct tessary_features_problem *p, const struct tessary_features_slopes *s,
    const double *x)
{
    (void)p;
    (void)s;
    return x[0] > 0.0 ? x[0] : 0.0;
}


static const char *const tessary_features_names[16] = {
    "step_s0_o0",
    "step_s0_o1",
    "step_s0_o2",
    "step_s0_o3",
    "step_s0_o4",
    "step_s0_o5",
    "step_s0_o6",
    "step_s0_o7",
    "line_s0_o0",
    "line_s0_o1",
    "line_s0_o2",
    "line_s0_o3",
    "line_s0_o4",
    "line_s0_o5",
    "line_s0_o6",
    "line_s0_o7"
};

/* ---- the instruction sets */

struct tessary_features_code_of {
    void (*responses)(const float *const *, ptrdiff_t, int, float *, char *, ptrdiff_t, int);
    void (*edges[1])(const float *const *, ptrdiff_t, int, float *, float *,
        unsigned char *);
    void (*fft)(const float *, int, int, int, float *, char *, ptrdiff_t, ptrdiff_t, int);
    void (*half)(const float *, int, int, int, float *, char *, ptrdiff_t, ptrdiff_t, int);
    void (*edges_all)(const float *const *, ptrdiff_t, int, float *, char *, ptrdiff_t,
        unsigned char *, ptrdiff_t);
    void (*range)(const float *, int, float *);
    void (*spread)(const float *const *, int, float *, float *);
};

#if !defined(__GNUC__) || tessary_features_MAX_LANES < 4
#define tessary_features_LANES 1
#else
#define tessary_features_LANES 4
#endif
#define tessary_features_FN(x) tessary_features_##x##_base
#define tessary_features_TARGET
#include "tessary_features.c"
static const struct tessary_features_code_of tessary_features_base = {tessary_features_responses_base, {tessary_features_edges0_base}, tessary_features_fft_block_base,
    NULL, tessary_features_edges_all_base, tessary_features_range_base, tessary_features_spread_base};
#undef tessary_features_LANES
#undef tessary_features_FN
#undef tessary_features_TARGET

#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 8
#define tessary_features_LANES 8
#define tessary_features_FN(x) tessary_features_##x##_avx2
#define tessary_features_TARGET __attribute__((target("avx2,fma")))
#include "tessary_features.c"
static const struct tessary_features_code_of tessary_features_avx2 = {tessary_features_responses_avx2, {tessary_features_edges0_avx2}, tessary_features_fft_block_avx2,
    NULL, tessary_features_edges_all_avx2, tessary_features_range_avx2, tessary_features_spread_avx2};
#undef tessary_features_LANES
#undef tessary_features_FN
#undef tessary_features_TARGET
#endif

#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 16
#define tessary_features_LANES 16
#define tessary_features_FN(x) tessary_features_##x##_avx512
#define tessary_features_TARGET __attribute__((target("avx512f,avx512vl,avx512bw,avx512dq,avx2,fma")))
#include "tessary_features.c"
static const struct tessary_features_code_of tessary_features_avx512 = {tessary_features_responses_avx512, {tessary_features_edges0_avx512}, tessary_features_fft_block_avx512,
    NULL, tessary_features_edges_all_avx512, tessary_features_range_avx512, tessary_features_spread_avx512};
#undef tessary_features_LANES
#undef tessary_features_FN
#undef tessary_features_TARGET
#endif

#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 8
/* What the processor and the operating system hold: asked of the processor itself, as not every
 * compiler's run-time library can tell. 1: AVX2 and FMA, 2: AVX-512 F, VL, BW, DQ, 3: VNNI too. */
static int tessary_features_processor(void)
{
    unsigned a, b, c, d, low, high;
    int known = 0;
    __cpuid(0, a, b, c, d);
    if (a < 7) return 0;
    __cpuid(1, a, b, c, d);
    if ((c & (1u << 27)) == 0) return 0; /* OSXSAVE */
    __asm__ volatile("xgetbv" : "=a"(low), "=d"(high) : "c"(0));
    (void)high;
    if ((low & 0x6u) == 0x6u && (c & (1u << 12)) != 0) {
        __cpuid_count(7, 0, a, b, c, d);
        if ((b & (1u << 5)) != 0) known = 1;
        if (known && (low & 0xe6u) == 0xe6u && (b & 0xc0030000u) == 0xc0030000u) known = 2;
        if (known == 2 && (c & (1u << 11)) != 0) known = 3;
    }
    return known;
}
#endif

static const struct tessary_features_code_of *tessary_features_choose(void)
{
#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 8
    const int known = tessary_features_processor();
#if tessary_features_MAX_LANES >= 16
    if (known >= 2) return &tessary_features_avx512;
#endif
    if (known >= 1) return &tessary_features_avx2;
#endif
    return &tessary_features_base;
}

/* ---- rows of the picture */

struct tessary_features_picture {
    const unsigned char *pixels;
    ptrdiff_t row_bytes;
    int width, height;
};

/* The pixel that stands for one outside 0 .. size - 1 (mirror101); -1: a working value of zero. */
static int tessary_features_border(int i, int size)
{
    return i < 0 ? -i : i >= size ? 2 * size - 2 - i : i;
}

static float tessary_features_value(tessary_features_pixel p, int *bad)
{
    (void)bad;
    return tessary_features_table[p];
}

/* Working values of row y, columns from - radius .. from + count + radius - 1, then zeros up
 * to a whole chunk. Returns 1 when a pixel code was beyond the format, else 0. */
static int tessary_features_fill(const struct tessary_features_picture *p, int y, int from, int count, float *to)
{
    const int end = count + 2 * tessary_features_RADIUS;
    const int inner = p->width - from + tessary_features_RADIUS; /* first index right of the picture */
    const tessary_features_pixel *row;
    int x = 0, bad = 0;
    y = tessary_features_border(y, p->height);
    memset(to + end, 0, (size_t)(tessary_features_LINE - 2 * tessary_features_RADIUS) * sizeof(float));
    if (y < 0) {
        memset(to, 0, (size_t)end * sizeof(float));
        return 0;
    }
    row = (const tessary_features_pixel *)(const void *)(p->pixels + (ptrdiff_t)y * p->row_bytes);
    for (; x < tessary_features_RADIUS - from; ++x) {
        const int i = tessary_features_border(x + from - tessary_features_RADIUS, p->width);
        to[x] = i < 0 ? 0.0f : tessary_features_value(row[i], &bad);
    }
    for (; x < end && x < inner; ++x) to[x] = tessary_features_value(row[x + from - tessary_features_RADIUS], &bad);
    for (; x < end; ++x) {
        const int i = tessary_features_border(x + from - tessary_features_RADIUS, p->width);
        to[x] = i < 0 ? 0.0f : tessary_features_value(row[i], &bad);
    }
    return bad;
}

/* ---- the walk */

struct tessary_features_job {
    int scale; /* -1: responses; the number of scales: all of them */
    char *out; /* planes, or strength */
    ptrdiff_t row_bytes, plane_bytes;
    unsigned char *orientation;
    ptrdiff_t orientation_row_bytes, orientation_plane_bytes;
    int stream;
};

static size_t tessary_features_ring_width(int width)
{
    const int tile = width < tessary_features_TILE ? width : tessary_features_TILE;
    return (size_t)((tile + 15) / 16 * 16 + tessary_features_LINE);
}

/* One row of outputs, columns from .. from + count - 1. */
static void tessary_features_row(const struct tessary_features_code_of *code, const struct tessary_features_job *job,
    const float *const *rows, int from, int count, int y, float *work)
{
    char *const out = job->out + (ptrdiff_t)y * job->row_bytes + (ptrdiff_t)from * 4;
    /* a first, shorter stretch, so that all others begin on a cache line */
    int n = tessary_features_CHUNK - (int)(((uintptr_t)out & 63u) / 4u);
    int x = 0;
    while (x < count) {
        char *const to = out + (ptrdiff_t)x * 4;
        if (n > count - x) n = count - x;
        if (job->scale < 0) {
            code->responses(rows, x, n, work, to, job->plane_bytes, job->stream);
        } else if (job->scale == tessary_features_SCALE_COUNT) {
            code->edges_all(rows, x, n, work, to, job->plane_bytes,
                job->orientation + (ptrdiff_t)y * job->orientation_row_bytes + from + x,
                job->orientation_plane_bytes);
        } else {
            code->edges[job->scale](rows, x, n, work, (float *)(void *)to,
                job->orientation + (ptrdiff_t)y * job->orientation_row_bytes + from + x);
        }
        x += n;
        n = tessary_features_CHUNK;
    }
}

static int tessary_features_walk(const struct tessary_features_picture *p, const struct tessary_features_job *job, int first, int count,
    void *scratch)
{
    const struct tessary_features_code_of *const code = tessary_features_choose();
    const size_t width = tessary_features_ring_width(p->width);
    float *const ring = (float *)(void *)((unsigned char *)scratch +
        ((64u - ((uintptr_t)scratch & 63u)) & 63u));
    float *const work = ring + tessary_features_SIZE * width;
    int bad = 0, from;
    for (from = 0; from < p->width; from += tessary_features_TILE) {
        const int part = p->width - from < tessary_features_TILE ? p->width - from : tessary_features_TILE;
        const float *rows[tessary_features_SIZE];
        int y, j;
        for (j = 0; j < tessary_features_SIZE - 1; ++j) {
            bad |= tessary_features_fill(p, first + j - tessary_features_RADIUS, from, part, ring + (size_t)j * width);
        }
        for (y = 0; y < count; ++y) {
            const int last = (y + tessary_features_SIZE - 1) % tessary_features_SIZE;
            bad |= tessary_features_fill(p, first + y + tessary_features_RADIUS, from, part, ring + (size_t)last * width);
            for (j = 0; j < tessary_features_SIZE; ++j) {
                rows[j] = ring + (size_t)((y + j) % tessary_features_SIZE) * width;
            }
            tessary_features_row(code, job, rows, from, part, y, work);
        }
    }
#if defined(__GNUC__) && defined(__SSE2__)
    if (job->stream) _mm_sfence();
#endif
    return bad ? tessary_features_BAD_PIXEL : tessary_features_OK;
}

/* ---- arguments */

static ptrdiff_t tessary_features_reach(ptrdiff_t stride)
{
    if (stride >= 0) return stride;
    return stride < -PTRDIFF_MAX ? PTRDIFF_MAX : -stride;
}

static int tessary_features_check_picture(const struct tessary_features_picture *p, int first, int count)
{
    const ptrdiff_t pixel = (ptrdiff_t)sizeof(tessary_features_pixel);
    if (p->pixels == NULL) return tessary_features_NO_IMAGE;
    if (p->width < tessary_features_SIZE || p->width > tessary_features_LONGEST) return tessary_features_BAD_WIDTH;
    if (p->height < tessary_features_SIZE || p->height > tessary_features_LONGEST) return tessary_features_BAD_HEIGHT;
    if ((uintptr_t)p->pixels % sizeof(tessary_features_pixel) != 0 || p->row_bytes % pixel != 0)
        return tessary_features_IMAGE_MISALIGNED;
    if (tessary_features_reach(p->row_bytes) < p->width * pixel) return tessary_features_BAD_ROW_BYTES;
    if (first < 0 || count < 1 || first > p->height - count) return tessary_features_BAD_ROWS;
    return tessary_features_OK;
}

/* Do rows or planes of the output overlap? Planes may lie one after the other, or be
 * interleaved row by row. */
static int tessary_features_overlap(ptrdiff_t row, ptrdiff_t plane, ptrdiff_t bytes, int rows, int planes)
{
    row = tessary_features_reach(row);
    plane = tessary_features_reach(plane);
    if (planes == 1) return 0;
    if (plane < bytes) return 1;
    if ((plane - bytes) / row >= rows - 1) return 0;
    return (row - bytes) / plane < planes - 1;
}

/* Check the arguments of a call that writes planes of values of some bytes, and fill in the job. */
static int tessary_features_check_planes(struct tessary_features_picture *p, struct tessary_features_job *job, const tessary_features_pixel *image,
    ptrdiff_t row_bytes, int width, int height, int first, int count, char *out,
    ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, int bytes, const void *scratch)
{
    int code;
    p->pixels = (const unsigned char *)image;
    p->row_bytes = row_bytes;
    p->width = width;
    p->height = height;
    code = tessary_features_check_picture(p, first, count);
    if (code != tessary_features_OK) return code;
    if (out == NULL) return tessary_features_NO_OUTPUT;
    if ((uintptr_t)out % (unsigned)bytes != 0 || out_row_bytes % bytes != 0 ||
        out_plane_bytes % bytes != 0)
        return tessary_features_OUTPUT_MISALIGNED;
    if (tessary_features_reach(out_row_bytes) < (ptrdiff_t)width * bytes) return tessary_features_BAD_OUTPUT_ROW_BYTES;
    if (tessary_features_overlap(out_row_bytes, out_plane_bytes, (ptrdiff_t)width * bytes, count,
            tessary_features_KERNEL_COUNT))
        return tessary_features_BAD_OUTPUT_PLANE_BYTES;
    if (scratch == NULL) return tessary_features_NO_SCRATCH;
    job->scale = -1;
    job->out = out;
    job->row_bytes = out_row_bytes;
    job->plane_bytes = out_plane_bytes;
    job->orientation = NULL;
    job->orientation_row_bytes = 0;
    job->orientation_plane_bytes = 0;
    /* judged by the whole picture: bands of one picture are usually made side by side */
    job->stream = (double)bytes * tessary_features_KERNEL_COUNT * width * height >= tessary_features_STREAM_FROM;
    return tessary_features_OK;
}

static int tessary_features_check_edges(struct tessary_features_picture *p, struct tessary_features_job *job, const tessary_features_pixel *image,
    ptrdiff_t row_bytes, int width, int height, int first, int count, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, const void *scratch)
{
    int code;
    p->pixels = (const unsigned char *)image;
    p->row_bytes = row_bytes;
    p->width = width;
    p->height = height;
    code = tessary_features_check_picture(p, first, count);
    if (code != tessary_features_OK) return code;
    if (scale < 0 || scale >= tessary_features_SCALE_COUNT) return tessary_features_BAD_SCALE;
    if (strength == NULL) return tessary_features_NO_STRENGTH;
    if ((uintptr_t)strength % 4u != 0 || strength_row_bytes % 4 != 0)
        return tessary_features_STRENGTH_MISALIGNED;
    if (tessary_features_reach(strength_row_bytes) < (ptrdiff_t)width * 4) return tessary_features_BAD_STRENGTH_ROW_BYTES;
    if (orientation == NULL) return tessary_features_NO_ORIENTATION;
    if (tessary_features_reach(orientation_row_bytes) < width) return tessary_features_BAD_ORIENTATION_ROW_BYTES;
    if (scratch == NULL) return tessary_features_NO_SCRATCH;
    job->scale = scale;
    job->out = (char *)strength;
    job->row_bytes = strength_row_bytes;
    job->plane_bytes = 0;
    job->orientation = orientation;
    job->orientation_row_bytes = orientation_row_bytes;
    job->orientation_plane_bytes = 0;
    job->stream = 0;
    return tessary_features_OK;
}

/* ---- tile transforms */

/* Blocks start at whole multiples of their height, so every band gives the same bits. */
static int tessary_features_walk_fft(const struct tessary_features_picture *p, const struct tessary_features_job *job, int first, int count,
    void *scratch)
{
    const struct tessary_features_code_of *const code = tessary_features_choose();
    float *const block = (float *)(void *)((unsigned char *)scratch +
        ((64u - ((uintptr_t)scratch & 63u)) & 63u));
    float *const work = block + tessary_features_FFT_LENGTH * tessary_features_FFT_ROW;
    int bad = 0, top;
    for (top = first / tessary_features_FFT_VALID * tessary_features_FFT_VALID; top < first + count; top += tessary_features_FFT_VALID) {
        const int begin = top < first ? first : top;
        const int end = first + count - top < tessary_features_FFT_VALID ? first + count : top + tessary_features_FFT_VALID;
        char *const out = job->out + (ptrdiff_t)(begin - first) * job->row_bytes;
        int n = tessary_features_CHUNK - (int)(((uintptr_t)out & 63u) / 4u), x = 0;
        while (x < p->width) {
            int j;
            if (n > p->width - x) n = p->width - x;
            for (j = 0; j < tessary_features_FFT_LENGTH; ++j) {
                const int y = top + j - tessary_features_FFT_SIZE / 2;
                float *const row = block + j * tessary_features_FFT_ROW;
                if (y < p->height + tessary_features_FFT_SIZE / 2) {
                    const int wrong = tessary_features_fill(p, y, x, n, row);
                    /* a code that no row of this band depends on is not its concern */
                    if (y >= begin - tessary_features_FFT_SIZE / 2 && y < end + tessary_features_FFT_SIZE / 2) bad |= wrong;
                    memset(row + n + 2 * tessary_features_RADIUS, 0,
                        (size_t)(tessary_features_FFT_ROW - n - 2 * tessary_features_RADIUS) * sizeof(float));
                } else {
                    memset(row, 0, tessary_features_FFT_ROW * sizeof(float));
                }
            }
            code->fft(block, begin - top, end - top, n, work, out + (ptrdiff_t)x * 4,
                job->row_bytes, job->plane_bytes, job->stream);
            x += n;
            n = tessary_features_CHUNK;
        }
    }
#if defined(__GNUC__) && defined(__SSE2__)
    if (job->stream) _mm_sfence();
#endif
    return bad ? tessary_features_BAD_PIXEL : tessary_features_OK;
}

/* ---- edges above a threshold: flat stretches are skipped */

struct tessary_features_flat {
    float threshold;
    uint64_t skipped;
};

static size_t tessary_features_flat_stretches(int width)
{
    const int tile = width < tessary_features_TILE ? width : tessary_features_TILE;
    return (size_t)((tile + tessary_features_CHUNK - 1) / tessary_features_CHUNK + tessary_features_FLAT_SPAN - 1);
}

/* Floats of a row: one value before it, and whole stretches. */
static size_t tessary_features_flat_pitch(int width)
{
    return 16 + tessary_features_flat_stretches(width) * tessary_features_CHUNK + tessary_features_LINE;
}

/* Row y with its neighbours' halo, and the ranges of its stretches, which begin one value before the
 * chunks: what a chunk and its neighbours depend on begins there. */
static int tessary_features_flat_fill(const struct tessary_features_code_of *code, const struct tessary_features_picture *p, int y, int from,
    int part, float *row, float *range)
{
    const int end = part + 2 * tessary_features_RADIUS;
    const int stretches = (int)tessary_features_flat_stretches(part);
    int bad, x;
    /* beyond the halo of the rim there is no neighbour: the outermost row stands for it */
    if (y < -tessary_features_RADIUS) y = -tessary_features_RADIUS;
    if (y >= p->height + tessary_features_RADIUS) y = p->height + tessary_features_RADIUS - 1;
    bad = tessary_features_fill(p, y, from, part, row);
    row[-1] = row[0];
    for (x = end; x < stretches * tessary_features_CHUNK + tessary_features_CHUNK; ++x) row[x] = row[end - 1];
    code->range(row - 1, stretches, range);
    return bad;
}

/* One row of outputs. The chunks begin at whole multiples of their width, so that every band and
 * every address skips the same. */
static void tessary_features_flat_row(const struct tessary_features_code_of *code, const struct tessary_features_job *job,
    struct tessary_features_flat *flat, const float *const *rows, const float *const *ranges,
    int from, int part, int rest, int y, float *work)
{
    static const float bounds[1][3] = {{7.95169115f, 0.0f, 0.0658461824f}};
    const float *const b = bounds[job->scale];
    float *const strength = (float *)(void *)(job->out + (ptrdiff_t)y * job->row_bytes) + from;
    unsigned char *const turn = job->orientation + (ptrdiff_t)y * job->orientation_row_bytes + from;
    int x;
    for (x = 0; x < part; x += tessary_features_CHUNK) {
        const int n = part - x < tessary_features_CHUNK ? part - x : tessary_features_CHUNK;
        /* neighbours beyond a seam of the ring are not seen */
        const int seam = (x == 0 && from > 0) || (x + n == part && rest > 0);
        float low, high;
        code->spread(ranges, x / tessary_features_CHUNK, &low, &high);
        if (!seam && b[0] * (high - low) + b[1] * (low < 0.0f ? -low : low) + b[2] < flat->threshold) {
            memset(strength + x, 0, (size_t)n * sizeof(float));
            memset(turn + x, 0, (size_t)n);
            flat->skipped += (uint64_t)n;
        } else {
            code->edges[job->scale](rows, x, n, work, strength + x, turn + x);
        }
    }
}

static int tessary_features_walk_flat(const struct tessary_features_picture *p, const struct tessary_features_job *job,
    struct tessary_features_flat *flat, int first, int count, void *scratch)
{
    const struct tessary_features_code_of *const code = tessary_features_choose();
    const size_t pitch = tessary_features_flat_pitch(p->width);
    const size_t ranged = tessary_features_flat_stretches(p->width) * 32;
    float *const ring = (float *)(void *)((unsigned char *)scratch +
        ((64u - ((uintptr_t)scratch & 63u)) & 63u)) + 16;
    float *const range = ring - 16 + tessary_features_FLAT_ROWS * pitch;
    float *const work = range + tessary_features_FLAT_ROWS * ranged;
    int bad = 0, from;
    for (from = 0; from < p->width; from += tessary_features_TILE) {
        const int part = p->width - from < tessary_features_TILE ? p->width - from : tessary_features_TILE;
        const float *rows[tessary_features_FLAT_ROWS], *ranges[tessary_features_FLAT_ROWS];
        int y, j;
        for (j = 0; j < tessary_features_FLAT_ROWS - 1; ++j) {
            const int wrong = tessary_features_flat_fill(code, p, first + j - tessary_features_RADIUS - 1, from, part,
                ring + (size_t)j * pitch, range + (size_t)j * ranged);
            if (j > 0) bad |= wrong; /* the row before the halo is no concern of this band */
        }
        for (y = 0; y < count; ++y) {
            const int last = (y + tessary_features_FLAT_ROWS - 1) % tessary_features_FLAT_ROWS;
            const int wrong = tessary_features_flat_fill(code, p, first + y + tessary_features_RADIUS + 1, from, part,
                ring + (size_t)last * pitch, range + (size_t)last * ranged);
            if (y + 1 < count) bad |= wrong;
            for (j = 0; j < tessary_features_FLAT_ROWS; ++j) {
                rows[j] = ring + (size_t)((y + j) % tessary_features_FLAT_ROWS) * pitch;
                ranges[j] = range + (size_t)((y + j) % tessary_features_FLAT_ROWS) * ranged;
            }
            tessary_features_flat_row(code, job, flat, rows + 1, ranges, from, part, p->width - from - part, y, work);
        }
    }
    return bad ? tessary_features_BAD_PIXEL : tessary_features_OK;
}

/* ---- fixed point */

struct tessary_features_code_of_q {
    uint64_t (*responses)(const int16_t *const *, ptrdiff_t, int, void *, char *, ptrdiff_t, int);
    void (*edges[1])(const int16_t *const *, ptrdiff_t, int, void *, float *,
        unsigned char *);
};

static const struct tessary_features_code_of_q tessary_features_q_base = {tessary_features_q_responses_base, {tessary_features_q_edges0_base}};
#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 8
static const struct tessary_features_code_of_q tessary_features_q_avx2 = {tessary_features_q_responses_avx2, {tessary_features_q_edges0_avx2}};
#endif
#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 16
static const struct tessary_features_code_of_q tessary_features_q_avx512 = {tessary_features_q_responses_avx512, {tessary_features_q_edges0_avx512}};
#endif

static const struct tessary_features_code_of_q *tessary_features_choose_q(void)
{
#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 8
    const int known = tessary_features_processor();
#if tessary_features_MAX_LANES >= 16
    if (known >= 3) return &tessary_features_q_avx512;
#endif
    if (known >= 1) return &tessary_features_q_avx2;
#endif
    return &tessary_features_q_base;
}

static int16_t tessary_features_value_q(tessary_features_pixel p, int *bad)
{
    (void)bad;
    return tessary_features_codes[p];
}

/* As tessary_features_fill, in codes. */
static int tessary_features_fill_q(const struct tessary_features_picture *p, int y, int from, int count, int16_t *to)
{
    const int end = count + 2 * tessary_features_RADIUS;
    const int inner = p->width - from + tessary_features_RADIUS;
    const tessary_features_pixel *row;
    int x = 0, bad = 0;
    y = tessary_features_border(y, p->height);
    memset(to + end, 0, (size_t)(tessary_features_LINE_Q - 2 * tessary_features_RADIUS) * sizeof(int16_t));
    if (y < 0) {
        memset(to, 0, (size_t)end * sizeof(int16_t));
        return 0;
    }
    row = (const tessary_features_pixel *)(const void *)(p->pixels + (ptrdiff_t)y * p->row_bytes);
    for (; x < tessary_features_RADIUS - from; ++x) {
        const int i = tessary_features_border(x + from - tessary_features_RADIUS, p->width);
        to[x] = (int16_t)(i < 0 ? 0 : tessary_features_value_q(row[i], &bad));
    }
    for (; x < end && x < inner; ++x) to[x] = tessary_features_value_q(row[x + from - tessary_features_RADIUS], &bad);
    for (; x < end; ++x) {
        const int i = tessary_features_border(x + from - tessary_features_RADIUS, p->width);
        to[x] = (int16_t)(i < 0 ? 0 : tessary_features_value_q(row[i], &bad));
    }
    return bad;
}

static size_t tessary_features_ring_width_q(int width)
{
    const int tile = width < tessary_features_TILE ? width : tessary_features_TILE;
    return (size_t)((tile + 31) / 32 * 32 + tessary_features_LINE_Q);
}

/* One row of outputs; returns how many counts stand at the ends of their range. */
static uint64_t tessary_features_row_q(const struct tessary_features_code_of_q *code, const struct tessary_features_job *job,
    const int16_t *const *rows, int from, int count, int y, void *work)
{
    const int bytes = job->scale < 0 ? 2 : 4;
    char *const out = job->out + (ptrdiff_t)y * job->row_bytes + (ptrdiff_t)from * bytes;
    int n = tessary_features_CHUNK - (int)(((uintptr_t)out & 63u) / (unsigned)bytes);
    uint64_t ends = 0;
    int x = 0;
    while (x < count) {
        char *const to = out + (ptrdiff_t)x * bytes;
        if (n > count - x) n = count - x;
        if (job->scale < 0) {
            ends += code->responses(rows, x, n, work, to, job->plane_bytes, job->stream);
        } else {
            code->edges[job->scale](rows, x, n, work, (float *)(void *)to,
                job->orientation + (ptrdiff_t)y * job->orientation_row_bytes + from + x);
        }
        x += n;
        n = tessary_features_CHUNK;
    }
    return ends;
}

static int tessary_features_walk_q(const struct tessary_features_picture *p, const struct tessary_features_job *job, int first, int count,
    uint64_t *saturated, void *scratch)
{
    const struct tessary_features_code_of_q *const code = tessary_features_choose_q();
    const size_t width = tessary_features_ring_width_q(p->width);
    int16_t *const ring = (int16_t *)(void *)((unsigned char *)scratch +
        ((64u - ((uintptr_t)scratch & 63u)) & 63u));
    void *const work = ring + tessary_features_SIZE * width;
    uint64_t ends = 0;
    int bad = 0, from;
    for (from = 0; from < p->width; from += tessary_features_TILE) {
        const int part = p->width - from < tessary_features_TILE ? p->width - from : tessary_features_TILE;
        const int16_t *rows[tessary_features_SIZE];
        int y, j;
        for (j = 0; j < tessary_features_SIZE - 1; ++j) {
            bad |= tessary_features_fill_q(p, first + j - tessary_features_RADIUS, from, part, ring + (size_t)j * width);
        }
        for (y = 0; y < count; ++y) {
            const int last = (y + tessary_features_SIZE - 1) % tessary_features_SIZE;
            bad |= tessary_features_fill_q(p, first + y + tessary_features_RADIUS, from, part, ring + (size_t)last * width);
            for (j = 0; j < tessary_features_SIZE; ++j) {
                rows[j] = ring + (size_t)((y + j) % tessary_features_SIZE) * width;
            }
            ends += tessary_features_row_q(code, job, rows, from, part, y, work);
        }
    }
#if defined(__GNUC__) && defined(__SSE2__)
    if (job->stream) _mm_sfence();
#endif
    if (saturated != NULL) *saturated = ends;
    return bad ? tessary_features_BAD_PIXEL : tessary_features_OK;
}

float tessary_features_q_step(int index)
{
    static const float steps[16] = {
        0.0133973919f, 0.0133973919f, 0.0133973919f, 0.0133973919f, 0.0133973919f,
        0.0133973919f, 0.0133973919f, 0.0133973919f, 0.0133973919f, 0.0133973919f,
        0.0133973919f, 0.0133973919f, 0.0133973919f, 0.0133973919f, 0.0133973919f, 0.0133973919f
    };
    return index < 0 || index >= tessary_features_KERNEL_COUNT ? 0.0f : steps[index];
}

int tessary_features_responses_q_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int16_t *out, ptrdiff_t out_row_bytes,
    ptrdiff_t out_plane_bytes, uint64_t *saturated, void *scratch)
{
    struct tessary_features_picture p;
    struct tessary_features_job job;
    const int code = tessary_features_check_planes(&p, &job, image, row_bytes, width, height, first_row,
        row_count, (char *)out, out_row_bytes, out_plane_bytes, 2, scratch);
    if (code != tessary_features_OK) return code;
    return tessary_features_walk_q(&p, &job, first_row, row_count, saturated, scratch);
}

int tessary_features_responses_q(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int16_t *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, uint64_t *saturated,
    void *scratch)
{
    return tessary_features_responses_q_rows(image, row_bytes, width, height, 0, height,
        out, out_row_bytes, out_plane_bytes, saturated, scratch);
}

int tessary_features_edges_q_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch)
{
    struct tessary_features_picture p;
    struct tessary_features_job job;
    const int code = tessary_features_check_edges(&p, &job, image, row_bytes, width, height, first_row,
        row_count, scale, strength, strength_row_bytes, orientation, orientation_row_bytes,
        scratch);
    if (code != tessary_features_OK) return code;
    return tessary_features_walk_q(&p, &job, first_row, row_count, NULL, scratch);
}

int tessary_features_edges_q(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch)
{
    return tessary_features_edges_q_rows(image, row_bytes, width, height, 0, height, scale,
        strength, strength_row_bytes, orientation, orientation_row_bytes, scratch);
}

/* ---- what a program calls */

int tessary_features_abi(void) { return tessary_features_ABI; }

int tessary_features_kernel_count(void) { return tessary_features_KERNEL_COUNT; }

int tessary_features_scale_count(void) { return tessary_features_SCALE_COUNT; }

const char *tessary_features_kernel_name(int index)
{
    return index < 0 || index >= tessary_features_KERNEL_COUNT ? NULL : tessary_features_names[index];
}

const char *tessary_features_message(int code)
{
    switch (code) {
    case tessary_features_OK: return "success";
    case tessary_features_NO_IMAGE: return "image is NULL";
    case tessary_features_BAD_WIDTH: return "width is smaller than a kernel, or larger than 16777216";
    case tessary_features_BAD_HEIGHT: return "height is smaller than a kernel, or larger than 16777216";
    case tessary_features_IMAGE_MISALIGNED: return "image or row_bytes is not a multiple of the pixel's size";
    case tessary_features_BAD_ROW_BYTES: return "row_bytes is smaller than a row of pixels";
    case tessary_features_BAD_ROWS: return "first_row and row_count do not lie inside the picture";
    case tessary_features_BAD_SCALE: return "there is no such scale in this bank";
    case tessary_features_NO_OUTPUT: return "out is NULL";
    case tessary_features_OUTPUT_MISALIGNED: return "out, out_row_bytes or out_plane_bytes is not a multiple of a value's size";
    case tessary_features_BAD_OUTPUT_ROW_BYTES: return "out_row_bytes is smaller than a row of values";
    case tessary_features_BAD_OUTPUT_PLANE_BYTES: return "out_plane_bytes makes the planes overlap";
    case tessary_features_NO_STRENGTH: return "strength is NULL";
    case tessary_features_STRENGTH_MISALIGNED: return "strength or strength_row_bytes is not a multiple of 4";
    case tessary_features_BAD_STRENGTH_ROW_BYTES: return "strength_row_bytes is smaller than a row of floats";
    case tessary_features_NO_ORIENTATION: return "orientation is NULL";
    case tessary_features_BAD_ORIENTATION_ROW_BYTES: return "orientation_row_bytes is smaller than a row";
    case tessary_features_NO_SCRATCH: return "scratch is NULL";
    case tessary_features_BAD_PIXEL: return "a pixel code is beyond the pixel format; the output is not to be used";
    case tessary_features_NO_COUNT: return "count is NULL";
    case tessary_features_BAD_THRESHOLD: return "a threshold is not between 1e-20 and 1e30, or no kernels find such edges";
    case tessary_features_NO_EDGELS: return "out is NULL and capacity is not 0";
    case tessary_features_EDGELS_MISALIGNED: return "out is not a multiple of 4";
    case tessary_features_TOO_MANY: return "there are more edgels than capacity; those that had room were written";
    case tessary_features_TOO_LARGE: return "the picture has too many pixels for the edgels' scratch memory";
    case tessary_features_BAD_STRENGTH_PLANE_BYTES: return "strength_plane_bytes: planes overlap, or no multiple of 4";
    case tessary_features_BAD_ORIENTATION_PLANE_BYTES: return "orientation_plane_bytes makes the planes overlap";
    default: return "unknown code";
    }
}

size_t tessary_features_scratch_bytes(int width, int height)
{
    size_t bytes;
    if (width < tessary_features_SIZE || width > tessary_features_LONGEST) return 0;
    if (height < tessary_features_SIZE || height > tessary_features_LONGEST) return 0;
    bytes = (tessary_features_SIZE * tessary_features_ring_width(width) + tessary_features_SCRATCH) * sizeof(float) + 64;
    {
        const size_t codes = tessary_features_SIZE * tessary_features_ring_width_q(width) * sizeof(int16_t)
            + tessary_features_SCRATCH_Q + 64;
        if (codes > bytes) bytes = codes;
    }
    if (tessary_features_FFT_SCRATCH > bytes) bytes = tessary_features_FFT_SCRATCH;
    {
        const size_t flat = (tessary_features_FLAT_ROWS * (tessary_features_flat_pitch(width)
            + 32 * tessary_features_flat_stretches(width)) + tessary_features_SCRATCH) * sizeof(float) + 64;
        if (flat > bytes) bytes = flat;
    }
    return bytes;
}

int tessary_features_responses_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count,
    float *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, void *scratch)
{
    struct tessary_features_picture p;
    struct tessary_features_job job;
    int code = tessary_features_check_planes(&p, &job, image, row_bytes, width, height, first_row,
        row_count, (char *)out, out_row_bytes, out_plane_bytes, 4, scratch);
    if (code != tessary_features_OK) return code;
    if (code == tessary_features_OK || code == tessary_features_BAD_PIXEL) {
        const int other = tessary_features_walk_fft(&p, &job, first_row, row_count, scratch);
        if (other != tessary_features_OK) code = other;
    }
    return code;
}

int tessary_features_responses(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    float *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, void *scratch)
{
    return tessary_features_responses_rows(image, row_bytes, width, height, 0, height,
        out, out_row_bytes, out_plane_bytes, scratch);
}

int tessary_features_edges_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch)
{
    struct tessary_features_picture p;
    struct tessary_features_job job;
    const int code = tessary_features_check_edges(&p, &job, image, row_bytes, width, height, first_row,
        row_count, scale, strength, strength_row_bytes, orientation, orientation_row_bytes,
        scratch);
    if (code != tessary_features_OK) return code;
    return tessary_features_walk(&p, &job, first_row, row_count, scratch);
}

int tessary_features_edges(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch)
{
    return tessary_features_edges_rows(image, row_bytes, width, height, 0, height, scale,
        strength, strength_row_bytes, orientation, orientation_row_bytes, scratch);
}

int tessary_features_edges_above_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale, float threshold,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, uint64_t *skipped, void *scratch)
{
    struct tessary_features_picture p;
    struct tessary_features_job job;
    int code = tessary_features_check_edges(&p, &job, image, row_bytes, width, height, first_row,
        row_count, scale, strength, strength_row_bytes, orientation, orientation_row_bytes,
        scratch);
    if (code != tessary_features_OK) return code;
    {
        struct tessary_features_flat flat;
        flat.threshold = threshold;
        flat.skipped = 0;
        code = tessary_features_walk_flat(&p, &job, &flat, first_row, row_count, scratch);
        if (skipped != NULL) *skipped = flat.skipped;
    }
    return code;
}

int tessary_features_edges_above(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height, int scale,
    float threshold, float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, uint64_t *skipped, void *scratch)
{
    return tessary_features_edges_above_rows(image, row_bytes, width, height, 0, height, scale, threshold,
        strength, strength_row_bytes, orientation, orientation_row_bytes, skipped, scratch);
}

int tessary_features_edges_all_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count,
    float *strength, ptrdiff_t strength_row_bytes, ptrdiff_t strength_plane_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, ptrdiff_t orientation_plane_bytes,
    void *scratch)
{
    struct tessary_features_picture p;
    struct tessary_features_job job;
    const int code = tessary_features_check_edges(&p, &job, image, row_bytes, width, height, first_row,
        row_count, 0, strength, strength_row_bytes, orientation, orientation_row_bytes, scratch);
    if (code != tessary_features_OK) return code;
    if (strength_plane_bytes % 4 != 0 || tessary_features_overlap(strength_row_bytes, strength_plane_bytes,
            (ptrdiff_t)width * 4, row_count, tessary_features_SCALE_COUNT))
        return tessary_features_BAD_STRENGTH_PLANE_BYTES;
    if (tessary_features_overlap(orientation_row_bytes, orientation_plane_bytes, width, row_count, tessary_features_SCALE_COUNT))
        return tessary_features_BAD_ORIENTATION_PLANE_BYTES;
    job.scale = tessary_features_SCALE_COUNT;
    job.plane_bytes = strength_plane_bytes;
    job.orientation_plane_bytes = orientation_plane_bytes;
    return tessary_features_walk(&p, &job, first_row, row_count, scratch);
}

int tessary_features_edges_all(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    float *strength, ptrdiff_t strength_row_bytes, ptrdiff_t strength_plane_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, ptrdiff_t orientation_plane_bytes,
    void *scratch)
{
    return tessary_features_edges_all_rows(image, row_bytes, width, height, 0, height,
        strength, strength_row_bytes, strength_plane_bytes,
        orientation, orientation_row_bytes, orientation_plane_bytes, scratch);
}


/* ---- edge elements */

typedef void (*tessary_features_fit_function)(const struct tessary_features_problem *, struct tessary_features_fitted *);

static tessary_features_fit_function tessary_features_choose_fit(void)
{
#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 8
    const int known = tessary_features_processor();
#if tessary_features_MAX_LANES >= 16
    if (known >= 2) return tessary_features_fit_avx512;
#endif
    if (known >= 1) return tessary_features_fit_avx2;
#endif
    return tessary_features_fit_base;
}

#define tessary_features_BAND 80 /* rows of responses that are held at once */
#define tessary_features_ABOVE 2 /* rows about an element that its start reads */
#define tessary_features_BELOW 3

/* The largest response of some kernels, and which one it is. */
struct tessary_features_plane {
    int count;
    const int *even, *odd; /* NULL: the other alone; both: the root of the sum of squares */
};

/* One pixel along each direction: the cell's offset, and the place inside it. */
struct tessary_features_along {
    signed char x, y;
    float u, v, left_u, left_v; /* left_u is 1 - u */
};

/* One scale of one kind of edges. */
struct tessary_features_map {
    int scale, plane, rival; /* planes; rival is -1 where there is none */
    int rival_of_lines; /* the rival has a say only where lines are looked for too */
    int reach, around; /* pixels at the border left out; half side of "around" */
    float own, other; /* shares of the largest strength around, and of the largest rival */
    const struct tessary_features_along *ahead, *behind;
    int apart; /* how far its elements must be from those of finer scales */
    int softer, soft_around; /* map that soft edges are left to, or -1, and what it looks at */
    float least; /* share of that map's strength that this one's must have */
    int disk; /* the wide one; the narrow one follows */
    int blur_free; /* the blur is not the camera's */
    double slack, step_blur, log_step_blur, line_blur, log_line_blur;
    const double *angle, *cosine, *sine, *slope_odd, *slope_even;
};

static const int tessary_features_odd0[8] = {0, 1, 2, 3, 4, 5, 6, 7};
static const int tessary_features_even0[8] = {8, 9, 10, 11, 12, 13, 14, 15};
static const struct tessary_features_plane tessary_features_planes[1] = {
    {8, tessary_features_even0, tessary_features_odd0}
};
static const struct tessary_features_along tessary_features_ahead0[8] = {
    {0, 0, 1.0f, 0.0f, 0.0f, 1.0f},
    {0, 0, 0.923879504f, 0.382683426f, 0.0761204958f, 0.617316604f},
    {0, 0, 0.707106769f, 0.707106769f, 0.292893231f, 0.292893231f},
    {0, 0, 0.382683426f, 0.923879504f, 0.617316604f, 0.0761204958f},
    {0, 0, 6.12323426e-17f, 1.0f, 1.0f, 0.0f},
    {-1, 0, 0.617316544f, 0.923879504f, 0.382683456f, 0.0761204958f},
    {-1, 0, 0.292893231f, 0.707106769f, 0.707106769f, 0.292893231f},
    {-1, 0, 0.076120466f, 0.382683426f, 0.923879504f, 0.617316604f}
};
static const struct tessary_features_along tessary_features_behind0[8] = {
    {-1, 0, 0.0f, 1.22464685e-16f, 1.0f, 1.0f},
    {-1, -1, 0.076120466f, 0.617316544f, 0.923879504f, 0.382683456f},
    {-1, -1, 0.292893231f, 0.292893231f, 0.707106769f, 0.707106769f},
    {-1, -1, 0.617316544f, 0.076120466f, 0.382683456f, 0.923879504f},
    {-1, -1, 1.0f, 0.0f, 0.0f, 1.0f},
    {0, -1, 0.382683426f, 0.076120466f, 0.617316604f, 0.923879504f},
    {0, -1, 0.707106769f, 0.292893231f, 0.292893231f, 0.707106769f},
    {0, -1, 0.923879504f, 0.617316544f, 0.0761204958f, 0.382683456f}
};
static const double tessary_features_angle0[8] = {
    0.0, 0.39269908169872414, 0.78539816339744828, 1.1780972450961724, 1.5707963267948966,
    1.9634954084936207, 2.3561944901923448, 2.748893571891069
};
static const double tessary_features_cosine0[8] = {
    1.0, 0.92387953251128674, 0.70710678118654757, 0.38268343236508984, 6.123233995736766e-17,
    -0.38268343236508973, -0.70710678118654746, -0.92387953251128674
};
static const double tessary_features_sine0[8] = {
    0.0, 0.38268343236508978, 0.70710678118654746, 0.92387953251128674, 1.0,
    0.92387953251128674, 0.70710678118654757, 0.38268343236508989
};
static const double tessary_features_slope_odd0[8] = {
    0.61237243484958204, 0.61237472501478551, 0.61237304318494257, 0.61237472501478551,
    0.61237243484958193, 0.6123747250147854, 0.61237304318494246, 0.61237472501478563
};
static const double tessary_features_slope_even0[8] = {
    0.79056941834541938, 0.79066449718929954, 0.79067305909225027, 0.79066449718929943,
    0.79056941834541949, 0.79066449718929754, 0.79067305909212404, 0.79066449718929743
};
static const struct tessary_features_map tessary_features_maps[1] = {
    {0, 0, -1, 0, 9, 5, 0.0f, 0.0f,
     tessary_features_ahead0, tessary_features_behind0, 2, -1, 0, 0.0f, 0, 0,
     1.0, 0.79655233233793987, -0.22746244891788103, 1.0, 0.0,
     tessary_features_angle0, tessary_features_cosine0, tessary_features_sine0, tessary_features_slope_odd0, tessary_features_slope_even0}
};
static const int tessary_features_first_map[2] = {0, 1};

/* Everything that a call has to carry. */
struct tessary_features_search {
    struct tessary_features_picture picture;
    float *strength; /* planes, one after the other */
    unsigned char *turn;
    unsigned char *found[1]; /* 1 + number of the map that found an element, else 0 */
    unsigned char *weak;
    int *stack;
    float *band;
    int band_first; /* first row in the band */
    void *inner; /* scratch of the responses */
    struct tessary_features_work *work;
    int lines_too;
};

static size_t tessary_features_step64(size_t bytes) { return (bytes + 63) / 64 * 64; }

size_t tessary_features_edgels_scratch_bytes(int width, int height)
{
    const size_t inner = tessary_features_scratch_bytes(width, height);
    size_t area;
    double all;
    int rows;
    if (inner == 0 || height > 2147483647 / width) return 0;
    rows = height < tessary_features_BAND + tessary_features_ABOVE + tessary_features_BELOW ? height : tessary_features_BAND + tessary_features_ABOVE + tessary_features_BELOW;
    area = (size_t)width * (size_t)height;
    all = (double)inner + (double)area * (1 * 5 + 1 + 5) + 1024.0
        + (double)sizeof(struct tessary_features_work) + 4.0 * tessary_features_KERNEL_COUNT * (double)rows * (double)width;
    if (all >= (double)((size_t)-1 / 2)) return 0;
    return 64 + tessary_features_step64(sizeof(struct tessary_features_work)) + tessary_features_step64(inner)
        + tessary_features_step64(area * 1 * 4) + tessary_features_step64(area * 1)
        + (1 + 1) * tessary_features_step64(area) + tessary_features_step64(area * 4)
        + tessary_features_step64(4 * tessary_features_KERNEL_COUNT * (size_t)rows * (size_t)width);
}

static void tessary_features_lay_out(struct tessary_features_search *s, void *scratch)
{
    const size_t area = (size_t)s->picture.width * (size_t)s->picture.height;
    unsigned char *at = (unsigned char *)scratch + ((64u - ((uintptr_t)scratch & 63u)) & 63u);
    int k;
    s->work = (struct tessary_features_work *)(void *)at;
    at += tessary_features_step64(sizeof(struct tessary_features_work));
    s->inner = at;
    at += tessary_features_step64(tessary_features_scratch_bytes(s->picture.width, s->picture.height));
    s->strength = (float *)(void *)at;
    at += tessary_features_step64(area * 1 * 4);
    s->turn = at;
    at += tessary_features_step64(area * 1);
    for (k = 0; k < 1; ++k) {
        s->found[k] = at;
        at += tessary_features_step64(area);
    }
    s->weak = at;
    at += tessary_features_step64(area);
    s->stack = (int *)(void *)at;
    at += tessary_features_step64(area * 4);
    s->band = (float *)(void *)at;
}

/* Responses of rows first .. first + count - 1. */
static int tessary_features_fill_band(struct tessary_features_search *s, int first, int count)
{
    const ptrdiff_t row = (ptrdiff_t)s->picture.width * 4;
    s->band_first = first;
    return tessary_features_responses_rows((const tessary_features_pixel *)(const void *)s->picture.pixels,
        s->picture.row_bytes, s->picture.width, s->picture.height, first, count, s->band, row,
        row * (tessary_features_BAND + tessary_features_ABOVE + tessary_features_BELOW < s->picture.height
            ? tessary_features_BAND + tessary_features_ABOVE + tessary_features_BELOW : s->picture.height), s->inner);
}

static const float *tessary_features_band_row(const struct tessary_features_search *s, int kernel, int y)
{
    const int rows = tessary_features_BAND + tessary_features_ABOVE + tessary_features_BELOW < s->picture.height
        ? tessary_features_BAND + tessary_features_ABOVE + tessary_features_BELOW : s->picture.height;
    return s->band + ((size_t)kernel * (size_t)rows + (size_t)(y - s->band_first))
        * (size_t)s->picture.width;
}

/* ---- strengths and thinning */

static void tessary_features_strongest(struct tessary_features_search *s, int number, int y)
{
    const struct tessary_features_plane *const p = &tessary_features_planes[number];
    const size_t width = (size_t)s->picture.width;
    const size_t at = ((size_t)number * (size_t)s->picture.height + (size_t)y) * width;
    float *const best = s->strength + at;
    unsigned char *const turn = s->turn + at;
    size_t x;
    int j;
    for (j = 0; j < p->count; ++j) {
        const float *const a = tessary_features_band_row(s, p->odd ? p->odd[j] : p->even[j], y);
        const float *const b = p->odd && p->even ? tessary_features_band_row(s, p->even[j], y) : NULL;
        for (x = 0; x < width; ++x) {
            float v = a[x] < 0.0f ? -a[x] : a[x];
            if (b) v = (float)sqrt((double)a[x] * (double)a[x] + (double)b[x] * (double)b[x]);
            if (j == 0 || v > best[x]) {
                best[x] = v;
                turn[x] = (unsigned char)j;
            }
        }
    }
}

/* A product rounded to float by itself: no compiler may fuse it with the sum that follows. */
static float tessary_features_times(float a, float b) { return (float)((double)a * (double)b); }

/* Bilinear sample one pixel along a direction. */
static float tessary_features_beside(const float *here, ptrdiff_t width, const struct tessary_features_along *a)
{
    const float *const c = here + (ptrdiff_t)a->y * width + a->x;
    const float upper = tessary_features_times(a->left_u, c[0]) + tessary_features_times(a->u, c[1]);
    const float lower = tessary_features_times(a->left_u, c[width]) + tessary_features_times(a->u, c[width + 1]);
    return tessary_features_times(a->left_v, upper) + tessary_features_times(a->v, lower);
}

/* Is a strength at least a share of all values of a plane around it? */
static int tessary_features_stands(const struct tessary_features_search *s, int plane, int around, int x, int y, float share,
    float strength)
{
    const int w = s->picture.width, h = s->picture.height;
    const int left = x < around ? 0 : x - around, right = w - 1 - x < around ? w - 1 : x + around;
    const int top = y < around ? 0 : y - around, end = h - 1 - y < around ? h - 1 : y + around;
    const float *row = s->strength + ((size_t)plane * (size_t)h + (size_t)top) * (size_t)w;
    int i, j;
    for (j = top; j <= end; ++j, row += w) {
        for (i = left; i <= right; ++i) {
            if (!(strength >= tessary_features_times(share, row[i]))) return 0;
        }
    }
    return 1;
}

/* The largest value of a plane around a pixel. */
static float tessary_features_largest(const struct tessary_features_search *s, int plane, int around, int x, int y)
{
    const int w = s->picture.width, h = s->picture.height;
    const int left = x < around ? 0 : x - around, right = w - 1 - x < around ? w - 1 : x + around;
    const int top = y < around ? 0 : y - around, end = h - 1 - y < around ? h - 1 : y + around;
    const float *row = s->strength + ((size_t)plane * (size_t)h + (size_t)top) * (size_t)w;
    float best = row[left];
    int i, j;
    for (j = top; j <= end; ++j, row += w) {
        for (i = left; i <= right; ++i) {
            if (row[i] > best) best = row[i];
        }
    }
    return best;
}

/* Is an edge sharp enough for a map, or is it left to an octave? */
static int tessary_features_is_sharp(const struct tessary_features_search *s, const struct tessary_features_map *m, int x, int y)
{
    const int other = tessary_features_maps[m->softer].plane;
    const float own = tessary_features_largest(s, m->plane, m->soft_around, x, y);
    const float theirs = tessary_features_largest(s, other, m->soft_around, x, y);
    return own >= tessary_features_times(m->least, theirs) + 0.5f;
}

/* Mark the thinned elements of a map: 1 from low on, 2 from high on. */
static void tessary_features_thin(const struct tessary_features_search *s, const struct tessary_features_map *m, float low, float high)
{
    const int w = s->picture.width, h = s->picture.height;
    const int rim = m->reach > 1 ? m->reach : 1;
    const size_t area = (size_t)w * (size_t)h;
    const float *const plane = s->strength + (size_t)m->plane * area;
    const unsigned char *const turns = s->turn + (size_t)m->plane * area;
    const float least = low > 1e-30f ? low : 1e-30f;
    int x, y;
    memset(s->weak, 0, area);
    for (y = rim; y < h - rim; ++y) {
        for (x = rim; x < w - rim; ++x) {
            const size_t at = (size_t)y * (size_t)w + (size_t)x;
            const float own = plane[at];
            const int turn = turns[at];
            if (!(own >= least)) continue;
            if (!(own > tessary_features_beside(plane + at, w, &m->ahead[turn]))) continue;
            if (!(own >= tessary_features_beside(plane + at, w, &m->behind[turn]))) continue;
            if (m->own > 0.0f && !tessary_features_stands(s, m->plane, m->around, x, y, m->own, own)) continue;
            if (m->rival >= 0 && (s->lines_too || !m->rival_of_lines) &&
                !tessary_features_stands(s, m->rival, m->around, x, y, m->other, own))
                continue;
            if (m->softer >= 0 && !tessary_features_is_sharp(s, m, x, y)) continue;
            s->weak[at] = (unsigned char)(own >= high ? 2 : own >= low ? 1 : 0);
        }
    }
}

/* Weak elements that hang together with a strong one become strong. */
static void tessary_features_hang_on(const struct tessary_features_search *s)
{
    const int w = s->picture.width, area = w * s->picture.height;
    int at, depth = 0;
    for (at = 0; at < area; ++at) {
        if (s->weak[at] == 2) s->stack[depth++] = at;
    }
    while (depth > 0) {
        const int from = s->stack[--depth];
        int dx, dy;
        for (dy = -1; dy <= 1; ++dy) {
            for (dx = -1; dx <= 1; ++dx) {
                /* elements never lie on the rim, so all eight neighbours are in the picture */
                const int to = from + dy * w + dx;
                if (s->weak[to] == 1) {
                    s->weak[to] = 2;
                    s->stack[depth++] = to;
                }
            }
        }
    }
}

/* Take over a map's elements where finer maps found nothing near. */
static size_t tessary_features_add(const struct tessary_features_search *s, unsigned char *found, int number)
{
    const int w = s->picture.width, h = s->picture.height, mark = number + 1;
    const int apart = tessary_features_maps[number].apart, beyond = (2 * apart + 1) * (2 * apart + 1);
    size_t count = 0;
    int x, y, dx, dy;
    for (y = 0; y < h; ++y) {
        for (x = 0; x < w; ++x) {
            const size_t at = (size_t)y * (size_t)w + (size_t)x;
            int clear = s->weak[at] == 2;
            if (!clear) continue;
            for (dy = -apart; clear && dy <= apart; ++dy) {
                for (dx = -apart; dx <= apart; ++dx) {
                    if (4 * (dx * dx + dy * dy) < beyond && x + dx >= 0 && x + dx < w &&
                        y + dy >= 0 && y + dy < h) {
                        const int other = found[(size_t)(y + dy) * (size_t)w + (size_t)(x + dx)];
                        if (other != 0 && other != mark) clear = 0;
                    }
                }
            }
            if (clear) {
                found[at] = (unsigned char)mark;
                ++count;
            }
        }
    }
    return count;
}

/* ---- where the responses alone put an element */

struct tessary_features_start {
    double offset, theta, sd;
    int kind;
};

static int tessary_features_within(int i, int size) { return i < 0 ? 0 : i >= size ? size - 1 : i; }

/* Weights of cubic convolution; Keys 1981. */
static void tessary_features_cubic(double t, double *w)
{
    w[0] = ((-0.5 * t + 1.0) * t - 0.5) * t;
    w[1] = (1.5 * t - 2.5) * t * t + 1.0;
    w[2] = ((-1.5 * t + 2.0) * t + 0.5) * t;
    w[3] = (0.5 * t - 0.5) * t * t;
}

static double tessary_features_sample(const struct tessary_features_search *s, int kernel, double y, double x)
{
    /* y and x are not far below 0 */
    const int y0 = (int)(y + 2.0) - 2, x0 = (int)(x + 2.0) - 2;
    double across[4], down[4], total = 0.0;
    int i, j;
    tessary_features_cubic(y - y0, down);
    tessary_features_cubic(x - x0, across);
    for (j = 0; j < 4; ++j) {
        const float *const row =
            tessary_features_band_row(s, kernel, tessary_features_within(y0 + j - 1, s->picture.height));
        double line = 0.0;
        for (i = 0; i < 4; ++i)
            line += across[i] * (double)row[tessary_features_within(x0 + i - 1, s->picture.width)];
        total += down[j] * line;
    }
    return total;
}

/* Place of the top of a parabola through values at -1, 0 and 1. */
static double tessary_features_parabola(double before, double here, double after, double reach, double *bend)
{
    double top = 0.0;
    *bend = before - 2.0 * here + after;
    if (*bend < 0.0) {
        top = (before - after) / (2.0 * *bend);
        if (top > reach) top = reach;
        if (top < -reach) top = -reach;
    } else {
        *bend = 0.0;
    }
    return top;
}

/* Response in a lattice direction that may run off either end. */
static double tessary_features_turned(const struct tessary_features_search *s, const int *members, int count, int turn,
    int odd, int x, int y)
{
    const int off = turn < 0 || turn >= count;
    const int kernel = members[turn < 0 ? turn + count : turn >= count ? turn - count : turn];
    const double value = (double)tessary_features_band_row(s, kernel, y)[x];
    return odd && off ? -value : value;
}

static void tessary_features_begin(const struct tessary_features_search *s, const struct tessary_features_map *m, int x, int y, int turn,
    struct tessary_features_start *b)
{
    const struct tessary_features_plane *const p = &tessary_features_planes[m->plane];
    int step = p->odd != NULL;
    const int *members;
    const double far = m->slack;
    double here, sign, before, after, bend, tilt, spare;
    if (p->odd != NULL && p->even != NULL) {
        const float o = tessary_features_band_row(s, p->odd[turn], y)[x];
        const float e = tessary_features_band_row(s, p->even[turn], y)[x];
        step = (o < 0.0f ? -o : o) >= (e < 0.0f ? -e : e);
    }
    members = step ? p->odd : p->even;
    here = (double)tessary_features_band_row(s, members[turn], y)[x];
    sign = here < 0.0 ? -1.0 : 1.0;
    before = sign * tessary_features_sample(s, members[turn], y - far * m->sine[turn],
        x - far * m->cosine[turn]);
    after = sign * tessary_features_sample(s, members[turn], y + far * m->sine[turn],
        x + far * m->cosine[turn]);
    b->offset = far * tessary_features_parabola(before, sign * here, after, 1.0, &bend);
    b->sd = far * (step ? m->slope_odd : m->slope_even)[turn] / (-bend > 1e-9 ? -bend : 1e-9);
    b->sd = far * (b->sd < 1.0 ? b->sd : 1.0);
    tilt = 0.0;
    if (p->count > 2) {
        before = sign * tessary_features_turned(s, members, p->count, turn - 1, step, x, y);
        after = sign * tessary_features_turned(s, members, p->count, turn + 1, step, x, y);
        tilt = tessary_features_parabola(before, sign * here, after, 0.5, &spare);
    }
    b->theta = m->angle[turn] + tilt * 3.1415926535897931 / p->count;
    b->kind = step ? tessary_features_STEP : sign > 0.0 ? tessary_features_BRIGHT_LINE : tessary_features_DARK_LINE;
    if (step && sign < 0.0) {
        b->theta += 3.1415926535897931;
        b->offset = -b->offset;
    }
}

/* ---- the place */

#define tessary_features_LOST 1e300 /* standard error of a fit that is not to be trusted */

/* Fit in one of the disks. Returns the standard error. */
static double tessary_features_fit_disk(const struct tessary_features_search *s, const struct tessary_features_map *m, int x, int y,
    const struct tessary_features_start *b, int disk, tessary_features_fit_function fit, struct tessary_features_fitted *f)
{
    struct tessary_features_problem p;
    struct tessary_features_work *const work = s->work;
    double sine, cosine, level[2][2] = {{0.0, 0.0}, {0.0, 0.0}}, moved;
    int i, rises, bad = 0;
    p.disk = &tessary_features_disks[disk];
    p.line = b->kind != tessary_features_STEP;
    p.work = work;
    p.pixels = 0;
    p.slack = m->slack;
    p.start = b->offset;
    p.blur = p.line ? m->line_blur : m->step_blur;
    p.log_blur = p.line ? m->log_line_blur : m->log_step_blur;
    p.blur_known = !p.line && !m->blur_free && 1;
    tessary_features_turn(b->theta, &sine, &cosine);
    for (i = 0; i < p.disk->padded; ++i) {
        const int px = x + (int)p.disk->x[i], py = y + (int)p.disk->y[i];
        const int inside = px >= 0 && px < s->picture.width && py >= 0 && py < s->picture.height;
        const tessary_features_pixel *const row = (const tessary_features_pixel *)(const void *)(s->picture.pixels
            + (ptrdiff_t)tessary_features_within(py, s->picture.height) * s->picture.row_bytes);
        const double u = (p.disk->x[i] * cosine + p.disk->y[i] * sine - b->offset) / p.blur;
        const double away = tessary_features_magnitude(u);
        const tessary_features_pixel pixel = row[tessary_features_within(px, s->picture.width)];
        work->data[i] = (double)tessary_features_value(pixel, &bad);
        work->weight[i] = 0.0;
        if (i >= p.disk->count) continue;
        work->weight[i] = inside ? 1.0 : 0.0;
        p.pixels += inside;
        {
            const double light = tessary_features_to_light(pixel);
            const int low = p.line ? away > 2.0 : u < -1.0, high = p.line ? away < 0.7 : u > 1.0;
            const double down = (low ? work->weight[i] : 0.0) + 1e-6;
            const double up = (high ? work->weight[i] : 0.0) + 1e-6;
            level[0][0] += down * light;
            level[0][1] += down;
            level[1][0] += up * light;
            level[1][1] += up;
        }
    }
    f->q[0] = b->offset;
    f->q[1] = b->theta;
    f->q[2] = level[0][0] / level[0][1];
    f->q[3] = level[1][0] / level[1][1];
    /* levels that differ by a rounding are equal: its sign must not choose the first step */
    if (tessary_features_magnitude(f->q[3] - f->q[2]) <= 1.0000000000000001e-09 * tessary_features_magnitude(f->q[2]))
        f->q[3] = f->q[2];
    f->q[4] = 0.0;
    f->q[5] = p.log_blur;
    fit(&p, f);
    rises = f->q[3] > f->q[2];
    if (p.line) rises = rises == (b->kind == tessary_features_BRIGHT_LINE);
    moved = tessary_features_magnitude(f->q[0] - b->offset);
    if (!f->ok || !rises || !(moved <= m->slack * 1.5)) return tessary_features_LOST;
    return f->sd * sqrt(f->misfit > 1.0 ? f->misfit : 1.0);
}

static void tessary_features_place(const struct tessary_features_search *s, int kind, int x, int y, tessary_features_fit_function fit,
    struct tessary_features_edgel *to)
{
    const int w = s->picture.width;
    const size_t at = (size_t)y * (size_t)w + (size_t)x;
    const struct tessary_features_map *const m = &tessary_features_maps[s->found[kind][at] - 1];
    const size_t plane = (size_t)m->plane * (size_t)w * (size_t)s->picture.height;
    struct tessary_features_start b;
    struct tessary_features_fitted wide, near;
    double sd, spread, sine, cosine, whole;
    int turns;
    tessary_features_begin(s, m, x, y, s->turn[plane + at], &b);
    sd = tessary_features_fit_disk(s, m, x, y, &b, m->disk, fit, &wide);
    if (wide.misfit > 1.8 || sd >= tessary_features_LOST) { /* other edges near pull at it */
        const double again = tessary_features_fit_disk(s, m, x, y, &b, m->disk + 1, fit, &near);
        if (again < sd) {
            sd = again;
            wide = near;
        }
    }
    spread = 0.0;
    if (sd < tessary_features_LOST) {
        b.offset = wide.q[0];
        b.theta = wide.q[1];
        if (b.kind != tessary_features_STEP) spread = tessary_features_exp(wide.q[5]);
    } else {
        sd = b.sd;
    }
    tessary_features_turn(b.theta, &sine, &cosine);
    to->x = (float)(x + b.offset * cosine);
    to->y = (float)(y + b.offset * sine);
    whole = b.kind == tessary_features_STEP ? 6.2831853071795862 : 3.1415926535897931;
    b.theta += b.kind == tessary_features_STEP ? 3.1415926535897931 : 0.0;
    turns = (int)(b.theta / whole);
    if (whole * turns > b.theta) --turns;
    b.theta -= whole * turns;
    to->theta = (float)(b.theta - (b.kind == tessary_features_STEP ? 3.1415926535897931 : 0.0));
    to->strength = s->strength[plane + at];
    to->sd = (float)sd;
    spread = spread * spread - 0.63449561815301181;
    to->width = (float)sqrt(12.0 * (spread > 0.0 ? spread : 0.0));
    to->scale = (unsigned char)m->scale;
    to->kind = (unsigned char)b.kind;
    to->unused[0] = to->unused[1] = 0;
}

/* Place every element that there is room for, row by row. */
static int tessary_features_place_all(struct tessary_features_search *s, struct tessary_features_edgel *out, size_t capacity)
{
    const tessary_features_fit_function fit = tessary_features_choose_fit();
    const int w = s->picture.width, h = s->picture.height;
    size_t done = 0;
    int x, y, kind;
    s->band_first = h;
    for (y = 0; y < h && done < capacity; ++y) {
        for (kind = 0; kind < 1; ++kind) {
            const unsigned char *const found = s->found[kind] + (size_t)y * (size_t)w;
            for (x = 0; x < w && done < capacity; ++x) {
                if (!found[x]) continue;
                if (s->band_first == h || y >= s->band_first + tessary_features_ABOVE + tessary_features_BAND) {
                    const int first = y < tessary_features_ABOVE ? 0 : y - tessary_features_ABOVE;
                    const int rows = tessary_features_BAND + tessary_features_ABOVE + tessary_features_BELOW;
                    const int code = tessary_features_fill_band(s, first, h - first < rows ? h - first : rows);
                    if (code != tessary_features_OK) return code;
                }
                tessary_features_place(s, kind, x, y, fit, out + done++);
            }
        }
    }
    return tessary_features_OK;
}

/* Find the elements of every kind and scale. */
static int tessary_features_find(struct tessary_features_search *s, const double *high, size_t *count)
{
    const size_t area = (size_t)s->picture.width * (size_t)s->picture.height;
    int y, first, k, number;
    for (first = 0; first < s->picture.height; first += tessary_features_BAND) {
        const int left = s->picture.height - first;
        const int code = tessary_features_fill_band(s, first, left < tessary_features_BAND ? left : tessary_features_BAND);
        if (code != tessary_features_OK) return code;
        for (y = first; y < first + tessary_features_BAND && y < s->picture.height; ++y) {
            for (k = 0; k < 1; ++k) tessary_features_strongest(s, k, y);
        }
    }
    for (k = 0; k < 1; ++k) {
        const double ratio = k == 0 ? tessary_features_HYSTERESIS_RATIO : 0.69999999999999996;
        memset(s->found[k], 0, area);
        for (number = tessary_features_first_map[k]; high[k] > 0.0 && number < tessary_features_first_map[k + 1]; ++number) {
            tessary_features_thin(s, &tessary_features_maps[number], (float)(ratio * high[k]), (float)high[k]);
            tessary_features_hang_on(s);
            *count += tessary_features_add(s, s->found[k], number);
        }
    }
    return tessary_features_OK;
}

int tessary_features_edgels(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    double threshold, double line_threshold,
    struct tessary_features_edgel *out, size_t capacity, size_t *count, void *scratch)
{
    struct tessary_features_search s;
    double high[2];
    int code;
    if (count == NULL) return tessary_features_NO_COUNT;
    *count = 0;
    s.picture.pixels = (const unsigned char *)image;
    s.picture.row_bytes = row_bytes;
    s.picture.width = width;
    s.picture.height = height;
    code = tessary_features_check_picture(&s.picture, 0, height > 0 ? height : 1);
    if (code != tessary_features_OK) return code;
    if (tessary_features_edgels_scratch_bytes(width, height) == 0) return tessary_features_TOO_LARGE;
    high[0] = threshold;
    high[1] = line_threshold;
    if (!(threshold >= 0.0 && line_threshold >= 0.0 && threshold <= 1e30 &&
          line_threshold <= 1e30 && (threshold >= 1e-20 || threshold == 0.0) &&
          (line_threshold >= 1e-20 || line_threshold == 0.0)))
        return tessary_features_BAD_THRESHOLD;
    if ((threshold == 0.0 && line_threshold == 0.0) || (line_threshold > 0.0 && 1 == 1))
        return tessary_features_BAD_THRESHOLD;
    if (out == NULL && capacity > 0) return tessary_features_NO_EDGELS;
    if ((uintptr_t)out % sizeof(float) != 0) return tessary_features_EDGELS_MISALIGNED;
    if (scratch == NULL) return tessary_features_NO_SCRATCH;
    s.lines_too = threshold > 0.0 && line_threshold > 0.0;
    tessary_features_lay_out(&s, scratch);
    code = tessary_features_find(&s, high, count);
    if (code == tessary_features_OK) code = tessary_features_place_all(&s, out, capacity);
    if (code != tessary_features_OK) *count = 0;
    return code == tessary_features_OK && *count > capacity ? tessary_features_TOO_MANY : code;
}

#endif
