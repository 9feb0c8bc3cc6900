#include "limits/limit_library.h"

#include <utility>

#include "limits/embedded_tables.h"
#include "quantities/input_error.h"

namespace dosimetry {

const LimitLibrary& LimitLibrary::embedded() {
    static const LimitLibrary library = [] {
        LimitLibrary l;
        for (const EmbeddedTable& table : embedded_tables()) {
            const std::string name(table.file_name);
            LimitSet set = LimitSet::read(table.bytes, name);
            if (name != set.edition().id + ".toml")
                throw InputError("the edition in this file is called " + quoted(set.edition().id),
                                 "an id equal to the file's name", "edition.id", {name, 1, 1});
            l.sets_.push_back(std::move(set));
        }
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
