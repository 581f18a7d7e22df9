package clampwright.app;

import clampwright.store.PictureFormat;
import clampwright.store.SketchFile;
import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.stream.Stream;
import javafx.stage.FileChooser;
import javafx.stage.FileChooser.ExtensionFilter;
import javafx.stage.Window;

/** Asks for files by the system's dialog, starting where the last file lay. */
final class SystemFilePrompt implements FilePrompt {
  private static final ExtensionFilter SKETCHES =
      new ExtensionFilter("Joint sketches", "*" + SketchFile.EXTENSION, "*.json");
  private static final ExtensionFilter ALL = new ExtensionFilter("All files", "*");

  private final Window owner;
  private final Supplier<Optional<Path>> last;

  SystemFilePrompt(Window owner, Supplier<Optional<Path>> last) {
    this.owner = owner;
    this.last = last;
  }

  @Override
  public Optional<Path> toOpen() {
    FileChooser chooser = chooser("Open a sketch");
    chooser.getExtensionFilters().setAll(toOpenOffered());
    File chosen = chooser.showOpenDialog(owner);
    return Optional.ofNullable(chosen).map(File::toPath);
  }

  /** The kinds of files to choose from at opening, the usual one first. */
  static List<ExtensionFilter> toOpenOffered() {
    List<String> pictures =
        Stream.of(PictureFormat.values()).map(format -> "*" + format.ending()).toList();
    List<String> both =
        Stream.concat(SKETCHES.getExtensions().stream(), pictures.stream()).toList();
    return List.of(
        new ExtensionFilter("Sketches and pictures with one", both),
        SKETCHES,
        new ExtensionFilter("Pictures with a sketch", pictures),
        ALL);
  }

  @Override
  public Optional<Path> toSave(String suggested) {
    FileChooser chooser = chooser("Save the sketch");
    chooser.setInitialFileName(suggested);
    File chosen = chooser.showSaveDialog(owner);
    return Optional.ofNullable(chosen).map(File::toPath).map(SystemFilePrompt::named);
  }

  @Override
  public Optional<Path> toExport(String title, String suggested) {
    String ending = suggested.substring(suggested.lastIndexOf('.'));
    FileChooser chooser = chooser(title);
    chooser
        .getExtensionFilters()
        .setAll(new ExtensionFilter(ending.substring(1).toUpperCase(Locale.ROOT), "*" + ending));
    chooser.setInitialFileName(suggested);
    File chosen = chooser.showSaveDialog(owner);
    return Optional.ofNullable(chosen)
        .map(File::toPath)
        .map(
            path ->
                path.getFileName().toString().contains(".")
                    ? path
                    : path.resolveSibling(path.getFileName() + ending));
  }

  /** Some systems leave the ending out. */
  private static Path named(Path path) {
    String name = path.getFileName().toString();
    return name.contains(".") ? path : path.resolveSibling(name + SketchFile.EXTENSION);
  }

  private FileChooser chooser(String title) {
    FileChooser chooser = new FileChooser();
    chooser.setTitle(title);
    chooser.getExtensionFilters().setAll(SKETCHES, ALL);
    last.get()
        .map(Path::toAbsolutePath)
        .map(Path::getParent)
        .filter(Files::isDirectory)
        .ifPresent(folder -> chooser.setInitialDirectory(folder.toFile()));
    return chooser;
  }
}
