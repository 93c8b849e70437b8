use super::paths::join;

#[test]
fn paths_count_from_the_folder_of_their_file() {
    assert_eq!(join("a/b.wright", "c.wright"), Ok("a/c.wright".to_string()));
    assert_eq!(join("a/b.wright", "../x//./c.wright"), Ok("x/c.wright".to_string()));
    assert_eq!(join("b.wright", "engines/c.wright"), Ok("engines/c.wright".to_string()));
}

#[test]
fn paths_that_leave_the_project_are_refused() {
    for path in ["../c.wright", "/etc/c", "C:/c", "a\\b", "", "a/", "a/../../b", "a\0b", "x/.."] {
        assert!(join("b.wright", path).is_err(), "{path:?}");
    }
}
