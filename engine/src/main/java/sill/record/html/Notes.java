package sill.record.html;

import java.net.URI;
import java.net.URISyntaxException;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import org.commonmark.node.AbstractVisitor;
import org.commonmark.node.Heading;
import org.commonmark.node.Image;
import org.commonmark.node.Link;
import org.commonmark.node.Node;
import org.commonmark.node.Text;
import org.commonmark.parser.Parser;
import org.commonmark.renderer.html.HtmlRenderer;
import sill.markup.Markup;
import sill.markup.VisibleText;

/**
 * Notes: CommonMark as HTML. Raw HTML is shown as text; a link that is not to the web or a mailbox is shown as text with its
 * address; nothing is fetched, so an image is shown as a link or its description.
 */
final class Notes {
    private static final Parser PARSER = Parser.builder().build();
    private static final HtmlRenderer RENDERER =
            HtmlRenderer.builder().escapeHtml(true).percentEncodeUrls(true).build();
    private static final Set<String> SCHEMES = Set.of("http", "https", "mailto");

    /** The cell's own heading is at level 3. */
    private static final int CELL_LEVEL = 3;

    /** Deeper trees, which nobody writes by hand, are shown as typed: rendering them would exhaust the stack. */
    private static final int DEEPEST = 100;

    private Notes() {}

    static void write(Markup page, String commonMark) {
        Optional<String> html = html(VisibleText.of(commonMark));
        if (html.isPresent()) {
            page.open("div", "class", "prose")
                    .line()
                    .trusted(html.get())
                    .close()
                    .line();
        } else {
            page.leaf("pre", commonMark, "class", "prose").line();
        }
    }

    /** The note as HTML; nothing when it is nested too deep. */
    private static Optional<String> html(String commonMark) {
        try {
            Node note = PARSER.parse(commonMark);
            if (depth(note) > DEEPEST) {
                return Optional.empty();
            }
            note.accept(new Fitting());
            return Optional.of(RENDERER.render(note));
        } catch (StackOverflowError e) {
            // The parser recurses and has no limit of its own; whatever overflows it lies far beyond ours.
            return Optional.empty();
        }
    }

    /** How deep the tree is; the walk itself needs no stack. */
    private static int depth(Node root) {
        int depth = 0;
        int deepest = 0;
        Node at = root;
        while (at != null) {
            if (at.getFirstChild() != null) {
                at = at.getFirstChild();
                depth++;
                deepest = Math.max(deepest, depth);
                continue;
            }
            while (at != root && at != null && at.getNext() == null) {
                at = at.getParent();
                depth--;
            }
            at = at == root || at == null ? null : at.getNext();
        }
        return deepest;
    }

    /** Makes a note's tree fit into the page. */
    private static final class Fitting extends AbstractVisitor {
        private int level = CELL_LEVEL;

        /** Headings go below the cell's, and no level is skipped on the way down. */
        @Override
        public void visit(Heading heading) {
            level = Math.min(Math.min(level + 1, CELL_LEVEL + heading.getLevel()), 6);
            heading.setLevel(level);
            visitChildren(heading);
        }

        @Override
        public void visit(Link link) {
            visitChildren(link);
            if (!isOpenable(link.getDestination())) {
                unwrap(link, " (" + link.getDestination() + ")");
            }
        }

        @Override
        public void visit(Image image) {
            visitChildren(image);
            unwrap(image, " (image " + image.getDestination() + ", not part of this record)");
        }

        private static void unwrap(Node node, String remark) {
            node.insertAfter(new Text(remark));
            while (node.getLastChild() != null) {
                node.insertAfter(node.getLastChild());
            }
            node.unlink();
        }

        private static boolean isOpenable(String destination) {
            try {
                URI uri = new URI(destination);
                return uri.getScheme() != null
                        && SCHEMES.contains(uri.getScheme().toLowerCase(Locale.ROOT))
                        && (uri.isOpaque() || uri.getHost() != null);
            } catch (URISyntaxException e) {
                return false;
            }
        }
    }
}
