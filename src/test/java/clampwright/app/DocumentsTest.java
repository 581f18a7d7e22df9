package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.edit.SketchModel;
import clampwright.joint.Sketch;
import clampwright.joint.Tightening;
import clampwright.store.PictureFormat;
import clampwright.store.Samples;
import clampwright.store.SketchFile;
import clampwright.store.SketchPicture;
import clampwright.store.Stored;
import clampwright.view.Sketches;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Opening and saving, and that no unsaved work goes without asking. */
class DocumentsTest implements Documents.Desk {
  @TempDir Path folder;

  private final Answers answers = new Answers();
  private final SketchModel model = new SketchModel(Sketches.cover());
  private final List<String> calls = new java.util.ArrayList<>();
  private Settings settings;
  private Documents documents;
  private Path other;

  @Override
  public void commit() {
    calls.add("commit");
  }

  @Override
  public void clear() {
    calls.add("clear");
  }

  @Override
  public void report(String sentence) {
    calls.add(sentence);
  }

  @BeforeEach
  void open() throws IOException {
    settings = Settings.of(folder.resolve("settings/settings.properties"));
    documents = new Documents(model, answers, answers, settings, this);
    other = folder.resolve("other.joint.json");
    SketchFile.write(Sketches.cover().withName("Other"), other);
    answers.open = Optional.of(other);
  }

  private Sketch edit() {
    model.change(
        "Preload",
        sketch -> sketch.withJoint(joint -> joint.withTightening(Tightening.force(31_000))));
    return model.sketch();
  }

  /** Every way in which another sketch can take this one's place. */
  static Stream<Consumer<DocumentsTest>> waysToLeave() {
    return Stream.of(
        test -> test.documents.startNew(),
        test -> test.documents.open(),
        test -> test.documents.open(test.other),
        test -> test.documents.open(Samples.all().get(1)));
  }

  @ParameterizedTest
  @MethodSource("waysToLeave")
  void asksBeforeUnsavedWorkGoes(Consumer<DocumentsTest> leave) {
    Sketch edited = edit();
    answers.unsaved = Questions.Unsaved.CANCEL;

    leave.accept(this);

    assertEquals(List.of("Pump cover"), answers.asked);
    assertEquals(edited, model.sketch());
    assertTrue(model.unsavedProperty().get());
  }

  @ParameterizedTest
  @MethodSource("waysToLeave")
  void leavesWithoutSavingWhenTold(Consumer<DocumentsTest> leave) {
    Sketch edited = edit();
    answers.unsaved = Questions.Unsaved.DISCARD;

    leave.accept(this);

    assertFalse(edited.equals(model.sketch()));
    assertEquals("", model.undoNameProperty().get());
    assertFalse(model.unsavedProperty().get());
    assertTrue(calls.contains("clear"));
  }

  @ParameterizedTest
  @MethodSource("waysToLeave")
  void savesFirstWhenTold(Consumer<DocumentsTest> leave) {
    Sketch edited = edit();
    Path kept = folder.resolve("kept.joint.json");
    answers.unsaved = Questions.Unsaved.SAVE;
    answers.save = Optional.of(kept);

    leave.accept(this);

    assertEquals(edited, ((Stored.Opened) SketchFile.read(kept)).sketch());
    assertFalse(edited.equals(model.sketch()));
  }

  @ParameterizedTest
  @MethodSource("waysToLeave")
  void staysWhenTheSaveIsCalledOff(Consumer<DocumentsTest> leave) {
    Sketch edited = edit();
    answers.unsaved = Questions.Unsaved.SAVE;
    answers.save = Optional.empty();

    leave.accept(this);

    assertEquals(edited, model.sketch());
  }

  @ParameterizedTest
  @MethodSource("waysToLeave")
  void asksNothingWhenNothingIsUnsaved(Consumer<DocumentsTest> leave) {
    leave.accept(this);

    assertEquals(List.of(), answers.asked);
    assertFalse(model.sketch().equals(Sketches.cover()));
  }

  @ParameterizedTest
  @MethodSource("waysToLeave")
  void takesOverWhatIsBeingTypedBeforeAsking(Consumer<DocumentsTest> leave) {
    leave.accept(this);

    assertEquals("commit", calls.get(0));
  }

