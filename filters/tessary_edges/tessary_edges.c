/* tessary_edges: the code of the bank; tessary_edges.h describes it.
 *
 * The content of this folder is its maker's own. The parts that come from patchlab's
 * templates are granted to everyone for any use, without conditions or attribution.
 *
 * How it works: the picture is walked from top to bottom, once. A ring holds the
 * working values of the last 13 rows. For every stretch of tessary_edges_CHUNK output pixels
 * the rows of the ring are folded (added and subtracted about the middle row) and
 * dotted with the plan's coefficients; a kernel's response is a signed sum of such
 * products. Kernels by tile transforms, where the plan has any, take blocks of rows instead.
 * The plan: parity, 564 multiplies a pixel.
 *
 * This file includes itself once for every instruction set, with tessary_edges_LANES set to the
 * floats in one vector. -Dtessary_edges_MAX_LANES=1 leaves nothing but plain C.
 */
#if defined(tessary_edges_LANES)

/* ============================================== read once for every instruction set */

#if tessary_edges_LANES == 1
typedef float tessary_edges_FN(vec);
typedef float tessary_edges_FN(any);
#else
typedef float tessary_edges_FN(vec) __attribute__((vector_size(4 * tessary_edges_LANES)));
typedef float tessary_edges_FN(any) __attribute__((vector_size(4 * tessary_edges_LANES), aligned(4), may_alias));
#endif

#define tessary_edges_LOAD(p) (*(const tessary_edges_FN(any) *)(const void *)(p))
#define tessary_edges_STORE(p, v) (*(tessary_edges_FN(any) *)(void *)(p) = (v))

#if tessary_edges_LANES == 16
#define tessary_edges_MUL_ADD(sum, v, k) \
    ((sum) = (tessary_edges_FN(vec))_mm512_fmadd_ps((__m512)(v), _mm512_set1_ps(k), (__m512)(sum)))
#define tessary_edges_STREAM(p, v) _mm512_stream_ps((p), (__m512)(v))
#define tessary_edges_TAKE(v, turn)                                                            \
    do {                                                                             \
        const __mmask16 m = _mm512_cmp_ps_mask((__m512)(v), (__m512)best, _CMP_GT_OQ); \
        best = (tessary_edges_FN(vec))_mm512_mask_mov_ps((__m512)best, m, (__m512)(v));        \
        who = (tessary_edges_FN(vec))_mm512_mask_mov_ps((__m512)who, m, _mm512_set1_ps(turn)); \
    } while (0)
#elif tessary_edges_LANES == 8
#define tessary_edges_MUL_ADD(sum, v, k) \
    ((sum) = (tessary_edges_FN(vec))_mm256_fmadd_ps((__m256)(v), _mm256_set1_ps(k), (__m256)(sum)))
#define tessary_edges_STREAM(p, v) _mm256_stream_ps((p), (__m256)(v))
#define tessary_edges_TAKE(v, turn)                                                            \
    do {                                                                             \
        const __m256 m = _mm256_cmp_ps((__m256)(v), (__m256)best, _CMP_GT_OQ);       \
        best = (tessary_edges_FN(vec))_mm256_blendv_ps((__m256)best, (__m256)(v), m);          \
        who = (tessary_edges_FN(vec))_mm256_blendv_ps((__m256)who, _mm256_set1_ps(turn), m);   \
    } while (0)
#elif tessary_edges_LANES == 4 && defined(__aarch64__)
#define tessary_edges_MUL_ADD(sum, v, k) \
    ((sum) = (tessary_edges_FN(vec))vfmaq_n_f32((float32x4_t)(sum), (float32x4_t)(v), (k)))
#else
#define tessary_edges_MUL_ADD(sum, v, k) ((sum) += (v) * (k))
#if tessary_edges_LANES == 4 && defined(__SSE2__)
#define tessary_edges_STREAM(p, v) _mm_stream_ps((p), (__m128)(v))
#endif
#endif

/* Keep the largest value so far and whose it is; among equals the first stays. */
#if tessary_edges_LANES == 1
#define tessary_edges_TAKE(v, turn)        \
    do {                         \
        if ((v) > best) {        \
            best = (v);          \
            who = (turn);        \
        }                        \
    } while (0)
#define tessary_edges_ABS(v) ((v) < 0.0f ? -(v) : (v))
#else
typedef int tessary_edges_FN(bits) __attribute__((vector_size(4 * tessary_edges_LANES)));
#ifndef tessary_edges_TAKE
#define tessary_edges_TAKE(v, turn)                                                            \
    do {                                                                             \
        const tessary_edges_FN(bits) m = (v) > best;                                           \
        const tessary_edges_FN(vec) t_ = (v) - (v) + (turn);                                   \
        best = (tessary_edges_FN(vec))(((tessary_edges_FN(bits))(v) & m) | ((tessary_edges_FN(bits))best & ~m));   \
        who = (tessary_edges_FN(vec))(((tessary_edges_FN(bits))t_ & m) | ((tessary_edges_FN(bits))who & ~m));      \
    } while (0)
#endif
#define tessary_edges_ABS(v) ((tessary_edges_FN(vec))((tessary_edges_FN(bits))(v) & 0x7fffffff))
#endif

/* The middle row, then the sums and then the differences of the rows about it. */
static tessary_edges_TARGET void tessary_edges_FN(fold)(const float *const *rows, ptrdiff_t at, float *s)
{
    int j, x;
    for (x = 0; x < tessary_edges_LINE; x += tessary_edges_LANES) {
        tessary_edges_STORE(s + x, tessary_edges_LOAD(rows[tessary_edges_RADIUS] + at + x));
    }
    for (j = 1; j <= tessary_edges_RADIUS; ++j) {
        const float *const below = rows[tessary_edges_RADIUS + j] + at;
        const float *const above = rows[tessary_edges_RADIUS - j] + at;
        float *const sum = s + (ptrdiff_t)j * tessary_edges_LINE;
        float *const difference = s + (ptrdiff_t)(tessary_edges_RADIUS + j) * tessary_edges_LINE;
        for (x = 0; x < tessary_edges_LINE; x += tessary_edges_LANES) {
            const tessary_edges_FN(vec) b = tessary_edges_LOAD(below + x), a = tessary_edges_LOAD(above + x);
            tessary_edges_STORE(sum + x, b + a);
            tessary_edges_STORE(difference + x, b - a);
        }
    }
}

/* 1 x 6 x 4 coefficients, even in y, odd in x */
static tessary_edges_TARGET void tessary_edges_FN(group0)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += 2 * tessary_edges_LANES) {
        const float *k = tessary_edges_group0_taps;
        tessary_edges_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        int j, i;
        for (j = 0; j < 6; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_edges_LINE + x + tessary_edges_RADIUS;
            for (i = 1; i < 5; ++i) {
                const tessary_edges_FN(vec) p = tessary_edges_LOAD(r + i) - tessary_edges_LOAD(r - i);
                const tessary_edges_FN(vec) q = tessary_edges_LOAD(r + tessary_edges_LANES + i) - tessary_edges_LOAD(r + tessary_edges_LANES - i);
                tessary_edges_MUL_ADD(a0, p, k[0]);
                tessary_edges_MUL_ADD(b0, q, k[0]);
                k += 1;
            }
        }
        tessary_edges_STORE(t + 0 * tessary_edges_CHUNK + x, a0);
        tessary_edges_STORE(t + 0 * tessary_edges_CHUNK + x + tessary_edges_LANES, b0);
    }
}

/* 3 x 6 x 5 coefficients, even in y, odd in x */
static tessary_edges_TARGET void tessary_edges_FN(group1)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += 2 * tessary_edges_LANES) {
        const float *k = tessary_edges_group1_taps;
        tessary_edges_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_edges_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_edges_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        int j, i;
        for (j = 0; j < 6; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_edges_LINE + x + tessary_edges_RADIUS;
            for (i = 1; i < 6; ++i) {
                const tessary_edges_FN(vec) p = tessary_edges_LOAD(r + i) - tessary_edges_LOAD(r - i);
                const tessary_edges_FN(vec) q = tessary_edges_LOAD(r + tessary_edges_LANES + i) - tessary_edges_LOAD(r + tessary_edges_LANES - i);
                tessary_edges_MUL_ADD(a0, p, k[0]);
                tessary_edges_MUL_ADD(b0, q, k[0]);
                tessary_edges_MUL_ADD(a1, p, k[1]);
                tessary_edges_MUL_ADD(b1, q, k[1]);
                tessary_edges_MUL_ADD(a2, p, k[2]);
                tessary_edges_MUL_ADD(b2, q, k[2]);
                k += 3;
            }
        }
        tessary_edges_STORE(t + 1 * tessary_edges_CHUNK + x, a0);
        tessary_edges_STORE(t + 1 * tessary_edges_CHUNK + x + tessary_edges_LANES, b0);
        tessary_edges_STORE(t + 3 * tessary_edges_CHUNK + x, a1);
        tessary_edges_STORE(t + 3 * tessary_edges_CHUNK + x + tessary_edges_LANES, b1);
        tessary_edges_STORE(t + 5 * tessary_edges_CHUNK + x, a2);
        tessary_edges_STORE(t + 5 * tessary_edges_CHUNK + x + tessary_edges_LANES, b2);
    }
}

/* 1 x 4 x 6 coefficients, odd in y, even in x */
static tessary_edges_TARGET void tessary_edges_FN(group2)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += 2 * tessary_edges_LANES) {
        const float *k = tessary_edges_group2_taps;
        tessary_edges_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        int j, i;
        for (j = 7; j < 11; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_edges_LINE + x + tessary_edges_RADIUS;
            {
                const tessary_edges_FN(vec) p = tessary_edges_LOAD(r);
                const tessary_edges_FN(vec) q = tessary_edges_LOAD(r + tessary_edges_LANES);
                tessary_edges_MUL_ADD(a0, p, k[0]);
                tessary_edges_MUL_ADD(b0, q, k[0]);
                k += 1;
            }
            for (i = 1; i < 6; ++i) {
                const tessary_edges_FN(vec) p = tessary_edges_LOAD(r + i) + tessary_edges_LOAD(r - i);
                const tessary_edges_FN(vec) q = tessary_edges_LOAD(r + tessary_edges_LANES + i) + tessary_edges_LOAD(r + tessary_edges_LANES - i);
                tessary_edges_MUL_ADD(a0, p, k[0]);
                tessary_edges_MUL_ADD(b0, q, k[0]);
                k += 1;
            }
        }
        tessary_edges_STORE(t + 7 * tessary_edges_CHUNK + x, a0);
        tessary_edges_STORE(t + 7 * tessary_edges_CHUNK + x + tessary_edges_LANES, b0);
    }
}

/* 3 x 5 x 6 coefficients, odd in y, even in x */
static tessary_edges_TARGET void tessary_edges_FN(group3)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += 2 * tessary_edges_LANES) {
        const float *k = tessary_edges_group3_taps;
        tessary_edges_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_edges_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_edges_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        int j, i;
        for (j = 7; j < 12; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_edges_LINE + x + tessary_edges_RADIUS;
            {
                const tessary_edges_FN(vec) p = tessary_edges_LOAD(r);
                const tessary_edges_FN(vec) q = tessary_edges_LOAD(r + tessary_edges_LANES);
                tessary_edges_MUL_ADD(a0, p, k[0]);
                tessary_edges_MUL_ADD(b0, q, k[0]);
                tessary_edges_MUL_ADD(a1, p, k[1]);
                tessary_edges_MUL_ADD(b1, q, k[1]);
                tessary_edges_MUL_ADD(a2, p, k[2]);
                tessary_edges_MUL_ADD(b2, q, k[2]);
                k += 3;
            }
            for (i = 1; i < 6; ++i) {
                const tessary_edges_FN(vec) p = tessary_edges_LOAD(r + i) + tessary_edges_LOAD(r - i);
                const tessary_edges_FN(vec) q = tessary_edges_LOAD(r + tessary_edges_LANES + i) + tessary_edges_LOAD(r + tessary_edges_LANES - i);
                tessary_edges_MUL_ADD(a0, p, k[0]);
                tessary_edges_MUL_ADD(b0, q, k[0]);
                tessary_edges_MUL_ADD(a1, p, k[1]);
                tessary_edges_MUL_ADD(b1, q, k[1]);
                tessary_edges_MUL_ADD(a2, p, k[2]);
                tessary_edges_MUL_ADD(b2, q, k[2]);
                k += 3;
            }
        }
        tessary_edges_STORE(t + 2 * tessary_edges_CHUNK + x, a0);
        tessary_edges_STORE(t + 2 * tessary_edges_CHUNK + x + tessary_edges_LANES, b0);
        tessary_edges_STORE(t + 4 * tessary_edges_CHUNK + x, a1);
        tessary_edges_STORE(t + 4 * tessary_edges_CHUNK + x + tessary_edges_LANES, b1);
        tessary_edges_STORE(t + 6 * tessary_edges_CHUNK + x, a2);
        tessary_edges_STORE(t + 6 * tessary_edges_CHUNK + x + tessary_edges_LANES, b2);
    }
}

