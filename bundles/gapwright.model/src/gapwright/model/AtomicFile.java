package gapwright.model;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;

/** Replaces a file by writing beside it, flushing to the disk, and renaming. */
public final class AtomicFile {

	private static final int MOST_LINKS = 40;

	private AtomicFile() {
	}

	/**
	 * @param file    may exist, may be a symbolic link (its target is replaced); keeps its permissions
	 * @param content the new content
	 * @throws IOException when it could not be written; the old file is then as it was and nothing is left beside it
	 */
	public static void write(Path file, byte[] content) throws IOException {
		Path target = target(file);
		if (Files.exists(target) && !Files.isWritable(target)) {
			throw new FileSystemException(target.toString(), null, "the file is read-only");
		}
		Path folder = target.getParent();
		Path beside;
		try {
			beside = Files.createTempFile(folder, "." + target.getFileName() + ".", ".saving");
		} catch (IOException e) {
			throw new FileSystemException(target.toString(), null, "cannot write in its folder: " + e.getMessage());
		}
		try {
			try (FileChannel channel = FileChannel.open(beside, StandardOpenOption.WRITE)) {
				ByteBuffer rest = ByteBuffer.wrap(content);
				while (rest.hasRemaining()) {
					channel.write(rest);
				}
				channel.force(true);
			}
			copyPermissions(target, beside);
			Files.move(beside, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
		} catch (IOException | RuntimeException e) {
			Files.deleteIfExists(beside);
			throw e;
		}
		flushFolder(folder);
	}

	/** Where a link leads, even when nothing is there yet. */
	private static Path target(Path file) throws IOException {
		Path target = file.toAbsolutePath();
		for (int links = 0; Files.isSymbolicLink(target); links++) {
			if (links == MOST_LINKS) {
				throw new FileSystemException(file.toString(), null, "the symbolic links lead round in a circle");
			}
			target = target.resolveSibling(Files.readSymbolicLink(target));
		}
		if (Files.isDirectory(target)) {
			throw new FileSystemException(target.toString(), null, "is a folder");
		}
		return target;
	}

	private static void copyPermissions(Path from, Path to) throws IOException {
		PosixFileAttributeView target = Files.getFileAttributeView(to, PosixFileAttributeView.class);
		if (target == null) {
			return;
		}
		if (Files.exists(from)) {
			target.setPermissions(Files.getPosixFilePermissions(from));
		} else {
			// a temporary file is private; a new design is as readable as any other new file
			Path probe = Files.createFile(to.resolveSibling(to.getFileName() + ".mode"));
			target.setPermissions(Files.getPosixFilePermissions(probe));
			Files.delete(probe);
		}
	}

	/** Makes the rename itself durable where the system allows a folder to be flushed. */
	private static void flushFolder(Path folder) {
		try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
			channel.force(true);
		} catch (IOException e) {
			// not every system opens folders; the rename is atomic all the same
		}
	}
}
