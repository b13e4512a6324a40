package sill.sheet;

import java.util.List;

/** Splits a cell into snippets, as the JDK's prompt splits what is typed into it line by line. */
@FunctionalInterface
public interface Splitter {
    /**
     * The snippets of a cell, in order, without the blank space around them; text that can't be completed is one last span.
     *
     * @param source a cell's text with LF between lines
     */
    List<Span> split(String source);
}
