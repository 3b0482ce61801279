/* tessary_features: a convolution bank, 16 kernels of 25 x 25 taps.
 *
 * The content of this folder is its maker's own. The parts that come from patchlab's
 * templates are granted to everyone for any use, without conditions or attribution.
 *
 * What it computes
 *   Every pixel goes through the bank's input table (Mono8 codes to working
 *   values), then every kernel is correlated with the working values, without
 *   flipping: r(y, x) = sum k(j, i) p(y + j - 12, x + i - 12).
 *   Border: mirror101. Outside, the picture is mirrored about its outermost pixels.
 *   Strength: the largest sqrt(even^2 + odd^2) over the orientations.
 *
 * CAUTION
 *   Edges that steer machines or gauge safety parts need a check of their own.
 *   The promised rate of false edges holds for the camera and the exposure that
 *   the bank was made for; this code cannot tell when either has changed.
 *
 * Rules of the interface
 *   No allocation, no state, no locale; safe to call from any number of threads,
 *   each with its own scratch memory. Strides are in bytes and may be negative; a
 *   picture with negative row_bytes is passed by the address of its first row.
 *   The picture and the outputs must not overlap. A result is the same, bit for
 *   bit, for every split into bands. It stays within the bank's error bound with
 *   or without fused multiply-adds; other processors may differ in the last bits.
 *   Do not compile with -ffast-math.
 */
#ifndef tessary_features_H
#define tessary_features_H

#include <stddef.h>
#include <stdint.h>

#if defined(_WIN32) && defined(tessary_features_BUILD_LIBRARY)
#define tessary_features_API __declspec(dllexport)
#elif defined(__GNUC__)
#define tessary_features_API __attribute__((visibility("default")))
#else
#define tessary_features_API
#endif

