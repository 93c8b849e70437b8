//! Paths of files as sources write them.

/// The path, from the project's folder, of what `from` (itself such a path) calls `written`.
/// An error says why it is refused.
pub(super) fn join(from: &str, written: &str) -> Result<String, &'static str> {
    if written.is_empty() || written.ends_with('/') {
        return Err("this names no file");
    }
    if written.contains('\\') {
        return Err("folders are joined by `/`, on every system");
    }
    if written.starts_with('/') || written.as_bytes().get(1) == Some(&b':') {
        return Err("a path counts from the folder of the file that it stands in");
    }
    if written.chars().any(char::is_control) {
        return Err("a path has no control characters");
    }
    let mut parts: Vec<&str> = from.split('/').collect();
    parts.pop();
    for part in written.split('/') {
        match part {
            "" | "." => {}
            ".." if parts.pop().is_none() => return Err("this leaves the project's folder"),
            ".." => {}
            _ => parts.push(part),
        }
    }
    if parts.is_empty() { Err("this names no file") } else { Ok(parts.join("/")) }
}
