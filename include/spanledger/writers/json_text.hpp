// SPDX-License-Identifier: MIT
#pragma once

#include <concepts>
#include <cstdint>
#include <optional>
#include <string>
#include <string_view>
#include <utility>
#include <vector>

namespace spanledger {

/// Writes a JSON text from front to back: keys in the order given, numbers as short as they can be to be read back the
/// same, UTF-8. The outer levels take a line per element, the inner ones stay in one line.
class JsonText {
public:
    explicit JsonText(std::size_t levels_in_lines) : levels_in_lines_(levels_in_lines) {}

    void open_object() { open('{'); }
    void close_object() { close('}'); }
    void open_list() { open('['); }
    void close_list() { close(']'); }
    void key(std::string_view name);

    void value(std::string_view text);
    void value(const std::string& text) { value(std::string_view(text)); }
    void value(const char* text) { value(std::string_view(text)); }
    void value(char letter);
    void value(double number);
    void value(bool yes);
    void value(std::integral auto number) { whole(static_cast<std::int64_t>(number)); }
    void null();
    template <class T> void value(const std::optional<T>& maybe) {
        if (maybe) {
            value(*maybe);
        } else {
            null();
        }
    }
    template <class T> void value(const std::vector<T>& list) {
        open_list();
        for (const T& element : list) value(element);
        close_list();
    }
    template <class T> void field(std::string_view name, const T& content) {
        key(name);
        value(content);
    }

    /// False once a number was not finite; null stands in its place.
    [[nodiscard]] bool finite() const noexcept { return finite_; }

    /// The text so far; a whole one ends with a line end.
    [[nodiscard]] const std::string& text() const noexcept { return text_; }
    [[nodiscard]] std::string take() { return std::move(text_); }
    void reserve(std::size_t bytes) { text_.reserve(bytes); }

private:
    void open(char bracket);
    void close(char bracket);
    void before_element();
    void new_line();
    void whole(std::int64_t number);

    std::string text_;
    std::vector<bool> has_elements_; ///< per open level
    std::size_t levels_in_lines_;
    bool after_key_ = false;
    bool finite_ = true;
};

/// A quantity in another unit, without the last digits that the conversion left behind (14 significant digits stay).
[[nodiscard]] double in_unit(double value, double factor);
[[nodiscard]] std::optional<double> in_unit(const std::optional<double>& value, double factor);

} // namespace spanledger
