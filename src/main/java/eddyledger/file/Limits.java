package eddyledger.file;

import com.fasterxml.jackson.core.StreamReadConstraints;

/**
 * How big a file may be, so that a spoilt or hostile one cannot fill the memory or the stack.
 *
 * @param bytes size of the file
 * @param depth objects and lists within one another
 * @param textLength characters of one text
 * @param numberLength characters of one number
 * @param keyLength characters of one key
 * @param tokens braces, brackets, keys and values together
 */
record Limits(long bytes, int depth, int textLength, int numberLength, int keyLength, long tokens) {

  /** Far above any vehicle, far below what a computer cannot hold. */
  static Limits ofBytes(long bytes) {
    return new Limits(bytes, 200, 100_000, 1_000, 1_000, 2_000_000L);
  }

  StreamReadConstraints constraints() {
    return StreamReadConstraints.builder()
        .maxNestingDepth(depth)
        .maxStringLength(textLength)
        .maxNumberLength(numberLength)
        .maxNameLength(keyLength)
        .maxTokenCount(tokens)
        .build();
  }
}
