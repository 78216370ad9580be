/** The process's first class. It stands on the JVM's class path beside the framework, outside of every bundle. */
package stirwright.start;
