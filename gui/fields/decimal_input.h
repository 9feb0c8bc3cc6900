#pragma once

#include <QString>
#include <string>

/// Turns what was typed into what files hold: trimmed, decimal point. A decimal comma is taken only where the
/// language of the window has one, and never together with a point, which would be a group separator.
/// Throws InputError where the number could be read in two ways.
std::string fileText(const QString& typed);
