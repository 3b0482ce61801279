/* tessary_features: the code of the bank; tessary_features.h describes it.
 *
 * The content of this folder is its maker's own. The parts that come from patchlab's
 * templates are granted to everyone for any use, without conditions or attribution.
 *
 * How it works: the picture is walked from top to bottom, once. A ring holds the
 * working values of the last 25 rows. For every stretch of tessary_features_CHUNK output pixels
 * the rows of the ring are folded (added and subtracted about the middle row) and
 * dotted with the plan's coefficients; a kernel's response is a signed sum of such
 * products. The plan: parity, 2525 multiplies a pixel.
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
        for (j = 0; j <= 12; ++j) {
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
            for (i = 1; i <= 12; ++i) {
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
        for (j = 13; j <= 24; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_features_LINE + x + tessary_features_RADIUS;
            for (i = 1; i <= 12; ++i) {
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
        for (j = 0; j <= 12; ++j) {
            const float *const r = s + (ptrdiff_t)j * tessary_features_LINE + x + tessary_features_RADIUS;
            for (i = 1; i <= 12; ++i) {
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
        for (j = 13; j <= 24; ++j) {
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
            for (i = 1; i <= 12; ++i) {
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

static tessary_features_TARGET void tessary_features_FN(add)(float *to, const float *a, const float *b)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_LANES) tessary_features_STORE(to + x, tessary_features_LOAD(a + x) + tessary_features_LOAD(b + x));
}

static tessary_features_TARGET void tessary_features_FN(subtract)(float *to, const float *a, const float *b)
{
    int x;
    for (x = 0; x < tessary_features_CHUNK; x += tessary_features_LANES) tessary_features_STORE(to + x, tessary_features_LOAD(a + x) - tessary_features_LOAD(b + x));
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
    float *const r = t + 16 * tessary_features_CHUNK; /* a sum */
    tessary_features_FN(fold)(rows, at, work);
    tessary_features_FN(group0)(work, t);
    tessary_features_FN(group1)(work, t);
    tessary_features_FN(group2)(work, t);
    tessary_features_FN(group3)(work, t);
    tessary_features_FN(put)(t + 0 * tessary_features_CHUNK, (float *)(void *)(out + 0 * plane), n, stream);
    tessary_features_FN(add)(r, t + 1 * tessary_features_CHUNK, t + 2 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 1 * plane), n, stream);
    tessary_features_FN(add)(r, t + 3 * tessary_features_CHUNK, t + 4 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 2 * plane), n, stream);
    tessary_features_FN(add)(r, t + 5 * tessary_features_CHUNK, t + 6 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 3 * plane), n, stream);
    tessary_features_FN(put)(t + 7 * tessary_features_CHUNK, (float *)(void *)(out + 4 * plane), n, stream);
    tessary_features_FN(subtract)(r, t + 6 * tessary_features_CHUNK, t + 5 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 5 * plane), n, stream);
    tessary_features_FN(subtract)(r, t + 4 * tessary_features_CHUNK, t + 3 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 6 * plane), n, stream);
    tessary_features_FN(subtract)(r, t + 2 * tessary_features_CHUNK, t + 1 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 7 * plane), n, stream);
    tessary_features_FN(put)(t + 8 * tessary_features_CHUNK, (float *)(void *)(out + 8 * plane), n, stream);
    tessary_features_FN(add)(r, t + 9 * tessary_features_CHUNK, t + 10 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 9 * plane), n, stream);
    tessary_features_FN(add)(r, t + 11 * tessary_features_CHUNK, t + 12 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 10 * plane), n, stream);
    tessary_features_FN(add)(r, t + 13 * tessary_features_CHUNK, t + 14 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 11 * plane), n, stream);
    tessary_features_FN(put)(t + 15 * tessary_features_CHUNK, (float *)(void *)(out + 12 * plane), n, stream);
    tessary_features_FN(subtract)(r, t + 13 * tessary_features_CHUNK, t + 14 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 13 * plane), n, stream);
    tessary_features_FN(subtract)(r, t + 11 * tessary_features_CHUNK, t + 12 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 14 * plane), n, stream);
    tessary_features_FN(subtract)(r, t + 9 * tessary_features_CHUNK, t + 10 * tessary_features_CHUNK);
    tessary_features_FN(put)(r, (float *)(void *)(out + 15 * plane), n, stream);
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
#define tessary_features_SCRATCH 3552 /* floats of scratch memory beside the ring */
#define tessary_features_LONGEST 16777216 /* pixels of a side */
#define tessary_features_STREAM_FROM 8388608.0 /* bytes of output from which stores pass the cache */

/* ---- what the bank is made of */

