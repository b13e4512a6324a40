package sill.sheet;

/** The forms that a snippet's text can have, each with what makes a compilation unit of it. */
enum SnippetForm {
    STATEMENT("class S { void m() throws Throwable {\n", "\n} }"),
    MEMBER("class S {\n", "\n}"),
    EXPRESSION("class S { Object m() throws Throwable { return (\n", "\n); } }"),
    IMPORT("", "\nclass S {}");

    final String before;
    final String after;

    SnippetForm(String before, String after) {
        this.before = before;
        this.after = after;
    }
}
