// What is written is read back equal, whatever people type into the fields.

#include "documents/setup_document.h"
#include "limits/limit_library.h"
#include "support/expect.h"
#include "support/files.h"
#include "support/random_setups.h"

namespace dosimetry {
namespace {

using testing_support::green_file;
using testing_support::green_setup;
using testing_support::log_uniform;
using testing_support::with_unit;

dosimetry::Setup read_back(const dosimetry::Setup& setup) {
    return read_setup(write_setup(setup), "written", LimitLibrary::embedded()).setup;
}

/// Words, quotation marks, line breaks, control characters, other scripts, what looks like TOML.
rc::Gen<std::string> any_text() {
    return rc::gen::map(rc::gen::container<std::vector<std::string>>(rc::gen::element<std::string>(
                            "a", "Z", " ", "\"", "'", "\\", "\n", "\t", "\r", "\x01", "\x1B", "\x7F", "#",
                            "=", "[", "]]", "\"\"\"", "\\u0041", "µ", "µ", "λ", "Ω", "漢字", "👩‍🔬",
                            "é", "\u202F", "\u2028", "0", "5 mW", ".", ",")),
                        [](const std::vector<std::string>& parts) {
                            std::string text;
                            for (const std::string& part : parts) text += part;
                            return text;
                        });
}

rc::Gen<dosimetry::Setup> any_stated_setup() {
    return rc::gen::exec([] {
        dosimetry::Setup setup = *testing_support::any_setup();
        setup.title = *any_text();
        setup.place = *any_text();
        setup.assessor = *any_text();
        setup.note = *any_text();
        setup.date =
            *rc::gen::element<std::string>("", "2026-12-01", "1999-02-28", "2024-02-29", "0001-01-01");
        LaserSetup& laser = setup.sources[0];
        laser.id = "x" + *any_text();
        BeamSetup& beam = laser.beam;
        switch (*rc::gen::inRange(0, 5)) {
            case 0:
                beam.diameter = beam.waist;
                beam.waist.reset();
                beam.waist_at.reset();
                break;
            case 1:
                beam.diameter = beam.waist;
                beam.waist.reset();
                beam.waist_at.reset();
                beam.divergence.reset();
                beam.m2 = *log_uniform(1, 1e6);
                break;
            case 2:
                beam.diameter = Stated<Length>(with_unit(beam.waist->value.in_si() * 3, "m"));
                beam.waist_at = Stated<Length>("-35.5 cm");
                beam.divergence.reset();
                break;
            case 3:
                beam.divergence.reset();
                beam.m2 = 1.0;
                break;
            default:
                break;
        }
        laser.power = Stated<RadiantPower>(
            *rc::gen::element<std::string>("5 mW", "  0.2 µW", "1e-3 W ", "+5 W", "5.0 W"));
        setup.positions.clear();
        for (int i = 0, n = *rc::gen::inRange(1, 4); i < n; ++i) {
            PositionSetup p = testing_support::position(std::to_string(i) + *any_text(),
                                                        with_unit(*log_uniform(1e-6, 1e6), "m"), "0.25 s");
            p.eye = *rc::gen::arbitrary<bool>();
            p.skin = !p.eye || *rc::gen::arbitrary<bool>();
            setup.positions.push_back(p);
        }
        return setup;
    });
}

RC_GTEST_PROP(RoundTripProperty, ReadingWhatWasWrittenGivesAnEqualSetup, ()) {
    const dosimetry::Setup setup = *any_stated_setup();
    const std::string written = write_setup(setup);
    const dosimetry::Setup again = read_setup(written, "written", LimitLibrary::embedded()).setup;
    RC_ASSERT(again == setup);
    RC_ASSERT(write_setup(again) == written);
}

TEST(WriteSetup, EveryQuantityAsItWasStated) {
    dosimetry::Setup setup = green_setup();
    setup.sources[0].power = Stated<RadiantPower>("5000 mW");
    EXPECT_NE(write_setup(setup).find("power = \"5000 mW\"\n"), std::string::npos);
    EXPECT_EQ(read_back(setup), setup);
}

TEST(WriteSetup, QuotesAndLineBreaksAreEscaped) {
    dosimetry::Setup setup = green_setup();
    setup.title = "the \"old\" bench\\\nsecond line";
    EXPECT_NE(write_setup(setup).find(R"(title = "the \"old\" bench\\\nsecond line")"), std::string::npos);
    EXPECT_EQ(read_back(setup).title, setup.title);
}

TEST(WriteSetup, TheFileAPersonWouldWrite) {
    dosimetry::Setup setup = green_setup();
    setup.title = "Alignment";
    setup.date = "2026-12-01";
    EXPECT_EQ(write_setup(setup), green_file);
}

}  // namespace
}  // namespace dosimetry