/* The input table: working value of every Mono8 code. */
static const float tessary_features_table[256] = {
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

/* 5 x 13 x 13 coefficients, even in y, even in x */
static const float tessary_features_group0_taps[845] = {
    0.155620158f, 0.153686345f, 0.151586056f, 0.15305239f, 0.1547333f, 0.103000611f,
    0.108148217f, 0.122660965f, 0.140962094f, 0.149972528f, 0.0f, 0.0143844783f, 0.0554241836f,
    0.109119684f, 0.136551529f, -0.0631530285f, -0.0520164073f, -0.00942113996f, 0.0684439242f,
    0.116798729f, -0.0631826222f, -0.0625886619f, -0.04347229f, 0.0308493376f, 0.093850404f,
    -0.0358966887f, -0.0412787497f, -0.0457189381f, 0.0041911006f, 0.0708419979f,
    -0.0138302445f, -0.0187107027f, -0.0318819284f, -0.00965738297f, 0.0502344966f,
    -0.00382968783f, -0.00623261929f, -0.0169071555f, -0.0134246051f, 0.0334633887f,
    -0.000783056021f, -0.00157186389f, -0.00715360045f, -0.0115639567f, 0.02094087f,
    -0.000120013952f, -0.00030502677f, -0.00247091055f, -0.00787657499f, 0.0123105049f,
    -1.39176846e-05f, -4.59849834e-05f, -0.000705778599f, -0.00453680754f, 0.00679850578f,
    -1.22189522e-06f, -5.42402267e-06f, -0.000168055296f, -0.00227370858f, 0.00352701545f,
    -8.94069672e-08f, -5.06639481e-07f, -3.35276127e-05f, -0.00100642443f, 0.00171893835f,
    0.150832057f, 0.141545206f, 0.122660965f, 0.107702672f, 0.102413654f, 0.0998316109f,
    0.100335598f, 0.100700095f, 0.0999222547f, 0.0992627144f, 0.0f, 0.0148221403f,
    0.0487861931f, 0.0792334974f, 0.0903797448f, -0.0612100065f, -0.0469987094f,
    -0.00324465334f, 0.0522654057f, 0.0773058832f, -0.0612387061f, -0.0581901968f,
    -0.0330207348f, 0.0264936686f, 0.0621170104f, -0.0347922742f, -0.0392866433f,
    -0.0376912057f, 0.00721253455f, 0.0468883812f, -0.0134047568f, -0.0182680041f,
    -0.0280109644f, -0.00383619964f, 0.0332488418f, -0.00371187925f, -0.0062622577f,
    -0.0158321261f, -0.00791069865f, 0.0221485198f, -0.000758975744f, -0.00163076818f,
    -0.00716426969f, -0.00766544044f, 0.0138601661f, -0.000116318464f, -0.000327825546f,
    -0.00265732408f, -0.00563617051f, 0.00814798474f, -1.3500452e-05f, -5.13792038e-05f,
    -0.000818267465f, -0.00346271694f, 0.00449973345f, -1.1920929e-06f, -6.31809235e-06f,
    -0.000210791826f, -0.00184383988f, 0.00233444571f, -8.94069672e-08f, -6.10947609e-07f,
    -4.56571579e-05f, -0.000866293907f, 0.00113770366f, 0.137334138f, 0.109571069f,
    0.0554241836f, 0.0143252313f, 0.0f, 0.0908977091f, 0.0795612633f, 0.0487861931f,
    0.0147610754f, 0.0f, 0.0f, 0.0155747533f, 0.0311177224f, 0.0155105889f, 0.0f,
    -0.0557323396f, -0.0339636058f, 0.00889144838f, 0.0153734684f, 0.0f, -0.0557584763f,
    -0.0464251488f, -0.00947396457f, 0.0134991258f, 0.0f, -0.0316787064f, -0.0337512344f,
    -0.018314749f, 0.0100393146f, 0.0f, -0.0122051537f, -0.0169216245f, -0.0178395063f,
    0.00599212945f, 0.0f, -0.00337970257f, -0.00627800822f, -0.0124929398f, 0.0025011301f, 0.0f,
    -0.000691056252f, -0.00177517533f, -0.00682358444f, 0.000229805708f, 0.0f, -0.000105917454f,
    -0.000388368964f, -0.00300329924f, -0.00080178678f, 0.0f, -1.22785568e-05f,
    -6.63101673e-05f, -0.00108329952f, -0.000980734825f, 0.0f, -1.07288361e-06f,
    -8.88109207e-06f, -0.00032350421f, -0.000764235854f, 0.0f, -5.96046448e-08f,
    -9.38773155e-07f, -8.05258751e-05f, -0.000471323729f, 0.0f, 0.117468119f, 0.0687270463f,
    -0.00942113996f, -0.0518021286f, -0.0627931356f, 0.0777489543f, 0.0524816066f,
    -0.00324465334f, -0.0468050838f, -0.0608612001f, 0.0f, 0.0154370666f, 0.00889144838f,
    -0.0338236988f, -0.0554147363f, -0.0476703942f, -0.0178272277f, 0.0152081698f,
    -0.0177537948f, -0.047398746f, -0.0476927459f, -0.0309171379f, 0.0110742301f,
    -0.00377805531f, -0.0380859673f, -0.0270962417f, -0.0258779526f, 0.00171853602f,
    0.00496762991f, -0.0287487805f, -0.0104396343f, -0.0146827847f, -0.00533474982f,
    0.00816576183f, -0.0203859508f, -0.00289079547f, -0.0061096251f, -0.00716131926f,
    0.00749722123f, -0.0135799646f, -0.000591099262f, -0.00192332268f, -0.00547720492f,
    0.00517581403f, -0.00849813223f, -9.05990601e-05f, -0.000465363264f, -0.00303941965f,
    0.00284263492f, -0.0049957931f, -1.05202198e-05f, -8.73655081e-05f, -0.00131475925f,
    0.00122612715f, -0.00275895f, -9.23871994e-07f, -1.28000975e-05f, -0.000457882881f,
    0.000371053815f, -0.00143131614f, -5.96046448e-08f, -1.47521496e-06f, -0.000130668283f,
    3.04728746e-05f, -0.00069758296f, 0.0943882763f, 0.0309769511f, -0.04347229f,
    -0.0623308122f, -0.0628225803f, 0.0624730289f, 0.0266032666f, -0.0330207348f,
    -0.0579504669f, -0.0608897209f, 0.0f, 0.0135549605f, -0.00947396457f, -0.0462338924f,
    -0.0554407239f, -0.0383042395f, -0.00379368663f, 0.0110742301f, -0.0307897776f,
    -0.0474209785f, -0.0383222103f, -0.0158704817f, 0.0181598514f, -0.0158050954f,
    -0.0381038189f, -0.0217724442f, -0.0172989368f, 0.0132593364f, -0.00439892709f,
    -0.0287622809f, -0.00838845968f, -0.0117223263f, 0.00460189581f, 0.00224544108f,
    -0.0203955173f, -0.00232282281f, -0.00560484827f, -0.00130210817f, 0.00471664965f,
    -0.0135863423f, -0.000474959612f, -0.00198188424f, -0.00306557119f, 0.00453537703f,
    -0.00850209594f, -7.28070736e-05f, -0.000530809164f, -0.00243608654f, 0.00324830413f,
    -0.00499814749f, -8.43405724e-06f, -0.000109225512f, -0.00131337345f, 0.0018940568f,
    -0.00276023149f, -7.4505806e-07f, -1.74194574e-05f, -0.000541165471f, 0.000919729471f,
    -0.00143200159f, -5.96046448e-08f, -2.16066837e-06f, -0.000178188086f, 0.000368714333f,
    -0.000697880983f, 0.0712480247f, 0.00420844555f, -0.0457189381f, -0.0411086977f,
    -0.0356921256f, 0.0471571088f, 0.00724236667f, -0.0376912057f, -0.0391247869f,
    -0.0345939994f, 0.0f, 0.0100808442f, -0.018314749f, -0.0336121917f, -0.0314981937f,
    -0.0289135575f, 0.00498817861f, 0.00171853602f, -0.0257713348f, -0.0269418359f,
    -0.0289271176f, -0.00441712141f, 0.0132593364f, -0.0172276795f, -0.0216483772f,
    -0.0164346993f, -0.00959165394f, 0.0142035186f, -0.00955213606f, -0.0163410604f,
    -0.00633195043f, -0.00842617452f, 0.00885742903f, -0.00380843878f, -0.0115875304f,
    -0.00175336003f, -0.00473298132f, 0.00295975804f, -0.000323995948f, -0.00771895051f,
    -0.000358521938f, -0.00188846886f, -0.000420972705f, 0.0012255609f, -0.00483039021f,
    -5.49554825e-05f, -0.000559329987f, -0.00131200254f, 0.00150710344f, -0.00283965468f,
    -6.37769699e-06f, -0.000125855207f, -0.00100545585f, 0.00119103491f, -0.0015681982f,
    -5.66244125e-07f, -2.18153e-05f, -0.000512570143f, 0.000743225217f, -0.000813573599f,
    -2.98023224e-08f, -2.93552876e-06f, -0.000198826194f, 0.000386357307f, -0.000396490097f,
    0.0505224168f, -0.00969731808f, -0.0318819284f, -0.018633604f, -0.0137514472f,
    0.0334393978f, -0.00385206938f, -0.0280109644f, -0.0181927532f, -0.0133283436f, 0.0f,
    0.00601691008f, -0.0178395063f, -0.0168519169f, -0.0121355951f, -0.0205027759f,
    0.00819954276f, -0.00533474982f, -0.0146223009f, -0.0103801191f, -0.0205124021f,
    0.0022547245f, 0.00460189581f, -0.0116740316f, -0.00834065676f, -0.0116539598f,
    -0.00382418931f, 0.00885742903f, -0.00839146972f, -0.00629585981f, -0.00449001789f,
    -0.00530068576f, 0.00782939792f, -0.00527884066f, -0.0044644475f, -0.00124332309f,
    -0.0036123842f, 0.00440390408f, -0.00277084112f, -0.00297394395f, -0.00025421381f,
    -0.00163814425f, 0.00137168169f, -0.00107714534f, -0.00186106563f, -3.89516354e-05f,
    -0.000537350774f, -0.00016258657f, -0.000153005123f, -0.00109404325f, -4.529953e-06f,
    -0.000132247806f, -0.000511392951f, 0.000211820006f, -0.000604182482f, -3.87430191e-07f,
    -2.48998404e-05f, -0.000369518995f, 0.000264331698f, -0.000313460827f, -2.98023224e-08f,
    -3.62098217e-06f, -0.0001770854f, 0.000195741653f, -0.000152766705f, 0.0336551964f,
    -0.0134801567f, -0.0169071555f, -0.00620692968f, -0.00380787253f, 0.0222754478f,
    -0.0079434216f, -0.0158321261f, -0.00623647869f, -0.0036907196f, 0.0f, 0.00251147151f,
    -0.0124929398f, -0.00625212491f, -0.00336042047f, -0.0136578083f, 0.00752823055f,
    -0.00716131926f, -0.00608444214f, -0.00287434459f, -0.013664186f, 0.00473617017f,
    -0.00130210817f, -0.00558176637f, -0.00230959058f, -0.00776320696f, -0.000325337052f,
    0.00295975804f, -0.0047134757f, -0.00174337626f, -0.00299099088f, -0.00278230011f,
    0.00440390408f, -0.00359749794f, -0.00123623013f, -0.000828236341f, -0.00245176256f,
    0.00353635848f, -0.00244165957f, -0.000823497772f, -0.000169336796f, -0.00128133595f,
    0.0018504411f, -0.00144506991f, -0.000515341759f, -2.59578228e-05f, -0.000467762351f,
    0.000540047884f, -0.000721782446f, -0.000302940607f, -3.01003456e-06f, -0.000126197934f,
    -5.93215227e-05f, -0.000282168388f, -0.000167310238f, -2.68220901e-07f, -2.58386135e-05f,
    -0.000176668167f, -6.4522028e-05f, -8.67843628e-05f, -2.98023224e-08f, -4.08291817e-06f,
    -0.000119954348f, 1.59144402e-05f, -4.22894955e-05f, 0.021060884f, -0.0116117895f,
    -0.00715360045f, -0.00156539679f, -0.000778615475f, 0.0139396191f, -0.00769715011f,
    -0.00716426969f, -0.00162403286f, -0.000754654408f, 0.0f, 0.000230744481f, -0.00682358444f,
    -0.00176784396f, -0.000687122345f, -0.00854682922f, 0.0051972121f, -0.00547720492f,
    -0.00191541016f, -0.0005877316f, -0.00855085254f, 0.00455412269f, -0.00306557119f,
    -0.0019737184f, -0.000472247601f, -0.00485807657f, 0.0012306273f, -0.000420972705f,
    -0.00188069046f, -0.000356465578f, -0.00187173486f, -0.00108160079f, 0.00137168169f,
    -0.00163140893f, -0.000252783298f, -0.000518292189f, -0.00145104527f, 0.0018504411f,
    -0.00127606094f, -0.000168383121f, -0.000105977058f, -0.000896796584f, 0.00138792396f,
    -0.000893086195f, -0.000105381012f, -1.62422657e-05f, -0.000367477536f, 0.00068128109f,
    -0.000554352999f, -6.19590282e-05f, -1.87754631e-06f, -0.000109121203f, 0.000186726451f,
    -0.000301226974f, -3.42130661e-05f, -1.78813934e-07f, -2.43633986e-05f, -1.92523003e-05f,
    -0.000140011311f, -1.77621841e-05f, 0.0f, -4.17232513e-06f, -5.38825989e-05f,
    -5.29587269e-05f, -8.64267349e-06f, 0.012381047f, -0.00790917873f, -0.00247091055f,
    -0.000303775072f, -0.000119328499f, 0.00819468498f, -0.00565949082f, -0.00265732408f,
    -0.000326469541f, -0.000115662813f, 0.0f, -0.000805109739f, -0.00300329924f,
    -0.000386759639f, -0.000105321407f, -0.00502443314f, 0.00285439193f, -0.00303941965f,
    -0.000463455915f, -9.00924206e-05f, -0.00502678752f, 0.00326174498f, -0.00243608654f,
    -0.000528618693f, -7.23898411e-05f, -0.00285592675f, 0.00151333213f, -0.00131200254f,
    -0.000557020307f, -5.46276569e-05f, -0.00110033154f, -0.000153645873f, -0.00016258657f,
    -0.000535145402f, -3.87430191e-05f, -0.000304698944f, -0.000724777579f, 0.000540047884f,
    -0.000465840101f, -2.58088112e-05f, -6.22868538e-05f, -0.000556647778f, 0.00068128109f,
    -0.000365972519f, -1.61528587e-05f, -9.53674316e-06f, -0.000259593129f, 0.000479742885f,
    -0.000258520246f, -9.50694084e-06f, -1.10268593e-06f, -8.53389502e-05f, 0.000221192837f,
    -0.000163465738f, -5.24520874e-06f, -8.94069672e-08f, -2.08318233e-05f, 5.69522381e-05f,
    -9.19103622e-05f, -2.71201134e-06f, 0.0f, -3.87430191e-06f, -5.51342964e-06f,
    -4.54932451e-05f, -1.31130219e-06f, 0.00683745742f, -0.004555583f, -0.000705778599f,
    -4.58061695e-05f, -1.38282776e-05f, 0.00452554226f, -0.00347703695f, -0.000818267465f,
    -5.11556864e-05f, -1.34110451e-05f, 0.0f, -0.00098477304f, -0.00108329952f,
    -6.60419464e-05f, -1.22189522e-05f, -0.00277474523f, 0.00123119354f, -0.00131475925f,
    -8.70078802e-05f, -1.04606152e-05f, -0.00277605653f, 0.00190189481f, -0.00131337345f,
    -0.000108778477f, -8.40425491e-06f, -0.00157719851f, 0.0011959523f, -0.00100545585f,
    -0.000125333667f, -6.34789467e-06f, -0.000607669353f, 0.000212699175f, -0.000511392951f,
    -0.000131696463f, -4.50015068e-06f, -0.000168263912f, -0.00028334558f, -5.93215227e-05f,
    -0.000125676394f, -2.98023224e-06f, -3.439188e-05f, -0.000302478671f, 0.000186726451f,
    -0.000108674169f, -1.87754631e-06f, -5.27501106e-06f, -0.000164136291f, 0.000221192837f,
    -8.49813223e-05f, -1.10268593e-06f, -6.2584877e-07f, -6.02304935e-05f, 0.000146314502f,
    -5.9992075e-05f, -5.96046448e-07f, -5.96046448e-08f, -1.61379576e-05f, 6.33746386e-05f,
    -3.81171703e-05f, -3.27825546e-07f, 0.0f, -3.2633543e-06f, 1.53332949e-05f,
    -2.17109919e-05f, -1.49011612e-07f, 0.00354722142f, -0.00228312612f, -0.000168055296f,
    -5.39422035e-06f, -1.22189522e-06f, 0.00234782696f, -0.00185146928f, -0.000210791826f,
    -6.28829002e-06f, -1.1920929e-06f, 0.0f, -0.0007673949f, -0.00032350421f, -8.85128975e-06f,
    -1.07288361e-06f, -0.00143951178f, 0.000372588634f, -0.000457882881f, -1.2755394e-05f,
    -9.23871994e-07f, -0.00144019723f, 0.000923514366f, -0.000541165471f, -1.73598528e-05f,
    -7.4505806e-07f, -0.000818222761f, 0.000746294856f, -0.000512570143f, -2.1725893e-05f,
    -5.66244125e-07f, -0.000315248966f, 0.000265419483f, -0.000369518995f, -2.47955322e-05f,
    -3.87430191e-07f, -8.72910023e-05f, -6.47902489e-05f, -0.000176668167f, -2.57343054e-05f,
    -2.68220901e-07f, -1.78515911e-05f, -0.000140592456f, -1.92523003e-05f, -2.42590904e-05f,
    -1.78813934e-07f, -2.74181366e-06f, -9.22828913e-05f, 5.69522381e-05f, -2.07424164e-05f,
    -8.94069672e-08f, -3.27825546e-07f, -3.82661819e-05f, 6.33746386e-05f, -1.60783529e-05f,
    -5.96046448e-08f, -2.98023224e-08f, -1.13248825e-05f, 3.9383769e-05f, -1.1280179e-05f,
    -2.98023224e-08f, 0.0f, -2.50339508e-06f, 1.60187483e-05f, -7.13765621e-06f, 0.0f,
    0.00172877312f, -0.00101059675f, -3.35276127e-05f, -5.06639481e-07f, -8.94069672e-08f,
    0.00114423037f, -0.000869899988f, -4.56571579e-05f, -6.10947609e-07f, -8.94069672e-08f,
    0.0f, -0.00047326088f, -8.05258751e-05f, -9.23871994e-07f, -5.96046448e-08f,
    -0.000701576471f, 3.06069851e-05f, -0.000130668283f, -1.4603138e-06f, -5.96046448e-08f,
    -0.000701904297f, 0.000370234251f, -0.000178188086f, -2.16066837e-06f, -5.96046448e-08f,
    -0.000398784876f, 0.000387951732f, -0.000198826194f, -2.92062759e-06f, -2.98023224e-08f,
    -0.000153630972f, 0.000196561217f, -0.0001770854f, -3.60608101e-06f, -2.98023224e-08f,
    -4.25577164e-05f, 1.59740448e-05f, -0.000119954348f, -4.05311584e-06f, -2.98023224e-08f,
    -8.70227814e-06f, -5.31673431e-05f, -5.38825989e-05f, -4.14252281e-06f, 0.0f,
    -1.34110451e-06f, -4.56869602e-05f, -5.51342964e-06f, -3.85940075e-06f, 0.0f,
    -1.49011612e-07f, -2.18003988e-05f, 1.53332949e-05f, -3.24845314e-06f, 0.0f, 0.0f,
    -7.16745853e-06f, 1.60187483e-05f, -2.48849392e-06f, 0.0f, 0.0f, -1.74343586e-06f,
    9.35792923e-06f, -1.7285347e-06f, 0.0f
};

/* 3 x 12 x 12 coefficients, odd in y, odd in x */
static const float tessary_features_group1_taps[432] = {
    -0.0298391283f, -0.0417013615f, -0.0297162086f, -0.0349637419f, -0.0594617426f,
    -0.0505510867f, -0.0188539922f, -0.0491929203f, -0.0577836633f, -0.00184556842f,
    -0.025683552f, -0.0524219871f, 0.00494155288f, -0.00588619709f, -0.0395730883f,
    0.004277125f, 0.00341117382f, -0.0251919478f, 0.00201119483f, 0.00475239754f,
    -0.0134327114f, 0.000645175576f, 0.00309044123f, -0.00579710305f, 0.000151187181f,
    0.00141867995f, -0.00180612504f, 2.67028809e-05f, 0.000504299998f, -0.000186160207f,
    3.60608101e-06f, 0.000144094229f, 0.000245541334f, 3.7252903e-07f, 3.37362289e-05f,
    0.00023779273f, -0.0507602096f, -0.0594617426f, -0.0348197073f, -0.0602422059f,
    -0.0869372338f, -0.0599940121f, -0.0334913582f, -0.0754121095f, -0.0700834692f,
    -0.00422205031f, -0.043090418f, -0.0656160563f, 0.0081346184f, -0.0132719874f,
    -0.0517081469f, 0.00747291744f, 0.00269533694f, -0.0348763317f, 0.00364935398f,
    0.00656555593f, -0.0201491416f, 0.00121369958f, 0.00490511954f, -0.00982579589f,
    0.000295296311f, 0.0024856627f, -0.00387020409f, 5.42700291e-05f, 0.000966235995f,
    -0.00106450915f, 7.65919685e-06f, 0.000301241875f, -4.3168664e-05f, 8.49366188e-07f,
    7.69495964e-05f, 0.000183224678f, -0.0580226928f, -0.0491929203f, -0.0187763274f,
    -0.0703733861f, -0.0754121095f, -0.0333533883f, -0.0411289483f, -0.0711626858f,
    -0.0409595221f, -0.00705617666f, -0.0468667001f, -0.0410718769f, 0.00868475437f,
    -0.0199858993f, -0.0353032053f, 0.00890888274f, -0.00227616727f, -0.0264778584f,
    0.00463452935f, 0.00453907251f, -0.0174140036f, 0.00163254142f, 0.00472407043f,
    -0.0100110024f, 0.000420749187f, 0.00285813212f, -0.00497078896f, 8.200109e-05f,
    0.00127804279f, -0.00207331777f, 1.2293458e-05f, 0.000451594591f, -0.000676557422f,
    1.44541264e-06f, 0.000129774213f, -0.000130400062f, -0.0526388437f, -0.025683552f,
    -0.00183796883f, -0.0658875108f, -0.043090418f, -0.00420466065f, -0.0412417948f,
    -0.0468667001f, -0.0070271045f, -0.00960001349f, -0.0376053602f, -0.00956046581f,
    0.00688621402f, -0.0218836218f, -0.0108894855f, 0.00852522254f, -0.00776490569f,
    -0.0105516464f, 0.00485299528f, 0.000335052609f, -0.00879390538f, 0.00184488297f,
    0.00281776488f, -0.00634679198f, 0.000511318445f, 0.00238265097f, -0.00397768617f,
    0.000107049942f, 0.00130365789f, -0.00216051936f, 1.72406435e-05f, 0.000539675355f,
    -0.00100812316f, 2.16066837e-06f, 0.000177979469f, -0.000395357609f, -0.0397367924f,
    -0.00588619709f, 0.00492119789f, -0.0519220531f, -0.0132719874f, 0.00810110569f,
    -0.0354492217f, -0.0199858993f, 0.00864897668f, -0.0109345317f, -0.0218836218f,
    0.00685784221f, 0.003889516f, -0.0175705254f, 0.00387351215f, 0.00682024658f,
    -0.00995323062f, 0.000992208719f, 0.00438468158f, -0.00325867534f, -0.00094242394f,
    0.00182972848f, 0.000352367759f, -0.00174248219f, 0.000551581383f, 0.0012987107f,
    -0.00169876218f, 0.000125050545f, 0.00100328028f, -0.00125564635f, 2.17556953e-05f,
    0.00051227212f, -0.000763013959f, 2.93552876e-06f, 0.000198796391f, -0.000391870737f,
    -0.0252961516f, 0.00341117382f, 0.00425951183f, -0.0350206196f, 0.00269533694f,
    0.00744213164f, -0.0265873969f, -0.00227616727f, 0.00887218118f, -0.0105952919f,
    -0.00776490569f, 0.0084901005f, 0.000996306539f, -0.00995323062f, 0.00679215789f,
    0.00456823409f, -0.00814759731f, 0.00454942882f, 0.00346563756f, -0.00448162854f,
    0.00246855617f, 0.00161522627f, -0.00138771534f, 0.000963240862f, 0.000534549356f,
    0.000159785151f, 0.000113964081f, 0.000131979585f, 0.000510975718f, -0.000224009156f,
    2.4870038e-05f, 0.000369459391f, -0.000267788768f, 3.62098217e-06f, 0.0001770854f,
    -0.000196635723f, -0.0134882629f, 0.00475239754f, 0.00200290978f, -0.0202324688f,
    0.00656555593f, 0.00363431871f, -0.0174860507f, 0.00453907251f, 0.00461542606f,
    -0.00883029401f, 0.000335052609f, 0.00483301282f, -0.000946328044f, -0.00325867534f,
    0.00436660647f, 0.00247876346f, -0.00448162854f, 0.00345134735f, 0.00239549577f,
    -0.0035534054f, 0.0023856312f, 0.00127319992f, -0.00185360014f, 0.00142551959f,
    0.000466838479f, -0.000540554523f, 0.000715583563f, 0.000126108527f, 5.92619181e-05f,
    0.000280380249f, 2.58386135e-05f, 0.000176668167f, 6.40451908e-05f, 4.08291817e-06f,
    0.000119954348f, -1.60336494e-05f, -0.00582109392f, 0.00309044123f, 0.00064252317f,
    -0.00986643136f, 0.00490511954f, 0.00120869279f, -0.0100524276f, 0.00472407043f,
    0.00162582099f, -0.00637304783f, 0.00281776488f, 0.00183728337f, -0.00174969435f,
    0.000352367759f, 0.0018221885f, 0.000967219472f, -0.00138771534f, 0.00160858035f,
    0.00143140554f, -0.00185360014f, 0.00126795471f, 0.000894144177f, -0.0013884604f,
    0.000890463591f, 0.000367209315f, -0.000681370497f, 0.000553578138f, 0.000109091401f,
    -0.000186726451f, 0.000301018357f, 2.43633986e-05f, 1.92523003e-05f, 0.000139951706f,
    4.17232513e-06f, 5.38825989e-05f, 5.29587269e-05f, -0.00181359053f, 0.00141867995f,
    0.000150576234f, -0.00388622284f, 0.0024856627f, 0.000294074416f, -0.00499133766f,
    0.00285813212f, 0.000419020653f, -0.00399413705f, 0.00238265097f, 0.000509217381f,
    -0.00170579553f, 0.0012987107f, 0.000549301505f, 0.000114426017f, 0.000159785151f,
    0.000532343984f, 0.000718548894f, -0.000540554523f, 0.000464916229f, 0.000555872917f,
    -0.000681370497f, 0.000365704298f, 0.000259503722f, -0.000479742885f, 0.000258430839f,
    8.53389502e-05f, -0.000221192837f, 0.000163435936f, 2.08318233e-05f, -5.69522381e-05f,
    9.19103622e-05f, 3.87430191e-06f, 5.51342964e-06f, 4.54932451e-05f, -0.000186920166f,
    0.000504299998f, 2.65985727e-05f, -0.001068905f, 0.000966235995f, 5.40316105e-05f,
    -0.00208190084f, 0.00127804279f, 8.16732645e-05f, -0.00216946006f, 0.00130365789f,
    0.000106602907f, -0.00126083195f, 0.00100328028f, 0.000124529004f, -0.000224918127f,
    0.000510975718f, 0.000131428242f, 0.000281527638f, 5.92619181e-05f, 0.000125586987f,
    0.000302270055f, -0.000186726451f, 0.000108644366f, 0.000164106488f, -0.000221192837f,
    8.49813223e-05f, 6.02304935e-05f, -0.000146314502f, 5.9992075e-05f, 1.61379576e-05f,
    -6.33746386e-05f, 3.81171703e-05f, 3.2633543e-06f, -1.53332949e-05f, 2.17109919e-05f,
    0.000246554613f, 0.000144094229f, 3.60608101e-06f, -4.33474779e-05f, 0.000301241875f,
    7.62939453e-06f, -0.000679343939f, 0.000451594591f, 1.22487545e-05f, -0.00101229548f,
    0.000539675355f, 1.71810389e-05f, -0.000766173005f, 0.00051227212f, 2.16662884e-05f,
    -0.000268906355f, 0.000369459391f, 2.47657299e-05f, 6.43134117e-05f, 0.000176668167f,
    2.57343054e-05f, 0.000140532851f, 1.92523003e-05f, 2.42590904e-05f, 9.22828913e-05f,
    -5.69522381e-05f, 2.07424164e-05f, 3.82661819e-05f, -6.33746386e-05f, 1.60783529e-05f,
    1.13248825e-05f, -3.9383769e-05f, 1.1280179e-05f, 2.50339508e-06f, -1.60187483e-05f,
    7.13765621e-06f, 0.000238776207f, 3.37362289e-05f, 3.7252903e-07f, 0.000183969736f,
    7.69495964e-05f, 8.34465027e-07f, -0.000130921602f, 0.000129774213f, 1.43051147e-06f,
    -0.000396996737f, 0.000177979469f, 2.16066837e-06f, -0.000393494964f, 0.000198796391f,
    2.92062759e-06f, -0.000197455287f, 0.0001770854f, 3.60608101e-06f, -1.60932541e-05f,
    0.000119954348f, 4.05311584e-06f, 5.31673431e-05f, 5.38825989e-05f, 4.14252281e-06f,
    4.56869602e-05f, 5.51342964e-06f, 3.85940075e-06f, 2.18003988e-05f, -1.53332949e-05f,
    3.24845314e-06f, 7.16745853e-06f, -1.60187483e-05f, 2.48849392e-06f, 1.74343586e-06f,
    -9.35792923e-06f, 1.7285347e-06f
};

/* 4 x 13 x 12 coefficients, even in y, odd in x */
static const float tessary_features_group2_taps[624] = {
    0.0730115175f, 0.0680678189f, 0.0535636395f, 0.0300587118f, 0.100360066f, 0.0974987745f,
    0.0847446471f, 0.0525287986f, 0.0805782974f, 0.0838434845f, 0.0860116482f, 0.0629241318f,
    0.0447867066f, 0.0513024926f, 0.0663729608f, 0.0612372905f, 0.01817514f, 0.0235575736f,
    0.041071251f, 0.0510642976f, 0.00551447272f, 0.00831276178f, 0.0208687931f, 0.0373612493f,
    0.00126683712f, 0.00228284299f, 0.00881786644f, 0.0242897123f, 0.000222027302f,
    0.000491589308f, 0.00312188268f, 0.0141383857f, 2.98321247e-05f, 8.34167004e-05f,
    0.00093062222f, 0.00740405917f, 3.08454037e-06f, 1.11907721e-05f, 0.000234350562f,
    0.00350005925f, 2.38418579e-07f, 1.1920929e-06f, 4.99784946e-05f, 0.00149708986f,
    1.49011612e-08f, 1.04308128e-07f, 9.04500484e-06f, 0.000580430031f, 0.0707651824f,
    0.0634288862f, 0.0451050997f, 0.0226453319f, 0.0972723067f, 0.091463998f, 0.0723668486f,
    0.0398674384f, 0.0780991763f, 0.0795306414f, 0.0751584172f, 0.0483454838f, 0.0434087664f,
    0.0494178906f, 0.0598612279f, 0.0478546843f, 0.017615959f, 0.0231401622f, 0.0385418683f,
    0.0407733396f, 0.0053448081f, 0.00836008787f, 0.0205288753f, 0.0306142792f, 0.00122787058f,
    0.00235956162f, 0.00915458053f, 0.0205098242f, 0.00021520257f, 0.000524103642f,
    0.00344131887f, 0.0123497993f, 2.89082527e-05f, 9.20444727e-05f, 0.00109504908f,
    0.00671456754f, 2.9951334e-06f, 1.28149986e-05f, 0.000295750797f, 0.00330644101f,
    2.38418579e-07f, 1.41561031e-06f, 6.79045916e-05f, 0.00147774071f, 1.49011612e-08f,
    1.2665987e-07f, 1.3269484e-05f, 0.00060030818f, 0.0644324273f, 0.0510966927f, 0.0250971019f,
    0.00706406683f, 0.0885674357f, 0.0752739906f, 0.0426122844f, 0.0130485445f, 0.0711100996f,
    0.0677542314f, 0.0482860059f, 0.0170542002f, 0.039524138f, 0.0440933108f, 0.0429035276f,
    0.0185739994f, 0.0160395056f, 0.0218399391f, 0.031256333f, 0.0176625028f, 0.00486651063f,
    0.00841371715f, 0.0189806968f, 0.0149289146f, 0.00111798942f, 0.00254803896f,
    0.00967673957f, 0.0113053918f, 0.000195935369f, 0.00061006844f, 0.0041571185f,
    0.00770165026f, 2.63303518e-05f, 0.000115856528f, 0.00150833279f, 0.00473115593f,
    2.7269125e-06f, 1.74790621e-05f, 0.000462993979f, 0.00262520462f, 2.23517418e-07f,
    2.10106373e-06f, 0.000120401382f, 0.00131746382f, 1.49011612e-08f, 2.01165676e-07f,
    2.65538692e-05f, 0.000598654151f, 0.0551119745f, 0.0350132585f, 0.00490264595f,
    -0.00474859774f, 0.0757557452f, 0.0537537634f, 0.0114722997f, -0.00768969953f,
    0.0608236939f, 0.0515284017f, 0.0183129385f, -0.00795248896f, 0.0338067859f, 0.0362574309f,
    0.0219845474f, -0.00593248755f, 0.0137193203f, 0.0195902139f, 0.0205792487f,
    -0.00287502259f, 0.00416254997f, 0.00826495886f, 0.0153952017f, -9.41008329e-05f,
    0.000956267118f, 0.00274257362f, 0.00936738402f, 0.00163400918f, 0.00016759336f,
    0.000718444586f, 0.00469410419f, 0.00221477449f, 2.25156546e-05f, 0.000148907304f,
    0.00195460767f, 0.00200009346f, 2.32458115e-06f, 2.44528055e-05f, 0.000680662692f,
    0.0014468655f, 1.78813934e-07f, 3.1888485e-06f, 0.000199168921f, 0.000888414681f,
    1.49011612e-08f, 3.27825546e-07f, 4.9136579e-05f, 0.000475361943f, 0.0442837179f,
    0.019582808f, -0.0071247071f, -0.00788184255f, 0.0608714521f, 0.0324588344f,
    -0.00849670172f, -0.0136235431f, 0.0488732159f, 0.0345490575f, -0.00331711769f,
    -0.0159750506f, 0.0271645188f, 0.0272474289f, 0.0042430833f, -0.0149822757f, 0.0110237896f,
    0.0164668858f, 0.00929721445f, -0.0117435977f, 0.00334469974f, 0.00771696121f,
    0.00997969508f, -0.00774729997f, 0.000768378377f, 0.00282207131f, 0.00761708617f,
    -0.00421135873f, 0.000134661794f, 0.000808939338f, 0.00452470034f, -0.00174368918f,
    1.80900097e-05f, 0.000182405114f, 0.00217102468f, -0.000376388431f, 1.86264515e-06f,
    3.24472785e-05f, 0.00085760653f, 0.000184431672f, 1.49011612e-07f, 4.55975533e-06f,
    0.000282011926f, 0.000297605991f, 1.49011612e-08f, 5.06639481e-07f, 7.77393579e-05f,
    0.000233843923f, 0.0334271044f, 0.00787835568f, -0.0100176185f, -0.00562037528f,
    0.0459481776f, 0.0155189857f, -0.014782384f, -0.00999564677f, 0.0368914306f, 0.019912608f,
    -0.0126072317f, -0.0123033449f, 0.0205048472f, 0.0184874758f, -0.00604902953f,
    -0.0123828873f, 0.00832118094f, 0.0127868205f, 0.000559024513f, -0.0106993094f,
    0.00252470374f, 0.00670777261f, 0.00427006185f, -0.00807569921f, 0.000579997897f,
    0.00270421058f, 0.0047943294f, -0.0053441003f, 0.000101655722f, 0.000845976174f,
    0.00353859365f, -0.00308102369f, 1.36643648e-05f, 0.000206820667f, 0.00199451298f,
    -0.00151781738f, 1.41561031e-06f, 3.97264957e-05f, 0.000902503729f, -0.000608794391f,
    1.1920929e-07f, 6.02006912e-06f, 0.00033544004f, -0.000170432031f, 0.0f, 7.22706318e-07f,
    0.00010368973f, -5.00679016e-06f, 0.0237033665f, 0.000881142914f, -0.0076989457f,
    -0.00264634192f, 0.032582134f, 0.00458259881f, -0.0123716742f, -0.00483576208f,
    0.0261599422f, 0.00930080563f, -0.0125286952f, -0.00622097403f, 0.014540121f, 0.0111208484f,
    -0.00892938673f, -0.00664956123f, 0.00590060651f, 0.00904999673f, -0.00394418836f,
    -0.00619656593f, 0.00179028511f, 0.00535098463f, 4.28855419e-05f, -0.00512525439f,
    0.00041128695f, 0.00237897784f, 0.00194966048f, -0.00378637761f, 7.20769167e-05f,
    0.000811167061f, 0.00211142004f, -0.00249949098f, 9.68575478e-06f, 0.000214725733f,
    0.0014718771f, -0.0014686957f, 9.983778e-07f, 4.44725156e-05f, 0.000780507922f,
    -0.000761598349f, 7.4505806e-08f, 7.24196434e-06f, 0.000331938267f, -0.000342786312f, 0.0f,
    9.31322575e-07f, 0.000115916133f, -0.00012935698f, 0.0157898515f, -0.0021385178f,
    -0.00431931764f, -0.000904120505f, 0.0217043906f, -0.000910758972f, -0.00744430721f,
    -0.00170111656f, 0.0174262822f, 0.00288494676f, -0.00849664956f, -0.00229165703f,
    0.00968579948f, 0.00574707985f, -0.00732949376f, -0.00260134041f, 0.0039306581f,
    0.00575982779f, -0.00471375883f, -0.00260388106f, 0.00119258463f, 0.00387904048f,
    -0.00193048269f, -0.00233582407f, 0.00027397275f, 0.00190674514f, 1.93715096e-06f,
    -0.00188861042f, 4.80115414e-05f, 0.000709101558f, 0.000809073448f, -0.00137806684f,
    6.4522028e-06f, 0.000203296542f, 0.000826179981f, -0.000906437635f, 6.70552254e-07f,
    4.54261899e-05f, 0.000541374087f, -0.000535935163f, 5.96046448e-08f, 7.96467066e-06f,
    0.000269725919f, -0.000283464789f, 0.0f, 1.10268593e-06f, 0.000107757747f, -0.00013307482f,
    0.00988103449f, -0.00266654044f, -0.001906991f, -0.000232718885f, 0.0135822594f,
    -0.00267795473f, -0.00352007896f, -0.000452138484f, 0.010905087f, -0.000199206173f,
    -0.00447012484f, -0.000639803708f, 0.00606122613f, 0.00237968564f, -0.00445789844f,
    -0.000772550702f, 0.00245973468f, 0.00324331969f, -0.00352166593f, -0.000829912722f,
    0.000746309757f, 0.00253527611f, -0.00210776925f, -0.000804044306f, 0.000171452761f,
    0.00138581544f, -0.000808402896f, -0.000705689192f, 3.00556421e-05f, 0.000563502312f,
    5.21540642e-08f, -0.000561654568f, 4.03821468e-06f, 0.000175207853f, 0.000297524035f,
    -0.000405177474f, 4.17232513e-07f, 4.22671437e-05f, 0.000285498798f, -0.000264592469f,
    2.98023224e-08f, 7.97957182e-06f, 0.000175751746f, -0.000156082213f, 0.0f, 1.18464231e-06f,
    8.22618604e-05f, -8.29398632e-05f, 0.00580875576f, -0.0020929575f, -0.000683747232f,
    -4.59998846e-05f, 0.00798459351f, -0.00252641737f, -0.00135440379f, -9.25734639e-05f,
    0.00641077757f, -0.0011831075f, -0.00190573186f, -0.000138014555f, 0.00356321037f,
    0.00061570853f, -0.00215785205f, -0.000177584589f, 0.00144600868f, 0.00157574564f,
    -0.00199148804f, -0.0002046749f, 0.000438734889f, 0.00148186833f, -0.00147128105f,
    -0.000213652849f, 0.000100791454f, 0.000909902155f, -0.000826075673f, -0.000202640891f,
    1.7657876e-05f, 0.000406265259f, -0.000297509134f, -0.000174753368f, 2.36928463e-06f,
    0.00013730675f, 0.0f, -0.000136978924f, 2.38418579e-07f, 3.58149409e-05f, 9.65893269e-05f,
    -9.75206494e-05f, 1.49011612e-08f, 7.28666782e-06f, 8.70749354e-05f, -6.29946589e-05f, 0.0f,
    1.16229057e-06f, 5.03510237e-05f, -3.68654728e-05f, 0.00320790708f, -0.00130598992f,
    -0.000202380121f, -7.06315041e-06f, 0.00440950692f, -0.0017459318f, -0.000431448221f,
    -1.47596002e-05f, 0.00354036689f, -0.00114603341f, -0.000671602786f, -2.3253262e-05f,
    0.00196778774f, -0.000102855265f, -0.000855401158f, -3.19257379e-05f, 0.000798553228f,
    0.000627614558f, -0.000902041793f, -3.9473176e-05f, 0.000242292881f, 0.000766262412f,
    -0.000780433416f, -4.43309546e-05f, 5.56558371e-05f, 0.000537544489f, -0.000541359186f,
    -4.53069806e-05f, 9.76026058e-06f, 0.000265240669f, -0.000285498798f, -4.21702862e-05f,
    1.31130219e-06f, 9.77441669e-05f, -9.65893269e-05f, -3.57329845e-05f, 1.34110451e-07f,
    2.76118517e-05f, 0.0f, -2.7552247e-05f, 1.49011612e-08f, 6.06477261e-06f, 2.76714563e-05f,
    -1.93193555e-05f, 0.0f, 1.04308128e-06f, 2.3432076e-05f, -1.23083591e-05f, 0.00166423619f,
    -0.000691533089f, -4.99337912e-05f, -8.49366188e-07f, 0.00228762627f, -0.000998646021f,
    -0.000114902854f, -1.84774399e-06f, 0.00183671713f, -0.000787883997f, -0.000197738409f,
    -3.07708979e-06f, 0.00102087855f, -0.000272579491f, -0.000281699002f, -4.52250242e-06f,
    0.000414282084f, 0.000175908208f, -0.000335380435f, -5.9902668e-06f, 0.000125691295f,
    0.000344358385f, -0.000331923366f, -7.22706318e-06f, 2.88784504e-05f, 0.000284209847f,
    -0.000269725919f, -7.9497695e-06f, 5.06639481e-06f, 0.000156454742f, -0.000175751746f,
    -7.96467066e-06f, 6.85453415e-07f, 6.313622e-05f, -8.70749354e-05f, -7.27176666e-06f,
    7.4505806e-08f, 1.9364059e-05f, -2.76714563e-05f, -6.04987144e-06f, 0.0f, 4.58955765e-06f,
    0.0f, -4.58210707e-06f, 0.0f, 8.49366188e-07f, 6.99609518e-06f, -3.15904617e-06f,
    0.000811085105f, -0.000319488347f, -1.03339553e-05f, -8.19563866e-08f, 0.00111490488f,
    -0.000493511558f, -2.57343054e-05f, -1.86264515e-07f, 0.000895142555f, -0.000444933772f,
    -4.89428639e-05f, -3.27825546e-07f, 0.000497534871f, -0.000227026641f, -7.76946545e-05f,
    -5.06639481e-07f, 0.000201910734f, 6.37024641e-06f, -0.00010368973f, -7.15255737e-07f,
    6.12586737e-05f, 0.000129841268f, -0.000115916133f, -9.31322575e-07f, 1.40666962e-05f,
    0.000133410096f, -0.000107757747f, -1.09523535e-06f, 2.47359276e-06f, 8.31261277e-05f,
    -8.22618604e-05f, -1.18464231e-06f, 3.27825546e-07f, 3.69474292e-05f, -5.03510237e-05f,
    -1.16229057e-06f, 2.98023224e-08f, 1.23381615e-05f, -2.3432076e-05f, -1.04308128e-06f, 0.0f,
    3.16649675e-06f, -6.99609518e-06f, -8.49366188e-07f, 0.0f, 6.33299351e-07f, 0.0f,
    -6.33299351e-07f
};

/* 4 x 12 x 13 coefficients, odd in y, even in x */
static const float tessary_features_group3_taps[624] = {
    0.0301270187f, 0.0535636395f, 0.0679135025f, 0.0727800727f, 0.0226967856f, 0.0451050997f,
    0.0632850751f, 0.0705408752f, 0.00708012283f, 0.0250971019f, 0.0509808436f, 0.064228192f,
    -0.00475938618f, 0.00490264595f, 0.0349338725f, 0.0549372882f, -0.00789975375f,
    -0.0071247071f, 0.01953841f, 0.0441433489f, -0.00563314557f, -0.0100176185f, 0.00786050409f,
    0.0333211422f, -0.00265236199f, -0.0076989457f, 0.000879146159f, 0.0236282349f,
    -0.000906176865f, -0.00431931764f, -0.00213366747f, 0.0157397985f, -0.000233247876f,
    -0.001906991f, -0.00266049802f, 0.00984971225f, -4.61041927e-05f, -0.000683747232f,
    -0.00208820403f, 0.00579035282f, -7.07805157e-06f, -0.000202380121f, -0.00130302459f,
    0.00319772959f, -8.49366188e-07f, -4.99337912e-05f, -0.000689961016f, 0.00165896118f,
    -8.19563866e-08f, -1.03339553e-05f, -0.00031876564f, 0.000808507204f, 0.0526481569f,
    0.0847446471f, 0.0972777307f, 0.100041926f, 0.03995803f, 0.0723668486f, 0.091256626f,
    0.0969639719f, 0.0130781978f, 0.0426122844f, 0.0751033276f, 0.0882866979f, -0.00770717114f,
    0.0114722997f, 0.0536319017f, 0.075515613f, -0.0136545002f, -0.00849670172f, 0.032385245f,
    0.060678497f, -0.0100183561f, -0.014782384f, 0.015483804f, 0.0458025336f, -0.00484675169f,
    -0.0123716742f, 0.00457220525f, 0.0324788541f, -0.00170497596f, -0.00744430721f,
    -0.000908687711f, 0.021635592f, -0.000453174114f, -0.00352007896f, -0.00267188251f,
    0.01353921f, -9.27746296e-05f, -0.00135440379f, -0.00252068788f, 0.00795929134f,
    -1.47968531e-05f, -0.000431448221f, -0.0017419681f, 0.00439552963f, -1.84774399e-06f,
    -0.000114902854f, -0.000996373594f, 0.0022803694f, -1.86264515e-07f, -2.57343054e-05f,
    -0.00049239397f, 0.0011113584f, 0.0630671233f, 0.0860116482f, 0.0836533904f, 0.0803228766f,
    0.0484553427f, 0.0751584172f, 0.0793503374f, 0.0778516084f, 0.0170929581f, 0.0482860059f,
    0.0676006228f, 0.0708846897f, -0.00797056407f, 0.0183129385f, 0.0514115766f, 0.0606308877f,
    -0.0160113573f, -0.00331711769f, 0.0344707295f, 0.0487182885f, -0.0123313069f,
    -0.0126072317f, 0.0198674574f, 0.0367745012f, -0.00623510778f, -0.0125286952f,
    0.00927971303f, 0.0260770172f, -0.00229686499f, -0.00849664956f, 0.00287840515f,
    0.0173710436f, -0.000641256571f, -0.00447012484f, -0.000198751688f, 0.0108705163f,
    -0.000138327479f, -0.00190573186f, -0.00118042529f, 0.00639045238f, -2.33054161e-05f,
    -0.000671602786f, -0.00114343315f, 0.00352914631f, -3.08454037e-06f, -0.000197738409f,
    -0.000786088407f, 0.00183089077f, -3.27825546e-07f, -4.89428639e-05f, -0.000443920493f,
    0.000892311335f, 0.0613764375f, 0.0663729608f, 0.0511861891f, 0.0446447432f, 0.0479634255f,
    0.0598612279f, 0.0493058488f, 0.0432711691f, 0.0186162069f, 0.0429035276f, 0.0439933315f,
    0.039398849f, -0.00594596565f, 0.0219845474f, 0.0361752287f, 0.0336996168f, -0.0150163174f,
    0.0042430833f, 0.0271856561f, 0.027078405f, -0.0124110281f, -0.00604902953f, 0.0184455588f,
    0.0204398483f, -0.006664671f, -0.00892938673f, 0.0110956356f, 0.0144940317f,
    -0.00260725617f, -0.00732949376f, 0.00573404878f, 0.00965510309f, -0.000774309039f,
    -0.00445789844f, 0.00237429142f, 0.00604200363f, -0.000177979469f, -0.00215785205f,
    0.000614315271f, 0.00355191529f, -3.20002437e-05f, -0.000855401158f, -0.000102624297f,
    0.00196155906f, -4.529953e-06f, -0.000281699002f, -0.000271961093f, 0.001017645f,
    -5.06639481e-07f, -7.76946545e-05f, -0.000226512551f, 0.000495955348f, 0.0511803329f,
    0.041071251f, 0.0235041678f, 0.0181175321f, 0.040865995f, 0.0385418683f, 0.0230876952f,
    0.0175601095f, 0.0177026466f, 0.031256333f, 0.0217904225f, 0.0159886628f, -0.0028815642f,
    0.0205792487f, 0.019545801f, 0.0136758387f, -0.0117702857f, 0.00929721445f, 0.0164295509f,
    0.0109888464f, -0.0107236207f, 0.000559024513f, 0.0127578303f, 0.00829480588f,
    -0.00621064007f, -0.00394418836f, 0.00902947783f, 0.00588190556f, -0.00260979682f,
    -0.00471375883f, 0.00574677438f, 0.00391818583f, -0.000831790268f, -0.00352166593f,
    0.00323596597f, 0.00245194137f, -0.000205136836f, -0.00199148804f, 0.00157217681f,
    0.00144141912f, -3.9562583e-05f, -0.000902041793f, 0.000626184046f, 0.000796034932f,
    -6.00516796e-06f, -0.000335380435f, 0.000175513327f, 0.000412970781f, -7.22706318e-07f,
    -0.00010368973f, 6.36279583e-06f, 0.000201269984f, 0.0374461412f, 0.0208687931f,
    0.00829391181f, 0.00549699366f, 0.0306838378f, 0.0205288753f, 0.00834113359f,
    0.00532786548f, 0.0149628371f, 0.0189806968f, 0.00839463621f, 0.00485108793f,
    -9.43168998e-05f, 0.0153952017f, 0.00824622065f, 0.00414934754f, -0.00776489824f,
    0.00997969508f, 0.00769946724f, 0.00333409011f, -0.00809404254f, 0.00427006185f,
    0.00669256598f, 0.00251670182f, -0.00513689965f, 4.28855419e-05f, 0.00533884764f,
    0.00178460777f, -0.00234112889f, -0.00193048269f, 0.00387025625f, 0.00118881464f,
    -0.000805877149f, -0.00210776925f, 0.00252953172f, 0.000743940473f, -0.000214144588f,
    -0.00147128105f, 0.00147850066f, 0.00043733418f, -4.44278121e-05f, -0.000780433416f,
    0.000764518976f, 0.000241518021f, -7.24196434e-06f, -0.000331923366f, 0.000343576074f,
    0.000125303864f, -9.31322575e-07f, -0.000115916133f, 0.000129550695f, 6.10649586e-05f,
    0.0243449062f, 0.00881786644f, 0.00227767229f, 0.00126282871f, 0.0205564275f,
    0.00915458053f, 0.00235421211f, 0.00122396648f, 0.0113310814f, 0.00967673957f,
    0.00254225731f, 0.00111444294f, 0.00163771957f, 0.00936738402f, 0.00273635238f,
    0.000953227282f, -0.00422093272f, 0.00761708617f, 0.00281567872f, 0.000765949488f,
    -0.00535624474f, 0.0047943294f, 0.0026980862f, 0.000578165054f, -0.00379498303f,
    0.00194966048f, 0.00237358361f, 0.000409975648f, -0.00189290196f, 1.93715096e-06f,
    0.0019024238f, 0.000273108482f, -0.000707298517f, -0.000808402896f, 0.0013826713f,
    0.000170901418f, -0.000203102827f, -0.000826075673f, 0.000907838345f, 0.000100463629f,
    -4.54112887e-05f, -0.000541359186f, 0.000536322594f, 5.54919243e-05f, -7.96467066e-06f,
    -0.000269725919f, 0.000283569098f, 2.87890434e-05f, -1.10268593e-06f, -0.000107757747f,
    0.000133104622f, 1.40219927e-05f, 0.0141705126f, 0.00312188268f, 0.000490471721f,
    0.000221326947f, 0.0123778656f, 0.00344131887f, 0.000522918999f, 0.000214517117f,
    0.00771915168f, 0.0041571185f, 0.000608690083f, 0.000195324421f, 0.00221980363f,
    0.00469410419f, 0.000716812909f, 0.000167071819f, -0.00174765289f, 0.00452470034f,
    0.000807106495f, 0.000134244561f, -0.00308801979f, 0.00353859365f, 0.000844053924f,
    0.000101327896f, -0.00250517577f, 0.00211142004f, 0.000809334219f, 7.18533993e-05f,
    -0.00138119608f, 0.000809073448f, 0.000707492232f, 4.78625298e-05f, -0.000562936068f,
    5.21540642e-08f, 0.000562220812f, 2.9951334e-05f, -0.000175148249f, -0.000297509134f,
    0.000405341387f, 1.76131725e-05f, -4.22671437e-05f, -0.000285498798f, 0.000264637172f,
    9.73045826e-06f, -7.97957182e-06f, -0.000175751746f, 0.000156097114f, 5.05149364e-06f,
    -1.18464231e-06f, -8.22618604e-05f, 8.29398632e-05f, 2.4586916e-06f, 0.00742088258f,
    0.00093062222f, 8.32229853e-05f, 2.97427177e-05f, 0.00672982633f, 0.00109504908f,
    9.18358564e-05f, 2.88188457e-05f, 0.00474190712f, 0.00150833279f, 0.000115595758f,
    2.62409449e-05f, 0.00200463831f, 0.00195460767f, 0.000148564577f, 2.24411488e-05f,
    -0.000377245247f, 0.00217102468f, 0.000181995332f, 1.8030405e-05f, -0.001521267f,
    0.00199451298f, 0.000206358731f, 1.36196613e-05f, -0.00147203356f, 0.0014718771f,
    0.000214233994f, 9.65595245e-06f, -0.000908501446f, 0.000826179981f, 0.000202834606f,
    6.43730164e-06f, -0.000406101346f, 0.000297524035f, 0.000174812973f, 4.02331352e-06f,
    -0.000137291849f, 0.0f, 0.000136993825f, 2.36928463e-06f, -3.58149409e-05f,
    -9.65893269e-05f, 9.75206494e-05f, 1.31130219e-06f, -7.28666782e-06f, -8.70749354e-05f,
    6.29946589e-05f, 6.70552254e-07f, -1.16229057e-06f, -5.03510237e-05f, 3.68654728e-05f,
    3.27825546e-07f, 0.00350801647f, 0.000234350562f, 1.11609697e-05f, 3.06963921e-06f,
    0.00331395119f, 0.000295750797f, 1.27851963e-05f, 2.98023224e-06f, 0.00263116509f,
    0.000462993979f, 1.74418092e-05f, 2.71201134e-06f, 0.00145015121f, 0.000680662692f,
    2.44006515e-05f, 2.32458115e-06f, 0.000184856355f, 0.00085760653f, 3.23727727e-05f,
    1.86264515e-06f, -0.000610180199f, 0.000902503729f, 3.96370888e-05f, 1.40070915e-06f,
    -0.000763326883f, 0.000780507922f, 4.4375658e-05f, 9.983778e-07f, -0.000537157059f,
    0.000541374087f, 4.53218818e-05f, 6.70552254e-07f, -0.000265195966f, 0.000285498798f,
    4.21702862e-05f, 4.17232513e-07f, -9.77441669e-05f, 9.65893269e-05f, 3.57329845e-05f,
    2.38418579e-07f, -2.76118517e-05f, 0.0f, 2.7552247e-05f, 1.34110451e-07f, -6.06477261e-06f,
    -2.76714563e-05f, 1.93193555e-05f, 7.4505806e-08f, -1.04308128e-06f, -2.3432076e-05f,
    1.23083591e-05f, 2.98023224e-08f, 0.00150048733f, 4.99784946e-05f, 1.1920929e-06f,
    2.38418579e-07f, 0.00148110092f, 6.79045916e-05f, 1.41561031e-06f, 2.38418579e-07f,
    0.0013204515f, 0.000120401382f, 2.10106373e-06f, 2.23517418e-07f, 0.000890433788f,
    0.000199168921f, 3.18139791e-06f, 1.78813934e-07f, 0.000298283994f, 0.000282011926f,
    4.55230474e-06f, 1.49011612e-07f, -0.000170826912f, 0.00033544004f, 6.00516796e-06f,
    1.1920929e-07f, -0.000343568623f, 0.000331938267f, 7.22706318e-06f, 7.4505806e-08f,
    -0.000284105539f, 0.000269725919f, 7.9497695e-06f, 5.96046448e-08f, -0.000156439841f,
    0.000175751746f, 7.96467066e-06f, 2.98023224e-08f, -6.313622e-05f, 8.70749354e-05f,
    7.27176666e-06f, 1.49011612e-08f, -1.9364059e-05f, 2.76714563e-05f, 6.04987144e-06f,
    1.49011612e-08f, -4.58955765e-06f, 0.0f, 4.58210707e-06f, 0.0f, -8.49366188e-07f,
    -6.99609518e-06f, 3.15904617e-06f, 0.0f, 0.000581741333f, 9.04500484e-06f, 1.04308128e-07f,
    1.49011612e-08f, 0.000601671636f, 1.3269484e-05f, 1.2665987e-07f, 1.49011612e-08f,
    0.000600010157f, 2.65538692e-05f, 2.01165676e-07f, 1.49011612e-08f, 0.000476449728f,
    4.9136579e-05f, 3.27825546e-07f, 1.49011612e-08f, 0.000234372914f, 7.77393579e-05f,
    5.06639481e-07f, 1.49011612e-08f, -5.01424074e-06f, 0.00010368973f, 7.15255737e-07f, 0.0f,
    -0.000129647553f, 0.000115916133f, 9.31322575e-07f, 0.0f, -0.000133380294f, 0.000107757747f,
    1.09523535e-06f, 0.0f, -8.31261277e-05f, 8.22618604e-05f, 1.18464231e-06f, 0.0f,
    -3.69474292e-05f, 5.03510237e-05f, 1.16229057e-06f, 0.0f, -1.23381615e-05f, 2.3432076e-05f,
    1.04308128e-06f, 0.0f, -3.16649675e-06f, 6.99609518e-06f, 8.49366188e-07f, 0.0f,
    -6.33299351e-07f, 0.0f, 6.33299351e-07f, 0.0f
};

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
};

