//! The nearest word: what was probably meant by a misspelt one.

/// The candidate that is at most two edits away from a word (one for short words, none for
/// those of three letters and less), if any.
pub fn nearest<'c>(word: &str, candidates: impl Iterator<Item = &'c str>) -> Option<&'c str> {
    if word.len() < 4 || !word.bytes().all(|byte| byte.is_ascii_alphanumeric() || byte == b'_') {
        return None;
    }
    let reach = if word.len() < 6 { 1 } else { 2 };
    let near = candidates.map(|candidate| (distance(word, candidate), candidate));
    near.filter(|(distance, _)| (1..=reach).contains(distance)).min().map(|(_, candidate)| candidate)
}

/// The number of insertions, deletions, replacements and swaps of neighbours between two words
/// (optimal string alignment). Long words are never near.
fn distance(left: &str, right: &str) -> usize {
    if left.len() > 32 || left.len().abs_diff(right.len()) > 2 {
        return usize::MAX;
    }
    let (left, right) = (left.as_bytes(), right.as_bytes());
    let mut before: Vec<usize> = Vec::new();
    let mut row: Vec<usize> = (0..=right.len()).collect();
    let mut previous = None;
    for (i, a) in left.iter().enumerate() {
        let mut next = vec![i + 1];
        let mut last = i + 1;
        for (j, b) in right.iter().enumerate() {
            let at = |row: &[usize], j: usize| row.get(j).copied().unwrap_or(usize::MAX - 1);
            last = (at(&row, j) + usize::from(a != b)).min(at(&row, j + 1) + 1).min(last + 1);
            let swapped = j.checked_sub(1).is_some_and(|k| right.get(k) == Some(a)) && previous == Some(b);
            if swapped {
                last = last.min(at(&before, j - 1) + 1);
            }
            next.push(last);
        }
        before = std::mem::replace(&mut row, next);
        previous = Some(a);
    }
    row.last().copied().unwrap_or(usize::MAX)
}

#[cfg(test)]
mod tests {
    use super::nearest;

    #[test]
    fn one_or_two_edits_are_near() {
        let words = ["vacuum", "steer", "stack"];
        let near = |word| nearest(word, words.into_iter());
        assert_eq!(near("vacum"), Some("vacuum"));
        assert_eq!(near("vcauum"), Some("vacuum"), "a swap is one edit");
        assert_eq!(near("stear"), Some("steer"));
        assert_eq!(near("stak"), Some("stack"));
        assert_eq!(near("start"), None, "two edits are too many for a short word");
        assert_eq!(near("vacuum"), None, "the word itself is not a mend");
        assert_eq!(near("sta"), None);
        assert_eq!(near("größer"), None);
    }
}
