//! The log: one JSON line an event on standard error, gathered for a moment so that a request does not wait for the disk.

use std::fmt;
use std::io::{self, Write};
use std::mem;
use std::sync::{Arc, Condvar, Mutex, MutexGuard, OnceLock, PoisonError};
use std::thread::{self, JoinHandle};
use std::time::{Duration, SystemTime, UNIX_EPOCH};

use tracing_subscriber::fmt::MakeWriter;
use tracing_subscriber::fmt::format::Writer;
use tracing_subscriber::fmt::time::FormatTime;

/// How long lines are gathered.
const PAUSE: Duration = Duration::from_millis(20);
/// With more than this in hand, events wait until it is written.
const MOST_BYTES: usize = 1 << 20;

#[derive(Default)]
struct Lines {
    bytes: Vec<u8>,
    ended: bool,
}

#[derive(Default)]
struct Shared {
    lines: Mutex<Lines>,
    changed: Condvar,
}

impl Shared {
    /// A panic between lock and unlock leaves whole lines at worst cut short, so the lines go on.
    fn lock(&self) -> MutexGuard<'_, Lines> {
        self.lines.lock().unwrap_or_else(PoisonError::into_inner)
    }

    fn wait<'a>(&self, lines: MutexGuard<'a, Lines>) -> MutexGuard<'a, Lines> {
        self.changed
            .wait(lines)
            .unwrap_or_else(PoisonError::into_inner)
    }
}

/// The log as events see it.
#[derive(Clone)]
struct Gathering(Arc<Shared>);

impl Write for Gathering {
    fn write(&mut self, line: &[u8]) -> io::Result<usize> {
        let mut lines = self.0.lock();
        while lines.bytes.len() > MOST_BYTES && !lines.ended {
            lines = self.0.wait(lines);
        }
        if lines.bytes.is_empty() {
            self.0.changed.notify_all();
        }
        lines.bytes.extend_from_slice(line);
        Ok(line.len())
    }

    fn flush(&mut self) -> io::Result<()> {
        Ok(())
    }
}

impl<'a> MakeWriter<'a> for Gathering {
    type Writer = Gathering;

    fn make_writer(&'a self) -> Gathering {
        self.clone()
    }
}

/// What a request came to.
pub struct RequestLine<'a> {
    /// Its id, letters, digits and `-_.:` alone.
    pub id: &'a str,
    /// Its method.
    pub method: &'a str,
    /// Its path, without the query.
    pub path: &'a str,
    /// The status of its answer.
    pub status: u16,
    /// How long it took.
    pub time: Duration,
}

static RUNNING: OnceLock<Arc<Shared>> = OnceLock::new();

/// Writes the line of a request, if the log runs.
///
/// One a request makes this the log's only hot line, so it is put together by hand; everything else goes through `tracing`.
pub fn request(line: &RequestLine) {
    let Some(shared) = RUNNING.get() else {
        return;
    };
    // Texts are always written as JSON.
    let path = serde_json::to_string(line.path).unwrap_or_default();
    let method = serde_json::to_string(line.method).unwrap_or_default();
    let text = format!(
        "{{\"timestamp\":\"{}\",\"level\":\"INFO\",\"message\":\"request\",\"request_id\":\"{}\",\"method\":{method},\"path\":{path},\"status\":{},\"microseconds\":{}}}\n",
        Now,
        line.id,
        line.status,
        line.time.as_micros()
    );
    // Gathering lines does not fail.
    let _ = Gathering(Arc::clone(shared)).write_all(text.as_bytes());
}

/// The time of an event: seconds since 1970-01-01 UTC, with microseconds.
struct Now;

impl fmt::Display for Now {
    fn fmt(&self, out: &mut fmt::Formatter<'_>) -> fmt::Result {
        let now = SystemTime::now()
            .duration_since(UNIX_EPOCH)
            .unwrap_or_default();
        write!(out, "{}.{:06}", now.as_secs(), now.subsec_micros())
    }
}

impl FormatTime for Now {
    fn format_time(&self, out: &mut Writer<'_>) -> fmt::Result {
        write!(out, "{Now}")
    }
}

/// The running log; what is in hand is written when it is dropped.
pub struct Log {
    shared: Arc<Shared>,
    writer: Option<JoinHandle<()>>,
}

/// Starts the log; events go to it from now on.
pub fn start() -> Log {
    let shared = Arc::new(Shared::default());
    tracing_subscriber::fmt()
        .json()
        .flatten_event(true)
        .with_target(false)
        .with_timer(Now)
        .with_writer(Gathering(Arc::clone(&shared)))
        .init();
    RUNNING.get_or_init(|| Arc::clone(&shared));
    let writing = Arc::clone(&shared);
    Log {
        shared,
        writer: Some(thread::spawn(move || write_until_ended(&writing))),
    }
}

fn write_until_ended(shared: &Shared) {
    let mut spare = Vec::new();
    loop {
        let mut lines = shared.lock();
        while lines.bytes.is_empty() && !lines.ended {
            lines = shared.wait(lines);
        }
        let ended = lines.ended;
        mem::swap(&mut lines.bytes, &mut spare);
        drop(lines);
        shared.changed.notify_all();
        // A log that cannot be written must not stop the service.
        let _ = io::stderr().write_all(&spare);
        spare.clear();
        if ended {
            return;
        }
        thread::sleep(PAUSE);
    }
}

impl Drop for Log {
    fn drop(&mut self) {
        self.shared.lock().ended = true;
        self.shared.changed.notify_all();
        if let Some(writer) = self.writer.take() {
            // The writer's own panic has been told already.
            let _ = writer.join();
        }
    }
}