#ifdef __cplusplus
extern "C" {
#endif

/* Compare with tessary_features_abi(): they differ when library and header do not belong together. */
#define tessary_features_ABI 144357961

#define tessary_features_KERNEL_COUNT 16
#define tessary_features_KERNEL_SIZE 25
#define tessary_features_SCALE_COUNT 1

/* Pixels: Mono8. */
typedef uint8_t tessary_features_pixel;

/* Strength thresholds for a promised number of false edge elements a megapixel,
 * found on pure noise through the whole chain (thinning and hysteresis included).
 * Use them as initialisers: static const float t[] = tessary_features_STRENGTH_THRESHOLDS; */
#define tessary_features_THRESHOLD_COUNT 5
#define tessary_features_FALSE_EDGES_PER_MEGAPIXEL {0.100000001f, 1.0f, 10.0f, 100.0f, 1000.0f}
#define tessary_features_STRENGTH_THRESHOLDS {6.20793295f, 5.81003618f, 5.37952852f, 4.90630722f, 4.37342644f}
#define tessary_features_HYSTERESIS 0.699999988f
#define tessary_features_FALSE_GROUPS_PER_MEGAPIXEL {0.00898534991f, 0.0857046694f, 0.814312935f, 7.6979351f, 72.2568283f}

/* What every function that returns int may return; tessary_features_message() says it in words. */
enum tessary_features_code {
    tessary_features_OK = 0,
    tessary_features_NO_IMAGE = 1,
    tessary_features_BAD_WIDTH = 2,
    tessary_features_BAD_HEIGHT = 3,
    tessary_features_IMAGE_MISALIGNED = 4,
    tessary_features_BAD_ROW_BYTES = 5,
    tessary_features_BAD_ROWS = 6,
    tessary_features_BAD_SCALE = 7,
    tessary_features_NO_OUTPUT = 8,
    tessary_features_OUTPUT_MISALIGNED = 9,
    tessary_features_BAD_OUTPUT_ROW_BYTES = 10,
    tessary_features_BAD_OUTPUT_PLANE_BYTES = 11,
    tessary_features_NO_STRENGTH = 12,
    tessary_features_STRENGTH_MISALIGNED = 13,
    tessary_features_BAD_STRENGTH_ROW_BYTES = 14,
    tessary_features_NO_ORIENTATION = 15,
    tessary_features_BAD_ORIENTATION_ROW_BYTES = 16,
    tessary_features_NO_SCRATCH = 17,
    tessary_features_BAD_PIXEL = 18,
    tessary_features_NO_COUNT = 19,
    tessary_features_BAD_THRESHOLD = 20,
    tessary_features_NO_EDGELS = 21,
    tessary_features_EDGELS_MISALIGNED = 22,
    tessary_features_TOO_MANY = 23,
    tessary_features_TOO_LARGE = 24,
    tessary_features_BAD_STRENGTH_PLANE_BYTES = 25,
    tessary_features_BAD_ORIENTATION_PLANE_BYTES = 26
};

/* ---- about the bank */

tessary_features_API int tessary_features_abi(void);
tessary_features_API int tessary_features_kernel_count(void);

/* Name of a kernel, or NULL when there is no such kernel. The kernels, in order:
 *   0  step_s0_o0
 *   1  step_s0_o1
 *   2  step_s0_o2
 *   3  step_s0_o3
 *   4  step_s0_o4
 *   5  step_s0_o5
 *   6  step_s0_o6
 *   7  step_s0_o7
 *   8  line_s0_o0
 *   9  line_s0_o1
 *   10  line_s0_o2
 *   11  line_s0_o3
 *   12  line_s0_o4
 *   13  line_s0_o5
 *   14  line_s0_o6
 *   15  line_s0_o7 */
tessary_features_API const char *tessary_features_kernel_name(int index);

tessary_features_API int tessary_features_scale_count(void);

/* A code in words; never NULL. */
tessary_features_API const char *tessary_features_message(int code);

/* ---- responses */

/* Bytes of scratch memory that a call on a picture of this size needs; 0 when no
 * call would accept the size. Any alignment will do; nothing is kept in it. */
tessary_features_API size_t tessary_features_scratch_bytes(int width, int height);

/* Responses of every kernel on the whole picture.
 *   image            first pixel of the first row
 *   row_bytes        from one row of the picture to the next
 *   width, height    pixels, each at least 25
 *   out              kernel k, row y, column x goes to
 *                    out + k * out_plane_bytes + y * out_row_bytes + 4 * x (in bytes)
 *   scratch          tessary_features_scratch_bytes(width, height) bytes
 * Returns 0, or a code. */
tessary_features_API int tessary_features_responses(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    float *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, void *scratch);

/* The same for rows first_row .. first_row + row_count - 1 alone, for callers with threads.
 * image, width and height still describe the whole picture (the rows above and below are
 * read too); out is where row first_row goes. */
tessary_features_API int tessary_features_responses_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count,
    float *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, void *scratch);

/* ---- edges */

/* Strength of one scale (0 the finest) and the index of the winning orientation; among
 * equals the first wins. Nothing else is written. Returns 0, or a code. */
tessary_features_API int tessary_features_edges(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch);

/* The same for some rows alone; strength and orientation are where row first_row goes. */
tessary_features_API int tessary_features_edges_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch);

/* Strengths and orientations of all scales in one pass over the picture, the bits of tessary_features_edges: scale s
 * goes to strength + s * strength_plane_bytes and orientation + s * orientation_plane_bytes (in bytes).
 * Returns 0, or a code. */
tessary_features_API int tessary_features_edges_all(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    float *strength, ptrdiff_t strength_row_bytes, ptrdiff_t strength_plane_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, ptrdiff_t orientation_plane_bytes,
    void *scratch);

/* The same for some rows alone; strength and orientation are where row first_row goes. */
tessary_features_API int tessary_features_edges_all_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count,
    float *strength, ptrdiff_t strength_row_bytes, ptrdiff_t strength_plane_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, ptrdiff_t orientation_plane_bytes,
    void *scratch);

/* As tessary_features_edges, for callers who want what reaches a threshold. At every pixel whose strength is at
 * least the threshold, and at its eight neighbours, strength and orientation are those of
 * tessary_features_edges, bit for bit; so thinning with that threshold gives the same edges. Elsewhere they are the
 * same or both 0: stretches that are provably too flat are not computed. *skipped, where it is not
 * NULL, becomes the number of such pixels. Returns 0, or a code. */
