package gnomon.session;

/// A statement with the number of its first line and what was replied to it.
public record Exchange(int line, String statement, Reply reply) {}
