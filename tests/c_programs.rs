//! The programs in C and C++: each is compiled, linked with the shared and with the static
//! library, and run.
//!
//! With `BEAMCORE_VALGRIND=1` they run under valgrind, which then must find neither a wrong access
//! nor a leak. `CC` and `CXX` name other compilers than gcc and g++.

use std::path::{Path, PathBuf};
use std::process::{Command, Output};

#[path = "golden/runner.rs"]
mod runner;

/// What the static library needs of the system.
const SYSTEM_LIBRARIES: [&str; 5] = ["-lgcc_s", "-lutil", "-lrt", "-lpthread", "-ldl"];

fn root() -> &'static Path {
    Path::new(env!("CARGO_MANIFEST_DIR"))
}

/// Where the programs are built, and where they may leave files.
fn workshop() -> &'static Path {
    Path::new(env!("CARGO_TARGET_TMPDIR"))
}

/// The folder of the two libraries: cargo leaves them beside this test.
fn libraries() -> PathBuf {
    let test = std::env::current_exe().expect("a test knows its own file");
    let folder = test.parent().expect("a file is in a folder").to_owned();
    for library in ["libbeamcore_ffi.so", "libbeamcore_ffi.a"] {
        assert!(
            folder.join(library).exists(),
            "{library} is not in {}; build it with cargo build -p beamcore-ffi",
            folder.display()
        );
    }
    folder
}

fn finished(command: &mut Command, purpose: &str) -> Output {
    command.output().unwrap_or_else(|error| {
        let program = Path::new(command.get_program()).display();
        panic!("{program} cannot be started: {error}. It is needed to {purpose}")
    })
}

fn shown(output: &Output) -> String {
    let text = |bytes: &[u8]| String::from_utf8_lossy(bytes).into_owned();
    text(&output.stdout) + &text(&output.stderr)
}

/// A compiler with the flags that every program must pass.
fn compiler(source: &str) -> Command {
    let (variable, usual, standard) = if source.ends_with(".c") {
        ("CC", "gcc", "-std=c11")
    } else {
        ("CXX", "g++", "-std=c++17")
    };
    let mut compiler = Command::new(std::env::var(variable).unwrap_or_else(|_| usual.into()));
    compiler.args([standard, "-Wall", "-Wextra", "-Werror", "-pedantic", "-g"]);
    compiler
}

fn compile(command: &mut Command, what: &str) {
    let output = finished(command, "build the programs in C and C++");
    assert!(output.status.success(), "{what}:\n{}", shown(&output));
}

/// A program of some sources, linked with the shared and with the static library.
fn built(name: &str, sources: &[&str]) -> [PathBuf; 2] {
    let objects: Vec<PathBuf> = sources
        .iter()
        .map(|source| {
            let object = workshop().join(source.replace('/', "-")).with_extension(
                // A C and a C++ file may bear one name.
                if source.ends_with(".c") {
                    "c.o"
                } else {
                    "cpp.o"
                },
            );
            let mut command = compiler(source);
            command
                .arg(format!(
                    "-I{}",
                    root().join("beamcore-ffi/include").display()
                ))
                .arg("-c")
                .arg(root().join(source))
                .arg("-o")
                .arg(&object);
            compile(&mut command, source);
            object
        })
        .collect();
    let libraries = libraries();
    ["shared", "static"].map(|kind| {
        let program = workshop().join(format!("{name}-{kind}"));
        let mut command = compiler(sources[0]);
        command.args(&objects).arg("-o").arg(&program);
        if kind == "shared" {
            command
                .arg(format!("-L{}", libraries.display()))
                .arg("-lbeamcore_ffi")
                .arg(format!("-Wl,-rpath,{}", libraries.display()))
                .args(["-lm", "-lpthread"]);
        } else {
            command
                .arg(libraries.join("libbeamcore_ffi.a"))
                .args(SYSTEM_LIBRARIES)
                .arg("-lm");
        }
        compile(&mut command, &format!("{name} with the {kind} library"));
        program
    })
}

/// What a program prints; it must succeed.
fn run(program: &Path, arguments: &[&Path]) -> String {
    let mut command = if std::env::var_os("BEAMCORE_VALGRIND").is_some_and(|value| value == "1") {
        let mut valgrind = Command::new("valgrind");
        valgrind
            .args(["--error-exitcode=99", "--leak-check=full", "-q"])
            .arg("--errors-for-leak-kinds=definite,indirect")
            .arg(program);
        valgrind
    } else {
        Command::new(program)
    };
    command.args(arguments);
    // The path of cargo may lead to the library of an earlier build; the program knows its own.
    command.env_remove("LD_LIBRARY_PATH");
    let output = finished(&mut command, "run the programs in C and C++");
    assert!(
        output.status.success(),
        "{} ({}):\n{}",
        program.display(),
        output.status,
        shown(&output)
    );
    String::from_utf8(output.stdout).expect("programs print UTF-8")
}

