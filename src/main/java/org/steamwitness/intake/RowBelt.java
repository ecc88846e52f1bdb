package org.steamwitness.intake;

import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Semaphore;
import org.apache.commons.csv.CSVRecord;

/**
 * Carries rows to their consumer in batches and in order, on a thread of its own, so that cutting lines and making
 * numbers go on side by side. A short log never starts the thread. Closing waits for the last row.
 */
final class RowBelt implements AutoCloseable {

    private static final int BATCH = 1024;

    /** So many batches may wait; more would only fill the memory. */
    private static final int WAITING = 8;

    private final Consumer consumer;
    private final Semaphore room = new Semaphore(WAITING);
    private CSVRecord[] rows = new CSVRecord[BATCH];
    private int[] lines = new int[BATCH];
    private int count;
    private ExecutorService worker;
    private CompletableFuture<Void> work = CompletableFuture.completedFuture(null);

    RowBelt(Consumer consumer) {
        this.consumer = consumer;
    }

    /** Takes the next row. */
    void put(CSVRecord row, int line) {
        rows[count] = row;
        lines[count] = line;
        count++;
        if (count == BATCH) {
            send();
        }
    }

    private void send() {
        worker = worker == null ? Executors.newSingleThreadExecutor(RowBelt::thread) : worker;
        CSVRecord[] sentRows = rows;
        int[] sentLines = lines;
        int sent = count;
        rows = new CSVRecord[BATCH];
        lines = new int[BATCH];
        count = 0;
        room.acquireUninterruptibly();
        work = work.thenRunAsync(
                () -> {
                    try {
                        consume(sentRows, sentLines, sent);
                    } finally {
                        room.release();
                    }
                },
                worker);
    }

    private void consume(CSVRecord[] some, int[] theirLines, int many) {
        for (int i = 0; i < many; i++) {
            consumer.accept(some[i], theirLines[i]);
        }
    }

    private static Thread thread(Runnable work) {
        Thread thread = new Thread(work, "rows");
        thread.setDaemon(true);
        return thread;
    }

    @Override
    public void close() {
        if (worker == null) {
            consume(rows, lines, count);
            return;
        }
        try {
            work.join();
            consume(rows, lines, count);
        } catch (CompletionException failed) {
            throw failed.getCause() instanceof RuntimeException cause ? cause : failed;
        } finally {
            worker.shutdownNow();
        }
    }

    /** Makes something of a row. */
    @FunctionalInterface
    interface Consumer {

        /** The next row and its line, as an editor counts. */
        void accept(CSVRecord row, int line);
    }
}
