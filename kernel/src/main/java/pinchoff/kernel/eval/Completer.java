package pinchoff.kernel.eval;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import javax.lang.model.SourceVersion;
import jdk.jshell.DeclarationSnippet;
import jdk.jshell.JShell;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.SourceCodeAnalysis.QualifiedNames;
import jdk.jshell.SourceCodeAnalysis.Suggestion;

/** Suggests what could be typed at a place in a cell. */
final class Completer {
  private static final int MAX_ITEMS = 500;

  /** Signatures cost several ms each, so only a short list has them. */
  private static final int MAX_SIGNATURES = 3;

  private final SnippetCompiler compiler;
  private final JavadocIndex library;

  Completer(SnippetCompiler compiler, JavadocIndex library) {
    this.compiler = compiler;
    this.library = library;
  }

  Completions complete(String code, int cursor) {
    if (isInComment(code, cursor)) {
      return new Completions(cursor, cursor, List.of());
    }
    return compiler.inquire(shell -> complete(shell, code, cursor));
  }

  private Completions complete(JShell shell, String code, int cursor) {
    SourceCodeAnalysis analysis = shell.sourceCodeAnalysis();
    int[] anchor = {cursor};
    Map<String, Suggestion> distinct = new LinkedHashMap<>();
    for (Suggestion s : analysis.completionSuggestions(code, cursor, anchor)) {
      distinct.merge(s.continuation(), s, (first, next) -> first.matchesType() ? first : next);
    }
    if (distinct.isEmpty()) {
      return qualifiedNames(analysis, code, cursor);
    }
    Set<String> own =
        shell
            .snippets()
            .filter(DeclarationSnippet.class::isInstance)
            .map(s -> ((DeclarationSnippet) s).name())
            .collect(Collectors.toSet());
    List<Suggestion> sorted = new ArrayList<>(distinct.values());
    sorted.sort(
        Comparator.comparing((Suggestion s) -> rank(s, own))
            .thenComparing(Suggestion::continuation));
    boolean signatures = sorted.size() <= MAX_SIGNATURES;
    List<Completions.Item> items = new ArrayList<>();
    for (Suggestion s : sorted.subList(0, Math.min(MAX_ITEMS, sorted.size()))) {
      String text = s.continuation();
      String signature =
          signatures && text.contains("(") ? signature(analysis, code, anchor[0], text) : "";
      items.add(new Completions.Item(text, typeOf(text), signature));
    }
    return new Completions(anchor[0], cursor, items);
  }

  /** Fitting types, the session's own names and the library's types come first. */
  private int rank(Suggestion suggestion, Set<String> own) {
    String name = suggestion.continuation().replaceFirst("\\(.*", "");
    boolean near = own.contains(name) || library.knowsType(name);
    return (suggestion.matchesType() ? 0 : 2) + (near ? 0 : 1);
  }

  private static String signature(
      SourceCodeAnalysis analysis, String code, int anchor, String text) {
    String call = code.substring(0, anchor) + text.substring(0, text.indexOf('(') + 1);
    return analysis.documentation(call, call.length(), false).stream()
        .map(SourceCodeAnalysis.Documentation::signature)
        .distinct()
        .limit(MAX_SIGNATURES)
        .collect(Collectors.joining("; "));
  }

  /** A class that is not imported is offered with its package. */
  private static Completions qualifiedNames(SourceCodeAnalysis analysis, String code, int cursor) {
    QualifiedNames names = analysis.listQualifiedNames(code.substring(0, cursor), cursor);
    List<Completions.Item> items =
        names.getNames().stream()
            .limit(MAX_ITEMS)
            .map(name -> new Completions.Item(name, "class", ""))
            .toList();
    int start = items.isEmpty() ? cursor : cursor - names.getSimpleNameLength();
    return new Completions(start, cursor, items);
  }

  private static String typeOf(String text) {
    if (text.endsWith("(") || text.endsWith("()")) {
      return "function";
    }
    if (SourceVersion.isKeyword(text.strip())) {
      return "keyword";
    }
    boolean constant = text.equals(text.toUpperCase(Locale.ROOT)) && text.length() > 1;
    return Character.isUpperCase(text.charAt(0)) && !constant ? "class" : "instance";
  }

  private static boolean isInComment(String code, int cursor) {
    if (cursor == 0) {
      return false;
    }
    String masked = JavaText.masked(code.substring(0, cursor));
    return masked.charAt(cursor - 1) == ' ' && code.charAt(cursor - 1) != ' ';
  }
}
