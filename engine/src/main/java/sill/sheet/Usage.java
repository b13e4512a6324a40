package sill.sheet;

/**
 * A name of the sheet, used somewhere in it.
 *
 * @param name a given, a result (by field name), a method or a type of the worksheet
 * @param kind what the name is
 * @param how what is done with it
 * @param piece the piece it is used in
 * @param offset where in the piece
 * @param deferred whether it stands in a lambda, method or type body, which may run later than it stands
 */
record Usage(String name, Kind kind, How how, Piece piece, int offset, boolean deferred) {
    /** What a used name is. */
    enum Kind {
        VALUE,
        METHOD,
        TYPE
    }

    /** What is done with it. */
    enum How {
        READ,
        /** Assigned, also by {@code +=} or {@code ++}. */
        ASSIGNED,
        /** An element of it is assigned, or a call without a value may change it from inside. */
        ALTERED
    }
}
