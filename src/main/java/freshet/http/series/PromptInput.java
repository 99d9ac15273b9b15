package freshet.http.series;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;

/** The body of a series; before the caller is waited for, the caller gets what is answered so far. */
final class PromptInput extends FilterInputStream {

    private final SeriesOutput out;

    PromptInput(InputStream body, SeriesOutput out) {
        super(body);
        this.out = out;
    }

    @Override
    public int read(byte[] target, int offset, int most) throws IOException {
        if (in.available() == 0) {
            out.send();
        }
        return in.read(target, offset, most);
    }
}
