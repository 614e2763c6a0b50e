package org.pofk.input;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Convention;
import org.pofk.claim.Claim;
import org.pofk.claim.Claims;
import org.pofk.claim.Claims.Review;
import org.pofk.text.Faults;
import org.pofk.text.RefusedException;

/**
 * Reads claims files and the models they are about. A file that can't be accepted is refused with all its faults at
 * their places, and all of its model. Linear in the length of both but for the arithmetic.
 */
public final class ClaimsReader {
    private static final List<String> KEYS = List.of("pofk-claims", "title", "model", "review", "claims");

    private final Source source;
    private final Optional<Path> folder;
    private final Overrides overrides;
    private final Reading reading;

    private ClaimsReader(Source source, Optional<Path> folder, Overrides overrides, Reading reading) {
        this.source = source;
        this.folder = folder;
        this.overrides = overrides;
        this.reading = reading;
    }

    /** The claims in a file; the model it names lies beside it. Refused with every fault of both. */
    public static Claims read(Path file, Overrides overrides) throws RefusedException {
        return read(Source.read(file), Optional.ofNullable(file.getParent()), overrides);
    }

    /** The claims in a text; the model it names lies in {@code folder}, or where the program runs. */
    public static Claims read(Source source, Optional<Path> folder, Overrides overrides) throws RefusedException {
        FileKind.of(source).require(FileKind.CLAIMS, source);
        Faults faults = new Faults();
        Node root = YamlComposer.compose(source, faults);
        Reading reading = new Reading(faults, overrides);
        Optional<Claims> claims = reading.mapping(root, "a claims file", "{pofk-claims: 1, model: …, claims: […]}")
                .flatMap(new ClaimsReader(source, folder, overrides, reading)::claims);
        faults.refuseIfAny();
        return claims.orElseThrow();
    }

    private Optional<Claims> claims(Node.Mapping root) {
        Fields fields = Fields.of(root, "claims", KEYS, reading);
        checkVersion(fields, root);
        Optional<Model> model = model(fields, root);
        Review review = fields.value("review").filter(node -> !isAbsent(node))
                .map(node -> ReviewSection.read(node, reading)).orElse(Review.NOTHING);
        Convention convention = review.convention().or(() -> model.map(Model::convention)).orElse(Convention.COLUMNS);
        ClaimSection section = new ClaimSection(new ClaimNames(model.map(Model::chain), reading), review, convention,
                reading);
        List<Claim> claims = new ArrayList<>();
        List<Node> written = fields.value("claims").map(this::items).orElse(List.of());
        for (int i = 0; i < written.size(); i++) {
            section.read(written.get(i), i + 1).ifPresent(claims::add);
        }
        return model.map(known -> new Claims(known, new Model.Origin(source.name(), source.sha256()), review, claims));
    }

    private List<Node> items(Node node) {
        return isAbsent(node) ? List.of()
                : reading.sequence(node, "'claims'", "[{value: OUTPUT, at: 5, is: 0.008}]")
                        .map(Node.Sequence::items).orElse(List.of());
    }

    /** A section all of whose lines are commented out. */
    private static boolean isAbsent(Node node) {
        return node.asScalar().filter(Node.Scalar::isAbsent).isPresent();
    }

    private void checkVersion(Fields fields, Node.Mapping root) {
        Optional<Node> version = fields.value("pofk-claims");
        if (version.isEmpty()) {
            reading.fault(root.position(), "version-missing",
                    "the key 'pofk-claims' is missing; begin the file with pofk-claims: 1");
        } else if (version.get().asScalar().filter(value -> value.text().strip().equals("1")).isEmpty()) {
            reading.fault(version.get().position(), "version-unknown",
                    "this format is pofk-claims: 1, not " + version.get().inWords());
        }
    }

    /** The model, or faults and nothing: its own, at their places in it. */
    private Optional<Model> model(Fields fields, Node.Mapping root) {
        if (fields.value("model").isEmpty()) {
            reading.fault(root.position(), "model-missing",
                    "the key 'model' is missing; name the model the claims are about, model: pumps.yaml");
            return Optional.empty();
        }
        Optional<Node.Scalar> named = reading.scalar(fields.value("model").get(), "'model'");
        return named.flatMap(name -> {
            try {
                return Optional.of(ModelBeside.read(name, folder, overrides));
            } catch (RefusedException refused) {
                reading.faults().addAll(refused.faults());
                return Optional.empty();
            }
        });
    }
}
