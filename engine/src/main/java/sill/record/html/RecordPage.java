package sill.record.html;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import sill.markup.Markup;
import sill.record.DesignRecord;
import sill.record.RecordJson;

/**
 * A record as one HTML file, laid out as a calculation sheet: verdict, checks and problems first, then the cells in order,
 * the trace, and the title block and digests at the foot. The record's JSON lies inside it, in the element {@code sill-record}. The page works without its script.
 */
public final class RecordPage {
    /** The id of the element that holds the JSON. */
    public static final String JSON_ELEMENT = "sill-record";

    private RecordPage() {}

    /** The page; the same record gives the same text. */
    public static String write(DesignRecord record) {
        Markup page = new Markup();
        page.trusted("<!DOCTYPE html>").line();
        page.open("html", "lang", language(record.titleBlock())).line();
        String script = "\n" + Inline.resource(Inline.PEEK);
        head(page, record, script);
        page.open("body").line();
        Heading.write(page, record);
        page.open("main").line();
        RecordTrace trace = RecordTrace.of(record);
        Checks.write(page, record, trace);
        Problems.write(page, record);
        Cells.write(page, record, trace);
        TraceSection.write(page, trace);
        page.close().line();
        Foot.write(page, record);
        page.open("script", "type", "application/json", "id", JSON_ELEMENT);
        page.trusted(inert(RecordJson.write(record))).close().line();
        page.open("script").trusted(script).close().line();
        page.close().line();
        page.close().line();
        return page.toString();
    }

    private static void head(Markup page, DesignRecord record, String script) {
        String style = Style.of(record.titleBlock());
        page.open("head").line();
        page.single("meta", "charset", "utf-8").line();
        page.single(
                        "meta",
                        "http-equiv",
                        "Content-Security-Policy",
                        "content",
                        "default-src 'none'; style-src '" + Inline.digest(style) + "'; script-src '"
                                + Inline.digest(script)
                                + "'; img-src data:; base-uri 'none'; form-action 'none'")
                .line();
        page.single("meta", "name", "viewport", "content", "width=device-width, initial-scale=1")
                .line();
        page.single("meta", "name", "color-scheme", "content", "light dark").line();
        page.single("meta", "name", "referrer", "content", "no-referrer").line();
        page.leaf("title", windowTitle(record)).line();
        page.open("style").trusted(style).close().line();
        page.close().line();
    }

    private static String windowTitle(DesignRecord record) {
        String number = record.titleBlock().getOrDefault("number", "");
        String title = Heading.title(record);
        return number.isEmpty() ? title : number + " " + title;
    }

    /**
     * The language of the sheet as an HTML language tag. Only a language that Java knows by its ISO 639 code is passed on; a
     * wrong tag would make a screen reader choose a wrong voice.
     */
    private static String language(Map<String, String> titleBlock) {
        List<String> parts =
                Arrays.asList(titleBlock.getOrDefault("language", "en").strip().split("[-_]"));
        String language = parts.get(0).toLowerCase(Locale.ROOT);
        if (!Arrays.asList(Locale.getISOLanguages()).contains(language)) {
            return "en";
        }
        String region = parts.size() == 2 ? parts.get(1).toUpperCase(Locale.ROOT) : "";
        return Arrays.asList(Locale.getISOCountries()).contains(region) ? language + "-" + region : language;
    }

    /** JSON in which no text can end the script element or be read as markup; the characters only occur in JSON strings. */
    static String inert(String json) {
        StringBuilder inert = new StringBuilder(json.length() + json.length() / 8);
        int copied = 0;
        for (int i = 0; i < json.length(); i++) {
            String escape =
                    switch (json.charAt(i)) {
                        case '&' -> "\\u0026";
                        case '<' -> "\\u003c";
                        case '>' -> "\\u003e";
                        case '\u2028' -> "\\u2028";
                        case '\u2029' -> "\\u2029";
                        default -> "";
                    };
            if (!escape.isEmpty()) {
                inert.append(json, copied, i).append(escape);
                copied = i + 1;
            }
        }
        return inert.append(json, copied, json.length()).toString();
    }
}