#if !defined(__GNUC__) || tessary_features_MAX_LANES < 4
#define tessary_features_LANES 1
#else
#define tessary_features_LANES 4
#endif
#define tessary_features_FN(x) tessary_features_##x##_base
#define tessary_features_TARGET
#include "tessary_features.c"
static const struct tessary_features_code_of tessary_features_base = {tessary_features_responses_base, {tessary_features_edges0_base}};
#undef tessary_features_LANES
#undef tessary_features_FN
#undef tessary_features_TARGET

#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 8
#define tessary_features_LANES 8
#define tessary_features_FN(x) tessary_features_##x##_avx2
#define tessary_features_TARGET __attribute__((target("avx2,fma")))
#include "tessary_features.c"
static const struct tessary_features_code_of tessary_features_avx2 = {tessary_features_responses_avx2, {tessary_features_edges0_avx2}};
#undef tessary_features_LANES
#undef tessary_features_FN
#undef tessary_features_TARGET
#endif

#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 16
#define tessary_features_LANES 16
#define tessary_features_FN(x) tessary_features_##x##_avx512
#define tessary_features_TARGET __attribute__((target("avx512f,avx512vl,avx512bw,avx512dq,avx2,fma")))
#include "tessary_features.c"
static const struct tessary_features_code_of tessary_features_avx512 = {tessary_features_responses_avx512, {tessary_features_edges0_avx512}};
#undef tessary_features_LANES
#undef tessary_features_FN
#undef tessary_features_TARGET
#endif

