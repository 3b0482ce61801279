/* tessary_edges: a convolution bank, 16 kernels of 21 x 21 taps.
 *
 * The content of this folder is its maker's own. The parts that come from patchlab's
 * templates are granted to everyone for any use, without conditions or attribution.
 *
 * What it computes
 *   Every pixel goes through the bank's input table (Mono8 codes to working
 *   values), then every kernel is correlated with the working values, without
 *   flipping: r(y, x) = sum k(j, i) p(y + j - 10, x + i - 10).
 *   Border: mirror101. Outside, the picture is mirrored about its outermost pixels.
 *   Strength: the largest absolute odd response over the orientations.
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
#ifndef tessary_edges_H
#define tessary_edges_H

#include <stddef.h>
#include <stdint.h>

#if defined(_WIN32) && defined(tessary_edges_BUILD_LIBRARY)
#define tessary_edges_API __declspec(dllexport)
#elif defined(__GNUC__)
#define tessary_edges_API __attribute__((visibility("default")))
#else
#define tessary_edges_API
#endif

#ifdef __cplusplus
extern "C" {
#endif

/* Compare with tessary_edges_abi(): they differ when library and header do not belong together. */
#define tessary_edges_ABI 195594573

#define tessary_edges_KERNEL_COUNT 16
#define tessary_edges_KERNEL_SIZE 21
#define tessary_edges_SCALE_COUNT 2

/* Pixels: Mono8. */
typedef uint8_t tessary_edges_pixel;

/* Strength thresholds for a promised number of false edge elements a megapixel,
 * found on pure noise through the whole chain (thinning and hysteresis included).
 * Use them as initialisers: static const float t[] = tessary_edges_STRENGTH_THRESHOLDS; */
#define tessary_edges_THRESHOLD_COUNT 5
#define tessary_edges_FALSE_EDGES_PER_MEGAPIXEL {0.100000001f, 1.0f, 10.0f, 100.0f, 1000.0f}
#define tessary_edges_STRENGTH_THRESHOLDS {6.01863003f, 5.6187048f, 5.18694735f, 4.71401691f, 4.1847291f}
#define tessary_edges_HYSTERESIS 0.699999988f
#define tessary_edges_FALSE_GROUPS_PER_MEGAPIXEL {0.0194079932f, 0.180935889f, 1.67743099f, 15.439353f, 140.708954f}

/* What every function that returns int may return; tessary_edges_message() says it in words. */
enum tessary_edges_code {
    tessary_edges_OK = 0,
    tessary_edges_NO_IMAGE = 1,
    tessary_edges_BAD_WIDTH = 2,
    tessary_edges_BAD_HEIGHT = 3,
    tessary_edges_IMAGE_MISALIGNED = 4,
    tessary_edges_BAD_ROW_BYTES = 5,
    tessary_edges_BAD_ROWS = 6,
    tessary_edges_BAD_SCALE = 7,
    tessary_edges_NO_OUTPUT = 8,
    tessary_edges_OUTPUT_MISALIGNED = 9,
    tessary_edges_BAD_OUTPUT_ROW_BYTES = 10,
    tessary_edges_BAD_OUTPUT_PLANE_BYTES = 11,
    tessary_edges_NO_STRENGTH = 12,
    tessary_edges_STRENGTH_MISALIGNED = 13,
    tessary_edges_BAD_STRENGTH_ROW_BYTES = 14,
    tessary_edges_NO_ORIENTATION = 15,
    tessary_edges_BAD_ORIENTATION_ROW_BYTES = 16,
    tessary_edges_NO_SCRATCH = 17,
    tessary_edges_BAD_PIXEL = 18,
    tessary_edges_NO_COUNT = 19,
    tessary_edges_BAD_THRESHOLD = 20,
    tessary_edges_NO_EDGELS = 21,
    tessary_edges_EDGELS_MISALIGNED = 22,
    tessary_edges_TOO_MANY = 23,
    tessary_edges_TOO_LARGE = 24,
    tessary_edges_BAD_STRENGTH_PLANE_BYTES = 25,
    tessary_edges_BAD_ORIENTATION_PLANE_BYTES = 26
};

