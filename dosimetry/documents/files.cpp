#include "documents/files.h"

#include <cerrno>
#include <cstdio>
#include <filesystem>
#include <memory>
#include <system_error>

#include "quantities/input_error.h"

namespace dosimetry {
namespace {

std::string read_stream(std::FILE* stream, const std::string& name) {
    std::string bytes(most_setup_bytes + 1, '\0');
    const std::size_t count = std::fread(bytes.data(), 1, bytes.size(), stream);
    if (std::ferror(stream) != 0)
        throw InputError("the file cannot be read", "a readable file", "", {name, 0, 0});
    bytes.resize(count);
    return bytes;
}

}  // namespace

std::string read_file(const std::string& name) {
    if (name == "-") return read_stream(stdin, "standard input");
    std::error_code ignored;
    if (std::filesystem::is_directory(name, ignored))
        throw InputError("this is a folder", "an assessment file", "", {name, 0, 0});
    errno = 0;
    const std::unique_ptr<std::FILE, int (*)(std::FILE*)> stream(std::fopen(name.c_str(), "rb"),
                                                                 &std::fclose);
    if (!stream)
        throw InputError("the file cannot be opened: " + std::generic_category().message(errno),
                         "a readable file", "", {name, 0, 0});
    return read_stream(stream.get(), name);
}

}  // namespace dosimetry
