/* tessary_edges: the code of the bank; tessary_edges.h describes it.
 *
 * The content of this folder is its maker's own. The parts that come from patchlab's
 * templates are granted to everyone for any use, without conditions or attribution.
 *
 * How it works: the picture is walked from top to bottom, once. A ring holds the
 * working values of the last 21 rows. For every stretch of tessary_edges_CHUNK output pixels
 * the rows of the ring are folded (added and subtracted about the middle row) and
 * dotted with the plan's coefficients; a kernel's response is a signed sum of such
 * products. Kernels by tile transforms or at half resolution, where the plan
 * has any, take blocks of rows instead.
 * The plan: parity, 1456 multiplies a pixel.
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

/* 4 x 9 x 8 coefficients, even in y, odd in x */
static tessary_edges_TARGET void tessary_edges_FN(group0)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += 2 * tessary_edges_LANES) {
        const float *k = tessary_edges_group0_taps;
        tessary_edges_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_edges_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_edges_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        tessary_edges_FN(vec) a3 = {0.0f}, b3 = {0.0f};
        int j, i;
        for (j = 0; j < 9; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_edges_LINE + x + tessary_edges_RADIUS;
            for (i = 1; i < 9; ++i) {
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
        tessary_edges_STORE(t + 0 * tessary_edges_CHUNK + x, a0);
        tessary_edges_STORE(t + 0 * tessary_edges_CHUNK + x + tessary_edges_LANES, b0);
        tessary_edges_STORE(t + 1 * tessary_edges_CHUNK + x, a1);
        tessary_edges_STORE(t + 1 * tessary_edges_CHUNK + x + tessary_edges_LANES, b1);
        tessary_edges_STORE(t + 3 * tessary_edges_CHUNK + x, a2);
        tessary_edges_STORE(t + 3 * tessary_edges_CHUNK + x + tessary_edges_LANES, b2);
        tessary_edges_STORE(t + 5 * tessary_edges_CHUNK + x, a3);
        tessary_edges_STORE(t + 5 * tessary_edges_CHUNK + x + tessary_edges_LANES, b3);
    }
}

/* 4 x 8 x 9 coefficients, odd in y, even in x */
static tessary_edges_TARGET void tessary_edges_FN(group1)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += 2 * tessary_edges_LANES) {
        const float *k = tessary_edges_group1_taps;
        tessary_edges_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_edges_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_edges_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        tessary_edges_FN(vec) a3 = {0.0f}, b3 = {0.0f};
        int j, i;
        for (j = 11; j < 19; ++j) {
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
            for (i = 1; i < 9; ++i) {
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
        tessary_edges_STORE(t + 2 * tessary_edges_CHUNK + x, a0);
        tessary_edges_STORE(t + 2 * tessary_edges_CHUNK + x + tessary_edges_LANES, b0);
        tessary_edges_STORE(t + 4 * tessary_edges_CHUNK + x, a1);
        tessary_edges_STORE(t + 4 * tessary_edges_CHUNK + x + tessary_edges_LANES, b1);
        tessary_edges_STORE(t + 6 * tessary_edges_CHUNK + x, a2);
        tessary_edges_STORE(t + 6 * tessary_edges_CHUNK + x + tessary_edges_LANES, b2);
        tessary_edges_STORE(t + 7 * tessary_edges_CHUNK + x, a3);
        tessary_edges_STORE(t + 7 * tessary_edges_CHUNK + x + tessary_edges_LANES, b3);
    }
}

/* 4 x 11 x 10 coefficients, even in y, odd in x */
static tessary_edges_TARGET void tessary_edges_FN(group2)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += 2 * tessary_edges_LANES) {
        const float *k = tessary_edges_group2_taps;
        tessary_edges_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_edges_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_edges_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        tessary_edges_FN(vec) a3 = {0.0f}, b3 = {0.0f};
        int j, i;
        for (j = 0; j < 11; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_edges_LINE + x + tessary_edges_RADIUS;
            for (i = 1; i < 11; ++i) {
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

/* 4 x 10 x 11 coefficients, odd in y, even in x */
static tessary_edges_TARGET void tessary_edges_FN(group3)(const float *s, float *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += 2 * tessary_edges_LANES) {
        const float *k = tessary_edges_group3_taps;
        tessary_edges_FN(vec) a0 = {0.0f}, b0 = {0.0f};
        tessary_edges_FN(vec) a1 = {0.0f}, b1 = {0.0f};
        tessary_edges_FN(vec) a2 = {0.0f}, b2 = {0.0f};
        tessary_edges_FN(vec) a3 = {0.0f}, b3 = {0.0f};
        int j, i;
        for (j = 11; j < 21; ++j) {
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
            for (i = 1; i < 11; ++i) {
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
    tessary_edges_FN(group2)(work, t);
    tessary_edges_FN(group3)(work, t);
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

/* Strengths and winners of all scales. */
static tessary_edges_TARGET void tessary_edges_FN(edges_all)(const float *const *rows, ptrdiff_t at, int n,
    float *work, char *strength, ptrdiff_t plane, unsigned char *orientation,
    ptrdiff_t turns)
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
    memcpy((float *)(void *)(strength + 0 * plane), top, (size_t)n * sizeof(float));
    for (x = 0; x < n; ++x) (orientation + 0 * turns)[x] = (unsigned char)winner[x];
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
    memcpy((float *)(void *)(strength + 1 * plane), top, (size_t)n * sizeof(float));
    for (x = 0; x < n; ++x) (orientation + 1 * turns)[x] = (unsigned char)winner[x];
}

#if tessary_edges_LANES == 16
/* with a full mask, as some compilers take the plain form's own header for a mistake */
#define tessary_edges_LEAST(a, b) \
    ((tessary_edges_FN(vec))_mm512_maskz_min_ps((__mmask16)0xffff, (__m512)(a), (__m512)(b)))
#define tessary_edges_MOST(a, b) \
    ((tessary_edges_FN(vec))_mm512_maskz_max_ps((__mmask16)0xffff, (__m512)(a), (__m512)(b)))
#elif tessary_edges_LANES == 8
#define tessary_edges_LEAST(a, b) ((tessary_edges_FN(vec))_mm256_min_ps((__m256)(a), (__m256)(b)))
#define tessary_edges_MOST(a, b) ((tessary_edges_FN(vec))_mm256_max_ps((__m256)(a), (__m256)(b)))
#elif tessary_edges_LANES == 4 && defined(__SSE2__)
#define tessary_edges_LEAST(a, b) ((tessary_edges_FN(vec))_mm_min_ps((__m128)(a), (__m128)(b)))
#define tessary_edges_MOST(a, b) ((tessary_edges_FN(vec))_mm_max_ps((__m128)(a), (__m128)(b)))
#elif tessary_edges_LANES == 4 && defined(__aarch64__)
#define tessary_edges_LEAST(a, b) ((tessary_edges_FN(vec))vminq_f32((float32x4_t)(a), (float32x4_t)(b)))
#define tessary_edges_MOST(a, b) ((tessary_edges_FN(vec))vmaxq_f32((float32x4_t)(a), (float32x4_t)(b)))
#elif tessary_edges_LANES == 4
typedef int tessary_edges_FN(pick) __attribute__((vector_size(16)));
static inline tessary_edges_FN(vec) tessary_edges_FN(least)(tessary_edges_FN(vec) a, tessary_edges_FN(vec) b)
{
    const tessary_edges_FN(pick) m = a < b;
    return (tessary_edges_FN(vec))(((tessary_edges_FN(pick))a & m) | ((tessary_edges_FN(pick))b & ~m));
}
#define tessary_edges_LEAST(a, b) tessary_edges_FN(least)((a), (b))
#define tessary_edges_MOST(a, b) (-tessary_edges_FN(least)(-(a), -(b)))
#else
#define tessary_edges_LEAST(a, b) ((a) < (b) ? (a) : (b))
#define tessary_edges_MOST(a, b) ((a) > (b) ? (a) : (b))
#endif

/* The least and the largest values of stretches of a row, 16 of each side by side. */
static tessary_edges_TARGET void tessary_edges_FN(range)(const float *row, int stretches, float *to)
{
    int s, x, i;
    for (s = 0; s < stretches; ++s, row += tessary_edges_CHUNK, to += 32) {
        for (x = 0; x < 16; x += tessary_edges_LANES) {
            tessary_edges_FN(vec) low = tessary_edges_LOAD(row + x), high = low;
            for (i = 16; i < tessary_edges_CHUNK; i += 16) {
                const tessary_edges_FN(vec) v = tessary_edges_LOAD(row + i + x);
                low = tessary_edges_LEAST(low, v);
                high = tessary_edges_MOST(high, v);
            }
            tessary_edges_STORE(to + x, low);
            tessary_edges_STORE(to + 16 + x, high);
        }
    }
}

/* The least and the largest value of some rows' stretches. */
static tessary_edges_TARGET void tessary_edges_FN(spread)(const float *const *ranges, int at, float *low, float *high)
{
    float found[32];
    int x, j, s;
    for (x = 0; x < 16; x += tessary_edges_LANES) {
        tessary_edges_FN(vec) l = tessary_edges_LOAD(ranges[0] + at * 32 + x);
        tessary_edges_FN(vec) h = tessary_edges_LOAD(ranges[0] + at * 32 + 16 + x);
        for (j = 0; j < tessary_edges_FLAT_ROWS; ++j) {
            for (s = at; s < at + tessary_edges_FLAT_SPAN; ++s) {
                l = tessary_edges_LEAST(l, tessary_edges_LOAD(ranges[j] + s * 32 + x));
                h = tessary_edges_MOST(h, tessary_edges_LOAD(ranges[j] + s * 32 + 16 + x));
            }
        }
        tessary_edges_STORE(found + x, l);
        tessary_edges_STORE(found + 16 + x, h);
    }
    *low = found[0];
    *high = found[16];
    for (x = 1; x < 16; ++x) {
        if (found[x] < *low) *low = found[x];
        if (found[16 + x] > *high) *high = found[16 + x];
    }
}

#undef tessary_edges_LEAST
#undef tessary_edges_MOST

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
        tessary_edges_FN(q32) a1 = tessary_edges_FN(q_nought)(), b1 = a1;
        tessary_edges_FN(q32) a2 = tessary_edges_FN(q_nought)(), b2 = a2;
        tessary_edges_FN(q32) a3 = tessary_edges_FN(q_nought)(), b3 = a3;
        int j;
        for (j = 0; j < 9; j += 1) {
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
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 7), tessary_edges_FN(q_load)(r - 7));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 8), tessary_edges_FN(q_load)(r - 8));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
        }
        tessary_edges_FN(q_keep)(t + 0 * tessary_edges_CHUNK + x, a0);
        tessary_edges_FN(q_keep)(t + 0 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b0);
        tessary_edges_FN(q_keep)(t + 1 * tessary_edges_CHUNK + x, a1);
        tessary_edges_FN(q_keep)(t + 1 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b1);
        tessary_edges_FN(q_keep)(t + 3 * tessary_edges_CHUNK + x, a2);
        tessary_edges_FN(q_keep)(t + 3 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b2);
        tessary_edges_FN(q_keep)(t + 5 * tessary_edges_CHUNK + x, a3);
        tessary_edges_FN(q_keep)(t + 5 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b3);
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
        tessary_edges_FN(q32) a3 = tessary_edges_FN(q_nought)(), b3 = a3;
        int j;
        for (j = 11; j < 19; j += 2) {
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
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 7), tessary_edges_FN(q_load)(r - 7));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 7), tessary_edges_FN(q_load)(r2 - 7));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 8), tessary_edges_FN(q_load)(r - 8));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 8), tessary_edges_FN(q_load)(r2 - 8));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
        }
        tessary_edges_FN(q_keep)(t + 2 * tessary_edges_CHUNK + x, a0);
        tessary_edges_FN(q_keep)(t + 2 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b0);
        tessary_edges_FN(q_keep)(t + 4 * tessary_edges_CHUNK + x, a1);
        tessary_edges_FN(q_keep)(t + 4 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b1);
        tessary_edges_FN(q_keep)(t + 6 * tessary_edges_CHUNK + x, a2);
        tessary_edges_FN(q_keep)(t + 6 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b2);
        tessary_edges_FN(q_keep)(t + 7 * tessary_edges_CHUNK + x, a3);
        tessary_edges_FN(q_keep)(t + 7 * tessary_edges_CHUNK + x + tessary_edges_WIDE / 2, b3);
    }
}

static tessary_edges_TARGET_Q void tessary_edges_FN(q_group2)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const int16_t *k = tessary_edges_group2_counts;
        tessary_edges_FN(q32) a0 = tessary_edges_FN(q_nought)(), b0 = a0;
        tessary_edges_FN(q32) a1 = tessary_edges_FN(q_nought)(), b1 = a1;
        tessary_edges_FN(q32) a2 = tessary_edges_FN(q_nought)(), b2 = a2;
        tessary_edges_FN(q32) a3 = tessary_edges_FN(q_nought)(), b3 = a3;
        int j;
        for (j = 0; j < 11; j += 1) {
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
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 7), tessary_edges_FN(q_load)(r - 7));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 8), tessary_edges_FN(q_load)(r - 8));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 9), tessary_edges_FN(q_load)(r - 9));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_sub)(tessary_edges_FN(q_load)(r + 10), tessary_edges_FN(q_load)(r - 10));
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

static tessary_edges_TARGET_Q void tessary_edges_FN(q_group3)(const int16_t *s, int32_t *t)
{
    int x;
    for (x = 0; x < tessary_edges_CHUNK; x += tessary_edges_WIDE) {
        const int16_t *k = tessary_edges_group3_counts;
        tessary_edges_FN(q32) a0 = tessary_edges_FN(q_nought)(), b0 = a0;
        tessary_edges_FN(q32) a1 = tessary_edges_FN(q_nought)(), b1 = a1;
        tessary_edges_FN(q32) a2 = tessary_edges_FN(q_nought)(), b2 = a2;
        tessary_edges_FN(q32) a3 = tessary_edges_FN(q_nought)(), b3 = a3;
        int j;
        for (j = 11; j < 21; j += 2) {
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
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 7), tessary_edges_FN(q_load)(r - 7));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 7), tessary_edges_FN(q_load)(r2 - 7));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 8), tessary_edges_FN(q_load)(r - 8));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 8), tessary_edges_FN(q_load)(r2 - 8));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 9), tessary_edges_FN(q_load)(r - 9));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 9), tessary_edges_FN(q_load)(r2 - 9));
                tessary_edges_PAIR(v, w);
                tessary_edges_MAC(a0, b0, k + 0);
                tessary_edges_MAC(a1, b1, k + 2);
                tessary_edges_MAC(a2, b2, k + 4);
                tessary_edges_MAC(a3, b3, k + 6);
                k += 8;
            }
            {
                const tessary_edges_FN(q16) v = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r + 10), tessary_edges_FN(q_load)(r - 10));
                const tessary_edges_FN(q16) w = tessary_edges_FN(q_add)(tessary_edges_FN(q_load)(r2 + 10), tessary_edges_FN(q_load)(r2 - 10));
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
    for (x = 0; x < n; ++x) strength[x] = 0.00559698977f * (float)best[x];
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
    tessary_edges_FN(q_group2)(s, t);
    tessary_edges_FN(q_group3)(s, t);
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
    for (x = 0; x < n; ++x) strength[x] = 0.0128518632f * (float)best[x];
    for (x = 0; x < n; ++x) orientation[x] = (unsigned char)who[x];
}