/// Builds a program and runs it with both libraries, which must print the same.
fn printed(name: &str, sources: &[&str], arguments: &[&Path]) -> String {
    let [shared, archive] = built(name, sources).map(|program| run(&program, arguments));
    assert_eq!(shared, archive, "{name}");
    shared
}

#[test]
fn the_test_programs_in_c_pass() {
    for name in [
        "materials",
        "outlines",
        "sections",
        "strains",
        "layers",
        "members",
        "plans",
        "supports",
        "shapes",
        "imposed",
        "slips",
        "simplified",
        "comparisons",
        "limits",
        "documents",
        "errors",
        "misuse",
        "misuse_layers",
        "threads",
    ] {
        printed(name, &[&format!("tests/c/{name}.c")], &[workshop()]);
    }
}

#[test]
fn the_test_programs_in_cpp_pass() {
    for name in [
        "wrapper",
        "wrapper_sections",
        "wrapper_layers",
        "wrapper_shapes",
        "exceptions",
    ] {
        printed(name, &[&format!("tests/c/{name}.cpp")], &[]);
    }
}

#[test]
fn wrong_jobs_give_their_messages() {
    let folder = root().join("tests/bad-jobs");
    printed("wrong-jobs-c", &["tests/c/wrong_jobs.c"], &[&folder]);
    printed("wrong-jobs-cpp", &["tests/c/wrong_jobs.cpp"], &[&folder]);
}

#[test]
fn golden_answers_have_the_bits_of_rust() {
    let folder = root().join("tests/golden");
    let (answers, _) = runner::job(&folder).expect("the golden cases are good jobs");
    let typed = runner::typed().expect("the typed cases are good members");
    for (name, sources) in [
        (
            "golden-c",
            &[
                "tests/c/golden.c",
                "tests/c/golden_typed.c",
                "tests/c/golden_roof_beam.c",
                "tests/c/golden_odd_section.c",
                "tests/c/golden_shrinking_slab.c",
                "tests/c/golden_layers.c",
                "tests/c/golden_screwed_floor.c",
                "tests/c/golden_haunched_beam.c",
                "tests/c/golden_rafter.c",
                "tests/c/golden_side_plates.c",
                "tests/c/golden_lift_off.c",
            ][..],
        ),
        (
            "golden-cpp",
            &[
                "tests/c/golden.cpp",
                "tests/c/golden_roof_beam.cpp",
                "tests/c/golden_odd_section.cpp",
                "tests/c/golden_shrinking_slab.cpp",
                "tests/c/golden_layers.cpp",
                "tests/c/golden_screwed_floor.cpp",
                "tests/c/golden_haunched_beam.cpp",
                "tests/c/golden_rafter.cpp",
                "tests/c/golden_side_plates.cpp",
                "tests/c/golden_lift_off.cpp",
            ][..],
        ),
    ] {
        for program in built(name, sources) {
            assert_same(name, &answers, &run(&program, &["job".as_ref(), &folder]));
            assert_same(name, &typed, &run(&program, &["typed".as_ref()]));
        }
    }
}

/// Whether two answers are the same, told by the first line that differs.
fn assert_same(name: &str, rust: &str, other: &str) {
    for (ours, theirs) in rust.lines().zip(other.lines()) {
        assert_eq!(ours, theirs, "{name}");
    }
    assert_eq!(rust.lines().count(), other.lines().count(), "{name}");
}

#[test]
fn the_examples_print_what_readme_says() {
    let c = printed("small-member-c", &["examples/c/small_member.c"], &[]);
    let cpp = printed("small-member-cpp", &["examples/cpp/small_member.cpp"], &[]);
    assert_eq!(c, "deflection 8.43 mm at 1.80 m\n");
    assert_eq!(c, cpp);
}

/// The programs in C between them call every function of the header.
#[test]
fn every_function_is_called() {
    let read = |path: PathBuf| std::fs::read_to_string(path).expect("a source is readable");
    let folder = root().join("tests/c");
    let programs: String = std::fs::read_dir(folder)
        .expect("the programs are in tests/c")
        .map(|entry| entry.expect("a folder can be listed").path())
        .filter(|path| path.extension().is_some_and(|ending| ending == "c"))
        .map(read)
        .collect();
    let header = read(root().join("beamcore-ffi/include/beamcore.h"));
    let declared: Vec<_> = header
        .lines()
        .filter(|line| !line.trim_start().starts_with("//") && !line.starts_with(" *"))
        .filter_map(|line| line.split_once('(')?.0.split(' ').next_back())
        .filter(|name| name.starts_with("bc_"))
        .collect();
    assert!(declared.len() > 300, "{}", declared.len());
    for name in declared {
        assert!(
            programs.contains(&format!("{name}(")),
            "{name} is not called"
        );
    }
}