/* ---- about the bank */

tessary_edges_API int tessary_edges_abi(void);
tessary_edges_API int tessary_edges_kernel_count(void);

/* Name of a kernel, or NULL when there is no such kernel. The kernels, in order:
 *   0  step_s0_o0
 *   1  step_s0_o1
 *   2  step_s0_o2
 *   3  step_s0_o3
 *   4  step_s0_o4
 *   5  step_s0_o5
 *   6  step_s0_o6
 *   7  step_s0_o7
 *   8  step_s1_o0
 *   9  step_s1_o1
 *   10  step_s1_o2
 *   11  step_s1_o3
 *   12  step_s1_o4
 *   13  step_s1_o5
 *   14  step_s1_o6
 *   15  step_s1_o7 */
tessary_edges_API const char *tessary_edges_kernel_name(int index);

tessary_edges_API int tessary_edges_scale_count(void);

/* A code in words; never NULL. */
tessary_edges_API const char *tessary_edges_message(int code);

/* ---- responses */

/* Bytes of scratch memory that a call on a picture of this size needs; 0 when no
 * call would accept the size. Any alignment will do; nothing is kept in it. */
tessary_edges_API size_t tessary_edges_scratch_bytes(int width, int height);

/* Responses of every kernel on the whole picture.
 *   image            first pixel of the first row
 *   row_bytes        from one row of the picture to the next
 *   width, height    pixels, each at least 21
 *   out              kernel k, row y, column x goes to
 *                    out + k * out_plane_bytes + y * out_row_bytes + 4 * x (in bytes)
 *   scratch          tessary_edges_scratch_bytes(width, height) bytes
 * Returns 0, or a code. */
tessary_edges_API int tessary_edges_responses(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    float *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, void *scratch);

/* The same for rows first_row .. first_row + row_count - 1 alone, for callers with threads.
 * image, width and height still describe the whole picture (the rows above and below are
 * read too); out is where row first_row goes. */
tessary_edges_API int tessary_edges_responses_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count,
    float *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, void *scratch);

/* ---- edges */

/* Strength of one scale (0 the finest) and the index of the winning orientation; among
 * equals the first wins. Nothing else is written. Returns 0, or a code. */
tessary_edges_API int tessary_edges_edges(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch);

/* The same for some rows alone; strength and orientation are where row first_row goes. */
tessary_edges_API int tessary_edges_edges_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch);

/* Strengths and orientations of all scales in one pass over the picture, the bits of tessary_edges_edges: scale s
 * goes to strength + s * strength_plane_bytes and orientation + s * orientation_plane_bytes (in bytes).
 * Returns 0, or a code. */
tessary_edges_API int tessary_edges_edges_all(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    float *strength, ptrdiff_t strength_row_bytes, ptrdiff_t strength_plane_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, ptrdiff_t orientation_plane_bytes,
    void *scratch);

/* The same for some rows alone; strength and orientation are where row first_row goes. */
tessary_edges_API int tessary_edges_edges_all_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count,
    float *strength, ptrdiff_t strength_row_bytes, ptrdiff_t strength_plane_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, ptrdiff_t orientation_plane_bytes,
    void *scratch);

/* As tessary_edges_edges, for callers who want what reaches a threshold. At every pixel whose strength is at
 * least the threshold, and at its eight neighbours, strength and orientation are those of
 * tessary_edges_edges, bit for bit; so thinning with that threshold gives the same edges. Elsewhere they are the
 * same or both 0: stretches that are provably too flat are not computed. *skipped, where it is not
 * NULL, becomes the number of such pixels. Returns 0, or a code. */
tessary_edges_API int tessary_edges_edges_above(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int scale, float threshold, float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, uint64_t *skipped, void *scratch);

/* The same for some rows alone; strength and orientation are where row first_row goes. */
tessary_edges_API int tessary_edges_edges_above_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale, float threshold,
    float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, uint64_t *skipped, void *scratch);

