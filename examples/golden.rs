//! The golden runner as a program: `golden job FOLDER` answers the golden cases of a folder
//! through job text, `golden typed` through the typed way.

use std::path::Path;
use std::process::ExitCode;

#[path = "../tests/golden/runner.rs"]
mod runner;

fn main() -> ExitCode {
    let arguments: Vec<String> = std::env::args().skip(1).collect();
    let answer = match arguments.iter().map(String::as_str).collect::<Vec<_>>()[..] {
        ["job", folder] => runner::job(Path::new(folder)),
        ["typed"] => runner::typed().map(|answers| (answers, Vec::new())),
        _ => {
            eprintln!("usage: golden job FOLDER | golden typed");
            return ExitCode::FAILURE;
        }
    };
    match answer {
        Ok((answers, misses)) => {
            print!("{answers}");
            misses.iter().for_each(|miss| eprintln!("{miss}"));
            if misses.is_empty() {
                ExitCode::SUCCESS
            } else {
                ExitCode::FAILURE
            }
        }
        Err(error) => {
            eprintln!("{error}");
            ExitCode::FAILURE
        }
    }
}
