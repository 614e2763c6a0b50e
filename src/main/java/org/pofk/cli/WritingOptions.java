package org.pofk.cli;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.pofk.report.LatexLayout;
import org.pofk.text.Alphabet;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** How and where the answer is written. */
final class WritingOptions {
    private final CommandName command;
    private final Set<Format> offered;

    @Option(names = "--as", paramLabel = "FORMAT", split = ",", splitSynopsisLabel = ",",
            description = "${COMPLETION-CANDIDATES}; otherwise from the name of the file, or text;"
                    + " several go into a folder, with --save-in")
    private List<Format> as = new ArrayList<>();

    @Option(names = "--save-in", paramLabel = "FOLDER",
            description = "writes a file for each format of --as into a folder, all or none, named after the model"
                    + " and the command")
    private Optional<Path> folder = Optional.empty();

    @Option(names = "--plain", description = "text in ASCII characters only")
    private boolean plain;

    @Option(names = "--fragment", description = "LaTeX to be put into a document of yours by \\input, not a whole one")
    private boolean fragment;

    @Option(names = "--figures", paramLabel = "WHERE", defaultValue = "inside",
            description = "in LaTeX: inside, or files: PNG and PDF beside it, so that a converter to other formats takes"
                    + " them along; ${DEFAULT-VALUE} otherwise")
    private Figures figures;

    @Mixin
    private SaveOptions save = new SaveOptions();

    /** Where the figures of LaTeX are. */
    enum Figures {
        INSIDE(LatexLayout.Figures.INSIDE), FILES(LatexLayout.Figures.IN_FILES);

        private final LatexLayout.Figures place;

        Figures(LatexLayout.Figures place) {
            this.place = place;
        }

        @Override
        public String toString() {
            return Words.lowerCase(this);
        }
    }

    /** For a command that writes the formats of any document and some besides. */
    WritingOptions(CommandName command, Format... besides) {
        this.command = command;
        this.offered = EnumSet.copyOf(Format.OF_DOCUMENTS);
        this.offered.addAll(List.of(besides));
    }

    /** The formats this command writes, as they are typed. */
    List<String> offered() {
        return offered.stream().map(Format::toString).toList();
    }

    /**
     * As what and where to the answer is written, about the model or the claims in a file. Refused where that
     * contradicts itself, isn't offered, or where a file isn't to be replaced.
     */
    Destination destination(Path about) throws UsageException {
        List<Destination.Target> asked = folder.isPresent() ? inFolder(folder.get(), about)
                : List.of(new Destination.Target(format(), save.file()));
        for (Destination.Target target : asked) {
            requireOffered(target);
        }
        requireLatex(asked);
        boolean isMade = figures == Figures.FILES || asked.stream().anyMatch(target -> target.format() == Format.PDF);
        Optional<Pdflatex> pdflatex = isMade ? Pdflatex.installed() : Optional.empty();
        List<Destination.Target> targets = pdflatex.isPresent() ? asked
                : asked.stream().map(WritingOptions::asArticle).toList();
        LatexLayout layout = new LatexLayout(targets.get(0).file().map(WritingOptions::name)
                .orElse(name(about) + "-" + command.word()), figures.place);
        save.check(targets.stream().flatMap(target -> target.file().stream()).toList());
        if (figures == Figures.FILES) {
            save.check(firstFigure(targets, layout));
        }
        return new Destination(targets, new DocumentForms(plain ? Alphabet.ASCII : Alphabet.UNICODE,
                fragment ? DocumentForms.LatexPart.FRAGMENT : DocumentForms.LatexPart.ARTICLE, layout), pdflatex, save);
    }

    private void requireLatex(List<Destination.Target> targets) throws UsageException {
        Optional<Destination.Target> latex = targets.stream().filter(target -> target.format() == Format.LATEX).findFirst();
        if (fragment && latex.isEmpty()) {
            throw new UsageException("--fragment is a part of a LaTeX document; there is no --as latex");
        }
        if (figures == Figures.FILES && latex.flatMap(Destination.Target::file).isEmpty()) {
            throw new UsageException("--figures files stand beside a LaTeX document: --save FILE.tex");
        }
    }

    /** Those of the first figure stand for all: whether there are more is known after the work. */
    private static List<Path> firstFigure(List<Destination.Target> targets, LatexLayout layout) {
        return targets.stream().filter(target -> target.format() == Format.LATEX)
                .flatMap(target -> target.file().stream()).flatMap(file -> Stream.of(".png", ".pdf")
                        .map(ending -> file.resolveSibling(layout.file(1) + ending))).toList();
    }

    /** A file's name without its ending. */
    private static String name(Path file) {
        return file.getFileName().toString().replaceFirst("(?<=.)\\.[^.]*$", "");
    }

    /** The LaTeX of a PDF, beside where that was to be. */
    private static Destination.Target asArticle(Destination.Target target) {
        return target.format() != Format.PDF ? target : new Destination.Target(Format.PDF, target.file().map(file ->
                file.resolveSibling(name(file) + Format.LATEX.ending())));
    }

    private List<Destination.Target> inFolder(Path folder, Path about) throws UsageException {
        if (save.file().isPresent()) {
            throw new UsageException("--save names one file, --save-in a folder of them; one of the two is enough");
        }
        if (as.isEmpty()) {
            throw new UsageException("which formats are to be saved in '" + folder + "'? Say  --as "
                    + String.join(",", offered()) + "  or some of them");
        }
        if (!Files.isDirectory(folder)) {
            throw new UsageException("there is no folder '" + folder + "'");
        }
        String name = name(about) + "-" + command.word();
        return as.stream().distinct().map(format -> new Destination.Target(format,
                Optional.of(folder.resolve(name + format.ending())))).toList();
    }

    private void requireOffered(Destination.Target target) throws UsageException {
        if (!offered.contains(target.format())) {
            throw new UsageException(command.word() + " writes no " + target.format() + "; it writes "
                    + Words.listed(offered(), "and"));
        }
        if (target.format() == Format.PDF && target.file().isEmpty()) {
            throw new UsageException("a PDF goes to a file: --save FILE.pdf");
        }
    }

    /** Where a file of YAML goes, which this command writes in place of its answer. */
    SaveOptions destinationOfYaml(String what) throws UsageException {
        if (!as.isEmpty() || folder.isPresent() || plain || fragment || figures == Figures.FILES) {
            throw new UsageException(what + " is YAML; --as, --save-in, --plain, --figures and --fragment are for the answer of "
                    + command.word());
        }
        if (save.file().flatMap(Format::of).isPresent()) {
            throw new UsageException(what + " is YAML; give '" + save.file().get() + "' an ending of .yaml");
        }
        save.check();
        return save;
    }

    private Format format() throws UsageException {
        save.check();
        Optional<Path> file = save.file();
        if (as.size() > 1) {
            throw new UsageException("several formats are several files; name a folder for them with --save-in");
        }
        Optional<Format> said = as.stream().findFirst();
        Optional<Format> named = file.flatMap(Format::of);
        if (file.isPresent() && named.isEmpty() && said.isEmpty()) {
            throw new UsageException("what is '" + file.get() + "' to hold? Name it with an ending of "
                    + String.join(", ", Format.endings(offered)) + ", or say with --as");
        }
        if (said.isPresent() && named.isPresent() && said.get() != named.get()) {
            throw new UsageException("--as " + said.get() + " and the name '" + file.orElseThrow()
                    + "' ask for two different formats");
        }
        return said.or(() -> named).orElse(Format.TEXT);
    }
}
