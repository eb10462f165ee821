using System.Runtime.InteropServices;
using Microsoft.Win32.SafeHandles;

namespace MemberScan.Part21.Edits;

/// <summary>Copies from file to file within the kernel, as a copy command does: nothing passes through the process, and a file system that shares blocks may share them.</summary>
internal static partial class KernelCopy
{
    // One call copies so much at most; more is refused by some kernels [byte].
    private const long MostAtOnce = 1L << 30;

    /// <summary>Copies as much as the kernel does; what it does not, the caller copies.</summary>
    /// <param name="from">File read.</param>
    /// <param name="offset">Where to read [byte]; afterwards behind what was copied.</param>
    /// <param name="until">Where to stop reading [byte].</param>
    /// <param name="to">File written.</param>
    /// <param name="position">Where to write [byte]; afterwards behind what was copied.</param>
    public static void Copy(SafeFileHandle from, ref long offset, long until, SafeFileHandle to, ref long position)
    {
        if (!OperatingSystem.IsLinux()) return;

        while (offset < until)
        {
            // Both offsets are moved by the call. 0 or −1: another file system, an old kernel, the end: the caller goes on and tells what fails.
            if (CopyFileRange(from, ref offset, to, ref position, (nuint)Math.Min(MostAtOnce, until - offset), 0) <= 0) return;
        }
    }

    [LibraryImport("libc", EntryPoint = "copy_file_range")]
    [DefaultDllImportSearchPaths(DllImportSearchPath.SafeDirectories)]
    private static partial nint CopyFileRange(SafeFileHandle from, ref long offset, SafeFileHandle to, ref long position, nuint length, uint flags);
}
