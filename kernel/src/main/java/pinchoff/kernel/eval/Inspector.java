package pinchoff.kernel.eval;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import jdk.jshell.JShell;
import jdk.jshell.Snippet;
import jdk.jshell.SourceCodeAnalysis.Documentation;
import jdk.jshell.VarSnippet;
import pinchoff.display.MimeBundle;

/** Tells what a name in a cell stands for. */
final class Inspector {
  private static final int MAX_OVERLOADS = 12;
  private static final int MAX_VALUE = 2000;

  /** A method's signature without type parameters: class, name, parameters. */
  private static final Pattern METHOD =
      Pattern.compile("(?:.*\\s)?(?:([\\w.]+)\\.)?(\\w+)\\((.*)\\).*");

  private static final Pattern FIELD = Pattern.compile("(?:([\\w.]+)\\.)?(\\w+):(.*)");

  private final SnippetCompiler compiler;
  private final JavadocIndex library;

  Inspector(SnippetCompiler compiler, JavadocIndex library) {
    this.compiler = compiler;
    this.library = library;
  }

  Optional<MimeBundle> inspect(String code, int cursor, int detail) {
    int end = cursor;
    while (end < code.length() && Character.isJavaIdentifierPart(code.charAt(end))) {
      end++;
    }
    int start = Math.min(cursor, end);
    while (start > 0 && Character.isJavaIdentifierPart(code.charAt(start - 1))) {
      start--;
    }
    String name = code.substring(start, end);
    boolean member = start > 0 && code.charAt(start - 1) == '.';
    if (!name.isEmpty() && !member) {
      Optional<MimeBundle> variable = variable(name);
      if (variable.isPresent()) {
        return variable;
      }
    }
    return documentation(code.substring(0, end), name.isEmpty(), detail);
  }

  private Optional<MimeBundle> variable(String name) {
    Optional<String> type =
        compiler.inquire(
            shell ->
                shell
                    .variables()
                    .filter(v -> shell.status(v) == Snippet.Status.VALID && v.name().equals(name))
                    .map(VarSnippet::typeName)
                    .findFirst());
    return type.map(
        t -> {
          String value = compiler.variables().value(name).map(ValueText::of).orElse("null");
          String shown = value.length() > MAX_VALUE ? value.substring(0, MAX_VALUE) + "…" : value;
          String about = library.ofType(simple(t)).map(d -> "\n\n" + d).orElse("");
          return bundle(t + " " + name + " = " + shown + about);
        });
  }

  private Optional<MimeBundle> documentation(String upToName, boolean insideCall, int detail) {
    List<Documentation> found =
        compiler.inquire(shell -> documentation(shell, upToName, insideCall));
    List<String> parts = new ArrayList<>();
    for (Documentation d : found.subList(0, Math.min(MAX_OVERLOADS, found.size()))) {
      String text = textOf(d);
      String shown = detail == 0 && found.size() > 1 ? firstParagraph(text) : text;
      parts.add(
          shown.isEmpty() ? d.signature() : d.signature() + "\n" + shown.indent(4).stripTrailing());
    }
    if (found.size() > MAX_OVERLOADS) {
      parts.add("and " + (found.size() - MAX_OVERLOADS) + " more");
    }
    return parts.isEmpty() ? Optional.empty() : Optional.of(bundle(String.join("\n\n", parts)));
  }

  /** A method is found by its call, a type by its name, and inside a call the method called. */
  private static List<Documentation> documentation(JShell shell, String code, boolean insideCall) {
    Stream<String> attempts = insideCall ? Stream.of(code) : Stream.of(code + "(", code);
    return attempts
        .map(attempt -> shell.sourceCodeAnalysis().documentation(attempt, attempt.length(), true))
        .filter(found -> !found.isEmpty())
        .findFirst()
        .orElse(List.of());
  }

  private String textOf(Documentation documentation) {
    String javadoc = documentation.javadoc();
    if (javadoc != null) {
      return JavadocText.plain(javadoc);
    }
    String signature = documentation.signature();
    for (String before = ""; !before.equals(signature); ) {
      before = signature;
      signature = signature.replaceAll("<[^<>]*>", "");
    }
    Matcher method = METHOD.matcher(signature);
    if (method.matches()) {
      String parameters = method.group(3).strip();
      int count = parameters.isEmpty() ? 0 : parameters.split(",").length;
      String type = method.group(1) == null ? method.group(2) : simple(method.group(1));
      String name = method.group(1) == null ? "<init>" : method.group(2);
      return library.ofMethod(type, name, count).orElse("");
    }
    Matcher field = FIELD.matcher(signature);
    if (field.matches() && field.group(1) != null) {
      return library.ofField(simple(field.group(1)), field.group(2)).orElse("");
    }
    return library.ofType(simple(signature)).orElse("");
  }

  private static String firstParagraph(String text) {
    int end = text.indexOf("\n\n");
    return end < 0 ? text : text.substring(0, end);
  }

  private static String simple(String type) {
    String raw = type.replaceFirst("<.*", "");
    return raw.substring(raw.lastIndexOf('.') + 1);
  }

  private static MimeBundle bundle(String text) {
    return MimeBundle.builder(text)
        .with(MimeBundle.HTML, "<pre>" + Html.escape(text) + "</pre>")
        .build();
  }
}