static const struct tessary_features_code_of *tessary_features_choose(void)
{
#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 8
    __builtin_cpu_init(); /* does nothing where the compiler's start-up code has done it */
#endif
#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 16
    if (__builtin_cpu_supports("avx512f") && __builtin_cpu_supports("avx512vl") &&
        __builtin_cpu_supports("avx512bw") && __builtin_cpu_supports("avx512dq"))
        return &tessary_features_avx512;
#endif
#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 8
    if (__builtin_cpu_supports("avx2") && __builtin_cpu_supports("fma")) return &tessary_features_avx2;
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
    int scale; /* -1: responses */
    char *out; /* planes, or strength */
    ptrdiff_t row_bytes, plane_bytes;
    unsigned char *orientation;
    ptrdiff_t orientation_row_bytes;
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
static int tessary_features_overlap(ptrdiff_t row, ptrdiff_t plane, ptrdiff_t bytes, int rows)
{
    row = tessary_features_reach(row);
    plane = tessary_features_reach(plane);
    if (tessary_features_KERNEL_COUNT == 1) return 0;
    if (plane < bytes) return 1;
    if ((plane - bytes) / row >= rows - 1) return 0;
    return (row - bytes) / plane < tessary_features_KERNEL_COUNT - 1;
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
    case tessary_features_OUTPUT_MISALIGNED: return "out, out_row_bytes or out_plane_bytes is not a multiple of 4";
    case tessary_features_BAD_OUTPUT_ROW_BYTES: return "out_row_bytes is smaller than a row of floats";
    case tessary_features_BAD_OUTPUT_PLANE_BYTES: return "out_plane_bytes makes the planes overlap";
    case tessary_features_NO_STRENGTH: return "strength is NULL";
    case tessary_features_STRENGTH_MISALIGNED: return "strength or strength_row_bytes is not a multiple of 4";
    case tessary_features_BAD_STRENGTH_ROW_BYTES: return "strength_row_bytes is smaller than a row of floats";
    case tessary_features_NO_ORIENTATION: return "orientation is NULL";
    case tessary_features_BAD_ORIENTATION_ROW_BYTES: return "orientation_row_bytes is smaller than a row";
    case tessary_features_NO_SCRATCH: return "scratch is NULL";
    case tessary_features_BAD_PIXEL: return "a pixel code is beyond the pixel format; the output is not to be used";
    default: return "unknown code";
    }
}

