/* tessary_features: the code of the bank; tessary_features.h describes it.
 *
 * The content of this folder is its maker's own. The parts that come from patchlab's
 * templates are granted to everyone for any use, without conditions or attribution.
 *
 * How it works: the picture is walked from top to bottom, once. A ring holds the
 * working values of the last 25 rows. For every stretch of tessary_features_CHUNK output pixels
 * the rows of the ring are folded (added and subtracted about the middle row) and
 * dotted with the plan's coefficients; a kernel's response is a signed sum of such
 * products. Kernels by tile transforms, where the plan has any, take blocks of rows instead.
 * The plan: parity, 2525 multiplies a pixel.
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
};

#if !defined(__GNUC__) || tessary_features_MAX_LANES < 4
#define tessary_features_LANES 1
#else
#define tessary_features_LANES 4
#endif
#define tessary_features_FN(x) tessary_features_##x##_base
#define tessary_features_TARGET
#include "tessary_features.c"
static const struct tessary_features_code_of tessary_features_base = {tessary_features_responses_base, {tessary_features_edges0_base}, NULL};
#undef tessary_features_LANES
#undef tessary_features_FN
#undef tessary_features_TARGET

#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 8
#define tessary_features_LANES 8
#define tessary_features_FN(x) tessary_features_##x##_avx2
#define tessary_features_TARGET __attribute__((target("avx2,fma")))
#include "tessary_features.c"
static const struct tessary_features_code_of tessary_features_avx2 = {tessary_features_responses_avx2, {tessary_features_edges0_avx2}, NULL};
#undef tessary_features_LANES
#undef tessary_features_FN
#undef tessary_features_TARGET
#endif

#if defined(__GNUC__) && defined(__x86_64__) && tessary_features_MAX_LANES >= 16
#define tessary_features_LANES 16
#define tessary_features_FN(x) tessary_features_##x##_avx512
#define tessary_features_TARGET __attribute__((target("avx512f,avx512vl,avx512bw,avx512dq,avx2,fma")))
#include "tessary_features.c"
static const struct tessary_features_code_of tessary_features_avx512 = {tessary_features_responses_avx512, {tessary_features_edges0_avx512}, NULL};
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
    if (tessary_features_overlap(out_row_bytes, out_plane_bytes, (ptrdiff_t)width * bytes, count))
        return tessary_features_BAD_OUTPUT_PLANE_BYTES;
    if (scratch == NULL) return tessary_features_NO_SCRATCH;
    job->scale = -1;
    job->out = out;
    job->row_bytes = out_row_bytes;
    job->plane_bytes = out_plane_bytes;
    job->orientation = NULL;
    job->orientation_row_bytes = 0;
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
    job->stream = 0;
    return tessary_features_OK;
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
    code = tessary_features_walk(&p, &job, first_row, row_count, scratch);
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

#endif
