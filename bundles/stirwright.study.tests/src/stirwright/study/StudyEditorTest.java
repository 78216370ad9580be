package stirwright.study;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

/** Steps, their labels, joining, and what counts as saved. */
class StudyEditorTest {
    private final Study study = Invented.study();
    private final StudyEditor editor = new StudyEditor(study);

    private void type(String name) {
        editor.edit("rename", "name", () -> study.setName(name));
    }

    @Test
    void labelsAndMoves() {
        assertFalse(editor.canUndo() || editor.canRedo() || editor.isDirty());
        editor.edit("rename", () -> study.setName("a"));
        editor.edit("note", () -> study.setNotes("n"));
        assertEquals(Optional.of("note"), editor.undoLabel());
        assertEquals(Optional.empty(), editor.redoLabel());
        editor.undo();
        assertEquals(Optional.of("rename"), editor.undoLabel());
        assertEquals(Optional.of("note"), editor.redoLabel());
        editor.undo();
        assertEquals("broth & <stock>", study.getName());
        editor.undo();
        editor.redo();
        assertEquals("a", study.getName());
        editor.edit("rename", () -> study.setName("b"));
        assertFalse(editor.canRedo());
    }

    @Test
    void typingInOneFieldIsOneStep() {
        type("s");
        type("st");
        type("sto");
        editor.undo();
        assertEquals("broth & <stock>", study.getName());
        editor.redo();
        assertEquals("sto", study.getName());
        type("stoc");
        editor.undo();
        assertEquals("sto", study.getName(), "a redo came between");
    }

    @Test
    void whatComesBetweenEndsAStep() {
        type("a");
        editor.endMerge();
        type("b");
        editor.markSaved();
        type("c");
        editor.edit("note", "notes", () -> study.setNotes("n"));
        type("d");
        for (String expected : new String[] {"c", "c", "b", "a", "broth & <stock>"}) {
            editor.undo();
            assertEquals(expected, study.getName());
        }
        assertFalse(editor.canUndo());
    }

    @Test
    void saved() {
        type("a");
        assertTrue(editor.isDirty());
        editor.markSaved();
        assertFalse(editor.isDirty());
        type("ab");
        assertTrue(editor.isDirty(), "typing goes on after a save");
        editor.undo();
        assertFalse(editor.isDirty());
        editor.undo();
        assertTrue(editor.isDirty());
        type("other");
        assertTrue(editor.isDirty(), "the saved step is gone");
    }

    @Test
    void whatChangesNothingIsNoStep() {
        editor.edit("rename", () -> study.setName("a"));
        editor.undo();
        editor.edit("rename", () -> study.setName(study.getName()));
        assertFalse(editor.canUndo());
        assertTrue(editor.canRedo());
    }

    @Test
    void aChangeThatThrowsLeavesNoTrace() {
        byte[] before = StudyFiles.bytes(study);
        AtomicInteger calls = new AtomicInteger();
        editor.listen(calls::incrementAndGet);
        IllegalStateException thrown = assertThrows(IllegalStateException.class, () -> editor.edit("break", () -> {
            study.setName("half");
            Parts.remove(study.getFluids().get(0));
            study.getCases().add(0, Parts.copy(study.getCases().get(0)));
            throw new IllegalStateException("stop");
        }));
        assertEquals("stop", thrown.getMessage());
        assertArrayEquals(before, StudyFiles.bytes(study));
        assertFalse(editor.canUndo() || editor.isDirty());
        assertEquals(0, calls.get());
        type("next");
        editor.undo();
        assertArrayEquals(before, StudyFiles.bytes(study));
    }

    @Test
    void anEditWithinAnEditBelongsToIt() {
        editor.edit("both", () -> {
            study.setName("a");
            editor.edit("inner", () -> study.setNotes("n"));
            assertThrows(IllegalStateException.class, editor::undo);
        });
        assertEquals(Optional.of("both"), editor.undoLabel());
        editor.undo();
        assertFalse(editor.canUndo());
        assertEquals(Invented.study().getNotes(), study.getNotes());
    }

    @Test
    void listenersHearEveryMoveUntilTheyClose() {
        AtomicInteger calls = new AtomicInteger();
        StudyEditor.Listening listening = editor.listen(calls::incrementAndGet);
        type("a");
        type("b");
        editor.undo();
        editor.redo();
        assertEquals(4, calls.get());
        editor.markSaved();
        editor.markSaved();
        assertEquals(5, calls.get());
        listening.close();
        type("c");
        assertEquals(5, calls.get());
    }

    @Test
    void nothingKeepsWatchingTheStudy() {
        for (int i = 0; i < 10; i++) {
            type("name " + i);
            editor.undo();
        }
        assertEquals(0, study.eAdapters().size() + study.getFluids().get(0).eAdapters().size());
    }

    @Test
    void removingAPartFreesItsCases() {
        byte[] before = StudyFiles.bytes(study);
        Vessel kettle = study.getVessels().get(0);
        assertEquals(study.getCases(), Parts.users(kettle));
        editor.edit("remove vessel", () -> Parts.remove(kettle));
        assertEquals(null, study.getCases().get(0).getVessel());
        assertTrue(new String(StudyFiles.bytes(study)).contains("fluid=\"fluid-1\" impeller="));
        editor.undo();
        assertArrayEquals(before, StudyFiles.bytes(study));
    }
}
