#include "fields/decimal_input.h"

#include <QLocale>

#include "quantities/decimal.h"

std::string fileText(const QString& typed) {
    std::string text = typed.trimmed().toStdString();
    if (QLocale().decimalPoint() != QStringLiteral(",")) return text;
    const std::size_t length = dosimetry::number_prefix_length(text);
    const std::string number = text.substr(0, length);
    if (number.find(',') == std::string::npos) return text;
    dosimetry::parse_number(number, dosimetry::DecimalMark::point_or_comma);
    text[number.find(',')] = '.';
    return text;
}
