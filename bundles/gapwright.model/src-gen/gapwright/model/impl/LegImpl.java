/**
 */
package gapwright.model.impl;

import gapwright.model.Gap;
import gapwright.model.GapwrightPackage;
import gapwright.model.Joint;
import gapwright.model.Leg;
import gapwright.model.Magnet;
import gapwright.model.Material;
import gapwright.model.SectionShape;

import gapwright.model.quantity.Quantity;

import java.util.Collection;

import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.common.notify.NotificationChain;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Leg</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.LegImpl#getFrom <em>From</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getTo <em>To</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getMaterial <em>Material</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getShape <em>Shape</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getWidth <em>Width</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getDepth <em>Depth</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getDiameter <em>Diameter</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getArea <em>Area</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getStackingFactor <em>Stacking Factor</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getPathLength <em>Path Length</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getGaps <em>Gaps</em>}</li>
 *   <li>{@link gapwright.model.impl.LegImpl#getMagnet <em>Magnet</em>}</li>
 * </ul>
 *
 * @generated
 */
public class LegImpl extends ElementImpl implements Leg {
	/**
	 * The cached value of the '{@link #getFrom() <em>From</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFrom()
	 * @generated
	 * @ordered
	 */
	protected Joint from;

	/**
	 * The cached value of the '{@link #getTo() <em>To</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTo()
	 * @generated
	 * @ordered
	 */
	protected Joint to;

	/**
	 * The cached value of the '{@link #getMaterial() <em>Material</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMaterial()
	 * @generated
	 * @ordered
	 */
	protected Material material;

	/**
	 * The default value of the '{@link #getShape() <em>Shape</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShape()
	 * @generated
	 * @ordered
	 */
	protected static final SectionShape SHAPE_EDEFAULT = SectionShape.RECTANGULAR;

	/**
	 * The cached value of the '{@link #getShape() <em>Shape</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShape()
	 * @generated
	 * @ordered
	 */
	protected SectionShape shape = SHAPE_EDEFAULT;

	/**
	 * The default value of the '{@link #getWidth() <em>Width</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWidth()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity WIDTH_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getWidth() <em>Width</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWidth()
	 * @generated
	 * @ordered
	 */
	protected Quantity width = WIDTH_EDEFAULT;

	/**
	 * The default value of the '{@link #getDepth() <em>Depth</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDepth()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity DEPTH_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDepth() <em>Depth</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDepth()
	 * @generated
	 * @ordered
	 */
	protected Quantity depth = DEPTH_EDEFAULT;

	/**
	 * The default value of the '{@link #getDiameter() <em>Diameter</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDiameter()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity DIAMETER_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDiameter() <em>Diameter</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDiameter()
	 * @generated
	 * @ordered
	 */
	protected Quantity diameter = DIAMETER_EDEFAULT;

	/**
	 * The default value of the '{@link #getArea() <em>Area</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getArea()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity AREA_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getArea() <em>Area</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getArea()
	 * @generated
	 * @ordered
	 */
	protected Quantity area = AREA_EDEFAULT;

	/**
	 * The default value of the '{@link #getStackingFactor() <em>Stacking Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStackingFactor()
	 * @generated
	 * @ordered
	 */
	protected static final double STACKING_FACTOR_EDEFAULT = 1.0;

	/**
	 * The cached value of the '{@link #getStackingFactor() <em>Stacking Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStackingFactor()
	 * @generated
	 * @ordered
	 */
	protected double stackingFactor = STACKING_FACTOR_EDEFAULT;

	/**
	 * The default value of the '{@link #getPathLength() <em>Path Length</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPathLength()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity PATH_LENGTH_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getPathLength() <em>Path Length</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPathLength()
	 * @generated
	 * @ordered
	 */
	protected Quantity pathLength = PATH_LENGTH_EDEFAULT;

	/**
	 * The cached value of the '{@link #getGaps() <em>Gaps</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGaps()
	 * @generated
	 * @ordered
	 */
	protected EList<Gap> gaps;

	/**
	 * The cached value of the '{@link #getMagnet() <em>Magnet</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMagnet()
	 * @generated
	 * @ordered
	 */
	protected Magnet magnet;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected LegImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.LEG;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Joint getFrom() {
		return from;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFrom(Joint newFrom) {
		Joint oldFrom = from;
		from = newFrom;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__FROM, oldFrom, from));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Joint getTo() {
		return to;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTo(Joint newTo) {
		Joint oldTo = to;
		to = newTo;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__TO, oldTo, to));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Material getMaterial() {
		return material;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMaterial(Material newMaterial) {
		Material oldMaterial = material;
		material = newMaterial;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__MATERIAL, oldMaterial, material));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SectionShape getShape() {
		return shape;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setShape(SectionShape newShape) {
		SectionShape oldShape = shape;
		shape = newShape == null ? SHAPE_EDEFAULT : newShape;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__SHAPE, oldShape, shape));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getWidth() {
		return width;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setWidth(Quantity newWidth) {
		Quantity oldWidth = width;
		width = newWidth;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__WIDTH, oldWidth, width));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getDepth() {
		return depth;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDepth(Quantity newDepth) {
		Quantity oldDepth = depth;
		depth = newDepth;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__DEPTH, oldDepth, depth));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getDiameter() {
		return diameter;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDiameter(Quantity newDiameter) {
		Quantity oldDiameter = diameter;
		diameter = newDiameter;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__DIAMETER, oldDiameter, diameter));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getArea() {
		return area;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setArea(Quantity newArea) {
		Quantity oldArea = area;
		area = newArea;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__AREA, oldArea, area));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getStackingFactor() {
		return stackingFactor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStackingFactor(double newStackingFactor) {
		double oldStackingFactor = stackingFactor;
		stackingFactor = newStackingFactor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__STACKING_FACTOR, oldStackingFactor, stackingFactor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getPathLength() {
		return pathLength;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPathLength(Quantity newPathLength) {
		Quantity oldPathLength = pathLength;
		pathLength = newPathLength;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__PATH_LENGTH, oldPathLength, pathLength));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Gap> getGaps() {
		if (gaps == null) {
			gaps = new EObjectContainmentEList<Gap>(Gap.class, this, GapwrightPackage.LEG__GAPS);
		}
		return gaps;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Magnet getMagnet() {
		return magnet;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetMagnet(Magnet newMagnet, NotificationChain msgs) {
		Magnet oldMagnet = magnet;
		magnet = newMagnet;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__MAGNET, oldMagnet, newMagnet);
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
	public void setMagnet(Magnet newMagnet) {
		if (newMagnet != magnet) {
			NotificationChain msgs = null;
			if (magnet != null)
				msgs = ((InternalEObject)magnet).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - GapwrightPackage.LEG__MAGNET, null, msgs);
			if (newMagnet != null)
				msgs = ((InternalEObject)newMagnet).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - GapwrightPackage.LEG__MAGNET, null, msgs);
			msgs = basicSetMagnet(newMagnet, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LEG__MAGNET, newMagnet, newMagnet));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case GapwrightPackage.LEG__GAPS:
				return ((InternalEList<?>)getGaps()).basicRemove(otherEnd, msgs);
			case GapwrightPackage.LEG__MAGNET:
				return basicSetMagnet(null, msgs);
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
			case GapwrightPackage.LEG__FROM:
				return getFrom();
			case GapwrightPackage.LEG__TO:
				return getTo();
			case GapwrightPackage.LEG__MATERIAL:
				return getMaterial();
			case GapwrightPackage.LEG__SHAPE:
				return getShape();
			case GapwrightPackage.LEG__WIDTH:
				return getWidth();
			case GapwrightPackage.LEG__DEPTH:
				return getDepth();
			case GapwrightPackage.LEG__DIAMETER:
				return getDiameter();
			case GapwrightPackage.LEG__AREA:
				return getArea();
			case GapwrightPackage.LEG__STACKING_FACTOR:
				return getStackingFactor();
			case GapwrightPackage.LEG__PATH_LENGTH:
				return getPathLength();
			case GapwrightPackage.LEG__GAPS:
				return getGaps();
			case GapwrightPackage.LEG__MAGNET:
				return getMagnet();
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
			case GapwrightPackage.LEG__FROM:
				setFrom((Joint)newValue);
				return;
			case GapwrightPackage.LEG__TO:
				setTo((Joint)newValue);
				return;
			case GapwrightPackage.LEG__MATERIAL:
				setMaterial((Material)newValue);
				return;
			case GapwrightPackage.LEG__SHAPE:
				setShape((SectionShape)newValue);
				return;
			case GapwrightPackage.LEG__WIDTH:
				setWidth((Quantity)newValue);
				return;
			case GapwrightPackage.LEG__DEPTH:
				setDepth((Quantity)newValue);
				return;
			case GapwrightPackage.LEG__DIAMETER:
				setDiameter((Quantity)newValue);
				return;
			case GapwrightPackage.LEG__AREA:
				setArea((Quantity)newValue);
				return;
			case GapwrightPackage.LEG__STACKING_FACTOR:
				setStackingFactor((Double)newValue);
				return;
			case GapwrightPackage.LEG__PATH_LENGTH:
				setPathLength((Quantity)newValue);
				return;
			case GapwrightPackage.LEG__GAPS:
				getGaps().clear();
				getGaps().addAll((Collection<? extends Gap>)newValue);
				return;
			case GapwrightPackage.LEG__MAGNET:
				setMagnet((Magnet)newValue);
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
			case GapwrightPackage.LEG__FROM:
				setFrom((Joint)null);
				return;
			case GapwrightPackage.LEG__TO:
				setTo((Joint)null);
				return;
			case GapwrightPackage.LEG__MATERIAL:
				setMaterial((Material)null);
				return;
			case GapwrightPackage.LEG__SHAPE:
				setShape(SHAPE_EDEFAULT);
				return;
			case GapwrightPackage.LEG__WIDTH:
				setWidth(WIDTH_EDEFAULT);
				return;
			case GapwrightPackage.LEG__DEPTH:
				setDepth(DEPTH_EDEFAULT);
				return;
			case GapwrightPackage.LEG__DIAMETER:
				setDiameter(DIAMETER_EDEFAULT);
				return;
			case GapwrightPackage.LEG__AREA:
				setArea(AREA_EDEFAULT);
				return;
			case GapwrightPackage.LEG__STACKING_FACTOR:
				setStackingFactor(STACKING_FACTOR_EDEFAULT);
				return;
			case GapwrightPackage.LEG__PATH_LENGTH:
				setPathLength(PATH_LENGTH_EDEFAULT);
				return;
			case GapwrightPackage.LEG__GAPS:
				getGaps().clear();
				return;
			case GapwrightPackage.LEG__MAGNET:
				setMagnet((Magnet)null);
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
			case GapwrightPackage.LEG__FROM:
				return from != null;
			case GapwrightPackage.LEG__TO:
				return to != null;
			case GapwrightPackage.LEG__MATERIAL:
				return material != null;
			case GapwrightPackage.LEG__SHAPE:
				return shape != SHAPE_EDEFAULT;
			case GapwrightPackage.LEG__WIDTH:
				return WIDTH_EDEFAULT == null ? width != null : !WIDTH_EDEFAULT.equals(width);
			case GapwrightPackage.LEG__DEPTH:
				return DEPTH_EDEFAULT == null ? depth != null : !DEPTH_EDEFAULT.equals(depth);
			case GapwrightPackage.LEG__DIAMETER:
				return DIAMETER_EDEFAULT == null ? diameter != null : !DIAMETER_EDEFAULT.equals(diameter);
			case GapwrightPackage.LEG__AREA:
				return AREA_EDEFAULT == null ? area != null : !AREA_EDEFAULT.equals(area);
			case GapwrightPackage.LEG__STACKING_FACTOR:
				return stackingFactor != STACKING_FACTOR_EDEFAULT;
			case GapwrightPackage.LEG__PATH_LENGTH:
				return PATH_LENGTH_EDEFAULT == null ? pathLength != null : !PATH_LENGTH_EDEFAULT.equals(pathLength);
			case GapwrightPackage.LEG__GAPS:
				return gaps != null && !gaps.isEmpty();
			case GapwrightPackage.LEG__MAGNET:
				return magnet != null;
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
		result.append(" (shape: ");
		result.append(shape);
		result.append(", width: ");
		result.append(width);
		result.append(", depth: ");
		result.append(depth);
		result.append(", diameter: ");
		result.append(diameter);
		result.append(", area: ");
		result.append(area);
		result.append(", stackingFactor: ");
		result.append(stackingFactor);
		result.append(", pathLength: ");
		result.append(pathLength);
		result.append(')');
		return result.toString();
	}

} //LegImpl