/* 4 x 7 x 6 coefficients, even in y, odd in x */
static tessary_edges_TARGET void tessary_edges_FN(group4)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += 2 * tessary_edges_LANES) {
        const float *k = tessary_edges_group4_taps;
        tessary_edges_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_edges_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_edges_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        tessary_edges_FN(vec) a3 = {0.0f}, b3 = {0.0f};
        int j, i;
        for (j = 0; j < 7; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_edges_LINE + x + tessary_edges_RADIUS;
            for (i = 1; i < 7; ++i) {
                const tessary_edges_FN(vec) p = tessary_edges_LOAD(r + i) - tessary_edges_LOAD(r - i);
                const tessary_edges_FN(vec) q = tessary_edges_LOAD(r + tessary_edges_LANES + i) - tessary_edges_LOAD(r + tessary_edges_LANES - i);
                tessary_edges_MUL_ADD(a0, p, k[0]);
                tessary_edges_MUL_ADD(b0, q, k[0]);
                tessary_edges_MUL_ADD(a1, p, k[1]);
                tessary_edges_MUL_ADD(b1, q, k[1]);
                tessary_edges_MUL_ADD(a2, p, k[2]);
                tessary_edges_MUL_ADD(b2, q, k[2]);
                tessary_edges_MUL_ADD(a3, p, k[3]);
                tessary_edges_MUL_ADD(b3, q, k[3]);
                k += 4;
            }
        }
        tessary_edges_STORE(t + 8 * tessary_edges_CHUNK + x, a0);
        tessary_edges_STORE(t + 8 * tessary_edges_CHUNK + x + tessary_edges_LANES, b0);
        tessary_edges_STORE(t + 9 * tessary_edges_CHUNK + x, a1);
        tessary_edges_STORE(t + 9 * tessary_edges_CHUNK + x + tessary_edges_LANES, b1);
        tessary_edges_STORE(t + 11 * tessary_edges_CHUNK + x, a2);
        tessary_edges_STORE(t + 11 * tessary_edges_CHUNK + x + tessary_edges_LANES, b2);
        tessary_edges_STORE(t + 13 * tessary_edges_CHUNK + x, a3);
        tessary_edges_STORE(t + 13 * tessary_edges_CHUNK + x + tessary_edges_LANES, b3);
    }
}

/* 4 x 6 x 7 coefficients, odd in y, even in x */
static tessary_edges_TARGET void tessary_edges_FN(group5)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += 2 * tessary_edges_LANES) {
        const float *k = tessary_edges_group5_taps;
        tessary_edges_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_edges_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_edges_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        tessary_edges_FN(vec) a3 = {0.0f}, b3 = {0.0f};
        int j, i;
        for (j = 7; j < 13; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_edges_LINE + x + tessary_edges_RADIUS;
            {
                const tessary_edges_FN(vec) p = tessary_edges_LOAD(r);
                const tessary_edges_FN(vec) q = tessary_edges_LOAD(r + tessary_edges_LANES);
                tessary_edges_MUL_ADD(a0, p, k[0]);
                tessary_edges_MUL_ADD(b0, q, k[0]);
                tessary_edges_MUL_ADD(a1, p, k[1]);
                tessary_edges_MUL_ADD(b1, q, k[1]);
                tessary_edges_MUL_ADD(a2, p, k[2]);
                tessary_edges_MUL_ADD(b2, q, k[2]);
                tessary_edges_MUL_ADD(a3, p, k[3]);
                tessary_edges_MUL_ADD(b3, q, k[3]);
                k += 4;
            }
            for (i = 1; i < 7; ++i) {
                const tessary_edges_FN(vec) p = tessary_edges_LOAD(r + i) + tessary_edges_LOAD(r - i);
                const tessary_edges_FN(vec) q = tessary_edges_LOAD(r + tessary_edges_LANES + i) + tessary_edges_LOAD(r + tessary_edges_LANES - i);
                tessary_edges_MUL_ADD(a0, p, k[0]);
                tessary_edges_MUL_ADD(b0, q, k[0]);
                tessary_edges_MUL_ADD(a1, p, k[1]);
                tessary_edges_MUL_ADD(b1, q, k[1]);
                tessary_edges_MUL_ADD(a2, p, k[2]);
                tessary_edges_MUL_ADD(b2, q, k[2]);
                tessary_edges_MUL_ADD(a3, p, k[3]);
                tessary_edges_MUL_ADD(b3, q, k[3]);
                k += 4;
            }
        }
        tessary_edges_STORE(t + 10 * tessary_edges_CHUNK + x, a0);
        tessary_edges_STORE(t + 10 * tessary_edges_CHUNK + x + tessary_edges_LANES, b0);
        tessary_edges_STORE(t + 12 * tessary_edges_CHUNK + x, a1);
        tessary_edges_STORE(t + 12 * tessary_edges_CHUNK + x + tessary_edges_LANES, b1);
        tessary_edges_STORE(t + 14 * tessary_edges_CHUNK + x, a2);
        tessary_edges_STORE(t + 14 * tessary_edges_CHUNK + x + tessary_edges_LANES, b2);
        tessary_edges_STORE(t + 15 * tessary_edges_CHUNK + x, a3);
        tessary_edges_STORE(t + 15 * tessary_edges_CHUNK + x + tessary_edges_LANES, b3);
    }
}

static tessary_edges_TARGET void tessary_edges_FN(add)(float *to, const float *a, const float *b)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_LANES) tessary_edges_STORE(to + x, tessary_edges_LOAD(a + x) + tessary_edges_LOAD(b + x));
}

static tessary_edges_TARGET void tessary_edges_FN(subtract)(float *to, const float *a, const float *b)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_LANES) tessary_edges_STORE(to + x, tessary_edges_LOAD(a + x) - tessary_edges_LOAD(b + x));
}

/* Send a stretch of a plane to the caller, past the cache where the planes are large. */
static tessary_edges_TARGET void tessary_edges_FN(put)(const float *from, float *to, int n, int stream)
{
    int x = 0;
#ifdef tessary_edges_STREAM
    if (stream) {
        const int head = (int)(((64u - ((uintptr_t)to & 63u)) & 63u) / 4u);
        for (; x < head && x < n; ++x) to[x] = from[x];
        for (; x + tessary_edges_LANES <= n; x += tessary_edges_LANES) tessary_edges_STREAM(to + x, tessary_edges_LOAD(from + x));
    }
#else
    (void)stream;
#endif
    if (x < n) memcpy(to + x, from + x, (size_t)(n - x) * sizeof(float));
}

static tessary_edges_TARGET void tessary_edges_FN(responses)(const float *const *rows, ptrdiff_t at, int n,
    float *work, char *out, ptrdiff_t plane, int stream)
{
    float *const t = work + tessary_edges_FOLDED; /* products */
    float *const r = t + 16 * tessary_edges_CHUNK; /* a sum */
    tessary_edges_FN(fold)(rows, at, work);
    tessary_edges_FN(group0)(work, t);
    tessary_edges_FN(group1)(work, t);
    tessary_edges_FN(group2)(work, t);
    tessary_edges_FN(group3)(work, t);
    tessary_edges_FN(group4)(work, t);
    tessary_edges_FN(group5)(work, t);
    tessary_edges_FN(put)(t + 0 * tessary_edges_CHUNK, (float *)(void *)(out + 0 * plane), n, stream);
    tessary_edges_FN(add)(r, t + 1 * tessary_edges_CHUNK, t + 2 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 1 * plane), n, stream);
    tessary_edges_FN(add)(r, t + 3 * tessary_edges_CHUNK, t + 4 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 2 * plane), n, stream);
    tessary_edges_FN(add)(r, t + 5 * tessary_edges_CHUNK, t + 6 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 3 * plane), n, stream);
    tessary_edges_FN(put)(t + 7 * tessary_edges_CHUNK, (float *)(void *)(out + 4 * plane), n, stream);
    tessary_edges_FN(subtract)(r, t + 6 * tessary_edges_CHUNK, t + 5 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 5 * plane), n, stream);
    tessary_edges_FN(subtract)(r, t + 4 * tessary_edges_CHUNK, t + 3 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 6 * plane), n, stream);
    tessary_edges_FN(subtract)(r, t + 2 * tessary_edges_CHUNK, t + 1 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 7 * plane), n, stream);
    tessary_edges_FN(put)(t + 8 * tessary_edges_CHUNK, (float *)(void *)(out + 8 * plane), n, stream);
    tessary_edges_FN(add)(r, t + 9 * tessary_edges_CHUNK, t + 10 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 9 * plane), n, stream);
    tessary_edges_FN(add)(r, t + 11 * tessary_edges_CHUNK, t + 12 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 10 * plane), n, stream);
    tessary_edges_FN(add)(r, t + 13 * tessary_edges_CHUNK, t + 14 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 11 * plane), n, stream);
    tessary_edges_FN(put)(t + 15 * tessary_edges_CHUNK, (float *)(void *)(out + 12 * plane), n, stream);
    tessary_edges_FN(subtract)(r, t + 14 * tessary_edges_CHUNK, t + 13 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 13 * plane), n, stream);
    tessary_edges_FN(subtract)(r, t + 12 * tessary_edges_CHUNK, t + 11 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 14 * plane), n, stream);
    tessary_edges_FN(subtract)(r, t + 10 * tessary_edges_CHUNK, t + 9 * tessary_edges_CHUNK);
    tessary_edges_FN(put)(r, (float *)(void *)(out + 15 * plane), n, stream);
}

/* Strength and winner of scale 0. */
static tessary_edges_TARGET void tessary_edges_FN(edges0)(const float *const *rows, ptrdiff_t at,
    int n, float *work, float *strength, unsigned char *orientation)
{
    float *const t = work + tessary_edges_FOLDED; /* products */
    float *const top = t + 16 * tessary_edges_CHUNK;
    float *const winner = top + tessary_edges_CHUNK;
    int x;
    tessary_edges_FN(fold)(rows, at, work);
    tessary_edges_FN(group0)(work, t);
    tessary_edges_FN(group1)(work, t);
    tessary_edges_FN(group2)(work, t);
    tessary_edges_FN(group3)(work, t);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_LANES) {
        tessary_edges_FN(vec) v, best, who = {0.0f};
        v = tessary_edges_LOAD(t + 0 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        best = v;
        v = tessary_edges_LOAD(t + 1 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 2 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 1.0f);
        v = tessary_edges_LOAD(t + 3 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 4 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 2.0f);
        v = tessary_edges_LOAD(t + 5 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 6 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 3.0f);
        v = tessary_edges_LOAD(t + 7 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 4.0f);
        v = - tessary_edges_LOAD(t + 5 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 6 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 5.0f);
        v = - tessary_edges_LOAD(t + 3 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 4 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 6.0f);
        v = - tessary_edges_LOAD(t + 1 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 2 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 7.0f);
        tessary_edges_STORE(top + x, best);
        tessary_edges_STORE(winner + x, who);
    }
    memcpy(strength, top, (size_t)n * sizeof(float));
    for (x = 0; x < n; ++x) orientation[x] = (unsigned char)winner[x];
}

/* Strength and winner of scale 1. */
static tessary_edges_TARGET void tessary_edges_FN(edges1)(const float *const *rows, ptrdiff_t at,
    int n, float *work, float *strength, unsigned char *orientation)
{
    float *const t = work + tessary_edges_FOLDED; /* products */
    float *const top = t + 16 * tessary_edges_CHUNK;
    float *const winner = top + tessary_edges_CHUNK;
    int x;
    tessary_edges_FN(fold)(rows, at, work);
    tessary_edges_FN(group4)(work, t);
    tessary_edges_FN(group5)(work, t);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_LANES) {
        tessary_edges_FN(vec) v, best, who = {0.0f};
        v = tessary_edges_LOAD(t + 8 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        best = v;
        v = tessary_edges_LOAD(t + 9 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 10 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 1.0f);
        v = tessary_edges_LOAD(t + 11 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 12 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 2.0f);
        v = tessary_edges_LOAD(t + 13 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 14 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 3.0f);
        v = tessary_edges_LOAD(t + 15 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 4.0f);
        v = - tessary_edges_LOAD(t + 13 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 14 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 5.0f);
        v = - tessary_edges_LOAD(t + 11 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 12 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 6.0f);
        v = - tessary_edges_LOAD(t + 9 * tessary_edges_CHUNK + x) + tessary_edges_LOAD(t + 10 * tessary_edges_CHUNK + x);
        v = tessary_edges_ABS(v);
        tessary_edges_TAKE(v, 7.0f);
        tessary_edges_STORE(top + x, best);
        tessary_edges_STORE(winner + x, who);
    }
    memcpy(strength, top, (size_t)n * sizeof(float));
    for (x = 0; x < n; ++x) orientation[x] = (unsigned char)winner[x];
}

