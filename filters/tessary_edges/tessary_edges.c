/* tessary_edges: the code of the bank; tessary_edges.h describes it.
 *
 * The content of this folder is its maker's own. The parts that come from patchlab's
 * templates are granted to everyone for any use, without conditions or attribution.
 *
 * How it works: the picture is walked from top to bottom, once. A ring holds the
 * working values of the last 9 rows. For every stretch of tessary_edges_CHUNK output pixels
 * the rows of the ring are folded (added and subtracted about the middle row) and
 * dotted with the plan's coefficients; a kernel's response is a signed sum of such
 * products. The plan: parity, 320 multiplies a pixel.
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

/* 4 x 5 x 4 coefficients, even in y, odd in x */
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
        for (j = 0; j <= 4; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_edges_LINE + x + tessary_edges_RADIUS;
            for (i = 1; i <= 4; ++i) {
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

/* 4 x 4 x 5 coefficients, odd in y, even in x */
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
        for (j = 5; j <= 8; ++j) {
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
            for (i = 1; i <= 4; ++i) {
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

/* 4 x 5 x 4 coefficients, even in y, odd in x */
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
        for (j = 0; j <= 4; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_edges_LINE + x + tessary_edges_RADIUS;
            for (i = 1; i <= 4; ++i) {
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

/* 4 x 4 x 5 coefficients, odd in y, even in x */
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
        for (j = 5; j <= 8; ++j) {
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
            for (i = 1; i <= 4; ++i) {
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
#include <immintrin.h>
#elif defined(__GNUC__) && defined(__aarch64__)
#include <arm_neon.h>
#endif

#ifndef tessary_edges_MAX_LANES
#define tessary_edges_MAX_LANES 16
#endif

#define tessary_edges_SIZE 9
#define tessary_edges_RADIUS 4
#define tessary_edges_CHUNK 64 /* output pixels computed together */
#define tessary_edges_LINE 80 /* a chunk with its halo, in whole vectors */
#define tessary_edges_FOLDED 720 /* floats of the folded rows of a chunk */
#define tessary_edges_TILE 5440 /* widest part of the picture that the ring holds */
#define tessary_edges_SCRATCH 1872 /* floats of scratch memory beside the ring */
#define tessary_edges_LONGEST 16777216 /* pixels of a side */
#define tessary_edges_STREAM_FROM 8388608.0 /* bytes of output from which stores pass the cache */

/* ---- what the bank is made of */

/* The input table: working value of every Mono8 code. */
static const float tessary_edges_table[256] = {
    0.0f, 1.95394826f, 3.57617021f, 5.02080631f, 6.30380869f, 7.46666384f, 8.5240984f,
    9.48549366f, 10.4228106f, 11.3143845f, 12.1613817f, 12.9754457f, 13.7559805f, 14.5022154f,
    15.2229071f, 15.9287977f, 16.6148014f, 17.279892f, 17.926157f, 18.5548935f, 19.1687126f,
    19.7698898f, 20.3593884f, 20.9371624f, 21.5023251f, 22.0554657f, 22.5979843f, 23.131422f,
    23.6565971f, 24.1739616f, 24.6831646f, 25.1828556f, 25.673336f, 26.1570625f, 26.6354694f,
    27.1087055f, 27.5749741f, 28.0341206f, 28.4863358f, 28.9333191f, 29.3756847f, 29.8135395f,
    30.2460899f, 30.6732235f, 31.0950603f, 31.512167f, 31.9253464f, 32.334713f, 32.7403107f,
    33.14151f, 33.5383949f, 33.9310532f, 34.3199234f, 34.7055359f, 35.087944f, 35.4672089f,
    35.843174f, 36.2157516f, 36.585022f, 36.9511795f, 37.3143425f, 37.6745949f, 38.0319824f,
    38.3865547f, 38.738369f, 39.0875931f, 39.4342918f, 39.7785034f, 40.120266f, 40.4595642f,
    40.7964325f, 41.1309395f, 41.4631844f, 41.7931976f, 42.1210022f, 42.4466324f, 42.7701111f,
    43.0914726f, 43.4108391f, 43.7282448f, 44.0437202f, 44.3572807f, 44.6689529f, 44.9787598f,
    45.2867546f, 45.5929909f, 45.8974838f, 46.2002525f, 46.5013199f, 46.8006973f, 47.098423f,
    47.394558f, 47.6891174f, 47.9821129f, 48.273571f, 48.5634956f, 48.8519135f, 49.1388741f,
    49.4244041f, 49.7085114f, 49.9912148f, 50.2725296f, 50.5524635f, 50.8310509f, 51.1083336f,
    51.3843117f, 51.659008f, 51.9324303f, 52.204586f, 52.4754982f, 52.7452087f, 53.0137215f,
    53.2810555f, 53.5472145f, 53.8122101f, 54.0760536f, 54.3387794f, 54.6004028f, 54.8609352f,
    55.1203804f, 55.3787537f, 55.6360588f, 55.8923187f, 56.1475563f, 56.4017792f, 56.6549988f,
    56.9072189f, 57.1584473f, 57.4086952f, 57.6579933f, 57.9063492f, 58.1537666f, 58.4002533f,
    58.6458206f, 58.8904686f, 59.1342201f, 59.3770905f, 59.6190834f, 59.8602104f, 60.1004715f,
    60.3398781f, 60.5784416f, 60.8161774f, 61.053093f, 61.289196f, 61.5244865f, 61.758976f,
    61.9926643f, 62.2255707f, 62.4577065f, 62.6890717f, 62.9196739f, 63.1495209f, 63.3786125f,
    63.6069641f, 63.8345947f, 64.0615082f, 64.2877045f, 64.5131912f, 64.7379761f, 64.962059f,
    65.185463f, 65.4081879f, 65.6302338f, 65.8516006f, 66.0723114f, 66.2923508f, 66.511734f,
    66.730484f, 66.9485855f, 67.1660538f, 67.3828812f, 67.5990829f, 67.8146591f, 68.0296249f,
    68.2439804f, 68.4577255f, 68.6708755f, 68.8834229f, 69.0953751f, 69.3067474f, 69.5175552f,
    69.7277832f, 69.9374466f, 70.1465378f, 70.355072f, 70.5630569f, 70.7704926f, 70.9773712f,
    71.1837082f, 71.3894882f, 71.5947266f, 71.7994308f, 72.0036011f, 72.2072449f, 72.4103699f,
    72.6129684f, 72.8150711f, 73.0166779f, 73.2178116f, 73.418457f, 73.6186371f, 73.8183365f,
    74.0175705f, 74.2163315f, 74.4146347f, 74.612442f, 74.8097153f, 75.0064545f, 75.2026672f,
    75.3983536f, 75.5935135f, 75.7881622f, 75.9822998f, 76.1759262f, 76.3690491f, 76.5618362f,
    76.7543564f, 76.9466171f, 77.1386185f, 77.330368f, 77.5218582f, 77.7130966f, 77.9040833f,
    78.0948181f, 78.2853088f, 78.4750748f, 78.6639099f, 78.8518219f, 79.0388184f, 79.2248993f,
    79.41008f, 79.594368f, 79.7777634f, 79.9602737f, 80.1418991f, 80.323288f, 80.5055923f,
    80.6888046f, 80.8729553f, 81.0580368f, 81.244072f, 81.4310455f, 81.6190872f, 81.8084793f,
    81.9992447f, 82.191391f, 82.3839493f, 82.5764999f, 82.7690506f, 82.9616089f, 83.1541595f,
    83.3467102f, 83.5392685f, 83.7318192f, 83.9243698f
};

/* 4 x 5 x 4 coefficients, even in y, odd in x */
static const float tessary_edges_group0_taps[80] = {
    0.575336337f, 0.543063402f, 0.454838395f, 0.280044079f, 0.0538864136f, 0.0583308935f,
    0.0680029988f, 0.0582801104f, 0.000491738319f, 0.000668883324f, 0.00135320425f,
    0.00201237202f, 4.76837158e-07f, 9.53674316e-07f, 4.23192978e-06f, 1.37090683e-05f,
    0.283252239f, 0.238147378f, 0.14027971f, 0.0515415072f, 0.0265295506f, 0.0275591016f,
    0.0248772502f, 0.0120742917f, 0.000242114067f, 0.000355064869f, 0.000633299351f,
    0.000497281551f, 2.38418579e-07f, 5.96046448e-07f, 2.65240669e-06f, 4.17232513e-06f,
    0.0338009596f, 0.0191782713f, -0.00184440613f, -0.00624132156f, 0.0031658411f,
    0.00285542011f, 0.000615298748f, -0.00118237734f, 2.88486481e-05f, 5.0008297e-05f,
    5.15878201e-05f, -3.24845314e-05f, 0.0f, 1.1920929e-07f, 4.17232513e-07f, -1.1920929e-07f,
    0.000977635384f, 0.000210285187f, -0.000335037708f, -0.000170052052f, 9.15527344e-05f,
    6.0915947e-05f, -4.06205654e-05f, -3.88622284e-05f, 8.34465027e-07f, 1.66893005e-06f,
    2.98023224e-08f, -1.54972076e-06f, 0.0f, 0.0f, 0.0f, 0.0f, 6.7949295e-06f, -7.15255737e-07f,
    -1.9967556e-06f, -3.57627869e-07f, 5.96046448e-07f, 2.38418579e-07f, -4.17232513e-07f,
    -1.1920929e-07f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f
};

/* 4 x 4 x 5 coefficients, odd in y, even in x */
static const float tessary_edges_group1_taps[80] = {
    0.280429482f, 0.454838395f, 0.542317152f, 0.574251413f, 0.0516124964f, 0.14027971f,
    0.237820089f, 0.282718182f, -0.00624984503f, -0.00184440613f, 0.0191518664f, 0.0337371826f,
    -0.00017029047f, -0.000335037708f, 0.000209987164f, 0.000975847244f, -3.57627869e-07f,
    -1.9967556e-06f, -7.15255737e-07f, 6.7949295e-06f, 0.0583603382f, 0.0680029988f,
    0.0582506657f, 0.0537847281f, 0.0120909214f, 0.0248772502f, 0.0275212526f, 0.0264796019f,
    -0.00118398666f, 0.000615298748f, 0.00285154581f, 0.00315988064f, -3.8921833e-05f,
    -4.06205654e-05f, 6.08563423e-05f, 9.14335251e-05f, -1.1920929e-07f, -4.17232513e-07f,
    2.38418579e-07f, 5.96046448e-07f, 0.00201523304f, 0.00135320425f, 0.000667929649f,
    0.000490903854f, 0.000497937202f, 0.000633299351f, 0.000354588032f, 0.00024163723f,
    -3.2544136e-05f, 5.15878201e-05f, 4.99486923e-05f, 2.88486481e-05f, -1.54972076e-06f,
    2.98023224e-08f, 1.66893005e-06f, 8.34465027e-07f, 0.0f, 0.0f, 0.0f, 0.0f, 1.37090683e-05f,
    4.23192978e-06f, 9.53674316e-07f, 4.76837158e-07f, 4.17232513e-06f, 2.65240669e-06f,
    5.96046448e-07f, 2.38418579e-07f, -1.1920929e-07f, 4.17232513e-07f, 1.1920929e-07f, 0.0f,
    0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f, 0.0f
};

/* 4 x 5 x 4 coefficients, even in y, odd in x */
static const float tessary_edges_group2_taps[80] = {
    0.405127943f, 0.381833673f, 0.307874262f, 0.176480174f, 0.169949412f, 0.171772718f,
    0.163957179f, 0.111257732f, 0.0188758373f, 0.0214352608f, 0.0271040201f, 0.0243647099f,
    0.000657856464f, 0.000879406929f, 0.00164842606f, 0.00219672918f, 0.282213449f,
    0.249374241f, 0.168938786f, 0.078799963f, 0.118387341f, 0.114380002f, 0.0938002169f,
    0.0508518815f, 0.0131489635f, 0.0147338808f, 0.0165804327f, 0.0115686059f, 0.000458300114f,
    0.000631272793f, 0.00110223889f, 0.00109833479f, 0.0953969359f, 0.06859833f, 0.0213039815f,
    -0.00169038773f, 0.0400186181f, 0.0335407257f, 0.0148646235f, -0.000309407711f,
    0.00444477797f, 0.00476244092f, 0.00349959731f, 0.000219702721f, 0.000154912472f,
    0.00023022294f, 0.000311344862f, 5.83231449e-05f, 0.0156481266f, 0.00753572583f,
    -0.00215414166f, -0.00287845731f, 0.00656431913f, 0.00422114134f, -0.000520139933f,
    -0.00176921487f, 0.000729084015f, 0.000713646412f, 0.000122249126f, -0.000367581844f,
    2.53915787e-05f, 4.12762165e-05f, 3.02791595e-05f, -2.9951334e-05f, 0.00124555826f,
    0.000268518925f, -0.00040063262f, -0.000209510326f, 0.000522494316f, 0.000211983919f,
    -0.000192731619f, -0.000137239695f, 5.8054924e-05f, 4.83393669e-05f, -2.22325325e-05f,
    -3.18288803e-05f, 2.02655792e-06f, 3.51667404e-06f, 1.1920929e-07f, -3.06963921e-06f
};

/* 4 x 4 x 5 coefficients, odd in y, even in x */
static const float tessary_edges_group3_taps[80] = {
    0.176990509f, 0.307874262f, 0.380732715f, 0.403535783f, 0.0790278018f, 0.168938786f,
    0.2486552f, 0.281104326f, -0.00169527531f, 0.0213039815f, 0.0684005618f, 0.0950220227f,
    -0.00288680196f, -0.00215414166f, 0.00751399994f, 0.0155866146f, -0.000210106373f,
    -0.00040063262f, 0.000267744064f, 0.00124067068f, 0.111579478f, 0.163957179f, 0.171277404f,
    0.169281483f, 0.0509989262f, 0.0938002169f, 0.11405021f, 0.117922068f, -0.000310301781f,
    0.0148646235f, 0.0334439874f, 0.0398613214f, -0.00177434087f, -0.000520139933f,
    0.00420898199f, 0.00653851032f, -0.000137656927f, -0.000192731619f, 0.000211387873f,
    0.000520467758f, 0.0244352221f, 0.0271040201f, 0.0213734508f, 0.0188016891f, 0.0116020739f,
    0.0165804327f, 0.0146913826f, 0.0130972862f, 0.000220358372f, 0.00349959731f,
    0.00474867225f, 0.0044273138f, -0.000368654728f, 0.000122249126f, 0.000711560249f,
    0.000726222992f, -3.19182873e-05f, -2.22325325e-05f, 4.81903553e-05f, 5.78165054e-05f,
    0.00220310688f, 0.00164842606f, 0.000876843929f, 0.000655293465f, 0.00110149384f,
    0.00110223889f, 0.000629425049f, 0.00045645237f, 5.85019588e-05f, 0.000311344862f,
    0.000229567289f, 0.000154316425f, -3.0040741e-05f, 3.02791595e-05f, 4.11868095e-05f,
    2.5331974e-05f, -3.09944153e-06f, 1.1920929e-07f, 3.48687172e-06f, 2.02655792e-06f
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
};

#if !defined(__GNUC__) || tessary_edges_MAX_LANES < 4
#define tessary_edges_LANES 1
#else
#define tessary_edges_LANES 4
#endif
#define tessary_edges_FN(x) tessary_edges_##x##_base
#define tessary_edges_TARGET
#include "tessary_edges.c"
static const struct tessary_edges_code_of tessary_edges_base = {tessary_edges_responses_base, {tessary_edges_edges0_base, tessary_edges_edges1_base}};
#undef tessary_edges_LANES
#undef tessary_edges_FN
#undef tessary_edges_TARGET

#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 8
#define tessary_edges_LANES 8
#define tessary_edges_FN(x) tessary_edges_##x##_avx2
#define tessary_edges_TARGET __attribute__((target("avx2,fma")))
#include "tessary_edges.c"
static const struct tessary_edges_code_of tessary_edges_avx2 = {tessary_edges_responses_avx2, {tessary_edges_edges0_avx2, tessary_edges_edges1_avx2}};
#undef tessary_edges_LANES
#undef tessary_edges_FN
#undef tessary_edges_TARGET
#endif

#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 16
#define tessary_edges_LANES 16
#define tessary_edges_FN(x) tessary_edges_##x##_avx512
#define tessary_edges_TARGET __attribute__((target("avx512f,avx512vl,avx512bw,avx512dq,avx2,fma")))
#include "tessary_edges.c"
static const struct tessary_edges_code_of tessary_edges_avx512 = {tessary_edges_responses_avx512, {tessary_edges_edges0_avx512, tessary_edges_edges1_avx512}};
#undef tessary_edges_LANES
#undef tessary_edges_FN
#undef tessary_edges_TARGET
#endif

static const struct tessary_edges_code_of *tessary_edges_choose(void)
{
#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 8
    __builtin_cpu_init(); /* does nothing where the compiler's start-up code has done it */
#endif
#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 16
    if (__builtin_cpu_supports("avx512f") && __builtin_cpu_supports("avx512vl") &&
        __builtin_cpu_supports("avx512bw") && __builtin_cpu_supports("avx512dq"))
        return &tessary_edges_avx512;
#endif
#if defined(__GNUC__) && defined(__x86_64__) && tessary_edges_MAX_LANES >= 8
    if (__builtin_cpu_supports("avx2") && __builtin_cpu_supports("fma")) return &tessary_edges_avx2;
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
    case tessary_edges_OUTPUT_MISALIGNED: return "out, out_row_bytes or out_plane_bytes is not a multiple of 4";
    case tessary_edges_BAD_OUTPUT_ROW_BYTES: return "out_row_bytes is smaller than a row of floats";
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
    if (width < tessary_edges_SIZE || width > tessary_edges_LONGEST) return 0;
    if (height < tessary_edges_SIZE || height > tessary_edges_LONGEST) return 0;
    return (tessary_edges_SIZE * tessary_edges_ring_width(width) + tessary_edges_SCRATCH) * sizeof(float) + 64;
}

int tessary_edges_responses_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count,
    float *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, void *scratch)
{
    struct tessary_edges_picture p;
    struct tessary_edges_job job;
    int code;
    p.pixels = (const unsigned char *)image;
    p.row_bytes = row_bytes;
    p.width = width;
    p.height = height;
    code = tessary_edges_check_picture(&p, first_row, row_count);
    if (code != tessary_edges_OK) return code;
    if (out == NULL) return tessary_edges_NO_OUTPUT;
    if ((uintptr_t)out % 4u != 0 || out_row_bytes % 4 != 0 || out_plane_bytes % 4 != 0)
        return tessary_edges_OUTPUT_MISALIGNED;
    if (tessary_edges_reach(out_row_bytes) < (ptrdiff_t)width * 4) return tessary_edges_BAD_OUTPUT_ROW_BYTES;
    if (tessary_edges_overlap(out_row_bytes, out_plane_bytes, (ptrdiff_t)width * 4, row_count))
        return tessary_edges_BAD_OUTPUT_PLANE_BYTES;
    if (scratch == NULL) return tessary_edges_NO_SCRATCH;
    job.scale = -1;
    job.out = (char *)out;
    job.row_bytes = out_row_bytes;
    job.plane_bytes = out_plane_bytes;
    job.orientation = NULL;
    job.orientation_row_bytes = 0;
    /* judged by the whole picture: bands of one picture are usually made side by side */
    job.stream = 4.0 * tessary_edges_KERNEL_COUNT * width * height >= tessary_edges_STREAM_FROM;
    return tessary_edges_walk(&p, &job, first_row, row_count, scratch);
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
    int code;
    p.pixels = (const unsigned char *)image;
    p.row_bytes = row_bytes;
    p.width = width;
    p.height = height;
    code = tessary_edges_check_picture(&p, first_row, row_count);
    if (code != tessary_edges_OK) return code;
    if (scale < 0 || scale >= tessary_edges_SCALE_COUNT) return tessary_edges_BAD_SCALE;
    if (strength == NULL) return tessary_edges_NO_STRENGTH;
    if ((uintptr_t)strength % 4u != 0 || strength_row_bytes % 4 != 0)
        return tessary_edges_STRENGTH_MISALIGNED;
    if (tessary_edges_reach(strength_row_bytes) < (ptrdiff_t)width * 4) return tessary_edges_BAD_STRENGTH_ROW_BYTES;
    if (orientation == NULL) return tessary_edges_NO_ORIENTATION;
    if (tessary_edges_reach(orientation_row_bytes) < width) return tessary_edges_BAD_ORIENTATION_ROW_BYTES;
    if (scratch == NULL) return tessary_edges_NO_SCRATCH;
    job.scale = scale;
    job.out = (char *)strength;
    job.row_bytes = strength_row_bytes;
    job.plane_bytes = 0;
    job.orientation = orientation;
    job.orientation_row_bytes = orientation_row_bytes;
    job.stream = 0;
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
