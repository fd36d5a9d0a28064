// SPDX-License-Identifier: MIT
#include "bare_cells.hpp"

#include <cstddef>
#include <fstream>

namespace spanledger::benchmark {
namespace {

void put(std::ostream& out, std::uint64_t count) {
    out.write(reinterpret_cast<const char*>(&count), sizeof count);
}

template <class T> void put(std::ostream& out, const std::vector<T>& values) {
    put(out, values.size());
    out.write(reinterpret_cast<const char*>(values.data()), static_cast<std::streamsize>(values.size() * sizeof(T)));
}

void put(std::ostream& out, const std::string& text) {
    put(out, text.size());
    out.write(text.data(), static_cast<std::streamsize>(text.size()));
}

void put(std::ostream& out, const std::vector<std::string>& texts) {
    put(out, texts.size());
    for (const std::string& text : texts) put(out, text);
}

std::size_t get_count(std::istream& in) {
    std::uint64_t count = 0;
    in.read(reinterpret_cast<char*>(&count), sizeof count);
    return in ? count : 0;
}

template <class Sequence> void get(std::istream& in, Sequence& values) {
    values.resize(get_count(in));
    in.read(reinterpret_cast<char*>(values.data()),
            static_cast<std::streamsize>(values.size() * sizeof(typename Sequence::value_type)));
}

void get(std::istream& in, std::vector<std::string>& texts) {
    texts.resize(get_count(in));
    for (std::string& text : texts) get(in, text);
}

} // namespace

bool write_bare_sheets(const std::string& file, const std::vector<BareSheet>& sheets) {
    std::ofstream out(file, std::ios::binary);
    put(out, sheets.size());
    for (const BareSheet& sheet : sheets) {
        put(out, sheet.name);
        put(out, sheet.classes);
        put(out, sheet.sections);
        put(out, sheet.loads);
        put(out, sheet.spacings);
        put(out, sheet.spans);
        put(out, sheet.limits);
    }
    out.close();
    return out.good();
}

std::vector<BareSheet> read_bare_sheets(const std::string& file) {
    std::ifstream in(file, std::ios::binary);
    std::vector<BareSheet> sheets(get_count(in));
    for (BareSheet& sheet : sheets) {
        get(in, sheet.name);
        get(in, sheet.classes);
        get(in, sheet.sections);
        get(in, sheet.loads);
        get(in, sheet.spacings);
        get(in, sheet.spans);
        get(in, sheet.limits);
    }
    return in ? sheets : std::vector<BareSheet>{};
}

} // namespace spanledger::benchmark
