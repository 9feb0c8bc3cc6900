#pragma once

#include <filesystem>
#include <fstream>
#include <random>
#include <sstream>
#include <string>

namespace testing_support {

inline std::string bytes_of(const std::filesystem::path& path) {
    std::ifstream stream(path, std::ios::binary);
    std::ostringstream bytes;
    bytes << stream.rdbuf();
    return bytes.str();
}

/// A folder of its own that goes with the test.
class TemporaryFolder {
  public:
    TemporaryFolder() {
        std::random_device random;
        path_ = std::filesystem::temp_directory_path() / ("photon-margin-test-" + std::to_string(random()));
        std::filesystem::create_directory(path_);
    }
    ~TemporaryFolder() {
        std::error_code ignored;
        std::filesystem::remove_all(path_, ignored);
    }
    TemporaryFolder(const TemporaryFolder&) = delete;
    TemporaryFolder& operator=(const TemporaryFolder&) = delete;

    const std::filesystem::path& path() const { return path_; }
    std::filesystem::path write(const std::string& name, const std::string& bytes) const {
        std::ofstream(path_ / name, std::ios::binary) << bytes;
        return path_ / name;
    }

  private:
    std::filesystem::path path_;
};

/// The green beam as a file.
inline const std::string green_file = R"(format = 1

[assessment]
title = "Alignment"
date = 2026-12-01
limits = ["icnirp_2013_laser"]

[[source]]
id = "green"
kind = "laser"
wavelength = "532 nm"
[source.emission]
mode = "continuous"
power = "5 W"
[source.beam]
profile = "gaussian"
diameter = "2 mm"
measured_at = "1/e2"
divergence = "1 mrad"

[[position]]
id = "operator"
at = "0.5 m"
exposure = "0.25 s"
tissues = ["eye", "skin"]
)";

/// That file with one part replaced.
inline std::string green_file_with(const std::string& from, const std::string& to) {
    std::string text = green_file;
    const auto at = text.find(from);
    if (at == std::string::npos) throw std::runtime_error("the file does not hold " + from);
    return text.replace(at, from.size(), to);
}

}  // namespace testing_support
