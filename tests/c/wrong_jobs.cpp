// Each wrong job of the folder given as the argument gives its message word for word.
#include <beamcore.hpp>

#include <fstream>
#include <iostream>
#include <sstream>

static std::string read_file(const std::string &path) {
    std::ifstream file(path);
    std::ostringstream text;
    text << file.rdbuf();
    if (!file) {
        throw std::runtime_error(path + " cannot be read");
    }
    return text.str();
}

// Whether a wrong job is refused with its message.
static bool is_refused(const std::string &folder, const std::string &name) {
    std::string expected = read_file(folder + "/" + name + ".message");
    expected.erase(expected.find_last_not_of('\n') + 1);
    const std::string document = read_file(folder + "/" + name + ".toml");
    std::string found = "a good job";
    try {
        beamcore::Job::read(document, beamcore::Format::toml);
    } catch (const beamcore::InputError &error) {
        found = error.what();
    }
    if (found != expected) {
        std::cerr << name << ": found\n" << found << "\nexpected\n" << expected << "\n";
    }
    return found == expected;
}

int main(int count, char **arguments) {
    const std::string folder = count == 2 ? arguments[1] : ".";
    std::istringstream cases(read_file(folder + "/cases.txt"));
    int jobs = 0, failures = 0;
    for (std::string name; std::getline(cases, name);) {
        if (name.empty() || name[0] == '#') {
            continue;
        }
        ++jobs;
        failures += is_refused(folder, name) ? 0 : 1;
    }
    return jobs >= 50 && failures == 0 ? 0 : 1;
}
