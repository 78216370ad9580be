package stirwright.workbench.internal.app;

import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import stirwright.exchange.Demo;
import stirwright.study.Study;
import stirwright.study.StudyFileException;
import stirwright.study.StudyFiles;
import stirwright.workbench.internal.Messages;

/**
 * What the window opens first: the study named on the command line, else the one of last time, else the demo.
 *
 * @param file empty for a study that stands in no file of the user's
 */
record Opening(Study study, Optional<Path> file) {

    /** @param arguments as given to the program: nothing, {@code open STUDY}, or {@code demo --window} */
    static Opening of(List<String> arguments, Notices notices) {
        boolean named = arguments.size() > 1 && arguments.get(0).equals("open");
        Optional<Path> file = named ? Optional.of(Path.of(arguments.get(1)).toAbsolutePath())
                : arguments.contains("demo") ? Optional.empty() : Recent.study().filter(Files::isRegularFile);
        try {
            return file.isPresent() ? new Opening(StudyFiles.read(file.get()), file) : demo(notices);
        } catch (StudyFileException unusable) {
            notices.put(new Notice("opening", unusable.getMessage(), List.of()));
            return demo(notices);
        }
    }

    /** A fresh copy of the invented study, which belongs to no file until it is saved. */
    static Opening demo(Notices notices) {
        try {
            return new Opening(Demo.study(), Optional.empty());
        } catch (StudyFileException | UncheckedIOException damaged) {
            notices.put(new Notice("opening", Messages.bind(Messages.Opening_noDemo, damaged.getMessage()), List.of()));
            return new Opening(Blank.study(""), Optional.empty());
        }
    }
}
