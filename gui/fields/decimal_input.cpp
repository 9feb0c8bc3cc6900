#include "fields/decimal_input.h"

#include <QLocale>

#include "quantities/decimal.h"
#include "quantities/input_error.h"

using namespace dosimetry;

namespace {

bool languageHasComma() {
    return QLocale().decimalPoint() == QStringLiteral(",");
}

bool couldBeThousands(const std::string& number) {
    const auto point = number.find('.');
    if (point == std::string::npos || point == 0) return false;
    const auto end = number.find_first_not_of("0123456789", point + 1);
    const std::size_t digits = (end == std::string::npos ? number.size() : end) - point - 1;
    return digits == 3 && number.find_first_not_of("+-0") < point;  // 0.064 cannot be a group of thousands
}

}  // namespace

std::string fileText(const QString& typed) {
    std::string text = typed.trimmed().toStdString();
    if (!languageHasComma()) return text;
    const std::string number = text.substr(0, number_prefix_length(text));
    const auto comma = number.find(',');
    if (comma == std::string::npos && couldBeThousands(number)) {
        std::string withComma = number;
        std::string whole = number;
        withComma[number.find('.')] = ',';
        whole.erase(number.find('.'), 1);
        throw InputError("the number " + quoted(number) + " can be read in two ways",
                         withComma + " or " + whole);
    }
    if (comma == std::string::npos) return text;
    parse_number(number, DecimalMark::point_or_comma);
    text[comma] = '.';
    return text;
}

QString fieldText(const std::string& stored) {
    std::string text = stored;
    if (languageHasComma()) {
        const auto point = text.substr(0, number_prefix_length(text)).find('.');
        if (point != std::string::npos) text[point] = ',';
    }
    return QString::fromStdString(text);
}