/* ---- fixed point: 16-bit codes and coefficients, exact sums in 32 bits */

#if tessary_edges_LANES == 16
#define tessary_edges_TARGET_Q \
    __attribute__((target("avx512f,avx512vl,avx512bw,avx512dq,avx512vnni,avx2,fma")))
#else
#define tessary_edges_TARGET_Q tessary_edges_TARGET
#endif
#define tessary_edges_QFN static inline tessary_edges_TARGET_Q

#if tessary_edges_LANES == 16

#define tessary_edges_WIDE 32 /* codes in one vector */
typedef __m512i tessary_edges_FN(q16);
typedef __m512i tessary_edges_FN(q32);
#define tessary_edges_X86(name) _mm512_##name
#define tessary_edges_X86_STREAM(p, v) _mm512_stream_si512((__m512i *)(p), (v))

#elif tessary_edges_LANES == 8

#define tessary_edges_WIDE 16
typedef __m256i tessary_edges_FN(q16);
typedef __m256i tessary_edges_FN(q32);
#define tessary_edges_X86(name) _mm256_##name
#define tessary_edges_X86_STREAM(p, v) _mm256_stream_si256((__m256i *)(p), (v))

#elif tessary_edges_LANES == 4 && defined(__SSE2__)

#define tessary_edges_WIDE 8
typedef __m128i tessary_edges_FN(q16);
typedef __m128i tessary_edges_FN(q32);
#define tessary_edges_X86(name) _mm_##name
#define tessary_edges_X86_STREAM(p, v) _mm_stream_si128((__m128i *)(p), (v))

#elif tessary_edges_LANES == 4 && defined(__aarch64__)

#define tessary_edges_WIDE 8
typedef int16x8_t tessary_edges_FN(q16);
typedef int32x4_t tessary_edges_FN(q32);

#else

#define tessary_edges_WIDE 8
typedef struct { int16_t v[8]; } tessary_edges_FN(q16);
typedef struct { int32_t v[4]; } tessary_edges_FN(q32);

#endif

#if defined(tessary_edges_X86)

/* On x86 a pair of vectors is two halves of interleaved codes, in the order that packing
 * undoes; products stand in memory in that order too. */
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_load)(const int16_t *p)
{
    tessary_edges_FN(q16) v;
    memcpy(&v, p, sizeof v);
    return v;
}
tessary_edges_QFN void tessary_edges_FN(q_store)(int16_t *p, tessary_edges_FN(q16) v) { memcpy(p, &v, sizeof v); }
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_sum)(const int32_t *p)
{
    tessary_edges_FN(q32) v;
    memcpy(&v, p, sizeof v);
    return v;
}
tessary_edges_QFN void tessary_edges_FN(q_keep)(int32_t *p, tessary_edges_FN(q32) v) { memcpy(p, &v, sizeof v); }
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_add)(tessary_edges_FN(q16) a, tessary_edges_FN(q16) b) { return tessary_edges_X86(add_epi16)(a, b); }
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_sub)(tessary_edges_FN(q16) a, tessary_edges_FN(q16) b) { return tessary_edges_X86(sub_epi16)(a, b); }
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_plus)(tessary_edges_FN(q32) a, tessary_edges_FN(q32) b) { return tessary_edges_X86(add_epi32)(a, b); }
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_minus)(tessary_edges_FN(q32) a, tessary_edges_FN(q32) b) { return tessary_edges_X86(sub_epi32)(a, b); }
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_nought)(void) { return tessary_edges_X86(set1_epi32)(0); }
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_low)(tessary_edges_FN(q16) v, tessary_edges_FN(q16) w) { return tessary_edges_X86(unpacklo_epi16)(v, w); }
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_high)(tessary_edges_FN(q16) v, tessary_edges_FN(q16) w) { return tessary_edges_X86(unpackhi_epi16)(v, w); }
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_mac)(tessary_edges_FN(q32) sum, tessary_edges_FN(q16) pairs, const int16_t *k)
{
    int32_t both;
    memcpy(&both, k, sizeof both);
#if tessary_edges_LANES == 16
    return _mm512_dpwssd_epi32(sum, pairs, _mm512_set1_epi32(both));
#else
    return tessary_edges_FN(q_plus)(sum, tessary_edges_X86(madd_epi16)(pairs, tessary_edges_X86(set1_epi32)(both)));
#endif
}
#define tessary_edges_PAIR(v, w) const tessary_edges_FN(q16) l = tessary_edges_FN(q_low)(v, w), h = tessary_edges_FN(q_high)(v, w)
#define tessary_edges_MAC(a, b, k) (a = tessary_edges_FN(q_mac)(a, l, k), b = tessary_edges_FN(q_mac)(b, h, k))
typedef int32_t tessary_edges_FN(q_signed) __attribute__((vector_size(2 * tessary_edges_WIDE)));
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_down)(tessary_edges_FN(q32) v, int bits)
{
    /* an arithmetic shift: every compiler with these vectors makes it one */
    return (tessary_edges_FN(q32))(((tessary_edges_FN(q_signed))v + (1 << bits >> 1)) >> bits);
}
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_round)(tessary_edges_FN(q32) l, tessary_edges_FN(q32) h, int bits)
{
    return tessary_edges_X86(max_epi16)(tessary_edges_X86(packs_epi32)(tessary_edges_FN(q_down)(l, bits), tessary_edges_FN(q_down)(h, bits)),
        tessary_edges_X86(set1_epi16)(-32767));
}

#elif tessary_edges_LANES == 4 && defined(__aarch64__)

tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_load)(const int16_t *p) { return vld1q_s16(p); }
tessary_edges_QFN void tessary_edges_FN(q_store)(int16_t *p, tessary_edges_FN(q16) v) { vst1q_s16(p, v); }
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_sum)(const int32_t *p) { return vld1q_s32(p); }
tessary_edges_QFN void tessary_edges_FN(q_keep)(int32_t *p, tessary_edges_FN(q32) v) { vst1q_s32(p, v); }
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_add)(tessary_edges_FN(q16) a, tessary_edges_FN(q16) b) { return vaddq_s16(a, b); }
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_sub)(tessary_edges_FN(q16) a, tessary_edges_FN(q16) b) { return vsubq_s16(a, b); }
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_plus)(tessary_edges_FN(q32) a, tessary_edges_FN(q32) b) { return vaddq_s32(a, b); }
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_minus)(tessary_edges_FN(q32) a, tessary_edges_FN(q32) b) { return vsubq_s32(a, b); }
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_nought)(void) { return vdupq_n_s32(0); }
#define tessary_edges_PAIR(v, w) const tessary_edges_FN(q16) l = (v), h = (w)
#define tessary_edges_MAC(a, b, k)                                            \
    (a = vmlal_n_s16(vmlal_n_s16(a, vget_low_s16(l), (k)[0]), vget_low_s16(h), (k)[1]), \
     b = vmlal_n_s16(vmlal_n_s16(b, vget_high_s16(l), (k)[0]), vget_high_s16(h), (k)[1]))
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_round)(tessary_edges_FN(q32) l, tessary_edges_FN(q32) h, int bits)
{
    const int32x4_t half = vdupq_n_s32(1 << bits >> 1), down = vdupq_n_s32(-bits);
    return vmaxq_s16(vcombine_s16(vqmovn_s32(vshlq_s32(vaddq_s32(l, half), down)),
        vqmovn_s32(vshlq_s32(vaddq_s32(h, half), down))), vdupq_n_s16(-32767));
}

#else

/* The portable twin: the same bits, in plain C. */
#define tessary_edges_EACH(n) for (i = 0; i < (n); ++i)
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_load)(const int16_t *p)
{
    tessary_edges_FN(q16) v;
    memcpy(&v, p, sizeof v);
    return v;
}
tessary_edges_QFN void tessary_edges_FN(q_store)(int16_t *p, tessary_edges_FN(q16) v) { memcpy(p, &v, sizeof v); }
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_sum)(const int32_t *p)
{
    tessary_edges_FN(q32) v;
    memcpy(&v, p, sizeof v);
    return v;
}
tessary_edges_QFN void tessary_edges_FN(q_keep)(int32_t *p, tessary_edges_FN(q32) v) { memcpy(p, &v, sizeof v); }
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_add)(tessary_edges_FN(q16) a, tessary_edges_FN(q16) b)
{
    int i;
    tessary_edges_EACH(8) a.v[i] = (int16_t)(a.v[i] + b.v[i]);
    return a;
}
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_sub)(tessary_edges_FN(q16) a, tessary_edges_FN(q16) b)
{
    int i;
    tessary_edges_EACH(8) a.v[i] = (int16_t)(a.v[i] - b.v[i]);
    return a;
}
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_plus)(tessary_edges_FN(q32) a, tessary_edges_FN(q32) b)
{
    int i;
    tessary_edges_EACH(4) a.v[i] += b.v[i];
    return a;
}
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_minus)(tessary_edges_FN(q32) a, tessary_edges_FN(q32) b)
{
    int i;
    tessary_edges_EACH(4) a.v[i] -= b.v[i];
    return a;
}
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_nought)(void)
{
    tessary_edges_FN(q32) a;
    memset(&a, 0, sizeof a);
    return a;
}
tessary_edges_QFN tessary_edges_FN(q32) tessary_edges_FN(q_mac)(tessary_edges_FN(q32) sum, const int16_t *v, const int16_t *w,
    const int16_t *k)
{
    int i;
    tessary_edges_EACH(4) sum.v[i] += (int32_t)v[i] * k[0] + (int32_t)w[i] * k[1];
    return sum;
}
#define tessary_edges_PAIR(v, w) const tessary_edges_FN(q16) l = (v), h = (w)
#define tessary_edges_MAC(a, b, k) \
    (a = tessary_edges_FN(q_mac)(a, l.v, h.v, k), b = tessary_edges_FN(q_mac)(b, l.v + 4, h.v + 4, k))
tessary_edges_QFN int16_t tessary_edges_FN(q_one)(int32_t v, int bits)
{
    /* the floor of a division, without shifting a negative number */
    v += 1 << bits >> 1;
    v = v >= 0 ? v >> bits : -1 - ((-1 - v) >> bits);
    return (int16_t)(v > 32767 ? 32767 : v < -32767 ? -32767 : v);
}
tessary_edges_QFN tessary_edges_FN(q16) tessary_edges_FN(q_round)(tessary_edges_FN(q32) l, tessary_edges_FN(q32) h, int bits)
{
    tessary_edges_FN(q16) r;
    int i;
    tessary_edges_EACH(4) r.v[i] = tessary_edges_FN(q_one)(l.v[i], bits);
    tessary_edges_EACH(4) r.v[i + 4] = tessary_edges_FN(q_one)(h.v[i], bits);
    return r;
}
#undef tessary_edges_EACH

#endif

/* The middle row, then the sums and then the differences of the rows about it. */
static tessary_edges_TARGET_Q void tessary_edges_FN(q_fold)(const int16_t *const *rows, ptrdiff_t at, int16_t *s)
{
    int j, x;
    for (x = 0; x < tessary_edges_LINE_Q; x += tessary_edges_WIDE) {
        tessary_edges_FN(q_store)(s + x, tessary_edges_FN(q_load)(rows[tessary_edges_RADIUS] + at + x));
    }
    for (j = 1; j <= tessary_edges_RADIUS; ++j) {
        const int16_t *const below = rows[tessary_edges_RADIUS + j] + at;
        const int16_t *const above = rows[tessary_edges_RADIUS - j] + at;
        int16_t *const sum = s + (ptrdiff_t)j * tessary_edges_LINE_Q;
        int16_t *const difference = s + (ptrdiff_t)(tessary_edges_RADIUS + j) * tessary_edges_LINE_Q;
        for (x = 0; x < tessary_edges_LINE_Q; x += tessary_edges_WIDE) {
            const tessary_edges_FN(q16) b = tessary_edges_FN(q_load)(below + x), a = tessary_edges_FN(q_load)(above + x);
            tessary_edges_FN(q_store)(sum + x, tessary_edges_FN(q_add)(b, a));
            tessary_edges_FN(q_store)(difference + x, tessary_edges_FN(q_sub)(b, a));
        }
    }
}

