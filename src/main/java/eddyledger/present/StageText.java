package eddyledger.present;

/**
 * What a stage says before notes and level are put to it.
 *
 * @param sentence what happens, in plain words
 * @param origin where its values come from
 * @param rule the formula, as {@link Markup}
 * @param numbers its numbers in the followed band, as {@link Markup}
 * @param picture its small picture
 */
record StageText(
    String sentence, String origin, String rule, String numbers, StagePicture picture) {}
