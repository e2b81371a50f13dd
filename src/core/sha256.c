/* SHA-256 as FIPS 180-4 has it, for the hash that names the text of a pack. */
#include "backsaw/core.h"

#include <string.h>

/* The first 32 bits of the fractional parts of the cube roots of the first 64 primes. */
static const uint32_t constants[64] = {
    0x428a2f98, 0x71374491, 0xb5c0fbcf, 0xe9b5dba5, 0x3956c25b, 0x59f111f1, 0x923f82a4, 0xab1c5ed5,
    0xd807aa98, 0x12835b01, 0x243185be, 0x550c7dc3, 0x72be5d74, 0x80deb1fe, 0x9bdc06a7, 0xc19bf174,
    0xe49b69c1, 0xefbe4786, 0x0fc19dc6, 0x240ca1cc, 0x2de92c6f, 0x4a7484aa, 0x5cb0a9dc, 0x76f988da,
    0x983e5152, 0xa831c66d, 0xb00327c8, 0xbf597fc7, 0xc6e00bf3, 0xd5a79147, 0x06ca6351, 0x14292967,
    0x27b70a85, 0x2e1b2138, 0x4d2c6dfc, 0x53380d13, 0x650a7354, 0x766a0abb, 0x81c2c92e, 0x92722c85,
    0xa2bfe8a1, 0xa81a664b, 0xc24b8b70, 0xc76c51a3, 0xd192e819, 0xd6990624, 0xf40e3585, 0x106aa070,
    0x19a4c116, 0x1e376c08, 0x2748774c, 0x34b0bcb5, 0x391c0cb3, 0x4ed8aa4a, 0x5b9cca4f, 0x682e6ff3,
    0x748f82ee, 0x78a5636f, 0x84c87814, 0x8cc70208, 0x90befffa, 0xa4506ceb, 0xbef9a3f7, 0xc67178f2,
};

static uint32_t turn(uint32_t word, int bits)
{
    return word >> bits | word << (32 - bits);
}

/* The message schedule of section 6.2.2, step 1. */
static void schedule(const unsigned char *block, uint32_t words[64])
{
    for (int i = 0; i < 16; i++)
        words[i] = (uint32_t)block[4 * i] << 24 | (uint32_t)block[4 * i + 1] << 16 |
                   (uint32_t)block[4 * i + 2] << 8 | (uint32_t)block[4 * i + 3];
    for (int i = 16; i < 64; i++) {
        uint32_t a = words[i - 15], b = words[i - 2];

        words[i] = words[i - 16] + (turn(a, 7) ^ turn(a, 18) ^ a >> 3) + words[i - 7] +
                   (turn(b, 17) ^ turn(b, 19) ^ b >> 10);
    }
}

/* Steps 2 to 4 for one block of 64 bytes; v holds a to h. */
static void take_block(uint32_t state[8], const unsigned char *block)
{
    uint32_t words[64], v[8];

    schedule(block, words);
    memcpy(v, state, sizeof v);
    for (int i = 0; i < 64; i++) {
        uint32_t choice = (v[4] & v[5]) ^ (~v[4] & v[6]);
        uint32_t majority = (v[0] & v[1]) ^ (v[0] & v[2]) ^ (v[1] & v[2]);
        uint32_t one = v[7] + (turn(v[4], 6) ^ turn(v[4], 11) ^ turn(v[4], 25)) + choice +
                       constants[i] + words[i];
        uint32_t two = (turn(v[0], 2) ^ turn(v[0], 13) ^ turn(v[0], 22)) + majority;

        memmove(v + 1, v, 7 * sizeof *v);
        v[4] += one;
        v[0] = one + two;
    }
    for (int i = 0; i < 8; i++)
        state[i] += v[i];
}

void bs_sha256(const void *data, size_t length, char hex[65])
{
    static const char digits[] = "0123456789abcdef";
    uint32_t state[8] = {0x6a09e667, 0xbb67ae85, 0x3c6ef372, 0xa54ff53a,
                         0x510e527f, 0x9b05688c, 0x1f83d9ab, 0x5be0cd19};
    const unsigned char *bytes = data;
    unsigned char last[128] = {0};
    size_t rest = length % 64, size = rest < 56 ? 64 : 128;

    for (size_t at = 0; at + 64 <= length; at += 64)
        take_block(state, bytes + at);
    if (rest)
        memcpy(last, bytes + (length - rest), rest);
    last[rest] = 0x80;
    for (int i = 0; i < 8; i++)
        last[size - 1 - (size_t)i] = (unsigned char)((uint64_t)length * 8 >> 8 * i);
    for (size_t at = 0; at < size; at += 64)
        take_block(state, last + at);
    for (int i = 0; i < 64; i++)
        hex[i] = digits[state[i / 8] >> (28 - 4 * (i % 8)) & 15];
    hex[64] = '\0';
}