static tessary_edges_TARGET_Q void tessary_edges_FN(q_group0)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const int16_t *k = tessary_edges_group0_counts;
        tessary_edges_FN(q32) a0 = tessary_edges_FN(q_nought)(), b0 = a0;
        int j;
        for (j = 0; j < 6; j += 1) {
            const int16_t *const r = s + (ptrdiff_t)(j) * tessary_edges_LINE_Q + x + tessary_edges_RADIUS;
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 1), tessary_edges_FN(q_load)(r - 1));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 2), tessary_edges_FN(q_load)(r - 2));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                k += 2;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 3), tessary_edges_FN(q_load)(r - 3));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 4), tessary_edges_FN(q_load)(r - 4));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                k += 2;
            }
        }
        tessary_edges_FN(q_keep)(t + 0 * tessary_edges_CHUNK + x, a0);
        tessary_edges_FN(q_keep)(t + 0 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b0);
    }
}

static tessary_edges_TARGET_Q void tessary_edges_FN(q_group1)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const int16_t *k = tessary_edges_group1_counts;
        tessary_edges_FN(q32) a0 = tessary_edges_FN(q_nought)(), b0 = a0;
        tessary_edges_FN(q32) a1 = tessary_edges_FN(q_nought)(), b1 = a1;
        tessary_edges_FN(q32) a2 = tessary_edges_FN(q_nought)(), b2 = a2;
        int j;
        for (j = 0; j < 6; j += 2) {
            const int16_t *const r = s + (ptrdiff_t)(j) * tessary_edges_LINE_Q + x + tessary_edges_RADIUS;
            const int16_t *const r2 = s + (ptrdiff_t)(j + 1) * tessary_edges_LINE_Q + x + tessary_edges_RADIUS;
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 1), tessary_edges_FN(q_load)(r - 1));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r2 + 1), tessary_edges_FN(q_load)(r2 - 1));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 2), tessary_edges_FN(q_load)(r - 2));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r2 + 2), tessary_edges_FN(q_load)(r2 - 2));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 3), tessary_edges_FN(q_load)(r - 3));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r2 + 3), tessary_edges_FN(q_load)(r2 - 3));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 4), tessary_edges_FN(q_load)(r - 4));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r2 + 4), tessary_edges_FN(q_load)(r2 - 4));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 5), tessary_edges_FN(q_load)(r - 5));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r2 + 5), tessary_edges_FN(q_load)(r2 - 5));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                k += 6;
            }
        }
        tessary_edges_FN(q_keep)(t + 1 * tessary_edges_CHUNK + x, a0);
        tessary_edges_FN(q_keep)(t + 1 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b0);
        tessary_edges_FN(q_keep)(t + 3 * tessary_edges_CHUNK + x, a1);
        tessary_edges_FN(q_keep)(t + 3 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b1);
        tessary_edges_FN(q_keep)(t + 5 * tessary_edges_CHUNK + x, a2);
        tessary_edges_FN(q_keep)(t + 5 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b2);
    }
}

static tessary_edges_TARGET_Q void tessary_edges_FN(q_group2)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const int16_t *k = tessary_edges_group2_counts;
        tessary_edges_FN(q32) a0 = tessary_edges_FN(q_nought)(), b0 = a0;
        int j;
        for (j = 7; j < 11; j += 1) {
            const int16_t *const r = s + (ptrdiff_t)(j) * tessary_edges_LINE_Q + x + tessary_edges_RADIUS;
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_load)(r);
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 1), tessary_edges_FN(q_load)(r - 1));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                k += 2;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 2), tessary_edges_FN(q_load)(r - 2));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 3), tessary_edges_FN(q_load)(r - 3));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                k += 2;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 4), tessary_edges_FN(q_load)(r - 4));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 5), tessary_edges_FN(q_load)(r - 5));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                k += 2;
            }
        }
        tessary_edges_FN(q_keep)(t + 7 * tessary_edges_CHUNK + x, a0);
        tessary_edges_FN(q_keep)(t + 7 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b0);
    }
}

static tessary_edges_TARGET_Q void tessary_edges_FN(q_group3)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const int16_t *k = tessary_edges_group3_counts;
        tessary_edges_FN(q32) a0 = tessary_edges_FN(q_nought)(), b0 = a0;
        tessary_edges_FN(q32) a1 = tessary_edges_FN(q_nought)(), b1 = a1;
        tessary_edges_FN(q32) a2 = tessary_edges_FN(q_nought)(), b2 = a2;
        int j;
        for (j = 7; j < 12; j += 1) {
            const int16_t *const r = s + (ptrdiff_t)(j) * tessary_edges_LINE_Q + x + tessary_edges_RADIUS;
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_load)(r);
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 1), tessary_edges_FN(q_load)(r - 1));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 2), tessary_edges_FN(q_load)(r - 2));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 3), tessary_edges_FN(q_load)(r - 3));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                k += 6;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 4), tessary_edges_FN(q_load)(r - 4));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 5), tessary_edges_FN(q_load)(r - 5));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                k += 6;
            }
        }
        tessary_edges_FN(q_keep)(t + 2 * tessary_edges_CHUNK + x, a0);
        tessary_edges_FN(q_keep)(t + 2 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b0);
        tessary_edges_FN(q_keep)(t + 4 * tessary_edges_CHUNK + x, a1);
        tessary_edges_FN(q_keep)(t + 4 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b1);
        tessary_edges_FN(q_keep)(t + 6 * tessary_edges_CHUNK + x, a2);
        tessary_edges_FN(q_keep)(t + 6 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b2);
    }
}

static tessary_edges_TARGET_Q void tessary_edges_FN(q_group4)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const int16_t *k = tessary_edges_group4_counts;
        tessary_edges_FN(q32) a0 = tessary_edges_FN(q_nought)(), b0 = a0;
        tessary_edges_FN(q32) a1 = tessary_edges_FN(q_nought)(), b1 = a1;
        tessary_edges_FN(q32) a2 = tessary_edges_FN(q_nought)(), b2 = a2;
        tessary_edges_FN(q32) a3 = tessary_edges_FN(q_nought)(), b3 = a3;
        int j;
        for (j = 0; j < 7; j += 1) {
            const int16_t *const r = s + (ptrdiff_t)(j) * tessary_edges_LINE_Q + x + tessary_edges_RADIUS;
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 1), tessary_edges_FN(q_load)(r - 1));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 2), tessary_edges_FN(q_load)(r - 2));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 3), tessary_edges_FN(q_load)(r - 3));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 4), tessary_edges_FN(q_load)(r - 4));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 5), tessary_edges_FN(q_load)(r - 5));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 6), tessary_edges_FN(q_load)(r - 6));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
        }
        tessary_edges_FN(q_keep)(t + 8 * tessary_edges_CHUNK + x, a0);
        tessary_edges_FN(q_keep)(t + 8 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b0);
        tessary_edges_FN(q_keep)(t + 9 * tessary_edges_CHUNK + x, a1);
        tessary_edges_FN(q_keep)(t + 9 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b1);
        tessary_edges_FN(q_keep)(t + 11 * tessary_edges_CHUNK + x, a2);
        tessary_edges_FN(q_keep)(t + 11 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b2);
        tessary_edges_FN(q_keep)(t + 13 * tessary_edges_CHUNK + x, a3);
        tessary_edges_FN(q_keep)(t + 13 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b3);
    }
}

static tessary_edges_TARGET_Q void tessary_edges_FN(q_group5)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const int16_t *k = tessary_edges_group5_counts;
        tessary_edges_FN(q32) a0 = tessary_edges_FN(q_nought)(), b0 = a0;
        tessary_edges_FN(q32) a1 = tessary_edges_FN(q_nought)(), b1 = a1;
        tessary_edges_FN(q32) a2 = tessary_edges_FN(q_nought)(), b2 = a2;
        tessary_edges_FN(q32) a3 = tessary_edges_FN(q_nought)(), b3 = a3;
        int j;
        for (j = 7; j < 13; j += 2) {
            const int16_t *const r = s + (ptrdiff_t)(j) * tessary_edges_LINE_Q + x + tessary_edges_RADIUS;
            const int16_t *const r2 = s + (ptrdiff_t)(j + 1) * tessary_edges_LINE_Q + x + tessary_edges_RADIUS;
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_load)(r);
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_load)(r2);
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 1), tessary_edges_FN(q_load)(r - 1));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 1), tessary_edges_FN(q_load)(r2 - 1));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 2), tessary_edges_FN(q_load)(r - 2));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 2), tessary_edges_FN(q_load)(r2 - 2));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 3), tessary_edges_FN(q_load)(r - 3));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 3), tessary_edges_FN(q_load)(r2 - 3));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 4), tessary_edges_FN(q_load)(r - 4));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 4), tessary_edges_FN(q_load)(r2 - 4));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 5), tessary_edges_FN(q_load)(r - 5));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 5), tessary_edges_FN(q_load)(r2 - 5));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 6), tessary_edges_FN(q_load)(r - 6));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 6), tessary_edges_FN(q_load)(r2 - 6));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
        }
        tessary_edges_FN(q_keep)(t + 10 * tessary_edges_CHUNK + x, a0);
        tessary_edges_FN(q_keep)(t + 10 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b0);
        tessary_edges_FN(q_keep)(t + 12 * tessary_edges_CHUNK + x, a1);
        tessary_edges_FN(q_keep)(t + 12 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b1);
        tessary_edges_FN(q_keep)(t + 14 * tessary_edges_CHUNK + x, a2);
        tessary_edges_FN(q_keep)(t + 14 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b2);
        tessary_edges_FN(q_keep)(t + 15 * tessary_edges_CHUNK + x, a3);
        tessary_edges_FN(q_keep)(t + 15 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b3);
    }
}

/* Counts go to the caller, past the cache where the planes are large. */
static tessary_edges_TARGET_Q void tessary_edges_FN(q_put)(const int16_t *from, int16_t *to, int n, int stream)
{
    int x = 0;
#if defined(tessary_edges_X86)
    if (stream) {
        const int head = (int)(((64u - ((uintptr_t)to & 63u)) & 63u) / 2u);
        for (; x < head && x < n; ++x) to[x] = from[x];
        for (; x + tessary_edges_WIDE <= n; x += tessary_edges_WIDE)
            tessary_edges_X86_STREAM((void *)(to + x), tessary_edges_FN(q_load)(from + x));
    }
#else
    (void)stream;
#endif
    if (x < n) memcpy(to + x, from + x, (size_t)(n - x) * sizeof(int16_t));
}

static tessary_edges_TARGET_Q uint64_t tessary_edges_FN(q_responses)(const int16_t *const *rows, ptrdiff_t at, int n,
    void *work, char *out, ptrdiff_t plane, int stream)
{
    int16_t *const s = (int16_t *)work; /* folded rows */
    int32_t *const t = (int32_t *)(void *)(s + tessary_edges_FOLDED_Q); /* products */
    int16_t *const r = (int16_t *)(void *)(t + 16 * tessary_edges_CHUNK); /* counts */
    uint64_t ends = 0;
    int x;
    tessary_edges_FN(q_fold)(rows, at, s);
    tessary_edges_FN(q_group0)(s, t);
    tessary_edges_FN(q_group1)(s, t);
    tessary_edges_FN(q_group2)(s, t);
    tessary_edges_FN(q_group3)(s, t);
    tessary_edges_FN(q_group4)(s, t);
    tessary_edges_FN(q_group5)(s, t);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_sum)(t + 0 * tessary_edges_CHUNK + x);
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_sum)(t + 0 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2);
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 0 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 1 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 2 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 1 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 2 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 1 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 3 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 4 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 3 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 4 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 2 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 5 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 6 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 5 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 6 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 3 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_sum)(t + 7 * tessary_edges_CHUNK + x);
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_sum)(t + 7 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2);
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 4 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 5 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 6 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 5 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 6 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 5 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 3 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 4 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 3 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 4 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 6 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 1 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 2 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 1 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 2 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 7 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_sum)(t + 8 * tessary_edges_CHUNK + x);
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_sum)(t + 8 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2);
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 8 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 9 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 10 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 9 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 10 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 9 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 11 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 12 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 11 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 12 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 10 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 13 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 14 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 13 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 14 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 11 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_sum)(t + 15 * tessary_edges_CHUNK + x);
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_sum)(t + 15 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2);
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 12 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 13 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 14 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 13 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 14 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 13 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 11 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 12 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 11 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 12 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 14 * plane), n, stream);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 9 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 10 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 9 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 10 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_put)(r, (int16_t *)(void *)(out + 15 * plane), n, stream);
    return ends;
}