#undef tessary_edges_TARGET_Q
#undef tessary_edges_QFN
#undef tessary_edges_WIDE
#undef tessary_edges_X86
#undef tessary_edges_X86_STREAM
#undef tessary_edges_PAIR
#undef tessary_edges_MAC
/* ---- edge elements: least squares */

static tessary_edges_TARGET double tessary_edges_FN(dot)(const double *a, const double *b, int n)
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
static tessary_edges_TARGET double tessary_edges_FN(residual)(const struct tessary_edges_problem *p, const double *q,
    struct tessary_edges_slopes *to)
{
    struct tessary_edges_work *const w = p->work;
    const double *const px = p->disk->x, *const py = p->disk->y;
    double *const u = w->u, *const shape = w->shape, *const slope = w->slope, *const a = w->a;
    double *const light = w->light, *const inside = w->inside, *const from = w->from;
    double *const rises = w->rises, *const gains = w->gains;
    int *const at = w->at;
    const int n = p->disk->padded;
    const double step = q[3] - q[2], bend = q[4];
    const double blur = q[5] == p->log_blur ? p->blur : tessary_edges_exp(q[5]);
    double sine, cosine;
    int i;
    tessary_edges_turn(q[1], &sine, &cosine);
    for (i = 0; i < n; ++i) {
        const double along = py[i] * cosine - px[i] * sine;
        const double across = px[i] * cosine + py[i] * sine;
        u[i] = (across - q[0] - bend * (along * along) / 2) / blur;
    }
    /* loops of their own, as compilers make vectors of these and not of one long loop */
    for (i = 0; i < n; ++i) {
        const double v = tessary_edges_magnitude(u[i]);
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
    for (i = 0; i < n; ++i) a[i] = light[i] > tessary_edges_LIGHT(0) ? light[i] : tessary_edges_LIGHT(0);
    for (i = 0; i < n; ++i) inside[i] = a[i] < tessary_edges_LIGHT(255) ? a[i] : tessary_edges_LIGHT(255);
    for (i = 0; i < n; ++i) a[i] = inside[i] - tessary_edges_LIGHT(0);
    for (i = 0; i < n; ++i) a[i] = a[i] > 0.0 ? a[i] : 0.0;
    for (i = 0; i < n; ++i) a[i] = a[i] < 254.0 ? a[i] : 254.0;
    for (i = 0; i < n; ++i) at[i] = (int)a[i];
    for (i = 0; i < n; ++i) {
        from[i] = tessary_edges_KNOT(at[i]);
        rises[i] = tessary_edges_KNOT(at[i] + 1) - from[i];
    }
    for (i = 0; i < n; ++i) gains[i] = rises[i] * (double)(inside[i] == light[i]);
    for (i = 0; i < n; ++i) {
        const double along = py[i] * cosine - px[i] * sine;
        const double across = px[i] * cosine + py[i] * sine;
        const double value = from[i] + rises[i] * (inside[i] - tessary_edges_LIGHT(at[i]));
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
    return tessary_edges_FN(dot)(to->left, to->left, n);
}

static double tessary_edges_FN(known)(const struct tessary_edges_problem *p, const double *q, const int *is_free)
{
    double sum = 0.0;
    int i;
    for (i = 0; i < 6; ++i) {
        const double off = q[i] - tessary_edges_middle(p, i);
        if (is_free[i]) sum += off * off * tessary_edges_before(p, i);
    }
    return sum;
}

/* Normal matrix and right side of the free parameters. */
static tessary_edges_TARGET void tessary_edges_FN(normal)(const struct tessary_edges_problem *p, const double *q,
    const struct tessary_edges_slopes *s, const int *is_free, double matrix[6][6], double *right)
{
    double top = 0.0;
    int i, j;
    for (i = 0; i < 6; ++i) {
        if (!is_free[i]) continue;
        for (j = 0; j <= i; ++j) {
            if (is_free[j]) matrix[i][j] = matrix[j][i] =
                tessary_edges_FN(dot)(s->by[i], s->by[j], p->disk->padded);
        }
        matrix[i][i] += tessary_edges_before(p, i);
        if (matrix[i][i] > top) top = matrix[i][i];
        right[i] = tessary_edges_FN(dot)(s->by[i], s->left, p->disk->padded)
            - tessary_edges_before(p, i) * (q[i] - tessary_edges_middle(p, i));
    }
    /* a ridge: parameters that the pixels cannot tell apart get no step and a huge error */
    for (i = 0; i < 6; ++i) {
        if (is_free[i]) matrix[i][i] += 1e-12 + 1e-10 * top;
    }
}

static double tessary_edges_FN(freedom)(const struct tessary_edges_problem *p, const int *is_free)
{
    int i, left = p->pixels;
    for (i = 0; i < 6; ++i) left -= is_free[i];
    return left > 1 ? (double)left : 1.0;
}

/* Damped Gauss-Newton. On entry and at the end *s belongs to q. Returns whether it settled. */
static tessary_edges_TARGET int tessary_edges_FN(descend)(const struct tessary_edges_problem *p, double *q,
    struct tessary_edges_slopes **s, struct tessary_edges_slopes **spare, double *square, const int *is_free)
{
    const double loose = tessary_edges_FN(freedom)(p, is_free), origin = q[0];
    double matrix[6][6], right[6], damping = 0.001;
    int round, i, moved = 1;
    for (round = 0; round < 12; ++round) {
        double damped[6][6], step[6], trial[6], part = 1.0, promise = 0.0, before, after, squared;
        if (moved) tessary_edges_FN(normal)(p, q, *s, is_free, matrix, right);
        memcpy(damped, matrix, sizeof(damped));
        for (i = 0; i < 6; ++i) {
            if (is_free[i]) damped[i][i] *= 1.0 + damping;
        }
        if (!tessary_edges_solve(damped, right, is_free, step)) return 0;
        for (i = 0; i < 6; ++i) {
            const double size = tessary_edges_magnitude(step[i]);
            if (tessary_edges_largest_step[i] > 0.0 && size > 1e-30 && tessary_edges_largest_step[i] / size < part)
                part = tessary_edges_largest_step[i] / size;
        }
        for (i = 0; i < 6; ++i) {
            step[i] *= part;
            trial[i] = q[i] + step[i];
            if (is_free[i]) promise += step[i] * right[i];
        }
        before = *square + tessary_edges_FN(known)(p, q, is_free);
        squared = tessary_edges_FN(residual)(p, trial, *spare);
        after = squared + tessary_edges_FN(known)(p, trial, is_free);
        moved = after <= before;
        if (moved) {
            struct tessary_edges_slopes *const swap = *s;
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
        if (!(tessary_edges_magnitude(q[0] - origin) <= p->slack * 2.02)) return 0;
    }
    return 0;
}

/* The inverse normal matrix times a vector, for errors: the start saw the same noise, so it adds
 * no knowledge of the position. Returns 0 when there is none. */
static tessary_edges_TARGET int tessary_edges_FN(error_row)(const struct tessary_edges_problem *p, const double *q,
    const struct tessary_edges_slopes *s, const int *is_free, const double *of, double *x)
{
    double matrix[6][6], right[6];
    tessary_edges_FN(normal)(p, q, s, is_free, matrix, right);
    matrix[0][0] -= tessary_edges_before(p, 0);
    return tessary_edges_solve(matrix, of, is_free, x);
}

/* Would the sum of squares fall enough if one more parameter were let free? */
static tessary_edges_TARGET int tessary_edges_FN(asks)(const struct tessary_edges_problem *p, const double *q,
    const struct tessary_edges_slopes *s, const int *is_free, int extra)
{
    const int n = p->disk->padded;
    double cross[6], x[6], room, push;
    int i;
    for (i = 0; i < 6; ++i) {
        cross[i] = is_free[i] ? tessary_edges_FN(dot)(s->by[i], s->by[extra], n) : 0.0;
    }
    if (is_free[extra] || !tessary_edges_FN(error_row)(p, q, s, is_free, cross, x)) return 0;
    room = tessary_edges_FN(dot)(s->by[extra], s->by[extra], n);
    for (i = 0; i < 6; ++i) room -= cross[i] * x[i];
    push = tessary_edges_FN(dot)(s->by[extra], s->left, n);
    return push * push > 9.0 * (room > 1e-9 ? room : 1e-9);
}

/* Fit: q holds where to start. */
static tessary_edges_TARGET void tessary_edges_FN(fit)(const struct tessary_edges_problem *p, struct tessary_edges_fitted *f)
{
    static const double first[6] = {1.0, 0.0, 0.0, 0.0, 0.0, 0.0};
    struct tessary_edges_slopes *s = &p->work->slopes[0], *spare = &p->work->slopes[1];
    double x[6], square;
    int is_free[6] = {1, 1, 1, 1, 0, 0};
    int i, extra;
    is_free[5] = !p->blur_known;
    square = tessary_edges_FN(residual)(p, f->q, s);
    f->ok = tessary_edges_FN(descend)(p, f->q, &s, &spare, &square, is_free);
    for (extra = 4; extra < 6; ++extra) {
        if (tessary_edges_FN(asks)(p, f->q, s, is_free, extra)) {
            is_free[extra] = 1;
            f->ok = tessary_edges_FN(descend)(p, f->q, &s, &spare, &square, is_free);
        }
    }
    f->misfit = square / tessary_edges_FN(freedom)(p, is_free);
    f->sd = 0.0;
    if (!tessary_edges_FN(error_row)(p, f->q, s, is_free, first, x)) f->ok = 0;
    else f->sd = sqrt(tessary_edges_variance(p, s, x));
    for (i = 0; i < 6; ++i) {
        if (!(tessary_edges_magnitude(f->q[i]) < 1e300)) f->ok = 0;
    }
    if (!(f->sd < 1e300)) f->ok = 0;
}

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

#include <math.h>
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

#define tessary_edges_SIZE 21
#define tessary_edges_RADIUS 10
#define tessary_edges_CHUNK 64 /* output pixels computed together */
#define tessary_edges_LINE 96 /* a chunk with its halo, in whole vectors */
#define tessary_edges_FOLDED 2016 /* floats of the folded rows of a chunk */
#define tessary_edges_TILE 2304 /* widest part of the picture that the ring holds */
#define tessary_edges_COLUMNS 1152 /* floats of products, and then columns of separable ones */
#define tessary_edges_SCRATCH 3168 /* floats of scratch memory beside the ring */
#define tessary_edges_LINE_Q 96 /* the same in 16-bit codes */
#define tessary_edges_FOLDED_Q 2016 /* codes of the folded rows of a chunk */
#define tessary_edges_SCRATCH_Q 8896 /* bytes of scratch memory beside the ring of codes */
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

/* 4 x 9 x 8 coefficients, even in y, odd in x */
static const float tessary_edges_group0_taps[288] = {
    0.369287014f, 0.346790969f, 0.276101947f, 0.155440986f, 0.246892035f, 0.24350369f,
    0.218231499f, 0.138300478f, 0.059628427f, 0.0638179779f, 0.0696688294f, 0.053780973f,
    0.00616580248f, 0.00739890337f, 0.0106468201f, 0.0108334422f, 0.000287890434f,
    0.00040024519f, 0.000821471214f, 0.0011922121f, 6.19888306e-06f, 1.03712082e-05f,
    3.27825546e-05f, 7.33733177e-05f, 5.96046448e-08f, 1.1920929e-07f, 6.55651093e-07f,
    2.56299973e-06f, 0.0f, 0.0f, 0.0f, 5.96046448e-08f, 0.286553025f, 0.256896466f,
    0.181219727f, 0.089084357f, 0.191579044f, 0.182105213f, 0.146132499f, 0.0801168382f,
    0.0462694168f, 0.0484818816f, 0.0482057035f, 0.0317121148f, 0.00478440523f, 0.00574424863f,
    0.0077034831f, 0.00654605031f, 0.000223398209f, 0.000319361687f, 0.000628322363f,
    0.000742971897f, 4.82797623e-06f, 8.5234642e-06f, 2.67624855e-05f, 4.74750996e-05f,
    5.96046448e-08f, 1.1920929e-07f, 5.96046448e-07f, 1.69873238e-06f, 0.0f, 0.0f, 0.0f,
    2.98023224e-08f, 0.133883774f, 0.103777915f, 0.046032697f, 0.00951752067f, 0.0895098448f,
    0.0758557618f, 0.0405006111f, 0.00943413377f, 0.0216180682f, 0.0212071538f, 0.0151976645f,
    0.0043066144f, 0.0022354126f, 0.0026794672f, 0.0028334558f, 0.00105246902f, 0.000104367733f,
    0.000160783529f, 0.000272810459f, 0.00014296174f, 2.2649765e-06f, 4.67896461e-06f,
    1.37686729e-05f, 1.09672546e-05f, 0.0f, 5.96046448e-08f, 3.57627869e-07f, 4.76837158e-07f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0376645327f, 0.0223249197f, 0.000566631556f, -0.00472617149f,
    0.0251811743f, 0.0173413754f, 0.00204053521f, -0.00398164988f, 0.00608164072f,
    0.00530084968f, 0.00157493353f, -0.00139531493f, 0.000628888607f, 0.000744402409f,
    0.000464171171f, -0.000234305859f, 2.93850899e-05f, 4.99784946e-05f, 6.16908073e-05f,
    -1.84476376e-05f, 6.55651093e-07f, 1.60932541e-06f, 3.96370888e-06f, -5.36441803e-07f, 0.0f,
    2.98023224e-08f, 1.1920929e-07f, 2.98023224e-08f, 0.0f, 0.0f, 0.0f, 0.0f, 0.00637996197f,
    0.00239160657f, -0.00145381689f, -0.00119844079f, 0.00426542759f, 0.00209727883f,
    -0.000936836004f, -0.00106626749f, 0.00103014708f, 0.000745415688f, -0.000162810087f,
    -0.000413239002f, 0.0001065135f, 0.000121593475f, 1.26361847e-05f, -8.21948051e-05f,
    4.94718552e-06f, 9.35792923e-06f, 5.9902668e-06f, -8.76188278e-06f, 1.1920929e-07f,
    3.27825546e-07f, 5.66244125e-07f, -5.06639481e-07f, 0.0f, 0.0f, 2.98023224e-08f,
    -2.98023224e-08f, 0.0f, 0.0f, 0.0f, 0.0f, 0.000650703907f, 9.75728035e-05f, -0.0002143085f,
    -9.63807106e-05f, 0.000435054302f, 0.000120669603f, -0.000163555145f, -8.8840723e-05f,
    0.000105082989f, 5.7131052e-05f, -4.64916229e-05f, -3.65078449e-05f, 1.08480453e-05f,
    1.15036964e-05f, -4.85777855e-06f, -7.86781311e-06f, 5.36441803e-07f, 1.04308128e-06f,
    2.98023224e-08f, -9.23871994e-07f, 0.0f, 2.98023224e-08f, 2.98023224e-08f, -5.96046448e-08f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 3.9935112e-05f, -2.23517418e-06f,
    -1.23977661e-05f, -3.27825546e-06f, 2.67028809e-05f, 1.78813934e-06f, -1.04308128e-05f,
    -3.12924385e-06f, 6.43730164e-06f, 2.20537186e-06f, -3.54647636e-06f, -1.37090683e-06f,
    6.55651093e-07f, 6.2584877e-07f, -5.66244125e-07f, -3.27825546e-07f, 5.96046448e-08f,
    5.96046448e-08f, -2.98023224e-08f, -2.98023224e-08f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 1.49011612e-06f, -3.27825546e-07f, -3.57627869e-07f,
    -5.96046448e-08f, 1.01327896e-06f, -1.1920929e-07f, -2.98023224e-07f, -5.96046448e-08f,
    2.38418579e-07f, 2.98023224e-08f, -1.1920929e-07f, -2.98023224e-08f, 0.0f, 2.98023224e-08f,
    -2.98023224e-08f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 5.96046448e-08f, -2.98023224e-08f, 0.0f, 0.0f, 0.0f, 0.0f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f
};

/* 4 x 8 x 9 coefficients, odd in y, even in x */
static const float tessary_edges_group1_taps[288] = {
    0.155440986f, 0.276101947f, 0.346790969f, 0.369287014f, 0.089084357f, 0.181219727f,
    0.256896466f, 0.286553025f, 0.00951752067f, 0.046032697f, 0.103777915f, 0.133883774f,
    -0.00472617149f, 0.000566631556f, 0.0223249197f, 0.0376645327f, -0.00119844079f,
    -0.00145381689f, 0.00239160657f, 0.00637996197f, -9.63807106e-05f, -0.0002143085f,
    9.75728035e-05f, 0.000650703907f, -3.27825546e-06f, -1.23977661e-05f, -2.23517418e-06f,
    3.9935112e-05f, -5.96046448e-08f, -3.57627869e-07f, -3.27825546e-07f, 1.49011612e-06f, 0.0f,
    0.0f, -2.98023224e-08f, 5.96046448e-08f, 0.138300478f, 0.218231499f, 0.24350369f,
    0.246892035f, 0.0801168382f, 0.146132499f, 0.182105213f, 0.191579044f, 0.00943413377f,
    0.0405006111f, 0.0758557618f, 0.0895098448f, -0.00398164988f, 0.00204053521f, 0.0173413754f,
    0.0251811743f, -0.00106626749f, -0.000936836004f, 0.00209727883f, 0.00426542759f,
    -8.8840723e-05f, -0.000163555145f, 0.000120669603f, 0.000435054302f, -3.12924385e-06f,
    -1.04308128e-05f, 1.78813934e-06f, 2.67028809e-05f, -5.96046448e-08f, -2.98023224e-07f,
    -1.1920929e-07f, 1.01327896e-06f, 0.0f, 0.0f, 0.0f, 0.0f, 0.053780973f, 0.0696688294f,
    0.0638179779f, 0.059628427f, 0.0317121148f, 0.0482057035f, 0.0484818816f, 0.0462694168f,
    0.0043066144f, 0.0151976645f, 0.0212071538f, 0.0216180682f, -0.00139531493f, 0.00157493353f,
    0.00530084968f, 0.00608164072f, -0.000413239002f, -0.000162810087f, 0.000745415688f,
    0.00103014708f, -3.65078449e-05f, -4.64916229e-05f, 5.7131052e-05f, 0.000105082989f,
    -1.37090683e-06f, -3.54647636e-06f, 2.20537186e-06f, 6.43730164e-06f, -2.98023224e-08f,
    -1.1920929e-07f, 2.98023224e-08f, 2.38418579e-07f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0108334422f,
    0.0106468201f, 0.00739890337f, 0.00616580248f, 0.00654605031f, 0.0077034831f,
    0.00574424863f, 0.00478440523f, 0.00105246902f, 0.0028334558f, 0.0026794672f, 0.0022354126f,
    -0.000234305859f, 0.000464171171f, 0.000744402409f, 0.000628888607f, -8.21948051e-05f,
    1.26361847e-05f, 0.000121593475f, 0.0001065135f, -7.86781311e-06f, -4.85777855e-06f,
    1.15036964e-05f, 1.08480453e-05f, -3.27825546e-07f, -5.66244125e-07f, 6.2584877e-07f,
    6.55651093e-07f, 0.0f, -2.98023224e-08f, 2.98023224e-08f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f,
    0.0011922121f, 0.000821471214f, 0.00040024519f, 0.000287890434f, 0.000742971897f,
    0.000628322363f, 0.000319361687f, 0.000223398209f, 0.00014296174f, 0.000272810459f,
    0.000160783529f, 0.000104367733f, -1.84476376e-05f, 6.16908073e-05f, 4.99784946e-05f,
    2.93850899e-05f, -8.76188278e-06f, 5.9902668e-06f, 9.35792923e-06f, 4.94718552e-06f,
    -9.23871994e-07f, 2.98023224e-08f, 1.04308128e-06f, 5.36441803e-07f, -2.98023224e-08f,
    -2.98023224e-08f, 5.96046448e-08f, 5.96046448e-08f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f,
    0.0f, 0.0f, 7.33733177e-05f, 3.27825546e-05f, 1.03712082e-05f, 6.19888306e-06f,
    4.74750996e-05f, 2.67624855e-05f, 8.5234642e-06f, 4.82797623e-06f, 1.09672546e-05f,
    1.37686729e-05f, 4.67896461e-06f, 2.2649765e-06f, -5.36441803e-07f, 3.96370888e-06f,
    1.60932541e-06f, 6.55651093e-07f, -5.06639481e-07f, 5.66244125e-07f, 3.27825546e-07f,
    1.1920929e-07f, -5.96046448e-08f, 2.98023224e-08f, 2.98023224e-08f, 0.0f, 0.0f, 0.0f, 0.0f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 2.56299973e-06f, 6.55651093e-07f,
    1.1920929e-07f, 5.96046448e-08f, 1.69873238e-06f, 5.96046448e-07f, 1.1920929e-07f,
    5.96046448e-08f, 4.76837158e-07f, 3.57627869e-07f, 5.96046448e-08f, 0.0f, 2.98023224e-08f,
    1.1920929e-07f, 2.98023224e-08f, 0.0f, -2.98023224e-08f, 2.98023224e-08f, 0.0f, 0.0f, 0.0f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f,
    5.96046448e-08f, 0.0f, 0.0f, 0.0f, 2.98023224e-08f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f
};

/* 4 x 11 x 10 coefficients, even in y, odd in x */
static const float tessary_edges_group2_taps[440] = {
    0.102009833f, 0.0945640802f, 0.0729695261f, 0.0398145318f, 0.162656635f, 0.152321726f,
    0.120451868f, 0.0673519373f, 0.167248666f, 0.159292638f, 0.131212354f, 0.0764255822f,
    0.131431937f, 0.128178149f, 0.111792207f, 0.0689435899f, 0.083254993f, 0.0837029517f,
    0.0785683393f, 0.0521481931f, 0.0435302258f, 0.0454230011f, 0.0466426015f, 0.0338668525f,
    0.0190255344f, 0.0207449794f, 0.0236870944f, 0.0191247165f, 0.00700369477f, 0.00803402066f,
    0.0103684366f, 0.00946190953f, 0.00218212605f, 0.0026512444f, 0.00393101573f,
    0.00412139297f, 0.000577330589f, 0.00074800849f, 0.00129517913f, 0.00158572197f,
    0.0967988074f, 0.0888375938f, 0.0668847859f, 0.035588026f, 0.154347599f, 0.143155068f,
    0.110497385f, 0.0602269173f, 0.158705056f, 0.149806678f, 0.120531514f, 0.0683874786f,
    0.124717981f, 0.12065801f, 0.102886572f, 0.0617514998f, 0.0790020525f, 0.078886956f,
    0.0724851936f, 0.0467656851f, 0.0413065553f, 0.0428724438f, 0.0431589782f, 0.0304169208f,
    0.0180536509f, 0.0196141154f, 0.0219946504f, 0.0172070116f, 0.00664591789f, 0.00761125982f,
    0.00966639817f, 0.00853055716f, 0.00207066536f, 0.00251741707f, 0.00368154049f,
    0.00372430682f, 0.000547856092f, 0.000712051988f, 0.0012191236f, 0.00143666565f,
    0.0827092826f, 0.0736358762f, 0.0513339043f, 0.0251452923f, 0.131881565f, 0.118804231f,
    0.0850270092f, 0.0426133722f, 0.135604769f, 0.124578252f, 0.0931490511f, 0.0484990478f,
    0.106564671f, 0.100624576f, 0.0799914598f, 0.0439341366f, 0.0675029457f, 0.0660294443f,
    0.0567885488f, 0.0334096402f, 0.0352941751f, 0.0360444635f, 0.0341279507f, 0.0218391716f,
    0.0154258609f, 0.0165766031f, 0.0175817907f, 0.0124274939f, 0.00567859411f, 0.00647115707f,
    0.00782300532f, 0.00620275736f, 0.00176924467f, 0.00215479732f, 0.003020823f,
    0.00272864103f, 0.000468105078f, 0.000614061952f, 0.00101563334f, 0.00106145442f,
    0.063634783f, 0.0538061261f, 0.0325924307f, 0.0134427547f, 0.101466924f, 0.0869950056f,
    0.0542554408f, 0.0228521079f, 0.104331493f, 0.091544196f, 0.0599304438f, 0.0261424929f,
    0.0819886327f, 0.0743043125f, 0.052053079f, 0.0238512605f, 0.0519353449f, 0.0490624309f,
    0.0374861509f, 0.0183024555f, 0.0271545947f, 0.0269843936f, 0.0229143947f, 0.0120947659f,
    0.0118683279f, 0.0125190467f, 0.0120371878f, 0.00696982443f, 0.00436899066f, 0.00493599474f,
    0.00547346473f, 0.00352860987f, 0.00136122108f, 0.00166189671f, 0.00216417015f,
    0.00157688558f, 0.000360161066f, 0.000479355454f, 0.000746294856f, 0.000624015927f,
    0.0440850258f, 0.0346051902f, 0.0166285783f, 0.0046569705f, 0.0702944398f, 0.0561265647f,
    0.0279364288f, 0.00798545778f, 0.0722789466f, 0.0593686551f, 0.0313223153f, 0.0092652142f,
    0.0568002462f, 0.0485342294f, 0.0277578235f, 0.00861696899f, 0.035979867f, 0.032337293f,
    0.0204880834f, 0.00677105784f, 0.0188122094f, 0.0179782957f, 0.0128843039f, 0.00459997356f,
    0.00822216272f, 0.00844481587f, 0.00698387623f, 0.00273410976f, 0.00302675366f,
    0.00337608159f, 0.00328418612f, 0.00143145025f, 0.000943034887f, 0.00115406513f,
    0.00134502351f, 0.000662863255f, 0.000249505043f, 0.000338360667f, 0.000480905175f,
    0.000272199512f, 0.0275007188f, 0.0195395947f, 0.00631044805f, 0.000110059977f,
    0.0438504219f, 0.0318309218f, 0.0108119994f, 0.000260904431f, 0.0450883806f, 0.0339127034f,
    0.0125025064f, 0.000438123941f, 0.0354325771f, 0.0279975235f, 0.0115289688f,
    0.000576063991f, 0.0224446058f, 0.0188835859f, 0.00891034305f, 0.000613451004f,
    0.0117352605f, 0.0106504112f, 0.00588978827f, 0.000541329384f, 0.00512906909f,
    0.00508451462f, 0.00336153805f, 0.000402569771f, 0.00188812613f, 0.00206913054f,
    0.00166469812f, 0.000255480409f, 0.000588268042f, 0.000720903277f, 0.000717282295f,
    0.000139653683f, 0.00015565753f, 0.000215634704f, 0.00026935339f, 6.62207603e-05f,
    0.0154473186f, 0.0096475929f, 0.00128111243f, -0.00123523176f, 0.0246310234f, 0.0158113837f,
    0.0023675859f, -0.00205130875f, 0.025326401f, 0.0170108974f, 0.00304494798f, -0.0022546649f,
    0.0199026763f, 0.0142296404f, 0.00316219032f, -0.00194053352f, 0.0126072764f, 0.0097528398f,
    0.00275053084f, -0.00137542188f, 0.00659176707f, 0.00560307503f, 0.00202989578f,
    -0.00081834197f, 0.00288102031f, 0.00272984803f, 0.00127932429f, -0.000410869718f,
    0.00106057525f, 0.00113530457f, 0.000691622496f, -0.000173151493f, 0.000330448151f,
    0.00040461123f, 0.000321894884f, -6.00665808e-05f, 8.74400139e-05f, 0.000123873353f,
    0.000129371881f, -1.6272068e-05f, 0.00781300664f, 0.00413881242f, -0.000391334295f,
    -0.00107868016f, 0.0124579668f, 0.00683997571f, -0.000516325235f, -0.00181089342f,
    0.0128096938f, 0.00745777786f, -0.000322014093f, -0.00202830136f, 0.0100664496f,
    0.00634910166f, 2.16662884e-05f, -0.00179544091f, 0.0063765645f, 0.00444361567f,
    0.000294074416f, -0.00132372975f, 0.00333401561f, 0.00261320174f, 0.000387459993f,
    -0.000831440091f, 0.00145718455f, 0.00130532682f, 0.0003323704f, -0.000449880958f,
    0.000536412001f, 0.000557050109f, 0.000218749046f, -0.000210806727f, 0.000167131424f,
    0.000203773379f, 0.000116854906f, -8.57114792e-05f, 4.42266464e-05f, 6.40302896e-05f,
    5.20497561e-05f, -3.01897526e-05f, 0.00355827808f, 0.00152617693f, -0.000570312142f,
    -0.000598505139f, 0.00567373633f, 0.00255274773f, -0.00088827312f, -0.00100970268f,
    0.00583389401f, 0.00283615291f, -0.000868082047f, -0.00114031136f, 0.00458455086f,
    0.00247325003f, -0.000615298748f, -0.0010214597f, 0.0029040575f, 0.00177936256f,
    -0.000313282013f, -0.000765159726f, 0.00151839852f, 0.00107783079f, -9.30726528e-05f,
    -0.000490531325f, 0.000663638115f, 0.000554963946f, 1.33216381e-05f, -0.000272348523f,
    0.000244289637f, 0.000244095922f, 3.94135714e-05f, -0.000131830573f, 7.61151314e-05f,
    9.19550657e-05f, 3.09050083e-05f, -5.58197498e-05f, 2.01463699e-05f, 2.97278166e-05f,
    1.6734004e-05f, -2.07275152e-05f, 0.00145921111f, 0.000474214554f, -0.000353246927f,
    -0.000253126025f, 0.00232672691f, 0.000808149576f, -0.000566095114f, -0.000428587198f,
    0.00239241123f, 0.00092355907f, -0.000584349036f, -0.00048699975f, 0.00188007951f,
    0.000833570957f, -0.000456616282f, -0.00044003129f, 0.0011909306f, 0.000622600317f,
    -0.000280290842f, -0.000333383679f, 0.000622689724f, 0.000391766429f, -0.000133723021f,
    -0.000216767192f, 0.000272154808f, 0.000209331512f, -4.58955765e-05f, -0.000122442842f,
    0.000100195408f, 9.53674316e-05f, -7.4505806e-06f, -6.05136156e-05f, 3.12030315e-05f,
    3.71336937e-05f, 3.39746475e-06f, -2.6255846e-05f, 8.2552433e-06f, 1.23679638e-05f,
    3.76999378e-06f, -1.00284815e-05f, 0.000538825989f, 0.000118985772f, -0.000158280134f,
    -8.63224268e-05f, 0.000859171152f, 0.000209644437f, -0.000257402658f, -0.000146642327f,
    0.000883430243f, 0.000251218677f, -0.000272765756f, -0.000167563558f, 0.0006942451f,
    0.000239238143f, -0.000222221017f, -0.000152572989f, 0.000439763069f, 0.000188589096f,
    -0.00014564395f, -0.000116750598f, 0.000229924917f, 0.000124841928f, -7.75456429e-05f,
    -7.68750906e-05f, 0.000100493431f, 6.98566437e-05f, -3.30358744e-05f, -4.40627337e-05f,
    3.69846821e-05f, 3.31550837e-05f, -1.06245279e-05f, -2.21580267e-05f, 1.15334988e-05f,
    1.33961439e-05f, -2.04145908e-06f, -9.80496407e-06f, 3.03983688e-06f, 4.60445881e-06f,
    2.08616257e-07f, -3.82959843e-06f
};

/* 4 x 10 x 11 coefficients, odd in y, even in x */
static const float tessary_edges_group3_taps[440] = {
    0.0398145318f, 0.0729695261f, 0.0945640802f, 0.102009833f, 0.035588026f, 0.0668847859f,
    0.0888375938f, 0.0967988074f, 0.0251452923f, 0.0513339043f, 0.0736358762f, 0.0827092826f,
    0.0134427547f, 0.0325924307f, 0.0538061261f, 0.063634783f, 0.0046569705f, 0.0166285783f,
    0.0346051902f, 0.0440850258f, 0.000110059977f, 0.00631044805f, 0.0195395947f, 0.0275007188f,
    -0.00123523176f, 0.00128111243f, 0.0096475929f, 0.0154473186f, -0.00107868016f,
    -0.000391334295f, 0.00413881242f, 0.00781300664f, -0.000598505139f, -0.000570312142f,
    0.00152617693f, 0.00355827808f, -0.000253126025f, -0.000353246927f, 0.000474214554f,
    0.00145921111f, -8.63224268e-05f, -0.000158280134f, 0.000118985772f, 0.000538825989f,
    0.0673519373f, 0.120451868f, 0.152321726f, 0.162656635f, 0.0602269173f, 0.110497385f,
    0.143155068f, 0.154347599f, 0.0426133722f, 0.0850270092f, 0.118804231f, 0.131881565f,
    0.0228521079f, 0.0542554408f, 0.0869950056f, 0.101466924f, 0.00798545778f, 0.0279364288f,
    0.0561265647f, 0.0702944398f, 0.000260904431f, 0.0108119994f, 0.0318309218f, 0.0438504219f,
    -0.00205130875f, 0.0023675859f, 0.0158113837f, 0.0246310234f, -0.00181089342f,
    -0.000516325235f, 0.00683997571f, 0.0124579668f, -0.00100970268f, -0.00088827312f,
    0.00255274773f, 0.00567373633f, -0.000428587198f, -0.000566095114f, 0.000808149576f,
    0.00232672691f, -0.000146642327f, -0.000257402658f, 0.000209644437f, 0.000859171152f,
    0.0764255822f, 0.131212354f, 0.159292638f, 0.167248666f, 0.0683874786f, 0.120531514f,
    0.149806678f, 0.158705056f, 0.0484990478f, 0.0931490511f, 0.124578252f, 0.135604769f,
    0.0261424929f, 0.0599304438f, 0.091544196f, 0.104331493f, 0.0092652142f, 0.0313223153f,
    0.0593686551f, 0.0722789466f, 0.000438123941f, 0.0125025064f, 0.0339127034f, 0.0450883806f,
    -0.0022546649f, 0.00304494798f, 0.0170108974f, 0.025326401f, -0.00202830136f,
    -0.000322014093f, 0.00745777786f, 0.0128096938f, -0.00114031136f, -0.000868082047f,
    0.00283615291f, 0.00583389401f, -0.00048699975f, -0.000584349036f, 0.00092355907f,
    0.00239241123f, -0.000167563558f, -0.000272765756f, 0.000251218677f, 0.000883430243f,
    0.0689435899f, 0.111792207f, 0.128178149f, 0.131431937f, 0.0617514998f, 0.102886572f,
    0.12065801f, 0.124717981f, 0.0439341366f, 0.0799914598f, 0.100624576f, 0.106564671f,
    0.0238512605f, 0.052053079f, 0.0743043125f, 0.0819886327f, 0.00861696899f, 0.0277578235f,
    0.0485342294f, 0.0568002462f, 0.000576063991f, 0.0115289688f, 0.0279975235f, 0.0354325771f,
    -0.00194053352f, 0.00316219032f, 0.0142296404f, 0.0199026763f, -0.00179544091f,
    2.16662884e-05f, 0.00634910166f, 0.0100664496f, -0.0010214597f, -0.000615298748f,
    0.00247325003f, 0.00458455086f, -0.00044003129f, -0.000456616282f, 0.000833570957f,
    0.00188007951f, -0.000152572989f, -0.000222221017f, 0.000239238143f, 0.0006942451f,
    0.0521481931f, 0.0785683393f, 0.0837029517f, 0.083254993f, 0.0467656851f, 0.0724851936f,
    0.078886956f, 0.0790020525f, 0.0334096402f, 0.0567885488f, 0.0660294443f, 0.0675029457f,
    0.0183024555f, 0.0374861509f, 0.0490624309f, 0.0519353449f, 0.00677105784f, 0.0204880834f,
    0.032337293f, 0.035979867f, 0.000613451004f, 0.00891034305f, 0.0188835859f, 0.0224446058f,
    -0.00137542188f, 0.00275053084f, 0.0097528398f, 0.0126072764f, -0.00132372975f,
    0.000294074416f, 0.00444361567f, 0.0063765645f, -0.000765159726f, -0.000313282013f,
    0.00177936256f, 0.0029040575f, -0.000333383679f, -0.000280290842f, 0.000622600317f,
    0.0011909306f, -0.000116750598f, -0.00014564395f, 0.000188589096f, 0.000439763069f,
    0.0338668525f, 0.0466426015f, 0.0454230011f, 0.0435302258f, 0.0304169208f, 0.0431589782f,
    0.0428724438f, 0.0413065553f, 0.0218391716f, 0.0341279507f, 0.0360444635f, 0.0352941751f,
    0.0120947659f, 0.0229143947f, 0.0269843936f, 0.0271545947f, 0.00459997356f, 0.0128843039f,
    0.0179782957f, 0.0188122094f, 0.000541329384f, 0.00588978827f, 0.0106504112f, 0.0117352605f,
    -0.00081834197f, 0.00202989578f, 0.00560307503f, 0.00659176707f, -0.000831440091f,
    0.000387459993f, 0.00261320174f, 0.00333401561f, -0.000490531325f, -9.30726528e-05f,
    0.00107783079f, 0.00151839852f, -0.000216767192f, -0.000133723021f, 0.000391766429f,
    0.000622689724f, -7.68750906e-05f, -7.75456429e-05f, 0.000124841928f, 0.000229924917f,
    0.0191247165f, 0.0236870944f, 0.0207449794f, 0.0190255344f, 0.0172070116f, 0.0219946504f,
    0.0196141154f, 0.0180536509f, 0.0124274939f, 0.0175817907f, 0.0165766031f, 0.0154258609f,
    0.00696982443f, 0.0120371878f, 0.0125190467f, 0.0118683279f, 0.00273410976f, 0.00698387623f,
    0.00844481587f, 0.00822216272f, 0.000402569771f, 0.00336153805f, 0.00508451462f,
    0.00512906909f, -0.000410869718f, 0.00127932429f, 0.00272984803f, 0.00288102031f,
    -0.000449880958f, 0.0003323704f, 0.00130532682f, 0.00145718455f, -0.000272348523f,
    1.33216381e-05f, 0.000554963946f, 0.000663638115f, -0.000122442842f, -4.58955765e-05f,
    0.000209331512f, 0.000272154808f, -4.40627337e-05f, -3.30358744e-05f, 6.98566437e-05f,
    0.000100493431f, 0.00946190953f, 0.0103684366f, 0.00803402066f, 0.00700369477f,
    0.00853055716f, 0.00966639817f, 0.00761125982f, 0.00664591789f, 0.00620275736f,
    0.00782300532f, 0.00647115707f, 0.00567859411f, 0.00352860987f, 0.00547346473f,
    0.00493599474f, 0.00436899066f, 0.00143145025f, 0.00328418612f, 0.00337608159f,
    0.00302675366f, 0.000255480409f, 0.00166469812f, 0.00206913054f, 0.00188812613f,
    -0.000173151493f, 0.000691622496f, 0.00113530457f, 0.00106057525f, -0.000210806727f,
    0.000218749046f, 0.000557050109f, 0.000536412001f, -0.000131830573f, 3.94135714e-05f,
    0.000244095922f, 0.000244289637f, -6.05136156e-05f, -7.4505806e-06f, 9.53674316e-05f,
    0.000100195408f, -2.21580267e-05f, -1.06245279e-05f, 3.31550837e-05f, 3.69846821e-05f,
    0.00412139297f, 0.00393101573f, 0.0026512444f, 0.00218212605f, 0.00372430682f,
    0.00368154049f, 0.00251741707f, 0.00207066536f, 0.00272864103f, 0.003020823f,
    0.00215479732f, 0.00176924467f, 0.00157688558f, 0.00216417015f, 0.00166189671f,
    0.00136122108f, 0.000662863255f, 0.00134502351f, 0.00115406513f, 0.000943034887f,
    0.000139653683f, 0.000717282295f, 0.000720903277f, 0.000588268042f, -6.00665808e-05f,
    0.000321894884f, 0.00040461123f, 0.000330448151f, -8.57114792e-05f, 0.000116854906f,
    0.000203773379f, 0.000167131424f, -5.58197498e-05f, 3.09050083e-05f, 9.19550657e-05f,
    7.61151314e-05f, -2.6255846e-05f, 3.39746475e-06f, 3.71336937e-05f, 3.12030315e-05f,
    -9.80496407e-06f, -2.04145908e-06f, 1.33961439e-05f, 1.15334988e-05f, 0.00158572197f,
    0.00129517913f, 0.00074800849f, 0.000577330589f, 0.00143666565f, 0.0012191236f,
    0.000712051988f, 0.000547856092f, 0.00106145442f, 0.00101563334f, 0.000614061952f,
    0.000468105078f, 0.000624015927f, 0.000746294856f, 0.000479355454f, 0.000360161066f,
    0.000272199512f, 0.000480905175f, 0.000338360667f, 0.000249505043f, 6.62207603e-05f,
    0.00026935339f, 0.000215634704f, 0.00015565753f, -1.6272068e-05f, 0.000129371881f,
    0.000123873353f, 8.74400139e-05f, -3.01897526e-05f, 5.20497561e-05f, 6.40302896e-05f,
    4.42266464e-05f, -2.07275152e-05f, 1.6734004e-05f, 2.97278166e-05f, 2.01463699e-05f,
    -1.00284815e-05f, 3.76999378e-06f, 1.23679638e-05f, 8.2552433e-06f, -3.82959843e-06f,
    2.08616257e-07f, 4.60445881e-06f, 3.03983688e-06f
};

static const int16_t tessary_edges_group0_counts[288] = {
    15431, 10317, 14491, 10175, 11537, 9119, 6495, 5779, 2492, 258, 2667, 309, 2911, 445, 2247,
    453, 12, 0, 17, 0, 34, 1, 50, 3, 0, 0, 0, 0, 0, 0, 0, 0, 11974, 8005, 10735, 7609, 7572,
    6106, 3722, 3348, 1933, 200, 2026, 240, 2014, 322, 1325, 274, 9, 0, 13, 0, 26, 1, 31, 2, 0,
    0, 0, 0, 0, 0, 0, 0, 5594, 3740, 4336, 3170, 1924, 1692, 398, 394, 903, 93, 886, 112, 635,
    118, 180, 44, 4, 0, 7, 0, 11, 1, 6, 0, 0, 0, 0, 0, 0, 0, 0, 0, 1574, 1052, 933, 725, 24, 85,
    -197, -166, 254, 26, 222, 31, 66, 19, -58, -10, 1, 0, 2, 0, 3, 0, -1, 0, 0, 0, 0, 0, 0, 0,
    0, 0, 267, 178, 100, 88, -61, -39, -50, -45, 43, 4, 31, 5, -7, 1, -17, -3, 0, 0, 0, 0, 0, 0,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 27, 18, 4, 5, -9, -7, -4, -4, 4, 0, 2, 0, -2, 0, -2, 0, 0, 0,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 2, 1, 0, 0, -1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0
};

static const int16_t tessary_edges_group1_counts[288] = {
    6495, 5779, 11537, 9119, 14491, 10175, 15431, 10317, 3722, 3348, 7572, 6106, 10735, 7609,
    11974, 8005, 398, 394, 1924, 1692, 4336, 3170, 5594, 3740, -197, -166, 24, 85, 933, 725,
    1574, 1052, -50, -45, -61, -39, 100, 88, 267, 178, -4, -4, -9, -7, 4, 5, 27, 18, 0, 0, -1,
    0, 0, 0, 2, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 2247, 453, 2911, 445, 2667,
    309, 2492, 258, 1325, 274, 2014, 322, 2026, 240, 1933, 200, 180, 44, 635, 118, 886, 112,
    903, 93, -58, -10, 66, 19, 222, 31, 254, 26, -17, -3, -7, 1, 31, 5, 43, 4, -2, 0, -2, 0, 2,
    0, 4, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 50, 3, 34,
    1, 17, 0, 12, 0, 31, 2, 26, 1, 13, 0, 9, 0, 6, 0, 11, 1, 7, 0, 4, 0, -1, 0, 3, 0, 2, 0, 1,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0,
    0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0
};

static const int16_t tessary_edges_group2_counts[440] = {
    1856, 2960, 1721, 2772, 1328, 2192, 725, 1226, 3044, 2392, 2899, 2333, 2388, 2034, 1391,
    1255, 1515, 792, 1523, 827, 1430, 849, 949, 616, 346, 127, 378, 146, 431, 189, 348, 172, 40,
    11, 48, 14, 72, 24, 75, 29, 1762, 2809, 1617, 2605, 1217, 2011, 648, 1096, 2888, 2270, 2726,
    2196, 2193, 1872, 1244, 1124, 1438, 752, 1436, 780, 1319, 785, 851, 554, 329, 121, 357, 139,
    400, 176, 313, 155, 38, 10, 46, 13, 67, 22, 68, 26, 1505, 2400, 1340, 2162, 934, 1547, 458,
    775, 2468, 1939, 2267, 1831, 1695, 1456, 883, 800, 1228, 642, 1202, 656, 1033, 621, 608,
    397, 281, 103, 302, 118, 320, 142, 226, 113, 32, 9, 39, 11, 55, 18, 50, 19, 1158, 1846, 979,
    1583, 593, 987, 245, 416, 1899, 1492, 1666, 1352, 1091, 947, 476, 434, 945, 494, 893, 491,
    682, 417, 333, 220, 216, 80, 228, 90, 219, 100, 127, 64, 25, 7, 30, 9, 39, 14, 29, 11, 802,
    1279, 630, 1021, 303, 508, 85, 145, 1315, 1034, 1080, 883, 570, 505, 169, 157, 655, 342,
    588, 327, 373, 234, 123, 84, 150, 55, 154, 61, 127, 60, 50, 26, 17, 5, 21, 6, 24, 9, 12, 5,
    500, 798, 356, 579, 115, 197, 2, 5, 821, 645, 617, 509, 228, 210, 8, 10, 408, 214, 344, 194,
    162, 107, 11, 10, 93, 34, 93, 38, 61, 30, 7, 5, 11, 3, 13, 4, 13, 5, 3, 1, 281, 448, 176,
    288, 23, 43, -22, -37, 461, 362, 310, 259, 55, 58, -41, -35, 229, 120, 177, 102, 50, 37,
    -25, -15, 52, 19, 50, 21, 23, 13, -7, -3, 6, 2, 7, 2, 6, 2, -1, 0, 142, 227, 75, 124, -7,
    -9, -20, -33, 233, 183, 136, 116, -6, 0, -37, -33, 116, 61, 81, 48, 5, 7, -24, -15, 27, 10,
    24, 10, 6, 4, -8, -4, 3, 1, 4, 1, 2, 1, -2, -1, 65, 103, 28, 46, -10, -16, -11, -18, 106,
    83, 52, 45, -16, -11, -21, -19, 53, 28, 32, 20, -6, -2, -14, -9, 12, 4, 10, 4, 0, 1, -5, -2,
    1, 0, 2, 1, 1, 0, -1, 0, 27, 42, 9, 15, -6, -10, -5, -8, 44, 34, 17, 15, -11, -8, -9, -8,
    22, 11, 11, 7, -5, -2, -6, -4, 5, 2, 4, 2, -1, 0, -2, -1, 1, 0, 1, 0, 0, 0, 0, 0, 10, 16, 2,
    4, -3, -5, -2, -3, 16, 13, 5, 4, -5, -4, -3, -3, 8, 4, 3, 2, -3, -1, -2, -1, 2, 1, 1, 1, -1,
    0, -1, 0, 0, 0, 0, 0, 0, 0, 0, 0
};

static const int16_t tessary_edges_group3_counts[440] = {
    725, 1226, 1328, 2192, 1721, 2772, 1856, 2960, 648, 1096, 1217, 2011, 1617, 2605, 1762,
    2809, 458, 775, 934, 1547, 1340, 2162, 1505, 2400, 245, 416, 593, 987, 979, 1583, 1158,
    1846, 85, 145, 303, 508, 630, 1021, 802, 1279, 2, 5, 115, 197, 356, 579, 500, 798, -22, -37,
    23, 43, 176, 288, 281, 448, -20, -33, -7, -9, 75, 124, 142, 227, -11, -18, -10, -16, 28, 46,
    65, 103, -5, -8, -6, -10, 9, 15, 27, 42, -2, -3, -3, -5, 2, 4, 10, 16, 1391, 1255, 2388,
    2034, 2899, 2333, 3044, 2392, 1244, 1124, 2193, 1872, 2726, 2196, 2888, 2270, 883, 800,
    1695, 1456, 2267, 1831, 2468, 1939, 476, 434, 1091, 947, 1666, 1352, 1899, 1492, 169, 157,
    570, 505, 1080, 883, 1315, 1034, 8, 10, 228, 210, 617, 509, 821, 645, -41, -35, 55, 58, 310,
    259, 461, 362, -37, -33, -6, 0, 136, 116, 233, 183, -21, -19, -16, -11, 52, 45, 106, 83, -9,
    -8, -11, -8, 17, 15, 44, 34, -3, -3, -5, -4, 5, 4, 16, 13, 949, 616, 1430, 849, 1523, 827,
    1515, 792, 851, 554, 1319, 785, 1436, 780, 1438, 752, 608, 397, 1033, 621, 1202, 656, 1228,
    642, 333, 220, 682, 417, 893, 491, 945, 494, 123, 84, 373, 234, 588, 327, 655, 342, 11, 10,
    162, 107, 344, 194, 408, 214, -25, -15, 50, 37, 177, 102, 229, 120, -24, -15, 5, 7, 81, 48,
    116, 61, -14, -9, -6, -2, 32, 20, 53, 28, -6, -4, -5, -2, 11, 7, 22, 11, -2, -1, -3, -1, 3,
    2, 8, 4, 348, 172, 431, 189, 378, 146, 346, 127, 313, 155, 400, 176, 357, 139, 329, 121,
    226, 113, 320, 142, 302, 118, 281, 103, 127, 64, 219, 100, 228, 90, 216, 80, 50, 26, 127,
    60, 154, 61, 150, 55, 7, 5, 61, 30, 93, 38, 93, 34, -7, -3, 23, 13, 50, 21, 52, 19, -8, -4,
    6, 4, 24, 10, 27, 10, -5, -2, 0, 1, 10, 4, 12, 4, -2, -1, -1, 0, 4, 2, 5, 2, -1, 0, -1, 0,
    1, 1, 2, 1, 75, 29, 72, 24, 48, 14, 40, 11, 68, 26, 67, 22, 46, 13, 38, 10, 50, 19, 55, 18,
    39, 11, 32, 9, 29, 11, 39, 14, 30, 9, 25, 7, 12, 5, 24, 9, 21, 6, 17, 5, 3, 1, 13, 5, 13, 4,
    11, 3, -1, 0, 6, 2, 7, 2, 6, 2, -2, -1, 2, 1, 4, 1, 3, 1, -1, 0, 1, 0, 2, 1, 1, 0, 0, 0, 0,
    0, 1, 0, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0
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
#define tessary_edges_FLAT_ROWS 23 /* a kernel's, one above, one below */
#define tessary_edges_FLAT_SPAN 2 /* stretches that a chunk depends on */
/* ---- edge elements: tables */

#define tessary_edges_WINDOW 56 /* pixels of the widest disk, in whole eights */

/* The disks of pixels that an edge is fitted in: offsets from the middle, then zeros. */
struct tessary_edges_disk {
    int count, padded;
    const double *x, *y;
};

static const double tessary_edges_disk_x0[56] = {
    0.0, -2.0, -1.0, 0.0, 1.0, 2.0, -3.0, -2.0, -1.0, 0.0, 1.0, 2.0, 3.0, -3.0, -2.0, -1.0, 0.0,
    1.0, 2.0, 3.0, -4.0, -3.0, -2.0, -1.0, 0.0, 1.0, 2.0, 3.0, 4.0, -3.0, -2.0, -1.0, 0.0, 1.0,
    2.0, 3.0, -3.0, -2.0, -1.0, 0.0, 1.0, 2.0, 3.0, -2.0, -1.0, 0.0, 1.0, 2.0, 0.0, 0.0, 0.0,
    0.0, 0.0, 0.0, 0.0, 0.0
};
static const double tessary_edges_disk_y0[56] = {
    -4.0, -3.0, -3.0, -3.0, -3.0, -3.0, -2.0, -2.0, -2.0, -2.0, -2.0, -2.0, -2.0, -1.0, -1.0,
    -1.0, -1.0, -1.0, -1.0, -1.0, 0.0, 0.0, 0.0, 0.0, 0.0, 0.0, 0.0, 0.0, 0.0, 1.0, 1.0, 1.0,
    1.0, 1.0, 1.0, 1.0, 2.0, 2.0, 2.0, 2.0, 2.0, 2.0, 2.0, 3.0, 3.0, 3.0, 3.0, 3.0, 4.0, 0.0,
    0.0, 0.0, 0.0, 0.0, 0.0, 0.0
};
static const double tessary_edges_disk_x1[24] = {
    -1.0, 0.0, 1.0, -2.0, -1.0, 0.0, 1.0, 2.0, -2.0, -1.0, 0.0, 1.0, 2.0, -2.0, -1.0, 0.0, 1.0,
    2.0, -1.0, 0.0, 1.0, 0.0, 0.0, 0.0
};
static const double tessary_edges_disk_y1[24] = {
    -2.0, -2.0, -2.0, -1.0, -1.0, -1.0, -1.0, -1.0, 0.0, 0.0, 0.0, 0.0, 0.0, 1.0, 1.0, 1.0, 1.0,
    1.0, 2.0, 2.0, 2.0, 0.0, 0.0, 0.0
};
static const struct tessary_edges_disk tessary_edges_disks[2] = {
    {49, 56, tessary_edges_disk_x0, tessary_edges_disk_y0},
    {21, 24, tessary_edges_disk_x1, tessary_edges_disk_y1}
};

/* Largest step of each parameter, and one over the variance of what is known of it before. */
static const double tessary_edges_largest_step[6] = {0.5, 0.29999999999999999, 0.0, 0.0, 0.10000000000000001, 0.40000000000000002};
static const double tessary_edges_prior[6] = {1.0, 0.0, 0.0, 0.0, 16.0, 2.0408163265306123};

#define tessary_edges_LIGHT(i) (0.0 + 1.0 * (double)(i))
#define tessary_edges_KNOT(i) ((double)tessary_edges_table[(i) + 0])

static double tessary_edges_magnitude(double v) { return v < 0.0 ? -v : v; }

/* Sine and cosine of an angle of a few turns; not-a-number for others. */
static void tessary_edges_turn(double angle, double *sine, double *cosine)
{
    double k, r, z, s, c;
    int quarter;
    if (!(tessary_edges_magnitude(angle) < 1e4)) {
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
static double tessary_edges_exp(double x)
{
    double r, sum, power = 1.0, base;
    int k, n;
    if (!(tessary_edges_magnitude(x) < 50.0)) return (x - x) / (x - x);
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
static double tessary_edges_to_light(tessary_edges_pixel p) { return (double)p; }

/* What the model leaves of the data, and its derivatives; in eights, as vectors take them. */
struct tessary_edges_slopes {
    double left[tessary_edges_WINDOW];
    double by[6][tessary_edges_WINDOW];
};

/* Memory of a fit; a part of the scratch memory. */
struct tessary_edges_work {
    double data[tessary_edges_WINDOW]; /* working values */
    double weight[tessary_edges_WINDOW]; /* one over their noise; 0 outside the picture */
    struct tessary_edges_slopes slopes[2];
    double u[tessary_edges_WINDOW], shape[tessary_edges_WINDOW], slope[tessary_edges_WINDOW]; /* of the edge's profile */
    double light[tessary_edges_WINDOW], inside[tessary_edges_WINDOW], from[tessary_edges_WINDOW]; /* of the curve ... */
    double rises[tessary_edges_WINDOW], gains[tessary_edges_WINDOW], a[tessary_edges_WINDOW];
    int at[tessary_edges_WINDOW]; /* ... and its knots */
};

/* A blurred edge in a disk of pixels. Its parameters q: position along the normal from the middle
 * pixel, direction of the normal, light on either side, curvature, logarithm of the blur. */
struct tessary_edges_problem {
    const struct tessary_edges_disk *disk;
    struct tessary_edges_work *work;
    int line; /* a line, else a step */
    int blur_known, pixels; /* pixels with a weight */
    double slack; /* how many times farther than usual the edge may lie from its start */
    double start; /* its position */
    double blur, log_blur; /* that is known, or expected */
};

struct tessary_edges_fitted {
    double q[6];
    double sd; /* standard error of the position, were the noise as stated */
    double misfit; /* squared residual over the noise's variance, per degree of freedom */
    int ok; /* it settled */
};

/* What was known of a parameter before looking: its middle, and one over its variance. */
static double tessary_edges_middle(const struct tessary_edges_problem *p, int i)
{
    return i == 0 ? p->start : i == 5 ? p->log_blur : 0.0;
}

static double tessary_edges_before(const struct tessary_edges_problem *p, int i)
{
    return i == 0 ? tessary_edges_prior[0] / (p->slack * p->slack) : tessary_edges_prior[i];
}

/* Solve matrix x = right for the parameters that are free. Returns 0 when that cannot be done. */
static int tessary_edges_solve(double matrix[6][6], const double *right, const int *is_free, double *x)
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
static double tessary_edges_variance(const struct tessary_edges_problem *p, const struct tessary_edges_slopes *s,
    const double *x)
{
    (void)p;
    (void)s;
    return x[0] > 0.0 ? x[0] : 0.0;
}


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
    void (*half)(const float *, int, int, int, float *, char *, ptrdiff_t, ptrdiff_t, int);
    void (*edges_all)(const float *const *, ptrdiff_t, int, float *, char *, ptrdiff_t,
        unsigned char *, ptrdiff_t);
    void (*range)(const float *, int, float *);
    void (*spread)(const float *const *, int, float *, float *);
};

#if !defined(__GNUC__) || tessary_edges_MAX_LANES < 4
#define tessary_edges_LANES 1
#else
#define tessary_edges_LANES 4
#endif
#define tessary_edges_FN(x) tessary_edges_##x##_base
#define tessary_edges_TARGET
#include "tessary_edges.c"
static const struct tessary_edges_code_of tessary_edges_base = {tessary_edges_responses_base, {tessary_edges_edges0_base, tessary_edges_edges1_base}, NULL,
    NULL, tessary_edges_edges_all_base, tessary_edges_range_base, tessary_edges_spread_base};
#undef tessary_edges_LANES
#undef tessary_edges_FN
#undef tessary_edges_TARGET

#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 8
#define tessary_edges_LANES 8
#define tessary_edges_FN(x) tessary_edges_##x##_avx2
#define tessary_edges_TARGET __attribute__((target("avx2,fma")))
#include "tessary_edges.c"
static const struct tessary_edges_code_of tessary_edges_avx2 = {tessary_edges_responses_avx2, {tessary_edges_edges0_avx2, tessary_edges_edges1_avx2}, NULL,
    NULL, tessary_edges_edges_all_avx2, tessary_edges_range_avx2, tessary_edges_spread_avx2};
#undef tessary_edges_LANES
#undef tessary_edges_FN
#undef tessary_edges_TARGET
#endif

#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 16
#define tessary_edges_LANES 16
#define tessary_edges_FN(x) tessary_edges_##x##_avx512
#define tessary_edges_TARGET __attribute__((target("avx512f,avx512vl,avx512bw,avx512dq,avx2,fma")))
#include "tessary_edges.c"
static const struct tessary_edges_code_of tessary_edges_avx512 = {tessary_edges_responses_avx512, {tessary_edges_edges0_avx512, tessary_edges_edges1_avx512}, NULL,
    NULL, tessary_edges_edges_all_avx512, tessary_edges_range_avx512, tessary_edges_spread_avx512};
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
    int scale; /* -1: responses; the number of scales: all of them */
    char *out; /* planes, or strength */
    ptrdiff_t row_bytes, plane_bytes;
    unsigned char *orientation;
    ptrdiff_t orientation_row_bytes, orientation_plane_bytes;
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
        } else if (job->scale == tessary_edges_SCALE_COUNT) {
            code->edges_all(rows, x, n, work, to, job->plane_bytes,
                job->orientation + (ptrdiff_t)y * job->orientation_row_bytes + from + x,
                job->orientation_plane_bytes);
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
static int tessary_edges_overlap(ptrdiff_t row, ptrdiff_t plane, ptrdiff_t bytes, int rows, int planes)
{
    row = tessary_edges_reach(row);
    plane = tessary_edges_reach(plane);
    if (planes == 1) return 0;
    if (plane < bytes) return 1;
    if ((plane - bytes) / row >= rows - 1) return 0;
    return (row - bytes) / plane < planes - 1;
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
    if (tessary_edges_overlap(out_row_bytes, out_plane_bytes, (ptrdiff_t)width * bytes, count,
            tessary_edges_KERNEL_COUNT))
        return tessary_edges_BAD_OUTPUT_PLANE_BYTES;
    if (scratch == NULL) return tessary_edges_NO_SCRATCH;
    job->scale = -1;
    job->out = out;
    job->row_bytes = out_row_bytes;
    job->plane_bytes = out_plane_bytes;
    job->orientation = NULL;
    job->orientation_row_bytes = 0;
    job->orientation_plane_bytes = 0;
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
    job->orientation_plane_bytes = 0;
    job->stream = 0;
    return tessary_edges_OK;
}

/* ---- edges above a threshold: flat stretches are skipped */

struct tessary_edges_flat {
    float threshold;
    uint64_t skipped;
};

static size_t tessary_edges_flat_stretches(int width)
{
    const int tile = width < tessary_edges_TILE ? width : tessary_edges_TILE;
    return (size_t)((tile + tessary_edges_CHUNK - 1) / tessary_edges_CHUNK + tessary_edges_FLAT_SPAN - 1);
}

/* Floats of a row: one value before it, and whole stretches. */
static size_t tessary_edges_flat_pitch(int width)
{
    return 16 + tessary_edges_flat_stretches(width) * tessary_edges_CHUNK + tessary_edges_LINE;
}

/* Row y with its neighbours' halo, and the ranges of its stretches, which begin one value before the
 * chunks: what a chunk and its neighbours depend on begins there. */
static int tessary_edges_flat_fill(const struct tessary_edges_code_of *code, const struct tessary_edges_picture *p, int y, int from,
    int part, float *row, float *range)
{
    const int end = part + 2 * tessary_edges_RADIUS;
    const int stretches = (int)tessary_edges_flat_stretches(part);
    int bad, x;
    /* beyond the halo of the rim there is no neighbour: the outermost row stands for it */
    if (y < -tessary_edges_RADIUS) y = -tessary_edges_RADIUS;
    if (y >= p->height + tessary_edges_RADIUS) y = p->height + tessary_edges_RADIUS - 1;
    bad = tessary_edges_fill(p, y, from, part, row);
    row[-1] = row[0];
    for (x = end; x < stretches * tessary_edges_CHUNK + tessary_edges_CHUNK; ++x) row[x] = row[end - 1];
    code->range(row - 1, stretches, range);
    return bad;
}

/* One row of outputs. The chunks begin at whole multiples of their width, so that every band and
 * every address skips the same. */
static void tessary_edges_flat_row(const struct tessary_edges_code_of *code, const struct tessary_edges_job *job,
    struct tessary_edges_flat *flat, const float *const *rows, const float *const *ranges,
    int from, int part, int rest, int y, float *work)
{
    static const float bounds[2][3] = {{2.5474112f, 0.0f, 0.00163970189f}, {5.62980509f, 0.0f, 0.00567276357f}};
    const float *const b = bounds[job->scale];
    float *const strength = (float *)(void *)(job->out + (ptrdiff_t)y * job->row_bytes) + from;
    unsigned char *const turn = job->orientation + (ptrdiff_t)y * job->orientation_row_bytes + from;
    int x;
    for (x = 0; x < part; x += tessary_edges_CHUNK) {
        const int n = part - x < tessary_edges_CHUNK ? part - x : tessary_edges_CHUNK;
        /* neighbours beyond a seam of the ring are not seen */
        const int seam = (x == 0 && from > 0) || (x + n == part && rest > 0);
        float low, high;
        code->spread(ranges, x / tessary_edges_CHUNK, &low, &high);
        if (!seam && b[0] * (high - low) + b[1] * (low < 0.0f ? -low : low) + b[2] < flat->threshold) {
            memset(strength + x, 0, (size_t)n * sizeof(float));
            memset(turn + x, 0, (size_t)n);
            flat->skipped += (uint64_t)n;
        } else {
            code->edges[job->scale](rows, x, n, work, strength + x, turn + x);
        }
    }
}

static int tessary_edges_walk_flat(const struct tessary_edges_picture *p, const struct tessary_edges_job *job,
    struct tessary_edges_flat *flat, int first, int count, void *scratch)
{
    const struct tessary_edges_code_of *const code = tessary_edges_choose();
    const size_t pitch = tessary_edges_flat_pitch(p->width);
    const size_t ranged = tessary_edges_flat_stretches(p->width) * 32;
    float *const ring = (float *)(void *)((unsigned char *)scratch +
        ((64u - ((uintptr_t)scratch & 63u)) & 63u)) + 16;
    float *const range = ring - 16 + tessary_edges_FLAT_ROWS * pitch;
    float *const work = range + tessary_edges_FLAT_ROWS * ranged;
    int bad = 0, from;
    for (from = 0; from < p->width; from += tessary_edges_TILE) {
        const int part = p->width - from < tessary_edges_TILE ? p->width - from : tessary_edges_TILE;
        const float *rows[tessary_edges_FLAT_ROWS], *ranges[tessary_edges_FLAT_ROWS];
        int y, j;
        for (j = 0; j < tessary_edges_FLAT_ROWS - 1; ++j) {
            const int wrong = tessary_edges_flat_fill(code, p, first + j - tessary_edges_RADIUS - 1, from, part,
                ring + (size_t)j * pitch, range + (size_t)j * ranged);
            if (j > 0) bad |= wrong; /* the row before the halo is no concern of this band */
        }
        for (y = 0; y < count; ++y) {
            const int last = (y + tessary_edges_FLAT_ROWS - 1) % tessary_edges_FLAT_ROWS;
            const int wrong = tessary_edges_flat_fill(code, p, first + y + tessary_edges_RADIUS + 1, from, part,
                ring + (size_t)last * pitch, range + (size_t)last * ranged);
            if (y + 1 < count) bad |= wrong;
            for (j = 0; j < tessary_edges_FLAT_ROWS; ++j) {
                rows[j] = ring + (size_t)((y + j) % tessary_edges_FLAT_ROWS) * pitch;
                ranges[j] = range + (size_t)((y + j) % tessary_edges_FLAT_ROWS) * ranged;
            }
            tessary_edges_flat_row(code, job, flat, rows + 1, ranges, from, part, p->width - from - part, y, work);
        }
    }
    return bad ? tessary_edges_BAD_PIXEL : tessary_edges_OK;
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
        0.00559698977f, 0.00559698977f, 0.00559698977f, 0.00559698977f, 0.00559698977f,
        0.00559698977f, 0.00559698977f, 0.00559698977f, 0.0128518632f, 0.0128518632f,
        0.0128518632f, 0.0128518632f, 0.0128518632f, 0.0128518632f, 0.0128518632f, 0.0128518632f
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
    case tessary_edges_NO_COUNT: return "count is NULL";
    case tessary_edges_BAD_THRESHOLD: return "a threshold is not between 1e-20 and 1e30, or no kernels find such edges";
    case tessary_edges_NO_EDGELS: return "out is NULL and capacity is not 0";
    case tessary_edges_EDGELS_MISALIGNED: return "out is not a multiple of 4";
    case tessary_edges_TOO_MANY: return "there are more edgels than capacity; those that had room were written";
    case tessary_edges_TOO_LARGE: return "the picture has too many pixels for the edgels' scratch memory";
    case tessary_edges_BAD_STRENGTH_PLANE_BYTES: return "strength_plane_bytes: planes overlap, or no multiple of 4";
    case tessary_edges_BAD_ORIENTATION_PLANE_BYTES: return "orientation_plane_bytes makes the planes overlap";
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
    {
        const size_t flat = (tessary_edges_FLAT_ROWS * (tessary_edges_flat_pitch(width)
            + 32 * tessary_edges_flat_stretches(width)) + tessary_edges_SCRATCH) * sizeof(float) + 64;
        if (flat > bytes) bytes = flat;
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

int tessary_edges_edges_above_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale, float threshold,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, uint64_t *skipped, void *scratch)
{
    struct tessary_edges_picture p;
    struct tessary_edges_job job;
    int code = tessary_edges_check_edges(&p, &job, image, row_bytes, width, height, first_row,
        row_count, scale, strength, strength_row_bytes, orientation, orientation_row_bytes,
        scratch);
    if (code != tessary_edges_OK) return code;
    {
        struct tessary_edges_flat flat;
        flat.threshold = threshold;
        flat.skipped = 0;
        code = tessary_edges_walk_flat(&p, &job, &flat, first_row, row_count, scratch);
        if (skipped != NULL) *skipped = flat.skipped;
    }
    return code;
}

int tessary_edges_edges_above(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height, int scale,
    float threshold, float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, uint64_t *skipped, void *scratch)
{
    return tessary_edges_edges_above_rows(image, row_bytes, width, height, 0, height, scale, threshold,
        strength, strength_row_bytes, orientation, orientation_row_bytes, skipped, scratch);
}

int tessary_edges_edges_all_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count,
    float *strength, ptrdiff_t strength_row_bytes, ptrdiff_t strength_plane_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, ptrdiff_t orientation_plane_bytes,
    void *scratch)
{
    struct tessary_edges_picture p;
    struct tessary_edges_job job;
    const int code = tessary_edges_check_edges(&p, &job, image, row_bytes, width, height, first_row,
        row_count, 0, strength, strength_row_bytes, orientation, orientation_row_bytes, scratch);
    if (code != tessary_edges_OK) return code;
    if (strength_plane_bytes % 4 != 0 || tessary_edges_overlap(strength_row_bytes, strength_plane_bytes,
            (ptrdiff_t)width * 4, row_count, tessary_edges_SCALE_COUNT))
        return tessary_edges_BAD_STRENGTH_PLANE_BYTES;
    if (tessary_edges_overlap(orientation_row_bytes, orientation_plane_bytes, width, row_count, tessary_edges_SCALE_COUNT))
        return tessary_edges_BAD_ORIENTATION_PLANE_BYTES;
    job.scale = tessary_edges_SCALE_COUNT;
    job.plane_bytes = strength_plane_bytes;
    job.orientation_plane_bytes = orientation_plane_bytes;
    return tessary_edges_walk(&p, &job, first_row, row_count, scratch);
}

int tessary_edges_edges_all(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    float *strength, ptrdiff_t strength_row_bytes, ptrdiff_t strength_plane_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, ptrdiff_t orientation_plane_bytes,
    void *scratch)
{
    return tessary_edges_edges_all_rows(image, row_bytes, width, height, 0, height,
        strength, strength_row_bytes, strength_plane_bytes,
        orientation, orientation_row_bytes, orientation_plane_bytes, scratch);
}


/* ---- edge elements */

typedef void (*tessary_edges_fit_function)(const struct tessary_edges_problem *, struct tessary_edges_fitted *);

static tessary_edges_fit_function tessary_edges_choose_fit(void)
{
#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 8
    const int known = tessary_edges_processor();
#if tessary_edges_MAX_LANES >= 16
    if (known >= 2) return tessary_edges_fit_avx512;
#endif
    if (known >= 1) return tessary_edges_fit_avx2;
#endif
    return tessary_edges_fit_base;
}

#define tessary_edges_BAND 48 /* rows of responses that are held at once */
#define tessary_edges_ABOVE 2 /* rows about an element that its start reads */
#define tessary_edges_BELOW 3

/* The largest response of some kernels, and which one it is. */
struct tessary_edges_plane {
    int count;
    const int *even, *odd; /* NULL: the other alone; both: the root of the sum of squares */
};

/* One pixel along each direction: the cell's offset, and the place inside it. */
struct tessary_edges_along {
    signed char x, y;
    float u, v, left_u, left_v; /* left_u is 1 - u */
};

/* One scale of one kind of edges. */
struct tessary_edges_map {
    int scale, plane, rival; /* planes; rival is -1 where there is none */
    int rival_of_lines; /* the rival has a say only where lines are looked for too */
    int reach, around; /* pixels at the border left out; half side of "around" */
    float own, other; /* shares of the largest strength around, and of the largest rival */
    const struct tessary_edges_along *ahead, *behind;
    int apart; /* how far its elements must be from those of finer scales */
    int softer, soft_around; /* map that soft edges are left to, or -1, and what it looks at */
    float least; /* share of that map's strength that this one's must have */
    int disk; /* the wide one; the narrow one follows */
    int blur_free; /* the blur is not the camera's */
    double slack, step_blur, log_step_blur, line_blur, log_line_blur;
    const double *angle, *cosine, *sine, *slope_odd, *slope_even;
};

static const int tessary_edges_odd0[8] = {0, 1, 2, 3, 4, 5, 6, 7};
static const int tessary_edges_odd1[8] = {8, 9, 10, 11, 12, 13, 14, 15};
static const struct tessary_edges_plane tessary_edges_planes[2] = {
    {8, NULL, tessary_edges_odd0},
    {8, NULL, tessary_edges_odd1}
};
static const struct tessary_edges_along tessary_edges_ahead0[8] = {
    {0, 0, 1.0f, 0.0f, 0.0f, 1.0f},
    {0, 0, 0.923879504f, 0.382683426f, 0.0761204958f, 0.617316604f},
    {0, 0, 0.707106769f, 0.707106769f, 0.292893231f, 0.292893231f},
    {0, 0, 0.382683426f, 0.923879504f, 0.617316604f, 0.0761204958f},
    {0, 0, 6.12323426e-17f, 1.0f, 1.0f, 0.0f},
    {-1, 0, 0.617316544f, 0.923879504f, 0.382683456f, 0.0761204958f},
    {-1, 0, 0.292893231f, 0.707106769f, 0.707106769f, 0.292893231f},
    {-1, 0, 0.076120466f, 0.382683426f, 0.923879504f, 0.617316604f}
};
static const struct tessary_edges_along tessary_edges_behind0[8] = {
    {-1, 0, 0.0f, 1.22464685e-16f, 1.0f, 1.0f},
    {-1, -1, 0.076120466f, 0.617316544f, 0.923879504f, 0.382683456f},
    {-1, -1, 0.292893231f, 0.292893231f, 0.707106769f, 0.707106769f},
    {-1, -1, 0.617316544f, 0.076120466f, 0.382683456f, 0.923879504f},
    {-1, -1, 1.0f, 0.0f, 0.0f, 1.0f},
    {0, -1, 0.382683426f, 0.076120466f, 0.617316604f, 0.923879504f},
    {0, -1, 0.707106769f, 0.292893231f, 0.292893231f, 0.707106769f},
    {0, -1, 0.923879504f, 0.617316544f, 0.0761204958f, 0.382683456f}
};
static const double tessary_edges_angle0[8] = {
    0.0, 0.39269908169872414, 0.78539816339744828, 1.1780972450961724, 1.5707963267948966,
    1.9634954084936207, 2.3561944901923448, 2.748893571891069
};
static const double tessary_edges_cosine0[8] = {
    1.0, 0.92387953251128674, 0.70710678118654757, 0.38268343236508984, 6.123233995736766e-17,
    -0.38268343236508973, -0.70710678118654746, -0.92387953251128674
};
static const double tessary_edges_sine0[8] = {
    0.0, 0.38268343236508978, 0.70710678118654746, 0.92387953251128674, 1.0,
    0.92387953251128674, 0.70710678118654757, 0.38268343236508989
};
static const double tessary_edges_slope_odd0[8] = {
    1.046577386888883, 1.046724540159238, 1.0467842200080848, 1.0467245401592382,
    1.046577386888883, 1.046724540159238, 1.0467842200080848, 1.046724540159238
};
static const struct tessary_edges_along tessary_edges_ahead1[8] = {
    {0, 0, 1.0f, 0.0f, 0.0f, 1.0f},
    {0, 0, 0.923879504f, 0.382683426f, 0.0761204958f, 0.617316604f},
    {0, 0, 0.707106769f, 0.707106769f, 0.292893231f, 0.292893231f},
    {0, 0, 0.382683426f, 0.923879504f, 0.617316604f, 0.0761204958f},
    {0, 0, 6.12323426e-17f, 1.0f, 1.0f, 0.0f},
    {-1, 0, 0.617316544f, 0.923879504f, 0.382683456f, 0.0761204958f},
    {-1, 0, 0.292893231f, 0.707106769f, 0.707106769f, 0.292893231f},
    {-1, 0, 0.076120466f, 0.382683426f, 0.923879504f, 0.617316604f}
};
static const struct tessary_edges_along tessary_edges_behind1[8] = {
    {-1, 0, 0.0f, 1.22464685e-16f, 1.0f, 1.0f},
    {-1, -1, 0.076120466f, 0.617316544f, 0.923879504f, 0.382683456f},
    {-1, -1, 0.292893231f, 0.292893231f, 0.707106769f, 0.707106769f},
    {-1, -1, 0.617316544f, 0.076120466f, 0.382683456f, 0.923879504f},
    {-1, -1, 1.0f, 0.0f, 0.0f, 1.0f},
    {0, -1, 0.382683426f, 0.076120466f, 0.617316604f, 0.923879504f},
    {0, -1, 0.707106769f, 0.292893231f, 0.292893231f, 0.707106769f},
    {0, -1, 0.923879504f, 0.617316544f, 0.0761204958f, 0.382683456f}
};
static const double tessary_edges_angle1[8] = {
    0.0, 0.39269908169872414, 0.78539816339744828, 1.1780972450961724, 1.5707963267948966,
    1.9634954084936207, 2.3561944901923448, 2.748893571891069
};
static const double tessary_edges_cosine1[8] = {
    1.0, 0.92387953251128674, 0.70710678118654757, 0.38268343236508984, 6.123233995736766e-17,
    -0.38268343236508973, -0.70710678118654746, -0.92387953251128674
};
static const double tessary_edges_sine1[8] = {
    0.0, 0.38268343236508978, 0.70710678118654746, 0.92387953251128674, 1.0,
    0.92387953251128674, 0.70710678118654757, 0.38268343236508989
};
static const double tessary_edges_slope_odd1[8] = {
    0.47600028707486797, 0.4760035395156928, 0.47600897091218536, 0.4760035395156928,
    0.47600028707486802, 0.47600353951569285, 0.47600897091218536, 0.47600353951569285
};
static const struct tessary_edges_map tessary_edges_maps[2] = {
    {0, 0, -1, 1, 3, 3, 0.0f, 1.25f,
     tessary_edges_ahead0, tessary_edges_behind0, 2, -1, 0, 0.0f, 0, 0,
     1.0, 0.79655233233793987, -0.22746244891788103, 1.0, 0.0,
     tessary_edges_angle0, tessary_edges_cosine0, tessary_edges_sine0, tessary_edges_slope_odd0, NULL},
    {1, 1, -1, 1, 8, 7, 0.349999994f, 1.25f,
     tessary_edges_ahead1, tessary_edges_behind1, 2, -1, 0, 0.0f, 0, 0,
     1.0, 0.79655233233793987, -0.22746244891788103, 1.0, 0.0,
     tessary_edges_angle1, tessary_edges_cosine1, tessary_edges_sine1, tessary_edges_slope_odd1, NULL}
};
static const int tessary_edges_first_map[2] = {0, 2};

/* Everything that a call has to carry. */
struct tessary_edges_search {
    struct tessary_edges_picture picture;
    float *strength; /* planes, one after the other */
    unsigned char *turn;
    unsigned char *found[1]; /* 1 + number of the map that found an element, else 0 */
    unsigned char *weak;
    int *stack;
    float *band;
    int band_first; /* first row in the band */
    void *inner; /* scratch of the responses */
    struct tessary_edges_work *work;
    int lines_too;
};

static size_t tessary_edges_step64(size_t bytes) { return (bytes + 63) / 64 * 64; }

size_t tessary_edges_edgels_scratch_bytes(int width, int height)
{
    const size_t inner = tessary_edges_scratch_bytes(width, height);
    size_t area;
    double all;
    int rows;
    if (inner == 0 || height > 2147483647 / width) return 0;
    rows = height < tessary_edges_BAND + tessary_edges_ABOVE + tessary_edges_BELOW ? height : tessary_edges_BAND + tessary_edges_ABOVE + tessary_edges_BELOW;
    area = (size_t)width * (size_t)height;
    all = (double)inner + (double)area * (2 * 5 + 1 + 5) + 1024.0
        + (double)sizeof(struct tessary_edges_work) + 4.0 * tessary_edges_KERNEL_COUNT * (double)rows * (double)width;
    if (all >= (double)((size_t)-1 / 2)) return 0;
    return 64 + tessary_edges_step64(sizeof(struct tessary_edges_work)) + tessary_edges_step64(inner)
        + tessary_edges_step64(area * 2 * 4) + tessary_edges_step64(area * 2)
        + (1 + 1) * tessary_edges_step64(area) + tessary_edges_step64(area * 4)
        + tessary_edges_step64(4 * tessary_edges_KERNEL_COUNT * (size_t)rows * (size_t)width);
}

static void tessary_edges_lay_out(struct tessary_edges_search *s, void *scratch)
{
    const size_t area = (size_t)s->picture.width * (size_t)s->picture.height;
    unsigned char *at = (unsigned char *)scratch + ((64u - ((uintptr_t)scratch & 63u)) & 63u);
    int k;
    s->work = (struct tessary_edges_work *)(void *)at;
    at += tessary_edges_step64(sizeof(struct tessary_edges_work));
    s->inner = at;
    at += tessary_edges_step64(tessary_edges_scratch_bytes(s->picture.width, s->picture.height));
    s->strength = (float *)(void *)at;
    at += tessary_edges_step64(area * 2 * 4);
    s->turn = at;
    at += tessary_edges_step64(area * 2);
    for (k = 0; k < 1; ++k) {
        s->found[k] = at;
        at += tessary_edges_step64(area);
    }
    s->weak = at;
    at += tessary_edges_step64(area);
    s->stack = (int *)(void *)at;
    at += tessary_edges_step64(area * 4);
    s->band = (float *)(void *)at;
}

/* Responses of rows first .. first + count - 1. */
static int tessary_edges_fill_band(struct tessary_edges_search *s, int first, int count)
{
    const ptrdiff_t row = (ptrdiff_t)s->picture.width * 4;
    s->band_first = first;
    return tessary_edges_responses_rows((const tessary_edges_pixel *)(const void *)s->picture.pixels,
        s->picture.row_bytes, s->picture.width, s->picture.height, first, count, s->band, row,
        row * (tessary_edges_BAND + tessary_edges_ABOVE + tessary_edges_BELOW < s->picture.height
            ? tessary_edges_BAND + tessary_edges_ABOVE + tessary_edges_BELOW : s->picture.height), s->inner);
}

static const float *tessary_edges_band_row(const struct tessary_edges_search *s, int kernel, int y)
{
    const int rows = tessary_edges_BAND + tessary_edges_ABOVE + tessary_edges_BELOW < s->picture.height
        ? tessary_edges_BAND + tessary_edges_ABOVE + tessary_edges_BELOW : s->picture.height;
    return s->band + ((size_t)kernel * (size_t)rows + (size_t)(y - s->band_first))
        * (size_t)s->picture.width;
}

/* ---- strengths and thinning */

static void tessary_edges_strongest(struct tessary_edges_search *s, int number, int y)
{
    const struct tessary_edges_plane *const p = &tessary_edges_planes[number];
    const size_t width = (size_t)s->picture.width;
    const size_t at = ((size_t)number * (size_t)s->picture.height + (size_t)y) * width;
    float *const best = s->strength + at;
    unsigned char *const turn = s->turn + at;
    size_t x;
    int j;
    for (j = 0; j < p->count; ++j) {
        const float *const a = tessary_edges_band_row(s, p->odd ? p->odd[j] : p->even[j], y);
        const float *const b = p->odd && p->even ? tessary_edges_band_row(s, p->even[j], y) : NULL;
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
static float tessary_edges_times(float a, float b) { return (float)((double)a * (double)b); }

/* Bilinear sample one pixel along a direction. */
static float tessary_edges_beside(const float *here, ptrdiff_t width, const struct tessary_edges_along *a)
{
    const float *const c = here + (ptrdiff_t)a->y * width + a->x;
    const float upper = tessary_edges_times(a->left_u, c[0]) + tessary_edges_times(a->u, c[1]);
    const float lower = tessary_edges_times(a->left_u, c[width]) + tessary_edges_times(a->u, c[width + 1]);
    return tessary_edges_times(a->left_v, upper) + tessary_edges_times(a->v, lower);
}

/* Is a strength at least a share of all values of a plane around it? */
static int tessary_edges_stands(const struct tessary_edges_search *s, int plane, int around, int x, int y, float share,
    float strength)
{
    const int w = s->picture.width, h = s->picture.height;
    const int left = x < around ? 0 : x - around, right = w - 1 - x < around ? w - 1 : x + around;
    const int top = y < around ? 0 : y - around, end = h - 1 - y < around ? h - 1 : y + around;
    const float *row = s->strength + ((size_t)plane * (size_t)h + (size_t)top) * (size_t)w;
    int i, j;
    for (j = top; j <= end; ++j, row += w) {
        for (i = left; i <= right; ++i) {
            if (!(strength >= tessary_edges_times(share, row[i]))) return 0;
        }
    }
    return 1;
}

/* The largest value of a plane around a pixel. */
static float tessary_edges_largest(const struct tessary_edges_search *s, int plane, int around, int x, int y)
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
static int tessary_edges_is_sharp(const struct tessary_edges_search *s, const struct tessary_edges_map *m, int x, int y)
{
    const int other = tessary_edges_maps[m->softer].plane;
    const float own = tessary_edges_largest(s, m->plane, m->soft_around, x, y);
    const float theirs = tessary_edges_largest(s, other, m->soft_around, x, y);
    return own >= tessary_edges_times(m->least, theirs) + 0.5f;
}

/* Mark the thinned elements of a map: 1 from low on, 2 from high on. */
static void tessary_edges_thin(const struct tessary_edges_search *s, const struct tessary_edges_map *m, float low, float high)
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
            if (!(own > tessary_edges_beside(plane + at, w, &m->ahead[turn]))) continue;
            if (!(own >= tessary_edges_beside(plane + at, w, &m->behind[turn]))) continue;
            if (m->own > 0.0f && !tessary_edges_stands(s, m->plane, m->around, x, y, m->own, own)) continue;
            if (m->rival >= 0 && (s->lines_too || !m->rival_of_lines) &&
                !tessary_edges_stands(s, m->rival, m->around, x, y, m->other, own))
                continue;
            if (m->softer >= 0 && !tessary_edges_is_sharp(s, m, x, y)) continue;
            s->weak[at] = (unsigned char)(own >= high ? 2 : own >= low ? 1 : 0);
        }
    }
}

/* Weak elements that hang together with a strong one become strong. */
static void tessary_edges_hang_on(const struct tessary_edges_search *s)
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
static size_t tessary_edges_add(const struct tessary_edges_search *s, unsigned char *found, int number)
{
    const int w = s->picture.width, h = s->picture.height, mark = number + 1;
    const int apart = tessary_edges_maps[number].apart, beyond = (2 * apart + 1) * (2 * apart + 1);
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

struct tessary_edges_start {
    double offset, theta, sd;
    int kind;
};

static int tessary_edges_within(int i, int size) { return i < 0 ? 0 : i >= size ? size - 1 : i; }

/* Weights of cubic convolution; Keys 1981. */
static void tessary_edges_cubic(double t, double *w)
{
    w[0] = ((-0.5 * t + 1.0) * t - 0.5) * t;
    w[1] = (1.5 * t - 2.5) * t * t + 1.0;
    w[2] = ((-1.5 * t + 2.0) * t + 0.5) * t;
    w[3] = (0.5 * t - 0.5) * t * t;
}

static double tessary_edges_sample(const struct tessary_edges_search *s, int kernel, double y, double x)
{
    /* y and x are not far below 0 */
    const int y0 = (int)(y + 2.0) - 2, x0 = (int)(x + 2.0) - 2;
    double across[4], down[4], total = 0.0;
    int i, j;
    tessary_edges_cubic(y - y0, down);
    tessary_edges_cubic(x - x0, across);
    for (j = 0; j < 4; ++j) {
        const float *const row =
            tessary_edges_band_row(s, kernel, tessary_edges_within(y0 + j - 1, s->picture.height));
        double line = 0.0;
        for (i = 0; i < 4; ++i)
            line += across[i] * (double)row[tessary_edges_within(x0 + i - 1, s->picture.width)];
        total += down[j] * line;
    }
    return total;
}

/* Place of the top of a parabola through values at -1, 0 and 1. */
static double tessary_edges_parabola(double before, double here, double after, double reach, double *bend)
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
static double tessary_edges_turned(const struct tessary_edges_search *s, const int *members, int count, int turn,
    int odd, int x, int y)
{
    const int off = turn < 0 || turn >= count;
    const int kernel = members[turn < 0 ? turn + count : turn >= count ? turn - count : turn];
    const double value = (double)tessary_edges_band_row(s, kernel, y)[x];
    return odd && off ? -value : value;
}

static void tessary_edges_begin(const struct tessary_edges_search *s, const struct tessary_edges_map *m, int x, int y, int turn,
    struct tessary_edges_start *b)
{
    const struct tessary_edges_plane *const p = &tessary_edges_planes[m->plane];
    int step = p->odd != NULL;
    const int *members;
    const double far = m->slack;
    double here, sign, before, after, bend, tilt, spare;
    if (p->odd != NULL && p->even != NULL) {
        const float o = tessary_edges_band_row(s, p->odd[turn], y)[x];
        const float e = tessary_edges_band_row(s, p->even[turn], y)[x];
        step = (o < 0.0f ? -o : o) >= (e < 0.0f ? -e : e);
    }
    members = step ? p->odd : p->even;
    here = (double)tessary_edges_band_row(s, members[turn], y)[x];
    sign = here < 0.0 ? -1.0 : 1.0;
    before = sign * tessary_edges_sample(s, members[turn], y - far * m->sine[turn],
        x - far * m->cosine[turn]);
    after = sign * tessary_edges_sample(s, members[turn], y + far * m->sine[turn],
        x + far * m->cosine[turn]);
    b->offset = far * tessary_edges_parabola(before, sign * here, after, 1.0, &bend);
    b->sd = far * (step ? m->slope_odd : m->slope_even)[turn] / (-bend > 1e-9 ? -bend : 1e-9);
    b->sd = far * (b->sd < 1.0 ? b->sd : 1.0);
    tilt = 0.0;
    if (p->count > 2) {
        before = sign * tessary_edges_turned(s, members, p->count, turn - 1, step, x, y);
        after = sign * tessary_edges_turned(s, members, p->count, turn + 1, step, x, y);
        tilt = tessary_edges_parabola(before, sign * here, after, 0.5, &spare);
    }
    b->theta = m->angle[turn] + tilt * 3.1415926535897931 / p->count;
    b->kind = step ? tessary_edges_STEP : sign > 0.0 ? tessary_edges_BRIGHT_LINE : tessary_edges_DARK_LINE;
    if (step && sign < 0.0) {
        b->theta += 3.1415926535897931;
        b->offset = -b->offset;
    }
}

/* ---- the place */

#define tessary_edges_LOST 1e300 /* standard error of a fit that is not to be trusted */

/* Fit in one of the disks. Returns the standard error. */
static double tessary_edges_fit_disk(const struct tessary_edges_search *s, const struct tessary_edges_map *m, int x, int y,
    const struct tessary_edges_start *b, int disk, tessary_edges_fit_function fit, struct tessary_edges_fitted *f)
{
    struct tessary_edges_problem p;
    struct tessary_edges_work *const work = s->work;
    double sine, cosine, level[2][2] = {{0.0, 0.0}, {0.0, 0.0}}, moved;
    int i, rises, bad = 0;
    p.disk = &tessary_edges_disks[disk];
    p.line = b->kind != tessary_edges_STEP;
    p.work = work;
    p.pixels = 0;
    p.slack = m->slack;
    p.start = b->offset;
    p.blur = p.line ? m->line_blur : m->step_blur;
    p.log_blur = p.line ? m->log_line_blur : m->log_step_blur;
    p.blur_known = !p.line && !m->blur_free && 1;
    tessary_edges_turn(b->theta, &sine, &cosine);
    for (i = 0; i < p.disk->padded; ++i) {
        const int px = x + (int)p.disk->x[i], py = y + (int)p.disk->y[i];
        const int inside = px >= 0 && px < s->picture.width && py >= 0 && py < s->picture.height;
        const tessary_edges_pixel *const row = (const tessary_edges_pixel *)(const void *)(s->picture.pixels
            + (ptrdiff_t)tessary_edges_within(py, s->picture.height) * s->picture.row_bytes);
        const double u = (p.disk->x[i] * cosine + p.disk->y[i] * sine - b->offset) / p.blur;
        const double away = tessary_edges_magnitude(u);
        const tessary_edges_pixel pixel = row[tessary_edges_within(px, s->picture.width)];
        work->data[i] = (double)tessary_edges_value(pixel, &bad);
        work->weight[i] = 0.0;
        if (i >= p.disk->count) continue;
        work->weight[i] = inside ? 1.0 : 0.0;
        p.pixels += inside;
        {
            const double light = tessary_edges_to_light(pixel);
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
    if (tessary_edges_magnitude(f->q[3] - f->q[2]) <= 1.0000000000000001e-09 * tessary_edges_magnitude(f->q[2]))
        f->q[3] = f->q[2];
    f->q[4] = 0.0;
    f->q[5] = p.log_blur;
    fit(&p, f);
    rises = f->q[3] > f->q[2];
    if (p.line) rises = rises == (b->kind == tessary_edges_BRIGHT_LINE);
    moved = tessary_edges_magnitude(f->q[0] - b->offset);
    if (!f->ok || !rises || !(moved <= m->slack * 1.5)) return tessary_edges_LOST;
    return f->sd * sqrt(f->misfit > 1.0 ? f->misfit : 1.0);
}

static void tessary_edges_place(const struct tessary_edges_search *s, int kind, int x, int y, tessary_edges_fit_function fit,
    struct tessary_edges_edgel *to)
{
    const int w = s->picture.width;
    const size_t at = (size_t)y * (size_t)w + (size_t)x;
    const struct tessary_edges_map *const m = &tessary_edges_maps[s->found[kind][at] - 1];
    const size_t plane = (size_t)m->plane * (size_t)w * (size_t)s->picture.height;
    struct tessary_edges_start b;
    struct tessary_edges_fitted wide, near;
    double sd, spread, sine, cosine, whole;
    int turns;
    tessary_edges_begin(s, m, x, y, s->turn[plane + at], &b);
    sd = tessary_edges_fit_disk(s, m, x, y, &b, m->disk, fit, &wide);
    if (wide.misfit > 1.8 || sd >= tessary_edges_LOST) { /* other edges near pull at it */
        const double again = tessary_edges_fit_disk(s, m, x, y, &b, m->disk + 1, fit, &near);
        if (again < sd) {
            sd = again;
            wide = near;
        }
    }
    spread = 0.0;
    if (sd < tessary_edges_LOST) {
        b.offset = wide.q[0];
        b.theta = wide.q[1];
        if (b.kind != tessary_edges_STEP) spread = tessary_edges_exp(wide.q[5]);
    } else {
        sd = b.sd;
    }
    tessary_edges_turn(b.theta, &sine, &cosine);
    to->x = (float)(x + b.offset * cosine);
    to->y = (float)(y + b.offset * sine);
    whole = b.kind == tessary_edges_STEP ? 6.2831853071795862 : 3.1415926535897931;
    b.theta += b.kind == tessary_edges_STEP ? 3.1415926535897931 : 0.0;
    turns = (int)(b.theta / whole);
    if (whole * turns > b.theta) --turns;
    b.theta -= whole * turns;
    to->theta = (float)(b.theta - (b.kind == tessary_edges_STEP ? 3.1415926535897931 : 0.0));
    to->strength = s->strength[plane + at];
    to->sd = (float)sd;
    spread = spread * spread - 0.63449561815301181;
    to->width = (float)sqrt(12.0 * (spread > 0.0 ? spread : 0.0));
    to->scale = (unsigned char)m->scale;
    to->kind = (unsigned char)b.kind;
    to->unused[0] = to->unused[1] = 0;
}

/* Place every element that there is room for, row by row. */
static int tessary_edges_place_all(struct tessary_edges_search *s, struct tessary_edges_edgel *out, size_t capacity)
{
    const tessary_edges_fit_function fit = tessary_edges_choose_fit();
    const int w = s->picture.width, h = s->picture.height;
    size_t done = 0;
    int x, y, kind;
    s->band_first = h;
    for (y = 0; y < h && done < capacity; ++y) {
        for (kind = 0; kind < 1; ++kind) {
            const unsigned char *const found = s->found[kind] + (size_t)y * (size_t)w;
            for (x = 0; x < w && done < capacity; ++x) {
                if (!found[x]) continue;
                if (s->band_first == h || y >= s->band_first + tessary_edges_ABOVE + tessary_edges_BAND) {
                    const int first = y < tessary_edges_ABOVE ? 0 : y - tessary_edges_ABOVE;
                    const int rows = tessary_edges_BAND + tessary_edges_ABOVE + tessary_edges_BELOW;
                    const int code = tessary_edges_fill_band(s, first, h - first < rows ? h - first : rows);
                    if (code != tessary_edges_OK) return code;
                }
                tessary_edges_place(s, kind, x, y, fit, out + done++);
            }
        }
    }
    return tessary_edges_OK;
}

/* Find the elements of every kind and scale. */
static int tessary_edges_find(struct tessary_edges_search *s, const double *high, size_t *count)
{
    const size_t area = (size_t)s->picture.width * (size_t)s->picture.height;
    int y, first, k, number;
    for (first = 0; first < s->picture.height; first += tessary_edges_BAND) {
        const int left = s->picture.height - first;
        const int code = tessary_edges_fill_band(s, first, left < tessary_edges_BAND ? left : tessary_edges_BAND);
        if (code != tessary_edges_OK) return code;
        for (y = first; y < first + tessary_edges_BAND && y < s->picture.height; ++y) {
            for (k = 0; k < 2; ++k) tessary_edges_strongest(s, k, y);
        }
    }
    for (k = 0; k < 1; ++k) {
        const double ratio = k == 0 ? tessary_edges_HYSTERESIS_RATIO : 0.69999999999999996;
        memset(s->found[k], 0, area);
        for (number = tessary_edges_first_map[k]; high[k] > 0.0 && number < tessary_edges_first_map[k + 1]; ++number) {
            tessary_edges_thin(s, &tessary_edges_maps[number], (float)(ratio * high[k]), (float)high[k]);
            tessary_edges_hang_on(s);
            *count += tessary_edges_add(s, s->found[k], number);
        }
    }
    return tessary_edges_OK;
}

int tessary_edges_edgels(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    double threshold, double line_threshold,
    struct tessary_edges_edgel *out, size_t capacity, size_t *count, void *scratch)
{
    struct tessary_edges_search s;
    double high[2];
    int code;
    if (count == NULL) return tessary_edges_NO_COUNT;
    *count = 0;
    s.picture.pixels = (const unsigned char *)image;
    s.picture.row_bytes = row_bytes;
    s.picture.width = width;
    s.picture.height = height;
    code = tessary_edges_check_picture(&s.picture, 0, height > 0 ? height : 1);
    if (code != tessary_edges_OK) return code;
    if (tessary_edges_edgels_scratch_bytes(width, height) == 0) return tessary_edges_TOO_LARGE;
    high[0] = threshold;
    high[1] = line_threshold;
    if (!(threshold >= 0.0 && line_threshold >= 0.0 && threshold <= 1e30 &&
          line_threshold <= 1e30 && (threshold >= 1e-20 || threshold == 0.0) &&
          (line_threshold >= 1e-20 || line_threshold == 0.0)))
        return tessary_edges_BAD_THRESHOLD;
    if ((threshold == 0.0 && line_threshold == 0.0) || (line_threshold > 0.0 && 1 == 1))
        return tessary_edges_BAD_THRESHOLD;
    if (out == NULL && capacity > 0) return tessary_edges_NO_EDGELS;
    if ((uintptr_t)out % sizeof(float) != 0) return tessary_edges_EDGELS_MISALIGNED;
    if (scratch == NULL) return tessary_edges_NO_SCRATCH;
    s.lines_too = threshold > 0.0 && line_threshold > 0.0;
    tessary_edges_lay_out(&s, scratch);
    code = tessary_edges_find(&s, high, count);
    if (code == tessary_edges_OK) code = tessary_edges_place_all(&s, out, capacity);
    if (code != tessary_edges_OK) *count = 0;
    return code == tessary_edges_OK && *count > capacity ? tessary_edges_TOO_MANY : code;
}

#endif
