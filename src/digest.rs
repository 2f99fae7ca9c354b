//! Digests that tell callers whether two answers rest on the same data.

use sha2::{Digest, Sha256};

/// `sha256:` and the SHA-256 of some bytes in hexadecimal.
pub fn sha256(bytes: &[u8]) -> String {
    const HEX: &[u8; 16] = b"0123456789abcdef";
    let mut text = String::with_capacity("sha256:".len() + 64);
    text.push_str("sha256:");
    for byte in Sha256::digest(bytes) {
        text.push(char::from(HEX[usize::from(byte >> 4)]));
        text.push(char::from(HEX[usize::from(byte & 15)]));
    }
    text
}

#[cfg(test)]
mod tests {
    /// FIPS 180-4's example for the message `abc`.
    #[test]
    fn digest_of_abc() {
        assert_eq!(
            super::sha256(b"abc"),
            "sha256:ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad"
        );
    }
}