/* Keep the largest value so far and whose it is; among equals the first stays. */
static tessary_edges_TARGET_Q void tessary_edges_FN(q_take)(const int16_t *e, int turn,
    int32_t *best, int32_t *who)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; ++x) {
        const int32_t v = e[x] < 0 ? -e[x] : e[x];
        who[x] = v > best[x] ? turn : who[x];
        best[x] = v > best[x] ? v : best[x];
    }
}

/* Strength and winner of scale 0. */
static tessary_edges_TARGET_Q void tessary_edges_FN(q_edges0)(const int16_t *const *rows,
    ptrdiff_t at, int n, void *work, float *strength, unsigned char *orientation)
{
    int16_t *const s = (int16_t *)work; /* folded rows */
    int32_t *const t = (int32_t *)(void *)(s + tessary_edges_FOLDED_Q); /* products */
    int32_t *const best = t + 16 * tessary_edges_CHUNK;
    int32_t *const who = best + tessary_edges_CHUNK;
    int16_t *const r = (int16_t *)(void *)(who + tessary_edges_CHUNK);
    int x;
    tessary_edges_FN(q_fold)(rows, at, s);
    tessary_edges_FN(q_group0)(s, t);
    tessary_edges_FN(q_group1)(s, t);
    tessary_edges_FN(q_group2)(s, t);
    tessary_edges_FN(q_group3)(s, t);
    for (x = 0; x < tessary_edges_CHUNK; ++x) best[x] = -1;
    for (x = 0; x < tessary_edges_CHUNK; ++x) who[x] = 0;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_sum)(t + 0 * tessary_edges_CHUNK + x);
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_sum)(t + 0 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2);
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 0, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 1 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 2 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 1 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 2 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 1, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 3 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 4 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 3 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 4 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 2, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 5 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 6 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 5 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 6 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 3, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_sum)(t + 7 * tessary_edges_CHUNK + x);
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_sum)(t + 7 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2);
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 4, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 5 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 6 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 5 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 6 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 5, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 3 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 4 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 3 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 4 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 6, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 1 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 2 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 1 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 2 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 7, best, who);
    for (x = 0; x < n; ++x) strength[x] = 0.00375549984f * (float)best[x];
    for (x = 0; x < n; ++x) orientation[x] = (unsigned char)who[x];
}

/* Strength and winner of scale 1. */
static tessary_edges_TARGET_Q void tessary_edges_FN(q_edges1)(const int16_t *const *rows,
    ptrdiff_t at, int n, void *work, float *strength, unsigned char *orientation)
{
    int16_t *const s = (int16_t *)work; /* folded rows */
    int32_t *const t = (int32_t *)(void *)(s + tessary_edges_FOLDED_Q); /* products */
    int32_t *const best = t + 16 * tessary_edges_CHUNK;
    int32_t *const who = best + tessary_edges_CHUNK;
    int16_t *const r = (int16_t *)(void *)(who + tessary_edges_CHUNK);
    int x;
    tessary_edges_FN(q_fold)(rows, at, s);
    tessary_edges_FN(q_group4)(s, t);
    tessary_edges_FN(q_group5)(s, t);
    for (x = 0; x < tessary_edges_CHUNK; ++x) best[x] = -1;
    for (x = 0; x < tessary_edges_CHUNK; ++x) who[x] = 0;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_sum)(t + 8 * tessary_edges_CHUNK + x);
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_sum)(t + 8 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2);
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 0, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 9 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 10 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 9 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 10 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 1, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 11 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 12 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 11 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 12 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 2, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 13 * tessary_edges_CHUNK + x), tessary_edges_FN(q_sum)(t + 14 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_sum)(t + 13 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2), tessary_edges_FN(q_sum)(t + 14 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 3, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_sum)(t + 15 * tessary_edges_CHUNK + x);
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_sum)(t + 15 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2);
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 4, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 13 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 14 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 13 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 14 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 5, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 11 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 12 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 11 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 12 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 6, best, who);
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const tessary_edges_FN(q32) l = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 9 * tessary_edges_CHUNK + x)), tessary_edges_FN(q_sum)(t + 10 * tessary_edges_CHUNK + x));
        const tessary_edges_FN(q32) h = tessary_edges_FN(q_plus)(tessary_edges_FN(q_minus)(tessary_edges_FN(q_nought)(), tessary_edges_FN(q_sum)(t + 9 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2)), tessary_edges_FN(q_sum)(t + 10 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2));
        tessary_edges_FN(q_store)(r + x, tessary_edges_FN(q_round)(l, h, 15));
    }
    tessary_edges_FN(q_take)(r, 7, best, who);
    for (x = 0; x < n; ++x) strength[x] = 0.00686406903f * (float)best[x];
    for (x = 0; x < n; ++x) orientation[x] = (unsigned char)who[x];
}

#undef tessary_edges_TARGET_Q
#undef tessary_edges_QFN
#undef tessary_edges_WIDE
#undef tessary_edges_X86
#undef tessary_edges_X86_STREAM
#undef tessary_edges_PAIR
#undef tessary_edges_MAC
#undef tessary_edges_LOAD
#undef tessary_edges_STORE
#undef tessary_edges_MUL_ADD
#undef tessary_edges_STREAM
#undef tessary_edges_TAKE
#undef tessary_edges_ABS

#else /* ============================================================ read once in all */

#ifndef tessary_edges_BUILD_LIBRARY
#define tessary_edges_BUILD_LIBRARY
#endif
#include "tessary_edges.h"

#include <string.h>

#if defined(__GNUC__) && defined(__x86_64__)
#include <cpuid.h>
#include <immintrin.h>
#elif defined(__GNUC__) && defined(__aarch64__)
#include <arm_neon.h>
#endif

#ifndef tessary_edges_MAX_LANES
#define tessary_edges_MAX_LANES 16
#endif

#define tessary_edges_SIZE 13
#define tessary_edges_RADIUS 6
#define tessary_edges_CHUNK 64 /* output pixels computed together */
#define tessary_edges_LINE 80 /* a chunk with its halo, in whole vectors */
#define tessary_edges_FOLDED 1040 /* floats of the folded rows of a chunk */
#define tessary_edges_TILE 3776 /* widest part of the picture that the ring holds */
#define tessary_edges_SCRATCH 2192 /* floats of scratch memory beside the ring */
#define tessary_edges_LINE_Q 96 /* the same in 16-bit codes */
#define tessary_edges_FOLDED_Q 1248 /* codes of the folded rows of a chunk */
#define tessary_edges_SCRATCH_Q 7360 /* bytes of scratch memory beside the ring of codes */
#define tessary_edges_LONGEST 16777216 /* pixels of a side */
#define tessary_edges_STREAM_FROM 8388608.0 /* bytes of output from which stores pass the cache */

/* ---- what the bank is made of */

