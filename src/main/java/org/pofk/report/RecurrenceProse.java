package org.pofk.report;

/** What terms that were compared have in common. */
final class RecurrenceProse {
    private RecurrenceProse() {
    }

    /** Behind so many terms: {@code satisfy a recurrence of order 2}; one of order 0 says that they are zero. */
    static String satisfied(int terms, int order) {
        String satisfied = terms == 1 ? "satisfies" : "satisfy";
        String zero = terms == 1 ? "is zero" : "are zero";
        return order == 0 ? zero : satisfied + " a recurrence of order " + order;
    }
}
