// SPDX-License-Identifier: MIT
#pragma once

#include <functional>
#include <optional>
#include <string>
#include <string_view>

// Writing without ever leaving something half-written: beside the target, then renamed over it. The old file stays as
// it is until the new one is whole and on the disk.

namespace spanledger {

/// What could not be written, and why. The program ends with status 3.
struct WriteError {
    std::string path;
    std::string reason;
};

/// Empty where all went well.
using WriteResult = std::optional<WriteError>;

/// Asked between steps of a long write; true stops it, and nothing of it stays. May be empty.
using Interrupted = std::function<bool()>;

/// A file in the making, in the folder of the file it is to become. The destructor removes it unless it was placed, so
/// that every early return cleans up. A process that is to survive a full file-size limit must ignore SIGXFSZ.
class TemporaryFile {
public:
    explicit TemporaryFile(std::string target);
    ~TemporaryFile();
    TemporaryFile(const TemporaryFile&) = delete;
    TemporaryFile& operator=(const TemporaryFile&) = delete;

    [[nodiscard]] const std::string& path() const noexcept { return path_; }
    [[nodiscard]] const std::string& target() const noexcept { return target_; }

    /// Why the file could not be made, if it could not. Nothing else may be called then.
    [[nodiscard]] const WriteResult& problem() const noexcept { return problem_; }

    /// Appends the text.
    [[nodiscard]] WriteResult write(std::string_view text);

    /// All that was written, here or through `path` by others, is on the disk afterwards.
    [[nodiscard]] WriteResult settle();

    /// Takes the target's place. To be called after settle().
    [[nodiscard]] WriteResult place();

private:
    [[nodiscard]] WriteError failure(int error) const;

    std::string target_;
    std::string path_;
    int descriptor_ = -1;
    bool placed_ = false;
    WriteResult problem_;
};

/// Writes a whole text file in one go, replacing an existing one.
[[nodiscard]] WriteResult write_file(const std::string& target, std::string_view text);

/// Makes the folder if it is missing and tries whether a file can be made in it: to be asked before long work.
[[nodiscard]] WriteResult prepare_folder(const std::string& folder);

/// The folder a file lies in ("." where its name has none).
[[nodiscard]] std::string folder_of(const std::string& file);

} // namespace spanledger
