package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Sketch;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A file is the old sketch or the new one, and every trouble is a sentence. */
class SketchFileTest {
  private static final Sketch SKETCH =
      Texts.opened(Texts.SHORTEST).sketch().withName("Träger außen − 2″");

  @TempDir private Path folder;

  private Path file() {
    return folder.resolve("cover.joint.json");
  }

  private List<Path> content() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.sorted().toList();
    }
  }

  private static void checkRefused(String problem, Path path) {
    assertEquals(new Stored.Refused(List.of(problem)), SketchFile.read(path));
  }

  private void checkNotSaved(String sentence, Path path) {
    IOException trouble = assertThrows(IOException.class, () -> SketchFile.write(SKETCH, path));
    assertEquals(sentence, trouble.getMessage());
  }

  @Test
  void aSavedSketchOpensEqual() throws IOException {
    SketchFile.write(SKETCH, file());
    assertEquals(new Stored.Opened(SKETCH, List.of()), SketchFile.read(file()));
    assertEquals(List.of(file()), content());
  }

  @Test
  void savingReplacesTheOldSketchAndLeavesNothingBeside() throws IOException {
    SketchFile.write(SKETCH, file());
    SketchFile.write(SKETCH.withName("Second"), file());
    assertEquals(new Stored.Opened(SKETCH.withName("Second"), List.of()), SketchFile.read(file()));
    assertEquals(List.of(file()), content());
  }

  @Test
  void theFileIsUtf8WhateverTheLocale() throws IOException {
    SketchFile.write(SKETCH, file());
    String text = Files.readString(file(), StandardCharsets.UTF_8);
    assertTrue(text.contains("Träger außen − 2″"), text);
  }

  @Test
  void aByteOrderMarkIsPassedOver() throws IOException {
    Files.writeString(file(), "\uFEFF" + Texts.SHORTEST);
    assertEquals(Texts.opened(Texts.SHORTEST), SketchFile.read(file()));
  }

  @Test
  void whatCannotBeReadIsToldInASentence() throws IOException {
    checkRefused("There is no such file.", file());
    checkRefused("This is a folder, not a sketch file.", folder);
    Files.write(file(), new byte[] {'{', (byte) 0xC3, '}'});
    checkRefused("This is not a sketch file: its text is not UTF-8.", file());
    Files.write(file(), Texts.SHORTEST.getBytes(StandardCharsets.UTF_16));
    checkRefused("This is not a sketch file: its text is not UTF-8.", file());
    Files.write(file(), new byte[SketchFile.LARGEST + 1]);
    checkRefused("This file is too large to be a sketch (over 4 MB).", file());
  }

  @Test
  void aMissingFolderIsNamed() {
    Path missing = folder.resolve("drawings");
    checkNotSaved("There is no folder " + missing + ".", missing.resolve("a.joint.json"));
  }

  @Test
  void aFolderIsNotReplaced() throws IOException {
    Files.createDirectory(file());
    checkNotSaved("The file cannot be saved: there is a folder of this name.", file());
    assertTrue(Files.isDirectory(file()));
  }
}
