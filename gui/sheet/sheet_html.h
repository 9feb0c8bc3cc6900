#pragma once

#include <QString>

#include "assessment/assessment.h"

/// Stands in the HTML where the drawing of the route goes.
inline constexpr char16_t routePlaceholder[] = u"\uE000route\uE000";

/// The sheet's text in the order an officer signs: what, verdict, what was assessed, margins, distances,
/// protection, assumptions, cautions, signatures; then the appendix with the trails.
QString sheetHtml(const dosimetry::Setup& setup, const dosimetry::Assessment& assessment,
                  const QString& fileSha256);
