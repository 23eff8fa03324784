package pinchoff.cells;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import pinchoff.display.Displayable;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;

class SessionTest {
  private final List<String> calls = new ArrayList<>();
  private Host before = Host.current();

  @BeforeEach
  void installARecordingHost() {
    before =
        Host.install(
            new Host() {
              @Override
              public void publish(MimeBundle bundle) {
                calls.add("publish " + bundle.plainText());
              }

              @Override
              public void publish(String displayId, MimeBundle bundle) {
                calls.add("publish in " + displayId + " " + bundle.plainText());
              }

              @Override
              public void update(String displayId, MimeBundle bundle) {
                calls.add("update " + displayId + " " + bundle.plainText());
              }

              @Override
              public void clear(boolean wait) {
                calls.add("clear " + wait);
              }

              @Override
              public void page(MimeBundle bundle) {
                calls.add("page " + bundle.plainText());
              }

              @Override
              public Optional<MimeBundle> help(String name) {
                return name.equals("V") ? Optional.of(MimeBundle.text("volts")) : Optional.empty();
              }

              @Override
              public String ask(String prompt, boolean password) {
                return prompt + password;
              }
            });
  }

  @AfterEach
  void putTheHostBack() {
    Host.install(before);
  }

  @Test
  void showsDisplayableResultsByTheirOwnBundle() {
    Displayable result = () -> MimeBundle.text("a bias sheet");
    Session.show(result);
    Session.show(42);
    assertEquals(List.of("publish a bias sheet", "publish 42"), calls);
  }

  @Test
  void aNamedPlaceIsPublishedOnceAndThenReplaced() {
    Session.showIn("gain", 1);
    Session.showIn("gain", 2);
    assertEquals(List.of("publish in gain 1", "update gain 2"), calls);
  }

  @Test
  void helpGoesToThePagerAlsoWhenNothingIsKnown() {
    Session.help("V");
    Session.help("nonsense");
    assertEquals(
        List.of("page volts", "page Nothing is known of \"nonsense\" in this session."), calls);
  }

  @Test
  void asksAndClears() {
    assertEquals("name?false", Session.ask("name?"));
    assertEquals("key?true", Session.askHidden("key?"));
    Session.clearOutput();
    assertEquals(List.of("clear true"), calls);
  }
}
