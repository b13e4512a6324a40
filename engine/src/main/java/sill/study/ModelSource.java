package sill.study;

/** Gives models that share nothing that changes, so that each thread may have its own. */
@FunctionalInterface
public interface ModelSource {
    /** A model of its own; called by the thread that runs the study, once for each thread. */
    Model newModel();
}
