// SPDX-License-Identifier: MIT
#include "spanledger/clauses/en1993_1_3_effective_channel.hpp"

#include <catch2/catch.hpp>

#include <cmath>
#include <functional>
#include <vector>

// Section properties against direct integration over thin strips: every plate is cut up in width and thickness, and the
// sums are those of the strips alone.

using namespace spanledger;

namespace {

struct Strips {
    double A = 0.0, S = 0.0, zz = 0.0; ///< sums of dA, z dA, z2 dA

    void add(double z, double area) {
        A += area;
        S += z * area;
        zz += z * z * area;
    }
    /// A plate parallel to the flanges at depth z.
    void flat(double z, double width, double t) {
        constexpr int cuts = 4000;
        for (int i = 0; i < cuts; ++i) add(z - t / 2 + t * (i + 0.5) / cuts, width * t / cuts);
    }
    /// A plate from depth `from` to depth `to`.
    void upright(double from, double to, double t) {
        constexpr int cuts = 40000;
        for (int i = 0; i < cuts; ++i) add(from + (to - from) * (i + 0.5) / cuts, (to - from) * t / cuts);
    }
    [[nodiscard]] double z() const { return S / A; }
    [[nodiscard]] double I() const { return zz - S * S / A; }
};

struct Example {
    lipped_channel::Size<double> size;
    double f_yb;
};

const std::vector<Example> examples{
    {{200, 74, 66, 20.8, 2, 3}, 350}, {{150, 50, 50, 15, 1.5, 2.5}, 350}, {{300, 75, 75, 25, 1.5, 3}, 550},
    {{100, 60, 80, 17, 3, 4}, 220},   {{250, 110, 70, 30, 2, 2.5}, 450},
};

void agree(const lipped_channel::Properties<double>& found, const Strips& strips, double h_p) {
    CHECK(found.A == Approx(strips.A).epsilon(1e-9));
    CHECK(found.z_c == Approx(strips.z()).epsilon(1e-9));
    CHECK(found.z_t == Approx(h_p - strips.z()).epsilon(1e-9));
    CHECK(found.I == Approx(strips.I()).epsilon(1e-7));
}

} // namespace

TEST_CASE("gross sections agree with strips", "[cold-formed]") {
    for (const Example& example : examples) {
        const auto x = lipped_channel::mid_line(example.size, 0.04);
        Strips strips;
        strips.flat(0, x.b_p1, x.t);
        strips.flat(x.h_p, x.b_p2, x.t);
        strips.upright(0, x.h_p, x.t);
        strips.upright(0, x.c_p, x.t);
        strips.upright(x.h_p - x.c_p, x.h_p, x.t);
        INFO("h " << example.size.h << " b_1 " << example.size.b_1);
        agree(lipped_channel::gross(x), strips, x.h_p);
    }
}

TEST_CASE("effective sections agree with strips", "[cold-formed]") {
    for (const Example& example : examples) {
        const auto x = lipped_channel::mid_line(example.size, 0.04);
        const en1993_1_3::Steel<double> steel{example.f_yb, 210000, 0.3};
        const auto flange = en1993_1_3::effective_flange(en1993_1_3::compression_flange(x, steel));
        const double h_c = en1993_1_3::compressed_depth(x, flange);
        const auto web = en1993_1_3::effective_web(x, h_c, en1993_1_3::yield_ratio(example.f_yb));
        Strips whole_web, strips;
        for (Strips* s : {&whole_web, &strips}) {
            s->flat(0, flange.b_e1, x.t);
            s->flat(0, flange.b_e2, flange.chi_d * x.t);
            s->upright(0, flange.c_eff, flange.chi_d * x.t);
            s->flat(x.h_p, x.b_p2, x.t);
            s->upright(x.h_p - x.c_p, x.h_p, x.t);
        }
        whole_web.upright(0, x.h_p, x.t);
        strips.upright(0, web.h_1, x.t);
        strips.upright(x.h_p - web.h_2, x.h_p, x.t);
        INFO("h " << example.size.h << " b_1 " << example.size.b_1);
        CHECK(h_c == Approx(whole_web.z()).epsilon(1e-9));
        CHECK(web.h_1 + web.h_2 <= x.h_p * (1 + 1e-12));
        agree(en1993_1_3::effective(x, steel), strips, x.h_p);
    }
}

TEST_CASE("the area of rounded corners agrees with a walk along the mid-line", "[cold-formed]") {
    for (const Example& example : examples) {
        const lipped_channel::Size<double>& s = example.size;
        const double radius = s.r + s.t_nom / 2;
        constexpr double quarter = 1.5707963267948966;
        constexpr int cuts = 100000;
        double length = (s.h - 2 * s.r - 2 * s.t_nom) + (s.b_1 - 2 * s.r - 2 * s.t_nom) +
                        (s.b_2 - 2 * s.r - 2 * s.t_nom) + 2 * (s.c - s.r - s.t_nom);
        for (int corner = 0; corner < 4; ++corner) {
            for (int i = 0; i < cuts; ++i) length += 2 * radius * std::sin(quarter / cuts / 2);
        }
        const auto x = lipped_channel::mid_line(s, 0.04);
        const double area = lipped_channel::nominal_area(s, lipped_channel::developed_width(x));
        CHECK(area == Approx(length * s.t_nom).epsilon(1e-9));
    }
}

TEST_CASE("where the stiffener does not settle, the step with the smaller reduction counts", "[cold-formed]") {
    struct Cycle {
        Example example;
        double chi_d, b_e2; // of the smaller of the two steps between which it goes on for ever
    };
    // Found by a search, with values of a separate calculation.
    for (const Cycle& cycle : {Cycle{{{308.185, 122.697, 122.697, 26.5613, 2.89329, 3}, 431.051}, 0.473043, 59.0276},
                               Cycle{{{93.2206, 71.5978, 71.5978, 16.3765, 1.48319, 3}, 519.862}, 0.473137, 29.8839}}) {
        const auto x = lipped_channel::mid_line(cycle.example.size, 0.04);
        const auto flange =
            en1993_1_3::effective_flange(en1993_1_3::compression_flange<double>(x, {cycle.example.f_yb, 210000, 0.3}));
        CHECK(flange.chi_d == Approx(cycle.chi_d).epsilon(0).margin(1e-6));
        CHECK(flange.b_e2 == Approx(cycle.b_e2).epsilon(0).margin(1e-4));
    }
}
