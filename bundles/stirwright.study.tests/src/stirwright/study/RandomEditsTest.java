package stirwright.study;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever is done in whatever order: undone to the start and done again to the end, the files are the same bytes. */
class RandomEditsTest {
    private final Study study = Invented.study();
    private final StudyEditor editor = new StudyEditor(study);
    /** What the study was after each step that the editor holds. */
    private final List<byte[]> states = new ArrayList<>(List.of(StudyFiles.bytes(study)));
    private int at;
    private int joined;

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void undoAndRedoGiveTheSameBytes(long seed) {
        Random random = new Random(seed);
        RandomChange changes = new RandomChange(study, random);
        for (int i = 0; i < 120; i++) {
            int what = random.nextInt(7);
            if (what == 0 && editor.canUndo()) {
                undo();
            } else if (what == 1 && editor.canRedo()) {
                redo();
            } else {
                edit("step " + i, random.nextInt(3) == 0 ? null : "field " + random.nextInt(2), changes);
            }
        }
        assertTrue(states.size() > 20 && joined > 5, () -> states.size() + " steps, " + joined + " joined");
        while (editor.canUndo()) {
            undo();
        }
        assertEquals(0, at);
        while (editor.canRedo()) {
            redo();
        }
        assertEquals(states.size() - 1, at);
    }

    private void undo() {
        editor.undo();
        at--;
        assertArrayEquals(states.get(at), StudyFiles.bytes(study));
    }

    private void redo() {
        editor.redo();
        at++;
        assertArrayEquals(states.get(at), StudyFiles.bytes(study));
    }

    private void edit(String label, Object key, Runnable change) {
        byte[] before = StudyFiles.bytes(study);
        Optional<String> last = editor.undoLabel();
        editor.edit(label, key, change);
        byte[] now = StudyFiles.bytes(study);
        if (editor.undoLabel().equals(Optional.of(label))) {
            states.subList(at + 1, states.size()).clear();
            states.add(now);
            at++;
        } else if (!Arrays.equals(before, now)) {
            assertEquals(last, editor.undoLabel());
            states.set(at, now);
            joined++;
        }
        assertEquals(states.size() - 1 > at, editor.canRedo());
    }
}
