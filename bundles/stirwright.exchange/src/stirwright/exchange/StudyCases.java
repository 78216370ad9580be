package stirwright.exchange;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import stirwright.core.Catalogue;
import stirwright.exchange.internal.cases.CaseReader;
import stirwright.exchange.internal.cases.StudyRow;
import stirwright.study.Case;
import stirwright.study.Study;
import stirwright.study.StudyFileException;
import stirwright.study.StudyFiles;

/**
 * The cases of a study. Their amounts are the columns of a case table, so the same words are refused for the same
 * reasons and the same numbers come out.
 */
public final class StudyCases {

    private StudyCases() {}

    /**
     * Every case of a study, in its order; none when it has none.
     *
     * @param fileName without the folder
     */
    public static CaseTable table(Study study, String fileName, Catalogue catalogue) {
        CaseReader reader = CaseReader.ofAnyColumn(catalogue);
        List<CaseEntry> entries = new ArrayList<>();
        for (Case one : study.getCases()) {
            entries.add(CaseEntry.of(reader, StudyRow.of(one, catalogue)));
        }
        return new CaseTable(fileName, entries, List.of());
    }

    /** One case, whatever the others of its study are called. */
    public static CaseEntry entry(Case one, Catalogue catalogue) {
        return CaseEntry.of(CaseReader.ofAnyColumn(catalogue), StudyRow.of(one, catalogue));
    }

    /**
     * The same case with another family in place of its impeller's. What was settled by hand for the one says nothing
     * about the other: neither picks nor given values are used.
     */
    public static CaseEntry entry(Case one, Catalogue catalogue, String familyId) {
        return CaseEntry.of(CaseReader.ofAnyColumn(catalogue), StudyRow.of(one, catalogue, familyId));
    }

    /** @throws UnusableFileException when the file is no study or holds no case */
    static CaseTable read(Path file, Catalogue catalogue) {
        Study study;
        try {
            study = StudyFiles.read(file);
        } catch (StudyFileException problem) {
            throw new UnusableFileException(file, problem.problem(), problem);
        }
        if (study.getCases().isEmpty()) {
            throw new UnusableFileException(file, "is a study without a case; add one");
        }
        return table(study, file.getFileName().toString(), catalogue);
    }
}
