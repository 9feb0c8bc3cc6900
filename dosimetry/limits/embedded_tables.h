#pragma once

#include <string_view>
#include <vector>

namespace dosimetry {

/// A file of limits_tables as it was when the program was built.
struct EmbeddedTable {
    std::string_view file_name;
    std::string_view bytes;
};

std::vector<EmbeddedTable> embedded_tables();

}  // namespace dosimetry
