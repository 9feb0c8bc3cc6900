// Stand-in for libFuzzer: calls the target with every file of the folders named on the command line.

#include <cstdio>
#include <filesystem>
#include <fstream>
#include <sstream>

#include "target.h"

int main(int count, char** arguments) {
    int replayed = 0;
    for (int i = 1; i < count; ++i)
        for (const auto& entry : std::filesystem::directory_iterator(arguments[i])) {
            if (!entry.is_regular_file()) continue;
            std::ifstream stream(entry.path(), std::ios::binary);
            std::ostringstream text;
            text << stream.rdbuf();
            const std::string bytes = text.str();
            const void* data = bytes.data();
            LLVMFuzzerTestOneInput(static_cast<const std::uint8_t*>(data), bytes.size());
            ++replayed;
        }
    std::printf("%d inputs\n", replayed);
    return replayed > 0 ? 0 : 1;  // an empty corpus tests nothing
}