/* The input table: working value of every Mono8 code. */
static const float tessary_edges_table[256] = {
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

/* 1 x 6 x 4 coefficients, even in y, odd in x */
static const float tessary_edges_group0_taps[24] = {
    0.526036024f, 0.109365344f, 0.0037702322f, 2.5510788e-05f, 0.311547279f, 0.0647721291f,
    0.0022329092f, 1.51395798e-05f, 0.0647215843f, 0.013455987f, 0.000463843346f,
    3.09944153e-06f, 0.00471615791f, 0.000980496407f, 3.38554382e-05f, 2.38418579e-07f,
    0.000120520592f, 2.50339508e-05f, 8.34465027e-07f, 0.0f, 1.07288361e-06f, 2.38418579e-07f,
    0.0f, 0.0f
};

/* 3 x 6 x 5 coefficients, even in y, odd in x */
static const float tessary_edges_group1_taps[90] = {
    0.498781621f, 0.411727726f, 0.243225098f, 0.114765108f, 0.121009648f, 0.09131217f,
    0.00468474627f, 0.00742810965f, 0.00842887163f, 4.02331352e-05f, 0.000112891197f,
    0.000226736069f, 5.96046448e-08f, 4.76837158e-07f, 1.84774399e-06f, 0.270009071f,
    0.172493607f, 0.0730602443f, 0.0647213161f, 0.0555153191f, 0.0289877951f, 0.00282162428f,
    0.00391882658f, 0.00292024016f, 2.643466e-05f, 7.10189342e-05f, 8.8006258e-05f,
    5.96046448e-08f, 3.57627869e-07f, 8.34465027e-07f, 0.0417353213f, 0.00485780835f,
    -0.00748941302f, 0.0114802718f, 0.00372797251f, -0.00239890814f, 0.000605821609f,
    0.000503629446f, -0.000151455402f, 7.03334808e-06f, 1.49011612e-05f, -1.07288361e-06f,
    2.98023224e-08f, 1.1920929e-07f, 2.98023224e-08f, 0.00161418319f, -0.00130355358f,
    -0.000950694084f, 0.000613749027f, -0.000263243914f, -0.000364482403f, 4.4465065e-05f,
    2.95042992e-06f, -3.439188e-05f, 6.85453415e-07f, 7.4505806e-07f, -9.23871994e-07f, 0.0f,
    0.0f, 0.0f, 4.02331352e-06f, -4.14550304e-05f, -1.32024288e-05f, 8.64267349e-06f,
    -1.28149986e-05f, -5.60283661e-06f, 1.04308128e-06f, -6.85453415e-07f, -6.2584877e-07f,
    2.98023224e-08f, 0.0f, -2.98023224e-08f, 0.0f, 0.0f, 0.0f, -2.38418579e-07f,
    -2.38418579e-07f, -5.96046448e-08f, 2.98023224e-08f, -1.1920929e-07f, -2.98023224e-08f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f
};

/* 1 x 4 x 6 coefficients, odd in y, even in x */
static const float tessary_edges_group2_taps[24] = {
    0.526036024f, 0.311547279f, 0.0647215843f, 0.00471615791f, 0.000120520592f, 1.07288361e-06f,
    0.109365344f, 0.0647721291f, 0.013455987f, 0.000980496407f, 2.50339508e-05f,
    2.38418579e-07f, 0.0037702322f, 0.0022329092f, 0.000463843346f, 3.38554382e-05f,
    8.34465027e-07f, 0.0f, 2.5510788e-05f, 1.51395798e-05f, 3.09944153e-06f, 2.38418579e-07f,
    0.0f, 0.0f
};

/* 3 x 5 x 6 coefficients, odd in y, even in x */
static const float tessary_edges_group3_taps[90] = {
    0.243225098f, 0.411727726f, 0.498781621f, 0.0730602443f, 0.172493607f, 0.270009071f,
    -0.00748941302f, 0.00485780835f, 0.0417353213f, -0.000950694084f, -0.00130355358f,
    0.00161418319f, -1.32024288e-05f, -4.14550304e-05f, 4.02331352e-06f, -5.96046448e-08f,
    -2.38418579e-07f, -2.38418579e-07f, 0.09131217f, 0.121009648f, 0.114765108f, 0.0289877951f,
    0.0555153191f, 0.0647213161f, -0.00239890814f, 0.00372797251f, 0.0114802718f,
    -0.000364482403f, -0.000263243914f, 0.000613749027f, -5.60283661e-06f, -1.28149986e-05f,
    8.64267349e-06f, -2.98023224e-08f, -1.1920929e-07f, 2.98023224e-08f, 0.00842887163f,
    0.00742810965f, 0.00468474627f, 0.00292024016f, 0.00391882658f, 0.00282162428f,
    -0.000151455402f, 0.000503629446f, 0.000605821609f, -3.439188e-05f, 2.95042992e-06f,
    4.4465065e-05f, -6.2584877e-07f, -6.85453415e-07f, 1.04308128e-06f, 0.0f, 0.0f, 0.0f,
    0.000226736069f, 0.000112891197f, 4.02331352e-05f, 8.8006258e-05f, 7.10189342e-05f,
    2.643466e-05f, -1.07288361e-06f, 1.49011612e-05f, 7.03334808e-06f, -9.23871994e-07f,
    7.4505806e-07f, 6.85453415e-07f, -2.98023224e-08f, 0.0f, 2.98023224e-08f, 0.0f, 0.0f, 0.0f,
    1.84774399e-06f, 4.76837158e-07f, 5.96046448e-08f, 8.34465027e-07f, 3.57627869e-07f,
    5.96046448e-08f, 2.98023224e-08f, 1.1920929e-07f, 2.98023224e-08f, 0.0f, 0.0f, 0.0f, 0.0f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f
};

/* 4 x 7 x 6 coefficients, even in y, odd in x */
static const float tessary_edges_group4_taps[168] = {
    0.286126912f, 0.267354012f, 0.210289061f, 0.116958439f, 0.267948389f, 0.259010434f,
    0.22112f, 0.133482337f, 0.113478363f, 0.116076052f, 0.113593817f, 0.0786052942f,
    0.0257591009f, 0.0285199881f, 0.0337896347f, 0.0283075571f, 0.00330543518f, 0.00405192375f,
    0.00613814592f, 0.00657504797f, 0.000245511532f, 0.000340878963f, 0.000697314739f,
    0.0010086298f, 0.240026295f, 0.217066765f, 0.15710783f, 0.0798731446f, 0.224776685f,
    0.211247802f, 0.16675964f, 0.0916066468f, 0.0951948166f, 0.0953860879f, 0.0870088339f,
    0.0543870926f, 0.0216088295f, 0.0236831009f, 0.0264434516f, 0.0198093653f, 0.00277286768f,
    0.00340995193f, 0.00493592024f, 0.00466811657f, 0.000205993652f, 0.000291526318f,
    0.00057926774f, 0.000728756189f, 0.141696453f, 0.115823954f, 0.0626197755f, 0.0212448239f,
    0.132694066f, 0.114348173f, 0.0688894391f, 0.0249994397f, 0.0561970472f, 0.0528557897f,
    0.0380399823f, 0.0154673159f, 0.0127564669f, 0.0135473609f, 0.0124464035f, 0.00595089793f,
    0.00163692236f, 0.00202876329f, 0.00253385305f, 0.00149786472f, 0.000121593475f,
    0.000181555748f, 0.000327289104f, 0.000251919031f, 0.0588653088f, 0.0401867628f,
    0.00994896889f, -0.00237435102f, 0.0551254153f, 0.0407602489f, 0.0125001669f,
    -0.00233525038f, 0.0233460665f, 0.0196570456f, 0.0082373023f, -0.000999301672f,
    0.00529944897f, 0.00532114506f, 0.00325143337f, -0.00016400218f, 0.000680029392f,
    0.00084900856f, 0.000792354345f, 2.30073929e-05f, 5.04851341e-05f, 8.14199448e-05f,
    0.000120669603f, 1.55866146e-05f, 0.0172091722f, 0.00884366035f, -0.00141486526f,
    -0.00270107388f, 0.0161158442f, 0.00940337777f, -0.000852882862f, -0.00302094221f,
    0.00682520866f, 0.00485929847f, 0.000149607658f, -0.00171470642f, 0.00154930353f,
    0.001426965f, 0.000318318605f, -0.000582188368f, 0.00019878149f, 0.000248104334f,
    0.000131487846f, -0.000123471022f, 1.47819519e-05f, 2.59280205e-05f, 2.70009041e-05f,
    -1.6450882e-05f, 0.0035404563f, 0.00115907192f, -0.000895619392f, -0.000640422106f,
    0.00331550837f, 0.00134968758f, -0.000849545002f, -0.0007340312f, 0.00140416622f,
    0.000783503056f, -0.000344306231f, -0.000434696674f, 0.00031876564f, 0.000258892775f,
    -5.50746918e-05f, -0.000157266855f, 4.08887863e-05f, 5.01871109e-05f, 4.20212746e-06f,
    -3.65376472e-05f, 3.03983688e-06f, 5.78165054e-06f, 3.06963921e-06f, -5.54323196e-06f,
    0.000512599945f, 7.173419e-05f, -0.000166207552f, -7.37309456e-05f, 0.000479996204f,
    0.000107616186f, -0.000171124935f, -8.6247921e-05f, 0.000203311443f, 7.90655613e-05f,
    -8.28206539e-05f, -5.28097153e-05f, 4.61339951e-05f, 3.12924385e-05f, -2.11000443e-05f,
    -2.00271606e-05f, 5.90085983e-06f, 6.97374344e-06f, -2.47359276e-06f, -4.94718552e-06f,
    4.17232513e-07f, 8.94069672e-07f, 2.98023224e-08f, -8.34465027e-07f
};

/* 4 x 6 x 7 coefficients, odd in y, even in x */
static const float tessary_edges_group5_taps[168] = {
    0.116958439f, 0.210289061f, 0.267354012f, 0.286126912f, 0.0798731446f, 0.15710783f,
    0.217066765f, 0.240026295f, 0.0212448239f, 0.0626197755f, 0.115823954f, 0.141696453f,
    -0.00237435102f, 0.00994896889f, 0.0401867628f, 0.0588653088f, -0.00270107388f,
    -0.00141486526f, 0.00884366035f, 0.0172091722f, -0.000640422106f, -0.000895619392f,
    0.00115907192f, 0.0035404563f, -7.37309456e-05f, -0.000166207552f, 7.173419e-05f,
    0.000512599945f, 0.133482337f, 0.22112f, 0.259010434f, 0.267948389f, 0.0916066468f,
    0.16675964f, 0.211247802f, 0.224776685f, 0.0249994397f, 0.0688894391f, 0.114348173f,
    0.132694066f, -0.00233525038f, 0.0125001669f, 0.0407602489f, 0.0551254153f, -0.00302094221f,
    -0.000852882862f, 0.00940337777f, 0.0161158442f, -0.0007340312f, -0.000849545002f,
    0.00134968758f, 0.00331550837f, -8.6247921e-05f, -0.000171124935f, 0.000107616186f,
    0.000479996204f, 0.0786052942f, 0.113593817f, 0.116076052f, 0.113478363f, 0.0543870926f,
    0.0870088339f, 0.0953860879f, 0.0951948166f, 0.0154673159f, 0.0380399823f, 0.0528557897f,
    0.0561970472f, -0.000999301672f, 0.0082373023f, 0.0196570456f, 0.0233460665f,
    -0.00171470642f, 0.000149607658f, 0.00485929847f, 0.00682520866f, -0.000434696674f,
    -0.000344306231f, 0.000783503056f, 0.00140416622f, -5.28097153e-05f, -8.28206539e-05f,
    7.90655613e-05f, 0.000203311443f, 0.0283075571f, 0.0337896347f, 0.0285199881f,
    0.0257591009f, 0.0198093653f, 0.0264434516f, 0.0236831009f, 0.0216088295f, 0.00595089793f,
    0.0124464035f, 0.0135473609f, 0.0127564669f, -0.00016400218f, 0.00325143337f,
    0.00532114506f, 0.00529944897f, -0.000582188368f, 0.000318318605f, 0.001426965f,
    0.00154930353f, -0.000157266855f, -5.50746918e-05f, 0.000258892775f, 0.00031876564f,
    -2.00271606e-05f, -2.11000443e-05f, 3.12924385e-05f, 4.61339951e-05f, 0.00657504797f,
    0.00613814592f, 0.00405192375f, 0.00330543518f, 0.00466811657f, 0.00493592024f,
    0.00340995193f, 0.00277286768f, 0.00149786472f, 0.00253385305f, 0.00202876329f,
    0.00163692236f, 2.30073929e-05f, 0.000792354345f, 0.00084900856f, 0.000680029392f,
    -0.000123471022f, 0.000131487846f, 0.000248104334f, 0.00019878149f, -3.65376472e-05f,
    4.20212746e-06f, 5.01871109e-05f, 4.08887863e-05f, -4.94718552e-06f, -2.47359276e-06f,
    6.97374344e-06f, 5.90085983e-06f, 0.0010086298f, 0.000697314739f, 0.000340878963f,
    0.000245511532f, 0.000728756189f, 0.00057926774f, 0.000291526318f, 0.000205993652f,
    0.000251919031f, 0.000327289104f, 0.000181555748f, 0.000121593475f, 1.55866146e-05f,
    0.000120669603f, 8.14199448e-05f, 5.04851341e-05f, -1.6450882e-05f, 2.70009041e-05f,
    2.59280205e-05f, 1.47819519e-05f, -5.54323196e-06f, 3.06963921e-06f, 5.78165054e-06f,
    3.03983688e-06f, -8.34465027e-07f, 2.98023224e-08f, 8.94069672e-07f, 4.17232513e-07f
};

static const int16_t tessary_edges_group0_counts[24] = {
    32759, 6811, 235, 2, 19402, 4034, 139, 1, 4031, 838, 29, 0, 294, 61, 2, 0, 8, 2, 0, 0, 0, 0,
    0, 0
};

static const int16_t tessary_edges_group1_counts[90] = {
    31062, 16815, 25640, 10742, 15147, 4550, 7147, 4031, 7536, 3457, 5686, 1805, 292, 176, 463,
    244, 525, 182, 3, 2, 7, 4, 14, 5, 0, 0, 0, 0, 0, 0, 2599, 101, 303, -81, -466, -59, 715, 38,
    232, -16, -149, -23, 38, 3, 31, 0, -9, -2, 0, 0, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, -3, 0,
    -1, 0, 1, 0, -1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0
};

static const int16_t tessary_edges_group2_counts[24] = {
    32759, 19402, 4031, 294, 8, 0, 6811, 4034, 838, 61, 2, 0, 235, 139, 29, 2, 0, 0, 2, 1, 0, 0,
    0, 0
};

static const int16_t tessary_edges_group3_counts[90] = {
    15147, 4550, 25640, 10742, 31062, 16815, -466, -59, 303, -81, 2599, 101, -1, 0, -3, 0, 0, 0,
    5686, 1805, 7536, 3457, 7147, 4031, -149, -23, 232, -16, 715, 38, 0, 0, -1, 0, 1, 0, 525,
    182, 463, 244, 292, 176, -9, -2, 31, 0, 38, 3, 0, 0, 0, 0, 0, 0, 14, 5, 7, 4, 3, 2, 0, 0, 1,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0
};

static const int16_t tessary_edges_group4_counts[168] = {
    9749, 9130, 9109, 8825, 7165, 7534, 3985, 4548, 3866, 878, 3955, 972, 3870, 1151, 2678, 965,
    113, 8, 138, 12, 209, 24, 224, 34, 8178, 7659, 7396, 7198, 5353, 5682, 2721, 3121, 3244,
    736, 3250, 807, 2965, 901, 1853, 675, 94, 7, 116, 10, 168, 20, 159, 25, 4828, 4521, 3946,
    3896, 2134, 2347, 724, 852, 1915, 435, 1801, 462, 1296, 424, 527, 203, 56, 4, 69, 6, 86, 11,
    51, 9, 2006, 1878, 1369, 1389, 339, 426, -81, -80, 795, 181, 670, 181, 281, 111, -34, -6,
    23, 2, 29, 3, 27, 4, 1, 1, 586, 549, 301, 320, -48, -29, -92, -103, 233, 53, 166, 49, 5, 11,
    -58, -20, 7, 1, 8, 1, 4, 1, -4, -1, 121, 113, 39, 46, -31, -29, -22, -25, 48, 11, 27, 9,
    -12, -2, -15, -5, 1, 0, 2, 0, 0, 0, -1, 0, 17, 16, 2, 4, -6, -6, -3, -3, 7, 2, 3, 1, -3, -1,
    -2, -1, 0, 0, 0, 0, 0, 0, 0, 0
};

static const int16_t tessary_edges_group5_counts[168] = {
    3985, 4548, 7165, 7534, 9109, 8825, 9749, 9130, 2721, 3121, 5353, 5682, 7396, 7198, 8178,
    7659, 724, 852, 2134, 2347, 3946, 3896, 4828, 4521, -81, -80, 339, 426, 1369, 1389, 2006,
    1878, -92, -103, -48, -29, 301, 320, 586, 549, -22, -25, -31, -29, 39, 46, 121, 113, -3, -3,
    -6, -6, 2, 4, 17, 16, 2678, 965, 3870, 1151, 3955, 972, 3866, 878, 1853, 675, 2965, 901,
    3250, 807, 3244, 736, 527, 203, 1296, 424, 1801, 462, 1915, 435, -34, -6, 281, 111, 670,
    181, 795, 181, -58, -20, 5, 11, 166, 49, 233, 53, -15, -5, -12, -2, 27, 9, 48, 11, -2, -1,
    -3, -1, 3, 1, 7, 2, 224, 34, 209, 24, 138, 12, 113, 8, 159, 25, 168, 20, 116, 10, 94, 7, 51,
    9, 86, 11, 69, 6, 56, 4, 1, 1, 27, 4, 29, 3, 23, 2, -4, -1, 4, 1, 8, 1, 7, 1, -1, 0, 0, 0,
    2, 0, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0
};

/* Code of every Mono8 value. */
static const int16_t tessary_edges_codes[256] = {
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

static const char *const tessary_edges_names[16] = {
    "step_s0_o0",
    "step_s0_o1",
    "step_s0_o2",
    "step_s0_o3",
    "step_s0_o4",
    "step_s0_o5",
    "step_s0_o6",
    "step_s0_o7",
    "step_s1_o0",
    "step_s1_o1",
    "step_s1_o2",
    "step_s1_o3",
    "step_s1_o4",
    "step_s1_o5",
    "step_s1_o6",
    "step_s1_o7"
};

/* ---- the instruction sets */

struct tessary_edges_code_of {
    void (*responses)(const float *const *, ptrdiff_t, int, float *, char *, ptrdiff_t, int);
    void (*edges[2])(const float *const *, ptrdiff_t, int, float *, float *,
        unsigned char *);
    void (*fft)(const float *, int, int, int, float *, char *, ptrdiff_t, ptrdiff_t, int);
};

#if !defined(__GNUC__) || tessary_edges_MAX_LANES < 4
#define tessary_edges_LANES 1
#else
#define tessary_edges_LANES 4
#endif
#define tessary_edges_FN(x) tessary_edges_##x##_base
#define tessary_edges_TARGET
#include "tessary_edges.c"
static const struct tessary_edges_code_of tessary_edges_base = {tessary_edges_responses_base, {tessary_edges_edges0_base, tessary_edges_edges1_base}, NULL};
#undef tessary_edges_LANES
#undef tessary_edges_FN
#undef tessary_edges_TARGET

#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 8
#define tessary_edges_LANES 8
#define tessary_edges_FN(x) tessary_edges_##x##_avx2
#define tessary_edges_TARGET __attribute__((target("avx2,fma")))
#include "tessary_edges.c"
static const struct tessary_edges_code_of tessary_edges_avx2 = {tessary_edges_responses_avx2, {tessary_edges_edges0_avx2, tessary_edges_edges1_avx2}, NULL};
#undef tessary_edges_LANES
#undef tessary_edges_FN
#undef tessary_edges_TARGET
#endif

#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 16
#define tessary_edges_LANES 16
#define tessary_edges_FN(x) tessary_edges_##x##_avx512
#define tessary_edges_TARGET __attribute__((target("avx512f,avx512vl,avx512bw,avx512dq,avx2,fma")))
#include "tessary_edges.c"
static const struct tessary_edges_code_of tessary_edges_avx512 = {tessary_edges_responses_avx512, {tessary_edges_edges0_avx512, tessary_edges_edges1_avx512}, NULL};
#undef tessary_edges_LANES
#undef tessary_edges_FN
#undef tessary_edges_TARGET
#endif

#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 8
/* What the processor and the operating system hold: asked of the processor itself, as not every
 * compiler's run-time library can tell. 1: AVX2 and FMA, 2: AVX-512 F, VL, BW, DQ, 3: VNNI too. */
static int tessary_edges_processor(void)
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

static const struct tessary_edges_code_of *tessary_edges_choose(void)
{
#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 8
    const int known = tessary_edges_processor();
#if tessary_edges_MAX_LANES >= 16
    if (known >= 2) return &tessary_edges_avx512;
#endif
    if (known >= 1) return &tessary_edges_avx2;
#endif
    return &tessary_edges_base;
}

/* ---- rows of the picture */

struct tessary_edges_picture {
    const unsigned char *pixels;
    ptrdiff_t row_bytes;
    int width, height;
};

/* The pixel that stands for one outside 0 .. size - 1 (mirror101); -1: a working value of zero. */
static int tessary_edges_border(int i, int size)
{
    return i < 0 ? -i : i >= size ? 2 * size - 2 - i : i;
}

static float tessary_edges_value(tessary_edges_pixel p, int *bad)
{
    (void)bad;
    return tessary_edges_table[p];
}

/* Working values of row y, columns from - radius .. from + count + radius - 1, then zeros up
 * to a whole chunk. Returns 1 when a pixel code was beyond the format, else 0. */
static int tessary_edges_fill(const struct tessary_edges_picture *p, int y, int from, int count, float *to)
{
    const int end = count + 2 * tessary_edges_RADIUS;
    const int inner = p->width - from + tessary_edges_RADIUS; /* first index right of the picture */
    const tessary_edges_pixel *row;
    int x = 0, bad = 0;
    y = tessary_edges_border(y, p->height);
    memset(to + end, 0, (size_t)(tessary_edges_LINE - 2 * tessary_edges_RADIUS) * sizeof(float));
    if (y < 0) {
        memset(to, 0, (size_t)end * sizeof(float));
        return 0;
    }
    row = (const tessary_edges_pixel *)(const void *)(p->pixels + (ptrdiff_t)y * p->row_bytes);
    for (; x < tessary_edges_RADIUS - from; ++x) {
        const int i = tessary_edges_border(x + from - tessary_edges_RADIUS, p->width);
        to[x] = i < 0 ? 0.0f : tessary_edges_value(row[i], &bad);
    }
    for (; x < end && x < inner; ++x) to[x] = tessary_edges_value(row[x + from - tessary_edges_RADIUS], &bad);
    for (; x < end; ++x) {
        const int i = tessary_edges_border(x + from - tessary_edges_RADIUS, p->width);
        to[x] = i < 0 ? 0.0f : tessary_edges_value(row[i], &bad);
    }
    return bad;
}

/* ---- the walk */

struct tessary_edges_job {
    int scale; /* -1: responses */
    char *out; /* planes, or strength */
    ptrdiff_t row_bytes, plane_bytes;
    unsigned char *orientation;
    ptrdiff_t orientation_row_bytes;
    int stream;
};

static size_t tessary_edges_ring_width(int width)
{
    const int tile = width < tessary_edges_TILE ? width : tessary_edges_TILE;
    return (size_t)((tile + 15) / 16 * 16 + tessary_edges_LINE);
}

/* One row of outputs, columns from .. from + count - 1. */
static void tessary_edges_row(const struct tessary_edges_code_of *code, const struct tessary_edges_job *job,
    const float *const *rows, int from, int count, int y, float *work)
{
    char *const out = job->out + (ptrdiff_t)y * job->row_bytes + (ptrdiff_t)from * 4;
    /* a first, shorter stretch, so that all others begin on a cache line */
    int n = tessary_edges_CHUNK - (int)(((uintptr_t)out & 63u) / 4u);
    int x = 0;
    while (x < count) {
        char *const to = out + (ptrdiff_t)x * 4;
        if (n > count - x) n = count - x;
        if (job->scale < 0) {
            code->responses(rows, x, n, work, to, job->plane_bytes, job->stream);
        } else {
            code->edges[job->scale](rows, x, n, work, (float *)(void *)to,
                job->orientation + (ptrdiff_t)y * job->orientation_row_bytes + from + x);
        }
        x += n;
        n = tessary_edges_CHUNK;
    }
}

static int tessary_edges_walk(const struct tessary_edges_picture *p, const struct tessary_edges_job *job, int first, int count,
    void *scratch)
{
    const struct tessary_edges_code_of *const code = tessary_edges_choose();
    const size_t width = tessary_edges_ring_width(p->width);
    float *const ring = (float *)(void *)((unsigned char *)scratch +
        ((64u - ((uintptr_t)scratch & 63u)) & 63u));
    float *const work = ring + tessary_edges_SIZE * width;
    int bad = 0, from;
    for (from = 0; from < p->width; from += tessary_edges_TILE) {
        const int part = p->width - from < tessary_edges_TILE ? p->width - from : tessary_edges_TILE;
        const float *rows[tessary_edges_SIZE];
        int y, j;
        for (j = 0; j < tessary_edges_SIZE - 1; ++j) {
            bad |= tessary_edges_fill(p, first + j - tessary_edges_RADIUS, from, part, ring + (size_t)j * width);
        }
        for (y = 0; y < count; ++y) {
            const int last = (y + tessary_edges_SIZE - 1) % tessary_edges_SIZE;
            bad |= tessary_edges_fill(p, first + y + tessary_edges_RADIUS, from, part, ring + (size_t)last * width);
            for (j = 0; j < tessary_edges_SIZE; ++j) {
                rows[j] = ring + (size_t)((y + j) % tessary_edges_SIZE) * width;
            }
            tessary_edges_row(code, job, rows, from, part, y, work);
        }
    }
#if defined(__GNUC__) && defined(__SSE2__)
    if (job->stream) _mm_sfence();
#endif
    return bad ? tessary_edges_BAD_PIXEL : tessary_edges_OK;
}

/* ---- arguments */

static ptrdiff_t tessary_edges_reach(ptrdiff_t stride)
{
    if (stride >= 0) return stride;
    return stride < -PTRDIFF_MAX ? PTRDIFF_MAX : -stride;
}

static int tessary_edges_check_picture(const struct tessary_edges_picture *p, int first, int count)
{
    const ptrdiff_t pixel = (ptrdiff_t)sizeof(tessary_edges_pixel);
    if (p->pixels == NULL) return tessary_edges_NO_IMAGE;
    if (p->width < tessary_edges_SIZE || p->width > tessary_edges_LONGEST) return tessary_edges_BAD_WIDTH;
    if (p->height < tessary_edges_SIZE || p->height > tessary_edges_LONGEST) return tessary_edges_BAD_HEIGHT;
    if ((uintptr_t)p->pixels % sizeof(tessary_edges_pixel) != 0 || p->row_bytes % pixel != 0)
        return tessary_edges_IMAGE_MISALIGNED;
    if (tessary_edges_reach(p->row_bytes) < p->width * pixel) return tessary_edges_BAD_ROW_BYTES;
    if (first < 0 || count < 1 || first > p->height - count) return tessary_edges_BAD_ROWS;
    return tessary_edges_OK;
}

/* Do rows or planes of the output overlap? Planes may lie one after the other, or be
 * interleaved row by row. */
static int tessary_edges_overlap(ptrdiff_t row, ptrdiff_t plane, ptrdiff_t bytes, int rows)
{
    row = tessary_edges_reach(row);
    plane = tessary_edges_reach(plane);
    if (tessary_edges_KERNEL_COUNT == 1) return 0;
    if (plane < bytes) return 1;
    if ((plane - bytes) / row >= rows - 1) return 0;
    return (row - bytes) / plane < tessary_edges_KERNEL_COUNT - 1;
}

/* Check the arguments of a call that writes planes of values of some bytes, and fill in the job. */
static int tessary_edges_check_planes(struct tessary_edges_picture *p, struct tessary_edges_job *job, const tessary_edges_pixel *image,
    ptrdiff_t row_bytes, int width, int height, int first, int count, char *out,
    ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, int bytes, const void *scratch)
{
    int code;
    p->pixels = (const unsigned char *)image;
    p->row_bytes = row_bytes;
    p->width = width;
    p->height = height;
    code = tessary_edges_check_picture(p, first, count);
    if (code != tessary_edges_OK) return code;
    if (out == NULL) return tessary_edges_NO_OUTPUT;
    if ((uintptr_t)out % (unsigned)bytes != 0 || out_row_bytes % bytes != 0 ||
        out_plane_bytes % bytes != 0)
        return tessary_edges_OUTPUT_MISALIGNED;
    if (tessary_edges_reach(out_row_bytes) < (ptrdiff_t)width * bytes) return tessary_edges_BAD_OUTPUT_ROW_BYTES;
    if (tessary_edges_overlap(out_row_bytes, out_plane_bytes, (ptrdiff_t)width * bytes, count))
        return tessary_edges_BAD_OUTPUT_PLANE_BYTES;
    if (scratch == NULL) return tessary_edges_NO_SCRATCH;
    job->scale = -1;
    job->out = out;
    job->row_bytes = out_row_bytes;
    job->plane_bytes = out_plane_bytes;
    job->orientation = NULL;
    job->orientation_row_bytes = 0;
    /* judged by the whole picture: bands of one picture are usually made side by side */
    job->stream = (double)bytes * tessary_edges_KERNEL_COUNT * width * height >= tessary_edges_STREAM_FROM;
    return tessary_edges_OK;
}

static int tessary_edges_check_edges(struct tessary_edges_picture *p, struct tessary_edges_job *job, const tessary_edges_pixel *image,
    ptrdiff_t row_bytes, int width, int height, int first, int count, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, const void *scratch)
{
    int code;
    p->pixels = (const unsigned char *)image;
    p->row_bytes = row_bytes;
    p->width = width;
    p->height = height;
    code = tessary_edges_check_picture(p, first, count);
    if (code != tessary_edges_OK) return code;
    if (scale < 0 || scale >= tessary_edges_SCALE_COUNT) return tessary_edges_BAD_SCALE;
    if (strength == NULL) return tessary_edges_NO_STRENGTH;
    if ((uintptr_t)strength % 4u != 0 || strength_row_bytes % 4 != 0)
        return tessary_edges_STRENGTH_MISALIGNED;
    if (tessary_edges_reach(strength_row_bytes) < (ptrdiff_t)width * 4) return tessary_edges_BAD_STRENGTH_ROW_BYTES;
    if (orientation == NULL) return tessary_edges_NO_ORIENTATION;
    if (tessary_edges_reach(orientation_row_bytes) < width) return tessary_edges_BAD_ORIENTATION_ROW_BYTES;
    if (scratch == NULL) return tessary_edges_NO_SCRATCH;
    job->scale = scale;
    job->out = (char *)strength;
    job->row_bytes = strength_row_bytes;
    job->plane_bytes = 0;
    job->orientation = orientation;
    job->orientation_row_bytes = orientation_row_bytes;
    job->stream = 0;
    return tessary_edges_OK;
}

/* ---- fixed point */

struct tessary_edges_code_of_q {
    uint64_t (*responses)(const int16_t *const *, ptrdiff_t, int, void *, char *, ptrdiff_t, int);
    void (*edges[2])(const int16_t *const *, ptrdiff_t, int, void *, float *,
        unsigned char *);
};

static const struct tessary_edges_code_of_q tessary_edges_q_base = {tessary_edges_q_responses_base, {tessary_edges_q_edges0_base, tessary_edges_q_edges1_base}};
#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 8
static const struct tessary_edges_code_of_q tessary_edges_q_avx2 = {tessary_edges_q_responses_avx2, {tessary_edges_q_edges0_avx2, tessary_edges_q_edges1_avx2}};
#endif
#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 16
static const struct tessary_edges_code_of_q tessary_edges_q_avx512 = {tessary_edges_q_responses_avx512, {tessary_edges_q_edges0_avx512, tessary_edges_q_edges1_avx512}};
#endif

static const struct tessary_edges_code_of_q *tessary_edges_choose_q(void)
{
#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 8
    const int known = tessary_edges_processor();
#if tessary_edges_MAX_LANES >= 16
    if (known >= 3) return &tessary_edges_q_avx512;
#endif
    if (known >= 1) return &tessary_edges_q_avx2;
#endif
    return &tessary_edges_q_base;
}

static int16_t tessary_edges_value_q(tessary_edges_pixel p, int *bad)
{
    (void)bad;
    return tessary_edges_codes[p];
}

/* As tessary_edges_fill, in codes. */
static int tessary_edges_fill_q(const struct tessary_edges_picture *p, int y, int from, int count, int16_t *to)
{
    const int end = count + 2 * tessary_edges_RADIUS;
    const int inner = p->width - from + tessary_edges_RADIUS;
    const tessary_edges_pixel *row;
    int x = 0, bad = 0;
    y = tessary_edges_border(y, p->height);
    memset(to + end, 0, (size_t)(tessary_edges_LINE_Q - 2 * tessary_edges_RADIUS) * sizeof(int16_t));
    if (y < 0) {
        memset(to, 0, (size_t)end * sizeof(int16_t));
        return 0;
    }
    row = (const tessary_edges_pixel *)(const void *)(p->pixels + (ptrdiff_t)y * p->row_bytes);
    for (; x < tessary_edges_RADIUS - from; ++x) {
        const int i = tessary_edges_border(x + from - tessary_edges_RADIUS, p->width);
        to[x] = (int16_t)(i < 0 ? 0 : tessary_edges_value_q(row[i], &bad));
    }
    for (; x < end && x < inner; ++x) to[x] = tessary_edges_value_q(row[x + from - tessary_edges_RADIUS], &bad);
    for (; x < end; ++x) {
        const int i = tessary_edges_border(x + from - tessary_edges_RADIUS, p->width);
        to[x] = (int16_t)(i < 0 ? 0 : tessary_edges_value_q(row[i], &bad));
    }
    return bad;
}

static size_t tessary_edges_ring_width_q(int width)
{
    const int tile = width < tessary_edges_TILE ? width : tessary_edges_TILE;
    return (size_t)((tile + 31) / 32 * 32 + tessary_edges_LINE_Q);
}

/* One row of outputs; returns how many counts stand at the ends of their range. */
static uint64_t tessary_edges_row_q(const struct tessary_edges_code_of_q *code, const struct tessary_edges_job *job,
    const int16_t *const *rows, int from, int count, int y, void *work)
{
    const int bytes = job->scale < 0 ? 2 : 4;
    char *const out = job->out + (ptrdiff_t)y * job->row_bytes + (ptrdiff_t)from * bytes;
    int n = tessary_edges_CHUNK - (int)(((uintptr_t)out & 63u) / (unsigned)bytes);
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
        n = tessary_edges_CHUNK;
    }
    return ends;
}

static int tessary_edges_walk_q(const struct tessary_edges_picture *p, const struct tessary_edges_job *job, int first, int count,
    uint64_t *saturated, void *scratch)
{
    const struct tessary_edges_code_of_q *const code = tessary_edges_choose_q();
    const size_t width = tessary_edges_ring_width_q(p->width);
    int16_t *const ring = (int16_t *)(void *)((unsigned char *)scratch +
        ((64u - ((uintptr_t)scratch & 63u)) & 63u));
    void *const work = ring + tessary_edges_SIZE * width;
    uint64_t ends = 0;
    int bad = 0, from;
    for (from = 0; from < p->width; from += tessary_edges_TILE) {
        const int part = p->width - from < tessary_edges_TILE ? p->width - from : tessary_edges_TILE;
        const int16_t *rows[tessary_edges_SIZE];
        int y, j;
        for (j = 0; j < tessary_edges_SIZE - 1; ++j) {
            bad |= tessary_edges_fill_q(p, first + j - tessary_edges_RADIUS, from, part, ring + (size_t)j * width);
        }
        for (y = 0; y < count; ++y) {
            const int last = (y + tessary_edges_SIZE - 1) % tessary_edges_SIZE;
            bad |= tessary_edges_fill_q(p, first + y + tessary_edges_RADIUS, from, part, ring + (size_t)last * width);
            for (j = 0; j < tessary_edges_SIZE; ++j) {
                rows[j] = ring + (size_t)((y + j) % tessary_edges_SIZE) * width;
            }
            ends += tessary_edges_row_q(code, job, rows, from, part, y, work);
        }
    }
#if defined(__GNUC__) && defined(__SSE2__)
    if (job->stream) _mm_sfence();
#endif
    if (saturated != NULL) *saturated = ends;
    return bad ? tessary_edges_BAD_PIXEL : tessary_edges_OK;
}

float tessary_edges_q_step(int index)
{
    static const float steps[16] = {
        0.00375549984f, 0.00375549984f, 0.00375549984f, 0.00375549984f, 0.00375549984f,
        0.00375549984f, 0.00375549984f, 0.00375549984f, 0.00686406903f, 0.00686406903f,
        0.00686406903f, 0.00686406903f, 0.00686406903f, 0.00686406903f, 0.00686406903f,
        0.00686406903f
    };
    return index < 0 || index >= tessary_edges_KERNEL_COUNT ? 0.0f : steps[index];
}

int tessary_edges_responses_q_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int16_t *out, ptrdiff_t out_row_bytes,
    ptrdiff_t out_plane_bytes, uint64_t *saturated, void *scratch)
{
    struct tessary_edges_picture p;
    struct tessary_edges_job job;
    const int code = tessary_edges_check_planes(&p, &job, image, row_bytes, width, height, first_row,
        row_count, (char *)out, out_row_bytes, out_plane_bytes, 2, scratch);
    if (code != tessary_edges_OK) return code;
    return tessary_edges_walk_q(&p, &job, first_row, row_count, saturated, scratch);
}

