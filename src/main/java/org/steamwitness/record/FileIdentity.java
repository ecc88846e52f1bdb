package org.steamwitness.record;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * What a file is known by, wherever it lies.
 *
 * @param name its base name
 * @param bytes its length
 * @param sha256 SHA-256 of its bytes, in lower case hexadecimal
 */
public record FileIdentity(String name, long bytes, String sha256) {

    /**
     * Identifies a file.
     *
     * @param name its base name
     * @param content its bytes
     * @return its identity
     */
    public static FileIdentity of(String name, byte[] content) {
        try {
            byte[] digest = MessageDigest.getInstance("SHA-256").digest(content);
            return new FileIdentity(name, content.length, HexFormat.of().formatHex(digest));
        } catch (NoSuchAlgorithmException everyPlatformHasIt) {
            throw new IllegalStateException(everyPlatformHasIt);
        }
    }
}
