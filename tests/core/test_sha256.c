/*
 * SHA-256 against the examples of NIST: "abc" and the 448-bit message are those of FIPS 180-2,
 * appendix B.1 and B.2, to which FIPS 180-4 refers; a million letters a is B.3. The lengths around
 * a block are checked against sha256sum of GNU coreutils 9.1.
 */
#include "support/check.h"

#include <string.h>

static void sha256__gives_the_digests_of_the_standard(void **state)
{
    static char million[1000000];
    char hex[65];

    (void)state;
    bs_sha256("abc", 3, hex);
    assert_string_equal(hex, "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
    bs_sha256("abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq", 56, hex);
    assert_string_equal(hex, "248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1");
    memset(million, 'a', sizeof million);
    bs_sha256(million, sizeof million, hex);
    assert_string_equal(hex, "cdc76e5c9914fb9281a1c7e284d73e67f1809a48a497200e046d39ccc7112cd0");
}

static void sha256__pads_every_length(void **state)
{
    static const struct {
        size_t length;
        const char *hex;
    } cases[] = {
        {0, "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855"},
        {55, "d5e285683cd4efc02d021a5c62014694958901005d6f71e89e0989fac77e4072"},
        {56, "04c26261370ee7541549d16dee320c723e3fd14671e66a099afe0a377c16888e"},
        {63, "75220b47218278e656f2013bb8f0c455a25eaf01e86c64924e9d48d89776d6f2"},
        {64, "7ce100971f64e7001e8fe5a51973ecdfe1ced42befe7ee8d5fd6219506b5393c"},
        {119, "000b48d4edf0fa7bee3c6236ecd2785baa5db4eeb8bb54341b029e0d9fa5fb0c"},
        {120, "13f05a0b594787f5ecd315edc96141bd3243203d1b7d4f0836f37308b276ba98"},
    };
    char text[128], hex[65];

    (void)state;
    memset(text, 'x', sizeof text);
    for (size_t i = 0; i < sizeof cases / sizeof *cases; i++) {
        bs_sha256(text, cases[i].length, hex);
        assert_string_equal(hex, cases[i].hex);
    }
}

int main(void)
{
    const struct CMUnitTest tests[] = {
        cmocka_unit_test(sha256__gives_the_digests_of_the_standard),
        cmocka_unit_test(sha256__pads_every_length),
    };

    return cmocka_run_group_tests_name("core.sha256", tests, NULL, NULL);
}
