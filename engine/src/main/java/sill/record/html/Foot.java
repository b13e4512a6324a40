package sill.record.html;

import java.util.LinkedHashMap;
import java.util.Map;
import sill.markup.Markup;
import sill.record.DesignRecord;

/** The foot of the sheet: title block, digests, how to run it again, and the caution. */
final class Foot {
    /** Fields of the title block with the words of ISO 7200:2004. */
    private static final Map<String, String> FIELDS = new LinkedHashMap<>();

    static {
        FIELDS.put("owner", "Legal owner");
        FIELDS.put("title", "Title");
        FIELDS.put("number", "Identification number");
        FIELDS.put("revision", "Revision");
        FIELDS.put("date", "Date of issue");
        FIELDS.put("creator", "Creator");
        FIELDS.put("approver", "Approved by");
        FIELDS.put("type", "Document type");
        FIELDS.put("language", "Language");
    }

    private Foot() {}

    static void write(Markup page, DesignRecord record) {
        page.open("footer").line();
        titleBlock(page, record.titleBlock());
        digests(page, record);
        rerun(page, record);
        page.leaf(
                        "p",
                        "Caution: the results are design aids. What switches mains voltage or protects people follows"
                                + " local codes and the judgement of a licensed practitioner.",
                        "class",
                        "caution")
                .line();
        page.close().line();
    }

    private static void titleBlock(Markup page, Map<String, String> block) {
        page.open("section", "aria-labelledby", "title-block").line();
        page.leaf("h2", "Title block", "id", "title-block").line();
        page.open("dl", "class", "title-block");
        FIELDS.forEach((key, name) -> {
            String text = block.getOrDefault(key, "");
            if (!text.isEmpty()) {
                field(page, "block-" + key, name, text);
            }
        });
        block.forEach((key, text) -> {
            if (!FIELDS.containsKey(key)) {
                field(page, "block-other", key, text);
            }
        });
        page.close().close().line();
    }

    private static void field(Markup page, String cssClass, String name, String text) {
        page.open("div", "class", cssClass).leaf("dt", name).leaf("dd", text).close();
    }

    private static void digests(Markup page, DesignRecord record) {
        page.open("section", "aria-labelledby", "digests").line();
        page.leaf("h2", "Made from", "id", "digests").line();
        page.open("table", "class", "plain digests");
        page.leaf("caption", "Files with their SHA-256 digests", "class", "unseen");
        Tables.head(page, "File", "SHA-256");
        page.open("tbody").line();
        digest(page, record.worksheet().file(), record.worksheet().sha256());
        record.files().forEach(file -> digest(page, file.path(), file.sha256()));
        page.close().close().line();
        DesignRecord.Made made = record.made();
        page.leaf("p", "Made by Sill " + made.sill() + " on Java " + made.java() + " at " + made.at() + ".");
        page.close().line();
    }

    private static void digest(Markup page, String file, String sha256) {
        page.open("tr").open("th", "scope", "row").leaf("code", file).close();
        page.open("td").leaf("code", sha256).close().close().line();
    }

    /** Only what this version can do is told as an instruction. */
    private static void rerun(Markup page, DesignRecord record) {
        page.open("p", "class", "rerun").text("To run it again, run the worksheet with its data beside it: ");
        page.leaf("code", "sill run " + quoted(record.worksheet().file()));
        page.text(". This file carries both; a Sill that has the command ");
        page.leaf("code", "sill rerun");
        page.text(" will run it from here and tell what differs.").close().line();
    }

    private static String quoted(String name) {
        return name.matches("[A-Za-z0-9._/-]+") ? name : "\"" + name + "\"";
    }
}
