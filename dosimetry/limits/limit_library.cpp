#include "limits/limit_library.h"

#include "limits/embedded_tables.h"

namespace dosimetry {

const LimitLibrary& LimitLibrary::embedded() {
    static const LimitLibrary library = [] {
        LimitLibrary l;
        for (const EmbeddedTable& table : embedded_tables())
            l.sets_.push_back(LimitSet::read(table.bytes, std::string(table.file_name)));
        return l;
    }();
    return library;
}

const LimitSet* LimitLibrary::find(const std::string& id) const {
    for (const LimitSet& set : sets_)
        if (set.edition().id == id) return &set;
    return nullptr;
}

std::string LimitLibrary::ids() const {
    std::string text;
    for (const LimitSet& set : sets_) text += (text.empty() ? "" : ", ") + set.edition().id;
    return text;
}

}  // namespace dosimetry
