package clipramp.cli;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.io.Writer;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * One of the two streams that a command writes to. A reader that went away (head, a closed pager) is no failure: what
 * follows is dropped quietly. Anything else, such as a full disk, is reported, once.
 */
final class Output {
    private final Writer writer;
    private final Spelling spelling;
    private final boolean styled;
    private boolean takesNoMore;

    /**
     * @param stream where the bytes go
     * @param charset ASCII, or one that has every sign
     * @param styled whether bold type may be used
     */
    Output(OutputStream stream, Charset charset, boolean styled) {
        this.writer = new BufferedWriter(new OutputStreamWriter(stream, charset));
        this.spelling = charset.equals(StandardCharsets.US_ASCII) ? Spelling.ASCII : Spelling.FULL;
        this.styled = styled;
    }

    Spelling spelling() {
        return spelling;
    }

    /** One line for people, spelled for this stream. */
    void line(String text) {
        exactly(spelling.of(text) + "\n");
    }

    void lines(List<String> lines) {
        lines.forEach(this::line);
    }

    /** Names a file that was written, below the answer. */
    void written(String what, Optional<String> file) {
        file.ifPresent(name -> {
            line("");
            line(what + ": " + name);
        });
    }

    /** A line whose first part stands out where the terminal can do that. */
    void strongLine(String strong, String rest) {
        String word = spelling.of(strong);
        exactly((styled ? "\u001B[1m" + word + "\u001B[0m" : word) + spelling.of(rest) + "\n");
    }

    /** Text for machines, byte for byte. */
    void exactly(String text) {
        if (takesNoMore) {
            return;
        }
        try {
            writer.write(text);
        } catch (IOException failure) {
            settle(failure);
        }
    }

    void flush() {
        if (takesNoMore) {
            return;
        }
        try {
            writer.flush();
        } catch (IOException failure) {
            settle(failure);
        }
    }

    /** The same stream as the command-line library wants it. */
    PrintWriter asPrintWriter() {
        return new PrintWriter(new Writer() {
            @Override
            public void write(char[] characters, int offset, int length) {
                exactly(spelling.of(new String(characters, offset, length)));
            }

            @Override
            public void flush() {
                Output.this.flush();
            }

            @Override
            public void close() {
                Output.this.flush();
            }
        });
    }

    private void settle(IOException failure) {
        takesNoMore = true;
        String reason = String.valueOf(failure.getMessage()).toLowerCase(Locale.ROOT);
        if (!reason.contains("pipe") && !reason.contains("stream closed")) {
            throw FileFailure.answering(failure);
        }
    }
}
