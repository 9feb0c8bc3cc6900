#include "margins_view/answers_model.h"

#include "documents/result.h"
#include "quantities/format.h"
#include "session/session.h"

using namespace dosimetry;

AnswersModel::AnswersModel(Session& session, QObject* parent)
    : QAbstractTableModel(parent), session_(session) {
    connect(&session, &Session::setupChanged, this, &AnswersModel::reload);
    connect(&session, &Session::currentPositionChanged, this, &AnswersModel::reload);
    reload();
}

void AnswersModel::add(const QString& label, const std::string& value, const Trail& trail) {
    answers_.push_back({label, QString::fromStdString(value), &trail});
}

void AnswersModel::reload() {
    beginResetModel();
    answers_.clear();
    const Assessment& assessment = session_.assessment();
    if (assessment.covered()) {
        const PositionAssessment& p =
            assessment.positions[static_cast<std::size_t>(session_.currentPosition())];
        for (const HazardDistance& d : assessment.hazard_distances)
            if (d.exposure.value == p.exposure.value)
                add(d.tissue == Tissue::eye ? tr("Hazard distance, eye (NOHD)") : tr("Hazard distance, skin"),
                    distance_text(d), d.trail);
        if (p.required_density_eye)
            add(tr("Optical density needed, eye"), density_text(*p.required_density_eye),
                p.density_trail_eye);
        if (p.required_density_skin)
            add(tr("Optical density needed, skin"), density_text(*p.required_density_skin),
                p.density_trail_skin);
        add(tr("Longest permitted exposure"), permitted_exposure_text(p) + tissue_remark(p),
            p.permitted_exposure_trail);
        add(tr("Highest permitted power"), format(p.permitted_power, 4, Rounding::down) + tissue_remark(p),
            p.permitted_power_trail);
        add(tr("Photons per area, on the axis"), format(p.photons_per_area, 4, Rounding::up),
            p.photons_trail);
    }
    const SourceAssessment& source = assessment.sources.front();
    add(tr("Photon energy"),
        format_number(in_electronvolts(source.photon_energy), 4, Rounding::nearest) + " eV",
        source.photon_energy_trail);
    add(tr("Photons per second"), format(source.photon_rate, 4, Rounding::up), source.photon_rate_trail);
    endResetModel();
}

int AnswersModel::rowCount(const QModelIndex& parent) const {
    return parent.isValid() ? 0 : static_cast<int>(answers_.size());
}

int AnswersModel::columnCount(const QModelIndex& parent) const {
    return parent.isValid() ? 0 : 2;
}

QVariant AnswersModel::data(const QModelIndex& index, int role) const {
    if (!index.isValid() || role != Qt::DisplayRole) return {};
    const Answer& answer = answers_[static_cast<std::size_t>(index.row())];
    return index.column() == 0 ? answer.label : answer.value;
}
