#pragma once

#include <QGroupBox>

#include "sources/laser_setup.h"

class QFormLayout;
class Session;
class SetupField;

/// The ways to state how a beam spreads.
enum class Spread { divergence, m2, exitAndWaist, waistAndDivergence, waistAndM2 };

Spread spreadOf(const dosimetry::BeamSetup& beam);

/// The same beam stated another way, its values computed from the present statement and rounded to six
/// digits.
dosimetry::BeamSetup restated(const dosimetry::LaserSetup& laser, Spread spread);

/// The beam: profile, where widths are measured, size, spread, and the apparent source if it is not a small
/// one.
class BeamForm : public QGroupBox {
    Q_OBJECT

  public:
    explicit BeamForm(Session& session, QWidget* parent = nullptr);

  private:
    void showRows();
    Session& session_;
    QFormLayout* form_;
    SetupField* diameter_;
    SetupField* divergence_;
    SetupField* m2_;
    SetupField* waist_;
    SetupField* waistAt_;
};