size_t tessary_features_scratch_bytes(int width, int height)
{
    if (width < tessary_features_SIZE || width > tessary_features_LONGEST) return 0;
    if (height < tessary_features_SIZE || height > tessary_features_LONGEST) return 0;
    return (tessary_features_SIZE * tessary_features_ring_width(width) + tessary_features_SCRATCH) * sizeof(float) + 64;
}

int tessary_features_responses_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count,
    float *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, void *scratch)
{
    struct tessary_features_picture p;
    struct tessary_features_job job;
    int code;
    p.pixels = (const unsigned char *)image;
    p.row_bytes = row_bytes;
    p.width = width;
    p.height = height;
    code = tessary_features_check_picture(&p, first_row, row_count);
    if (code != tessary_features_OK) return code;
    if (out == NULL) return tessary_features_NO_OUTPUT;
    if ((uintptr_t)out % 4u != 0 || out_row_bytes % 4 != 0 || out_plane_bytes % 4 != 0)
        return tessary_features_OUTPUT_MISALIGNED;
    if (tessary_features_reach(out_row_bytes) < (ptrdiff_t)width * 4) return tessary_features_BAD_OUTPUT_ROW_BYTES;
    if (tessary_features_overlap(out_row_bytes, out_plane_bytes, (ptrdiff_t)width * 4, row_count))
        return tessary_features_BAD_OUTPUT_PLANE_BYTES;
    if (scratch == NULL) return tessary_features_NO_SCRATCH;
    job.scale = -1;
    job.out = (char *)out;
    job.row_bytes = out_row_bytes;
    job.plane_bytes = out_plane_bytes;
    job.orientation = NULL;
    job.orientation_row_bytes = 0;
    /* judged by the whole picture: bands of one picture are usually made side by side */
    job.stream = 4.0 * tessary_features_KERNEL_COUNT * width * height >= tessary_features_STREAM_FROM;
    return tessary_features_walk(&p, &job, first_row, row_count, scratch);
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
    int code;
    p.pixels = (const unsigned char *)image;
    p.row_bytes = row_bytes;
    p.width = width;
    p.height = height;
    code = tessary_features_check_picture(&p, first_row, row_count);
    if (code != tessary_features_OK) return code;
    if (scale < 0 || scale >= tessary_features_SCALE_COUNT) return tessary_features_BAD_SCALE;
    if (strength == NULL) return tessary_features_NO_STRENGTH;
    if ((uintptr_t)strength % 4u != 0 || strength_row_bytes % 4 != 0)
        return tessary_features_STRENGTH_MISALIGNED;
    if (tessary_features_reach(strength_row_bytes) < (ptrdiff_t)width * 4) return tessary_features_BAD_STRENGTH_ROW_BYTES;
    if (orientation == NULL) return tessary_features_NO_ORIENTATION;
    if (tessary_features_reach(orientation_row_bytes) < width) return tessary_features_BAD_ORIENTATION_ROW_BYTES;
    if (scratch == NULL) return tessary_features_NO_SCRATCH;
    job.scale = scale;
    job.out = (char *)strength;
    job.row_bytes = strength_row_bytes;
    job.plane_bytes = 0;
    job.orientation = orientation;
    job.orientation_row_bytes = orientation_row_bytes;
    job.stream = 0;
    return tessary_features_walk(&p, &job, first_row, row_count, scratch);
}

int tessary_features_edges(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch)
{
    return tessary_features_edges_rows(image, row_bytes, width, height, 0, height, scale,
        strength, strength_row_bytes, orientation, orientation_row_bytes, scratch);
}

#endif
