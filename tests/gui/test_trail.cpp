#include <gtest/gtest.h>

#include "trail_view/trail_view.h"

TEST(Trail, SetsPowersAndIndices) {
    EXPECT_EQ(mathHtml("18 · t^0.75 · CE"), "18 · t<sup>0.75</sup> · CE");
    EXPECT_EQ(mathHtml("H_EL / t"), "H<sub>EL</sub> / t");
    EXPECT_EQ(mathHtml("10^(0.002·(905 − 700))"), "10<sup>(0.002·(905 − 700))</sup>");
    EXPECT_EQ(mathHtml("T2^−0.25"), "T2<sup>−0.25</sup>");
    EXPECT_EQ(mathHtml("d^2 + 1"), "d<sup>2</sup> + 1");
    EXPECT_EQ(mathHtml("a < b & c"), "a &lt; b &amp; c");
    EXPECT_EQ(mathHtml("x^"), "x^");
    EXPECT_EQ(mathHtml("10^(2"), "10<sup>(2</sup>");
}

TEST(Trail, ShowsFormulaNumbersResultAndSource) {
    TrailView view;
    view.showTrail({"subject", {{"R", "ratio", "E / E_EL", "4 / 2", "2", "definition"}}});
    const QString text = view.toPlainText();
    for (const char* part : {"subject", "E / EEL", "4 / 2", "= 2", "ratio", "definition"})
        EXPECT_TRUE(text.contains(part)) << part;
}
