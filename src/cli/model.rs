//! `model`: the checked model as JSON.

use std::path::Path;

use super::arguments::{ModelCommand, Schema};
use super::{Status, output, session};
use crate::{diagnostics, model, report};

pub fn run(command: &ModelCommand) -> Status {
    if let Some(schema) = command.schema {
        return output::print(&match schema {
            Schema::Model => model::schema(),
            Schema::Report => report::schema(),
            Schema::Diagnostic => diagnostics::schema(),
        });
    }
    command.files.iter().map(|file| one(file, command)).max().unwrap_or(Status::Well)
}

fn one(file: &Path, command: &ModelCommand) -> Status {
    let compiled = match session::compile(file) {
        Ok(compiled) => compiled,
        Err(status) => return status,
    };
    let told = session::tell(&compiled.diagnostics, &compiled.sources, command.format);
    match &compiled.model {
        Some(model) => told.max(output::print(&model::json(model))),
        None => told,
    }
}
