#pragma once

#include <QString>
#include <string>

/// Turns what was typed into what files hold: trimmed, decimal point. A decimal comma is taken only where the
/// language of the window has one. There a point is taken too, unless exactly three digits follow it: "1.064"
/// could be a thousand and sixty-four. Throws InputError where the number could be read in two ways.
std::string fileText(const QString& typed);

/// The other way round: a file's value as the language writes it.
QString fieldText(const std::string& stored);
