//! README shows the example programs as they stand in their files, which other tests build and run.

use std::path::Path;

fn read(name: &str) -> String {
    let file = Path::new(env!("CARGO_MANIFEST_DIR")).join(name);
    std::fs::read_to_string(&file).unwrap_or_else(|error| panic!("{}: {error}", file.display()))
}

/// Each `<!-- FILE -->` line is followed by a fenced block with the text of that file.
///
/// `UPDATE_README=1 cargo test --test readme` writes the files into the blocks.
#[test]
fn the_blocks_are_the_example_programs() {
    let readme = read("README.md");
    let mut made = String::new();
    let mut lines = readme.lines();
    let mut shown = Vec::new();
    while let Some(line) = lines.next() {
        made += &format!("{line}\n");
        let file = line
            .strip_prefix("<!-- ")
            .and_then(|rest| rest.strip_suffix(" -->"));
        let Some(file) = file else { continue };
        let fence = lines.next().unwrap();
        assert!(fence.starts_with("```"), "{file} is followed by {fence}");
        made += &format!("{fence}\n{}```\n", read(file));
        lines
            .by_ref()
            .find(|line| *line == "```")
            .expect("the block ends");
        shown.push(file);
    }
    assert_eq!(shown.len(), 4);
    if std::env::var_os("UPDATE_README").is_some() {
        std::fs::write(
            Path::new(env!("CARGO_MANIFEST_DIR")).join("README.md"),
            &made,
        )
        .unwrap();
    } else {
        assert!(
            made == readme,
            "README is not current: run UPDATE_README=1 cargo test --test readme"
        );
    }
}

/// The messages that README shows are those of the wrong jobs.
#[test]
fn the_messages_are_real() {
    assert!(read("README.md").contains(read("tests/bad-jobs/two-mistakes.message").trim_end()));
}

/// The paths that README shows lead to numbers in the outcome of the example job.
#[test]
fn the_paths_lead_to_numbers() {
    let file = Path::new(env!("CARGO_MANIFEST_DIR")).join("examples/jobs/garden-wall.toml");
    let outcome = beamcore::job::Job::open(&file).unwrap().solve().unwrap();
    let readme = read("README.md");
    let paths: Vec<_> = readme
        .lines()
        .filter(|line| line.starts_with("combinations[") || line.starts_with("camber."))
        .collect();
    assert_eq!(paths.len(), 3);
    for path in paths {
        assert!(outcome.number(path).unwrap().is_finite(), "{path}");
    }
}

/// "Run it" and "Test it" each hold one fenced block of one command line.
#[test]
fn the_two_commands_stand_alone() {
    let readme = read("README.md");
    for (heading, command) in [
        (
            "## Run it\n\n```sh\n",
            "cargo run --release --example run_job -- examples/jobs/garden-wall.toml",
        ),
        ("## Test it\n\n```sh\n", "python3 tests/run.py"),
    ] {
        let block = readme.split(heading).nth(1).expect("the heading");
        assert_eq!(block.split("```").next().unwrap().trim(), command);
    }
}

/// The small member in Rust prints what README says.
#[test]
fn the_small_member_prints_what_readme_says() {
    let cargo = std::env::var("CARGO").unwrap_or_else(|_| "cargo".into());
    let output = std::process::Command::new(cargo)
        .args(["run", "--quiet", "--example", "small_member"])
        .current_dir(env!("CARGO_MANIFEST_DIR"))
        .output()
        .unwrap();
    assert!(
        output.status.success(),
        "{}",
        String::from_utf8_lossy(&output.stderr)
    );
    let printed = String::from_utf8(output.stdout).unwrap();
    assert!(read("README.md").contains(&format!("Each prints `{}`", printed.trim())));
}