tessary_features_API int tessary_features_edges_above(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int scale, float threshold, float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, uint64_t *skipped, void *scratch);

/* The same for some rows alone; strength and orientation are where row first_row goes. */
tessary_features_API int tessary_features_edges_above_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale, float threshold,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, uint64_t *skipped, void *scratch);

/* ---- fixed point
 *
 * The same bank in 16-bit integers: faster, and the same bits on every processor. A response
 * is a count; count * tessary_features_q_step(kernel) is its value. What is exact, what is rounded (halves
 * upwards, once, at the end) and how far that is from the exact response is stated in the
 * bank's manifest. No input can make a sum overflow. */

/* Value of one count of a kernel; 0 when there is no such kernel. */
tessary_features_API float tessary_features_q_step(int index);

/* As tessary_features_responses, in counts: kernel k, row y, column x goes to
 * out + k * out_plane_bytes + y * out_row_bytes + 2 * x (in bytes). *saturated (unless
 * NULL) becomes the number of counts at the ends of the range, -32767 or 32767;
 * for this bank no input can reach them. */
tessary_features_API int tessary_features_responses_q(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int16_t *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, uint64_t *saturated,
    void *scratch);
tessary_features_API int tessary_features_responses_q_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width,
    int height, int first_row, int row_count, int16_t *out, ptrdiff_t out_row_bytes,
    ptrdiff_t out_plane_bytes, uint64_t *saturated, void *scratch);

/* As tessary_features_edges, from counts; strength is in the units of tessary_features_edges. */
tessary_features_API int tessary_features_edges_q(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int scale, float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch);
tessary_features_API int tessary_features_edges_q_rows(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale, float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch);

/* ---- edge elements */

/* An edge element, placed below the pixel by least squares of a blurred edge run through the
 * input table. */
struct tessary_features_edgel {
    float x, y; /* pixels; the centre of the first pixel is 0, 0 */
    float theta; /* normal, radians from +x towards +y, towards the brighter side for a step */
    float strength; /* of the response that found it */
    float sd; /* standard error of the position along the normal, pixels */
    float width; /* of a line, pixels, blur taken out; 0 for a step */
    unsigned char scale; /* that found it, 0 the finest */
    unsigned char kind; /* tessary_features_STEP, tessary_features_BRIGHT_LINE or tessary_features_DARK_LINE */
    unsigned char unused[2]; /* 0 */
};

#define tessary_features_STEP 0
#define tessary_features_BRIGHT_LINE 1
#define tessary_features_DARK_LINE 2

/* Bytes of scratch memory that tessary_features_edgels needs on a picture of this size (about 11 bytes a
 * pixel); 0 when no call would accept the size. Any alignment will do; nothing is kept in it. */
tessary_features_API size_t tessary_features_edgels_scratch_bytes(int width, int height);

/* Edge elements of the whole picture: strength, thinning along the normal, hysteresis, the finest
 * scale first, and the sub-pixel place of each.
 *   threshold        strength at which an element stands by itself: one of
 *                    tessary_features_STRENGTH_THRESHOLDS, or any other.
 *                    Neighbours of tessary_features_HYSTERESIS_RATIO times that hang on.
 *   line_threshold   0, as this bank looks for one kind of edges only
 *   out, capacity    room for that many elements; NULL with 0 to count them only
 *   count            how many there are, which may be more than capacity; 0 after a refusal
 *   scratch          tessary_features_edgels_scratch_bytes(width, height) bytes
 * They come row by row. Returns 0; tessary_features_TOO_MANY when there was not room for all: those of the
 * first rows stand in out; or another code. */
#define tessary_features_HYSTERESIS_RATIO 0.69999999999999996
tessary_features_API int tessary_features_edgels(const tessary_features_pixel *image, ptrdiff_t row_bytes, int width, int height,
    double threshold, double line_threshold,
    struct tessary_features_edgel *out, size_t capacity, size_t *count, void *scratch);

#ifdef __cplusplus
}
#endif

#endif
