package whorl.page;

import java.io.IOException;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Takes the value of a cell and lets everything else that it shows go by. */
final class ValueOnly implements Front {
  private volatile @Nullable Bundle value;

  Optional<Bundle> value() {
    return Optional.ofNullable(value);
  }

  @Override
  public void result(Bundle bundle) {
    value = bundle;
  }

  @Override
  public void print(Stream stream, String text) {}

  @Override
  public void display(Bundle bundle, @Nullable String id) {}

  @Override
  public void update(Bundle bundle, String id) {}

  @Override
  public void clear(boolean wait) {}

  @Override
  public String ask(String prompt, boolean secret) throws IOException {
    throw new IOException("an expression of a client cannot ask its user");
  }
}