  @Test
  void aSavedSketchReadsBackEqual() {
    Path file = folder.resolve("cover.joint.json");
    answers.save = Optional.of(file);
    Sketch edited = edit();

    assertTrue(documents.save());

    assertEquals(List.of("pump-cover.joint.json"), answers.suggested);
    assertFalse(model.unsavedProperty().get());
    assertEquals(Optional.of(file), documents.file());
    documents.startNew();
    assertEquals(Optional.empty(), documents.file());
    documents.open(file);
    assertEquals(edited, model.sketch());
    assertEquals(file, settings.recent().get(0));
  }

  @Test
  void savesToTheSameFileWithoutAskingAgain() {
    documents.open(other);
    Sketch edited = edit();

    assertTrue(documents.save());

    assertEquals(List.of(), answers.suggested);
    assertEquals(edited, ((Stored.Opened) SketchFile.read(other)).sketch());
  }

  @Test
  void aSketchOutOfAPictureHasNoFileOfItsOwn() throws IOException {
    Path picture = folder.resolve("other.svg");
    Sketch shown = Sketches.cover().withName("Shown");
    byte[] svg = "<svg xmlns='http://www.w3.org/2000/svg'/>".getBytes(StandardCharsets.UTF_8);
    Files.write(picture, SketchPicture.with(PictureFormat.SVG, svg, shown));
    byte[] before = Files.readAllBytes(picture);
    documents.open(other);

    documents.open(picture);

    assertEquals(shown, model.sketch());
    assertEquals(Optional.empty(), documents.file());
    assertFalse(model.unsavedProperty().get());
    assertEquals(picture, settings.recent().get(0));
    assertEquals(
        "Opened from the picture other.svg; saving asks for a file.", calls.get(calls.size() - 1));

    Path kept = folder.resolve("kept.joint.json");
    answers.save = Optional.of(kept);
    assertTrue(documents.save());
    assertEquals(List.of("shown.joint.json"), answers.suggested);
    assertEquals(Optional.of(kept), documents.file());
    assertArrayEquals(before, Files.readAllBytes(picture));
  }

  @Test
  void aPictureWithoutASketchLeavesTheSketchAsItIs() throws IOException {
    documents.open(other);
    Sketch before = model.sketch();
    Path picture = folder.resolve("foreign.svg");
    Files.writeString(picture, "<svg xmlns='http://www.w3.org/2000/svg'/>");

    documents.open(picture);

    assertEquals(
        List.of("foreign.svg cannot be opened: This picture holds no sketch."), answers.told);
    assertEquals(before, model.sketch());
    assertEquals(Optional.of(other), documents.file());
    assertEquals(List.of(other), settings.recent());
  }

  @Test
  void aFailedSaveKeepsTheWorkUnsaved() {
    edit();
    answers.save = Optional.of(folder.resolve("missing/folder/cover.joint.json"));

    assertFalse(documents.save());

    assertEquals(1, answers.told.size());
    assertTrue(answers.told.get(0).startsWith("cover.joint.json could not be saved"));
    assertTrue(model.unsavedProperty().get());
  }

  @Test
  void aRefusedFileLeavesTheSketchAsItIs() throws IOException {
    Path broken = folder.resolve("broken.joint.json");
    Files.writeString(broken, "{ not a sketch");

    documents.open(broken);

    assertTrue(answers.told.get(0).startsWith("broken.joint.json cannot be opened"));
    assertEquals(Sketches.cover(), model.sketch());
    assertEquals(List.of(), settings.recent());
  }

  @Test
  void whatAFileHoldsBeyondASketchIsTold() throws IOException {
    String text = Files.readString(other);
    Files.writeString(other, text.replaceFirst("\\{", "{ \"colour\": \"red\","));

    documents.open(other);

    assertEquals("Other", model.sketch().name());
    assertTrue(answers.told.get(0).contains("colour"), answers.told.toString());
  }

  @Test
  void settingsThatCannotBeKeptCostTheMemoryOnly() throws IOException {
    Path file = folder.resolve("a-file");
    Files.writeString(file, "in the way");
    Settings unwritable = Settings.of(file.resolve("settings.properties"));

    assertFalse(unwritable.keep());
    assertEquals(List.of(), unwritable.recent());
  }
}
