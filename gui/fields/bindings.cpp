#include "fields/bindings.h"

#include <QDate>
#include <QObject>

#include "quantities/input_error.h"

std::string nonEmpty(const std::string& text) {
    if (text.empty()) throw dosimetry::InputError("the name is empty", "a short name, such as operator");
    return text;
}

FieldBinding dateBinding() {
    return {"date",
            QObject::tr("date"),
            [](const dosimetry::Setup& s) { return s.date; },
            [](dosimetry::Setup& s, const std::string& text) {
                const bool valid = QDate::fromString(QString::fromStdString(text), Qt::ISODate).isValid() &&
                                   text.size() == 10;
                if (!text.empty() && !valid)
                    throw dosimetry::InputError(dosimetry::quoted(text) + " is not a date",
                                                "YYYY-MM-DD, such as 2026-12-01");
                s.date = text;
            },
            FieldBinding::Content::text,
            QObject::tr("YYYY-MM-DD")};
}
