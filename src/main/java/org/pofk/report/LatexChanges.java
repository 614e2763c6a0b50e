package org.pofk.report;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A rule in the margin beside what has changed, in plain TeX that every LaTeX has: what is beside the rule is set in a
 * box, a high one in pieces, so that pages may end within it. A table, which can't stand in a box, gets the rule in its
 * rows.
 */
final class LatexChanges {
    /** Leave alone those who read LaTeX without a TeX: to them the environment is one they don't know. */
    static final List<String> DEFINITIONS = List.of("\\makeatletter",
            "\\newbox\\pofkchangedbox \\newbox\\pofkchangedpart",
            "\\@namedef{pofkchangedrule}{\\par\\noindent\\llap{\\vrule width 1.2pt height\\ht\\pofkchangedpart"
                    + " depth\\dp\\pofkchangedpart\\hskip 8pt}\\box\\pofkchangedpart\\par}",
            "\\@namedef{pofkchanged}{\\par\\setbox\\pofkchangedbox\\vbox\\bgroup\\hsize\\linewidth\\@parboxrestore"
                    + "\\parskip4pt plus 2pt\\def\\@listi{\\leftmargin\\leftmargini\\topsep0pt\\partopsep0pt\\parsep4pt"
                    + "\\itemsep0pt}\\abovedisplayskip3pt\\belowdisplayskip3pt\\abovedisplayshortskip0pt"
                    + "\\belowdisplayshortskip3pt}",
            "\\@namedef{endpofkchanged}{\\par\\egroup\\splittopskip=10pt\\vbadness10000\\vfuzz\\maxdimen"
                    + "\\loop\\ifdim\\ht\\pofkchangedbox>.5\\textheight"
                    + "\\setbox\\pofkchangedpart\\vsplit\\pofkchangedbox to .25\\textheight"
                    + "\\setbox\\pofkchangedpart\\vbox{\\unvbox\\pofkchangedpart}"
                    + "\\pofkchangedrule\\repeat\\setbox\\pofkchangedpart\\box\\pofkchangedbox\\pofkchangedrule}",
            "\\makeatother");
    private static final Pattern FIRST_COLUMN = Pattern.compile("^\\\\begin\\{(?:longtable|tabular)}\\{@\\{");

    private LatexChanges() {
    }

    /** The lines of a table, with the rule beside its rows. */
    static List<String> table(List<String> lines) {
        return lines.stream().map(line -> FIRST_COLUMN.matcher(line).replaceFirst(begin ->
                Matcher.quoteReplacement(begin.group() + "\\hskip-9.2pt\\vrule width 1.2pt\\hskip8pt"))).toList();
    }
}
