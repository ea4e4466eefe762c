package manyskies.specification;

/**
 * One thing that is wrong with a specification file.
 *
 * @param line line of the file, from 1; 0 where the fault is the file's as a whole
 * @param sentence what was found, what is allowed and how to mend it
 */
public record Fault(int line, String sentence) {}
