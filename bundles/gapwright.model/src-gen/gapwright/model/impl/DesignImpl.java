/**
 */
package gapwright.model.impl;

import gapwright.model.AirPath;
import gapwright.model.Design;
import gapwright.model.GapwrightPackage;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Limits;
import gapwright.model.Material;
import gapwright.model.OperatingPoint;
import gapwright.model.Tolerance;
import gapwright.model.Winding;
import gapwright.model.WindingConnection;
import gapwright.model.WindingLeakage;

import java.util.Collection;

import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.common.notify.NotificationChain;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Design</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.DesignImpl#getName <em>Name</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getNotes <em>Notes</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getMaterials <em>Materials</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getJoints <em>Joints</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getLegs <em>Legs</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getAirPaths <em>Air Paths</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getWindings <em>Windings</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getOperatingPoints <em>Operating Points</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getLimits <em>Limits</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getLeakages <em>Leakages</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getConnections <em>Connections</em>}</li>
 *   <li>{@link gapwright.model.impl.DesignImpl#getTolerances <em>Tolerances</em>}</li>
 * </ul>
 *
 * @generated
 */
public class DesignImpl extends MinimalEObjectImpl.Container implements Design {
	/**
	 * The default value of the '{@link #getName() <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getName()
	 * @generated
	 * @ordered
	 */
	protected static final String NAME_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getName() <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getName()
	 * @generated
	 * @ordered
	 */
	protected String name = NAME_EDEFAULT;

	/**
	 * The default value of the '{@link #getNotes() <em>Notes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNotes()
	 * @generated
	 * @ordered
	 */
	protected static final String NOTES_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getNotes() <em>Notes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNotes()
	 * @generated
	 * @ordered
	 */
	protected String notes = NOTES_EDEFAULT;

	/**
	 * The cached value of the '{@link #getMaterials() <em>Materials</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMaterials()
	 * @generated
	 * @ordered
	 */
	protected EList<Material> materials;

	/**
	 * The cached value of the '{@link #getJoints() <em>Joints</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getJoints()
	 * @generated
	 * @ordered
	 */
	protected EList<Joint> joints;

	/**
	 * The cached value of the '{@link #getLegs() <em>Legs</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLegs()
	 * @generated
	 * @ordered
	 */
	protected EList<Leg> legs;

	/**
	 * The cached value of the '{@link #getAirPaths() <em>Air Paths</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAirPaths()
	 * @generated
	 * @ordered
	 */
	protected EList<AirPath> airPaths;

	/**
	 * The cached value of the '{@link #getWindings() <em>Windings</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWindings()
	 * @generated
	 * @ordered
	 */
	protected EList<Winding> windings;

	/**
	 * The cached value of the '{@link #getOperatingPoints() <em>Operating Points</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOperatingPoints()
	 * @generated
	 * @ordered
	 */
	protected EList<OperatingPoint> operatingPoints;

	/**
	 * The cached value of the '{@link #getLimits() <em>Limits</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLimits()
	 * @generated
	 * @ordered
	 */
	protected Limits limits;

	/**
	 * The cached value of the '{@link #getLeakages() <em>Leakages</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLeakages()
	 * @generated
	 * @ordered
	 */
	protected EList<WindingLeakage> leakages;

	/**
	 * The cached value of the '{@link #getConnections() <em>Connections</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getConnections()
	 * @generated
	 * @ordered
	 */
	protected EList<WindingConnection> connections;

	/**
	 * The cached value of the '{@link #getTolerances() <em>Tolerances</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTolerances()
	 * @generated
	 * @ordered
	 */
	protected EList<Tolerance> tolerances;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected DesignImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.DESIGN;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getName() {
		return name;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setName(String newName) {
		String oldName = name;
		name = newName;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.DESIGN__NAME, oldName, name));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getNotes() {
		return notes;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setNotes(String newNotes) {
		String oldNotes = notes;
		notes = newNotes;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.DESIGN__NOTES, oldNotes, notes));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Material> getMaterials() {
		if (materials == null) {
			materials = new EObjectContainmentEList<Material>(Material.class, this, GapwrightPackage.DESIGN__MATERIALS);
		}
		return materials;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Joint> getJoints() {
		if (joints == null) {
			joints = new EObjectContainmentEList<Joint>(Joint.class, this, GapwrightPackage.DESIGN__JOINTS);
		}
		return joints;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Leg> getLegs() {
		if (legs == null) {
			legs = new EObjectContainmentEList<Leg>(Leg.class, this, GapwrightPackage.DESIGN__LEGS);
		}
		return legs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<AirPath> getAirPaths() {
		if (airPaths == null) {
			airPaths = new EObjectContainmentEList<AirPath>(AirPath.class, this, GapwrightPackage.DESIGN__AIR_PATHS);
		}
		return airPaths;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Winding> getWindings() {
		if (windings == null) {
			windings = new EObjectContainmentEList<Winding>(Winding.class, this, GapwrightPackage.DESIGN__WINDINGS);
		}
		return windings;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<OperatingPoint> getOperatingPoints() {
		if (operatingPoints == null) {
			operatingPoints = new EObjectContainmentEList<OperatingPoint>(OperatingPoint.class, this, GapwrightPackage.DESIGN__OPERATING_POINTS);
		}
		return operatingPoints;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Limits getLimits() {
		return limits;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetLimits(Limits newLimits, NotificationChain msgs) {
		Limits oldLimits = limits;
		limits = newLimits;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, GapwrightPackage.DESIGN__LIMITS, oldLimits, newLimits);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLimits(Limits newLimits) {
		if (newLimits != limits) {
			NotificationChain msgs = null;
			if (limits != null)
				msgs = ((InternalEObject)limits).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - GapwrightPackage.DESIGN__LIMITS, null, msgs);
			if (newLimits != null)
				msgs = ((InternalEObject)newLimits).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - GapwrightPackage.DESIGN__LIMITS, null, msgs);
			msgs = basicSetLimits(newLimits, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.DESIGN__LIMITS, newLimits, newLimits));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<WindingLeakage> getLeakages() {
		if (leakages == null) {
			leakages = new EObjectContainmentEList<WindingLeakage>(WindingLeakage.class, this, GapwrightPackage.DESIGN__LEAKAGES);
		}
		return leakages;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<WindingConnection> getConnections() {
		if (connections == null) {
			connections = new EObjectContainmentEList<WindingConnection>(WindingConnection.class, this, GapwrightPackage.DESIGN__CONNECTIONS);
		}
		return connections;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Tolerance> getTolerances() {
		if (tolerances == null) {
			tolerances = new EObjectContainmentEList<Tolerance>(Tolerance.class, this, GapwrightPackage.DESIGN__TOLERANCES);
		}
		return tolerances;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case GapwrightPackage.DESIGN__MATERIALS:
				return ((InternalEList<?>)getMaterials()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.DESIGN__JOINTS:
				return ((InternalEList<?>)getJoints()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.DESIGN__LEGS:
				return ((InternalEList<?>)getLegs()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.DESIGN__AIR_PATHS:
				return ((InternalEList<?>)getAirPaths()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.DESIGN__WINDINGS:
				return ((InternalEList<?>)getWindings()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.DESIGN__OPERATING_POINTS:
				return ((InternalEList<?>)getOperatingPoints()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.DESIGN__LIMITS:
				return basicSetLimits(null, msgs);
			case GapwrightPackage.DESIGN__LEAKAGES:
				return ((InternalEList<?>)getLeakages()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.DESIGN__CONNECTIONS:
				return ((InternalEList<?>)getConnections()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.DESIGN__TOLERANCES:
				return ((InternalEList<?>)getTolerances()).basicRemove(otherEnd, msgs);
		}
		return super.eInverseRemove(otherEnd, featureID, msgs);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.DESIGN__NAME:
				return getName();
			case GapwrightPackage.DESIGN__NOTES:
				return getNotes();
			case GapwrightPackage.DESIGN__MATERIALS:
				return getMaterials();
			case GapwrightPackage.DESIGN__JOINTS:
				return getJoints();
			case GapwrightPackage.DESIGN__LEGS:
				return getLegs();
			case GapwrightPackage.DESIGN__AIR_PATHS:
				return getAirPaths();
			case GapwrightPackage.DESIGN__WINDINGS:
				return getWindings();
			case GapwrightPackage.DESIGN__OPERATING_POINTS:
				return getOperatingPoints();
			case GapwrightPackage.DESIGN__LIMITS:
				return getLimits();
			case GapwrightPackage.DESIGN__LEAKAGES:
				return getLeakages();
			case GapwrightPackage.DESIGN__CONNECTIONS:
				return getConnections();
			case GapwrightPackage.DESIGN__TOLERANCES:
				return getTolerances();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@SuppressWarnings("unchecked")
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case GapwrightPackage.DESIGN__NAME:
				setName((String)newValue);
				return;
			case GapwrightPackage.DESIGN__NOTES:
				setNotes((String)newValue);
				return;
			case GapwrightPackage.DESIGN__MATERIALS:
				getMaterials().clear();
				getMaterials().addAll((Collection<? extends Material>)newValue);
				return;
			case GapwrightPackage.DESIGN__JOINTS:
				getJoints().clear();
				getJoints().addAll((Collection<? extends Joint>)newValue);
				return;
			case GapwrightPackage.DESIGN__LEGS:
				getLegs().clear();
				getLegs().addAll((Collection<? extends Leg>)newValue);
				return;
			case GapwrightPackage.DESIGN__AIR_PATHS:
				getAirPaths().clear();
				getAirPaths().addAll((Collection<? extends AirPath>)newValue);
				return;
			case GapwrightPackage.DESIGN__WINDINGS:
				getWindings().clear();
				getWindings().addAll((Collection<? extends Winding>)newValue);
				return;
			case GapwrightPackage.DESIGN__OPERATING_POINTS:
				getOperatingPoints().clear();
				getOperatingPoints().addAll((Collection<? extends OperatingPoint>)newValue);
				return;
			case GapwrightPackage.DESIGN__LIMITS:
				setLimits((Limits)newValue);
				return;
			case GapwrightPackage.DESIGN__LEAKAGES:
				getLeakages().clear();
				getLeakages().addAll((Collection<? extends WindingLeakage>)newValue);
				return;
			case GapwrightPackage.DESIGN__CONNECTIONS:
				getConnections().clear();
				getConnections().addAll((Collection<? extends WindingConnection>)newValue);
				return;
			case GapwrightPackage.DESIGN__TOLERANCES:
				getTolerances().clear();
				getTolerances().addAll((Collection<? extends Tolerance>)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case GapwrightPackage.DESIGN__NAME:
				setName(NAME_EDEFAULT);
				return;
			case GapwrightPackage.DESIGN__NOTES:
				setNotes(NOTES_EDEFAULT);
				return;
			case GapwrightPackage.DESIGN__MATERIALS:
				getMaterials().clear();
				return;
			case GapwrightPackage.DESIGN__JOINTS:
				getJoints().clear();
				return;
			case GapwrightPackage.DESIGN__LEGS:
				getLegs().clear();
				return;
			case GapwrightPackage.DESIGN__AIR_PATHS:
				getAirPaths().clear();
				return;
			case GapwrightPackage.DESIGN__WINDINGS:
				getWindings().clear();
				return;
			case GapwrightPackage.DESIGN__OPERATING_POINTS:
				getOperatingPoints().clear();
				return;
			case GapwrightPackage.DESIGN__LIMITS:
				setLimits((Limits)null);
				return;
			case GapwrightPackage.DESIGN__LEAKAGES:
				getLeakages().clear();
				return;
			case GapwrightPackage.DESIGN__CONNECTIONS:
				getConnections().clear();
				return;
			case GapwrightPackage.DESIGN__TOLERANCES:
				getTolerances().clear();
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case GapwrightPackage.DESIGN__NAME:
				return NAME_EDEFAULT == null ? name != null : !NAME_EDEFAULT.equals(name);
			case GapwrightPackage.DESIGN__NOTES:
				return NOTES_EDEFAULT == null ? notes != null : !NOTES_EDEFAULT.equals(notes);
			case GapwrightPackage.DESIGN__MATERIALS:
				return materials != null && !materials.isEmpty();
			case GapwrightPackage.DESIGN__JOINTS:
				return joints != null && !joints.isEmpty();
			case GapwrightPackage.DESIGN__LEGS:
				return legs != null && !legs.isEmpty();
			case GapwrightPackage.DESIGN__AIR_PATHS:
				return airPaths != null && !airPaths.isEmpty();
			case GapwrightPackage.DESIGN__WINDINGS:
				return windings != null && !windings.isEmpty();
			case GapwrightPackage.DESIGN__OPERATING_POINTS:
				return operatingPoints != null && !operatingPoints.isEmpty();
			case GapwrightPackage.DESIGN__LIMITS:
				return limits != null;
			case GapwrightPackage.DESIGN__LEAKAGES:
				return leakages != null && !leakages.isEmpty();
			case GapwrightPackage.DESIGN__CONNECTIONS:
				return connections != null && !connections.isEmpty();
			case GapwrightPackage.DESIGN__TOLERANCES:
				return tolerances != null && !tolerances.isEmpty();
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (name: ");
		result.append(name);
		result.append(", notes: ");
		result.append(notes);
		result.append(')');
		return result.toString();
	}

} //DesignImpl