int tessary_edges_responses_q(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int16_t *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, uint64_t *saturated,
    void *scratch)
{
    return tessary_edges_responses_q_rows(image, row_bytes, width, height, 0, height,
        out, out_row_bytes, out_plane_bytes, saturated, scratch);
}

int tessary_edges_edges_q_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch)
{
    struct tessary_edges_picture p;
    struct tessary_edges_job job;
    const int code = tessary_edges_check_edges(&p, &job, image, row_bytes, width, height, first_row,
        row_count, scale, strength, strength_row_bytes, orientation, orientation_row_bytes,
        scratch);
    if (code != tessary_edges_OK) return code;
    return tessary_edges_walk_q(&p, &job, first_row, row_count, NULL, scratch);
}

int tessary_edges_edges_q(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch)
{
    return tessary_edges_edges_q_rows(image, row_bytes, width, height, 0, height, scale,
        strength, strength_row_bytes, orientation, orientation_row_bytes, scratch);
}

/* ---- what a program calls */

int tessary_edges_abi(void) { return tessary_edges_ABI; }

int tessary_edges_kernel_count(void) { return tessary_edges_KERNEL_COUNT; }

int tessary_edges_scale_count(void) { return tessary_edges_SCALE_COUNT; }

const char *tessary_edges_kernel_name(int index)
{
    return index < 0 || index >= tessary_edges_KERNEL_COUNT ? NULL : tessary_edges_names[index];
}

