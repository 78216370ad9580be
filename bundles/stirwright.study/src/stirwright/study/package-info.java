/**
 * A study: the fluids, vessels and impellers of a job and the cases that combine them. The model's types are generated
 * from {@code model/study.ecore}; {@link stirwright.study.StudyFactory} makes them, {@link stirwright.study.StudyFiles}
 * reads and writes them, {@link stirwright.study.StudyEditor} changes them step by step. Nothing here computes.
 *
 * <p>Not for code from outside, which relies on {@code stirwright.correlation} alone.
 */
@Version("1.0.0")
package stirwright.study;

import org.osgi.annotation.versioning.Version;