/* ---- fixed point
 *
 * The same bank in 16-bit integers: faster, and the same bits on every processor. A response
 * is a count; count * tessary_edges_q_step(kernel) is its value. What is exact, what is rounded (halves
 * upwards, once, at the end) and how far that is from the exact response is stated in the
 * bank's manifest. No input can make a sum overflow. */

/* Value of one count of a kernel; 0 when there is no such kernel. */
tessary_edges_API float tessary_edges_q_step(int index);

/* As tessary_edges_responses, in counts: kernel k, row y, column x goes to
 * out + k * out_plane_bytes + y * out_row_bytes + 2 * x (in bytes). *saturated (unless
 * NULL) becomes the number of counts at the ends of the range, -32767 or 32767;
 * for this bank no input can reach them. */
tessary_edges_API int tessary_edges_responses_q(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int16_t *out, ptrdiff_t out_row_bytes, ptrdiff_t out_plane_bytes, uint64_t *saturated,
    void *scratch);
tessary_edges_API int tessary_edges_responses_q_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width,
    int height, int first_row, int row_count, int16_t *out, ptrdiff_t out_row_bytes,
    ptrdiff_t out_plane_bytes, uint64_t *saturated, void *scratch);

/* As tessary_edges_edges, from counts; strength is in the units of tessary_edges_edges. */
tessary_edges_API int tessary_edges_edges_q(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int scale, float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch);
tessary_edges_API int tessary_edges_edges_q_rows(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    int first_row, int row_count, int scale, float *strength, ptrdiff_t strength_row_bytes,
    unsigned char *orientation, ptrdiff_t orientation_row_bytes, void *scratch);

/* ---- edge elements */

/* An edge element, placed below the pixel by least squares of a blurred edge run through the
 * input table. */
struct tessary_edges_edgel {
    float x, y; /* pixels; the centre of the first pixel is 0, 0 */
    float theta; /* normal, radians from +x towards +y, towards the brighter side for a step */
    float strength; /* of the response that found it */
    float sd; /* standard error of the position along the normal, pixels */
    float width; /* of a line, pixels, blur taken out; 0 for a step */
    unsigned char scale; /* that found it, 0 the finest */
    unsigned char kind; /* tessary_edges_STEP, tessary_edges_BRIGHT_LINE or tessary_edges_DARK_LINE */
    unsigned char unused[2]; /* 0 */
};

#define tessary_edges_STEP 0
#define tessary_edges_BRIGHT_LINE 1
#define tessary_edges_DARK_LINE 2

/* Bytes of scratch memory that tessary_edges_edgels needs on a picture of this size (about 16 bytes a
 * pixel); 0 when no call would accept the size. Any alignment will do; nothing is kept in it. */
tessary_edges_API size_t tessary_edges_edgels_scratch_bytes(int width, int height);

/* Edge elements of the whole picture: strength, thinning along the normal, hysteresis, the finest
 * scale first, and the sub-pixel place of each.
 *   threshold        strength at which an element stands by itself: one of
 *                    tessary_edges_STRENGTH_THRESHOLDS, or any other.
 *                    Neighbours of tessary_edges_HYSTERESIS_RATIO times that hang on.
 *   line_threshold   0, as this bank looks for one kind of edges only
 *   out, capacity    room for that many elements; NULL with 0 to count them only
 *   count            how many there are, which may be more than capacity; 0 after a refusal
 *   scratch          tessary_edges_edgels_scratch_bytes(width, height) bytes
 * They come row by row. Returns 0; tessary_edges_TOO_MANY when there was not room for all: those of the
 * first rows stand in out; or another code. */
#define tessary_edges_HYSTERESIS_RATIO 0.69999999999999996
tessary_edges_API int tessary_edges_edgels(const tessary_edges_pixel *image, ptrdiff_t row_bytes, int width, int height,
    double threshold, double line_threshold,
    struct tessary_edges_edgel *out, size_t capacity, size_t *count, void *scratch);

#ifdef __cplusplus
}
#endif

#endif