const char *tessary_edges_message(int code)
{
    switch (code) {
    case tessary_edges_OK: return "success";
    case tessary_edges_NO_IMAGE: return "image is NULL";
    case tessary_edges_BAD_WIDTH: return "width is smaller than a kernel, or larger than 16777216";
    case tessary_edges_BAD_HEIGHT: return "height is smaller than a kernel, or larger than 16777216";
    case tessary_edges_IMAGE_MISALIGNED: return "image or row_bytes is not a multiple of the pixel's size";
    case tessary_edges_BAD_ROW_BYTES: return "row_bytes is smaller than a row of pixels";
    case tessary_edges_BAD_ROWS: return "first_row and row_count do not lie inside the picture";
    case tessary_edges_BAD_SCALE: return "there is no such scale in this bank";
    case tessary_edges_NO_OUTPUT: return "out is NULL";
    case tessary_edges_OUTPUT_MISALIGNED: return "out, out_row_bytes or out_plane_bytes is not a multiple of a value's size";
    case tessary_edges_BAD_OUTPUT_ROW_BYTES: return "out_row_bytes is smaller than a row of values";
    case tessary_edges_BAD_OUTPUT_PLANE_BYTES: return "out_plane_bytes makes the planes overlap";
    case tessary_edges_NO_STRENGTH: return "strength is NULL";
    case tessary_edges_STRENGTH_MISALIGNED: return "strength or strength_row_bytes is not a multiple of 4";
    case tessary_edges_BAD_STRENGTH_ROW_BYTES: return "strength_row_bytes is smaller than a row of floats";
    case tessary_edges_NO_ORIENTATION: return "orientation is NULL";
    case tessary_edges_BAD_ORIENTATION_ROW_BYTES: return "orientation_row_bytes is smaller than a row";
    case tessary_edges_NO_SCRATCH: return "scratch is NULL";
    case tessary_edges_BAD_PIXEL: return "a pixel code is beyond the pixel format; the output is not to be used";
    default: return "unknown code";
    }
}

size_t tessary_edges_scratch_bytes(int width, int height)
{
    size_t bytes;
    if (width < tessary_edges_SIZE || width > tessary_edges_LONGEST) return 0;
    if (height < tessary_edges_SIZE || height > tessary_edges_LONGEST) return 0;
    bytes = (tessary_edges_SIZE * tessary_edges_ring_width(width) + tessary_edges_SCRATCH) * sizeof(float) + 64;
    {
        const size_t codes = tessary_edges_SIZE * tessary_edges_ring_width_q(width) * sizeof(int16_t)
            + tessary_edges_SCRATCH_Q + 64;
        if (codes > bytes) bytes = codes;
    }
    return bytes;
}

int tessary_edges_responses_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count,
    float *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, void *scratch)
{
    struct tessary_edges_picture p;
    struct tessary_edges_job job;
    int code = tessary_edges_check_planes(&p, &job, image, row_bytes, width, height, first_row,
        row_count, (char *)out, out_row_bytes, out_plane_bytes, 4, scratch);
    if (code != tessary_edges_OK) return code;
    code = tessary_edges_walk(&p, &job, first_row, row_count, scratch);
    return code;
}

int tessary_edges_responses(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    float *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, void *scratch)
{
    return tessary_edges_responses_rows(image, row_bytes, width, height, 0, height,
        out, out_row_bytes, out_plane_bytes, scratch);
}

int tessary_edges_edges_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch)
{
    struct tessary_edges_picture p;
    struct tessary_edges_job job;
    const int code = tessary_edges_check_edges(&p, &job, image, row_bytes, width, height, first_row,
        row_count, scale, strength, strength_row_bytes, orientation, orientation_row_bytes,
        scratch);
    if (code != tessary_edges_OK) return code;
    return tessary_edges_walk(&p, &job, first_row, row_count, scratch);
}

int tessary_edges_edges(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch)
{
    return tessary_edges_edges_rows(image, row_bytes, width, height, 0, height, scale,
        strength, strength_row_bytes, orientation, orientation_row_bytes, scratch);
}

#endif
