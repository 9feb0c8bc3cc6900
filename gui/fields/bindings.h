#pragma once

#include "fields/setup_field.h"

/// Refuses an empty name. Throws InputError.
std::string nonEmpty(const std::string& text);

/// The date of the assessment as YYYY-MM-DD, or empty.
FieldBinding dateBinding();
