package gnomon.value;

/// No value: the statement did something and has only a message, which may be empty.
public record NoneValue(String message) implements Value {
  @Override
  public Sort sort() {
    return Sort.NONE;
  }
}
