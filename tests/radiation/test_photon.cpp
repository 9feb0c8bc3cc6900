// Photon energy and rate against constants that others have typed in.

#include <gsl/gsl_const_mksa.h>

#include "radiation/constants.h"
#include "radiation/photon.h"
#include "support/expect.h"

namespace dosimetry {
namespace {

using testing_support::agrees;
using testing_support::printed;
using testing_support::relatively_near;

// GSL 2.7 carries CODATA 2006. Since the redefinition of 2019 h is larger by 1.8e-7 and e by 0.9e-7; the
// tolerance spans that change and nothing more.
constexpr double codata_2006_to_2018 = 2e-7;

TEST(Constants, AgreeWithGslCodata2006) {
    EXPECT_EQ(constants::speed_of_light_m_per_s, GSL_CONST_MKSA_SPEED_OF_LIGHT);
    EXPECT_TRUE(
        relatively_near(constants::planck_J_s, GSL_CONST_MKSA_PLANCKS_CONSTANT_H, codata_2006_to_2018));
    EXPECT_TRUE(
        relatively_near(constants::electronvolt_J, GSL_CONST_MKSA_ELECTRON_VOLT, codata_2006_to_2018));
}

TEST(Constants, AreTheExactValuesOfSiBrochure9Section2_2) {
    EXPECT_EQ(constants::planck_J_s, 6.62607015e-34);
    EXPECT_EQ(constants::speed_of_light_m_per_s, 299792458.0);
    EXPECT_EQ(constants::electronvolt_J, 1.602176634e-19);
}

// CODATA 2018 prints the inverse metre to electronvolt relationship as 1.239 841 984… e-6 eV, digits cut off.
TEST(PhotonEnergy, Codata2018InverseMetreElectronvoltRelationship) {
    const double ev_nm = in_electronvolts(photon_energy(nanometres(1)));
    EXPECT_GE(ev_nm, 1239.841984);
    EXPECT_LT(ev_nm, 1239.841985);
}

TEST(PhotonEnergy, FromGslConstants) {
    for (double nm : {180.0, 275.0, 532.0, 1064.0, 10600.0, 1e6}) {
        const double gsl = GSL_CONST_MKSA_PLANCKS_CONSTANT_H * GSL_CONST_MKSA_SPEED_OF_LIGHT / (nm * 1e-9);
        EXPECT_TRUE(relatively_near(photon_energy(nanometres(nm)).in_si(), gsl, codata_2006_to_2018));
    }
}

// By hand: hc = 1.98644586e-25 J m; / 532e-9 m = 3.73392e-19 J; 5 W / that = 1.33908e19 photons a second.
TEST(PhotonRate, FiveWattsAt532Nanometres) {
    EXPECT_TRUE(agrees(photon_energy(nanometres(532)).in_si() * 1e19, printed(3.73392, 5)));
    EXPECT_TRUE(agrees(photon_rate(watts(5), nanometres(532)).in_si() / 1e19, printed(1.33908, 5)));
}

// By hand: 1 J/m² at 620 nm, one photon 3.203945e-19 J, gives 3.12115e18 photons per square metre.
TEST(PhotonExposure, OneJoulePerSquareMetreAt620Nanometres) {
    EXPECT_TRUE(
        agrees(photon_exposure(joules_per_m2(1), nanometres(620)).in_si() / 1e18, printed(3.12115, 5)));
}

TEST(PhotonEnergy, TimesRateIsThePower) {
    const RadiantPower power = photon_rate(watts(0.3), nanometres(905)) * photon_energy(nanometres(905));
    EXPECT_TRUE(relatively_near(power.in_si(), 0.3, 1e-15));
}

}  // namespace
}  // namespace dosimetry
