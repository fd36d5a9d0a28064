// SPDX-License-Identifier: MIT
#include "spanledger/writers/safe_file.hpp"

#include <fmt/format.h>

#include <cerrno>
#include <cstdio>
#include <filesystem>
#include <system_error>
#include <utility>

#include <fcntl.h>
#include <unistd.h>

namespace spanledger {
namespace {

std::string reason_of(int error) {
    return std::generic_category().message(error);
}

std::string name_beside(const std::filesystem::path& target, int attempt) {
    const std::string name = fmt::format(".{}.part-{}-{}", target.filename().string(), ::getpid(), attempt);
    return (target.parent_path() / name).string();
}

/// Closes a descriptor when it goes out of scope.
class Closing {
public:
    explicit Closing(int descriptor) : descriptor_(descriptor) {}
    ~Closing() {
        if (descriptor_ >= 0) ::close(descriptor_);
    }
    Closing(const Closing&) = delete;
    Closing& operator=(const Closing&) = delete;

private:
    int descriptor_;
};

} // namespace

TemporaryFile::TemporaryFile(std::string target) : target_(std::move(target)) {
    constexpr int attempts = 100;
    constexpr mode_t readable_by_all = 0666; // less the user's mask
    for (int attempt = 0; attempt < attempts; ++attempt) {
        path_ = name_beside(target_, attempt);
        descriptor_ = ::open(path_.c_str(), O_WRONLY | O_CREAT | O_EXCL | O_CLOEXEC, readable_by_all);
        if (descriptor_ >= 0 || errno != EEXIST) break;
    }
    if (descriptor_ < 0) problem_ = failure(errno);
}

TemporaryFile::~TemporaryFile() {
    if (descriptor_ >= 0) ::close(descriptor_);
    if (!problem_ && !placed_) ::unlink(path_.c_str());
}

WriteError TemporaryFile::failure(int error) const {
    return {target_, reason_of(error)};
}

WriteResult TemporaryFile::write(std::string_view text) {
    while (!text.empty()) {
        const ssize_t written = ::write(descriptor_, text.data(), text.size());
        if (written < 0 && errno == EINTR) continue;
        if (written < 0) return failure(errno);
        text.remove_prefix(static_cast<std::size_t>(written));
    }
    return {};
}

WriteResult TemporaryFile::settle() {
    const int descriptor = std::exchange(descriptor_, -1);
    // Some file systems cannot be asked to settle a file; they say EINVAL.
    if (::fsync(descriptor) != 0 && errno != EINVAL) {
        const int error = errno;
        ::close(descriptor);
        return failure(error);
    }
    if (::close(descriptor) != 0) return failure(errno);
    return {};
}

WriteResult TemporaryFile::place() {
    if (std::rename(path_.c_str(), target_.c_str()) != 0) return failure(errno);
    placed_ = true;
    const int folder = ::open(folder_of(target_).c_str(), O_RDONLY | O_DIRECTORY | O_CLOEXEC);
    const Closing closing(folder);
    // The file is whole and in place: a folder that cannot be settled takes nothing from that.
    if (folder >= 0) (void)::fsync(folder);
    return {};
}

WriteResult write_file(const std::string& target, std::string_view text) {
    TemporaryFile file(target);
    if (file.problem()) return file.problem();
    if (auto error = file.write(text)) return error;
    if (auto error = file.settle()) return error;
    return file.place();
}

WriteResult prepare_folder(const std::string& folder) {
    std::error_code error;
    std::filesystem::create_directories(folder, error);
    if (!std::filesystem::is_directory(folder)) {
        return WriteError{folder, error ? error.message() : std::string("is not a folder")};
    }
    const TemporaryFile probe((std::filesystem::path(folder) / "probe").string());
    if (probe.problem()) return WriteError{folder, probe.problem()->reason};
    return {};
}

std::string folder_of(const std::string& file) {
    const std::string folder = std::filesystem::path(file).parent_path().string();
    return folder.empty() ? "." : folder;
}

} // namespace spanledger
